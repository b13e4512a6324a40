package sill.formula;

import java.util.List;

/** The expressions directly inside another. */
final class Parts {
    private Parts() {}

    static List<Expression> of(Expression expression) {
        if (expression instanceof Expression.Negation negation) {
            return List.of(negation.of());
        } else if (expression instanceof Expression.Arithmetic arithmetic) {
            return List.of(arithmetic.left(), arithmetic.right());
        } else if (expression instanceof Expression.Function function) {
            return function.arguments();
        } else if (expression instanceof Expression.Comparison comparison) {
            return List.of(comparison.left(), comparison.right());
        } else if (expression instanceof Expression.Logic logic) {
            return List.of(logic.left(), logic.right());
        } else if (expression instanceof Expression.Not not) {
            return List.of(not.of());
        } else if (expression instanceof Expression.Choice choice) {
            return List.of(choice.condition(), choice.first(), choice.second());
        } else if (expression instanceof Expression.Sum sum) {
            return List.of(sum.term());
        } else if (expression instanceof Expression.Call call) {
            return call.arguments();
        } else if (expression instanceof Expression.Defined call) {
            return call.arguments();
        } else if (expression instanceof Expression.Component component) {
            return List.of(component.of());
        } else if (expression instanceof Expression.Element element) {
            return List.of(element.of(), element.index());
        }
        return List.of();
    }
}
