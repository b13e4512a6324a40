package sill.worksheet;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import sill.worksheet.Given.Quantity;
import sill.worksheet.Given.Tolerance;

/** Reads the lines of given cells; one parser knows the names of the whole worksheet. */
final class GivenParser {
    private final ProblemList problems;
    private final Map<String, Integer> lineOfName = new HashMap<>();

    GivenParser(ProblemList problems) {
        this.problems = problems;
    }

    /** The givens of a cell and the names of those whose value is wrong. */
    record Lines(List<Given> givens, List<String> wrong) {}

    Lines parse(List<SourceLine> lines) {
        List<Given> givens = new ArrayList<>();
        List<String> wrong = new ArrayList<>();
        for (SourceLine line : lines) {
            if (!line.isBlank() && !line.isComment()) {
                parse(line, givens, wrong);
            }
        }
        return new Lines(givens, wrong);
    }

    private void parse(SourceLine line, List<Given> givens, List<String> wrong) {
        Cursor cursor = new Cursor(line.text());
        cursor.skipSpace();
        int start = cursor.position();
        String name;
        try {
            name = GivenName.read(cursor);
            declare(name, line, start);
        } catch (TextException slip) {
            problems.error(line, slip);
            return;
        }
        try {
            Given.Value value = GivenValue.read(cursor);
            String remark = cursor.take("|") ? cursor.rest() : "";
            givens.add(new Given(name, line.number(), start + 1, value, remark));
            warnOfNothing(value, line, start);
        } catch (TextException slip) {
            problems.error(line, slip);
            wrong.add(name);
        }
    }

    private void declare(String name, SourceLine line, int start) throws TextException {
        Integer first = lineOfName.putIfAbsent(name, line.number());
        if (first != null) {
            throw new TextException(
                    start,
                    "Found the name '" + name + "' again, expected each name once; it is given on line " + first,
                    "The first one counts. Choose another name here.");
        }
    }

    private void warnOfNothing(Given.Value value, SourceLine line, int start) {
        if (value instanceof Quantity quantity
                && quantity.nominal() == 0
                && quantity.tolerance() instanceof Tolerance.Relative relative
                && relative.fraction() > 0) {
            problems.warning(
                    line.number(),
                    start + 1,
                    "Found a relative tolerance of 0, which allows nothing",
                    "Write the tolerance with a unit, such as '± 3 mV'.");
        }
    }
}
