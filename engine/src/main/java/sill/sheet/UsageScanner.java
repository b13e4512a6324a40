package sill.sheet;

import com.sun.source.tree.ArrayAccessTree;
import com.sun.source.tree.AssignmentTree;
import com.sun.source.tree.ClassTree;
import com.sun.source.tree.CompilationUnitTree;
import com.sun.source.tree.CompoundAssignmentTree;
import com.sun.source.tree.ExpressionStatementTree;
import com.sun.source.tree.ExpressionTree;
import com.sun.source.tree.IdentifierTree;
import com.sun.source.tree.LambdaExpressionTree;
import com.sun.source.tree.MemberSelectTree;
import com.sun.source.tree.MethodInvocationTree;
import com.sun.source.tree.MethodTree;
import com.sun.source.tree.ParenthesizedTree;
import com.sun.source.tree.Tree;
import com.sun.source.tree.UnaryTree;
import com.sun.source.util.SourcePositions;
import com.sun.source.util.TreePath;
import com.sun.source.util.TreePathScanner;
import com.sun.source.util.Trees;
import java.util.ArrayList;
import java.util.IdentityHashMap;
import java.util.List;
import java.util.Map;
import javax.lang.model.element.Element;
import javax.lang.model.element.ElementKind;
import javax.lang.model.element.TypeElement;
import javax.lang.model.type.DeclaredType;
import javax.lang.model.type.TypeKind;
import javax.lang.model.type.TypeMirror;

/** Collects where the attributed class uses the sheet's own names. The scan's argument: whether the code may run later. */
final class UsageScanner extends TreePathScanner<Void, Boolean> {
    private final Trees trees;
    private final SourcePositions positions;
    private final CompilationUnitTree unit;
    private final MappedText text;
    private final Map<Tree, Usage.How> targets = new IdentityHashMap<>();
    private final List<Usage> usages = new ArrayList<>();

    UsageScanner(Trees trees, CompilationUnitTree unit, MappedText text) {
        this.trees = trees;
        this.positions = trees.getSourcePositions();
        this.unit = unit;
        this.text = text;
    }

    List<Usage> usages() {
        scan(unit, false);
        return List.copyOf(usages);
    }

    @Override
    public Void visitIdentifier(IdentifierTree identifier, Boolean deferred) {
        Element element = trees.getElement(getCurrentPath());
        Element owner = element == null ? null : element.getEnclosingElement();
        if (owner != null
                && owner.getSimpleName().contentEquals(ClassText.NAME)
                && owner.getKind().isClass()) {
            // A helper's field is written to by the class itself, not by the author.
            MappedText.Origin origin = text.origin((int) positions.getStartPosition(unit, identifier));
            Usage.How how = targets.getOrDefault(identifier, Usage.How.READ);
            if (how == Usage.How.ALTERED && !canBeAltered(element.asType())) {
                how = Usage.How.READ;
            }
            usages.add(new Usage(
                    element.getSimpleName().toString(), kind(element), how, origin.piece(), origin.offset(), deferred));
        }
        return null;
    }

    private static Usage.Kind kind(Element element) {
        if (element.getKind() == ElementKind.METHOD) {
            return Usage.Kind.METHOD;
        }
        return element.getKind().isField() ? Usage.Kind.VALUE : Usage.Kind.TYPE;
    }

    @Override
    public Void visitAssignment(AssignmentTree assignment, Boolean deferred) {
        target(assignment.getVariable());
        return super.visitAssignment(assignment, deferred);
    }

    @Override
    public Void visitCompoundAssignment(CompoundAssignmentTree assignment, Boolean deferred) {
        target(assignment.getVariable());
        return super.visitCompoundAssignment(assignment, deferred);
    }

    @Override
    public Void visitUnary(UnaryTree unary, Boolean deferred) {
        switch (unary.getKind()) {
            case PREFIX_INCREMENT, PREFIX_DECREMENT, POSTFIX_INCREMENT, POSTFIX_DECREMENT ->
                target(unary.getExpression());
            default -> {
                // Other operators only read.
            }
        }
        return super.visitUnary(unary, deferred);
    }

    @Override
    public Void visitExpressionStatement(ExpressionStatementTree statement, Boolean deferred) {
        if (statement.getExpression() instanceof MethodInvocationTree call) {
            mayAlter(call.getMethodSelect());
            // A call that gives a value is made for it, or, as list.add(x), for what it is called on.
            TypeMirror value = trees.getTypeMirror(new TreePath(getCurrentPath(), call));
            if (value != null && value.getKind() == TypeKind.VOID) {
                call.getArguments().forEach(this::mayAlter);
            }
        }
        return super.visitExpressionStatement(statement, deferred);
    }

    @Override
    public Void visitLambdaExpression(LambdaExpressionTree lambda, Boolean deferred) {
        return super.visitLambdaExpression(lambda, true);
    }

    @Override
    public Void visitMethod(MethodTree method, Boolean deferred) {
        boolean generated = method.getName().toString().startsWith("$");
        return super.visitMethod(method, !generated || deferred);
    }

    @Override
    public Void visitClass(ClassTree type, Boolean deferred) {
        boolean sheet = type.getSimpleName().contentEquals(ClassText.NAME);
        return super.visitClass(type, !sheet || deferred);
    }

    private void target(ExpressionTree variable) {
        ExpressionTree inner = bare(variable);
        if (inner instanceof IdentifierTree) {
            targets.put(inner, Usage.How.ASSIGNED);
        } else {
            mayAlter(inner);
        }
    }

    /** Marks the name at the root of a chain of selections, calls and element accesses. */
    private void mayAlter(ExpressionTree expression) {
        ExpressionTree inner = bare(expression);
        while (!(inner instanceof IdentifierTree)) {
            if (inner instanceof MemberSelectTree select) {
                inner = bare(select.getExpression());
            } else if (inner instanceof MethodInvocationTree call) {
                inner = bare(call.getMethodSelect());
            } else if (inner instanceof ArrayAccessTree access) {
                inner = bare(access.getExpression());
            } else {
                return;
            }
        }
        targets.putIfAbsent(inner, Usage.How.ALTERED);
    }

    /** Numbers, texts, records and enum constants stay what they are, whatever they are handed to. */
    private static boolean canBeAltered(TypeMirror type) {
        if (!(type instanceof DeclaredType declared)) {
            return !type.getKind().isPrimitive();
        }
        TypeElement element = (TypeElement) declared.asElement();
        String name = element.getQualifiedName().toString();
        return element.getKind() != ElementKind.RECORD
                && element.getKind() != ElementKind.ENUM
                && !name.startsWith("java.math.")
                && !(name.startsWith("java.lang.") && !name.startsWith("java.lang.StringBu"));
    }

    private static ExpressionTree bare(ExpressionTree expression) {
        ExpressionTree inner = expression;
        while (inner instanceof ParenthesizedTree parentheses) {
            inner = parentheses.getExpression();
        }
        return inner;
    }
}
