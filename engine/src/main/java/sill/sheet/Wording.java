package sill.sheet;

import java.util.Collection;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import sill.words.NearestWord;
import sill.worksheet.Problem;

/** Puts what the compiler complains of into words for the worksheet's author. */
final class Wording {
    private static final Pattern SYMBOL = Pattern.compile("symbol:\\s+(\\w+) ([^\\s(]+)(\\S*)");

    private Wording() {}

    /**
     * A complaint as a problem.
     *
     * @param known names to suggest when one is misspelt
     */
    static Problem problem(Piece piece, int offset, String code, String message, Collection<String> known) {
        Place place = piece.place(offset);
        Matcher symbol = SYMBOL.matcher(message);
        String said;
        String hint = "";
        if (code.startsWith("compiler.err.cant.resolve") && symbol.find()) {
            String name = symbol.group(2);
            said = "no " + symbol.group(1) + " \"" + name + symbol.group(3) + "\" is known here";
            hint = NearestWord.to(name, known)
                    .map(near -> "did you mean \"" + near + "\"?")
                    .orElse("declare it in a cell above, or correct its spelling");
        } else {
            said = firstLine(message);
            hint = hint(code);
        }
        return Problem.error(place.line(), place.column(), piece.cell(), piece.where() + ": " + said, hint);
    }

    private static String firstLine(String message) {
        String line = message.lines().findFirst().orElse(message);
        return line.replaceAll("(in |of )?class \\$Sheet", "$1this worksheet")
                .replace("$Sheet.", "")
                .replaceAll("\\b(?:[a-z]\\w*\\.)+(?=[A-Z])", "")
                .strip();
    }

    private static String hint(String code) {
        return switch (code) {
            case "compiler.err.expected", "compiler.err.premature.eof" -> "complete the Java at this place";
            case "compiler.err.unreported.exception.need.to.catch.or.throw" ->
                "catch it, or declare the method with \"throws\"";
            case "compiler.err.cant.inherit.from.sealed", "compiler.err.illegal.char" -> "take it out";
            default -> "";
        };
    }
}
