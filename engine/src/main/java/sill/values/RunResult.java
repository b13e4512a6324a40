package sill.values;

import java.util.List;
import java.util.Map;
import sill.worksheet.Problem;

/**
 * What a run of the sheet left, complete or not.
 *
 * @param cells calculation and check cells, in order
 * @param results in order of address
 * @param checks those whose expression could be evaluated
 * @param withoutValue why the others could not, by the check's line, as in {@code waits on trip (cell 2)}
 * @param findings of the tolerance cells, in order of address
 * @param problems found while translating and running, in the text's order
 */
public record RunResult(
        List<CellRun> cells,
        List<Result> results,
        List<CheckValue> checks,
        Map<Integer, String> withoutValue,
        List<Finding> findings,
        List<Problem> problems) {
    /** What a run leaves that did nothing. */
    public static final RunResult NOTHING =
            new RunResult(List.of(), List.of(), List.of(), Map.of(), List.of(), List.of());

    public RunResult {
        cells = List.copyOf(cells);
        results = List.copyOf(results);
        checks = List.copyOf(checks);
        withoutValue = Map.copyOf(withoutValue);
        findings = List.copyOf(findings);
        problems = List.copyOf(problems);
    }
}
