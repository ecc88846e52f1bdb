package simulation;

import java.time.LocalDateTime;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import simulation.logger.Column;
import simulation.logger.HeaterMeter;
import simulation.logger.Probe;
import simulation.logger.Transducer;
import simulation.logger.Unit;
import simulation.plant.Body;
import simulation.plant.BodySpot;
import simulation.plant.Contents;
import simulation.plant.Equipment;
import simulation.plant.Flow;
import simulation.plant.GasSpot;
import simulation.plant.Plant;
import simulation.plant.Room;
import simulation.plant.Settings;
import simulation.plant.Spot;
import simulation.plant.Step;
import simulation.plant.Water;

/** A test kitchen's pressure cooker with jars: its own water boils inside. */
final class CookerRun {

    private final CookerTwist twist;
    private final boolean faulty;
    private final LogStyle style;
    private final Jitter jitter;
    private final String name;
    private final Water water = new Water();
    private final double atmosphere;
    private final double volume;
    private final double before;
    private final double metalKg;
    private final double loadKg;
    private final double room;
    private double atClosing;
    private Rig rig;

    CookerRun(String name, CookerTwist twist, boolean faulty, LogStyle style, Jitter jitter) {
        this.name = name;
        this.twist = twist;
        this.faulty = faulty;
        this.style = style;
        this.jitter = jitter;
        this.atmosphere = jitter.about(100_600, 1300);
        this.volume = jitter.about(0.0072, 0.0006);
        boolean little = faulty && twist == CookerTwist.DRY;
        this.before = little ? jitter.about(0.46, 0.03) : jitter.about(1.20, 0.15);
        this.metalKg = jitter.about(2.6, 0.3);
        this.loadKg = jitter.about(1.8, 0.2);
        this.room = jitter.about(21, 2);
    }

    private boolean isSealed() {
        return twist == CookerTwist.SEALED;
    }

    private double atLeast() {
        return twist == CookerTwist.SAWING ? 110.0 : 115.0;
    }

    private double atMost() {
        return twist == CookerTwist.SAWING ? 121.0 : 119.0;
    }

    private double minutes() {
        return faulty && isSealed() ? 11 : 15.8;
    }

    SimulatedRun make(LocalDateTime start) {
        LocalDateTime first = start.plusMinutes(jitter.seed() % 71);
        rig = new Rig(plant(), style);
        Spot steam = rig.spot("steam", new GasSpot(1, List.of()));
        rig.temperature("T steam", new Probe(steam, 2.5, jitter.about(0.02, 0.04), 0.03), 0.01);
        Spot jar = rig.spot("jar", new BodySpot(rig.plant().loads().get(0)));
        rig.temperature("T jar", new Probe(jar, 2, jitter.about(0, 0.04), 0.02), 0.01);
        rig.pressure("P pot", new Transducer(jitter.about(0, 200), 0, 70));
        rig.column(new Column(
                style.header("E heater", Unit.KILOWATT_HOUR), new HeaterMeter(), Unit.KILOWATT_HOUR, 4, 1e-4));
        rig.run(steps(), 2, 6000 + jitter.seed());
        atClosing = closingWater();
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
        double opens = water.pascal(twist == CookerTwist.SAWING ? 118 : 116.2);
        double shuts = twist == CookerTwist.SAWING ? water.pascal(112) : opens;
        Equipment equipment = new Equipment()
                .pool()
                .vent(0.004, 0)
                .weight(opens, shuts, 0.006)
                .loss(jitter.about(1.4, 0.2));
        Body metal = new Body(room, 260, 6, new double[] {metalKg * 900});
        Body jars = new Body(room, loadKg * 3600 / jitter.about(190, 20), 0.6, new double[] {loadKg * 3600});
        Contents contents = Contents.moistAir(water, volume, room, atmosphere, 1, before);
        return new Plant(water, new Room(room, atmosphere), equipment, contents, metal, List.of(jars), 10);
    }

