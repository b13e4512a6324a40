package sill.record.html;

import sill.markup.Markup;
import sill.plot.PlotDrawing;
import sill.record.DesignRecord.ToleranceEntry;
import sill.record.HistogramPlot;

/** How the samples of a tolerance run lie between limits and extremes. */
final class Histograms {
    private Histograms() {}

    static void write(Markup page, ToleranceEntry entry) {
        HistogramPlot.of(entry).ifPresent(plot -> {
            String name = entry.finding().name();
            page.open("figure");
            Tables.openScrolling(page, "Histogram of " + name);
            String id = "samples-" + entry.at().replace('.', '-')
                    + (entry.finding().component().isEmpty()
                            ? ""
                            : "-" + entry.finding().component());
            page.trusted(PlotDrawing.svg(plot, id)).close();
            page.leaf("figcaption", "Samples of " + name + ", with limits and extremes")
                    .close()
                    .line();
        });
    }
}
