package sill.formula;

import java.util.ArrayList;
import java.util.List;
import sill.formula.Box.Row;
import sill.formula.Box.Style;
import sill.formula.Box.Token;
import sill.formula.Expression.Arithmetic;
import sill.formula.Expression.Operator;

/**
 * Lays an expression out by the rules of ISO 80000-2: a half-high dot between symbols, a cross between numbers, a bar for a
 * quotient, brackets only where the order of operations asks for them.
 */
final class Layout {
    /** A wider quotient is written with a solidus: a bar can't break at the end of a line. */
    private static final int WIDEST_BAR = 60;

    private static final Token MINUS = new Token(Style.BEFORE, "−");

    /** How tightly the outermost operation binds, from the loosest. */
    enum Binding {
        CHOICE,
        OR,
        AND,
        RELATION,
        SUM,
        PRODUCT,
        /** Whole, but to be raised to a power only in brackets: a quotient, a power, a number with its unit. */
        POWER,
        ATOM
    }

    record Laid(Box box, Binding binding) {}

    /** The sign of multiplication. */
    private final Token times;

    private Layout(boolean numbers) {
        times = new Token(Style.BETWEEN, numbers ? "×" : "⋅");
    }

    /** One side of an equation: a statement stands in brackets there, lest its sign be taken for the equation's. */
    static Box side(Expression expression) {
        Box box = new Layout(hasNumbers(expression)).laid(expression).box();
        boolean statement = expression instanceof Expression.Comparison
                || expression instanceof Expression.Logic
                || expression instanceof Expression.Not;
        return statement ? bracketed(box) : box;
    }

    private static boolean hasNumbers(Expression expression) {
        if (expression instanceof Expression.Shown) {
            return true;
        }
        for (Expression part : Parts.of(expression)) {
            if (hasNumbers(part)) {
                return true;
            }
        }
        return false;
    }

    Laid laid(Expression expression) {
        if (expression instanceof Expression.Literal literal) {
            Box box = Glyphs.literal(literal);
            return new Laid(box, Glyphs.hasPower(box) ? Binding.PRODUCT : Binding.ATOM);
        } else if (expression instanceof Expression.Shown shown) {
            return shown(shown);
        } else if (expression instanceof Expression.Constant constant) {
            return new Laid(new Token(Style.UPRIGHT, constant.letter()), Binding.ATOM);
        } else if (expression instanceof Expression.Truth truth) {
            return new Laid(new Token(Style.TEXT, String.valueOf(truth.value())), Binding.ATOM);
        } else if (expression instanceof Expression.Text text) {
            return new Laid(new Token(Style.TEXT, "“" + text.text() + "”"), Binding.ATOM);
        } else if (expression instanceof Expression.Name name) {
            return new Laid(Glyphs.symbol(name.name()), Binding.ATOM);
        } else if (expression instanceof Expression.Negation negation) {
            return new Laid(Row.of(MINUS, atLeast(negation.of(), Binding.PRODUCT)), Binding.SUM);
        } else if (expression instanceof Arithmetic arithmetic) {
            return arithmetic(arithmetic);
        } else if (expression instanceof Expression.Function function) {
            return Functions.laid(this, function);
        } else if (expression instanceof Expression.Component component) {
            Box of = laid(component.of()).box();
            return new Laid(Glyphs.lowered(of, Glyphs.index(component.name())), Binding.ATOM);
        } else if (expression instanceof Expression.Element element) {
            Box of = laid(element.of()).box();
            return new Laid(Glyphs.lowered(of, laid(element.index()).box()), Binding.ATOM);
        } else if (expression instanceof Expression.Call call) {
            Token name = new Token(Style.UPRIGHT, call.name());
            Box called = call.qualifier().isEmpty()
                    ? name
                    : new Box.Lowered(name, new Token(Style.UPRIGHT, call.qualifier()));
            return new Laid(applied(called, call.arguments()), Binding.POWER);
        } else if (expression instanceof Expression.Defined call) {
            return new Laid(applied(new Token(Style.UPRIGHT, call.name()), call.arguments()), Binding.POWER);
        } else if (expression instanceof Expression.Sum sum) {
            Box term = atLeast(sum.term(), Binding.PRODUCT);
            return new Laid(Row.of(new Token(Style.BEFORE, "∑"), term), Binding.PRODUCT);
        }
        return statement(expression);
    }

    private Laid statement(Expression expression) {
        if (expression instanceof Expression.Comparison comparison) {
            Token sign = new Token(Style.BETWEEN, comparison.relation().sign());
            return new Laid(
                    Row.of(atLeast(comparison.left(), Binding.SUM), sign, atLeast(comparison.right(), Binding.SUM)),
                    Binding.RELATION);
        } else if (expression instanceof Expression.Logic logic) {
            boolean and = logic.connective() == Expression.Connective.AND;
            Binding binding = and ? Binding.AND : Binding.OR;
            Token sign = new Token(Style.BETWEEN, and ? "∧" : "∨");
            return new Laid(Row.of(atLeast(logic.left(), binding), sign, atLeast(logic.right(), binding)), binding);
        } else if (expression instanceof Expression.Not not) {
            return new Laid(Row.of(new Token(Style.BEFORE, "¬"), atLeast(not.of(), Binding.POWER)), Binding.RELATION);
        } else if (expression instanceof Expression.Choice choice) {
            return new Laid(cases(choice), Binding.CHOICE);
        }
        throw new IllegalArgumentException("an expression must be of a known kind, got " + expression.getClass());
    }

