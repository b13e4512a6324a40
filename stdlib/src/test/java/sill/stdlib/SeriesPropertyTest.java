package sill.stdlib;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import java.util.Map;
import java.util.concurrent.ConcurrentHashMap;
import java.util.stream.DoubleStream;
import java.util.stream.IntStream;
import net.jqwik.api.Arbitraries;
import net.jqwik.api.Arbitrary;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.Provide;

/** The series against a search through all numbers of the published table. */
class SeriesPropertyTest {
    private static final Map<Series, List<Double>> ALL = new ConcurrentHashMap<>();

    @Property(seed = "60063")
    void stepsAgreeWithASearch(@ForAll Series series, @ForAll("values") double x) {
        List<Double> all = around(series);
        double atMost = all.stream().filter(v -> v <= x).max(Double::compare).orElseThrow();
        double atLeast = all.stream().filter(v -> v >= x).min(Double::compare).orElseThrow();
        assertThat(series.atMost(x)).isEqualTo(atMost);
        assertThat(series.atLeast(x)).isEqualTo(atLeast);
        double nearest = all.stream()
                .min((a, b) -> Double.compare(distance(a, x), distance(b, x)))
                .orElseThrow();
        assertThat(distance(series.nearest(x), x)).isLessThanOrEqualTo(distance(nearest, x) + 1e-14);
    }

    @Property(seed = "60063")
    void betweenGivesAllAndOnlyThose(@ForAll Series series, @ForAll("values") double a, @ForAll("values") double b) {
        double low = Math.min(a, b);
        double high = Math.max(a, b);
        double[] expected = around(series).stream()
                .filter(v -> low <= v && v <= high)
                .mapToDouble(v -> v)
                .toArray();
        assertThat(series.between(low, high)).containsExactly(expected);
    }

    @Property(seed = "60063")
    void aPreferredNumberIsItsOwnNeighbour(@ForAll Series series, @ForAll("places") int place) {
        List<Double> all = around(series);
        double x = all.get(Math.floorMod(place, all.size()));
        assertThat(series.nearest(x)).isEqualTo(x);
        assertThat(series.atLeast(x)).isEqualTo(x);
        assertThat(series.atMost(x)).isEqualTo(x);
    }

    @Provide
    Arbitrary<Double> values() {
        return Arbitraries.doubles().between(-11.9, 11.9).ofScale(9).map(power -> Math.pow(10, power));
    }

    @Provide
    Arbitrary<Integer> places() {
        return Arbitraries.integers().greaterOrEqual(0);
    }

    private static double distance(double a, double b) {
        return Math.abs(Math.log(a / b));
    }

    private static List<Double> around(Series series) {
        return ALL.computeIfAbsent(series, SeriesPropertyTest::allDecades);
    }

    private static List<Double> allDecades(Series series) {
        double[] published = SeriesTest.published(series);
        return IntStream.rangeClosed(-12, 12)
                .boxed()
                .flatMap(decade -> DoubleStream.of(published).mapToObj(number -> Double.valueOf(number + "e" + decade)))
                .toList();
    }
}
