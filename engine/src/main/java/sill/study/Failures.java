package sill.study;

import java.util.Optional;

/**
 * Evaluations that gave no finite result.
 *
 * @param notFinite how many gave infinity or not a number without throwing
 * @param thrown how many threw
 * @param first what the first of them threw, in the order of the study's numbering
 */
public record Failures(long notFinite, long thrown, Optional<Throwable> first) {
    /** How many in all. */
    public long count() {
        return notFinite + thrown;
    }

    /** What the first threw, as text; empty where none threw. */
    public Optional<String> message() {
        return first.map(Throwable::toString);
    }
}
