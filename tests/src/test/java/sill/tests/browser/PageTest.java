package sill.tests.browser;

import static org.assertj.core.api.Assertions.assertThat;

import com.deque.html.axecore.results.Results;
import com.deque.html.axecore.selenium.AxeBuilder;
import java.io.OutputStream;
import java.io.PrintStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import java.util.stream.Stream;
import org.junit.jupiter.api.AfterAll;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.TestInstance;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.MethodSource;
import org.junit.jupiter.params.provider.ValueSource;
import org.openqa.selenium.By;
import org.openqa.selenium.Keys;
import org.openqa.selenium.WebElement;
import sill.cli.Main;
import sill.record.DesignRecord;
import sill.record.html.RecordPage;
import sill.tests.Clone;

/** The page of a record as people meet it: on a wide and a narrow screen, light and dark, on paper, read aloud. */
@TestInstance(TestInstance.Lifecycle.PER_CLASS)
class PageTest {
    private Path folder;
    private Browser browser;

    @BeforeAll
    void startBrowser(@TempDir Path temporary) throws Exception {
        folder = temporary;
        write("everything", SampleRecord.everything());
        write("holding", SampleRecord.holding());
        Path studied = Clone.root().resolve("worksheets/cabinet-fan/cabinet-fan.sill");
        PrintStream nowhere = new PrintStream(OutputStream.nullOutputStream());
        assertThat(Main.run(nowhere, nowhere, "run", studied.toString(), "--out", folder.toString(), "--quiet"))
                .isZero();
        browser = Browser.start();
    }

    @AfterAll
    void stopBrowser() {
        if (browser != null) {
            browser.close();
        }
    }

    private void write(String name, DesignRecord record) throws Exception {
        Files.writeString(file(name), RecordPage.write(record));
    }

    private Path file(String name) {
        return folder.resolve(name + ".html");
    }

    static Stream<Arguments> views() {
        return Stream.of("everything", "holding", "cabinet-fan")
                .flatMap(page -> Stream.of("light", "dark")
                        .flatMap(scheme -> Stream.of(1200, 400).map(width -> Arguments.of(page, scheme, width))));
    }

    /** Each takes seconds, so the schemes and widths are spread over the pages. */
    @ParameterizedTest
    @CsvSource({"everything, light, 1200", "everything, dark, 400", "holding, dark, 1200", "cabinet-fan, light, 400"})
    void nothingInTheWayOfAReader(String page, String scheme, int width) {
        browser.open(file(page), width, scheme);
        // Folded parts count too: a reader opens them.
        browser.evaluate("document.querySelectorAll('details').forEach(part => part.open = true)");
        Results results = new AxeBuilder().analyze(browser.driver());
        assertThat(results.getPasses()).hasSizeGreaterThan(15);
        assertThat(results.getViolations())
                .as("axe-core 4.10 violations")
                .allSatisfy(rule -> assertThat(rule.getId() + " " + rule.getHelp() + " "
                                + rule.getNodes().stream()
                                        .map(node -> node.getTarget() + node.getHtml())
                                        .toList())
                        .isEmpty());
    }

    @ParameterizedTest
    @MethodSource("views")
    void thePageNeverScrollsSideways(String page, String scheme, int width) {
        browser.open(file(page), width, scheme);
        browser.evaluate("document.querySelectorAll('details').forEach(part => part.open = true)");
        assertThat(browser.evaluate("document.documentElement.scrollWidth - document.documentElement.clientWidth"))
                .isEqualTo(0L);
    }

    @Test
    void darkAndLightDiffer() {
        browser.open(file("holding"), 1200, "light");
        Object light = browser.evaluate("getComputedStyle(document.body).backgroundColor");
        browser.open(file("holding"), 1200, "dark");
        Object dark = browser.evaluate("getComputedStyle(document.body).backgroundColor");
        assertThat(light).isEqualTo("rgb(253, 254, 252)");
        assertThat(dark).isEqualTo("rgb(21, 28, 25)");
    }

