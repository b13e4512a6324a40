package sill.stdlib;

import static org.assertj.core.api.Assertions.assertThat;

import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class EngineeringTest {
    /** Prefixes by the SI brochure; the choice of the power of a thousand is ours. */
    @ParameterizedTest
    @CsvSource({
        "0, V, 0 V",
        "-0.0, V, 0 V",
        "4.9, V, 4.9 V",
        "-0.0352113, V, −35.21 mV",
        "999.96, V, 1 kV",
        "220000, Ω, 220 kΩ",
        "4.7e-9, F, 4.7 nF",
        "1e-15, F, 0.001 pF",
        "2e12, Hz, 2000 GHz",
        "1e-30, A, 1E−18 pA",
        "298.15, K, 298.2 K",
        "0.001, kg, 0.001 kg",
        "5e4, 1/K, 50000 1/K",
        "0.7071067, 1, 0.7071",
        "2.5e-8, 1, 2.5E−8",
        "1234567, 1, 1235000"
    })
    void fourDigitsAndAPrefix(double value, String unit, String text) {
        assertThat(Engineering.text(value, unit)).isEqualTo(text);
    }
}
