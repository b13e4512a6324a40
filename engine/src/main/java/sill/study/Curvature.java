package sill.study;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;

/** Compares straight lines with the model: each input alone at its limits, two inputs together, the extremes. */
final class Curvature {
    /** Straight lines may miss by this fraction. */
    private static final double TENTH = 0.1;

    /** With more inputs than this only those that move the most are taken in pairs. */
    private static final int PAIRED = 20;

    /** Misses below this fraction of the results are rounding. */
    private static final double ROUNDING = 1e-11;

    private final List<Varied> inputs;
    private final Box box;
    private final double[] nominal;
    private final double[][] slopes;
    private final LinearPicture[] pictures;
    private final List<List<Doubt>> doubts = new ArrayList<>();

    Curvature(List<Varied> inputs, double[] nominal, double[][] slopes) {
        this.inputs = inputs;
        this.box = new Box(inputs);
        this.nominal = nominal.clone();
        this.slopes = slopes;
        pictures = new LinearPicture[nominal.length];
        for (int k = 0; k < nominal.length; k++) {
            pictures[k] = new LinearPicture(inputs, nominal[k], slopes[k]);
            doubts.add(new ArrayList<>());
        }
    }

    LinearPicture picture(int output) {
        return pictures[output];
    }

    /** Looks at the model where straight lines may miss. */
    void look(Probe probe, Tally tally) throws InterruptedException {
        double[][] far = new double[inputs.size()][];
        for (int i : box.free()) {
            Varied input = inputs.get(i);
            double[] low = at(probe, tally, i, input.low());
            double[] high = at(probe, tally, i, input.high());
            far[i] = input.high() - input.nominal() >= input.nominal() - input.low() ? high : low;
            for (int k = 0; k < nominal.length; k++) {
                List<String> name = List.of(input.name());
                if (!Double.isFinite(slopes[k][i])) {
                    doubts.get(k).add(new Doubt(Doubt.Kind.NO_SLOPE, name, Double.NaN, Double.NaN));
                    continue;
                }
                compare(k, Doubt.Kind.ALONE_LOW, name, slopes[k][i] * (input.low() - input.nominal()), low[k]);
                compare(k, Doubt.Kind.ALONE_HIGH, name, slopes[k][i] * (input.high() - input.nominal()), high[k]);
            }
        }
        pairs(probe, tally, far);
    }

    private double[] at(Probe probe, Tally tally, int input, double value) throws InterruptedException {
        double[] point = box.nominal();
        point[input] = value;
        tally.look(probe, point);
        return probe.outputs().clone();
    }

    /** The mixed terms: what two inputs do together beyond what each does alone. */
    private void pairs(Probe probe, Tally tally, double[][] far) throws InterruptedException {
        int[] free = box.free();
        if (free.length > PAIRED) {
            free = pictures[0].strongest(PAIRED);
        }
        for (int a = 0; a < free.length; a++) {
            for (int b = a + 1; b < free.length; b++) {
                double[] point = box.nominal();
                point[free[a]] = farther(free[a]);
                point[free[b]] = farther(free[b]);
                tally.look(probe, point);
                for (int k = 0; k < nominal.length; k++) {
                    double alone = far[free[a]][k] - nominal[k] + (far[free[b]][k] - nominal[k]);
                    List<String> names = List.of(
                            inputs.get(free[a]).name(), inputs.get(free[b]).name());
                    compare(k, Doubt.Kind.TOGETHER, names, alone, probe.outputs()[k]);
                }
            }
        }
    }

    private double farther(int input) {
        Varied varied = inputs.get(input);
        return varied.high() - varied.nominal() >= varied.nominal() - varied.low() ? varied.high() : varied.low();
    }

    private void compare(int output, Doubt.Kind kind, List<String> givens, double linear, double value) {
        double found = value - nominal[output];
        double width = Math.max(pictures[output].halfWidth(false), pictures[output].halfWidth(true));
        double allowed = Math.max(TENTH * width, ROUNDING * Math.max(Math.abs(nominal[output]), Math.abs(value)));
        if (Double.isFinite(found) && Math.abs(found - linear) > allowed) {
            doubts.get(output).add(new Doubt(kind, givens, linear, found));
        }
    }

    /** The worst first; the extremes are compared with the plain sums of what slopes say. */
    List<Doubt> doubts(int output, Tally tally) {
        List<Doubt> all = new ArrayList<>(doubts.get(output));
        extreme(all, output, Doubt.Kind.LOWEST, -pictures[output].sum(false), tally.lowest(output));
        extreme(all, output, Doubt.Kind.HIGHEST, pictures[output].sum(true), tally.highest(output));
        all.sort(Comparator.comparingDouble((Doubt doubt) -> doubt.kind() == Doubt.Kind.NO_SLOPE
                ? Double.NEGATIVE_INFINITY
                : -Math.abs(doubt.found() - doubt.linear())));
        return all;
    }

    private void extreme(List<Doubt> all, int output, Doubt.Kind kind, double linear, double value) {
        double found = value - nominal[output];
        double allowed =
                Math.max(TENTH * Math.abs(linear), ROUNDING * Math.max(Math.abs(nominal[output]), Math.abs(value)));
        if (Math.abs(found - linear) > allowed) {
            all.add(new Doubt(kind, List.of(), linear, found));
        }
    }
}
