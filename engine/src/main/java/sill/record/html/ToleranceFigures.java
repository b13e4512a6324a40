package sill.record.html;

import sill.markup.Markup;
import sill.plot.PlotDrawing;
import sill.record.DesignRecord.ToleranceEntry;
import sill.record.HistogramPlot;
import sill.record.SweepPlot;
import sill.stdlib.Plot;

/** Drawings of what a tolerance cell found: how samples lie between limits, and a result along one given. */
final class ToleranceFigures {
    private ToleranceFigures() {}

    static void write(Markup page, ToleranceEntry entry) {
        String name = entry.finding().name();
        HistogramPlot.of(entry).ifPresent(plot -> figure(page, entry, plot, "samples", "Samples of " + name));
        entry.finding().sweep().ifPresent(sweep -> {
            String caption = name + " over " + sweep.given() + ", with all else nominal and in the worst cases";
            figure(page, entry, SweepPlot.of(entry).orElseThrow(), "over", caption);
        });
    }

    private static void figure(Markup page, ToleranceEntry entry, Plot plot, String kind, String caption) {
        String component = entry.finding().component();
        String id = kind + "-" + entry.at().replace('.', '-') + (component.isEmpty() ? "" : "-" + component);
        page.open("figure");
        Tables.openScrolling(page, caption);
        page.trusted(PlotDrawing.svg(plot, id)).close();
        page.leaf("figcaption", caption).close().line();
    }
}
