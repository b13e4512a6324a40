package sill.study;

import org.apache.commons.math3.exception.MathIllegalStateException;
import org.apache.commons.math3.optim.InitialGuess;
import org.apache.commons.math3.optim.MaxEval;
import org.apache.commons.math3.optim.SimpleBounds;
import org.apache.commons.math3.optim.nonlinear.scalar.GoalType;
import org.apache.commons.math3.optim.nonlinear.scalar.ObjectiveFunction;
import org.apache.commons.math3.optim.nonlinear.scalar.noderiv.BOBYQAOptimizer;
import org.apache.commons.math3.optim.univariate.BrentOptimizer;
import org.apache.commons.math3.optim.univariate.SearchInterval;
import org.apache.commons.math3.optim.univariate.UnivariateObjectiveFunction;

/**
 * Follows one output from a point to a peak (or a valley) within the limits: Powell's BOBYQA in the unit cube of the inputs,
 * then along each input by Brent's method. Every evaluation goes to the tally, so nothing is lost when a search gives up.
 */
final class Climb {
    private static final double START_RADIUS = 0.1;
    private static final double END_RADIUS = 1e-7;
    private static final double LINE_REACH = 0.02;
    private static final double LINE_ACCURACY = 1e-9;
    private static final int LINE_EVALUATIONS = 60;

    private final Box box;
    private final int[] free;
    private final int output;
    private final boolean highest;
    private final Probe probe;
    private final Tally tally;
    private final double substitute;

    /**
     * One search.
     *
     * @param substitute what stands for a result that is not finite: a poor one
     */
    Climb(Box box, int outputs, int output, boolean highest, Probe probe, double substitute) {
        this.box = box;
        this.free = box.free();
        this.output = output;
        this.highest = highest;
        this.probe = probe;
        this.tally = new Tally(box.size(), outputs);
        this.substitute = substitute;
    }

    /** How many evaluations a search takes at most. */
    static int evaluations(int inputs) {
        return 200 + 60 * inputs;
    }

    /** Searches from a point; gives what was seen. */
    Tally from(double[] start) throws InterruptedException {
        try {
            look(start);
            if (free.length > 1) {
                bend(start);
            }
            for (int input : free) {
                along(input, free.length == 1 ? 1 : LINE_REACH);
            }
        } catch (Stopped e) {
            throw e.interruption;
        }
        return tally;
    }

    private void bend(double[] start) {
        double[] ones = new double[free.length];
        java.util.Arrays.fill(ones, 1);
        try {
            new BOBYQAOptimizer(2 * free.length + 1, START_RADIUS, END_RADIUS)
                    .optimize(
                            new MaxEval(evaluations(free.length)),
                            new InitialGuess(box.fractions(start)),
                            new SimpleBounds(new double[free.length], ones),
                            highest ? GoalType.MAXIMIZE : GoalType.MINIMIZE,
                            new ObjectiveFunction(fractions -> look(box.values(fractions))));
        } catch (MathIllegalStateException e) {
            // Out of evaluations or of numeric room: the tally has the best.
            return;
        } catch (Stopped e) {
            throw e;
        } catch (RuntimeException e) {
            // Paths of the algorithm that the library has not met.
            return;
        }
    }

    /** Along one input through the best point, its limits tried too. */
    private void along(int input, double reach) {
        double[] point = best();
        double middle = box.fraction(input, point[input]);
        at(point, input, 0);
        at(point, input, 1);
        try {
            new BrentOptimizer(LINE_ACCURACY, LINE_ACCURACY * LINE_ACCURACY)
                    .optimize(
                            new MaxEval(LINE_EVALUATIONS),
                            highest ? GoalType.MAXIMIZE : GoalType.MINIMIZE,
                            new SearchInterval(
                                    Math.max(0, middle - reach),
                                    Math.min(1, middle + reach),
                                    Math.min(1, Math.max(0, middle))),
                            new UnivariateObjectiveFunction(fraction -> at(point, input, fraction)));
        } catch (MathIllegalStateException e) {
            // Out of evaluations: the tally has the best.
            return;
        }
    }

    private double[] best() {
        return highest ? tally.highPoint(output) : tally.lowPoint(output);
    }

    private double at(double[] point, int input, double fraction) {
        double[] moved = point.clone();
        moved[input] = box.value(input, fraction);
        return look(moved);
    }

    private double look(double[] point) {
        try {
            if (Thread.interrupted()) {
                throw new InterruptedException();
            }
            tally.look(probe, point);
        } catch (InterruptedException e) {
            throw new Stopped(e);
        }
        double value = probe.outputs()[output];
        return Double.isFinite(value) ? value : substitute;
    }

    /** Carries an interruption through the library. */
    private static final class Stopped extends RuntimeException {
        private final InterruptedException interruption;

        Stopped(InterruptedException interruption) {
            super(null, interruption, false, false);
            this.interruption = interruption;
        }
    }
}
