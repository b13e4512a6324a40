package sill.plot;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.Arrays;
import java.util.stream.IntStream;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.constraints.IntRange;
import org.junit.jupiter.api.Test;

class DecimationTest {
    private static final int LENGTH = 100_000;

    /** One point out of line, anywhere in a long curve, is still drawn: up or down, along or across. */
    @Property(tries = 200)
    void noSpikeIsLost(@ForAll @IntRange(max = LENGTH - 1) int at, @ForAll boolean up, @ForAll boolean toAndFro) {
        double[] x = IntStream.range(0, LENGTH)
                .mapToDouble(i -> toAndFro ? 300 + 300 * StrictMath.sin(i * 1.7) : i * 600.0 / LENGTH)
                .toArray();
        double[] y = IntStream.range(0, LENGTH)
                .mapToDouble(i -> 100 + 10 * StrictMath.sin(i * 0.01))
                .toArray();
        y[at] = up ? 200 : 0;
        int[] kept = Decimation.line(x, y, 1, 4000);
        assertThat(kept).contains(at).isSorted().doesNotHaveDuplicates();
        assertThat(kept.length).isLessThanOrEqualTo(4006);
    }

    @Test
    void aShortCurveStaysWhole() {
        double[] x = {0, 0.1, 0.2, 0.3, 0.4, 0.5, 0.6, 0.7};
        assertThat(Decimation.line(x, x, 1, 8)).containsExactly(0, 1, 2, 3, 4, 5, 6, 7);
    }

    @Test
    void bothEndsStay() {
        double[] x = IntStream.range(0, 5000).mapToDouble(i -> i / 10.0).toArray();
        int[] kept = Decimation.line(x, x, 1, 2000);
        assertThat(kept).startsWith(0).endsWith(4999);
    }

    @Test
    void everyPointAloneHasOneThatIsDrawnNearby() {
        double[] x = IntStream.range(0, LENGTH)
                .mapToDouble(i -> (i * 7919L % 6000) / 10.0)
                .toArray();
        double[] y = IntStream.range(0, LENGTH)
                .mapToDouble(i -> (i * 104729L % 3300) / 10.0)
                .toArray();
        x[777] = 1000;
        int[] kept = Decimation.points(x, y, 4000);
        assertThat(kept.length).isBetween(1000, 4000);
        assertThat(kept).contains(777);
        for (int i = 0; i < LENGTH; i += 991) {
            int point = i;
            assertThat(Arrays.stream(kept).anyMatch(k -> Math.hypot(x[k] - x[point], y[k] - y[point]) < 20))
                    .isTrue();
        }
    }
}
