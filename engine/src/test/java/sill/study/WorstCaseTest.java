package sill.study;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import java.util.stream.IntStream;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.constraints.DoubleRange;
import net.jqwik.api.constraints.IntRange;
import org.junit.jupiter.api.Test;
import sill.study.Setting.Place;

class WorstCaseTest {
    private static WorstCase worst(Trial trial, Model model) {
        return trial.worstCase().of(model).worstCase().orElseThrow();
    }

    private static List<Place> places(Extreme extreme) {
        return extreme.at().stream().map(Setting::place).toList();
    }

    /** By interval reasoning: the output rises with supply and lower resistor and falls with the upper one. */
    @Test
    void aDividerHasItsExtremesAtTwoCorners() {
        WorstCase found = worst(
                new Trial()
                        .uniform("v", 5, 4.9, 5.1)
                        .uniform("top", 1e4, 9.9e3, 1.01e4)
                        .uniform("bottom", 1e4, 9.9e3, 1.01e4),
                (in, out) -> out[0] = in[0] * in[2] / (in[1] + in[2]));
        assertThat(found.low().value()).isEqualTo(4.9 * 9.9e3 / (1.01e4 + 9.9e3));
        assertThat(found.high().value()).isEqualTo(5.1 * 1.01e4 / (9.9e3 + 1.01e4));
        assertThat(places(found.low())).containsExactly(Place.LOW, Place.HIGH, Place.LOW);
        assertThat(places(found.high())).containsExactly(Place.HIGH, Place.LOW, Place.HIGH);
        assertThat(found.directions()).containsExactly(Direction.RISING, Direction.FALLING, Direction.RISING);
        assertThat(found.monotonic()).isTrue();
        assertThat(found.low().inside()).isFalse();
        assertThat(found.failures().count()).isZero();
    }

    /**
     * By interval reasoning: a comparator with input resistor a, feedback b, reference r and output low l trips at
     * r + (r − l) a / b, and r stays above l; so it rises with r and a, falls with b and l.
     */
    @Test
    void aComparatorsTripPointHasItsExtremesAtTwoCorners() {
        WorstCase found = worst(
                new Trial()
                        .uniform("r", 5, 4.95, 5.05)
                        .uniform("a", 8200, 8118, 8282)
                        .uniform("b", 220e3, 217.8e3, 222.2e3)
                        .uniform("l", 0.02, 0, 0.06),
                (in, out) -> out[0] = in[0] * (1 + in[1] / in[2]) - in[3] * in[1] / in[2]);
        assertThat(found.low().value()).isCloseTo(4.95 + 4.89 * 8118 / 222.2e3, within(1e-14));
        assertThat(found.high().value()).isCloseTo(5.05 + 5.05 * 8282 / 217.8e3, within(1e-14));
        assertThat(places(found.low())).containsExactly(Place.LOW, Place.LOW, Place.HIGH, Place.HIGH);
        assertThat(places(found.high())).containsExactly(Place.HIGH, Place.HIGH, Place.LOW, Place.LOW);
        assertThat(found.directions())
                .containsExactly(Direction.RISING, Direction.RISING, Direction.FALLING, Direction.FALLING);
    }

    /** Maximum power transfer theorem: a source of resistance R gives a load most, v² / 4 R, where the load is R too. */
    @Test
    void aMatchedLoadPeaksInsideTheBox() {
        WorstCase found = worst(
                new Trial()
                        .uniform("v", 10, 9, 11)
                        .uniform("source", 50, 50, 50)
                        .uniform("load", 40, 20, 100),
                (in, out) -> out[0] = in[0] * in[0] * in[2] / ((in[1] + in[2]) * (in[1] + in[2])));
        assertThat(found.high().value()).isCloseTo(121.0 / 200, within(1e-12));
        assertThat(found.high().inside()).isTrue();
        assertThat(places(found.high())).containsExactly(Place.HIGH, Place.HELD, Place.BETWEEN);
        assertThat(found.high().at().get(2).value()).isCloseTo(50, within(1e-3));
        assertThat(found.directions()).containsExactly(Direction.RISING, Direction.NONE, Direction.NEITHER);
        assertThat(found.low().value()).isEqualTo(81.0 * 20 / (70 * 70));
        assertThat(found.low().inside()).isFalse();
    }

