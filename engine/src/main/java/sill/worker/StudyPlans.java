package sill.worker;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import sill.study.Sampling;
import sill.study.Spread;
import sill.study.Studied;
import sill.study.StudyPlan;
import sill.study.Varied;
import sill.study.Window;
import sill.worksheet.Given.Distribution;
import sill.worksheet.ToleranceStudy.Method;

/** What a tolerance cell asks for, as plans of studies. */
final class StudyPlans {
    private final Job.StudyOrder order;
    private final List<StudyTarget> targets;
    private final List<String> varied;
    private final Map<String, Object> values;
    private final Map<String, Job.Spread> spreads;

    /**
     * @param varied the givens that vary, in order
     * @param values values of all givens
     * @param spreads of the givens with limits
     */
    StudyPlans(
            Job.StudyOrder order,
            List<StudyTarget> targets,
            List<String> varied,
            Map<String, Object> values,
            Map<String, Job.Spread> spreads) {
        this.order = order;
        this.targets = targets;
        this.varied = varied;
        this.values = values;
        this.spreads = spreads;
    }

    List<String> varied() {
        return varied;
    }

    int outputs() {
        return targets.size();
    }

    /** What the cells gave. */
    double[] nominal() {
        return targets.stream().mapToDouble(StudyTarget::nominal).toArray();
    }

    /** All that is asked for, on all cores. */
    StudyPlan whole() {
        boolean worstCase = false;
        boolean rss = false;
        Optional<Sampling> sampling = Optional.empty();
        for (Method method : order.methods()) {
            worstCase |= method instanceof Method.WorstCase;
            rss |= method instanceof Method.RootSumSquare;
            if (method instanceof Method.MonteCarlo samples) {
                sampling = Optional.of(new Sampling(samples.samples(), samples.seed()));
            }
        }
        return new StudyPlan(inputs(""), studied(true), worstCase, rss, sampling, cores());
    }

    /** The extremes alone, with one given held. */
    StudyPlan extremesWithout(String given) {
        return new StudyPlan(inputs(given), studied(false), true, false, Optional.empty(), cores());
    }

    private static int cores() {
        return Runtime.getRuntime().availableProcessors();
    }

    private List<Varied> inputs(String without) {
        List<Varied> inputs = new ArrayList<>();
        for (String name : varied) {
            if (!name.equals(without)) {
                Job.Spread spread = spreads.get(name);
                inputs.add(new Varied(
                        name, (Double) values.get(name), spread.low(), spread.high(), spread(spread.distribution())));
            }
        }
        return inputs;
    }

    private static Spread spread(Distribution distribution) {
        if (distribution instanceof Distribution.Normal normal) {
            return new Spread.Normal(normal.k());
        }
        return distribution instanceof Distribution.Triangular ? new Spread.Triangular() : new Spread.Uniform();
    }

    private List<Studied> studied(boolean withWindows) {
        List<Studied> studied = new ArrayList<>();
        for (StudyTarget target : targets) {
            List<Window> windows = new ArrayList<>();
            if (withWindows) {
                shares(target).forEach(share -> windows.add(new Window(share.low(), share.high())));
            }
            studied.add(new Studied(target.name(), windows));
        }
        return studied;
    }

    /** Lines of the checks that want the share of a target's samples. */
    List<Integer> shareLines(StudyTarget target) {
        return shares(target).stream().map(Job.ShareWanted::line).toList();
    }

    private List<Job.ShareWanted> shares(StudyTarget target) {
        // A check's expression is a number, which the components of a record are not.
        return order.shares().stream()
                .filter(share -> target.component().isEmpty() && share.target() == target.index() - 1)
                .toList();
    }

    /** A given's limits. */
    Job.Spread spread(String given) {
        return spreads.get(given);
    }

    double value(String given) {
        return (Double) values.get(given);
    }
}
