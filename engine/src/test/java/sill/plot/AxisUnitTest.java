package sill.plot;

import static org.assertj.core.api.Assertions.assertThat;

import java.math.BigDecimal;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class AxisUnitTest {
    /**
     * Prefixes by the SI brochure, 9th edition, section 3 and table 7: one prefix before the first symbol, none on a unit
     * with an exponent, those of mass formed from the gram. Where it leaves the choice, the range 1 to 999 is common
     * practice, as are no larger prefixes on seconds and kelvins.
     */
    @ParameterizedTest
    @CsvSource({
        "V,      0.0055,   mV",
        "V,      999,      V",
        "V,      1000,     kV",
        "Ω,      2.2e6,    MΩ",
        "F,      4.7e-11,  pF",
        "V/s,    2e6,      MV/s",
        "N·m,    5000,     kN·m",
        "kg,     0.005,    g",
        "kg,     5e-6,     mg",
        "kg/m³,  0.5,      g/m³",
        "s,      0.02,     ms",
        "s,      20000,    s",
        "s,      2e6,      10⁶ s",
        "K,      330,      K",
        "m,      5000,     km",
        "m,      5e6,      10⁶ m",
        "m²,     0.5,      m²",
        "m²,     0.00002,  10⁻⁶ m²",
        "1/K,    0.004,    10⁻³ 1/K",
        "V/√Hz,  1e-8,     nV/√Hz",
        "V,      1e40,     10³⁹ V",
        "V,      0,        V",
    })
    void thePrefixOfAnAxis(String unit, double largest, String expected) {
        assertThat(AxisUnit.forLargest(unit, largest).symbol()).isEqualTo(expected);
    }

    /** ISO 80000-1:2022, 7.1: a quantity divided by its unit, a compound unit in brackets. */
    @Test
    void anAxisIsLabelledByAQuotient() {
        assertThat(AxisUnit.forLargest("V", 0.1).quotient("input voltage")).isEqualTo("input voltage / mV");
        assertThat(AxisUnit.forLargest("V/s", 1).quotient("slew rate")).isEqualTo("slew rate / (V/s)");
        assertThat(AxisUnit.forLargest("1", 3).quotient("gain")).isEqualTo("gain");
        assertThat(AxisUnit.forLargest("1", 2e-6).quotient("ratio")).isEqualTo("ratio / 10⁻⁶");
        assertThat(AxisUnit.forLargest("V", 1).quotient("")).isEqualTo("/ V");
    }

    @Test
    void numbersHaveFixedDecimalsAndATrueMinus() {
        AxisUnit milli = AxisUnit.forLargest("V", 0.5);
        assertThat(milli.number(new BigDecimal("-0.0125"), 1)).isEqualTo("−12.5");
        assertThat(milli.number(BigDecimal.ZERO, 1)).isEqualTo("0.0");
        assertThat(milli.quantity(0.0125)).isEqualTo("12.5\u00A0mV");
        assertThat(milli.quantity(-0.33333333)).isEqualTo("−333.3\u00A0mV");
        assertThat(milli.quantity(0)).isEqualTo("0\u00A0mV");
        assertThat(AxisUnit.forLargest("1", 1).quantity(0.5)).isEqualTo("0.5");
    }
}
