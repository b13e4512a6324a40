package sill.sheet;

import com.sun.source.tree.CompilationUnitTree;
import com.sun.source.util.Trees;
import java.io.IOException;
import java.util.List;
import java.util.Map;
import sill.inference.Inference;
import sill.inference.Inferred;

/**
 * The sheet's class, attributed: what the compiler complains of, and what its one tree tells the readers.
 *
 * @param text the compilation unit
 * @param errors what the compiler complains of, offsets in {@code text}
 * @param usages uses of the sheet's own names
 * @param types types of the bare expressions, by field; {@link ClassText#NO_VALUE} for a call that gives none
 * @param inferred dimensions, and where they don't go together
 * @param known names that every worksheet may use, where there is an error that may be about a misspelt one
 * @param formulas what the values mean as mathematics, by field, as far as they do
 */
record Attribution(
        MappedText text,
        List<Compiler.Complaint> errors,
        List<Usage> usages,
        Map<String, String> types,
        Inferred inferred,
        KnownNames known,
        Map<String, FormulaReader.Formula> formulas) {
    static Attribution of(ClassText classText, Compiler compiler, SheetUnits units) {
        MappedText text = classText.unit();
        Compiler.Task task = compiler.task(List.of(text.toString()));
        try {
            CompilationUnitTree unit = task.task().parse().iterator().next();
            task.task().analyze();
            Trees trees = Trees.instance(task.task());
            UsageScanner scanner = new UsageScanner(trees, unit, text);
            List<Usage> usages = scanner.usages();
            FieldFacts facts = FieldFacts.of(trees, unit, classText.slots());
            Inferred inferred = Inference.of(trees, unit, units.seeds(text, classText.slots()));
            List<Compiler.Complaint> errors = task.errors();
            KnownNames known = errors.isEmpty()
                    ? KnownNames.NONE
                    : KnownNames.in(task.task().getElements());
            return new Attribution(
                    text,
                    errors,
                    usages,
                    facts.types(),
                    inferred,
                    known,
                    Formulas.of(trees, unit, text.toString(), classText.slots()));
        } catch (IOException e) {
            throw new java.io.UncheckedIOException(e);
        }
    }
}
