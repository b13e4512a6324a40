package sill.record.html;

import sill.markup.Markup;

/** Addresses such as {@code 3.2}: what a reviewer quotes, and a link to the place. */
final class Addresses {
    private Addresses() {}

    /**
     * An address.
     *
     * @param isPlace whether this is the place itself, which carries the id, or a reference to it
     */
    static void write(Markup page, String at, boolean isPlace) {
        if (isPlace) {
            page.leaf("a", at, "class", "address", "href", href(at), "id", id(at));
        } else {
            page.leaf("a", at, "class", "address", "href", href(at));
        }
    }

    static String href(String at) {
        return "#" + id(at);
    }

    static String id(String at) {
        return "at-" + at;
    }

    /** The number of the cell in an address. */
    static int cell(String at) {
        int end = at.indexOf('.');
        return Integer.parseInt(end < 0 ? at : at.substring(0, end));
    }

    /** The place in its cell in an address. */
    static int index(String at) {
        return Integer.parseInt(at.substring(at.indexOf('.') + 1));
    }
}
