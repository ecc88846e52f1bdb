package simulation;

import java.time.LocalDateTime;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import simulation.logger.Dialect;
import simulation.logger.Oddity;
import simulation.logger.Probe;
import simulation.logger.ProbeFault;
import simulation.logger.Transducer;
import simulation.plant.Body;
import simulation.plant.BodySpot;
import simulation.plant.Contents;
import simulation.plant.Equipment;
import simulation.plant.GasSpot;
import simulation.plant.Plant;
import simulation.plant.Pocket;
import simulation.plant.Room;
import simulation.plant.Settings;
import simulation.plant.Spot;
import simulation.plant.SteamSupply;
import simulation.plant.Step;
import simulation.plant.Water;
import simulation.plant.Window;

/** A retort with cans of bean stew in saturated steam: standing, venting, heating, holding, cooling under air. */
final class RetortRun {

    private static final double HOLD_MINUTES = 30;
    private static final int CLOCK_SLOW = 35;
    private static final double REFERENCE = 121.11;

    private final RetortTwist twist;
    private final boolean faulty;
    private final LogStyle style;
    private final Jitter jitter;
    private final String name;
    private final Water water = new Water();
    private final double atmosphere;
    private final double standing;
    private final double venting;
    private final double setPoint;
    private final double initial;
    private final double volume;
    private final double metalKg;
    private final double loadKg;
    private final double loss;
    private final double faultAfter;
    private final double faultSeconds;
    private final double faultSize;
    private final double pressureHigh;
    private final double pressureDrift;
    private Rig rig;

    RetortRun(String name, RetortTwist twist, boolean faulty, LogStyle style, Jitter jitter) {
        this.name = name;
        this.twist = twist;
        this.faulty = faulty;
        this.style = style;
        this.jitter = jitter;
        this.atmosphere = is(RetortTwist.ALTITUDE) ? jitter.about(84_600, 400) : jitter.about(101_200, 1200);
        this.standing = jitter.stepped(240, 120, 10);
        boolean early = on(RetortTwist.RESIDUAL_AIR) || on(RetortTwist.LEAVING_AIR);
        this.venting = early ? jitter.about(27, 1.5) : jitter.about(440, 15);
        this.setPoint = jitter.about(122.3, 0.2);
        this.initial = jitter.about(66, 4);
        this.volume = jitter.about(1.30, 0.15);
        this.metalKg = jitter.about(640, 60);
        this.loadKg = jitter.about(410, 40);
        this.loss = jitter.about(28, 4);
        this.faultAfter = jitter.about(420, 180);
        this.faultSeconds = jitter.about(480, 120);
        this.faultSize = jitter.about(0.085, 0.02);
        this.pressureHigh = on(RetortTwist.PRESSURE_HIGH) ? jitter.about(13_000, 1500) : 0;
        this.pressureDrift = on(RetortTwist.PRESSURE_DRIFT) ? jitter.about(22_000, 2500) : 0;
    }

    private boolean is(RetortTwist which) {
        return twist == which;
    }

    private boolean dips() {
        return on(RetortTwist.DIP_AND_FULL_HOLD) || on(RetortTwist.DIP_AND_SHORT_HOLD);
    }

    private boolean on(RetortTwist which) {
        return faulty && twist == which;
    }

    SimulatedRun make(LocalDateTime start) {
        LocalDateTime first = start.plusMinutes(jitter.seed() % 97);
        rig = new Rig(plant(), style);
        places();
        rig.run(steps(), 5, 1000 + jitter.seed());
        Truth truth = truth(first);
        Dialect dialect = style.dialect(first, rig.unitsRow("\t"));
        if (is(RetortTwist.QUIRKS)) {
            quirks(dialect);
        }
        return new SimulatedRun(name, style.extension(), dialect.write(rig.logger()), plan(), sheet(first), truth);
    }

