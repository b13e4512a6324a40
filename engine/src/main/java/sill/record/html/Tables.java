package sill.record.html;

import sill.markup.Markup;

/** Pieces that all tables of the page share. */
final class Tables {
    private Tables() {}

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
        page.leaf("td", text, "class", text.isEmpty() ? cssClass + " empty" : cssClass, "data-label", column);
    }

    /** Opens a box that scrolls sideways when its content is wider than the page; also by keyboard. */
    static void openScrolling(Markup page, String label) {
        page.open("div", "class", "scrolling", "tabindex", "0", "role", "region", "aria-label", label)
                .line();
    }
}
