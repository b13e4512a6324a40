package sill.study;

import java.util.ArrayList;
import java.util.List;
import java.util.function.LongConsumer;

/**
 * Looks for the extremes within the limits.
 *
 * <ol>
 *   <li>All corners, for up to {@value #ALL_CORNERS} inputs; with more, the other inputs stand for each output and side where
 *       their slopes at the nominal point say, and the corners are those of the strongest.
 *   <li>Points that fill the box evenly, and lines along each input through the nominal point, some of those points and the
 *       extremes so far. They show whether a result goes one way with each input.
 *   <li>Where one does not, searches for peaks from the extremes so far, the nominal point and the best points inside.
 * </ol>
 */
final class WorstCaseSearch {
    static final int ALL_CORNERS = 20;
    private static final int LINE_BASES = 16;
    private static final int STARTS_INSIDE = 3;

    private final List<Varied> inputs;
    private final Box box;
    private final int outputs;
    private final Crew crew;
    private final Tally tally;
    private final LongConsumer done;

    /**
     * One search.
     *
     * @param tally what is known already, with a finite result for every output; takes what is found
     * @param done hears how many evaluations were added
     */
    WorstCaseSearch(List<Varied> inputs, int outputs, Crew crew, Tally tally, LongConsumer done) {
        this.inputs = inputs;
        this.box = new Box(inputs);
        this.outputs = outputs;
        this.crew = crew;
        this.tally = tally;
        this.done = done;
    }

    /** How many evaluations to expect. */
    static long expected(int free, int outputs) {
        long corners = free <= ALL_CORNERS ? 1L << free : 2L * outputs << ALL_CORNERS;
        return corners + 2000L * Math.max(1, free);
    }

    void run(Curvature curvature) throws InterruptedException {
        if (box.free().length == 0) {
            return;
        }
        corners(curvature);
        QuasiRandom spread = new QuasiRandom(box, outputs);
        spread.look(crew, tally);
        List<double[]> bases = new ArrayList<>();
        bases.add(box.nominal());
        for (int i = 1; i <= LINE_BASES; i++) {
            bases.add(spread.point(i));
        }
        addExtremes(bases);
        lines(bases);
        List<Integer> bent = bent();
        if (!bent.isEmpty()) {
            climb(bent, spread);
            bases.clear();
            addExtremes(bases);
            lines(bases);
        }
    }

    private void corners(Curvature curvature) throws InterruptedException {
        int[] free = box.free();
        if (free.length <= ALL_CORNERS) {
            new CornerSweep(box, box.nominal(), free, outputs).run(crew, tally, done);
            return;
        }
        for (int k = 0; k < outputs; k++) {
            LinearPicture picture = curvature.picture(k);
            int[] strongest = picture.strongest(ALL_CORNERS);
            new CornerSweep(box, picture.corner(false), strongest, outputs).run(crew, tally, done);
            new CornerSweep(box, picture.corner(true), strongest, outputs).run(crew, tally, done);
        }
    }

    private void addExtremes(List<double[]> bases) {
        for (int k = 0; k < outputs; k++) {
            bases.add(tally.lowPoint(k));
            bases.add(tally.highPoint(k));
        }
    }

    private void lines(List<double[]> bases) throws InterruptedException {
        Lines lines = new Lines(box, outputs);
        crew.run(bases.size(), (number, probe) -> lines.through(bases.get((int) number), probe), this::add);
    }

    private void add(Tally found) {
        tally.add(found);
        done.accept(found.evaluations());
    }

    /** Outputs that don't go one way with every input. */
    private List<Integer> bent() {
        List<Integer> bent = new ArrayList<>();
        for (int k = 0; k < outputs; k++) {
            boolean any = false;
            for (int input : box.free()) {
                any |= tally.direction(input, k) == Direction.NEITHER;
            }
            if (any) {
                bent.add(k);
            }
        }
        return bent;
    }

    private record Start(int output, boolean highest, double substitute, double[] point) {}

    private void climb(List<Integer> bent, QuasiRandom spread) throws InterruptedException {
        List<Start> starts = new ArrayList<>();
        for (int k : bent) {
            for (boolean highest : new boolean[] {false, true}) {
                double substitute = highest ? tally.lowest(k) : tally.highest(k);
                List<double[]> points = spread.best(k, highest, STARTS_INSIDE);
                points.add(highest ? tally.highPoint(k) : tally.lowPoint(k));
                points.add(box.nominal());
                for (double[] point : points) {
                    starts.add(new Start(k, highest, substitute, point));
                }
            }
        }
        climb(starts);
        List<Start> ends = new ArrayList<>();
        for (int k : bent) {
            ends.add(new Start(k, false, tally.highest(k), tally.lowPoint(k)));
            ends.add(new Start(k, true, tally.lowest(k), tally.highPoint(k)));
        }
        climb(ends);
    }

    private void climb(List<Start> starts) throws InterruptedException {
        crew.run(
                starts.size(),
                (number, probe) -> {
                    Start start = starts.get((int) number);
                    return new Climb(box, outputs, start.output(), start.highest(), probe, start.substitute())
                            .from(start.point());
                },
                this::add);
    }

    /** The findings of one output. */
    WorstCase found(int output) {
        List<Direction> directions = new ArrayList<>();
        for (int i = 0; i < inputs.size(); i++) {
            directions.add(tally.direction(i, output));
        }
        return new WorstCase(
                extreme(tally.lowest(output), tally.lowPoint(output), directions),
                extreme(tally.highest(output), tally.highPoint(output), directions),
                directions,
                tally.evaluations(),
                tally.failures(output));
    }

    private Extreme extreme(double value, double[] point, List<Direction> directions) {
        List<Setting> at = new ArrayList<>();
        boolean inside = false;
        for (int i = 0; i < point.length; i++) {
            Setting.Place place = place(inputs.get(i), point[i]);
            at.add(new Setting(inputs.get(i).name(), point[i], place));
            inside |= place == Setting.Place.BETWEEN && directions.get(i) != Direction.NONE;
        }
        return new Extreme(value, at, inside);
    }

    private static Setting.Place place(Varied input, double value) {
        if (!input.free()) {
            return Setting.Place.HELD;
        } else if (value == input.low()) {
            return Setting.Place.LOW;
        }
        return value == input.high() ? Setting.Place.HIGH : Setting.Place.BETWEEN;
    }
}
