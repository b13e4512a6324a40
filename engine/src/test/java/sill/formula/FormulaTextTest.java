package sill.formula;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatIllegalArgumentException;

import java.lang.reflect.InvocationTargetException;
import java.lang.reflect.Method;
import java.lang.reflect.Modifier;
import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import java.util.Random;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.MethodSource;
import sill.formula.Expression.Defined;
import sill.formula.Expression.Form;
import sill.formula.Expression.Kind;
import sill.formula.Expression.Literal;
import sill.formula.Expression.Parameter;
import sill.stdlib.Comparators;
import sill.stdlib.Dividers;
import sill.stdlib.Filters;
import sill.stdlib.Formula;
import sill.stdlib.TripPoints;
import sill.stdlib.Unit;

class FormulaTextTest {
    static List<Method> helpers() {
        return Stream.of(Comparators.class, Dividers.class, Filters.class)
                .flatMap(type -> Stream.of(type.getDeclaredMethods()))
                .filter(method -> method.isAnnotationPresent(Formula.class) && Modifier.isStatic(method.getModifiers()))
                .toList();
    }

    @Test
    void noHelperIsOverlooked() {
        assertThat(helpers()).hasSize(11);
    }

    /** The forms are held against what the methods compute, on random arguments. */
    @ParameterizedTest
    @MethodSource("helpers")
    void formOfEveryHelperGivesWhatItsMethodDoes(Method method) throws ReflectiveOperationException {
        Random random = new Random(20261);
        int agreed = 0;
        for (int i = 0; i < 500; i++) {
            agreed += agrees(method, random) ? 1 : 0;
        }
        assertThat(agreed).as("arguments that %s takes", method).isGreaterThan(25);
    }

    private static boolean agrees(Method method, Random random) throws ReflectiveOperationException {
        List<Parameter> parameters = new ArrayList<>();
        List<Expression> arguments = new ArrayList<>();
        List<Object> passed = new ArrayList<>();
        for (java.lang.reflect.Parameter each : method.getParameters()) {
            String unit = each.getAnnotation(Unit.class).value();
            parameters.add(new Parameter(each.getName(), unit, each.isVarArgs()));
            double[] values = random.doubles(each.isVarArgs() ? 3 : 1)
                    .map(x -> number(unit, x))
                    .toArray();
            for (double value : values) {
                arguments.add(new Literal(Double.toString(value), value));
            }
            passed.add(each.isVarArgs() ? values : (Object) values[0]);
        }
        Object result;
        try {
            result = method.invoke(null, passed.toArray());
        } catch (InvocationTargetException e) {
            assertThat(e.getCause()).isInstanceOf(IllegalArgumentException.class);
            return false;
        }
        List<Form> forms = new ArrayList<>();
        for (String text : method.getAnnotation(Formula.class).value()) {
            int equals = text.indexOf('=');
            String several =
                    method.isVarArgs() ? parameters.get(parameters.size() - 1).name() : "";
            String component = equals < 0 ? "" : text.substring(0, equals).strip();
            forms.add(new Form(
                    component, FormulaText.parse(text.substring(equals + 1).strip(), several), ""));
        }
        Expression call = Substitution.of(Symbols.ONLY, 17)
                .in(new Defined(Kind.HELPER, method.getName(), parameters, arguments, forms));
        if (result instanceof TripPoints trip) {
            close(method, new Expression.Component(call, "rising"), trip.rising());
            close(method, new Expression.Component(call, "falling"), trip.falling());
        } else {
            close(method, call, (double) result);
        }
        return true;
    }

    private static double number(String unit, double x) {
        return switch (unit) {
            case "V" -> -20 + 40 * x;
            case "Ω" -> Math.pow(10, 6 * x);
            case "F" -> Math.pow(10, -12 + 9 * x);
            case "Hz" -> Math.pow(10, 6 * x);
            default -> throw new AssertionError("no random value in " + unit);
        };
    }

    private static void close(Method method, Expression form, double expected) {
        OptionalDouble value = Evaluation.of(form, Symbols.ONLY);
        assertThat(value).as("%s", method).isPresent();
        // Differences of voltages lose digits against the voltages themselves, hence the floor.
        assertThat(Math.abs(value.getAsDouble() - expected))
                .as("%s: form %s, method %s", method, value.getAsDouble(), expected)
                .isLessThanOrEqualTo(1e-9 * Math.abs(expected) + 1e-12);
    }

    /** Expected values worked by hand. */
    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "1 + 2 * 3 - 4 / 8 | 6.5",
                "-(2 - 5) * -2 | -6",
                "8 / 4 / 2 | 1",
                "5 - 2 - 1 | 2",
                "sqrt(2 + 2) + pow(5, 3) | 127",
                "exp(log(2)) * 2.5 | 5",
                "PI / PI | 1",
                "  ( 1 +1 )*3  | 6"
            })
    void arithmeticHasItsUsualOrder(String form, double expected) {
        assertThat(Evaluation.of(FormulaText.parse(form.strip(), ""), Symbols.ONLY)
                        .getAsDouble())
                .isEqualTo(expected);
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "a +     | a number, a name or '('  | 4",
                "(a      | closing                  | 3",
                "a b     | an operator or the end   | 3",
                "cosh    | nothing                  | 0",
                "f(a)    | a function before        | 5",
                "sum(a)  | a function before        | 7",
                "''      | a number, a name or '('  | 1"
            })
    void whatIsNoFormIsRefused(String form, String expected, int at) {
        String text = form;
        if (at == 0) {
            assertThat(FormulaText.parse(text, "")).isEqualTo(new Expression.Name("cosh"));
            return;
        }
        assertThatIllegalArgumentException()
                .isThrownBy(() -> FormulaText.parse(text, ""))
                .withMessage("a form must be arithmetic, expected " + expected.replace("closing", "')'")
                        + " at character " + at + " of: " + text);
    }
}
