package sill.stdlib;

import java.util.HashMap;
import java.util.Map;

/** Evaluates the arithmetic that {@link Formula} allows; a value is an array for a parameter that takes any number. */
final class FormulaEvaluator {
    private final String text;
    private final Map<String, double[]> names;
    private int at;

    private FormulaEvaluator(String text, Map<String, double[]> names) {
        this.text = text.replace(" ", "");
        this.names = names;
    }

    static double evaluate(String formula, Map<String, double[]> names) {
        FormulaEvaluator evaluator = new FormulaEvaluator(formula, names);
        double value = evaluator.sum();
        if (evaluator.at != evaluator.text.length()) {
            throw evaluator.unreadable("an operator or the end");
        }
        return value;
    }

    private double sum() {
        double value = product();
        while (true) {
            if (skip("+")) {
                value += product();
            } else if (skip("-")) {
                value -= product();
            } else {
                return value;
            }
        }
    }

    private double product() {
        double value = operand();
        while (true) {
            if (skip("*")) {
                value *= operand();
            } else if (skip("/")) {
                value /= operand();
            } else {
                return value;
            }
        }
    }

    private double operand() {
        if (skip("-")) {
            return -operand();
        }
        if (skip("(")) {
            double value = sum();
            expect(")");
            return value;
        }
        if (at < text.length() && Character.isDigit(text.charAt(at))) {
            return Double.parseDouble(take("[0-9.]"));
        }
        String name = take("[A-Za-z0-9]");
        if (skip("(")) {
            return name.equals("sum") ? overAll() : call(name);
        }
        if (name.equals("PI")) {
            return Math.PI;
        }
        double[] value = names.get(name);
        if (value == null || value.length != 1) {
            throw unreadable("one of the numbers " + names.keySet() + " or a function before");
        }
        return value[0];
    }

    private double call(String function) {
        double first = sum();
        double value =
                switch (function) {
                    case "sqrt" -> Math.sqrt(first);
                    case "log" -> Math.log(first);
                    case "exp" -> Math.exp(first);
                    case "pow" -> {
                        expect(",");
                        yield Math.pow(first, sum());
                    }
                    default -> throw unreadable("sqrt, log, exp, pow or sum before");
                };
        expect(")");
        return value;
    }

    /** {@code sum(term)}: the term once for each value of the parameter that takes any number. */
    private double overAll() {
        int start = at;
        String several = names.entrySet().stream()
                .filter(entry -> entry.getValue().length > 1)
                .map(Map.Entry::getKey)
                .findFirst()
                .orElseThrow(() -> unreadable("a parameter that takes any number"));
        double total = 0;
        for (double each : names.get(several)) {
            Map<String, double[]> one = new HashMap<>(names);
            one.put(several, new double[] {each});
            FormulaEvaluator term = new FormulaEvaluator(text, one);
            term.at = start;
            total += term.sum();
            at = term.at;
        }
        expect(")");
        return total;
    }

    private String take(String characters) {
        int start = at;
        while (at < text.length() && text.substring(at, at + 1).matches(characters)) {
            at++;
        }
        if (start == at) {
            throw unreadable("a number or a name");
        }
        return text.substring(start, at);
    }

    private boolean skip(String token) {
        if (text.startsWith(token, at)) {
            at += token.length();
            return true;
        }
        return false;
    }

    private void expect(String token) {
        if (!skip(token)) {
            throw unreadable(token);
        }
    }

    private IllegalArgumentException unreadable(String expected) {
        return new IllegalArgumentException("expected " + expected + " at " + at + " of " + text);
    }
}
