package sill.record;

import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.TreeMap;
import sill.formula.Working;
import sill.stdlib.Plot;
import sill.values.CellState;
import sill.values.Datum;
import sill.values.Finding;
import sill.worksheet.Problem;

/** Small records for tests; the circuits in them are invented. */
public final class Records {
    private Records() {}

    /** A record of one calculation cell with these values. */
    public static DesignRecord ofValues(DesignRecord.ValueEntry... values) {
        return record("double a = 1;", List.of(), List.of(values), List.of(), List.of());
    }

    /** A record of one check cell with these checks. */
    public static DesignRecord ofChecks(DesignRecord.CheckEntry... checks) {
        return record("", List.of(), List.of(), List.of(checks), List.of());
    }

    /** A record of one calculation cell with these problems. */
    public static DesignRecord ofProblems(String source, Problem... problems) {
        return record(source, List.of(), List.of(), List.of(), List.of(problems));
    }

    /** A record with one of everything. */
    public static DesignRecord ofEverything() {
        return record(
                "double v = 2;",
                List.of(given()),
                List.of(value("v", new Datum.Real(2), "2.000 V")),
                List.of(check(DesignRecord.Verdict.HOLDS)),
                List.of(Problem.warning(5, 1, 1, "unused", "")));
    }

    /** A record of one tolerance cell, which found all that one can. */
    public static DesignRecord ofTolerances() {
        DesignRecord all = ofEverything();
        return new DesignRecord(
                all.outcome(),
                all.titleBlock(),
                all.made(),
                all.trial(),
                all.worksheet(),
                List.of(),
                List.of(new DesignRecord.CellEntry(1, "tolerance", "Spread", 4, CellState.DONE, "", "", "of: v")),
                List.of(given()),
                List.of(),
                List.of(tolerance()),
                List.of(),
                List.of(),
                List.of());
    }

    private static DesignRecord record(
            String source,
            List<DesignRecord.GivenEntry> givens,
            List<DesignRecord.ValueEntry> values,
            List<DesignRecord.CheckEntry> checks,
            List<Problem> problems) {
        return new DesignRecord(
                DesignRecord.Outcome.HOLDS,
                Map.of("title", "Door heater"),
                new DesignRecord.Made("0.1.0", "17.0.15", "2026-01-02T03:04:05Z"),
                Map.of(),
                new DesignRecord.Source(
                        "door.sill", "00ff", "sill 1\ntitle: Door heater\n\n:: calc A\n" + source + "\n"),
                List.of(new DesignRecord.DataFile("a.csv", "ff00", new byte[] {0, 1, -1})),
                List.of(new DesignRecord.CellEntry(1, "calc", "A", 4, CellState.DONE, "", "", source)),
                givens,
                values,
                checks,
                List.of(new DesignRecord.PlotEntry("1.9", "", "Ramp", plot(), List.of("v"), List.of("v", "vIn"))),
                problems);
    }

    /** What a tolerance cell found of {@code v}, at address 1.1. */
    static DesignRecord.ToleranceEntry tolerance() {
        Finding.MonteCarlo sampled = new Finding.MonteCarlo(
                200_000,
                7,
                2.01,
                0.05,
                1.91,
                2.11,
                new TreeMap<>(Map.of("0.00135", 1.85, "0.5", 2.01, "0.99865", 2.16)),
                Map.of("mean", 0.0001, "sd", 0.0002, "low", 0.001, "high", 0.002, "0.5", 0.0003),
                0,
                1.82,
                2.19,
                3,
                2,
                new Finding.Histogram(1.8, 2.2, List.of(50_000L, 99_997L, 50_000L)),
                List.of(new Finding.Share(5, 0.99, 0.985)));
        Finding finding = new Finding(
                1,
                1,
                "v",
                "",
                "V",
                "",
                2,
                List.of("vIn"),
                Optional.of(new Finding.WorstCase(
                        new Finding.Extreme(1.8, List.of(22.8)),
                        new Finding.Extreme(2.2, List.of(24.1)),
                        List.of(Finding.Trend.MIXED))),
                Optional.of(new Finding.RootSumSquare(1.9, 2.1, 0.06)),
                Optional.of(sampled),
                List.of(new Finding.Sensitivity("vIn", 0.083, 1)),
                Optional.of(new Finding.Sweep(
                        "vIn", List.of(22.8, 25.2), List.of(1.9, 2.1), List.of(1.8, 2.0), List.of(2.0, 2.2))),
                List.of("A remark."));
        return new DesignRecord.ToleranceEntry(
                finding, "1.1", 5, List.of(new DesignRecord.Limit(2.15, "REQ-01")), Map.of("vIn", Units.of("V")));
    }

