package org.steamwitness.evaluate.saturation;

import java.util.ArrayList;
import java.util.List;
import java.util.function.IntPredicate;
import org.steamwitness.plan.SaturationTolerance;
import org.steamwitness.trace.Stretch;
import org.steamwitness.trace.Trace;

/**
 * Joins the samples of one probe that left saturation to the same side. Samples closer together than the shortest time
 * belong together. What may have lasted longer than the shortest time, from the sample before to the sample after, is an
 * episode; it is confirmed if its confirmed samples alone, from first to last, lasted that long.
 */
final class EpisodeFinder {

    private final Trace trace;
    private final Departure departure;
    private final SaturationTolerance tolerance;
    private final SampleStates states;

    EpisodeFinder(Trace trace, Departure departure, SaturationTolerance tolerance, SampleStates states) {
        this.trace = trace;
        this.departure = departure;
        this.tolerance = tolerance;
        this.states = states;
    }

    List<Episode> between(int from, int end) {
        List<Episode> episodes = new ArrayList<>();
        episodes.addAll(ofKind(Episode.Kind.AIR, SampleState.CONFIRMED_AIR, SampleState.POSSIBLE_AIR, from, end));
        episodes.addAll(ofKind(
                Episode.Kind.SUPERHEAT, SampleState.CONFIRMED_SUPERHEAT, SampleState.POSSIBLE_SUPERHEAT, from, end));
        return episodes;
    }

    private List<Episode> ofKind(Episode.Kind kind, SampleState sure, SampleState unsure, int from, int end) {
        List<Stretch> confirmed = stretches(i -> states.at(i) == sure, from, end).stream()
                .filter(s -> seconds(s.to()) - seconds(s.from()) >= tolerance.shortestSeconds())
                .toList();
        List<Stretch> outside = stretches(i -> states.at(i) == sure || states.at(i) == unsure, from, end).stream()
                .filter(this::maySuffice)
                .toList();
        List<Episode> episodes = new ArrayList<>();
        for (Stretch stretch : outside) {
            boolean holdsConfirmed =
                    confirmed.stream().anyMatch(c -> c.from() <= stretch.to() && c.to() >= stretch.from());
            episodes.add(episode(kind, holdsConfirmed, stretch));
        }
        return episodes;
    }

    /** Between its samples a departure may have lasted from the sample before to the sample after. */
    private boolean maySuffice(Stretch stretch) {
        double before = seconds(Math.max(0, stretch.from() - 1));
        double after = seconds(Math.min(trace.size() - 1, stretch.to() + 1));
        return seconds(stretch.to()) - seconds(stretch.from()) >= tolerance.shortestSeconds()
                || after - before > tolerance.shortestSeconds();
    }

    private List<Stretch> stretches(IntPredicate belongs, int from, int end) {
        List<Stretch> found = new ArrayList<>();
        int first = -1;
        int last = -1;
        for (int i = from; i <= end; i++) {
            boolean closes = first >= 0 && (i == end || seconds(i) - seconds(last) > tolerance.shortestSeconds());
            if (closes) {
                found.add(new Stretch(first, last));
                first = -1;
            }
            if (i < end && belongs.test(i)) {
                first = first < 0 ? i : first;
                last = i;
            }
        }
        return found;
    }

    private Episode episode(Episode.Kind kind, boolean confirmed, Stretch stretch) {
        int worst = -1;
        double sum = 0;
        int count = 0;
        for (int i = stretch.from(); i <= stretch.to(); i++) {
            double kelvin = departure.kelvinAt(i);
            if (Double.isNaN(kelvin)) {
                continue;
            }
            sum += kelvin;
            count++;
            if (worst < 0 || Math.abs(kelvin) > Math.abs(departure.kelvinAt(worst))) {
                worst = i;
            }
        }
        return new Episode(
                departure.channel(),
                kind,
                confirmed,
                stretch.from(),
                stretch.to(),
                worst,
                departure.kelvinAt(worst),
                sum / count,
                departure.uncertaintyAt(worst),
                departure.airFractionAt(worst));
    }

    private double seconds(int index) {
        return trace.seconds().at(index);
    }
}
