package sill.inference;

import com.sun.source.tree.ExpressionTree;
import com.sun.source.tree.StatementTree;

/** Walks code as if it ran. */
interface Walker {
    /** An expression's value. */
    Value value(ExpressionTree expression, Environment env);

    /**
     * Runs a statement.
     *
     * @return whether what follows it in its block is surely not reached
     */
    boolean run(StatementTree statement, Environment env);

    /** An expression with its value. */
    default Operand operand(ExpressionTree expression, Environment env) {
        return new Operand(value(expression, env), expression);
    }
}
