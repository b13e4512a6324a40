package sill.formula;

/** The result that a working leads to, as its record prints it. */
public interface PrintedResult {
    /**
     * Its text.
     *
     * @param component a component of a record; empty for the value itself
     * @return empty when there is no such number or truth value
     */
    String shown(String component);

    /** The text that another value in its place would have; a truth value counts as 1 or 0. */
    String shown(String component, double value);
}
