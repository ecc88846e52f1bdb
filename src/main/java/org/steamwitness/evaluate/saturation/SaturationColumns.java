package org.steamwitness.evaluate.saturation;

import org.steamwitness.steam.Saturation;
import org.steamwitness.trace.Column;

/**
 * Saturation temperature of the measured pressure and its slope, sample by sample: IAPWS-IF97, region 4. NaN where the
 * pressure is missing or lies off the saturation line, such as below the triple point.
 *
 * @param kelvin saturation temperature
 * @param kelvinPerPascal its slope over pressure
 */
record SaturationColumns(Column kelvin, Column kelvinPerPascal) {

    static SaturationColumns of(Column pascal) {
        double[] kelvin = new double[pascal.size()];
        double[] slope = new double[pascal.size()];
        for (int i = 0; i < kelvin.length; i++) {
            double pressure = pascal.at(i);
            boolean onTheLine = pressure >= Saturation.LOWEST_PASCAL && pressure <= Saturation.HIGHEST_PASCAL;
            kelvin[i] = onTheLine ? Saturation.kelvinAt(pressure) : Double.NaN;
            slope[i] = onTheLine ? Saturation.kelvinPerPascalAt(pressure) : Double.NaN;
        }
        return new SaturationColumns(Column.of(kelvin), Column.of(slope));
    }
}
