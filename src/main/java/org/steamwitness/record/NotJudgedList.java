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
        list.add(new NotJudged("air away from the probes", "a probe sees the steam around itself only"));
        if (evidence.bound().inProduct().isEmpty()) {
            list.add(new NotJudged(
                    "product lethality", "not measured; judged by time, temperature and initial temperature"));
        }
        list.add(new NotJudged("energy", "this version of the program does not evaluate it"));
        list.add(new NotJudged(
                "state of the sensors (noise, lag, drift, slipped probes)",
                "this version of the program does not evaluate it"));
        list.add(new NotJudged(
                "vent, initial temperature, recorder against indicating device, cooling",
                "the plan sets no criterion for them; the scheduled process may"));
        list.add(new NotJudged("product safety", "the record documents a run; qualified people decide"));
        return List.copyOf(list);
    }
}