    /** Everything a logger does to its file that is no fault of the run: none of it touches the hold phase. */
    private void quirks(Dialect dialect) {
        int cooling = (int) (steamOff() / 5) + 20;
        dialect.preamble("Cookroom 2 - logger 9;;", "Operator: 4", "Remarks: \u00b0C and kPa absolute; door 1", "")
                .missing("-200")
                .oddities(
                        new Oddity(4, Oddity.Kind.DOUBLED),
                        new Oddity(7, Oddity.Kind.GARBLED),
                        new Oddity(9, Oddity.Kind.TRAILING),
                        new Oddity(20, Oddity.Kind.DROPPED),
                        new Oddity(cooling, Oddity.Kind.HEADER_AGAIN),
                        new Oddity(cooling + 9, Oddity.Kind.DROPPED),
                        new Oddity(cooling + 10, Oddity.Kind.DROPPED),
                        new Oddity(cooling + 11, Oddity.Kind.DROPPED))
                .tail(
                        "Minimum;;22.1;22.0;22.1;101.1;65.8;65.8",
                        "Maximum;;123.0;122.9;123.0;217.4;120.4;119.6",
                        "End of data");
    }

    private Plant plant() {
        SteamSupply main = SteamSupply.wet(water, 500_000, jitter.about(0.97, 0.01), jitter.about(0.25, 0.03));
        if (on(RetortTwist.SUPERHEAT)) {
            main = main.drying(water.dryEnthalpy(jitter.about(172, 6), 500_000), List.of(faultWindow()));
        }
        Equipment equipment = new Equipment()
                .supply(main)
                .controller(0.06, 60)
                .vent(0.12, on(RetortTwist.SUPERHEAT) ? 0.03 : 0.006)
                .air(0.12)
                .cooling(jitter.about(17, 2))
                .loss(loss)
                .condensate(15, 0);
        if (on(RetortTwist.SUPERHEAT) || dips()) {
            equipment.byPressure();
        }
        if (on(RetortTwist.AIR_COMING_IN)) {
            equipment.leakingAirValve(jitter.about(0.00040, 0.00005), new Window("hold", 120, 5000));
        }
        double room = jitter.about(23, 3);
        Body metal = new Body(on(RetortTwist.CUT) ? 85 : room, 8000, dips() ? 100 : 800, new double[] {metalKg * 500});
        double heat = loadKg * 3550;
        Body near = can(0.5 * heat, 1.0);
        Body far = can(0.5 * heat, jitter.about(1.12, 0.05));
        Contents contents = Contents.moistAir(
                water, volume, on(RetortTwist.CUT) ? 84 : room, atmosphere, on(RetortTwist.CUT) ? 0.9 : 0.6, 0);
        return new Plant(water, new Room(room, atmosphere), equipment, contents, metal, List.of(near, far), 4);
    }

    private Body can(double heat, double slow) {
        double outer = 0.55 * heat;
        double inner = 0.45 * heat;
        return new Body(initial, outer / (200 * slow), 1, new double[] {outer, inner}, inner / (430 * slow));
    }

    private Window faultWindow() {
        return new Window("hold", faultAfter, faultSeconds);
    }

    private void places() {
        Spot chamber = rig.spot("chamber", new GasSpot(2, List.of()));
        rig.temperature("T1 steam", new Probe(chamber, chamberLag(), jitter.about(0.04, 0.05), 0.03), step());
        if (!is(RetortTwist.ONE_PROBE)) {
            Spot drain = rig.spot("drain", new GasSpot(40, drainPockets()));
            List<ProbeFault> stuck = on(RetortTwist.FROZEN_PROBE)
                    ? List.of(new ProbeFault(ProbeFault.Kind.FROZEN, new Window("hold", faultAfter, 9000)))
                    : List.of();
            rig.temperature("T2 drain", new Probe(drain, lag(5), jitter.about(-0.03, 0.05), 0.03, stuck), step());
            Spot free = rig.spot("free-space", new GasSpot(20, freeSpacePockets()));
            double high = on(RetortTwist.HIGH_PROBE) ? 3.2 : 0;
            rig.temperature(
                    "T3 free space",
                    new Probe(free, lag(4), high + jitter.about(0.02, 0.05), 0.03, freeSpaceFaults()),
                    step());
        }
        rig.pressure("P1", new Transducer(pressureHigh + jitter.about(0, 300), pressureDrift, 90));
        List<ProbeFault> slipped = on(RetortTwist.SLIPPED_PROBE)
                ? List.of(new ProbeFault(ProbeFault.Kind.SLIPPED, new Window("hold", 60, 9000)))
                : List.of();
        Spot first = rig.spot("can-1", new BodySpot(rig.plant().loads().get(0)));
        Spot second = rig.spot("can-2", new BodySpot(rig.plant().loads().get(1)));
        rig.temperature("T5", new Probe(first, 2, jitter.about(0, 0.05), 0.02), step());
        rig.temperature("T6", new Probe(second, 2, jitter.about(0, 0.05), 0.02, slipped), step());
    }

