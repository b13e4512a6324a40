package sill.record.html;

import java.util.List;
import sill.markup.Markup;
import sill.trace.Trace;
import sill.trace.TraceDrawing;
import sill.trace.TraceKind;
import sill.trace.TraceNode;

/** The trace of the whole sheet as one drawing, and the givens that nothing uses. */
final class TraceSection {
    /** A drawing of more boxes would not be read. */
    static final int MOST_BOXES = 150;

    private TraceSection() {}

    static void write(Markup page, RecordTrace record) {
        Trace trace = record.trace();
        List<TraceNode> unused = record.unused();
        boolean drawn = trace.nodes().stream().anyMatch(node -> node.kind() != TraceKind.GIVEN);
        if (!drawn && unused.isEmpty()) {
            return;
        }
        page.open("section", "class", "tracing", "aria-labelledby", "trace").line();
        page.leaf("h2", "Trace", "id", "trace").line();
        if (!unused.isEmpty()) {
            unused(page, unused);
        }
        if (drawn && trace.nodes().size() > MOST_BOXES) {
            page.leaf(
                            "p",
                            "No drawing: the sheet's " + trace.nodes().size() + " givens, results, plots and checks are"
                                    + " more than the " + MOST_BOXES
                                    + " that one drawing can show. Each line has its own trace, under its name or value.")
                    .line();
        } else if (drawn) {
            page.leaf(
                            "p",
                            "Lines lead from what is used, on the left, to what uses it. Givens have square corners,"
                                    + " results round ones, plots a double edge, checks a point. Each box leads to its line.",
                            "class",
                            "key")
                    .line();
            Tables.openScrolling(page, "Drawing of the trace");
            TraceDrawing drawing = TraceDrawing.of(trace, "trace");
            page.trusted(drawing.svg(Addresses.id(""))).line();
            page.close().line();
            parts(page, drawing.parts());
        }
        page.close().line();
    }

    /** On paper a drawing that would be too small stands on several sheets. */
    private static void parts(Markup page, List<String> parts) {
        for (int i = 0; i < parts.size(); i++) {
            page.open("div", "class", "part", "aria-hidden", "true");
            page.leaf("p", "Part " + (i + 1) + " of " + parts.size());
            page.trusted(parts.get(i)).close().line();
        }
    }

    private static void unused(Markup page, List<TraceNode> unused) {
        page.open("p", "class", "unused-givens");
        page.text(
                unused.size() == 1
                        ? "One given that no result, check or plot uses: "
                        : "Givens that no result, check or plot uses: ");
        for (int i = 0; i < unused.size(); i++) {
            page.text(i == 0 ? "" : ", ");
            TracePanel.link(page, unused.get(i), false);
            page.text(" ").leaf("span", "(" + unused.get(i).at() + ")", "class", "where");
        }
        page.text(".").close().line();
    }
}
