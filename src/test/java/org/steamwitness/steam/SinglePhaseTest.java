package org.steamwitness.steam;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import net.jqwik.api.Arbitraries;
import net.jqwik.api.Arbitrary;
import net.jqwik.api.Combinators;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.Provide;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvFileSource;
import org.junit.jupiter.params.provider.CsvSource;

class SinglePhaseTest {

    /**
     * Against IAPWS-95 (reference/single-phase-iapws95.csv): volume within 2e-4 (steam) and 3e-5 (liquid), energies
     * within 0.2 kJ/kg, entropy within 5e-4 kJ/(kg K).
     */
    @ParameterizedTest(name = "{0} water at {1} degC and {2} kPa")
    @CsvFileSource(resources = "/reference/single-phase-iapws95.csv", useHeadersInDisplayName = true)
    void staysNearTheScientificFormulation(
            String phase, double celsius, double kilopascal, double v, double u, double h, double s) {
        boolean steam = phase.equals("superheated");
        SinglePhase state = at(steam ? 2 : 1, celsius + 273.15, kilopascal * 1000);
        assertThat(state.cubicMetrePerKilogram()).isCloseTo(v, within((steam ? 2e-4 : 3e-5) * v));
        assertThat(state.internalEnergyJoulePerKilogram() / 1000).isCloseTo(u, within(0.2));
        assertThat(state.enthalpyJoulePerKilogram() / 1000).isCloseTo(h, within(0.2));
        assertThat(state.entropyJoulePerKilogramKelvin() / 1000).isCloseTo(s, within(5e-4));
    }

    /**
     * Against a general-purpose property library (reference/if97-general-library.csv), which writes the same equations
     * in its own way: equal to 1e-9 over both regions, energies to 1e-9 of 1 MJ/kg, entropies to 1e-9 of 1 kJ/(kg K).
     */
    @ParameterizedTest(name = "region {0} at {1} K and {2} Pa")
    @CsvFileSource(resources = "/reference/if97-general-library.csv", useHeadersInDisplayName = true)
    void agreesWithAnIndependentImplementation(
            int region, double kelvin, double pascal, double v, double u, double h, double s, double cp, double w) {
        SinglePhase state = at(region, kelvin, pascal);
        assertThat(state.cubicMetrePerKilogram()).isCloseTo(v, within(1e-9 * v));
        assertThat(state.internalEnergyJoulePerKilogram()).isCloseTo(u, within(1e-3));
        assertThat(state.enthalpyJoulePerKilogram()).isCloseTo(h, within(1e-3));
        assertThat(state.entropyJoulePerKilogramKelvin()).isCloseTo(s, within(1e-6));
        assertThat(state.isobaricHeatJoulePerKilogramKelvin()).isCloseTo(cp, within(1e-9 * cp));
        assertThat(state.soundMetrePerSecond()).isCloseTo(w, within(1e-9 * w));
    }

    /** The ideal gas is the limit: p v = R T with R of Eq. (1), IAPWS R7-97(2012). */
    @Test
    void becomesAnIdealGasAtOnePascal() {
        SinglePhase thin = Region2.at(400, 1);
        assertThat(thin.cubicMetrePerKilogram()).isCloseTo(461.526 * 400, within(0.5));
        assertThat(thin.soundMetrePerSecond())
                .isCloseTo(
                        Math.sqrt(thin.isobaricHeatJoulePerKilogramKelvin()
                                / (thin.isobaricHeatJoulePerKilogramKelvin() - 461.526)
                                * 461.526
                                * 400),
                        within(1e-3));
    }

    @Test
    void refusesLiquidBelowTheSaturationPressure() {
        assertThatThrownBy(() -> Region1.at(394.25, 2e5))
                .isInstanceOf(OutOfRangeException.class)
                .hasMessage("liquid, region 1, at 394.25 K: absolute pressure 200000.0 Pa lies outside "
                        + Saturation.pascalAt(394.25) + " to 1.0E8 Pa");
    }

    @Test
    void refusesSteamOnTheWetSide() {
        assertThatThrownBy(() -> Region2.at(394.25, 2.1e5))
                .isInstanceOf(OutOfRangeException.class)
                .hasMessage("steam, region 2, at 394.25 K: absolute pressure 210000.0 Pa lies outside 1.0 to "
                        + Saturation.pascalAt(394.25) + " Pa");
    }

    @Test
    void takesTheSaturationLineItselfAsBothPhases() {
        double pascal = Saturation.pascalAt(394.25);
        assertThat(Region1.at(394.25, pascal * (1 - 0.9e-9)).pascal()).isLessThan(pascal);
        assertThat(Region2.at(394.25, pascal * (1 + 0.9e-9)).pascal()).isGreaterThan(pascal);
        assertThatThrownBy(() -> Region1.at(394.25, pascal * (1 - 1.1e-9))).isInstanceOf(OutOfRangeException.class);
        assertThatThrownBy(() -> Region2.at(394.25, pascal * (1 + 1.1e-9))).isInstanceOf(OutOfRangeException.class);
    }