    private double step() {
        return is(RetortTwist.CREEP) ? 0.1 : style.temperature() == simulation.logger.Unit.DEGF ? 0.02 : 0.01;
    }

    private double chamberLag() {
        return lag(4);
    }

    private double lag(double usual) {
        return is(RetortTwist.RIPPLE) ? 12 : usual;
    }

    private List<Pocket> drainPockets() {
        if (on(RetortTwist.DRAIN_POCKET)) {
            return List.of(Pocket.staying(faultWindow(), faultSize));
        }
        return on(RetortTwist.DRAIN_DIPS)
                ? List.of(new Pocket(new Window("hold", faultAfter, 900), 0.16, 150, 30))
                : List.of();
    }

    private List<Pocket> freeSpacePockets() {
        return on(RetortTwist.POCKET) ? List.of(Pocket.staying(faultWindow(), faultSize)) : List.of();
    }

    private List<ProbeFault> freeSpaceFaults() {
        if (is(RetortTwist.QUIRKS)) {
            return List.of(new ProbeFault(ProbeFault.Kind.OPEN, new Window("", 40, 30)));
        }
        if (on(RetortTwist.DEAD_PROBE)) {
            return List.of(new ProbeFault(ProbeFault.Kind.OPEN, Window.always()));
        }
        return on(RetortTwist.SPIKE)
                ? List.of(new ProbeFault(ProbeFault.Kind.SPIKE, new Window("hold", faultAfter, 5)))
                : List.of();
    }

    private List<Step> steps() {
        List<Step> steps = new ArrayList<>();
        boolean cut = on(RetortTwist.CUT);
        if (!cut) {
            steps.add(Step.of("standing", standing, Settings.shut().vent(0.3)));
        }
        Settings open = Settings.shut().steam(1).vent(1).bleeder(1);
        double fewest = venting > 200 ? 106.5 : 0;
        steps.add(new Step(
                "venting",
                open,
                (plant, since) -> since >= venting && plant.gas().celsius() >= fewest));
        double bleeders = bleeders();
        Settings steam = Settings.shut().steamTo(setPoint, 1).bleeder(bleeders);
        if (is(RetortTwist.OVERSHOOT)) {
            overshoot(steps, steam);
        } else {
            steps.add(toTemperature("heating", steam));
        }
        holds(steps, steam);
        if (!cut) {
            cooling(steps);
        }
        return steps;
    }

    private double bleeders() {
        if (on(RetortTwist.RESIDUAL_AIR)) {
            return 0;
        }
        return on(RetortTwist.LEAVING_AIR) || on(RetortTwist.AIR_COMING_IN) ? 0.3 : 1;
    }

    private Step toTemperature(String step, Settings steam) {
        return new Step(step, steam, (plant, since) -> plant.gas().celsius() >= 121.4);
    }

    private void overshoot(List<Step> steps, Settings steam) {
        steps.add(new Step(
                "heating", steam.steamTo(130, 1), (plant, since) -> plant.gas().celsius() >= 124.5));
        steps.add(Step.of("overshoot", 12, steam.steamTo(124.6, 1)));
        steps.add(new Step(
                "undershoot",
                Settings.shut().vent(0.06),
                (plant, since) -> plant.gas().celsius() <= 120.7));
        steps.add(Step.of("low", 20, steam.steamTo(120.7, 1)));
        steps.add(toTemperature("settling", steam));
    }

