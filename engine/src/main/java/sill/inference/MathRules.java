package sill.inference;

import com.sun.source.tree.Tree;
import java.util.List;
import java.util.Set;
import sill.units.Dimension;
import sill.units.Rational;

/** The functions of {@code Math}, {@code StrictMath} and Commons Math's {@code FastMath}, by their mathematics. */
final class MathRules {
    private static final Set<String> OWNERS =
            Set.of("java.lang.Math", "java.lang.StrictMath", "org.apache.commons.math3.util.FastMath");

    private final Rules rules;
    private final Constants constants;

    MathRules(Rules rules, Constants constants) {
        this.rules = rules;
        this.constants = constants;
    }

    static boolean own(String owner) {
        return OWNERS.contains(owner);
    }

    Quantity call(String name, List<Operand> arguments, Tree call) {
        if (arguments.isEmpty()) {
            return Quantity.NUMBER;
        }
        Operand first = arguments.get(0);
        Quantity x = first.quantity();
        return switch (name) {
            case "sqrt" -> x.power(Rational.HALF);
            case "cbrt" -> x.power(new Rational(1, 3));
            case "abs",
                    "ceil",
                    "floor",
                    "rint",
                    "round",
                    "ulp",
                    "nextUp",
                    "nextDown",
                    "nextAfter",
                    "copySign",
                    "scalb",
                    "negateExact",
                    "toIntExact",
                    "absExact" -> x;
            case "exp",
                    "expm1",
                    "log10",
                    "log1p",
                    "sin",
                    "cos",
                    "tan",
                    "asin",
                    "acos",
                    "atan",
                    "sinh",
                    "cosh",
                    "tanh",
                    "asinh",
                    "acosh",
                    "atanh",
                    "toRadians",
                    "toDegrees" -> rules.pure(name, first);
            case "log" -> logarithm(arguments);
            case "signum" -> pureLike(x);
            case "max", "min", "hypot", "IEEEremainder", "floorMod", "addExact", "subtractExact", "clamp" ->
                rules.alike(name, arguments, call);
            case "atan2" -> pureLike(rules.alike(name, arguments, call));
            case "pow" -> power(first, arguments.get(1));
            case "fma" -> fma(arguments, call);
            case "multiplyExact", "multiplyFull" -> x.times(arguments.get(1).quantity());
            case "floorDiv" -> x.over(arguments.get(1).quantity());
            default -> Quantity.UNKNOWN;
        };
    }

    private Quantity logarithm(List<Operand> arguments) {
        Quantity result = Quantity.LITERAL;
        for (Operand argument : arguments) {
            result = rules.pure("log", argument);
        }
        return result;
    }

    private Quantity power(Operand base, Operand exponent) {
        Quantity x = base.quantity();
        Quantity n = rules.pure("pow", exponent);
        if (n.kind() == Quantity.Kind.UNKNOWN && !exponent.value().equals(Quantity.UNKNOWN)) {
            return Quantity.UNKNOWN;
        } else if (x.isMadeOfNumbers() && n.isMadeOfNumbers()) {
            return x.join(n);
        } else if (x.isPure()) {
            return Quantity.of(x.dimension());
        }
        return constants.fraction(exponent.tree()).map(x::power).orElse(Quantity.UNKNOWN);
    }

    private Quantity fma(List<Operand> arguments, Tree call) {
        Operand factor = arguments.get(0);
        Operand product = new Operand(factor.quantity().times(arguments.get(1).quantity()), factor.tree());
        Operand added = arguments.get(2);
        if (product.quantity().fits(added.quantity())) {
            return rules.alike(product, added, Rules.Pairing.ADD, 0);
        }
        rules.unfit(
                added,
                product.quantity().dimension(),
                "fma expects " + product.quantity().said() + " as argument 3, found " + rules.said(added),
                "");
        return Quantity.UNKNOWN;
    }

    /** A pure number, known as well as another value is. */
    private static Quantity pureLike(Quantity x) {
        if (x.kind() == Quantity.Kind.UNKNOWN || x.kind() == Quantity.Kind.ANY || x.isMadeOfNumbers()) {
            return x;
        }
        return Quantity.of(Dimension.NONE);
    }
}
