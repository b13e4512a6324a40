package sill.worker;

import java.util.regex.Matcher;
import java.util.regex.Pattern;

/**
 * Java text that is for sure one snippet and no more, told without the prompt's analysis: that costs milliseconds for a
 * line, and a tenth of a second before the first. All text here is code only, without comments and contents of quotes.
 */
final class PlainSnippet {
    /** What may go on behind its semicolon or brace. */
    private static final Pattern MAY_GO_ON =
            Pattern.compile("(?:if|else|do|try|switch|case|default|catch|finally|synchronized)\\b");

    private static final Pattern LOOP = Pattern.compile("(?:for|while)\\s*(?=\\()");
    private static final Pattern MAY_GO_ON_WITHIN = Pattern.compile("\\b(?:if|do|try)\\b");
    private static final Pattern NAME_OR_CALL = Pattern.compile(
            "(?!(?:static|final|public|private|protected|new|throw|return)\\b)[A-Za-z_][\\w.]*(?:\\(.*\\))?");

    private static final String OPENING = "([{";
    private static final String CLOSING = ")]}";

    private PlainSnippet() {}

    /** Whether a text without blank space around it is one statement, declaration, name or call. */
    static boolean is(String code) {
        if (code.isEmpty() || code.indexOf('@') >= 0 || MAY_GO_ON.matcher(code).lookingAt()) {
            return false;
        }
        int end = code.length() - 1;
        char last = code.charAt(end);
        if (last != ';' && last != '}') {
            return code.indexOf('\n') < 0
                    && isClosed(code)
                    && NAME_OR_CALL.matcher(code).matches();
        }
        return isClosed(code) && !mayGoOnWithin(code);
    }

    /** How many more brackets open than close in a part of a text. */
    static int depth(String code, int from, int to) {
        int depth = 0;
        for (int i = from; i < to; i++) {
            depth += step(code.charAt(i));
        }
        return depth;
    }

    /** Whether all brackets are closed, and nothing ends before the last character. */
    private static boolean isClosed(String code) {
        int depth = 0;
        for (int i = 0; i < code.length(); i++) {
            char c = code.charAt(i);
            depth += step(c);
            boolean ends = depth == 0 && (c == ';' || c == '}');
            if (depth < 0 || (ends && i < code.length() - 1)) {
                return false;
            }
        }
        return depth == 0;
    }

    private static int step(char c) {
        if (OPENING.indexOf(c) >= 0) {
            return 1;
        }
        return CLOSING.indexOf(c) >= 0 ? -1 : 0;
    }

    /** A loop over a statement ends with it, which may go on; one over a block ends with the block. */
    private static boolean mayGoOnWithin(String code) {
        Matcher loop = LOOP.matcher(code);
        if (!loop.lookingAt()) {
            return false;
        }
        int depth = 0;
        int at = loop.end();
        do {
            depth += step(code.charAt(at++));
        } while (depth > 0);
        return code.charAt(skipBlank(code, at)) != '{'
                && MAY_GO_ON_WITHIN.matcher(code).region(at, code.length()).find();
    }

    static int skipBlank(String code, int from) {
        int at = from;
        while (at < code.length() && Character.isWhitespace(code.charAt(at))) {
            at++;
        }
        return at;
    }
}
