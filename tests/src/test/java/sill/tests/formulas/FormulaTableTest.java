package sill.tests.formulas;

import static org.assertj.core.api.Assertions.assertThat;

import com.fasterxml.jackson.databind.JsonNode;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** Lines of Java and the formulas that their results show, by the table {@code formulas/lines.txt}. */
class FormulaTableTest {
    private static final String GIVENS = """
            sill 1
            title: Formulas
            :: given Values
            vIn = 24 V
            vDrop = 1.5 V
            vOff = -3 mV
            rTop = 10 kΩ
            rBottom = 1 kΩ
            r1 = 4700 Ω
            cFilter = 47 nF
            tDelay = 2 ms
            n = 3
            vMin = 3 V
            vTop = 30 V
            vTiny = 0.000123 V
            tWarm = 25 °C
            tCold = -20 °C
            temps = [-10, 25] °C
            """;

    @TempDir
    static Path folder;

    private static Sheet sheet;

    /** A block of the table; without a formula the line shows its source. */
    record Example(int cell, String java, List<String> sides) {
        boolean showsSource() {
            return sides.equals(List.of("source"));
        }

        @Override
        public String toString() {
            return java.replace("\n", " ") + " " + sides;
        }
    }

    static List<Example> examples() throws IOException {
        List<Example> examples = new ArrayList<>();
        List<String> java = new ArrayList<>();
        List<String> sides = new ArrayList<>();
        List<String> lines = new ArrayList<>(
                Files.readAllLines(Path.of("src/test/resources/formulas/lines.txt"), StandardCharsets.UTF_8));
        lines.add("");
        for (String line : lines) {
            if (line.startsWith("=")) {
                sides.add(line.substring(1).strip());
            } else if (line.isBlank() && !java.isEmpty()) {
                examples.add(new Example(examples.size() + 2, String.join("\n", java), List.copyOf(sides)));
                java.clear();
                sides.clear();
            } else if (!line.startsWith("#") && !line.isBlank()) {
                java.add(line);
            }
        }
        return examples;
    }

    @BeforeAll
    static void run() throws IOException {
        StringBuilder text = new StringBuilder(GIVENS);
        for (Example example : examples()) {
            text.append(":: calc Cell\n").append(example.java()).append("\n");
        }
        Path file = folder.resolve("formulas.sill");
        Files.writeString(file, text);
        sheet = Sheet.run(file, folder);
    }

    @Test
    void theTableIsRead() throws IOException {
        assertThat(examples()).hasSizeGreaterThan(90);
        // Bare numbers beside volts and ohms keep the table short; that they are slips is another matter.
        assertThat(sheet.record().get("problems"))
                .as(sheet.said())
                .allSatisfy(
                        problem -> assertThat(problem.get("message").asText()).contains(" a bare "));
    }

    @ParameterizedTest
    @MethodSource("examples")
    void lineShowsItsFormula(Example example) {
        PageLine line = line(example);
        if (example.showsSource()) {
            assertThat(line.hasFormula()).as(line.own().what()).isFalse();
            assertThat(line.source()).isNotEmpty();
        } else {
            assertThat(equals(line.own().formula())).isEqualTo(example.sides().get(0));
            assertThat(equals(line.own().numbers())).isEqualTo(example.sides().get(1));
        }
    }

    @ParameterizedTest
    @MethodSource("examples")
    void printedNumbersGiveThePrintedResult(Example example) {
        PageLine line = line(example);
        if (!line.hasFormula()
                || example.java().contains("for (int j = 0; j < k")
                || line.own().closed().isEmpty()) {
            return;
        }
        SheetScope scope = new SheetScope(sheet.record());
        scope.define(line.beneath());
        JsonNode exact = sheet.value(line.at()).get("value");
        double value = MathReader.value(line.own().closed(), scope);
        String shown = line.own().shown();
        boolean shows = exact.isBoolean()
                ? (value == 1) == exact.asBoolean()
                : Quantity.of(shown).shows(value) && Quantity.of(shown).shows(exact.asDouble());
        assertThat(shows).as("%s, evaluated: %s", line.own().what(), value).isTrue();
    }

    private static PageLine line(Example example) {
        return sheet.lines().stream()
                .filter(line -> line.at().startsWith(example.cell() + "."))
                .reduce((first, last) -> last)
                .orElseThrow(() -> new AssertionError("no line of " + example + ": " + sheet.said()));
    }

    private static String equals(List<org.jsoup.nodes.Element> side) {
        return Linear.text(side).replaceFirst("^= ", "");
    }
}
