package simulation;

import java.io.BufferedReader;
import java.io.IOException;
import java.io.InputStreamReader;
import java.nio.charset.StandardCharsets;
import java.util.Map;
import java.util.TreeMap;

/** Saturation pressure from the table of IAPWS-95: the logarithm of pressure runs straight over 1/T between rows. */
final class SteamTable {

    private final TreeMap<Double, Double> logPascal = new TreeMap<>();

    SteamTable() throws IOException {
        try (BufferedReader lines = new BufferedReader(new InputStreamReader(
                SteamTable.class.getResourceAsStream("/reference/saturation-iapws95.csv"), StandardCharsets.UTF_8))) {
            lines.lines()
                    .filter(line -> !line.startsWith("#") && !line.startsWith("T_"))
                    .map(line -> line.split(",", -1))
                    .forEach(row -> logPascal.put(
                            Double.parseDouble(row[0]), StrictMath.log(Double.parseDouble(row[1]) * 1e3)));
        }
    }

    double pascalAt(double celsius) {
        Map.Entry<Double, Double> below = logPascal.floorEntry(celsius);
        Map.Entry<Double, Double> above = logPascal.higherEntry(celsius);
        double x = 1 / (celsius + 273.15);
        double x0 = 1 / (below.getKey() + 273.15);
        double x1 = 1 / (above.getKey() + 273.15);
        return StrictMath.exp(below.getValue() + (above.getValue() - below.getValue()) * (x - x0) / (x1 - x0));
    }
}
