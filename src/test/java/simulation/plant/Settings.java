package simulation.plant;

/** How the valves, the pump and the heater stand in one step of a cycle. */
public final class Settings {

    private double opening;
    private double setCelsius = Double.NaN;
    private double rippleShare;
    private double ripplePeriod = 1;
    private double vent;
    private double bleeder;
    private double pump;
    private double airPascal = Double.NaN;
    private double reliefPascal = Double.NaN;
    private double waterKgPerSecond;
    private double heaterWatt;
    private double heaterCelsius = Double.NaN;
    private boolean weight;

    private Settings() {}

    /** Everything shut and off. */
    public static Settings shut() {
        return new Settings();
    }

    private Settings copy() {
        Settings copy = new Settings();
        copy.opening = opening;
        copy.setCelsius = setCelsius;
        copy.rippleShare = rippleShare;
        copy.ripplePeriod = ripplePeriod;
        copy.vent = vent;
        copy.bleeder = bleeder;
        copy.pump = pump;
        copy.airPascal = airPascal;
        copy.reliefPascal = reliefPascal;
        copy.waterKgPerSecond = waterKgPerSecond;
        copy.heaterWatt = heaterWatt;
        copy.heaterCelsius = heaterCelsius;
        copy.weight = weight;
        return copy;
    }

    /** Steam by hand, 0 to 1. */
    public Settings steam(double share) {
        Settings changed = copy();
        changed.opening = share;
        changed.setCelsius = Double.NaN;
        return changed;
    }

    /** Steam by the controller, which opens up to a share. */
    public Settings steamTo(double celsius, double atMost) {
        Settings changed = copy();
        changed.opening = atMost;
        changed.setCelsius = celsius;
        return changed;
    }

    /** A valve that swings about what the controller asks. */
    public Settings ripple(double share, double seconds) {
        Settings changed = copy();
        changed.rippleShare = share;
        changed.ripplePeriod = seconds;
        return changed;
    }

    /** Vent to the room. */
    public Settings vent(double share) {
        Settings changed = copy();
        changed.vent = share;
        return changed;
    }

    /** Bleeders. */
    public Settings bleeder(double share) {
        Settings changed = copy();
        changed.bleeder = share;
        return changed;
    }

    /** Vacuum pump. */
    public Settings pump(double share) {
        Settings changed = copy();
        changed.pump = share;
        return changed;
    }

    /** Compressed air up to a pressure. */
    public Settings air(double pascal) {
        Settings changed = copy();
        changed.airPascal = pascal;
        return changed;
    }

    /** The vent opens above a pressure. */
    public Settings relief(double pascal) {
        Settings changed = copy();
        changed.reliefPascal = pascal;
        return changed;
    }

    /** Cooling water. */
    public Settings water(double kgPerSecond) {
        Settings changed = copy();
        changed.waterKgPerSecond = kgPerSecond;
        return changed;
    }

    /** Heater, which switches off at a temperature; NaN: never. */
    public Settings heater(double watt, double celsius) {
        Settings changed = copy();
        changed.heaterWatt = watt;
        changed.heaterCelsius = celsius;
        return changed;
    }

    /** The weight sits on its seat. */
    public Settings weight() {
        Settings changed = copy();
        changed.weight = true;
        return changed;
    }

    double opening() {
        return opening;
    }

    double setCelsius() {
        return setCelsius;
    }

    double rippleAt(double seconds) {
        return rippleShare * StrictMath.sin(2 * StrictMath.PI * seconds / ripplePeriod);
    }

    double vent() {
        return vent;
    }

    double bleeder() {
        return bleeder;
    }

    double pump() {
        return pump;
    }

    double airPascal() {
        return airPascal;
    }

    double reliefPascal() {
        return reliefPascal;
    }

    double waterKgPerSecond() {
        return waterKgPerSecond;
    }

    double heaterWatt() {
        return heaterWatt;
    }

    double heaterCelsius() {
        return heaterCelsius;
    }

    boolean hasWeight() {
        return weight;
    }
}
