package sill.tests.formulas;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import org.jsoup.nodes.Element;

/**
 * Evaluates presentation MathML by the usual order of operations, in coherent SI. Truth values count as 1 and 0. It knows of
 * the engine nothing but the units.
 */
final class MathReader {
    private final Scope scope;
    private final List<Element> tokens;
    private int at;

    private MathReader(Scope scope, List<Element> elements) {
        this.scope = scope;
        tokens = new ArrayList<>();
        elements.forEach(this::flatten);
    }

    /** What symbols and functions stand for. */
    interface Scope {
        /** The value of a symbol, written as {@link Linear} does. */
        double symbol(String symbol);

        /** The value of a function of the sheet or of the stdlib. */
        double call(String function, List<Double> arguments, List<String> texts);
    }

    /** Something on the page that this evaluator has no value for. */
    static final class Unknown extends RuntimeException {
        private static final long serialVersionUID = 1;

        Unknown(String what) {
            super(what);
        }
    }

    /** The value of the elements side by side; an equals sign before them is passed over. */
    static double value(List<Element> elements, Scope scope) {
        MathReader reader = new MathReader(scope, elements);
        reader.skip("=");
        double value = reader.disjunction();
        if (reader.at != reader.tokens.size()) {
            throw new IllegalArgumentException(
                    "something is left from part " + reader.at + " of " + Linear.text(reader.tokens));
        }
        return value;
    }

    /** A component of what a call gives. */
    static double component(List<Element> call, String component, Scope scope) {
        MathReader reader = new MathReader(scope, call);
        reader.skip("=");
        String name = Linear.text(List.of(reader.tokens.get(reader.at++))) + "_" + component;
        if (!reader.skip("\u2061")) {
            throw new IllegalArgumentException("no call: " + Linear.text(call));
        }
        return reader.application(name);
    }

    private void flatten(Element element) {
        boolean transparent =
                element.tagName().equals("mrow") || element.tagName().equals("math");
        if (transparent) {
            element.children().forEach(this::flatten);
        } else {
            tokens.add(element);
        }
    }

    private double disjunction() {
        double value = conjunction();
        while (skip("∨")) {
            double other = conjunction();
            value = value != 0 || other != 0 ? 1 : 0;
        }
        return value;
    }

    private double conjunction() {
        double value = relation();
        while (skip("∧")) {
            double other = relation();
            value = value != 0 && other != 0 ? 1 : 0;
        }
        return value;
    }

    private double relation() {
        if (skip("¬")) {
            return relation() == 0 ? 1 : 0;
        }
        double left = sum();
        for (String sign : List.of("<", "≤", ">", "≥", "=", "≠")) {
            if (skip(sign)) {
                double right = sum();
                boolean holds =
                        switch (sign) {
                            case "<" -> left < right;
                            case "≤" -> left <= right;
                            case ">" -> left > right;
                            case "≥" -> left >= right;
                            case "=" -> left == right;
                            default -> left != right;
                        };
                return holds ? 1 : 0;
            }
        }
        return left;
    }

    private double sum() {
        double value = skip("−") ? -product() : product();
        while (true) {
            if (skip("+")) {
                value += product();
            } else if (skip("−")) {
                value -= product();
            } else {
                return value;
            }
        }
    }

    private double product() {
        double value = operand();
        while (true) {
            if (skip("⋅") || skip("×")) {
                value *= operand();
            } else if (skip("/")) {
                value /= operand();
            } else {
                return value;
            }
        }
    }

    private double operand() {
        if (at >= tokens.size()) {
            throw new IllegalArgumentException("something is missing at the end of " + Linear.text(tokens));
        }
        if (skip("(")) {
            return closed(disjunction(), ")");
        } else if (skip("|")) {
            return Math.abs(closed(sum(), "|"));
        } else if (skip("⌊")) {
            return Math.floor(closed(sum(), "⌋"));
        } else if (skip("⌈")) {
            return Math.ceil(closed(sum(), "⌉"));
        } else if (skip("{")) {
            return cases(tokens.get(at++));
        }
        Element token = tokens.get(at++);
        if (skip("\u2061")) {
            return application(Linear.text(List.of(token)));
        }
        return switch (token.tagName()) {
            case "mn" -> quantity(token.wholeText());
            case "mi", "msub" -> symbol(token);
            case "mtext" -> truth(token.wholeText());
            case "mfrac" -> inside(token.child(0)) / inside(token.child(1));
            case "msup" -> Math.pow(inside(token.child(0)), inside(token.child(1)));
            case "msqrt" -> Math.sqrt(value(token.children(), scope));
            case "mroot" -> Math.pow(inside(token.child(0)), 1 / inside(token.child(1)));
            default -> throw new IllegalArgumentException("no operand: " + Linear.text(List.of(token)));
        };
    }

    private double inside(Element element) {
        return value(List.of(element), scope);
    }

    private double closed(double value, String sign) {
        if (!skip(sign)) {
            throw new IllegalArgumentException(sign + " is missing at part " + at + " of " + Linear.text(tokens));
        }
        return value;
    }

