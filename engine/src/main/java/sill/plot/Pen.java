package sill.plot;

import sill.stdlib.Plot;

/**
 * How a line is drawn. Colours are for white paper; the page overrides them by class.
 *
 * @param cssClass class of the line
 * @param colour as SVG writes it
 * @param width in the drawing's units
 * @param dash pattern, empty for a full line
 */
record Pen(String cssClass, String colour, String width, String dash) {
    static final Pen FINE_GRID = new Pen("grid-fine", "#eceeed", "1", "");
    static final Pen GRID = new Pen("grid", "#cfd5d2", "1", "");
    static final Pen FRAME = new Pen("frame", "#4c5753", "1", "");
    static final Pen LEADER = new Pen("leader", "#4c5753", "1", "");

    /** The pen of a mark by what it means. */
    static Pen of(Plot.Role role) {
        return switch (role) {
            case LIMIT -> new Pen("mark mark-limit", "#a1262f", "1.5", "12 3");
            case TRIP_POINT -> new Pen("mark mark-trip", "#26302c", "1.5", "5 3");
            case REFERENCE -> new Pen("mark mark-reference", "#66706c", "1.5", "1.5 3");
        };
    }

    /** The pen of a curve; points are drawn full, since a dash would break their markers. */
    static Pen of(Look look, Plot.Style style) {
        boolean points = style == Plot.Style.POINTS;
        return new Pen("curve curve-" + look.number(), look.colour(), points ? "1.5" : "2", points ? "" : look.dash());
    }
}
