package sill.worksheet;

import java.util.List;
import sill.words.NearestWord;
import sill.words.Quoted;

/** The key of a {@code key: value} line. */
final class KeyedLine {
    private KeyedLine() {}

    /** Reads a key and its colon; the cursor then stands behind the colon. */
    static String key(Cursor cursor, List<String> known) throws TextException {
        int start = cursor.position();
        while (!cursor.atEnd() && cursor.peek() != ':') {
            cursor.skip(1);
        }
        String key = cursor.between(start, cursor.position());
        if (cursor.atEnd() || key.isEmpty()) {
            cursor.moveTo(start);
            throw TextException.expected("'key: value'", cursor, "The keys are " + String.join(", ", known) + ".");
        }
        if (!known.contains(key)) {
            throw new TextException(
                    start,
                    "Found the key " + Quoted.of(key) + ", expected one of " + String.join(", ", known),
                    NearestWord.hint(key, known, ""));
        }
        cursor.skip(1);
        return key;
    }
}
