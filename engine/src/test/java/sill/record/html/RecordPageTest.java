package sill.record.html;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.stream.IntStream;
import org.jsoup.Jsoup;
import org.jsoup.nodes.Document;
import org.jsoup.nodes.Element;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import sill.formula.Expression;
import sill.formula.Working;
import sill.record.DesignRecord;
import sill.record.DesignRecord.Verdict;
import sill.record.RecordJson;
import sill.record.Records;
import sill.values.CellState;
import sill.values.Datum;
import sill.worksheet.Problem;

/** What stands on the page; how it looks and reads is tested in a browser, in the module tests. */
class RecordPageTest {
    private static Document page(DesignRecord record) {
        return Jsoup.parse(RecordPage.write(record));
    }

    @Test
    void theJsonInsideIsTheRecord() {
        DesignRecord record = Records.ofValues(Records.value("v", new Datum.Text("</script> & <!-- \u2028"), ""));
        Element script = page(record).getElementById(RecordPage.JSON_ELEMENT);
        assertThat(script.attr("type")).isEqualTo("application/json");
        String inside = script.data();
        assertThat(inside).doesNotContain("<", ">", "&", "\u2028");
        assertThat(inside.replace("\\u003c", "<")
                        .replace("\\u003e", ">")
                        .replace("\\u0026", "&")
                        .replace("\\u2028", "\u2028"))
                .isEqualTo(RecordJson.write(record));
    }

    @Test
    void nothingIsFetchedAndNoScriptRunsButThePagesOwn() {
        Document page = page(Records.ofEverything());
        String policy =
                page.selectFirst("meta[http-equiv=Content-Security-Policy]").attr("content");
        String style = page.selectFirst("style").data();
        assertThat(policy)
                .isEqualTo("default-src 'none'; style-src '" + Inline.digest(style) + "'; script-src '"
                        + Inline.digest(page.select("script").last().data())
                        + "'; img-src data:; base-uri 'none'; form-action 'none'");
        assertThat(page.select("script").eachAttr("type")).containsExactly("application/json");
        assertThat(page.select("script")).hasSize(2);
        assertThat(page.select("script").last().data())
                .isEqualTo("\n" + Inline.resource(Inline.PEEK))
                .doesNotContain("eval(", "Function(", "innerHTML", "fetch(", "import", "</");
        assertThat(page.select("[style], link, img, iframe")).isEmpty();
        assertThat(style).doesNotContain("url(", "@import");
    }

    /** Computed with: printf 'a{}' | openssl dgst -sha256 -binary | base64. */
    @Test
    void theStylesDigest() {
        assertThat(Inline.digest("a{}")).isEqualTo("sha256-X1RutGBrXCt9KkSaXMK7tHftWiRscFHOhxsS8tv8hBk=");
    }

    @Test
    void aTitleCannotLeaveTheStyleSheet() {
        assertThat(Style.quoted("a</style>\"\\")).isEqualTo("\"a\\3c \\2f style\\3e \\22 \\5c \"");
    }

    @Test
    void checksComeFirst() {
        Document page = page(Records.ofChecks(Records.check(Verdict.FAILS)));
        assertThat(page.select("h2").eachText()).startsWith("Checks", "Working");
        Element row = page.selectFirst("section.checks tbody tr");
        assertThat(row.select("th, td").eachText())
                .containsExactly(
                        "1.1",
                        "v at most 3 V Made from v and so from vIn at the nominal values",
                        "2.000 V",
                        "≤ 3 V",
                        "+1.000 V +33.3 %",
                        "✗ fails",
                        "REQ-01");
    }

    @Test
    void aCheckThatWasNotJudgedSaysWhy() {
        Document page = page(Records.ofChecks(Records.check(Verdict.NOT_JUDGED)));
        assertThat(page.selectFirst("section.checks td[data-label=Verdict]").text())
                .isEqualTo("? not judged no tolerance runs");
    }

    @Test
    void aResultReadsAsAnEquation() {
        Document page = page(Records.ofValues(Records.value("v", new Datum.Real(2.00000001), "2.000 V")));
        assertThat(page.selectFirst(".equation").ownText()).isEqualTo("= =");
        assertThat(page.selectFirst(".equation > var").text()).isEqualTo("v");
        assertThat(page.selectFirst(".equation > code").text()).isEqualTo("vIn / 12");
        assertThat(page.selectFirst(".equation summary").text()).isEqualTo("2.000 V");
        assertThat(page.selectFirst(".full").text())
                .isEqualTo("2.00000001 V Type double, worksheet line 5. Made from vIn Used by plot Ramp");
        assertThat(page.getElementById("at-1.1").text()).isEqualTo("1.1");
    }

