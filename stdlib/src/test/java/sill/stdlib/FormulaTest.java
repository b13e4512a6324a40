package sill.stdlib;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatIllegalArgumentException;

import java.lang.reflect.InvocationTargetException;
import java.lang.reflect.Method;
import java.lang.reflect.Modifier;
import java.lang.reflect.Parameter;
import java.lang.reflect.RecordComponent;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Random;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.MethodSource;

/** Every {@link Formula} computes what its method does. */
class FormulaTest {
    private static final int TRIES = 2000;
    private static final int LEAST = 100;

    static List<Method> formulas() {
        return Helpers.methods().stream()
                .filter(method -> method.isAnnotationPresent(Formula.class))
                .toList();
    }

    @Test
    void noFormulaIsOverlooked() {
        assertThat(formulas()).extracting(Method::getDeclaringClass).contains(Dividers.class, Comparators.class);
        assertThat(formulas()).hasSize(13);
    }

    @Test
    void everyHelperWithANumberForResultHasAFormula() {
        for (Class<?> type : List.of(Dividers.class, Comparators.class, Filters.class)) {
            assertThat(type.getDeclaredMethods())
                    .filteredOn(method -> Modifier.isPublic(method.getModifiers()))
                    .allSatisfy(method -> assertThat(method.isAnnotationPresent(Formula.class))
                            .isTrue());
        }
    }

    @ParameterizedTest
    @MethodSource("formulas")
    void formulaAgreesWithItsMethod(Method method) throws ReflectiveOperationException {
        Random random = new Random(8);
        int agreed = 0;
        for (int i = 0; i < TRIES; i++) {
            if (agrees(method, random)) {
                agreed++;
            }
        }
        assertThat(agreed).as("random arguments that %s takes", method).isGreaterThan(LEAST);
    }

    /** Whether the random arguments were such as the method takes; if so, the formula must agree. */
    private static boolean agrees(Method method, Random random) throws ReflectiveOperationException {
        Map<String, double[]> names = new LinkedHashMap<>();
        Object result;
        try {
            result = method.getDeclaringClass().isRecord()
                    ? onRecord(method, random, names)
                    : onArguments(method, random, names);
        } catch (InvocationTargetException e) {
            assertThat(e.getCause()).isInstanceOf(IllegalArgumentException.class);
            return false;
        }
        String[] forms = method.getAnnotation(Formula.class).value();
        if (result instanceof Double value) {
            assertThat(forms).hasSize(1);
            compare(method, forms[0], names, value);
            return true;
        }
        RecordComponent[] components = result.getClass().getRecordComponents();
        assertThat(forms).hasSameSizeAs(components);
        for (int i = 0; i < forms.length; i++) {
            String prefix = components[i].getName() + " = ";
            assertThat(forms[i]).startsWith(prefix);
            double value = (double) components[i].getAccessor().invoke(result);
            compare(method, forms[i].substring(prefix.length()), names, value);
        }
        return true;
    }

    private static Object onArguments(Method method, Random random, Map<String, double[]> names)
            throws ReflectiveOperationException {
        Parameter[] parameters = method.getParameters();
        Object[] arguments = new Object[parameters.length];
        for (int i = 0; i < arguments.length; i++) {
            String unit = parameters[i].getAnnotation(Unit.class).value();
            if (parameters[i].isVarArgs()) {
                arguments[i] = random.doubles(2 + random.nextInt(4))
                        .map(x -> random(unit, random))
                        .toArray();
                names.put(parameters[i].getName(), (double[]) arguments[i]);
            } else {
                arguments[i] = random(unit, random);
                names.put(parameters[i].getName(), new double[] {(double) arguments[i]});
            }
        }
        return method.invoke(null, arguments);
    }

    private static Object onRecord(Method method, Random random, Map<String, double[]> names)
            throws ReflectiveOperationException {
        RecordComponent[] components = method.getDeclaringClass().getRecordComponents();
        Class<?>[] types = new Class<?>[components.length];
        Object[] values = new Object[components.length];
        for (int i = 0; i < components.length; i++) {
            types[i] = components[i].getType();
            values[i] = random(components[i].getAnnotation(Unit.class).value(), random);
            names.put(components[i].getName(), new double[] {(double) values[i]});
        }
        return method.invoke(method.getDeclaringClass().getConstructor(types).newInstance(values));
    }

    private static double random(String unit, Random random) {
        return switch (unit) {
            case "V" -> -20 + 40 * random.nextDouble();
            case "Ω" -> Math.pow(10, 6 * random.nextDouble());
            case "F" -> Math.pow(10, -12 + 9 * random.nextDouble());
            case "Hz" -> Math.pow(10, 9 * random.nextDouble());
            default -> throw new AssertionError("no random value in " + unit);
        };
    }

    private static void compare(Method method, String form, Map<String, double[]> names, double actual) {
        StringBuilder what = new StringBuilder(method.getName() + ": " + form);
        names.forEach(
                (name, values) -> what.append(" ").append(name).append("=").append(values[0]));
        double expected = FormulaEvaluator.evaluate(form, names);
        double largest =
                names.values().stream().mapToDouble(v -> Math.abs(v[0])).max().orElseThrow();
        // Differences of voltages lose digits against the voltages themselves, hence the floor.
        double floor = names.containsKey("v") ? names.get("r")[0] * names.get("c")[0] * largest : 0;
        Figures.assertWithin(what.toString(), expected, actual, 1e-12 * (Math.abs(expected) + floor));
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "1 + 2 * 3 - 4 / 8 | 6.5",
                "-(a - b) * -2 | -6",
                "8 / 4 / 2 | 1",
                "5 - 2 - 1 | 2",
                "sqrt(a + 2) + pow(b, 3) | 127",
                "exp(log(a)) * 2.5 | 5",
                "1 / sum(1 / r) | 1",
                "sum(r * a) + 1 | 23",
                "PI / PI | 1"
            })
    void theEvaluatorKnowsArithmetic(String formula, double expected) {
        Map<String, double[]> names = Map.of("a", new double[] {2}, "b", new double[] {5}, "r", new double[] {2, 3, 6});
        Figures.assertRelative(formula, expected, FormulaEvaluator.evaluate(formula, names), 1e-15);
    }

    @Test
    void theEvaluatorRefusesWhatItDoesNotKnow() {
        for (String formula : List.of("x + 1", "a +", "(a", "a b", "cos(a)", "", "r")) {
            assertThatIllegalArgumentException()
                    .isThrownBy(() -> FormulaEvaluator.evaluate(
                            formula, Map.of("a", new double[] {1}, "r", new double[] {1, 2})));
        }
    }
}
