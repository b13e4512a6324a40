package sill.worksheet;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;

/** The problems found so far. */
final class ProblemList {
    private final List<Problem> problems = new ArrayList<>();
    private int cell;

    /** From here on problems lie in this cell; 0 before the first. */
    void enterCell(int number) {
        cell = number;
    }

    void error(SourceLine line, TextException slip) {
        error(line.number(), slip.position() + 1, slip.getMessage(), slip.hint());
    }

    void error(int line, int column, String message, String hint) {
        problems.add(Problem.error(line, column, cell, message, hint));
    }

    void warning(int line, int column, String message, String hint) {
        problems.add(Problem.warning(line, column, cell, message, hint));
    }

    boolean hasErrorIn(int number) {
        return problems.stream().anyMatch(problem -> problem.cell() == number && problem.isError());
    }

    List<Problem> inTextOrder() {
        List<Problem> sorted = new ArrayList<>(problems);
        sorted.sort(Comparator.comparingInt(Problem::line).thenComparingInt(Problem::column));
        return sorted;
    }
}
