package sill.worker;

import java.util.List;
import sill.sheet.TranslatedSheet;
import sill.values.Finding;
import sill.values.Result;
import sill.worksheet.Problem;

/** Studies what tolerance cells ask for. */
@FunctionalInterface
interface Studies {
    /**
     * Studies one cell.
     *
     * @param step the cell, with its expressions as results
     * @param nominal what these gave
     */
    Outcome study(TranslatedSheet.Step step, List<Result> nominal);

    /** What was found, and what is wrong; nothing was found where the cell could not be studied. */
    record Outcome(List<Finding> findings, List<Problem> problems) {
        boolean failed() {
            return findings.isEmpty();
        }
    }
}
