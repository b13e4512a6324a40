package sill.units;

import java.util.List;
import sill.words.Quoted;

/**
 * Reads unit symbols by recursive descent.
 *
 * <pre>
 * quotient = product ["/" operand]          operand = power | root | "(" quotient ")"
 * product  = operand {("·" | "*" | " ") operand}
 * root     = "√" atom | "sqrt(" quotient ")"
 * power    = atom ["^" exponent | raised digits]
 * atom     = symbol | "(" quotient ")" | "1" before "/"
 * </pre>
 */
final class UnitParser {
    /** No real unit is longer; the bound also keeps the recursion shallow. */
    private static final int LONGEST = 100;

    /** No real exponent is larger. */
    private static final int HIGHEST_EXPONENT = 99;

    private static final String A_UNIT = "a unit such as V, kΩ, µF or ppm/K";
    private static final String PRODUCT_SIGNS = "·*⋅∙•";

    private final String text;
    private int at;

    private UnitParser(String text) {
        this.text = text;
    }

    static UnitExpression parse(String text) throws UnitException {
        if (text.length() > LONGEST) {
            throw new UnitException(
                    0, Quoted.of(text), "a unit of at most " + LONGEST + " characters", "Is a '|' missing before it?");
        }
        UnitParser parser = new UnitParser(text);
        try {
            return parser.whole();
        } catch (ArithmeticException e) {
            throw outOfRange(text);
        }
    }

    private UnitExpression whole() throws UnitException {
        if (text.isEmpty()) {
            throw new UnitException(0, "nothing", A_UNIT, "");
        }
        UnitExpression unit = quotient();
        if (at < text.length()) {
            throw unexpected();
        }
        double factor = unit.factor();
        if (!(factor > 0 && factor <= Double.MAX_VALUE)) {
            throw outOfRange(text);
        }
        return unit;
    }

    private UnitExpression quotient() throws UnitException {
        UnitExpression top = product();
        if (!peek('/')) {
            return top;
        }
        at++;
        skipSpace();
        UnitExpression quotient = top.over(operand());
        skipSpace();
        if (peek('/') || isProductSign() || startsOperand()) {
            // SI brochure, 9th edition, 5.2: after a solidus no second one and no product without brackets.
            throw new UnitException(
                    at,
                    Quoted.of(text.substring(at)),
                    "one factor after '/'",
                    "Put the whole denominator in brackets, such as 'W/(m·K)'.");
        }
        return quotient;
    }

    private UnitExpression product() throws UnitException {
        int start = at;
        if (peek('1') && (at + 1 == text.length() || "/ )".indexOf(text.charAt(at + 1)) >= 0)) {
            at++;
            skipSpace();
            if (at < text.length() && !peek('/') && !peek(')')) {
                at = start;
                throw unexpected();
            }
            return new UnitExpression(List.of(), List.of());
        }
        UnitExpression product = operand();
        while (true) {
            int end = at;
            skipSpace();
            if (isProductSign()) {
                at++;
                skipSpace();
                product = product.times(operand());
            } else if (at > end && startsOperand()) {
                product = product.times(operand());
            } else {
                return product;
            }
        }
    }

    private UnitExpression operand() throws UnitException {
        if (peek('√')) {
            at++;
            return atom().power(Rational.HALF);
        }
        if (text.startsWith("sqrt", at)) {
            int bracket = at + "sqrt".length();
            if (bracket < text.length() && text.charAt(bracket) == '(') {
                at = bracket;
                return atom().power(Rational.HALF);
            }
        }
        UnitExpression atom = atom();
        if (peek('^')) {
            at++;
            return atom.power(exponent());
        }
        return at < text.length() && isRaised(text.charAt(at)) ? atom.power(raisedExponent()) : atom;
    }

    private UnitExpression atom() throws UnitException {
        if (peek('(')) {
            int open = at++;
            skipSpace();
            UnitExpression inside = quotient();
            skipSpace();
            if (!peek(')')) {
                throw at < text.length()
                        ? unexpected()
                        : new UnitException(open, "'(' without its ')'", "both brackets", "");
            }
            at++;
            return inside;
        }
        int start = at;
        while (at < text.length() && isSymbolPart(text.charAt(at))) {
            at++;
        }
        if (at == start) {
            throw unexpected();
        }
        return UnitSymbols.resolve(text.substring(start, at), start);
    }

    private Rational exponent() throws UnitException {
        if (!peek('(')) {
            return Rational.of(wholeExponent());
        }
        at++;
        int numerator = wholeExponent();
        int denominator = 1;
        if (peek('/')) {
            at++;
            denominator = wholeExponent();
        }
        if (!peek(')') || denominator < 1) {
            throw badExponent(at);
        }
        at++;
        return new Rational(numerator, denominator);
    }

    private int wholeExponent() throws UnitException {
        int start = at;
        boolean negative = peek('-') || peek('−');
        if (negative || peek('+')) {
            at++;
        }
        int number = 0;
        int digits = at;
        while (at < text.length() && text.charAt(at) >= '0' && text.charAt(at) <= '9') {
            number = Math.min(1000, number * 10 + text.charAt(at) - '0');
            at++;
        }
        return checked(negative ? -number : number, start, at > digits);
    }

    private Rational raisedExponent() throws UnitException {
        int start = at;
        boolean negative = peek('⁻');
        if (Superscript.isSign(text.charAt(at))) {
            at++;
        }
        int number = 0;
        int digits = at;
        while (at < text.length() && Superscript.digit(text.charAt(at)) >= 0) {
            number = Math.min(1000, number * 10 + Superscript.digit(text.charAt(at)));
            at++;
        }
        return Rational.of(checked(negative ? -number : number, start, at > digits));
    }

    private int checked(int exponent, int start, boolean hasDigits) throws UnitException {
        if (!hasDigits || exponent == 0 || Math.abs(exponent) > HIGHEST_EXPONENT) {
            throw badExponent(start);
        }
        return exponent;
    }

    private UnitException badExponent(int start) {
        return new UnitException(
                start,
                start < text.length() ? Quoted.of(text.substring(start)) : "the end",
                "an exponent from 1 to " + HIGHEST_EXPONENT + ", positive or negative",
                "Write powers as 'm²', 'm^2' or 's^-1' and roots as '√Hz' or 'sqrt(Hz)'.");
    }

    private UnitException unexpected() {
        String found = at < text.length() ? Quoted.of(text.substring(at)) : "the end after " + Quoted.of(text);
        return new UnitException(at, found, A_UNIT, "");
    }

    private static UnitException outOfRange(String text) {
        return new UnitException(0, Quoted.of(text), "a unit of a size that a double can hold", "");
    }

    private boolean startsOperand() {
        return at < text.length()
                && (text.charAt(at) == '(' || text.charAt(at) == '√' || isSymbolPart(text.charAt(at)));
    }

    private static boolean isSymbolPart(char c) {
        return !isSpace(c) && PRODUCT_SIGNS.indexOf(c) < 0 && "/()^√".indexOf(c) < 0 && !isRaised(c);
    }

    private static boolean isRaised(char c) {
        return Superscript.digit(c) >= 0 || Superscript.isSign(c);
    }

    private boolean isProductSign() {
        return at < text.length() && PRODUCT_SIGNS.indexOf(text.charAt(at)) >= 0;
    }

    private boolean peek(char c) {
        return at < text.length() && text.charAt(at) == c;
    }

    private void skipSpace() {
        while (at < text.length() && isSpace(text.charAt(at))) {
            at++;
        }
    }

    private static boolean isSpace(char c) {
        return c == '\t' || Character.isSpaceChar(c);
    }
}
