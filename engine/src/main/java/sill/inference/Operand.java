package sill.inference;

import com.sun.source.tree.ExpressionTree;

/** A value with the expression it comes from. */
record Operand(Value value, ExpressionTree tree) {
    Quantity quantity() {
        return value.quantity();
    }
}