    @Test
    void onePeakOfOneInputIsFound() {
        WorstCase found = worst(
                new Trial().uniform("load", 40, 20, 100),
                (in, out) -> out[0] = 100 * in[0] / ((50 + in[0]) * (50 + in[0])));
        assertThat(found.high().value()).isCloseTo(0.5, within(1e-14));
        assertThat(found.high().inside()).isTrue();
    }

    /** A sum of squares about a point inside, on which all but one corner lie higher. */
    @Test
    void aValleyOfManyInputsIsFound() {
        double[] floor = {0.3, -0.2, 0.7, 0.1, -0.6, 0.45};
        Trial trial = new Trial();
        IntStream.range(0, 6).forEach(i -> trial.uniform("x" + i, 0, -1, 1));
        WorstCase found = worst(trial, (in, out) -> {
            double sum = 3;
            for (int i = 0; i < 6; i++) {
                sum += (in[i] - floor[i]) * (in[i] - floor[i]) * (i + 1);
            }
            out[0] = sum;
        });
        assertThat(found.low().value()).isCloseTo(3, within(1e-9));
        assertThat(found.low().inside()).isTrue();
        for (int i = 0; i < 6; i++) {
            assertThat(found.low().at().get(i).value()).isCloseTo(floor[i], within(1e-4));
        }
    }

    /** 24 inputs, of which four fall: the extremes of a weighted sum are known. */
    @Test
    void beyondTwentyInputsSlopesChooseTheSides() {
        Trial trial = new Trial();
        IntStream.range(0, 24).forEach(i -> trial.uniform("x" + i, 1, 0.5, 2));
        WorstCase found = worst(trial, (in, out) -> {
            double sum = 0;
            for (int i = 0; i < 24; i++) {
                sum += i % 6 == 5 ? -in[i] : 1 / (1 + 1 / in[i]);
            }
            out[0] = sum;
        });
        assertThat(found.high().value()).isCloseTo(20 * 2 / 3.0 - 4 * 0.5, within(1e-12));
        assertThat(found.low().value()).isCloseTo(20 / 3.0 - 4 * 2, within(1e-12));
        assertThat(found.directions().get(5)).isEqualTo(Direction.FALLING);
        assertThat(found.directions().get(6)).isEqualTo(Direction.RISING);
        assertThat(found.evaluations()).isGreaterThan(2L << 20);
    }

    @Test
    void exceptionsAndInfinitiesAreCounted() {
        WorstCase found = worst(new Trial().uniform("a", 0.5, 0, 1).uniform("b", 1, 1, 2), (in, out) -> {
            if (in[0] == 1 && in[1] == 2) {
                throw new ArithmeticException("no room");
            }
            out[0] = in[1] / in[0];
        });
        assertThat(found.failures().notFinite()).isPositive();
        assertThat(found.failures().thrown()).isPositive();
        assertThat(found.failures().message()).contains("java.lang.ArithmeticException: no room");
        assertThat(found.low().value()).isGreaterThanOrEqualTo(1);
        assertThat(found.high().value()).isGreaterThan(2);
    }

    /** No extreme is less extreme than a point that was evaluated: the model keeps its own record. */
    @Property(tries = 40)
    void noEvaluatedPointIsMoreExtreme(
            @ForAll @IntRange(min = 1, max = 5) int inputs, @ForAll @DoubleRange(min = 0.5, max = 12) double waves) {
        Trial trial = new Trial();
        IntStream.range(0, inputs).forEach(i -> trial.uniform("x" + i, 0.1, -1, 1.5));
        double[] seen = {Double.POSITIVE_INFINITY, Double.NEGATIVE_INFINITY};
        WorstCase found = worst(trial.cores(1), (in, out) -> {
            double y = 0;
            for (double x : in) {
                y += StrictMath.sin(waves * x) + 0.1 * x;
            }
            seen[0] = Math.min(seen[0], y);
            seen[1] = Math.max(seen[1], y);
            out[0] = y;
        });
        assertThat(found.low().value()).isEqualTo(seen[0]);
        assertThat(found.high().value()).isEqualTo(seen[1]);
    }
}
