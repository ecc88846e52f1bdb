package simulation;

import java.util.ArrayList;
import java.util.List;
import simulation.logger.Unit;

/** The text of a plan, put together line by line. */
final class PlanText {

    private final LogStyle style;
    private final List<String> lines = new ArrayList<>();

    PlanText(LogStyle style) {
        this.style = style;
    }

    /** The head of every plan. */
    PlanText head(String id, String title, String equipment, String process, String medium) {
        lines.add("# Invented plan for invented equipment. No figure here is a scheduled process for anything.");
        lines.add("plan-format: 1");
        lines.add("id: " + id);
        lines.add("title: " + title);
        lines.add("revision: 1");
        lines.add("status: in-force");
        lines.add("basis: {document: SP-" + Math.abs(id.hashCode() % 900) + ", edition: \"2026-01\","
                + " by: process authority, date: 2026-01-20}");
        lines.add("equipment: " + equipment);
        lines.add("process: " + process);
        lines.add("medium: " + medium);
        return this;
    }

    PlanText add(String text) {
        text.lines().forEach(lines::add);
        return this;
    }

    /** A temperature channel whose calibration is good to a fifth of a kelvin. */
    PlanText temperature(String name, String header, String place, String more) {
        lines.add("  - {name: " + name + ", column: \"" + style.header(header, style.temperature())
                + "\", quantity: temperature, place: " + place + ", " + style.planUnit(style.temperature()) + more
                + ",");
        lines.add("     uncertainty: {calibration: 0.2 K, drift: 0.1 K, coverage: 2}, certificate: \"26-"
                + (400 + lines.size()) + "\", due: 2027-01-15}");
        return this;
    }

    /** The pressure channel, with its expanded uncertainty. */
    PlanText pressure(String header, String uncertainty) {
        Unit unit = style.pressure();
        lines.add("  - {name: pressure, column: \"" + style.header(header, unit)
                + "\", quantity: pressure, place: chamber, " + style.planUnit(unit) + ",");
        lines.add("     uncertainty: {calibration: " + uncertainty + ", coverage: 2}, certificate: \"26-"
                + (400 + lines.size()) + "\", due: 2027-01-15}");
        return this;
    }

    @Override
    public String toString() {
        return String.join("\n", lines) + "\n";
    }
}
