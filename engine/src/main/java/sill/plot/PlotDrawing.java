package sill.plot;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.stream.DoubleStream;
import sill.markup.Markup;
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

    /** Points of all curves together; keeps a drawing below 200 kB. */
    private static final int MOST_POINTS = 4000;

    private final Plot plot;
    private final String idPrefix;
    private final Ticks xTicks;
    private final Ticks yTicks;
    private final List<Plot.Mark> marks;
    private final List<MarkLabels.Flag> flags;
    private final Frame frame;
    private final Markup svg = new Markup();

    private PlotDrawing(Plot plot, String idPrefix) {
        this.plot = plot;
        this.idPrefix = idPrefix;
        AxisRange x = range(plot.x(), Plot.Side.X);
        AxisRange y = range(plot.y(), Plot.Side.Y);
        xTicks = Ticks.within(x, plot.x().unit(), WIDTH - 2 * MARK_MARGIN);
        yTicks = Ticks.along(y, plot.y().unit(), 6);
        marks = plot.marks().stream()
                .filter(mark -> AxisRange.shows(axis(mark).scale(), mark.at()))
                .toList();
        double left = EDGE
                + 10
                + widest(yTicks.labelled().stream().map(Ticks.Tick::text).toList());
        List<String> sideTexts = marks.stream()
                .filter(mark -> mark.side() == Plot.Side.Y)
                .map(this::markText)
                .toList();
        double right = sideTexts.isEmpty() ? 24 : Math.min(MARK_MARGIN, widest(sideTexts) + 14) + EDGE;
        Frame flat = new Frame(left, 0, WIDTH - left - right, HEIGHT, x, y);
        flags = MarkLabels.above(
                marks.stream()
                        .filter(mark -> mark.side() == Plot.Side.X)
                        .map(mark -> new MarkLabels.Wanted(flat.px(mark.at()), markText(mark)))
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
        return new PlotDrawing(plot, idPrefix).draw();
    }

    private String draw() {
        List<CurvePath> curves = new ArrayList<>();
        int most = Math.max(40, MOST_POINTS / Math.max(1, plot.curves().size()));
        for (int i = 0; i < plot.curves().size(); i++) {
            curves.add(
                    new CurvePath(plot.curves().get(i), frame, most, Look.of(i).marker()));
        }
        int hidden = curves.stream().mapToInt(CurvePath::hidden).sum();
        List<Key.Entry> key = Key.arrange(plot.curves(), KEY_SWATCH, EDGE, WIDTH - EDGE);
        double keyTop = frame.bottom() + 2 * LABEL_ROW + 4;
        int keyRows = key.stream().mapToInt(entry -> entry.row() + 1).max().orElse(0);
        double height = keyTop + (keyRows + (hidden > 0 ? 1 : 0)) * LABEL_ROW + EDGE;

        svg.open(
                "svg",
                "xmlns",
                "http://www.w3.org/2000/svg",
                "class",
                "plot",
                "role",
                "img",
                "aria-labelledby",
                idPrefix + "-title " + idPrefix + "-desc",
                "viewBox",
                "0 0 " + Px.text(WIDTH) + " " + Px.text(height),
                "width",
                Px.text(WIDTH),
                "height",
                Px.text(height),
                "font-family",
                "system-ui, sans-serif",
                "font-size",
                Integer.toString(TextWidth.FONT_SIZE));
        svg.leaf("title", plot.title(), "id", idPrefix + "-title");
        svg.leaf("desc", plot.description(), "id", idPrefix + "-desc").line();
        shape("rect", "paper", "width", Px.text(WIDTH), "height", Px.text(height), "fill", "#ffffff");
        drawGrid();
        drawAxes();
        drawMarks();
        for (int i = 0; i < curves.size(); i++) {
            drawCurve(plot.curves().get(i).style(), curves.get(i), Look.of(i));
        }
        drawMarkLabels();
        key.forEach(entry -> drawKey(entry, keyTop));
        if (hidden > 0) {
            String note = hidden == 1 ? "1 point is" : hidden + " points are";
            label(EDGE, keyTop + keyRows * LABEL_ROW + 14, "start", note + " outside what the axes can show");
        }
        return svg.close().toString();
    }

    private void drawGrid() {
        StringBuilder fine = new StringBuilder();
        xTicks.between().forEach(value -> fine.append(vertical(value)));
        yTicks.between().forEach(value -> fine.append(horizontal(value)));
        path("grid-fine", fine, "stroke", "#eceeed");
        StringBuilder main = new StringBuilder();
        xTicks.labelled().forEach(tick -> main.append(vertical(tick.value())));
        yTicks.labelled().forEach(tick -> main.append(horizontal(tick.value())));
        path("grid", main, "stroke", "#cfd5d2");
    }

    private void drawAxes() {
        shape(
                "rect",
                "frame",
                "x",
                Px.text(frame.left()),
                "y",
                Px.text(frame.top()),
                "width",
                Px.text(frame.width()),
                "height",
                Px.text(frame.height()),
                "fill",
                "none",
                "stroke",
                "#4c5753");
        for (Ticks.Tick tick : xTicks.labelled()) {
            label(frame.px(tick.value()), frame.bottom() + 17, "middle", tick.text());
        }
        for (Ticks.Tick tick : yTicks.labelled()) {
            label(frame.left() - 7, frame.py(tick.value()) + 4.5, "end", tick.text());
        }
        String x = TextWidth.fit(xTicks.unit().quotient(plot.x().label()), frame.width());
        label(frame.left() + frame.width() / 2, frame.bottom() + 17 + LABEL_ROW, "middle", x);
        String y = TextWidth.fit(yTicks.unit().quotient(plot.y().label()), WIDTH - 2 * EDGE);
        label(EDGE, EDGE + 11, "start", y);
    }

    private void drawMarks() {
        for (Plot.Mark mark : marks) {
            boolean upright = mark.side() == Plot.Side.X;
            String line = upright ? vertical(mark.at()) : horizontal(mark.at());
            path(
                    markClass(mark),
                    line,
                    "stroke",
                    markColour(mark),
                    "stroke-width",
                    "1.5",
                    "stroke-dasharray",
                    dash(mark));
        }
    }

    private void drawMarkLabels() {
        StringBuilder leaders = new StringBuilder();
        for (MarkLabels.Flag flag : flags) {
            double y = frame.top() - flag.row() * MarkLabels.ROW - 5;
            leaders.append(Px.at('M', flag.at(), frame.top())).append("V").append(Px.text(y - 9));
            label(flag.leftwards() ? flag.to() : flag.from(), y, flag.leftwards() ? "end" : "start", flag.text());
        }
        List<Plot.Mark> beside =
                marks.stream().filter(mark -> mark.side() == Plot.Side.Y).toList();
        double[] lines =
                beside.stream().mapToDouble(mark -> frame.py(mark.at())).toArray();
        double[] texts = MarkLabels.beside(lines, frame.top(), frame.bottom());
        for (int i = 0; i < lines.length; i++) {
            leaders.append(Px.at('M', frame.right(), lines[i])).append(Px.at('L', frame.right() + 10, texts[i]));
            String text = TextWidth.fit(markText(beside.get(i)), WIDTH - frame.right() - 14);
            label(frame.right() + 13, texts[i] + 4.5, "start", text);
        }
        path("leader", leaders, "stroke", "#4c5753");
    }

    private void drawCurve(Plot.Style style, CurvePath curve, Look look) {
        boolean points = style == Plot.Style.POINTS;
        if (!curve.path().isEmpty()) {
            path(
                    "curve curve-" + look.number(),
                    curve.path(),
                    "stroke",
                    look.colour(),
                    "stroke-width",
                    points ? "1.5" : "2",
                    "stroke-linecap",
                    "round",
                    "stroke-linejoin",
                    "round",
                    "stroke-dasharray",
                    points || look.dash().isEmpty() ? "none" : look.dash());
        }
        if (!curve.arrows().isEmpty()) {
            shape("path", "arrow arrow-" + look.number(), "d", curve.arrows(), "fill", look.colour());
        }
    }

    private void drawKey(Key.Entry entry, double top) {
        double y = top + entry.row() * LABEL_ROW + 10;
        boolean points = entry.style() == Plot.Style.POINTS;
        String swatch =
                points ? Px.at('M', entry.left() + 12, y) + entry.look().marker() : Px.at('M', entry.left(), y) + "h26";
        drawCurve(entry.style(), CurvePath.of(swatch), entry.look());
        label(entry.left() + KEY_SWATCH, y + 4.5, "start", entry.text());
    }

    private String vertical(double value) {
        return Px.at('M', frame.px(value), frame.top()) + "V" + Px.text(frame.bottom());
    }

    private String horizontal(double value) {
        return Px.at('M', frame.left(), frame.py(value)) + "H" + Px.text(frame.right());
    }

    private void label(double x, double y, String anchor, String text) {
        svg.leaf(
                        "text",
                        text,
                        "x",
                        Px.text(x),
                        "y",
                        Px.text(y),
                        "text-anchor",
                        anchor,
                        "class",
                        "label",
                        "fill",
                        "#26302c")
                .line();
    }

    private void path(String cssClass, CharSequence data, String... attributes) {
        if (data.length() == 0) {
            return;
        }
        String[] all = Arrays.copyOf(new String[] {"d", data.toString(), "fill", "none"}, 4 + attributes.length);
        System.arraycopy(attributes, 0, all, 4, attributes.length);
        shape("path", cssClass, all);
    }

    private void shape(String element, String cssClass, String... attributes) {
        String[] all = Arrays.copyOf(new String[] {"class", cssClass}, 2 + attributes.length);
        System.arraycopy(attributes, 0, all, 2, attributes.length);
        svg.shape(element, all).line();
    }

    private AxisRange range(Plot.Axis axis, Plot.Side side) {
        DoubleStream points = plot.curves().stream()
                .flatMapToDouble(curve -> Arrays.stream(side == Plot.Side.X ? curve.x() : curve.y()));
        DoubleStream lines =
                plot.marks().stream().filter(mark -> mark.side() == side).mapToDouble(Plot.Mark::at);
        boolean onEdge =
                side == Plot.Side.X && plot.curves().stream().noneMatch(curve -> curve.style() == Plot.Style.POINTS);
        return AxisRange.around(DoubleStream.concat(points, lines), axis.scale(), onEdge ? 0 : 0.05);
    }

    private Plot.Axis axis(Plot.Mark mark) {
        return mark.side() == Plot.Side.X ? plot.x() : plot.y();
    }

    private String markText(Plot.Mark mark) {
        AxisUnit unit = (mark.side() == Plot.Side.X ? xTicks : yTicks).unit();
        String value = unit.quantity(mark.at());
        return mark.label().isEmpty() ? value : mark.label() + " " + value;
    }

    private static String markClass(Plot.Mark mark) {
        return switch (mark.role()) {
            case LIMIT -> "mark mark-limit";
            case TRIP_POINT -> "mark mark-trip";
            case REFERENCE -> "mark mark-reference";
        };
    }

    private static String markColour(Plot.Mark mark) {
        return switch (mark.role()) {
            case LIMIT -> "#a1262f";
            case TRIP_POINT -> "#26302c";
            case REFERENCE -> "#66706c";
        };
    }

    private static String dash(Plot.Mark mark) {
        return switch (mark.role()) {
            case LIMIT -> "12 3";
            case TRIP_POINT -> "5 3";
            case REFERENCE -> "1.5 3";
        };
    }

    private static double widest(List<String> texts) {
        return texts.stream().mapToDouble(TextWidth::of).max().orElse(0);
    }
}
