package sill.units;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import org.junit.jupiter.api.Test;

class RationalTest {
    @Test
    void isKeptInLowestTerms() {
        assertThat(new Rational(4, -6)).isEqualTo(new Rational(-2, 3)).hasToString("-2/3");
        assertThat(new Rational(0, 7)).isEqualTo(Rational.ZERO).hasToString("0");
        assertThat(new Rational(Integer.MIN_VALUE, 2)).isEqualTo(Rational.of(Integer.MIN_VALUE / 2));
    }

    @Test
    void addsAndMultiplies() {
        assertThat(new Rational(1, 2).plus(new Rational(1, 3))).isEqualTo(new Rational(5, 6));
        assertThat(new Rational(2, 3).times(new Rational(-3, 4))).isEqualTo(new Rational(-1, 2));
        assertThat(Rational.HALF.negated().sign()).isEqualTo(-1);
        assertThat(Rational.HALF.toDouble()).isEqualTo(0.5);
    }

    @Test
    void refusesWhatItCannotHold() {
        assertThatThrownBy(() -> new Rational(1, 0))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessage("denominator must not be 0, found 1/0");
        assertThatThrownBy(() -> Rational.of(Integer.MAX_VALUE).plus(Rational.ONE))
                .isInstanceOf(ArithmeticException.class);
        assertThatThrownBy(() -> Rational.of(Integer.MAX_VALUE).times(Rational.of(2)))
                .isInstanceOf(ArithmeticException.class);
    }
}
