package sill.record;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import sill.record.DesignRecord.CheckEntry;
import sill.record.DesignRecord.OverTolerance;
import sill.record.DesignRecord.Verdict;
import sill.units.Notation;
import sill.values.CheckValue;
import sill.values.Datum;
import sill.values.Finding;
import sill.values.RunResult;
import sill.worksheet.Cell;
import sill.worksheet.Check;
import sill.worksheet.Check.Basis;
import sill.worksheet.Worksheet;

/** Judges the checks of a worksheet on the values that a run gave, and on what its tolerance cells found. */
final class Judge {
    private static final String NO_VALUE = "its expression has no value: see the problems";
    private static final String NOTHING_FOUND = "the tolerance cell that studies it found nothing: see the problems";

    private final RunResult run;
    private final Map<Integer, CheckValue> values = new HashMap<>();
    private final StudiedChecks studied;

    private Judge(Worksheet worksheet, RunResult run) {
        this.run = run;
        run.checks().forEach(value -> values.put(value.line(), value));
        studied = new StudiedChecks(worksheet, run.findings());
    }

    static List<CheckEntry> judge(Worksheet worksheet, RunResult run) {
        Judge judge = new Judge(worksheet, run);
        List<CheckEntry> entries = new ArrayList<>();
        for (Cell cell : worksheet.cells()) {
            if (cell instanceof Cell.Checks checks) {
                int index = 0;
                for (Check check : checks.checks()) {
                    index++;
                    entries.add(judge.judge(check, cell.number() + "." + index));
                }
            }
        }
        return entries;
    }

    private CheckEntry judge(Check check, String at) {
        Window window = Window.of(check.requirement());
        CheckValue value = values.get(check.line());
        if (value == null) {
            return entry(check, at, Judged.not(run.withoutValue().getOrDefault(check.line(), NO_VALUE)));
        }
        if (value.value() instanceof Datum.Truth truth) {
            String shown = ShownValue.of(truth, window.unit());
            return entry(
                    check, at, new Judged(verdict(truth.value()), Optional.empty(), OverTolerance.NONE, shown, "", ""));
        }
        double number = ((Datum.Real) value.value()).value();
        if (check.basis() instanceof Basis.WorstCase) {
            return entry(
                    check,
                    at,
                    studied.worstCase(check)
                            .map(found -> atWorst(window, found))
                            .orElse(NONE_FOUND));
        } else if (check.basis() instanceof Basis.Share wanted) {
            return entry(
                    check,
                    at,
                    studied.share(check)
                            .map(found -> inShare(window, number, found, wanted.share()))
                            .orElse(NONE_FOUND));
        }
        double margin = window.margin(number);
        return entry(
                check,
                at,
                new Judged(
                        verdict(margin >= 0),
                        Optional.of(margin),
                        OverTolerance.NONE,
                        ShownValue.of(value.value(), window.unit()),
                        window.shownMargin(margin),
                        ""));
    }

    private static final Judged NONE_FOUND = Judged.not(NOTHING_FOUND);

    /** What a check came to. */
    private record Judged(
            Verdict verdict,
            Optional<Double> margin,
            OverTolerance overTolerance,
            String shownValue,
            String shownMargin,
            String reason) {
        static Judged not(String reason) {
            return new Judged(Verdict.NOT_JUDGED, Optional.empty(), OverTolerance.NONE, "", "", reason);
        }
    }

    private static Judged atWorst(Window window, Finding.WorstCase found) {
        double low = found.low().value();
        double high = found.high().value();
        double margin = Math.min(window.margin(low), window.margin(high));
        return new Judged(
                verdict(margin >= 0),
                Optional.of(margin),
                new OverTolerance(Optional.of(found), Optional.empty()),
                Notation.shown(low, window.unit()) + " .. " + Notation.shown(high, window.unit()),
                window.shownMargin(margin),
                "");
    }

    /** The margin is that of the nominal value; what decides is the confidence bound. */
    private static Judged inShare(Window window, double nominal, Finding.Share found, double wanted) {
        return new Judged(
                verdict(found.low() >= wanted),
                Optional.of(window.margin(nominal)),
                new OverTolerance(Optional.empty(), Optional.of(found)),
                Shares.percent(found.share()) + " inside, at least " + Shares.percent(found.low()),
                Shares.above(found.low(), wanted),
                "");
    }

    private static Verdict verdict(boolean holds) {
        return holds ? Verdict.HOLDS : Verdict.FAILS;
    }

    private CheckEntry entry(Check check, String at, Judged judged) {
        Window window = Window.of(check.requirement());
        Optional<CheckValue> value = Optional.ofNullable(values.get(check.line()));
        boolean condition = check.requirement() instanceof Check.Requirement.Holds;
        String share = check.basis() instanceof Basis.Share wanted ? " in " + Shares.percent(wanted.share()) : "";
        return new CheckEntry(
                check.text(),
                basis(check.basis()),
                value.map(CheckValue::value),
                condition ? "" : window.unit().coherent().symbol(),
                window.low(),
                window.high(),
                judged.margin(),
                judged.margin().flatMap(window::share),
                judged.overTolerance(),
                judged.shownValue(),
                window.shown() + share,
                judged.shownMargin(),
                judged.verdict(),
                judged.reason(),
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
