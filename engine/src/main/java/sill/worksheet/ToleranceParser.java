package sill.worksheet;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import sill.words.Quoted;
import sill.worksheet.ToleranceStudy.Method;
import sill.worksheet.ToleranceStudy.Target;

/** Reads the lines of one tolerance cell. */
final class ToleranceParser {
    private static final List<String> KEYS = List.of("of", "method", "vary", "hold", "over");

    private final ProblemList problems;
    private final Map<String, Integer> lineOfKey = new HashMap<>();
    private final List<Target> of = new ArrayList<>();
    private final List<Method> methods = new ArrayList<>();
    private final List<Target> vary = new ArrayList<>();
    private final List<Target> hold = new ArrayList<>();
    private final List<Target> over = new ArrayList<>();

    private ToleranceParser(ProblemList problems) {
        this.problems = problems;
    }

    static ToleranceStudy parse(int header, List<SourceLine> lines, ProblemList problems) {
        ToleranceParser parser = new ToleranceParser(problems);
        for (SourceLine line : lines) {
            if (!line.isBlank() && !line.isComment()) {
                try {
                    parser.read(line);
                } catch (TextException slip) {
                    problems.error(line, slip);
                }
            }
        }
        parser.require("of", "what is to be studied", "of: trip.rising(), band", header);
        parser.require("method", "how", "method: worst-case, rss, monte-carlo 200000 seed 7", header);
        return new ToleranceStudy(
                parser.of,
                parser.methods,
                parser.vary,
                parser.hold,
                parser.over.stream().findFirst());
    }

    private void require(String key, String meaning, String example, int header) {
        if (!lineOfKey.containsKey(key)) {
            problems.error(
                    header,
                    1,
                    "Found a tolerance cell without '" + key + ":', expected a line that says " + meaning,
                    "Add a line such as '" + example + "'.");
        }
    }

    private void read(SourceLine line) throws TextException {
        Cursor cursor = new Cursor(line.text());
        cursor.skipSpace();
        int start = cursor.position();
        String key = KeyedLine.key(cursor, KEYS);
        Integer first = lineOfKey.putIfAbsent(key, line.number());
        if (first != null) {
            throw new TextException(
                    start,
                    "Found '" + key + ":' again, expected each key once; it is on line " + first,
                    "Put everything into one line, with commas.");
        }
        switch (key) {
            case "of" -> distinct(TopLevelList.read(cursor, line, "a result or an expression"), line, of);
            case "method" -> methods(cursor, line);
            case "vary" -> names(cursor, line, vary);
            case "hold" -> names(cursor, line, hold);
            default -> over(cursor, line);
        }
    }

    private void over(Cursor cursor, SourceLine line) throws TextException {
        names(cursor, line, over);
        if (over.size() > 1) {
            problems.error(
                    line.number(),
                    over.get(1).column(),
                    "Found " + Quoted.of(over.get(1).text()) + " as a second name behind 'over:', expected one given",
                    "A tolerance cell of its own may go over another given.");
        }
    }

    private void names(Cursor cursor, SourceLine line, List<Target> into) throws TextException {
        List<Target> names = new ArrayList<>();
        for (Target target : TopLevelList.read(cursor, line, "the name of a given")) {
            if (GivenName.isName(target.text())) {
                names.add(target);
            } else {
                problems.error(
                        line.number(),
                        target.column(),
                        "Found " + Quoted.of(target.text()) + ", expected the name of a given",
                        "");
            }
        }
        distinct(names, line, into);
    }

    private void distinct(List<Target> targets, SourceLine line, List<Target> into) {
        Set<String> seen = new HashSet<>();
        for (Target target : targets) {
            if (seen.add(target.text())) {
                into.add(target);
            } else {
                twice(target, line);
            }
        }
    }

    private void methods(Cursor cursor, SourceLine line) throws TextException {
        Set<Class<?>> seen = new HashSet<>();
        for (Target target : TopLevelList.read(cursor, line, "a method")) {
            if (problems.isFull()) {
                return;
            }
            try {
                Method method = MethodReader.read(target);
                if (seen.add(method.getClass())) {
                    methods.add(method);
                } else {
                    twice(target, line);
                }
            } catch (TextException slip) {
                problems.error(line, slip);
            }
        }
    }

    private void twice(Target target, SourceLine line) {
        problems.error(
                line.number(),
                target.column(),
                "Found " + Quoted.of(target.text()) + " a second time, expected each entry once",
                "Leave one of them out.");
    }
}
