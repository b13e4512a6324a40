package sill.sheet;

import com.sun.source.tree.AssignmentTree;
import com.sun.source.tree.ClassTree;
import com.sun.source.tree.CompilationUnitTree;
import com.sun.source.tree.ExpressionStatementTree;
import com.sun.source.tree.ExpressionTree;
import com.sun.source.tree.MethodTree;
import com.sun.source.tree.StatementTree;
import com.sun.source.tree.Tree;
import com.sun.source.tree.VariableTree;
import com.sun.source.util.TreePath;
import com.sun.source.util.Trees;
import java.util.HashMap;
import java.util.Map;
import javax.lang.model.type.TypeMirror;

/** Finds the statements that give fields their values, and what they mean as mathematics. */
final class Formulas {
    private Formulas() {}

    /**
     * What the values mean, by field, as far as they have a meaning.
     *
     * @param text the unit's text
     * @param slots start offsets of the statements, to the names of their fields
     */
    static Map<String, FormulaReader.Formula> of(
            Trees trees, CompilationUnitTree unit, String text, Map<Integer, String> slots) {
        Map<String, FormulaReader.Formula> formulas = new HashMap<>();
        TreePath root = new TreePath(unit);
        for (Tree type : unit.getTypeDecls()) {
            if (type instanceof ClassTree sheet) {
                for (Tree member : sheet.getMembers()) {
                    if (member instanceof MethodTree method && method.getBody() != null) {
                        for (StatementTree statement : method.getBody().getStatements()) {
                            int at = (int) trees.getSourcePositions().getStartPosition(unit, statement);
                            String field = slots.get(at);
                            ExpressionTree value = field == null ? null : value(statement);
                            if (value != null && isShown(trees.getTypeMirror(new TreePath(root, value)))) {
                                FormulaReader.read(trees, root, text, value)
                                        .ifPresent(formula -> formulas.put(field, formula));
                            }
                        }
                    }
                }
            }
        }
        return formulas;
    }

    private static ExpressionTree value(StatementTree statement) {
        if (statement instanceof VariableTree variable) {
            return variable.getInitializer();
        } else if (statement instanceof ExpressionStatementTree expression) {
            return expression.getExpression() instanceof AssignmentTree assignment
                    ? assignment.getExpression()
                    : expression.getExpression();
        }
        return null;
    }

    private static boolean isShown(TypeMirror type) {
        return NumberTypes.isNumber(type) || NumberTypes.isTruth(type) || NumberTypes.isRecord(type);
    }
}
