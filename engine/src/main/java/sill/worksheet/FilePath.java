package sill.worksheet;

/** Reads the path behind {@code file}; whether the file is there is not asked here. */
final class FilePath {
    private FilePath() {}

    static String read(Cursor cursor) throws TextException {
        cursor.skipSpace();
        int open = cursor.position();
        if (!cursor.take("\"")) {
            throw TextException.expected("a path in quotes after 'file'", cursor, "Write 'file \"bench/run-03.csv\"'.");
        }
        while (cursor.peek() != '"') {
            if (cursor.atEnd()) {
                throw QuotedText.unclosed(open);
            }
            if (cursor.peek() == '\\') {
                throw new TextException(
                        cursor.position(), "Found '\\', expected '/' between folders", "Write '/' on every system.");
            }
            cursor.skip(1);
        }
        String path = cursor.from(open + 1);
        cursor.skip(1);
        if (path.isBlank()) {
            throw new TextException(
                    open, "Found an empty path, expected the path of a file in the worksheet's folder", "");
        }
        return path;
    }
}
