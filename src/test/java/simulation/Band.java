package simulation;

import java.util.ArrayList;
import java.util.List;

/** A band of temperature that several places must keep at once. */
final class Band {

    private static final double SHORTEST = 5;

    private final double atLeast;
    private final double atMost;
    private final int[] spots;

    /** From one temperature to another, in degC, and at which places. */
    Band(double atLeast, double atMost, int... spots) {
        this.atLeast = atLeast;
        this.atMost = atMost;
        this.spots = spots.clone();
    }

    boolean holds(Moment moment) {
        for (int spot : spots) {
            double celsius = moment.spots().get(spot);
            if (celsius < atLeast || celsius > atMost) {
                return false;
            }
        }
        return true;
    }

    /** Every stretch inside that lasts five seconds, between two times. */
    List<Span> attempts(History history, double from, double to) {
        List<Span> attempts = new ArrayList<>();
        double since = Double.NaN;
        double last = Double.NaN;
        for (Moment moment : history.moments()) {
            if (moment.seconds() < from || moment.seconds() > to) {
                continue;
            }
            if (holds(moment)) {
                since = Double.isNaN(since) ? moment.seconds() : since;
                last = moment.seconds();
            } else if (!Double.isNaN(since)) {
                attempts.add(new Span("hold", since, last));
                since = Double.NaN;
            }
        }
        if (!Double.isNaN(since)) {
            attempts.add(new Span("hold", since, last));
        }
        return attempts.stream().filter(span -> span.length() >= SHORTEST).toList();
    }
}
