package org.steamwitness.steam;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Map;
import java.util.stream.Collectors;

/**
 * Worked examples of the first law, computed with IAPWS-95 (reference/first-law-examples.csv). Energies hold to 0.1 % or
 * 0.3 kJ, other values to 0.1 %.
 */
final class FirstLawExamples {

    private static final Path FILE = Path.of("src/test/resources/reference/first-law-examples.csv");

    private final Map<String, Double> values;

    FirstLawExamples() {
        try {
            values = Files.readAllLines(FILE).stream()
                    .filter(line -> line.matches("[A-J].*"))
                    .map(line -> line.split(";", -1))
                    .collect(Collectors.toUnmodifiableMap(
                            cells -> cells[0] + " " + cells[2], cells -> Double.parseDouble(cells[3])));
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    /** A value by example and quantity, such as "A x1", in the unit of the file: kPa, kJ/kg, kJ, degC, kg, m3. */
    double value(String exampleAndQuantity) {
        Double value = values.get(exampleAndQuantity);
        if (value == null) {
            throw new IllegalArgumentException("no such value: " + exampleAndQuantity);
        }
        return value;
    }
}
