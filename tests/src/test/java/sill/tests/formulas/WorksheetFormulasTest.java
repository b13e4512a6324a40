package sill.tests.formulas;

import static org.assertj.core.api.Assertions.assertThat;

import com.fasterxml.jackson.databind.JsonNode;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import java.util.stream.Stream;
import org.junit.jupiter.api.AfterAll;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.TestInstance;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/**
 * Every formula of every worksheet in the project, evaluated as it stands on the page: with the printed numbers it gives the
 * result to the digits shown, with the exact values it gives the exact result.
 */
@TestInstance(TestInstance.Lifecycle.PER_CLASS)
class WorksheetFormulasTest {
    private static final Path WORKSHEETS = Path.of("").toAbsolutePath().resolveSibling("worksheets");

    /** Calls of methods that loop: only the sheet itself can tell their values. */
    private static final List<String> LOOPS = List.of("atChange");

    private final Map<Path, Sheet> runs = new TreeMap<>();
    private int evaluated;

    @TempDir
    static Path folder;

    static List<Path> sheets() throws IOException {
        try (Stream<Path> files = Files.walk(WORKSHEETS)) {
            return files.filter(file -> file.toString().endsWith(".sill"))
                    .sorted(Comparator.naturalOrder())
                    .toList();
        }
    }

    @BeforeAll
    void run() throws IOException {
        for (Path sheet : sheets()) {
            runs.put(sheet, Sheet.run(sheet, folder));
        }
    }

    /** A test that finds nothing to evaluate proves nothing. */
    @AfterAll
    void enoughWasEvaluated() {
        assertThat(runs).hasSizeGreaterThanOrEqualTo(4);
        assertThat(evaluated).as("sides evaluated").isGreaterThan(130);
    }

    @ParameterizedTest
    @MethodSource("sheets")
    void printedNumbersGiveThePrintedResult(Path path) {
        Sheet sheet = runs.get(path);
        SheetScope scope = new SheetScope(sheet.record());
        for (PageLine line : sheet.lines()) {
            scope.define(line.beneath());
            List<PageLine.Equation> all = new ArrayList<>(line.beneath());
            all.add(line.own());
            for (PageLine.Equation equation : all) {
                if (!equation.numbers().isEmpty() && !equation.shown().isEmpty() && !loops(equation)) {
                    double value = MathReader.value(equation.numbers(), scope);
                    assertThat(shows(equation.shown(), value))
                            .as("%s %s: %s, evaluated: %s", path.getFileName(), line.at(), equation.what(), value)
                            .isTrue();
                    evaluated++;
                }
            }
        }
    }

    @ParameterizedTest
    @MethodSource("sheets")
    void formulaWithExactValuesGivesTheExactResult(Path path) {
        Sheet sheet = runs.get(path);
        SheetScope scope = new SheetScope(sheet.record());
        for (PageLine line : sheet.lines()) {
            JsonNode value = sheet.value(line.at()).get("value");
            if (line.hasFormula() && value.isNumber() && !loops(line.own())) {
                scope.define(line.beneath());
                double evaluated = MathReader.value(line.own().formula(), scope);
                double exact = value.asDouble();
                assertThat(Math.abs(evaluated - exact))
                        .as(
                                "%s %s: %s, evaluated: %s",
                                path.getFileName(), line.at(), line.own().what(), evaluated)
                        .isLessThanOrEqualTo(1e-9 * Math.abs(exact));
                this.evaluated++;
            }
        }
    }

    @ParameterizedTest
    @MethodSource("sheets")
    void componentsOfARecordAreWorkedOut(Path path) {
        for (PageLine line : runs.get(path).lines()) {
            if (!line.components().isEmpty()) {
                assertThat(line.beneath())
                        .as("%s %s", path.getFileName(), line.at())
                        .extracting(PageLine.Equation::shown)
                        .containsAll(line.components().values());
            }
        }
    }

    @ParameterizedTest
    @MethodSource("sheets")
    void linesStartWithTheSymbolOfTheirName(Path path) {
        Sheet sheet = runs.get(path);
        for (PageLine line : sheet.lines()) {
            String name = sheet.value(line.at()).path("name").asText();
            if (line.hasFormula() && !name.isEmpty()) {
                assertThat(Linear.text(line.own().name())).isEqualTo(SheetScope.symbolOf(name));
            }
        }
    }

    @Test
    void onlyStreamsTablesAndArraysShowTheirSource() {
        assertThat(runs.values())
                .flatExtracting(Sheet::lines)
                .extracting(PageLine::source)
                .filteredOn(source -> !source.isEmpty())
                .allMatch(source -> source.contains(".column(")
                        || source.contains(".length")
                        || source.contains("->")
                        || source.contains("stream("));
    }

    private static boolean loops(PageLine.Equation equation) {
        return LOOPS.stream().anyMatch(name -> Linear.text(equation.formula()).contains(name + "("));
    }

    private static boolean shows(String printed, double value) {
        return switch (printed) {
            case "true" -> value == 1;
            case "false" -> value == 0;
            default -> Quantity.of(printed).shows(value);
        };
    }
}
