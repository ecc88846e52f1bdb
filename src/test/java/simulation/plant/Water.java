package simulation.plant;

import java.io.BufferedReader;
import java.io.IOException;
import java.io.InputStreamReader;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.List;

/**
 * Water from the saturation table of IAPWS-95 alone. Splines run through the rows at every five degrees; the rows
 * between are left out, for tests. Dry steam follows p v = R T (1 + B(T)/v), with B and the energy of the dilute vapour
 * taken from the saturated rows, so that it joins the saturation line without a step and p and u agree with each other
 * (du/dv at constant T is T dp/dT - p). In chambers, up to 5 bar and 180 degC, pressures are good to 0.2 % and energies to
 * 5 kJ/kg. Degrees Celsius, pascal, cubic metre per kilogram, joule per kilogram.
 */
public final class Water {

    /** Gas constant of water in J/(kg K), as IAPWS-95 has it. */
    public static final double GAS_CONSTANT = 461.51805;

    /** Where the table ends. */
    public static final double WARMEST = 200;

    private static final double ZERO = 273.15;
    private static final double DILUTE_HEAT = 1480;

    private final Spline logPascal;
    private final Spline virial;
    private final Spline liquidVolume;
    private final Spline liquidEnergy;
    private final Spline vapourEnergy;

    /** Reads the table. */
    public Water() {
        List<double[]> rows =
                rows().stream().filter(row -> row[0] < 1 || row[0] % 5 == 0).toList();
        int n = rows.size();
        double[] celsius = new double[n];
        double[] inverse = new double[n];
        double[] ln = new double[n];
        double[] b = new double[n];
        double[] vf = new double[n];
        double[] uf = new double[n];
        double[] ug = new double[n];
        for (int i = 0; i < n; i++) {
            double[] row = rows.get(i);
            celsius[i] = row[0];
            inverse[i] = -1 / (row[0] + ZERO);
            ln[i] = StrictMath.log(row[1] * 1e3);
            vf[i] = row[2];
            b[i] = row[3] * (row[1] * 1e3 * row[3] / (GAS_CONSTANT * (row[0] + ZERO)) - 1);
            uf[i] = row[4] * 1e3;
            ug[i] = row[5] * 1e3;
        }
        logPascal = new Spline(inverse, ln);
        virial = new Spline(celsius, b);
        liquidVolume = new Spline(celsius, vf);
        liquidEnergy = new Spline(celsius, uf);
        vapourEnergy = new Spline(celsius, ug);
    }

    /** Every row of the table: T in degC, p in kPa, vf, vg in m3/kg, uf, ug, hf, hfg, hg in kJ/kg. */
    static List<double[]> rows() {
        try (BufferedReader lines = new BufferedReader(new InputStreamReader(
                Water.class.getResourceAsStream("/reference/saturation-iapws95.csv"), StandardCharsets.UTF_8))) {
            return lines.lines()
                    .filter(line -> !line.startsWith("#") && !line.startsWith("T_"))
                    .map(line -> List.of(line.split(",", -1)).stream()
                            .mapToDouble(Double::parseDouble)
                            .toArray())
                    .toList();
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    /** Saturation pressure. */
    public double pascal(double celsius) {
        return StrictMath.exp(logPascal.at(-1 / (celsius + ZERO)));
    }

    /** Saturation temperature. */
    public double celsius(double pascal) {
        double aim = StrictMath.log(pascal);
        double x = -1 / (ZERO + 100);
        for (int i = 0; i < 60; i++) {
            double step = (logPascal.at(x) - aim) / logPascal.slope(x);
            x -= step;
            if (Math.abs(step) < 1e-15) {
                break;
            }
        }
        return -1 / x - ZERO;
    }

    /** Volume of saturated liquid. */
    public double vf(double celsius) {
        return liquidVolume.at(celsius);
    }

    /** Volume of saturated vapour. */
    public double vg(double celsius) {
        double density = pascal(celsius) / (GAS_CONSTANT * (celsius + ZERO));
        return (1 + Math.sqrt(1 + 4 * virial.at(celsius) * density)) / (2 * density);
    }

    /** Internal energy of saturated liquid. */
    public double uf(double celsius) {
        return liquidEnergy.at(celsius);
    }

    /** Internal energy of saturated vapour. */
    public double ug(double celsius) {
        return vapourEnergy.at(celsius);
    }

    /** Enthalpy of saturated liquid. */
    public double hf(double celsius) {
        return uf(celsius) + pascal(celsius) * vf(celsius);
    }

    /** Enthalpy of saturated vapour. */
    public double hg(double celsius) {
        return ug(celsius) + pascal(celsius) * vg(celsius);
    }

    /** Temperature of saturated liquid of an enthalpy. */
    public double celsiusOfLiquid(double joulePerKg) {
        double celsius = joulePerKg / 4200;
        for (int i = 0; i < 40; i++) {
            double step = (hf(celsius) - joulePerKg) / (liquidEnergy.slope(celsius) + 30);
            celsius -= step;
            if (Math.abs(step) < 1e-10) {
                break;
            }
        }
        return celsius;
    }

    /** Pressure of dry steam. */
    public double dryPascal(double celsius, double volume) {
        return GAS_CONSTANT * (celsius + ZERO) / volume * (1 + virial.at(celsius) / volume);
    }

    /** Internal energy of dry steam. */
    public double dryEnergy(double celsius, double volume) {
        return diluteEnergy(celsius) - pull(celsius) / volume;
    }

    /** Enthalpy of dry steam of a pressure, as a boiler with a superheater sends it. */
    public double dryEnthalpy(double celsius, double pascal) {
        double density = pascal / (GAS_CONSTANT * (celsius + ZERO));
        double volume = (1 + Math.sqrt(1 + 4 * virial.at(celsius) * density)) / (2 * density);
        return dryEnergy(celsius, volume) + pascal * volume;
    }

    private double diluteEnergy(double celsius) {
        double inside = Math.min(celsius, WARMEST);
        return ug(inside) + pull(inside) / vg(inside) + DILUTE_HEAT * (celsius - inside);
    }

    /** R T^2 dB/dT: what the molecules' pull takes from the energy, times the volume. */
    private double pull(double celsius) {
        double kelvin = celsius + ZERO;
        return GAS_CONSTANT * kelvin * kelvin * virial.slope(celsius);
    }
}
