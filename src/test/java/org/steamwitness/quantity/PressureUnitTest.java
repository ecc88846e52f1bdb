package org.steamwitness.quantity;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.math.BigDecimal;
import java.math.MathContext;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.constraints.DoubleRange;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class PressureUnitTest {

    private static final BigDecimal GRAVITY = new BigDecimal("9.80665");
    private static final BigDecimal INCH = new BigDecimal("0.0254");

    /** SI prefixes, bar = 100 kPa, standard atmosphere 101,325 Pa (10th General Conference, 1954); all exact. */
    @ParameterizedTest
    @CsvSource({
        "PASCAL, 1",
        "HECTOPASCAL, 100",
        "KILOPASCAL, 1000",
        "MEGAPASCAL, 1000000",
        "BAR, 100000",
        "MILLIBAR, 100",
        "STANDARD_ATMOSPHERE, 101325"
    })
    void isExactByDefinition(PressureUnit unit, double pascal) {
        assertThat(unit.toPascal(1)).isEqualTo(pascal);
        assertThat(unit.ofPascal(pascal)).isEqualTo(1);
    }

    /** Pound 0.45359237 kg, standard gravity 9.80665 m/s2 and inch 0.0254 m are exact, so the quotient is as well. */
    @Test
    void thePoundForcePerSquareInchComesFromPoundGravityAndInch() {
        double psi = new BigDecimal("0.45359237")
                .multiply(GRAVITY)
                .divide(INCH.multiply(INCH), MathContext.DECIMAL128)
                .doubleValue();
        assertThat(PressureUnit.PSI.toPascal(1)).isCloseTo(psi, within(1e-12 * psi));
    }

    @Test
    void theKilogramForcePerSquareCentimetreComesFromGravity() {
        double pascal = GRAVITY.multiply(new BigDecimal("1e4")).doubleValue();
        assertThat(PressureUnit.KILOGRAM_FORCE_PER_SQUARE_CENTIMETRE.toPascal(1))
                .isEqualTo(pascal);
    }

    /** Conventional mercury, 13,595.1 kg/m3, under standard gravity; the inch is that of seven-digit tables. */
    @Test
    void theColumnsOfMercuryAreTheConventionalOnes() {
        BigDecimal perMetre = new BigDecimal("13595.1").multiply(GRAVITY);
        assertThat(PressureUnit.MILLIMETRE_OF_MERCURY.toPascal(1))
                .isEqualTo(perMetre.movePointLeft(3).doubleValue());
        double inch = perMetre.multiply(INCH).doubleValue();
        assertThat(PressureUnit.INCH_OF_MERCURY.toPascal(1)).isEqualTo(3386.389).isCloseTo(inch, within(1.1e-7 * inch));
    }

    /** NIST SP 811, appendix B.8, seven digits, typed from memory. */
    @ParameterizedTest
    @CsvSource({
        "PSI, 6.894757e3",
        "KILOGRAM_FORCE_PER_SQUARE_CENTIMETRE, 9.80665e4",
        "STANDARD_ATMOSPHERE, 1.01325e5",
        "MILLIMETRE_OF_MERCURY, 1.333224e2",
        "INCH_OF_MERCURY, 3.386389e3"
    })
    void agreesWithThePrintedTableOfFactors(PressureUnit unit, double pascal) {
        assertThat(new BigDecimal(unit.toPascal(1)).round(new MathContext(7)))
                .isEqualByComparingTo(new BigDecimal(pascal).round(new MathContext(7)));
    }

    @Property
    void comesBackFromPascal(@ForAll PressureUnit unit, @ForAll @DoubleRange(min = -1e5, max = 1e7) double pascal) {
        assertThat(unit.toPascal(unit.ofPascal(pascal))).isCloseTo(pascal, within(1e-12 * Math.abs(pascal)));
    }
}
