package sill.trace;

import sill.markup.Markup;
import sill.plot.Px;
import sill.plot.TextWidth;

/**
 * A trace as SVG. Givens have square corners, results round ones, plots a double edge, and checks a point, so that the kinds
 * differ without colour. Colours are for white paper; a page overrides them by class. Each box is a link to its address.
 */
public final class TraceDrawing {
    /** A wider drawing is marked {@code wide}, so that a page can print it across; A4 has 660 pixels between margins. */
    private static final double UPRIGHT = 800;

    private static final String INK = "#26302c";
    private static final String PAPER = "#ffffff";

    private TraceDrawing() {}

    /**
     * The drawing.
     *
     * @param idPrefix begins the ids in it, so that drawings of one page differ
     * @param linkPrefix what stands before an address in the id of its place in the page
     */
    public static String svg(Trace trace, String idPrefix, String linkPrefix) {
        TraceLayout layout = TraceLayout.of(trace);
        Markup svg = new Markup();
        svg.open("svg")
                .with("xmlns", "http://www.w3.org/2000/svg")
                .with("class", layout.width() > UPRIGHT ? "trace-drawing wide" : "trace-drawing")
                // No role img: what is inside an image can't be reached, and these boxes are links.
                .with("aria-labelledby", idPrefix + "-title")
                .with("aria-describedby", idPrefix + "-desc")
                .with("viewBox", "0 0 " + Px.text(layout.width()) + " " + Px.text(layout.height()))
                .with("width", Px.text(layout.width()))
                .with("height", Px.text(layout.height()))
                .with("font-family", "system-ui, sans-serif")
                .with("font-size", Integer.toString(TextWidth.FONT_SIZE));
        svg.leaf("title", "Trace of givens, results, plots and checks", "id", idPrefix + "-title");
        svg.leaf("desc", description(trace, layout), "id", idPrefix + "-desc").line();
        for (TraceLayout.Line line : layout.lines()) {
            svg.shape("path", "class", line.mutual() ? "use mutual" : "use", "d", path(line));
            svg.with("fill", "none").with("stroke", "#4c5753");
            if (line.mutual()) {
                svg.with("stroke-dasharray", "5 3");
            }
            svg.line();
        }
        for (TraceLayout.Box box : layout.boxes()) {
            box(svg, trace, box, linkPrefix);
        }
        return svg.close().toString();
    }

    private static String description(Trace trace, TraceLayout layout) {
        int[] counts = new int[TraceKind.values().length];
        for (TraceNode node : trace.nodes()) {
            counts[node.kind().ordinal()]++;
        }
        StringBuilder text = new StringBuilder("Lines lead from what is used, on the left, to what uses it:");
        String separator = " ";
        for (TraceKind kind : TraceKind.values()) {
            int count = counts[kind.ordinal()];
            text.append(separator).append(count).append(' ').append(kind.word());
            text.append(count == 1 ? "" : "s");
            separator = ", ";
        }
        return text.append(". Each box leads to its line.").toString();
    }

    private static String path(TraceLayout.Line line) {
        double bend = (line.toX() - line.fromX()) / 2;
        StringBuilder path = new StringBuilder(64);
        Px.write(path, 'M', line.fromX(), line.fromY());
        Px.write(path, 'C', line.fromX() + bend, line.fromY());
        Px.write(path, ' ', line.toX() - bend, line.toY());
        Px.write(path, ' ', line.toX(), line.toY());
        if (line.endX() > line.toX()) {
            path.append('H').append(Px.text(line.endX()));
        }
        return path.toString();
    }

    private static void box(Markup svg, Trace trace, TraceLayout.Box box, String linkPrefix) {
        TraceNode node = trace.nodes().get(box.node());
        boolean alone = trace.users(box.node()).isEmpty() && node.kind() == TraceKind.GIVEN;
        svg.open("a", "href", "#" + linkPrefix + node.at());
        svg.with("class", "node node-" + node.kind().word() + (alone ? " alone" : ""));
        double room = box.width() - TraceLayout.PADDING;
        String below = TraceLayout.secondLine(node);
        if (TextWidth.of(node.label()) > room || !below.endsWith(node.shown())) {
            svg.leaf("title", node.label() + ", " + node.at() + (node.shown().isEmpty() ? "" : ", " + node.shown()));
        }
        shape(svg, node.kind(), box);
        if (alone) {
            svg.with("stroke-dasharray", "4 3");
        }
        String x = Px.text(box.x() + 11);
        svg.open("text", "x", x, "y", Px.text(box.y() + 17), "fill", INK, "class", "label");
        svg.text(TextWidth.fit(node.label(), room)).close();
        svg.open("text", "x", x, "y", Px.text(box.y() + 34), "fill", INK, "class", "label below");
        svg.text(below).close();
        svg.close().line();
    }

    private static void shape(Markup svg, TraceKind kind, TraceLayout.Box box) {
        double right = box.x() + box.width();
        double bottom = box.y() + box.height();
        switch (kind) {
            case GIVEN -> rectangle(svg, box, 0, "0");
            case RESULT -> rectangle(svg, box, 0, "10");
            case PLOT -> {
                rectangle(svg, box, 0, "0");
                rectangle(svg, box, 3, "0");
            }
            case CHECK -> {
                StringBuilder path = new StringBuilder(64);
                Px.write(path, 'M', box.x(), box.y());
                Px.write(path, 'L', right - 10, box.y());
                Px.write(path, 'L', right, (box.y() + bottom) / 2);
                Px.write(path, 'L', right - 10, bottom);
                Px.write(path, 'L', box.x(), bottom).append('Z');
                svg.shape("path", "class", "box", "d", path.toString(), "fill", PAPER, "stroke", INK);
            }
        }
    }

    private static void rectangle(Markup svg, TraceLayout.Box box, double inset, String radius) {
        svg.shape("rect", "class", "box", "x", Px.text(box.x() + inset), "y", Px.text(box.y() + inset));
        svg.with("width", Px.text(box.width() - 2 * inset)).with("height", Px.text(box.height() - 2 * inset));
        svg.with("rx", radius).with("fill", PAPER).with("stroke", INK);
    }
}
