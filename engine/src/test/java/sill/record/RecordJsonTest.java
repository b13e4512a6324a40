package sill.record;

import static org.assertj.core.api.Assertions.assertThat;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import sill.plot.PlotDrawing;
import sill.values.Datum;

class RecordJsonTest {
    private static JsonNode parse(DesignRecord record) throws Exception {
        return new ObjectMapper().readTree(RecordJson.write(record));
    }

    private static JsonNode value(Datum value) throws Exception {
        return parse(Records.ofValues(Records.value("v", value, ""))).at("/values/0");
    }

    private static List<String> fields(JsonNode object) {
        List<String> names = new ArrayList<>();
        object.fieldNames().forEachRemaining(names::add);
        return names;
    }

    /** Fields that others rely on, in this order; more may stand between them. From the design's page on the record. */
    @ParameterizedTest
    @CsvSource({
        "'', format outcome titleBlock made trial worksheet files cells givens values tolerances checks plots problems",
        "/made, sill java at",
        "/worksheet, file sha256 text",
        "/files/0, path sha256 bytes",
        "/cells/0, number kind caption line state source",
        "/givens/0, name value unit low high distribution remark at line",
        "/values/0, name type value unit shown caption at line uses dependsOn",
        "/checks/0, text basis value low high margin verdict remark at line uses dependsOn",
        "/plots/0, at caption svg uses dependsOn",
        "/problems/0, line column cell severity message hint"
    })
    void theFormatsFields(String place, String names) throws Exception {
        assertThat(fields(parse(Records.ofEverything()).at(place))).containsSubsequence(names.split(" "));
    }

    /** From the design's page on the record. */
    @ParameterizedTest
    @CsvSource({
        "/tolerances/0, of unit nominal worstCase rss monteCarlo sensitivities",
        "/tolerances/0/worstCase, low high monotonic",
        "/tolerances/0/rss, low high",
        "/tolerances/0/monteCarlo, samples seed mean sd low high quantiles min max notFinite",
        "/tolerances/0/sensitivities/0, given slope share"
    })
    void theFormatsFieldsOfATolerance(String place, String names) throws Exception {
        assertThat(fields(parse(Records.ofTolerances()).at(place))).containsSubsequence(names.split(" "));
    }

    @Test
    void whatATolerancesFieldsHold() throws Exception {
        JsonNode found = parse(Records.ofTolerances()).at("/tolerances/0");
        assertThat(found.at("/of").asText()).isEqualTo("v");
        assertThat(found.at("/worstCase/monotonic").isBoolean()).isTrue();
        assertThat(found.at("/worstCase/monotonic").asBoolean()).isFalse();
        assertThat(found.at("/worstCase/trends/vIn").asText()).isEqualTo("mixed");
        assertThat(found.at("/worstCase/highAt/vIn").doubleValue()).isEqualTo(24.1);
        assertThat(found.at("/monteCarlo/quantiles/0.99865").doubleValue()).isEqualTo(2.16);
        assertThat(found.at("/monteCarlo/notFinite").longValue()).isEqualTo(3);
        assertThat(found.at("/over/given").asText()).isEqualTo("vIn");
        assertThat(found.at("/over/high")).hasSize(2);
        assertThat(found.at("/remarks/0").asText()).isEqualTo("A remark.");
        assertThat(found.at("/at").asText()).isEqualTo("1.1");
    }

    @Test
    void whatTheFieldsHold() throws Exception {
        JsonNode json = parse(Records.ofEverything());
        assertThat(json.get("format").asText()).isEqualTo("sill-record/1");
        assertThat(json.get("outcome").asText()).isEqualTo("holds");
        // Base64 of the bytes 0, 1 and 255 by RFC 4648.
        assertThat(json.at("/files/0/bytes").asText()).isEqualTo("AAH/");
        assertThat(json.at("/cells/0/state").asText()).isEqualTo("done");
        assertThat(json.at("/givens/0/low").doubleValue()).isEqualTo(22.8);
        assertThat(json.at("/checks/0/low").isNull()).isTrue();
        assertThat(json.at("/checks/0/margin").doubleValue()).isEqualTo(1);
        assertThat(json.at("/checks/0/marginShare").doubleValue()).isEqualTo(1.0 / 3);
        assertThat(json.at("/checks/0/verdict").asText()).isEqualTo("holds");
        assertThat(json.at("/problems/0/severity").asText()).isEqualTo("warning");
        assertThat(json.at("/plots/0/svg").asText()).isEqualTo(PlotDrawing.svg(Records.plot(), "plot-1-9"));
        assertThat(json.at("/values/0/uses/0").asText()).isEqualTo("vIn");
        assertThat(json.at("/checks/0/uses")).hasToString("[\"v\"]");
        assertThat(json.at("/checks/0/dependsOn")).hasToString("[\"v\",\"vIn\"]");
    }