    private static Laid shown(Expression.Shown shown) {
        Binding binding = shown.printed().isNegative()
                ? Binding.SUM
                : shown.printed().power() != 0
                        ? Binding.PRODUCT
                        : shown.printed().unit().isEmpty() ? Binding.ATOM : Binding.POWER;
        return new Laid(Glyphs.quantity(shown.printed()), binding);
    }

    private Laid arithmetic(Arithmetic arithmetic) {
        Expression left = arithmetic.left();
        Expression right = arithmetic.right();
        boolean sum = arithmetic.operator() == Operator.PLUS || arithmetic.operator() == Operator.MINUS;
        if (sum) {
            Token sign = new Token(Style.BETWEEN, arithmetic.operator() == Operator.PLUS ? "+" : "−");
            return new Laid(Row.of(atLeast(left, Binding.SUM), sign, atLeast(right, Binding.PRODUCT)), Binding.SUM);
        } else if (left instanceof Expression.Negation negation) {
            // A minus sign in front of a product is that of the whole.
            return laid(new Expression.Negation(new Arithmetic(arithmetic.operator(), negation.of(), right)));
        } else if (arithmetic.operator() == Operator.TIMES) {
            return new Laid(
                    Row.of(atLeast(left, Binding.PRODUCT), times(left, right), atLeast(right, Binding.PRODUCT)),
                    Binding.PRODUCT);
        }
        return quotient(left, right);
    }

    private Token times(Expression left, Expression right) {
        boolean digits = left instanceof Expression.Literal && right instanceof Expression.Literal;
        return digits ? new Token(Style.BETWEEN, "×") : times;
    }

    /** A quotient; one by one quotient after another is one by the product of their divisors. */
    private Laid quotient(Expression dividend, Expression divisor) {
        if (dividend instanceof Arithmetic inner && inner.operator() == Operator.OVER) {
            return quotient(inner.left(), new Arithmetic(Operator.TIMES, inner.right(), divisor));
        }
        Box bar = new Box.Fraction(laid(dividend).box(), laid(divisor).box());
        if (bar.width() <= WIDEST_BAR) {
            return new Laid(bar, Binding.POWER);
        }
        Box solidus = Row.of(
                atLeast(dividend, Binding.PRODUCT), new Token(Style.BETWEEN, "/"), atLeast(divisor, Binding.POWER));
        return new Laid(solidus, Binding.PRODUCT);
    }

    private Box cases(Expression.Choice choice) {
        List<List<Box>> rows = new ArrayList<>();
        Expression rest = choice;
        boolean known = true;
        while (rest instanceof Expression.Choice next) {
            Box condition = Row.of(
                    new Token(Style.TEXT, (rows.isEmpty() ? "if" : "else if") + "\u00A0"),
                    laid(next.condition()).box());
            boolean applies = known && next.applies() == Expression.Applies.FIRST;
            rows.add(row(laid(next.first()).box(), condition, applies));
            known &= next.applies() == Expression.Applies.SECOND;
            rest = next.second();
        }
        rows.add(row(laid(rest).box(), new Token(Style.TEXT, "otherwise"), known));
        return new Box.Cases(rows);
    }

    private static List<Box> row(Box value, Box condition, boolean applies) {
        return applies ? List.of(value, condition, new Token(Style.TEXT, "applies")) : List.of(value, condition);
    }

    /** A part that binds at least so tightly, else in brackets. */
    Box atLeast(Expression part, Binding binding) {
        Laid laid = laid(part);
        return laid.binding().compareTo(binding) < 0 ? bracketed(laid.box()) : laid.box();
    }

    Box applied(Box name, List<Expression> arguments) {
        List<Box> list = new ArrayList<>();
        list.add(new Token(Style.OPENING, "("));
        for (Expression argument : arguments) {
            if (list.size() > 1) {
                list.add(new Token(Style.COMMA, ","));
            }
            list.add(laid(argument).box());
        }
        list.add(new Token(Style.CLOSING, ")"));
        Row brackets = Row.of(list.toArray(Box[]::new)).grouped();
        return Row.of(name, new Token(Style.APPLICATION, "\u2061"), brackets);
    }

    static Box bracketed(Box inner) {
        return bracketed("(", inner, ")");
    }

    static Box bracketed(String opening, Box inner, String closing) {
        return Row.of(new Token(Style.OPENING, opening), inner, new Token(Style.CLOSING, closing))
                .grouped();
    }
}
