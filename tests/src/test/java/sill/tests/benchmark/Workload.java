package sill.tests.benchmark;

import java.util.ArrayList;
import java.util.List;
import java.util.stream.Collectors;
import java.util.stream.IntStream;

/**
 * One calculation in the forms that the contenders read: a worksheet, a Java source file, and lines for the JDK's snippet
 * prompt. The scenario is invented: the supervision of a kiln's fan, whose speed comes as a voltage. A longer calculation
 * repeats it with other names.
 *
 * @param calcCells how many calc cells of eight Java lines each
 */
record Workload(int calcCells) {
    static final int LINES_PER_CELL = 8;

    /** Name, value as a worksheet has it, value as Java has it. */
    private static final List<List<String>> GIVENS = List.of(
            List.of("vSupply", "15 V ± 5 %", "15"),
            List.of("vRef", "6.2 V ± 2 %", "6.2"),
            List.of("vDrop", "0.9 V [0.6 V .. 1.2 V]", "0.9"),
            List.of("vLow", "150 mV [0 V .. 400 mV]", "0.15"),
            List.of("rIn", "22 kΩ ± 1 %", "22e3"),
            List.of("rFb", "470 kΩ ± 1 %", "470e3"),
            List.of("rTop", "68 kΩ ± 1 %", "68e3"),
            List.of("rBottom", "47 kΩ ± 1 %", "47e3"),
            List.of("rFilter", "33 kΩ ± 5 %", "33e3"),
            List.of("cFilter", "100 nF ± 10 %", "100e-9"),
            List.of("fRipple", "100 Hz", "100"));

    private static final List<String> CHECKED = List.of("rising1", "falling1", "band1");

    /** A cell of Java; {@code #} in its lines becomes the number of the repetition. */
    private record Template(String caption, boolean declares, String lines) {}

    private static final List<Template> TEMPLATES = List.of(
            new Template("Output levels and divider", false, """
                    double vHigh# = vSupply - vDrop;
                    double swing# = vHigh# - vLow;
                    double rSource# = Dividers.sourceResistance(rTop, rBottom);
                    double tap# = Dividers.output(vSupply, rTop, rBottom);
                    double loaded# = Dividers.output(vSupply, rTop, rBottom, rIn);
                    double droop# = tap# - loaded#;
                    double droopShare# = droop# / tap#;
                    double parallel# = Dividers.parallel(rTop, rBottom, rIn);
                    """),
            new Template("Trip points", false, """
                    TripPoints trip# = Comparators.noninverting(vRef, rIn, rFb, vLow, vHigh#);
                    double rising# = trip#.rising();
                    double falling# = trip#.falling();
                    double band# = trip#.band();
                    double centre# = trip#.centre();
                    double bandShare# = band# / centre#;
                    double above# = rising# - vRef;
                    double below# = vRef - falling#;
                    """),
            new Template("Trip points with the input on the other side", false, """
                    TripPoints other# = Comparators.inverting(vSupply, rTop, rBottom, rFb, vLow, vHigh#);
                    double otherRising# = other#.rising();
                    double otherFalling# = other#.falling();
                    double otherBand# = other#.band();
                    double otherCentre# = other#.centre();
                    double wider# = Math.max(band#, otherBand#);
                    double apart# = Math.abs(centre# - otherCentre#);
                    boolean higher# = otherCentre# > centre#;
                    """),
            new Template("Filter and delay", false, """
                    double tau# = Filters.timeConstant(rFilter, cFilter);
                    double corner# = Filters.cutoff(rFilter, cFilter);
                    double ripple# = Filters.gain(fRipple, rFilter, cFilter);
                    double delay# = Filters.timeToReach(rFilter, cFilter, 0, vSupply, rising#);
                    double release# = Filters.timeToReach(rFilter, cFilter, vSupply, 0, falling#);
                    double noise# = Filters.noiseBandwidth(rFilter, cFilter);
                    double slope# = (vSupply - rising#) / tau#;
                    double passage# = band# / slope#;
                    """),
            new Template("Preferred values", false, """
                    double wanted# = rIn * swing# / band#;
                    double chosen# = Series.E24.nearest(wanted#);
                    double off# = chosen# / wanted# - 1;
                    String mark# = MarkingCode.format(chosen#);
                    TripPoints rounded# = Comparators.noninverting(vRef, rIn, chosen#, vLow, vHigh#);
                    double shift# = rounded#.band() - band#;
                    double[] choices# = Series.E24.between(rIn, rFb);
                    int choiceCount# = choices#.length;
                    """),
            new Template("Levels of the speed voltage", false, """
                    double[] levels# = new double[21];
                    for (int i = 0; i < levels#.length; i++) {
                        levels#[i] = vSupply * i / (levels#.length - 1);
                    }
                    double sum# = 0;
                    for (double level : levels#) sum# += level;
                    double mean# = sum# / levels#.length;
                    double spread# = Arrays.stream(levels#).max().orElse(0) - mean#;
                    """),
            new Template("Stages", true, """
                    record Stage#(String name, double low, double high) {
                        double middle() { return (low + high) / 2; }
                    }
                    double toSpeed#(double v) {
                        double turnsPerVolt = 120;
                        return v * turnsPerVolt;
                    }
                    boolean inside#(double v, Stage# stage) { return v >= stage.low() && v <= stage.high(); }
                    """),
            new Template("Stages of the fan", false, """
                    Stage# slow# = new Stage#("slow", 0, falling#);
                    Stage# fast# = new Stage#("fast", rising#, vSupply);
                    List<Stage#> stages# = List.of(slow#, fast#);
                    double highest# = stages#.stream().mapToDouble(Stage#::middle).max().orElse(0);
                    String names# = stages#.stream().map(Stage#::name).collect(Collectors.joining(", "));
                    double speed# = toSpeed#(highest#);
                    boolean safe# = inside#(rising#, fast#);
                    var widths# = stages#.stream().map(stage -> stage.high() - stage.low()).toList();
                    """),
            new Template("Heat", false, """
                    double iDivider# = vSupply / (rTop + rBottom);
                    double pDivider# = vSupply * iDivider#;
                    double iFeedback# = (vHigh# - vRef) / (rIn + rFb);
                    double pFeedback# = iFeedback# * iFeedback# * rFb;
                    double pAll# = pDivider# + pFeedback#;
                    double most# = Math.max(pDivider#, pFeedback#);
                    double rippleLevel# = 20 * Math.log10(ripple#);
                    double rippleShown# = Math.round(rippleLevel# * 10) / 10.0;
                    """));

