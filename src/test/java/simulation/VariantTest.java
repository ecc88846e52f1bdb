package simulation;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.Arrays;
import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;
import simulation.plant.Flow;
import simulation.plant.Water;

/** Every kind of run closes its books and tells its truth. */
class VariantTest {

    private static final double BOOKS = 1e-6;
    private static final List<Long> SEEDS = List.of(0L, 3L);

    private final Water water = new Water();

    @ParameterizedTest
    @EnumSource
    void withItsFaultARunClosesItsBooksAndTellsThePhases(Variant variant) {
        for (long seed : SEEDS) {
            Truth truth = variant.run(seed, true).truth();
            closesItsBooks(truth);
            followOneAnother(truth);
            assertThat(truth.faulty()).isEqualTo(variant.hasFault());
            assertThat(truth.faults().isEmpty() && variant != Variant.RETORT_THREE_CYCLES)
                    .isEqualTo(!variant.hasFault());
        }
    }

    @ParameterizedTest
    @EnumSource
    void withoutItsFaultARunMeetsItsPlan(Variant variant) {
        for (long seed : List.of(7L)) {
            SimulatedRun run = variant.run(seed, false);
            Truth truth = run.truth();
            closesItsBooks(truth);
            followOneAnother(truth);
            assertThat(truth.faults()).isEmpty();
            assertThat(truth.expected()).isEqualTo(Expected.MET);
            if (run.plan().contains("hold:")) {
                assertThat(truth.longestHold()).isGreaterThan(minutes(run.plan()) * 60);
            }
            if (run.plan().contains("judged: [hold]") && variant != Variant.RETORT_RIPPLE) {
                truth.attempts().forEach(attempt -> isSaturated(truth, attempt));
            }
        }
    }

    @ParameterizedTest
    @EnumSource
    void theSameSeedGivesTheSameBytes(Variant variant) {
        SimulatedRun run = variant.run(5, true);
        SimulatedRun again = variant.run(5, true);
        assertThat(run.log()).isEqualTo(again.log());
        assertThat(run.truth().json()).isEqualTo(again.truth().json());
    }

    @Test
    void anotherSeedGivesOtherBytes() {
        assertThat(Arrays.equals(
                        Variant.LEAK_RATE.run(5, true).log(),
                        Variant.LEAK_RATE.run(6, true).log()))
                .isFalse();
    }

    @Test
    void aSealedPotLosesNothing() {
        Truth truth = Variant.COOKER_SEALED.run(0, false).truth();
        for (Span phase : truth.phases()) {
            assertThat(truth.energy(phase).get("contents-dU-J"))
                    .isCloseTo(truth.over(phase, Flow.CONTENTS_HEAT_J), within(0.1));
        }
        assertThat(truth.figures().get("vented-kg")).isZero();
    }

    private static void closesItsBooks(Truth truth) {
        assertThat(truth.balance().energy()).as("energy").isLessThan(BOOKS);
        assertThat(truth.balance().water()).as("water").isLessThan(BOOKS);
        assertThat(truth.balance().air()).as("air").isLessThan(BOOKS);
        for (Span phase : truth.phases()) {
            Map<String, Double> energy = truth.energy(phase);
            double held = energy.get("contents-dU-J")
                    + energy.get("metal-J")
                    + energy.get("load-J")
                    + energy.get("sump-dH-J");
            double crossed = truth.over(phase, Flow.STEAM_J)
                    + truth.over(phase, Flow.COOLING_WATER_J)
                    + truth.over(phase, Flow.AIR_IN_J)
                    + truth.over(phase, Flow.HEATER_J)
                    + truth.over(phase, Flow.JACKET_J)
                    - truth.over(phase, Flow.VENTED_J)
                    - truth.over(phase, Flow.PUMPED_J)
                    - truth.over(phase, Flow.DRAINED_J)
                    - truth.over(phase, Flow.LOSS_J);
            assertThat(held).as(phase.name()).isCloseTo(crossed, within(1.0));
        }
    }

    private static void followOneAnother(Truth truth) {
        double end = 0;
        for (Span phase : truth.phases()) {
            assertThat(phase.from()).isEqualTo(end);
            assertThat(phase.to()).isGreaterThan(phase.from());
            end = phase.to();
        }
        assertThat(end).isEqualTo(truth.history().end());
    }

    /** The first seconds aside, in which compression may still warm the steam. */
    private void isSaturated(Truth truth, Span attempt) {
        for (double t = attempt.from() + 15; t <= attempt.to(); t++) {
            Moment moment = truth.history().at(t);
            assertThat(moment.gas().celsius())
                    .isCloseTo(water.celsius(moment.gas().pascal()), within(0.5));
        }
    }

    private static double minutes(String plan) {
        String after = plan.substring(plan.indexOf("duration: ") + 10);
        return Double.parseDouble(after.substring(0, after.indexOf(' ')));
    }
}
