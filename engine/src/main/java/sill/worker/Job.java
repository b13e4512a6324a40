package sill.worker;

import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import sill.sheet.Place;
import sill.sheet.SheetSource;
import sill.sheet.Span;
import sill.worksheet.Given;
import sill.worksheet.ToleranceStudy;

/**
 * What a worker is to do.
 *
 * @param source the sheet's Java
 * @param values values of the givens, by name
 * @param studies what the tolerance cells ask for, in order
 * @param leftOut places of the cells and checks that an earlier worker could not end
 */
record Job(SheetSource source, Map<String, GivenValue> values, List<StudyOrder> studies, Set<Place> leftOut) {

    /**
     * How a given varies.
     *
     * @param low its lower limit in coherent SI
     * @param high its upper limit in coherent SI
     */
    record Spread(double low, double high, Given.Distribution distribution) {}

    /**
     * What a tolerance cell asks for.
     *
     * @param vary givens to vary; empty for all with limits that the results rest on
     * @param hold givens to hold at nominal
     * @param over a given along which the results are wanted
     * @param shares checks that are judged on a share of the samples
     */
    record StudyOrder(
            int cell,
            List<ToleranceStudy.Method> methods,
            List<String> vary,
            List<String> hold,
            Optional<String> over,
            List<ShareWanted> shares) {}

    /**
     * A check in need of the share of samples inside its limits, inclusive.
     *
     * @param line the check's line
     * @param target which expression of the tolerance cell it judges, from 0
     */
    record ShareWanted(int line, int target, double low, double high) {}

    /** A given's value. */
    sealed interface GivenValue {
        /** A number and, where it has limits, how it spreads between them. */
        record Number(double value, Optional<Spread> spread) implements GivenValue {}

        record Numbers(double[] values) implements GivenValue {}

        record Text(String value) implements GivenValue {}

        /** A data file, to be read as a table. */
        record File(String path, byte[] bytes) implements GivenValue {}
    }

    byte[] bytes() {
        WireOut out = new WireOut();
        out.list(
                source.givens(),
                (o, given) -> o.text(given.name())
                        .number(given.type().ordinal())
                        .number(given.cell())
                        .number(given.line())
                        .text(given.unit()));
        out.list(
                source.cells(),
                (o, cell) -> o.number(cell.number())
                        .text(cell.caption())
                        .number(cell.line())
                        .text(cell.source())
                        .list(
                                cell.studied(),
                                (s, span) -> s.number(span.start()).number(span.end())));
        out.list(
                source.checks(),
                (o, check) -> o.number(check.cell())
                        .number(check.line())
                        .number(check.column())
                        .text(check.expression())
                        .flag(check.condition())
                        .text(check.unit()));
        out.map(values, Job::value);
        out.list(studies, StudyWire::order);
        out.list(leftOut, (o, place) -> o.number(place.line()).number(place.column()));
        return out.bytes();
    }

    static Job of(byte[] message) {
        WireIn in = new WireIn(message);
        List<SheetSource.GivenField> givens = in.list(i -> new SheetSource.GivenField(
                i.text(), i.constant(SheetSource.GivenType.values()), i.number(), i.number(), i.text()));
        List<SheetSource.CodeCell> cells = in.list(i -> new SheetSource.CodeCell(
                i.number(), i.text(), i.number(), i.text(), i.list(s -> new Span(s.number(), s.number()))));
        List<SheetSource.CheckLine> checks = in.list(
                i -> new SheetSource.CheckLine(i.number(), i.number(), i.number(), i.text(), i.flag(), i.text()));
        Job job = new Job(
                new SheetSource(givens, cells, checks),
                in.map(Job::value),
                in.list(StudyWire::order),
                Set.copyOf(in.list(i -> new Place(i.number(), i.number()))));
        in.end();
        return job;
    }

    private static void value(WireOut out, GivenValue value) {
        if (value instanceof GivenValue.Number number) {
            out.number(0).real(number.value()).list(number.spread().stream().toList(), StudyWire::spread);
        } else if (value instanceof GivenValue.Numbers numbers) {
            out.number(1).reals(numbers.values());
        } else if (value instanceof GivenValue.Text text) {
            out.number(2).text(text.value());
        } else if (value instanceof GivenValue.File file) {
            out.number(3).text(file.path()).raw(file.bytes());
        }
    }

    private static GivenValue value(WireIn in) {
        int kind = in.number();
        return switch (kind) {
            case 0 ->
                new GivenValue.Number(
                        in.real(), in.list(StudyWire::spread).stream().findFirst());
            case 1 -> new GivenValue.Numbers(in.reals());
            case 2 -> new GivenValue.Text(in.text());
            case 3 -> new GivenValue.File(in.text(), in.raw());
            default -> throw new WireIn.BadMessage("there is no kind of given " + kind);
        };
    }
}
