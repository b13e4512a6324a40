package sill.tests.benchmark;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import sill.sheet.Compiler;
import sill.sheet.SheetSource;
import sill.sheet.Slice;
import sill.sheet.Span;
import sill.sheet.TranslatedSheet;
import sill.sheet.Translation;
import sill.study.Spread;
import sill.study.Varied;

/**
 * A calculation over tolerances, as a worksheet has it. The scenarios are invented.
 *
 * @param givens those that vary
 * @param java the lines of the calculation cell, a statement each
 * @param studied names of the results
 */
record StudySheet(List<Varied> givens, List<String> java, List<String> studied) {
    private static final int CALCULATION = 2;
    private static final int TOLERANCE = 3;
    private static final int LADDER = 16;

    /** A kiln fan's speed switch: seven givens with tolerances, two trip points and their band. */
    static StudySheet tripPoints() {
        Spread uniform = new Spread.Uniform();
        return new StudySheet(
                List.of(
                        new Varied("vSupply", 15, 14.25, 15.75, uniform),
                        new Varied("vRef", 6.2, 6.076, 6.324, uniform),
                        new Varied("rIn", 22e3, 21.78e3, 22.22e3, uniform),
                        new Varied("rFb", 470e3, 465.3e3, 474.7e3, uniform),
                        new Varied("vDrop", 0.9, 0.6, 1.2, new Spread.Triangular()),
                        new Varied("vLow", 0.15, 0, 0.4, uniform),
                        new Varied("vOffset", 0, -0.003, 0.003, new Spread.Normal(3))),
                List.of(
                        "double vHigh = vSupply - vDrop;",
                        "double share = rIn / rFb;",
                        "double vTap = vRef + vOffset;",
                        "double rising = vTap * (1 + share) - vLow * share;",
                        "double falling = vTap * (1 + share) - vHigh * share;",
                        "double band = rising - falling;"),
                List.of("rising", "falling", "band"));
    }

    /** Eight dividers whose outputs are added: sixteen givens, one result. */
    static StudySheet dividers() {
        List<Varied> givens = new ArrayList<>();
        List<String> java = new ArrayList<>();
        StringBuilder sum = new StringBuilder("double sum = ");
        for (int i = 1; i <= LADDER; i++) {
            double nominal = 1000 + 10 * i;
            givens.add(new Varied("r" + i, nominal, nominal * 0.99, nominal * 1.01, new Spread.Uniform()));
            if (i % 2 == 0) {
                java.add("double share" + i / 2 + " = r" + (i - 1) + " / (r" + (i - 1) + " + r" + i + ");");
                sum.append(i == 2 ? "" : " + ").append("share").append(i / 2);
            }
        }
        java.add(sum + ";");
        return new StudySheet(givens, java, List.of("sum"));
    }

    double[] lows() {
        return givens.stream().mapToDouble(Varied::low).toArray();
    }

    double[] highs() {
        return givens.stream().mapToDouble(Varied::high).toArray();
    }

    /**
     * The slice as class files, made as the worker makes it.
     *
     * @param folder where they go
     * @param classPath what worksheets see
     */
    Slice compile(Path folder, List<Path> classPath) throws IOException {
        Translation translation = Translation.of(source(), new Compiler(classPath), StudySheet::lines);
        TranslatedSheet sheet = translation.sheet();
        if (!sheet.problems().isEmpty()) {
            throw new IllegalStateException("the sheet has problems: " + sheet.problems());
        }
        List<Slice.Output> outputs = sheet.steps().stream()
                .filter(TranslatedSheet.Step::study)
                .flatMap(step -> step.results().stream())
                .map(result -> new Slice.Output(result.field(), List.of()))
                .toList();
        List<String> names = givens.stream().map(Varied::name).toList();
        Slice slice = translation
                .slicer()
                .slice(TOLERANCE, outputs, names, Slice.Form.LOCALS)
                .orElseThrow();
        for (Map.Entry<String, byte[]> type : slice.classes().entrySet()) {
            Files.write(folder.resolve(type.getKey() + ".class"), type.getValue());
        }
        return slice;
    }

    private SheetSource source() {
        List<SheetSource.GivenField> fields = new ArrayList<>();
        for (int i = 0; i < givens.size(); i++) {
            fields.add(new SheetSource.GivenField(givens.get(i).name(), SheetSource.GivenType.NUMBER, 1, i + 2, "1"));
        }
        int line = givens.size() + 2;
        String of = String.join(", ", studied);
        List<Span> spans = studied.stream()
                .map(name -> new Span(of.lastIndexOf(name), of.lastIndexOf(name) + name.length()))
                .toList();
        return new SheetSource(
                fields,
                List.of(
                        new SheetSource.CodeCell(CALCULATION, "Calculation", line, String.join("\n", java)),
                        new SheetSource.CodeCell(TOLERANCE, "Tolerances", line + java.size() + 1, of, spans)),
                List.of());
    }

    /** Each line is a snippet. */
    private static List<Span> lines(String source) {
        List<Span> spans = new ArrayList<>();
        int start = 0;
        for (String line : source.split("\n")) {
            if (!line.isBlank()) {
                spans.add(new Span(start, start + line.length()));
            }
            start += line.length() + 1;
        }
        return spans;
    }
}
