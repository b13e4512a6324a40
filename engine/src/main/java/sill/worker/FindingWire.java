package sill.worker;

import java.util.List;
import java.util.Optional;
import java.util.function.BiConsumer;
import java.util.function.Function;
import sill.values.Finding;

/** What tolerance cells found, as bytes and back. */
final class FindingWire {
    private FindingWire() {}

    static void write(WireOut out, Finding finding) {
        out.number(finding.cell()).number(finding.index()).text(finding.of()).text(finding.component());
        out.text(finding.unit()).text(finding.shownIn()).real(finding.nominal()).texts(finding.varied());
        optional(out, finding.worstCase(), FindingWire::worstCase);
        optional(
                out,
                finding.rootSumSquare(),
                (o, rss) -> o.real(rss.low()).real(rss.high()).real(rss.standardUncertainty()));
        optional(out, finding.monteCarlo(), FindingWire::monteCarlo);
        out.list(
                finding.sensitivities(),
                (o, each) -> o.text(each.given()).real(each.slope()).real(each.share()));
        optional(out, finding.sweep(), FindingWire::sweep);
        out.texts(finding.remarks());
    }

    static Finding read(WireIn in) {
        return new Finding(
                in.number(),
                in.number(),
                in.text(),
                in.text(),
                in.text(),
                in.text(),
                in.real(),
                in.texts(),
                optional(in, FindingWire::worstCase),
                optional(in, i -> new Finding.RootSumSquare(i.real(), i.real(), i.real())),
                optional(in, FindingWire::monteCarlo),
                in.list(i -> new Finding.Sensitivity(i.text(), i.real(), i.real())),
                optional(in, FindingWire::sweep),
                in.texts());
    }

    private static void sweep(WireOut out, Finding.Sweep sweep) {
        out.text(sweep.given()).list(sweep.at(), WireOut::real).list(sweep.nominal(), WireOut::real);
        out.list(sweep.low(), WireOut::real).list(sweep.high(), WireOut::real);
    }

    private static Finding.Sweep sweep(WireIn in) {
        return new Finding.Sweep(
                in.text(), in.list(WireIn::real), in.list(WireIn::real), in.list(WireIn::real), in.list(WireIn::real));
    }

    private static void worstCase(WireOut out, Finding.WorstCase found) {
        extreme(out, found.low());
        extreme(out, found.high());
        out.list(found.trends(), (o, trend) -> o.number(trend.ordinal()));
    }

    private static Finding.WorstCase worstCase(WireIn in) {
        return new Finding.WorstCase(extreme(in), extreme(in), in.list(i -> i.constant(Finding.Trend.values())));
    }

    private static void extreme(WireOut out, Finding.Extreme extreme) {
        out.real(extreme.value()).list(extreme.at(), WireOut::real);
    }

    private static Finding.Extreme extreme(WireIn in) {
        return new Finding.Extreme(in.real(), in.list(WireIn::real));
    }

    private static void monteCarlo(WireOut out, Finding.MonteCarlo found) {
        out.number(found.samples()).whole(found.seed());
        out.real(found.mean()).real(found.sd()).real(found.low()).real(found.high());
        out.map(found.quantiles(), WireOut::real)
                .map(found.errors(), WireOut::real)
                .real(found.resolution());
        out.real(found.min()).real(found.max());
        out.whole(found.notFinite()).whole(found.thrown());
        out.real(found.histogram().from()).real(found.histogram().to());
        out.list(found.histogram().counts(), WireOut::whole);
        out.list(
                found.shares(),
                (o, share) -> o.number(share.line()).real(share.share()).real(share.low()));
    }

    private static Finding.MonteCarlo monteCarlo(WireIn in) {
        return new Finding.MonteCarlo(
                in.number(),
                in.whole(),
                in.real(),
                in.real(),
                in.real(),
                in.real(),
                in.map(WireIn::real),
                in.map(WireIn::real),
                in.real(),
                in.real(),
                in.real(),
                in.whole(),
                in.whole(),
                new Finding.Histogram(in.real(), in.real(), in.list(WireIn::whole)),
                in.list(i -> new Finding.Share(i.number(), i.real(), i.real())));
    }

    private static <T> void optional(WireOut out, Optional<T> value, BiConsumer<WireOut, T> each) {
        out.list(value.stream().toList(), each);
    }

    private static <T> Optional<T> optional(WireIn in, Function<WireIn, T> each) {
        List<T> values = in.list(each);
        return values.stream().findFirst();
    }
}
