package sill.worker;

import java.util.ArrayList;
import java.util.List;
import java.util.function.Supplier;
import java.util.regex.Pattern;
import jdk.jshell.SourceCodeAnalysis;
import jdk.jshell.SourceCodeAnalysis.Completeness;
import jdk.jshell.SourceCodeAnalysis.CompletionInfo;
import sill.sheet.CodeText;
import sill.sheet.Span;
import sill.sheet.Splitter;

/**
 * Splits a cell as the JDK's prompt splits what is typed into it: line by line, a snippet ends as soon as it can. Other than
 * the prompt it sees the next line before it decides: one that starts with what can't start a snippet ({@code else}, {@code
 * .map(…)}, {@code * 2}) goes on, and so does an indented one that starts with a sign, where the prompt would quietly take
 * half of a sum. A {@link PlainSnippet} is told without the prompt's analysis.
 */
final class PromptSplitter implements Splitter {
    private static final Pattern GOES_ON =
            Pattern.compile("\\.(?!\\d)|[?:*/%=&|^,]|!=|->|[<>]=?\\s|>>|(?:else|catch|finally|instanceof)\\b");

    private static final Pattern SIGN = Pattern.compile("[+-](?![+-])");

    private final Supplier<SourceCodeAnalysis> analysis;

    /** @param analysis the prompt's; asked for when it is needed */
    PromptSplitter(Supplier<SourceCodeAnalysis> analysis) {
        this.analysis = analysis;
    }

    @Override
    public List<Span> split(String source) {
        String code = CodeText.codeOnly(source);
        List<Span> spans = new ArrayList<>();
        int at = PlainSnippet.skipBlank(code, 0);
        while (at < code.length()) {
            int end = snippetEnd(source, code, at);
            spans.add(new Span(at, end));
            at = PlainSnippet.skipBlank(code, end);
        }
        return spans;
    }

    private int snippetEnd(String source, String code, int start) {
        int lineEnd = closedLineEnd(code, start, start);
        int plainEnd = CodeText.endOfCode(code, start, lineEnd);
        if (PlainSnippet.is(code.substring(start, plainEnd))
                && !goesOn(code, start, plainEnd, PlainSnippet.skipBlank(code, plainEnd))) {
            return plainEnd;
        }
        while (true) {
            String typed = source.substring(start, lineEnd);
            CompletionInfo info = analysis.get().analyzeCompletion(typed);
            boolean complete = info.completeness() != Completeness.DEFINITELY_INCOMPLETE
                    && info.completeness() != Completeness.CONSIDERED_INCOMPLETE;
            int taken = complete && info.remaining() != null
                    ? typed.length() - info.remaining().length()
                    : typed.length();
            int end = Math.max(start + 1, CodeText.endOfCode(code, start, start + Math.max(1, taken)));
            int next = PlainSnippet.skipBlank(code, end);
            if (lineEnd >= code.length() || (complete && !goesOn(code, start, end, next))) {
                return end;
            }
            lineEnd = closedLineEnd(code, start, Math.max(lineEnd + 1, next));
        }
    }

    private static boolean goesOn(String code, int start, int end, int next) {
        if (next >= code.length() || code.charAt(end - 1) == ';') {
            // Behind a semicolon only an "else" can belong to what stands before it.
            return code.startsWith("else", next)
                    && GOES_ON.matcher(code).region(next, code.length()).lookingAt();
        }
        return GOES_ON.matcher(code).region(next, code.length()).lookingAt()
                || (code.charAt(end - 1) != '}'
                        && SIGN.matcher(code).region(next, code.length()).lookingAt()
                        && indent(code, next) > indent(code, start));
    }

    private static int indent(String code, int at) {
        return at - (code.lastIndexOf('\n', at - 1) + 1);
    }

    /** The end of the first line from {@code from} on at which no bracket is open: with one the text can't be complete. */
    private static int closedLineEnd(String code, int start, int from) {
        int end = lineEnd(code, from);
        int depth = PlainSnippet.depth(code, start, end);
        while (end < code.length() && depth > 0) {
            int next = lineEnd(code, end + 1);
            depth += PlainSnippet.depth(code, end, next);
            end = next;
        }
        return end;
    }

    private static int lineEnd(String code, int from) {
        int end = code.indexOf('\n', from);
        return end < 0 ? code.length() : end;
    }
}
