package sill.trace;

import java.util.ArrayList;
import java.util.List;

/**
 * The places of a drawing, layer by layer: one for each node, and one for each line that passes a layer on its way further
 * right. Lines from one node share their way as long as they can, so a value used often is one line that branches.
 */
final class Lanes {
    /** What stands at a place: a node, or the line of the node {@code owner} passing by. */
    record Place(int layer, int owner, boolean passing) {}

    /** A line from a place to one in the next layer. */
    record Step(int from, int to, boolean mutual) {}

    private final List<Place> places = new ArrayList<>();
    private final List<Step> steps = new ArrayList<>();
    private final List<List<Integer>> lefts = new ArrayList<>();
    private final List<List<Integer>> rights = new ArrayList<>();
    private final int layers;

    Lanes(int nodes, Layers layers) {
        this.layers = layers.count();
        List<List<Layers.Use>> bySource = new ArrayList<>();
        for (int node = 0; node < nodes; node++) {
            add(new Place(layers.layer(node), node, false));
            bySource.add(new ArrayList<>());
        }
        for (Layers.Use use : layers.uses()) {
            bySource.get(use.from()).add(use);
        }
        for (int node = 0; node < nodes; node++) {
            lead(node, bySource.get(node));
        }
    }

    private void lead(int node, List<Layers.Use> uses) {
        int start = places.get(node).layer();
        int end = start;
        for (Layers.Use use : uses) {
            end = Math.max(end, places.get(use.to()).layer());
        }
        int at = node;
        for (int layer = start + 1; layer <= end; layer++) {
            for (Layers.Use use : uses) {
                if (places.get(use.to()).layer() == layer) {
                    join(at, use.to(), use.mutual());
                }
            }
            if (layer < end) {
                int next = add(new Place(layer, node, true));
                join(at, next, false);
                at = next;
            }
        }
    }

    private int add(Place place) {
        places.add(place);
        lefts.add(new ArrayList<>());
        rights.add(new ArrayList<>());
        return places.size() - 1;
    }

    private void join(int from, int to, boolean mutual) {
        steps.add(new Step(from, to, mutual));
        rights.get(from).add(to);
        lefts.get(to).add(from);
    }

    /** How many layers there are. */
    int layers() {
        return layers;
    }

    /** All places; those of the nodes come first, in the nodes' order. */
    List<Place> places() {
        return places;
    }

    List<Step> steps() {
        return steps;
    }

    /** The places in the next layer to the left that a place is joined to. */
    List<Integer> lefts(int place) {
        return lefts.get(place);
    }

    /** The places in the next layer to the right that a place is joined to. */
    List<Integer> rights(int place) {
        return rights.get(place);
    }
}
