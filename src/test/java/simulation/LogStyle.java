package simulation;

import java.nio.charset.StandardCharsets;
import java.time.LocalDateTime;
import simulation.logger.Dialect;
import simulation.logger.TimeStyle;
import simulation.logger.Unit;

/** Manners of writing a log, none of them a maker's: invented plants write as they like. */
public enum LogStyle {
    /** ISO time, commas, degC, bar gauge. */
    PLAIN(TimeStyle.ISO, Unit.DEGC, Unit.BAR_GAUGE, "%", ".csv"),
    /** Month first, twelve hours, degF, psi gauge, units in square brackets, a preamble. */
    MONTHS_FIRST(TimeStyle.MONTH_FIRST_12_HOURS, Unit.DEGF, Unit.PSI_GAUGE, "% [#]", ".csv"),
    /** Day first with dots, semicolons, decimal comma, kPa absolute, date and time apart, CRLF. */
    DECIMAL_COMMA(TimeStyle.APART, Unit.DEGC, Unit.KPA_ABSOLUTE, "% in #", ".csv"),
    /** UTF-16 with tabs and a row of units. */
    WIDE(TimeStyle.ISO_SPACE, Unit.DEGC, Unit.KPA_GAUGE, "%", ".csv"),
    /** Seconds since the start, mbar absolute. */
    ELAPSED(TimeStyle.ELAPSED_SECONDS, Unit.DEGC, Unit.MBAR_ABSOLUTE, "% (#)", ".csv"),
    /** Hours, minutes and seconds since the start, kPa absolute. */
    STOPWATCH(TimeStyle.ELAPSED_CLOCK, Unit.DEGC, Unit.KPA_ABSOLUTE, "% (#)", ".csv"),
    /** Day first with slashes, semicolons, points, Windows-1252 with degree signs, kPa absolute, a tail. */
    DEGREE_SIGN(TimeStyle.DAY_FIRST, Unit.DEGC, Unit.KPA_ABSOLUTE, "% / #", ".csv");

    private final TimeStyle time;
    private final Unit temperature;
    private final Unit pressure;
    private final String header;
    private final String extension;

    LogStyle(TimeStyle time, Unit temperature, Unit pressure, String header, String extension) {
        this.time = time;
        this.temperature = temperature;
        this.pressure = pressure;
        this.header = header;
        this.extension = extension;
    }

    Unit temperature() {
        return temperature;
    }

    Unit pressure() {
        return pressure;
    }

    String extension() {
        return extension;
    }

    boolean isElapsed() {
        return time == TimeStyle.ELAPSED_SECONDS || time == TimeStyle.ELAPSED_CLOCK;
    }

    int pressureDecimals() {
        return switch (pressure) {
            case BAR_GAUGE -> 3;
            case MBAR_ABSOLUTE -> 1;
            default -> 2;
        };
    }

    /** An expanded uncertainty as a plan writes it, in the unit of the log. */
    String pressureUncertainty(double pascal) {
        return switch (pressure) {
            case BAR_GAUGE -> Names.number(pascal / 1e5, 4) + " bar";
            case MBAR_ABSOLUTE -> Names.number(pascal / 1e2, 2) + " mbar";
            case PSI_GAUGE -> Names.number(pascal / 6894.757, 3) + " psi";
            default -> Names.number(pascal / 1e3, 3) + " kPa";
        };
    }

    String header(String name, Unit unit) {
        return header.replace("%", name).replace("#", sign(unit));
    }

    /** Unit and, for pressures, datum as a plan writes them. */
    String planUnit(Unit unit) {
        return switch (unit) {
            case DEGC -> "unit: degC";
            case DEGF -> "unit: degF";
            case KPA_ABSOLUTE -> "unit: kPa, datum: absolute";
            case MBAR_ABSOLUTE -> "unit: mbar, datum: absolute";
            case BAR_GAUGE -> "unit: bar, datum: gauge";
            case KPA_GAUGE -> "unit: kPa, datum: gauge";
            case PSI_GAUGE -> "unit: psi, datum: gauge";
            case KILOWATT_HOUR -> "unit: kWh";
        };
    }

    private String sign(Unit unit) {
        String plain = switch (unit) {
            case DEGC -> "degC";
            case DEGF -> "degF";
            case KPA_ABSOLUTE -> "kPa abs";
            case MBAR_ABSOLUTE -> "mbar abs";
            case BAR_GAUGE -> "bar";
            case KPA_GAUGE -> "kPa";
            case PSI_GAUGE -> "psig";
            case KILOWATT_HOUR -> "kWh";
        };
        return this == DEGREE_SIGN ? plain.replace("deg", "\u00b0") : plain;
    }

    Dialect dialect(LocalDateTime start, String unitsRow) {
        Dialect dialect = new Dialect(start, time);
        return switch (this) {
            case PLAIN -> dialect;
            case MONTHS_FIRST ->
                dialect.timeHeader("Date/Time")
                        .preamble("Cookroom logger 4,,,", "Serial,00417,,", "Site,cookroom 2,,", "");
            case DECIMAL_COMMA ->
                dialect.timeHeader("Datum;Uhrzeit").marks(";", ',').windowsLines();
            case WIDE ->
                dialect.timeHeader("time")
                        .marks("\t", '.')
                        .units(unitsRow)
                        .windowsLines()
                        .encoded(StandardCharsets.UTF_16LE, true);
            case ELAPSED -> dialect.timeHeader("elapsed (s)").preamble("# elapsed since trigger");
            case STOPWATCH -> dialect.timeHeader("elapsed (h:mm:ss)");
            case DEGREE_SIGN ->
                dialect.timeHeader("date and time")
                        .marks(";", '.')
                        .windowsLines()
                        .encoded(java.nio.charset.Charset.forName("windows-1252"), false)
                        .tail("End of data");
        };
    }
}
