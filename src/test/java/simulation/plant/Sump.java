package simulation.plant;

/**
 * Condensate at the bottom: it collects, drains, and boils up again when the pressure falls. Its
 * pressure times its volume, some hundredths of a percent of its heat, is not told apart from its energy.
 */
final class Sump {

    private final Water water;
    private double kg;
    private double joule;

    Sump(Water water) {
        this.water = water;
    }

    double kg() {
        return kg;
    }

    double joule() {
        return joule;
    }

    double celsius() {
        return water.celsiusOfLiquid(joule / kg);
    }

    double volume() {
        return kg < 1e-9 ? 0 : kg * water.vf(celsius());
    }

    void add(double mass, double enthalpy) {
        kg += mass;
        joule += enthalpy;
    }
}
