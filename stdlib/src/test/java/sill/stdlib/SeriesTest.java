package sill.stdlib;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.Arrays;
import java.util.stream.DoubleStream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.EnumSource;

class SeriesTest {
    /** The numbers of a series from 1 to 10, from the published table. */
    static double[] published(Series series) {
        return PublishedTable.read("iec60063.txt").stream()
                .filter(row -> row.get("series").equals(series.name()))
                .flatMap(row -> Arrays.stream(row.get("numbers").split(" ")))
                .mapToDouble(Double::parseDouble)
                .toArray();
    }

    @ParameterizedTest
    @EnumSource
    void everyNumberIsThePublishedOne(Series series) {
        double[] expected = published(series);
        assertThat(expected).hasSize(Integer.parseInt(series.name().substring(1)));
        assertThat(series.between(1, 9.99)).containsExactly(expected);
    }

    @ParameterizedTest
    @CsvSource({"E24, 2.6, 2.7", "E24, 2.9, 3.0", "E24, 4.6, 4.7", "E24, 8.3, 8.2", "E192, 9.19, 9.20"})
    void irregularNumbersReplaceTheRoundedPower(Series series, double power, double standard) {
        assertThat(series.between(1, 9.99)).contains(standard).doesNotContain(power);
    }

    @ParameterizedTest
    @CsvSource({"-9, e-9", "-3, e-3", "0, e0", "5, e5", "12, e12", "100, e100"})
    void numbersAreTheDoublesOfTheirLiterals(int decade, String suffix) {
        double[] literals = DoubleStream.of(published(Series.E24))
                .map(x -> Double.parseDouble(x + suffix))
                .toArray();
        assertThat(Series.E24.between(literals[0], literals[23])).containsExactly(literals);
    }

    @Test
    void printedSelections() {
        // Both printed in the documentation of a public library of standard values.
        assertThat(Series.E24.nearest(319)).isEqualTo(330);
        assertThat(Series.E96.atLeast(184)).isEqualTo(187);
        assertThat(Series.E24.between(4700, 5600)).containsExactly(4700, 5100, 5600);
        assertThat(Series.E24.atMost(5000)).isEqualTo(4700);
        assertThat(Series.E24.atLeast(5000)).isEqualTo(5100);
    }

    @Test
    void nearestIsByRatio() {
        // 33 from 22 and 47: 32.5 is nearer to 47 by ratio (√(22·47) = 32.16), to 22 by difference (34.5).
        assertThat(Series.E3.nearest(32.5)).isEqualTo(47);
        assertThat(Series.E3.nearest(32.1)).isEqualTo(22);
        assertThat(Series.E3.nearest(7)).isEqualTo(10);
    }

    @Test
    void aNumberWithinOnePartInABillionCountsAsPreferred() {
        for (double x : new double[] {4700 * (1 + 9e-10), 4700 * (1 - 9e-10), 4700}) {
            assertThat(Series.E12.atLeast(x)).isEqualTo(4700);
            assertThat(Series.E12.atMost(x)).isEqualTo(4700);
            assertThat(Series.E12.nearest(x)).isEqualTo(4700);
            assertThat(Series.E12.between(x, x)).containsExactly(4700);
        }
        assertThat(Series.E12.atLeast(4700 * (1 + 2e-9))).isEqualTo(5600);
        assertThat(Series.E12.atMost(4700 * (1 - 2e-9))).isEqualTo(3900);
        assertThat(Series.E12.between(4700 * (1 + 2e-9), 5600 * (1 - 2e-9))).isEmpty();
    }

    @Test
    void theEndsOfTheRangeAreServed() {
        assertThat(Series.E6.atLeast(1e-300)).isEqualTo(1e-300);
        assertThat(Series.E6.atMost(1e300)).isEqualTo(1e300);
        assertThat(Series.E6.nearest(1.1e299)).isEqualTo(1e299);
    }
}
