package sill.study;

/** Hears how far a study is. Calls come from the study's threads, but never two at once, and {@code done} never shrinks. */
@FunctionalInterface
public interface Progress {
    /** Hears nothing. */
    Progress NONE = (done, total) -> {};

    /**
     * Says how far the study is.
     *
     * @param done evaluations done
     * @param total evaluations that the study is expected to take; the search inside the limits is estimated, not counted
     */
    void at(long done, long total);
}
