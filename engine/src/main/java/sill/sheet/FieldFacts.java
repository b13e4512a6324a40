package sill.sheet;

import com.sun.source.tree.AssignmentTree;
import com.sun.source.tree.BlockTree;
import com.sun.source.tree.CompilationUnitTree;
import com.sun.source.tree.ExpressionStatementTree;
import com.sun.source.tree.ExpressionTree;
import com.sun.source.tree.MethodInvocationTree;
import com.sun.source.tree.StatementTree;
import com.sun.source.tree.VariableTree;
import com.sun.source.util.SourcePositions;
import com.sun.source.util.TreePath;
import com.sun.source.util.TreePathScanner;
import com.sun.source.util.Trees;
import java.util.HashMap;
import java.util.Map;
import javax.lang.model.element.AnnotationMirror;
import javax.lang.model.element.AnnotationValue;
import javax.lang.model.element.Element;
import javax.lang.model.type.TypeMirror;

/**
 * What the attributed tree tells of the statements that give fields their values: the type of the value, and the unit that a
 * helper states for it.
 */
final class FieldFacts extends TreePathScanner<Void, Void> {
    private static final String UNIT = "sill.stdlib.Unit";

    private final Trees trees;
    private final SourcePositions positions;
    private final CompilationUnitTree unit;
    private final Map<Integer, String> slots;
    private final Map<String, String> types = new HashMap<>();
    private final Map<String, String> units = new HashMap<>();

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

    /** Unit symbols by field, where the value is a helper's result. */
    Map<String, String> units() {
        return units;
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
        ExpressionTree value = null;
        TypeMirror type = null;
        if (statement instanceof VariableTree variable) {
            value = variable.getInitializer();
            type = trees.getElement(path).asType();
        } else if (statement instanceof ExpressionStatementTree expression) {
            path = new TreePath(path, expression.getExpression());
            value = expression.getExpression();
            if (value instanceof AssignmentTree assignment) {
                value = assignment.getExpression();
            }
            type = trees.getTypeMirror(path);
        }
        String source = type == null ? "" : TypeNames.source(type);
        if (!source.isEmpty()) {
            types.put(field, source);
        }
        if (value instanceof MethodInvocationTree) {
            Element method = trees.getElement(new TreePath(path, value));
            String symbol = method == null ? "" : unitOf(method);
            if (!symbol.isEmpty()) {
                units.put(field, symbol);
            }
        }
    }

    private static String unitOf(Element method) {
        for (AnnotationMirror annotation : method.getAnnotationMirrors()) {
            if (annotation.getAnnotationType().toString().equals(UNIT)) {
                for (AnnotationValue value : annotation.getElementValues().values()) {
                    String symbol = value.getValue().toString();
                    // A symbol such as "?x" stands for whatever unit the arguments have.
                    return symbol.startsWith("?") ? "" : symbol;
                }
            }
        }
        return "";
    }
}
