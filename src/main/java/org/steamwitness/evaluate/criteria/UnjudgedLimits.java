package org.steamwitness.evaluate.criteria;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.steamwitness.plan.Limit;
import org.steamwitness.plan.Measure;
import org.steamwitness.plan.PlannedPhase;

/** Limits that this version does not judge: each is an undecided criterion, so that none passes in silence. */
final class UnjudgedLimits {

    private static final String WHY = "not judged by this version";

    private UnjudgedLimits() {}

    static List<Criterion> of(List<Limit> limits) {
        List<Criterion> criteria = new ArrayList<>();
        for (int i = 0; i < limits.size(); i++) {
            Limit limit = limits.get(i);
            String id = limit.idAt(i);
            limit.atLeast().ifPresent(figure -> criteria.add(undecided(id + "-least", limit, figure, true)));
            limit.atMost().ifPresent(figure -> criteria.add(undecided(id + "-most", limit, figure, false)));
            limit.anyOf().stream()
                    .findFirst()
                    .ifPresent(way -> criteria.add(undecided(id + "-any", limit, way.time(), true)));
        }
        return List.copyOf(criteria);
    }

    /** A vent is named by its time; a pressure by what it is counted from. */
    private static String unit(Limit limit, Limit.Figure figure) {
        return limit.measure() == Measure.PRESSURE
                ? limit.measure().unit() + " " + figure.datum().word()
                : limit.measure().unit();
    }

    private static Criterion undecided(String id, Limit limit, Limit.Figure figure, boolean atLeast) {
        return new Criterion(
                id,
                Criterion.Subject.OTHER,
                limit.words(),
                limit.scope().where().isEmpty() ? "all" : limit.scope().where(),
                limit.scope().phase().map(PlannedPhase::word).orElse("whole run"),
                unit(limit, figure),
                OptionalDouble.empty(),
                limit.measure().printed(figure.si()),
                atLeast,
                OptionalDouble.empty(),
                Optional.empty(),
                Decision.UNDECIDED,
                WHY);
    }
}