    private void holds(List<Step> steps, Settings steam) {
        double seconds = HOLD_MINUTES * 60 + jitter.about(110, 40);
        Settings held = is(RetortTwist.RIPPLE) ? rippling(steam) : steam;
        if (dips()) {
            double before = jitter.about(600, 200);
            steps.add(Step.of("hold", before, held));
            Settings weak = Settings.shut().steamTo(117.8, 0.15).bleeder(3);
            steps.add(Step.of("steam failure", jitter.about(170, 40), weak));
            steps.add(toTemperature("heating again", steam.steamTo(setPoint, 0.12)));
            double again = on(RetortTwist.DIP_AND_FULL_HOLD) ? seconds : seconds - before;
            steps.add(Step.of("second hold", again, held));
        } else if (on(RetortTwist.CREEP)) {
            creep(steps, seconds);
        } else if (on(RetortTwist.CUT)) {
            steps.add(Step.of("hold", seconds / 2, held));
        } else {
            steps.add(Step.of("hold", seconds, held));
        }
    }

    private void creep(List<Step> steps, double seconds) {
        double from = 121.85;
        for (int i = 0; i * 30 < seconds; i++) {
            Settings sinking = Settings.shut().steamTo(from - 0.05 * i / 2, 1).bleeder(1);
            steps.add(Step.of(i == 0 ? "hold" : "creep", 30, sinking));
        }
    }

    private Settings rippling(Settings steam) {
        return steam.ripple(0.20, 20).bleeder(3);
    }

    private void cooling(List<Step> steps) {
        Settings cold = Settings.shut().water(0.9);
        double cushion = 215_000;
        if (is(RetortTwist.COOLING_DIP)) {
            steps.add(new Step(
                    "cooling", cold, (plant, since) -> plant.gas().pascal() < atmosphere - jitter.about(7000, 1000)));
            steps.add(Step.of("cushion", 480, cold.air(190_000)));
        } else {
            steps.add(Step.of("cooling", 420, cold.air(cushion).relief(cushion + 6000)));
            steps.add(Step.of("cushion", 420, cold.air(150_000).relief(160_000)));
        }
        steps.add(Step.of("open", jitter.about(360, 60), cold.vent(0.3)));
    }

    private double steamOff() {
        double off = rig.start("cooling");
        return Double.isNaN(off) ? rig.history().end() : off;
    }

    private double limit() {
        return is(RetortTwist.RIPPLE) ? 117 : 121.1;
    }

    private double top() {
        return is(RetortTwist.RIPPLE) ? 130 : 124.1;
    }

    private boolean startsByChamber() {
        return is(RetortTwist.ONE_PROBE) || is(RetortTwist.DRAIN_DIPS) || is(RetortTwist.DRAIN_POCKET);
    }

    private Truth truth(LocalDateTime first) {
        History history = rig.history();
        int[] places = startsByChamber()
                ? new int[] {rig.index("chamber")}
                : new int[] {rig.index("chamber"), rig.index("drain")};
        Band band = new Band(limit(), top(), places);
        double shut = ventShut();
        double off = steamOff();
        List<Span> attempts = band.attempts(history, shut, off);
        PhaseList phases = new PhaseList();
        if (!on(RetortTwist.CUT)) {
            phases.upTo("standing", rig.start("venting"));
        }
        phases.upTo("air-removal", shut);
        for (Span attempt : attempts) {
            phases.upTo("heating", attempt.from());
            phases.upTo("hold", attempt.to() >= off - 1 ? off : attempt.to() + 1);
        }
        phases.upTo("heating", off);
        phases.upTo("cooling", history.end());
        List<TrueLethality> lethality = List.of(
                TrueLethality.of(history, "can-1", rig.index("can-1"), REFERENCE, 10, off),
                TrueLethality.of(history, "can-2", rig.index("can-2"), REFERENCE, 10, off));
        Map<String, Double> figures = new LinkedHashMap<>();
        figures.put(
                "come-up-s", attempts.isEmpty() ? Double.NaN : attempts.get(0).from() - rig.start("venting"));
        figures.put("free-volume-m3", volume);
        figures.put("metal-kg", metalKg);
        figures.put("load-kg", loadKg);
        return new Truth(
                name,
                "retort-" + Names.of(twist),
                jitter.seed(),
                faulty,
                first,
                5,
                atmosphere,
                rig.spotNames(),
                phases.spans(),
                attempts,
                faults(shut),
                lethality,
                Double.NaN,
                expected(),
                figures,
                history,
                rig.balance());
    }

