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
import com.sun.source.util.Trees;
import java.io.IOException;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/**
 * Parses snippets, each alone, in the forms Java text can have: statement, member of a class, bare expression, import. The
 * first form that fits decides. Text that closes the form around it fits none.
 */
final class SnippetParser {
    private final Compiler compiler;

    SnippetParser(Compiler compiler) {
        this.compiler = compiler;
    }

    /** A snippet's text in its cell. */
    record Raw(Piece piece, String codeOnly, Span span, Caption caption) {
        String text() {
            return span.of(piece.text());
        }
    }

    /** A snippet, or where and why it is none. */
    record Parsed(Raw raw, Optional<Snippet> snippet, Fault fault) {}

    /** Why a text is no snippet; {@code offset} in the piece. */
    record Fault(int offset, String code, String message) {
        static final Fault NONE = new Fault(-1, "", "");
    }

    private enum Form {
        STATEMENT("class S { void m() throws Throwable {\n", "\n} }"),
        MEMBER("class S {\n", "\n}"),
        EXPRESSION("class S { Object m() throws Throwable { return (\n", "\n); } }"),
        IMPORT("", "\nclass S {}");

        final String before;
        final String after;

        Form(String before, String after) {
            this.before = before;
            this.after = after;
        }
    }

    /** Parses cell snippets. */
    List<Parsed> parse(List<Raw> raws) {
        List<Parsed> parsed = new ArrayList<>(raws.size());
        for (Attempt first : attempts(raws, raw -> isImport(raw) ? Form.IMPORT : Form.STATEMENT)) {
            parsed.add(first.parsed());
        }
        List<Integer> open = new ArrayList<>();
        for (int i = 0; i < parsed.size(); i++) {
            if (parsed.get(i).snippet().isEmpty() && !isImport(raws.get(i))) {
                open.add(i);
            }
        }
        for (Form form : List.of(Form.MEMBER, Form.EXPRESSION)) {
            List<Attempt> attempts = attempts(open.stream().map(raws::get).toList(), raw -> form);
            for (int i = 0; i < open.size(); i++) {
                parsed.set(
                        open.get(i),
                        better(parsed.get(open.get(i)), attempts.get(i).parsed()));
            }
        }
        return parsed;
    }

    /** Parses texts that must be expressions. */
    List<Parsed> parseExpressions(List<Raw> raws) {
        return attempts(raws, raw -> Form.EXPRESSION).stream()
                .map(Attempt::parsed)
                .toList();
    }

    private static boolean isImport(Raw raw) {
        return raw.span().of(raw.codeOnly()).strip().startsWith("import ");
    }

    /** The one that fits, else the one whose fault lies further on: it understood more of the text. */
    private static Parsed better(Parsed a, Parsed b) {
        if (a.snippet().isPresent()) {
            return a;
        }
        return b.snippet().isPresent() || b.fault().offset() > a.fault().offset() ? b : a;
    }

    private List<Attempt> attempts(List<Raw> raws, java.util.function.Function<Raw, Form> form) {
        if (raws.isEmpty()) {
            return List.of();
        }
        List<Attempt> attempts = new ArrayList<>();
        for (Raw raw : raws) {
            attempts.add(new Attempt(raw, form.apply(raw)));
        }
        Compiler.Task task =
                compiler.task(attempts.stream().map(Attempt::source).toList());
        SourcePositions positions = Trees.instance(task.task()).getSourcePositions();
        try {
            int i = 0;
            for (CompilationUnitTree unit : task.task().parse()) {
                attempts.get(i++).take(unit, positions);
            }
        } catch (IOException e) {
            throw new java.io.UncheckedIOException(e);
        }
        for (Compiler.Complaint error : task.errors()) {
            attempts.get(error.source()).fail(error.offset(), error.code(), error.message());
        }
        return attempts;
    }

    /** One snippet in one form. */
    private static final class Attempt {
        private final Raw raw;
        private final Form form;
        private final Span span;
        private final int shift;
        private Snippet snippet;
        private Fault fault = Fault.NONE;

