package sill.stdlib;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;

/** Says in words what a plot shows: what runs over what, from where to where, what is marked. */
final class PlotDescription {
    private PlotDescription() {}

    static String of(Plot.Axis x, Plot.Axis y, List<Plot.Curve> curves, List<Plot.Mark> marks) {
        List<String> sentences = new ArrayList<>();
        sentences.add(y.label() + " over " + x.label() + span(x, curves) + ".");
        for (Plot.Curve curve : curves) {
            sentences.add(sentence(curve, x, y));
        }
        for (Plot.Mark mark : marks) {
            Plot.Axis axis = mark.side() == Plot.Side.X ? x : y;
            sentences.add(role(mark) + " at " + axis.label() + " " + Engineering.text(mark.at(), axis.unit()) + ".");
        }
        return String.join(" ", sentences);
    }

    private static String span(Plot.Axis x, List<Plot.Curve> curves) {
        double[] finite = curves.stream()
                .flatMapToDouble(curve -> Arrays.stream(curve.x()))
                .filter(Double::isFinite)
                .sorted()
                .toArray();
        String scale = x.scale() == Plot.Scale.LOGARITHMIC ? ", logarithmic" : "";
        return finite.length == 0 ? scale : ", " + range(finite, x.unit()) + scale;
    }

    private static String sentence(Plot.Curve curve, Plot.Axis x, Plot.Axis y) {
        double[] xs = curve.x();
        double[] ys = curve.y();
        double[] finite = Arrays.stream(ys).filter(Double::isFinite).sorted().toArray();
        String name = "\"" + curve.label() + "\"";
        if (finite.length == 0) {
            return name + " has no finite point.";
        }
        if (curve.arrow()) {
            int end = xs.length - 1;
            return name + " goes from " + point(xs[0], ys[0], x, y) + " to " + point(xs[end], ys[end], x, y) + ".";
        }
        String gaps = finite.length == ys.length
                ? ""
                : "; " + (ys.length - finite.length) + " of " + ys.length + " points are not finite";
        return name + " lies " + range(finite, y.unit()) + gaps + ".";
    }

    private static String range(double[] sorted, String unit) {
        double low = sorted[0];
        double high = sorted[sorted.length - 1];
        return low == high
                ? "at " + Engineering.text(low, unit)
                : "from " + Engineering.text(low, unit) + " to " + Engineering.text(high, unit);
    }

    private static String point(double x, double y, Plot.Axis xAxis, Plot.Axis yAxis) {
        return Engineering.text(y, yAxis.unit()) + " at " + Engineering.text(x, xAxis.unit());
    }

    private static String role(Plot.Mark mark) {
        String name = "\"" + mark.label() + "\"";
        return switch (mark.role()) {
            case LIMIT -> "Limit " + name;
            case TRIP_POINT -> "Trip point " + name;
            case REFERENCE -> "Reference " + name;
        };
    }
}
