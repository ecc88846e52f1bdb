package org.steamwitness.evaluate.criteria;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.steamwitness.plan.Limit;
import org.steamwitness.plan.PlannedPhase;

/** Limits that this version does not judge: each is an undecided criterion, so that none passes in silence. */
final class UnjudgedLimits {

    private static final String WHY = "this version does not judge it";

    private UnjudgedLimits() {}

    static List<Criterion> of(List<Limit> limits) {
        List<Criterion> criteria = new ArrayList<>();
        for (int i = 0; i < limits.size(); i++) {
            Limit limit = limits.get(i);
            String id = "limit-" + (i + 1) + "-" + limit.what().word();
            limit.atLeast().ifPresent(figure -> criteria.add(undecided(id + "-least", limit, figure, true)));
            limit.atMost().ifPresent(figure -> criteria.add(undecided(id + "-most", limit, figure, false)));
            limit.anyOf().stream()
                    .findFirst()
                    .ifPresent(way -> criteria.add(undecided(id + "-any", limit, way.time(), true)));
        }
        return List.copyOf(criteria);
    }

    private static Criterion undecided(String id, Limit limit, Limit.Figure figure, boolean atLeast) {
        return new Criterion(
                id,
                Criterion.Subject.OTHER,
                limit.words(),
                limit.scope().where().isEmpty() ? "all" : limit.scope().where(),
                limit.scope().phase().map(PlannedPhase::word).orElse("whole run"),
                limit.measure().unit(),
                OptionalDouble.empty(),
                figure.si(),
                atLeast,
                OptionalDouble.empty(),
                Optional.empty(),
                Decision.UNDECIDED,
                WHY + limit.source().map(source -> "; limit from " + source).orElse(""));
    }
}