    @Test
    void aLongListIsFoldedAndComplete() {
        List<Datum> items = IntStream.range(0, 50)
                .<Datum>mapToObj(i -> new Datum.Real(i / 8.0))
                .toList();
        Document page = page(Records.ofValues(Records.value("v", new Datum.Items(items, 900), "")));
        assertThat(page.selectFirst("summary").text()).isEqualTo("[0, 0.125, 0.25, 0.375, 0.5, 0.625, … 894 more] V");
        assertThat(page.select(".full li")).hasSize(50);
        assertThat(page.select(".full li").last().text()).isEqualTo("6.125 V");
        assertThat(page.select(".full").text()).contains("The record keeps the first 50 of 900.");
    }

    @Test
    void columnsAreATable() {
        Map<String, Datum> columns = new LinkedHashMap<>();
        columns.put("r", new Datum.Items(List.of(new Datum.Real(8200), new Datum.Real(1e-9)), 2));
        columns.put("name", new Datum.Items(List.of(new Datum.Text("E24"), new Datum.Text("<b>")), 2));
        Document page = page(Records.ofValues(Records.value("v", new Datum.Fields(columns), "")));
        assertThat(page.selectFirst("summary").text()).isEqualTo("2 rows");
        assertThat(page.select(".full tr").eachText()).containsExactly("index r name", "0 8200 E24", "1 1 × 10⁻⁹ <b>");
        assertThat(page.selectFirst("details.result").hasAttr("open")).isTrue();
    }

    @Test
    void thePlotStandsInPlaceOfItsValue() {
        Document page = page(Records.ofEverything());
        assertThat(page.select("figure svg title").eachText()).containsExactly("Ramp");
        assertThat(page.selectFirst("figure figcaption").ownText()).isEqualTo("Ramp");
        assertThat(page.getElementById("at-1.9").text()).isEqualTo("1.9");
    }

    @Test
    void resultsAndPlotsStandInOrder() {
        assertThat(page(Records.ofEverything()).select(".cell .line > .address").eachText())
                .containsExactly("1.1", "1.9");
    }

    @Test
    void aProblemQuotesItsLineWithACaret() {
        Document page = page(Records.ofProblems(
                "\tdouble a = b\u202E;",
                Problem.error(5, 13, 1, "cannot find b", "Did you mean vIn?"),
                Problem.error(99, 1, 0, "elsewhere", "")));
        assertThat(page.select(".problem-list p").eachText())
                .containsExactly(
                        "Error in line 5, column 13, cell 1: cannot find b.",
                        "Did you mean vIn?",
                        "Error in line 99, column 1: elsewhere.");
        assertThat(page.selectFirst(".quote").wholeText()).isEqualTo("\tdouble a = b[U+202E];\n\t           ^");
    }

    @Test
    void aLongLineIsQuotedInPart() {
        Document page = page(Records.ofProblems("x".repeat(100_000), Problem.error(5, 50_000, 1, "long", "")));
        assertThat(page.selectFirst(".quote").wholeText())
                .isEqualTo("…" + "x".repeat(100) + "…\n" + " ".repeat(61) + "^");
    }

    @Test
    void sourceIsFoldedWithTheWorksheetsLineNumbers() {
        Document page = page(Records.ofValues());
        Element source = page.selectFirst("details.source");
        assertThat(source.hasAttr("open")).isFalse();
        assertThat(source.selectFirst("summary").text()).isEqualTo("Java source");
        assertThat(source.select(".row").eachAttr("data-line")).containsExactly("5");
        assertThat(source.select(".row").eachText()).containsExactly("double a = 1;");
    }

    @Test
    void theFootHasTitleBlockDigestsAndRerun() {
        Document page = page(Records.ofEverything());
        assertThat(page.select(".title-block dt").eachText()).containsExactly("Title");
        assertThat(page.select(".digests tbody tr").eachText()).containsExactly("door.sill 00ff", "a.csv ff00");
        assertThat(page.selectFirst(".rerun").text())
                .isEqualTo(
                        "To run it again, run the worksheet with its data beside it: sill run door.sill. This file carries"
                                + " both; a Sill that has the command sill rerun will run it from here and tell what differs.");
        assertThat(page.selectFirst(".caution").text())
                .isEqualTo(
                        "Caution: the results are design aids. What switches mains voltage or protects people follows"
                                + " local codes and the judgement of a licensed practitioner.");
    }

