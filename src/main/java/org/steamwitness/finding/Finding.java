package org.steamwitness.finding;

import java.util.Collections;
import java.util.Map;
import java.util.Set;
import java.util.TreeMap;
import java.util.TreeSet;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/**
 * Anything the reader must know: a kind, where it was found, and the facts that the kind's words ask for.
 *
 * @param kind which entry of the catalogue
 * @param position where
 * @param facts by name, exactly those that the kind's words name
 */
public record Finding(FindingKind kind, Position position, Map<String, String> facts) {

    private static final Pattern FACT = Pattern.compile("\\{([a-z]+)}");

    /**
     * Checks the facts against the catalogue.
     *
     * @param kind which entry of the catalogue
     * @param position where
     * @param facts by name
     * @throws IllegalArgumentException if a fact is missing or nobody asks for it
     */
    public Finding {
        Set<String> asked = factsOf(kind);
        if (!asked.equals(facts.keySet())) {
            throw new IllegalArgumentException(kind + " asks for the facts " + asked + ", got " + facts.keySet());
        }
        facts = Collections.unmodifiableMap(new TreeMap<>(facts));
    }

    /**
     * How much it weighs.
     *
     * @return the severity of its kind
     */
    public Severity severity() {
        return kind.severity();
    }

    /**
     * What was found, in words.
     *
     * @return one sentence, without its position
     */
    public String text() {
        return filled(kind.text());
    }

    /**
     * What to do about it, in words.
     *
     * @return one sentence
     */
    public String remedy() {
        return filled(kind.remedy());
    }

    /** The facts that the words of a kind name. */
    static Set<String> factsOf(FindingKind kind) {
        Set<String> names = new TreeSet<>();
        Matcher fact = FACT.matcher(kind.text() + kind.remedy());
        while (fact.find()) {
            names.add(fact.group(1));
        }
        return names;
    }

    private String filled(String words) {
        return FACT.matcher(words).replaceAll(fact -> Matcher.quoteReplacement(facts.get(fact.group(1))));
    }
}
