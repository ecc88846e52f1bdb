package org.steamwitness.plan;

/** Understands {@code decision}. */
final class DecisionReader {

    private DecisionReader() {}

    static DecisionRule decision(Section at) {
        Entry<Boolean> guarded = at.need("rule").parsed("one of: guarded, simple", DecisionReader::guarded);
        if (guarded.kept().filter(g -> !g).isPresent()) {
            return DecisionRule.SIMPLE;
        }
        Entry<Double> conformance =
                at.need("conformance").parsed("a probability such as 95 %", DecisionReader::probability);
        return new DecisionRule(guarded.get(), conformance.get());
    }

    private static boolean guarded(String text) {
        return switch (text) {
            case "guarded" -> true;
            case "simple" -> false;
            default -> throw new IllegalArgumentException("\"" + text + "\" is not one of: guarded, simple");
        };
    }

    private static double probability(String text) {
        if (!text.matches("[0-9]{2}(\\.[0-9]{1,3})? ?%")) {
            throw new IllegalArgumentException("\"" + text + "\" is not a probability such as 95 %");
        }
        double percent = Double.parseDouble(text.substring(0, text.length() - 1).strip());
        if (!(percent > 50)) {
            throw new IllegalArgumentException(
                    "\"" + text + "\" is too low; expected more than 50 % and less than 100 %");
        }
        return percent / 100;
    }
}
