package sill.formula;

import java.math.BigDecimal;
import sill.formula.Box.Row;
import sill.formula.Box.Style;
import sill.formula.Box.Token;
import sill.units.PrintedQuantity;
import sill.units.Superscript;

/** Boxes of what has no parts: symbols, numbers, quantities. */
final class Glyphs {
    private static final String SPACE = "\u00A0";

    private Glyphs() {}

    /** A name as a symbol. */
    static Box symbol(String name) {
        Symbol symbol = Symbol.of(name);
        Token base = new Token(symbol.isWord() ? Style.WORD : Style.LETTER, symbol.base(), name);
        return symbol.index().isEmpty() ? base : new Box.Lowered(base, index(symbol.index()));
    }

    /** An index that describes: digits, or an upright word. */
    static Token index(String text) {
        boolean digits = text.chars().allMatch(c -> c >= '0' && c <= '9');
        return new Token(digits ? Style.NUMBER : Style.UPRIGHT, text);
    }

    /** A symbol or call with one more index. */
    static Box lowered(Box base, Box index) {
        if (base instanceof Box.Lowered lowered) {
            return new Box.Lowered(lowered.base(), Row.of(lowered.index(), new Token(Style.COMMA, ","), index));
        }
        return new Box.Lowered(base instanceof Row row ? row.grouped() : base, index);
    }

    static Box quantity(PrintedQuantity quantity) {
        if (quantity.mantissa().isEmpty() || !Double.isFinite(quantity.si())) {
            return new Token(Style.TEXT, quantity.text());
        }
        boolean negative = quantity.isNegative();
        Box number = number(negative ? quantity.mantissa().substring(1) : quantity.mantissa(), quantity.power());
        Row row = negative ? Row.of(new Token(Style.BEFORE, "−"), number) : Row.of(number);
        String unit = quantity.unit();
        if (unit.isEmpty()) {
            return row;
        }
        boolean close = quantity.text().endsWith(unit) && !quantity.text().endsWith(SPACE + unit);
        return Row.of(row, new Token(Style.TEXT, close ? unit : SPACE + unit));
    }

    /** A number as it is typed in Java. */
    static Box literal(Expression.Literal literal) {
        String text = literal.text().replace("_", "");
        int exponent = Math.max(text.indexOf('e'), text.indexOf('E'));
        String mantissa = exponent < 0 ? text : text.substring(0, exponent);
        if (!isPlain(mantissa)) {
            // Hexadecimal and the like.
            return new Token(
                    Style.NUMBER,
                    BigDecimal.valueOf(literal.value()).stripTrailingZeros().toPlainString());
        }
        mantissa = mantissa.endsWith(".") ? mantissa.substring(0, mantissa.length() - 1) : mantissa;
        mantissa = mantissa.startsWith(".") ? "0" + mantissa : mantissa;
        return number(mantissa, exponent < 0 ? 0 : Integer.parseInt(text.substring(exponent + 1)));
    }

    /** Whether a typed number is written with a power of ten. */
    static boolean hasPower(Box box) {
        return box instanceof Row row && row.boxes().size() > 1;
    }

    private static boolean isPlain(String digits) {
        return !digits.isEmpty() && digits.chars().allMatch(c -> c >= '0' && c <= '9' || c == '.');
    }

    private static Box number(String mantissa, int power) {
        Token digits = new Token(Style.NUMBER, mantissa);
        if (power == 0) {
            return digits;
        }
        return Row.of(digits, new Token(Style.BETWEEN, "×"), new Token(Style.NUMBER, "10" + Superscript.of(power)));
    }
}
