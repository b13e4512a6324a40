package sill.inference;

import com.sun.source.tree.ExpressionTree;
import com.sun.source.tree.Tree;
import java.util.List;
import java.util.Optional;

/**
 * A call of a method of Java's library.
 *
 * @param owner qualified name of the type that declares the method
 * @param target the expression it is called on; empty for a static method
 * @param receiver that expression's value
 */
record LibraryCall(
        String owner,
        String name,
        Optional<ExpressionTree> target,
        Value receiver,
        List<Operand> arguments,
        Tree tree,
        Environment env) {
    Value argument(int i) {
        return i < arguments.size() ? arguments.get(i).value() : Quantity.UNKNOWN;
    }

    Optional<Behaviour> function(int i) {
        return argument(i) instanceof Behaviour behaviour ? Optional.of(behaviour) : Optional.empty();
    }

    int count() {
        return arguments.size();
    }

    /** What any of the arguments is. */
    Value joined() {
        Value result = Quantity.ANY;
        for (Operand argument : arguments) {
            result = Value.join(result, argument.value());
        }
        return result;
    }
}
