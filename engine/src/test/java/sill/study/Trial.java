package sill.study;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/** A study put together for a test: one output "y" unless said otherwise. */
final class Trial {
    private final List<Varied> inputs = new ArrayList<>();
    private List<Studied> outputs = List.of(Studied.of("y"));
    private boolean worstCase;
    private boolean rss;
    private Optional<Sampling> sampling = Optional.empty();
    private int cores = 2;

    Trial uniform(String name, double nominal, double low, double high) {
        inputs.add(new Varied(name, nominal, low, high, new Spread.Uniform()));
        return this;
    }

    Trial normal(String name, double mean, double sd) {
        inputs.add(new Varied(name, mean, mean - 3 * sd, mean + 3 * sd, new Spread.Normal(3)));
        return this;
    }

    Trial triangular(String name, double mode, double low, double high) {
        inputs.add(new Varied(name, mode, low, high, new Spread.Triangular()));
        return this;
    }

    Trial windows(Window... windows) {
        outputs = List.of(new Studied("y", List.of(windows)));
        return this;
    }

    Trial outputs(String... names) {
        outputs = java.util.Arrays.stream(names).map(Studied::of).toList();
        return this;
    }

    Trial worstCase() {
        worstCase = true;
        return this;
    }

    Trial rss() {
        rss = true;
        return this;
    }

    Trial samples(long samples, long seed) {
        sampling = Optional.of(new Sampling(samples, seed));
        return this;
    }

    Trial cores(int number) {
        cores = number;
        return this;
    }

    StudyPlan plan() {
        return new StudyPlan(inputs, outputs, worstCase, rss, sampling, cores);
    }

    List<Findings> all(ModelSource models) {
        try {
            return Study.run(plan(), models, Progress.NONE);
        } catch (InterruptedException e) {
            throw new AssertionError(e);
        }
    }

    List<Findings> all(Model model) {
        return all(() -> model);
    }

    Findings of(Model model) {
        return all(model).get(0);
    }

    Statistics statistics(Model model) {
        return of(model).monteCarlo().orElseThrow().statistics().orElseThrow();
    }
}
