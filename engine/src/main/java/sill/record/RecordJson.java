package sill.record;

import com.fasterxml.jackson.core.JsonFactory;
import com.fasterxml.jackson.core.JsonGenerator;
import com.fasterxml.jackson.core.StreamWriteFeature;
import java.io.IOException;
import java.io.StringWriter;
import java.io.UncheckedIOException;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import java.util.TreeMap;
import sill.plot.PlotDrawing;
import sill.values.Datum;
import sill.values.Finding;
import sill.worksheet.Problem;

/**
 * A record as JSON text of the format {@link DesignRecord#FORMAT}.
 *
 * <p>The same record gives the same text on every Java. Numbers have as many digits as it takes to read the same
 * {@code double} back; those that JSON cannot write are the texts {@code "NaN"}, {@code "Infinity"} and {@code "-Infinity"}.
 */
public final class RecordJson {
    // Java before 19 prints some doubles with a digit too many; the fast writer is Jackson's own and the same
    // everywhere.
    private static final JsonFactory JSON = JsonFactory.builder()
            .enable(StreamWriteFeature.USE_FAST_DOUBLE_WRITER)
            .build();

    private RecordJson() {}

    /** The record as JSON, ending in a line feed. */
    public static String write(DesignRecord record) {
        StringWriter text = new StringWriter(8192);
        try (JsonGenerator json = JSON.createGenerator(text)) {
            json.setPrettyPrinter(new EntryLines());
            writeRecord(json, record);
        } catch (IOException e) {
            throw new UncheckedIOException("a text in memory must be writable", e);
        }
        return text.append('\n').toString();
    }

    private static void writeRecord(JsonGenerator json, DesignRecord record) throws IOException {
        json.writeStartObject();
        text(json, "format", DesignRecord.FORMAT);
        text(json, "outcome", record.outcome().word());
        texts(json, "titleBlock", record.titleBlock());
        json.writeObjectFieldStart("made");
        text(json, "sill", record.made().sill());
        text(json, "java", record.made().java());
        text(json, "at", record.made().at());
        json.writeEndObject();
        texts(json, "trial", record.trial());
        json.writeObjectFieldStart("worksheet");
        text(json, "file", record.worksheet().file());
        text(json, "sha256", record.worksheet().sha256());
        text(json, "text", record.worksheet().text());
        json.writeEndObject();
        list(json, "files", record.files(), RecordJson::file);
        list(json, "cells", record.cells(), RecordJson::cell);
        list(json, "givens", record.givens(), RecordJson::given);
        list(json, "values", record.values(), RecordJson::value);
        list(json, "tolerances", record.tolerances(), FindingJson::write);
        list(json, "checks", record.checks(), RecordJson::check);
        list(json, "plots", record.plots(), RecordJson::plot);
        list(json, "problems", record.problems(), RecordJson::problem);
        json.writeEndObject();
    }

    private static void file(JsonGenerator json, DesignRecord.DataFile file) throws IOException {
        text(json, "path", file.path());
        text(json, "sha256", file.sha256());
        json.writeBinaryField("bytes", file.bytes());
    }

    private static void cell(JsonGenerator json, DesignRecord.CellEntry cell) throws IOException {
        json.writeNumberField("number", cell.number());
        text(json, "kind", cell.kind());
        text(json, "caption", cell.caption());
        json.writeNumberField("line", cell.line());
        text(json, "state", cell.state().word());
        textIfAny(json, "reason", cell.reason());
        textIfAny(json, "output", cell.output());
        text(json, "source", cell.source());
    }

    private static void given(JsonGenerator json, DesignRecord.GivenEntry given) throws IOException {
        text(json, "name", given.name());
        datum(json, "value", Optional.of(given.value()));
        text(json, "unit", given.unit());
        text(json, "shown", given.shown());
        number(json, "low", given.low());
        number(json, "high", given.high());
        textIfAny(json, "shownLimits", given.shownLimits());
        text(json, "distribution", given.distribution());
        text(json, "remark", given.remark());
        place(json, given.at(), given.line());
    }

    private static void value(JsonGenerator json, DesignRecord.ValueEntry value) throws IOException {
        text(json, "name", value.name());
        text(json, "formula", value.formula());
        text(json, "type", value.type());
        datum(json, "value", Optional.of(value.value()));
        Map<String, Integer> shortened = DatumJson.shortened(value.value());
        if (!shortened.isEmpty()) {
            json.writeObjectFieldStart("shortened");
            for (Map.Entry<String, Integer> list : shortened.entrySet()) {
                json.writeNumberField(encodable(list.getKey()), list.getValue());
            }
            json.writeEndObject();
        }
        text(json, "unit", value.unit());
        if (!value.componentUnits().isEmpty()) {
            texts(json, "componentUnits", new TreeMap<>(value.componentUnits()));
        }
        text(json, "shown", value.shown());
        text(json, "shownFull", value.shownFull());
        if (!value.shownComponents().isEmpty()) {
            texts(json, "shownComponents", value.shownComponents());
        }
        text(json, "caption", value.caption());
        place(json, value.at(), value.line());
        names(json, "uses", value.uses());
        names(json, "dependsOn", value.dependsOn());
    }

