package sill.stdlib;

import static org.assertj.core.api.Assertions.assertThat;

import org.junit.jupiter.api.Test;

class PlotsTest {
    @Test
    void lineDescribesItself() {
        Plot plot = Plots.line(
                        "Trip points over supply",
                        "supply",
                        "V",
                        new double[] {20, 24, 28},
                        "rising",
                        "V",
                        new double[] {5.1, 5.2, 5.3})
                .curve("falling", new double[] {4.3, Double.NaN, 4.3})
                .yLabel("trip point")
                .limit(4.9, "REQ-07")
                .referenceX(24, "nominal supply");
        assertThat(plot.title()).isEqualTo("Trip points over supply");
        assertThat(plot.description())
                .isEqualTo("trip point over supply, from 20 V to 28 V. \"rising\" lies from 5.1 V to 5.3 V."
                        + " \"falling\" lies at 4.3 V; 1 of 3 points are not finite."
                        + " Limit \"REQ-07\" at trip point 4.9 V. Reference \"nominal supply\" at supply 24 V.");
    }

    @Test
    void lineOfAFunctionSamplesBothEndsAndEvenly() {
        Plot.Curve curve = Plots.line("t", "supply", "V", 20, 28, "half", "V", v -> v / 2)
                .curves()
                .get(0);
        assertThat(curve.x()).hasSize(201).startsWith(20, 20.04).endsWith(28);
        assertThat(curve.y()).hasSize(201).startsWith(10, 10.02).endsWith(14);
    }

    @Test
    void responseSamplesByEvenRatioOnALogarithmicAxis() {
        Plot plot = Plots.response("Input filter", 10, 1e6, "gain", "1", f -> Filters.gain(f, 1e3, 1e-9))
                .limitX(159e3, "cutoff");
        Plot.Curve curve = plot.curves().get(0);
        assertThat(curve.x()).hasSize(201).startsWith(10).endsWith(1e6);
        for (int i = 1; i < curve.x().length; i++) {
            Figures.assertRelative("ratio", Math.pow(10, 5 / 200.0), curve.x()[i] / curve.x()[i - 1], 1e-12);
        }
        assertThat(plot.x()).isEqualTo(new Plot.Axis("frequency", "Hz", Plot.Scale.LOGARITHMIC));
        assertThat(plot.description())
                .isEqualTo("gain over frequency, from 10 Hz to 1 MHz, logarithmic. \"gain\" lies from 0.1572 to 1."
                        + " Limit \"cutoff\" at frequency 159 kHz.");
    }

    @Test
    void transferOfANoninvertingComparatorGoesHighWithTheInput() {
        Plot plot = Plots.transfer("Dew switch", new TripPoints(5.25, 4.5), 0.02, 22.5);
        assertThat(plot.curves())
                .containsExactly(
                        new Plot.Curve(
                                "input rising",
                                Plot.Style.LINE,
                                true,
                                new double[] {3.75, 5.25, 5.25, 6.0},
                                new double[] {0.02, 0.02, 22.5, 22.5}),
                        new Plot.Curve(
                                "input falling",
                                Plot.Style.LINE,
                                true,
                                new double[] {6.0, 4.5, 4.5, 3.75},
                                new double[] {22.5, 22.5, 0.02, 0.02}));
        assertThat(plot.marks())
                .containsExactly(
                        new Plot.Mark(Plot.Side.X, 5.25, "rising", Plot.Role.TRIP_POINT),
                        new Plot.Mark(Plot.Side.X, 4.5, "falling", Plot.Role.TRIP_POINT));
        assertThat(plot.description())
                .isEqualTo("output over input, from 3.75 V to 6 V."
                        + " \"input rising\" goes from 20 mV at 3.75 V to 22.5 V at 6 V."
                        + " \"input falling\" goes from 22.5 V at 6 V to 20 mV at 3.75 V."
                        + " Trip point \"rising\" at input 5.25 V. Trip point \"falling\" at input 4.5 V.");
    }

    @Test
    void transferOfAnInvertingComparatorGoesLowWithTheInput() {
        Plot plot = Plots.transfer("Dew switch", new TripPoints(5.2, 4.4), 22.5, 0.02);
        assertThat(plot.curves().get(0).y()).containsExactly(22.5, 22.5, 0.02, 0.02);
        assertThat(plot.curves().get(1).y()).containsExactly(0.02, 0.02, 22.5, 22.5);
    }

    @Test
    void transferWithoutABandStillHasRoomOnBothSides() {
        Plot plot = Plots.transfer("Plain", new TripPoints(5, 5), 0, 12);
        assertThat(plot.curves().get(0).x()).containsExactly(4, 5, 5, 6);
    }

    @Test
    void signalsRunOverTime() {
        Plot plot = Plots.signals("Bench", new double[] {0, 1e-3, 2e-3}, "vIn", "V", new double[] {0, 5, 0})
                .steps("vOut", new double[] {0, 12, 0})
                .tripPoints(new TripPoints(4, 3));
        assertThat(plot.x()).isEqualTo(new Plot.Axis("time", "s", Plot.Scale.LINEAR));
        assertThat(plot.y().label()).isEqualTo("vIn, vOut");
        assertThat(plot.description())
                .isEqualTo("vIn, vOut over time, from 0 s to 2 ms. \"vIn\" lies from 0 V to 5 V."
                        + " \"vOut\" lies from 0 V to 12 V. Trip point \"rising\" at vIn, vOut 4 V."
                        + " Trip point \"falling\" at vIn, vOut 3 V.");
    }

    @Test
    void aCurveWithoutAFinitePointSaysSo() {
        double[] nothing = {Double.NaN};
        assertThat(Plots.line("t", "a", "V", nothing, "b", "V", nothing).description())
                .isEqualTo("b over a. \"b\" has no finite point.");
    }
}
