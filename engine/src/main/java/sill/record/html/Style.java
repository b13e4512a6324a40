package sill.record.html;

import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.security.MessageDigest;
import java.security.NoSuchAlgorithmException;
import java.util.Base64;
import java.util.Map;
import sill.markup.VisibleText;

/** The page's style sheet: a resource of the program, and the line that each printed page carries. */
final class Style {
    private static final String RESOURCE = "sheet.css";

    private Style() {}

    /** The style sheet of a record with this title block. */
    static String of(Map<String, String> titleBlock) {
        return "\n" + resource() + printedLine(titleBlock);
    }

    /** The source by which a content security policy allows this style sheet and no other. */
    static String digest(String style) {
        try {
            byte[] digest = MessageDigest.getInstance("SHA-256").digest(style.getBytes(StandardCharsets.UTF_8));
            return "sha256-" + Base64.getEncoder().encodeToString(digest);
        } catch (NoSuchAlgorithmException e) {
            throw new IllegalStateException("every Java must have SHA-256", e);
        }
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

    private static String resource() {
        try (InputStream in = Style.class.getResourceAsStream(RESOURCE)) {
            if (in == null) {
                throw new IllegalStateException("the program must contain " + RESOURCE);
            }
            return new String(in.readAllBytes(), StandardCharsets.UTF_8);
        } catch (IOException e) {
            throw new UncheckedIOException("the program's own " + RESOURCE + " must be readable", e);
        }
    }
}
