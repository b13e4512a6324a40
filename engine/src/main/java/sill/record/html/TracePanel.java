package sill.record.html;

import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import sill.markup.Markup;
import sill.trace.Trace;
import sill.trace.TraceKind;
import sill.trace.TraceNode;

/**
 * What one line of the sheet is made from, down to the givens, and what is made from it, as links to the lines where each
 * name is set. It stands inside a {@code details} element, so that it is reached by mouse, finger and key without a script.
 */
final class TracePanel {
    /** A list names so many at most; the record's JSON has all. */
    private static final int LONGEST = 60;

    /** What is said of a given that nothing uses. */
    static final String UNUSED = "no result, check or plot uses it";

    private TracePanel() {}

    /** The lists of a node; none of those that would be empty. */
    static void write(Markup page, RecordTrace record, int place) {
        Trace trace = record.trace();
        TraceNode node = trace.nodes().get(place);
        if (node.uses().isEmpty()
                && node.dependsOn().isEmpty()
                && trace.resting(place).isEmpty()) {
            if (record.isUnused(place)) {
                page.leaf("p", "Nothing to trace: " + UNUSED + ".", "class", "trace");
            }
            return;
        }
        page.open("dl", "class", "trace");
        Set<String> direct = new HashSet<>(node.uses());
        direct.add(node.name());
        List<String> further = new ArrayList<>(node.dependsOn());
        further.removeIf(direct::contains);
        names(page, trace, "Made from", node.uses(), true);
        names(page, trace, "and so from", further, false);
        Set<Integer> users = new HashSet<>(trace.users(place));
        List<Integer> later = new ArrayList<>(trace.resting(place));
        later.removeIf(users::contains);
        nodes(page, trace, "Used by", trace.users(place));
        nodes(page, trace, "and so by", later);
        page.close();
    }

    private static void names(Markup page, Trace trace, String heading, List<String> names, boolean inFull) {
        if (names.isEmpty()) {
            return;
        }
        open(page, heading);
        for (int i = 0; i < Math.min(names.size(), LONGEST); i++) {
            separate(page, i);
            Optional<TraceNode> node = trace.named(names.get(i));
            if (node.isPresent()) {
                link(page, node.get(), inFull);
            } else {
                page.leaf("var", names.get(i));
            }
        }
        close(page, names.size());
    }

    private static void nodes(Markup page, Trace trace, String heading, List<Integer> places) {
        if (places.isEmpty()) {
            return;
        }
        open(page, heading);
        for (int i = 0; i < Math.min(places.size(), LONGEST); i++) {
            separate(page, i);
            link(page, trace.nodes().get(places.get(i)), false);
        }
        close(page, places.size());
    }

    private static void open(Markup page, String heading) {
        page.open("div").leaf("dt", heading).open("dd");
    }

    private static void separate(Markup page, int index) {
        page.text(index == 0 ? "" : "; ");
    }

    private static void close(Markup page, int size) {
        if (size > LONGEST) {
            page.text("; and " + (size - LONGEST) + " more");
        }
        page.close().close();
    }

    /** A link to where a node is set; in full with its address and value. */
    static void link(Markup page, TraceNode node, boolean inFull) {
        page.open("a", "href", Addresses.href(node.at()));
        if (node.kind() == TraceKind.CHECK || node.name().isEmpty() && node.kind() == TraceKind.RESULT) {
            page.leaf("code", node.label());
        } else if (node.kind() == TraceKind.PLOT) {
            page.text("plot " + node.label());
        } else {
            page.leaf("var", node.name());
        }
        page.close();
        if (inFull) {
            page.text((node.shown().isEmpty() ? "" : " = " + node.shown()) + " ");
            page.leaf("span", "(" + node.at() + ")", "class", "where");
        }
    }
}
