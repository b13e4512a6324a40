package sill.tests.browser;

import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import sill.record.DesignRecord;
import sill.record.DesignRecord.CellEntry;
import sill.record.DesignRecord.CheckEntry;
import sill.record.DesignRecord.GivenEntry;
import sill.record.DesignRecord.PlotEntry;
import sill.record.DesignRecord.ValueEntry;
import sill.record.DesignRecord.Verdict;
import sill.stdlib.Plot;
import sill.values.CellState;
import sill.values.Datum;
import sill.worksheet.Problem;

/**
 * A record with everything a page can show: every kind of cell, value, state and verdict, two plots, problems, and texts
 * that try to break out of the page. The design, a sump's level switch, is invented.
 */
final class SampleRecord {
    /** What a text would have to contain to do harm if it were not escaped. */
    static final String HOSTILE =
            "</script><img src=x onerror=document.title='broken'>\"' onload=alert(1) &lt; <!-- \u202Egnp.exe\u202C \u0007 ]]> {{7*7}}";

    private static final double REFERENCE = 3.3;
    private static final double R_IN = 10_000;
    private static final double R_FEEDBACK = 150_000;
    private static final double OUTPUT_LOW = 0.2;
    private static final double OUTPUT_HIGH = 22.5;
    private static final double SENSE = 250;

    private final List<String> text = new ArrayList<>();
    private final List<CellEntry> cells = new ArrayList<>();
    private final List<GivenEntry> givens = new ArrayList<>();
    private final List<ValueEntry> values = new ArrayList<>();
    private final List<CheckEntry> checks = new ArrayList<>();
    private final List<PlotEntry> plots = new ArrayList<>();
    private final List<Problem> problems = new ArrayList<>();

    private SampleRecord() {
        text.addAll(List.of("sill 1", "title: Sump level switch, cable cellar", "number: SP-207", "revision: C", ""));
    }

    /** The record. */
    static DesignRecord everything() {
        SampleRecord sample = new SampleRecord();
        sample.purpose();
        sample.parts();
        sample.tripPoints();
        sample.overTime();
        sample.kindsOfValue();
        sample.unfinished();
        sample.requirements();
        sample.hostile();
        return sample.build(DesignRecord.Outcome.INCOMPLETE, "Sump level switch, cable cellar");
    }

    /** The same design without problems, all checks holding: the common case. */
    static DesignRecord holding() {
        SampleRecord sample = new SampleRecord();
        sample.purpose();
        sample.parts();
        sample.tripPoints();
        sample.overTime();
        int cell =
                sample.cell("check", "Requirements", CellState.DONE, "", "startLevel within 1.5 m .. 1.6 m | REQ-11");
        sample.startLevelCheck(cell, 1);
        return sample.build(DesignRecord.Outcome.HOLDS, "Sump level switch, cable cellar");
    }

    private DesignRecord build(DesignRecord.Outcome outcome, String title) {
        Map<String, String> block = new LinkedHashMap<>();
        block.put("title", title);
        block.put("number", "SP-207");
        block.put("revision", "C");
        block.put("date", "2026-03-17");
        block.put("owner", "Harbour Works (invented)");
        block.put("creator", "A. Example");
        block.put("approver", "B. Example");
        block.put("type", "Circuit calculation");
        block.put("language", "en-GB");
        byte[] bytes = "time [s],level [m]\n0,0.64\n1,0.65\n".getBytes(StandardCharsets.UTF_8);
        return new DesignRecord(
                outcome,
                block,
                new DesignRecord.Made("0.1.0", "17.0.15", "2026-03-17T09:30:00Z"),
                outcome == DesignRecord.Outcome.HOLDS ? Map.of() : Map.of("rSense", "249 Ω"),
                new DesignRecord.Source("sump.sill", "9f".repeat(32), String.join("\n", text) + "\n"),
                List.of(new DesignRecord.DataFile("logger/inflow.csv", "a1".repeat(32), bytes)),
                cells,
                givens,
                values,
                checks,
                plots,
                problems);
    }

    private int cell(String kind, String caption, CellState state, String reason, String... source) {
        text.add(":: " + kind + " " + caption);
        int line = text.size();
        text.addAll(List.of(source));
        text.add("");
        int number = cells.size() + 1;
        cells.add(new CellEntry(number, kind, caption, line, state, reason, "", String.join("\n", source)));
        return number;
    }

