package sill.record.html;

import sill.markup.Markup;

/** Pieces that all tables of the page share. */
final class Tables {
    private Tables() {}

    /** A text up to this length stays on one line, so that a number is not parted from its unit. */
    private static final int SHORT = 32;

    /** The head row. */
    static void head(Markup page, String... columns) {
        page.open("thead").open("tr");
        for (String column : columns) {
            page.leaf("th", column, "scope", "col");
        }
        page.close().close().line();
    }

    /** A cell that knows its column's name, which a narrow screen shows beside it; one without text is marked empty. */
    static void cell(Markup page, String column, String cssClass, String text) {
        page.leaf("td", text, "class", cssClass + length(text), "data-label", column);
    }

    /** The class by which the style sheet keeps a short text on one line and drops an empty cell; with a space before it. */
    static String length(String text) {
        return text.isEmpty() ? " empty" : text.length() <= SHORT ? " short" : "";
    }

    /** Opens a box that scrolls sideways when its content is wider than the page; also by keyboard. */
    static void openScrolling(Markup page, String label) {
        page.open("div", "class", "scrolling", "tabindex", "0", "role", "region", "aria-label", label)
                .line();
    }
}
