package sill.tests.formulas;

import com.fasterxml.jackson.databind.JsonNode;
import java.util.Arrays;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.function.DoubleSupplier;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.jsoup.nodes.Element;
import sill.stdlib.Series;

/**
 * What symbols and calls of a record stand for: values from its JSON, functions as the page itself defines them in the
 * equations beneath a result.
 */
final class SheetScope implements MathReader.Scope {
    private static final Pattern NAME = Pattern.compile("([A-Za-z][a-z]*)(.*)");
    private static final Pattern CALL = Pattern.compile("(\\w+)\\((.*)\\)(_\\w+)?");
    private static final Map<String, String> GREEK = Map.of("beta", "β", "tau", "τ", "alpha", "α", "omega", "ω");

    private final Map<String, Double> values = new HashMap<>();
    private final Map<String, PageLine.Equation> definitions = new HashMap<>();
    private Map<String, Double> parameters = Map.of();
    private Map<String, String> aliases = Map.of();

    SheetScope(JsonNode record) {
        record.get("givens").forEach(given -> put(symbolOf(given.get("name").asText()), given.get("value")));
        record.get("values").forEach(value -> put(symbolOf(value.path("name").asText()), value.get("value")));
    }

    /** The symbol of a name of the project's worksheets, as {@link Linear} writes it. */
    static String symbolOf(String name) {
        Matcher matcher = NAME.matcher(name);
        if (!matcher.matches()) {
            return name;
        }
        String first = GREEK.getOrDefault(matcher.group(1), matcher.group(1));
        return matcher.group(2).isEmpty() ? first : first + "_" + matcher.group(2);
    }

    private void put(String symbol, JsonNode value) {
        if (value.isNumber()) {
            values.put(symbol, value.asDouble());
        } else if (value.isBoolean()) {
            values.put(symbol, value.asBoolean() ? 1.0 : 0.0);
        } else if (value.isArray()) {
            for (int i = 0; i < value.size(); i++) {
                put(indexed(symbol, Integer.toString(i)), value.get(i));
            }
        } else if (value.isObject()) {
            value.properties().forEach(component -> put(indexed(symbol, component.getKey()), component.getValue()));
        }
    }

    /** A symbol with one more index. */
    private static String indexed(String symbol, String index) {
        int at = symbol.indexOf('_');
        return at < 0
                ? symbol + "_" + index
                : symbol.substring(0, at) + "_{" + symbol.substring(at + 1).replaceAll("[{}]", "") + ", " + index + "}";
    }

    /** Takes the definitions beneath a line, in place of any before. */
    void define(List<PageLine.Equation> beneath) {
        definitions.clear();
        for (PageLine.Equation equation : beneath) {
            Matcher call = CALL.matcher(Linear.text(equation.name()));
            if (call.matches()) {
                definitions.putIfAbsent(call.group(1) + (call.group(3) == null ? "" : call.group(3)), equation);
            }
        }
    }

    @Override
    public double symbol(String symbol) {
        if (parameters.containsKey(symbol)) {
            return parameters.get(symbol);
        }
        int index = symbol.indexOf('_');
        String base = index < 0 ? symbol : symbol.substring(0, index);
        String known = index > 0 && aliases.containsKey(base) ? aliases.get(base) + symbol.substring(index) : symbol;
        Double value = values.get(known);
        if (value == null) {
            throw new MathReader.Unknown("the symbol " + symbol);
        }
        return value;
    }

    @Override
    public double call(String function, List<Double> arguments, List<String> texts) {
        if (function.equals("parallel")) {
            return 1 / arguments.stream().mapToDouble(r -> 1 / r).sum();
        }
        Matcher series = Pattern.compile("(nearest|atLeast|atMost)_(E\\d+)").matcher(function);
        if (series.matches()) {
            Series of = Series.valueOf(series.group(2));
            double x = arguments.get(0);
            return switch (series.group(1)) {
                case "nearest" -> of.nearest(x);
                case "atLeast" -> of.atLeast(x);
                default -> of.atMost(x);
            };
        }
        PageLine.Equation definition = definitions.get(function);
        int index = function.indexOf('_');
        if (definition == null && index > 0 && definitions.containsKey(function.substring(0, index))) {
            PageLine.Equation whole = definitions.get(function.substring(0, index));
            return within(
                    whole.name(),
                    arguments,
                    texts,
                    () -> MathReader.component(whole.formula(), function.substring(index + 1), this));
        } else if (definition == null) {
            throw new MathReader.Unknown("the function " + function);
        }
        return within(definition.name(), arguments, texts, () -> MathReader.value(definition.formula(), this));
    }

    private double within(List<Element> head, List<Double> arguments, List<String> texts, DoubleSupplier body) {
        Matcher call = CALL.matcher(Linear.text(head));
        if (!call.matches()) {
            throw new IllegalArgumentException("a definition must start with a call: " + Linear.text(head));
        }
        List<String> names = Arrays.asList(call.group(2).split(", "));
        Map<String, Double> outer = parameters;
        Map<String, String> outerAliases = aliases;
        Map<String, Double> bound = new HashMap<>();
        Map<String, String> named = new HashMap<>();
        for (int i = 0; i < names.size(); i++) {
            if (Double.isNaN(arguments.get(i))) {
                named.put(names.get(i), texts.get(i));
            } else {
                bound.put(names.get(i), arguments.get(i));
            }
        }
        parameters = bound;
        aliases = named;
        try {
            return body.getAsDouble();
        } finally {
            parameters = outer;
            aliases = outerAliases;
        }
    }
}
