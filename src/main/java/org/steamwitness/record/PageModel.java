package org.steamwitness.record;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import org.steamwitness.quantity.Printed;

/**
 * The record as a template sees it: maps, lists and strings, every number already rounded and in its unit, so that a
 * template can arrange but not compute.
 */
final class PageModel {

    private final CycleRecord record;

    private PageModel(CycleRecord record) {
        this.record = record;
    }

    static Map<String, Object> of(CycleRecord record, String printedAt) {
        PageModel model = new PageModel(record);
        Map<String, Object> page = new LinkedHashMap<>();
        page.put("printedAt", printedAt);
        page.put(
                "program",
                record.provenance().program() + " " + record.provenance().version());
        page.put("evaluation", Integer.toString(record.provenance().evaluation()));
        page.put("run", model.run());
        page.put("plan", model.plan());
        page.put("verdict", model.verdict());
        page.put("criteria", model.criteria());
        page.put("hold", model.hold());
        page.put("saturation", model.saturation());
        page.put("lethality", model.lethality());
        page.put("phases", model.phases());
        page.put("channels", model.channels());
        page.put("findings", model.findings());
        page.put("hasFindings", !record.findings().isEmpty());
        page.put(
                "notJudged",
                record.notJudged().stream()
                        .map(n -> Map.of("what", n.what(), "why", n.why()))
                        .toList());
        page.put(
                "cautions",
                record.cautions().stream().map(CycleRecord.Caution::text).toList());
        page.put("files", model.files());
        return page;
    }

    private Map<String, Object> run() {
        RunPart run = record.run();
        String start = record.phases().get(0).startLocal().value().orElse("");
        Map<String, Object> map = new LinkedHashMap<>();
        map.put("run", run.run());
        map.put("equipment", run.equipment());
        map.put("product", run.product().printed(RunPart.Product::name));
        map.put("code", run.product().printed(p -> p.code().printed(c -> c)));
        map.put("lots", run.product().printed(p -> p.lots().printed(l -> String.join(", ", l))));
        map.put("container", run.product().printed(p -> p.container().printed(c -> c)));
        map.put("count", run.product().printed(p -> p.count().printed(c -> Integer.toString(c))));
        map.put(
                "initialTemperature",
                run.initialTemperature().printed(t -> Printed.fixed(t.valueCelsius(), 1) + " °C"));
        map.put("atmosphere", run.atmosphereKilopascal().printed(p -> Printed.fixed(p, 2) + " kPa"));
        map.put("zone", run.zone().printed(z -> z));
        map.put(
                "start",
                start.isEmpty()
                        ? "0 s"
                        : start.substring(0, Math.min(19, start.length())).replace('T', ' '));
        PhasePart last = record.phases().get(record.phases().size() - 1);
        map.put("end", timeOfDay(last.endLocal(), last.endSeconds()));
        map.put("offset", start.length() > 19 ? " (UTC" + start.substring(19) + ")" : "");
        map.put("enteredBy", run.entered().by());
        map.put("enteredAt", run.entered().at());
        map.put("steamOn", run.marks().steamOn().printed(t -> t));
        map.put("ventClosed", run.marks().ventClosed().printed(t -> t));
        map.put("steamOff", run.marks().steamOff().printed(t -> t));
        return map;
    }

    private Map<String, Object> plan() {
        PlanPart plan = record.plan();
        Map<String, Object> map = new LinkedHashMap<>();
        map.put("id", plan.id());
        map.put("title", plan.title());
        map.put("revision", Integer.toString(plan.revision()));
        map.put("status", plan.status().replace('-', ' '));
        map.put(
                "basis",
                plan.basis().document() + ", edition " + plan.basis().edition() + ", "
                        + plan.basis().by() + ", " + plan.basis().date());
        map.put(
                "decision",
                plan.decision()
                        .conformance()
                        .value()
                        .map(c -> plan.decision().rule() + ", conformance " + Printed.fixed(c * 100, 1) + " %")
                        .orElse(plan.decision().rule()));
        return map;
    }

    private Map<String, Object> verdict() {
        VerdictPart verdict = record.verdict();
        Map<String, Object> map = new LinkedHashMap<>();
        map.put("outcome", verdict.outcome());
        map.put("class", verdict.outcome().replace(' ', '-'));
        map.put("because", verdict.because());
        map.put(
                "closest",
                verdict.closest()
                        .printed(c -> criterionNamed(c.criterion()) + ", margin "
                                + signed(c.margin(), c.unit()) + " (" + c.channel() + ")"
                                + c.seconds()
                                        .value()
                                        .map(s -> ", " + Printed.duration(s) + " into the log")
                                        .orElse("")));
        return map;
    }

    private String criterionNamed(String id) {
        return record.criteria().stream()
                .filter(c -> c.id().equals(id))
                .map(CriterionPart::what)
                .findFirst()
                .orElse(id);
    }

