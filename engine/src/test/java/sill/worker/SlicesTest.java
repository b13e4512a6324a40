package sill.worker;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.io.InputStream;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import sill.sheet.Slice;
import sill.sheet.Slicer;
import sill.sheet.TranslatedSheet;
import sill.sheet.Translation;
import sill.values.Result;
import sill.worksheet.Worksheet;

/** Every sheet of {@code spec/slices.txt}: the slice gives what the cells gave, at the nominal point and beside it. */
class SlicesTest {
    private static final int SHEETS = 16;
    private static final List<String> VARIED = List.of("vSupply", "rTop", "rBottom");

    record Sheet(String form, String name, String java, String of) {
        String text(double vSupply, double rTop) {
            return "sill 1\ntitle: T\n:: given G\nvSupply = " + vSupply + " ± 5 %\nrTop = " + rTop
                    + " ± 1 %\nrBottom = 6000 ± 1 %\ngain = 2\nsteps = [1, 2, 3]\n:: calc C\n" + java
                    + "\n:: tolerance T\nof: " + of + "\nmethod: worst-case\n";
        }

        @Override
        public String toString() {
            return name;
        }
    }

    static Stream<Sheet> sheets() throws IOException {
        try (InputStream in = SlicesTest.class.getResourceAsStream("/spec/slices.txt")) {
            String[] parts = new String(in.readAllBytes(), StandardCharsets.UTF_8).split("(?m)^--- ");
            return Arrays.stream(parts).skip(1).map(SlicesTest::sheet);
        }
    }

    private static Sheet sheet(String part) {
        String[] lines = part.strip().split("\n");
        String[] head = lines[0].split(" ", 2);
        String last = lines[lines.length - 1];
        assertThat(last).startsWith("of: ");
        String java = String.join("\n", List.of(lines).subList(1, lines.length - 1));
        return new Sheet(head[0], head[1], java, last.substring(4));
    }

    @Test
    void everySheetIsSeen() throws IOException {
        assertThat(sheets()).hasSize(SHEETS);
    }

    @ParameterizedTest
    @MethodSource("sheets")
    void aSliceGivesWhatTheCellsGive(Sheet sheet) throws ReflectiveOperationException {
        try (Evaluator evaluator = new Evaluator(Sheets.classPath())) {
            Run nominal = new Run(sheet.text(9, 3000), evaluator);
            if (sheet.form().equals("-")) {
                assertThat(nominal.agreeing()).isEmpty();
                return;
            }
            assertThat(nominal.firstForm()).isEqualTo(Optional.of(Slice.Form.valueOf(sheet.form())));
            double[] slice = new double[nominal.nominal().length];
            nominal.agreeing().orElseThrow().newInstance().accept(new double[] {9.5, 2900, 6000}, slice);
            try (Evaluator second = new Evaluator(Sheets.classPath())) {
                assertThat(slice).containsExactly(new Run(sheet.text(9.5, 2900), second).nominal());
            }
        }
    }

    /** A sheet, run, and its one tolerance cell. */
    private static final class Run {
        private final List<Double> nominal = new ArrayList<>();
        private final List<Slice.Output> outputs = new ArrayList<>();
        private final GivenValues givens;
        private final Slicer slicer;

        Run(String text, Evaluator evaluator) throws ReflectiveOperationException {
            Worksheet worksheet = Worksheet.parse(text);
            assertThat(worksheet.problems()).isEmpty();
            givens = GivenValues.of(JobWriter.job(worksheet, Map.of(), Set.of()));
            Translation translation = Translation.of(givens.source(), Sheets.compiler(), evaluator.splitter());
            TranslatedSheet sheet = translation.sheet();
            Class<?> code = evaluator.evaluate(sheet).sheet();
            givens.set(code);
            List<Result> results = new ArrayList<>();
            List<TranslatedSheet.ResultField> fields = new ArrayList<>();
            Studies studies = (step, found) -> {
                results.addAll(found);
                fields.addAll(step.results());
                return new Studies.Outcome(List.of(), List.of());
            };
            new StepRunner(sheet, code, Set.of(), new CapturedOutput(), studies, report -> {}).run(givens.present());
            assertThat(results).isNotEmpty();
            for (Result result : results) {
                List<StudyTarget> targets = StudyTarget.of(result, "");
                targets.forEach(target -> nominal.add(target.nominal()));
                outputs.add(StudyTarget.output(fields.get(result.index() - 1), targets));
            }
            slicer = translation.slicer();
        }

        double[] nominal() {
            return nominal.stream().mapToDouble(Double::doubleValue).toArray();
        }

        Optional<SliceCode> agreeing() {
            return SliceCode.agreeing(slicer, 3, outputs, VARIED, givens.values(), nominal());
        }

        /** The form that serves, found by asking for each alone. */
        Optional<Slice.Form> firstForm() {
            for (Slice.Form form : Slice.Form.values()) {
                Optional<Slice> slice = slicer.slice(3, outputs, VARIED, form);
                if (slice.isPresent()
                        && new SliceCode(slice.get(), givens.values()).gives(new double[] {9, 3000, 6000}, nominal())) {
                    return Optional.of(form);
                }
            }
            return Optional.empty();
        }
    }
}
