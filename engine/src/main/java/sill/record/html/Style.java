package sill.record.html;

import java.util.Map;
import sill.markup.VisibleText;

/** The page's style sheet: a resource of the program, and the line that each printed page carries. */
final class Style {
    private Style() {}

    /** The style sheet of a record with this title block. */
    static String of(Map<String, String> titleBlock) {
        return "\n" + Inline.resource(Inline.STYLE) + printedLine(titleBlock);
    }

    /** ISO 7200 wants the identification number on every sheet of a document. */
    private static String printedLine(Map<String, String> titleBlock) {
        String number = titleBlock.getOrDefault("number", "");
        String revision = titleBlock.getOrDefault("revision", "");
        String line = (number + (revision.isEmpty() ? "" : "  rev. " + revision)).strip();
        String title = titleBlock.getOrDefault("title", "");
        String text = line.isEmpty() ? title : line + " · " + title;
        return "@page { @bottom-left { font: inherit; content: " + quoted(text) + "; } }\n";
    }

    /** A CSS string; everything but plain letters, digits and blanks is written by its code. */
    static String quoted(String text) {
        StringBuilder css = new StringBuilder("\"");
        VisibleText.of(text).codePoints().limit(90).forEach(code -> {
            boolean plain = code == ' ' || code < 128 && Character.isLetterOrDigit(code);
            css.append(plain ? Character.toString(code) : "\\" + Integer.toHexString(code) + " ");
        });
        return css.append('"').toString();
    }
}
