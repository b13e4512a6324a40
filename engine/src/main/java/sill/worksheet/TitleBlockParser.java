package sill.worksheet;

import java.util.HashMap;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import sill.words.NearestWord;

/** Reads the lines between {@code sill 1} and the first cell. */
final class TitleBlockParser {
    private final ProblemList problems;
    private final Map<String, String> fields = new LinkedHashMap<>();
    private final Map<String, Integer> lineOfKey = new HashMap<>();

    private TitleBlockParser(ProblemList problems) {
        this.problems = problems;
    }

    /** Reads the lines; {@code whole} unless some of them could not be read and are missing. */
    static TitleBlock parse(List<SourceLine> lines, boolean whole, ProblemList problems) {
        TitleBlockParser parser = new TitleBlockParser(problems);
        // What stands on line 1 instead of "sill 1" has been reported.
        int lastWithoutKey = 0;
        for (SourceLine line : lines) {
            if (line.isBlank() || line.isComment()) {
                continue;
            }
            if (line.text().indexOf(':') < 0) {
                // Prose before the first cell is one slip, however many lines it has.
                if (line.number() != lastWithoutKey + 1) {
                    parser.prose(line);
                }
                lastWithoutKey = line.number();
                continue;
            }
            try {
                parser.read(line);
            } catch (TextException slip) {
                problems.error(line, slip);
            }
        }
        if (whole && !parser.lineOfKey.containsKey("title")) {
            problems.error(
                    1,
                    1,
                    "Found no title, expected a line 'title: …' before the first cell",
                    "Add 'title: …' after line 1.");
        }
        return new TitleBlock(parser.fields);
    }

    private void prose(SourceLine line) {
        Cursor cursor = new Cursor(line.text());
        cursor.skipSpace();
        problems.error(
                line,
                TextException.expected(
                        "'key: value' before the first cell", cursor, "Prose goes into a cell: ':: note Purpose'."));
    }

    private void read(SourceLine line) throws TextException {
        Cursor cursor = new Cursor(line.text());
        cursor.skipSpace();
        int start = cursor.position();
        String key;
        try {
            key = KeyedLine.key(cursor, TitleBlock.KEYS);
        } catch (TextException slip) {
            // A title whose key is misspelled is not missing as well.
            String word = cursor.between(start, cursor.position());
            NearestWord.to(word, TitleBlock.KEYS).ifPresent(near -> lineOfKey.putIfAbsent(near, line.number()));
            throw slip;
        }
        Integer first = lineOfKey.putIfAbsent(key, line.number());
        if (first != null) {
            throw new TextException(
                    start,
                    "Found '" + key + ":' again, expected each key once; it is on line " + first,
                    "The first one counts. Leave this one out.");
        }
        cursor.skipSpace();
        if (cursor.atEnd()) {
            throw TextException.expected("a text after '" + key + ":'", cursor, "Write one or leave the line out.");
        }
        fields.put(key, cursor.rest());
    }
}
