package sill.sheet;

/** A place in the worksheet: line and column from 1. */
public record Place(int line, int column) implements Comparable<Place> {
    /** The place of an offset in a text that starts at {@code line}, {@code column}. */
    static Place in(String text, int offset, int line, int column) {
        int at = Math.max(0, Math.min(offset, text.length()));
        int row = line;
        int start = 0;
        for (int i = text.indexOf('\n'); i >= 0 && i < at; i = text.indexOf('\n', i + 1)) {
            row++;
            start = i + 1;
        }
        return new Place(row, at - start + (row == line ? column : 1));
    }

    @Override
    public int compareTo(Place other) {
        return line != other.line ? Integer.compare(line, other.line) : Integer.compare(column, other.column);
    }
}