    private List<Map<String, Object>> criteria() {
        List<Map<String, Object>> rows = new ArrayList<>();
        for (CriterionPart c : record.criteria()) {
            Map<String, Object> row = new LinkedHashMap<>();
            row.put("what", c.what());
            row.put("where", c.where());
            row.put("phase", c.phase());
            row.put("value", c.value().value().map(v -> plain(v, c.unit())).orElse("–"));
            row.put("limit", (c.side().equals("at least") ? "≥ " : "≤ ") + plain(c.limit(), c.unit()));
            row.put("margin", c.margin().value().map(m -> signed(m, c.unit())).orElse("–"));
            row.put(
                    "uncertainty",
                    c.uncertainty()
                            .value()
                            .map(u -> "± " + plain(2 * u, c.unit()))
                            .orElse("–"));
            row.put("decision", c.decision());
            row.put("class", c.decision().replace(' ', '-'));
            row.put("why", c.why());
            row.put("source", c.source() + ", " + c.edition());
            rows.add(row);
        }
        return rows;
    }

    private Map<String, Object> hold() {
        HoldPart.Step step = record.hold().steps().get(0);
        Map<String, Object> map = new LinkedHashMap<>();
        map.put(
                "band",
                Printed.fixed(step.atLeastCelsius(), 1) + " to " + Printed.fixed(step.atMostCelsius(), 1) + " °C");
        map.put("required", Printed.duration(step.requiredSeconds()));
        map.put("proven", Printed.duration(step.provenSeconds()));
        map.put("possible", Printed.duration(step.possibleSeconds()));
        map.put("attempts", Integer.toString(step.attempts().size()));
        map.put(
                "spread",
                step.spreadKelvin()
                        .printed(s -> Printed.fixed(s.highest(), 2) + " K"
                                + s.uncertainty()
                                        .value()
                                        .map(u -> " ± " + Printed.fixed(2 * u, 2) + " K")
                                        .orElse("") + ", "
                                + s.hottest() + " above " + s.coldest()));
        map.put("hasProbes", !step.perChannel().isEmpty());
        map.put(
                "probes",
                step.perChannel().stream()
                        .map(p -> Map.of(
                                "channel", p.channel(),
                                "lowest", Printed.fixed(p.lowest(), 2),
                                "mean", Printed.fixed(p.mean(), 2),
                                "highest", Printed.fixed(p.highest(), 2),
                                "uncertainty",
                                        p.uncertainty()
                                                .value()
                                                .map(u -> "± " + Printed.fixed(2 * u.lowest(), 2))
                                                .orElse("–"),
                                "meanUncertainty",
                                        p.uncertainty()
                                                .value()
                                                .map(u -> "± " + Printed.fixed(2 * u.mean(), 2))
                                                .orElse("–")))
                        .toList());
        return map;
    }

    private Map<String, Object> saturation() {
        SaturationPart part = record.saturation();
        Map<String, Object> map = new LinkedHashMap<>();
        map.put(
                "tolerance",
                part.tolerance()
                        .printed(t -> "− " + Printed.fixed(t.airKelvin(), 1) + " K (air), + "
                                + Printed.fixed(t.superheatKelvin(), 1) + " K (superheat)"));
        map.put("smallestAir", part.smallestAirFraction().printed(a -> Printed.fixed(a * 100, 1) + " % by volume"));
        map.put("episodes", Integer.toString(part.episodes().size()));
        List<Map<String, String>> probes = new ArrayList<>();
        for (SaturationPart.PerPhase p : part.perPhase()) {
            if (p.phase().equals("hold") && p.departureKelvin().value().isPresent()) {
                SaturationPart.DepartureKelvin d = p.departureKelvin().value().get();
                probes.add(Map.of(
                        "channel", p.channel(),
                        "lowest", Printed.signed(d.lowest(), 2),
                        "mean", Printed.signed(d.mean(), 2),
                        "highest", Printed.signed(d.highest(), 2),
                        "uncertainty", "± " + Printed.fixed(2 * d.uncertainty(), 2)));
            }
        }
        map.put("hasProbes", !probes.isEmpty());
        map.put("probes", probes);
        return map;
    }

