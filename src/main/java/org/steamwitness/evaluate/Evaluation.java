package org.steamwitness.evaluate;

import java.util.ArrayList;
import java.util.List;
import org.steamwitness.evaluate.criteria.Criteria;
import org.steamwitness.evaluate.criteria.Criterion;
import org.steamwitness.evaluate.criteria.GuardBand;
import org.steamwitness.evaluate.criteria.Verdict;
import org.steamwitness.evaluate.hold.HoldResult;
import org.steamwitness.evaluate.instruments.Instruments;
import org.steamwitness.evaluate.lethality.Lethality;
import org.steamwitness.evaluate.phase.Phases;
import org.steamwitness.evaluate.saturation.SaturationCheck;
import org.steamwitness.finding.Finding;
import org.steamwitness.plan.BoundPlan;
import org.steamwitness.trace.Reading;
import org.steamwitness.trace.Trace;

/**
 * Everything that was concluded from one run.
 *
 * @param instruments what the log shows of its channels
 * @param phases phases and attempts
 * @param saturation the saturation check
 * @param hold the hold
 * @param lethality one entry an aim of the plan
 * @param criteria limits held against values
 * @param verdict all together
 * @param findings what the reader must know, those handed in first
 */
public record Evaluation(
        Instruments instruments,
        Phases phases,
        SaturationCheck saturation,
        HoldResult hold,
        List<Lethality> lethality,
        List<Criterion> criteria,
        Verdict verdict,
        List<Finding> findings) {

    /** Rises whenever a result of an unchanged log, plan and run sheet changes. */
    public static final int NUMBER = 3;

    /**
     * Evaluates a run.
     *
     * @param trace the samples
     * @param reading how they were read
     * @param plan the plan bound to them
     * @param known findings of reading and binding, which the verdict has to heed
     * @return the conclusions
     */
    public static Evaluation of(Trace trace, Reading reading, BoundPlan plan, List<Finding> known) {
        double z = GuardBand.z(plan.decision());
        Instruments instruments = Instruments.of(trace, plan);
        Phases phases = Phases.of(trace, plan);
        SaturationCheck saturation = SaturationCheck.of(trace, plan, instruments, phases, z);
        HoldResult hold = HoldResult.of(trace, plan, instruments, phases);
        List<Lethality> lethality = Lethality.of(trace, plan, phases, saturation::outsideAt, z);
        List<Criterion> criteria = Criteria.of(plan, phases, hold, saturation, lethality);
        List<Finding> findings = new ArrayList<>(known);
        findings.addAll(instruments.findings());
        findings.addAll(
                RunFindings.of(trace, reading, plan, new RunFindings.Evaluated(phases, hold, saturation, lethality)));
        Verdict verdict = Verdict.of(criteria, findings, plan.draft());
        return new Evaluation(
                instruments, phases, saturation, hold, lethality, criteria, verdict, List.copyOf(findings));
    }
}
