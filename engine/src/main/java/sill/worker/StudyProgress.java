package sill.worker;

import java.util.function.Consumer;
import sill.study.Progress;

/** Hands on how far a study is, a hundred times at most. */
final class StudyProgress implements Progress {
    private static final int STEPS = 100;

    private final Consumer<Report> reports;
    private long told = -1;

    StudyProgress(Consumer<Report> reports) {
        this.reports = reports;
    }

    @Override
    public void at(long done, long total) {
        long step = total <= 0 ? 0 : done * STEPS / total;
        if (step > told) {
            told = step;
            reports.accept(new Report.Studied(done, total));
        }
    }
}
