package sill.values;

import java.util.List;

/**
 * How one cell of Java fared.
 *
 * @param number the cell's number
 * @param state how it ended
 * @param reason why it did not end, in words; empty when it did
 * @param waitsOn names it waits on, when it was not run
 * @param output what it printed, cut at the engine's limit
 */
public record CellRun(int number, CellState state, String reason, List<String> waitsOn, String output) {
    public CellRun {
        waitsOn = List.copyOf(waitsOn);
    }
}
