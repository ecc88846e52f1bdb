package org.steamwitness.steam;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvFileSource;
import org.steamwitness.steam.PowerSum.Term;

class If97VerificationTest {

    private static final Path REFERENCE = Path.of("src/test/resources/reference");

    /**
     * IAPWS R7-97(2012), Tables 5, 15, 35 and 36 and the boundary pair of section 4 (reference/if97-verification.csv):
     * equal when printed to the nine digits given.
     */
    @ParameterizedTest(name = "region {0}, {1} K, {2} MPa: {3} = {4}")
    @CsvFileSource(resources = "/reference/if97-verification.csv", useHeadersInDisplayName = true)
    void printsTheDigitsOfTheRelease(int region, Double kelvin, Double megapascal, String quantity, double value) {
        double computed = switch (region) {
            case 1 -> property(Region1.at(kelvin, megapascal * 1e6), quantity);
            case 2 -> property(Region2.at(kelvin, megapascal * 1e6), quantity);
            default -> ofTheLines(kelvin, megapascal, quantity);
        };
        assertThat(Digits.nine(computed)).isEqualTo(Digits.nine(value));
    }

    /** IAPWS R7-97(2012), Table 2 (reference/if97-region1.csv), every digit of every row. */
    @Test
    void holdsTheConstantsOfTable2() throws IOException {
        assertThat(Region1.TABLE_2.terms()).isEqualTo(rows("if97-region1.csv"));
    }

    /** IAPWS R7-97(2012), Table 10 (reference/if97-region2-ideal.csv), every digit of every row. */
    @Test
    void holdsTheConstantsOfTable10() throws IOException {
        assertThat(Region2.TABLE_10.terms()).isEqualTo(rows("if97-region2-ideal.csv"));
    }

    /** IAPWS R7-97(2012), Table 11 (reference/if97-region2-residual.csv), every digit of every row. */
    @Test
    void holdsTheConstantsOfTable11() throws IOException {
        assertThat(Region2.TABLE_11.terms()).isEqualTo(rows("if97-region2-residual.csv"));
    }

    private static double ofTheLines(Double kelvin, Double megapascal, String quantity) {
        return switch (quantity) {
            case "psat" -> Saturation.pascalAt(kelvin) / 1e6;
            case "Tsat" -> Saturation.kelvinAt(megapascal * 1e6);
            case "p_boundary" -> Boundary23.pascalAt(kelvin) / 1e6;
            case "T_boundary" -> Boundary23.kelvinAt(megapascal * 1e6);
            default -> throw new IllegalArgumentException(quantity);
        };
    }

    private static double property(SinglePhase state, String quantity) {
        return switch (quantity) {
            case "v" -> state.cubicMetrePerKilogram();
            case "h" -> state.enthalpyJoulePerKilogram() / 1000;
            case "u" -> state.internalEnergyJoulePerKilogram() / 1000;
            case "s" -> state.entropyJoulePerKilogramKelvin() / 1000;
            case "cp" -> state.isobaricHeatJoulePerKilogramKelvin() / 1000;
            case "w" -> state.soundMetrePerSecond();
            default -> throw new IllegalArgumentException(quantity);
        };
    }

    /** Rows "i, I, J, n"; the ideal-gas part has no I. */
    private static List<Term> rows(String file) throws IOException {
        return Files.readAllLines(REFERENCE.resolve(file)).stream()
                .filter(line -> Character.isDigit(line.charAt(0)))
                .map(line -> List.of(line.split(",")))
                .map(cells -> new Term(
                        Integer.parseInt(cells.get(0)),
                        cells.size() == 3 ? 0 : Integer.parseInt(cells.get(1)),
                        Integer.parseInt(cells.get(cells.size() - 2)),
                        Double.parseDouble(cells.get(cells.size() - 1))))
                .toList();
    }
}
