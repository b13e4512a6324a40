package sill.sheet;

import com.sun.source.tree.AssignmentTree;
import com.sun.source.tree.IdentifierTree;
import com.sun.source.tree.MethodInvocationTree;
import com.sun.source.tree.MethodTree;
import com.sun.source.util.TreePath;
import com.sun.source.util.TreePathScanner;
import com.sun.source.util.Trees;
import java.util.HashMap;
import java.util.Map;
import javax.lang.model.element.AnnotationMirror;
import javax.lang.model.element.AnnotationValue;
import javax.lang.model.element.Element;

/** Finds the units that helpers state for their results, where a result is a helper's result. */
final class HelperUnits extends TreePathScanner<Void, Void> {
    private static final String UNIT = "sill.stdlib.Unit";

    private final Trees trees;
    private final Map<String, String> units = new HashMap<>();

    HelperUnits(Trees trees) {
        this.trees = trees;
    }

    /** Unit symbols by field. */
    Map<String, String> units() {
        return Map.copyOf(units);
    }

    @Override
    public Void visitMethod(MethodTree method, Void nothing) {
        return method.getName().toString().startsWith("$cell") ? super.visitMethod(method, nothing) : null;
    }

    @Override
    public Void visitAssignment(AssignmentTree assignment, Void nothing) {
        if (assignment.getVariable() instanceof IdentifierTree field
                && assignment.getExpression() instanceof MethodInvocationTree call) {
            Element method = trees.getElement(new TreePath(getCurrentPath(), call));
            String unit = method == null ? "" : unit(method);
            if (!unit.isEmpty()) {
                units.put(field.getName().toString(), unit);
            }
        }
        return null;
    }

    private static String unit(Element method) {
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
