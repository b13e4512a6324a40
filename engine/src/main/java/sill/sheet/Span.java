package sill.sheet;

/** A stretch of text: {@code start} inclusive, {@code end} exclusive. */
public record Span(int start, int end) {
    /** The stretch of {@code text} it covers. */
    public String of(String text) {
        return text.substring(start, end);
    }

    Span shifted(int by) {
        return new Span(start + by, end + by);
    }
}
