package org.steamwitness.steam;

/** Expansion through a valve without heat or work: the enthalpy stays, h2 = h1. A flash is the same from a liquid. */
public final class Throttling {

    private Throttling() {}

    /**
     * What arrives behind the valve: wet steam, whose quality is then the flashed fraction, or superheated steam.
     *
     * @param pascal absolute pressure behind the valve, 611.213 Pa to 16.53 MPa
     * @param joulePerKilogram specific enthalpy before it, from boiling liquid to steam of 1073.15 K at {@code pascal}
     * @return the state behind the valve
     * @throws OutOfRangeException if either lies outside its range or is NaN
     */
    public static Water to(double pascal, double joulePerKilogram) {
        Saturated line = Saturated.atPascal(pascal);
        return joulePerKilogram > line.vapour().enthalpyJoulePerKilogram()
                ? Superheated.ofPascalEnthalpy(pascal, joulePerKilogram)
                : WetSteam.ofPascalEnthalpy(pascal, joulePerKilogram);
    }
}