    private List<Map<String, Object>> lethality() {
        List<Map<String, Object>> aims = new ArrayList<>();
        for (LethalityPart part : record.lethality()) {
            Map<String, Object> map = new LinkedHashMap<>();
            map.put("name", part.name());
            map.put(
                    "kinetics",
                    "reference " + Printed.fixed(part.referenceCelsius(), 2) + " °C, z "
                            + Printed.fixed(part.zKelvin(), 1) + " K, floor "
                            + part.floorCelsius().printed(f -> Printed.fixed(f, 1) + " °C")
                            + ", " + part.counted() + " counted");
            map.put("unit", part.unit());
            map.put(
                    "limits",
                    "minimum " + limit(part.minimum(), part.unit())
                            + part.maximum()
                                    .value()
                                    .map(m -> "; maximum " + limit(part.maximum(), part.unit()))
                                    .orElse(""));
            map.put("governs", part.governs());
            map.put(
                    "least",
                    part.governing()
                            .printed(g -> Printed.fixed(g.value(), 2) + " " + part.unit() + " at " + g.channel()));
            map.put(
                    "reduction",
                    part.decimalReduction()
                            .value()
                            .map(r -> "It reduces " + r.of() + " by " + Printed.fixed(r.powersOfTen(), 1)
                                    + " powers of ten (D " + Printed.fixed(r.timeMinutes(), 3) + " min, " + r.source()
                                    + ").")
                            .orElse(""));
            map.put("hasProbes", !part.perChannel().isEmpty());
            map.put(
                    "probes",
                    part.perChannel().stream()
                            .map(p -> Map.of(
                                    "channel", p.channel() + (p.contact().equals("steam") ? ", in steam" : ""),
                                    "toSteamOff", Printed.fixed(p.toSteamOff(), 2),
                                    "withCooling", Printed.fixed(p.withCooling(), 2),
                                    "interval",
                                            p.interval()
                                                    .printed(i -> Printed.fixed(i.low(), 2) + " to "
                                                            + Printed.fixed(i.high(), 2)),
                                    "lost", Printed.duration(p.lostSeconds()),
                                    "marked",
                                            p.markedValue()
                                                    .value()
                                                    .map(m -> Printed.fixed(m, 2))
                                                    .orElse("–")))
                            .toList());
            aims.add(map);
        }
        return aims;
    }

    private static String limit(Given<Double> limit, String unit) {
        return limit.value().map(l -> Printed.fixed(l, 1) + " " + unit).orElse("none");
    }

    private List<Map<String, String>> phases() {
        return record.phases().stream()
                .map(p -> Map.of(
                        "number", Integer.toString(p.index()),
                        "name", p.name(),
                        "start", timeOfDay(p.startLocal(), p.startSeconds()),
                        "end", timeOfDay(p.endLocal(), p.endSeconds()),
                        "duration", Printed.duration(p.durationSeconds()),
                        "foundBy", p.foundBy().equals("mark") ? "entered mark" : "trace",
                        "temperature",
                                p.temperatureCelsius()
                                        .printed(c ->
                                                Printed.fixed(c.lowest(), 1) + " to " + Printed.fixed(c.highest(), 1)),
                        "pressure",
                                p.pressureKilopascal()
                                        .printed(c ->
                                                Printed.fixed(c.lowest(), 1) + " to " + Printed.fixed(c.highest(), 1))))
                .toList();
    }

    private static String timeOfDay(Given<String> local, double seconds) {
        return local.value()
                .map(l -> l.length() < 19 ? l : l.substring(11, 19))
                .orElseGet(() -> Printed.duration(seconds));
    }

    private List<Map<String, String>> channels() {
        List<Map<String, String>> rows = new ArrayList<>();
        for (ChannelPart c : record.channels()) {
            boolean pressure = c.quantity().equals("pressure");
            String difference = pressure ? " kPa" : " K";
            Map<String, String> row = new LinkedHashMap<>();
            row.put("name", c.name());
            row.put("column", c.column());
            row.put("place", c.place());
            row.put("unit", c.unit() + (pressure ? " " + c.datum() : ""));
            row.put("samples", Integer.toString(c.samples()));
            row.put("missing", Integer.toString(c.missing()));
            row.put("resolution", c.resolution().printed(r -> Printed.fixed(r, 3) + difference));
            row.put("uncertainty", c.uncertainty().printed(u -> "± " + Printed.fixed(2 * u, 2) + difference));
            row.put("certificate", c.certificate().printed(t -> t));
            row.put("due", c.due().printed(t -> t));
            rows.add(row);
        }
        return rows;
    }

    private List<Map<String, String>> findings() {
        return record.findings().stream()
                .map(f -> Map.of(
                        "severity", f.severity(),
                        "place", f.place().value().map(p -> p + ": ").orElse(""),
                        "text", f.text(),
                        "remedy", f.remedy()))
                .toList();
    }

    private List<Map<String, String>> files() {
        Provenance p = record.provenance();
        return List.of(
                file("log", p.log()),
                file("plan", p.plan()),
                file("run sheet", p.runSheet()),
                file("template", p.template()));
    }

    private static Map<String, String> file(String role, FileIdentity file) {
        return Map.of(
                "role", role,
                "name", file.name(),
                "bytes", Long.toString(file.bytes()),
                "sha256", file.sha256());
    }

    private static String plain(double value, String unit) {
        if (unit.equals("s")) {
            return Printed.duration(value);
        }
        return Printed.fixed(value, unit.startsWith("s ") ? 0 : 2) + " " + unit;
    }

    private static String signed(double value, String unit) {
        if (unit.equals("s")) {
            return (value < 0 ? "−" : "+") + Printed.duration(Math.abs(value));
        }
        return Printed.signed(value, 2) + " " + unit;
    }
}
