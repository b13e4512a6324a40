package sill.sheet;

import com.sun.source.tree.ClassTree;
import com.sun.source.tree.CompilationUnitTree;
import com.sun.source.tree.ExpressionStatementTree;
import com.sun.source.tree.ImportTree;
import com.sun.source.tree.MethodInvocationTree;
import com.sun.source.tree.MethodTree;
import com.sun.source.tree.NewArrayTree;
import com.sun.source.tree.NewClassTree;
import com.sun.source.tree.ReturnTree;
import com.sun.source.tree.Tree;
import com.sun.source.tree.VariableTree;
import com.sun.source.util.SourcePositions;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/** One snippet's text, tried in one form. */
final class SnippetAttempt {
    /** Another form may fit better. */
    private static final String NOT_ONE_CODE = "sill.not.one";

    private static final String NOT_ONE = "found more or less than one complete piece of Java";

    private final SnippetParser.Raw raw;
    private final SnippetForm form;
    private final Span span;
    private final int shift;
    private Snippet snippet;
    private SnippetParser.Fault fault = SnippetParser.Fault.NONE;

    SnippetAttempt(SnippetParser.Raw raw, SnippetForm form) {
        this.raw = raw;
        this.form = form;
        int end = CodeText.endOfCode(
                raw.codeOnly(), raw.span().start(), raw.span().end());
        while (form == SnippetForm.EXPRESSION
                && end > raw.span().start()
                && raw.codeOnly().charAt(end - 1) == ';') {
            end = CodeText.endOfCode(raw.codeOnly(), raw.span().start(), end - 1);
        }
        this.span = new Span(raw.span().start(), end);
        this.shift = span.start() - form.before.length();
    }

    String source() {
        String text = span.of(raw.piece().text());
        // The prompt completes what lacks its semicolon; so does this. Behind a closing brace it does no harm.
        boolean open = form != SnippetForm.EXPRESSION && !text.endsWith(";");
        return form.before + text + (open ? ";" : "") + form.after;
    }

    SnippetParser.Parsed parsed() {
        return new SnippetParser.Parsed(
                raw, Optional.ofNullable(fault == SnippetParser.Fault.NONE ? snippet : null), fault);
    }

    void fail(int position, String code, String message) {
        if (fault == SnippetParser.Fault.NONE) {
            int offset = Math.max(span.start(), Math.min(position + shift, Math.max(span.start(), span.end() - 1)));
            fault = new SnippetParser.Fault(offset, code, message);
        }
    }

    /** Takes the parsed form; after a complaint there is nothing to take. */
    void take(CompilationUnitTree unit, SourcePositions positions) {
        if (fault != SnippetParser.Fault.NONE) {
            return;
        }
        SnippetShape shape = new SnippetShape(unit, positions, raw.codeOnly(), shift);
        if (form == SnippetForm.IMPORT) {
            takeImport(unit, shape);
            return;
        }
        if (unit.getTypeDecls().size() != 1
                || !(unit.getTypeDecls().get(0) instanceof ClassTree wrapper)
                || shape.end(wrapper) - shift != source().length()) {
            fail(form.before.length(), NOT_ONE_CODE, NOT_ONE);
            return;
        }
        List<? extends Tree> inside = wrapper.getMembers();
        if (form != SnippetForm.MEMBER) {
            if (inside.size() != 1 || !(inside.get(0) instanceof MethodTree method) || method.getBody() == null) {
                fail(form.before.length(), NOT_ONE_CODE, NOT_ONE);
                return;
            }
            inside = method.getBody().getStatements();
        }
        inside = inside.size() > 1
                ? inside.stream()
                        .filter(tree -> tree.getKind() != Tree.Kind.EMPTY_STATEMENT)
                        .toList()
                : inside;
        inside.forEach(shape::look);
        if (form == SnippetForm.STATEMENT && shape.strayReturn() >= 0) {
            fail(shape.strayReturn() - shift, Wording.OURS, "found 'return', but a cell is no method to return from");
            return;
        }
        if (form == SnippetForm.EXPRESSION) {
            takeExpression(inside, shape);
        } else {
            takeStatements(inside, shape);
        }
    }

