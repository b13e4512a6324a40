package sill.study;

import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.util.List;
import java.util.Optional;
import java.util.stream.IntStream;
import org.assertj.core.api.ThrowableAssert.ThrowingCallable;
import org.junit.jupiter.api.Test;

class GuardsTest {
    private static void refused(ThrowingCallable call, String message) {
        assertThatThrownBy(call).isInstanceOf(IllegalArgumentException.class).hasMessage(message);
    }

    private static StudyPlan plan(List<Varied> inputs, List<Studied> outputs, int cores) {
        return new StudyPlan(inputs, outputs, false, false, Optional.empty(), cores);
    }

    private static Varied input(String name) {
        return new Varied(name, 1, 0, 2, new Spread.Uniform());
    }

    @Test
    void inputs() {
        Spread uniform = new Spread.Uniform();
        refused(() -> new Varied("a", 0, 0, Double.NaN, uniform), "limits of \"a\" must be finite, got 0.0 .. NaN");
        refused(
                () -> new Varied("a", 0, -1e308, 1e308, uniform),
                "limits of \"a\" must be finite and so must their distance, got -1.0E308 .. 1.0E308");
        refused(() -> new Varied("a", 3, 1, 2, uniform), "nominal value of \"a\" must lie within 1.0 .. 2.0, got 3.0");
        refused(
                () -> new Varied("a", Double.NaN, 1, 2, uniform),
                "nominal value of \"a\" must lie within 1.0 .. 2.0, got NaN");
        refused(
                () -> new Varied("a", 1.4, 1, 2, new Spread.Normal(3)),
                "limits of \"a\" must lie evenly about the nominal value for a normal spread, got 1.4 in 1.0 .. 2.0");
        refused(() -> new Spread.Normal(0), "k must be finite and above 0, got 0.0");
        refused(() -> new Spread.Normal(Double.NaN), "k must be finite and above 0, got NaN");
    }

    @Test
    void plans() {
        List<Studied> outputs = List.of(Studied.of("y"));
        refused(() -> plan(List.of(), outputs, 1), "inputs must be 1 to 1000, got 0");
        List<Varied> many =
                IntStream.range(0, 1001).mapToObj(i -> input("x" + i)).toList();
        refused(() -> plan(many, outputs, 1), "inputs must be 1 to 1000, got 1001");
        refused(() -> plan(List.of(input("a")), List.of(), 1), "outputs must be 1 or more, got 0");
        refused(() -> plan(List.of(input("a")), outputs, 0), "cores must be 1 or more, got 0");
        refused(
                () -> plan(List.of(input("a"), input("a")), outputs, 1),
                "inputs must have one name each, got \"a\" twice");
        refused(() -> new Sampling(1, 0), "samples must be from 2 to 10000000000, got 1");
        refused(() -> new Sampling(10_000_000_001L, 0), "samples must be from 2 to 10000000000, got 10000000001");
        refused(() -> new Window(2, 1), "low must be at most high, got 2.0 .. 1.0");
        refused(() -> new Window(Double.NaN, 1), "low must be at most high, got NaN .. 1.0");
    }

    @Test
    void nominalPoints() {
        Trial trial = new Trial().uniform("x", 0, 0, 1);
        refused(
                () -> trial.of((in, out) -> out[0] = 1 / in[0]),
                "the model must give a finite \"y\" at the nominal point, but it gave Infinity");
        refused(
                () -> trial.of((in, out) -> {
                    throw new IllegalStateException("not today");
                }),
                "the model must give a finite \"y\" at the nominal point, but it threw"
                        + " java.lang.IllegalStateException: not today");
    }
}
