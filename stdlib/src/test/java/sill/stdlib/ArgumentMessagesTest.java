package sill.stdlib;

import static org.assertj.core.api.Assertions.assertThatIllegalArgumentException;

import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.function.Executable;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.MethodSource;

/** The whole text of what helpers say to arguments that make no sense. */
class ArgumentMessagesTest {
    private static final double NAN = Double.NaN;
    private static final double INFINITY = Double.POSITIVE_INFINITY;

    static Stream<Arguments> dividers() {
        return Stream.of(
                says("vIn must be finite, got NaN V", () -> Dividers.output(NAN, 1, 1)),
                says("vIn must be finite, got -Infinity V", () -> Dividers.output(-INFINITY, 1, 1, 1)),
                says("rTop must be at least 0 Ω, got -1.0 Ω", () -> Dividers.output(5, -1, 1)),
                says("rTop must be finite, got NaN Ω", () -> Dividers.output(5, NAN, 1, 1)),
                says("rBottom must be at least 0 Ω, got -0.5 Ω", () -> Dividers.output(5, 1, -0.5)),
                says("rBottom must be finite, got Infinity Ω", () -> Dividers.output(5, 1, INFINITY)),
                says("rTop + rBottom must be above 0 Ω, got 0.0 Ω", () -> Dividers.output(5, 0, 0)),
                says("rLoad must be above 0 Ω, got 0.0 Ω", () -> Dividers.output(5, 1, 1, 0)),
                says("rLoad must be finite, got NaN Ω", () -> Dividers.output(5, 1, 1, NAN)),
                says("rTop must be at least 0 Ω, got -1.0 Ω", () -> Dividers.sourceResistance(-1, 1)),
                says("rTop + rBottom must be above 0 Ω, got 0.0 Ω", () -> Dividers.sourceResistance(0, 0)),
                says("r must be one resistance or more, got none", () -> Dividers.parallel()),
                says("r[1] must be at least 0 Ω, got -3.0 Ω", () -> Dividers.parallel(1, -3)),
                says("r[0] must be finite, got NaN Ω", () -> Dividers.parallel(NAN)));
    }

    static Stream<Arguments> comparators() {
        return Stream.of(
                says("rIn must be above 0 Ω, got -8200.0 Ω", () -> Comparators.noninverting(5, -8200, 220e3, 0, 12)),
                says("rIn must be above 0 Ω, got 0.0 Ω", () -> Comparators.noninverting(5, 0, 220e3, 0, 12)),
                says("rIn must be finite, got NaN Ω", () -> Comparators.noninverting(5, NAN, 220e3, 0, 12)),
                says("rFb must be finite, got Infinity Ω", () -> Comparators.noninverting(5, 1, INFINITY, 0, 12)),
                says("rFb must be above 0 Ω, got -1.0 Ω", () -> Comparators.noninverting(5, 1, -1, 0, 12)),
                says("vOutLow must be finite, got NaN V", () -> Comparators.noninverting(5, 1, 1, NAN, 12)),
                says("vOutHigh must be finite, got NaN V", () -> Comparators.noninverting(5, 1, 1, 0, NAN)),
                says(
                        "vOutLow must be below vOutHigh (12.0 V), got 12.0 V",
                        () -> Comparators.noninverting(5, 1, 1, 12, 12)),
                says(
                        "vRef must be within vOutLow .. vOutHigh (0.02 V .. 22.5 V), got 30.0 V",
                        () -> Comparators.noninverting(30, 1, 1, 0.02, 22.5)),
                says(
                        "vRef must be within vOutLow .. vOutHigh (0.02 V .. 22.5 V), got -1.0 V",
                        () -> Comparators.noninverting(-1, 1, 1, 0.02, 22.5)),
                says("vRef must be finite, got NaN V", () -> Comparators.noninverting(NAN, 1, 1, 0, 12)),
                says("vSupply must be finite, got NaN V", () -> Comparators.inverting(NAN, 1, 1, 1, 0, 5)),
                says("rTop must be above 0 Ω, got 0.0 Ω", () -> Comparators.inverting(5, 0, 1, 1, 0, 5)),
                says("rBottom must be above 0 Ω, got -1.0 Ω", () -> Comparators.inverting(5, 1, -1, 1, 0, 5)),
                says("rFb must be finite, got NaN Ω", () -> Comparators.inverting(5, 1, 1, NAN, 0, 5)),
                says(
                        "vOutLow must be below vOutHigh (0.0 V), got 5.0 V",
                        () -> Comparators.inverting(5, 1, 1, 1, 5, 0)),
                says("falling must be at most rising (1.0 V), got 2.0 V", () -> new TripPoints(1, 2)),
                says("falling must be finite, got NaN V", () -> new TripPoints(1, NAN)),
                says("rising must be finite, got Infinity V", () -> new TripPoints(INFINITY, 1)));
    }

