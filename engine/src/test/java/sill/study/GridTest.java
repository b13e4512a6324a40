package sill.study;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Test;

class GridTest {
    private static final int MORE = 3 * SamplingRun.KEPT;

    /** The same samples through a model that also keeps them; one thread, so that they come in order. */
    private static void compare(Trial trial, Model model) {
        double[] all = new double[MORE];
        int[] count = {-1_000_000};
        Statistics found = trial.samples(MORE, 9).cores(1).statistics((in, out) -> {
            model.evaluate(in, out);
            if (count[0] >= 0) {
                all[count[0]++] = out[0];
            }
            if (count[0] == -1_000_000) {
                // The nominal point, then the slopes: 20 for each input.
                count[0] = -20 * in.length;
            } else if (count[0] < 0) {
                count[0]++;
            }
        });
        assertThat(count[0]).isEqualTo(MORE);
        BucketSort.sort(all);
        Sorted sorted = new Sorted(all, MORE);
        for (Quantile quantile : found.quantiles()) {
            Estimate estimate = quantile.estimate();
            assertThat(estimate.resolution()).isPositive().isLessThan(3 * estimate.standardError());
            assertThat(estimate.value())
                    .isCloseTo(sorted.quantile(quantile.probability()), within(estimate.resolution()));
        }
        ShortestInterval interval = ShortestInterval.of(sorted);
        double width = interval.high() - interval.low();
        assertThat(found.high().value() - found.low().value())
                .isCloseTo(
                        width,
                        within(2 * (found.low().resolution() + found.high().resolution())));
        assertThat(found.min()).isEqualTo(all[0]);
        assertThat(found.max()).isEqualTo(all[MORE - 1]);
        Histogram histogram = found.histogram();
        long above = histogram.below();
        for (int i = 0; i < histogram.counts().size(); i++) {
            above += histogram.counts().get(i);
            long upTo = sorted.atMost(histogram.edges().get(i + 1));
            assertThat(above).isBetween(upTo - 2, upTo + 2);
        }
    }

    @Test
    void manySamplesAreCountedWithinTheResolution() {
        compare(
                new Trial().normal("a", 5, 0.1).triangular("b", 2, 1, 2.5).uniform("c", 0, -0.1, 0.3),
                (in, out) -> out[0] = in[0] * in[1] + in[2]);
    }

    @Test
    void longTailsDoNotSpoilIt() {
        compare(new Trial().uniform("a", 1, 1e-6, 2), (in, out) -> out[0] = 1 / in[0]);
    }

    @Test
    void equalSamplesStayEqual() {
        Statistics found = new Trial().uniform("a", 1, 0, 2).samples(MORE, 1).statistics((in, out) -> out[0] = 7.5);
        assertThat(found.quantiles())
                .allSatisfy(each -> assertThat(each.estimate().value()).isEqualTo(7.5));
        assertThat(found.low().value()).isEqualTo(7.5);
        assertThat(found.high().value()).isEqualTo(7.5);
        assertThat(found.mean().value()).isEqualTo(7.5);
        assertThat(found.sd().value()).isZero();
    }
}
