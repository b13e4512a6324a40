package sill.values;

/** How a cell ended. */
public enum CellState {
    /** It ended; its values are settled. */
    DONE("done"),
    /** Its text is wrong, or it ended in an exception. */
    PROBLEM("problem"),
    /** It waits on a cell that did not end. */
    NOT_RUN("not run"),
    /** A limit or a lost worker ended it. */
    STOPPED("stopped");

    private final String word;

    CellState(String word) {
        this.word = word;
    }

    /** The word in the record. */
    public String word() {
        return word;
    }
}
