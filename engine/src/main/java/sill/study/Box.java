package sill.study;

import java.util.List;
import java.util.stream.IntStream;

/** The limits of the inputs as arrays, and the way between them and the unit cube of those inputs that vary. */
final class Box {
    private final double[] nominal;
    private final double[] low;
    private final double[] high;
    private final int[] free;

    Box(List<Varied> inputs) {
        nominal = inputs.stream().mapToDouble(Varied::nominal).toArray();
        low = inputs.stream().mapToDouble(Varied::low).toArray();
        high = inputs.stream().mapToDouble(Varied::high).toArray();
        free = IntStream.range(0, low.length).filter(i -> inputs.get(i).free()).toArray();
    }

    int size() {
        return nominal.length;
    }

    double[] nominal() {
        return nominal.clone();
    }

    double low(int input) {
        return low[input];
    }

    double high(int input) {
        return high[input];
    }

    /** The inputs that vary, by number. */
    int[] free() {
        return free.clone();
    }

    /** A value by its fraction of the way between the limits; 0 and 1 give the limits to the last bit. */
    double value(int input, double fraction) {
        if (fraction >= 1) {
            return high[input];
        }
        return Math.min(low[input] + Math.max(0, fraction) * (high[input] - low[input]), high[input]);
    }

    double fraction(int input, double value) {
        return (value - low[input]) / (high[input] - low[input]);
    }

    /** A point of the unit cube as values. */
    double[] values(double[] fractions) {
        double[] values = nominal.clone();
        for (int i = 0; i < free.length; i++) {
            values[free[i]] = value(free[i], fractions[i]);
        }
        return values;
    }

    /** The other way. */
    double[] fractions(double[] values) {
        double[] fractions = new double[free.length];
        for (int i = 0; i < free.length; i++) {
            fractions[i] = Math.min(1, Math.max(0, fraction(free[i], values[free[i]])));
        }
        return fractions;
    }

    boolean contains(double[] values) {
        for (int i = 0; i < values.length; i++) {
            if (!(low[i] <= values[i] && values[i] <= high[i])) {
                return false;
            }
        }
        return true;
    }
}
