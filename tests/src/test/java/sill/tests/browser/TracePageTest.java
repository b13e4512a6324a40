package sill.tests.browser;

import static org.assertj.core.api.Assertions.assertThat;

import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import java.util.regex.Pattern;
import org.junit.jupiter.api.AfterAll;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.TestInstance;
import org.junit.jupiter.api.io.TempDir;

/** The drawing of a trace of 60 names: on paper, and read aloud. */
@TestInstance(TestInstance.Lifecycle.PER_CLASS)
class TracePageTest {
    private Path page;
    private Browser browser;

    @BeforeAll
    void startBrowser(@TempDir Path folder) throws Exception {
        page = RecordFile.of(sheet(), folder);
        browser = Browser.start();
    }

    @AfterAll
    void stopBrowser() {
        if (browser != null) {
            browser.close();
        }
    }

    /** 20 givens, 38 results made from them and from each other, 2 checks. */
    private static String sheet() {
        StringBuilder sheet = new StringBuilder("sill 1\ntitle: Sixty\n:: given G\n");
        for (int i = 0; i < 20; i++) {
            sheet.append("gain").append(i).append(" = ").append(i + 1).append('\n');
        }
        sheet.append(":: calc C\n");
        for (int i = 0; i < 38; i++) {
            sheet.append("double sum").append(i).append(" = gain").append(i % 20);
            sheet.append(i < 4 ? " + 1;\n" : " + sum" + (i - 4) + ";\n");
        }
        return sheet.append(":: check R\nsum37 at least 1\nsum36 at least 1\n").toString();
    }

    @Test
    void itIsValidHtml() throws Exception {
        assertThat(HtmlValidator.complaints(Files.readString(page))).isEmpty();
    }

    @Test
    void nothingInTheWayOfAReader() {
        browser.open(page, 1200, "dark");
        assertThat(Axe.violations(browser)).isEmpty();
        assertThat(browser.evaluate("[...document.querySelectorAll('.part')].filter(part =>"
                        + " getComputedStyle(part).display != 'none').length"))
                .isEqualTo(0L);
    }

    /** The kind of each box, and what it is made from, as a screen reader is told. */
    @Test
    void eachBoxSaysWhatItIsMadeFrom() {
        browser.open(page, 1200, "light");
        browser.driver().executeCdpCommand("Accessibility.enable", Map.of());
        Map<String, Object> tree = browser.driver().executeCdpCommand("Accessibility.getFullAXTree", Map.of());
        List<String> told = ((List<?>) tree.get("nodes"))
                .stream()
                        .map(node -> (Map<?, ?>) node)
                        .map(node -> of(node, "role") + " | " + of(node, "name") + " | " + of(node, "description"))
                        .filter(line -> line.startsWith("group | ") || line.startsWith("link | sum5"))
                        .toList();
        assertThat(told)
                .contains(
                        "group | Trace of givens, results, plots and checks | Lines lead from what is used, on the left,"
                                + " to what uses it: 20 givens, 38 results, 0 plots, 2 checks. Each box leads to its line.",
                        "group | Givens | ",
                        "group | Results | ",
                        "group | Checks | ",
                        "link | sum5 2.6 · 9.000 | made from gain5, sum1");
    }

    private static String of(Map<?, ?> node, String property) {
        return node.get(property) instanceof Map<?, ?> value ? String.valueOf(value.get("value")) : "";
    }

    /** 1 point is 1/72 inch, 1 CSS pixel 1/96 inch (CSS Values and Units, section 6.2). */
    @Test
    void itsLettersArePrintedSevenPointsHigh() {
        browser.open(page, (int) (262 / 25.4 * 96), "light");
        browser.driver()
                .executeCdpCommand("Emulation.setEmulatedMedia", Map.of("media", "print", "features", List.of()));
        try {
            assertThat(browser.evaluate("getComputedStyle(document.querySelector('.trace-drawing')).display"))
                    .isEqualTo("none");
            assertThat(browser.evaluate("Math.max(...[...document.querySelectorAll('.trace-part')].map(part =>"
                            + " part.getBoundingClientRect().width)) < 262 / 25.4 * 96 + 1"))
                    .isEqualTo(true);
            assertThat(
                            browser.evaluate(
                                    "Math.min(...[...document.querySelectorAll('.trace-part')].map(part =>"
                                            + " parseFloat(getComputedStyle(part).fontSize) * part.getScreenCTM().a * 72 / 96 + 1e-6))"))
                    .asString()
                    .satisfies(points -> assertThat(Double.parseDouble(points)).isBetween(7.0, 9.75));
        } finally {
            browser.driver()
                    .executeCdpCommand("Emulation.setEmulatedMedia", Map.of("media", "", "features", List.of()));
        }
    }

    @Test
    void eachPartHasASheetAcross() {
        browser.open(page, 1200, "light");
        long parts = (long) browser.evaluate("document.querySelectorAll('.trace-part').length");
        String pdf = new String(browser.print(), StandardCharsets.ISO_8859_1);
        long across = Pattern.compile("/MediaBox \\[\\s*0 0 84[0-3][0-9.]* 59[4-7]")
                .matcher(pdf)
                .results()
                .count();
        assertThat(parts).isGreaterThan(1);
        assertThat(across).isEqualTo(parts);
    }
}
