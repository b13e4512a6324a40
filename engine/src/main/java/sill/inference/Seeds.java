package sill.inference;

import java.util.Map;
import java.util.Optional;
import sill.units.Dimension;
import sill.units.Unit;

/**
 * What is known before the inference starts.
 *
 * @param source the compilation unit's text
 * @param slots start offsets of the statements that give fields their first values, to the fields
 * @param givens the fields that givens fill, by name
 * @param stated units that captions state, by field
 * @param limits dimensions of the limits of checks, by the check's method; without those whose limits are bare zeros
 * @param places the way back to the worksheet
 */
public record Seeds(
        String source,
        Map<Integer, String> slots,
        Map<String, GivenValue> givens,
        Map<String, Unit> stated,
        Map<String, Dimension> limits,
        Places places) {
    /** The way back to the worksheet. */
    public interface Places {
        /** The worksheet's line for an offset of the compilation unit. */
        int line(int offset);

        /** A stretch of the compilation unit as the worksheet has it. */
        String text(int start, int end);
    }

    /**
     * A given.
     *
     * @param line its line in the worksheet
     * @param dimension of its number or numbers; empty for others
     * @param columns of a table, those whose dimension is known
     */
    public record GivenValue(int line, Optional<Dimension> dimension, Map<String, Dimension> columns) {
        /** A number or a list of numbers. */
        public static GivenValue of(int line, Dimension dimension) {
            return new GivenValue(line, Optional.of(dimension), Map.of());
        }
    }
}
