package sill.worker;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import sill.sheet.Place;
import sill.sheet.SheetSource;
import sill.sheet.SheetSource.CheckLine;
import sill.sheet.SheetSource.CodeCell;
import sill.sheet.SheetSource.GivenField;
import sill.sheet.SheetSource.GivenType;
import sill.sheet.Span;
import sill.units.Unit;
import sill.worksheet.Cell;
import sill.worksheet.Check;
import sill.worksheet.Given;
import sill.worksheet.ToleranceStudy;
import sill.worksheet.Worksheet;

/** Takes from a worksheet what a worker needs. */
final class JobWriter {
    private final List<GivenField> givens = new ArrayList<>();
    private final List<CodeCell> cells = new ArrayList<>();
    private final List<CheckLine> checks = new ArrayList<>();
    private final Map<String, Job.GivenValue> values = new LinkedHashMap<>();
    private final Map<String, byte[]> files;

    private JobWriter(Map<String, byte[]> files) {
        this.files = files;
    }

    /**
     * The job for a worksheet.
     *
     * @param files data files by path; a given whose file is not there is missing
     * @param leftOut places of cells and checks that can't be ended
     */
    static Job job(Worksheet worksheet, Map<String, byte[]> files, Set<Place> leftOut) {
        JobWriter writer = new JobWriter(files);
        for (Cell cell : worksheet.cells()) {
            if (cell instanceof Cell.Givens givens) {
                writer.add(givens);
            } else if (cell instanceof Cell.Calculation code) {
                writer.cells.add(new CodeCell(code.number(), code.caption(), code.line(), code.source()));
            } else if (cell instanceof Cell.Tolerance tolerance) {
                writer.add(tolerance);
            } else if (cell instanceof Cell.Checks checks) {
                for (Check check : checks.checks()) {
                    boolean condition = check.requirement() instanceof Check.Requirement.Holds;
                    writer.checks.add(new CheckLine(
                            cell.number(),
                            check.line(),
                            check.column(),
                            check.expression(),
                            condition,
                            unit(check.requirement())));
                }
            }
        }
        return new Job(
                new SheetSource(writer.givens, writer.cells, writer.checks),
                writer.values,
                StudyOrders.of(worksheet),
                leftOut);
    }

    private static Optional<Job.Spread> spread(Given.Quantity quantity) {
        return quantity.hasLimits()
                ? Optional.of(new Job.Spread(quantity.low(), quantity.high(), quantity.distribution()))
                : Optional.empty();
    }

    private void add(Cell.Tolerance cell) {
        List<Span> studied = new ArrayList<>();
        for (ToleranceStudy.Target target : cell.study().of()) {
            // The source starts on the line behind the header.
            int lineStart = 0;
            for (int line = cell.line() + 1; line < target.line(); line++) {
                lineStart = cell.source().indexOf('\n', lineStart) + 1;
            }
            int start = lineStart + target.column() - 1;
            studied.add(new Span(start, start + target.text().length()));
        }
        if (!studied.isEmpty()) {
            cells.add(new CodeCell(cell.number(), cell.caption(), cell.line(), cell.source(), studied));
        }
    }

    /** The limits' coherent unit; none when they are bare zeros, which fit anything, or when there are no limits. */
    private static String unit(Check.Requirement requirement) {
        List<Check.Limit> limits = List.of();
        if (requirement instanceof Check.Requirement.Within within) {
            limits = List.of(within.low(), within.high());
        } else if (requirement instanceof Check.Requirement.AtLeast least) {
            limits = List.of(least.low());
        } else if (requirement instanceof Check.Requirement.AtMost most) {
            limits = List.of(most.high());
        } else if (requirement instanceof Check.Requirement.EqualTo equal) {
            limits = List.of(equal.value());
        }
        return limits.stream()
                .filter(limit -> limit.value() != 0 || !limit.unit().equals(Unit.ONE))
                .map(limit -> limit.unit().coherent().symbol())
                .findFirst()
                .orElse("");
    }

    private void add(Cell.Givens cell) {
        Set<String> present = new LinkedHashSet<>();
        for (Given given : cell.givens()) {
            present.add(given.name());
            add(cell.number(), given);
        }
        // A line that is wrong still names what others wait on.
        for (String name : cell.wrong()) {
            if (present.add(name)) {
                givens.add(new GivenField(name, GivenType.MISSING, cell.number(), cell.line(), ""));
            }
        }
    }

    private void add(int cell, Given given) {
        GivenType type = GivenType.MISSING;
        String unit = "";
        if (given.value() instanceof Given.Quantity quantity) {
            type = GivenType.NUMBER;
            unit = quantity.unit().coherent().symbol();
            values.put(given.name(), new Job.GivenValue.Number(quantity.nominal(), spread(quantity)));
        } else if (given.value() instanceof Given.Quantities quantities) {
            type = GivenType.NUMBERS;
            unit = quantities.unit().coherent().symbol();
            double[] numbers = quantities.values().stream()
                    .mapToDouble(Double::doubleValue)
                    .toArray();
            values.put(given.name(), new Job.GivenValue.Numbers(numbers));
        } else if (given.value() instanceof Given.Text text) {
            type = GivenType.TEXT;
            values.put(given.name(), new Job.GivenValue.Text(text.text()));
        } else if (given.value() instanceof Given.DataFile file && files.containsKey(file.path())) {
            type = GivenType.TABLE;
            values.put(given.name(), new Job.GivenValue.File(file.path(), files.get(file.path())));
        }
        givens.add(new GivenField(given.name(), type, cell, given.line(), unit));
    }
}
