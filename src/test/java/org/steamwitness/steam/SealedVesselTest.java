package org.steamwitness.steam;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.constraints.DoubleRange;
import net.jqwik.api.constraints.Scale;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvFileSource;
import org.junit.jupiter.params.provider.CsvSource;
import org.steamwitness.steam.VesselState.Phase;

/** Values of "the examples" stand in reference/first-law-examples.csv: energies hold to 0.3 kJ, others to 0.1 %. */
class SealedVesselTest {

    private static final double PASCAL_PER_PSI = 6894.757293168;
    private static final double ATMOSPHERE = 101325;

    private final FirstLawExamples examples = new FirstLawExamples();

    /** Example A: 0.5 kg of water without air in 0.025 m3, from 20 to 121.1 degC. */
    @Test
    void heatsWaterWithoutAir() {
        SealedVessel vessel = SealedVessel.withoutAir(0.025, 0.5);
        VesselState cold = vessel.atKelvin(293.15);
        VesselState hot = vessel.atKelvin(394.25);
        assertThat(vessel.cubicMetrePerKilogram()).isCloseTo(examples.value("A v"), within(1e-15));
        assertThat(cold.phase()).isEqualTo(Phase.WET);
        assertThat(cold.quality()).isCloseTo(examples.value("A x1"), within(1e-6));
        assertThat(hot.quality()).isCloseTo(examples.value("A x2"), within(5e-5));
        assertThat(hot.totalPascal() / 1000).isCloseTo(examples.value("A p2"), within(0.05));
        assertThat(hot.airPascal()).isZero();
        assertThat(hot.airJoule()).isZero();
        assertThat((hot.waterJoule() - cold.waterJoule()) / 1000).isCloseTo(examples.value("A Q"), within(0.26));
    }

    /** Example B: 0.1 kg in 0.1 m3 from 60 to 140 degC dries out on the way and superheats. */
    @Test
    void driesOutAndSuperheats() {
        SealedVessel vessel = SealedVessel.withoutAir(0.1, 0.1);
        double dryOut = vessel.dryOutKelvin().orElseThrow();
        VesselState cold = vessel.atKelvin(333.15);
        VesselState dry = vessel.atKelvin(dryOut);
        VesselState hot = vessel.atKelvin(413.15);
        assertThat(cold.quality()).isCloseTo(examples.value("B x1"), within(1e-4));
        assertThat(dryOut - 273.15).isCloseTo(examples.value("B T_dryout"), within(0.01));
        assertThat(dry.totalPascal() / 1000).isCloseTo(examples.value("B p_dryout"), within(0.05));
        assertThat(dry.quality()).isCloseTo(1, within(1e-9));
        assertThat(hot.phase()).isEqualTo(Phase.SUPERHEATED);
        assertThat(hot.quality()).isEqualTo(1);
        assertThat(hot.gasCubicMetre()).isEqualTo(0.1);
        assertThat(hot.steamPascal() / 1000).isCloseTo(examples.value("B p2"), within(0.05));
        assertThat(SteamAir.departureKelvin(hot.kelvin(), hot.totalPascal()))
                .isCloseTo(examples.value("B superheat"), within(0.02));
        assertThat((dry.waterJoule() - cold.waterJoule()) / 1000)
                .isCloseTo(examples.value("B Q_to_dryout"), within(0.2));
        assertThat((hot.waterJoule() - cold.waterJoule()) / 1000).isCloseTo(examples.value("B Q"), within(0.2));
    }

