package sill.study;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/** Carries out a {@link StudyPlan}. */
public final class Study {
    private final StudyPlan plan;
    private final Box box;
    private final Crew crew;
    private final Progress progress;
    private final long total;
    private long done;

    private Study(StudyPlan plan, Crew crew, Progress progress) {
        this.plan = plan;
        this.box = new Box(plan.inputs());
        this.crew = crew;
        this.progress = progress;
        this.total = expected(plan, box.free().length);
    }

    private static long expected(StudyPlan plan, int free) {
        long search =
                plan.worstCase() ? WorstCaseSearch.expected(free, plan.outputs().size()) : 0;
        return search + plan.sampling().map(Sampling::samples).orElse(0L);
    }

    /**
     * Finds out what the plan asks for.
     *
     * <p>When the calling thread is interrupted, the study's threads end at their next look, at most 256 evaluations later.
     *
     * @param models gives each thread its model
     * @param progress hears how far the study is
     * @return findings in the order of the plan's outputs
     * @throws InterruptedException when the calling thread was interrupted, or a model threw that
     * @throws IllegalArgumentException when the model throws at the nominal point, or gives a result there that is not finite
     */
    public static List<Findings> run(StudyPlan plan, ModelSource models, Progress progress)
            throws InterruptedException {
        List<Probe> probes = new ArrayList<>();
        for (int i = 0; i < plan.cores(); i++) {
            probes.add(new Probe(
                    models.newModel(), plan.inputs().size(), plan.outputs().size()));
        }
        return new Study(plan, new Crew(probes), progress).run();
    }

    private List<Findings> run() throws InterruptedException {
        int outputs = plan.outputs().size();
        Tally tally = new Tally(box.size(), outputs);
        double[] nominal = nominal(tally);
        double[][] slopes = new SlopeFinder(box, crew.probe(), tally, nominal).find();
        Curvature curvature = new Curvature(plan.inputs(), nominal, slopes);
        if (plan.rss() || plan.worstCase()) {
            curvature.look(crew.probe(), tally);
        }
        List<MonteCarlo> sampled = List.of();
        if (plan.sampling().isPresent()) {
            SamplingRun run = new SamplingRun(plan, plan.sampling().get(), crew, this::advance);
            sampled = run.run();
            if (plan.worstCase()) {
                run.lookAtExtremes(box, tally);
            }
        }
        WorstCaseSearch search = new WorstCaseSearch(plan.inputs(), outputs, crew, tally, this::advance);
        if (plan.worstCase()) {
            search.run(curvature);
        } else if (plan.rss()) {
            cornersOfSlopes(curvature, tally);
        }
        progress.at(total, total);
        List<Findings> findings = new ArrayList<>();
        for (int k = 0; k < outputs; k++) {
            findings.add(new Findings(
                    plan.outputs().get(k).name(),
                    nominal[k],
                    plan.worstCase() ? Optional.of(search.found(k)) : Optional.empty(),
                    plan.rss()
                            ? Optional.of(curvature.picture(k).rootSumSquare(curvature.doubts(k, tally)))
                            : Optional.empty(),
                    sampled.isEmpty() ? Optional.empty() : Optional.of(sampled.get(k)),
                    curvature.picture(k).sensitivities()));
        }
        return findings;
    }

    private double[] nominal(Tally tally) throws InterruptedException {
        tally.look(crew.probe(), box.nominal());
        double[] nominal = crew.probe().outputs().clone();
        for (int k = 0; k < nominal.length; k++) {
            if (!Double.isFinite(nominal[k])) {
                Failures failures = tally.failures(k);
                String found = failures.message().map(what -> "threw " + what).orElse("gave " + nominal[k]);
                throw new IllegalArgumentException(
                        "the model must give a finite \""
                                + plan.outputs().get(k).name() + "\" at the nominal point, but it " + found,
                        failures.first().orElse(null));
            }
        }
        return nominal;
    }

    /** Where the extremes are not looked for, straight lines are compared at the corners that slopes choose. */
    private void cornersOfSlopes(Curvature curvature, Tally tally) throws InterruptedException {
        for (int k = 0; k < plan.outputs().size(); k++) {
            tally.look(crew.probe(), curvature.picture(k).corner(false));
            tally.look(crew.probe(), curvature.picture(k).corner(true));
        }
    }

    private void advance(long evaluations) {
        done = Math.min(total, done + evaluations);
        progress.at(done, total);
    }
}
