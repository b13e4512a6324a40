package sill.units;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import java.util.Locale;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.MethodSource;

class NotationTest {
    static List<String[]> published() {
        return PublishedTable.rows("si-notation.tsv", 4);
    }

    private static String spaced(String text) {
        return text.replace('_', Notation.SPACE);
    }

    @ParameterizedTest
    @MethodSource("published")
    void followsTheStandards(double si, String unit, String written, String source) throws UnitException {
        assertThat(Notation.shown(si, Unit.parse(unit))).as(source).isEqualTo(spaced(written));
    }

    @ParameterizedTest
    @CsvSource({
        "5, V, 5.000_V",
        "0.99994, V, 999.9_mV",
        "0.99995, V, 1.000_V",
        "999.96e-3, V, 1.000_V",
        "999950, Ω, 1.000_MΩ",
        "0.001, V, 1.000_mV",
        "0, mV, 0_V",
        "-0.0, V, 0_V",
        "-3e-6, V, −3.000_µV",
        "12345, mV, 12.35_kV",
        "8200, kΩ, 8.200_kΩ",
        "4.7e-9, F, 4.700_nF",
        "1e30, V, 1.000_QV",
        "1e33, V, 1000_QV",
        "1e34, V, 1.000_×_10³⁴_V",
        "1e-30, V, 1.000_qV",
        "1e-31, V, 1.000_×_10⁻³¹_V",
        "NaN, V, not a number",
        "Infinity, mV, ∞_V",
        "-Infinity, %, −∞_%",
        "5e-9, V/√Hz, 5.000_nV/√Hz",
        "1e6, V/s, 1.000_MV/s",
        "2e6, V/µs, 2.000_MV/s",
        "0.004, V·s, 4.000_mV·s",
    })
    void picksTheEngineeringPrefix(double si, String unit, String written) throws UnitException {
        Unit typed = Unit.parse(unit);
        // A prefix below the solidus stays as typed; these values are shown in the coherent unit.
        assertThat(Notation.shown(si, unit.contains("/µs") ? typed.coherent() : typed))
                .isEqualTo(spaced(written));
    }

    @ParameterizedTest
    @CsvSource({
        "3600, s, 3600_s",
        "86400, s, 8.640_×_10⁴_s",
        "0.02, s, 20.00_ms",
        "6500, K, 6500_K",
        "0.05, K, 50.00_mK",
        "120, min, 2.000_min",
        "1500, m, 1.500_km",
        "2e7, m, 2.000_×_10⁷_m",
        "0.002, kg, 2.000_g",
        "75, kg, 75.00_kg",
        "20000, kg, 2.000_×_10⁴_kg",
        "298.15, °C, 25.00_°C",
        "271.15, degC, −2.000_°C",
        "0.123456, %, 12.35_%",
        "0.0001, ppm, 100.0_ppm",
        "1e-6, m², 1.000_×_10⁻⁶_m²",
        "0.005, 1/K, 0.005000_K⁻¹",
        "3e-7, ppm/K, 0.3000_ppm/K",
        "0.5, 1, 0.5000",
        "1234, 1, 1234",
        "12345, 1, 1.235_×_10⁴",
        "0.00012345, 1, 1.235_×_10⁻⁴",
        "4, √Hz, 4.000_√Hz",
        "25, 1/√Hz, 25.00_1/√Hz",
        "2, V²/Hz, 2.000_V²/Hz",
        "1.5707963267948966, °, 90.00°",
    })
    void leavesOutPrefixesThatReadBadly(double si, String unit, String written) throws UnitException {
        assertThat(Notation.shown(si, Unit.parse(unit))).isEqualTo(spaced(written));
    }

    @ParameterizedTest
    @CsvSource({
        "0.6, mV, 600.0_mV", "1.2, mV, 1200_mV", "12, mV, 1.200_×_10⁴_mV", "1e-9, mV, 1.000_×_10⁻⁶_mV", "0, mV, 0_mV",
        "0.05, mm, 50.00_mm", "298.15, °C, 25.00_°C", "NaN, mV, not a number", "-0.6, mV, −600.0_mV",
                "10000, s, 1.000_×_10⁴_s",
        "9999.6, s, 1.000_×_10⁴_s", "300, min, 5.000_min",
    })
    void staysInTheUnitAskedFor(double si, String unit, String written) throws UnitException {
        assertThat(Notation.shownIn(si, Unit.parse(unit))).isEqualTo(spaced(written));
    }

    @ParameterizedTest
    @CsvSource({
        "8200, kΩ, 8.2_kΩ",
        "8200, Ω, 8200_Ω",
        "3e-6, µV, 3_µV",
        "0.05, %, 5_%",
        "298.15, °C, 25_°C",
        "24, V, 24_V",
        "-0.0, V, 0_V",
        "1e-7, F, 1_×_10⁻⁷_F",
        "1e-7, nF, 100_nF",
        "1e15, 1, 1_×_10¹⁵",
        "123456789012345, 1, 123456789012345",
        "Infinity, V, ∞_V",
        "0.7853981633974483, °, 45°",
    })
    void showsAStatedValueAsTyped(double si, String unit, String written) throws UnitException {
        assertThat(Notation.plain(si, Unit.parse(unit))).isEqualTo(spaced(written));
    }

    @ParameterizedTest
    @CsvSource({
        "0.1, mV, 0.1_V",
        "5.023456789012345, mV, 5.023456789012345_V",
        "298.15, °C, 298.15_K",
        "1.7976931348623157e308, V, " + "1.7976931348623157_×_10³⁰⁸_V",
        "0.05, %, 0.05",
    })
    void givesAllDigitsInTheCoherentUnit(double si, String unit, String written) throws UnitException {
        assertThat(Notation.full(si, Unit.parse(unit))).isEqualTo(spaced(written));
    }

    @Test
    void doesNotDependOnTheLocale() throws UnitException {
        Locale before = Locale.getDefault();
        try {
            for (String tag : List.of("de-DE", "ar-EG-u-nu-arab", "hi-IN-u-nu-deva", "tr-TR")) {
                Locale.setDefault(Locale.forLanguageTag(tag));
                assertThat(Notation.shown(-1234.5, Unit.parse("V"))).isEqualTo(spaced("−1.235_kV"));
                assertThat(Notation.plain(1234.5, Unit.ONE)).isEqualTo("1234.5");
            }
        } finally {
            Locale.setDefault(before);
        }
    }

    @Test
    void printsAUnitItCannotReadAsItIs() {
        assertThat(Notation.shown(1500, new Unit("turns", Dimension.NONE, 1, 0)))
                .isEqualTo(spaced("1500_turns"));
    }
}