    /** Example C: air shut in at 20 degC and 101.325 kPa above 0.3 kg of water in 0.02 m3, heated to 115 degC. */
    @Test
    void keepsTheAirInTheVapourSpace() {
        SealedVessel vessel = SealedVessel.withoutAir(0.02, 0.3).closedAt(293.15, ATMOSPHERE);
        VesselState cold = vessel.atKelvin(293.15);
        VesselState hot = vessel.atKelvin(388.15);
        assertThat(vessel.airKilogram()).isCloseTo(examples.value("C m_air"), within(2e-6));
        assertThat(cold.quality()).isCloseTo(examples.value("C x1"), within(1e-6));
        assertThat(cold.gasCubicMetre()).isCloseTo(examples.value("C gas_volume1"), within(1e-7));
        assertThat(cold.airPascal() / 1000).isCloseTo(examples.value("C p_air1"), within(0.01));
        assertThat(cold.totalPascal()).isCloseTo(ATMOSPHERE, within(1e-6));
        assertThat(hot.quality()).isCloseTo(examples.value("C x2"), within(6e-5));
        assertThat(hot.gasCubicMetre()).isCloseTo(examples.value("C gas_volume2"), within(1e-7));
        assertThat(hot.steamPascal() / 1000).isCloseTo(examples.value("C p_steam2"), within(0.04));
        assertThat(hot.airPascal() / 1000).isCloseTo(examples.value("C p_air2"), within(0.01));
        assertThat(hot.totalPascal() / 1000).isCloseTo(examples.value("C p_total2"), within(0.05));
        assertThat(SteamAir.departureKelvin(hot.kelvin(), hot.totalPascal()))
                .isCloseTo(examples.value("C T_minus_Tsat"), within(0.01));
        assertThat(SteamAir.airMoleFraction(hot.kelvin(), hot.totalPascal()))
                .isCloseTo(examples.value("C y_air_equiv"), within(5e-4));
        assertThat((hot.waterJoule() - cold.waterJoule()) / 1000).isCloseTo(examples.value("C Q_water"), within(0.15));
        assertThat((hot.airJoule() - cold.airJoule()) / 1000).isCloseTo(examples.value("C Q_air"), within(0.0015));
    }

    /** Example C from its total pressure: the temperature is 115 degC within 0.01 K. */
    @Test
    void findsTheTemperatureFromTheTotalPressure() {
        SealedVessel vessel = new SealedVessel(0.02, 0.3, examples.value("C m_air"));
        VesselState hot = vessel.atPascal(examples.value("C p_total2") * 1000);
        assertThat(hot.kelvin()).isCloseTo(388.15, within(0.01));
        assertThat(hot.phase()).isEqualTo(Phase.WET);
        assertThat(hot.totalPascal()).isCloseTo(examples.value("C p_total2") * 1000, within(1e-5));
    }

    /** Examples A and B from their pressures, without air: 121.1 degC wet, 140 degC superheated. */
    @Test
    void findsTheTemperatureFromThePressureOfSteamAlone() {
        VesselState wet = SealedVessel.withoutAir(0.025, 0.5).atPascal(examples.value("A p2") * 1000);
        assertThat(wet.kelvin()).isCloseTo(394.25, within(0.01));
        assertThat(wet.quality()).isCloseTo(examples.value("A x2"), within(5e-5));
        VesselState dry = SealedVessel.withoutAir(0.1, 0.1).atPascal(examples.value("B p2") * 1000);
        assertThat(dry.phase()).isEqualTo(Phase.SUPERHEATED);
        assertThat(dry.kelvin()).isCloseTo(413.15, within(0.1));
    }

    /** Example D: a pot of 0.012 m3 at 115 degC with 1.0 and 0.8 kg; what was vented carried h_g. */
    @Test
    void ventsAPotAtConstantTemperature() {
        VesselState before = SealedVessel.withoutAir(0.012, 1.0).atKelvin(388.15);
        VesselState after = SealedVessel.withoutAir(0.012, 0.8).atKelvin(388.15);
        double vented = 0.2 * Saturated.atKelvin(388.15).vapour().enthalpyJoulePerKilogram();
        assertThat(before.waterJoule() / 1000).isCloseTo(examples.value("D U1"), within(0.3));
        assertThat(after.waterJoule() / 1000).isCloseTo(examples.value("D U2"), within(0.3));
        assertThat(vented / 1000).isCloseTo(examples.value("D H_out"), within(0.3));
        assertThat((after.waterJoule() - before.waterJoule() + vented) / 1000)
                .isCloseTo(examples.value("D Q"), within(0.3));
    }