    private static void check(JsonGenerator json, DesignRecord.CheckEntry check) throws IOException {
        text(json, "text", check.text());
        text(json, "basis", check.basis());
        datum(json, "value", check.value());
        text(json, "unit", check.unit());
        number(json, "low", check.low());
        number(json, "high", check.high());
        number(json, "margin", check.margin());
        number(json, "marginShare", check.marginShare());
        if (check.overTolerance().worst().isPresent()) {
            Finding.WorstCase worst = check.overTolerance().worst().get();
            json.writeNumberField("worstLow", worst.low().value());
            json.writeNumberField("worstHigh", worst.high().value());
        }
        if (check.overTolerance().share().isPresent()) {
            Finding.Share share = check.overTolerance().share().get();
            json.writeNumberField("share", share.share());
            json.writeNumberField("shareLow", share.low());
        }
        textIfAny(json, "shownValue", check.shownValue());
        textIfAny(json, "shownLimit", check.shownLimit());
        textIfAny(json, "shownMargin", check.shownMargin());
        text(json, "verdict", check.verdict().word());
        textIfAny(json, "reason", check.reason());
        text(json, "remark", check.remark());
        place(json, check.at(), check.line());
        names(json, "uses", check.uses());
        names(json, "dependsOn", check.dependsOn());
    }

    private static void plot(JsonGenerator json, DesignRecord.PlotEntry plot) throws IOException {
        text(json, "at", plot.at());
        textIfAny(json, "name", plot.name());
        text(json, "caption", plot.caption());
        json.writeStringField("svg", PlotDrawing.svg(plot.plot(), plotId(plot.at())));
        names(json, "uses", plot.uses());
        names(json, "dependsOn", plot.dependsOn());
    }

    private static void problem(JsonGenerator json, Problem problem) throws IOException {
        json.writeNumberField("line", problem.line());
        json.writeNumberField("column", problem.column());
        json.writeNumberField("cell", problem.cell());
        text(json, "severity", problem.severity().name().toLowerCase(Locale.ROOT));
        text(json, "message", problem.message());
        text(json, "hint", problem.hint());
    }

    private static void text(JsonGenerator json, String text) throws IOException {
        json.writeString(encodable(text));
    }

    /** The prefix of the ids in the drawing of the plot at an address, as {@code plot-3-2}. */
    public static String plotId(String at) {
        return "plot-" + at.replace('.', '-');
    }

    static void place(JsonGenerator json, String at, int line) throws IOException {
        text(json, "at", at);
        json.writeNumberField("line", line);
    }

    static void text(JsonGenerator json, String name, String text) throws IOException {
        json.writeStringField(name, encodable(text));
    }

    private static void textIfAny(JsonGenerator json, String name, String text) throws IOException {
        if (!text.isEmpty()) {
            text(json, name, text);
        }
    }

    private static void texts(JsonGenerator json, String name, Map<String, String> texts) throws IOException {
        json.writeObjectFieldStart(name);
        for (Map.Entry<String, String> entry : texts.entrySet()) {
            text(json, encodable(entry.getKey()), entry.getValue());
        }
        json.writeEndObject();
    }

    static void names(JsonGenerator json, String name, List<String> names) throws IOException {
        json.writeArrayFieldStart(name);
        for (String each : names) {
            text(json, each);
        }
        json.writeEndArray();
    }

    private static void number(JsonGenerator json, String name, Optional<Double> number) throws IOException {
        json.writeFieldName(name);
        if (number.isPresent()) {
            json.writeNumber(number.get());
        } else {
            json.writeNull();
        }
    }

    private static void datum(JsonGenerator json, String name, Optional<Datum> value) throws IOException {
        json.writeFieldName(name);
        DatumJson.write(json, value.orElse(new Datum.Absent()));
    }

    static <T> void list(JsonGenerator json, String name, List<T> entries, EntryWriter<T> writer) throws IOException {
        json.writeArrayFieldStart(name);
        for (T entry : entries) {
            json.writeStartObject();
            writer.write(json, entry);
            json.writeEndObject();
        }
        json.writeEndArray();
    }

    /** The text with halves of surrogate pairs, which no UTF-8 file can hold, as the replacement character U+FFFD. */
    static String encodable(String text) {
        StringBuilder repaired = null;
        for (int i = 0; i < text.length(); i++) {
            if (!Character.isSurrogate(text.charAt(i))) {
                continue;
            }
            if (Character.isSurrogate((char) text.codePointAt(i)) && text.codePointAt(i) < 0x10000) {
                repaired = repaired == null ? new StringBuilder(text) : repaired;
                repaired.setCharAt(i, '\uFFFD');
            } else {
                i++;
            }
        }
        return repaired == null ? text : repaired.toString();
    }

    interface EntryWriter<T> {
        void write(JsonGenerator json, T entry) throws IOException;
    }
}
