package sill.sheet;

import com.sun.source.tree.BlockTree;
import com.sun.source.tree.CompilationUnitTree;
import com.sun.source.tree.ExpressionStatementTree;
import com.sun.source.tree.StatementTree;
import com.sun.source.tree.VariableTree;
import com.sun.source.util.SourcePositions;
import com.sun.source.util.TreePath;
import com.sun.source.util.TreePathScanner;
import com.sun.source.util.Trees;
import java.util.HashMap;
import java.util.Map;
import javax.lang.model.type.TypeMirror;

/** What the attributed tree tells of the statements that give fields their values: the type of the value. */
final class FieldFacts extends TreePathScanner<Void, Void> {
    private final Trees trees;
    private final SourcePositions positions;
    private final CompilationUnitTree unit;
    private final Map<Integer, String> slots;
    private final Map<String, String> types = new HashMap<>();

    private FieldFacts(Trees trees, CompilationUnitTree unit, Map<Integer, String> slots) {
        this.trees = trees;
        this.positions = trees.getSourcePositions();
        this.unit = unit;
        this.slots = slots;
    }

    /**
     * Reads a unit.
     *
     * @param slots start offsets of the statements, to the names of their fields
     */
    static FieldFacts of(Trees trees, CompilationUnitTree unit, Map<Integer, String> slots) {
        FieldFacts facts = new FieldFacts(trees, unit, slots);
        facts.scan(unit, null);
        return facts;
    }

    /** Types by field, as source text; a field whose type can't be told is missing. */
    Map<String, String> types() {
        return types;
    }

    @Override
    public Void visitBlock(BlockTree block, Void nothing) {
        for (StatementTree statement : block.getStatements()) {
            String field = slots.get((int) positions.getStartPosition(unit, statement));
            if (field != null) {
                take(field, statement);
            }
        }
        // Only the statements of the cells' own methods are slots: there is nothing further inside.
        return null;
    }

    private void take(String field, StatementTree statement) {
        TreePath path = new TreePath(getCurrentPath(), statement);
        TypeMirror type = null;
        if (statement instanceof VariableTree variable) {
            type = trees.getElement(path).asType();
        } else if (statement instanceof ExpressionStatementTree expression) {
            path = new TreePath(path, expression.getExpression());
            type = trees.getTypeMirror(path);
        }
        String source = type == null ? "" : TypeNames.source(type);
        if (!source.isEmpty()) {
            types.put(field, source);
        }
    }
}
