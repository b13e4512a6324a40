package sill.sheet;

import com.sun.source.tree.CompilationUnitTree;
import com.sun.source.tree.ExpressionStatementTree;
import com.sun.source.tree.MethodTree;
import com.sun.source.tree.StatementTree;
import com.sun.source.tree.VariableTree;
import com.sun.source.util.SourcePositions;
import com.sun.source.util.TreePath;
import com.sun.source.util.TreePathScanner;
import com.sun.source.util.Trees;
import java.io.IOException;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import javax.lang.model.type.TypeMirror;

/** Finds the types of results declared with {@code var} and of bare expressions. */
final class TypeFinder {
    private final Compiler compiler;

    TypeFinder(Compiler compiler) {
        this.compiler = compiler;
    }

    /** Java types by field name, as source text; a field whose type can't be found is missing. */
    Map<String, String> find(Program program) {
        Map<String, String> types = new HashMap<>();
        int open = program.openFields().size();
        // A local of the probe can stand in the way of another's lambda parameter; once it has its type it is a field,
        // and
        // stands aside. So a round that found something is followed by another.
        int known = -1;
        while (types.size() < open && types.size() > known) {
            known = types.size();
            round(program, types);
        }
        return types;
    }

    private void round(Program program, Map<String, String> types) {
        ProbeText probe = new ProbeText(program, types);
        Compiler.Task task = compiler.task(List.of(probe.unit()));
        Trees trees = Trees.instance(task.task());
        SourcePositions positions = trees.getSourcePositions();
        try {
            CompilationUnitTree unit = task.task().parse().iterator().next();
            task.task().analyze();
            new TreePathScanner<Void, Void>() {
                @Override
                public Void visitMethod(MethodTree method, Void nothing) {
                    if (method.getName().contentEquals("all") && method.getBody() != null) {
                        for (StatementTree statement : method.getBody().getStatements()) {
                            String field = probe.slots().get((int) positions.getStartPosition(unit, statement));
                            String type = field == null ? "" : type(trees, getCurrentPath(), statement);
                            if (!type.isEmpty()) {
                                types.put(field, type);
                            }
                        }
                    }
                    return null;
                }
            }.scan(unit, null);
        } catch (IOException e) {
            throw new java.io.UncheckedIOException(e);
        }
    }

    private static String type(Trees trees, TreePath method, StatementTree statement) {
        TypeMirror type = null;
        TreePath path = new TreePath(method, statement);
        if (statement instanceof VariableTree) {
            type = trees.getElement(path).asType();
        } else if (statement instanceof ExpressionStatementTree expression) {
            type = trees.getTypeMirror(new TreePath(path, expression.getExpression()));
        }
        return type == null ? "" : TypeNames.source(type);
    }
}
