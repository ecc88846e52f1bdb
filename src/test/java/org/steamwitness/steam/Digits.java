package org.steamwitness.steam;

import java.math.BigDecimal;
import java.math.MathContext;

/** Prints a value to the nine significant digits of the verification tables. */
final class Digits {

    private static final MathContext NINE = new MathContext(9);

    private Digits() {}

    static String nine(double value) {
        return new BigDecimal(value).round(NINE).stripTrailingZeros().toPlainString();
    }
}
