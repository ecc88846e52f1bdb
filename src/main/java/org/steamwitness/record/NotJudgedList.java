package org.steamwitness.record;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import java.util.stream.Collectors;
import org.steamwitness.plan.Limit;
import org.steamwitness.plan.LimitKind;
import org.steamwitness.record.CycleRecord.NotJudged;

/** What the record does not judge, and why: silence must not be read as agreement. */
final class NotJudgedList {

    private NotJudgedList() {}

    static List<NotJudged> of(Evidence evidence) {
        List<NotJudged> list = new ArrayList<>();
        evidence.evaluation().saturation().notJudged().ifPresent(why -> list.add(new NotJudged("saturation", why)));
        list.add(new NotJudged("air away from the probes", "a probe sees only the steam around it"));
        if (evidence.bound().inProduct().isEmpty()) {
            list.add(new NotJudged(
                    "product lethality", "not measured; judged by time, temperature and initial temperature"));
        }
        list.add(new NotJudged("energy", "not evaluated by this version"));
        list.add(new NotJudged("sensors (dead, drifting or slipped probes)", "not evaluated by this version"));
        withoutLimit(evidence).ifPresent(list::add);
        list.add(new NotJudged("product safety", "for qualified people to decide"));
        return List.copyOf(list);
    }

    private static Optional<NotJudged> withoutLimit(Evidence evidence) {
        Set<LimitKind> limited =
                evidence.plan().limits().stream().map(Limit::what).collect(Collectors.toSet());
        List<String> names = new ArrayList<>();
        if (!limited.contains(LimitKind.VENT)) {
            names.add("vent");
        }
        if (!limited.contains(LimitKind.INITIAL_TEMPERATURE)) {
            names.add("initial temperature");
        }
        if (!limited.contains(LimitKind.RECORDER_AGAINST_INDICATING)) {
            names.add("indicating device");
        }
        if (!limited.contains(LimitKind.COOLING_END_TEMPERATURE)) {
            names.add("cooling");
        }
        return names.isEmpty()
                ? Optional.empty()
                : Optional.of(new NotJudged(String.join(", ", names), "the plan sets no criterion for them"));
    }
}
