package simulation.plant;

/** Flow of gas through an opening between two pressures: full speed at a low ratio, less as the pressures near. */
final class Nozzle {

    private static final double CRITICAL = 0.55;

    private Nozzle() {}

    /** Share of the full-speed flow, 0 to 1. */
    static double share(double downstream, double upstream) {
        if (downstream >= upstream) {
            return 0;
        }
        double ratio = downstream / upstream;
        if (ratio <= CRITICAL) {
            return 1;
        }
        double x = (ratio - CRITICAL) / (1 - CRITICAL);
        return Math.sqrt(1 - x * x);
    }
}
