package sill.study;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Test;

class SamplingTest {
    /** The moments of a triangular distribution with limits 1 and 5 and mode 2: (1+5+2)/3 and (1+25+4−5−2−10)/18. */
    @Test
    void anUnevenTriangleHasItsMoments() {
        Statistics found =
                new Trial().triangular("x", 2, 1, 5).samples(400_000, 3).statistics((in, out) -> out[0] = in[0]);
        assertThat(found.mean().value())
                .isCloseTo(8 / 3.0, within(5 * found.mean().standardError()));
        assertThat(found.sd().value())
                .isCloseTo(Math.sqrt(13 / 18.0), within(5 * found.sd().standardError()));
        assertThat(found.mean().standardError()).isCloseTo(Math.sqrt(13 / 18.0 / 400_000), within(1e-5));
        // F(2) = (2 − 1) / (5 − 1) is a quarter; the median is 5 − √6.
        assertThat(found.quantiles().get(2).estimate().value()).isCloseTo(5 - Math.sqrt(6), within(0.01));
        assertThat(found.min()).isGreaterThanOrEqualTo(1);
        assertThat(found.max()).isLessThanOrEqualTo(5);
    }

    @Test
    void failuresAreCountedAndStandOutside() {
        MonteCarlo found = new Trial()
                .uniform("x", 0.75, 0, 1)
                .windows(new Window(0, Double.POSITIVE_INFINITY), new Window(0.5, 0.75))
                .samples(100_000, 11)
                .of((in, out) -> {
                    if (in[0] < 0.25) {
                        throw new IllegalStateException("below a quarter");
                    }
                    out[0] = in[0] < 0.5 ? Double.POSITIVE_INFINITY : in[0];
                })
                .monteCarlo()
                .orElseThrow();
        assertThat(found.failures().thrown()).isBetween(24_000L, 26_000L);
        assertThat(found.failures().notFinite()).isBetween(24_000L, 26_000L);
        assertThat(found.failures().message()).contains("java.lang.IllegalStateException: below a quarter");
        long finite = 100_000 - found.failures().count();
        assertThat(found.shares().get(0).inside()).isEqualTo(finite);
        assertThat(found.shares().get(0).share()).isEqualTo(finite / 1e5);
        assertThat(found.shares().get(0).lowerBound())
                .isBetween(0.49, found.shares().get(0).share());
        assertThat(found.shares().get(1).share()).isCloseTo(0.25, within(0.01));
        assertThat(found.statistics().orElseThrow().min()).isGreaterThanOrEqualTo(0.5);
    }

    @Test
    void withoutFiniteSamplesThereAreNoStatistics() {
        MonteCarlo found = new Trial()
                .uniform("x", 0, 0, 1)
                .samples(5000, 1)
                .of((in, out) -> out[0] = in[0] == 0 ? 0 : Double.NaN)
                .monteCarlo()
                .orElseThrow();
        assertThat(found.statistics()).isEmpty();
        assertThat(found.failures().notFinite()).isEqualTo(5000);
        assertThat(found.failures().message()).isEmpty();
    }

    @Test
    void classesHoldAllSamples() {
        Statistics found =
                new Trial().normal("x", 0.1, 1).samples(50_000, 5).statistics((in, out) -> out[0] = 1 / in[0]);
        Histogram histogram = found.histogram();
        long inClasses = histogram.counts().stream().mapToLong(Long::longValue).sum();
        assertThat(histogram.below() + inClasses + histogram.above()).isEqualTo(50_000);
        assertThat(histogram.edges()).hasSize(histogram.counts().size() + 1).isSorted();
        assertThat(histogram.below()).isPositive();
    }
}
