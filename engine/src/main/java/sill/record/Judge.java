package sill.record;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import sill.record.DesignRecord.CheckEntry;
import sill.record.DesignRecord.Verdict;
import sill.values.CheckValue;
import sill.values.Datum;
import sill.values.RunResult;
import sill.worksheet.Cell;
import sill.worksheet.Check;
import sill.worksheet.Check.Basis;
import sill.worksheet.Worksheet;

/** Judges the checks of a worksheet on the values that a run gave. */
final class Judge {
    private static final String NO_VALUE = "its expression has no value: see the problems";

    private Judge() {}

    static List<CheckEntry> judge(Worksheet worksheet, RunResult run) {
        Map<Integer, CheckValue> values = new HashMap<>();
        run.checks().forEach(value -> values.put(value.line(), value));
        List<CheckEntry> entries = new ArrayList<>();
        for (Cell cell : worksheet.cells()) {
            if (cell instanceof Cell.Checks checks) {
                int index = 0;
                for (Check check : checks.checks()) {
                    index++;
                    Optional<CheckValue> value = Optional.ofNullable(values.get(check.line()));
                    entries.add(judge(run, check, value, cell.number() + "." + index));
                }
            }
        }
        return entries;
    }

    private static CheckEntry judge(RunResult run, Check check, Optional<CheckValue> value, String at) {
        Window window = Window.of(check.requirement());
        if (value.isEmpty()) {
            String reason = run.withoutValue().getOrDefault(check.line(), NO_VALUE);
            return entry(check, window, value, Optional.empty(), Verdict.NOT_JUDGED, reason, at);
        }
        if (!(check.basis() instanceof Basis.Nominal)) {
            return entry(check, window, value, Optional.empty(), Verdict.NOT_JUDGED, Assembly.NO_TOLERANCE_RUNS, at);
        }
        if (value.get().value() instanceof Datum.Truth truth) {
            return entry(check, window, value, Optional.empty(), truth.value() ? Verdict.HOLDS : Verdict.FAILS, "", at);
        }
        double number = ((Datum.Real) value.get().value()).value();
        Verdict verdict = window.holds(number) ? Verdict.HOLDS : Verdict.FAILS;
        return entry(check, window, value, Optional.of(window.margin(number)), verdict, "", at);
    }

    private static CheckEntry entry(
            Check check,
            Window window,
            Optional<CheckValue> value,
            Optional<Double> margin,
            Verdict verdict,
            String reason,
            String at) {
        boolean condition = check.requirement() instanceof Check.Requirement.Holds;
        return new CheckEntry(
                check.text(),
                basis(check.basis()),
                value.map(CheckValue::value),
                condition ? "" : window.unit().coherent().symbol(),
                window.low(),
                window.high(),
                margin,
                margin.flatMap(window::share),
                value.map(found -> ShownValue.of(found.value(), window.unit())).orElse(""),
                window.shown(),
                margin.map(window::shownMargin).orElse(""),
                verdict,
                reason,
                check.remark(),
                at,
                check.line(),
                value.map(CheckValue::uses).orElse(List.of()),
                value.map(CheckValue::dependsOn).orElse(List.of()));
    }

    private static String basis(Basis basis) {
        if (basis instanceof Basis.WorstCase) {
            return "worst-case";
        }
        return basis instanceof Basis.Share ? "share" : "nominal";
    }
}
