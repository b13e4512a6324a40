package sill.formula;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;
import sill.formula.Expression.Arithmetic;
import sill.formula.Expression.Literal;
import sill.formula.Expression.Name;
import sill.formula.Expression.Operator;
import sill.formula.Expression.Shown;
import sill.units.Notation;
import sill.units.PrintedQuantity;
import sill.units.Unit;

class WorkingOutTest {
    private static final Expression DIFFERENCE = new Arithmetic(Operator.MINUS, new Name("a"), new Name("b"));

    /** Pure numbers by name. */
    private record Numbers(Map<String, Double> values) implements Values {
        @Override
        public Optional<Expression> inPlaceOf(String name, List<String> path, int digits) {
            return Optional.ofNullable(values.get(name)).map(value -> new Shown(quantity(value, "", digits)));
        }

        @Override
        public PrintedQuantity quantity(double si, String unit, int digits) {
            return Notation.printed(si, Unit.ONE, digits);
        }

        @Override
        public OptionalDouble value(Expression.Call call, List<Double> arguments) {
            return OptionalDouble.empty();
        }
    }

    /** A result that is a pure number. */
    private record Number(double value) implements PrintedResult {
        @Override
        public String shown(String component) {
            return shown(component, value);
        }

        @Override
        public String shown(String component, double other) {
            return Notation.shown(other, Unit.ONE);
        }
    }

    private static Optional<Working> working(Expression expression, Map<String, Double> values, double result) {
        return WorkingOut.of("x", expression, new Numbers(values), new Number(result));
    }

    private static List<String> printed(Expression expression) {
        return Parts.of(expression).stream()
                .map(part -> ((Shown) part).printed().text())
                .toList();
    }

    @Test
    void fourDigitsAreEnoughWhereTheyGiveTheResult() {
        Working working = working(DIFFERENCE, Map.of("a", 20.0, "b", 1 / 3.0), 20 - 1 / 3.0)
                .orElseThrow();
        assertThat(printed(working.lines().get(0).numbers().orElseThrow())).containsExactly("20.00", "0.3333");
    }

    @Test
    void moreDigitsAreShownWhereFourDoNotGiveTheResult() {
        Working working = working(DIFFERENCE, Map.of("a", 12.34567, "b", 12.3), 12.34567 - 12.3)
                .orElseThrow();
        assertThat(printed(working.lines().get(0).numbers().orElseThrow())).containsExactly("12.34567", "12.30000");
    }

    @Test
    void formulaThatDoesNotGiveTheResultIsNotShown() {
        assertThat(working(DIFFERENCE, Map.of("a", 7.0, "b", 2.0), 5.5)).isEmpty();
    }

    @Test
    void numberAloneAndNameAloneSayNothingMore() {
        Working.Line number =
                working(new Literal("5", 5), Map.of(), 5).orElseThrow().lines().get(0);
        assertThat(number.formula()).isEmpty();
        assertThat(number.numbers()).isEmpty();
        Working.Line name = working(new Name("a"), Map.of("a", 5.0), 5)
                .orElseThrow()
                .lines()
                .get(0);
        assertThat(name.formula()).contains(new Name("a"));
        assertThat(name.numbers()).isEmpty();
    }

    @Test
    void hugeFormulaIsNotShown() {
        Expression sum = new Name("a");
        for (int i = 0; i < 200; i++) {
            sum = new Arithmetic(Operator.PLUS, sum, new Name("a"));
        }
        assertThat(working(sum, Map.of("a", 1.0), 201)).isEmpty();
    }

    @Test
    void formsWithinFormsEndSomewhere() {
        Expression twice = new Arithmetic(Operator.PLUS, new Name("p"), new Name("p"));
        Expression call = new Name("a");
        for (int i = 0; i < 20; i++) {
            call = new Expression.Defined(
                    Expression.Kind.METHOD,
                    "twice",
                    List.of(new Expression.Parameter("p", "", false)),
                    List.of(call),
                    List.of(new Expression.Form("", twice, "")));
        }
        assertThat(working(call, Map.of("a", 1.0), 1 << 20)).isEmpty();
    }
}
