package sill.trace;

/** What a node of the trace is; each kind has a shape of its own in the drawing. */
public enum TraceKind {
    /** An input value. */
    GIVEN("given"),
    /** A result of a calculation. */
    RESULT("result"),
    /** A plot, which shows results. */
    PLOT("plot"),
    /** A requirement. */
    CHECK("check");

    private final String word;

    TraceKind(String word) {
        this.word = word;
    }

    /** The word for it, as in {@code given}; part of a class name in the drawing. */
    public String word() {
        return word;
    }
}
