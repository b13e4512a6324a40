package sill.formula;

import java.util.ArrayList;
import java.util.List;
import sill.formula.Expression.Arithmetic;
import sill.formula.Expression.Operator;

/**
 * Reads the form that a helper states, by recursive descent.
 *
 * <pre>
 * sum     = product {("+" | "-") product}       operand = "-" operand | number | name | "(" sum ")"
 * product = operand {("*" | "/") operand}                | function "(" sum {"," sum} ")"
 * </pre>
 */
public final class FormulaText {
    private final String text;
    private final String several;
    private int at;

    private FormulaText(String text, String several) {
        this.text = text;
        this.several = several;
    }

    /**
     * A form.
     *
     * @param text as in {@code "vIn * rBottom / (rTop + rBottom)"}
     * @param several the parameter that takes any number of values, over which {@code sum(…)} adds up; empty for none
     * @throws IllegalArgumentException when it is no form
     */
    public static Expression parse(String text, String several) {
        FormulaText parser = new FormulaText(text, several);
        Expression expression = parser.sum();
        if (parser.at < text.length()) {
            throw parser.unreadable("an operator or the end");
        }
        return expression;
    }

    private Expression sum() {
        Expression left = product();
        while (true) {
            if (skip('+')) {
                left = new Arithmetic(Operator.PLUS, left, product());
            } else if (skip('-')) {
                left = new Arithmetic(Operator.MINUS, left, product());
            } else {
                return left;
            }
        }
    }

    private Expression product() {
        Expression left = operand();
        while (true) {
            if (skip('*')) {
                left = new Arithmetic(Operator.TIMES, left, operand());
            } else if (skip('/')) {
                left = new Arithmetic(Operator.OVER, left, operand());
            } else {
                return left;
            }
        }
    }

    private Expression operand() {
        if (skip('-')) {
            return new Expression.Negation(operand());
        }
        if (skip('(')) {
            Expression inner = sum();
            expect(')');
            return inner;
        }
        int start = at;
        while (at < text.length() && (Character.isLetterOrDigit(text.charAt(at)) || text.charAt(at) == '.')) {
            at++;
        }
        String word = text.substring(start, at);
        skipSpace();
        if (word.isEmpty()) {
            throw unreadable("a number, a name or '('");
        }
        if (Character.isDigit(word.charAt(0))) {
            return new Expression.Literal(word, Double.parseDouble(word));
        }
        if (skip('(')) {
            return call(word);
        }
        return word.equals("PI") ? Expression.Constant.PI : new Expression.Name(word);
    }

    private Expression call(String name) {
        List<Expression> arguments = new ArrayList<>();
        do {
            arguments.add(sum());
        } while (skip(','));
        expect(')');
        if (name.equals("sum") && arguments.size() == 1 && !several.isEmpty()) {
            return new Expression.Sum(arguments.get(0), several);
        }
        return MathFunction.named(name, arguments.size())
                .map(function -> new Expression.Function(function, arguments))
                .orElseThrow(() -> unreadable("a function before"));
    }

    private boolean skip(char token) {
        if (at < text.length() && text.charAt(at) == token) {
            at++;
            skipSpace();
            return true;
        }
        return false;
    }

    private void skipSpace() {
        while (at < text.length() && text.charAt(at) == ' ') {
            at++;
        }
    }

    private void expect(char token) {
        if (!skip(token)) {
            throw unreadable("'" + token + "'");
        }
    }

    private IllegalArgumentException unreadable(String expected) {
        return new IllegalArgumentException(
                "a form must be arithmetic, expected " + expected + " at character " + (at + 1) + " of: " + text);
    }
}
