package sill.units;

import java.util.Objects;

/** A text that is not a unit symbol; whoever wrote the text is to be told. */
public final class UnitException extends Exception {
    private static final long serialVersionUID = 1L;

    private final int position;
    private final String found;
    private final String expected;
    private final String hint;

    /**
     * An error at a place.
     *
     * @param position where in the text, from 0, in UTF-16 units
     * @param found what stands there
     * @param expected what should stand there
     * @param hint how to mend it, one or more sentences; empty when nothing sensible can be said
     */
    public UnitException(int position, String found, String expected, String hint) {
        super("Found " + found + ", expected " + expected);
        this.position = position;
        this.found = Objects.requireNonNull(found, "found");
        this.expected = Objects.requireNonNull(expected, "expected");
        this.hint = Objects.requireNonNull(hint, "hint");
    }

    /** Where in the text, from 0, in UTF-16 units. */
    public int position() {
        return position;
    }

    /** What stands there, quoted. */
    public String found() {
        return found;
    }

    /** What should stand there. */
    public String expected() {
        return expected;
    }

    /** How to mend it; may be empty. */
    public String hint() {
        return hint;
    }
}