    @ParameterizedTest
    @ValueSource(strings = {"everything", "holding", "cabinet-fan"})
    void itIsValidHtml(String page) throws Exception {
        assertThat(HtmlValidator.complaints(Files.readString(file(page)))).isEmpty();
    }

    @Test
    void theValidatorSeesAFault() throws Exception {
        String page = Files.readString(file("holding")).replace("<main>", "<main><p id=\"checks\">");
        assertThat(HtmlValidator.complaints(page)).isNotEmpty();
    }

    /** What the validator's older CSS checker cannot say: a browser knows every property and value of the style sheet. */
    @Test
    void theStyleSheetIsUnderstood() {
        browser.open(file("holding"), 1200, "light");
        Object unknown = browser.evaluate(
                "document.querySelector('style').textContent"
                        + ".replace(/\\/\\*[^]*?\\*\\//g, '').replace(/@page[^]*?(?=@media)/, '')"
                        + ".match(/[{;]\\s*[a-z-]+\\s*:\\s*[^;{}]+(?=[;}])/g)"
                        + ".map(text => text.slice(1).trim()).filter(text => !text.startsWith('--'))"
                        + ".filter(text => !CSS.supports(text.slice(0, text.indexOf(':')), text.slice(text.indexOf(':') + 1)))");
        assertThat(unknown).isEqualTo(List.of());
    }

    @Test
    void hostileTextsDoNothing() {
        browser.open(file("everything"), 1200, "light");
        assertThat(browser.driver().getTitle()).isEqualTo("SP-207 Sump level switch, cable cellar");
        assertThat(browser.evaluate(
                        "document.querySelectorAll('img, iframe, script:not(#sill-record, main ~ script)').length"))
                .isEqualTo(0L);
        assertThat(browser.evaluate("document.scripts.length")).isEqualTo(2L);
        assertThat(browser.evaluate("[...document.querySelectorAll('*')].flatMap(e => [...e.attributes])"
                        + ".filter(a => a.name.startsWith('on')).length"))
                .isEqualTo(0L);
        assertThat(browser.evaluate("performance.getEntriesByType('resource').length"))
                .isEqualTo(0L);
        assertThat(browser.evaluate(
                        "JSON.parse(document.getElementById('sill-record').textContent).cells.at(-1).caption"))
                .isEqualTo(SampleRecord.HOSTILE);
    }

    @Test
    void everyAddressLeadsToOnePlace() {
        browser.open(file("everything"), 1200, "light");
        assertThat(browser.evaluate("[...document.querySelectorAll('a[href^=\"#\"]')].filter(a =>"
                        + " document.querySelectorAll('[id=\"' + a.getAttribute('href').slice(1) + '\"]').length != 1)"
                        + ".map(a => a.outerHTML)"))
                .isEqualTo(List.of());
    }

    @Test
    void theFullValueIsReachedByKeyboard() {
        browser.open(file("holding"), 1200, "light");
        assertThat(browser.evaluate("document.querySelectorAll('.line details.result').length"))
                .isEqualTo(5L);
        assertThat(browser.evaluate("[...document.querySelectorAll('details.result')].every(d =>"
                        + " d.firstElementChild.tagName == 'SUMMARY' && d.firstElementChild.tabIndex == 0)"))
                .isEqualTo(true);
    }

