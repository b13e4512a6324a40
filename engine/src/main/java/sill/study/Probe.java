package sill.study;

import java.util.Arrays;

/** A thread's model, and what it gave last. */
final class Probe {
    private final Model model;
    private final double[] scratch;
    private final double[] outputs;
    private Throwable thrown;

    Probe(Model model, int inputs, int outputs) {
        this.model = model;
        this.scratch = new double[inputs];
        this.outputs = new double[outputs];
    }

    /** Results of the last evaluation; not numbers where it threw. */
    double[] outputs() {
        return outputs;
    }

    /** What the last evaluation threw; to be asked only when {@link #evaluate} gave false. */
    Throwable thrown() {
        return thrown;
    }

    /** Calculates once from values at an offset, which stay as they are; gives whether nothing was thrown. */
    boolean evaluate(double[] from, int offset) throws InterruptedException {
        double[] inputs = scratch;
        for (int i = 0; i < inputs.length; i++) {
            inputs[i] = from[offset + i];
        }
        try {
            model.evaluate(inputs, outputs);
            return true;
        } catch (InterruptedException | OutOfMemoryError e) {
            throw e;
        } catch (Throwable e) {
            thrown = e;
            Arrays.fill(outputs, Double.NaN);
            return false;
        }
    }
}
