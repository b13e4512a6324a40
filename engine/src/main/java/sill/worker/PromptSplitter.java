package sill.worker;

import java.util.ArrayList;
import java.util.List;
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
 * half of a sum. Lines that are one plain statement are told without asking the prompt's analysis, which takes milliseconds.
 */
final class PromptSplitter implements Splitter {
    /** Words that start what may go on in the next line though it ends in a semicolon. */
    private static final Pattern MAY_GO_ON =
            Pattern.compile("(if|else|for|while|do|try|switch|case|default|catch|finally|class|record|enum|interface"
                    + "|abstract|sealed|non-sealed|synchronized|@interface)\\b.*");

    private static final Pattern GOES_ON =
            Pattern.compile("\\.(?!\\d)|[?:*/%=&|^,]|!=|->|[<>]=?\\s|>>|(?:else|catch|finally|instanceof)\\b");

    private static final String OPENING = "([{";
    private static final String CLOSING = ")]}";

    private static final Pattern NAME_OR_CALL = Pattern.compile(
            "(?!(?:static|final|public|private|protected|new|throw|return)\\b)[A-Za-z_][\\w.]*(?:\\(.*\\))?");

    private static final Pattern SIGN = Pattern.compile("[+-](?![+-])");

    private final SourceCodeAnalysis analysis;

    PromptSplitter(SourceCodeAnalysis analysis) {
        this.analysis = analysis;
    }

    @Override
    public List<Span> split(String source) {
        String code = CodeText.codeOnly(source);
        List<Span> spans = new ArrayList<>();
        int at = skipBlank(code, 0);
        while (at < code.length()) {
            int end = snippetEnd(source, code, at);
            spans.add(new Span(at, end));
            at = skipBlank(code, end);
        }
        return spans;
    }

    private int snippetEnd(String source, String code, int start) {
        int lineEnd = lineEnd(code, start);
        if (isPlain(code.substring(start, lineEnd).strip())) {
            int end = CodeText.endOfCode(code, start, lineEnd);
            if (!goesOn(code, start, end, skipBlank(code, end))) {
                return end;
            }
        }
        while (true) {
            // Lines with open brackets can't be complete: no need to ask.
            while (lineEnd < code.length() && openBrackets(code, start, lineEnd)) {
                lineEnd = lineEnd(code, lineEnd + 1);
            }
            String typed = source.substring(start, lineEnd);
            CompletionInfo info = analysis.analyzeCompletion(typed);
            boolean complete = info.completeness() != Completeness.DEFINITELY_INCOMPLETE
                    && info.completeness() != Completeness.CONSIDERED_INCOMPLETE;
            int taken = complete && info.remaining() != null
                    ? typed.length() - info.remaining().length()
                    : typed.length();
            int end = Math.max(start + 1, CodeText.endOfCode(code, start, start + Math.max(1, taken)));
            int next = skipBlank(code, end);
            if (lineEnd >= code.length() || (complete && !goesOn(code, start, end, next))) {
                return end;
            }
            lineEnd = lineEnd(code, Math.max(lineEnd + 1, next));
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

    /** Whether a line is for sure one snippet and no more: a statement, a method on one line, a name or a call. */
    private static boolean isPlain(String line) {
        if (line.isEmpty() || line.indexOf('@') >= 0 || MAY_GO_ON.matcher(line).matches()) {
            return false;
        }
        char last = line.charAt(line.length() - 1);
        int depth = 0;
        for (int i = 0; i < line.length(); i++) {
            char c = line.charAt(i);
            if (OPENING.indexOf(c) >= 0) {
                depth++;
            } else if (CLOSING.indexOf(c) >= 0) {
                depth--;
            }
            boolean ends = depth == 0 && (c == ';' || c == '}');
            if (depth < 0 || (ends && i < line.length() - 1)) {
                return false;
            }
        }
        return depth == 0
                && (last == ';' || last == '}' || NAME_OR_CALL.matcher(line).matches());
    }

    private static boolean openBrackets(String code, int start, int end) {
        int open = 0;
        for (int i = start; i < end; i++) {
            if (OPENING.indexOf(code.charAt(i)) >= 0) {
                open++;
            } else if (CLOSING.indexOf(code.charAt(i)) >= 0) {
                open--;
            }
        }
        return open > 0;
    }

    private static int lineEnd(String code, int from) {
        int end = code.indexOf('\n', from);
        return end < 0 ? code.length() : end;
    }

    private static int skipBlank(String code, int from) {
        int at = from;
        while (at < code.length() && Character.isWhitespace(code.charAt(at))) {
            at++;
        }
        return at;
    }
}
