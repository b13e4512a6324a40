package sill.values;

import java.util.List;
import sill.worksheet.Problem;

/**
 * What a run of the sheet left, complete or not.
 *
 * @param cells calculation and check cells, in order
 * @param results in order of address
 * @param checks those whose expression could be evaluated
 * @param problems found while translating and running, in the text's order
 */
public record RunResult(List<CellRun> cells, List<Result> results, List<CheckValue> checks, List<Problem> problems) {
    public RunResult {
        cells = List.copyOf(cells);
        results = List.copyOf(results);
        checks = List.copyOf(checks);
        problems = List.copyOf(problems);
    }
}
