package sill.formula;

/**
 * How far letters reach. Browsers set a token of plain text by the height of its letters, but one that holds a link by that of a
 * line of text, so a style sheet has to be told.
 */
final class Reach {
    /** Letters no higher than an x. */
    private static final String LOW = "acegmnopqrsuvwxyzαγεηικμνοπρστυχω";

    /** Letters that reach below the line. */
    private static final String DEEP = "fgjpqyβγζημξρφχψ";

    private Reach() {}

    /** Classes, each behind a space: {@code up} for a text that reaches above an x, {@code down} for one below the line. */
    static String of(String text) {
        boolean up = text.codePoints().anyMatch(letter -> LOW.indexOf(letter) < 0);
        boolean down = text.codePoints().anyMatch(letter -> DEEP.indexOf(letter) >= 0);
        return (up ? " up" : "") + (down ? " down" : "");
    }
}
