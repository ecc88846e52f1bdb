package simulation.logger;

import java.util.ArrayList;
import java.util.List;
import simulation.plant.Plant;
import simulation.plant.Watcher;

/** Asks every instrument at its interval and keeps the rows. */
public final class Logger implements Watcher {

    private final List<Column> columns;
    private final double interval;
    private final Noise noise;
    private final double gaugeZero;
    private final List<double[]> rows = new ArrayList<>();
    private double next;

    /** Sets the logger up; gauge pressures count from the atmosphere given. */
    public Logger(List<Column> columns, double interval, double gaugeZero, Noise noise) {
        this.columns = List.copyOf(columns);
        this.interval = interval;
        this.gaugeZero = gaugeZero;
        this.noise = noise;
    }

    @Override
    public void see(Plant plant) {
        columns.forEach(column -> column.instrument().see(plant));
        if (plant.timeline().now() >= next - 1e-9) {
            double[] row = new double[columns.size() + 1];
            row[0] = plant.timeline().now();
            for (int i = 0; i < columns.size(); i++) {
                row[i + 1] = columns.get(i).reading(noise, gaugeZero);
            }
            rows.add(row);
            next += interval;
        }
    }

    /** Columns in order. */
    public List<Column> columns() {
        return columns;
    }

    /** Rows: seconds since the first, then a number a column; NaN for an open circuit. */
    public List<double[]> rows() {
        return List.copyOf(rows);
    }

    /** Seconds between rows. */
    public double interval() {
        return interval;
    }
}
