package sill.inference;

import com.sun.source.tree.ExpressionTree;

/**
 * Code as a value: a lambda or a method reference. It is inferred anew for the arguments of each use.
 *
 * @param code a lambda expression or a member reference
 * @param captured what it sees of the variables around it
 * @param receiver what a reference such as {@code spline::value} is bound to; unknown where it is not
 */
record Behaviour(ExpressionTree code, Environment captured, Value receiver) implements Value {
    @Override
    public boolean equals(Object other) {
        return other instanceof Behaviour that && code == that.code && captured == that.captured;
    }

    @Override
    public int hashCode() {
        return System.identityHashCode(code);
    }
}
