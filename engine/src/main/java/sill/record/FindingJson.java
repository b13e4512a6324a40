package sill.record;

import com.fasterxml.jackson.core.JsonGenerator;
import java.io.IOException;
import java.util.List;
import java.util.Map;
import sill.record.DesignRecord.ToleranceEntry;
import sill.values.Finding;

/** What tolerance cells found, in the record's JSON. */
final class FindingJson {
    private FindingJson() {}

    static void write(JsonGenerator json, ToleranceEntry entry) throws IOException {
        Finding finding = entry.finding();
        RecordJson.text(json, "of", finding.name());
        RecordJson.text(json, "unit", finding.unit());
        json.writeNumberField("nominal", finding.nominal());
        RecordJson.names(json, "varied", finding.varied());
        if (finding.worstCase().isPresent()) {
            worstCase(json, finding, finding.worstCase().get());
        }
        if (finding.rootSumSquare().isPresent()) {
            Finding.RootSumSquare rss = finding.rootSumSquare().get();
            json.writeObjectFieldStart("rss");
            json.writeNumberField("low", rss.low());
            json.writeNumberField("high", rss.high());
            json.writeNumberField("standardUncertainty", rss.standardUncertainty());
            json.writeEndObject();
        }
        if (finding.monteCarlo().isPresent()) {
            monteCarlo(json, finding.monteCarlo().get());
        }
        RecordJson.list(json, "sensitivities", finding.sensitivities(), (j, each) -> {
            RecordJson.text(j, "given", each.given());
            j.writeNumberField("slope", each.slope());
            j.writeNumberField("share", each.share());
        });
        if (finding.sweep().isPresent()) {
            sweep(json, finding.sweep().get());
        }
        RecordJson.names(json, "remarks", finding.remarks());
        RecordJson.place(json, entry.at(), entry.line());
    }

    private static void worstCase(JsonGenerator json, Finding finding, Finding.WorstCase found) throws IOException {
        json.writeObjectFieldStart("worstCase");
        json.writeNumberField("low", found.low().value());
        json.writeNumberField("high", found.high().value());
        json.writeBooleanField("monotonic", found.isMonotonic());
        json.writeObjectFieldStart("trends");
        for (int i = 0; i < finding.varied().size(); i++) {
            RecordJson.text(json, finding.varied().get(i), found.trends().get(i).word());
        }
        json.writeEndObject();
        point(json, "lowAt", finding.varied(), found.low().at());
        point(json, "highAt", finding.varied(), found.high().at());
        json.writeEndObject();
    }

    private static void sweep(JsonGenerator json, Finding.Sweep sweep) throws IOException {
        json.writeObjectFieldStart("over");
        RecordJson.text(json, "given", sweep.given());
        column(json, "at", sweep.at());
        column(json, "nominal", sweep.nominal());
        column(json, "low", sweep.low());
        column(json, "high", sweep.high());
        json.writeEndObject();
    }

    private static void column(JsonGenerator json, String name, List<Double> numbers) throws IOException {
        json.writeArrayFieldStart(name);
        for (double number : numbers) {
            json.writeNumber(number);
        }
        json.writeEndArray();
    }

    private static void point(JsonGenerator json, String name, List<String> givens, List<Double> values)
            throws IOException {
        json.writeObjectFieldStart(name);
        for (int i = 0; i < givens.size(); i++) {
            json.writeNumberField(givens.get(i), values.get(i));
        }
        json.writeEndObject();
    }

    private static void monteCarlo(JsonGenerator json, Finding.MonteCarlo found) throws IOException {
        json.writeObjectFieldStart("monteCarlo");
        json.writeNumberField("samples", found.samples());
        json.writeNumberField("seed", found.seed());
        json.writeNumberField("mean", found.mean());
        json.writeNumberField("sd", found.sd());
        json.writeNumberField("low", found.low());
        json.writeNumberField("high", found.high());
        numbers(json, "quantiles", found.quantiles());
        numbers(json, "standardErrors", found.errors());
        json.writeNumberField("resolution", found.resolution());
        json.writeNumberField("min", found.min());
        json.writeNumberField("max", found.max());
        json.writeNumberField("notFinite", found.notFinite());
        json.writeNumberField("thrown", found.thrown());
        json.writeObjectFieldStart("histogram");
        json.writeNumberField("from", found.histogram().from());
        json.writeNumberField("to", found.histogram().to());
        json.writeArrayFieldStart("counts");
        for (long count : found.histogram().counts()) {
            json.writeNumber(count);
        }
        json.writeEndArray();
        json.writeEndObject();
        json.writeEndObject();
    }

    private static void numbers(JsonGenerator json, String name, Map<String, Double> numbers) throws IOException {
        json.writeObjectFieldStart(name);
        for (Map.Entry<String, Double> number : numbers.entrySet()) {
            json.writeNumberField(number.getKey(), number.getValue());
        }
        json.writeEndObject();
    }
}
