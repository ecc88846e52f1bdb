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

/** Pouches in steam and air under overpressure from cold to cold. Its fault: the compressed air fails in the hold. */
final class SteamAirRun {

    private static final double LIMIT = 120.0;

    private final boolean faulty;
    private final LogStyle style;
    private final Jitter jitter;
    private final String name;
    private final Water water = new Water();
    private final double atmosphere;
    private final double volume;
    private final double over;
    private Rig rig;

    SteamAirRun(String name, boolean faulty, LogStyle style, Jitter jitter) {
        this.name = name;
        this.faulty = faulty;
        this.style = style;
        this.jitter = jitter;
        this.atmosphere = jitter.about(101_300, 1200);
        this.volume = jitter.about(1.1, 0.1);
        this.over = jitter.about(285_000, 5000);
    }

    SimulatedRun make(LocalDateTime start) {
        LocalDateTime first = start.plusMinutes(jitter.seed() % 73);
        rig = new Rig(plant(), style);
        Spot chamber = rig.spot("chamber", new GasSpot(2, List.of()));
        rig.temperature("T chamber", new Probe(chamber, 4, jitter.about(0.02, 0.04), 0.04), 0.01);
        Spot low = rig.spot("low", new GasSpot(2, List.of()));
        rig.temperature("T low", new Probe(low, 4, jitter.about(-0.05, 0.05), 0.04), 0.01);
        Spot pouch = rig.spot("pouch-1", new BodySpot(rig.plant().loads().get(0)));
        rig.temperature("T pouch", new Probe(pouch, 2, jitter.about(0, 0.04), 0.02), 0.01);
        rig.pressure("P", new Transducer(jitter.about(0, 300), 0, 120));
        rig.run(steps(), 5, 5000 + jitter.seed());
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
        double room = jitter.about(21, 2);
        Equipment equipment = new Equipment()
                .supply(SteamSupply.wet(water, 550_000, 0.97, jitter.about(0.3, 0.03)))
                .controller(0.05, 60)
                .vent(0.15, 0)
                .air(0.1)
                .cooling(jitter.about(16, 2))
                .loss(25);
        double heat = jitter.about(300, 30) * 3700;
        Body metal = new Body(room, 9000, 900, new double[] {520 * 500});
        Body pouches = new Body(
                jitter.about(30, 3), heat * 0.5 / 120, 2, new double[] {0.5 * heat, 0.5 * heat}, 0.5 * heat / 220);
        Contents contents = Contents.moistAir(water, volume, room, atmosphere, 0.5, 0);
        return new Plant(water, new Room(room, atmosphere), equipment, contents, metal, List.of(pouches), 5);
    }

    private List<Step> steps() {
        double aim = jitter.about(121.3, 0.2);
        Settings hot = Settings.shut().steamTo(aim, 1).air(over).relief(over + 5000);
        Settings cold = Settings.shut().water(0.8).air(over).relief(over + 5000);
        double hold = 25 * 60 + jitter.about(110, 30);
        List<Step> holding = faulty
                ? List.of(
                        Step.of("hold", hold / 2, hot),
                        Step.of(
                                "air failure",
                                300,
                                Settings.shut().steamTo(aim, 1).relief(222_000)),
                        Step.of("hold again", hold / 2 - 300, hot))
                : List.of(Step.of("hold", hold, hot));
        java.util.ArrayList<Step> steps = new java.util.ArrayList<>();
        steps.add(
                Step.of("standing", jitter.stepped(100, 40, 10), Settings.shut().vent(0.2)));
        steps.add(new Step("heating", hot, (plant, since) -> plant.gas().celsius() >= LIMIT + 0.3));
        steps.addAll(holding);
        steps.add(
                new Step("cooling", cold, (plant, since) -> plant.loads().get(0).core() <= 45));
        steps.add(new Step(
                "release",
                Settings.shut().vent(0.5),
                (plant, since) -> plant.gas().pascal() <= atmosphere + 300));
        steps.add(Step.of("end", 60, Settings.shut().vent(0.5)));
        return steps;
    }