    /** A number, the power of ten behind it and its unit. */
    private double quantity(String digits) {
        StringBuilder printed = new StringBuilder(digits);
        boolean power = isSign(at, "×")
                && at + 1 < tokens.size()
                && tokens.get(at + 1).wholeText().matches("10[⁺⁻]?[⁰¹²³⁴⁵⁶⁷⁸⁹]+");
        if (power) {
            printed.append("\u00A0×\u00A0").append(tokens.get(at + 1).wholeText());
            at += 2;
        }
        if (at < tokens.size() && tokens.get(at).tagName().equals("mtext")) {
            printed.append(tokens.get(at++).wholeText());
        }
        return Quantity.of(printed.toString()).si();
    }

    private double symbol(Element token) {
        String text = Linear.text(List.of(token));
        return switch (text) {
            case "π" -> Math.PI;
            case "e" -> token.attr("mathvariant").equals("normal") ? Math.E : scope.symbol(text);
            default -> {
                if (token.tagName().equals("msub")) {
                    yield indexed(token, text);
                }
                yield scope.symbol(text);
            }
        };
    }

    /** An index that is itself computed, as that of an array's element, is written as its value. */
    private double indexed(Element token, String text) {
        MathReader inner = new MathReader(scope, List.of(token.child(0)));
        if (inner.tokens.size() > 1) {
            return component(List.of(token.child(0)), Linear.text(List.of(token.child(1))), scope);
        }
        try {
            return scope.symbol(text);
        } catch (Unknown e) {
            double index = inside(token.child(1));
            String base = Linear.text(List.of(token.child(0)));
            return scope.symbol(base + "_" + (long) index);
        }
    }

    private static double truth(String text) {
        if (!text.equals("true") && !text.equals("false")) {
            throw new Unknown("the text " + text);
        }
        return text.equals("true") ? 1 : 0;
    }

    private double cases(Element table) {
        for (Element row : table.children()) {
            List<Element> condition = new ArrayList<>(row.child(1).children());
            MathReader reader = new MathReader(scope, condition);
            String word = reader.tokens.remove(0).wholeText().strip();
            if (word.equals("otherwise") || value(reader.tokens, scope) != 0) {
                boolean marked = row.childrenSize() == 3;
                boolean anyMarked = table.children().stream().anyMatch(each -> each.childrenSize() == 3);
                if (anyMarked && !marked) {
                    throw new IllegalArgumentException("the wrong case is marked in " + Linear.text(List.of(table)));
                }
                return inside(row.child(0).child(0));
            }
        }
        throw new IllegalArgumentException("no case applies in " + Linear.text(List.of(table)));
    }

    private double application(String name) {
        closed(0, "(");
        List<Double> arguments = new ArrayList<>();
        List<String> texts = new ArrayList<>();
        while (!skip(")")) {
            int start = at;
            int end = endOfArgument();
            List<Element> argument = tokens.subList(start, end);
            texts.add(Linear.text(argument));
            double value;
            try {
                value = value(argument, scope);
            } catch (Unknown e) {
                // A record or an array: a function may still know what to do with its name.
                value = Double.NaN;
            }
            arguments.add(value);
            at = end;
            skip(",");
        }
        double x = arguments.isEmpty() ? 0 : arguments.get(0);
        double y = arguments.size() < 2 ? 0 : arguments.get(1);
        Map<String, Double> known = known(x, y);
        return known.containsKey(name) ? known.get(name) : scope.call(name, arguments, texts);
    }

    private int endOfArgument() {
        int depth = 0;
        int end = at;
        while (end < tokens.size() && (depth > 0 || !isSign(end, ",") && !isSign(end, ")"))) {
            depth += isSign(end, "(") ? 1 : isSign(end, ")") ? -1 : 0;
            end++;
        }
        return end;
    }

    private static Map<String, Double> known(double x, double y) {
        return Map.ofEntries(
                Map.entry("ln", Math.log(x)),
                Map.entry("lg", Math.log10(x)),
                Map.entry("exp", Math.exp(x)),
                Map.entry("sgn", Math.signum(x)),
                Map.entry("round", Math.floor(x + 0.5)),
                Map.entry("rint", Math.rint(x)),
                Map.entry("max", Math.max(x, y)),
                Map.entry("min", Math.min(x, y)),
                Map.entry("sin", Math.sin(x)),
                Map.entry("cos", Math.cos(x)),
                Map.entry("tan", Math.tan(x)),
                Map.entry("arcsin", Math.asin(x)),
                Map.entry("arccos", Math.acos(x)),
                Map.entry("arctan", Math.atan(x)),
                Map.entry("arctan2", Math.atan2(x, y)),
                Map.entry("sinh", Math.sinh(x)),
                Map.entry("cosh", Math.cosh(x)),
                Map.entry("tanh", Math.tanh(x)));
    }

    private boolean isSign(int index, String sign) {
        return index < tokens.size()
                && tokens.get(index).tagName().equals("mo")
                && tokens.get(index).wholeText().equals(sign);
    }

    private boolean skip(String sign) {
        boolean there = isSign(at, sign);
        at += there ? 1 : 0;
        return there;
    }
}