    static Stream<Arguments> filters() {
        return Stream.of(
                says("r must be above 0 Ω, got 0.0 Ω", () -> Filters.cutoff(0, 1e-6)),
                says("c must be above 0 F, got -1.0E-6 F", () -> Filters.cutoff(1, -1e-6)),
                says("c must be finite, got NaN F", () -> Filters.timeConstant(1, NAN)),
                says("f must be at least 0 Hz, got -1.0 Hz", () -> Filters.gain(-1, 1, 1)),
                says("f must be finite, got NaN Hz", () -> Filters.gain(NAN, 1, 1)),
                says("r must be finite, got NaN Ω", () -> Filters.gain(1, NAN, 1)),
                says("r must be above 0 Ω, got -1.0 Ω", () -> Filters.noiseBandwidth(-1, 1)),
                says("r must be above 0 Ω, got 0.0 Ω", () -> Filters.timeToReach(0, 1, 0, 5, 2)),
                says("vStart must be finite, got NaN V", () -> Filters.timeToReach(1, 1, NAN, 5, 2)),
                says("vFinal must be finite, got Infinity V", () -> Filters.timeToReach(1, 1, 0, INFINITY, 2)),
                says("vFinal must be other than vStart (5.0 V), got 5.0 V", () -> Filters.timeToReach(1, 1, 5, 5, 5)),
                says("v must be finite, got NaN V", () -> Filters.timeToReach(1, 1, 0, 5, NAN)),
                says(
                        "v must be from vStart (0.0 V) on and short of vFinal (5.0 V), got 5.0 V",
                        () -> Filters.timeToReach(1, 1, 0, 5, 5)),
                says(
                        "v must be from vStart (0.0 V) on and short of vFinal (5.0 V), got -1.0 V",
                        () -> Filters.timeToReach(1, 1, 0, 5, -1)),
                says(
                        "v must be from vStart (5.0 V) on and short of vFinal (0.0 V), got 6.0 V",
                        () -> Filters.timeToReach(1, 1, 5, 0, 6)));
    }

    static Stream<Arguments> seriesAndCodes() {
        return Stream.of(
                says("x must be above 0, got 0.0", () -> Series.E24.nearest(0)),
                says("x must be above 0, got -4700.0", () -> Series.E24.atLeast(-4700)),
                says("x must be finite, got NaN", () -> Series.E24.atMost(NAN)),
                says("x must be within 1.0E-300 .. 1.0E300, got 1.0E-301", () -> Series.E24.nearest(1e-301)),
                says("x must be within 1.0E-300 .. 1.0E300, got 2.0E300", () -> Series.E24.nearest(2e300)),
                says("low must be above 0, got 0.0", () -> Series.E24.between(0, 1)),
                says("high must be finite, got Infinity", () -> Series.E24.between(1, INFINITY)),
                says("low must be at most high (1.0), got 2.0", () -> Series.E24.between(2, 1)),
                says("resistance must be above 0 Ω, got 0.0 Ω", () -> MarkingCode.format(0)),
                says("resistance must be finite, got NaN Ω", () -> MarkingCode.format(NAN)),
                says("resistance must be within 1.0E-6 Ω .. 1.0E15 Ω, got 2.0E15 Ω", () -> MarkingCode.format(2e15)),
                says(
                        "resistance must be of at most 4 significant digits, got 4712.5 Ω",
                        () -> MarkingCode.format(4712.5)),
                says(
                        "capacitance must be within 1.0E-15 F .. 1000.0 F, got 1.0E-16 F",
                        () -> MarkingCode.formatCapacitance(1e-16)),
                says(
                        "capacitance must be of at most 4 significant digits, got 1.2345E-9 F",
                        () -> MarkingCode.formatCapacitance(1.2345e-9)),
                says(
                        "tolerance letter must be one of E L P W B C D F G H J K M N, got \"Z\"",
                        () -> MarkingCode.tolerance("Z")));
    }

