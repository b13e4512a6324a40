package sill.record;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import sill.record.DesignRecord.Limit;
import sill.values.Finding;
import sill.worksheet.Cell;
import sill.worksheet.Check;
import sill.worksheet.ToleranceStudy.Target;
import sill.worksheet.Worksheet;

/** Which checks judge the expressions that tolerance cells study, and what was found of them. */
final class StudiedChecks {
    private final Map<Integer, Cell.Tolerance> cells = new HashMap<>();
    private final List<Check> checks = new ArrayList<>();
    private final Map<String, Finding.WorstCase> worstCases = new HashMap<>();
    private final Map<Integer, Finding.Share> shares = new HashMap<>();

    StudiedChecks(Worksheet worksheet, List<Finding> findings) {
        for (Cell cell : worksheet.cells()) {
            if (cell instanceof Cell.Tolerance tolerance) {
                cells.put(cell.number(), tolerance);
            } else if (cell instanceof Cell.Checks those) {
                checks.addAll(those.checks());
            }
        }
        for (Finding finding : findings) {
            // The components of a record are other numbers than the expression.
            if (finding.component().isEmpty()) {
                String key = target(finding).key();
                finding.worstCase().ifPresent(found -> worstCases.putIfAbsent(key, found));
                finding.monteCarlo()
                        .ifPresent(found -> found.shares().forEach(share -> shares.put(share.line(), share)));
            }
        }
    }

    /** The expression that a finding is about, where it stands. */
    Target target(Finding finding) {
        return cells.get(finding.cell()).study().of().get(finding.index() - 1);
    }

    /** The limits of the checks that judge what a finding is about; a component is also called as a method. */
    List<Limit> limits(Finding finding) {
        String key = target(finding).key() + (finding.component().isEmpty() ? "" : "." + finding.component() + "()");
        List<Limit> limits = new ArrayList<>();
        for (Check check : checks) {
            if (check.key().equals(key)) {
                String label = check.remark().isBlank()
                        ? "limit"
                        : check.remark().strip().split("\\s+", 2)[0];
                Window window = Window.of(check.requirement());
                window.low().ifPresent(limit -> limits.add(new Limit(limit, label)));
                window.high().ifPresent(limit -> limits.add(new Limit(limit, label)));
            }
        }
        return limits;
    }

    /** The extremes of a check's expression. */
    Optional<Finding.WorstCase> worstCase(Check check) {
        return Optional.ofNullable(worstCases.get(check.key()));
    }

    /** The share of samples inside a check's limits. */
    Optional<Finding.Share> share(Check check) {
        return Optional.ofNullable(shares.get(check.line()));
    }
}