    private void purpose() {
        cell(
                "note",
                "Purpose",
                CellState.DONE,
                "",
                "A pressure transmitter (4 mA to 20 mA over **2.5 m** of water) reports the level of a sump.",
                "The circuit starts the pump when the water is high and stops it when it is *low enough*,",
                "so that the pump neither chatters nor runs dry.",
                "",
                "## What is not covered",
                "",
                "- the pump's motor protection",
                "- the transmitter's own error; see [the data sheet](https://example.org/lt-25.pdf)",
                "",
                "> A float switch trips the alarm on its own.");
    }

    private void parts() {
        int cell = cell(
                "given",
                "Supply and parts",
                CellState.DONE,
                "",
                "vRef   = 3.3 V ± 0.5 %              | reference at the inverting input",
                "rSense = 250 Ω ± 0.1 %              | turns 4 mA to 20 mA into 1 V to 5 V",
                "rIn    = 10 kΩ ± 1 %                | metal film",
                "rFb    = 150 kΩ ± 1 %               | metal film",
                "vOff   = 0 mV ± 3 mV ~ normal 3     | offset of the comparator",
                "vHigh  = 22.5 V [21.3 V .. 23.7 V]  | output high",
                "temps  = [-10, 25, 55] °C           | cellar, winter to summer",
                "inflow = file \"logger/inflow.csv\"   | level over a wet day, invented",
                "part   = \"metal film\"");
        given(cell, 1, "vRef", new Datum.Real(3.3), "V", "3.300 V", 3.2835, 3.3165, "3.284 V .. 3.317 V", "uniform");
        given(cell, 2, "rSense", new Datum.Real(250), "Ω", "250.0 Ω", 249.75, 250.25, "249.8 Ω .. 250.3 Ω", "uniform");
        given(cell, 3, "rIn", new Datum.Real(1e4), "Ω", "10.00 kΩ", 9900, 10100, "9.900 kΩ .. 10.10 kΩ", "uniform");
        given(
                cell,
                4,
                "rFb",
                new Datum.Real(1.5e5),
                "Ω",
                "150.0 kΩ",
                148500,
                151500,
                "148.5 kΩ .. 151.5 kΩ",
                "uniform");
        given(cell, 5, "vOff", new Datum.Real(0), "V", "0 mV", -0.003, 0.003, "−3.000 mV .. 3.000 mV", "normal 3");
        given(cell, 6, "vHigh", new Datum.Real(22.5), "V", "22.50 V", 21.3, 23.7, "21.30 V .. 23.70 V", "uniform");
        plainGiven(cell, 7, "temps", reals(263.15, 298.15, 328.15), "K", "[−10, 25, 55] °C");
        plainGiven(cell, 8, "inflow", new Datum.Opaque("logger/inflow.csv"), "", "logger/inflow.csv");
        plainGiven(cell, 9, "part", new Datum.Text("metal film"), "", "\"metal film\"");
    }

    private void given(
            int cell,
            int index,
            String name,
            Datum value,
            String unit,
            String shown,
            double low,
            double high,
            String limits,
            String distribution) {
        CellEntry entry = cells.get(cell - 1);
        givens.add(new GivenEntry(
                name,
                value,
                unit,
                shown,
                Optional.of(low),
                Optional.of(high),
                limits,
                distribution,
                remark(entry, index),
                cell + "." + index,
                entry.line() + index));
    }

    private void plainGiven(int cell, int index, String name, Datum value, String unit, String shown) {
        CellEntry entry = cells.get(cell - 1);
        givens.add(new GivenEntry(
                name,
                value,
                unit,
                shown,
                Optional.empty(),
                Optional.empty(),
                "",
                "",
                remark(entry, index),
                cell + "." + index,
                entry.line() + index));
    }

    private static String remark(CellEntry cell, int index) {
        String line = cell.source().split("\n")[index - 1];
        int bar = line.indexOf('|');
        return bar < 0 ? "" : line.substring(bar + 1).strip();
    }

    private static double rising() {
        return REFERENCE * (1 + R_IN / R_FEEDBACK) - OUTPUT_LOW * R_IN / R_FEEDBACK;
    }

