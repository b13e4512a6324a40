package sill.worksheet;

/** A place in a line that moves to the right. */
final class Cursor {
    private final String text;
    private final int end;
    private int at;

    Cursor(String text) {
        this(text, 0, text.length());
    }

    /** A cursor over a part of a line; positions are those of the line. */
    Cursor(String text, int start, int end) {
        this.text = text;
        this.at = start;
        this.end = end;
    }

    int position() {
        return at;
    }

    void moveTo(int position) {
        at = position;
    }

    boolean atEnd() {
        return at >= end;
    }

    /** The character here, or NUL at the end. */
    char peek() {
        return peek(0);
    }

    /** The character some places on, or NUL beyond the end. */
    char peek(int ahead) {
        return at + ahead < end ? text.charAt(at + ahead) : '\0';
    }

    void skip(int count) {
        at += count;
    }

    boolean startsWith(String word) {
        return at + word.length() <= end && text.startsWith(word, at);
    }

    /** Moves past the word if it stands here. */
    boolean take(String word) {
        if (!startsWith(word)) {
            return false;
        }
        at += word.length();
        return true;
    }

    /** Moves past the word if it stands here as a whole word. */
    boolean takeWord(String word) {
        int after = at + word.length();
        if (!startsWith(word) || after < end && Character.isJavaIdentifierPart(text.charAt(after))) {
            return false;
        }
        at = after;
        return true;
    }

    void skipSpace() {
        while (at < end && isSpace(text.charAt(at))) {
            at++;
        }
    }

    String from(int start) {
        return text.substring(start, at);
    }

    /** The text between two positions of the line, without spaces at its ends. */
    String between(int start, int stop) {
        return strip(text.substring(start, stop));
    }

    /** Everything from here on, without spaces at its ends. */
    String rest() {
        return strip(text.substring(Math.min(at, end), end));
    }

    /** What stands here up to the next space. */
    String word() {
        int stop = at;
        while (stop < end && !isSpace(text.charAt(stop))) {
            stop++;
        }
        return text.substring(Math.min(at, end), stop);
    }

    /** A cursor over a part of the same line. */
    Cursor part(int start, int stop) {
        return new Cursor(text, start, stop);
    }

    /** The end of the part this cursor moves in. */
    int end() {
        return end;
    }

    /** A space of any width, or a tab. */
    static boolean isSpace(int c) {
        return c == '\t' || Character.isSpaceChar(c);
    }

    static String strip(String text) {
        int start = 0;
        int stop = text.length();
        while (start < stop && isSpace(text.charAt(start))) {
            start++;
        }
        while (stop > start && isSpace(text.charAt(stop - 1))) {
            stop--;
        }
        return text.substring(start, stop);
    }
}
