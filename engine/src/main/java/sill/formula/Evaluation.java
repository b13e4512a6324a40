package sill.formula;

import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import sill.formula.Expression.Component;
import sill.formula.Expression.Defined;

/**
 * The value of an expression in which the numbers have been put in. A truth value counts as 1 or 0. All is computed with
 * {@code double}s: for whole numbers that differs from Java where Java overflows, and then the result tells.
 */
final class Evaluation {
    private final Values values;

    private Evaluation(Values values) {
        this.values = values;
    }

    /** The value; empty when something in it is not known. */
    static OptionalDouble of(Expression expression, Values values) {
        try {
            return OptionalDouble.of(new Evaluation(values).value(expression));
        } catch (Unknown e) {
            return OptionalDouble.empty();
        }
    }

    private static final class Unknown extends RuntimeException {
        private static final long serialVersionUID = 1;

        Unknown() {
            super("not known", null, false, false);
        }
    }

    private double value(Expression expression) {
        if (expression instanceof Expression.Literal literal) {
            return literal.value();
        } else if (expression instanceof Expression.Shown shown) {
            return shown.printed().si();
        } else if (expression instanceof Expression.Constant constant) {
            return constant.value();
        } else if (expression instanceof Expression.Negation negation) {
            return -value(negation.of());
        } else if (expression instanceof Expression.Arithmetic arithmetic) {
            return arithmetic(arithmetic);
        } else if (expression instanceof Expression.Function function) {
            return function.function().value(all(function.arguments()));
        } else if (expression instanceof Expression.Choice choice) {
            return value(isTrue(choice.condition()) ? choice.first() : choice.second());
        } else if (expression instanceof Expression.Call call) {
            return values.value(call, all(call.arguments())).orElseThrow(Unknown::new);
        } else if (expression instanceof Defined call) {
            return component(call, "");
        } else if (expression instanceof Component component && component.of() instanceof Defined call) {
            return component(call, component.name());
        }
        return isTrue(expression) ? 1 : 0;
    }

    private boolean isTrue(Expression expression) {
        if (expression instanceof Expression.Truth truth) {
            return truth.value();
        } else if (expression instanceof Expression.Comparison comparison) {
            return comparison(comparison);
        } else if (expression instanceof Expression.Logic logic) {
            return logic.connective() == Expression.Connective.AND
                    ? isTrue(logic.left()) && isTrue(logic.right())
                    : isTrue(logic.left()) || isTrue(logic.right());
        } else if (expression instanceof Expression.Not not) {
            return !isTrue(not.of());
        } else if (expression instanceof Expression.Choice
                || expression instanceof Defined
                || expression instanceof Component) {
            return value(expression) != 0;
        }
        throw new Unknown();
    }

    private List<Double> all(List<Expression> expressions) {
        List<Double> list = new ArrayList<>();
        for (Expression expression : expressions) {
            list.add(value(expression));
        }
        return list;
    }

    private double arithmetic(Expression.Arithmetic arithmetic) {
        double left = value(arithmetic.left());
        double right = value(arithmetic.right());
        return switch (arithmetic.operator()) {
            case PLUS -> left + right;
            case MINUS -> left - right;
            case TIMES -> left * right;
            case OVER -> left / right;
        };
    }

    private boolean comparison(Expression.Comparison comparison) {
        double left = value(comparison.left());
        double right = value(comparison.right());
        return switch (comparison.relation()) {
            case LESS -> left < right;
            case AT_MOST -> left <= right;
            case GREATER -> left > right;
            case AT_LEAST -> left >= right;
            case EQUAL -> left == right;
            case NOT_EQUAL -> left != right;
        };
    }

    private double component(Defined call, String name) {
        for (Expression.Form form : call.forms()) {
            if (form.component().equals(name)) {
                return value(form.body());
            } else if (form.component().isEmpty()) {
                return value(new Component(form.body(), name));
            }
        }
        throw new Unknown();
    }
}
