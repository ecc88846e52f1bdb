package simulation;

import java.time.LocalDateTime;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import simulation.logger.Probe;
import simulation.logger.Transducer;
import simulation.plant.Body;
import simulation.plant.Contents;
import simulation.plant.Equipment;
import simulation.plant.GasSpot;
import simulation.plant.PackSpot;
import simulation.plant.Plant;
import simulation.plant.Pocket;
import simulation.plant.Room;
import simulation.plant.Settings;
import simulation.plant.Spot;
import simulation.plant.SteamSupply;
import simulation.plant.Step;
import simulation.plant.Water;
import simulation.plant.Window;

/** A sterilizer with textile packs: vacuum pulses, a short plateau, drying; or plateaus at several temperatures. */
final class PorousRun {

    private final PorousTwist twist;
    private final boolean faulty;
    private final LogStyle style;
    private final Jitter jitter;
    private final String name;
    private final Water water = new Water();
    private final double atmosphere;
    private final double volume;
    private final double metalKg;
    private final double loadKg;
    private final double setPoint;
    private final double pocket;
    private final double leakRate;
    private Rig rig;

    PorousRun(String name, PorousTwist twist, boolean faulty, LogStyle style, Jitter jitter) {
        this.name = name;
        this.twist = twist;
        this.faulty = faulty;
        this.style = style;
        this.jitter = jitter;
        this.atmosphere = jitter.about(100_900, 1200);
        this.volume = jitter.about(0.55, 0.08);
        this.metalKg = jitter.about(260, 30);
        this.loadKg = jitter.about(24, 5);
        this.setPoint = jitter.about(135.2, 0.15);
        this.pocket = jitter.about(0.11, 0.02);
        this.leakRate = on(PorousTwist.LEAKING) ? jitter.about(3.4e-3, 0.2e-3) : 0;
    }

    private boolean on(PorousTwist which) {
        return faulty && twist == which;
    }

    private boolean isSteps() {
        return twist == PorousTwist.STEPS
                || twist == PorousTwist.STEPS_OFFSET
                || twist == PorousTwist.STEPS_PRESSURE_ERROR;
    }

    private double interval() {
        return isSteps() ? 5 : 1;
    }

    SimulatedRun make(LocalDateTime start) {
        LocalDateTime first = start.plusMinutes(jitter.seed() % 89);
        rig = new Rig(plant(), style);
        places();
        rig.run(steps(), interval(), 2000 + jitter.seed());
        Truth truth = truth(first);
        return new SimulatedRun(
                name,
                style.extension(),
                style.dialect(first, rig.unitsRow("\t")).write(rig.logger()),
                plan(),
                sheet(first),
                truth);
    }

    private Plant plant() {
        double room = jitter.about(22, 2);
        double warm = isSteps() ? 40 : jitter.about(112, 4);
        Equipment equipment = new Equipment()
                .supply(SteamSupply.wet(water, 420_000, jitter.about(0.965, 0.01), jitter.about(0.09, 0.01)))
                .controller(0.12, 30)
                .vent(0.09, 0.0015)
                .pump(jitter.about(0.05, 0.006), 2500)
                .leak(leakRate, List.of(Window.always()))
                .loss(9)
                .condensate(10, 150);
        if (!isSteps()) {
            equipment.jacket(jitter.about(126, 2), 400);
        }
        Body metal = new Body(warm, 4000, 400, new double[] {metalKg * 500});
        double heat = loadKg * 1400;
        Body first = new Body(room + 4, 5000, 2, new double[] {0.5 * heat});
        Body second = new Body(room + 4, 4400, 2, new double[] {0.5 * heat});
        Contents contents = Contents.moistAir(water, volume, warm, atmosphere, isSteps() ? 0.2 : 0.02, 0);
        return new Plant(water, new Room(room, atmosphere), equipment, contents, metal, List.of(first, second), 10);
    }

