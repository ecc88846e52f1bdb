package simulation.plant;

import java.util.List;

/**
 * A chamber with its contents, metal, load, condensate and pipes, stepped through time. All that moves in one step is
 * taken from the state at its start; then the contents settle at the temperature that their energy asks for, so that
 * nothing is lost between the steps.
 */
public final class Plant {

    private static final double MOST_OF_GAS = 0.2;

    private final Water water;
    private final Room room;
    private final Equipment equipment;
    private final Contents contents;
    private final Body metal;
    private final List<Body> loads;
    private final Sump sump;
    private final Ledger ledger = new Ledger();
    private final Timeline timeline;
    private final double seconds;
    private final double volume;
    private Settings settings = Settings.shut();
    private double integral;
    private double controllerProbe;
    private boolean weightOpen;
    private boolean steamAllowed = true;

    /** Puts a plant together. */
    public Plant(
            Water water,
            Room room,
            Equipment equipment,
            Contents contents,
            Body metal,
            List<Body> loads,
            int stepsPerSecond) {
        this.water = water;
        this.room = room;
        this.equipment = equipment;
        this.contents = contents;
        this.metal = metal;
        this.loads = List.copyOf(loads);
        this.sump = new Sump(water);
        this.timeline = new Timeline(stepsPerSecond);
        this.seconds = 1.0 / stepsPerSecond;
        this.volume = contents.volume();
        this.controllerProbe = contents.state().celsius();
    }

    /** The gas as it is. */
    public GasState gas() {
        return contents.state();
    }

    /** Water and air in the chamber. */
    public Contents contents() {
        return contents;
    }

    /** The room. */
    public Room room() {
        return room;
    }

    /** The metal. */
    public Body metal() {
        return metal;
    }

    /** The load, piece by piece. */
    public List<Body> loads() {
        return loads;
    }

    /** The properties of water. */
    public Water water() {
        return water;
    }

    /** Time and steps. */
    public Timeline timeline() {
        return timeline;
    }

    /** Sums so far. */
    public Ledger ledger() {
        return ledger.copy();
    }

    /** Length of a time step. */
    public double seconds() {
        return seconds;
    }

    /** Condensate that has not drained. */
    public double sumpKg() {
        return sump.kg();
    }

    /** Its enthalpy. */
    public double sumpJoule() {
        return sump.joule();
    }

    /** Energy of all that the chamber holds. */
    public double joule() {
        double sum = contents.joule() + sump.joule() + metal.joule();
        for (Body load : loads) {
            sum += load.joule();
        }
        return sum;
    }

    /** Energy that has come in less what has gone out. */
    public double joulesCrossed() {
        return ledger.of(Flow.STEAM_J)
                + ledger.of(Flow.COOLING_WATER_J)
                + ledger.of(Flow.AIR_IN_J)
                + ledger.of(Flow.HEATER_J)
                + ledger.of(Flow.JACKET_J)
                - ledger.of(Flow.VENTED_J)
                - ledger.of(Flow.PUMPED_J)
                - ledger.of(Flow.DRAINED_J)
                - ledger.of(Flow.LOSS_J);
    }

    /** Water in the chamber. */
    public double waterKg() {
        return contents.waterKg() + sump.kg();
    }

    /** Water that has come in less what has gone out. */
    public double waterCrossed() {
        return ledger.of(Flow.STEAM_KG)
                + ledger.of(Flow.COOLING_WATER_KG)
                - ledger.of(Flow.VENTED_VAPOUR_KG)
                - ledger.of(Flow.PUMPED_VAPOUR_KG)
                - ledger.of(Flow.DRAINED_KG);
    }

    /** Air that has come in less what has gone out. */
    public double airCrossed() {
        return ledger.of(Flow.AIR_IN_KG) - ledger.of(Flow.VENTED_AIR_KG) - ledger.of(Flow.PUMPED_AIR_KG);
    }