    private void takeImport(CompilationUnitTree unit, SnippetShape shape) {
        List<? extends ImportTree> imports = unit.getImports();
        if (imports.size() == 1
                && unit.getPackageName() == null
                && unit.getTypeDecls().size() == 1) {
            snippet = snippet(Snippet.Kind.IMPORT, List.of(), span, shape, Snippet.Name.NONE);
        } else {
            fail(0, NOT_ONE_CODE, "found more or less than one import");
        }
    }

    private void takeExpression(List<? extends Tree> inside, SnippetShape shape) {
        if (inside.size() == 1 && inside.get(0) instanceof ReturnTree) {
            snippet = snippet(Snippet.Kind.EXPRESSION, List.of(), span, shape, Snippet.Name.NONE);
        } else {
            fail(form.before.length(), NOT_ONE_CODE, "found more or less than one expression");
        }
    }

    private void takeStatements(List<? extends Tree> inside, SnippetShape shape) {
        Tree first = inside.isEmpty() ? null : inside.get(0);
        if (first == null) {
            snippet = snippet(Snippet.Kind.STATEMENT, List.of(), span, shape, Snippet.Name.NONE);
        } else if (first instanceof VariableTree variable
                && variable.getType() == null
                && variable.getInitializer() == null) {
            fail(form.before.length(), Wording.OURS, "found 'var' without a value to take the type from");
        } else if (first instanceof VariableTree && inside.stream().allMatch(VariableTree.class::isInstance)) {
            snippet = snippet(Snippet.Kind.VARIABLES, variables(inside, shape), span, shape, Snippet.Name.NONE);
        } else if (inside.size() == 1 && first instanceof ClassTree type) {
            snippet = snippet(
                    Snippet.Kind.TYPE,
                    List.of(),
                    span,
                    shape,
                    name(type.getSimpleName().toString(), shape.end(type.getModifiers())));
        } else if (inside.size() == 1 && first instanceof MethodTree method) {
            snippet = snippet(
                    Snippet.Kind.METHOD,
                    List.of(),
                    span,
                    shape,
                    name(
                            method.getName().toString(),
                            method.getReturnType() == null ? -1 : shape.end(method.getReturnType())));
        } else if (form == SnippetForm.MEMBER) {
            fail(form.before.length(), NOT_ONE_CODE, "found an initialiser block, expected statements");
        } else if (inside.size() == 1
                && first instanceof ExpressionStatementTree statement
                && (statement.getExpression() instanceof MethodInvocationTree
                        || statement.getExpression() instanceof NewClassTree)) {
            snippet = snippet(
                    Snippet.Kind.CALL, List.of(), shape.span(statement.getExpression()), shape, Snippet.Name.NONE);
        } else {
            snippet = snippet(Snippet.Kind.STATEMENT, List.of(), span, shape, Snippet.Name.NONE);
        }
    }

    private Snippet snippet(
            Snippet.Kind kind,
            List<Snippet.Variable> variables,
            Span expression,
            SnippetShape shape,
            Snippet.Name name) {
        return new Snippet(
                raw.piece(), span, kind, variables, expression, shape.calls(), shape.bodies(), name, raw.caption());
    }

    private List<Snippet.Variable> variables(List<? extends Tree> trees, SnippetShape shape) {
        List<Snippet.Variable> variables = new ArrayList<>();
        int from = -1;
        for (Tree tree : trees) {
            VariableTree variable = (VariableTree) tree;
            Span type = variable.getType() == null ? null : shape.span(variable.getType());
            from = from < 0 ? (type == null ? shape.start(variable) : type.start()) : from;
            String name = variable.getName().toString();
            int at = nameAt(name, from);
            Tree initialiser = variable.getInitializer();
            Span value = initialiser == null ? new Span(at, at) : shape.span(initialiser);
            variables.add(new Snippet.Variable(
                    name,
                    at,
                    type == null ? Snippet.OPEN : variable.getType().toString(),
                    type == null ? new Span(at, at) : type,
                    value,
                    initialiser instanceof NewArrayTree array && array.getType() == null));
            from = Math.max(at + name.length(), value.end());
        }
        return variables;
    }

    private Snippet.Name name(String name, int from) {
        return new Snippet.Name(name, nameAt(name, from));
    }

    /** The compiler tells where a declaration starts, not where its name stands. */
    private int nameAt(String name, int from) {
        return Math.max(span.start(), CodeText.word(raw.codeOnly(), name, Math.max(from, span.start())));
    }
}
