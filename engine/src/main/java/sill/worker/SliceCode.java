package sill.worker;

import java.lang.reflect.UndeclaredThrowableException;
import java.util.Arrays;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.function.BiConsumer;
import sill.sheet.Slice;
import sill.sheet.Slicer;
import sill.study.Model;

/** A slice, ready to be called. */
final class SliceCode {
    private final Slice slice;
    private final Map<String, Object> givens;
    private final Map<String, byte[]> classes = new HashMap<>();

    /** @param givens values of the givens that do not vary, by name */
    SliceCode(Slice slice, Map<String, Object> givens) {
        this.slice = slice;
        this.givens = givens;
        slice.classes().forEach((name, bytes) -> classes.put(name, StrictFunctions.in(bytes)));
    }

    /**
     * The first form of a slice that gives bit for bit what the cells gave.
     *
     * @param varied the givens that vary
     * @param givens values of all givens, by name
     * @param nominal what the cells gave
     * @return nothing when no form does
     */
    static Optional<SliceCode> agreeing(
            Slicer slicer,
            int cell,
            List<Slice.Output> outputs,
            List<String> varied,
            Map<String, Object> givens,
            double[] nominal) {
        double[] inputs =
                varied.stream().mapToDouble(name -> (Double) givens.get(name)).toArray();
        for (Slice.Form form : Slice.Form.values()) {
            Optional<SliceCode> code =
                    slicer.slice(cell, outputs, varied, form).map(slice -> new SliceCode(slice, givens));
            if (code.isPresent() && code.get().gives(inputs, nominal)) {
                return code;
            }
        }
        return Optional.empty();
    }

    /** Whether it gives these results, and, asked again, the same: nothing of a repetition may be left for the next. */
    boolean gives(double[] inputs, double[] results) {
        double[] got = new double[results.length];
        try {
            BiConsumer<double[], double[]> calculation = newInstance();
            for (int i = 0; i < 2; i++) {
                Arrays.fill(got, Double.NaN);
                calculation.accept(inputs, got);
                if (!Arrays.equals(got, results)) {
                    return false;
                }
            }
            return true;
        } catch (RuntimeException | LinkageError e) {
            // The cells gave a value where this did not: it is another calculation.
            return false;
        }
    }

    /** The same as a model of a study; what the calculation throws comes out as it was. */
    Model newModel() {
        BiConsumer<double[], double[]> calculation = newInstance();
        return (inputs, outputs) -> {
            try {
                calculation.accept(inputs, outputs);
            } catch (UndeclaredThrowableException e) {
                throw e.getUndeclaredThrowable();
            }
        };
    }

    /** A calculation with a state of its own, for one thread: takes the values of the varied givens, puts the results. */
    BiConsumer<double[], double[]> newInstance() {
        SheetLoader loader = new SheetLoader(classes);
        try {
            Class<?> type = loader.findClass(slice.className());
            for (String held : slice.held()) {
                type.getField(held).set(null, givens.get(held));
            }
            @SuppressWarnings("unchecked")
            BiConsumer<double[], double[]> calculation =
                    (BiConsumer<double[], double[]>) type.getConstructor().newInstance();
            return calculation;
        } catch (ReflectiveOperationException e) {
            throw new IllegalStateException("a slice's class is as it was written", e);
        }
    }
}
