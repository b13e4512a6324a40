package sill.record;

import com.fasterxml.jackson.core.JsonGenerator;
import java.io.IOException;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import sill.values.Datum;

/** Worksheet values as JSON values: numbers are numbers, arrays arrays, a record an object of its components. */
final class DatumJson {
    /** Whole numbers beyond 2⁵³ are written as texts, since a reader with IEEE doubles would change them. */
    private static final int SAFE_DIGITS = 15;

    private DatumJson() {}

    static void write(JsonGenerator json, Datum value) throws IOException {
        if (value instanceof Datum.Real real) {
            json.writeNumber(real.value());
        } else if (value instanceof Datum.Whole whole) {
            writeWhole(json, whole.digits());
        } else if (value instanceof Datum.Truth truth) {
            json.writeBoolean(truth.value());
        } else if (value instanceof Datum.Text text) {
            json.writeString(RecordJson.encodable(text.value()));
        } else if (value instanceof Datum.Opaque opaque) {
            json.writeString(RecordJson.encodable(opaque.text()));
        } else if (value instanceof Datum.Items items) {
            json.writeStartArray();
            for (Datum item : items.items()) {
                write(json, item);
            }
            json.writeEndArray();
        } else if (value instanceof Datum.Fields fields) {
            json.writeStartObject();
            for (Map.Entry<String, Datum> field : fields.fields().entrySet()) {
                json.writeFieldName(RecordJson.encodable(field.getKey()));
                write(json, field.getValue());
            }
            json.writeEndObject();
        } else {
            json.writeNull();
        }
    }

    private static void writeWhole(JsonGenerator json, String digits) throws IOException {
        if (digits.length() <= SAFE_DIGITS) {
            json.writeNumber(digits);
        } else {
            json.writeString(digits);
        }
    }

    /** The lists of which the value holds only the first items: where they stand, and how many there are in all. */
    static Map<String, Integer> shortened(Datum value) {
        Map<String, Integer> sizes = new LinkedHashMap<>();
        collectShortened("value", value, sizes);
        return sizes;
    }

    private static void collectShortened(String place, Datum value, Map<String, Integer> sizes) {
        if (value instanceof Datum.Items items) {
            List<Datum> kept = items.items();
            if (items.size() > kept.size()) {
                sizes.put(place, items.size());
            }
            for (int i = 0; i < kept.size(); i++) {
                collectShortened(place + "[" + i + "]", kept.get(i), sizes);
            }
        } else if (value instanceof Datum.Fields fields) {
            fields.fields().forEach((name, field) -> collectShortened(place + "." + name, field, sizes));
        }
    }
}