    @Property
    void doublesReadBackTheSame(@ForAll double number) throws Exception {
        JsonNode value = value(new Datum.Real(number)).get("value");
        assertThat(value.isNumber()).isTrue();
        assertThat(Double.doubleToLongBits(value.doubleValue())).isEqualTo(Double.doubleToLongBits(number));
    }

    /** The shortest digits, as Java 19 and later print them; Java 17 would print 2.0E-3 alike but 2.2E-322 as 2.17E-322. */
    @Test
    void doublesAreTheSameOnEveryJava() {
        String json = RecordJson.write(Records.ofValues(
                Records.value("a", new Datum.Real(2.2E-322), ""), Records.value("b", new Datum.Real(2e23), "")));
        assertThat(json).contains("\"value\": 2.2E-322,", "\"value\": 2.0E23,");
    }

    @ParameterizedTest
    @CsvSource({"NaN", "Infinity", "-Infinity"})
    void whatIsNotANumberIsAText(String text) throws Exception {
        JsonNode value = value(new Datum.Real(Double.parseDouble(text))).get("value");
        assertThat(value.isTextual()).isTrue();
        assertThat(value.asText()).isEqualTo(text);
    }

    @Test
    void everyKindOfValue() throws Exception {
        Map<String, Datum> fields = new LinkedHashMap<>();
        fields.put("rising", new Datum.Real(5.25));
        fields.put("falling", new Datum.Absent());
        assertThat(value(new Datum.Fields(fields)).get("value")).hasToString("{\"rising\":5.25,\"falling\":null}");
        assertThat(value(new Datum.Items(List.of(new Datum.Real(1), new Datum.Real(0.5)), 2))
                        .get("value"))
                .hasToString("[1.0,0.5]");
        assertThat(value(new Datum.Whole("42")).get("value")).hasToString("42");
        assertThat(value(new Datum.Truth(true)).get("value")).hasToString("true");
        assertThat(value(new Datum.Text("a\"b")).get("value").asText()).isEqualTo("a\"b");
        assertThat(value(new Datum.Opaque("law")).get("value").asText()).isEqualTo("law");
        assertThat(value(new Datum.Absent()).get("value").isNull()).isTrue();
    }

    @Test
    void aWholeNumberThatADoubleCannotHoldIsAText() throws Exception {
        assertThat(value(new Datum.Whole("-123456789012345")).get("value").isTextual())
                .isTrue();
        assertThat(value(new Datum.Whole("123456789012345")).get("value").isNumber())
                .isTrue();
        assertThat(value(new Datum.Whole("9007199254740993")).get("value").asText())
                .isEqualTo("9007199254740993");
    }

    @Test
    void aShortenedListSaysHowLongItIs() throws Exception {
        Datum inner = new Datum.Items(List.of(new Datum.Real(1)), 70);
        JsonNode value = value(new Datum.Items(List.of(inner), 5000));
        assertThat(value.get("shortened")).hasToString("{\"value\":5000,\"value[0]\":70}");
    }

    @Test
    void halfASurrogatePairIsReplaced() throws Exception {
        assertThat(value(new Datum.Text("\uD83Dx\uD83D\uDD0C\uDD0C"))
                        .get("value")
                        .asText())
                .isEqualTo("\uFFFDx\uD83D\uDD0C\uFFFD");
    }

    @Test
    void anEntryIsALine() {
        String json = RecordJson.write(Records.ofEverything());
        assertThat(json.lines())
                .contains(
                        "{",
                        "  \"format\": \"sill-record/1\",",
                        "  \"trial\": {},",
                        "  \"tolerances\": [],",
                        "    {\"path\": \"a.csv\", \"sha256\": \"ff00\", \"bytes\": \"AAH/\"}",
                        "}");
        assertThat(json).endsWith("}\n");
    }

    @Test
    void theSameRecordIsTheSameText() {
        assertThat(RecordJson.write(Records.ofEverything())).isEqualTo(RecordJson.write(Records.ofEverything()));
    }
}
