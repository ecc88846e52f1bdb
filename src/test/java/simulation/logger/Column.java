package simulation.logger;

/**
 * A column of the log.
 *
 * @param header its name in the log, exactly
 * @param instrument where its numbers come from
 * @param unit of its numbers
 * @param decimals digits after the mark
 * @param step smallest step of the numbers
 */
public record Column(String header, Instrument instrument, Unit unit, int decimals, double step) {

    /** A column that resolves as finely as it is written. */
    public static Column of(String header, Instrument instrument, Unit unit, int decimals) {
        return new Column(header, instrument, unit, decimals, StrictMath.pow(10, -decimals));
    }

    double reading(Noise noise, double atmosphere) {
        double raw = unit.from(instrument.read(noise), atmosphere);
        return StrictMath.rint(raw / step) * step;
    }
}
