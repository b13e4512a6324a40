package sill.worker;

/** Is told what a run is at. */
@FunctionalInterface
public interface Progress {
    /** Tells nobody. */
    Progress SILENT = cell -> {};

    /**
     * A step begins.
     *
     * @param cell number of the cell that runs; 0 while the sheet is compiled
     */
    void begins(int cell);

    /** The tolerance cell that runs has come so far: of {@code total} repetitions {@code done} are done. */
    default void studied(long done, long total) {}
}
