package sill.worker;

import static org.assertj.core.api.Assertions.assertThat;

import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.stream.Stream;
import org.junit.jupiter.api.AfterAll;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.DynamicTest;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.TestFactory;
import sill.sheet.Compiler;
import sill.sheet.TranslatedSheet;
import sill.sheet.Translation;
import sill.worksheet.Problem;
import sill.worksheet.Worksheet;

/** Units that go together pass in silence, others are told: every row of {@code units/unit-slips.txt}. */
class UnitSlipsTest {
    private static final int FINE = 88;
    private static final int SLIPS = 113;
    private static final Map<String, byte[]> FILES =
            Map.of("bench.csv", "t [ms],v [mV],raw,note\n0,1,2,a\n1,2,3,b\n".getBytes(StandardCharsets.UTF_8));

    private static Compiler compiler;
    private static Evaluator evaluator;

    @BeforeAll
    static void start() {
        compiler = Sheets.compiler();
        evaluator = new Evaluator(Sheets.classPath());
    }

    @AfterAll
    static void stop() {
        evaluator.close();
    }

    @Test
    void everyRowIsSeen() {
        List<UnitRow> rows = UnitRow.all();
        assertThat(rows.stream().filter(UnitRow::fine)).hasSize(FINE);
        assertThat(rows.stream().filter(row -> !row.fine())).hasSize(SLIPS);
        assertThat(rows).extracting(UnitRow::name).doesNotHaveDuplicates();
    }

    @TestFactory
    Stream<DynamicTest> rows() {
        return UnitRow.all().stream()
                .map(row -> DynamicTest.dynamicTest(row.toString(), () -> {
                    TranslatedSheet sheet = translated(row.code());
                    assertThat(row.fine() ? fine(sheet) : slips(sheet)).isEqualTo(row.expected());
                }));
    }

    private static TranslatedSheet translated(String text) {
        Worksheet worksheet = Worksheet.parse(text);
        assertThat(worksheet.problems()).isEmpty();
        GivenValues givens = GivenValues.of(JobWriter.job(worksheet, FILES, Set.of()));
        return Translation.of(givens.source(), compiler, evaluator.splitter()).sheet();
    }

    /** The units of the results; a problem where there should be none is told in their place. */
    private static String fine(TranslatedSheet sheet) {
        return sheet.problems().isEmpty() ? units(sheet) : slips(sheet);
    }

    private static String units(TranslatedSheet sheet) {
        List<String> units = new ArrayList<>();
        for (TranslatedSheet.Step step : sheet.steps()) {
            for (TranslatedSheet.ResultField result : step.results()) {
                String name = result.name().isEmpty() ? "-" : result.name();
                if (result.componentUnits().isEmpty()) {
                    units.add(name + ": " + (result.unit().isEmpty() ? "?" : result.unit()));
                }
                result.componentUnits().forEach((part, unit) -> units.add(name + "." + part + ": " + unit));
            }
        }
        return String.join(", ", units);
    }

    private static String slips(TranslatedSheet sheet) {
        List<String> told = new ArrayList<>();
        for (Problem problem : sheet.problems()) {
            told.add(problem.line() + ":" + problem.column() + " " + problem.message());
            if (!problem.hint().isEmpty()) {
                told.add("  mend: " + problem.hint());
            }
        }
        return String.join("\n", told);
    }
}
