package sill.study;

import java.util.Arrays;

/** A thread's model, and what it gave last. */
final class Probe {
    private final Model model;
    private double[] scratch;
    private double[] outputs;
    private Throwable thrown;

    Probe(Model model, int inputs, int outputs) {
        this.model = model;
        this.scratch = new double[inputs];
        this.outputs = new double[outputs];
    }

    /**
     * Takes new arrays from the calling thread's own memory: arrays of two threads that share a cache line would slow both.
     */
    void settle() {
        scratch = new double[scratch.length];
        outputs = new double[outputs.length];
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
