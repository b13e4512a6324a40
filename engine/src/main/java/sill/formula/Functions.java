package sill.formula;

import java.util.List;
import sill.formula.Box.Style;
import sill.formula.Box.Token;
import sill.formula.Expression.Arithmetic;
import sill.formula.Expression.Function;
import sill.formula.Expression.Literal;
import sill.formula.Expression.Operator;
import sill.formula.Layout.Binding;
import sill.formula.Layout.Laid;

/** Lays functions out: those of mathematics by their own signs, the others by their names. */
final class Functions {
    /** A wider exponent of e is written behind {@code exp}. */
    private static final int WIDEST_EXPONENT = 9;

    private static final Literal ONE = new Literal("1", 1);
    private static final Literal TWO = new Literal("2", 2);
    private static final Literal STRAIGHT = new Literal("180", 180);

    private Functions() {}

    static Laid laid(Layout layout, Function function) {
        List<Expression> arguments = function.arguments();
        Expression first = arguments.get(0);
        return switch (function.function()) {
            case SQRT -> new Laid(new Box.Root(layout.laid(first).box(), ""), Binding.ATOM);
            case CBRT -> new Laid(new Box.Root(layout.laid(first).box(), "3"), Binding.ATOM);
            case HYPOT -> layout.laid(new Function(MathFunction.SQRT, List.of(squares(first, arguments.get(1)))));
            case POW ->
                raised(
                        layout.atLeast(first, Binding.ATOM),
                        layout.laid(arguments.get(1)).box());
            case EXP -> exponential(layout, function);
            case EXPM1 -> layout.laid(new Arithmetic(Operator.MINUS, new Function(MathFunction.EXP, arguments), ONE));
            case LOG1P ->
                layout.laid(new Function(MathFunction.LOG, List.of(new Arithmetic(Operator.PLUS, ONE, first))));
            case ABS -> fenced(layout, "|", first, "|");
            case FLOOR -> fenced(layout, "⌊", first, "⌋");
            case CEIL -> fenced(layout, "⌈", first, "⌉");
            case TO_RADIANS -> layout.laid(scaled(first, Expression.Constant.PI, STRAIGHT));
            case TO_DEGREES -> layout.laid(scaled(first, STRAIGHT, Expression.Constant.PI));
            default -> named(layout, function);
        };
    }

    private static Expression squares(Expression a, Expression b) {
        return new Arithmetic(
                Operator.PLUS,
                new Function(MathFunction.POW, List.of(a, TWO)),
                new Function(MathFunction.POW, List.of(b, TWO)));
    }

    private static Expression scaled(Expression angle, Expression top, Expression bottom) {
        return new Arithmetic(Operator.TIMES, angle, new Arithmetic(Operator.OVER, top, bottom));
    }

    private static Laid exponential(Layout layout, Function function) {
        Box exponent = layout.laid(function.arguments().get(0)).box();
        return exponent.width() <= WIDEST_EXPONENT
                ? raised(new Token(Style.UPRIGHT, "e"), exponent)
                : named(layout, function);
    }

    private static Laid raised(Box base, Box exponent) {
        return new Laid(new Box.Raised(base, exponent), Binding.POWER);
    }

    private static Laid fenced(Layout layout, String opening, Expression inner, String closing) {
        return new Laid(Layout.bracketed(opening, layout.laid(inner).box(), closing), Binding.ATOM);
    }

    private static Laid named(Layout layout, Function function) {
        Token name = new Token(Style.UPRIGHT, function.function().printed());
        return new Laid(layout.applied(name, function.arguments()), Binding.POWER);
    }
}
