package sill.units;

import static org.assertj.core.api.Assertions.assertThat;

import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.constraints.DoubleRange;
import net.jqwik.api.constraints.IntRange;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class PrintedQuantityTest {
    /** By the prefixes of the SI brochure, 9th edition, table 7; ␣ stands for the no-break space. */
    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            nullValues = "-",
            value = {
                "0.0234567 | V      | 4  | 23.46␣mV          | 23.46   | 0   | mV     | 0.02346",
                "0.0234567 | V      | 6  | 23.4567␣mV        | 23.4567 | 0   | mV     | 0.0234567",
                "-8200     | Ω      | 4  | −8.200␣kΩ         | −8.200  | 0   | kΩ     | -8200",
                "123456    | 1      | 4  | 1.235␣×␣10⁵       | 1.235   | 5   | ''     | 123500",
                "123456    | 1      | 6  | 123456            | 123456  | 0   | ''     | 123456",
                "1.5e-7    | 1      | 2  | 1.5␣×␣10⁻⁷        | 1.5     | -7  | ''     | 1.5e-7",
                "1e-9      | 1/K    | 4  | 1.000␣×␣10⁻⁹␣K⁻¹  | 1.000   | -9  | K⁻¹    | 1e-9",
                "0         | V      | 4  | 0␣V               | 0       | 0   | V      | 0",
                "0.5       | %      | 4  | 50.00␣%           | 50.00   | 0   | %      | 0.5",
                "2         | °      | 4  | 114.6°            | 114.6   | 0   | °      | 2.0001473227855016"
            })
    void printedTextIsTakenApart(
            double si, String unit, int digits, String text, String mantissa, int power, String symbol, double read)
            throws UnitException {
        PrintedQuantity printed = Notation.printed(si, Unit.parse(unit), digits);
        assertThat(printed).isEqualTo(new PrintedQuantity(text.replace('␣', '\u00A0'), mantissa, power, symbol, read));
    }

    @Test
    void whatIsNotFiniteIsText() {
        assertThat(Notation.printed(Double.NaN, Unit.ONE, 4).text()).isEqualTo("not a number");
        assertThat(Notation.printed(Double.NEGATIVE_INFINITY, Unit.ONE, 4).text())
                .isEqualTo("−∞");
    }

    @Property
    void whatIsReadIsTheValueToThePrintedDigits(
            @ForAll @DoubleRange(min = -1e12, max = 1e12) double si, @ForAll @IntRange(min = 1, max = 17) int digits)
            throws UnitException {
        for (String unit : new String[] {"V", "1", "Ω", "V/s", "K", "nV/√Hz"}) {
            PrintedQuantity printed = Notation.printed(si, Unit.parse(unit), digits);
            assertThat(Math.abs(printed.si() - si))
                    .as("%s printed as %s", si, printed.text())
                    .isLessThanOrEqualTo(0.5 * Math.pow(10, 1 - digits) * Math.abs(si) * 1.0001 + Double.MIN_NORMAL);
        }
    }
}
