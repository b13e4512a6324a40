package sill.sheet;

import com.sun.source.tree.BinaryTree;
import com.sun.source.tree.BlockTree;
import com.sun.source.tree.ClassTree;
import com.sun.source.tree.CompilationUnitTree;
import com.sun.source.tree.LambdaExpressionTree;
import com.sun.source.tree.MemberSelectTree;
import com.sun.source.tree.MethodInvocationTree;
import com.sun.source.tree.MethodTree;
import com.sun.source.tree.NewClassTree;
import com.sun.source.tree.ReturnTree;
import com.sun.source.tree.StatementTree;
import com.sun.source.tree.Tree;
import com.sun.source.util.SourcePositions;
import com.sun.source.util.TreeScanner;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;

/** What the translation wants to know of a parsed snippet's inside: calls, method bodies, a stray {@code return}. */
final class SnippetShape extends TreeScanner<Void, Boolean> {
    private final CompilationUnitTree unit;
    private final SourcePositions positions;
    private final String codeOnly;
    private final int shift;
    private final List<MappedText.Break> calls = new ArrayList<>();
    private final List<Span> bodies = new ArrayList<>();
    private int strayReturn = -1;

    /**
     * @param codeOnly the piece, masked
     * @param shift from a position in the unit to an offset in the piece
     */
    SnippetShape(CompilationUnitTree unit, SourcePositions positions, String codeOnly, int shift) {
        this.unit = unit;
        this.positions = positions;
        this.codeOnly = codeOnly;
        this.shift = shift;
    }

    List<MappedText.Break> calls() {
        calls.sort(Comparator.comparingInt(MappedText.Break::at));
        return List.copyOf(calls);
    }

    List<Span> bodies() {
        return List.copyOf(bodies);
    }

    /** Offset of a {@code return} outside any method or lambda, or -1. */
    int strayReturn() {
        return strayReturn;
    }

    int start(Tree tree) {
        return (int) positions.getStartPosition(unit, tree) + shift;
    }

    int end(Tree tree) {
        return (int) positions.getEndPosition(unit, tree) + shift;
    }

    Span span(Tree tree) {
        return new Span(start(tree), end(tree));
    }

    /** The argument of every visit: whether a {@code return} belongs to a method or lambda of the snippet. */
    void look(Tree tree) {
        // The snippet itself starts on a line of its own.
        tree.accept(this, false);
    }

    @Override
    public Void scan(Tree tree, Boolean inside) {
        // The compiler numbers the lines of statements too; several may stand on one.
        if (tree instanceof StatementTree && !(tree instanceof BlockTree)) {
            calls.add(new MappedText.Break(start(tree), start(tree)));
        }
        return super.scan(tree, inside);
    }

    @Override
    public Void visitMethodInvocation(MethodInvocationTree call, Boolean inside) {
        int end = end(call.getMethodSelect());
        int name = call.getMethodSelect() instanceof MemberSelectTree select
                ? end - select.getIdentifier().length()
                : start(call.getMethodSelect());
        calls.add(new MappedText.Break(end, name));
        return super.visitMethodInvocation(call, inside);
    }

    @Override
    public Void visitNewClass(NewClassTree creation, Boolean inside) {
        if (creation.getEnclosingExpression() == null) {
            calls.add(new MappedText.Break(start(creation), start(creation)));
        }
        return super.visitNewClass(creation, inside);
    }

    @Override
    public Void visitBinary(BinaryTree binary, Boolean inside) {
        if (binary.getKind() == Tree.Kind.DIVIDE || binary.getKind() == Tree.Kind.REMAINDER) {
            int at = end(binary.getLeftOperand());
            while (at < codeOnly.length() && Character.isWhitespace(codeOnly.charAt(at))) {
                at++;
            }
            calls.add(new MappedText.Break(at, at));
        }
        return super.visitBinary(binary, inside);
    }

    @Override
    public Void visitReturn(ReturnTree exit, Boolean inside) {
        if (!inside && strayReturn < 0) {
            strayReturn = start(exit);
        }
        return super.visitReturn(exit, inside);
    }

    @Override
    public Void visitLambdaExpression(LambdaExpressionTree lambda, Boolean inside) {
        return super.visitLambdaExpression(lambda, true);
    }

    @Override
    public Void visitClass(ClassTree type, Boolean inside) {
        return super.visitClass(type, true);
    }

    @Override
    public Void visitMethod(MethodTree method, Boolean inside) {
        if (method.getBody() != null) {
            bodies.add(span(method.getBody()));
        }
        int outer = bodies.size();
        super.visitMethod(method, true);
        bodies.subList(outer, bodies.size()).clear();
        return null;
    }
}
