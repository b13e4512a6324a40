package sill.trace;

import java.util.List;

/**
 * How high each place of a drawing lies: in its layer's order, never nearer to its neighbours than they need, and otherwise as
 * near as can be to the mean of the places it is joined to. One layer at a time that is a least-squares fit under an order,
 * solved by pooling adjacent violators (Barlow, Bartholomew, Bremner and Brunk, Statistical Inference under Order Restrictions,
 * 1972).
 */
final class Heights {
    private static final int SWEEPS = 6;

    /** Lines that pass a layer weigh more, so that they run straight. */
    private static final double PASSING_WEIGHT = 4;

    private final Lanes lanes;
    private final List<List<Integer>> layers;
    private final double[] needed;
    private final double gap;
    private final double[] centre;

    private Heights(Lanes lanes, List<List<Integer>> layers, double[] needed, double gap) {
        this.lanes = lanes;
        this.layers = layers;
        this.needed = needed;
        this.gap = gap;
        centre = new double[needed.length];
    }

    /**
     * The centre of each place, the topmost box beginning at 0.
     *
     * @param needed how high each place is
     * @param gap what stays free between neighbours
     */
    static double[] of(Lanes lanes, List<List<Integer>> layers, double[] needed, double gap) {
        Heights heights = new Heights(lanes, layers, needed, gap);
        for (List<Integer> layer : layers) {
            heights.stack(layer);
        }
        for (int sweep = 0; sweep < SWEEPS; sweep++) {
            for (int i = 0; i < layers.size(); i++) {
                heights.settle(layers.get(sweep % 2 == 0 ? i : layers.size() - 1 - i), sweep);
            }
        }
        return heights.fromTheTop();
    }

    private void stack(List<Integer> layer) {
        double y = 0;
        for (int place : layer) {
            centre[place] = y + needed[place] / 2;
            y += needed[place] + gap;
        }
        for (int place : layer) {
            centre[place] -= y / 2;
        }
    }

    private void settle(List<Integer> layer, int sweep) {
        int size = layer.size();
        double[] offset = new double[size];
        double[] mean = new double[size];
        double[] weight = new double[size];
        int[] length = new int[size];
        int blocks = 0;
        for (int i = 0; i < size; i++) {
            int place = layer.get(i);
            if (i > 0) {
                offset[i] = offset[i - 1] + (needed[layer.get(i - 1)] + needed[place]) / 2 + gap;
            }
            mean[blocks] = wanted(place, sweep) - offset[i];
            weight[blocks] = lanes.places().get(place).passing() ? PASSING_WEIGHT : 1;
            length[blocks] = 1;
            blocks++;
            while (blocks > 1 && mean[blocks - 2] > mean[blocks - 1]) {
                double both = weight[blocks - 2] + weight[blocks - 1];
                mean[blocks - 2] =
                        (mean[blocks - 2] * weight[blocks - 2] + mean[blocks - 1] * weight[blocks - 1]) / both;
                weight[blocks - 2] = both;
                length[blocks - 2] += length[blocks - 1];
                blocks--;
            }
        }
        int i = 0;
        for (int block = 0; block < blocks; block++) {
            for (int left = length[block]; left > 0; left--) {
                centre[layer.get(i)] = mean[block] + offset[i];
                i++;
            }
        }
    }

    /** The mean of what it is joined to: on the side the sweep comes from, in the last two sweeps on both. */
    private double wanted(int place, int sweep) {
        boolean both = sweep >= SWEEPS - 2;
        double sum = 0;
        int joined = 0;
        if (both || sweep % 2 == 0) {
            for (int other : lanes.lefts(place)) {
                sum += centre[other];
                joined++;
            }
        }
        if (both || sweep % 2 == 1) {
            for (int other : lanes.rights(place)) {
                sum += centre[other];
                joined++;
            }
        }
        return joined == 0 ? centre[place] : sum / joined;
    }

    private double[] fromTheTop() {
        double top = Double.POSITIVE_INFINITY;
        for (int place = 0; place < centre.length; place++) {
            top = Math.min(top, centre[place] - needed[place] / 2);
        }
        for (int place = 0; place < centre.length; place++) {
            centre[place] -= top;
        }
        return centre;
    }
}
