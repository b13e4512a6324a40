package sill.worker;

import java.util.regex.Pattern;

/** What a worker's JVM is to be good at. */
public enum Pace {
    /** Starting: what runs once is not worth compiling well. */
    QUICK_START,
    /** Repeating: tolerance runs call the same code a hundred thousand times. */
    LONG_RUN;

    private static final Pattern TOLERANCE_CELL = Pattern.compile("(?m)^::[ \\t]*tolerance\\b");

    /** What a worksheet's text calls for, told before it is parsed. */
    public static Pace of(String worksheet) {
        return TOLERANCE_CELL.matcher(worksheet).find() ? LONG_RUN : QUICK_START;
    }
}
