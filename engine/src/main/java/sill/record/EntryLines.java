package sill.record;

import com.fasterxml.jackson.core.JsonGenerator;
import com.fasterxml.jackson.core.PrettyPrinter;
import java.io.IOException;

/**
 * Lays JSON out for version control: each field of the record and each entry of its lists stands on a line of its own, and
 * what is inside an entry stays on that line, so a changed value is one changed line in a comparison.
 */
final class EntryLines implements PrettyPrinter {
    private static final int DEPTH_ON_LINES = 2;

    private int depth;

    @Override
    public void writeRootValueSeparator(JsonGenerator json) {}

    @Override
    public void writeStartObject(JsonGenerator json) throws IOException {
        json.writeRaw('{');
        depth++;
    }

    @Override
    public void beforeObjectEntries(JsonGenerator json) throws IOException {
        startEntry(json);
    }

    @Override
    public void writeObjectFieldValueSeparator(JsonGenerator json) throws IOException {
        json.writeRaw(": ");
    }

    @Override
    public void writeObjectEntrySeparator(JsonGenerator json) throws IOException {
        nextEntry(json);
    }

    @Override
    public void writeEndObject(JsonGenerator json, int entries) throws IOException {
        end(json, entries, '}');
    }

    @Override
    public void writeStartArray(JsonGenerator json) throws IOException {
        json.writeRaw('[');
        depth++;
    }

    @Override
    public void beforeArrayValues(JsonGenerator json) throws IOException {
        startEntry(json);
    }

    @Override
    public void writeArrayValueSeparator(JsonGenerator json) throws IOException {
        nextEntry(json);
    }

    @Override
    public void writeEndArray(JsonGenerator json, int values) throws IOException {
        end(json, values, ']');
    }

    private void startEntry(JsonGenerator json) throws IOException {
        if (depth <= DEPTH_ON_LINES) {
            newLine(json);
        }
    }

    private void nextEntry(JsonGenerator json) throws IOException {
        json.writeRaw(',');
        if (depth <= DEPTH_ON_LINES) {
            newLine(json);
        } else {
            json.writeRaw(' ');
        }
    }

    private void end(JsonGenerator json, int entries, char bracket) throws IOException {
        depth--;
        if (entries > 0 && depth < DEPTH_ON_LINES) {
            newLine(json);
        }
        json.writeRaw(bracket);
    }

    private void newLine(JsonGenerator json) throws IOException {
        json.writeRaw('\n');
        json.writeRaw("  ".repeat(depth));
    }
}
