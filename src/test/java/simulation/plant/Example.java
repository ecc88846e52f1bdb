package simulation.plant;

import java.io.BufferedReader;
import java.io.IOException;
import java.io.InputStreamReader;
import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import org.assertj.core.data.Percentage;

/** A worked example of the first law from the reference values. */
final class Example {

    static final Percentage CLOSE = Percentage.withPercentage(0.5);

    private final Map<String, Double> values = new TreeMap<>();

    Example(String letter) throws IOException {
        try (BufferedReader lines = new BufferedReader(new InputStreamReader(
                Example.class.getResourceAsStream("/reference/first-law-examples.csv"), StandardCharsets.UTF_8))) {
            lines.lines()
                    .filter(line -> line.startsWith(letter + ";"))
                    .map(line -> List.of(line.split(";", -1)))
                    .forEach(cells -> values.put(cells.get(2), Double.parseDouble(cells.get(3))));
        }
    }

    double value(String quantity) {
        return values.get(quantity);
    }
}
