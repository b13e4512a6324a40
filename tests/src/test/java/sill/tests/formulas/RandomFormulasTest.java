package sill.tests.formulas;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import net.jqwik.api.Arbitraries;
import net.jqwik.api.Arbitrary;
import net.jqwik.api.Combinators;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.Provide;
import net.jqwik.api.lifecycle.AfterProperty;
import org.jsoup.Jsoup;
import org.jsoup.nodes.Element;
import sill.formula.Expression;
import sill.formula.MathFunction;
import sill.formula.MathWriter;
import sill.formula.PrintedResult;
import sill.formula.Values;
import sill.formula.Working;
import sill.formula.WorkingOut;
import sill.markup.Markup;
import sill.units.Notation;
import sill.units.PrintedQuantity;
import sill.units.Unit;

/** Random expressions: what their MathML says, by the usual order of operations, is what they are. */
class RandomFormulasTest {
    private static final Map<String, Double> NUMBERS = Map.of("a", 3.5, "b", -0.25, "c", 1200.0, "d", 7e-5);

    private static final List<String> DIFFERENT = new ArrayList<>();
    private static int checked;

    @Provide
    Arbitrary<Expression> expressions() {
        return expression(5);
    }

    private static Arbitrary<Expression> expression(int depth) {
        Arbitrary<Expression> leaf = Arbitraries.oneOf(
                Arbitraries.of("a", "b", "c", "d").map(Expression.Name::new),
                Arbitraries.of("2", "0.5", "1e3", "2.5e-3", "7")
                        .map(text -> new Expression.Literal(text, Double.parseDouble(text))),
                Arbitraries.of(Expression.Constant.class));
        if (depth == 0) {
            return leaf;
        }
        Arbitrary<Expression> part = Arbitraries.lazy(() -> expression(depth - 1));
        return Arbitraries.oneOf(
                leaf,
                part.map(Expression.Negation::new),
                Combinators.combine(Arbitraries.of(Expression.Operator.class), part, part)
                        .as(Expression.Arithmetic::new),
                Combinators.combine(Arbitraries.of(Expression.Operator.class), part, part)
                        .as(Expression.Arithmetic::new),
                Combinators.combine(
                                Arbitraries.of(
                                        MathFunction.SQRT,
                                        MathFunction.ABS,
                                        MathFunction.FLOOR,
                                        MathFunction.SIN,
                                        MathFunction.ATAN,
                                        MathFunction.LOG,
                                        MathFunction.EXP,
                                        MathFunction.TO_RADIANS),
                                part)
                        .as((function, argument) -> new Expression.Function(function, List.of(argument))),
                Combinators.combine(Arbitraries.of(MathFunction.MAX, MathFunction.HYPOT, MathFunction.POW), part, part)
                        .as((function, x, y) -> new Expression.Function(function, List.of(x, y))),
                Combinators.combine(Arbitraries.of(Expression.Relation.class), part, part, part, part)
                        .as((relation, x, y, first, second) -> new Expression.Choice(
                                new Expression.Comparison(relation, x, y), first, second, Expression.Applies.OPEN)));
    }

    @Property(tries = 1500)
    void printedFormulaIsTheExpression(@ForAll("expressions") Expression expression) {
        Exact exact = new Exact();
        Optional<Working> working = WorkingOut.of("", expression, exact, exact);
        if (working.isEmpty() || working.get().lines().get(0).formula().isEmpty()) {
            return;
        }
        Working.Line line = working.get().lines().get(0);
        double expected = exact.evaluated;
        check(line.formula().orElseThrow(), expected);
        line.numbers().ifPresent(numbers -> check(numbers, expected));
    }

    private static void check(Expression expression, double expected) {
        Markup page = new Markup();
        MathWriter.first(page, expression);
        List<Element> maths = Jsoup.parse(page.toString()).select("body > math");
        double value = MathReader.value(maths, new Names());
        boolean same = Double.isNaN(expected)
                ? Double.isNaN(value)
                : value == expected || Math.abs(value - expected) <= 1e-6 * Math.abs(expected);
        checked++;
        // Written with other operations, as a quotient of quotients is, the last digit of a number may differ, and a
        // floor,
        // a comparison or a difference of equals then decides otherwise. That is rare; a wrong bracket is not.
        if (!same) {
            DIFFERENT.add(Linear.text(maths) + " is " + expected + ", evaluated: " + value);
        }
    }

    @AfterProperty
    void hardlyAnyDiffers() {
        assertThat(checked).isGreaterThan(1500);
        assertThat(DIFFERENT).as("of %s", checked).hasSizeLessThan(checked / 200);
    }

    /** All numbers are printed with every digit, and any result will do: its value is noted. */
    private static final class Exact implements Values, PrintedResult {
        private double evaluated = Double.NaN;

        @Override
        public Optional<Expression> inPlaceOf(String name, List<String> path, int digits) {
            return Optional.of(new Expression.Shown(quantity(NUMBERS.get(name), "", 17)));
        }

        @Override
        public PrintedQuantity quantity(double si, String unit, int digits) {
            return Notation.printed(si, Unit.ONE, digits);
        }

        @Override
        public OptionalDouble value(Expression.Call call, List<Double> arguments) {
            return OptionalDouble.empty();
        }

        @Override
        public String shown(String component) {
            return "any";
        }

        @Override
        public String shown(String component, double value) {
            evaluated = value;
            return "any";
        }
    }

    private static final class Names implements MathReader.Scope {
        @Override
        public double symbol(String symbol) {
            return NUMBERS.get(symbol);
        }

        @Override
        public double call(String function, List<Double> arguments, List<String> texts) {
            throw new MathReader.Unknown("the function " + function);
        }
    }
}