    @ParameterizedTest
    @CsvSource({
        "PROBLEM, Problem: it broke",
        "NOT_RUN, Not run: it broke",
        "STOPPED, Stopped: it broke",
        "DONE, it broke"
    })
    void aCellThatDidNotEndSaysWhy(CellState state, String words) {
        DesignRecord all = Records.ofEverything();
        DesignRecord.CellEntry cell =
                new DesignRecord.CellEntry(1, "tolerance", "A", 4, state, "it broke", "", "of: a");
        DesignRecord record = new DesignRecord(
                all.outcome(),
                all.titleBlock(),
                all.made(),
                all.trial(),
                all.worksheet(),
                all.files(),
                List.of(cell),
                List.of(),
                List.of(),
                List.of(),
                List.of(),
                List.of());
        Document page = page(record);
        assertThat(page.selectFirst(".state").text()).isEqualTo(words);
        assertThat(page.selectFirst("details.source").hasAttr("open")).isTrue();
    }

    @ParameterizedTest
    @CsvSource({"de, de", "en-GB, en-GB", "pt_BR, pt-BR", "DE, de", "xx, en", "en-XX, en", "'', en", "\"><b>, en"})
    void theLanguageIsOneThatExists(String typed, String tag) {
        DesignRecord all = Records.ofEverything();
        DesignRecord record = new DesignRecord(
                all.outcome(),
                Map.of("title", "T", "language", typed),
                all.made(),
                Map.of("vIn", "26 V"),
                all.worksheet(),
                all.files(),
                all.cells(),
                all.givens(),
                all.values(),
                all.checks(),
                all.plots(),
                all.problems());
        Document page = page(record);
        assertThat(page.selectFirst("html").attr("lang")).isEqualTo(tag);
        assertThat(page.selectFirst(".trial").text())
                .isEqualTo("Trial run, not for issue. In place of the worksheet's values: vIn = 26 V.");
    }

    @Test
    void theSameRecordIsTheSamePage() {
        assertThat(RecordPage.write(Records.ofEverything())).isEqualTo(RecordPage.write(Records.ofEverything()));
    }

    @Test
    void aGivenThatNothingUsesIsPointedOut() {
        Document page = page(Records.ofGivens("double a = vOther;", CellState.DONE));
        assertThat(page.select(".givens .unused").eachText()).containsExactly(TracePanel.UNUSED);
        assertThat(page.selectFirst(".unused-givens").text())
                .isEqualTo("One given that no result, check or plot uses: vIn (1.1).");
        assertThat(page.selectFirst(".unused-givens a").attr("href")).isEqualTo("#at-1.1");
        assertThat(page.select(".tracing svg")).isEmpty();
    }

    /** What a cell that did not run uses is not known; its text is all there is to go by. */
    @Test
    void aGivenOfACellThatDidNotRunIsNotCalledUnused() {
        assertThat(page(Records.ofGivens("double a = vIn / 2;", CellState.NOT_RUN))
                        .select(".unused, .tracing"))
                .isEmpty();
        assertThat(page(Records.ofGivens("double a = vIn2 / 2;", CellState.PROBLEM))
                        .select(".unused"))
                .hasSize(1);
    }

    /** A reader of a formula must find the given, and a reader of the worksheet too. */
    @ParameterizedTest
    @CsvSource({
        "vIn, <math><msub><mi>v</mi><mi>In</mi></msub></math> <code>vIn</code>",
        "kappa, <math><mi>κ</mi></math> <code>kappa</code>",
        "band, <var>band</var>",
        "n, <var>n</var>"
    })
    void aGivensNameIsShownAsFormulasAndAsTheWorksheetWriteIt(String name, String shown) {
        assertThat(RecordPage.write(Records.ofBareGiven(name))).contains("<summary>" + shown + "</summary>");
    }

    @Test
    void columnsThatNoGivenOfTheCellNeedsAreLeftOut() {
        Document bare = page(Records.ofBareGiven("n"));
        assertThat(bare.select(".givens thead th").eachText()).containsExactly("At", "Name", "Value", "Remark");
        assertThat(bare.select(".givens tbody tr").first().children()).hasSize(4);
        Document limited = page(Records.ofGivens("", CellState.DONE));
        assertThat(limited.select(".givens thead th").eachText())
                .containsExactly("At", "Name", "Value", "Limits", "Distribution", "Remark");
        assertThat(limited.select(".givens tbody tr").first().children()).hasSize(6);
    }

