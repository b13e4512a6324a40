package sill.stdlib;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.Arrays;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.function.ToDoubleFunction;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** Helpers against textbook examples, alone and in combination. */
class PublishedHelpersTest {
    private static final Map<String, ToDoubleFunction<double[]>> HELPERS = Map.ofEntries(
            Map.entry("output", a -> Dividers.output(a[0], a[1], a[2])),
            Map.entry("output loaded", a -> Dividers.output(a[0], a[1], a[2], a[3])),
            Map.entry(
                    "loading error in %",
                    a -> 100 * (Dividers.output(a[0], a[1], a[2], a[3]) / Dividers.output(a[0], a[1], a[2]) - 1)),
            Map.entry("series plus source resistance", a -> a[0] + Dividers.sourceResistance(a[1], a[2])),
            Map.entry("parallel", Dividers::parallel),
            Map.entry("noninverting rising", a -> noninverting(a).rising()),
            Map.entry("noninverting falling", a -> noninverting(a).falling()),
            Map.entry("noninverting band", a -> noninverting(a).band()),
            Map.entry("inverting rising", a -> inverting(a).rising()),
            Map.entry("inverting falling", a -> inverting(a).falling()),
            Map.entry("inverting band", a -> inverting(a).band()),
            Map.entry("timeToReach", a -> Filters.timeToReach(a[0], a[1], a[2], a[3], a[4])),
            Map.entry("gain", a -> Filters.gain(a[0], a[1], a[2])),
            Map.entry(
                    "gain in dB at the cutoff",
                    a -> 20 * Math.log10(Filters.gain(Filters.cutoff(a[0], a[1]), a[0], a[1]))),
            Map.entry("rise time from 10 % to 90 %", a -> riseTime(a[0], a[1])),
            Map.entry("rise time times cutoff", a -> riseTime(a[0], a[1]) * Filters.cutoff(a[0], a[1])),
            Map.entry(
                    "noise bandwidth over cutoff",
                    a -> Filters.noiseBandwidth(a[0], a[1]) / Filters.cutoff(a[0], a[1])),
            Map.entry("cutoff behind a divider", a -> Filters.cutoff(Dividers.sourceResistance(a[0], a[1]), a[2])),
            Map.entry("oscillator frequency", PublishedHelpersTest::oscillator));

    static Stream<PublishedTable.Row> rows() {
        return Stream.of("dividers.txt", "comparators.txt", "filters.txt")
                .flatMap(file -> PublishedTable.read(file).stream());
    }

    @ParameterizedTest
    @MethodSource("rows")
    void helperGivesThePublishedValue(PublishedTable.Row row) {
        double[] arguments = Arrays.stream(row.get("arguments").split(","))
                .mapToDouble(Double::parseDouble)
                .toArray();
        double actual = HELPERS.get(row.get("helper")).applyAsDouble(arguments);
        if (!row.get("published").equals("-")) {
            Figures.assertPrinted(row.toString(), row.get("published"), actual);
        }
        Figures.assertPrinted(row.toString(), row.get("computed"), actual);
    }

    @Test
    void everyHelperHereHasARow() {
        Set<String> seen = new HashSet<>(rows().map(row -> row.get("helper")).toList());
        assertThat(seen).isEqualTo(HELPERS.keySet());
        assertThat(List.copyOf(rows().toList())).hasSizeGreaterThan(55);
    }

    private static TripPoints noninverting(double[] a) {
        return Comparators.noninverting(a[0], a[1], a[2], a[3], a[4]);
    }

    private static TripPoints inverting(double[] a) {
        return Comparators.inverting(a[0], a[1], a[2], a[3], a[4], a[5]);
    }

    private static double riseTime(double r, double c) {
        return Filters.timeToReach(r, c, 0, 1, 0.9) - Filters.timeToReach(r, c, 0, 1, 0.1);
    }

    /** An inverting comparator that charges its own input: rBottom to 0 V, rFb to the output of ±10 V. */
    private static double oscillator(double[] a) {
        TripPoints trip = Comparators.inverting(0, 2 * a[2], 2 * a[2], a[3], -10, 10);
        return 1
                / (Filters.timeToReach(a[0], a[1], trip.falling(), 10, trip.rising())
                        + Filters.timeToReach(a[0], a[1], trip.rising(), -10, trip.falling()));
    }
}
