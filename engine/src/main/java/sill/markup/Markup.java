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
        escape(VisibleText.of(value));
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
        escape(VisibleText.of(text));
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

    private void escape(String text) {
        for (int i = 0; i < text.length(); i++) {
            char c = text.charAt(i);
            switch (c) {
                case '&' -> out.append("&amp;");
                case '<' -> out.append("&lt;");
                case '>' -> out.append("&gt;");
                case '"' -> out.append("&quot;");
                case '\'' -> out.append("&#39;");
                default -> out.append(c);
            }
        }
    }
}
