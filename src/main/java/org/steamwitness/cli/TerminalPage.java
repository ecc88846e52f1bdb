package org.steamwitness.cli;

import java.util.ArrayList;
import java.util.List;
import org.steamwitness.quantity.Printed;
import org.steamwitness.record.CriterionPart;
import org.steamwitness.record.CycleRecord;
import org.steamwitness.record.FindingPart;
import org.steamwitness.record.HoldPart;
import org.steamwitness.record.LethalityPart;
import org.steamwitness.record.RunPart;
import org.steamwitness.record.SaturationPart;

/** A record on one screen: what it came to, the closest call, what was not judged, and what needs a person. */
final class TerminalPage {

    private static final int WIDTH = 100;

    private final CycleRecord record;
    private final List<String> lines = new ArrayList<>();

    private TerminalPage(CycleRecord record) {
        this.record = record;
    }

    static List<String> of(CycleRecord record) {
        return new TerminalPage(record).page();
    }

    private List<String> page() {
        identity();
        verdict();
        record.criteria().forEach(this::criterion);
        hold();
        saturation();
        record.lethality().forEach(this::lethality);
        wrapped(
                "Not judged   ",
                String.join(
                        "; ",
                        record.notJudged().stream()
                                .map(n -> n.what() + ": " + n.why())
                                .toList()));
        findings();
        wrapped("Caution      ", record.cautions().get(0).text());
        return List.copyOf(lines);
    }

    private void identity() {
        RunPart run = record.run();
        String product =
                run.product().printed(p -> p.name() + ", lots " + p.lots().printed(l -> String.join(", ", l)));
        wrapped("Run          ", run.run() + ", equipment " + run.equipment() + ", " + product);
        lines.add("Log          " + record.provenance().log().name() + ", "
                + record.phases().get(0).startLocal().printed(l -> l.replace('T', ' ')) + ", zone "
                + run.zone().printed(z -> z));
        lines.add("Plan         " + record.plan().id() + ", revision "
                + record.plan().revision() + ", " + record.plan().status().replace('-', ' '));
    }

    private void verdict() {
        lines.add("");
        lines.add("Criteria of the plan: " + record.verdict().outcome());
        record.verdict().because().stream()
                .filter(b -> !record.verdict().outcome().equals("met"))
                .forEach(because -> wrapped("  because    ", because));
        wrapped(
                "  closest    ",
                record.verdict()
                        .closest()
                        .printed(c -> whatOf(c.criterion()) + ", margin "
                                + signed(c.margin(), c.unit()) + ", " + c.channel()
                                + c.seconds()
                                        .value()
                                        .map(s -> ", " + Printed.duration(s) + " into the log")
                                        .orElse("")));
        lines.add("");
    }

    private String whatOf(String id) {
        return record.criteria().stream()
                .filter(c -> c.id().equals(id))
                .map(CriterionPart::what)
                .findFirst()
                .orElse(id);
    }

    private void criterion(CriterionPart c) {
        String value = c.value().value().map(v -> plain(v, c.unit())).orElse("–");
        lines.add(padded(c.decision(), 13) + padded(c.what(), 30) + padded(value, 14) + c.side() + " "
                + plain(c.limit(), c.unit()));
    }

    private void hold() {
        HoldPart.Step step = record.hold().steps().get(0);
        lines.add("");
        lines.add("Hold         proven " + Printed.duration(step.provenSeconds()) + ", possible "
                + Printed.duration(step.possibleSeconds()) + ", attempts "
                + step.attempts().size());
        for (HoldPart.PerChannel p : step.perChannel()) {
            lines.add("  " + padded(p.channel(), 18) + "lowest " + Printed.fixed(p.lowest(), 2) + "  mean "
                    + Printed.fixed(p.mean(), 2) + "  highest " + Printed.fixed(p.highest(), 2) + " °C");
        }
    }

    private void saturation() {
        SaturationPart part = record.saturation();
        if (part.tolerance().value().isEmpty()) {
            wrapped("Saturation   ", part.tolerance().printed(t -> ""));
            return;
        }
        String tolerance = part.tolerance()
                .printed(t -> "tolerance -" + Printed.fixed(t.airKelvin(), 1) + " K to +"
                        + Printed.fixed(t.superheatKelvin(), 1) + " K");
        String air = part.smallestAirFraction().printed(a -> Printed.fixed(a * 100, 1) + " % by volume");
        wrapped(
                "Saturation   ",
                part.episodes().size() + (part.episodes().size() == 1 ? " episode" : " episodes")
                        + " in the hold phase, " + tolerance + "; smallest air these sensors could show: " + air);
    }

    private void lethality(LethalityPart part) {
        String minimum = part.minimum()
                .value()
                .map(m -> ", minimum " + Printed.fixed(m, part.unit().equals("s") ? 0 : 2) + " " + part.unit())
                .orElse("");
        int decimals = part.unit().equals("s") ? 0 : 2;
        String governs = part.governs().equals("least") ? "Least " : "Most ";
        lines.add(padded(governs + part.name(), 13)
                + part.governing()
                        .printed(g -> Printed.fixed(g.value(), decimals) + " " + part.unit() + " at " + g.channel()
                                + " (" + part.counted() + minimum + ")"));
    }

    private void findings() {
        List<FindingPart> serious = record.findings().stream()
                .filter(f -> !f.severity().equals("note"))
                .toList();
        if (serious.isEmpty()) {
            lines.add("For a person nothing beyond the usual review and signature");
        }
        for (FindingPart finding : serious) {
            wrapped(
                    "For a person ",
                    finding.place().value().map(p -> p + ": ").orElse("") + finding.text() + " " + finding.remedy());
        }
    }

    private void wrapped(String label, String text) {
        String indent = " ".repeat(label.length());
        StringBuilder line = new StringBuilder(label);
        boolean fresh = true;
        for (String word : text.split(" ", -1)) {
            if (!fresh && line.length() + 1 + word.length() > WIDTH) {
                lines.add(line.toString());
                line = new StringBuilder(indent);
                fresh = true;
            }
            line.append(fresh ? "" : " ").append(word);
            fresh = false;
        }
        lines.add(line.toString());
    }

    private static String padded(String text, int width) {
        return text + " ".repeat(Math.max(1, width - text.length()));
    }

    private static String plain(double value, String unit) {
        if (unit.equals("s")) {
            return Printed.duration(value);
        }
        return Printed.fixed(value, unit.startsWith("s ") ? 0 : 2) + " " + unit;
    }

    private static String signed(double value, String unit) {
        return unit.equals("s")
                ? (value < 0 ? "-" : "+") + Printed.duration(Math.abs(value))
                : Printed.signed(value, 2) + " " + unit;
    }
}
