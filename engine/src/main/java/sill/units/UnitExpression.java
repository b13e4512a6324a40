package sill.units;

import java.util.ArrayList;
import java.util.List;

/**
 * A unit as its factors: those before the solidus and those after it, each in the order written.
 *
 * @param top factors of the numerator; none in {@code 1/K}
 * @param bottom factors of the denominator, with the exponents as written there
 */
record UnitExpression(List<Factor> top, List<Factor> bottom) {

    /** A unit symbol with its prefix and exponent. */
    record Factor(Prefix prefix, NamedUnit unit, Rational exponent) {
        Scale scale() {
            return unit.scale().times(Scale.ten(prefix.exponent())).power(exponent);
        }

        Dimension dimension() {
            return unit.dimension().power(exponent);
        }

        Factor power(Rational by) {
            return new Factor(prefix, unit, exponent.times(by));
        }

        String symbol() {
            String plain = prefix.symbol() + unit.symbol();
            if (exponent.equals(Rational.HALF)) {
                return "√" + plain;
            }
            if (exponent.equals(Rational.ONE)) {
                return plain;
            }
            return plain
                    + (exponent.isWhole() ? Superscript.of(exponent.numerator()) : "^(" + exponent.toString() + ")");
        }
    }

    UnitExpression {
        top = List.copyOf(top);
        bottom = List.copyOf(bottom);
    }

    UnitExpression times(UnitExpression other) {
        return new UnitExpression(joined(top, other.top), joined(bottom, other.bottom));
    }

    UnitExpression over(UnitExpression other) {
        return new UnitExpression(joined(top, other.bottom), joined(bottom, other.top));
    }

    UnitExpression power(Rational exponent) {
        return new UnitExpression(powers(top, exponent), powers(bottom, exponent));
    }

    /** The same unit with another prefix on its first factor. */
    UnitExpression withPrefix(Prefix prefix) {
        List<Factor> changed = new ArrayList<>(top);
        Factor first = changed.get(0);
        changed.set(0, new Factor(prefix, first.unit(), first.exponent()));
        return new UnitExpression(changed, bottom);
    }

    String symbol() {
        if (top.isEmpty() && bottom.isEmpty()) {
            return "1";
        }
        String over = top.isEmpty() ? "1" : product(top);
        if (bottom.isEmpty()) {
            return over;
        }
        return over + "/" + (bottom.size() == 1 ? product(bottom) : "(" + product(bottom) + ")");
    }

    Dimension dimension() {
        Dimension dimension = Dimension.NONE;
        for (Factor factor : top) {
            dimension = dimension.times(factor.dimension());
        }
        for (Factor factor : bottom) {
            dimension = dimension.over(factor.dimension());
        }
        return dimension;
    }

    double factor() {
        Scale scale = Scale.ten(0);
        for (Factor factor : top) {
            scale = scale.times(factor.scale());
        }
        for (Factor factor : bottom) {
            scale = scale.times(factor.scale().power(Rational.of(-1)));
        }
        return scale.toDouble();
    }

    /** The zero point; only a unit that stands alone has one other than 0 (a degree in a quotient is a difference). */
    double offset() {
        boolean alone =
                top.size() == 1 && bottom.isEmpty() && top.get(0).exponent().equals(Rational.ONE);
        return alone ? top.get(0).unit().offset() : 0;
    }

    Unit toUnit() {
        return new Unit(symbol(), dimension(), factor(), offset());
    }

    private static String product(List<Factor> factors) {
        return String.join("·", factors.stream().map(Factor::symbol).toList());
    }

    private static List<Factor> joined(List<Factor> first, List<Factor> second) {
        List<Factor> all = new ArrayList<>(first);
        all.addAll(second);
        return all;
    }

    private static List<Factor> powers(List<Factor> factors, Rational exponent) {
        return factors.stream().map(factor -> factor.power(exponent)).toList();
    }
}
