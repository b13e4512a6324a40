package sill.sheet;

import java.util.LinkedHashMap;
import java.util.Map;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/**
 * The names that Java which can't be parsed probably declares. Whatever uses them waits on that cell; to call them unknown
 * would send the author to the wrong place.
 */
final class LostNames {
    private static final Pattern TYPE = Pattern.compile("\\b(?:class|interface|enum|record)\\s+([A-Za-z_]\\w*)");

    /** At a line's start, where what is indented belongs to something else: words, a type, a name, what may follow it. */
    private static final Pattern VARIABLE_OR_METHOD = Pattern.compile(
            "(?m)^(?!(?:import|return|throw|else|new|package)\\b)"
                    + "(?:(?:final|static|public|private|protected)\\s+)*"
                    + "[A-Za-z_][\\w.]*(?:<[^=;(){}]*>)?(?:\\[\\])*\\s+([A-Za-z_]\\w*)\\s*(?:\\[\\]\\s*)*(?:[=;,({]|$)");

    private LostNames() {}

    /**
     * The names and their offsets in the piece.
     *
     * @param codeOnly a piece, masked by {@link CodeText#codeOnly}
     */
    static Map<String, Integer> in(String codeOnly, Span span) {
        Map<String, Integer> names = new LinkedHashMap<>();
        String code = span.of(codeOnly);
        for (Pattern pattern : new Pattern[] {TYPE, VARIABLE_OR_METHOD}) {
            Matcher found = pattern.matcher(code);
            while (found.find()) {
                names.putIfAbsent(found.group(1), span.start() + found.start(1));
            }
        }
        return names;
    }
}
