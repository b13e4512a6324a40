package sill.units;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.concurrent.ConcurrentHashMap;
import sill.units.UnitExpression.Factor;

/**
 * The symbol that a dimension's coherent SI unit is written with. Named units come first, then the compound forms usual in
 * electronics, then the first short quotient or product of named units, at last a product of base units. The same dimension
 * always gives the same symbol.
 */
final class CoherentUnits {
    /** Units of their own, in the order in which compounds are sought; mass counts in kilograms. */
    private static final List<String> NAMED = List.of(
            "V", "A", "Ω", "W", "J", "C", "F", "H", "S", "Hz", "s", "K", "m", "kg", "N", "Pa", "T", "Wb", "mol", "cd",
            "lx", "kat");

    private static final List<String> USUAL = List.of(
            "V/s",
            "A/s",
            "Hz/s",
            "V/√Hz",
            "A/√Hz",
            "V²/Hz",
            "A²/Hz",
            "√Hz",
            "1/√Hz",
            "Hz/V",
            "1/V",
            "1/K",
            "V/K",
            "A/K",
            "Ω/K",
            "F/K",
            "Hz/K",
            "K/W",
            "W/K",
            "J/K",
            "V/m",
            "A/m",
            "Ω·m",
            "Ω/m",
            "S/m",
            "F/m",
            "H/m",
            "m/s",
            "m/s²",
            "1/m",
            "m²",
            "m³",
            "V²",
            "A²",
            "s²",
            "1/s²",
            "Ω²",
            "V/W",
            "A/W",
            "kg/m³",
            "W/m²",
            "W/(m·K)",
            "J/(kg·K)");

    private static final Map<Dimension, String> SYMBOLS = known();

    private CoherentUnits() {}

    static String symbol(Dimension dimension) {
        String known = SYMBOLS.get(dimension);
        if (known == null) {
            known = sought(dimension).symbol();
            SYMBOLS.put(dimension, known);
        }
        return known;
    }

    private static Map<Dimension, String> known() {
        Map<Dimension, String> symbols = new HashMap<>();
        symbols.put(Dimension.NONE, "1");
        for (List<String> list : List.of(NAMED, USUAL)) {
            for (String symbol : list) {
                symbols.putIfAbsent(read(symbol).dimension(), symbol);
            }
        }
        return new ConcurrentHashMap<>(symbols);
    }

    private static UnitExpression sought(Dimension dimension) {
        List<UnitExpression> units = NAMED.stream().map(CoherentUnits::read).toList();
        UnitExpression one = read("1");
        for (int power = 1; power <= 4; power++) {
            for (UnitExpression unit : units) {
                UnitExpression raised = unit.power(Rational.of(power));
                if (raised.dimension().equals(dimension)) {
                    return raised;
                }
                if (one.over(raised).dimension().equals(dimension)) {
                    return one.over(raised);
                }
            }
        }
        for (UnitExpression unit : units) {
            UnitExpression root = unit.power(Rational.HALF);
            if (root.dimension().equals(dimension)) {
                return root;
            }
            if (one.over(root).dimension().equals(dimension)) {
                return one.over(root);
            }
        }
        List<UnitExpression> pairs = new ArrayList<>();
        units.forEach(a -> units.forEach(b -> pairs.add(a.over(b))));
        units.forEach(a -> units.forEach(b -> pairs.add(a.times(b))));
        units.forEach(a -> units.forEach(b -> pairs.add(a.over(b.power(Rational.of(2))))));
        units.forEach(a -> units.forEach(b -> pairs.add(a.power(Rational.of(2)).over(b))));
        units.forEach(a -> units.forEach(b -> pairs.add(a.over(b.power(Rational.HALF)))));
        for (UnitExpression pair : pairs) {
            if (pair.dimension().equals(dimension)) {
                return pair;
            }
        }
        return baseUnits(dimension);
    }

    private static UnitExpression baseUnits(Dimension dimension) {
        List<Factor> top = new ArrayList<>();
        List<Factor> bottom = new ArrayList<>();
        for (BaseUnit base : List.of(
                BaseUnit.KILOGRAM,
                BaseUnit.METRE,
                BaseUnit.SECOND,
                BaseUnit.AMPERE,
                BaseUnit.KELVIN,
                BaseUnit.MOLE,
                BaseUnit.CANDELA)) {
            Rational exponent = dimension.exponent(base);
            Factor factor = read(symbolOf(base)).top().get(0);
            if (exponent.sign() > 0) {
                top.add(factor.power(exponent));
            } else if (exponent.sign() < 0) {
                bottom.add(factor.power(exponent.negated()));
            }
        }
        return new UnitExpression(top, bottom);
    }

    private static String symbolOf(BaseUnit base) {
        return switch (base) {
            case METRE -> "m";
            case KILOGRAM -> "kg";
            case SECOND -> "s";
            case AMPERE -> "A";
            case KELVIN -> "K";
            case MOLE -> "mol";
            case CANDELA -> "cd";
        };
    }

    private static UnitExpression read(String symbol) {
        try {
            return UnitParser.parse(symbol);
        } catch (UnitException e) {
            throw new IllegalStateException("Sill's own unit table: " + e.getMessage(), e);
        }
    }
}
