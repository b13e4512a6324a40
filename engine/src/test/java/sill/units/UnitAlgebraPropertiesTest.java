package sill.units;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatCode;

import net.jqwik.api.Arbitraries;
import net.jqwik.api.Arbitrary;
import net.jqwik.api.Combinators;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.Provide;

/** Dimensions are a commutative group with powers; symbols read back to what they were written from. */
class UnitAlgebraPropertiesTest {
    @Provide
    Arbitrary<Rational> exponents() {
        return Combinators.combine(Arbitraries.integers().between(-6, 6), Arbitraries.of(1, 1, 1, 2, 3))
                .as(Rational::new);
    }

    @Provide
    Arbitrary<Dimension> dimensions() {
        return Combinators.combine(Arbitraries.of(BaseUnit.values()), exponents())
                .as((base, exponent) -> Dimension.of(base).power(exponent))
                .list()
                .ofMaxSize(4)
                .map(factors -> factors.stream().reduce(Dimension.NONE, Dimension::times));
    }

    @Provide
    Arbitrary<String> unitLikeText() {
        return Arbitraries.of(
                        "V", "A", "k", "m", "µ", "Ω", "Hz", "√", "sqrt(", "(", ")", "/", "·", "*", " ", "^", "2", "-",
                        "⁻", "²", "1", "°C", "%", "s", "d", "min", "x", "^(1/2)", "^-3", "Q", "q")
                .list()
                .ofMaxSize(12)
                .map(parts -> String.join("", parts));
    }

    @Property
    void multiplicationIsAGroup(
            @ForAll("dimensions") Dimension a, @ForAll("dimensions") Dimension b, @ForAll("dimensions") Dimension c) {
        assertThat(a.times(b)).isEqualTo(b.times(a)).hasSameHashCodeAs(b.times(a));
        assertThat(a.times(b).times(c)).isEqualTo(a.times(b.times(c)));
        assertThat(a.times(b).over(b)).isEqualTo(a);
        assertThat(a.over(a)).isEqualTo(Dimension.NONE);
        assertThat(a.power(Rational.HALF).power(2)).isEqualTo(a);
        assertThat(a.times(b).power(3)).isEqualTo(a.power(3).times(b.power(3)));
    }

    @Property(tries = 300)
    void coherentSymbolReadsBack(@ForAll("dimensions") Dimension dimension) throws UnitException {
        Unit unit = Unit.ofDimension(dimension);

        assertThat(Unit.parse(unit.symbol()).dimension()).isEqualTo(dimension);
        assertThat(Unit.parse(unit.symbol()).factor()).isEqualTo(1);
        assertThat(unit.coherent()).isEqualTo(unit);
    }

    @Property
    void anyTextIsAUnitOrAProblem(@ForAll String text) {
        assertThatCode(() -> Unit.isUnit(text)).doesNotThrowAnyException();
    }

    @Property
    void whatReadsIsSpelledSoThatItReadsAgain(@ForAll("unitLikeText") String text) throws UnitException {
        if (Unit.isUnit(text)) {
            Unit unit = Unit.parse(text);
            assertThat(Unit.parse(unit.symbol())).isEqualTo(unit);
        }
    }
}
