package sill.sheet;

import java.util.Optional;
import sill.units.Unit;
import sill.units.UnitException;

/**
 * The comment behind a snippet.
 *
 * @param text its text, without a leading {@code [unit]}
 * @param unit the unit it states
 * @param at offset in the piece of what stands in the brackets
 * @param fault why that is no unit, empty when it is one or nothing stands there
 * @param hint how to mend the fault
 */
record Caption(String text, Optional<Unit> unit, int at, String fault, String hint) {
    static final Caption NONE = new Caption("", Optional.empty(), 0, "", "");

    /** Reads a comment's text that starts at an offset of the piece, behind the slashes. */
    static Caption read(String comment, int offset) {
        String text = comment.strip();
        int close = text.indexOf(']');
        if (!text.startsWith("[") || close < 0) {
            return new Caption(text, Optional.empty(), offset, "", "");
        }
        String symbol = text.substring(1, close).strip();
        String rest = text.substring(close + 1).strip();
        int at = offset + comment.indexOf('[') + 1;
        try {
            return new Caption(rest, Optional.of(Unit.parse(symbol)), at, "", "");
        } catch (UnitException e) {
            return new Caption(rest, Optional.empty(), at, e.getMessage(), e.hint());
        }
    }
}
