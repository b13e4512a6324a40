package sill.sheet;

import com.sun.source.tree.CompilationUnitTree;
import com.sun.source.util.SourcePositions;
import com.sun.source.util.Trees;
import java.io.IOException;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.regex.Pattern;

/**
 * Parses snippets, each alone, in the forms Java text can have: statement, member of a class, bare expression, import. The
 * first form that fits decides. Text that closes the form around it fits none.
 */
final class SnippetParser {
    private static final Pattern IMPORT = Pattern.compile("\\s*import\\b");

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

    /** Why a text is no snippet; {@code offset} in the piece, {@code code} the compiler's key or {@link Wording#OURS}. */
    record Fault(int offset, String code, String message) {
        static final Fault NONE = new Fault(-1, "", "");
    }

    /** Parses cell snippets. */
    List<Parsed> parse(List<Raw> raws) {
        List<Parsed> parsed = new ArrayList<>(raws.size());
        for (SnippetAttempt first : attempts(raws, raw -> isImport(raw) ? SnippetForm.IMPORT : SnippetForm.STATEMENT)) {
            parsed.add(first.parsed());
        }
        List<Integer> open = new ArrayList<>();
        for (int i = 0; i < parsed.size(); i++) {
            if (parsed.get(i).snippet().isEmpty() && !isImport(raws.get(i))) {
                open.add(i);
            }
        }
        for (SnippetForm form : List.of(SnippetForm.MEMBER, SnippetForm.EXPRESSION)) {
            List<SnippetAttempt> attempts =
                    attempts(open.stream().map(raws::get).toList(), raw -> form);
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
        return attempts(raws, raw -> SnippetForm.EXPRESSION).stream()
                .map(SnippetAttempt::parsed)
                .toList();
    }

    private static boolean isImport(Raw raw) {
        return IMPORT.matcher(raw.codeOnly())
                .region(raw.span().start(), raw.span().end())
                .lookingAt();
    }

    /** The one that fits, else the one whose fault lies further on: it understood more of the text. */
    private static Parsed better(Parsed a, Parsed b) {
        if (a.snippet().isPresent() || a.fault().code().equals(Wording.OURS)) {
            return a;
        }
        return b.snippet().isPresent() || b.fault().offset() > a.fault().offset() ? b : a;
    }

    private List<SnippetAttempt> attempts(List<Raw> raws, java.util.function.Function<Raw, SnippetForm> form) {
        if (raws.isEmpty()) {
            return List.of();
        }
        List<SnippetAttempt> attempts = new ArrayList<>();
        for (Raw raw : raws) {
            attempts.add(new SnippetAttempt(raw, form.apply(raw)));
        }
        Compiler.Task task =
                compiler.task(attempts.stream().map(SnippetAttempt::source).toList());
        SourcePositions positions = Trees.instance(task.task()).getSourcePositions();
        try {
            Iterable<? extends CompilationUnitTree> units = task.task().parse();
            for (Compiler.Complaint error : task.errors()) {
                attempts.get(error.source()).fail(error.offset(), error.code(), error.message());
            }
            int i = 0;
            for (CompilationUnitTree unit : units) {
                attempts.get(i++).take(unit, positions);
            }
        } catch (IOException e) {
            throw new java.io.UncheckedIOException(e);
        }
        return attempts;
    }
}
