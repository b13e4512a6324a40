package sill.study;

import java.util.List;
import org.apache.commons.rng.sampling.distribution.ZigguratSampler;

/** Draws and evaluates blocks for one thread. */
final class BlockRun {
    private final List<Studied> outputs;
    private final Draws draws;
    private final long seed;
    private final int inputs;
    private final double[] rows;
    private final double[][] columns;
    private final double[] finite = new double[Draws.BLOCK];

    BlockRun(StudyPlan plan, long seed) {
        this.outputs = plan.outputs();
        this.draws = new Draws(plan.inputs());
        this.seed = seed;
        this.inputs = plan.inputs().size();
        this.rows = new double[Draws.CHUNK * inputs];
        this.columns = new double[outputs.size()][Draws.BLOCK];
    }

    /** What becomes of the finite values of an output. */
    interface Keeper {
        /** Takes a block: all values in the order drawn (those not finite are not numbers), then the finite ones alone. */
        void keep(int output, double[] all, int count, double[] finite, int finiteCount);
    }

    /** A block's samples through the model. */
    BlockTally run(long block, int count, Probe probe, Keeper keeper) throws InterruptedException {
        BlockTally tally = new BlockTally(outputs);
        Stream generator = Stream.of(seed, block);
        ZigguratSampler.NormalizedGaussian normals = ZigguratSampler.NormalizedGaussian.of(generator);
        for (int from = 0; from < count; from += Draws.CHUNK) {
            if (Thread.interrupted()) {
                throw new InterruptedException();
            }
            int some = Math.min(Draws.CHUNK, count - from);
            draws.fill(generator, normals, rows, some);
            chunk(from, some, probe, tally);
        }
        for (int k = 0; k < columns.length; k++) {
            int kept = 0;
            double[] column = columns[k];
            for (int i = 0; i < count; i++) {
                double value = column[i];
                if (Math.abs(value) <= Double.MAX_VALUE) {
                    finite[kept++] = value;
                } else {
                    column[i] = Double.NaN;
                }
            }
            tally.take(k, finite, kept, count);
            keeper.keep(k, column, count, finite, kept);
        }
        return tally;
    }

    private void chunk(int from, int some, Probe probe, BlockTally tally) throws InterruptedException {
        double[] results = probe.outputs();
        for (int i = 0; i < some; i++) {
            if (!probe.evaluate(rows, i * inputs)) {
                tally.threw(probe.thrown());
            }
            for (int k = 0; k < columns.length; k++) {
                columns[k][from + i] = results[k];
            }
        }
    }

    /** The inputs of the first sample of a block that gives an output this value. */
    double[] inputsOf(long block, int count, int output, double value, Probe probe) throws InterruptedException {
        Stream generator = Stream.of(seed, block);
        ZigguratSampler.NormalizedGaussian normals = ZigguratSampler.NormalizedGaussian.of(generator);
        double[] found = new double[inputs];
        for (int from = 0; from < count; from += Draws.CHUNK) {
            int some = Math.min(Draws.CHUNK, count - from);
            draws.fill(generator, normals, rows, some);
            for (int i = 0; i < some; i++) {
                if (probe.evaluate(rows, i * inputs) && probe.outputs()[output] == value) {
                    System.arraycopy(rows, i * inputs, found, 0, inputs);
                    return found;
                }
            }
        }
        throw new IllegalStateException("The model gave another result for the same inputs.");
    }
}
