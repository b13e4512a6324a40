package sill.sheet;

import java.util.HashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.stream.Stream;

/** Cuts slices out of a translated sheet, statement by statement. */
public final class Slicer {
    private final Program program;
    private final Map<String, String> types;
    private final Dependencies dependencies;
    private final Compiler compiler;

    Slicer(Program program, Map<String, String> types, Dependencies dependencies, Compiler compiler) {
        this.program = program;
        this.types = types;
        this.dependencies = dependencies;
        this.compiler = compiler;
    }

    /** The givens that some results of a tolerance cell rest on, in the order of the worksheet. */
    public List<String> givens(List<Slice.Output> outputs) {
        Set<String> given = new LinkedHashSet<>();
        program.presentGivens().forEach(each -> given.add(each.name()));
        return dependencies.closure(fields(outputs)).stream()
                .filter(given::contains)
                .toList();
    }

    /**
     * The slice in one form; nothing when it does not compile in that form.
     *
     * @param cell the tolerance cell
     * @param outputs what is studied, each a field of that cell
     * @param varied the givens that vary, in the order in which the slice takes them
     */
    public Optional<Slice> slice(int cell, List<Slice.Output> outputs, List<String> varied, Slice.Form form) {
        SlicePlan plan = new SlicePlan(program, types, dependencies, cell, fields(outputs), form);
        SliceText text = new SliceText(program, types, plan, targets(cell), outputs, varied);
        return compiler.compile(text.unit()).map(classes -> new Slice(SliceText.NAME, classes, text.held()));
    }

    /** Whether the code that makes some results has a word. */
    public boolean mentions(int cell, List<Slice.Output> outputs, String word) {
        SlicePlan plan = new SlicePlan(program, types, dependencies, cell, fields(outputs), Slice.Form.FIELDS);
        return Stream.concat(plan.statements().stream(), plan.members().stream())
                .map(snippet ->
                        CodeText.codeOnly(snippet.span().of(snippet.piece().text())))
                .anyMatch(code -> CodeText.word(code, word, 0) >= 0);
    }

    private static List<String> fields(List<Slice.Output> outputs) {
        return outputs.stream().map(Slice.Output::field).toList();
    }

    private Map<String, Snippet> targets(int cell) {
        Map<String, Snippet> targets = new HashMap<>();
        for (Program.CellCode each : program.cells()) {
            if (each.number() == cell) {
                each.fields().forEach(field -> targets.put(field.field(), field.snippet()));
            }
        }
        return targets;
    }
}
