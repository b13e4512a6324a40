package sill.study;

/** Which way a result goes as one input rises, everywhere that was looked at. */
public enum Direction {
    /** It does not change. */
    NONE,
    /** It rises, or stays. */
    RISING,
    /** It falls, or stays. */
    FALLING,
    /** It rises in one place and falls in another. */
    NEITHER
}
