package sill.record.html;

import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.security.MessageDigest;
import java.security.NoSuchAlgorithmException;
import java.util.Base64;

/** Resources of the program that stand in the page itself, and what its content security policy says of them. */
final class Inline {
    /** The page's one script: shows beside a name what the page tells of it. */
    static final String PEEK = "peek.js";

    static final String STYLE = "sheet.css";

    private Inline() {}

    /** The text of a resource. */
    static String resource(String name) {
        try (InputStream in = Inline.class.getResourceAsStream(name)) {
            if (in == null) {
                throw new IllegalStateException("the program must contain " + name);
            }
            return new String(in.readAllBytes(), StandardCharsets.UTF_8);
        } catch (IOException e) {
            throw new UncheckedIOException("the program's own " + name + " must be readable", e);
        }
    }

    /** The source by which a content security policy allows this style sheet or script and no other. */
    static String digest(String text) {
        try {
            byte[] digest = MessageDigest.getInstance("SHA-256").digest(text.getBytes(StandardCharsets.UTF_8));
            return "sha256-" + Base64.getEncoder().encodeToString(digest);
        } catch (NoSuchAlgorithmException e) {
            throw new IllegalStateException("every Java must have SHA-256", e);
        }
    }
}
