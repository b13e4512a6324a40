package sill.units;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.catchThrowableOfType;

import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.MethodSource;
import org.junit.jupiter.params.provider.ValueSource;

class UnitTest {
    static List<String[]> units() {
        return PublishedTable.rows("si-units.tsv", 5);
    }

    static List<String[]> prefixes() {
        return PublishedTable.rows("si-prefixes.tsv", 3);
    }

    @ParameterizedTest
    @MethodSource("units")
    void isWhatTheSiBrochureSays(String symbol, String baseUnits, double factor, double offset, String source)
            throws UnitException {
        Unit unit = Unit.parse(symbol);

        assertThat(unit.dimension()).as(source).isEqualTo(Unit.parse(baseUnits).dimension());
        assertThat(unit.factor()).as(source).isEqualTo(factor);
        assertThat(unit.offset()).as(source).isEqualTo(offset);
    }

    @ParameterizedTest
    @MethodSource("prefixes")
    void prefixMultiplies(String prefix, int power, String source) throws UnitException {
        assertThat(Unit.parse(prefix + "V").factor()).as(source).isEqualTo(Double.parseDouble("1e" + power));
        assertThat(Unit.parse("1/" + prefix + "V").factor()).as(source).isEqualTo(Double.parseDouble("1e" + -power));
        assertThat(Unit.parse(prefix + "m^2").factor()).as(source).isEqualTo(Double.parseDouble("1e" + 2 * power));
    }

    @ParameterizedTest
    @CsvSource({
        "kohm, kΩ",
        "MOhm, MΩ",
        "\u2126, Ω",
        "k\u2126, kΩ",
        "uF, µF",
        "\u03bcF, µF",
        "µF, µF",
        "degC, °C",
        "\u2103, °C",
        "deg, °",
        "l, L",
        "V*s, V·s",
        "V s, V·s",
        "V\u22c5s, V·s",
        "m^2, m²",
        "s^-1, s⁻¹",
        "m^12, m¹²",
        "nV/sqrt(Hz), nV/√Hz",
        "nV/Hz^(1/2), nV/√Hz",
        "W/(m*K), W/(m·K)",
        "W / (m K), W/(m·K)",
        "sqrt(V*s), √V·√s",
        "1, 1",
        "1/K, 1/K",
        "(V/s), V/s",
        "V/(V/A), V·A/V",
        "Hz^(3/2), Hz^(3/2)"
    })
    void isSpelledAsInTheSi(String typed, String symbol) throws UnitException {
        assertThat(Unit.parse(typed).symbol()).isEqualTo(symbol);
        assertThat(Unit.parse(symbol)).isEqualTo(Unit.parse(typed));
    }

    @ParameterizedTest
    @CsvSource({
        "m, m, 1",
        "mm, m, 0.001",
        "min, s, 60",
        "ms, s, 0.001",
        "Pa, Pa, 1",
        "pA, A, 1e-12",
        "PA, A, 1e15",
        "cd, cd, 1",
        "T, T, 1",
        "TT, T, 1e12",
        "d, s, 86400",
        "dm, m, 0.1",
        "dam, m, 10",
        "h, s, 3600",
        "hm, m, 100",
        "F, F, 1",
        "fF, F, 1e-15",
        "mol, mol, 1",
        "mmol, mol, 0.001",
        "kg, kg, 1",
        "mg, kg, 1e-6",
        "Gg, kg, 1e6",
        "lm, cd, 1",
        "nm, m, 1e-9",
        "mT, T, 0.001",
        "kat, kat, 1",
        "mA·h, C, 3.6",
        "V/µs, V/s, 1e6",
        "ppm/K, 1/K, 1e-6",
        "mV/°C, V/K, 0.001",
        "nV/√kHz, V/√Hz, 3.1622776601683794e-11",
        "kV·mA, W, 1",
        "km/h, m/s, 0.2777777777777778"
    })
    void readsWholeUnitsBeforePrefixes(String symbol, String coherent, double factor) throws UnitException {
        Unit unit = Unit.parse(symbol);

        assertThat(unit.coherent().symbol()).isEqualTo(coherent);
        assertThat(unit.factor()).isEqualTo(factor);
    }

    @ParameterizedTest
    @ValueSource(
            strings = {
                "V", "A", "Ω", "W", "J", "C", "F", "H", "S", "Hz", "s", "K", "m", "kg", "N", "Pa", "T", "Wb", "mol",
                "cd", "lx", "kat", "V/s", "A/s", "V/√Hz", "A/√Hz", "V²/Hz", "√Hz", "1/√Hz", "Hz/V", "1/K", "V/K", "Ω/K",
                "K/W", "J/K", "V/m", "Ω·m", "m/s", "m/s²", "m²", "V²", "W/(m·K)", "√V", "1"
            })
    void coherentUnitIsTheUsualOne(String symbol) throws UnitException {
        Unit unit = Unit.parse(symbol);

        assertThat(unit.coherent()).isEqualTo(new Unit(symbol, unit.dimension(), 1, 0));
    }

