package sill.worker;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import sill.study.Findings;
import sill.study.Model;
import sill.study.Progress;
import sill.study.Study;
import sill.values.Finding;

/** Goes along one given from limit to limit, and at each step looks for the extremes over all others. */
final class StudySweep {
    private static final int STEPS = 40;

    private final StudyPlans plans;
    private final SliceCode code;
    private final String given;
    private final int place;

    StudySweep(StudyPlans plans, SliceCode code, String given) {
        this.plans = plans;
        this.code = code;
        this.given = given;
        this.place = plans.varied().indexOf(given);
    }

    /** For each output; nothing when the results do not rest on the given. */
    List<Optional<Finding.Sweep>> run() throws InterruptedException {
        List<Optional<Finding.Sweep>> sweeps = new ArrayList<>();
        if (place < 0) {
            for (int i = 0; i < plans.outputs(); i++) {
                sweeps.add(Optional.empty());
            }
            return sweeps;
        }
        List<Double> at = new ArrayList<>();
        List<List<Findings>> found = new ArrayList<>();
        double low = plans.spread(given).low();
        double high = plans.spread(given).high();
        for (int step = 0; step <= STEPS; step++) {
            double value = step == STEPS ? high : low + (high - low) * step / STEPS;
            at.add(value);
            found.add(
                    plans.varied().size() > 1
                            ? Study.run(plans.extremesWithout(given), () -> with(value), Progress.NONE)
                            : alone(value));
        }
        for (int i = 0; i < plans.outputs(); i++) {
            sweeps.add(Optional.of(sweep(at, found, i)));
        }
        return sweeps;
    }

    private Finding.Sweep sweep(List<Double> at, List<List<Findings>> found, int output) {
        List<Double> nominal = new ArrayList<>();
        List<Double> low = new ArrayList<>();
        List<Double> high = new ArrayList<>();
        for (List<Findings> step : found) {
            Findings there = step.get(output);
            nominal.add(there.nominal());
            low.add(there.worstCase().map(extremes -> extremes.low().value()).orElse(there.nominal()));
            high.add(there.worstCase().map(extremes -> extremes.high().value()).orElse(there.nominal()));
        }
        return new Finding.Sweep(given, at, nominal, low, high);
    }

    /** Nothing else varies. */
    private List<Findings> alone(double value) {
        double[] outputs = new double[plans.outputs()];
        code.newInstance().accept(new double[] {value}, outputs);
        List<Findings> found = new ArrayList<>();
        for (double output : outputs) {
            found.add(new Findings(given, output, Optional.empty(), Optional.empty(), Optional.empty(), List.of()));
        }
        return found;
    }

    /** The calculation with the given at a value, and without it among the inputs. */
    private Model with(double value) {
        Model whole = code.newModel();
        double[] all = new double[plans.varied().size()];
        return (inputs, outputs) -> {
            System.arraycopy(inputs, 0, all, 0, place);
            all[place] = value;
            System.arraycopy(inputs, place, all, place + 1, all.length - place - 1);
            whole.evaluate(all, outputs);
        };
    }
}
