package sill.worker;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.stream.Collectors;
import sill.study.Doubt;
import sill.study.Estimate;
import sill.study.Extreme;
import sill.study.Failures;
import sill.study.Findings;
import sill.study.MonteCarlo;
import sill.study.Quantile;
import sill.study.RootSumSquare;
import sill.study.Setting;
import sill.study.Share;
import sill.study.Statistics;
import sill.values.Finding;
import sill.values.Finding.Trend;

/** Turns what a study found into what a record holds. */
final class FindingWriter {
    private final List<String> varied;
    private final List<String> notes;

    /**
     * @param varied the givens that varied, in order
     * @param notes what a reader must know of the whole study
     */
    FindingWriter(List<String> varied, List<String> notes) {
        this.varied = varied;
        this.notes = notes;
    }

    /**
     * One finding.
     *
     * @param target what it is about
     * @param shareLines lines of the checks that want a share of samples, in the order of the plan's windows
     */
    Finding write(StudyTarget target, Findings found, List<Integer> shareLines, Optional<Finding.Sweep> sweep) {
        List<String> remarks = new ArrayList<>(notes);
        found.rss().ifPresent(rss -> rss.doubts().stream().limit(1).forEach(doubt -> remarks.add(remark(doubt))));
        notFinite(found).ifPresent(remarks::add);
        return new Finding(
                target.cell(),
                target.index(),
                target.of(),
                target.component(),
                target.unit(),
                target.shownIn(),
                found.nominal(),
                varied,
                found.worstCase().map(this::worstCase),
                found.rss().map(FindingWriter::rootSumSquare),
                found.monteCarlo().flatMap(sampled -> monteCarlo(sampled, shareLines)),
                found.sensitivities().stream()
                        .map(each -> new Finding.Sensitivity(each.given(), each.slope(), each.share()))
                        .toList(),
                sweep,
                remarks);
    }

    /** How many repetitions gave no finite value, if some did not: a sentence. */
    static Optional<String> notFinite(Findings found) {
        Optional<String> samples =
                found.monteCarlo().flatMap(sampled -> notFinite(sampled.failures(), sampled.samples(), "samples"));
        return samples.or(() -> found.worstCase()
                .flatMap(extremes ->
                        notFinite(extremes.failures(), extremes.evaluations(), "points within the limits")));
    }

    private static Optional<String> notFinite(Failures failures, long all, String what) {
        return failures.count() == 0
                ? Optional.empty()
                : Optional.of(failures.count() + " of " + all + " " + what + " gave no finite value"
                        + failures.message()
                                .map(first -> ", the first " + first)
                                .orElse("") + ".");
    }

    private static String remark(Doubt doubt) {
        return "The root sum square rests on straight lines, and here " + doubt.words()
                + " by more than a tenth: take the worst case or the samples instead.";
    }

    private Finding.WorstCase worstCase(sill.study.WorstCase found) {
        List<Trend> trends = found.directions().stream()
                .map(direction -> switch (direction) {
                    case NONE -> Trend.STILL;
                    case RISING -> Trend.RISING;
                    case FALLING -> Trend.FALLING;
                    case NEITHER -> Trend.MIXED;
                })
                .toList();
        return new Finding.WorstCase(extreme(found.low()), extreme(found.high()), trends);
    }

    private static Finding.Extreme extreme(Extreme extreme) {
        return new Finding.Extreme(
                extreme.value(), extreme.at().stream().map(Setting::value).toList());
    }

    private static Finding.RootSumSquare rootSumSquare(RootSumSquare found) {
        return new Finding.RootSumSquare(found.low(), found.high(), found.standardUncertainty());
    }

    /** With fewer than two finite samples there are no figures; the remarks tell. */
    private static Optional<Finding.MonteCarlo> monteCarlo(MonteCarlo found, List<Integer> shareLines) {
        return found.statistics().map(statistics -> {
            Map<String, Double> errors = new LinkedHashMap<>();
            put(errors, "mean", statistics.mean());
            put(errors, "sd", statistics.sd());
            put(errors, "low", statistics.low());
            put(errors, "high", statistics.high());
            statistics.quantiles().forEach(quantile -> put(errors, name(quantile), quantile.estimate()));
            return new Finding.MonteCarlo(
                    (int) found.samples(),
                    found.seed(),
                    statistics.mean().value(),
                    statistics.sd().value(),
                    statistics.low().value(),
                    statistics.high().value(),
                    quantiles(statistics),
                    errors,
                    resolution(statistics),
                    statistics.min(),
                    statistics.max(),
                    found.failures().count(),
                    found.failures().thrown(),
                    histogram(statistics),
                    shares(found.shares(), shareLines));
        });
    }

    private static double resolution(Statistics statistics) {
        double quantiles = statistics.quantiles().stream()
                .mapToDouble(quantile -> quantile.estimate().resolution())
                .max()
                .orElse(0);
        return Math.max(
                quantiles,
                Math.max(statistics.low().resolution(), statistics.high().resolution()));
    }

    private static void put(Map<String, Double> errors, String name, Estimate estimate) {
        if (!Double.isNaN(estimate.standardError())) {
            errors.put(name, estimate.standardError());
        }
    }

    private static Map<String, Double> quantiles(Statistics statistics) {
        return statistics.quantiles().stream()
                .collect(Collectors.toMap(
                        FindingWriter::name, quantile -> quantile.estimate().value(), (a, b) -> a, LinkedHashMap::new));
    }

    private static String name(Quantile quantile) {
        return String.valueOf(quantile.probability());
    }

    private static Finding.Histogram histogram(Statistics statistics) {
        List<Double> edges = statistics.histogram().edges();
        return new Finding.Histogram(
                edges.get(0),
                edges.get(edges.size() - 1),
                statistics.histogram().counts());
    }

    private static List<Finding.Share> shares(List<Share> shares, List<Integer> lines) {
        List<Finding.Share> found = new ArrayList<>();
        for (int i = 0; i < lines.size(); i++) {
            found.add(new Finding.Share(
                    lines.get(i), shares.get(i).share(), shares.get(i).lowerBound()));
        }
        return found;
    }
}