    @Test
    void takesTheEdgesOfItsRanges() {
        assertThat(Region1.at(273.15, 100e6).kelvin()).isEqualTo(273.15);
        assertThat(Region1.at(623.15, 100e6).kelvin()).isEqualTo(623.15);
        assertThat(Region2.at(273.15, 1).pascal()).isEqualTo(1);
        assertThat(Region2.at(1073.15, 100e6).pascal()).isEqualTo(100e6);
    }

    @ParameterizedTest(name = "{0} K and {1} Pa")
    @CsvSource({"273.14, 1e6", "623.16, 50e6", "NaN, 1e6", "300, NaN", "300, 100.1e6", "300, -1", "300, Infinity"})
    void refusesLiquidOutsideItsRange(double kelvin, double pascal) {
        assertThatThrownBy(() -> Region1.at(kelvin, pascal)).isInstanceOf(OutOfRangeException.class);
    }

    @ParameterizedTest(name = "{0} K and {1} Pa")
    @CsvSource({
        "273.14, 10",
        "1073.16, 10",
        "NaN, 10",
        "300, NaN",
        "300, 0.99",
        "300, 0",
        "650, 22e6",
        "863.15, 100.1e6",
        "900, 100.1e6",
        "900, Infinity"
    })
    void refusesSteamOutsideItsRange(double kelvin, double pascal) {
        assertThatThrownBy(() -> Region2.at(kelvin, pascal)).isInstanceOf(OutOfRangeException.class);
    }

    /** IAPWS R7-97(2012), Fig. 1: the upper edge of region 2 runs along regions 4 and 3 and ends at 100 MPa. */
    @Test
    void endsSteamAtSaturationThenAtTheBoundaryThenAt100Megapascal() {
        assertThat(Region2.highestPascalAt(500)).isEqualTo(Saturation.pascalAt(500));
        assertThat(Region2.highestPascalAt(623.15)).isEqualTo(Saturation.pascalAt(623.15));
        assertThat(Region2.highestPascalAt(700)).isEqualTo(Boundary23.pascalAt(700));
        assertThat(Region2.highestPascalAt(863.15)).isCloseTo(100e6, within(10.0));
        assertThat(Region2.highestPascalAt(863.16)).isEqualTo(100e6);
        assertThat(Region2.lowestKelvinAt(1)).isEqualTo(273.15);
        assertThat(Region2.lowestKelvinAt(611)).isEqualTo(273.15);
        assertThat(Region2.lowestKelvinAt(611.213)).isEqualTo(Saturation.kelvinAt(611.213));
        assertThat(Region2.lowestKelvinAt(1e5)).isEqualTo(Saturation.kelvinAt(1e5));
        assertThat(Region2.lowestKelvinAt(50e6)).isEqualTo(Boundary23.kelvinAt(50e6));
        assertThatThrownBy(() -> Region2.lowestKelvinAt(0.5)).isInstanceOf(OutOfRangeException.class);
        assertThatThrownBy(() -> Region2.lowestKelvinAt(100.1e6)).isInstanceOf(OutOfRangeException.class);
    }

    /** IAPWS R7-97(2012), section 4: the boundary runs from saturation at 623.15 K to 100 MPa at 863.15 K. */
    @Test
    void boundsSteamBetween62315And86315Kelvin() {
        assertThat(Boundary23.LOWEST_PASCAL).isCloseTo(Saturation.pascalAt(623.15), within(1.0));
        assertThat(Boundary23.kelvinAt(100e6)).isCloseTo(863.15, within(1e-5));
        assertThatThrownBy(() -> Boundary23.pascalAt(623.14))
                .hasMessage("boundary 2/3: temperature 623.14 K lies outside 623.15 to 863.15 K");
        assertThatThrownBy(() -> Boundary23.pascalAt(863.16)).isInstanceOf(OutOfRangeException.class);
        assertThatThrownBy(() -> Boundary23.kelvinAt(16.5e6)).isInstanceOf(OutOfRangeException.class);
        assertThatThrownBy(() -> Boundary23.kelvinAt(Double.NaN))
                .hasMessageStartingWith("boundary 2/3: absolute pressure NaN Pa lies outside");
    }

    @Test
    void refusesACoefficientTableOutOfOrder() {
        assertThatThrownBy(() -> new PowerSum(new PowerSum.Term(2, 0, 0, 1))).hasMessage("row 1 is numbered 2");
    }