    private List<Step> steps() {
        double power = jitter.about(2000, 150);
        List<Step> steps = new ArrayList<>();
        double aim = 116.0;
        steps.add(Step.of(
                "standing",
                jitter.stepped(60, 20, 4),
                isSealed() ? Settings.shut() : Settings.shut().vent(1)));
        if (isSealed()) {
            Settings heat = Settings.shut().heater(power, aim);
            steps.add(new Step("heating", heat, (plant, since) -> plant.gas().celsius() >= 115.3));
            steps.add(Step.of("hold", minutes() * 60, heat));
        } else {
            Settings open = Settings.shut().heater(power, Double.NaN).vent(1);
            double boiling = 0.95 * water.celsius(atmosphere);
            steps.add(new Step("warming", open, (plant, since) -> plant.gas().celsius() >= boiling));
            steps.add(Step.of("purging", jitter.about(300, 30), open));
            Settings shut = Settings.shut().heater(power, Double.NaN).weight();
            steps.add(new Step("heating", shut, (plant, since) -> plant.gas().celsius() >= atLeast() + 0.5));
            boil(steps, power);
        }
        steps.add(Step.of("cooling", 420, Settings.shut()));
        steps.add(new Step(
                "release",
                Settings.shut().vent(0.15),
                (plant, since) -> plant.gas().pascal() <= atmosphere + 1500 || since > 400));
        steps.add(Step.of("open", 60, Settings.shut().vent(1)));
        return isSealed() ? steps.subList(0, 4) : steps;
    }

    private void boil(List<Step> steps, double power) {
        if (faulty && twist == CookerTwist.DRY) {
            Settings hot = Settings.shut().heater(0.7 * power, Double.NaN).weight();
            steps.add(new Step("hold", hot, (plant, since) -> plant.gas().celsius() >= 142 || since > 1800));
            return;
        }
        double gentle = twist == CookerTwist.SAWING ? power : 0.42 * power;
        steps.add(Step.of(
                "hold",
                minutes() * 60,
                Settings.shut().heater(gentle, Double.NaN).weight()));
    }

    /** Water in the vessel when the valve was shut. */
    private double closingWater() {
        return rig.history().at(isSealed() ? 0 : rig.start("heating")).waterKg();
    }

    /** Water that is weighed afterwards: what was sealed in has come down again, what was open has left as steam. */
    private double left() {
        double all = rig.plant().contents().waterKg();
        return isSealed() ? all : all - rig.plant().gas().vapourKg();
    }

    private Truth truth(LocalDateTime first) {
        History history = rig.history();
        double off = rig.start("cooling");
        Band band = new Band(atLeast(), atMost(), 0);
        List<Span> attempts = band.attempts(history, rig.start("heating"), off);
        PhaseList phases = new PhaseList();
        if (isSealed()) {
            phases.upTo("standing", rig.start("heating"));
        } else {
            phases.upTo("standing", rig.start("warming"));
            phases.upTo("heating", rig.start("purging"));
            phases.upTo("air-removal", rig.start("heating"));
        }
        Span longest = attempts.get(0);
        for (Span attempt : attempts) {
            longest = attempt.length() > longest.length() ? attempt : longest;
        }
        phases.upTo("heating", longest.from());
        phases.upTo("hold", longest.to() >= off - 1 ? off : longest.to() + 1);
        phases.upTo("undetermined", off);
        phases.upTo("cooling", history.end());
        Map<String, Double> figures = new LinkedHashMap<>();
        figures.put("free-volume-m3", volume);
        figures.put("metal-kg", metalKg);
        figures.put("load-kg", loadKg);
        figures.put("water-before-kg", before);
        figures.put("water-at-closing-kg", atClosing);
        figures.put("water-after-kg", left());
        figures.put(
                "air-at-closing-kg",
                history.at(isSealed() ? 0 : rig.start("heating")).gas().airKg());
        figures.put("vented-kg", rig.plant().ledger().of(Flow.VENTED_VAPOUR_KG));
        double dry = history.first(rig.start("heating"), 0, m -> m.gas().dry());
        figures.put("dry-out-s", dry < history.end() ? dry : Double.NaN);
        return new Truth(
                name,
                "cooker-" + Names.of(twist),
                jitter.seed(),
                faulty,
                first,
                2,
                atmosphere,
                rig.spotNames(),
                phases.spans(),
                attempts,
                faults(dry),
                List.of(TrueLethality.of(history, "jar", 1, 121.11, 10, off)),
                Double.NaN,
                expected(),
                figures,
                history,
                rig.balance());
    }

