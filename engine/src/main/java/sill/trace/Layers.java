package sill.trace;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;

/**
 * In which layer, from 0 at the left, each node of a trace stands. Every node is right of all it is made from: as far right as
 * the longest way there. What rests on nothing, as the givens, moves up to the first thing made from it, so that lines stay
 * short; checks share the last layer. Values that a loop makes from each other can't all stand right of their sources; one line of each such circle is
 * turned round and marked.
 */
final class Layers {
    /** A direct use; {@code mutual} when each rests on the other. */
    record Use(int from, int to, boolean mutual) {}

    private enum Visit {
        NEW,
        OPEN,
        ENDED
    }

    private final Trace trace;
    private final int[] layer;
    private final Visit[] visits;
    private final List<Use> uses = new ArrayList<>();
    private int last;

    private Layers(Trace trace) {
        this.trace = trace;
        int size = trace.nodes().size();
        layer = new int[size];
        visits = new Visit[size];
        Arrays.fill(visits, Visit.NEW);
    }

    static Layers of(Trace trace) {
        Layers layers = new Layers(trace);
        for (int node = 0; node < layers.layer.length; node++) {
            layers.visit(node);
        }
        layers.shiftChecks();
        layers.shiftStarts();
        return layers;
    }

    int layer(int node) {
        return layer[node];
    }

    int count() {
        return last + 1;
    }

    /** All uses, each from a layer to one further right. */
    List<Use> uses() {
        return uses;
    }

    private void visit(int node) {
        if (visits[node] != Visit.NEW) {
            return;
        }
        visits[node] = Visit.OPEN;
        int right = 0;
        for (int source : trace.sources(node)) {
            visit(source);
            if (visits[source] == Visit.ENDED) {
                boolean mutual = trace.sources(source).contains(node);
                uses.add(new Use(source, node, mutual));
                right = Math.max(right, layer[source] + 1);
            } else if (!trace.sources(source).contains(node)) {
                // The source waits for this very node: a circle, closed by a line that is turned round.
                uses.add(new Use(node, source, true));
            }
        }
        layer[node] = right;
        last = Math.max(last, right);
        visits[node] = Visit.ENDED;
    }

    private void shiftChecks() {
        boolean sharing = false;
        for (int node = 0; node < layer.length; node++) {
            boolean check = trace.nodes().get(node).kind() == TraceKind.CHECK;
            sharing |= !check && layer[node] == last && last > 0;
        }
        for (int node = 0; node < layer.length; node++) {
            if (trace.nodes().get(node).kind() == TraceKind.CHECK) {
                layer[node] = sharing ? last + 1 : last;
            }
        }
        for (int right : layer) {
            last = Math.max(last, right);
        }
    }

    private void shiftStarts() {
        for (int node = 0; node < layer.length; node++) {
            if (!trace.sources(node).isEmpty() || trace.nodes().get(node).kind() == TraceKind.CHECK) {
                continue;
            }
            int first = last + 1;
            for (int user : trace.users(node)) {
                first = Math.min(first, layer[user]);
            }
            layer[node] = first <= last ? first - 1 : 0;
        }
    }
}