    private static double falling() {
        return REFERENCE * (1 + R_IN / R_FEEDBACK) - OUTPUT_HIGH * R_IN / R_FEEDBACK;
    }

    private static double level(double volts) {
        return (volts / SENSE - 0.004) / 0.016 * 2.5;
    }

    private void tripPoints() {
        int cell = cell(
                "calc",
                "Trip points",
                CellState.DONE,
                "",
                "TripPoints trip = Comparators.noninverting(vRef + vOff, rIn, rFb, vLow, vHigh);",
                "double band = trip.band();                       // [V] hysteresis",
                "double startLevel = level(trip.rising());        // [m] pump starts",
                "double stopLevel = level(trip.falling());        // [m] pump stops",
                "",
                "double level(double v) {",
                "    return (v / rSense - 4e-3) / 16e-3 * 2.5;",
                "}",
                "Plots.transferLoop(trip, vLow, vHigh)");
        Map<String, Datum> trip = new LinkedHashMap<>();
        trip.put("rising", new Datum.Real(rising()));
        trip.put("falling", new Datum.Real(falling()));
        Map<String, String> shown = new LinkedHashMap<>();
        shown.put("rising", "3.507 V");
        shown.put("falling", "2.020 V");
        value(
                cell,
                1,
                1,
                "trip",
                "Comparators.noninverting(vRef + vOff, rIn, rFb, vLow, vHigh)",
                "TripPoints",
                new Datum.Fields(trip),
                "",
                "rising 3.507 V, falling 2.020 V",
                "",
                shown,
                "");
        real(cell, 2, 2, "band", "trip.band()", rising() - falling(), "V", "1.487 V", "hysteresis");
        real(cell, 3, 3, "startLevel", "level(trip.rising())", level(rising()), "m", "1.567 m", "pump starts");
        real(cell, 4, 4, "stopLevel", "level(trip.falling())", level(falling()), "m", "637.5 mm", "pump stops");
        plots.add(new PlotEntry(
                cell + ".5",
                "",
                "Transfer loop",
                transferLoop(),
                List.of("trip"),
                List.of("trip", "vRef", "rIn", "rFb")));
        value(
                cell,
                5,
                9,
                "",
                "Plots.transferLoop(trip, vLow, vHigh)",
                "Plot",
                new Datum.Opaque("Plot"),
                "",
                "",
                "",
                Map.of(),
                "");
    }

    static Plot transferLoop() {
        double[] up = {1, rising(), rising(), 5};
        double[] upOut = {OUTPUT_LOW, OUTPUT_LOW, OUTPUT_HIGH, OUTPUT_HIGH};
        double[] down = {5, falling(), falling(), 1};
        double[] downOut = {OUTPUT_HIGH, OUTPUT_HIGH, OUTPUT_LOW, OUTPUT_LOW};
        return new Plot(
                "Output over input",
                "The output goes high when the input rises past 3.507 V and low when it falls past 2.020 V.",
                new Plot.Axis("input voltage", "V", Plot.Scale.LINEAR),
                new Plot.Axis("output voltage", "V", Plot.Scale.LINEAR),
                List.of(
                        new Plot.Curve("input rising", Plot.Style.LINE, true, up, upOut),
                        new Plot.Curve("input falling", Plot.Style.LINE, true, down, downOut)),
                List.of(
                        new Plot.Mark(Plot.Side.X, rising(), "rising", Plot.Role.TRIP_POINT),
                        new Plot.Mark(Plot.Side.X, falling(), "falling", Plot.Role.TRIP_POINT),
                        new Plot.Mark(Plot.Side.X, REFERENCE, "reference", Plot.Role.REFERENCE),
                        new Plot.Mark(Plot.Side.Y, OUTPUT_HIGH, "output high", Plot.Role.REFERENCE),
                        new Plot.Mark(Plot.Side.Y, OUTPUT_LOW, "output low", Plot.Role.REFERENCE)));
    }

