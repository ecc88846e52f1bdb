package org.steamwitness.record;

import java.util.ArrayList;
import java.util.List;
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
        list.add(new NotJudged(
                "vent, initial temperature, indicating device, cooling", "the plan sets no criterion for them"));
        list.add(new NotJudged("product safety", "for qualified people to decide"));
        return List.copyOf(list);
    }
}