    void begin(Step step) {
        settings = step.settings();
        timeline.begin(step.name());
        steamAllowed = settings.opening() > 0;
        if (!steamAllowed) {
            integral = 0;
        }
    }

    void step() {
        GasState gas = contents.state();
        double felt = equipment.byPressure ? water.celsius(gas.pascal()) : gas.celsius();
        controllerProbe += seconds / 2 * (felt - controllerProbe);
        admitSteam(gas);
        letOut(gas);
        letAirIn(gas);
        sprayWater();
        heatBodies(gas);
        if (!equipment.pool) {
            settleMist(gas);
            boilSump(gas);
            drain();
        }
        contents.resize(volume - sump.volume());
        contents.settle();
        timeline.tick();
    }

    private void admitSteam(GasState gas) {
        if (!steamAllowed) {
            return;
        }
        double opening = settings.opening();
        if (!Double.isNaN(settings.setCelsius())) {
            double miss = settings.setCelsius() - controllerProbe;
            double asked = equipment.gain * miss + integral;
            if (asked > 0 && asked < 0.6 * settings.opening()) {
                integral += equipment.gain * miss * seconds / equipment.resetSeconds;
                integral = Math.min(Math.max(integral, 0), 0.3 * settings.opening());
            }
            opening = Math.min(Math.max(asked + settings.rippleAt(timeline.now()), 0), settings.opening());
        }
        double kg = equipment.supply.flow(opening, gas.pascal()) * seconds;
        double joule = kg * equipment.supply.enthalpyAt(timeline);
        contents.add(kg, 0, joule);
        ledger.add(Flow.STEAM_KG, kg);
        ledger.add(Flow.STEAM_J, joule);
    }

    private void letOut(GasState gas) {
        double share = Nozzle.share(room.pascal(), gas.pascal()) * gas.pascal() / 1e5;
        double vent = settings.vent();
        if (gas.pascal() > settings.reliefPascal()) {
            vent = Math.min(1, vent + (gas.pascal() - settings.reliefPascal()) / 4000);
        }
        double rate = equipment.ventKgPerSecond * vent + equipment.bleederKgPerSecond * settings.bleeder();
        if (settings.hasWeight()) {
            rate += weightFlow(gas);
        }
        double vapour = gas.vapourKg() / (gas.vapourKg() + gas.airKg());
        double kg = Math.min(rate * share * seconds, MOST_OF_GAS * (gas.vapourKg() + gas.airKg()));
        double joule = take(gas, kg * vapour, kg * (1 - vapour));
        ledger.add(Flow.VENTED_VAPOUR_KG, kg * vapour);
        ledger.add(Flow.VENTED_AIR_KG, kg * (1 - vapour));
        ledger.add(Flow.VENTED_J, joule);
        if (settings.pump() > 0 && gas.pascal() > equipment.pumpFloorPascal) {
            double volume = equipment.pumpCubicMetrePerSecond
                    * settings.pump()
                    * (1 - equipment.pumpFloorPascal / gas.pascal())
                    * seconds;
            double part = Math.min(volume / contents.volume(), MOST_OF_GAS);
            double pumped = take(gas, part * gas.vapourKg(), part * gas.airKg());
            ledger.add(Flow.PUMPED_VAPOUR_KG, part * gas.vapourKg());
            ledger.add(Flow.PUMPED_AIR_KG, part * gas.airKg());
            ledger.add(Flow.PUMPED_J, pumped);
        }
    }

    private double weightFlow(GasState gas) {
        boolean saws = equipment.weightShutsPascal < equipment.weightOpensPascal;
        if (!saws) {
            double lift = (gas.pascal() - equipment.weightOpensPascal) / 3000;
            return equipment.weightKgPerSecond * Math.min(Math.max(lift, 0), 1);
        }
        if (gas.pascal() > equipment.weightOpensPascal) {
            weightOpen = true;
        } else if (gas.pascal() < equipment.weightShutsPascal) {
            weightOpen = false;
        }
        return weightOpen ? equipment.weightKgPerSecond : 0;
    }