    private void overTime() {
        int cell = cell(
                "calc",
                "A wet night",
                CellState.DONE,
                "",
                "double[] level = simulate(inflow);            // [m]",
                "Plots.signals(level)",
                "System.out.println(\"8 starts in 6 h\");");
        double[] level = new double[400];
        double[] time = new double[400];
        double[] pump = new double[400];
        boolean running = false;
        double now = 0.7;
        for (int i = 0; i < level.length; i++) {
            time[i] = i * 54;
            now += (0.0021 + 0.0008 * StrictMath.sin(i / 60.0)) * 5 - (running ? 0.034 : 0);
            running = now >= level(rising()) || running && now > level(falling());
            level[i] = now;
            pump[i] = running ? 0.35 : 0.05;
        }
        value(
                cell,
                1,
                1,
                "level",
                "simulate(inflow)",
                "double[]",
                reals(level),
                "m",
                "400 values, 0.6075 m to 1.577 m",
                "",
                Map.of(),
                "level every 54 s");
        Plot plot = new Plot(
                "Level and pump over six hours",
                "The level rises from 0.7 m, the pump empties the sump eight times between 1.57 m and 0.64 m.",
                new Plot.Axis("time", "s", Plot.Scale.LINEAR),
                new Plot.Axis("level", "m", Plot.Scale.LINEAR),
                List.of(
                        new Plot.Curve("water level", Plot.Style.LINE, false, time, level),
                        new Plot.Curve("pump (high: runs)", Plot.Style.STEP, false, time, pump),
                        new Plot.Curve(
                                "soundings by hand",
                                Plot.Style.POINTS,
                                false,
                                new double[] {1000, 9000, 16000},
                                new double[] {0.9, 1.1, 1.3})),
                List.of(
                        new Plot.Mark(Plot.Side.Y, 1.6, "flood limit", Plot.Role.LIMIT),
                        new Plot.Mark(Plot.Side.Y, level(rising()), "start", Plot.Role.TRIP_POINT),
                        new Plot.Mark(Plot.Side.Y, level(falling()), "stop", Plot.Role.TRIP_POINT),
                        new Plot.Mark(Plot.Side.Y, 0.6, "suction limit", Plot.Role.LIMIT)));
        plots.add(new PlotEntry(
                cell + ".2",
                "",
                "Level over a wet night, invented inflow",
                plot,
                List.of("startLevel", "stopLevel"),
                List.of("startLevel", "stopLevel", "trip", "vRef", "rIn", "rFb")));
        CellEntry entry = cells.get(cell - 1);
        cells.set(
                cell - 1,
                new CellEntry(
                        cell,
                        entry.kind(),
                        entry.caption(),
                        entry.line(),
                        entry.state(),
                        "",
                        "8 starts in 6 h\n",
                        entry.source()));
    }

    private void kindsOfValue() {
        int cell = cell("calc", "Kinds of value", CellState.DONE, "", "int starts = 8;", "…");
        value(cell, 1, 1, "starts", "8", "int", new Datum.Whole("8"), "", "8", "8", Map.of(), "starts in six hours");
        value(cell, 2, 2, "dry", "stopLevel < 0.5", "boolean", new Datum.Truth(false), "", "false", "", Map.of(), "");
        value(
                cell,
                3,
                3,
                "label",
                "\"sump \" + 4",
                "String",
                new Datum.Text("sump 4"),
                "",
                "\"sump 4\"",
                "",
                Map.of(),
                "");
        value(cell, 4, 4, "nothing", "null", "Object", new Datum.Absent(), "", "", "", Map.of(), "");
        value(cell, 5, 5, "ratio", "1.0 / 0", "double", new Datum.Real(1 / 0.0), "", "", "", Map.of(), "a slip");
        value(
                cell,
                6,
                6,
                "law",
                "v -> 2 * v",
                "DoubleUnaryOperator",
                new Datum.Opaque("a DoubleUnaryOperator"),
                "",
                "",
                "",
                Map.of(),
                "");
        Map<String, Datum> columns = new LinkedHashMap<>();
        columns.put("resistance", reals(8200, 10000, 12000));
        columns.put("band", reals(1.22, 1.487, 1.784));
        columns.put(
                "remark", new Datum.Items(List.of(new Datum.Text("E24"), new Datum.Text(""), new Datum.Text("")), 3));
        value(
                cell,
                7,
                7,
                "choices",
                "table(rIn)",
                "Table",
                new Datum.Fields(columns),
                "",
                "",
                "",
                Map.of(),
                "input resistor");
        value(
                cell,
                8,
                8,
                "",
                "IntStream.range(0, 100000).toArray()",
                "int[]",
                new Datum.Items(List.of(new Datum.Whole("0"), new Datum.Whole("1")), 100000),
                "",
                "",
                "",
                Map.of(),
                "");
    }