    private void places() {
        double low = on(PorousTwist.STEPS_OFFSET) ? -jitter.about(1.9, 0.2) : 0;
        Spot drain = rig.spot("drain", new GasSpot(4, List.of()));
        rig.temperature("T drain", new Probe(drain, 1.5, jitter.about(0, 0.04), 0.03), 0.01);
        Spot chamber = rig.spot("chamber", new GasSpot(2, List.of()));
        rig.temperature("T chamber", new Probe(chamber, 1.5, low + jitter.about(0.03, 0.04), 0.03), 0.01);
        List<Pocket> air =
                on(PorousTwist.POCKET) ? List.of(Pocket.staying(new Window("heat up", 0, 5000), pocket)) : List.of();
        Spot first = rig.spot("load-1", new PackSpot(rig.plant().loads().get(0), List.of()));
        Spot second = rig.spot("load-2", new PackSpot(rig.plant().loads().get(1), air));
        rig.temperature("T load 1", new Probe(first, 0.8, jitter.about(0, 0.04), 0.03), 0.01);
        rig.temperature("T load 2", new Probe(second, 0.8, jitter.about(0, 0.04), 0.03), 0.01);
        double high = on(PorousTwist.STEPS_PRESSURE_ERROR) ? jitter.about(8000, 800) : 0;
        rig.pressure("P chamber", new Transducer(high + jitter.about(0, 200), 0, 60));
    }

    private List<Step> steps() {
        List<Step> steps = new ArrayList<>();
        steps.add(Step.of("standing", jitter.stepped(60, 20, 5), Settings.shut().vent(0.2)));
        if (isSteps()) {
            plateaus(steps);
            return steps;
        }
        boolean shallow = on(PorousTwist.SHALLOW_PULSES);
        double depth = shallow ? 45_000 : jitter.about(6500, 800);
        int count = shallow ? 2 : 4;
        for (int i = 1; i < count; i++) {
            pulse(steps, depth, jitter.about(90_000, 3000));
        }
        evacuate(steps, depth);
        if (twist == PorousTwist.POSITIVE_PULSES) {
            steps.add(new Step(
                    "refill",
                    Settings.shut().steam(0.6),
                    (plant, since) -> plant.gas().pascal() >= 92_000));
            steps.add(Step.of("shut", 600, Settings.shut()));
            for (int i = 0; i < 4; i++) {
                steps.add(new Step(
                        "up",
                        Settings.shut().steam(0.8),
                        (plant, since) -> plant.gas().pascal() >= 185_000));
                steps.add(new Step(
                        "down",
                        Settings.shut().vent(0.8),
                        (plant, since) -> plant.gas().pascal() <= atmosphere + 9000));
            }
        }
        steps.add(new Step(
                "heat up",
                Settings.shut().steamTo(setPoint, 1),
                (plant, since) -> plant.gas().celsius() >= setPoint - 0.4));
        steps.add(Step.of("plateau", 180 + jitter.about(75, 15), Settings.shut().steamTo(setPoint, 1)));
        steps.add(new Step(
                "exhaust",
                Settings.shut().vent(1),
                (plant, since) -> plant.gas().pascal() <= atmosphere + 3000));
        drying(steps);
        return steps;
    }

    private void pulse(List<Step> steps, double depth, double peak) {
        evacuate(steps, depth);
        steps.add(new Step(
                "refill",
                Settings.shut().steam(0.7),
                (plant, since) -> plant.gas().pascal() >= peak));
    }

    private static void evacuate(List<Step> steps, double depth) {
        steps.add(new Step(
                "evacuate",
                Settings.shut().pump(1),
                (plant, since) -> plant.gas().pascal() <= depth || since > 150));
    }

    private void drying(List<Step> steps) {
        if (twist == PorousTwist.PULSED_DRYING) {
            for (int i = 0; i < 3; i++) {
                steps.add(Step.of("drying", 150, Settings.shut().pump(1)));
                steps.add(new Step(
                        "air pulse",
                        Settings.shut().vent(0.25),
                        (plant, since) -> plant.gas().pascal() >= 60_000));
            }
        }
        steps.add(Step.of("drying", jitter.about(300, 40), Settings.shut().pump(1)));
        steps.add(new Step(
                "air in",
                Settings.shut().vent(0.3),
                (plant, since) -> plant.gas().pascal() >= atmosphere - 500));
        steps.add(Step.of("end", 30, Settings.shut().vent(1)));
    }

