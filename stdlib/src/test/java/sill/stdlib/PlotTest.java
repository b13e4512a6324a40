package sill.stdlib;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import org.junit.jupiter.api.Test;

class PlotTest {
    private static final double[] XS = {20, 24, 28};
    private static final double[] YS = {5.1, 5.2, 5.3};
    private static final Plot PLOT = Plots.line("Trip point over supply", "supply", "V", XS, "rising", "V", YS);

    @Test
    void additionsLeaveThePlotAsItWas() {
        String before = PLOT.toString();
        PLOT.curve("falling", XS)
                .steps("output", XS)
                .points("bench", XS, YS)
                .limit(4.9, "REQ-07")
                .limitX(21, "REQ-01")
                .reference(5, "nominal")
                .referenceX(24, "nominal")
                .tripPoints(new TripPoints(5.2, 4.4))
                .yLabel("trip point")
                .logX()
                .logY();
        assertThat(PLOT.toString()).isEqualTo(before);
    }

    @Test
    void arraysAreCopied() {
        double[] xs = XS.clone();
        Plot plot = Plots.line("t", "a", "V", xs, "b", "V", YS);
        xs[0] = 0;
        plot.curves().get(0).x()[1] = 0;
        plot.curves().get(0).y()[1] = 0;
        assertThat(plot.curves().get(0).x()).containsExactly(XS);
        assertThat(plot.curves().get(0).y()).containsExactly(YS);
    }

    @Test
    void curvesKeepTheirStyleAndAbscissas() {
        Plot plot =
                PLOT.curve("half", x -> x / 2).steps("output", YS).points("bench", new double[] {25}, new double[] {5});
        assertThat(plot.curves())
                .containsExactly(
                        new Plot.Curve("rising", Plot.Style.LINE, false, XS, YS),
                        new Plot.Curve("half", Plot.Style.LINE, false, XS, new double[] {10, 12, 14}),
                        new Plot.Curve("output", Plot.Style.STEP, false, XS, YS),
                        new Plot.Curve("bench", Plot.Style.POINTS, false, new double[] {25}, new double[] {5}));
    }

    @Test
    void marksStandOnTheirAxisWithTheirRole() {
        Plot plot = PLOT.limit(4.9, "REQ-07")
                .limitX(21, "REQ-01")
                .reference(5, "vRef")
                .referenceX(24, "nominal")
                .tripPoints(new TripPoints(5.2, 4.4))
                .tripPointsX(new TripPoints(26, 25));
        assertThat(plot.marks())
                .containsExactly(
                        new Plot.Mark(Plot.Side.Y, 4.9, "REQ-07", Plot.Role.LIMIT),
                        new Plot.Mark(Plot.Side.X, 21, "REQ-01", Plot.Role.LIMIT),
                        new Plot.Mark(Plot.Side.Y, 5, "vRef", Plot.Role.REFERENCE),
                        new Plot.Mark(Plot.Side.X, 24, "nominal", Plot.Role.REFERENCE),
                        new Plot.Mark(Plot.Side.Y, 5.2, "rising", Plot.Role.TRIP_POINT),
                        new Plot.Mark(Plot.Side.Y, 4.4, "falling", Plot.Role.TRIP_POINT),
                        new Plot.Mark(Plot.Side.X, 26, "rising", Plot.Role.TRIP_POINT),
                        new Plot.Mark(Plot.Side.X, 25, "falling", Plot.Role.TRIP_POINT));
    }

    @Test
    void theVerticalAxisIsNamedAfterAllCurvesUnlessItIsNamed() {
        assertThat(PLOT.curve("falling", YS).y().label()).isEqualTo("rising, falling");
        assertThat(PLOT.yLabel("trip point").curve("falling", YS).y().label()).isEqualTo("trip point");
        assertThat(PLOT.curve("falling", YS).yLabel("trip point").y().label()).isEqualTo("trip point");
    }

    @Test
    void logarithmicAxesKeepTheRest() {
        Plot plot = PLOT.limit(5, "REQ-07").logX().logY();
        assertThat(plot.x()).isEqualTo(new Plot.Axis("supply", "V", Plot.Scale.LOGARITHMIC));
        assertThat(plot.y()).isEqualTo(new Plot.Axis("rising", "V", Plot.Scale.LOGARITHMIC));
        assertThat(plot.marks()).hasSize(1);
    }

    @Test
    void twoPlotsOfTheSameAreEqual() {
        Plot same = Plots.line("Trip point over supply", "supply", "V", XS.clone(), "rising", "V", YS.clone());
        assertThat(same).isEqualTo(PLOT).hasSameHashCodeAs(PLOT);
        assertThat(same.curve("rising", new double[] {5.1, 5.2, 5.4})).isNotEqualTo(PLOT.curve("rising", YS));
        List<Plot.Curve> curves = List.of(
                new Plot.Curve("a", Plot.Style.LINE, false, XS, YS),
                new Plot.Curve("b", Plot.Style.LINE, false, XS, YS),
                new Plot.Curve("a", Plot.Style.STEP, false, XS, YS),
                new Plot.Curve("a", Plot.Style.LINE, true, XS, YS),
                new Plot.Curve("a", Plot.Style.LINE, false, YS, YS),
                new Plot.Curve("a", Plot.Style.LINE, false, XS, XS));
        assertThat(curves).doesNotHaveDuplicates();
    }

    @Test
    void theTextOfACurveHasNoAddressOfTheMachine() {
        assertThat(PLOT.curves().get(0)).hasToString("Curve[rising, LINE, 3 points]");
    }
}
