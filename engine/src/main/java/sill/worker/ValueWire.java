package sill.worker;

import java.util.List;
import java.util.Optional;
import sill.stdlib.Plot;
import sill.values.CellRun;
import sill.values.CellState;
import sill.values.CheckValue;
import sill.values.Datum;
import sill.values.Result;
import sill.worksheet.Problem;

/** The values of a run, as bytes and back. */
final class ValueWire {
    /** Deeper values are no message of ours: {@link DatumReader} ends far above. */
    private static final int DEEPEST = 64;

    private ValueWire() {}

    static void problem(WireOut out, Problem problem) {
        out.number(problem.line()).number(problem.column()).number(problem.cell());
        out.number(problem.severity().ordinal()).text(problem.message()).text(problem.hint());
    }

    static Problem problem(WireIn in) {
        return new Problem(
                in.number(), in.number(), in.number(), in.constant(Problem.Severity.values()), in.text(), in.text());
    }

    static void cellRun(WireOut out, CellRun run) {
        out.number(run.number()).number(run.state().ordinal()).text(run.reason());
        out.texts(run.waitsOn()).text(run.output());
    }

    static CellRun cellRun(WireIn in) {
        return new CellRun(in.number(), in.constant(CellState.values()), in.text(), in.texts(), in.text());
    }

    static void result(WireOut out, Result result) {
        out.text(result.name()).number(result.cell()).number(result.index()).number(result.line());
        out.text(result.formula()).text(result.type());
        datum(out, result.value());
        out.flag(result.plot().isPresent());
        result.plot().ifPresent(plot -> plot(out, plot));
        out.text(result.unit()).text(result.shownIn()).map(result.componentUnits(), WireOut::text);
        out.text(result.caption()).texts(result.uses()).texts(result.dependsOn());
        out.flag(result.meaning().isPresent());
        result.meaning().ifPresent(meaning -> ExpressionWire.write(out, meaning));
    }

    static Result result(WireIn in) {
        return new Result(
                in.text(),
                in.number(),
                in.number(),
                in.number(),
                in.text(),
                in.text(),
                datum(in, 0),
                in.flag() ? Optional.of(plot(in)) : Optional.empty(),
                in.text(),
                in.text(),
                in.map(WireIn::text),
                in.text(),
                in.texts(),
                in.texts(),
                in.flag() ? Optional.of(ExpressionWire.read(in)) : Optional.empty());
    }

    static void checkValue(WireOut out, CheckValue check) {
        out.number(check.line());
        datum(out, check.value());
        out.text(check.unit()).texts(check.uses()).texts(check.dependsOn());
    }

    static CheckValue checkValue(WireIn in) {
        return new CheckValue(in.number(), datum(in, 0), in.text(), in.texts(), in.texts());
    }

    /** A value's bytes: equal for equal values. */
    static byte[] bytes(Datum datum) {
        WireOut out = new WireOut();
        datum(out, datum);
        return out.bytes();
    }

    private static void datum(WireOut out, Datum datum) {
        if (datum instanceof Datum.Real real) {
            out.number(0).real(real.value());
        } else if (datum instanceof Datum.Whole whole) {
            out.number(1).text(whole.digits());
        } else if (datum instanceof Datum.Truth truth) {
            out.number(2).flag(truth.value());
        } else if (datum instanceof Datum.Text text) {
            out.number(3).text(text.value());
        } else if (datum instanceof Datum.Items items) {
            out.number(4).number(items.size()).list(items.items(), ValueWire::datum);
        } else if (datum instanceof Datum.Fields fields) {
            out.number(5).map(fields.fields(), ValueWire::datum);
        } else if (datum instanceof Datum.Opaque opaque) {
            out.number(6).text(opaque.text());
        } else {
            out.number(7);
        }
    }

    private static Datum datum(WireIn in, int depth) {
        if (depth > DEEPEST) {
            throw new WireIn.BadMessage("a value is nested deeper than " + DEEPEST);
        }
        int kind = in.number();
        return switch (kind) {
            case 0 -> new Datum.Real(in.real());
            case 1 -> new Datum.Whole(in.text());
            case 2 -> new Datum.Truth(in.flag());
            case 3 -> new Datum.Text(in.text());
            case 4 -> {
                int size = in.number();
                List<Datum> items = in.list(item -> datum(item, depth + 1));
                if (items.size() > size) {
                    throw new WireIn.BadMessage("a list of " + size + " values holds " + items.size());
                }
                yield new Datum.Items(items, size);
            }
            case 5 -> new Datum.Fields(in.map(field -> datum(field, depth + 1)));
            case 6 -> new Datum.Opaque(in.text());
            case 7 -> new Datum.Absent();
            default -> throw new WireIn.BadMessage("there is no kind of value " + kind);
        };
    }

    private static void plot(WireOut out, Plot plot) {
        out.text(plot.title()).text(plot.description());
        axis(out, plot.x());
        axis(out, plot.y());
        out.list(
                plot.curves(),
                (o, curve) -> o.text(curve.label())
                        .number(curve.style().ordinal())
                        .flag(curve.arrow())
                        .reals(curve.x())
                        .reals(curve.y()));
        out.list(
                plot.marks(),
                (o, mark) -> o.number(mark.side().ordinal())
                        .real(mark.at())
                        .text(mark.label())
                        .number(mark.role().ordinal()));
    }

    private static Plot plot(WireIn in) {
        try {
            return new Plot(
                    in.text(),
                    in.text(),
                    axis(in),
                    axis(in),
                    in.list(i ->
                            new Plot.Curve(i.text(), i.constant(Plot.Style.values()), i.flag(), i.reals(), i.reals())),
                    in.list(i -> new Plot.Mark(
                            i.constant(Plot.Side.values()), i.real(), i.text(), i.constant(Plot.Role.values()))));
        } catch (IllegalArgumentException e) {
            throw new WireIn.BadMessage("not a plot: " + e.getMessage());
        }
    }

    private static void axis(WireOut out, Plot.Axis axis) {
        out.text(axis.label()).text(axis.unit()).number(axis.scale().ordinal());
    }

    private static Plot.Axis axis(WireIn in) {
        return new Plot.Axis(in.text(), in.text(), in.constant(Plot.Scale.values()));
    }
}
