package sill.record;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import sill.record.DesignRecord.Limit;
import sill.record.DesignRecord.ToleranceEntry;
import sill.stdlib.Plot;
import sill.stdlib.Plot.Axis;
import sill.stdlib.Plot.Mark;
import sill.stdlib.Plot.Role;
import sill.stdlib.Plot.Scale;
import sill.stdlib.Plot.Side;
import sill.values.Finding;

/** The samples of a tolerance run as a plot: the share of each stretch of values, limits of checks, extremes. */
public final class HistogramPlot {
    private HistogramPlot() {}

    /** The plot; nothing without samples, or where all are the same. */
    public static Optional<Plot> of(ToleranceEntry entry) {
        Finding finding = entry.finding();
        return finding.monteCarlo()
                .filter(found -> found.histogram().from() < found.histogram().to())
                .map(found -> plot(finding, found, entry.limits()));
    }

    private static Plot plot(Finding finding, Finding.MonteCarlo found, List<Limit> limits) {
        Finding.Histogram histogram = found.histogram();
        AxisOf axis = AxisOf.result(finding);
        int stretches = histogram.counts().size();
        long all = histogram.counts().stream().mapToLong(Long::longValue).sum();
        double width = (histogram.to() - histogram.from()) / stretches;
        double[] x = new double[stretches + 1];
        double[] y = new double[stretches + 1];
        for (int i = 0; i <= stretches; i++) {
            x[i] = axis.number(i == stretches ? histogram.to() : histogram.from() + i * width);
            y[i] = i == stretches ? 0 : 100.0 * histogram.counts().get(i) / all;
        }
        FindingText text = new FindingText(finding);
        List<Mark> marks = new ArrayList<>();
        limits.forEach(limit -> marks.add(new Mark(Side.X, axis.number(limit.value()), limit.label(), Role.LIMIT)));
        finding.worstCase().ifPresent(extremes -> {
            marks.add(new Mark(Side.X, axis.number(extremes.low().value()), "lowest found", Role.REFERENCE));
            marks.add(new Mark(Side.X, axis.number(extremes.high().value()), "highest found", Role.REFERENCE));
        });
        return new Plot(
                "Samples of " + finding.name(),
                "Share of " + FindingText.grouped(all) + " samples in " + stretches + " stretches from "
                        + text.range(histogram.from(), histogram.to()) + "; the mean is " + text.number(found.mean())
                        + ", the standard deviation " + text.distance(found.sd()) + ".",
                axis.axis(),
                new Axis("share of samples in %", "1", Scale.LINEAR),
                List.of(new Plot.Curve("samples", Plot.Style.STEP, false, x, y)),
                marks);
    }
}
