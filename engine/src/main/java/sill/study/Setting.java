package sill.study;

/**
 * An input's value at a point.
 *
 * @param given the input
 * @param value its value, in coherent SI
 * @param place where that lies
 */
public record Setting(String given, double value, Place place) {
    /** Where a value lies. */
    public enum Place {
        /** At the lower limit. */
        LOW,
        /** At the upper limit. */
        HIGH,
        /** Between the limits. */
        BETWEEN,
        /** The limits are equal. */
        HELD
    }
}
