package simulation;

import java.math.BigDecimal;
import java.math.RoundingMode;
import java.util.Locale;

/** Words and numbers as plans and run sheets write them. */
final class Names {

    private Names() {}

    static String of(Enum<?> constant) {
        return constant.name().toLowerCase(Locale.ROOT).replace('_', '-');
    }

    static String number(double value, int decimals) {
        return new BigDecimal(value).setScale(decimals, RoundingMode.HALF_UP).toPlainString();
    }
}
