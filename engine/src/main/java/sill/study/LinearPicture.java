package sill.study;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;

/** What slopes at the nominal point say of one output. */
final class LinearPicture {
    private final List<Varied> inputs;
    private final double nominal;
    private final double[] slopes;

    LinearPicture(List<Varied> inputs, double nominal, double[] slopes) {
        this.inputs = inputs;
        this.nominal = nominal;
        this.slopes = slopes.clone();
    }

    /** How far one input alone moves the result upwards (or downwards), 0 or more. */
    private double reach(int input, boolean upwards) {
        Varied varied = inputs.get(input);
        boolean rises = slopes[input] > 0 == upwards;
        return Math.abs(slopes[input]) * (rises ? varied.high() - varied.nominal() : varied.nominal() - varied.low());
    }

    /** Half-width of the root-sum-square to one side. */
    double halfWidth(boolean upwards) {
        double sum = 0;
        for (int i = 0; i < slopes.length; i++) {
            double reach = reach(i, upwards);
            sum += reach * reach;
        }
        return Math.sqrt(sum);
    }

    /** Sum of all reaches to one side. */
    double sum(boolean upwards) {
        double sum = 0;
        for (int i = 0; i < slopes.length; i++) {
            sum += reach(i, upwards);
        }
        return sum;
    }

    private double uncertainty(int input) {
        return Math.abs(slopes[input]) * inputs.get(input).standardDeviation();
    }

    private double variance() {
        double sum = 0;
        for (int i = 0; i < slopes.length; i++) {
            sum += uncertainty(i) * uncertainty(i);
        }
        return sum;
    }

    RootSumSquare rootSumSquare(List<Doubt> doubts) {
        return new RootSumSquare(nominal - halfWidth(false), nominal + halfWidth(true), Math.sqrt(variance()), doubts);
    }

    /** The largest share first; equal ones in the order of the inputs. */
    List<Sensitivity> sensitivities() {
        double variance = variance();
        List<Sensitivity> all = new ArrayList<>();
        for (int i = 0; i < slopes.length; i++) {
            double share = variance > 0 ? uncertainty(i) * uncertainty(i) / variance : 0;
            all.add(new Sensitivity(inputs.get(i).name(), slopes[i], share));
        }
        all.sort(Comparator.comparingDouble(Sensitivity::share).reversed());
        return List.copyOf(all);
    }

    /** Inputs by the size of what they can move, the strongest first. */
    int[] strongest(int most) {
        List<Integer> free = new ArrayList<>();
        for (int i = 0; i < slopes.length; i++) {
            if (inputs.get(i).free()) {
                free.add(i);
            }
        }
        free.sort(Comparator.comparingDouble(
                (Integer i) -> -Math.abs(slopes[i]) * inputs.get(i).width()));
        return free.stream().limit(most).mapToInt(Integer::intValue).toArray();
    }

    /** The corner that slopes alone would choose. */
    double[] corner(boolean upwards) {
        double[] point = new double[slopes.length];
        for (int i = 0; i < point.length; i++) {
            point[i] = slopes[i] > 0 == upwards
                    ? inputs.get(i).high()
                    : inputs.get(i).low();
        }
        return point;
    }
}
