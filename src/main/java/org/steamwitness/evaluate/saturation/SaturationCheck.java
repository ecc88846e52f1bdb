package org.steamwitness.evaluate.saturation;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.steamwitness.evaluate.instruments.Instruments;
import org.steamwitness.evaluate.phase.Phase;
import org.steamwitness.evaluate.phase.Phases;
import org.steamwitness.plan.BoundChannel;
import org.steamwitness.plan.BoundPlan;
import org.steamwitness.plan.SaturationTolerance;
import org.steamwitness.trace.Column;
import org.steamwitness.trace.Stretch;
import org.steamwitness.trace.Trace;

/**
 * All steam-contact probes held against saturation. Figures are given for every phase, episodes are sought in the hold
 * phase, which alone is judged.
 *
 * @param notJudged why saturation could not be judged; empty if it was
 * @param tolerance the plan's tolerances
 * @param saturationKelvin saturation temperature of the measured pressure, one value a sample; NaN where unknown
 * @param departures one entry a steam-contact probe, sample by sample; empty if saturation was not judged
 * @param outside where each probe stood outside the tolerance
 * @param perPhase what each probe showed in each phase
 * @param episodes in the hold phase, in the order of probes
 */
public record SaturationCheck(
        Optional<String> notJudged,
        Optional<SaturationTolerance> tolerance,
        Column saturationKelvin,
        List<Departure> departures,
        List<OutsideSaturation> outside,
        List<PhaseDeparture> perPhase,
        List<Episode> episodes) {

    /**
     * Holds the samples against saturation.
     *
     * @param trace the samples
     * @param plan the bound plan
     * @param instruments what is known of the channels
     * @param phases the phases
     * @param z standard uncertainties that make a departure sure, one-sided
     * @return figures and episodes
     */
    public static SaturationCheck of(Trace trace, BoundPlan plan, Instruments instruments, Phases phases, double z) {
        Optional<BoundChannel> pressure = plan.pressure();
        SaturationColumns saturation =
                SaturationColumns.of(pressure.map(BoundChannel::values).orElseGet(() -> unknown(trace.size())));
        Optional<String> obstacle = obstacle(plan, phases);
        if (obstacle.isPresent()) {
            return new SaturationCheck(
                    obstacle, plan.saturation(), saturation.kelvin(), List.of(), List.of(), List.of(), List.of());
        }
        SaturationTolerance tolerance = plan.saturation().orElseThrow();
        List<PhaseDeparture> perPhase = new ArrayList<>();
        List<Departure> departures = new ArrayList<>();
        List<OutsideSaturation> outside = new ArrayList<>();
        List<Episode> episodes = new ArrayList<>();
        for (BoundChannel probe : plan.inSteam()) {
            Departure departure = new Departure(
                    instruments.of(probe), instruments.of(pressure.orElseThrow()), saturation, trace.seconds(), plan);
            departures.add(departure);
            SampleStates states = new SampleStates(departure, tolerance, z);
            outside.add(new OutsideSaturation(probe, states.outside(trace.size())));
            for (Phase phase : phases.phases()) {
                perPhase.add(PhaseDeparture.of(departure, phase, trace.seconds(), states, tolerance.airKelvin(), z));
            }
            EpisodeFinder finder = new EpisodeFinder(trace, departure, tolerance, states);
            phases.hold().ifPresent(hold -> episodes.addAll(finder.between(hold.from(), hold.end())));
        }
        return new SaturationCheck(
                Optional.empty(),
                plan.saturation(),
                saturation.kelvin(),
                List.copyOf(departures),
                List.copyOf(outside),
                List.copyOf(perPhase),
                List.copyOf(episodes));
    }

    /**
     * What the probes showed in one phase.
     *
     * @param phase one of the run's phases
     * @return one entry a steam-contact probe that could be judged
     */
    public List<PhaseDeparture> in(Phase phase) {
        return perPhase.stream()
                .filter(p -> p.phase().equals(phase) && p.figures().isPresent())
                .toList();
    }

    /**
     * Departure of one sample.
     *
     * @param channel a probe that was held against saturation
     * @param index of the sample
     * @return kelvin; NaN where there is none
     */
    public double kelvinAt(BoundChannel channel, int index) {
        return departures.stream()
                .filter(d -> d.channel().equals(channel))
                .findFirst()
                .map(d -> d.kelvinAt(index))
                .orElse(Double.NaN);
    }

    /**
     * The probe that went longest without a sample that could be judged.
     *
     * @param phase one of the run's phases
     * @return empty if no probe was held against saturation
     */
    public Optional<PhaseDeparture> longestUnjudged(Phase phase) {
        return perPhase.stream()
                .filter(p -> p.phase().equals(phase))
                .max(Comparator.comparingDouble(PhaseDeparture::longestUnjudgedSeconds));
    }

    /**
     * Where a probe stood outside the tolerance.
     *
     * @param channel any channel
     * @return in order of time; empty if the channel was not held against saturation
     */
    public Optional<List<Stretch>> outsideAt(BoundChannel channel) {
        return outside.stream()
                .filter(o -> o.channel().equals(channel))
                .map(OutsideSaturation::stretches)
                .findFirst();
    }

    /**
     * The least air fraction that any of the probes would have confirmed at every instant of a phase.
     *
     * @param phase one of the run's phases
     * @return mole fraction; empty if no sample could be judged
     */
    public OptionalDouble smallestAirFraction(Phase phase) {
        return in(phase).stream()
                .mapToDouble(p -> p.figures().orElseThrow().smallestAirFraction())
                .max();
    }

    private static Optional<String> obstacle(BoundPlan plan, Phases phases) {
        if (plan.saturation().isEmpty()) {
            return Optional.of("the medium holds air on purpose");
        }
        if (plan.pressure().isEmpty()) {
            return Optional.of("the chamber's absolute pressure is not known");
        }
        if (plan.inSteam().isEmpty()) {
            return Optional.of("no temperature channel stands in the chamber's steam");
        }
        return phases.hold().isEmpty() ? Optional.of("no hold phase was reached") : Optional.empty();
    }

    private static Column unknown(int size) {
        double[] values = new double[size];
        Arrays.fill(values, Double.NaN);
        return Column.of(values);
    }
}
