package sill.cli;

/** A file that can't be read or written; the message says which and why. */
final class Unusable extends Exception {
    private static final long serialVersionUID = 1;

    private final String mend;

    Unusable(String message, String mend) {
        super(message);
        this.mend = mend;
    }

    /** How to mend it. */
    String mend() {
        return mend;
    }
}
