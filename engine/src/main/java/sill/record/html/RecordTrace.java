package sill.record.html;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import sill.record.DesignRecord;
import sill.record.DesignRecord.CellEntry;
import sill.record.DesignRecord.CheckEntry;
import sill.record.DesignRecord.GivenEntry;
import sill.record.DesignRecord.PlotEntry;
import sill.record.DesignRecord.ValueEntry;
import sill.trace.Trace;
import sill.trace.TraceKind;
import sill.trace.TraceNode;
import sill.values.CellState;
import sill.values.Datum;

/** What rests on what in a record, and which node of the trace each of its entries is. */
final class RecordTrace {
    private final Trace trace;
    private final Map<String, Integer> places = new HashMap<>();
    private final Set<String> varied = new HashSet<>();
    private final Set<String> mentioned = new HashSet<>();

    private RecordTrace(List<TraceNode> nodes) {
        trace = Trace.of(nodes);
        for (int i = 0; i < nodes.size(); i++) {
            places.put(key(nodes.get(i).kind(), nodes.get(i).at()), i);
        }
    }

    static RecordTrace of(DesignRecord record) {
        List<TraceNode> nodes = new ArrayList<>();
        for (GivenEntry given : record.givens()) {
            String shown = given.shown().isEmpty() ? Values.brief(given.value(), given.unit()) : given.shown();
            nodes.add(node(TraceKind.GIVEN, given.at(), given.name(), given.name(), shown, List.of(), List.of()));
        }
        for (ValueEntry value : record.values()) {
            String label = value.name().isEmpty() ? value.formula() : value.name();
            nodes.add(node(
                    TraceKind.RESULT, value.at(), value.name(), label, shown(value), value.uses(), value.dependsOn()));
        }
        for (PlotEntry plot : record.plots()) {
            nodes.add(node(TraceKind.PLOT, plot.at(), plot.name(), plot.caption(), "", plot.uses(), plot.dependsOn()));
        }
        for (CheckEntry check : record.checks()) {
            String verdict = check.verdict().word();
            nodes.add(node(TraceKind.CHECK, check.at(), "", check.text(), verdict, check.uses(), check.dependsOn()));
        }
        RecordTrace trace = new RecordTrace(nodes);
        record.givens().stream()
                .filter(given -> given.low().isPresent())
                .forEach(given -> trace.varied.add(given.name()));
        record.cells().forEach(trace::readMentions);
        return trace;
    }

    private static TraceNode node(
            TraceKind kind,
            String at,
            String name,
            String label,
            String shown,
            List<String> uses,
            List<String> dependsOn) {
        return new TraceNode(kind, at, name, label.isEmpty() ? at : label, shown, uses, dependsOn);
    }

    private static String shown(ValueEntry value) {
        if (value.value() instanceof Datum.Items items && !Values.isTable(items)) {
            return Heading.counted(items.size(), "value");
        }
        boolean inOwnWords = value.shown().isEmpty() || Values.isTable(value.value());
        return inOwnWords ? Values.brief(value.value(), value.unit()) : value.shown();
    }

    /** A cell that did not run has no uses in the record, though its text may have; nor has a tolerance cell. */
    private void readMentions(CellEntry cell) {
        boolean traced = List.of("note", "given").contains(cell.kind());
        boolean ran = cell.state() == CellState.DONE && !cell.kind().equals("tolerance");
        if (!traced && !ran) {
            mentioned.addAll(List.of(cell.source().split("\\P{javaJavaIdentifierPart}+")));
        }
    }

    private static String key(TraceKind kind, String at) {
        return kind.word() + " " + at;
    }

    Trace trace() {
        return trace;
    }

    /** The place in the trace of the entry of a kind at an address of the record. */
    int place(TraceKind kind, String at) {
        return places.get(key(kind, at));
    }

    /** The id of the line where a name is set that another line mentions; empty when that is the same line or none. */
    String placeFrom(String at, String name) {
        return trace.named(name)
                .map(TraceNode::at)
                .filter(set -> !set.equals(at))
                .map(Addresses::id)
                .orElse("");
    }

    /** Whether a given is used by nothing, as far as the record knows. */
    boolean isUnused(int place) {
        TraceNode node = trace.nodes().get(place);
        return node.kind() == TraceKind.GIVEN && trace.users(place).isEmpty() && !mentioned.contains(node.name());
    }

    /** Whether a check's expression rests on a given with limits. */
    boolean restsOnTolerances(CheckEntry check) {
        return check.dependsOn().stream().anyMatch(varied::contains);
    }

    /** The givens used by nothing, in order. */
    List<TraceNode> unused() {
        List<TraceNode> unused = new ArrayList<>();
        for (int i = 0; i < trace.nodes().size(); i++) {
            if (isUnused(i)) {
                unused.add(trace.nodes().get(i));
            }
        }
        return unused;
    }
}
