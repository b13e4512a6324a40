package sill.worker;

import sill.worksheet.Given.Distribution;
import sill.worksheet.ToleranceStudy.Method;

/** What tolerance cells ask for, as bytes. */
final class StudyWire {
    private StudyWire() {}

    static void spread(WireOut out, Job.Spread spread) {
        out.real(spread.low()).real(spread.high());
        if (spread.distribution() instanceof Distribution.Normal normal) {
            out.number(1).real(normal.k());
        } else {
            out.number(spread.distribution() instanceof Distribution.Triangular ? 2 : 0);
        }
    }

    static Job.Spread spread(WireIn in) {
        return new Job.Spread(in.real(), in.real(), distribution(in));
    }

    private static Distribution distribution(WireIn in) {
        int kind = in.number();
        return switch (kind) {
            case 0 -> new Distribution.Uniform();
            case 1 -> new Distribution.Normal(in.real());
            case 2 -> new Distribution.Triangular();
            default -> throw new WireIn.BadMessage("there is no distribution " + kind);
        };
    }

    static void order(WireOut out, Job.StudyOrder order) {
        out.number(order.cell()).list(order.methods(), StudyWire::method);
        out.texts(order.vary()).texts(order.hold()).texts(order.over().stream().toList());
        out.list(
                order.shares(),
                (o, share) -> o.number(share.line())
                        .number(share.target())
                        .real(share.low())
                        .real(share.high()));
    }

    static Job.StudyOrder order(WireIn in) {
        return new Job.StudyOrder(
                in.number(),
                in.list(StudyWire::method),
                in.texts(),
                in.texts(),
                in.texts().stream().findFirst(),
                in.list(i -> new Job.ShareWanted(i.number(), i.number(), i.real(), i.real())));
    }

    private static void method(WireOut out, Method method) {
        if (method instanceof Method.MonteCarlo samples) {
            out.number(2).number(samples.samples()).whole(samples.seed());
        } else {
            out.number(method instanceof Method.RootSumSquare ? 1 : 0);
        }
    }

    private static Method method(WireIn in) {
        int kind = in.number();
        return switch (kind) {
            case 0 -> new Method.WorstCase();
            case 1 -> new Method.RootSumSquare();
            case 2 -> new Method.MonteCarlo(in.number(), in.whole());
            default -> throw new WireIn.BadMessage("there is no method " + kind);
        };
    }
}
