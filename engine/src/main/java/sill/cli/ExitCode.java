package sill.cli;

import sill.record.DesignRecord.Outcome;

/** What a command's exit code tells the shell. */
final class ExitCode {
    /** All checks hold. */
    static final int HOLDS = 0;

    /** A check fails. */
    static final int FAILS = 1;

    /** The worksheet has problems or a cell did not end; the record is still written. */
    static final int INCOMPLETE = 2;

    /** Bad usage, unreadable or unwritable file. */
    static final int UNUSABLE = 3;

    private ExitCode() {}

    static int of(Outcome outcome) {
        return switch (outcome) {
            case HOLDS -> HOLDS;
            case FAILS -> FAILS;
            case INCOMPLETE -> INCOMPLETE;
        };
    }
}