    private void unfinished() {
        int wrong = cell(
                "calc",
                "Snubber",
                CellState.PROBLEM,
                "cannot find symbol: vLine",
                "double peak = Math.sqrt(2) * vLine;");
        int line = cells.get(wrong - 1).line() + 1;
        problems.add(Problem.error(
                line,
                31,
                wrong,
                "cannot find symbol: vLine, expected a given or an earlier result",
                "Did you mean vLow?"));
        problems.add(Problem.warning(
                cells.get(1).line() + 9, 1, 2, "the given part is not used", "Remove it, or use it in a calculation."));
        cell(
                "calc",
                "Snubber losses",
                CellState.NOT_RUN,
                "waits on peak (cell " + wrong + ")",
                "double loss = peak * peak * c * f;");
        cell("calc", "Search", CellState.STOPPED, "the time limit of 60 s was reached", "while (true) {}");
        cell(
                "tolerance",
                "Levels over tolerance",
                CellState.DONE,
                "Not judged: this Sill has no tolerance runs yet.",
                "of: startLevel, stopLevel",
                "method: worst-case, rss");
    }

    private void requirements() {
        int cell = cell(
                "check",
                "Requirements",
                CellState.DONE,
                "",
                "startLevel within 1.5 m .. 1.6 m             | REQ-11 before the cable tray",
                "stopLevel at most 0.6 m                      | REQ-12 energy",
                "band at least 1 V in 99.7 %                  | REQ-13 no chatter",
                "starts < 10 holds                            | REQ-14 motor");
        startLevelCheck(cell, 1);
        checks.add(new CheckEntry(
                "stopLevel at most 0.6 m",
                "nominal",
                Optional.of(new Datum.Real(level(falling()))),
                "m",
                Optional.empty(),
                Optional.of(0.6),
                Optional.of(0.6 - level(falling())),
                Optional.of((0.6 - level(falling())) / 0.6),
                "637.5 mm",
                "≤ 600 mm",
                "−37.50 mm",
                Verdict.FAILS,
                "",
                "REQ-12 energy",
                cell + ".2",
                cells.get(cell - 1).line() + 2,
                List.of("stopLevel"),
                List.of("stopLevel", "trip", "vRef", "rIn", "rFb")));
        checks.add(new CheckEntry(
                "band at least 1 V in 99.7 %",
                "share",
                Optional.of(new Datum.Real(rising() - falling())),
                "V",
                Optional.of(1.0),
                Optional.empty(),
                Optional.empty(),
                Optional.empty(),
                "1.487 V",
                "≥ 1 V",
                "",
                Verdict.NOT_JUDGED,
                "this Sill has no tolerance runs yet",
                "REQ-13 no chatter",
                cell + ".3",
                cells.get(cell - 1).line() + 3,
                List.of("band"),
                List.of("band", "trip", "vRef", "rIn", "rFb")));
        checks.add(new CheckEntry(
                "starts < 10 holds",
                "nominal",
                Optional.of(new Datum.Truth(true)),
                "",
                Optional.empty(),
                Optional.empty(),
                Optional.empty(),
                Optional.empty(),
                "true",
                "true",
                "",
                Verdict.HOLDS,
                "",
                "REQ-14 motor",
                cell + ".4",
                cells.get(cell - 1).line() + 4,
                List.of("starts"),
                List.of("starts")));
    }

    private void startLevelCheck(int cell, int index) {
        double value = level(rising());
        checks.add(new CheckEntry(
                "startLevel within 1.5 m .. 1.6 m",
                "nominal",
                Optional.of(new Datum.Real(value)),
                "m",
                Optional.of(1.5),
                Optional.of(1.6),
                Optional.of(1.6 - value),
                Optional.of((1.6 - value) / 0.05),
                "1.567 m",
                "1.5 m .. 1.6 m",
                "+33.33 mm",
                Verdict.HOLDS,
                "",
                "REQ-11 before the cable tray",
                cell + "." + index,
                cells.get(cell - 1).line() + index,
                List.of("startLevel"),
                List.of("startLevel", "trip", "vRef", "rIn", "rFb")));
    }

