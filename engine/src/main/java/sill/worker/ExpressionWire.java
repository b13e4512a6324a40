package sill.worker;

import java.util.List;
import sill.formula.Expression;
import sill.formula.Expression.Form;
import sill.formula.Expression.Parameter;
import sill.formula.MathFunction;

/** The formula of a result, as bytes and back. What the record puts in itself, printed numbers, is never sent. */
final class ExpressionWire {
    /** Deeper expressions are no message of ours: what the sheet reads ends far above. */
    private static final int DEEPEST = 200;

    private ExpressionWire() {}

    static void write(WireOut out, Expression expression) {
        if (expression instanceof Expression.Literal literal) {
            out.number(0).text(literal.text()).real(literal.value());
        } else if (expression instanceof Expression.Constant constant) {
            out.number(1).number(constant.ordinal());
        } else if (expression instanceof Expression.Truth truth) {
            out.number(2).flag(truth.value());
        } else if (expression instanceof Expression.Text text) {
            out.number(3).text(text.text());
        } else if (expression instanceof Expression.Name name) {
            out.number(4).text(name.name());
        } else if (expression instanceof Expression.Negation negation) {
            write(out.number(5), negation.of());
        } else if (expression instanceof Expression.Arithmetic arithmetic) {
            out.number(6).number(arithmetic.operator().ordinal());
            write(out, arithmetic.left());
            write(out, arithmetic.right());
        } else if (expression instanceof Expression.Comparison comparison) {
            out.number(7).number(comparison.relation().ordinal());
            write(out, comparison.left());
            write(out, comparison.right());
        } else if (expression instanceof Expression.Logic logic) {
            out.number(8).number(logic.connective().ordinal());
            write(out, logic.left());
            write(out, logic.right());
        } else if (expression instanceof Expression.Not not) {
            write(out.number(9), not.of());
        } else if (expression instanceof Expression.Choice choice) {
            write(out.number(10), choice.condition());
            write(out, choice.first());
            write(out, choice.second());
        } else if (expression instanceof Expression.Function function) {
            out.number(11).number(function.function().ordinal()).list(function.arguments(), ExpressionWire::write);
        } else if (expression instanceof Expression.Sum sum) {
            write(out.number(12).text(sum.over()), sum.term());
        } else if (expression instanceof Expression.Call call) {
            out.number(13).text(call.name()).text(call.qualifier()).list(call.arguments(), ExpressionWire::write);
        } else if (expression instanceof Expression.Defined call) {
            out.number(14).number(call.kind().ordinal()).text(call.name());
            out.list(call.parameters(), ExpressionWire::parameter).list(call.arguments(), ExpressionWire::write);
            out.list(call.forms(), ExpressionWire::form);
        } else if (expression instanceof Expression.Component component) {
            write(out.number(15).text(component.name()), component.of());
        } else if (expression instanceof Expression.Element element) {
            write(out.number(16), element.of());
            write(out, element.index());
        } else {
            throw new IllegalArgumentException("a formula must be without printed numbers, got " + expression);
        }
    }

    private static void parameter(WireOut out, Parameter parameter) {
        out.text(parameter.name()).text(parameter.unit()).flag(parameter.several());
    }

    private static void form(WireOut out, Form form) {
        write(out.text(form.component()).text(form.unit()), form.body());
    }

    static Expression read(WireIn in) {
        return read(in, 0);
    }

    private static Expression read(WireIn in, int depth) {
        if (depth > DEEPEST) {
            throw new WireIn.BadMessage("a formula is nested deeper than " + DEEPEST);
        }
        int next = depth + 1;
        int kind = in.number();
        return switch (kind) {
            case 0 -> new Expression.Literal(in.text(), in.real());
            case 1 -> in.constant(Expression.Constant.values());
            case 2 -> new Expression.Truth(in.flag());
            case 3 -> new Expression.Text(in.text());
            case 4 -> new Expression.Name(in.text());
            case 5 -> new Expression.Negation(read(in, next));
            case 6 ->
                new Expression.Arithmetic(in.constant(Expression.Operator.values()), read(in, next), read(in, next));
            case 7 ->
                new Expression.Comparison(in.constant(Expression.Relation.values()), read(in, next), read(in, next));
            case 8 -> new Expression.Logic(in.constant(Expression.Connective.values()), read(in, next), read(in, next));
            case 9 -> new Expression.Not(read(in, next));
            case 10 -> new Expression.Choice(read(in, next), read(in, next), read(in, next), Expression.Applies.OPEN);
            case 11 -> new Expression.Function(in.constant(MathFunction.values()), all(in, next));
            case 12 -> sum(in.text(), read(in, next));
            case 13 -> new Expression.Call(in.text(), in.text(), all(in, next));
            case 14 ->
                new Expression.Defined(
                        in.constant(Expression.Kind.values()),
                        in.text(),
                        in.list(each -> new Parameter(each.text(), each.text(), each.flag())),
                        all(in, next),
                        in.list(each -> form(each.text(), each.text(), read(each, next))));
            case 15 -> component(in.text(), read(in, next));
            case 16 -> new Expression.Element(read(in, next), read(in, next));
            default -> throw new WireIn.BadMessage("there is no kind of formula " + kind);
        };
    }

    private static List<Expression> all(WireIn in, int depth) {
        return in.list(each -> read(each, depth));
    }

    private static Expression sum(String over, Expression term) {
        return new Expression.Sum(term, over);
    }

    private static Expression component(String name, Expression of) {
        return new Expression.Component(of, name);
    }

    private static Form form(String component, String unit, Expression body) {
        return new Form(component, body, unit);
    }
}