    @Test
    void aNameOfAFormulaTellsItsPlaceUnlessItIsThisLine() {
        DesignRecord.ValueEntry value = Records.value("v", new Datum.Real(2), "2.000 V");
        Expression sum =
                new Expression.Arithmetic(Expression.Operator.PLUS, new Expression.Name("v"), new Expression.Name("w"));
        Working working = new Working(List.of(
                new Working.Line(Optional.of(new Expression.Name("v")), Optional.of(sum), Optional.empty(), ""),
                new Working.Line(Optional.of(new Expression.Name("w")), Optional.of(sum), Optional.empty(), "")));
        String page = RecordPage.write(Records.ofValues(Records.worked(value, working), Records.valueAt("w", "1.2")));
        assertThat(page)
                .contains("<span class=\"side formula\"><math><mo form=\"infix\">=</mo><mi>v</mi>"
                        + "<mo form=\"infix\">+</mo><mi class=\"at-1.2\">w</mi></math></span>")
                // A helper's own names.
                .contains("<span class=\"side formula\"><math><mo form=\"infix\">=</mo><mi>v</mi>"
                        + "<mo form=\"infix\">+</mo><mi>w</mi></math></span>");
    }

    @Test
    void moreThanADrawingCanShowIsSaid() {
        DesignRecord.ValueEntry[] values = IntStream.range(0, TraceSection.MOST_BOXES)
                .mapToObj(i -> Records.valueAt("v" + i, "1." + (i + 1)))
                .toArray(DesignRecord.ValueEntry[]::new);
        Document page = page(Records.ofValues(values));
        assertThat(page.select(".tracing svg")).isEmpty();
        assertThat(page.selectFirst(".tracing p").text())
                .isEqualTo(
                        "No drawing: the sheet's 151 givens, results, plots and checks are more than the 150 that one"
                                + " drawing can show. Each line has its own trace, under its name or value.");
    }

    @Test
    void aLongTraceIsCutAndSaysSo() {
        DesignRecord.ValueEntry[] values = IntStream.range(0, 70)
                .mapToObj(i -> i == 0
                        ? Records.value("vIn", new Datum.Real(1), "1 V")
                        : Records.valueAt("v" + i, "1." + (i + 1)))
                .toArray(DesignRecord.ValueEntry[]::new);
        Element panel = page(Records.ofValues(values)).selectFirst(".trace dt:contains(Used by) + dd");
        assertThat(panel.select("a")).hasSize(60);
        assertThat(panel.text()).startsWith("v1; v2; ").endsWith("; v60; and 9 more");
    }

    @Test
    void aCheckNamesWhatItIsMadeFrom() {
        Element panel = page(Records.ofEverything()).selectFirst(".checks .trace");
        assertThat(panel.select("dt").eachText()).containsExactly("Made from", "and so from");
        assertThat(panel.select("dd").eachText()).containsExactly("v = 2.000 V (1.1)", "vIn");
    }

    @Test
    void whatATolerancesCellFound() {
        Document page = page(Records.ofTolerances());
        Element row = page.selectFirst(".cell-tolerance > table tbody tr");
        assertThat(row.text().replace('\u00a0', ' '))
                .isEqualTo("1.1 v 2.000 V 1.800 V .. 2.200 V 1.900 V .. 2.100 V"
                        + " 0.135 % 1.850 V 50 % 2.010 V 99.865 % 2.160 V");
        assertThat(page.select(".finding .state").eachText()).containsExactly("A remark.");
        assertThat(page.select(".finding .fields dd").eachText())
                .extracting(text -> text.replace('\u00a0', ' '))
                .containsExactly(
                        "60.00 mV",
                        "200 000, seed 7",
                        "3 of them, 2 by an exception; the figures below are those of the others",
                        "2.010 V, standard error by sampling 100.0 µV",
                        "50.00 mV, standard error by sampling 200.0 µV",
                        "1.910 V .. 2.110 V, standard errors 1.000 mV and 2.000 mV",
                        "50 % 300.0 µV",
                        "1.820 V, 2.190 V");
        assertThat(page.selectFirst(".sensitivities tbody tr").text().replace('\u00a0', ' '))
                .isEqualTo("vIn 0.08300 100.0 % mixed lower limit 24.10 V");
        assertThat(page.select(".finding svg.plot title").eachText()).containsExactly("Samples of v", "v over vIn");
        assertThat(page.select(".finding svg.bar rect").attr("width")).isEqualTo("100.0");
    }
}