    private double take(GasState gas, double vapour, double air) {
        double joule = vapour * gas.vapourEnthalpy() + air * Air.enthalpy(gas.celsius());
        contents.add(-vapour, -air, -joule);
        return joule;
    }

    private void letAirIn(GasState gas) {
        double share = Nozzle.share(gas.pascal(), room.pascal()) * room.pascal() / 1e5;
        double through =
                (equipment.ventKgPerSecond * settings.vent() + equipment.bleederKgPerSecond * settings.bleeder())
                        * share;
        double leaked = equipment.leaks.stream().anyMatch(window -> window.isOpen(timeline))
                ? equipment.leakKgPerSecond * leakShare(gas)
                : 0;
        double pressed = 0;
        if (gas.pascal() < settings.airPascal()) {
            pressed = equipment.airKgPerSecond * Math.min(1, (settings.airPascal() - gas.pascal()) / 4000);
        }
        double kg = (through + leaked + pressed) * seconds;
        double joule = kg * Air.enthalpy(room.celsius());
        contents.add(0, kg, joule);
        ledger.add(Flow.AIR_IN_KG, kg);
        ledger.add(Flow.AIR_IN_J, joule);
        ledger.add(Flow.LEAKED_AIR_KG, leaked * seconds);
    }

    private double leakShare(GasState gas) {
        return equipment.airValveLeaks ? 1 : Nozzle.share(gas.pascal(), room.pascal());
    }

    private void sprayWater() {
        double kg = settings.waterKgPerSecond() * seconds;
        double joule = kg * water.hf(equipment.coolingCelsius);
        contents.add(kg, 0, joule);
        ledger.add(Flow.COOLING_WATER_KG, kg);
        ledger.add(Flow.COOLING_WATER_J, joule);
    }

    private void heatBodies(GasState gas) {
        double gasHeat = 0;
        for (Body load : loads) {
            double heat = heat(gas, load);
            ledger.add(Flow.LOAD_HEAT_J, heat);
            gasHeat -= heat;
            load.conduct(seconds);
        }
        double toMetal = heat(gas, metal);
        gasHeat -= toMetal;
        double loss = equipment.lossWattPerKelvin * (metal.surface() - room.celsius()) * seconds;
        double jacket = Double.isNaN(equipment.jacketCelsius)
                ? 0
                : equipment.jacketWattPerKelvin * (equipment.jacketCelsius - metal.surface()) * seconds;
        double heater = heaterOn(gas) ? settings.heaterWatt() * seconds : 0;
        metal.take(heater + jacket - loss);
        metal.conduct(seconds);
        ledger.add(Flow.LOSS_J, loss);
        ledger.add(Flow.JACKET_J, jacket);
        ledger.add(Flow.HEATER_J, heater);
        ledger.add(Flow.METAL_HEAT_J, toMetal + heater + jacket - loss);
        ledger.add(Flow.CONTENTS_HEAT_J, gasHeat);
    }

    private boolean heaterOn(GasState gas) {
        return Double.isNaN(settings.heaterCelsius()) || gas.celsius() < settings.heaterCelsius();
    }

    /** Heat from the chamber's contents to a body in this step. */
    private double heat(GasState gas, Body body) {
        if (equipment.pool) {
            double conductance = gas.dry() ? body.dryConductance() : body.wetConductance();
            return give(body, conductance * (gas.celsius() - body.surface()) * seconds);
        }
        double part = Math.min(body.dryConductance() * seconds, MOST_OF_GAS * heatCapacity(gas));
        double heat = give(body, part * (gas.celsius() - body.surface()));
        if (settings.waterKgPerSecond() > 0 && body.surface() > gas.celsius()) {
            return heat + give(body, 0.3 * body.wetConductance() * (gas.celsius() - body.surface()) * seconds);
        }
        double below = gas.dewCelsius() - body.surface();
        if (below <= 0 || gas.vapourKg() <= 0) {
            return heat;
        }
        double liquid = water.hf(gas.dewCelsius());
        double latent = gas.vapourEnthalpy() - liquid;
        double kg = Math.min(
                body.wetConductance() * (1 - gas.airShare()) * below * seconds / latent, MOST_OF_GAS * gas.vapourKg());
        contents.add(-kg, 0, -kg * gas.vapourEnthalpy());
        sump.add(kg, kg * liquid);
        body.take(kg * latent);
        ledger.add(Flow.CONDENSED_KG, kg);
        return heat + kg * latent;
    }

