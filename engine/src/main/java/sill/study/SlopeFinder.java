package sill.study;

/**
 * Derivatives at the nominal point, by differences that stay within the limits and are extrapolated to a distance of 0
 * (Ridders 1982; the tableau is Neville's). Where the nominal value lies at or close to a limit, the differences are taken
 * to the other side alone.
 *
 * <p>The differences start at the distance of the nearer limit and shrink by a fixed ratio; of all extrapolated values the
 * one with the smallest estimate of its error is taken, so that neither rounding nor curvature decides.
 */
final class SlopeFinder {
    private static final int STEPS = 10;
    private static final double CENTRAL_RATIO = 1.4;
    private static final double SIDED_RATIO = 2;

    /** A nearer limit closer than this fraction of the farther one's distance leaves too little room. */
    private static final double ROOM = 1e-3;

    private final Box box;
    private final Probe probe;
    private final Tally tally;
    private final double[] atNominal;

    /**
     * For one probe.
     *
     * @param atNominal what the model gives at the nominal point
     */
    SlopeFinder(Box box, Probe probe, Tally tally, double[] atNominal) {
        this.box = box;
        this.probe = probe;
        this.tally = tally;
        this.atNominal = atNominal.clone();
    }

    /** Slopes by output, then by input; 0 for one that is held, not a number where no difference was finite. */
    double[][] find() throws InterruptedException {
        double[][] slopes = new double[atNominal.length][box.size()];
        for (int input : box.free()) {
            double[] found = of(input);
            for (int k = 0; k < found.length; k++) {
                slopes[k][input] = found[k];
            }
        }
        return slopes;
    }

    private double[] of(int input) throws InterruptedException {
        double[] point = box.nominal();
        double x = point[input];
        double above = box.high(input) - x;
        double below = x - box.low(input);
        boolean central = Math.min(above, below) > ROOM * Math.max(above, below);
        double ratio = central ? CENTRAL_RATIO : SIDED_RATIO;
        double distance = central ? Math.min(above, below) : above >= below ? above : -below;
        double[][] quotients = new double[STEPS][];
        for (int step = 0; step < STEPS; step++, distance /= ratio) {
            point[input] = inside(input, x + distance);
            double up = point[input];
            tally.look(probe, point);
            double[] here = probe.outputs().clone();
            double[] there = atNominal;
            double down = x;
            if (central) {
                point[input] = inside(input, x - distance);
                down = point[input];
                tally.look(probe, point);
                there = probe.outputs();
            }
            quotients[step] = new double[here.length];
            for (int k = 0; k < here.length; k++) {
                quotients[step][k] = (here[k] - there[k]) / (up - down);
            }
        }
        double[] slopes = new double[atNominal.length];
        for (int k = 0; k < slopes.length; k++) {
            double[] column = new double[STEPS];
            for (int step = 0; step < STEPS; step++) {
                column[step] = quotients[step][k];
            }
            slopes[k] = extrapolated(column, central ? ratio * ratio : ratio);
        }
        return slopes;
    }

    private double inside(int input, double value) {
        return Math.min(box.high(input), Math.max(box.low(input), value));
    }

    /**
     * Extrapolates difference quotients whose steps shrink by a ratio.
     *
     * @param shrink by how much each further term of the error shrinks from one step to the next
     */
    static double extrapolated(double[] quotients, double shrink) {
        double best = Double.NaN;
        double smallest = Double.POSITIVE_INFINITY;
        double[] row = new double[0];
        for (double quotient : quotients) {
            if (!Double.isFinite(quotient)) {
                row = new double[0];
                continue;
            }
            double[] next = new double[row.length + 1];
            next[0] = quotient;
            double factor = shrink;
            for (int order = 1; order < next.length; order++) {
                next[order] = (next[order - 1] * factor - row[order - 1]) / (factor - 1);
                factor *= shrink;
                double error =
                        Math.max(Math.abs(next[order] - next[order - 1]), Math.abs(next[order] - row[order - 1]));
                if (error < smallest) {
                    smallest = error;
                    best = next[order];
                }
            }
            if (Double.isNaN(best)) {
                best = quotient;
            }
            row = next;
        }
        return best;
    }
}
