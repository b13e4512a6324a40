package sill.plot;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import java.util.stream.DoubleStream;
import net.jqwik.api.Assume;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.constraints.DoubleRange;
import org.junit.jupiter.api.Test;
import sill.stdlib.Plot;

/** Marks at 1, 2 and 5 times a power of ten are common practice; what is tested here is worked out by hand. */
class TicksTest {
    private static List<String> labels(double low, double high, Plot.Scale scale, String unit) {
        return Ticks.along(new AxisRange(low, high, scale), unit, 6).labelled().stream()
                .map(Ticks.Tick::text)
                .toList();
    }

    @Test
    void linearMarksAreRound() {
        assertThat(labels(0, 5, Plot.Scale.LINEAR, "V")).containsExactly("0", "1", "2", "3", "4", "5");
        assertThat(labels(-0.3, 0.31, Plot.Scale.LINEAR, "1"))
                .containsExactly("−0.3", "−0.2", "−0.1", "0.0", "0.1", "0.2", "0.3");
        assertThat(labels(0.0019, 0.0042, Plot.Scale.LINEAR, "A")).containsExactly("2.0", "2.5", "3.0", "3.5", "4.0");
        assertThat(labels(4999.9, 5000.2, Plot.Scale.LINEAR, "Ω"))
                .containsExactly("4.99990", "4.99995", "5.00000", "5.00005", "5.00010", "5.00015", "5.00020");
    }

    @Test
    void logarithmicMarksAreDecades() {
        assertThat(labels(1, 1e6, Plot.Scale.LOGARITHMIC, "Hz"))
                .containsExactly("10⁰", "10¹", "10²", "10³", "10⁴", "10⁵", "10⁶");
        assertThat(labels(10, 1e4, Plot.Scale.LOGARITHMIC, "Hz")).containsExactly("0.01", "0.1", "1", "10");
        assertThat(labels(90, 2000, Plot.Scale.LOGARITHMIC, "Ω")).containsExactly("0.1", "0.2", "0.5", "1", "2");
        assertThat(labels(20, 60, Plot.Scale.LOGARITHMIC, "Ω"))
                .containsExactly("20", "25", "30", "35", "40", "45", "50", "55", "60");
        assertThat(labels(1e-30, 1e30, Plot.Scale.LOGARITHMIC, "V"))
                .containsExactly("10⁻³⁰", "10⁻²⁰", "10⁻¹⁰", "10⁰", "10¹⁰", "10²⁰", "10³⁰");
    }

    @Test
    void numbersOfAHorizontalAxisHaveRoom() {
        AxisRange range = new AxisRange(1e6, 1.00001e6, Plot.Scale.LINEAR);
        Ticks ticks = Ticks.within(range, "Ω", 300);
        assertThat(ticks.labelled().stream().map(Ticks.Tick::text)).containsExactly("1.000000", "1.000005", "1.000010");
    }

    @Property
    void marksLieInTheRangeAndAreFewAndDistinct(
            @ForAll @DoubleRange(min = -1e12, max = 1e12) double a,
            @ForAll @DoubleRange(min = -1e12, max = 1e12) double b) {
        Assume.that(a != b);
        AxisRange range = AxisRange.around(DoubleStream.of(a, b), Plot.Scale.LINEAR, 0);
        Ticks ticks = Ticks.along(range, "V", 6);
        assertThat(ticks.labelled()).hasSizeBetween(2, 10);
        assertThat(ticks.labelled())
                .allSatisfy(tick -> assertThat(range.fraction(tick.value())).isBetween(-1e-9, 1 + 1e-9));
        assertThat(ticks.labelled().stream().map(Ticks.Tick::text)).doesNotHaveDuplicates();
        assertThat(ticks.between()).hasSizeLessThan(60);
    }
}