    private static double heatCapacity(GasState gas) {
        return gas.vapourKg() * 1500 + gas.airKg() * Air.CV + gas.liquidKg() * 4200;
    }

    private double give(Body body, double joule) {
        body.take(joule);
        contents.add(0, 0, -joule);
        return joule;
    }

    private void settleMist(GasState gas) {
        double kg = gas.liquidKg() * Math.min(1, seconds / equipment.settleSeconds);
        double joule = kg * (water.uf(gas.celsius()) + gas.pascal() * water.vf(gas.celsius()));
        contents.add(-kg, 0, -joule);
        sump.add(kg, joule);
    }

    private void boilSump(GasState gas) {
        if (sump.kg() < 1e-6) {
            return;
        }
        double celsius = sump.celsius();
        double fromMetal = equipment.sumpToMetalWattPerKelvin * (metal.surface() - celsius) * seconds;
        sump.add(0, -giveToBody(metal, -limited(fromMetal)));
        ledger.add(Flow.METAL_HEAT_J, -limited(fromMetal));
        for (Body load : loads) {
            double fromLoad =
                    limited(equipment.sumpToLoadWattPerKelvin / loads.size() * (load.surface() - celsius) * seconds);
            sump.add(0, -giveToBody(load, -fromLoad));
            ledger.add(Flow.LOAD_HEAT_J, -fromLoad);
        }
        double open = (1 - gas.airShare()) * equipment.sumpWattPerKelvin * seconds;
        double boiling = water.hg(celsius);
        if (celsius > gas.dewCelsius()) {
            double kg = open * (celsius - gas.dewCelsius()) / (boiling - water.hf(celsius));
            kg = Math.min(kg, Math.min(0.5 * sump.kg(), 0.3 * most(celsius, gas.dewCelsius())));
            sump.add(-kg, -kg * boiling);
            contents.add(kg, 0, kg * boiling);
        } else if (gas.vapourKg() > 0) {
            double kg = open * (gas.dewCelsius() - celsius) / (boiling - water.hf(celsius));
            kg = Math.min(kg, Math.min(MOST_OF_GAS / 4 * gas.vapourKg(), 0.3 * most(gas.dewCelsius(), celsius)));
            contents.add(-kg, 0, -kg * gas.vapourEnthalpy());
            sump.add(kg, kg * gas.vapourEnthalpy());
        }
    }

    /** What the sump can boil off or take up until it is as warm as the dew point. */
    private double most(double warm, double cold) {
        return sump.kg() * 4200 * (warm - cold) / 2.2e6;
    }

    private double limited(double joule) {
        double most = sump.kg() * 4200 * 2;
        return Math.min(Math.max(joule, -most), most);
    }

    private static double giveToBody(Body body, double joule) {
        body.take(joule);
        return joule;
    }

    private void drain() {
        double kg = sump.kg() * Math.min(1, seconds / equipment.drainSeconds);
        boolean heldBack = contents.state().pascal() < room.pascal() - 2000 && settings.pump() <= 0;
        if (heldBack || sump.kg() < 1e-9) {
            return;
        }
        double joule = kg * sump.joule() / sump.kg();
        sump.add(-kg, -joule);
        ledger.add(Flow.DRAINED_KG, kg);
        ledger.add(Flow.DRAINED_J, joule);
    }
}
