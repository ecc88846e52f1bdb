package org.steamwitness.evaluate.criteria;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.Arrays;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.steamwitness.evaluate.Bench;
import org.steamwitness.evaluate.Evaluation;
import org.steamwitness.evaluate.criteria.Verdict.Outcome;
import org.steamwitness.finding.Finding;
import org.steamwitness.finding.FindingKind;
import org.steamwitness.finding.Position;
import org.steamwitness.finding.Severity;
import org.steamwitness.plan.DecisionRule;
import org.steamwitness.plan.LethalityAim;
import org.steamwitness.plan.LethalityUnit;
import org.steamwitness.plan.Limit;
import org.steamwitness.plan.LimitKind;
import org.steamwitness.plan.Measure;
import org.steamwitness.plan.ProbeChoice;
import org.steamwitness.quantity.Datum;
import org.steamwitness.trace.Place;
import org.steamwitness.trace.Reading;

class CriteriaTest {

    private static final Reading READING =
            new Reading("UTF-8", "comma", "full stop", "ISO 8601 without zone", List.of(), 0, List.of(), List.of());

    /** One-sided quantiles of the normal distribution as printed in tables of JCGM 106's guard bands. */
    @ParameterizedTest
    @CsvSource({"0.80, 0.8416", "0.85, 1.0364", "0.90, 1.2816", "0.95, 1.6449", "0.99, 2.3263", "0.999, 3.0902"})
    void theGuardBandIsTheQuantileOfTheConformanceProbability(double conformance, double z) {
        assertThat(GuardBand.z(new DecisionRule(true, conformance))).isCloseTo(z, within(5e-5));
        assertThat(GuardBand.z(DecisionRule.SIMPLE)).isZero();
    }

