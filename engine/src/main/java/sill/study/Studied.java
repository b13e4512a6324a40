package sill.study;

import java.util.List;
import java.util.Objects;

/**
 * An output that is studied.
 *
 * @param name what the findings call it
 * @param windows the limits for which samples are counted; may be empty
 */
public record Studied(String name, List<Window> windows) {
    public Studied {
        Objects.requireNonNull(name, "name");
        windows = List.copyOf(windows);
    }

    /** An output for which no sample is counted. */
    public static Studied of(String name) {
        return new Studied(name, List.of());
    }
}
