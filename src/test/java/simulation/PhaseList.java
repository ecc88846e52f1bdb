package simulation;

import java.util.ArrayList;
import java.util.List;

/** Phases one after the other, without a gap. */
final class PhaseList {

    private final List<Span> spans = new ArrayList<>();
    private double end;

    /** Adds a phase from the end of the last one; none if it would be empty. */
    PhaseList upTo(String name, double to) {
        if (to > end) {
            spans.add(new Span(name, end, to));
            end = to;
        }
        return this;
    }

    double end() {
        return end;
    }

    List<Span> spans() {
        return List.copyOf(spans);
    }
}
