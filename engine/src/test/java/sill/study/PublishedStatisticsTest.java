package sill.study;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.ArrayList;
import java.util.List;
import java.util.stream.Stream;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.constraints.IntRange;
import org.apache.commons.math3.distribution.BinomialDistribution;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import sill.units.PublishedTable;

class PublishedStatisticsTest {
    static Stream<String[]> sets() {
        return PublishedTable.rows("nist-strd.tsv", 6).stream();
    }

    /** Values, or values of which the last two are repeated so many times. */
    private static double[] values(String text) {
        List<Double> values = new ArrayList<>();
        String[] words = text.split(" ");
        if (!words[2].equals("times")) {
            return Stream.of(words).mapToDouble(Double::parseDouble).toArray();
        }
        values.add(Double.valueOf(words[0]));
        for (int i = 0; i < Integer.parseInt(words[1]); i++) {
            values.add(Double.valueOf(words[3]));
            values.add(Double.valueOf(words[4]));
        }
        return values.stream().mapToDouble(Double::doubleValue).toArray();
    }

    @ParameterizedTest(name = "{0}")
    @MethodSource("sets")
    void certifiedMeansAndDeviations(
            String set, String text, String mean, String deviation, String allowed, String source) {
        double[] values = values(text);
        compare(Moments.of(values, values.length), mean, deviation, allowed, source);
        // In blocks of seven too.
        Moments together = new Moments();
        for (int from = 0; from < values.length; from += 7) {
            double[] block = java.util.Arrays.copyOfRange(values, from, Math.min(values.length, from + 7));
            together.add(Moments.of(block, block.length));
        }
        compare(together, mean, deviation, allowed, source);
    }

    private static void compare(Moments found, String mean, String deviation, String allowed, String source) {
        double certified = Double.parseDouble(mean);
        assertThat(found.mean().value()).as(source).isCloseTo(certified, within(Math.abs(certified) * 1e-15));
        double sd = Double.parseDouble(deviation);
        assertThat(found.standardDeviation().value())
                .as(source)
                .isCloseTo(sd, within(sd * Double.parseDouble(allowed)));
    }

    static Stream<String[]> bounds() {
        return PublishedTable.rows("binomial-bounds.tsv", 4).stream();
    }

    /** With one sample less the bound does not reach the share. */
    @ParameterizedTest
    @MethodSource("bounds")
    void boundsReachAShareWithTheseSamples(String inside, String samples, String share, String source) {
        long k = Long.parseLong(inside);
        long n = Long.parseLong(samples);
        double wanted = Double.parseDouble(share);
        assertThat(BinomialBound.lower(k, n)).as(source).isGreaterThanOrEqualTo(wanted);
        assertThat(BinomialBound.lower(k - 1, n - 1)).as(source).isLessThan(wanted);
    }

    /** By what defines it: were the share the bound, so many or more would lie inside with a chance of 5 %. */
    @Property(tries = 200)
    void theBoundSolvesItsEquation(
            @ForAll @IntRange(min = 1, max = 200_000) int samples, @ForAll @IntRange(max = 1_000_000) int part) {
        int inside = 1 + (int) ((long) part * (samples - 1) / 1_000_000);
        double bound = BinomialBound.lower(inside, samples);
        double chance = 1 - new BinomialDistribution(null, samples, bound).cumulativeProbability(inside - 1);
        assertThat(chance).isCloseTo(0.05, within(1e-6));
    }
}
