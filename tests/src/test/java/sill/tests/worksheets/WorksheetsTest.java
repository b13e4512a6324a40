package sill.tests.worksheets;

import static org.assertj.core.api.Assertions.assertThat;

import com.fasterxml.jackson.databind.JsonNode;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Arrays;
import java.util.HashSet;
import java.util.List;
import java.util.Set;
import java.util.regex.Pattern;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvFileSource;
import org.junit.jupiter.params.provider.EnumSource;

/** Every design of the project runs, holds, and comes to figures got elsewhere. */
class WorksheetsTest {
    private static Runs runs;

    @BeforeAll
    static void prepare(@TempDir Path folder) {
        runs = new Runs(folder);
    }

    @Test
    void noWorksheetIsForgotten() throws IOException {
        try (Stream<Path> files = Files.walk(Design.FOLDER)) {
            List<Path> sheets =
                    files.filter(file -> file.toString().endsWith(".sill")).toList();
            assertThat(sheets)
                    .containsExactlyInAnyOrderElementsOf(
                            Arrays.stream(Design.values()).map(Design::sheet).toList());
        }
    }

    @ParameterizedTest
    @EnumSource
    void itRunsWithoutAProblemOrWarning(Design design) {
        Runs.Run run = runs.of(design);

        assertThat(run.code()).as(run.out() + run.err()).isZero();
        assertThat(run.err()).isEmpty();
        assertThat(run.record().at("/outcome").asText()).isEqualTo("holds");
        assertThat(run.record().at("/problems").isArray()).isTrue();
        assertThat(run.record().at("/problems")).isEmpty();
        assertThat(run.record().at("/cells"))
                .isNotEmpty()
                .allMatch(cell -> cell.at("/state").asText().equals("done"));
    }

    @ParameterizedTest
    @EnumSource
    void eachCheckHoldsWithTheMarginItsLimitsLeave(Design design) {
        JsonNode checks = runs.of(design).record().at("/checks");

        assertThat(checks).hasSize(design.checks());
        for (JsonNode check : checks) {
            assertThat(check.at("/verdict").asText()).as(check.toString()).isEqualTo("holds");
            assertThat(check.at("/remark").asText()).as(check.toString()).isNotBlank();
            if (check.at("/value").isBoolean()) {
                assertThat(check.at("/value").asBoolean()).isTrue();
            } else {
                assertThat(check.at("/margin").asDouble())
                        .as(check.toString())
                        .isEqualTo(margin(check))
                        .isPositive();
            }
        }
    }

    /** From the value to the nearer limit, as the record's format defines it. */
    private static double margin(JsonNode check) {
        if (check.hasNonNull("worstLow")) {
            return Math.min(
                    margin(check, check.at("/worstLow").asDouble()),
                    margin(check, check.at("/worstHigh").asDouble()));
        }
        return margin(check, check.at("/value").asDouble());
    }

    private static double margin(JsonNode check, double value) {
        double below = check.hasNonNull("low") ? value - check.at("/low").asDouble() : Double.POSITIVE_INFINITY;
        double above = check.hasNonNull("high") ? check.at("/high").asDouble() - value : Double.POSITIVE_INFINITY;
        return Math.min(below, above);
    }

    @ParameterizedTest
    @EnumSource
    void itsPlotsAndDataAreInTheRecord(Design design) {
        Runs.Run run = runs.of(design);

        assertThat(run.record().at("/plots"))
                .hasSize(design.plots())
                .allMatch(plot -> plot.at("/svg").asText().startsWith("<svg")
                        && !plot.at("/caption").asText().isBlank());
        assertThat(run.record().at("/files")).hasSize(design.dataFiles());
        assertThat(run.page().split("<svg", -1)).hasSizeGreaterThan(design.plots());
    }

    @ParameterizedTest
    @EnumSource(mode = EnumSource.Mode.EXCLUDE, names = "WORKED_EXAMPLE")
    void whatIsInventedSaysSo(Design design) {
        JsonNode record = runs.of(design).record();

        assertThat(record.at("/worksheet/text").asText()).contains("**invented**");
        for (JsonNode file : record.at("/files")) {
            assertThat(file.at("/path").asText()).endsWith("-invented.csv");
        }
    }

    @ParameterizedTest
    @EnumSource(mode = EnumSource.Mode.EXCLUDE, names = "WORKED_EXAMPLE")
    void whatSwitchesDangerSaysSo(Design design) {
        assertThat(runs.of(design).page()).contains("Cautions", "local", "licensed");
    }

    @ParameterizedTest
    @EnumSource
    void everyLineIsAPlaceAndNoLinkIsDead(Design design) {
        Runs.Run run = runs.of(design);
        Set<String> ids = found("\\bid=\"([^\"]*)\"", run.page());

        for (String list : List.of("givens", "values", "tolerances", "plots", "checks")) {
            for (JsonNode entry : run.record().at("/" + list)) {
                assertThat(ids).contains("at-" + entry.at("/at").asText());
            }
        }
        assertThat(found("href=\"#([^\"]*)\"", run.page()))
                .hasSizeGreaterThan(10)
                .isSubsetOf(ids);
    }

    /** In these designs every given serves; each line of the page that uses a name links to it. */
    @ParameterizedTest
    @EnumSource
    void theTraceReachesTheGivens(Design design) {
        JsonNode record = runs.of(design).record();
        Set<String> givens = new HashSet<>(record.at("/givens").findValuesAsText("name"));
        Set<String> used = new HashSet<>();

        for (JsonNode check : record.at("/checks")) {
            Set<String> below = new HashSet<>();
            check.at("/dependsOn").forEach(name -> below.add(name.asText()));
            assertThat(below).as(check.toString()).containsAnyElementsOf(givens);
            check.at("/uses").forEach(name -> assertThat(below).contains(name.asText()));
            used.addAll(below);
        }
        record.at("/plots").forEach(plot -> plot.at("/dependsOn").forEach(name -> used.add(name.asText())));
        assertThat(used).containsAll(givens);
        assertThat(runs.of(design).page()).doesNotContain("class=\"unused\"").contains("class=\"trace-drawing");
    }

    private static Set<String> found(String pattern, String text) {
        return Pattern.compile(pattern)
                .matcher(text)
                .results()
                .map(match -> match.group(1))
                .collect(Collectors.toSet());
    }

    /** A figure holds to half a unit of its last digit. */
    @ParameterizedTest(name = "{0}: {1} = {2}")
    @CsvFileSource(resources = "/worksheets/figures.txt", delimiter = '|', useHeadersInDisplayName = true)
    void aFigureIsWhatItIsElsewhere(String sheet, String name, String figure, String from) {
        assertThat(from).as("every figure says where it is from").isNotBlank();
        assertThat(value(Design.named(sheet), name)).is(Figure.of(figure));
    }

    private static double value(Design design, String name) {
        String[] words = name.split(" ");
        for (JsonNode found : runs.of(design).record().at("/tolerances")) {
            if (words.length == 2 && found.at("/of").asText().equals(words[0])) {
                return found.at("/worstCase/" + words[1]).asDouble();
            }
        }
        String[] path = name.split("\\.", 2);
        for (JsonNode value : runs.of(design).record().at("/values")) {
            if (value.at("/name").asText().equals(path[0])) {
                JsonNode number = value.at(path.length == 1 ? "/value" : "/value/" + path[1]);
                assertThat(number.isNumber()).as(name + " in " + value).isTrue();
                return number.asDouble();
            }
        }
        throw new AssertionError("no value \"" + name + "\" in the record of " + design);
    }
}
