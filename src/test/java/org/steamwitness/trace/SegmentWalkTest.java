package org.steamwitness.trace;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.constraints.DoubleRange;
import net.jqwik.api.constraints.IntRange;
import net.jqwik.api.constraints.Size;
import org.junit.jupiter.api.Test;

class SegmentWalkTest {

    private static final double NONE = Double.NaN;

    @Test
    void visitsEverySegmentOfAWholeColumn() {
        assertThat(walked(new double[] {0, 5, 10}, new double[] {1, 2, 4}, 10, 0, 2))
                .isEqualTo("0.0:1.0-5.0:2.0 5.0:2.0-10.0:4.0 covered 10.0 bridged 0.0 lost 0.0");
    }

    @Test
    void bridgesAMissingSampleWithinTheLongestGap() {
        assertThat(walked(new double[] {0, 5, 10}, new double[] {1, NONE, 3}, 10, 0, 2))
                .isEqualTo("0.0:1.0-10.0:3.0 covered 10.0 bridged 10.0 lost 0.0");
    }

    @Test
    void neverCrossesALongerGap() {
        assertThat(walked(new double[] {0, 5, 16, 21}, new double[] {1, 2, 3, 4}, 10, 0, 3))
                .isEqualTo("0.0:1.0-5.0:2.0 16.0:3.0-21.0:4.0 covered 10.0 bridged 0.0 lost 11.0");
    }

    @Test
    void cutsABridgedSegmentAtAPhaseBoundary() {
        double[] seconds = {0, 5, 10};
        double[] values = {1, NONE, 3};
        assertThat(walked(seconds, values, 10, 0, 1)).isEqualTo("0.0:1.0-5.0:2.0 covered 5.0 bridged 5.0 lost 0.0");
        assertThat(walked(seconds, values, 10, 1, 2)).isEqualTo("5.0:2.0-10.0:3.0 covered 5.0 bridged 5.0 lost 0.0");
    }

    @Test
    void losesTheTimeBeforeTheFirstAndAfterTheLastValue() {
        assertThat(walked(new double[] {0, 5, 10, 15, 20}, new double[] {NONE, 2, 3, NONE, NONE}, 10, 0, 4))
                .isEqualTo("5.0:2.0-10.0:3.0 covered 5.0 bridged 0.0 lost 15.0");
    }

    @Test
    void countsAnEmptyColumnAsLost() {
        assertThat(walked(new double[] {0, 5}, new double[] {NONE, NONE}, 10, 0, 1))
                .isEqualTo("covered 0.0 bridged 0.0 lost 5.0");
        assertThat(walked(new double[] {0}, new double[] {7}, 10, 0, 0)).isEqualTo("covered 0.0 bridged 0.0 lost 0.0");
    }

    @Property
    void neighbouringStretchesAddUp(
            @ForAll @Size(12) List<@DoubleRange(min = 0.1, max = 20) Double> steps,
            @ForAll @Size(13) List<@DoubleRange(min = -20, max = 100) Double> raw,
            @ForAll @IntRange(min = 0, max = 12) int cut) {
        double[] seconds = new double[13];
        for (int i = 1; i < 13; i++) {
            seconds[i] = seconds[i - 1] + steps.get(i - 1);
        }
        double[] values = raw.stream().mapToDouble(Double::doubleValue).toArray();
        for (int i = 0; i < values.length; i++) {
            values[i] = values[i] < 0 ? NONE : values[i];
        }
        SegmentWalk walk = new SegmentWalk(Column.of(seconds), Column.of(values), 12);
        double[] areas = new double[3];
        SegmentWalk.Coverage whole = walk.over(0, 12, area(areas, 0));
        SegmentWalk.Coverage parts = walk.over(0, cut, area(areas, 1)).plus(walk.over(cut, 12, area(areas, 2)));
        assertThat(areas[1] + areas[2]).isCloseTo(areas[0], within(1e-9 * (1 + areas[0])));
        assertThat(parts.coveredSeconds()).isCloseTo(whole.coveredSeconds(), within(1e-9));
        assertThat(parts.bridgedSeconds()).isCloseTo(whole.bridgedSeconds(), within(1e-9));
        assertThat(parts.lostSeconds()).isCloseTo(whole.lostSeconds(), within(1e-9));
        assertThat(whole.coveredSeconds() + whole.lostSeconds()).isCloseTo(seconds[12], within(1e-9));
    }

    private static SegmentWalk.Visitor area(double[] areas, int index) {
        return (a, u, b, v) -> areas[index] += (u + v) / 2 * (b - a);
    }

    private static String walked(double[] seconds, double[] values, double longestGap, int from, int to) {
        StringBuilder seen = new StringBuilder();
        SegmentWalk.Coverage c = new SegmentWalk(Column.of(seconds), Column.of(values), longestGap)
                .over(from, to, (a, u, b, v) -> seen.append(a + ":" + u + "-" + b + ":" + v + " "));
        return seen + "covered " + c.coveredSeconds() + " bridged " + c.bridgedSeconds() + " lost " + c.lostSeconds();
    }
}