    /** Two plots as the lines of one more cell; what they draw is defined from the second calc cell on. */
    private static final String PLOTS = """
            :: calc Plots
            Plots.transfer("Fan output over speed voltage", trip1, vLow, vHigh1)
            Plots.response("Filter", 1, 10e3, "gain", "1", f -> Filters.gain(f, rFilter, cFilter))

            """;

    private static final String IMPORTS = """
            import java.math.*;
            import java.util.*;
            import java.util.function.*;
            import java.util.stream.*;
            import sill.stdlib.*;
            """;

    Workload {
        if (calcCells < 2) {
            throw new IllegalArgumentException("calcCells must be at least 2, got " + calcCells);
        }
    }

    int javaLines() {
        return calcCells * LINES_PER_CELL;
    }

    /** All cells of the worksheet: a note, the givens and the checks stand around the calc cells. */
    int cells() {
        return calcCells + 3;
    }

    private static String lines(int cell) {
        int repetition = cell / TEMPLATES.size() + 1;
        return template(cell).lines().replace("#", Integer.toString(repetition));
    }

    private static Template template(int cell) {
        return TEMPLATES.get(cell % TEMPLATES.size());
    }

    String worksheet() {
        return worksheet("");
    }

    String worksheetWithTwoPlots() {
        return worksheet(PLOTS);
    }

    /**
     * With a tolerance cell of three results.
     *
     * @param method as the cell has it
     */
    String worksheetWithTolerances(String method) {
        return worksheet(":: tolerance Trip points over tolerance\nof: " + String.join(", ", CHECKED) + "\nmethod: "
                + method + "\n\n");
    }

    private String worksheet(String more) {
        StringBuilder sheet = new StringBuilder("""
                sill 1
                title: Kiln fan supervision
                number: BENCH-1
                revision: A

                :: note Purpose
                An invented design that the benchmark measures.

                :: given Supply and parts
                """);
        GIVENS.forEach(given ->
                sheet.append(given.get(0)).append(" = ").append(given.get(1)).append('\n'));
        for (int cell = 0; cell < calcCells; cell++) {
            sheet.append("\n:: calc ")
                    .append(template(cell).caption())
                    .append('\n')
                    .append(lines(cell));
        }
        return sheet.append('\n').append(more).append("""

                :: check Requirements
                rising1 within 6 V .. 7 V
                falling1 at least 5 V
                band1 at least 300 mV
                """).toString();
    }

    /** A source file whose class is {@code Calculation}; it prints what the worksheet checks. */
    String sourceFile() {
        String declarations = IntStream.range(0, calcCells)
                .filter(cell -> template(cell).declares())
                .mapToObj(Workload::lines)
                .collect(Collectors.joining());
        String statements = IntStream.range(0, calcCells)
                .filter(cell -> !template(cell).declares())
                .mapToObj(Workload::lines)
                .collect(Collectors.joining());
        return IMPORTS + "public class Calculation {\n" + declarations + "void run() {\n" + givens() + statements
                + prints() + "}\npublic static void main(String[] arguments) { new Calculation().run(); }\n}\n";
    }

    /** What one would type at the prompt for the same, its end included. */
    String promptInput() {
        String cells = IntStream.range(0, calcCells).mapToObj(Workload::lines).collect(Collectors.joining());
        return IMPORTS + givens() + cells + prints() + "/exit\n";
    }

    private static String givens() {
        return GIVENS.stream()
                .map(given -> "double " + given.get(0) + " = " + given.get(2) + ";\n")
                .collect(Collectors.joining());
    }

    private static String prints() {
        List<String> prints = new ArrayList<>();
        CHECKED.forEach(name -> prints.add("System.out.println(" + name + ");\n"));
        return String.join("", prints);
    }
}
