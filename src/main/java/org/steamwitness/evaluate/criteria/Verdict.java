package org.steamwitness.evaluate.criteria;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import org.steamwitness.evaluate.criteria.Criterion.Subject;
import org.steamwitness.finding.Finding;
import org.steamwitness.finding.Severity;

/**
 * All criteria and blocking findings together. Not met goes before undecided, undecided before met; a blocking finding
 * makes it undecided at best; without a decided criterion on holding time or temperature nothing is judged.
 *
 * @param outcome what it came to
 * @param because what made it so, in words
 * @param closest the criterion with the least margin in proportion to its limit
 */
public record Verdict(Outcome outcome, List<String> because, Optional<Criterion> closest) {

    /**
     * Takes all together.
     *
     * @param criteria all criteria
     * @param findings all findings
     * @param draft whether the plan is not in force
     * @return the verdict
     */
    public static Verdict of(List<Criterion> criteria, List<Finding> findings, boolean draft) {
        Optional<Criterion> closest = criteria.stream()
                .filter(c -> c.margin().isPresent())
                .min(Comparator.comparingDouble(c -> c.margin().orElseThrow() / Math.abs(c.limit())));
        if (draft) {
            return new Verdict(Outcome.DRAFT_PLAN, List.of("the plan is not in force"), closest);
        }
        List<String> notMet = named(criteria, Decision.NOT_MET);
        if (!notMet.isEmpty()) {
            return new Verdict(Outcome.NOT_MET, notMet, closest);
        }
        List<String> open = new ArrayList<>(named(criteria, Decision.UNDECIDED));
        findings.stream()
                .filter(f -> f.severity() == Severity.BLOCKS)
                .map(Finding::text)
                .forEach(open::add);
        if (!open.isEmpty()) {
            return new Verdict(Outcome.UNDECIDED, List.copyOf(open), closest);
        }
        boolean heartDecided = criteria.stream()
                .anyMatch(c -> c.subject() == Subject.TIME_OR_TEMPERATURE && c.decision() == Decision.MET);
        return heartDecided
                ? new Verdict(Outcome.MET, List.of("every criterion is met"), closest)
                : new Verdict(
                        Outcome.NOTHING_JUDGED,
                        List.of("the plan has no decided criterion on holding time or temperature"),
                        closest);
    }

    private static List<String> named(List<Criterion> criteria, Decision decision) {
        return criteria.stream()
                .filter(c -> c.decision() == decision)
                .map(c -> c.what() + ": " + c.why())
                .toList();
    }

    /** What a verdict can come to. */
    public enum Outcome {
        /** Every criterion is met. */
        MET("met"),
        /** A criterion is not met. */
        NOT_MET("not met"),
        /** It can't be told. */
        UNDECIDED("undecided"),
        /** Nothing that a verdict needs was decided. */
        NOTHING_JUDGED("nothing judged"),
        /** The plan is not in force. */
        DRAFT_PLAN("draft plan");

        private final String word;

        Outcome(String word) {
            this.word = word;
        }

        /**
         * The word used in records.
         *
         * @return such as "not met"
         */
        public String word() {
            return word;
        }
    }
}
