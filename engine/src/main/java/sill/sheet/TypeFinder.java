package sill.sheet;

import com.sun.source.tree.CompilationUnitTree;
import com.sun.source.util.Trees;
import java.io.IOException;
import java.util.HashMap;
import java.util.List;
import java.util.Map;

/** Finds the types of results declared with {@code var}, which the fields of the sheet's class need. */
final class TypeFinder {
    private final Compiler compiler;

    TypeFinder(Compiler compiler) {
        this.compiler = compiler;
    }

    /** Java types by name, as source text; a result whose type can't be found is missing. */
    Map<String, String> find(Program program) {
        Map<String, String> types = new HashMap<>();
        int open = program.openVariables().size();
        // A local of the probe can stand in the way of another's lambda parameter; once it has its type it is a field,
        // and
        // stands aside. So a round that found something is followed by another.
        int known = -1;
        while (types.size() < open && types.size() > known) {
            known = types.size();
            types.putAll(round(program, types));
        }
        return types;
    }

    private Map<String, String> round(Program program, Map<String, String> types) {
        ProbeText probe = new ProbeText(program, types);
        Compiler.Task task = compiler.task(List.of(probe.unit()));
        try {
            CompilationUnitTree unit = task.task().parse().iterator().next();
            task.task().analyze();
            return FieldFacts.of(Trees.instance(task.task()), unit, probe.slots())
                    .types();
        } catch (IOException e) {
            throw new java.io.UncheckedIOException(e);
        }
    }
}
