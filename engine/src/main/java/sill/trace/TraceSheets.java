package sill.trace;

import java.util.ArrayList;
import java.util.List;

/**
 * A drawing of a trace cut into parts that can each be printed on a sheet of paper with letters that can be read. Cuts run
 * between columns, and a part begins with the column that the one before ends with, so that lines can be followed.
 *
 * @param scale of all parts: how large a unit of the drawing is in CSS pixels
 * @param parts row by row; empty when the whole drawing can be read on one sheet
 */
record TraceSheets(double scale, List<Part> parts) {
    /** A part of a drawing, in the drawing's units. */
    record Part(double x, double y, double width, double height) {}

    /** Pixels of 1/96 inch between the margins of A4 across (ISO 216: 297 mm by 210 mm), less the head of the section. */
    static final double SHEET_WIDTH = 262 / 25.4 * 96;

    static final double SHEET_HEIGHT = 125 / 25.4 * 96;

    /** Letters of 13 pixels are 9.75 points high; at this scale 7 points. */
    static final double SMALLEST = 0.72;

    /** What two parts below each other share: a box and the gaps around it. */
    private static final double OVERLAP = 62;

    TraceSheets {
        parts = List.copyOf(parts);
    }

    static TraceSheets of(TraceLayout layout) {
        double widest = SHEET_WIDTH / SMALLEST;
        double highest = SHEET_HEIGHT / SMALLEST;
        if (layout.width() <= widest && layout.height() <= highest) {
            return new TraceSheets(1, List.of());
        }
        List<Part> parts = new ArrayList<>();
        double scale = 1;
        for (double y = 0; y == 0 || y + OVERLAP < layout.height(); y += highest - OVERLAP) {
            double height = Math.min(highest, layout.height() - y);
            for (double[] span : spans(layout, widest)) {
                parts.add(new Part(span[0], y, span[1] - span[0], height));
                scale = Math.min(scale, Math.min(SHEET_WIDTH / (span[1] - span[0]), SHEET_HEIGHT / height));
            }
        }
        return new TraceSheets(scale, parts);
    }

    /** From where to where each part reaches from left to right. */
    private static List<double[]> spans(TraceLayout layout, double widest) {
        List<double[]> columns = columns(layout);
        List<double[]> spans = new ArrayList<>();
        int first = 0;
        while (true) {
            int last = first;
            while (last + 1 < columns.size() && columns.get(last + 1)[1] - columns.get(first)[0] <= widest) {
                last++;
            }
            spans.add(new double[] {columns.get(first)[0], columns.get(last)[1]});
            if (last == columns.size() - 1) {
                return spans;
            }
            first = last > first ? last : first + 1;
        }
    }

    /** The edges of each layer's boxes, and what stands free around them. */
    private static List<double[]> columns(TraceLayout layout) {
        List<double[]> columns = new ArrayList<>();
        for (TraceLayout.Box box : layout.boxes()) {
            while (columns.size() <= box.layer()) {
                columns.add(new double[2]);
            }
            columns.get(box.layer())[0] = box.x() - TraceLayout.EDGE;
            columns.get(box.layer())[1] = box.x() + box.width() + TraceLayout.EDGE;
        }
        return columns;
    }
}