    static Stream<Arguments> badCodes() {
        String code = "code must be digits with one letter of L R K M G T (Ω) or p n µ m F (F) as the decimal sign,"
                + " such as \"4K7\" or \"4n7\", got ";
        String resistor = "resistor code must be digits with one letter of L R K M G T as the decimal sign, such as"
                + " \"4K7\", or digits and a power of ten from 0 to 7, such as \"472\","
                + " or 01 to 96 and one letter of Z Y X A B C D E F, such as \"68C\", got ";
        String capacitor = "capacitor code must be digits with one letter of p n µ m F as the decimal sign, such as"
                + " \"4n7\", or two digits and a power of ten from 0 to 7 in pF, such as \"472\", got ";
        return Stream.of(
                        Stream.of(
                                        "",
                                        "4X7",
                                        "4700",
                                        "K",
                                        "4K7K",
                                        "4.7K",
                                        "-4K7",
                                        "4 K7",
                                        "4K7 ",
                                        "4N7",
                                        "٤K7",
                                        "9".repeat(10) + "K")
                                .map(bad -> says(code + "\"" + bad + "\"", () -> MarkingCode.parse(bad))),
                        Stream.of("", "4n7", "4m7", "00A", "97A", "01H", "01R5R", "47", "478", "12345")
                                .map(bad -> says(resistor + "\"" + bad + "\"", () -> MarkingCode.parseResistance(bad))),
                        Stream.of("", "4K7", "1002", "10", "108", "µ")
                                .map(bad ->
                                        says(capacitor + "\"" + bad + "\"", () -> MarkingCode.parseCapacitance(bad))))
                .flatMap(stream -> stream);
    }

    static Stream<Arguments> plots() {
        double[] one = {1};
        double[] two = {1, 2};
        String unit = " must be a coherent SI unit such as \"V\", \"Ω\" or \"K\", or \"1\" for a pure number"
                + " (the drawing chooses the prefix), got ";
        Plot plot = Plots.line("t", "a", "V", two, "b", "V", two);
        return Stream.of(
                says("xUnit" + unit + "\"mV\"", () -> Plots.line("t", "a", "mV", one, "b", "V", one)),
                says("yUnit" + unit + "\"°C\"", () -> Plots.line("t", "a", "V", one, "b", "°C", one)),
                says("yUnit" + unit + "\"\"", () -> Plots.signals("t", one, "b", "", one)),
                says(
                        "curve \"b\" must have as many ordinates as abscissas (2), got 1",
                        () -> Plots.line("t", "a", "V", two, "b", "V", one)),
                says(
                        "curve \"b\" must have one point or more, got none",
                        () -> Plots.line("t", "a", "V", new double[0], "b", "V", one)),
                says("curve \"c\" must have as many ordinates as abscissas (2), got 1", () -> plot.curve("c", one)),
                says("low must be below high (1.0), got 1.0", () -> Plots.line("t", "a", "V", 1, 1, "b", "V", v -> v)),
                says("low must be above 0 Hz, got 0.0 Hz", () -> Plots.response("t", 0, 1, "b", "1", f -> f)),
                says("low must be below high (1.0 Hz), got 2.0 Hz", () -> Plots.response("t", 2, 1, "b", "1", f -> f)),
                says(
                        "vOutAbove must be other than vOutBelow (5.0 V), got 5.0 V",
                        () -> Plots.transfer("t", new TripPoints(2, 1), 5, 5)),
                says("vOutBelow must be finite, got NaN V", () -> Plots.transfer("t", new TripPoints(2, 1), NAN, 5)),
                says(
                        "vOutAbove must be finite, got Infinity V",
                        () -> Plots.transfer("t", new TripPoints(2, 1), 0, INFINITY)),
                says("mark \"REQ-1\" must be finite, got NaN", () -> plot.limit(NAN, "REQ-1")),
                says(
                        "\"REQ-1\" on the logarithmic axis \"a\" must be above 0, got -1.0 V",
                        () -> plot.logX().limitX(-1, "REQ-1")),
                says(
                        "\"b\" on the logarithmic axis \"b\" must be above 0, got 0.0",
                        () -> Plots.line("t", "a", "V", two, "b", "1", new double[] {1, 0})
                                .logY()),
                says(
                        "curves must be one or more, got none",
                        () -> Plot.described("t", plot.x(), plot.y(), List.of(), plot.marks())));
    }

    @ParameterizedTest
    @MethodSource({"dividers", "comparators", "filters", "seriesAndCodes", "badCodes", "plots"})
    void theMessageNamesArgumentRuleAndValue(String message, Executable call) {
        assertThatIllegalArgumentException().isThrownBy(call::execute).withMessage(message);
    }

    private static Arguments says(String message, Executable call) {
        return Arguments.of(message, call);
    }
}
