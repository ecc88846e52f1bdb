package simulation;

import java.time.LocalDateTime;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import simulation.logger.Probe;
import simulation.logger.Transducer;
import simulation.plant.Body;
import simulation.plant.BodySpot;
import simulation.plant.Contents;
import simulation.plant.Equipment;
import simulation.plant.GasSpot;
import simulation.plant.Plant;
import simulation.plant.Room;
import simulation.plant.Settings;
import simulation.plant.Spot;
import simulation.plant.SteamSupply;
import simulation.plant.Step;
import simulation.plant.Water;

/** Bottles of fluid in saturated steam: the load lags the chamber by some twenty minutes. Its fault: released hot. */
final class FluidsRun {

    private static final double LIMIT = 121.0;

    private final boolean faulty;
    private final LogStyle style;
    private final Jitter jitter;
    private final String name;
    private final Water water = new Water();
    private final double atmosphere;
    private final double volume;
    private final double metalKg;
    private final double loadKg;
    private Rig rig;

    FluidsRun(String name, boolean faulty, LogStyle style, Jitter jitter) {
        this.name = name;
        this.faulty = faulty;
        this.style = style;
        this.jitter = jitter;
        this.atmosphere = jitter.about(101_100, 1200);
        this.volume = jitter.about(0.34, 0.04);
        this.metalKg = jitter.about(180, 20);
        this.loadKg = jitter.about(42, 5);
    }

    SimulatedRun make(LocalDateTime start) {
        LocalDateTime first = start.plusMinutes(jitter.seed() % 79);
        rig = new Rig(plant(), style);
        Spot drain = rig.spot("drain", new GasSpot(15, List.of()));
        rig.temperature("T1 drain", new Probe(drain, 3, jitter.about(0.02, 0.04), 0.03), 0.01);
        Spot fast = rig.spot("bottle-1", new BodySpot(rig.plant().loads().get(0)));
        Spot slow = rig.spot("bottle-2", new BodySpot(rig.plant().loads().get(1)));
        rig.temperature("T2 bottle", new Probe(fast, 3, jitter.about(0, 0.04), 0.02), 0.01);
        rig.temperature("T3 bottle", new Probe(slow, 3, jitter.about(0, 0.04), 0.02), 0.01);
        rig.pressure("P1", new Transducer(jitter.about(0, 250), 0, 80));
        rig.run(steps(), 5, 4000 + jitter.seed());
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
        Equipment equipment = new Equipment()
                .supply(SteamSupply.wet(water, 400_000, 0.97, jitter.about(0.09, 0.01)))
                .controller(0.08, 50)
                .vent(0.05, 0.002)
                .air(0.05)
                .cooling(jitter.about(18, 2))
                .loss(8);
        double heat = 0.5 * loadKg * 4150;
        double lag = jitter.about(390, 20);
        Body metal = new Body(room, 3000, 300, new double[] {metalKg * 500});
        Body fast = new Body(room, heat / (0.85 * lag), 1, new double[] {heat});
        Body slow = new Body(room, heat / lag, 1, new double[] {heat});
        Contents contents = Contents.moistAir(water, volume, room, atmosphere, 0.5, 0);
        return new Plant(water, new Room(room, atmosphere), equipment, contents, metal, List.of(fast, slow), 5);
    }

    private List<Step> steps() {
        Settings steam = Settings.shut().steamTo(jitter.about(122.2, 0.2), 1).bleeder(1);
        Settings cold = Settings.shut().water(0.25).air(180_000).relief(190_000);
        double release = faulty ? jitter.about(94, 3) : jitter.about(74, 3);
        return List.of(
                Step.of("standing", jitter.stepped(120, 40, 10), Settings.shut().vent(0.2)),
                Step.of(
                        "venting",
                        jitter.about(330, 20),
                        Settings.shut().steam(1).vent(1).bleeder(1)),
                new Step(
                        "heating", steam, (plant, since) -> plant.loads().get(1).core() >= LIMIT + 0.1),
                Step.of("hold", 15 * 60 + jitter.about(90, 20), steam),
                new Step("cooling", cold, (plant, since) -> hottest(plant) <= release),
                Step.of("open", 90, Settings.shut().vent(1)));
    }

    private static double hottest(Plant plant) {
        return Math.max(plant.loads().get(0).core(), plant.loads().get(1).core());
    }

