package sill.study;

/** A calculation that can be repeated. One thread uses it at a time. */
@FunctionalInterface
public interface Model {
    /**
     * Calculates once.
     *
     * @param inputs values of the varied inputs in the order of the plan, in coherent SI; the model may overwrite them
     * @param outputs where the results go, in the order of the plan; they may be infinite or not a number, which is counted
     * @throws Throwable whatever the calculation throws, which is counted; an {@link InterruptedException} or
     *     {@link OutOfMemoryError} ends the study
     */
    void evaluate(double[] inputs, double[] outputs) throws Throwable;
}
