package sill.study;

/** Lines through points, each along one input from limit to limit: they show which way the results go. */
final class Lines {
    /** Points on a line, limits included. */
    private static final int POINTS = 9;

    private final Box box;
    private final int outputs;

    Lines(Box box, int outputs) {
        this.box = box;
        this.outputs = outputs;
    }

    /** Adds what the lines through a point show. */
    Tally through(double[] base, Probe probe) throws InterruptedException {
        Tally tally = new Tally(box.size(), outputs);
        double[] before = new double[outputs];
        for (int input : box.free()) {
            if (Thread.interrupted()) {
                throw new InterruptedException();
            }
            double[] point = base.clone();
            boolean passed = false;
            double last = Double.NaN;
            for (int i = 0; i < POINTS; i++) {
                double value = box.value(input, i / (POINTS - 1.0));
                if (!passed && value >= base[input]) {
                    passed = true;
                    if (value > base[input] && i > 0) {
                        step(probe, tally, point, input, base[input], before, last);
                        last = base[input];
                    }
                }
                step(probe, tally, point, input, value, before, last);
                last = value;
            }
        }
        return tally;
    }

    private void step(Probe probe, Tally tally, double[] point, int input, double value, double[] before, double last)
            throws InterruptedException {
        point[input] = value;
        tally.look(probe, point);
        if (!Double.isNaN(last)) {
            tally.rose(input, before, probe.outputs());
        }
        System.arraycopy(probe.outputs(), 0, before, 0, outputs);
    }
}
