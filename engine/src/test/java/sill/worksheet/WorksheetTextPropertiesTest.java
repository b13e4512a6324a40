package sill.worksheet;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.Comparator;
import java.util.List;
import net.jqwik.api.Arbitraries;
import net.jqwik.api.Arbitrary;
import net.jqwik.api.Combinators;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.Provide;
import sill.units.Notation;
import sill.units.Unit;
import sill.units.UnitException;
import sill.worksheet.Given.Quantity;

/** Any text has a result, and what a record prints is read back to the same number. */
class WorksheetTextPropertiesTest {
    private static final List<String> UNITS = List.of(
            "1", "V", "mV", "kΩ", "µF", "%", "ppm", "°C", "°", "nV/√Hz", "1/K", "ppm/K", "min", "QV", "qA", "mA·h",
            "V/µs", "m²");

    @Provide
    Arbitrary<String> worksheetLikeText() {
        return Arbitraries.of(
                        "sill 1",
                        "title: T",
                        ":: given G",
                        ":: calc C",
                        ":: check C",
                        ":: tolerance T",
                        ":: note N",
                        "x",
                        "=",
                        "5",
                        "V",
                        "±",
                        "%",
                        "[",
                        "]",
                        "..",
                        "~",
                        "normal",
                        "3",
                        "|",
                        "\"",
                        "file",
                        "at least",
                        "within",
                        "equals",
                        "holds",
                        "at worst-case",
                        "in",
                        "of:",
                        "method:",
                        "rss",
                        "monte-carlo 2000 seed 1",
                        "vary:",
                        ",",
                        "(",
                        ")",
                        "°C",
                        "8k2",
                        "Ω",
                        "-",
                        "//",
                        "\n",
                        "\n",
                        "\n",
                        "\r",
                        "\t",
                        "\0",
                        "\ufeff")
                .list()
                .ofMaxSize(60)
                .map(parts -> String.join(" ", parts).replace(" \n ", "\n"));
    }

    @Property(tries = 3000)
    void anyTextHasAResult(@ForAll String text) {
        isSound(Worksheet.parse(text));
    }

    @Property(tries = 5000)
    void anyTextOfItsWordsHasAResult(@ForAll("worksheetLikeText") String text) {
        isSound(Worksheet.parse(text));
        isSound(Worksheet.parse("sill 1\ntitle: T\n" + text));
    }

    private static void isSound(Worksheet sheet) {
        int lines = SourceLine.split(sheet.text()).size();
        assertThat(sheet.problems())
                .isSortedAccordingTo(Comparator.comparingInt(Problem::line).thenComparingInt(Problem::column))
                .allSatisfy(problem -> {
                    assertThat(problem.line()).isBetween(1, Math.max(1, lines));
                    assertThat(problem.column()).isPositive();
                    assertThat(problem.cell()).isBetween(0, sheet.cells().size());
                    assertThat(problem.message())
                            .startsWith("Found ")
                            .contains(", expected ")
                            .doesNotContain("\n", ".\u0000");
                    assertThat(problem.message()).doesNotEndWith(".");
                });
        for (int number = 1; number <= sheet.cells().size(); number++) {
            assertThat(sheet.cells().get(number - 1).number()).isEqualTo(number);
        }
    }

    /** Doubles of every size, and round ones. */
    @Provide
    Arbitrary<Double> numbers() {
        Arbitrary<Long> digits = Arbitraries.oneOf(
                Arbitraries.longs().between(-99_999, 99_999),
                Arbitraries.longs().between(-(1L << 53), 1L << 53));
        return Combinators.combine(digits, Arbitraries.integers().between(-60, 40))
                .as((whole, power) -> Double.parseDouble(whole + "e" + power));
    }

    @Provide
    Arbitrary<String> units() {
        return Arbitraries.of(UNITS);
    }

    @Property(tries = 3000)
    void aStatedValueReadsBackAsPrinted(@ForAll("numbers") double value, @ForAll("units") String symbol)
            throws UnitException {
        Unit unit = Unit.parse(symbol);
        // Below a millikelvin, °C would need more digits than a double has.
        double si = unit.offset() == 0 ? value : Math.max(1e-3, value % 1e6);

        assertThat(read(Notation.plain(si, unit))).isEqualTo(si + 0.0);
        assertThat(read(Notation.full(si, unit))).isEqualTo(si + 0.0);
    }

    @Property(tries = 3000)
    void aShownValueReadsBackToFourDigits(@ForAll("numbers") double value, @ForAll("units") String symbol)
            throws UnitException {
        Unit unit = Unit.parse(symbol);
        double si = unit.offset() == 0 ? value : 273.15 + value % 1e6;
        // Half a unit of the fourth digit, and the rounding of the sum with 273.15 K.
        double step = 5.1e-4 * Math.abs(unit.offset() == 0 ? si : si - 273.15) + 2 * Math.ulp(si);

        assertThat(Math.abs(read(Notation.shown(si, unit)) - si)).isLessThanOrEqualTo(step);
        assertThat(Math.abs(read(Notation.shownIn(si, unit)) - si)).isLessThanOrEqualTo(step);
    }

    private static double read(String printed) {
        Worksheet sheet = Worksheet.parse("sill 1\ntitle: T\n:: given G\nx = " + printed);
        assertThat(sheet.problems()).as(printed).isEmpty();
        return ((Quantity) ((Cell.Givens) sheet.cells().get(0)).givens().get(0).value()).nominal();
    }
}