    /** Twelve samples inside at 5 s prove 55 s; the samples around them leave 65 s possible. */
    @ParameterizedTest
    @CsvSource({
        "55, true, MET",
        "56, true, UNDECIDED",
        "65, true, UNDECIDED",
        "66, true, NOT_MET",
        "55, false, MET",
        "56, false, NOT_MET"
    })
    void holdingTimeIsMetOnlyByWhatTheSamplesProve(double required, boolean guarded, Decision decision) {
        double[] celsius = new double[20];
        Arrays.fill(celsius, 100);
        Arrays.fill(celsius, 4, 16, 122);
        Evaluation evaluation = evaluate(Bench.every(5, 20)
                .holding(required)
                .deciding(guarded ? new DecisionRule(true, 0.95) : DecisionRule.SIMPLE)
                .with(Bench.temperature("chamber", Place.REFERENCE, 0.1, celsius)));
        Criterion time = evaluation.criteria().get(0);
        assertThat(time.decision()).isEqualTo(decision);
        assertThat(time.value()).hasValue(55);
        assertThat(time.margin()).hasValue(55 - required);
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', textBlock = """
            55 | 55 s of 55 s proven
            60 | 55 s of 1 min 00 s proven, 1 min 05 s possible: the sampling interval leaves it open
            90 | 55 s of 1 min 30 s proven
            """)
    void saysWhatTheSamplesProve(double required, String why) {
        double[] celsius = new double[20];
        Arrays.fill(celsius, 100);
        Arrays.fill(celsius, 4, 16, 122);
        Criterion time = evaluate(Bench.every(5, 20)
                        .holding(required)
                        .with(Bench.temperature("chamber", Place.REFERENCE, 0.1, celsius)))
                .criteria()
                .get(0);
        assertThat(time.why()).isEqualTo(why);
        assertThat(time.where()).isEqualTo("chamber");
    }

    /** The side that uses most of its tolerance is shown: 1.2 K of 2 K of superheat before 0.3 K of 1 K of air. */
    @ParameterizedTest
    @CsvSource({
        "122, 123.2, 1.2, 2, false, MET, no episode in the hold phase",
        "121.7, 122, -0.3, -1, true, MET, no episode in the hold phase",
        "120.8, 122, -1.2, -1, true, UNDECIDED, 'possible episodes in the hold phase: 1, none beyond the sensors'"
                + "' uncertainty'",
        "120.2, 120.8, -1.8, -1, true, NOT_MET, 'episodes in the hold phase: 1 confirmed, 1 possible'"
    })
    void showsTheDepartureThatComesClosest(
            double lower, double upper, double value, double limit, boolean atLeast, Decision decision, String why) {
        double[] first = held(30);
        Arrays.fill(first, 10, 20, lower);
        double[] second = held(30);
        Arrays.fill(second, 10, 20, upper);
        double[] pressed = steam(30);
        Criterion saturation = evaluate(Bench.every(5, 30)
                        .with(
                                Bench.temperature("chamber", Place.REFERENCE, 0.1, held(30)),
                                Bench.temperature("drain", Place.DRAIN, 0.1, first),
                                Bench.temperature("free-space", Place.FREE_SPACE, 0.1, second),
                                Bench.pressure(1, pressed)))
                .criteria()
                .get(1);
        assertThat(saturation.value().orElseThrow()).isCloseTo(value, within(0.01));
        assertThat(saturation.limit()).isEqualTo(limit);
        assertThat(saturation.atLeast()).isEqualTo(atLeast);
        assertThat(saturation.decision()).isEqualTo(decision);
        assertThat(saturation.why()).isEqualTo(why);
        assertThat(saturation.index()).hasValue(10);
        assertThat(saturation.uncertainty().orElseThrow()).isGreaterThan(0.1);
    }

    @Test
    void theClosestCallHasTheLeastMarginInProportionToItsLimit() {
        Criterion wide = marginal("wide", 120, 100);
        Criterion near = marginal("near", 1050, 1000);
        Criterion none = criterion(Criterion.Subject.SATURATION, Decision.NOT_APPLICABLE);
        Verdict verdict = Verdict.of(List.of(wide, near), List.of(), false);
        assertThat(verdict.closest().orElseThrow().id()).isEqualTo("near");
        assertThat(Verdict.of(List.of(none), List.of(), false).closest()).isPresent();
        assertThat(verdict.because()).containsExactly("every criterion is met");
        assertThat(verdict.outcome().word()).isEqualTo("met");
    }

    @Test
    void aVerdictNamesWhatMadeItSo() {
        Criterion failed = criterion(Criterion.Subject.TIME_OR_TEMPERATURE, Decision.NOT_MET);
        assertThat(Verdict.of(List.of(failed), List.of(), false).because()).containsExactly("what: why");
        assertThat(Decision.NOT_MET.word()).isEqualTo("not met");
        Finding review = new Finding(
                FindingKind.MARK_OUTSIDE_LOG,
                Position.RUN,
                Map.of("mark", "steam-on", "time", "08:00", "first", "09:00", "last", "10:00"));
        Criterion met = criterion(Criterion.Subject.TIME_OR_TEMPERATURE, Decision.MET);
        assertThat(review.severity()).isEqualTo(Severity.REVIEW);
        assertThat(outcome(List.of(met), List.of(review))).isEqualTo(Outcome.MET);
    }

    private static Criterion marginal(String id, double value, double limit) {
        return new Criterion(
                id,
                Criterion.Subject.TIME_OR_TEMPERATURE,
                "what",
                "where",
                "hold",
                "s",
                OptionalDouble.of(value),
                limit,
                true,
                OptionalDouble.empty(),
                Optional.empty(),
                Decision.MET,
                "why");
    }

    @Test
    void aHoldNeverReachedIsNotMetAndNotMissing() {
        Evaluation evaluation =
                evaluate(Bench.every(5, 4).with(Bench.temperature("chamber", Place.REFERENCE, 0.1, 20, 60, 100, 60)));
        assertThat(evaluation.criteria().get(0).value()).hasValue(0);
        assertThat(evaluation.verdict().outcome()).isEqualTo(Outcome.NOT_MET);
    }

    @ParameterizedTest
    @CsvSource({"290, MET", "300, UNDECIDED", "310, NOT_MET"})
    void lethalityIsGuardedByTheSensorsSharedUncertainty(double minimum, Decision decision) {
        double[] reference = new double[61];
        Arrays.fill(reference, 121.11);
        double[] chamber = new double[61];
        Arrays.fill(chamber, 1, 60, 122);
        Evaluation evaluation = evaluate(Bench.every(5, 61)
                .with(
                        Bench.temperature("chamber", Place.REFERENCE, 0.05, chamber),
                        Bench.temperature("can-1", Place.PRODUCT, 0.05, reference))
                .aiming(Bench.aim(121.11, minimum, true)));
        Criterion lethality = evaluation.criteria().get(2);
        assertThat(lethality.value().orElseThrow()).isCloseTo(5, within(1e-9));
        assertThat(lethality.uncertainty().orElseThrow())
                .isCloseTo(5 * Math.log(10) / 10 * 0.05, within(1e-3 * 0.0576));
        assertThat(lethality.decision()).isEqualTo(decision);
    }

    @ParameterizedTest
    @CsvSource({"310, MET", "300, UNDECIDED", "290, NOT_MET"})
    void aMaximumIsHeldAgainstTheGreatestProbe(double maximum, Decision decision) {
        LethalityAim aim = chosen(
                new ProbeChoice(Optional.of(Place.PRODUCT), List.of()),
                LethalityUnit.SECOND,
                new LethalityAim.Limits(OptionalDouble.empty(), OptionalDouble.of(maximum)));
        double[] reference = new double[61];
        Arrays.fill(reference, 121.11);
        double[] cooler = new double[61];
        Arrays.fill(cooler, 119);
        Criterion most = evaluate(Bench.every(5, 61)
                        .with(
                                Bench.temperature("chamber", Place.REFERENCE, 0.05, reference),
                                Bench.temperature("can-1", Place.PRODUCT, 0.05, cooler),
                                Bench.temperature("can-2", Place.PRODUCT, 0.05, reference))
                        .aiming(aim))
                .criteria()
                .get(2);
        assertThat(most.id()).isEqualTo("lethality-F0-most");
        assertThat(most.where()).isEqualTo("can-2");
        assertThat(most.what()).isEqualTo("F0 at the greatest product probe");
        assertThat(most.unit()).isEqualTo("s at 121.1 °C");
        assertThat(most.value().orElseThrow()).isCloseTo(300, within(1e-6));
        assertThat(most.atLeast()).isFalse();
        assertThat(most.margin().orElseThrow()).isCloseTo(maximum - 300, within(1e-6));
        assertThat(most.decision()).isEqualTo(decision);
        assertThat(most.why()).startsWith("300 s of " + (int) maximum + " s, greatest of 2 probes");
    }

    /** Twenty samples at 122 degC gather 95 s times 10^0.089; five samples of a pocket do not help to reach a minimum. */
    @Test
    void whatIsGatheredOutsideSaturationDoesNotCountAsReached() {
        double gathered = 95 * Math.pow(10, 0.089);
        LethalityAim aim = chosen(
                new ProbeChoice(Optional.empty(), List.of("chamber")),
                LethalityUnit.MINUTE,
                LethalityAim.Limits.atLeast(gathered * 0.9));
        double[] pressed = steam(20);
        Bench clean = Bench.every(5, 20)
                .with(Bench.temperature("chamber", Place.REFERENCE, 0.01, held(20)), Bench.pressure(0.1, pressed))
                .aiming(aim);
        Criterion reached = evaluate(clean).criteria().get(2);
        assertThat(reached.decision()).isEqualTo(Decision.MET);
        assertThat(reached.what()).isEqualTo("F0 at the least of chamber");
        assertThat(reached.why()).endsWith("; in the chamber's steam, not in a product");
        Arrays.fill(pressed, 8, 13, 230);
        Criterion marked = evaluate(Bench.every(5, 20)
                        .with(
                                Bench.temperature("chamber", Place.REFERENCE, 0.01, held(20)),
                                Bench.pressure(0.1, pressed))
                        .aiming(aim))
                .criteria()
                .get(2);
        assertThat(marked.value()).isEqualTo(reached.value());
        assertThat(marked.decision()).isEqualTo(Decision.UNDECIDED);
        assertThat(marked.why()).endsWith("; of it 0.61 min outside saturation, which does not count as reached");
    }

    @Test
    void saturationIsUndecidedWhereAProbeWasNotJudgedForLongerThanTheLongestGap() {
        double[] pressed = steam(20);
        Arrays.fill(pressed, 8, 10, Double.NaN);
        assertThat(saturationWith(pressed).decision()).isEqualTo(Decision.UNDECIDED);
        assertThat(saturationWith(pressed).why())
                .isEqualTo("not judged for 15 s of the hold phase at chamber: temperature or pressure is missing or off"
                        + " the saturation line");
        pressed[8] = 211.59;
        assertThat(saturationWith(pressed).decision()).isEqualTo(Decision.MET);
    }

    /** One sample of a dip is no episode: the criterion shows what it judged, and the dip is told beside it. */
    @Test
    void neverShowsADepartureBeyondTheLimitBesideMet() {
        double[] drain = held(30);
        drain[12] = 116;
        double[] chamber = held(30);
        chamber[29] = 60;
        Evaluation evaluation = evaluate(Bench.every(5, 30)
                .with(
                        Bench.temperature("chamber", Place.REFERENCE, 0.1, chamber),
                        Bench.temperature("drain", Place.DRAIN, 0.1, drain),
                        Bench.pressure(1, steam(30))));
        Criterion saturation = evaluation.criteria().get(1);
        assertThat(saturation.decision()).isEqualTo(Decision.MET);
        assertThat(saturation.margin().orElseThrow()).isPositive();
        assertThat(evaluation.findings())
                .extracting(Finding::text)
                .singleElement()
                .asString()
                .startsWith(
                        "drain left saturation in the hold phase for 1 samples, too short for an episode; at worst -6.0");
    }

    /** What a probe without samples lacks can't be called not met. */
    @Test
    void lethalityThatFallsShortForLackOfSamplesIsUndecided() {
        double[] can = new double[61];
        Arrays.fill(can, 121.11);
        Arrays.fill(can, 20, 40, Double.NaN);
        Evaluation evaluation = evaluate(Bench.every(5, 61)
                .with(
                        Bench.temperature("chamber", Place.REFERENCE, 0.05, held(61)),
                        Bench.temperature("can-1", Place.PRODUCT, 0.05, can))
                .aiming(Bench.aim(121.11, 280, true)));
        Criterion lethality = evaluation.criteria().get(2);
        assertThat(lethality.decision()).isEqualTo(Decision.UNDECIDED);
        assertThat(lethality.why()).endsWith("; without samples for 1 min 45 s, which count as nothing");
        assertThat(evaluation.findings()).extracting(Finding::kind).contains(FindingKind.PROBE_WITHOUT_SAMPLES);
    }

    /** What lies before the first sample and behind the last is not known, so neither time nor lethality is too small. */
    @Test
    void aLogThatBeginsOrEndsInTheHoldLeavesOpenWhatItLacks() {
        double[] begun = held(40);
        Arrays.fill(begun, 20, 40, 60);
        double[] ended = held(40);
        Arrays.fill(ended, 0, 20, 60);
        double[] can = new double[40];
        Arrays.fill(can, 118);
        Evaluation early = evaluate(
                Bench.every(5, 40).holding(600).with(Bench.temperature("chamber", Place.REFERENCE, 0.1, begun)));
        assertThat(early.criteria().get(0).decision()).isEqualTo(Decision.UNDECIDED);
        Evaluation late = evaluate(Bench.every(5, 40)
                .holding(600)
                .with(
                        Bench.temperature("chamber", Place.REFERENCE, 0.1, ended),
                        Bench.temperature("can-1", Place.PRODUCT, 0.1, can))
                .aiming(Bench.aim(121.11, 600, true)));
        assertThat(late.criteria().get(0).decision()).isEqualTo(Decision.UNDECIDED);
        assertThat(late.criteria().get(2).decision()).isEqualTo(Decision.UNDECIDED);
    }

    @Test
    void aHoldCutShortByTheEndOfTheLogIsUndecided() {
        Criterion time = evaluate(Bench.every(5, 20)
                        .holding(600)
                        .with(Bench.temperature("chamber", Place.REFERENCE, 0.1, held(20))))
                .criteria()
                .get(0);
        assertThat(time.decision()).isEqualTo(Decision.UNDECIDED);
        assertThat(time.why())
                .isEqualTo(
                        "1 min 35 s of 10 min 00 s proven; a gap or an end of the log leaves open whether it was held"
                                + " longer");
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', textBlock = """
            0 | 0   | 200 | the band was held for 1 min 35 s longer
            0 | 0   | 400 | the band was left 1 min 45 s before
            0 | 120 | 295 | the band was reached 1 min 40 s before
            """)
    void marksThatDoNotAgreeWithTheLogAreTold(double steamOn, double ventClosed, double steamOff, String what) {
        double[] celsius = new double[100];
        Arrays.fill(celsius, 60);
        Arrays.fill(celsius, 4, 60, 122);
        Bench bench = Bench.every(5, 100)
                .marked(steamOn, ventClosed, steamOff)
                .with(Bench.temperature("chamber", Place.REFERENCE, 0.1, celsius));
        assertThat(evaluate(bench).findings())
                .filteredOn(f -> f.kind() == FindingKind.MARK_DIFFERS)
                .extracting(f -> f.facts().get("what"))
                .containsExactly(what);
        bench.marked(0, 0, 300);
        assertThat(evaluate(bench).findings()).noneMatch(f -> f.kind() == FindingKind.MARK_DIFFERS);
    }

    @Test
    void severalAttemptsAreTold() {
        double[] celsius = new double[60];
        Arrays.fill(celsius, 122);
        celsius[20] = 110;
        celsius[59] = 60;
        Evaluation evaluation =
                evaluate(Bench.every(5, 60).with(Bench.temperature("chamber", Place.REFERENCE, 0.1, celsius)));
        assertThat(evaluation.findings()).extracting(Finding::kind).contains(FindingKind.HOLD_IN_ATTEMPTS);
    }

    private static Criterion saturationWith(double[] pressed) {
        return evaluate(Bench.every(5, 20)
                        .with(Bench.temperature("chamber", Place.REFERENCE, 0.1, held(20)), Bench.pressure(1, pressed)))
                .criteria()
                .get(1);
    }

    private static LethalityAim chosen(ProbeChoice probes, LethalityUnit unit, LethalityAim.Limits limits) {
        return new LethalityAim(
                "F0", 121.11 + 273.15, 10, OptionalDouble.empty(), unit, limits, probes, true, Optional.empty());
    }

    @Test
    void lethalityWithoutAProductProbeDoesNotApply() {
        Evaluation evaluation = evaluate(Bench.every(5, 20)
                .with(Bench.temperature("chamber", Place.REFERENCE, 0.1, held(20)))
                .aiming(Bench.aim(121.11, 60, true)));
        Criterion lethality = evaluation.criteria().get(2);
        assertThat(lethality.decision()).isEqualTo(Decision.NOT_APPLICABLE);
        assertThat(lethality.what()).isEqualTo("F0 at the least product probe");
        assertThat(lethality.where()).isEqualTo("product");
        assertThat(lethality.unit()).isEqualTo("min");
        assertThat(lethality.why()).isEqualTo("not measured: no product probe; judged by time and temperature");
    }

    @Test
    void saturationWithoutPressureIsUndecided() {
        Evaluation evaluation =
                evaluate(Bench.every(5, 20).with(Bench.temperature("chamber", Place.REFERENCE, 0.1, held(20))));
        Criterion saturation = evaluation.criteria().get(1);
        assertThat(saturation.decision()).isEqualTo(Decision.UNDECIDED);
        assertThat(saturation.why()).isEqualTo("not judged: the chamber's absolute pressure is not known");
        assertThat(saturation.value()).isEmpty();
        assertThat(saturation.limit()).isEqualTo(-1);
        assertThat(saturation.atLeast()).isTrue();
    }

    @Test
    void notMetGoesBeforeUndecidedAndUndecidedBeforeMet() {
        Criterion met = criterion(Criterion.Subject.TIME_OR_TEMPERATURE, Decision.MET);
        Criterion open = criterion(Criterion.Subject.SATURATION, Decision.UNDECIDED);
        Criterion failed = criterion(Criterion.Subject.LETHALITY, Decision.NOT_MET);
        assertThat(outcome(List.of(met), List.of())).isEqualTo(Outcome.MET);
        assertThat(outcome(List.of(met, open), List.of())).isEqualTo(Outcome.UNDECIDED);
        assertThat(outcome(List.of(met, open, failed), List.of())).isEqualTo(Outcome.NOT_MET);
    }

    @Test
    void aBlockingFindingLeavesTheVerdictUndecidedAtBest() {
        Criterion met = criterion(Criterion.Subject.TIME_OR_TEMPERATURE, Decision.MET);
        Criterion failed = criterion(Criterion.Subject.TIME_OR_TEMPERATURE, Decision.NOT_MET);
        List<Finding> blocking = List.of(new Finding(FindingKind.LOG_ENDS_IN_HOLD, Position.RUN, Map.of()));
        assertThat(outcome(List.of(met), blocking)).isEqualTo(Outcome.UNDECIDED);
        assertThat(outcome(List.of(failed), blocking)).isEqualTo(Outcome.NOT_MET);
        assertThat(Verdict.of(List.of(met), blocking, false).because())
                .containsExactly("The log ends in the hold phase.");
    }

    @Test
    void withoutADecidedTimeOrTemperatureNothingIsJudged() {
        assertThat(outcome(List.of(criterion(Criterion.Subject.LETHALITY, Decision.MET)), List.of()))
                .isEqualTo(Outcome.NOTHING_JUDGED);
        assertThat(outcome(
                        List.of(criterion(Criterion.Subject.TIME_OR_TEMPERATURE, Decision.NOT_APPLICABLE)), List.of()))
                .isEqualTo(Outcome.NOTHING_JUDGED);
    }

    @Test
    void aDraftPlanGivesNoVerdict() {
        Criterion failed = criterion(Criterion.Subject.TIME_OR_TEMPERATURE, Decision.NOT_MET);
        assertThat(Verdict.of(List.of(failed), List.of(), true).outcome()).isEqualTo(Outcome.DRAFT_PLAN);
    }

    @Test
    void aLogThatEndsInTheHoldIsBlocked() {
        Evaluation evaluation = evaluate(Bench.every(5, 20)
                .with(Bench.temperature("chamber", Place.REFERENCE, 0.1, held(20)), Bench.pressure(1, steam(20))));
        assertThat(evaluation.findings()).extracting(Finding::kind).containsExactly(FindingKind.LOG_ENDS_IN_HOLD);
        assertThat(evaluation.verdict().outcome()).isEqualTo(Outcome.UNDECIDED);
    }

    @Test
    void rowsRefusedInTheHoldAreBlocking() {
        Reading reading = new Reading(
                "UTF-8",
                "comma",
                "full stop",
                "ISO 8601 without zone",
                List.of(),
                0,
                List.of(),
                List.of(new Reading.RefusedRows(9, 9, 1, "whole row", "its time is wrong")));
        double[] celsius = held(20);
        celsius[19] = 60;
        Bench bench = Bench.every(5, 20)
                .with(Bench.temperature("chamber", Place.REFERENCE, 0.1, celsius), Bench.pressure(1, steam(20)));
        Evaluation evaluation = Evaluation.of(bench.trace(), reading, bench.plan(), List.of());
        assertThat(evaluation.findings()).extracting(Finding::kind).containsExactly(FindingKind.ROWS_REFUSED_IN_HOLD);
        assertThat(evaluate(bench).verdict().outcome()).isEqualTo(Outcome.MET);
        assertThat(evaluation.verdict().outcome()).isEqualTo(Outcome.UNDECIDED);
    }

    @Test
    void samplesMissingInTheHoldAreBlocking() {
        double[] celsius = held(20);
        celsius[8] = Double.NaN;
        celsius[19] = 60;
        Evaluation evaluation = evaluate(Bench.every(5, 20)
                .with(Bench.temperature("chamber", Place.REFERENCE, 0.1, celsius), Bench.pressure(1, steam(20))));
        assertThat(evaluation.findings())
                .extracting(Finding::text)
                .containsExactly("1 samples of chamber are missing in the hold phase.");
    }

    @Test
    void aLimitThatIsNotJudgedIsUndecidedAndNeverPasses() {
        double[] celsius = held(20);
        celsius[0] = 100;
        celsius[19] = 60;
        Bench bench = Bench.every(5, 20)
                .with(Bench.temperature("chamber", Place.REFERENCE, 0.1, celsius), Bench.pressure(1, steam(20)));
        assertThat(evaluate(bench).verdict().outcome()).isEqualTo(Outcome.MET);
        Limit limit = new Limit(
                LimitKind.COME_UP_TIME,
                Measure.DURATION,
                new Limit.Scope(Optional.empty(), List.of(), List.of(), Limit.Which.EACH, OptionalDouble.empty()),
                new Limit.Terms(
                        Optional.empty(),
                        OptionalDouble.empty(),
                        OptionalDouble.empty(),
                        OptionalDouble.empty(),
                        Optional.empty()),
                Optional.of(new Limit.Figure(60, Datum.ABSOLUTE, "1 min")),
                Optional.of(new Limit.Figure(600, Datum.ABSOLUTE, "10 min")),
                List.of(),
                Optional.empty(),
                Optional.empty(),
                Optional.of("study TD-07"),
                Optional.empty());
        Evaluation evaluation = evaluate(bench.limiting(limit));
        assertThat(evaluation.verdict().outcome()).isEqualTo(Outcome.UNDECIDED);
        List<Criterion> added = evaluation.criteria().stream()
                .filter(c -> c.subject() == Criterion.Subject.OTHER)
                .toList();
        assertThat(added)
                .extracting(Criterion::id)
                .containsExactly("limit-1-come-up-time-least", "limit-1-come-up-time-most");
        assertThat(added).allSatisfy(c -> {
            assertThat(c.what()).isEqualTo("come-up-time, at least 1 min, at most 10 min");
            assertThat(c.why()).isEqualTo("not judged by this version");
            assertThat(c.decision()).isEqualTo(Decision.UNDECIDED);
            assertThat(c.value()).isEmpty();
            assertThat(c.phase()).isEqualTo("whole run");
        });
    }

    /** A retort's rules may find a fault where another process has none, so neither met nor not met may stand. */
    @ParameterizedTest
    @CsvSource({"55, MET", "900, NOT_MET"})
    void nothingIsDecidedWhereWhatIsAskedForIsNotHeeded(double required, Decision otherwise) {
        double[] celsius = held(20);
        celsius[0] = 100;
        celsius[19] = 60;
        Bench bench = Bench.every(5, 20)
                .holding(required)
                .with(Bench.temperature("chamber", Place.REFERENCE, 0.1, celsius), Bench.pressure(1, steam(20)));
        assertThat(evaluate(bench).criteria().get(0).decision()).isEqualTo(otherwise);
        Evaluation evaluation = evaluate(bench.unheeding("process: cooker"));
        assertThat(evaluation.criteria())
                .extracting(Criterion::decision)
                .doesNotContain(Decision.MET, Decision.NOT_MET);
        assertThat(evaluation.criteria().get(0).why())
                .endsWith("; not decided, since this version does not heed process: cooker");
        assertThat(evaluation.verdict().outcome()).isEqualTo(Outcome.UNDECIDED);
    }

    private static Outcome outcome(List<Criterion> criteria, List<Finding> findings) {
        return Verdict.of(criteria, findings, false).outcome();
    }

    private static Criterion criterion(Criterion.Subject subject, Decision decision) {
        return new Criterion(
                "id",
                subject,
                "what",
                "where",
                "hold",
                "s",
                OptionalDouble.of(1),
                1,
                true,
                OptionalDouble.empty(),
                Optional.empty(),
                decision,
                "why");
    }

    private static double[] held(int samples) {
        double[] celsius = new double[samples];
        Arrays.fill(celsius, 122);
        return celsius;
    }

    private static double[] steam(int samples) {
        double[] kilopascal = new double[samples];
        Arrays.fill(kilopascal, 211.59);
        return kilopascal;
    }

    private static Evaluation evaluate(Bench bench) {
        return Evaluation.of(bench.trace(), READING, bench.plan(), List.of());
    }
}