    @Test
    void celsiusIsATemperatureAloneAndADifferenceElsewhere() throws UnitException {
        assertThat(Unit.parse("°C").toSi(25)).isEqualTo(298.15);
        assertThat(Unit.parse("°C").fromSi(298.15)).isEqualTo(25);
        assertThat(Unit.parse("ppm/°C").toSi(25)).isEqualTo(25e-6);
        assertThat(Unit.parse("1/°C").offset()).isZero();
        assertThat(Unit.parse("°C").coherent()).isEqualTo(Unit.parse("K"));
    }

    @Test
    void convertsTheDecimalDigits() throws UnitException {
        // 3 * 1e-6 and 0.7 * 1e-6 miss the nearest double.
        assertThat(Unit.parse("µV").toSi(3)).isEqualTo(3e-6);
        assertThat(Unit.parse("ppm").toSi(0.7)).isEqualTo(0.7e-6);
        assertThat(Unit.parse("µV").fromSi(3e-6)).isEqualTo(3);
        assertThat(Unit.parse("QV").toSi(1e300)).isInfinite();
        assertThat(Unit.parse("mV").toSi(Double.NaN)).isNaN();
        assertThat(Unit.parse("mV").fromSi(Double.NEGATIVE_INFINITY)).isEqualTo(Double.NEGATIVE_INFINITY);
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '@',
            value = {
                "''@0@Found nothing, expected a unit such as V, kΩ, µF or ppm/K@''",
                "Vx@0@Found 'Vx', expected a unit such as V, kΩ, µF or ppm/K@''",
                "V/KHz@2@Found 'KHz', expected a unit such as V, kΩ, µF or ppm/K@Did you mean 'kHz'?",
                "mAh@0@Found 'mAh', expected a unit such as V, kΩ, µF or ppm/K@Write 'mA·h'.",
                "n@0@Found 'n', expected a unit such as V, kΩ, µF or ppm/K@A prefix needs its unit, such as 'nV'.",
                "m2@0@Found 'm2', expected a unit such as V, kΩ, µF or ppm/K@Write a power as 'm^2'.",
                "degF@0@Found 'degF', expected a unit such as V, kΩ, µF or ppm/K@Convert the value to °C or K.",
                "m°C@0@Found 'm°C', expected a unit such as V, kΩ, µF or ppm/K@Did you mean '°C'?",
                "kmin@0@Found 'kmin', expected a unit such as V, kΩ, µF or ppm/K@Did you mean 'min'?",
                "mµF@0@Found 'mµF', expected a unit such as V, kΩ, µF or ppm/K@Did you mean 'mF'?",
                "dBV@0@Found 'dBV', expected a linear unit@Write the level as a plain value or ratio; 20 dB between voltages is 10.",
                "V/s/s@3@Found '/s', expected one factor after '/'@Put the whole denominator in brackets, such as 'W/(m·K)'.",
                "V/s A@4@Found 'A', expected one factor after '/'@Put the whole denominator in brackets, such as 'W/(m·K)'.",
                "V/@2@Found the end after 'V/', expected a unit such as V, kΩ, µF or ppm/K@''",
                "(V@0@Found '(' without its ')', expected both brackets@''",
                "(V^2;@4@Found ';', expected a unit such as V, kΩ, µF or ppm/K@''",
                "V)@1@Found ')', expected a unit such as V, kΩ, µF or ppm/K@''",
                "1 V@0@Found '1 V', expected a unit such as V, kΩ, µF or ppm/K@''",
                "m^100@2@Found '100', expected an exponent from 1 to 99, positive or negative@"
                        + "Write powers as 'm²', 'm^2' or 's^-1' and roots as '√Hz' or 'sqrt(Hz)'.",
                "m^(1/0)@5@Found '0)', expected an exponent from 1 to 99, positive or negative@"
                        + "Write powers as 'm²', 'm^2' or 's^-1' and roots as '√Hz' or 'sqrt(Hz)'.",
                "m⁻@1@Found '⁻', expected an exponent from 1 to 99, positive or negative@"
                        + "Write powers as 'm²', 'm^2' or 's^-1' and roots as '√Hz' or 'sqrt(Hz)'.",
                "Qm^99@0@Found 'Qm^99', expected a unit of a size that a double can hold@''",
            })
    void saysWhatIsWrong(String text, int position, String message, String hint) {
        UnitException problem = catchThrowableOfType(UnitException.class, () -> Unit.parse(text));

        assertThat(problem.getMessage()).isEqualTo(message);
        assertThat(problem.hint()).isEqualTo(hint);
        assertThat(problem.position()).isEqualTo(position);
        assertThat(problem.getMessage()).isEqualTo("Found " + problem.found() + ", expected " + problem.expected());
    }

    @Test
    void refusesWhatNoUnitIsAsLongAs() {
        assertThatThrownBy(() -> Unit.parse("(".repeat(100_000)))
                .isInstanceOf(UnitException.class)
                .hasMessage("Found '" + "(".repeat(40) + "…', expected a unit of at most 100 characters");
        assertThat(Unit.isUnit("(".repeat(99))).isFalse();
        assertThat(Unit.isUnit("kΩ")).isTrue();
    }
}
