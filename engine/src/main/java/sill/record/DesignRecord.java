package sill.record;

import java.util.List;
import java.util.Map;
import java.util.Optional;
import sill.formula.Working;
import sill.stdlib.Plot;
import sill.units.Unit;
import sill.values.CellState;
import sill.values.Datum;
import sill.values.Finding;
import sill.worksheet.Problem;

/**
 * A record: everything a reader of the design sees, in coherent SI.
 *
 * @param outcome the verdict over all
 * @param titleBlock ISO 7200 fields as the worksheet gives them
 * @param made by which Sill, which Java, when
 * @param trial givens overridden for this run, name to text as typed; empty for a proper record
 * @param worksheet the text it was made from
 * @param files data files, with their bytes
 * @param cells all cells in order
 * @param givens input values
 * @param values results
 * @param tolerances what the tolerance cells found
 * @param checks requirements
 * @param plots plots
 * @param problems what is wrong, errors and warnings, in the text's order
 */
public record DesignRecord(
        Outcome outcome,
        Map<String, String> titleBlock,
        Made made,
        Map<String, String> trial,
        Source worksheet,
        List<DataFile> files,
        List<CellEntry> cells,
        List<GivenEntry> givens,
        List<ValueEntry> values,
        List<ToleranceEntry> tolerances,
        List<CheckEntry> checks,
        List<PlotEntry> plots,
        List<Problem> problems) {

    /** A record without tolerance cells. */
    public DesignRecord(
            Outcome outcome,
            Map<String, String> titleBlock,
            Made made,
            Map<String, String> trial,
            Source worksheet,
            List<DataFile> files,
            List<CellEntry> cells,
            List<GivenEntry> givens,
            List<ValueEntry> values,
            List<CheckEntry> checks,
            List<PlotEntry> plots,
            List<Problem> problems) {
        this(
                outcome,
                titleBlock,
                made,
                trial,
                worksheet,
                files,
                cells,
                givens,
                values,
                List.of(),
                checks,
                plots,
                problems);
    }

    /** The format's name, first field of the JSON. */
    public static final String FORMAT = "sill-record/1";

    /** The verdict over all. */
    public enum Outcome {
        /** Everything ran and every check holds. */
        HOLDS("holds"),
        /** Everything ran and a check fails. */
        FAILS("fails"),
        /** The worksheet has problems, a cell did not end, or a check could not be judged. */
        INCOMPLETE("incomplete");

        private final String word;

        Outcome(String word) {
            this.word = word;
        }

        /** The word in the JSON. */
        public String word() {
            return word;
        }
    }

    /** What a check came to. */
    public enum Verdict {
        HOLDS("holds"),
        FAILS("fails"),
        NOT_JUDGED("not judged");

        private final String word;

        Verdict(String word) {
            this.word = word;
        }

        /** The word in the JSON. */
        public String word() {
            return word;
        }
    }

    /** By what and when it was made; {@code at} is ISO 8601 in UTC. */
    public record Made(String sill, String java, String at) {}

    /** The worksheet: file name without folders, SHA-256 of its bytes in hexadecimal, text. */
    public record Source(String file, String sha256, String text) {}

    /** A data file: path as the worksheet gives it, SHA-256 in hexadecimal, bytes. */
    public record DataFile(String path, String sha256, byte[] bytes) {}

    /**
     * A cell.
     *
     * @param kind the worksheet's word
     * @param reason why it did not end; empty when it did
     * @param output what it printed; empty when nothing
     */
    public record CellEntry(
            int number,
            String kind,
            String caption,
            int line,
            CellState state,
            String reason,
            String output,
            String source) {}

    /**
     * A given.
     *
     * @param value {@code Real}, {@code Items} of reals, {@code Text}, or {@code Opaque} with the path of a data file
     * @param unit coherent SI unit symbol; empty for a text or a file
     * @param shown value with unit as the worksheet's author would write it, with a prefix
     * @param low lower limit, where stated
     * @param high upper limit, where stated
     * @param shownLimits the limits as text, empty when none were stated
     * @param distribution {@code uniform}, {@code normal 3}, {@code triangular}; empty when no limits were stated
     */
    public record GivenEntry(
            String name,
            Datum value,
            String unit,
            String shown,
            Optional<Double> low,
            Optional<Double> high,
            String shownLimits,
            String distribution,
            String remark,
            String at,
            int line) {}

    /**
     * A result.
     *
     * @param name empty for a bare expression
     * @param formula the Java it comes from, one line
     * @param unit coherent SI unit symbol; empty when unknown
     * @param componentUnits coherent SI unit symbols of a record's components, where known
     * @param shown value with unit and prefix, four significant digits
     * @param shownFull the same with every digit
     * @param shownComponents a record's components, each as {@code shown}; empty for other values
     * @param working how it is made, as mathematics; empty when its source is all there is to show. The JSON is without it:
     *     it follows from the worksheet's text
     */
    public record ValueEntry(
            String name,
            String formula,
            String type,
            Datum value,
            String unit,
            Map<String, String> componentUnits,
            String shown,
            String shownFull,
            Map<String, String> shownComponents,
            String caption,
            String at,
            int line,
            List<String> uses,
            List<String> dependsOn,
            Optional<Working> working) {
        /** A result of which only its source can be shown. */
        public ValueEntry(
                String name,
                String formula,
                String type,
                Datum value,
                String unit,
                Map<String, String> componentUnits,
                String shown,
                String shownFull,
                Map<String, String> shownComponents,
                String caption,
                String at,
                int line,
                List<String> uses,
                List<String> dependsOn) {
            this(
                    name,
                    formula,
                    type,
                    value,
                    unit,
                    componentUnits,
                    shown,
                    shownFull,
                    shownComponents,
                    caption,
                    at,
                    line,
                    uses,
                    dependsOn,
                    Optional.empty());
        }
    }

    /**
     * What a tolerance cell found of one number.
     *
     * @param at its address; the components of a record share one
     * @param line the line of its expression
     * @param limits of the checks that judge the same expression
     * @param givenUnits units of the varied givens as the worksheet has them
     */
    public record ToleranceEntry(
            Finding finding, String at, int line, List<Limit> limits, Map<String, Unit> givenUnits) {}

    /** A limit of a check, and what a drawing calls it. */
    public record Limit(double value, String label) {}

    /**
     * What a check was judged on beside the nominal value.
     *
     * @param worst the extremes, for {@code at worst-case}
     * @param share the share of samples inside the limits, for {@code in P %}
     */
    public record OverTolerance(Optional<Finding.WorstCase> worst, Optional<Finding.Share> share) {
        /** The nominal value alone. */
        public static final OverTolerance NONE = new OverTolerance(Optional.empty(), Optional.empty());
    }

    /**
     * A check.
     *
     * @param text the worksheet's text without the remark
     * @param basis {@code nominal}, {@code worst-case} or {@code share}
     * @param value the judged value; absent when the expression could not be evaluated
     * @param unit coherent SI unit symbol of the limits; empty for a boolean
     * @param low lower limit, inclusive
     * @param high upper limit, inclusive
     * @param margin from the judged value to the nearer limit, negative when missed
     * @param marginShare margin over the window's half-width, or over the limit's size when one-sided
     * @param overTolerance what it was judged on beside the nominal value
     * @param shownValue the judged value with unit: nominal, both extremes, or the share
     * @param shownLimit the requirement with units, as in {@code 4.9 V .. 5.5 V}, {@code ≥ 600 mV}
     * @param shownMargin margin with sign and unit; empty when there is none
     * @param reason why it was not judged; empty when it was
     * @param uses names in its expression
     * @param dependsOn all names it rests on, down to the givens
     */
    public record CheckEntry(
            String text,
            String basis,
            Optional<Datum> value,
            String unit,
            Optional<Double> low,
            Optional<Double> high,
            Optional<Double> margin,
            Optional<Double> marginShare,
            OverTolerance overTolerance,
            String shownValue,
            String shownLimit,
            String shownMargin,
            Verdict verdict,
            String reason,
            String remark,
            String at,
            int line,
            List<String> uses,
            List<String> dependsOn) {
        /** A check judged on the nominal value alone. */
        public CheckEntry(
                String text,
                String basis,
                Optional<Datum> value,
                String unit,
                Optional<Double> low,
                Optional<Double> high,
                Optional<Double> margin,
                Optional<Double> marginShare,
                String shownValue,
                String shownLimit,
                String shownMargin,
                Verdict verdict,
                String reason,
                String remark,
                String at,
                int line,
                List<String> uses,
                List<String> dependsOn) {
            this(
                    text,
                    basis,
                    value,
                    unit,
                    low,
                    high,
                    margin,
                    marginShare,
                    OverTolerance.NONE,
                    shownValue,
                    shownLimit,
                    shownMargin,
                    verdict,
                    reason,
                    remark,
                    at,
                    line,
                    uses,
                    dependsOn);
        }
    }

    /**
     * A plot. The SVG is drawn when the record is written.
     *
     * @param name its variable's name; empty for a bare expression
     * @param plot what it shows
     * @param uses names it is made from directly
     * @param dependsOn all names it rests on, down to the givens
     */
    public record PlotEntry(
            String at, String name, String caption, Plot plot, List<String> uses, List<String> dependsOn) {}
}