    private List<Fault> faults(double dry) {
        if (!faulty) {
            return List.of();
        }
        double off = rig.start("cooling");
        return switch (twist) {
            case SEALED -> List.of(new Fault("short-hold", "all", rig.start("hold"), off, minutes(), "min"));
            case DRY -> List.of(new Fault("superheat", "all", dry, off, superheat(), "K at its most"));
            case DISCHARGING, SAWING -> List.of();
        };
    }

    private double superheat() {
        double most = 0;
        for (Moment moment : rig.history().moments()) {
            if (moment.seconds() > rig.start("cooling")) {
                break;
            }
            most = Math.max(most, moment.gas().celsius() - moment.gas().dewCelsius());
        }
        return most;
    }

    private Expected expected() {
        return faulty && (twist == CookerTwist.SEALED || twist == CookerTwist.DRY) ? Expected.NOT_MET : Expected.MET;
    }

    private String planId() {
        return "K1-jars-" + Names.of(twist);
    }

    private String plan() {
        PlanText plan = new PlanText(style)
                .head(
                        planId(),
                        "Cooker K1, jars of chutney",
                        "K1",
                        "cooker",
                        isSealed() ? "steam-air" : "saturated-steam")
                .add("chamber:")
                .add("  steam: raised-inside")
                .add("  volume: 9.5 l")
                .add("  free-volume: " + Names.number(volume * 1000, 3) + " l")
                .add("  air-at-closing: " + (isSealed() ? "all" : "none"))
                .add("  metal: {mass: " + Names.number(metalKg, 3)
                        + " kg, specific-heat: 0.900 kJ/(kg K), temperature: steam}")
                .add("  load: {mass: " + Names.number(loadKg, 3)
                        + " kg, specific-heat: 3.60 kJ/(kg K), temperature: [jar], probes: mass-average}")
                .add("  heat-loss: 1.4 W/K")
                .add("  maximum-pressure: 1.6 bar(g)")
                .add("atmosphere: entered")
                .add("channels:")
                .temperature("steam", "T steam", "reference", ", lag: {value: 2.5 s, uncertainty: 1 s}")
                .temperature("jar", "T jar", "product", ", contact: sealed")
                .pressure("P pot", style.pressureUncertainty(1500))
                .add("  - {name: heater, column: \"" + style.header("E heater", Unit.KILOWATT_HOUR)
                        + "\", quantity: energy, place: supply, unit: kWh,")
                .add("     uncertainty: {calibration: 1 %, coverage: 2}, certificate: \"26-600\", due: 2027-01-15}")
                .add("hold:")
                .add("  {at-least: " + atLeast() + " degC, at-most: " + atMost() + " degC, duration: "
                        + (twist == CookerTwist.SAWING ? "14" : "15") + " min,")
                .add("   starts: {when: all, channels: [steam]}}")
                .add("longest-gap: 6 s");
        if (!isSealed()) {
            plan.add("saturation: {air: 1.0 K, superheat: 2.0 K, shortest: 10 s, judged: [hold]}");
            plan.add("limits:");
            plan.add("  - {what: vent, time: 4 min, source: \"invented kitchen rule\"}");
        }
        return plan.add("decision: {rule: guarded, conformance: 95 %}")
                .add("run-sheet: {required: [zone, atmosphere, product, water]}")
                .toString();
    }

    private String sheet(LocalDateTime first) {
        SheetText sheet = new SheetText(name, planId(), "K1", first, style);
        sheet.add("atmosphere: " + Names.number(atmosphere / 100, 0) + " hPa");
        sheet.add("product: {name: chutney, code: CH-2, lots: [J031], container: jar 228 ml, count: 4}");
        sheet.add("water: {before: " + Names.number(before, 3) + " kg, after: " + Names.number(left(), 3) + " kg}");
        if (isSealed()) {
            sheet.add("marks: {steam-on: " + sheet.at(rig.start("heating")) + ", vent-closed: " + sheet.at(0)
                    + ", steam-off: " + sheet.at(rig.start("cooling")) + "}");
        } else {
            sheet.add("marks: {steam-on: " + sheet.at(rig.start("warming")) + ", vent-closed: "
                    + sheet.at(rig.start("heating")) + ", steam-off: " + sheet.at(rig.start("cooling")) + "}");
        }
        return sheet.entered(rig.history().end()).toString();
    }
}
