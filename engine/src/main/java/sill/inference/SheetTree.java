package sill.inference;

import com.sun.source.tree.ClassTree;
import com.sun.source.tree.CompilationUnitTree;
import com.sun.source.tree.ExpressionTree;
import com.sun.source.tree.MethodTree;
import com.sun.source.tree.ParenthesizedTree;
import com.sun.source.tree.Tree;
import com.sun.source.util.SourcePositions;
import com.sun.source.util.TreePath;
import com.sun.source.util.TreeScanner;
import com.sun.source.util.Trees;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import javax.lang.model.element.Element;
import javax.lang.model.element.Modifier;
import javax.lang.model.type.TypeMirror;

/** The sheet's attributed class: what its trees mean and where they stand. */
final class SheetTree {
    private final Trees trees;
    private final SourcePositions positions;
    private final CompilationUnitTree unit;
    private final TreePath root;
    private final String source;
    private final ClassTree sheet;
    private final Element sheetClass;
    private final Map<Element, MethodTree> bodies = new HashMap<>();

    SheetTree(Trees trees, CompilationUnitTree unit, String source) {
        this.trees = trees;
        this.positions = trees.getSourcePositions();
        this.unit = unit;
        this.root = new TreePath(unit);
        this.source = source;
        this.sheet = (ClassTree) unit.getTypeDecls().get(0);
        this.sheetClass = trees.getElement(new TreePath(root, sheet));
        new TreeScanner<Void, Void>() {
            @Override
            public Void visitMethod(MethodTree method, Void nothing) {
                element(method).ifPresent(element -> bodies.put(element, method));
                return super.visitMethod(method, nothing);
            }
        }.scan(unit, null);
    }

    /** The sheet's own methods, in the order of the text. */
    List<MethodTree> methods() {
        List<MethodTree> methods = new ArrayList<>();
        for (Tree member : sheet.getMembers()) {
            if (member instanceof MethodTree method) {
                methods.add(method);
            }
        }
        return methods;
    }

    /** All methods with a body in this unit, those of the sheet's types too. */
    Map<Element, MethodTree> bodies() {
        return bodies;
    }

    /** What a tree names or declares; empty where the compiler could not tell. */
    Optional<Element> element(Tree tree) {
        return Optional.ofNullable(trees.getElement(new TreePath(root, tree)));
    }

    /** An expression's type; empty where the compiler could not tell. */
    Optional<TypeMirror> type(Tree tree) {
        return Optional.ofNullable(trees.getTypeMirror(new TreePath(root, tree)));
    }

    /** Whether an element is a given or a result. */
    boolean isField(Element element) {
        return element.getKind().isField()
                && element.getModifiers().contains(Modifier.STATIC)
                && element.getEnclosingElement() == sheetClass;
    }

    int start(Tree tree) {
        return (int) positions.getStartPosition(unit, tree);
    }

    int end(Tree tree) {
        return (int) positions.getEndPosition(unit, tree);
    }

    /** Where the operator stands between two operands. */
    int between(Tree left, Tree right) {
        int from = end(left);
        int to = start(right);
        int at = Math.max(from, 0);
        while (at < to) {
            if (source.startsWith("//", at)) {
                at = source.indexOf('\n', at);
            } else if (source.startsWith("/*", at)) {
                at = source.indexOf("*/", at) + 2;
            } else if (!Character.isWhitespace(source.charAt(at))) {
                return at;
            } else {
                at++;
            }
            if (at < from) {
                break;
            }
        }
        return Math.max(start(right), 0);
    }

    static ExpressionTree bare(ExpressionTree expression) {
        ExpressionTree inner = expression;
        while (inner instanceof ParenthesizedTree parentheses) {
            inner = parentheses.getExpression();
        }
        return inner;
    }
}