    /** Without a script: a summary opens by key and by tap, and the links inside lead to marked lines. */
    @Test
    void theTraceIsReachedByKeyAndByTap() {
        browser.open(file("holding"), 400, "light");
        WebElement name = browser.driver().findElement(By.cssSelector(".givens .traced > summary"));
        assertThat(browser.driver()
                        .findElement(By.cssSelector(".givens .trace a"))
                        .isDisplayed())
                .isFalse();
        name.sendKeys(Keys.ENTER);
        WebElement user = browser.driver().findElement(By.cssSelector(".givens .trace a"));
        assertThat(user.isDisplayed()).isTrue();
        name.sendKeys(Keys.TAB);
        assertThat(browser.driver().switchTo().activeElement()).isEqualTo(user);
        user.sendKeys(Keys.ENTER);
        assertThat(browser.evaluate("getComputedStyle(document.querySelector(':target')).outlineStyle"))
                .isEqualTo("solid");
        assertThat(browser.evaluate("document.querySelector(':target').closest('.line, tr') != null"))
                .isEqualTo(true);
        WebElement result = browser.driver().findElement(By.cssSelector(".line .result > summary"));
        result.click();
        assertThat(browser.driver()
                        .findElement(By.cssSelector(".line .result .trace"))
                        .isDisplayed())
                .isTrue();
    }

    /** At 100 % the text of a box is at least 11 pixels high, however wide the drawing is. */
    @ParameterizedTest
    @ValueSource(ints = {1200, 400})
    void theDrawingIsReadable(int width) {
        browser.open(file("everything"), width, "light");
        assertThat(browser.evaluate("Math.min(...[...document.querySelectorAll('.trace-drawing text')].map(text =>"
                        + " parseFloat(getComputedStyle(text).fontSize) * text.getScreenCTM().a)) >= 11"))
                .isEqualTo(true);
        // No text runs out of its box: 1 pixel for the difference between fonts.
        assertThat(
                        browser.evaluate(
                                "[...document.querySelectorAll('.trace-drawing .node')].filter(node =>"
                                        + " [...node.querySelectorAll('text')].some(text => text.getBBox().x + text.getBBox().width >"
                                        + " node.getBBox().x + node.querySelector('.box').getBBox().width + 1)).map(node => node.textContent)"))
                .isEqualTo(List.of());
    }

    /** A4 is 210 mm by 297 mm (ISO 216:2007), which is 595.3 by 841.9 points of 1/72 inch; a wide trace lies across, here in two parts. */
    @Test
    void itPrintsOnA4() {
        browser.open(file("everything"), 1200, "dark");
        String pdf = new String(browser.print(), StandardCharsets.ISO_8859_1);
        Matcher box =
                Pattern.compile("/MediaBox \\[\\s*0 0 ([0-9.]+) ([0-9.]+)\\s*]").matcher(pdf);
        int pages = 0;
        int across = 0;
        while (box.find()) {
            pages++;
            double width = Double.parseDouble(box.group(1));
            double height = Double.parseDouble(box.group(2));
            assertThat(Math.min(width, height)).isBetween(594.0, 597.0);
            assertThat(Math.max(width, height)).isBetween(840.0, 843.0);
            across += width > height ? 1 : 0;
        }
        assertThat(pages).isBetween(3, 20);
        assertThat(across).isEqualTo(2);
    }

    /** What sticks out over the paper's edge would be cut off; 175 mm are left between the margins, and more for a trace across. */
    @Test
    void nothingIsCutOffOnPaper() {
        browser.open(file("everything"), (int) (175 / 25.4 * 96), "light");
        browser.driver()
                .executeCdpCommand("Emulation.setEmulatedMedia", Map.of("media", "print", "features", List.of()));
        assertThat(browser.evaluate(
                        "[...document.querySelectorAll('body *:not(svg *, .trace-part)')].filter(e => e.getBoundingClientRect().right >"
                                + " document.documentElement.clientWidth + 1).map(e => e.outerHTML.slice(0, 200))"))
                .isEqualTo(List.of());
        browser.driver().executeCdpCommand("Emulation.setEmulatedMedia", Map.of("media", "", "features", List.of()));
    }

    @Test
    void aMissingBrowserSaysHowToGetIt() {
        assertThat(Browser.missing(Path.of("/usr/bin/chromium")))
                .isEqualTo("the browser tests need /usr/bin/chromium, which is not there;"
                        + " on Debian: apt-get install chromium chromium-driver");
    }
}
