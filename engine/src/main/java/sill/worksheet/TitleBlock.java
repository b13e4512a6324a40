package sill.worksheet;

import java.util.Collections;
import java.util.LinkedHashMap;
import java.util.Map;

/**
 * The title block's fields (ISO 7200) as the worksheet gives them, in its order.
 *
 * @param fields key to text; keys are those of {@link #KEYS}
 */
public record TitleBlock(Map<String, String> fields) {
    /** The known keys, in the order a record shows them. */
    public static final java.util.List<String> KEYS = java.util.List.of(
            "title", "number", "revision", "date", "owner", "creator", "approver", "type", "language");

    public TitleBlock {
        fields = Collections.unmodifiableMap(new LinkedHashMap<>(fields));
    }

    /** The document's title; empty when the worksheet lacks it. */
    public String title() {
        return fields.getOrDefault("title", "");
    }
}
