package sill.tests.launcher;

/**
 * What a start left.
 *
 * @param code its exit code
 * @param out what it wrote to standard output
 * @param err what it wrote to standard error
 */
record Outcome(int code, String out, String err) {}