    /** Example F: dry saturated steam of 134 degC shut into 0.1 m3 and cooled to 40 degC. */
    @Test
    void condensesWhatIsShutIn() {
        double mass = 0.1 / Saturated.atKelvin(407.15).vapour().cubicMetrePerKilogram();
        SealedVessel vessel = SealedVessel.withoutAir(0.1, mass);
        VesselState hot = vessel.atKelvin(407.15);
        VesselState cold = vessel.atKelvin(313.15);
        assertThat(mass).isCloseTo(examples.value("F m"), within(2e-4 * mass));
        assertThat(cold.totalPascal() / 1000).isCloseTo(examples.value("F p2"), within(0.002));
        assertThat(cold.quality()).isCloseTo(examples.value("F x2"), within(1e-5));
        assertThat(mass * (1 - cold.quality())).isCloseTo(examples.value("F condensate"), within(1e-4));
        assertThat((cold.waterJoule() - hot.waterJoule()) / 1000).isCloseTo(examples.value("F Q"), within(0.3));
    }

    /**
     * Example G: an evacuated chamber of 0.1 m3 with 30 kg of steel (0.50 kJ/(kg K), 60 degC) is filled with saturated
     * steam of 134 degC: m_in h_g = U + Q_wall, with V = m_v v_g + m_c v_f.
     */
    @Test
    void fillsAColdChamber() {
        Saturated line = Saturated.atKelvin(407.15);
        SinglePhase f = line.liquid();
        SinglePhase g = line.vapour();
        double wallJoule = 30 * 500 * (134 - 60);
        double vapourLoss = g.internalEnergyJoulePerKilogram() - g.enthalpyJoulePerKilogram();
        double liquidLoss = f.internalEnergyJoulePerKilogram() - g.enthalpyJoulePerKilogram();
        double vapourPerLiquid = f.cubicMetrePerKilogram() / g.cubicMetrePerKilogram();
        double condensate = (wallJoule + 0.1 / g.cubicMetrePerKilogram() * vapourLoss)
                / (vapourPerLiquid * vapourLoss - liquidLoss);
        double massIn = 0.1 / g.cubicMetrePerKilogram() + condensate * (1 - vapourPerLiquid);
        assertThat(wallJoule / 1000).isEqualTo(examples.value("G wall_heat"));
        assertThat(condensate).isCloseTo(examples.value("G m_condensate"), within(2e-4));
        assertThat(massIn).isCloseTo(examples.value("G m_in"), within(2e-4));
        VesselState full = SealedVessel.withoutAir(0.1, massIn).atKelvin(407.15);
        assertThat(full.quality() * massIn).isCloseTo(examples.value("G m_vapour"), within(5e-5));
        assertThat(massIn * g.enthalpyJoulePerKilogram() - full.waterJoule()).isCloseTo(wallJoule, within(1.0));
        assertThat(wallJoule / line.evaporationJoulePerKilogram())
                .isCloseTo(examples.value("G simple_condensate_Cw_over_hfg"), within(1e-4));
    }

    /**
     * Heated air in the gauge table (reference/steam-air-gauge-table.csv, column heated_air_degC): dry air trapped at 20
     * degC, at (1 - f) of an atmosphere, in a chamber whose last drop of water evaporates at that temperature.
     */
    @ParameterizedTest(name = "{0} psi on the gauge, {1} of the air discharged")
    @CsvFileSource(resources = "/reference/steam-air-gauge-table.csv", useHeadersInDisplayName = true)
    void heatsItsAirAlong(double psi, double discharged, double table, double convention, double heatedAir) {
        double trapped = (1 - discharged) * ATMOSPHERE / (287.055 * 293.15);
        double water = 1 / Saturated.atKelvin(heatedAir + 273.15).vapour().cubicMetrePerKilogram();
        VesselState state = new SealedVessel(1, water * 1.002, trapped).atPascal(psi * PASCAL_PER_PSI + ATMOSPHERE);
        assertThat(state.phase()).isEqualTo(Phase.WET);
        assertThat(state.kelvin() - 273.15).isCloseTo(heatedAir, within(0.015));
    }

    /** IAPWS-95 (reference/saturation-iapws95.csv): a vessel of v_g dries out at that temperature, within 0.01 K. */
    @ParameterizedTest(name = "{3} m3/kg dries out at {0} degC")
    @CsvFileSource(resources = "/reference/saturation-iapws95.csv", useHeadersInDisplayName = true)
    void driesOutWhereTheVapourFillsIt(double celsius, double kilopascal, double vf, double vg) {
        assertThat(SealedVessel.withoutAir(vg, 1).dryOutKelvin().orElseThrow())
                .isCloseTo(celsius + 273.15, within(0.01));
    }