    /** Every text of a record, as an attacker would write it. */
    private void hostile() {
        cell(
                "note",
                HOSTILE,
                CellState.DONE,
                "",
                HOSTILE,
                "",
                "[x](javascript:alert(1)) ![y](https://example.org/y.png)",
                "<iframe src=\"https://example.org\"></iframe>",
                "",
                "###### deep",
                "# shallow");
        int given = cell("given", HOSTILE, CellState.DONE, HOSTILE, HOSTILE);
        givens.add(new GivenEntry(
                "x",
                new Datum.Text(HOSTILE),
                HOSTILE,
                HOSTILE,
                Optional.empty(),
                Optional.empty(),
                HOSTILE,
                HOSTILE,
                HOSTILE,
                given + ".1",
                1));
        int calc = cell("calc", HOSTILE, CellState.DONE, HOSTILE, HOSTILE);
        values.add(new ValueEntry(
                HOSTILE,
                HOSTILE,
                HOSTILE,
                new Datum.Fields(Map.of(HOSTILE, new Datum.Text(HOSTILE))),
                HOSTILE,
                Map.of(HOSTILE, HOSTILE),
                HOSTILE,
                HOSTILE,
                Map.of(HOSTILE, HOSTILE),
                HOSTILE,
                calc + ".1",
                1,
                List.of(HOSTILE),
                List.of(HOSTILE)));
        Plot plot = new Plot(
                HOSTILE,
                HOSTILE,
                new Plot.Axis(HOSTILE, HOSTILE, Plot.Scale.LOGARITHMIC),
                new Plot.Axis(HOSTILE, HOSTILE, Plot.Scale.LINEAR),
                List.of(new Plot.Curve(
                        HOSTILE, Plot.Style.LINE, false, new double[] {1, 10, 100}, new double[] {1, 2, 3})),
                List.of(new Plot.Mark(Plot.Side.Y, 2, HOSTILE, Plot.Role.LIMIT)));
        plots.add(new PlotEntry(calc + ".2", HOSTILE, HOSTILE, plot, List.of(HOSTILE), List.of(HOSTILE)));
        int check = cell("check", HOSTILE, CellState.DONE, "", HOSTILE);
        checks.add(new CheckEntry(
                HOSTILE,
                HOSTILE,
                Optional.of(new Datum.Text(HOSTILE)),
                HOSTILE,
                Optional.empty(),
                Optional.empty(),
                Optional.empty(),
                Optional.empty(),
                HOSTILE,
                HOSTILE,
                HOSTILE,
                Verdict.NOT_JUDGED,
                HOSTILE,
                HOSTILE,
                check + ".1",
                1,
                List.of(HOSTILE),
                List.of(HOSTILE)));
        int line = cells.get(check - 1).line() + 1;
        problems.add(Problem.error(line, 40, check, HOSTILE, HOSTILE));
    }

    private void real(
            int cell,
            int index,
            int line,
            String name,
            String formula,
            double value,
            String unit,
            String shown,
            String caption) {
        String full = value + " " + unit;
        value(cell, index, line, name, formula, "double", new Datum.Real(value), unit, shown, full, Map.of(), caption);
    }

    private void value(
            int cell,
            int index,
            int line,
            String name,
            String formula,
            String type,
            Datum value,
            String unit,
            String shown,
            String full,
            Map<String, String> components,
            String caption) {
        Map<String, String> componentUnits = components.isEmpty() ? Map.of() : Map.of("rising", "V", "falling", "V");
        values.add(new ValueEntry(
                name,
                formula,
                type,
                value,
                unit,
                componentUnits,
                shown,
                full,
                components,
                caption,
                cell + "." + index,
                cells.get(cell - 1).line() + line,
                name.equals("trip") ? List.of("vRef", "rIn", "rFb") : List.of("trip"),
                name.equals("trip") ? List.of("vRef", "rIn", "rFb") : List.of("trip", "vRef", "rIn", "rFb")));
    }

    private static Datum.Items reals(double... numbers) {
        List<Datum> items = new ArrayList<>();
        for (double number : numbers) {
            items.add(new Datum.Real(number));
        }
        return new Datum.Items(items, items.size());
    }
}
