package sill.stdlib;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatIllegalArgumentException;

import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

class CoherentUnitTest {
    @ParameterizedTest
    @CsvSource({
        "V, V",
        "Ω, Ω",
        "ohm, Ω",
        "\u2126, Ω",
        "1, 1",
        "V/s, V/s",
        "1/K, 1/K",
        "K^-1, K^-1",
        "V/√Hz, V/√Hz",
        "V/sqrt(Hz), V/√(Hz)",
        "m·kg/s², m·kg/s²",
        "kg, kg"
    })
    void coherentUnitsPass(String unit, String symbol) {
        assertThat(CoherentUnit.checked("yUnit", unit)).isEqualTo(symbol);
    }

    @ParameterizedTest
    @ValueSource(strings = {"mV", "kΩ", "kohm", "µF", "°C", "%", "ppm/K", "V/µs", "g", "", "2", "volt", "nV/√Hz"})
    void othersDoNot(String unit) {
        assertThatIllegalArgumentException()
                .isThrownBy(() -> CoherentUnit.checked("yUnit", unit))
                .withMessageEndingWith("got \"" + unit + "\"");
    }
}