    /** IAPWS-95 (rows of the same file): a vessel of v_f fills with liquid there; 3e-5 of v_f is up to 0.06 K. */
    @ParameterizedTest(name = "{1} m3/kg is full of liquid at {0} degC")
    @CsvSource({"60, 0.0010171282", "80, 0.0010290541", "100, 0.0010434611", "121.1, 0.0010613259", "150, 0.0010905033"
    })
    void fillsWithLiquidWhereTheLiquidSwells(double celsius, double vf) {
        SealedVessel vessel = SealedVessel.withoutAir(vf, 1);
        double full = vessel.liquidFullKelvin().orElseThrow();
        assertThat(full).isCloseTo(celsius + 273.15, within(0.06));
        assertThat(vessel.dryOutKelvin()).isEmpty();
        assertThat(vessel.atKelvin(full - 0.01).phase()).isEqualTo(Phase.WET);
        assertThatThrownBy(() -> vessel.atKelvin(full + 0.01))
                .isInstanceOfSatisfying(
                        LiquidFullException.class,
                        e -> assertThat(e.fullKelvin()).isEqualTo(full));
    }

    @Test
    void warnsThatThePressureTurnsHydraulic() {
        SealedVessel vessel = SealedVessel.withoutAir(0.00110, 1);
        double full = vessel.liquidFullKelvin().orElseThrow();
        assertThatThrownBy(() -> vessel.atKelvin(450))
                .isInstanceOf(LiquidFullException.class)
                .hasMessage("liquid fills the vessel at " + full
                        + " K, with 0.0011 m3 for each kilogram of water; from there on the pressure is hydraulic");
        assertThatThrownBy(() -> vessel.atPascal(1e6)).isInstanceOf(LiquidFullException.class);
        assertThatThrownBy(() -> vessel.closedAt(450, 1e6)).isInstanceOf(LiquidFullException.class);
        double oneKelvinOn =
                Region1.at(full + 1, Saturation.pascalAt(full) + 1e6).cubicMetrePerKilogram();
        assertThat(oneKelvinOn).isGreaterThan(0.00110);
    }

    @Test
    void compressesItsAirBeforeTheLiquidFillsIt() {
        SealedVessel vessel = SealedVessel.withoutAir(0.00110, 1).closedAt(293.15, ATMOSPHERE);
        double full = vessel.liquidFullKelvin().orElseThrow();
        VesselState state = vessel.atPascal(10e6);
        assertThat(state.totalPascal()).isCloseTo(10e6, within(1.0));
        assertThat(state.kelvin()).isBetween(full - 10, full);
        assertThatThrownBy(() -> vessel.atKelvin(full - 1e-3))
                .isInstanceOf(OutOfRangeException.class)
                .hasMessageStartingWith("sealed vessel: absolute pressure");
    }

    @Test
    void isOfOneMindAboutTheEdges() {
        double vg = Saturated.atKelvin(394.25).vapour().cubicMetrePerKilogram();
        assertThat(SealedVessel.withoutAir(vg, 1).atKelvin(394.25).phase()).isEqualTo(Phase.WET);
        assertThat(SealedVessel.withoutAir(vg * 1.0001, 1).atKelvin(394.25).phase())
                .isEqualTo(Phase.SUPERHEATED);
        double vf = Saturated.atKelvin(394.25).liquid().cubicMetrePerKilogram();
        assertThatThrownBy(() -> SealedVessel.withoutAir(vf, 1).atKelvin(394.25))
                .isInstanceOf(LiquidFullException.class);
        double coldest = Saturated.atKelvin(273.15).vapour().cubicMetrePerKilogram();
        double hottest = Saturated.atKelvin(623.15).vapour().cubicMetrePerKilogram();
        double fullest = Saturated.atKelvin(623.15).liquid().cubicMetrePerKilogram();
        assertThat(SealedVessel.withoutAir(coldest, 1).dryOutKelvin()).hasValue(273.15);
        assertThat(SealedVessel.withoutAir(hottest, 1).dryOutKelvin()).hasValue(623.15);
        assertThat(SealedVessel.withoutAir(fullest, 1).liquidFullKelvin()).hasValue(623.15);
        assertThat(SealedVessel.withoutAir(300, 1).dryOutKelvin()).isEmpty();
        assertThat(SealedVessel.withoutAir(0.005, 1).dryOutKelvin()).isEmpty();
        assertThat(SealedVessel.withoutAir(0.005, 1).liquidFullKelvin()).isEmpty();
        assertThat(SealedVessel.withoutAir(0.005, 1).atKelvin(623.15).phase()).isEqualTo(Phase.WET);
        assertThat(SealedVessel.withoutAir(300, 1).atKelvin(273.15).phase()).isEqualTo(Phase.SUPERHEATED);
        assertThat(SealedVessel.withoutAir(300, 1).atPascal(500).kelvin()).isCloseTo(325, within(0.1));
    }

