package sill.worker;

import java.util.ArrayList;
import java.util.List;
import sill.worksheet.Cell;
import sill.worksheet.Check;
import sill.worksheet.Check.Requirement;
import sill.worksheet.ToleranceStudy;
import sill.worksheet.ToleranceStudy.Target;
import sill.worksheet.Worksheet;

/** Takes from a worksheet what its tolerance cells ask for, and which checks rest on their samples. */
final class StudyOrders {
    private StudyOrders() {}

    static List<Job.StudyOrder> of(Worksheet worksheet) {
        List<Job.StudyOrder> orders = new ArrayList<>();
        for (Cell cell : worksheet.cells()) {
            if (cell instanceof Cell.Tolerance tolerance
                    && !tolerance.study().of().isEmpty()) {
                ToleranceStudy study = tolerance.study();
                orders.add(new Job.StudyOrder(
                        cell.number(),
                        study.methods(),
                        study.vary().stream().map(Target::text).toList(),
                        study.hold().stream().map(Target::text).toList(),
                        study.over().map(Target::text),
                        shares(worksheet, study)));
            }
        }
        return orders;
    }

    private static List<Job.ShareWanted> shares(Worksheet worksheet, ToleranceStudy study) {
        List<String> targets = study.of().stream().map(target -> target.key()).toList();
        List<Job.ShareWanted> shares = new ArrayList<>();
        for (Cell cell : worksheet.cells()) {
            if (cell instanceof Cell.Checks checks) {
                for (Check check : checks.checks()) {
                    int target = targets.indexOf(check.key());
                    if (target >= 0 && check.basis() instanceof Check.Basis.Share) {
                        shares.add(share(check, target));
                    }
                }
            }
        }
        return shares;
    }

    private static Job.ShareWanted share(Check check, int target) {
        Requirement requirement = check.requirement();
        double low = Double.NEGATIVE_INFINITY;
        double high = Double.POSITIVE_INFINITY;
        if (requirement instanceof Requirement.Within within) {
            low = within.low().value();
            high = within.high().value();
        } else if (requirement instanceof Requirement.AtLeast least) {
            low = least.low().value();
        } else if (requirement instanceof Requirement.AtMost most) {
            high = most.high().value();
        } else if (requirement instanceof Requirement.EqualTo equal) {
            low = equal.value().value() - equal.distance();
            high = equal.value().value() + equal.distance();
        }
        return new Job.ShareWanted(check.line(), target, low, high);
    }
}
