package sill.study;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.stream.IntStream;
import org.apache.commons.math3.random.SobolSequenceGenerator;

/** Points that fill the box evenly (Sobol's sequence), and what the model gives there. */
final class QuasiRandom {
    private static final int FEWEST = 256;
    private static final int MOST = 4096;
    private static final int FOR_EACH_INPUT = 64;

    /** Points of a task. */
    private static final int TASK = 64;

    private final Box box;
    private final int outputs;
    private final double[][] points;
    private final double[][] values;

    QuasiRandom(Box box, int outputs) {
        this.box = box;
        this.outputs = outputs;
        int inputs = box.free().length;
        int count = Math.min(MOST, Math.max(FEWEST, FOR_EACH_INPUT * inputs));
        SobolSequenceGenerator generator = new SobolSequenceGenerator(inputs);
        points = new double[count][];
        for (int i = 0; i < count; i++) {
            points[i] = box.values(generator.nextVector());
        }
        values = new double[count][];
    }

    int size() {
        return points.length;
    }

    double[] point(int number) {
        return points[number].clone();
    }

    /** Evaluates all of them. */
    void look(Crew crew, Tally into) throws InterruptedException {
        crew.run((points.length + TASK - 1) / TASK, this::some, into::add);
    }

    private Tally some(long number, Probe probe) throws InterruptedException {
        Tally tally = new Tally(box.size(), outputs);
        int from = (int) number * TASK;
        for (int i = from; i < Math.min(points.length, from + TASK); i++) {
            tally.look(probe, points[i]);
            values[i] = probe.outputs().clone();
        }
        return tally;
    }

    /** The points with the highest (or lowest) finite values of an output, the best first. */
    List<double[]> best(int output, boolean highest, int most) {
        Comparator<Integer> byValue = Comparator.comparingDouble(i -> values[i][output]);
        List<double[]> best = new ArrayList<>();
        IntStream.range(0, points.length)
                .filter(i -> Double.isFinite(values[i][output]))
                .boxed()
                .sorted(highest ? byValue.reversed() : byValue)
                .limit(most)
                .forEach(i -> best.add(point(i)));
        return best;
    }
}