    /** All air: p V = m R T (first-law-examples.csv gives R = 0.287055 and c_v = 0.718 kJ/(kg K)). */
    @Test
    void holdsAlmostAirAlone() {
        SealedVessel vessel = new SealedVessel(1, 1e-5, 1.2);
        VesselState state = vessel.atKelvin(373.15);
        assertThat(state.airPascal()).isCloseTo(1.2 * 287.055 * 373.15, within(1e-6));
        assertThat(state.totalPascal()).isCloseTo(1.2 * 287.055 * 373.15, within(2.0));
        assertThat(state.airJoule()).isCloseTo(1.2 * 718 * (373.15 - 273.16), within(1e-6));
        assertThat(vessel.atPascal(state.totalPascal()).kelvin()).isCloseTo(373.15, within(1e-9));
    }

    @ParameterizedTest(name = "{0} m3, {1} kg of water, {2} kg of air")
    @CsvSource({
        "0, 1, 0",
        "-1, 1, 0",
        "NaN, 1, 0",
        "Infinity, 1, 0",
        "1, 0, 0",
        "1, -1, 0",
        "1, NaN, 0",
        "1, 1, -0.001",
        "1, 1, NaN",
        "1, 1, Infinity",
        "0.001, 1, 0",
        "1, 1e-6, 0"
    })
    void refusesAChargeThatNoTemperatureHas(double cubicMetre, double water, double air) {
        assertThatThrownBy(() -> new SealedVessel(cubicMetre, water, air)).isInstanceOf(OutOfRangeException.class);
    }

    @Test
    void namesTheRangeOfTheCharge() {
        double least = Saturated.atKelvin(273.15).liquid().cubicMetrePerKilogram();
        assertThatThrownBy(() -> SealedVessel.withoutAir(0.001, 1))
                .hasMessage("free volume for each kilogram of water 0.001 m3/kg lies outside " + least + " to "
                        + Region2.at(273.15, 1).cubicMetrePerKilogram() + " m3/kg");
        assertThatThrownBy(() -> SealedVessel.withoutAir(least, 1)).isInstanceOf(OutOfRangeException.class);
        assertThat(SealedVessel.withoutAir(Region2.at(273.15, 1).cubicMetrePerKilogram(), 1)
                        .atKelvin(273.15)
                        .steamPascal())
                .isEqualTo(1);
    }

