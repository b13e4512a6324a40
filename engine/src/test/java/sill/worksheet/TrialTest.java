package sill.worksheet;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import sill.worksheet.Given.Quantity;

class TrialTest {
    private static final Worksheet SHEET = Worksheet.parse("""
            sill 1
            title: T
            :: given G
            vIn = 24 V ± 5 %
            vOff = 0 mV ± 3 mV
            vDrop = 1.5 V [1.2 V .. 1.8 V]
            tAmb = 25 °C ± 10 K
            temps = [-10, 25] °C
            part = "metal film"
            bench = file "a.csv"
            :: calc C
            double x = vIn;
            """);

    private static Given given(Worksheet sheet, String name) {
        return ((Cell.Givens) sheet.cells().get(0))
                .givens().stream()
                        .filter(given -> given.name().equals(name))
                        .findFirst()
                        .orElseThrow();
    }

    @ParameterizedTest
    @CsvSource({
        "vIn, 26 V, 26, 24.7, 27.3",
        "vIn, 26000mV, 26, 24.7, 27.3",
        "vIn, 0, 0, 0, 0",
        "vOff, 10 mV, 0.01, 0.007, 0.013",
        "vDrop, 1.7 V, 1.7, 1.2, 1.8",
        "tAmb, 40 °C, 313.15, 303.15, 323.15",
        "tAmb, 300 K, 300, 290, 310"
    })
    void theToleranceStaysAsStated(String name, String value, double nominal, double low, double high) {
        Quantity quantity =
                (Quantity) given(Trial.override(SHEET, name, value), name).value();

        assertThat(quantity.nominal()).isEqualTo(nominal);
        assertThat(quantity.low()).isEqualTo(low);
        assertThat(quantity.high()).isEqualTo(high);
    }

    @Test
    void listsTextsAndFilesCanBeTried() {
        assertThat(given(Trial.override(SHEET, "temps", "[0, 50] °C"), "temps").value())
                .isEqualTo(given(Worksheet.parse("sill 1\ntitle: T\n:: given G\ntemps = [0, 50] °C"), "temps")
                        .value());
        assertThat(given(Trial.override(SHEET, "part", "carbon"), "part").value())
                .isEqualTo(new Given.Text("carbon"));
        assertThat(given(Trial.override(SHEET, "bench", "file \"b.csv\""), "bench")
                        .value())
                .isEqualTo(new Given.DataFile("b.csv"));
    }

    @Test
    void theRestOfTheSheetStays() {
        Worksheet tried = Trial.override(SHEET, "vIn", "26 V");

        assertThat(tried.cells().get(1)).isEqualTo(SHEET.cells().get(1));
        assertThat(given(tried, "vOff")).isEqualTo(given(SHEET, "vOff"));
        assertThat(tried.text()).isEqualTo(SHEET.text());
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '@',
            value = {
                "vin@26 V@Found the trial name 'vin', expected a given of the worksheet. Did you mean 'vIn'?",
                "x@26 V@Found the trial name 'x', expected a given of the worksheet",
                "vIn@26 A@Trial value of 'vIn': Found '26 A', expected a unit that fits V",
                "vIn@26@Trial value of 'vIn': Found '26', expected a unit that fits V",
                "vIn@26 Vx@Trial value of 'vIn': Found 'Vx', expected a unit such as V, kΩ, µF or ppm/K",
                "vIn@26 V ± 1 %@Trial value of 'vIn': Found '± 1 %', expected the end of the trial value. "
                        + "Its tolerance stays as the worksheet says.",
                "vDrop@2 V@Trial value of 'vDrop': Found '2 V', expected a value within its limits, from 1.2 V to 1.8 V. "
                        + "Change the limits in the worksheet.",
                "tAmb@0@Trial value of 'tAmb': Found '0', expected a unit that fits °C",
                "temps@[1, 2] V@Trial value of 'temps': Found '[1, 2] V', expected a value like the worksheet's",
                "temps@5 °C@Trial value of 'temps': Found '5 °C', expected a value like the worksheet's",
                "bench@\"b.csv\"@Trial value of 'bench': Found '\"b.csv\"', expected a value like the worksheet's",
            })
    void refusesWhatDoesNotFit(String name, String value, String message) {
        assertThatThrownBy(() -> Trial.override(SHEET, name, value))
                .isInstanceOf(IllegalArgumentException.class)
                .extracting(e -> e.getMessage().replace('\u00a0', ' '))
                .isEqualTo(message);
    }
}