    private Truth truth(LocalDateTime first) {
        History history = rig.history();
        double off = rig.start("cooling");
        Band band = new Band(LIMIT, 123, 0, 1);
        List<Span> attempts = band.attempts(history, rig.start("heating"), off);
        PhaseList phases = new PhaseList().upTo("standing", rig.start("heating"));
        for (Span attempt : attempts) {
            phases.upTo("heating", attempt.from());
            phases.upTo("hold", attempt.to() >= off - 1 ? off : attempt.to() + 1);
        }
        phases.upTo("heating", off).upTo("cooling", history.end());
        double failed = rig.start("air failure");
        List<Fault> faults =
                faulty ? List.of(new Fault("pressure-lost", "all", failed, failed + 300, 222_000, "Pa")) : List.of();
        Map<String, Double> figures = new LinkedHashMap<>();
        figures.put("free-volume-m3", volume);
        return new Truth(
                name,
                "steam-air",
                jitter.seed(),
                faulty,
                first,
                5,
                atmosphere,
                rig.spotNames(),
                phases.spans(),
                attempts,
                faults,
                List.of(TrueLethality.of(history, "pouch-1", 2, 121.11, 10, off)),
                Double.NaN,
                faulty ? Expected.NOT_MET : Expected.MET,
                figures,
                history,
                rig.balance());
    }

    private String plan() {
        return new PlanText(style)
                .head("R3-pouch-180", "Retort R3, pouches of 180 g under overpressure", "R3", "retort", "steam-air")
                .add("chamber:")
                .add("  steam: supplied")
                .add("  volume: 1.6 m3")
                .add("  free-volume: " + Names.number(volume, 3) + " m3")
                .add("  metal: {mass: 520 kg, material: stainless-steel, temperature: chamber}")
                .add("  heat-loss: 25 W/K")
                .add("  maximum-pressure: 3.5 bar(g)")
                .add("atmosphere: entered")
                .add("channels:")
                .temperature("chamber", "T chamber", "reference", ", required: yes")
                .temperature("low", "T low", "chamber", "")
                .temperature("pouch-1", "T pouch", "product", ", contact: sealed")
                .pressure("P", style.pressureUncertainty(2500))
                .add("hold:")
                .add("  {at-least: 120.0 degC, at-most: 123.0 degC, set-point: 121.3 degC, duration: 25 min,")
                .add("   starts: {when: all, channels: [chamber, low]}}")
                .add("longest-gap: 15 s")
                .add("lethality:")
                .add("  - {name: F0, reference: 121.11 degC, z: 10 K, floor: none, minimum: 3.0 min,"
                        + " channels: product, cooling: counted}")
                .add("limits:")
                .add("  - {what: overpressure-above-saturation, phase: hold, at-least: 0.60 bar,"
                        + " source: \"invented pouch study\"}")
                .add("  - {what: spread, places: [reference, chamber], phase: hold, at-most: 1.5 K,"
                        + " source: \"invented pouch study\"}")
                .add("  - {what: pressure, phase: cooling, over: 5 min, at-least: 2.5 bar(a),"
                        + " source: \"invented pouch study\"}")
                .add("decision: {rule: guarded, conformance: 95 %}")
                .add("run-sheet: {required: [zone, atmosphere, product, lots, marks.steam-on, marks.steam-off]}")
                .toString();
    }

    private String sheet(LocalDateTime first) {
        SheetText sheet = new SheetText(name, "R3-pouch-180", "R3", first, style);
        return sheet.add("atmosphere: " + Names.number(atmosphere / 100, 0) + " hPa")
                .add("product: {name: lentil pouch, code: LP-18, lots: [P0417], container: 180 g, count: 1560}")
                .add("marks: {steam-on: " + sheet.at(rig.start("heating")) + ", steam-off: "
                        + sheet.at(rig.start("cooling")) + "}")
                .entered(rig.history().end())
                .toString();
    }
}