    @Test
    void refusesTemperaturesAndPressuresOutsideItsRange() {
        SealedVessel alone = SealedVessel.withoutAir(0.025, 0.5);
        SealedVessel withAir = alone.closedAt(293.15, ATMOSPHERE);
        assertThatThrownBy(() -> alone.atKelvin(273.1)).isInstanceOf(OutOfRangeException.class);
        assertThatThrownBy(() -> alone.atKelvin(Double.NaN)).isInstanceOf(OutOfRangeException.class);
        assertThatThrownBy(() -> alone.atPascal(Double.NaN)).isInstanceOf(OutOfRangeException.class);
        assertThatThrownBy(() -> alone.atPascal(600)).isInstanceOf(OutOfRangeException.class);
        assertThatThrownBy(() -> alone.atPascal(16.6e6)).isInstanceOf(OutOfRangeException.class);
        assertThatThrownBy(() -> withAir.atPascal(Double.NaN)).isInstanceOf(OutOfRangeException.class);
        assertThatThrownBy(() -> withAir.atPascal(9e4))
                .isInstanceOf(OutOfRangeException.class)
                .hasMessage("sealed vessel with air: absolute pressure 90000.0 Pa lies outside "
                        + withAir.atKelvin(277.15).totalPascal() + " to "
                        + withAir.atKelvin(623.15).totalPascal() + " Pa");
        assertThatThrownBy(() -> SealedVessel.withoutAir(1, 1).atPascal(3e5))
                .hasMessage("sealed vessel: temperature "
                        + Superheated.ofPascalVolume(3e5, 1).kelvin() + " K lies outside 273.15 to 623.15 K");
        SealedVessel dry = new SealedVessel(1, 0.1, 1);
        assertThatThrownBy(() -> dry.atPascal(2e6))
                .isInstanceOf(OutOfRangeException.class)
                .hasMessage("sealed vessel with air: absolute pressure 2000000.0 Pa lies outside "
                        + dry.atKelvin(277.15).totalPascal() + " to "
                        + dry.atKelvin(623.15).totalPascal() + " Pa");
        assertThatThrownBy(() -> alone.closedAt(293.15, 2000))
                .hasMessage("closing: absolute pressure 2000.0 Pa lies outside " + Saturation.pascalAt(293.15) + " to "
                        + Saturated.HIGHEST_PASCAL + " Pa");
        assertThatThrownBy(() -> alone.closedAt(293.15, Double.NaN)).isInstanceOf(OutOfRangeException.class);
        assertThatThrownBy(() -> alone.closedAt(Double.NaN, 1e5)).isInstanceOf(OutOfRangeException.class);
    }

    @Test
    void refusesAStateThatDoesNotFillTheVessel() {
        SealedVessel vessel = SealedVessel.withoutAir(0.025, 0.5);
        assertThatThrownBy(() -> new VesselState(vessel, WetSteam.ofKelvinVolume(394.25, 0.0501)))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessageStartingWith("the vessel holds water of 0.05 m3/kg, the state has 0.0501");
        assertThat(new VesselState(vessel, WetSteam.ofKelvinVolume(394.25, 0.05)).quality())
                .isEqualTo(vessel.atKelvin(394.25).quality());
    }

    @Property
    void theTemperatureComesBackFromTheTotalPressure(
            @ForAll @DoubleRange(min = 277.2, max = 620) double kelvin,
            @ForAll @DoubleRange(min = 0.002, max = 50) @Scale(6) double volume,
            @ForAll @DoubleRange(min = 0, max = 1) @Scale(6) double trapped) {
        double air = 0.01 * trapped * volume * ATMOSPHERE / (287.055 * 293.15);
        SealedVessel vessel = new SealedVessel(0.01 * volume, 0.01, air);
        VesselState state = vessel.atKelvin(Math.min(kelvin, 550));
        assertThat(vessel.atPascal(state.totalPascal()).kelvin()).isCloseTo(state.kelvin(), within(1e-9 * kelvin));
        assertThat(vessel.atKelvin(state.kelvin() + 0.5).totalPascal()).isGreaterThan(state.totalPascal());
        assertThat(state.totalPascal()).isEqualTo(state.steamPascal() + state.airPascal());
    }

    @Property
    void nothingJumpsAtDryOut(@ForAll @DoubleRange(min = 0.05, max = 100) double volume) {
        SealedVessel vessel = new SealedVessel(volume, 1, 0.1 * volume);
        double dryOut = vessel.dryOutKelvin().orElseThrow();
        VesselState before = vessel.atKelvin(dryOut - 1e-5);
        VesselState after = vessel.atKelvin(dryOut + 1e-5);
        assertThat(before.phase()).isEqualTo(Phase.WET);
        assertThat(after.phase()).isEqualTo(Phase.SUPERHEATED);
        assertThat(after.totalPascal()).isCloseTo(before.totalPascal(), within(2e-6 * before.totalPascal()));
        assertThat(after.waterJoule()).isCloseTo(before.waterJoule(), within(5.0));
    }
}
