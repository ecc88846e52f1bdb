package simulation.logger;

/** Units of columns, from degrees Celsius, pascal absolute or joule. */
public enum Unit {
    DEGC(1, 0, false),
    DEGF(1.8, 32, false),
    KPA_ABSOLUTE(1e-3, 0, false),
    MBAR_ABSOLUTE(1e-2, 0, false),
    BAR_GAUGE(1e-5, 0, true),
    KPA_GAUGE(1e-3, 0, true),
    PSI_GAUGE(1 / 6894.757293168, 0, true),
    KILOWATT_HOUR(1 / 3.6e6, 0, false);

    private final double factor;
    private final double zero;
    private final boolean gauge;

    Unit(double factor, double zero, boolean gauge) {
        this.factor = factor;
        this.zero = zero;
        this.gauge = gauge;
    }

    double from(double value, double atmosphere) {
        return (gauge ? value - atmosphere : value) * factor + zero;
    }
}
