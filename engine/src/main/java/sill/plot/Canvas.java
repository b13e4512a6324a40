package sill.plot;

import sill.markup.Markup;

/** An SVG drawing in the making: lines, areas and labels at places in its own units. */
final class Canvas {
    /** Where a label's text lies seen from its place. */
    enum Anchor {
        START,
        MIDDLE,
        END
    }

    private static final String TEXT_COLOUR = "#26302c";

    private final Markup svg = new Markup();

    /** Starts the drawing with its text alternatives, on white paper. */
    Canvas(double width, double height, String idPrefix, String title, String description) {
        svg.open("svg")
                .with("xmlns", "http://www.w3.org/2000/svg")
                .with("class", "plot")
                .with("role", "img")
                .with("aria-labelledby", idPrefix + "-title " + idPrefix + "-desc")
                .with("viewBox", "0 0 " + Px.text(width) + " " + Px.text(height))
                .with("width", Px.text(width))
                .with("height", Px.text(height))
                .with("font-family", "system-ui, sans-serif")
                .with("font-size", Integer.toString(TextWidth.FONT_SIZE));
        svg.leaf("title", title, "id", idPrefix + "-title");
        svg.leaf("desc", description, "id", idPrefix + "-desc").line();
        svg.shape("rect", "class", "paper", "width", Px.text(width), "height", Px.text(height), "fill", "#ffffff");
        svg.line();
    }

    /** Draws along a path; nothing when it is empty. */
    void line(Pen pen, CharSequence path) {
        if (path.length() == 0) {
            return;
        }
        svg.shape("path", "class", pen.cssClass(), "d", path.toString(), "fill", "none");
        svg.with("stroke", pen.colour()).with("stroke-width", pen.width());
        if (!pen.dash().isEmpty()) {
            svg.with("stroke-dasharray", pen.dash());
        }
        svg.with("stroke-linecap", "round").with("stroke-linejoin", "round").line();
    }

    /** Fills the inside of a path; nothing when it is empty. */
    void area(String cssClass, String colour, CharSequence path) {
        if (path.length() > 0) {
            svg.shape("path", "class", cssClass, "d", path.toString(), "fill", colour)
                    .line();
        }
    }

    /** Writes a text with its baseline at a height. */
    void label(double x, double y, Anchor anchor, String text) {
        String word =
                switch (anchor) {
                    case START -> "start";
                    case MIDDLE -> "middle";
                    case END -> "end";
                };
        svg.open("text", "x", Px.text(x), "y", Px.text(y), "text-anchor", word);
        svg.with("class", "label").with("fill", TEXT_COLOUR).text(text).close().line();
    }

    /** The finished drawing. */
    String finish() {
        return svg.close().toString();
    }
}
