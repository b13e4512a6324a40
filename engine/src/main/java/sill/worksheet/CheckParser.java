package sill.worksheet;

import java.util.ArrayList;
import java.util.List;

/** Reads the lines of check cells. */
final class CheckParser {
    private final ProblemList problems;

    CheckParser(ProblemList problems) {
        this.problems = problems;
    }

    List<Check> parse(List<SourceLine> lines) {
        List<Check> checks = new ArrayList<>();
        for (SourceLine line : lines) {
            if (!line.isBlank() && !line.isComment()) {
                try {
                    checks.add(check(line));
                } catch (TextException slip) {
                    problems.error(line, slip);
                }
            }
        }
        return checks;
    }

    private static Check check(SourceLine line) throws TextException {
        String text = line.text();
        CheckSplitter.Split split = CheckSplitter.split(text);
        Cursor tail = new Cursor(text, split.requirement(), split.end());
        RequirementReader.Judged judged = RequirementReader.read(tail);
        Cursor whole = new Cursor(text);
        whole.skipSpace();
        int start = whole.position();
        if (start >= split.requirement()) {
            throw new TextException(
                    start,
                    "Found a requirement without an expression, expected what is to be checked before it",
                    "Write 'band at least 600 mV'.");
        }
        whole.moveTo(Math.min(text.length(), split.end() + 1));
        return new Check(
                line.number(),
                whole.between(start, split.end()),
                whole.between(start, split.requirement()),
                start + 1,
                judged.requirement(),
                judged.basis(),
                whole.rest());
    }
}