    private void plateaus(List<Step> steps) {
        for (int i = 0; i < 3; i++) {
            pulse(steps, 6000, 80_000);
        }
        evacuate(steps, 6000);
        for (double celsius : new double[] {90, 110, 121}) {
            double aim = celsius + 0.6;
            Settings steam = Settings.shut().steamTo(aim, 0.25);
            steps.add(new Step(
                    "to " + Names.number(celsius, 0),
                    steam,
                    (plant, since) -> plant.gas().celsius() >= aim - 0.3));
            steps.add(Step.of("at " + Names.number(celsius, 0), jitter.about(660, 30), steam));
        }
        steps.add(new Step(
                "exhaust",
                Settings.shut().vent(1),
                (plant, since) -> plant.gas().pascal() <= atmosphere + 3000));
        steps.add(Step.of("end", 120, Settings.shut().vent(1)));
    }

    private Truth truth(LocalDateTime first) {
        History history = rig.history();
        PhaseList phases = new PhaseList();
        List<Span> attempts = new ArrayList<>();
        phases.upTo("standing", rig.start("evacuate"));
        if (isSteps()) {
            phases.upTo("air-removal", rig.start("to 90"));
            for (double celsius : new double[] {90, 110, 121}) {
                String step = Names.number(celsius, 0);
                Band band = new Band(celsius, celsius + 3, rig.index("drain"));
                double next = Double.isNaN(rig.start(next(celsius))) ? history.end() : rig.start(next(celsius));
                List<Span> found = band.attempts(history, rig.start("to " + step), next);
                phases.upTo("heating", found.get(0).from());
                phases.upTo("hold", next);
                attempts.addAll(found);
            }
            phases.upTo("exhaust", history.first(phases.end(), 0, m -> m.gas().pascal() <= atmosphere + 5000));
            phases.upTo("undetermined", history.end());
        } else {
            double off = rig.start("exhaust");
            phases.upTo("air-removal", rig.start("heat up"));
            double reached =
                    history.first(rig.start("heat up"), 5, m -> m.spots().get(rig.index("drain")) >= 134);
            phases.upTo("heating", Math.min(reached, off));
            Band band = new Band(134, 137, rig.index("drain"), rig.index("load-1"));
            attempts.addAll(band.attempts(history, rig.start("heat up"), off));
            if (attempts.isEmpty()) {
                phases.upTo("equilibration", off);
            } else {
                phases.upTo("equilibration", attempts.get(0).from());
                phases.upTo("hold", off);
            }
            phases.upTo("exhaust", history.first(off, 0, m -> m.gas().pascal() <= atmosphere + 5000));
            phases.upTo("undetermined", history.first(off, 0, m -> m.gas().pascal() <= atmosphere - 10_000));
            double dried = lastBelow(history, atmosphere - 10_000);
            phases.upTo("drying", dried + 1);
            phases.upTo("undetermined", history.end());
        }
        Map<String, Double> figures = new LinkedHashMap<>();
        figures.put("free-volume-m3", volume);
        figures.put("metal-kg", metalKg);
        figures.put("load-kg", loadKg);
        return new Truth(
                name,
                "porous-" + Names.of(twist),
                jitter.seed(),
                faulty,
                first,
                interval(),
                atmosphere,
                rig.spotNames(),
                phases.spans(),
                attempts,
                faults(),
                List.of(),
                leakRate * 287.055 * 333 / volume,
                expected(),
                figures,
                history,
                rig.balance());
    }

    private static String next(double celsius) {
        return celsius == 90 ? "to 110" : celsius == 110 ? "to 121" : "exhaust";
    }

    private static double lastBelow(History history, double pascal) {
        double last = 0;
        for (Moment moment : history.moments()) {
            if (moment.gas().pascal() < pascal) {
                last = moment.seconds();
            }
        }
        return last;
    }

    private List<Fault> faults() {
        if (!faulty) {
            return List.of();
        }
        double up = rig.start("heat up");
        double off = rig.start("exhaust");
        return switch (twist) {
            case POCKET -> List.of(new Fault("air-pocket", "load-2", up, off, pocket, "share of air"));
            case SHALLOW_PULSES ->
                List.of(new Fault(
                        "residual-air",
                        "all",
                        up,
                        off,
                        rig.history().at(off - 1).gas().airShare(),
                        "share of air"));
            case LEAKING ->
                List.of(new Fault(
                        "residual-air",
                        "all",
                        up,
                        off,
                        rig.history().at(off - 1).gas().airShare(),
                        "share of air"));
            case STEPS_OFFSET ->
                List.of(new Fault("offset", "chamber", 0, rig.history().end(), -1.9, "K"));
            case STEPS_PRESSURE_ERROR ->
                List.of(new Fault("pressure-error", "all", 0, rig.history().end(), 8000, "Pa"));
            case PLAIN, POSITIVE_PULSES, PULSED_DRYING, STEPS -> List.of();
        };
    }

