package sill.inference;

import java.util.List;
import java.util.Map;
import sill.units.Dimension;

/**
 * What the inference found. A value that is missing here is unknown; a pure number's dimension is {@link Dimension#NONE}.
 *
 * @param fields dimensions by field, of a number or of each number in a container
 * @param components dimensions by component, by field, for fields that hold a record
 * @param checks dimensions of the checks' expressions, by the check's method
 * @param slips in the order of the text
 */
public record Inferred(
        Map<String, Dimension> fields,
        Map<String, Map<String, Dimension>> components,
        Map<String, Dimension> checks,
        List<Slip> slips) {}
