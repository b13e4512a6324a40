package sill.plot;

import java.util.ArrayList;
import java.util.List;
import sill.stdlib.Plot;

/** The key below a plot: which curve is which. */
final class Key {
    private static final double SPACE = 26;

    private Key() {}

    /**
     * A curve's entry.
     *
     * @param left left edge of its swatch
     * @param row row from 0
     */
    record Entry(double left, int row, String text, Plot.Style style, Look look) {}

    /** The entries side by side in as many rows as they need; a curve without a label has none. */
    static List<Entry> arrange(List<Plot.Curve> curves, double swatch, double left, double right) {
        List<Entry> entries = new ArrayList<>();
        double at = left;
        int row = 0;
        for (int i = 0; i < curves.size(); i++) {
            Plot.Curve curve = curves.get(i);
            if (curve.label().isEmpty()) {
                continue;
            }
            String text = TextWidth.fit(curve.label(), right - left - swatch);
            double width = swatch + TextWidth.of(text);
            if (at > left && at + width > right) {
                at = left;
                row++;
            }
            entries.add(new Entry(at, row, text, curve.style(), Look.of(i)));
            at += width + SPACE;
        }
        return entries;
    }
}
