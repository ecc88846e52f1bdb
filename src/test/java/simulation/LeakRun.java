package simulation;

import java.time.LocalDateTime;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import simulation.logger.Probe;
import simulation.logger.Transducer;
import simulation.plant.Body;
import simulation.plant.Contents;
import simulation.plant.Equipment;
import simulation.plant.GasSpot;
import simulation.plant.Plant;
import simulation.plant.Room;
import simulation.plant.Settings;
import simulation.plant.Spot;
import simulation.plant.Step;
import simulation.plant.Water;
import simulation.plant.Window;

/** An air-leakage test of the sterilizer: evacuation, five minutes to settle, ten minutes of test. */
final class LeakRun {

    private static final double WALLS = 45;

    private final LeakTwist twist;
    private final boolean faulty;
    private final LogStyle style;
    private final Jitter jitter;
    private final String name;
    private final double atmosphere;
    private final double volume;
    private final double pascalPerSecond;
    private Rig rig;

    LeakRun(String name, LeakTwist twist, boolean faulty, LogStyle style, Jitter jitter) {
        this.name = name;
        this.twist = twist;
        this.faulty = faulty;
        this.style = style;
        this.jitter = jitter;
        this.atmosphere = jitter.about(101_000, 1200);
        this.volume = jitter.about(0.60, 0.05);
        boolean leaks = faulty && twist == LeakTwist.RATE;
        this.pascalPerSecond = (leaks ? jitter.about(290, 60) : jitter.about(45, 20)) / 60;
    }

    SimulatedRun make(LocalDateTime start) {
        LocalDateTime first = start.plusMinutes(jitter.seed() % 83);
        rig = new Rig(plant(), style);
        Spot drain = rig.spot("drain", new GasSpot(2, List.of()));
        rig.temperature("T drain", new Probe(drain, 2, jitter.about(0, 0.04), 0.02), 0.01);
        rig.pressure("P chamber", new Transducer(jitter.about(0, 50), 0, 8));
        rig.run(steps(), 2, 3000 + jitter.seed());
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
        double kg = pascalPerSecond * volume / (287.055 * (WALLS + 273.15));
        Equipment equipment = new Equipment()
                .vent(0.02, 0)
                .pump(jitter.about(0.012, 0.001), 1500)
                .leak(kg, List.of(Window.always()))
                .condensate(1e9, 0)
                .loss(0);
        if (faulty && twist == LeakTwist.WARMING) {
            equipment.jacket(95, 140);
        }
        double liquid = faulty && twist == LeakTwist.WET ? jitter.about(0.6, 0.1) : 0;
        Contents contents = Contents.moistAir(new Water(), volume, WALLS, atmosphere, 0.08, liquid);
        Body metal = new Body(WALLS, 3000, 600, new double[] {250 * 500});
        return new Plant(new Water(), new Room(22, atmosphere), equipment, contents, metal, List.of(), 10);
    }

    private List<Step> steps() {
        double depth = faulty && twist == LeakTwist.WET ? 6200 : jitter.about(5000, 400);
        return List.of(
                Step.of("standing", jitter.stepped(60, 20, 4), Settings.shut().vent(1)),
                new Step(
                        "evacuation",
                        Settings.shut().pump(1),
                        (plant, since) -> plant.gas().pascal() <= depth || since > 900),
                Step.of("settling", 300, Settings.shut()),
                Step.of("test", 600, Settings.shut()),
                new Step(
                        "air in",
                        Settings.shut().vent(1),
                        (plant, since) -> plant.gas().pascal() >= atmosphere - 300),
                Step.of("end", 20, Settings.shut().vent(1)));
    }

    private Truth truth(LocalDateTime first) {
        History history = rig.history();
        PhaseList phases = new PhaseList()
                .upTo("standing", rig.start("evacuation"))
                .upTo("evacuation", rig.start("settling"))
                .upTo("settling", rig.start("test"))
                .upTo("test", rig.start("air in"))
                .upTo("undetermined", history.end());
        Moment begin = history.at(rig.start("test"));
        Moment end = history.at(rig.start("air in"));
        Map<String, Double> figures = new LinkedHashMap<>();
        figures.put("free-volume-m3", volume);
        figures.put("two-point-Pa-per-s", (end.gas().pascal() - begin.gas().pascal()) / 600);
        figures.put("temperature-moved-K", end.gas().celsius() - begin.gas().celsius());
        return new Truth(
                name,
                "leak-" + Names.of(twist),
                jitter.seed(),
                faulty,
                first,
                2,
                atmosphere,
                rig.spotNames(),
                phases.spans(),
                List.of(),
                faults(begin, end),
                List.of(),
                pascalPerSecond,
                expected(),
                figures,
                history,
                rig.balance());
    }

    private List<Fault> faults(Moment begin, Moment end) {
        if (!faulty) {
            return List.of();
        }
        double from = begin.seconds();
        double to = end.seconds();
        return List.of(
                switch (twist) {
                    case RATE -> new Fault("air-leakage", "chamber", 0, to, pascalPerSecond * 60, "Pa/min");
                    case WET -> new Fault("wet-chamber", "chamber", from, to, begin.sumpKg(), "kg of water");
                    case WARMING ->
                        new Fault(
                                "warming",
                                "chamber",
                                from,
                                to,
                                end.gas().celsius() - begin.gas().celsius(),
                                "K");
                });
    }

    private Expected expected() {
        if (!faulty) {
            return Expected.MET;
        }
        return twist == LeakTwist.RATE ? Expected.NOT_MET : Expected.UNDECIDED;
    }

    private String plan() {
        return new PlanText(style)
                .head("S1-leak-test", "Sterilizer S1, air leakage", "S1", "leak-test", "saturated-steam")
                .add("chamber:")
                .add("  steam: supplied")
                .add("  volume: 0.62 m3")
                .add("  free-volume: " + Names.number(volume, 3) + " m3")
                .add("atmosphere: entered")
                .add("channels:")
                .temperature("drain", "T drain", "reference", "")
                .pressure("P chamber", style.pressureUncertainty(150))
                .add("longest-gap: 6 s")
                .add("limits:")
                .add("  - {what: air-leakage, start-pressure: 7 kPa(a), settle: 5 min, measure: 10 min,"
                        + " at-most: 0.13 kPa/min, source: \"invented leak study\"}")
                .add("decision: {rule: guarded, conformance: 95 %}")
                .add("run-sheet: {required: [zone, atmosphere]}")
                .toString();
    }

    private String sheet(LocalDateTime first) {
        return new SheetText(name, "S1-leak-test", "S1", first, style)
                .add("atmosphere: " + Names.number(atmosphere / 100, 0) + " hPa")
                .entered(rig.history().end())
                .toString();
    }
}
