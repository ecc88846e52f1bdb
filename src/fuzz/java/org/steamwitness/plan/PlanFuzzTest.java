package org.steamwitness.plan;

import com.code_intelligence.jazzer.junit.FuzzTest;

/** Whatever the bytes are, a plan or run sheet is read or refused with words. */
class PlanFuzzTest {

    @FuzzTest(maxDuration = "5m")
    void readsAnything(byte[] bytes) {
        AsWritten<Plan> plan = Plan.read("p.yaml", bytes);
        AsWritten<RunSheet> sheet = RunSheet.read("r.yaml", bytes);
        if (plan.value().isPresent() != plan.problems().isEmpty()
                || sheet.value().isPresent() != sheet.problems().isEmpty()) {
            throw new IllegalStateException("neither read nor refused");
        }
    }
}
