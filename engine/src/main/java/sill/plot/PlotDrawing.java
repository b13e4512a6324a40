package sill.plot;

import java.util.ArrayList;
import java.util.List;
import java.util.stream.Stream;
import sill.stdlib.Plot;

/**
 * Draws a {@link Plot} as SVG. The drawing stands alone (its colours are attributes, for white paper) and fits into a page,
 * which may override them by class. The same plot gives the same text on every machine.
 */
public final class PlotDrawing {
    private static final double WIDTH = 680;
    private static final double HEIGHT = 330;
    private static final double EDGE = 8;
    private static final double LABEL_ROW = 20;
    private static final double MARK_MARGIN = 190;
    private static final double KEY_SWATCH = 34;

    /** From the middle of a line of text to its baseline. */
    private static final double BASELINE = 4.5;

    /** Points of all curves together; keeps a drawing below 200 kB. */
    private static final int MOST_POINTS = 4000;

    private final Plot plot;
    private final Ticks xTicks;
    private final Ticks yTicks;
    private final List<Plot.Mark> marks;
    private final List<MarkLabels.Flag> flags;
    private final Frame frame;

    private PlotDrawing(Plot plot) {
        this.plot = plot;
        AxisRange x = AxisRange.of(plot, Plot.Side.X);
        AxisRange y = AxisRange.of(plot, Plot.Side.Y);
        yTicks = Ticks.along(y, plot.y().unit(), 6);
        marks = plot.marks().stream()
                .filter(mark -> AxisRange.shows((mark.side() == Plot.Side.X ? x : y).scale(), mark.at()))
                .toList();
        double left = EDGE + 10 + widest(yTicks.labelled().stream().map(Ticks.Tick::text));
        double widestMark = widest(marks(Plot.Side.Y).map(mark -> markText(mark, yTicks)));
        double right = widestMark == 0 ? 24 : Math.min(MARK_MARGIN, widestMark + 14) + EDGE;
        Frame flat = new Frame(left, 0, WIDTH - left - right, HEIGHT, x, y);
        xTicks = Ticks.within(x, plot.x().unit(), flat.width());
        flags = MarkLabels.above(
                marks(Plot.Side.X)
                        .map(mark -> new MarkLabels.Wanted(flat.px(mark.at()), markText(mark, xTicks)))
                        .toList(),
                EDGE,
                WIDTH - EDGE);
        int rows = flags.stream().mapToInt(flag -> flag.row() + 1).max().orElse(0);
        frame = new Frame(left, EDGE + LABEL_ROW + rows * MarkLabels.ROW, flat.width(), HEIGHT, x, y);
    }

    /**
     * The plot as an SVG element, with its title and description as text alternatives.
     *
     * @param idPrefix start of the ids in the drawing, unique in the page: an ASCII letter, then letters, digits and hyphens
     * @throws IllegalArgumentException when {@code idPrefix} is something else
     */
    public static String svg(Plot plot, String idPrefix) {
        if (!idPrefix.matches("[A-Za-z][A-Za-z0-9-]*")) {
            throw new IllegalArgumentException(
                    "idPrefix must be a letter, then letters, digits and hyphens, got \"" + idPrefix + "\"");
        }
        return new PlotDrawing(plot).draw(idPrefix);
    }

    private String draw(String idPrefix) {
        List<CurvePath> curves = new ArrayList<>();
        int most = Math.max(40, MOST_POINTS / plot.curves().size());
        for (Plot.Curve curve : plot.curves()) {
            curves.add(new CurvePath(curve, frame, most, Look.of(curves.size()).marker()));
        }
        int hidden = curves.stream().mapToInt(CurvePath::hidden).sum();
        List<Key.Entry> key = Key.arrange(keyed(), KEY_SWATCH, EDGE, WIDTH - EDGE);
        double keyTop = frame.bottom() + 2 * LABEL_ROW + 4;
        int keyRows = key.stream().mapToInt(entry -> entry.row() + 1).max().orElse(0);
        double noteTop = keyTop + keyRows * LABEL_ROW;
        double height = noteTop + (hidden > 0 ? LABEL_ROW : 0) + EDGE;

        Canvas canvas = new Canvas(WIDTH, height, idPrefix, plot.title(), plot.description());
        drawGrid(canvas);
        drawAxes(canvas);
        marks.forEach(mark -> canvas.line(
                Pen.of(mark.role()), mark.side() == Plot.Side.X ? vertical(mark.at()) : horizontal(mark.at())));
        for (int i = 0; i < curves.size(); i++) {
            Look look = Look.of(i);
            canvas.line(
                    Pen.of(look, plot.curves().get(i).style()), curves.get(i).path());
            canvas.area(
                    "arrow arrow-" + look.number(), look.colour(), curves.get(i).arrows());
        }
        drawMarkLabels(canvas);
        key.forEach(entry -> drawKey(canvas, entry, keyTop));
        if (hidden > 0) {
            String note = hidden == 1 ? "1 point is" : hidden + " points are";
            canvas.label(EDGE, noteTop + 14, Canvas.Anchor.START, note + " outside what the axes can show");
        }
        return canvas.finish();
    }

