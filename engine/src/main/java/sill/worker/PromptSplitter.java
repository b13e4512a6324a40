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
 * Splits a cell as the JDK's prompt splits what is typed into it: line by line, a snippet ends as soon as it can. Lines that
 * are one plain statement are told without asking the prompt's analysis, which takes milliseconds a line.
 */
final class PromptSplitter implements Splitter {
    /** Words that start what may go on in the next line though it ends in a semicolon. */
    private static final Pattern MAY_GO_ON =
            Pattern.compile("(if|else|for|while|do|try|switch|case|default|catch|finally|class|record|enum|interface"
                    + "|abstract|sealed|non-sealed|synchronized|@interface)\\b.*");

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
        if (isPlainStatement(code.substring(start, lineEnd).strip())) {
            return CodeText.endOfCode(code, start, lineEnd);
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
            if (complete || lineEnd >= code.length()) {
                int taken = complete && info.remaining() != null
                        ? typed.length() - info.remaining().length()
                        : typed.length();
                int end = CodeText.endOfCode(code, start, start + Math.max(1, taken));
                return Math.max(end, start + 1);
            }
            lineEnd = lineEnd(code, lineEnd + 1);
        }
    }

    private static boolean isPlainStatement(String line) {
        return line.endsWith(";")
                && line.indexOf(';') == line.length() - 1
                && line.indexOf('{') < 0
                && line.indexOf('}') < 0
                && line.indexOf('@') < 0
                && !openBrackets(line, 0, line.length())
                && !MAY_GO_ON.matcher(line).matches();
    }

    private static boolean openBrackets(String code, int start, int end) {
        int open = 0;
        for (int i = start; i < end; i++) {
            char c = code.charAt(i);
            if (c == '(' || c == '{' || c == '[') {
                open++;
            } else if (c == ')' || c == '}' || c == ']') {
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