    private Truth truth(LocalDateTime first) {
        History history = rig.history();
        double off = rig.start("cooling");
        double plateau = history.first(rig.start("heating"), 5, m -> m.spots().get(0) >= LIMIT);
        Band band = new Band(LIMIT, 124, 0, 1, 2);
        List<Span> attempts = band.attempts(history, rig.start("heating"), off);
        PhaseList phases = new PhaseList()
                .upTo("standing", rig.start("venting"))
                .upTo("air-removal", rig.start("heating"))
                .upTo("heating", plateau)
                .upTo("equilibration", attempts.get(0).from())
                .upTo("hold", off)
                .upTo("cooling", history.end());
        Map<String, Double> figures = new LinkedHashMap<>();
        figures.put("free-volume-m3", volume);
        figures.put("metal-kg", metalKg);
        figures.put("load-kg", loadKg);
        figures.put("load-lag-s", attempts.get(0).from() - plateau);
        figures.put("load-at-release-degC", hottest(rig.plant()));
        List<Fault> faults = faulty
                ? List.of(new Fault("released-hot", "load", history.end(), history.end(), hottest(rig.plant()), "degC"))
                : List.of();
        return new Truth(
                name,
                "fluids",
                jitter.seed(),
                faulty,
                first,
                5,
                atmosphere,
                rig.spotNames(),
                phases.spans(),
                attempts,
                faults,
                List.of(
                        TrueLethality.of(history, "bottle-1", 1, 121.11, 10, off),
                        TrueLethality.of(history, "bottle-2", 2, 121.11, 10, off)),
                Double.NaN,
                faulty ? Expected.NOT_MET : Expected.MET,
                figures,
                history,
                rig.balance());
    }

    private String plan() {
        String lag = ", lag: {value: 3 s, uncertainty: 1 s}";
        return new PlanText(style)
                .head("S2-fluids-500", "Sterilizer S2, bottles of 500 ml", "S2", "fluids", "saturated-steam")
                .add("chamber:")
                .add("  steam: supplied")
                .add("  volume: 0.45 m3")
                .add("  free-volume: " + Names.number(volume, 3) + " m3")
                .add("  metal: {mass: " + Names.number(metalKg, 1)
                        + " kg, material: stainless-steel, temperature: drain}")
                .add("  load: {mass: " + Names.number(loadKg, 1)
                        + " kg, specific-heat: 4.15 kJ/(kg K), temperature: [bottle-1, bottle-2],"
                        + " probes: mass-average}")
                .add("  heat-loss: 8 W/K")
                .add("  maximum-pressure: 2.5 bar(g)")
                .add("atmosphere: entered")
                .add("channels:")
                .temperature("drain", "T1 drain", "reference", ", required: yes" + lag)
                .temperature("bottle-1", "T2 bottle", "load", ", contact: sealed, required: yes")
                .temperature("bottle-2", "T3 bottle", "load", ", contact: sealed, required: yes")
                .pressure("P1", style.pressureUncertainty(2000))
                .add("hold:")
                .add("  {at-least: 121.0 degC, at-most: 124.0 degC, set-point: 122.2 degC, duration: 15 min,")
                .add("   starts: {when: all, channels: [drain, bottle-1, bottle-2]}}")
                .add("longest-gap: 15 s")
                .add("saturation: {air: 1.0 K, superheat: 2.0 K, shortest: 15 s, judged: [hold]}")
                .add("lethality:")
                .add("  - {name: F0, reference: 121.11 degC, z: 10 K, floor: 100 degC, minimum: 12 min,"
                        + " channels: load, cooling: not-counted}")
                .add("limits:")
                .add(
                        "  - {what: load-temperature-at-release, at-most: 80 degC, source: \"invented safe handling rule\"}")
                .add("decision: {rule: guarded, conformance: 95 %}")
                .add("run-sheet: {required: [zone, atmosphere, product, marks.steam-on, marks.steam-off]}")
                .toString();
    }

    private String sheet(LocalDateTime first) {
        SheetText sheet = new SheetText(name, "S2-fluids-500", "S2", first, style);
        return sheet.add("atmosphere: " + Names.number(atmosphere / 100, 0) + " hPa")
                .add("product: {name: buffer, code: BF-5, lots: [B771], container: 500 ml, count: 84}")
                .add("marks: {steam-on: " + sheet.at(rig.start("venting")) + ", vent-closed: "
                        + sheet.at(rig.start("heating")) + ", steam-off: " + sheet.at(rig.start("cooling")) + "}")
                .entered(rig.history().end())
                .toString();
    }
}
