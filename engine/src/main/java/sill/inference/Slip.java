package sill.inference;

/**
 * Two dimensions that don't go together.
 *
 * @param field the field whose caption states what its value is not; empty when the slip lies in the code
 * @param offset place in the compilation unit: of the operator, or of the value
 * @param pair both dimensions; a place tells of each pair once
 * @param message what was found and what was expected, one sentence without a closing full stop
 * @param hint how to mend it; empty when nothing sensible can be said
 */
public record Slip(String field, int offset, String pair, String message, String hint) {
    /** Whether it is the caption that disagrees. */
    public boolean isInCaption() {
        return !field.isEmpty();
    }

    boolean isSameAs(Slip other) {
        return offset == other.offset && field.equals(other.field) && pair.equals(other.pair);
    }
}
