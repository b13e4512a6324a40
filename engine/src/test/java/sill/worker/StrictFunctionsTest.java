package sill.worker;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.io.InputStream;
import java.lang.reflect.Method;
import java.util.List;
import java.util.Random;
import java.util.function.DoubleBinaryOperator;
import java.util.function.DoubleUnaryOperator;
import org.junit.jupiter.api.Test;
import sill.values.Datum;

/** {@code StrictMath} is the reference, bit by bit. */
class StrictFunctionsTest {
    /** Compiled as a worksheet's Java is: calls, a method reference, and what must stay. */
    public static final class Calls {
        public static double[] all(double x, double y) {
            DoubleUnaryOperator reference = Math::sin;
            DoubleBinaryOperator two = Math::pow;
            long wide = 1L << 40;
            return new double[] {
                Math.sin(x),
                Math.cos(x),
                Math.tan(x),
                Math.asin(x),
                Math.acos(x),
                Math.atan(x),
                Math.atan2(x, y),
                Math.sinh(x),
                Math.cosh(x),
                Math.tanh(x),
                Math.exp(x),
                Math.expm1(x),
                Math.log(y),
                Math.log10(y),
                Math.log1p(y),
                Math.pow(y, x),
                Math.cbrt(x),
                Math.hypot(x, y),
                reference.applyAsDouble(x),
                two.applyAsDouble(y, x),
                Math.sqrt(y),
                Math.abs(x),
                Math.fma(x, y, 2.5e3),
                wide
            };
        }
    }

    private static double[] expected(double x, double y) {
        return new double[] {
            StrictMath.sin(x), StrictMath.cos(x), StrictMath.tan(x), StrictMath.asin(x), StrictMath.acos(x),
            StrictMath.atan(x), StrictMath.atan2(x, y), StrictMath.sinh(x), StrictMath.cosh(x), StrictMath.tanh(x),
            StrictMath.exp(x), StrictMath.expm1(x), StrictMath.log(y), StrictMath.log10(y), StrictMath.log1p(y),
            StrictMath.pow(y, x), StrictMath.cbrt(x), StrictMath.hypot(x, y), StrictMath.sin(x), StrictMath.pow(y, x),
            Math.sqrt(y), Math.abs(x), Math.fma(x, y, 2.5e3), 1L << 40
        };
    }

    @Test
    void callsAndMethodReferencesGiveTheStrictValue() throws ReflectiveOperationException, IOException {
        Method all = loaded(StrictFunctions.in(bytes(Calls.class))).getMethod("all", double.class, double.class);
        Random random = new Random(1);
        for (int i = 0; i < 20_000; i++) {
            double x = random.nextDouble() * 2 - 1;
            double y = random.nextDouble() * 100;
            assertThat((double[]) all.invoke(null, x, y)).isEqualTo(expected(x, y));
        }
    }

    @Test
    void aSheetsFunctionsAreStrict() {
        String sheet = Sheets.calculation(
                "double x = 0; for (int i = 1; i < 500; i++) { x += pow(i, 0.37) * sin(i) + exp(-i); }");
        double expected = 0;
        for (int i = 1; i < 500; i++) {
            expected += StrictMath.pow(i, 0.37) * StrictMath.sin(i) + StrictMath.exp(-i);
        }

        assertThat(Sheets.here(sheet).results().get(0).value()).isEqualTo(new Datum.Real(expected));
    }

    @Test
    void aClassWithoutSuchCallsStaysAsItIs() throws IOException {
        for (Class<?> type : List.of(Sheets.class, RunNotation.class, WireOut.class)) {
            byte[] bytes = bytes(type);
            assertThat(StrictFunctions.in(bytes)).isSameAs(bytes);
        }
    }

    private static Class<?> loaded(byte[] classFile) {
        return new ClassLoader(StrictFunctionsTest.class.getClassLoader()) {
            Class<?> define() {
                return defineClass(Calls.class.getName(), classFile, 0, classFile.length);
            }
        }.define();
    }

    private static byte[] bytes(Class<?> type) throws IOException {
        String name = type.getName().replace('.', '/') + ".class";
        try (InputStream in = type.getClassLoader().getResourceAsStream(name)) {
            return in.readAllBytes();
        }
    }
}
