package sill.sheet;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;

/**
 * Generated text that remembers where its parts come from. Offsets of the text lead back to an offset of a worksheet
 * piece: exactly where the part was copied, and to one anchor where it was made up.
 */
final class MappedText {
    private final StringBuilder text = new StringBuilder();
    private final List<Part> parts = new ArrayList<>();
    private final Map<Integer, Origin> brokenLines = new HashMap<>();
    private int line = 1;

    /** Where an offset comes from. */
    record Origin(Piece piece, int offset) {
        Place place() {
            return piece.place(offset);
        }
    }

    /**
     * A line break put into copied text.
     *
     * @param at offset before which the line breaks
     * @param tells offset that the new line stands for
     */
    record Break(int at, int tells) {}

    private record Part(int start, int end, int line, Piece piece, int offset, boolean copied) {
        Origin origin(int at) {
            return new Origin(piece, copied ? offset + Math.max(0, Math.min(at, end) - start) : offset);
        }
    }

    /** Appends text that no worksheet line stands for. */
    MappedText add(String made) {
        for (int i = made.indexOf('\n'); i >= 0; i = made.indexOf('\n', i + 1)) {
            line++;
        }
        text.append(made);
        return this;
    }

    /** Appends text made up for one place of a piece. */
    MappedText add(String made, Piece piece, int offset) {
        parts.add(new Part(text.length(), text.length() + made.length(), line, piece, offset, false));
        return add(made);
    }

    /** Appends a stretch of a piece as it stands. */
    MappedText copy(Piece piece, Span span) {
        if (span.end() > span.start()) {
            parts.add(new Part(
                    text.length(), text.length() + span.end() - span.start(), line, piece, span.start(), true));
            add(span.of(piece.text()));
        }
        return this;
    }

    /**
     * Appends a stretch of a piece with line breaks put in, so that the line numbers of the compiled class tell calls
     * apart that stand on one line of the worksheet.
     */
    MappedText copy(Piece piece, Span span, List<Break> breaks) {
        int from = span.start();
        for (Break next : breaks) {
            if (next.at() >= from && next.at() < span.end() && next.at() >= span.start()) {
                copy(piece, new Span(from, next.at()));
                add("\n");
                brokenLines.put(line, new Origin(piece, next.tells()));
                from = next.at();
            }
        }
        return copy(piece, new Span(from, span.end()));
    }

    /** Where the character at an offset comes from: its own part, else the part before it, else the first one. */
    Origin origin(int offset) {
        return part(offset, Part::start).origin(offset);
    }

    /** Where a line of the text comes from; a line between the parts has the origin of the one before. */
    Origin lineOrigin(int number) {
        Origin broken = brokenLines.get(number);
        if (broken != null) {
            return broken;
        }
        Part part = part(number, Part::line);
        if (!part.copied()) {
            return part.origin(part.start());
        }
        String piece = part.piece().text();
        int at = part.offset();
        for (int skip = number - part.line(); skip > 0 && piece.indexOf('\n', at) >= 0; skip--) {
            at = piece.indexOf('\n', at) + 1;
        }
        while (at < piece.length() - 1 && Character.isWhitespace(piece.charAt(at))) {
            at++;
        }
        return new Origin(part.piece(), at);
    }

    /** The last part whose key is not beyond the wanted one, or the first part. */
    private Part part(int wanted, java.util.function.ToIntFunction<Part> key) {
        int low = 0;
        int high = parts.size() - 1;
        while (low < high) {
            int middle = (low + high + 1) >>> 1;
            if (key.applyAsInt(parts.get(middle)) <= wanted) {
                low = middle;
            } else {
                high = middle - 1;
            }
        }
        return parts.get(low);
    }

    int length() {
        return text.length();
    }

    boolean isEmpty() {
        return parts.isEmpty();
    }

    @Override
    public String toString() {
        return text.toString();
    }
}
