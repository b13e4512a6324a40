package sill.trace;

import java.util.ArrayList;
import java.util.Collections;
import java.util.List;

/**
 * The order of the places in each layer, with few crossings of lines: every place moves to the mean of the places it is joined
 * to (the barycentre heuristic of Sugiyama, Tagawa and Toda, IEEE Transactions on Systems, Man and Cybernetics 11, 1981), layer
 * by layer to the right and back, and the best order seen is kept. Equal means keep their order, so the result is always the
 * same.
 */
final class Ordering {
    private static final int SWEEPS = 10;

    private final Lanes lanes;
    private final int[] rank;
    private final double[] wanted;
    private List<List<Integer>> layers = new ArrayList<>();

    private Ordering(Lanes lanes) {
        this.lanes = lanes;
        rank = new int[lanes.places().size()];
        wanted = new double[rank.length];
        for (int layer = 0; layer < lanes.layers(); layer++) {
            layers.add(new ArrayList<>());
        }
        for (int place = 0; place < rank.length; place++) {
            layers.get(lanes.places().get(place).layer()).add(place);
        }
        layers.forEach(this::number);
    }

    /** The places of each layer, from the top. */
    static List<List<Integer>> of(Lanes lanes) {
        Ordering ordering = new Ordering(lanes);
        List<List<Integer>> best = ordering.copy();
        int fewest = ordering.crossings();
        for (int sweep = 0; sweep < SWEEPS && fewest > 0; sweep++) {
            ordering.sweep(sweep % 2 == 0);
            int crossings = ordering.crossings();
            if (crossings < fewest) {
                fewest = crossings;
                best = ordering.copy();
            }
        }
        return best;
    }

    private void sweep(boolean toTheRight) {
        for (int i = 0; i < layers.size(); i++) {
            List<Integer> layer = layers.get(toTheRight ? i : layers.size() - 1 - i);
            for (int place : layer) {
                List<Integer> joined = toTheRight ? lanes.lefts(place) : lanes.rights(place);
                double sum = 0;
                for (int other : joined) {
                    sum += rank[other];
                }
                wanted[place] = joined.isEmpty() ? rank[place] : sum / joined.size();
            }
            layer.sort((a, b) -> Double.compare(wanted[a], wanted[b]));
            number(layer);
        }
    }

    private void number(List<Integer> layer) {
        for (int i = 0; i < layer.size(); i++) {
            rank[layer.get(i)] = i;
        }
    }

    private List<List<Integer>> copy() {
        List<List<Integer>> copy = new ArrayList<>();
        layers.forEach(layer -> copy.add(List.copyOf(layer)));
        return copy;
    }

    /** How often lines cross between layers. */
    private int crossings() {
        int crossings = 0;
        for (List<Integer> layer : layers) {
            List<Integer> seen = new ArrayList<>();
            for (int place : layer) {
                List<Integer> ends = new ArrayList<>();
                for (int right : lanes.rights(place)) {
                    ends.add(rank[right]);
                }
                for (int end : ends) {
                    crossings += seen.size() - firstAbove(seen, end);
                }
                for (int end : ends) {
                    seen.add(firstAbove(seen, end), end);
                }
            }
        }
        return crossings;
    }

    /** Where in a sorted list the first number greater than this one stands. */
    private static int firstAbove(List<Integer> sorted, int number) {
        int found = Collections.binarySearch(sorted, number + 1);
        int at = found < 0 ? -found - 1 : found;
        while (at > 0 && sorted.get(at - 1) > number) {
            at--;
        }
        return at;
    }
}
