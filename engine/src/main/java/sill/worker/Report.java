package sill.worker;

import java.util.List;
import java.util.Optional;
import sill.sheet.Place;
import sill.values.CellRun;
import sill.values.CheckValue;
import sill.values.Finding;
import sill.values.Result;
import sill.worksheet.Problem;

/** What a worker says while it works, one message each. */
sealed interface Report {
    /** The sheet is translated and evaluated; these problems were found. */
    record Translated(List<Problem> problems) implements Report {}

    /** A cell or check line is about to be called. */
    record Begun(int cell, Place place) implements Report {}

    /** A calculation cell ended, or could not be called. */
    record CellEnded(CellRun run, List<Result> results, List<Problem> problems) implements Report {}

    /** A check line ended, or could not be called; without a value it could not be evaluated, for the reason given. */
    record CheckEnded(int cell, Place place, Optional<CheckValue> value, String reason, List<Problem> problems)
            implements Report {}

    /** A tolerance cell ended, or could not be called. */
    record StudyEnded(CellRun run, List<Finding> findings, List<Problem> problems) implements Report {}

    /** How far the tolerance cell has come that began last. */
    record Studied(long done, long total) implements Report {}

    /** All is done; these problems show only at the end. */
    record Finished(List<Problem> problems) implements Report {}

    /** The worker could not do its work; the hint says what may help. */
    record Failed(String what, String hint) implements Report {
        static Failed of(Throwable thrown) {
            for (Throwable cause = thrown; cause != null; cause = cause.getCause()) {
                if (cause instanceof StackOverflowError) {
                    return new Failed(
                            "it is nested too deeply for the compiler", "Give parts of long expressions a name.");
                }
            }
            StackTraceElement[] frames = thrown.getStackTrace();
            String where = frames.length == 0 ? "" : " at " + frames[0];
            return new Failed("a fault of Sill itself, " + thrown + where, "Please report it with the worksheet.");
        }
    }

    /** The message's bytes. */
    default byte[] bytes() {
        WireOut out = new WireOut();
        if (this instanceof Translated translated) {
            out.number(0).list(translated.problems(), ValueWire::problem);
        } else if (this instanceof Begun begun) {
            out.number(1).number(begun.cell());
            place(out, begun.place());
        } else if (this instanceof CellEnded ended) {
            out.number(2);
            ValueWire.cellRun(out, ended.run());
            out.list(ended.results(), ValueWire::result).list(ended.problems(), ValueWire::problem);
        } else if (this instanceof CheckEnded ended) {
            out.number(3).number(ended.cell());
            place(out, ended.place());
            out.flag(ended.value().isPresent());
            ended.value().ifPresent(value -> ValueWire.checkValue(out, value));
            out.text(ended.reason()).list(ended.problems(), ValueWire::problem);
        } else if (this instanceof Finished finished) {
            out.number(4).list(finished.problems(), ValueWire::problem);
        } else if (this instanceof Failed failed) {
            out.number(5).text(failed.what()).text(failed.hint());
        } else if (this instanceof StudyEnded ended) {
            out.number(6);
            ValueWire.cellRun(out, ended.run());
            out.list(ended.findings(), FindingWire::write).list(ended.problems(), ValueWire::problem);
        } else if (this instanceof Studied studied) {
            out.number(7).whole(studied.done()).whole(studied.total());
        }
        return out.bytes();
    }

    private static void place(WireOut out, Place place) {
        out.number(place.line()).number(place.column());
    }

    private static Place place(WireIn in) {
        return new Place(in.number(), in.number());
    }

    /** The message that the bytes are. */
    static Report of(byte[] message) {
        WireIn in = new WireIn(message);
        Report report = read(in);
        in.end();
        return report;
    }

    private static Report read(WireIn in) {
        int kind = in.number();
        return switch (kind) {
            case 0 -> new Translated(in.list(ValueWire::problem));
            case 1 -> new Begun(in.number(), place(in));
            case 2 -> new CellEnded(ValueWire.cellRun(in), in.list(ValueWire::result), in.list(ValueWire::problem));
            case 3 ->
                new CheckEnded(
                        in.number(),
                        place(in),
                        in.flag() ? Optional.of(ValueWire.checkValue(in)) : Optional.empty(),
                        in.text(),
                        in.list(ValueWire::problem));
            case 4 -> new Finished(in.list(ValueWire::problem));
            case 5 -> new Failed(in.text(), in.text());
            case 6 -> new StudyEnded(ValueWire.cellRun(in), in.list(FindingWire::read), in.list(ValueWire::problem));
            case 7 -> new Studied(in.whole(), in.whole());
            default -> throw new WireIn.BadMessage("there is no kind of report " + kind);
        };
    }
}
