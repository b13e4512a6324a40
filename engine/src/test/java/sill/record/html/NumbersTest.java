package sill.record.html;

import static org.assertj.core.api.Assertions.assertThat;

import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import org.junit.jupiter.api.Test;

class NumbersTest {
    @Test
    void briefNumbersHaveFourDigits() {
        assertThat(Numbers.brief(0)).isEqualTo("0");
        assertThat(Numbers.brief(-0.0)).isEqualTo("0");
        assertThat(Numbers.brief(2.0 / 3)).isEqualTo("0.6667");
        assertThat(Numbers.brief(-12345678)).isEqualTo("−1.235\u00A0×\u00A010⁷");
        assertThat(Numbers.brief(8200)).isEqualTo("8200");
        assertThat(Numbers.brief(1.5e-12)).isEqualTo("1.5\u00A0×\u00A010⁻¹²");
        assertThat(Numbers.brief(Double.NaN)).isEqualTo("not a number");
        assertThat(Numbers.brief(Double.NEGATIVE_INFINITY)).isEqualTo("−∞");
    }

    @Test
    void sharesAreSignedPercentages() {
        assertThat(Numbers.percent(0.3333)).isEqualTo("+33.3\u00A0%");
        assertThat(Numbers.percent(-0.0625)).isEqualTo("−6.2\u00A0%");
        assertThat(Numbers.percent(0)).isEqualTo("0.0\u00A0%");
        assertThat(Numbers.percent(Double.POSITIVE_INFINITY)).isEqualTo("∞");
    }

    @Property
    void fullNumbersReadBack(@ForAll double value) {
        String plain = Numbers.full(value).replace('−', '-').replace("\u00A0×\u00A010", "E");
        for (int i = 0; i < 10; i++) {
            plain = plain.replace("⁰¹²³⁴⁵⁶⁷⁸⁹".charAt(i), (char) ('0' + i));
        }
        assertThat(Double.parseDouble(plain.replace('⁻', '-'))).isEqualTo(value == 0 ? 0 : value);
    }
}
