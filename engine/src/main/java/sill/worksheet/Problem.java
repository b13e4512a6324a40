package sill.worksheet;

import java.util.Objects;

/**
 * Something the worksheet's author has to know, at a place in the text.
 *
 * @param line line of the worksheet, from 1
 * @param column column in that line, from 1, in UTF-16 units
 * @param cell number of the cell it lies in, 0 when it lies before the first
 * @param severity whether the record is incomplete by it
 * @param message what was found and what was expected, one sentence without a closing full stop
 * @param hint how to mend it; empty when nothing sensible can be said
 */
public record Problem(int line, int column, int cell, Severity severity, String message, String hint) {
    public Problem {
        Objects.requireNonNull(severity, "severity");
        Objects.requireNonNull(message, "message");
        Objects.requireNonNull(hint, "hint");
    }

    /** How much a problem weighs. */
    public enum Severity {
        /** The record is incomplete. */
        ERROR,
        /** Worth a look; the outcome stands. */
        WARNING
    }

    /** An error at a place. */
    public static Problem error(int line, int column, int cell, String message, String hint) {
        return new Problem(line, column, cell, Severity.ERROR, message, hint);
    }

    /** A warning at a place. */
    public static Problem warning(int line, int column, int cell, String message, String hint) {
        return new Problem(line, column, cell, Severity.WARNING, message, hint);
    }

    /** Whether the record is incomplete by it. */
    public boolean isError() {
        return severity == Severity.ERROR;
    }
}
