package sill.worksheet;

import sill.words.Quoted;

/** What is wrong in one line; the reader of the line turns it into a {@link Problem}. */
final class TextException extends Exception {
    private static final long serialVersionUID = 1L;

    private final int position;
    private final String hint;

    /**
     * A slip at a place.
     *
     * @param position in the line, from 0
     * @param message as {@link Problem#message}
     * @param hint as {@link Problem#hint}
     */
    TextException(int position, String message, String hint) {
        // Never seen as a stack trace, and a long worksheet may hold many.
        super(message, null, false, false);
        this.position = position;
        this.hint = hint;
    }

    /** What stands at the cursor is not what was expected there. */
    static TextException expected(String expected, Cursor found, String hint) {
        String what = found.atEnd() ? "the end" : Quoted.of(found.rest());
        return new TextException(found.position(), "Found " + what + ", expected " + expected, hint);
    }

    int position() {
        return position;
    }

    String hint() {
        return hint;
    }
}
