package org.steamwitness.steam;

/**
 * The liquid of a sealed vessel has swollen until no vapour space is left. From there on the pressure is hydraulic: it
 * climbs by about a megapascal per kelvin, and no saturation line tells it. A warning to a person, not a slip of the
 * caller.
 */
public final class LiquidFullException extends RuntimeException {

    private static final long serialVersionUID = 1L;

    private final double fullKelvin;

    LiquidFullException(double fullKelvin, double cubicMetrePerKilogram) {
        super("liquid fills the vessel at " + fullKelvin + " K, with " + cubicMetrePerKilogram
                + " m3 for each kilogram of water; from there on the pressure is hydraulic");
        this.fullKelvin = fullKelvin;
    }

    /**
     * The temperature at which the vapour space vanishes, v_f(T) = v.
     *
     * @return kelvin
     */
    public double fullKelvin() {
        return fullKelvin;
    }
}