    private double ventShut() {
        double heating = rig.start("heating");
        return Double.isNaN(heating) ? rig.history().end() : heating;
    }

    private List<Fault> faults(double shut) {
        double hold = rig.start("hold");
        double off = steamOff();
        double from = hold + faultAfter;
        double to = Math.min(from + faultSeconds, off);
        double left = rig.history().at(hold).gas().airShare();
        if (!faulty) {
            return List.of();
        }
        return switch (twist) {
            case POCKET -> List.of(new Fault("air-pocket", "free-space", from, to, faultSize, "share of air"));
            case DRAIN_POCKET -> List.of(new Fault("air-pocket", "drain", from, to, faultSize, "share of air"));
            case RESIDUAL_AIR -> List.of(new Fault("residual-air", "all", shut, off, left, "share of air"));
            case LEAVING_AIR -> List.of(new Fault("leaving-air", "all", shut, off, left, "share of air"));
            case AIR_COMING_IN ->
                List.of(new Fault(
                        "air-coming-in",
                        "all",
                        hold + 120,
                        off,
                        rig.history().at(off - 1).gas().airShare(),
                        "share of air at the end"));
            case SUPERHEAT -> List.of(new Fault("superheat", "all", from, to, superheat(from, to), "K at its most"));
            case DIP_AND_FULL_HOLD, DIP_AND_SHORT_HOLD ->
                List.of(new Fault(
                        "steam-failure",
                        "all",
                        rig.start("steam failure"),
                        rig.start("heating again"),
                        rig.history().at(rig.start("heating again")).gas().celsius(),
                        "degC"));
            case CREEP -> List.of(new Fault("creep", "all", hold, off, 0.05, "K/min"));
            case CUT -> List.of(new Fault("cut-log", "all", 0, off, 0, "s"));
            case DRAIN_DIPS ->
                List.of(new Fault("drain-dips", "drain", from, Math.min(from + 900, off), 0.16, "share of air"));
            case HIGH_PROBE ->
                List.of(new Fault("offset", "free-space", 0, rig.history().end(), 3.2, "K"));
            case PRESSURE_HIGH ->
                List.of(new Fault("pressure-error", "all", 0, rig.history().end(), pressureHigh, "Pa"));
            case PRESSURE_DRIFT ->
                List.of(new Fault("pressure-drift", "all", 0, rig.history().end(), pressureDrift, "Pa/h"));
            case DEAD_PROBE ->
                List.of(new Fault("open-circuit", "free-space", 0, rig.history().end(), 0, ""));
            case FROZEN_PROBE ->
                List.of(new Fault("frozen", "drain", from, rig.history().end(), 0, ""));
            case SPIKE -> List.of(new Fault("spike", "free-space", from, from + 5, 37, "K"));
            case SLIPPED_PROBE ->
                List.of(new Fault("slipped", "can-2", hold + 60, rig.history().end(), 0, ""));
            case PLAIN, ALTITUDE, OVERSHOOT, RIPPLE, COOLING_DIP, ONE_PROBE, QUIRKS -> List.of();
        };
    }

    private double superheat(double from, double to) {
        double most = 0;
        for (Moment moment : rig.history().moments()) {
            if (moment.seconds() >= from && moment.seconds() <= to) {
                most = Math.max(most, moment.gas().celsius() - moment.gas().dewCelsius());
            }
        }
        return most;
    }

    private Expected expected() {
        if (!faulty) {
            return Expected.MET;
        }
        return switch (twist) {
            case PLAIN, ALTITUDE, OVERSHOOT, RIPPLE, COOLING_DIP, ONE_PROBE, QUIRKS, DIP_AND_FULL_HOLD, SPIKE ->
                Expected.MET;
            case CUT, DEAD_PROBE, FROZEN_PROBE, SLIPPED_PROBE -> Expected.UNDECIDED;
            default -> Expected.NOT_MET;
        };
    }

    private String planId() {
        return "R2-stew-" + Names.of(twist);
    }