    static DesignRecord.GivenEntry given() {
        return new DesignRecord.GivenEntry(
                "vIn",
                new Datum.Real(24),
                "V",
                "24 V",
                Optional.of(22.8),
                Optional.of(25.2),
                "22.8 V .. 25.2 V",
                "uniform",
                "supply",
                "1.1",
                5);
    }

    /** A value in cell 1 at address 1.1. */
    public static DesignRecord.ValueEntry value(String name, Datum value, String shown) {
        return value(name, value, shown, "1.1");
    }

    /** A value in cell 1 at an address. */
    public static DesignRecord.ValueEntry valueAt(String name, String at) {
        return value(name, new Datum.Real(2), "2.000 V", at);
    }

    private static DesignRecord.ValueEntry value(String name, Datum value, String shown, String at) {
        return new DesignRecord.ValueEntry(
                name,
                "vIn / 12",
                "double",
                value,
                "V",
                Map.of(),
                shown,
                "",
                Map.of(),
                "half",
                at,
                5,
                List.of("vIn"),
                List.of("vIn"));
    }

    /** A value with its working. */
    public static DesignRecord.ValueEntry worked(DesignRecord.ValueEntry value, Working working) {
        return new DesignRecord.ValueEntry(
                value.name(),
                value.formula(),
                value.type(),
                value.value(),
                value.unit(),
                value.componentUnits(),
                value.shown(),
                value.shownFull(),
                value.shownComponents(),
                value.caption(),
                value.at(),
                value.line(),
                value.uses(),
                value.dependsOn(),
                Optional.of(working));
    }

    /** A record of one given cell with one given, and a calculation cell without results. */
    public static DesignRecord ofGivens(String source, CellState state) {
        return ofGivens(source, state, given());
    }

    /** A record of one given cell with one given without limits. */
    public static DesignRecord ofBareGiven(String name) {
        DesignRecord.GivenEntry given = new DesignRecord.GivenEntry(
                name, new Datum.Real(24), "V", "24 V", Optional.empty(), Optional.empty(), "", "", "supply", "1.1", 5);
        return ofGivens("", CellState.DONE, given);
    }

    private static DesignRecord ofGivens(String source, CellState state, DesignRecord.GivenEntry given) {
        DesignRecord all = ofValues();
        return new DesignRecord(
                all.outcome(),
                all.titleBlock(),
                all.made(),
                all.trial(),
                all.worksheet(),
                List.of(),
                List.of(
                        new DesignRecord.CellEntry(1, "given", "A", 4, CellState.DONE, "", "", "vIn = 24 V"),
                        new DesignRecord.CellEntry(2, "calc", "B", 6, state, "", "", source)),
                List.of(given),
                List.of(),
                List.of(),
                List.of(),
                List.of());
    }

    /** A check at address 1.1. */
    public static DesignRecord.CheckEntry check(DesignRecord.Verdict verdict) {
        return new DesignRecord.CheckEntry(
                "v at most 3 V",
                "nominal",
                Optional.of(new Datum.Real(2)),
                "V",
                Optional.empty(),
                Optional.of(3.0),
                Optional.of(1.0),
                Optional.of(1.0 / 3),
                "2.000 V",
                "≤ 3 V",
                "+1.000 V",
                verdict,
                verdict == DesignRecord.Verdict.NOT_JUDGED ? "no tolerance runs" : "",
                "REQ-01",
                "1.1",
                5,
                List.of("v"),
                List.of("v", "vIn"));
    }

    static Plot plot() {
        return new Plot(
                "Ramp",
                "A ramp.",
                new Plot.Axis("time", "s", Plot.Scale.LINEAR),
                new Plot.Axis("voltage", "V", Plot.Scale.LINEAR),
                List.of(new Plot.Curve("ramp", Plot.Style.LINE, false, new double[] {0, 1}, new double[] {0, 2})),
                List.of());
    }
}
