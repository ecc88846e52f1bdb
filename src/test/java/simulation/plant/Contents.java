package simulation.plant;

/** Water and air in a rigid space: masses and energy go in and out, temperature and pressures follow from them. */
public final class Contents {

    private static final double ZERO = 273.15;
    private static final double HOTTEST = 600;

    private final Water water;
    private double volume;
    private double waterKg;
    private double airKg;
    private double joule;
    private GasState state;

    /**
     * Fills the space.
     *
     * @param water the properties of water
     * @param volume cubic metres
     * @param waterKg all water, liquid and vapour
     * @param airKg air
     * @param celsius temperature of both
     */
    public Contents(Water water, double volume, double waterKg, double airKg, double celsius) {
        this.water = water;
        this.volume = volume;
        this.waterKg = waterKg;
        this.airKg = airKg;
        this.joule = energyAt(celsius);
        settle(celsius);
    }

    /** Air of a pressure and humidity, with liquid water below it. */
    public static Contents moistAir(
            Water water, double volume, double celsius, double pascal, double humidity, double liquidKg) {
        double gas = volume - liquidKg * water.vf(celsius);
        double share = liquidKg > 0 ? 1 : humidity;
        double steam = share * water.pascal(celsius);
        double vapour = share * gas / water.vg(celsius);
        double air = (pascal - steam) * gas / (Air.GAS_CONSTANT * (celsius + ZERO));
        return new Contents(water, volume, liquidKg + vapour, air, celsius);
    }

    /** Temperature and pressures as they are. */
    public GasState state() {
        return state;
    }

    /** All water, liquid and vapour. */
    public double waterKg() {
        return waterKg;
    }

    /** Air. */
    public double airKg() {
        return airKg;
    }

    /** Volume. */
    public double volume() {
        return volume;
    }

    /** Internal energy, found again from temperature and masses. */
    public double joule() {
        return energyAt(state.celsius());
    }

    /** Internal energy of the water alone. */
    public double waterJoule() {
        return joule() - airKg * Air.energy(state.celsius());
    }

    void add(double water, double air, double energy) {
        waterKg += water;
        airKg += air;
        joule += energy;
        if (waterKg < 0 || airKg < 0) {
            throw new IllegalStateException("more leaves than is there: water " + waterKg + " kg, air " + airKg);
        }
    }

    /** Adds heat alone and settles, as in worked examples. */
    public void heat(double energy) {
        joule += energy;
        settle();
    }

    /** Gives the contents another volume, as when condensate gathers below them. */
    void resize(double cubicMetres) {
        volume = cubicMetres;
    }

    void settle() {
        settle(state.celsius());
    }

    private void settle(double guess) {
        double low = 0.01;
        double high = HOTTEST;
        double celsius = guess;
        for (int i = 0; i < 200; i++) {
            double miss = energyAt(celsius) - joule;
            if (miss > 0) {
                high = celsius;
            } else {
                low = celsius;
            }
            double small = 1e-5;
            double slope = (energyAt(celsius + small) - energyAt(celsius)) / small;
            double next = celsius - miss / slope;
            if (Math.abs(next - celsius) < 1e-12 * HOTTEST) {
                celsius = next;
                break;
            }
            if (!(next > low && next < high)) {
                next = (low + high) / 2;
            }
            celsius = next;
        }
        if (celsius < 0.011 || celsius > HOTTEST - 1) {
            throw new IllegalStateException("outside the table: " + celsius + " degC");
        }
        state = stateAt(celsius);
    }

    private double vapourIfWet(double celsius) {
        double vf = water.vf(celsius);
        double room = volume - waterKg * vf;
        if (room < 0) {
            throw new IllegalStateException("full of liquid at " + celsius + " degC");
        }
        return room / (water.vg(celsius) - vf);
    }

    private boolean wet(double celsius) {
        return celsius <= Water.WARMEST && vapourIfWet(celsius) < waterKg;
    }

    private double energyAt(double celsius) {
        double air = airKg * Air.energy(celsius);
        if (waterKg <= 0) {
            return air;
        }
        if (wet(celsius)) {
            double vapour = vapourIfWet(celsius);
            return air + vapour * water.ug(celsius) + (waterKg - vapour) * water.uf(celsius);
        }
        return air + waterKg * water.dryEnergy(celsius, volume / waterKg);
    }

    private GasState stateAt(double celsius) {
        if (waterKg <= 0) {
            return new GasState(celsius, 0, airPascal(celsius, volume), 0, 0, airKg, 0, 0);
        }
        if (wet(celsius)) {
            double vapour = vapourIfWet(celsius);
            double liquid = waterKg - vapour;
            double gas = volume - liquid * water.vf(celsius);
            double enthalpy = water.hg(celsius);
            return new GasState(
                    celsius, water.pascal(celsius), airPascal(celsius, gas), vapour, liquid, airKg, celsius, enthalpy);
        }
        double v = volume / waterKg;
        double steam = water.dryPascal(celsius, v);
        double enthalpy = water.dryEnergy(celsius, v) + steam * v;
        double dew = Math.min(water.celsius(steam), celsius);
        return new GasState(celsius, steam, airPascal(celsius, volume), waterKg, 0, airKg, dew, enthalpy);
    }

    private double airPascal(double celsius, double gas) {
        return airKg * Air.GAS_CONSTANT * (celsius + ZERO) / gas;
    }
}
