package sill.trace;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/**
 * Nodes and how they rest on one another. Nodes are known by their place in {@link #nodes()}, from 0. A name without a node
 * is passed over; where several nodes have one name, the first has it.
 */
public final class Trace {
    private final List<TraceNode> nodes;
    private final Map<String, Integer> byName = new HashMap<>();
    private final List<List<Integer>> sources = new ArrayList<>();
    private final List<List<Integer>> users = new ArrayList<>();
    private final List<List<Integer>> resting = new ArrayList<>();

    private Trace(List<TraceNode> nodes) {
        this.nodes = List.copyOf(nodes);
        for (int i = 0; i < nodes.size(); i++) {
            if (!nodes.get(i).name().isEmpty()) {
                byName.putIfAbsent(nodes.get(i).name(), i);
            }
            users.add(new ArrayList<>());
            resting.add(new ArrayList<>());
        }
        for (int i = 0; i < nodes.size(); i++) {
            sources.add(found(nodes.get(i).uses(), i));
            for (int source : sources.get(i)) {
                users.get(source).add(i);
            }
            for (int below : found(nodes.get(i).dependsOn(), i)) {
                resting.get(below).add(i);
            }
        }
    }

    /** The trace of these nodes, which stand in the order of their addresses. */
    public static Trace of(List<TraceNode> nodes) {
        return new Trace(nodes);
    }

    /** All nodes, in the order they were given. */
    public List<TraceNode> nodes() {
        return nodes;
    }

    /** The node with a name. */
    public Optional<TraceNode> named(String name) {
        Integer place = byName.get(name);
        return place == null ? Optional.empty() : Optional.of(nodes.get(place));
    }

    /** The nodes that one is made from directly, itself left out. */
    public List<Integer> sources(int node) {
        return sources.get(node);
    }

    /** The nodes made from one directly, in order. */
    public List<Integer> users(int node) {
        return users.get(node);
    }

    /** All nodes that rest on one, directly or not, in order. */
    public List<Integer> resting(int node) {
        return resting.get(node);
    }

    /** Lists of names hold each name once. */
    private List<Integer> found(List<String> names, int self) {
        List<Integer> places = new ArrayList<>(names.size());
        for (String name : names) {
            Integer place = byName.get(name);
            if (place != null && place != self) {
                places.add(place);
            }
        }
        return places;
    }
}
