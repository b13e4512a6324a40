package sill.markup;

import java.util.ArrayDeque;
import java.util.Deque;

/**
 * Builds HTML or SVG in which every text and attribute is escaped and every element is closed. Only {@link #trusted} puts
 * markup in as it is; it is for the output of other classes of this kind.
 */
public final class Markup {
    private final StringBuilder out = new StringBuilder(4096);
    private final Deque<String> openElements = new ArrayDeque<>();

    /** What ends the start tag written last; empty once it has ended. */
    private String tagEnd = "";

    /**
     * Opens an element.
     *
     * @param element its name
     * @param attributes names and values in turn; a value is escaped
     */
    public Markup open(String element, String... attributes) {
        startTag(element, attributes, ">");
        openElements.push(element);
        return this;
    }

    /** Gives the element opened just now one more attribute. */
    public Markup with(String attribute, String value) {
        if (tagEnd.isEmpty()) {
            throw new IllegalStateException(
                    "an attribute must follow its start tag, got " + attribute + " after content");
        }
        out.append(' ').append(attribute).append("=\"");
        escape(value);
        out.append('"');
        return this;
    }

    /** Closes the element that was opened last. */
    public Markup close() {
        endTag();
        out.append("</").append(openElements.pop()).append('>');
        return this;
    }

    /** An element around one text. */
    public Markup leaf(String element, String text, String... attributes) {
        return open(element, attributes).text(text).close();
    }

    /** An HTML element that has no end tag, as {@code meta}. */
    public Markup single(String element, String... attributes) {
        startTag(element, attributes, ">");
        return this;
    }

    /** An SVG element without content. */
    public Markup shape(String element, String... attributes) {
        startTag(element, attributes, "/>");
        return this;
    }

    /** Text, escaped, with hidden characters shown as their codes. */
    public Markup text(String text) {
        endTag();
        escape(text);
        return this;
    }

    /** A line end, for readers of the file. */
    public Markup line() {
        endTag();
        out.append('\n');
        return this;
    }

    /** Markup as it is; never text from a worksheet. */
    public Markup trusted(String markup) {
        endTag();
        out.append(markup);
        return this;
    }

    /**
     * The markup so far.
     *
     * @throws IllegalStateException when an element is still open
     */
    @Override
    public String toString() {
        if (!openElements.isEmpty()) {
            throw new IllegalStateException("elements must be closed, still open: " + openElements);
        }
        endTag();
        return out.toString();
    }

    private void startTag(String element, String[] attributes, String end) {
        if (attributes.length % 2 != 0) {
            throw new IllegalArgumentException(
                    "attributes must be names and values in turn, got " + attributes.length + " texts");
        }
        endTag();
        out.append('<').append(element);
        tagEnd = end;
        for (int i = 0; i < attributes.length; i += 2) {
            with(attributes[i], attributes[i + 1]);
        }
    }

    private void endTag() {
        out.append(tagEnd);
        tagEnd = "";
    }

    /** One pass that copies whole runs of harmless characters, since most of a page is written by a cold program. */
    private void escape(String text) {
        int copied = 0;
        for (int i = 0; i < text.length(); i++) {
            char c = text.charAt(i);
            String entity = entity(c);
            if (!entity.isEmpty()) {
                out.append(text, copied, i).append(entity);
                copied = i + 1;
            } else if (!VisibleText.isPlain(c)) {
                // From here on each character may be one that hides.
                out.append(text, copied, i);
                escapeVisible(VisibleText.of(text.substring(i)));
                return;
            }
        }
        out.append(text, copied, text.length());
    }

    private void escapeVisible(String visible) {
        int copied = 0;
        for (int i = 0; i < visible.length(); i++) {
            String entity = entity(visible.charAt(i));
            if (!entity.isEmpty()) {
                out.append(visible, copied, i).append(entity);
                copied = i + 1;
            }
        }
        out.append(visible, copied, visible.length());
    }

    private static String entity(char c) {
        return switch (c) {
            case '&' -> "&amp;";
            case '<' -> "&lt;";
            case '>' -> "&gt;";
            case '"' -> "&quot;";
            case '\'' -> "&#39;";
            default -> "";
        };
    }
}
