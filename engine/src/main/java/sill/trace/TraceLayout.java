package sill.trace;

import java.util.ArrayList;
import java.util.List;
import sill.plot.TextWidth;

/**
 * Where the boxes and lines of a trace stand, in the drawing's own units, which a browser shows as CSS pixels. The same trace
 * always has the same layout.
 *
 * @param width of the whole drawing
 * @param height of the whole drawing
 * @param boxes one for each node, in the nodes' order
 * @param lines from what is used to what uses it, in steps of one layer
 */
public record TraceLayout(double width, double height, List<Box> boxes, List<Line> lines) {
    /** What stands free around the drawing. */
    static final double EDGE = 8;

    private static final double BOX_HEIGHT = 42;
    private static final double GAP = 10;
    private static final double LINE_HEIGHT = 2;
    private static final double BETWEEN_LAYERS = 40;
    private static final double NARROWEST = 64;
    private static final double WIDEST = 150;
    private static final double WIDEST_CHECK = 210;

    /** What stands free beside the text of a box, both sides together; a check's point needs as much. */
    static final double PADDING = 24;

    /**
     * A node's box.
     *
     * @param node the node's place in the trace
     * @param layer from 0 at the left
     * @param x left edge
     * @param y upper edge
     */
    public record Box(int node, int layer, double x, double y, double width, double height) {}

    /**
     * A line to the next layer.
     *
     * @param toX where it meets the next layer
     * @param endX how far it runs on there: past a layer's boxes, or no further
     * @param mutual whether each end rests on the other
     */
    public record Line(double fromX, double fromY, double toX, double toY, double endX, boolean mutual) {}

    public TraceLayout {
        boxes = List.copyOf(boxes);
        lines = List.copyOf(lines);
    }

    /** Lays a trace out. */
    public static TraceLayout of(Trace trace) {
        int nodes = trace.nodes().size();
        Lanes lanes = new Lanes(nodes, Layers.of(trace));
        List<List<Integer>> layers = Ordering.of(lanes);
        double[] needed = new double[lanes.places().size()];
        for (int place = 0; place < needed.length; place++) {
            needed[place] = place < nodes ? BOX_HEIGHT : LINE_HEIGHT;
        }
        double[] centre = Heights.of(lanes, layers, needed, GAP);
        double height = 0;
        for (int place = 0; place < needed.length; place++) {
            centre[place] += EDGE;
            height = Math.max(height, centre[place] + needed[place] / 2 + EDGE);
        }
        double[] left = new double[layers.size()];
        double[] right = new double[layers.size()];
        double x = EDGE;
        for (int layer = 0; layer < left.length; layer++) {
            left[layer] = x;
            right[layer] = x + width(trace, layers.get(layer));
            x = right[layer] + BETWEEN_LAYERS;
        }
        List<Box> boxes = new ArrayList<>();
        for (int node = 0; node < nodes; node++) {
            int layer = lanes.places().get(node).layer();
            double y = centre[node] - BOX_HEIGHT / 2;
            boxes.add(new Box(node, layer, left[layer], y, right[layer] - left[layer], BOX_HEIGHT));
        }
        double width = right.length == 0 ? 2 * EDGE : right[right.length - 1] + EDGE;
        return new TraceLayout(width, height, boxes, lines(lanes, layers, centre, left, right));
    }

    private static List<Line> lines(
            Lanes lanes, List<List<Integer>> layers, double[] centre, double[] left, double[] right) {
        int[] rank = new int[centre.length];
        for (List<Integer> layer : layers) {
            for (int i = 0; i < layer.size(); i++) {
                rank[layer.get(i)] = i;
            }
        }
        List<Line> lines = new ArrayList<>();
        for (Lanes.Step step : lanes.steps()) {
            Lanes.Place to = lanes.places().get(step.to());
            double toX = left[to.layer()];
            double endX = to.passing() ? right[to.layer()] : toX;
            double toY = centre[step.to()] + (to.passing() ? 0 : port(lanes.lefts(step.to()), step.from(), rank));
            lines.add(new Line(right[to.layer() - 1], centre[step.from()], toX, toY, endX, step.mutual()));
        }
        return lines;
    }

    /** How far above or below the middle of its box a line ends: lines reach a box in the order they come in. */
    private static double port(List<Integer> lefts, int from, int[] rank) {
        int above = 0;
        for (int other : lefts) {
            above += rank[other] < rank[from] ? 1 : 0;
        }
        double room = Math.min(8, (BOX_HEIGHT - 14) / Math.max(1, lefts.size() - 1));
        return (above - (lefts.size() - 1) / 2.0) * room;
    }

    private static double width(Trace trace, List<Integer> layer) {
        double width = NARROWEST;
        for (int place : layer) {
            if (place < trace.nodes().size()) {
                TraceNode node = trace.nodes().get(place);
                double widest = node.kind() == TraceKind.CHECK ? WIDEST_CHECK : WIDEST;
                double wanted = PADDING + Math.max(TextWidth.of(node.label()), TextWidth.of(secondLine(node)));
                width = Math.max(width, Math.min(widest, wanted));
            }
        }
        return width;
    }

    /** The second line of text in a node's box: its address, and its value where that fits. */
    static String secondLine(TraceNode node) {
        String text = node.at() + " · " + node.shown();
        return node.shown().isEmpty() || TextWidth.of(text) > WIDEST - PADDING ? node.at() : text;
    }
}