        Attempt(Raw raw, Form form) {
            this.raw = raw;
            this.form = form;
            int end = CodeText.endOfCode(
                    raw.codeOnly(), raw.span().start(), raw.span().end());
            while (form == Form.EXPRESSION
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
            boolean open = form != Form.EXPRESSION && !text.endsWith(";");
            return form.before + text + (open ? ";" : "") + form.after;
        }

        Parsed parsed() {
            return new Parsed(raw, Optional.ofNullable(fault == Fault.NONE ? snippet : null), fault);
        }

        void fail(int position, String code, String message) {
            if (fault == Fault.NONE) {
                int offset = Math.max(span.start(), Math.min(position + shift, Math.max(span.start(), span.end() - 1)));
                fault = new Fault(offset, code, message);
            }
        }

        void take(CompilationUnitTree unit, SourcePositions positions) {
            SnippetShape shape = new SnippetShape(unit, positions, raw.codeOnly(), shift);
            if (form == Form.IMPORT) {
                takeImport(unit, shape);
                return;
            }
            if (unit.getTypeDecls().size() != 1
                    || !(unit.getTypeDecls().get(0) instanceof ClassTree wrapper)
                    || shape.end(wrapper) - shift != source().length()) {
                fail(form.before.length(), "", "this is not one complete piece of Java");
                return;
            }
            List<? extends Tree> inside = wrapper.getMembers();
            if (form != Form.MEMBER) {
                if (inside.size() != 1 || !(inside.get(0) instanceof MethodTree method) || method.getBody() == null) {
                    fail(form.before.length(), "", "this is not one complete piece of Java");
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
            if (form == Form.STATEMENT && shape.strayReturn() >= 0) {
                fail(shape.strayReturn() - shift, "", "a cell is no method, \"return\" has nothing to return from");
                return;
            }
            if (form == Form.EXPRESSION) {
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
                snippet = snippet(Snippet.Kind.IMPORT, List.of(), span, shape, "");
            } else {
                fail(0, "", "this is not one complete import");
            }
        }

        private void takeExpression(List<? extends Tree> inside, SnippetShape shape) {
            if (inside.size() == 1 && inside.get(0) instanceof ReturnTree) {
                snippet = snippet(Snippet.Kind.EXPRESSION, List.of(), span, shape, "");
            } else {
                fail(form.before.length(), "", "this is not one expression");
            }
        }

        private void takeStatements(List<? extends Tree> inside, SnippetShape shape) {
            Tree first = inside.isEmpty() ? null : inside.get(0);
            if (first == null) {
                snippet = snippet(Snippet.Kind.STATEMENT, List.of(), span, shape, "");
            } else if (first instanceof VariableTree && inside.stream().allMatch(VariableTree.class::isInstance)) {
                snippet = snippet(Snippet.Kind.VARIABLES, variables(inside, shape), span, shape, "");
            } else if (inside.size() == 1 && first instanceof ClassTree type) {
                snippet = snippet(
                        Snippet.Kind.TYPE,
                        List.of(),
                        span,
                        shape,
                        type.getSimpleName().toString());
            } else if (inside.size() == 1 && first instanceof MethodTree method) {
                snippet = snippet(
                        Snippet.Kind.METHOD,
                        List.of(),
                        span,
                        shape,
                        method.getName().toString());
            } else if (form == Form.MEMBER) {
                fail(form.before.length(), "", "an initialiser block has no place in a cell");
            } else if (inside.size() == 1
                    && first instanceof ExpressionStatementTree statement
                    && (statement.getExpression() instanceof MethodInvocationTree
                            || statement.getExpression() instanceof NewClassTree)) {
                snippet = snippet(Snippet.Kind.CALL, List.of(), shape.span(statement.getExpression()), shape, "");
            } else {
                snippet = snippet(Snippet.Kind.STATEMENT, List.of(), span, shape, "");
            }
        }

        private Snippet snippet(
                Snippet.Kind kind, List<Snippet.Variable> variables, Span expression, SnippetShape shape, String name) {
            return new Snippet(
                    raw.piece(), span, kind, variables, expression, shape.calls(), shape.bodies(), name, raw.caption());
        }

        private List<Snippet.Variable> variables(List<? extends Tree> trees, SnippetShape shape) {
            List<Snippet.Variable> variables = new ArrayList<>();
            int from = -1;
            for (Tree tree : trees) {
                VariableTree variable = (VariableTree) tree;
                int typeAt = variable.getType() == null ? shape.start(variable) : shape.start(variable.getType());
                if (from < 0) {
                    from = variable.getType() == null ? typeAt : shape.end(variable.getType());
                }
                String name = variable.getName().toString();
                int at = nameAt(name, from);
                Tree initialiser = variable.getInitializer();
                Span value = initialiser == null ? new Span(at, at) : shape.span(initialiser);
                variables.add(new Snippet.Variable(
                        name,
                        at,
                        variable.getType() == null ? "var" : variable.getType().toString(),
                        typeAt,
                        value,
                        initialiser instanceof NewArrayTree array && array.getType() == null));
                from = Math.max(at + name.length(), value.end());
            }
            return variables;
        }

        /** The compiler tells where a declaration starts, not where its name stands. */
        private int nameAt(String name, int from) {
            int at = Math.max(from, span.start());
            while (true) {
                at = raw.codeOnly().indexOf(name, at);
                if (at < 0) {
                    return span.start();
                }
                boolean whole = (at == 0
                                || !Character.isJavaIdentifierPart(
                                        raw.codeOnly().charAt(at - 1)))
                        && (at + name.length() >= raw.codeOnly().length()
                                || !Character.isJavaIdentifierPart(
                                        raw.codeOnly().charAt(at + name.length())));
                if (whole) {
                    return at;
                }
                at++;
            }
        }
    }
}
