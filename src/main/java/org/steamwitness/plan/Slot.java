package org.steamwitness.plan;

import java.time.DateTimeException;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.function.Function;
import java.util.stream.Collectors;
import org.snakeyaml.engine.v2.nodes.MappingNode;
import org.snakeyaml.engine.v2.nodes.Node;
import org.snakeyaml.engine.v2.nodes.ScalarNode;
import org.snakeyaml.engine.v2.nodes.SequenceNode;
import org.snakeyaml.engine.v2.nodes.Tag;

/** The value under one key, not yet understood. Each way to understand it reports what it has to refuse. */
final class Slot {

    private final Document document;
    private final Section owner;
    private final String path;
    private final Node node;

    Slot(Document document, Section owner, String path, Node node) {
        this.document = document;
        this.owner = owner;
        this.path = path;
        this.node = node;
    }

    boolean isEmpty() {
        return node == null;
    }

    boolean isSection() {
        return node instanceof MappingNode;
    }

    boolean isList() {
        return node instanceof SequenceNode;
    }

    /** Text as written, whatever type YAML would make of it. */
    Entry<String> text() {
        return parsed("text", Function.identity());
    }

    /** Text that a parser turns into a value; its message says what it expected. */
    <T> Entry<T> parsed(String expected, Function<String, T> parser) {
        if (isEmpty()) {
            return Entry.absent();
        }
        if (!(node instanceof ScalarNode scalar)) {
            return refused("expected " + expected);
        }
        if (isOpen()) {
            return open(expected);
        }
        if (scalar.getTag().equals(Tag.NULL) || scalar.getValue().isBlank()) {
            return refused("is empty; expected " + expected);
        }
        String value = OpenPlace.asWritten(scalar.getValue());
        try {
            return Entry.of(parser.apply(value));
        } catch (DateTimeException notATime) {
            return refused("\"" + value + "\" is not " + expected);
        } catch (NumberFormatException notANumber) {
            return refused("\"" + value + "\" is not " + expected);
        } catch (IllegalArgumentException wrong) {
            return refused(wrong.getMessage());
        }
    }

    /** Whether the text could be read as such a figure; reports nothing. */
    boolean reads(Measure measure) {
        try {
            return node instanceof ScalarNode scalar
                    && !measure.figure(scalar.getValue()).written().isEmpty();
        } catch (IllegalArgumentException other) {
            return false;
        }
    }

    Entry<Integer> whole(int low, int high) {
        return parsed("a whole number from " + low + " to " + high, text -> {
            int value = Integer.parseInt(text);
            if (value < low || value > high) {
                throw new NumberFormatException(text);
            }
            return value;
        });
    }

    /** One of the words of an enum. */
    <E extends Enum<E>> Entry<E> word(Class<E> type, Function<E, String> word) {
        String known = Arrays.stream(type.getEnumConstants()).map(word).collect(Collectors.joining(", "));
        return parsed(
                "one of: " + known,
                text -> Arrays.stream(type.getEnumConstants())
                        .filter(constant -> word.apply(constant).equals(text))
                        .findFirst()
                        .orElseThrow(() -> new IllegalArgumentException("\"" + text + "\" is not one of: " + known)));
    }

    /** One of a few words. */
    Entry<String> oneOf(List<String> words) {
        String known = String.join(", ", words);
        return parsed("one of: " + known, text -> {
            if (!words.contains(text)) {
                throw new IllegalArgumentException("\"" + text + "\" is not one of: " + known);
            }
            return text;
        });
    }

    /** True for the first word, false for the second. */
    Entry<Boolean> either(String yes, String no) {
        Entry<String> word = oneOf(List.of(yes, no));
        if (isEmpty()) {
            return Entry.absent();
        }
        return word.kept().map(text -> Entry.of(text.equals(yes))).orElseGet(Entry::broken);
    }

    /** A name, or a list of names. */
    Entry<List<String>> oneOrMore() {
        return isList() ? list(Slot::text) : parsed("a name or a list of names", List::of);
    }

    <T> Entry<T> section(Function<Section, T> reader) {
        if (isEmpty()) {
            return Entry.absent();
        }
        if (isOpen()) {
            return open("keys and values, one level deeper");
        }
        if (!(node instanceof MappingNode mapping)) {
            return refused("expected keys and values, one level deeper");
        }
        return new Section(document, mapping, path).read(reader);
    }

    /** A list; each item is understood by itself, so that all mistakes are reported. */
    <T> Entry<List<T>> list(Function<Slot, Entry<T>> item) {
        if (isEmpty()) {
            return Entry.absent();
        }
        if (isOpen()) {
            return open("a list");
        }
        if (!(node instanceof SequenceNode sequence)) {
            return refused("expected a list");
        }
        if (sequence.getValue().isEmpty()) {
            return refused("the list is empty; expected one entry or more");
        }
        List<Entry<T>> items = new ArrayList<>();
        for (Node each : sequence.getValue()) {
            items.add(item.apply(new Slot(document, owner, path + "[" + items.size() + "]", each)));
        }
        try {
            return Entry.of(items.stream().map(Entry::get).toList());
        } catch (Entry.IncompleteException reported) {
            return Entry.broken();
        }
    }

    /** A list of sections that may be empty. */
    <T> Entry<List<T>> anyNumber(Function<Section, T> reader) {
        if (node instanceof SequenceNode sequence && sequence.getValue().isEmpty()) {
            return Entry.of(List.of());
        }
        return list(slot -> slot.section(reader));
    }

    /** Tells whether a question mark stands here. */
    private boolean isOpen() {
        return node instanceof ScalarNode scalar && OpenPlace.is(scalar.getValue());
    }

    private <T> Entry<T> open(String expected) {
        owner.openAt(node, path, expected);
        return Entry.broken();
    }

    <T> Entry<T> refused(String what) {
        owner.refuseAt(node, path, what);
        return Entry.broken();
    }
}