    private Expected expected() {
        if (!faulty) {
            return Expected.MET;
        }
        return switch (twist) {
            case PLAIN, POSITIVE_PULSES, PULSED_DRYING, STEPS -> Expected.MET;
            default -> Expected.NOT_MET;
        };
    }

    private String planId() {
        return "S1-" + Names.of(twist);
    }

    private String plan() {
        String lag = ", lag: {value: 1.5 s, uncertainty: 0.5 s}";
        PlanText plan = new PlanText(style)
                .head(
                        planId(),
                        isSteps() ? "Sterilizer S1, three plateaus" : "Sterilizer S1, textile packs",
                        "S1",
                        isSteps() ? "gravity" : "porous-load",
                        "saturated-steam")
                .add("chamber:")
                .add("  steam: supplied")
                .add("  volume: 0.62 m3")
                .add("  free-volume: " + Names.number(volume, 3) + " m3")
                .add("  metal: {mass: " + Names.number(metalKg, 1)
                        + " kg, material: stainless-steel, temperature: chamber}")
                .add("  load: {mass: " + Names.number(loadKg, 1)
                        + " kg, specific-heat: 1.40 kJ/(kg K), temperature: [load-1, load-2], probes: mass-average}")
                .add("  heat-loss: 9 W/K")
                .add("  maximum-pressure: 2.6 bar(g)")
                .add("atmosphere: entered")
                .add("channels:")
                .temperature("drain", "T drain", "reference", ", required: yes" + lag)
                .temperature("chamber", "T chamber", "chamber", lag)
                .temperature("load-1", "T load 1", "load", ", contact: steam, required: yes")
                .temperature("load-2", "T load 2", "load", ", contact: steam")
                .pressure("P chamber", style.pressureUncertainty(1000));
        if (isSteps()) {
            plan.add("hold:")
                    .add("  - {at-least: 90.0 degC, at-most: 93.0 degC, duration: 10 min,"
                            + " starts: {when: all, channels: [drain]}}")
                    .add("  - {at-least: 110.0 degC, at-most: 113.0 degC, duration: 10 min,"
                            + " starts: {when: all, channels: [drain]}}")
                    .add("  - {at-least: 121.0 degC, at-most: 124.0 degC, duration: 10 min,"
                            + " starts: {when: all, channels: [drain]}}");
        } else {
            plan.add("hold:")
                    .add("  {at-least: 134.0 degC, at-most: 137.0 degC, set-point: 135.2 degC, duration: 3 min,")
                    .add("   starts: {when: all, channels: [drain, load-1]}, equilibration: 15 s}");
        }
        plan.add("longest-gap: " + (isSteps() ? "15 s" : "3 s"))
                .add("saturation: {air: 1.0 K, superheat: 2.0 K, shortest: " + (isSteps() ? "15 s" : "5 s")
                        + ", judged: [hold]}");
        if (!isSteps()) {
            plan.add("limits:");
            plan.add("  - {what: pulses, at-least: 4, depth: 10 kPa(a), source: \"invented cycle study\"}");
            plan.add("  - {what: equilibration, at-most: 30 s, source: \"invented cycle study\"}");
            plan.add("  - {what: spread, places: [reference, chamber, load], phase: hold, at-most: 2.0 K,"
                    + " source: \"invented cycle study\"}");
            plan.add("  - {what: drying, time: 4 min, pressure: 10 kPa(a), source: \"invented cycle study\"}");
        }
        return plan.add("decision: {rule: guarded, conformance: 95 %}")
                .add("run-sheet: {required: [zone, atmosphere, product]}")
                .toString();
    }

    private String sheet(LocalDateTime first) {
        return new SheetText(name, planId(), "S1", first, style)
                .add("atmosphere: " + Names.number(atmosphere / 100, 0) + " hPa")
                .add("product: {name: textile packs, code: TX-2, lots: [W118], count: 12}")
                .add("indicators: [{kind: chemical, lot: CI-9, result: passed, read-by: J.}]")
                .entered(rig.history().end())
                .toString();
    }
}