    private String plan() {
        boolean one = is(RetortTwist.ONE_PROBE);
        String lag = is(RetortTwist.RIPPLE)
                ? ", lag: {value: 12 s, uncertainty: 2 s}"
                : ", lag: {value: 4 s, uncertainty: 2 s}";
        PlanText plan = new PlanText(style)
                .head(planId(), "Retort R2, cans of bean stew", "R2", "retort", "saturated-steam")
                .add("chamber:")
                .add("  steam: supplied")
                .add("  volume: 1.9 m3")
                .add("  free-volume: " + Names.number(volume, 3) + " m3")
                .add("  metal: {mass: " + Names.number(metalKg, 1)
                        + " kg, material: stainless-steel, temperature: chamber}")
                .add("  load: {mass: " + Names.number(loadKg, 1)
                        + " kg, specific-heat: 3.55 kJ/(kg K), temperature: [can-1, can-2], probes: cold-spot}")
                .add("  heat-loss: " + Names.number(loss, 1) + " W/K")
                .add("  maximum-pressure: 3.0 bar(g)")
                .add("atmosphere: entered")
                .add("channels:")
                .temperature("chamber", "T1 steam", "reference", ", required: yes" + lag);
        if (!one) {
            plan.temperature("drain", "T2 drain", "drain", ", required: yes" + lag)
                    .temperature("free-space", "T3 free space", "free-space", ", required: yes" + lag);
        }
        plan.pressure("P1", style.pressureUncertainty(2000))
                .temperature("can-1", "T5", "product", ", contact: sealed")
                .temperature("can-2", "T6", "product", ", contact: sealed")
                .add("hold:")
                .add("  {at-least: " + limit() + " degC, at-most: " + top()
                        + " degC, set-point: 122.3 degC, duration: 30 min,")
                .add("   starts: {when: all, channels: [" + (startsByChamber() ? "chamber" : "chamber, drain") + "]},"
                        + " interruption: restarts}")
                .add("longest-gap: 15 s")
                .add("saturation: {air: 1.0 K, superheat: 2.0 K, shortest: 15 s, judged: [hold]}")
                .add("lethality:")
                .add("  - {name: F0, reference: 121.11 degC, z: 10 K, floor: none, minimum: 6.0 min,"
                        + " channels: product, cooling: counted}")
                .add("limits:")
                .add("  - {what: vent, any-of: [{time: 7 min, temperature: 104.4 degC}, {time: 5 min,"
                        + " temperature: 107.2 degC}], source: \"invented vent schedule\"}")
                .add("  - {what: initial-temperature, at-least: 55 degC, source: \"SP-114\"}")
                .add("  - {what: come-up-time, at-most: 30 min, source: \"SP-114\"}");
        if (!one && !is(RetortTwist.RIPPLE)) {
            plan.add("  - {what: spread, places: [reference, drain], phase: hold, at-most: 1.5 K, alert: 1.0 K,"
                    + " source: \"invented study TD-07\"}");
        }
        plan.add("decision: {rule: guarded, conformance: 95 %}");
        plan.add("run-sheet: {required: [zone, atmosphere, product, lots, initial-temperature, marks.steam-on,"
                + " marks.vent-closed, marks.steam-off]}");
        return plan.toString();
    }

    private String sheet(LocalDateTime first) {
        SheetText sheet = new SheetText(name, planId(), "R2", first, style);
        if (is(RetortTwist.QUIRKS)) {
            sheet.loggerSlow(CLOCK_SLOW);
        }
        sheet.add("atmosphere: " + Names.number(atmosphere / 100, 0) + " hPa");
        sheet.add("product: {name: bean stew, code: BS-73, lots: [L2291], container: 73 x 111 mm, count: 1240}");
        sheet.add("initial-temperature: {value: " + Names.number(initial, 1) + " degC, at: " + sheet.at(0)
                + ", instrument: TP-03}");
        StringBuilder marks = new StringBuilder("marks: {");
        if (!on(RetortTwist.CUT)) {
            marks.append("steam-on: ").append(sheet.at(rig.start("venting"))).append(", ");
        }
        marks.append("vent-closed: ").append(sheet.at(ventShut()));
        if (!on(RetortTwist.CUT)) {
            marks.append(", steam-off: ").append(sheet.at(steamOff()));
        }
        sheet.add(marks.append('}').toString());
        return sheet.entered(rig.history().end()).toString();
    }
}
