package sill.worksheet;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.HashSet;
import java.util.List;
import java.util.Set;

/** The problems found so far. */
final class ProblemList {
    /** Nobody reads more, and a text that is no worksheet at all might have millions. */
    private static final int MOST = 1000;

    private final List<Problem> problems = new ArrayList<>();
    private final Set<Integer> cellsWithError = new HashSet<>();
    private int cell;

    /** From here on problems lie in this cell; 0 before the first. */
    void enterCell(int number) {
        cell = number;
    }

    void error(SourceLine line, TextException slip) {
        error(line.number(), slip.position() + 1, slip.getMessage(), slip.hint());
    }

    void error(int line, int column, String message, String hint) {
        cellsWithError.add(cell);
        add(Problem.error(line, column, cell, message, hint));
    }

    void warning(int line, int column, String message, String hint) {
        add(Problem.warning(line, column, cell, message, hint));
    }

    private void add(Problem problem) {
        if (problems.size() < MOST) {
            problems.add(problem);
        } else if (problems.size() == MOST) {
            problems.add(Problem.error(
                    problem.line(),
                    problem.column(),
                    cell,
                    "Found more than " + MOST + " problems, expected fewer; the others are left out",
                    "Mend these first."));
        }
    }

    /** Whether more problems would be left out. */
    boolean isFull() {
        return problems.size() > MOST;
    }

    boolean hasErrorIn(int number) {
        return cellsWithError.contains(number);
    }

    List<Problem> inTextOrder() {
        List<Problem> sorted = new ArrayList<>(problems);
        sorted.sort(Comparator.comparingInt(Problem::line).thenComparingInt(Problem::column));
        return sorted;
    }
}
