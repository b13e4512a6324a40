package sill.record;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import sill.record.DesignRecord.Limit;
import sill.record.DesignRecord.ToleranceEntry;
import sill.stdlib.Plot;
import sill.stdlib.Plot.Curve;
import sill.stdlib.Plot.Mark;
import sill.stdlib.Plot.Role;
import sill.stdlib.Plot.Side;
import sill.stdlib.Plot.Style;
import sill.values.Finding;

/** A result along one given as a plot: at its nominal value, lowest and highest, with the limits of checks. */
public final class SweepPlot {
    private SweepPlot() {}

    /** The plot; nothing where the tolerance cell goes over no given. */
    public static Optional<Plot> of(ToleranceEntry entry) {
        return entry.finding().sweep().map(sweep -> plot(entry, sweep));
    }

    private static Plot plot(ToleranceEntry entry, Finding.Sweep sweep) {
        Finding finding = entry.finding();
        AxisOf x = new AxisOf(sweep.given(), entry.givenUnits().get(sweep.given()));
        AxisOf y = AxisOf.result(finding);
        double[] at = x.numbers(sweep.at());
        List<Mark> marks = new ArrayList<>();
        for (Limit limit : entry.limits()) {
            marks.add(new Mark(Side.Y, y.number(limit.value()), limit.label(), Role.LIMIT));
        }
        FindingText text = new FindingText(finding);
        double low = sweep.low().stream().mapToDouble(Double::doubleValue).min().orElseThrow();
        double high =
                sweep.high().stream().mapToDouble(Double::doubleValue).max().orElseThrow();
        return new Plot(
                finding.name() + " over " + sweep.given(),
                finding.name() + " over " + sweep.given()
                        + " from limit to limit, at the nominal values and in the worst" + " cases of all else: "
                        + text.range(low, high) + " in all.",
                x.axis(),
                y.axis(),
                List.of(
                        new Curve("highest", Style.LINE, false, at, y.numbers(sweep.high())),
                        new Curve("nominal", Style.LINE, false, at, y.numbers(sweep.nominal())),
                        new Curve("lowest", Style.LINE, false, at, y.numbers(sweep.low()))),
                marks);
    }
}