    private void drawGrid(Canvas canvas) {
        StringBuilder fine = new StringBuilder();
        xTicks.between().forEach(value -> fine.append(vertical(value)));
        yTicks.between().forEach(value -> fine.append(horizontal(value)));
        canvas.line(Pen.FINE_GRID, fine);
        StringBuilder main = new StringBuilder();
        xTicks.labelled().forEach(tick -> main.append(vertical(tick.value())));
        yTicks.labelled().forEach(tick -> main.append(horizontal(tick.value())));
        canvas.line(Pen.GRID, main);
    }

    private void drawAxes(Canvas canvas) {
        String right = "H" + Px.text(frame.right());
        String down = "V" + Px.text(frame.bottom());
        canvas.line(
                Pen.FRAME, Px.at('M', frame.left(), frame.top()) + right + down + "H" + Px.text(frame.left()) + "z");
        for (Ticks.Tick tick : xTicks.labelled()) {
            canvas.label(frame.px(tick.value()), frame.bottom() + 17, Canvas.Anchor.MIDDLE, tick.text());
        }
        for (Ticks.Tick tick : yTicks.labelled()) {
            canvas.label(frame.left() - 7, frame.py(tick.value()) + BASELINE, Canvas.Anchor.END, tick.text());
        }
        String x = TextWidth.fit(xTicks.unit().quotient(plot.x().label()), frame.width());
        canvas.label(frame.left() + frame.width() / 2, frame.bottom() + 17 + LABEL_ROW, Canvas.Anchor.MIDDLE, x);
        String y = TextWidth.fit(yTicks.unit().quotient(plot.y().label()), WIDTH - 2 * EDGE);
        canvas.label(EDGE, EDGE + 11, Canvas.Anchor.START, y);
    }

    private void drawMarkLabels(Canvas canvas) {
        StringBuilder leaders = new StringBuilder();
        for (MarkLabels.Flag flag : flags) {
            double y = frame.top() - flag.row() * MarkLabels.ROW - 5;
            leaders.append(Px.at('M', flag.at(), frame.top())).append("V").append(Px.text(y - 9));
            if (flag.leftwards()) {
                canvas.label(flag.to(), y, Canvas.Anchor.END, flag.text());
            } else {
                canvas.label(flag.from(), y, Canvas.Anchor.START, flag.text());
            }
        }
        List<Plot.Mark> beside = marks(Plot.Side.Y).toList();
        double[] lines =
                beside.stream().mapToDouble(mark -> frame.py(mark.at())).toArray();
        double[] texts = MarkLabels.beside(lines, frame.top(), frame.bottom());
        for (int i = 0; i < lines.length; i++) {
            leaders.append(Px.at('M', frame.right(), lines[i])).append(Px.at('L', frame.right() + 10, texts[i]));
            String text = TextWidth.fit(markText(beside.get(i), yTicks), WIDTH - frame.right() - 14);
            canvas.label(frame.right() + 13, texts[i] + BASELINE, Canvas.Anchor.START, text);
        }
        canvas.line(Pen.LEADER, leaders);
    }

    private static void drawKey(Canvas canvas, Key.Entry entry, double top) {
        double y = top + entry.row() * LABEL_ROW + 10;
        String swatch = entry.style() == Plot.Style.POINTS
                ? Px.at('M', entry.left() + 12, y) + entry.look().marker()
                : Px.at('M', entry.left(), y) + "h26";
        canvas.line(Pen.of(entry.look(), entry.style()), swatch);
        canvas.label(entry.left() + KEY_SWATCH, y + BASELINE, Canvas.Anchor.START, entry.text());
    }

    private String vertical(double value) {
        return Px.at('M', frame.px(value), frame.top()) + "V" + Px.text(frame.bottom());
    }

    private String horizontal(double value) {
        return Px.at('M', frame.left(), frame.py(value)) + "H" + Px.text(frame.right());
    }

    /** The curves that the key names; a single one that is named like its axis needs none. */
    private List<Plot.Curve> keyed() {
        boolean said = plot.curves().size() == 1
                && plot.curves().get(0).label().equals(plot.y().label());
        return said ? List.of() : plot.curves();
    }

    private Stream<Plot.Mark> marks(Plot.Side side) {
        return marks.stream().filter(mark -> mark.side() == side);
    }

    private static String markText(Plot.Mark mark, Ticks axis) {
        String value = axis.unit().quantity(mark.at());
        return mark.label().isEmpty() ? value : mark.label() + " " + value;
    }

    private static double widest(Stream<String> texts) {
        return texts.mapToDouble(TextWidth::of).max().orElse(0);
    }
}
