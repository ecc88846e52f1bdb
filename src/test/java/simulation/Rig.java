package simulation;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import simulation.logger.Column;
import simulation.logger.Instrument;
import simulation.logger.Logger;
import simulation.logger.Noise;
import simulation.logger.Unit;
import simulation.plant.Cycle;
import simulation.plant.Plant;
import simulation.plant.Spot;
import simulation.plant.Step;
import simulation.plant.Watcher;

/** A plant with places, instruments and a logger, ready to run. */
final class Rig {

    private final Plant plant;
    private final LogStyle style;
    private final Map<String, Spot> spots = new LinkedHashMap<>();
    private final List<Column> columns = new ArrayList<>();
    private Logger logger;
    private History history;
    private Balance balance;

    Rig(Plant plant, LogStyle style) {
        this.plant = plant;
        this.style = style;
    }

    /** Adds a place and gives it back. */
    Spot spot(String name, Spot spot) {
        spots.put(name, spot);
        return spot;
    }

    void temperature(String header, Instrument probe, double step) {
        Unit unit = style.temperature();
        columns.add(new Column(style.header(header, unit), probe, unit, 2, step));
    }

    void pressure(String header, Instrument transducer) {
        Unit unit = style.pressure();
        columns.add(Column.of(style.header(header, unit), transducer, unit, style.pressureDecimals()));
    }

    void column(Column column) {
        columns.add(column);
    }

    void run(List<Step> steps, double interval, long seed) {
        logger = new Logger(columns, interval, plant.room().pascal(), new Noise(seed));
        history = new History(List.copyOf(spots.values()));
        List<Watcher> watchers = new ArrayList<>(spots.values());
        watchers.add(logger);
        watchers.add(history);
        Balance.Before before = Balance.before(plant);
        new Cycle(steps).run(plant, watchers);
        balance = before.after(plant);
    }

    Plant plant() {
        return plant;
    }

    Logger logger() {
        return logger;
    }

    History history() {
        return history;
    }

    Balance balance() {
        return balance;
    }

    List<String> spotNames() {
        return List.copyOf(spots.keySet());
    }

    int index(String spot) {
        return spotNames().indexOf(spot);
    }

    /** When a step of the cycle began. */
    double start(String step) {
        return plant.timeline().start(step);
    }

    /** A row of units, for logs that have one. */
    String unitsRow(String delimiter) {
        StringBuilder row = new StringBuilder("local");
        for (Column column : columns) {
            row.append(delimiter).append(column.unit() == style.pressure() ? "kPa" : "degC");
        }
        return row.toString();
    }
}
