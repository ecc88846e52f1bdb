package simulation.plant;

import java.util.List;

/** What is bolted to a chamber, with sizes. Set while the plant is put together, read afterwards. */
public final class Equipment {

    SteamSupply supply = SteamSupply.none();
    double gain = 0.08;
    boolean byPressure;
    double resetSeconds = 40;
    double ventKgPerSecond;
    double bleederKgPerSecond;
    double pumpCubicMetrePerSecond;
    double pumpFloorPascal = 3000;
    double leakKgPerSecond;
    boolean airValveLeaks;
    List<Window> leaks = List.of(Window.always());
    double airKgPerSecond = 0.1;
    double coolingCelsius = 18;
    double lossWattPerKelvin;
    double jacketCelsius = Double.NaN;
    double jacketWattPerKelvin;
    boolean pool;
    double settleSeconds = 3;
    double drainSeconds = 15;
    double sumpWattPerKelvin = 400;
    double sumpToMetalWattPerKelvin = 50;
    double sumpToLoadWattPerKelvin;
    double weightOpensPascal = Double.NaN;
    double weightShutsPascal = Double.NaN;
    double weightKgPerSecond = 0.01;

    /** Steam from a main through a valve under a controller. */
    public Equipment supply(SteamSupply main) {
        supply = main;
        return this;
    }

    /** The controller: opening per kelvin, and the time in which it repeats itself. */
    public Equipment controller(double perKelvin, double seconds) {
        gain = perKelvin;
        resetSeconds = seconds;
        return this;
    }

    /** The controller goes by the pressure, as the temperature at which steam of that pressure boils. */
    public Equipment byPressure() {
        byPressure = true;
        return this;
    }

    /** Vent and bleeders: flow at 1 bar when they are open. */
    public Equipment vent(double kgPerSecond, double bleederKgPerSecond) {
        ventKgPerSecond = kgPerSecond;
        this.bleederKgPerSecond = bleederKgPerSecond;
        return this;
    }

    /** A vacuum pump. */
    public Equipment pump(double cubicMetrePerSecond, double floorPascal) {
        pumpCubicMetrePerSecond = cubicMetrePerSecond;
        pumpFloorPascal = floorPascal;
        return this;
    }

    /** Air that comes in through a leak while the chamber is far below the atmosphere. */
    public Equipment leak(double kgPerSecond, List<Window> when) {
        leakKgPerSecond = kgPerSecond;
        leaks = when;
        return this;
    }

    /** Compressed air that creeps through its shut valve, at any pressure. */
    public Equipment leakingAirValve(double kgPerSecond, Window when) {
        airValveLeaks = true;
        return leak(kgPerSecond, List.of(when));
    }

    /** Compressed air. */
    public Equipment air(double kgPerSecond) {
        airKgPerSecond = kgPerSecond;
        return this;
    }

    /** Temperature of the cooling water. */
    public Equipment cooling(double celsius) {
        coolingCelsius = celsius;
        return this;
    }

    /** Loss from the metal to the room. */
    public Equipment loss(double wattPerKelvin) {
        lossWattPerKelvin = wattPerKelvin;
        return this;
    }

    /** A jacket that keeps the metal warm. */
    public Equipment jacket(double celsius, double wattPerKelvin) {
        jacketCelsius = celsius;
        jacketWattPerKelvin = wattPerKelvin;
        return this;
    }

    /** The vessel's own water boils inside; nothing drains. */
    public Equipment pool() {
        pool = true;
        return this;
    }

    /** Condensate: how slowly it drains, how well it touches the load. */
    public Equipment condensate(double drainSeconds, double toLoadWattPerKelvin) {
        this.drainSeconds = drainSeconds;
        this.sumpToLoadWattPerKelvin = toLoadWattPerKelvin;
        return this;
    }

    /** A weight that opens at one pressure and shuts at another. */
    public Equipment weight(double opensPascal, double shutsPascal, double kgPerSecond) {
        weightOpensPascal = opensPascal;
        weightShutsPascal = shutsPascal;
        weightKgPerSecond = kgPerSecond;
        return this;
    }
}
