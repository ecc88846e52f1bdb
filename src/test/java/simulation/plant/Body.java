package simulation.plant;

/** Something solid that takes up heat through its surface: metal as one lump, cans as lumps in a row. */
public final class Body {

    private final double[] capacity;
    private final double[] conductance;
    private final double[] celsius;
    private final double wetConductance;
    private final double dryConductance;

    /**
     * Describes the body.
     *
     * @param celsius temperature at the start
     * @param wetConductance from condensing steam to the surface, W/K
     * @param dryConductance from dry gas to the surface, W/K
     * @param capacity heat capacities from the surface inwards, J/K
     * @param conductance between neighbours, W/K
     */
    public Body(
            double celsius, double wetConductance, double dryConductance, double[] capacity, double... conductance) {
        this.capacity = capacity.clone();
        this.conductance = conductance.clone();
        this.wetConductance = wetConductance;
        this.dryConductance = dryConductance;
        this.celsius = new double[capacity.length];
        java.util.Arrays.fill(this.celsius, celsius);
    }

    double wetConductance() {
        return wetConductance;
    }

    double dryConductance() {
        return dryConductance;
    }

    double surface() {
        return celsius[0];
    }

    /** Temperature of the lump inside. */
    public double core() {
        return celsius[celsius.length - 1];
    }

    /** Temperature by mass. */
    public double mean() {
        double sum = 0;
        double all = 0;
        for (int i = 0; i < capacity.length; i++) {
            sum += capacity[i] * celsius[i];
            all += capacity[i];
        }
        return sum / all;
    }

    /** Heat content above 0 degC. */
    public double joule() {
        double sum = 0;
        for (int i = 0; i < capacity.length; i++) {
            sum += capacity[i] * celsius[i];
        }
        return sum;
    }

    void take(double joule) {
        celsius[0] += joule / capacity[0];
    }

    void conduct(double seconds) {
        for (int i = 0; i < conductance.length; i++) {
            double joule = conductance[i] * (celsius[i] - celsius[i + 1]) * seconds;
            celsius[i] -= joule / capacity[i];
            celsius[i + 1] += joule / capacity[i + 1];
        }
    }
}
