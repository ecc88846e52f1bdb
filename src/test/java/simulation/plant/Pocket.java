package simulation.plant;

/**
 * Air that stays at one place.
 *
 * @param when for how long
 * @param share air beyond that of the chamber, by amount of substance
 * @param period seconds after which it comes again; 0 if it stays
 * @param length seconds for which it stays each time
 */
public record Pocket(Window when, double share, double period, double length) {

    /** A pocket that stays. */
    public static Pocket staying(Window when, double share) {
        return new Pocket(when, share, 0, 0);
    }

    double shareNow(Timeline timeline) {
        if (period <= 0) {
            return share;
        }
        double since = timeline.now() - when.from(timeline);
        return since % period < length ? share : 0;
    }
}
