package sill.tests.browser;

import static org.assertj.core.api.Assertions.assertThat;

import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.AfterAll;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.TestInstance;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** Formulas as a browser lays them out and hands them to a screen reader. */
@TestInstance(TestInstance.Lifecycle.PER_CLASS)
class FormulaPageTest {
    private static final String SHEET = """
            sill 1
            title: Formulas
            :: given Values
            vIn = 24 V
            rTop = 10 kΩ
            rBottom = 1 kΩ
            n = 3
            :: calc Formulas
            double vOut = vIn * rBottom / (rTop + rBottom);
            double root = sqrt(pow(n, 2) + 1);
            double pick = n > 2 ? n : 2;
            double same = Dividers.output(vIn, rTop, rBottom);
            double wide = n * 1.0001 + n * 2.0002 + n * 3.0003 + n * 4.0004 + n * 5.0005 + n * 6.0006 + n * 7.0007 + n * 8.0008;
            double tower = 1 / (n * 1.0001 + n * 2.0002 + n * 3.0003 + n * 4.0004 + n * 5.0005);
            """;

    private Path page;
    private Browser browser;

    @BeforeAll
    void startBrowser(@TempDir Path folder) throws Exception {
        page = RecordFile.of(SHEET, folder);
        browser = Browser.start();
    }

    @AfterAll
    void stopBrowser() {
        if (browser != null) {
            browser.close();
        }
    }

    @Test
    void itIsValidHtml() throws Exception {
        assertThat(HtmlValidator.complaints(Files.readString(page))).isEmpty();
    }

    @ParameterizedTest
    @ValueSource(ints = {1200, 400})
    void nothingInTheWayOfAReader(int width) {
        browser.open(page, width, "light");
        assertThat(Axe.violations(browser)).isEmpty();
    }

    @ParameterizedTest
    @ValueSource(ints = {1200, 400})
    void longFormulaStaysInsideItsLine(int width) {
        browser.open(page, width, "light");
        assertThat(browser.evaluate("document.documentElement.scrollWidth - document.documentElement.clientWidth"))
                .isEqualTo(0L);
        // The long sum breaks between its pieces: nothing of it has to be scrolled to.
        assertThat(browser.evaluate("(() => { const line = document.querySelectorAll('.equation')[4];"
                        + " return line.scrollWidth - line.clientWidth; })()"))
                .isEqualTo(0L);
    }

    @Test
    void fractionIsLaidOutAsOne() {
        browser.open(page, 1200, "light");
        assertThat(browser.evaluate("(() => { const [top, bottom] = [...document.querySelector('mfrac').children]"
                        + ".map(part => part.getBoundingClientRect());"
                        + " return top.bottom <= bottom.top + 1 && top.height > 5 && bottom.height > 5; })()"))
                .isEqualTo(true);
    }

    @Test
    void indexStandsLowerAndExponentHigher() {
        browser.open(page, 1200, "light");
        assertThat(browser.evaluate(edges("msub", "bottom"))).asString().isEqualTo("lower, smaller");
        assertThat(browser.evaluate(edges("msup", "bottom"))).asString().isEqualTo("higher, smaller");
    }

    /** Where the second part of an element ends against the first, and which is set larger. */
    private static String edges(String element, String edge) {
        return "(() => { const [base, script] = [...document.querySelector('" + element + "').children];"
                + " const by = script.getBoundingClientRect()." + edge + " - base.getBoundingClientRect()." + edge + ";"
                + " const size = part => parseFloat(getComputedStyle(part).fontSize);"
                + " return (by > 0 ? 'lower' : 'higher') + ', '"
                + " + (size(script) < size(base) ? 'smaller' : 'not smaller'); })()";
    }

    /** What the browser hands to assistive technology, by the roles of the MathML accessibility mapping. */
    @Test
    void screenReaderGetsTheFormula() {
        browser.open(page, 1200, "light");
        browser.driver().executeCdpCommand("Accessibility.enable", Map.of());
        Map<String, Object> tree = browser.driver().executeCdpCommand("Accessibility.getFullAXTree", Map.of());
        List<String> roles = ((List<?>) tree.get("nodes"))
                .stream()
                        .map(node -> ((Map<?, ?>) ((Map<?, ?>) node).get("role")))
                        .filter(role -> role != null)
                        .map(role -> String.valueOf(role.get("value")))
                        .toList();
        assertThat(roles)
                .contains("MathMLMath", "MathMLFraction", "MathMLSquareRoot", "MathMLSub", "MathMLSup", "MathMLTable");
    }

    @Test
    void noScriptFromElsewhereAndNoFontIsNeeded() throws Exception {
        String text = Files.readString(page);
        assertThat(text).doesNotContain("@font-face").doesNotContain("url(");
        assertThat(text.split("<script", -1)).as("the JSON and the peek").hasSize(3);
        assertThat(text).contains("<script type=\"application/json\"");
    }
}
