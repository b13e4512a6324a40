package sill.study;

import java.util.ArrayList;
import java.util.IdentityHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.function.LongConsumer;

/**
 * Monte Carlo. The first {@value #KEPT} samples are kept and sorted; when there are more, they lay out a {@link Grid} in
 * which all samples are counted, so that memory does not grow.
 */
final class SamplingRun {
    private static final int KEPT_BLOCKS = 256;

    /** Samples of each output that are kept. */
    static final int KEPT = KEPT_BLOCKS * Draws.BLOCK;

    private final StudyPlan plan;
    private final Sampling sampling;
    private final Crew crew;
    private final LongConsumer done;
    private final long blocks;
    private final BlockTally tally;
    private final double[][] kept;
    private final long[] lowBlock;
    private final long[] highBlock;
    private long added;

    SamplingRun(StudyPlan plan, Sampling sampling, Crew crew, LongConsumer done) {
        this.plan = plan;
        this.sampling = sampling;
        this.crew = crew;
        this.done = done;
        int outputs = plan.outputs().size();
        blocks = (sampling.samples() + Draws.BLOCK - 1) / Draws.BLOCK;
        tally = new BlockTally(plan.outputs());
        kept = new double[outputs][(int) Math.min(KEPT, sampling.samples())];
        lowBlock = new long[outputs];
        highBlock = new long[outputs];
    }

    private int count(long block) {
        return (int) Math.min(Draws.BLOCK, sampling.samples() - block * Draws.BLOCK);
    }

    /** Samples, and gives what was found for each output. */
    List<MonteCarlo> run() throws InterruptedException {
        long first = Math.min(blocks, KEPT_BLOCKS);
        Map<Probe, BlockRun> runs = new IdentityHashMap<>();
        for (Probe probe : crew.probes()) {
            runs.put(probe, new BlockRun(plan, sampling.seed()));
        }
        crew.run(
                first,
                (block, probe) -> {
                    int from = (int) block * Draws.BLOCK;
                    return runs.get(probe)
                            .run(
                                    block,
                                    count(block),
                                    probe,
                                    (output, all, count, finite, finiteCount) ->
                                            System.arraycopy(all, 0, kept[output], from, count));
                },
                this::add);
        List<double[]> errors = errors();
        List<Ordered> ordered = new ArrayList<>();
        crew.run(kept.length, (output, probe) -> sorted(kept[(int) output]), ordered::add);
        if (blocks > first) {
            count(first, runs, ordered);
        }
        return found(ordered, errors);
    }

    /** Sorts slices of the kept samples on the way. */
    private List<double[]> errors() throws InterruptedException {
        int slices = ShortestInterval.SLICES;
        List<Optional<ShortestInterval>> found = new ArrayList<>();
        crew.run(
                (long) slices * kept.length,
                (number, probe) -> ShortestInterval.ofSlice(kept[(int) number / slices], (int) number % slices),
                found::add);
        double times = sampling.samples() / (double) (kept[0].length / slices);
        List<double[]> errors = new ArrayList<>();
        for (int k = 0; k < kept.length; k++) {
            errors.add(ShortestInterval.errors(found.subList(k * slices, (k + 1) * slices), times));
        }
        return errors;
    }

    /** The slices are sorted already, so that buckets are filled from one end to the other, a slice at a time. */
    private static Ordered sorted(double[] values) {
        BucketSort.sort(values);
        return new Sorted(values, ShortestInterval.finite(values));
    }

    private void add(BlockTally block) {
        for (int k = 0; k < kept.length; k++) {
            double low = tally.moments(k).min();
            double high = tally.moments(k).max();
            lowBlock[k] = block.moments(k).min() < low ? added : lowBlock[k];
            highBlock[k] = block.moments(k).max() > high ? added : highBlock[k];
        }
        tally.add(block);
        done.accept(count(added));
        added++;
    }

    /** Samples the blocks from {@code first} on into grids, which take the place of the kept samples. */
    private void count(long first, Map<Probe, BlockRun> runs, List<Ordered> ordered) throws InterruptedException {
        Grid[] all = new Grid[kept.length];
        for (int k = 0; k < kept.length; k++) {
            if (ordered.get(k).count() > 1) {
                all[k] = Grid.like(ordered.get(k));
                all[k].add(kept[k], (int) ordered.get(k).count());
            }
        }
        Map<Probe, Grid[]> grids = new IdentityHashMap<>();
        for (Probe probe : crew.probes()) {
            Grid[] own = new Grid[kept.length];
            for (int k = 0; k < own.length; k++) {
                own[k] = all[k] == null ? null : all[k].empty();
            }
            grids.put(probe, own);
        }
        crew.run(
                blocks - first,
                (number, probe) -> {
                    Grid[] own = grids.get(probe);
                    long block = first + number;
                    return runs.get(probe)
                            .run(block, count(block), probe, (output, values, count, finite, finiteCount) -> {
                                if (own[output] != null) {
                                    own[output].add(finite, finiteCount);
                                }
                            });
                },
                this::add);
        for (int k = 0; k < kept.length; k++) {
            if (all[k] != null) {
                for (Probe probe : crew.probes()) {
                    all[k].add(grids.get(probe)[k]);
                }
                all[k].close(tally.moments(k).min(), tally.moments(k).max());
                ordered.set(k, all[k]);
            }
        }
    }

    private List<MonteCarlo> found(List<Ordered> ordered, List<double[]> errors) throws InterruptedException {
        List<MonteCarlo> found = new ArrayList<>();
        crew.run(kept.length, (output, probe) -> found((int) output, ordered, errors), found::add);
        return found;
    }

    private MonteCarlo found(int output, List<Ordered> ordered, List<double[]> errors) {
        Optional<Statistics> statistics = ordered.get(output).count() < 2
                ? Optional.empty()
                : Optional.of(new Summary(tally.moments(output), ordered.get(output)).statistics(errors.get(output)));
        return new MonteCarlo(
                sampling.samples(),
                sampling.seed(),
                tally.failures(output),
                statistics,
                tally.shares(output, sampling.samples()));
    }

    /** Looks again at the samples with the lowest and highest results, where they lie within the limits. */
    void lookAtExtremes(Box box, Tally into) throws InterruptedException {
        BlockRun again = new BlockRun(plan, sampling.seed());
        for (int k = 0; k < kept.length; k++) {
            if (tally.moments(k).count() > 0) {
                look(
                        box,
                        into,
                        again.inputsOf(
                                lowBlock[k],
                                count(lowBlock[k]),
                                k,
                                tally.moments(k).min(),
                                crew.probe()));
                look(
                        box,
                        into,
                        again.inputsOf(
                                highBlock[k],
                                count(highBlock[k]),
                                k,
                                tally.moments(k).max(),
                                crew.probe()));
            }
        }
    }

    private void look(Box box, Tally into, double[] point) throws InterruptedException {
        if (box.contains(point)) {
            into.look(crew.probe(), point);
        }
    }
}
