package sill.units;

import static sill.units.BaseUnit.AMPERE;
import static sill.units.BaseUnit.CANDELA;
import static sill.units.BaseUnit.KELVIN;
import static sill.units.BaseUnit.KILOGRAM;
import static sill.units.BaseUnit.METRE;
import static sill.units.BaseUnit.MOLE;
import static sill.units.BaseUnit.SECOND;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;

/**
 * A unit with a symbol of its own: the SI base units and derived units with special names (SI brochure, 9th edition, tables
 * 2 and 4), the units accepted with the SI that an electronics engineer meets (table 8; the bar from table 8 of the 8th
 * edition), and the fractions {@code %} and {@code ppm}.
 *
 * @param symbol in SI spelling
 * @param spellings other ways to type it
 * @param dimension what it measures
 * @param scale its size in the coherent SI unit
 * @param offset its zero point in the coherent SI unit
 * @param prefixable whether SI prefixes may stand before it
 * @param highestPrefix the highest power of ten of a prefix that a record writes before it
 */
record NamedUnit(
        String symbol,
        List<String> spellings,
        Dimension dimension,
        Scale scale,
        double offset,
        boolean prefixable,
        int highestPrefix) {

    private static final int ANY_PREFIX = 30;
    private static final Dimension LENGTH = Dimension.of(METRE);
    private static final Dimension MASS = Dimension.of(KILOGRAM);
    private static final Dimension TIME = Dimension.of(SECOND);
    private static final Dimension CURRENT = Dimension.of(AMPERE);
    private static final Dimension TEMPERATURE = Dimension.of(KELVIN);
    private static final Dimension AMOUNT = Dimension.of(MOLE);
    private static final Dimension LIGHT = Dimension.of(CANDELA);
    private static final Dimension FREQUENCY = TIME.power(-1);
    private static final Dimension FORCE = MASS.times(LENGTH).over(TIME.power(2));
    private static final Dimension ENERGY = FORCE.times(LENGTH);
    private static final Dimension POWER = ENERGY.over(TIME);
    private static final Dimension CHARGE = CURRENT.times(TIME);
    private static final Dimension VOLTAGE = POWER.over(CURRENT);
    private static final Dimension FLUX = VOLTAGE.times(TIME);

    /** All of them. */
    static final List<NamedUnit> ALL = table();

    private static final Map<String, NamedUnit> BY_SPELLING = bySpelling();

    /** Degree Celsius, the one unit with an offset. */
    static final NamedUnit CELSIUS = find("°C");

    /** The gram: mass is the one dimension whose coherent unit has a prefix. */
    static final NamedUnit GRAM = find("g");

    /** The unit with this spelling, or null. */
    static NamedUnit find(String spelling) {
        return BY_SPELLING.get(spelling);
    }

    private static List<NamedUnit> table() {
        List<NamedUnit> units = new ArrayList<>();
        // Base units. Times and temperatures above 1000 read better without a prefix, lengths and masses above 1000 k.
        units.add(si("m", LENGTH, 3));
        units.add(new NamedUnit("g", List.of(), MASS, Scale.ten(-3), 0, true, 3));
        units.add(si("s", TIME, 0));
        units.add(si("A", CURRENT, ANY_PREFIX));
        units.add(si("K", TEMPERATURE, 0));
        units.add(si("mol", AMOUNT, ANY_PREFIX));
        units.add(si("cd", LIGHT, ANY_PREFIX));
        // Derived units with special names.
        units.add(si("Hz", FREQUENCY, ANY_PREFIX));
        units.add(si("N", FORCE, ANY_PREFIX));
        units.add(si("Pa", FORCE.over(LENGTH.power(2)), ANY_PREFIX));
        units.add(si("J", ENERGY, ANY_PREFIX));
        units.add(si("W", POWER, ANY_PREFIX));
        units.add(si("C", CHARGE, ANY_PREFIX));
        units.add(si("V", VOLTAGE, ANY_PREFIX));
        units.add(si("F", CHARGE.over(VOLTAGE), ANY_PREFIX));
        // The Greek letter is the spelling in text; U+2126 is the compatibility character.
        units.add(si("Ω", VOLTAGE.over(CURRENT), ANY_PREFIX, "\u2126", "ohm", "Ohm"));
        units.add(si("S", CURRENT.over(VOLTAGE), ANY_PREFIX));
        units.add(si("Wb", FLUX, ANY_PREFIX));
        units.add(si("T", FLUX.over(LENGTH.power(2)), ANY_PREFIX));
        units.add(si("H", FLUX.over(CURRENT), ANY_PREFIX));
        units.add(si("lm", LIGHT, ANY_PREFIX));
        units.add(si("lx", LIGHT.over(LENGTH.power(2)), ANY_PREFIX));
        units.add(si("Bq", FREQUENCY, ANY_PREFIX));
        units.add(si("Gy", ENERGY.over(MASS), ANY_PREFIX));
        units.add(si("Sv", ENERGY.over(MASS), ANY_PREFIX));
        units.add(si("kat", AMOUNT.over(TIME), ANY_PREFIX));
        units.add(si("rad", Dimension.NONE, 0));
        units.add(si("sr", Dimension.NONE, 0));
        units.add(new NamedUnit("°C", List.of("\u2103", "degC", "ºC"), TEMPERATURE, Scale.ten(0), 273.15, false, 0));
        // Accepted with the SI.
        units.add(plain("min", TIME, Scale.of(60)));
        units.add(plain("h", TIME, Scale.of(3600)));
        units.add(plain("d", TIME, Scale.of(86400)));
        units.add(plain("°", Dimension.NONE, Scale.of(Math.PI / 180), "deg"));
        units.add(plain("′", Dimension.NONE, Scale.of(Math.PI / 10800), "arcmin"));
        units.add(plain("″", Dimension.NONE, Scale.of(Math.PI / 648000), "arcsec"));
        units.add(new NamedUnit("L", List.of("l"), LENGTH.power(3), Scale.ten(-3), 0, true, 0));
        units.add(plain("t", MASS, Scale.ten(3)));
        units.add(new NamedUnit("bar", List.of(), FORCE.over(LENGTH.power(2)), Scale.ten(5), 0, true, 0));
        // SI brochure, 9th edition, table 1: e = 1.602 176 634 × 10⁻¹⁹ C exactly.
        units.add(new NamedUnit("eV", List.of(), ENERGY, Scale.of(1.602176634e-19), 0, true, ANY_PREFIX));
        // Fractions.
        units.add(plain("%", Dimension.NONE, Scale.ten(-2)));
        units.add(plain("ppm", Dimension.NONE, Scale.ten(-6)));
        return List.copyOf(units);
    }

    private static NamedUnit si(String symbol, Dimension dimension, int highestPrefix, String... spellings) {
        return new NamedUnit(symbol, List.of(spellings), dimension, Scale.ten(0), 0, true, highestPrefix);
    }

    private static NamedUnit plain(String symbol, Dimension dimension, Scale scale, String... spellings) {
        return new NamedUnit(symbol, List.of(spellings), dimension, scale, 0, false, 0);
    }

    private static Map<String, NamedUnit> bySpelling() {
        Map<String, NamedUnit> bySpelling = new HashMap<>();
        for (NamedUnit unit : ALL) {
            bySpelling.put(unit.symbol, unit);
            unit.spellings.forEach(spelling -> bySpelling.put(spelling, unit));
        }
        return bySpelling;
    }
}
