package sill.worker;

import java.time.Duration;

/**
 * What a run may take.
 *
 * @param cellTime for one cell
 * @param memoryMegabytes heap of the worker
 */
public record Limits(Duration cellTime, int memoryMegabytes) {
    private static final Duration LEAST_TRANSLATION_TIME = Duration.ofSeconds(30);

    /** For starting the worker and compiling the sheet; a short limit meant for cells does not shorten it below half a minute. */
    Duration translationTime() {
        return cellTime.compareTo(LEAST_TRANSLATION_TIME) > 0 ? cellTime : LEAST_TRANSLATION_TIME;
    }

    /** One minute a cell, 512 MiB. */
    public static final Limits DEFAULT = new Limits(Duration.ofSeconds(60), 512);
}
