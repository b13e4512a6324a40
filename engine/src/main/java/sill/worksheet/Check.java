package sill.worksheet;

import sill.units.Unit;

/**
 * One line of a check cell.
 *
 * @param line its line in the worksheet
 * @param text the line's text without the remark
 * @param expression the Java before the requirement
 * @param column the column at which the expression starts
 * @param requirement what the expression must meet
 * @param basis what it is judged on
 * @param remark text after {@code |}, empty when there is none
 */
public record Check(
        int line, String text, String expression, int column, Requirement requirement, Basis basis, String remark) {

    /** The expression without spaces, by which it finds the tolerance cell that studies it. */
    public String key() {
        return key(expression);
    }

    static String key(String expression) {
        return expression.replaceAll("[\\s\\h]+", "");
    }

    /**
     * A limit as written.
     *
     * @param value in coherent SI
     * @param unit as written; symbol {@code 1} when none was
     */
    public record Limit(double value, Unit unit) {}

    /** What a checked expression must meet; limits are inclusive. */
    public sealed interface Requirement {
        /** {@code within A .. B}. */
        record Within(Limit low, Limit high) implements Requirement {}

        /** {@code at least A}. */
        record AtLeast(Limit low) implements Requirement {}

        /** {@code at most A}. */
        record AtMost(Limit high) implements Requirement {}

        /** {@code equals A ± t}; {@code distance} in coherent SI. */
        record EqualTo(Limit value, double distance) implements Requirement {}

        /** {@code holds}: the expression is a boolean. */
        record Holds() implements Requirement {}
    }

    /** What a check is judged on. */
    public sealed interface Basis {
        /** The nominal value. */
        record Nominal() implements Basis {}

        /** The found extremes over tolerance. */
        record WorstCase() implements Basis {}

        /** A share of samples, from 0 to 1. */
        record Share(double share) implements Basis {}
    }
}
