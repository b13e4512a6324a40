package sill.inference;

import java.util.Set;
import javax.lang.model.element.Element;
import javax.lang.model.element.TypeElement;

/** The constants of Java's library that a worksheet meets. */
final class LibraryConstants {
    private static final Set<String> NUMBERS = Set.of("PI", "E", "TAU");
    private static final Set<String> BOUNDS =
            Set.of("NaN", "POSITIVE_INFINITY", "NEGATIVE_INFINITY", "MAX_VALUE", "MIN_VALUE", "MIN_NORMAL");

    private LibraryConstants() {}

    /** A constant's value; unknown when it is none of them. */
    static Quantity value(Element element) {
        if (!(element.getEnclosingElement() instanceof TypeElement owner)) {
            return Quantity.UNKNOWN;
        }
        String type = owner.getQualifiedName().toString();
        String name = element.getSimpleName().toString();
        if (MathRules.own(type) && NUMBERS.contains(name)) {
            return Quantity.LITERAL;
        }
        // A bound starts a search for the largest or least of anything, and NaN stands for a value that is not there.
        boolean bound = type.startsWith("java.lang.") && BOUNDS.contains(name);
        return bound ? Quantity.ANY : Quantity.UNKNOWN;
    }
}
