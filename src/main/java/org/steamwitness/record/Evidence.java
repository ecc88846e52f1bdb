package org.steamwitness.record;

import org.steamwitness.evaluate.Evaluation;
import org.steamwitness.plan.BoundPlan;
import org.steamwitness.plan.Plan;
import org.steamwitness.plan.RunSheet;
import org.steamwitness.trace.Reading;
import org.steamwitness.trace.Trace;

/**
 * All that a record is made from.
 *
 * @param provenance the files and the program
 * @param plan as written
 * @param sheet as written
 * @param trace the samples
 * @param reading how they were read
 * @param bound the plan bound to the samples
 * @param evaluation what was concluded
 */
public record Evidence(
        Provenance provenance,
        Plan plan,
        RunSheet sheet,
        Trace trace,
        Reading reading,
        BoundPlan bound,
        Evaluation evaluation) {}