    @Property
    void enthalpyIsInternalEnergyAndFlowWork(@ForAll("anyState") SinglePhase state) {
        assertThat(state.enthalpyJoulePerKilogram())
                .isCloseTo(
                        state.internalEnergyJoulePerKilogram() + state.pascal() * state.cubicMetrePerKilogram(),
                        within(1e-12 * 4e6));
    }

    /** dg/dT = -s and dg/dp = v with g = h - T s, by central differences. */
    @Property
    void entropyAndVolumeAreSlopesOfTheGibbsEnergy(@ForAll("anyState") SinglePhase state) {
        double dT = 1e-3;
        double dp = 1e-4 * state.pascal();
        double byKelvin = (gibbs(neighbour(state, dT, 0)) - gibbs(neighbour(state, -dT, 0))) / (2 * dT);
        double byPascal = (gibbs(neighbour(state, 0, dp)) - gibbs(neighbour(state, 0, -dp))) / (2 * dp);
        assertThat(-byKelvin).isCloseTo(state.entropyJoulePerKilogramKelvin(), within(1e-2));
        double v = state.cubicMetrePerKilogram();
        assertThat(byPascal).isCloseTo(v, within(1e-6 * v + 2e-9 / dp));
    }

    /** c_p = dh/dT at constant pressure, by central differences. */
    @Property
    void heatCapacityIsTheSlopeOfTheEnthalpy(@ForAll("anyState") SinglePhase state) {
        double dT = 1e-2;
        double slope = (neighbour(state, dT, 0).enthalpyJoulePerKilogram()
                        - neighbour(state, -dT, 0).enthalpyJoulePerKilogram())
                / (2 * dT);
        assertThat(state.isobaricHeatJoulePerKilogramKelvin()).isCloseTo(slope, within(1e-5 * slope));
    }

    /** Maxwell: (dv/dT)_p = -(ds/dp)_T, by central differences. */
    @Property
    void volumeAndEntropyMoveAsMaxwellSays(@ForAll("anyState") SinglePhase state) {
        double dT = 1e-2;
        double dp = 1e-3 * state.pascal();
        double expansion = (neighbour(state, dT, 0).cubicMetrePerKilogram()
                        - neighbour(state, -dT, 0).cubicMetrePerKilogram())
                / (2 * dT);
        double entropySlope = (neighbour(state, 0, dp).entropyJoulePerKilogramKelvin()
                        - neighbour(state, 0, -dp).entropyJoulePerKilogramKelvin())
                / (2 * dp);
        assertThat(expansion).isCloseTo(-entropySlope, within(2e-5 * Math.abs(expansion) + 1e-8 / dp + 1e-12));
    }

    @Property
    void heatsAndGivesWayAsAnySubstanceDoes(@ForAll("anyState") SinglePhase state) {
        SinglePhase warmer = neighbour(state, 0.1, 0);
        SinglePhase pressed = neighbour(state, 0, 0.01 * state.pascal());
        assertThat(warmer.enthalpyJoulePerKilogram()).isGreaterThan(state.enthalpyJoulePerKilogram());
        assertThat(warmer.entropyJoulePerKilogramKelvin()).isGreaterThan(state.entropyJoulePerKilogramKelvin());
        assertThat(pressed.cubicMetrePerKilogram()).isLessThan(state.cubicMetrePerKilogram());
    }

    @Provide
    Arbitrary<SinglePhase> anyState() {
        Arbitrary<Double> share = Arbitraries.doubles().between(0.05, 0.95).ofScale(6);
        Arbitrary<SinglePhase> liquid = Combinators.combine(
                        Arbitraries.doubles().between(274, 600), share)
                .as((kelvin, part) -> {
                    double low = Saturation.pascalAt(kelvin);
                    return Region1.at(kelvin, low + part * (Region1.HIGHEST_PASCAL - low));
                });
        Arbitrary<SinglePhase> steam = Combinators.combine(Arbitraries.doubles().between(274, 1070), share)
                .as((kelvin, part) -> Region2.at(kelvin, Math.max(10, part * Region2.highestPascalAt(kelvin))));
        return Arbitraries.oneOf(liquid, steam);
    }

    private static SinglePhase neighbour(SinglePhase state, double stepKelvin, double stepPascal) {
        boolean steam = state.pascal() < 0.99 * Region2.highestPascalAt(state.kelvin());
        return steam
                ? Region2.unguarded(state.kelvin() + stepKelvin, state.pascal() + stepPascal)
                : Region1.unguarded(state.kelvin() + stepKelvin, state.pascal() + stepPascal);
    }

    private static double gibbs(SinglePhase state) {
        return state.enthalpyJoulePerKilogram() - state.kelvin() * state.entropyJoulePerKilogramKelvin();
    }

    private static SinglePhase at(int region, double kelvin, double pascal) {
        return region == 1 ? Region1.at(kelvin, pascal) : Region2.at(kelvin, pascal);
    }
}
