package sill.study;

/**
 * Limits in which a result is wanted.
 *
 * @param low lower limit, inclusive; negative infinity where there is none
 * @param high upper limit, inclusive; infinity where there is none
 */
public record Window(double low, double high) {
    public Window {
        if (!(low <= high)) {
            throw new IllegalArgumentException("low must be at most high, got " + low + " .. " + high);
        }
    }
}
