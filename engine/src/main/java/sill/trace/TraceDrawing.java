package sill.trace;

import java.util.ArrayList;
import java.util.List;
import sill.markup.Markup;
import sill.plot.Px;
import sill.plot.TextWidth;

/**
 * A trace as SVG. Givens have square corners, results round ones, plots a double edge, and checks a point, so that the kinds
 * differ without colour. Colours are for white paper; a page overrides them by class. Each box is a link to its line.
 */
public final class TraceDrawing {
    /** A wider drawing is marked {@code wide}, so that a page can print it across; A4 has 660 pixels between margins. */
    private static final double UPRIGHT = 800;

    private static final String INK = "#26302c";
    private static final String PAPER = "#ffffff";

    private final Trace trace;
    private final TraceLayout layout;
    private final TraceSheets sheets;
    private final String idPrefix;

    private TraceDrawing(Trace trace, String idPrefix) {
        this.trace = trace;
        this.idPrefix = idPrefix;
        layout = TraceLayout.of(trace);
        sheets = TraceSheets.of(layout);
    }

    /**
     * A drawing.
     *
     * @param idPrefix begins the ids in it, so that drawings of one page differ
     */
    public static TraceDrawing of(Trace trace, String idPrefix) {
        return new TraceDrawing(trace, idPrefix);
    }

    /**
     * The whole drawing. It is marked {@code parted} when it has parts for print.
     *
     * @param linkPrefix what stands before an address in the id of its place in the page
     */
    public String svg(String linkPrefix) {
        String wide = layout.width() > UPRIGHT || !sheets.parts().isEmpty() ? " wide" : "";
        Markup svg = new Markup();
        svg.open("svg")
                .with("xmlns", "http://www.w3.org/2000/svg")
                .with("class", "trace-drawing" + wide + (sheets.parts().isEmpty() ? "" : " parted"))
                .with("viewBox", "0 0 " + Px.text(layout.width()) + " " + Px.text(layout.height()))
                .with("width", Px.text(layout.width()))
                .with("height", Px.text(layout.height()))
                .with("font-family", "system-ui, sans-serif")
                .with("font-size", Integer.toString(TextWidth.FONT_SIZE));
        // No image: what is inside one can't be reached, and these boxes are links.
        svg.open("g", "id", idPrefix + "-whole", "role", "group");
        svg.with("aria-labelledby", idPrefix + "-title")
                .with("aria-describedby", idPrefix + "-desc")
                .line();
        svg.leaf("title", "Trace of givens, results, plots and checks", "id", idPrefix + "-title");
        svg.leaf("desc", description(), "id", idPrefix + "-desc").line();
        for (TraceLayout.Line line : layout.lines()) {
            svg.shape("path", "class", line.mutual() ? "use mutual" : "use", "d", path(line));
            svg.with("fill", "none").with("stroke", "#4c5753");
            if (line.mutual()) {
                svg.with("stroke-dasharray", "5 3");
            }
            svg.line();
        }
        boxes(svg, linkPrefix);
        return svg.close().close().toString();
    }

    /**
     * The parts of a drawing that is too large to be read on one sheet of paper, each as an SVG that shows a part of what
     * {@link #svg} has drawn, which must stand in the same page; none when it is not too large.
     */
    public List<String> parts() {
        List<String> drawn = new ArrayList<>();
        for (TraceSheets.Part part : sheets.parts()) {
            Markup svg = new Markup();
            svg.open("svg", "class", "trace-part", "viewBox", box(part));
            svg.with("width", Px.text(part.width() * sheets.scale()));
            svg.with("height", Px.text(part.height() * sheets.scale()));
            svg.with("font-family", "system-ui, sans-serif").with("font-size", Integer.toString(TextWidth.FONT_SIZE));
            drawn.add(
                    svg.shape("use", "href", "#" + idPrefix + "-whole").close().toString());
        }
        return drawn;
    }

    private static String box(TraceSheets.Part part) {
        return Px.text(part.x()) + " " + Px.text(part.y()) + " " + Px.text(part.width()) + " " + Px.text(part.height());
    }

    /** The boxes, those of a kind in a group that says so: their shapes are only seen. */
    private void boxes(Markup svg, String linkPrefix) {
        TraceKind open = null;
        for (TraceLayout.Box box : layout.boxes()) {
            TraceKind kind = trace.nodes().get(box.node()).kind();
            if (kind != open) {
                if (open != null) {
                    svg.close().line();
                }
                svg.open("g", "role", "group", "aria-label", heading(kind)).line();
                open = kind;
            }
            box(svg, box, linkPrefix);
        }
        if (open != null) {
            svg.close().line();
        }
    }

    private static String heading(TraceKind kind) {
        return Character.toUpperCase(kind.word().charAt(0)) + kind.word().substring(1) + "s";
    }

    private String description() {
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

    private void box(Markup svg, TraceLayout.Box box, String linkPrefix) {
        TraceNode node = trace.nodes().get(box.node());
        boolean alone = trace.users(box.node()).isEmpty() && node.kind() == TraceKind.GIVEN;
        svg.open("a", "href", "#" + linkPrefix + node.at());
        svg.with("class", "node node-" + node.kind().word() + (alone ? " alone" : ""));
        double room = box.width() - TraceLayout.PADDING;
        String below = TraceLayout.secondLine(node);
        if (TextWidth.of(node.label()) > room || !below.endsWith(node.shown())) {
            svg.leaf("title", node.label() + ", " + node.at() + (node.shown().isEmpty() ? "" : ", " + node.shown()));
        }
        if (!node.uses().isEmpty()) {
            // What the lines show, for those who can't see them.
            svg.leaf("desc", "made from " + String.join(", ", node.uses()));
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
