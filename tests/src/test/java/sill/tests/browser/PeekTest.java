package sill.tests.browser;

import static org.assertj.core.api.Assertions.assertThat;

import java.nio.file.Path;
import java.time.Duration;
import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.AfterAll;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.TestInstance;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.openqa.selenium.By;
import org.openqa.selenium.Keys;
import org.openqa.selenium.WebElement;
import org.openqa.selenium.interactions.Actions;
import org.openqa.selenium.interactions.PointerInput;
import org.openqa.selenium.interactions.Sequence;
import org.openqa.selenium.support.ui.ExpectedConditions;
import org.openqa.selenium.support.ui.WebDriverWait;

/** Names in formulas and trace lists: on hover, focus or tap what the page tells of them. */
@TestInstance(TestInstance.Lifecycle.PER_CLASS)
class PeekTest {
    private static final String SHEET = """
            sill 1
            title: Names
            :: given Supply and parts
            vSupply = 24 V ± 5 % | cabinet supply
            rTop = 10 kΩ
            rBottom = 1 kΩ
            kappa = 2
            gains = [1, 2, 5]
            :: calc Output
            double vOut = Dividers.output(vSupply, rTop, rBottom); // of the divider
            double[] steps = {vOut, vSupply};
            double width = vOut / (kappa * vSupply) + pow(kappa, vOut / vSupply);
            double step = steps[1] / gains[2];
            :: check Requirements
            width at most 3 | REQ-01
            """;

    private static final By SUPPLY = By.cssSelector("math .at-1\\.1");
    /** The same name in the trace list of a result. */
    private static final By LISTED = By.cssSelector(".result .trace a[href='#at-1.1']");

    private static final By PANEL = By.cssSelector(".peek");

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
    void eachNameOfAFormulaLeadsToItsLine() {
        browser.open(page, 1200, "light");
        assertThat(browser.evaluate("[...document.querySelectorAll('.formula')].map(side =>"
                        + " [...side.querySelectorAll('[class*=at-]')].map(name =>"
                        + " name.textContent + ' ' + name.className.replace('word ', '')).join(', '))"))
                .isEqualTo(List.of(
                        "v at-1.1, r at-1.2, r at-1.3",
                        // Names of the helper's own formula.
                        "",
                        "v at-2.1, κ at-1.4, v at-1.1, κ at-1.4, v at-2.1, v at-1.1",
                        "steps at-2.2, gains at-1.5"));
        assertThat(browser.evaluate("document.querySelectorAll('.side:not(.formula) [class*=at-]').length"))
                .isEqualTo(0L);
    }

    @Test
    void hoveringTellsOfANameAndStays() {
        browser.open(page, 1200, "light");
        WebElement name = browser.driver().findElement(SUPPLY);
        new Actions(browser.driver()).moveToElement(name).perform();
        WebElement panel = shown();
        assertThat(panel.getText()).isEqualTo("""
                        1.1 Supply and parts
                        v
                        Supply
                        vSupply = 24 V
                        cabinet supply
                        Used by
                        vOut; steps; width
                        and so by
                        step; width at most 3""");
        assertThat(name.getAttribute("class")).isEqualTo("at-1.1 peeked");
        new Actions(browser.driver())
                .moveToElement(panel)
                .pause(Duration.ofMillis(600))
                .perform();
        assertThat(panel.isDisplayed()).isTrue();
        assertThat(browser.evaluate("document.querySelectorAll('.peek [id]').length"))
                .isEqualTo(0L);
        new Actions(browser.driver())
                .moveToElement(browser.driver().findElement(By.tagName("h1")))
                .perform();
        gone();
        assertThat(name.getAttribute("class")).isEqualTo("at-1.1");
    }

    /** The whole symbol tells, its index too. */
    @Test
    void theIndexBelongsToTheName() {
        browser.open(page, 1200, "light");
        WebElement index = browser.driver().findElement(By.xpath("//*[local-name()='msub'][*[@class='at-1.1']]/*[2]"));
        new Actions(browser.driver()).moveToElement(index).perform();
        assertThat(shown().getText()).startsWith("1.1 Supply and parts");
        new Actions(browser.driver()).moveToElement(index).click().perform();
        assertThat(browser.evaluate("location.hash")).isEqualTo("#at-1.1");
        gone();
    }

    @Test
    void aResultTellsWhatItRestsOnDownToTheGivens() {
        browser.open(page, 1200, "light");
        new Actions(browser.driver())
                .moveToElement(browser.driver().findElement(By.cssSelector("math .at-2\\.2")))
                .perform();
        assertThat(shown().getText()).isEqualTo("""
                        2.2 Output
                        steps = 2.182 V, 24.00 V
                        Made from
                        vSupply = 24 V (1.1); vOut = 2.182 V (2.1)
                        and so from
                        rTop; rBottom
                        Used by
                        step""");
    }

    @Test
    void escapeClosesAndHoverOpensAgain() {
        browser.open(page, 1200, "light");
        WebElement name = browser.driver().findElement(SUPPLY);
        new Actions(browser.driver()).moveToElement(name).perform();
        shown();
        new Actions(browser.driver()).sendKeys(Keys.ESCAPE).perform();
        gone();
        new Actions(browser.driver())
                .moveToElement(browser.driver().findElement(By.tagName("h1")))
                .moveToElement(name)
                .perform();
        shown();
    }

    @Test
    void byKeyboardInAndOut() {
        browser.open(page, 1200, "light");
        browser.evaluate("document.querySelector('.result').open = true");
        WebElement name = tabTo(LISTED);
        assertThat(shown().getText()).endsWith("Enter: to line 1.1. Arrow down: into this box. Escape: close.");
        assertThat(name.getAttribute("aria-expanded")).isEqualTo("true");
        assertThat(browser.evaluate("getComputedStyle(document.activeElement).outlineStyle"))
                .isEqualTo("solid");
        name.sendKeys(Keys.ARROW_DOWN);
        assertThat(focused().getText()).isEqualTo("1.1");
        assertThat(browser.evaluate("document.activeElement.closest('.peek') !== null"))
                .isEqualTo(true);
        focused().sendKeys(Keys.chord(Keys.SHIFT, Keys.TAB));
        assertThat(focused()).isEqualTo(name);
        name.sendKeys(Keys.ARROW_DOWN);
        for (int i = 0; i < 6; i++) {
            focused().sendKeys(Keys.TAB);
        }
        // Behind the last link of the panel comes the name after this one.
        assertThat(focused().getAttribute("href")).endsWith("#at-1.2");
        focused().sendKeys(Keys.ARROW_DOWN);
        focused().sendKeys(Keys.ESCAPE);
        gone();
        assertThat(focused().getAttribute("href")).endsWith("#at-1.2");
        focused().sendKeys(Keys.ENTER);
        assertThat(browser.evaluate("location.hash")).isEqualTo("#at-1.2");
        gone();
    }

    @Test
    void aTapTellsAndASecondOneFollows() {
        browser.open(page, 400, "dark");
        WebElement name = browser.driver().findElement(SUPPLY);
        browser.evaluate("document.querySelector('math .at-1\\\\.1').scrollIntoView({block: 'center'})");
        tap(name);
        WebElement panel = shown();
        assertThat(browser.evaluate("location.hash")).isEqualTo("");
        assertThat(panel.getRect().getX()).isNotNegative();
        assertThat(panel.getRect().getX() + panel.getRect().getWidth()).isLessThanOrEqualTo(400);
        tap(browser.driver().findElement(By.cssSelector(".cell h3")));
        gone();
        tap(name);
        shown();
        tap(name);
        gone();
        assertThat(browser.evaluate("location.hash")).isEqualTo("#at-1.1");
    }

    @Test
    void aNameInATraceListTellsToo() {
        browser.open(page, 1200, "light");
        browser.evaluate("document.querySelectorAll('details').forEach(part => part.open = true)");
        new Actions(browser.driver())
                .moveToElement(browser.driver().findElement(By.cssSelector(".result .trace a[href='#at-1.2']")))
                .perform();
        assertThat(shown().getText()).startsWith("1.2 Supply and parts\nr\nTop\nrTop = 10 kΩ\nUsed by\nvOut");
    }

    @ParameterizedTest
    @CsvSource({"1200, light", "400, dark"})
    void nothingInTheWayOfAReader(int width, String scheme) {
        browser.open(page, width, scheme);
        hover(SUPPLY);
        shown();
        assertThat(Axe.violations(browser)).isEmpty();
        assertThat(browser.evaluate("document.documentElement.scrollWidth <= document.documentElement.clientWidth ? []"
                        + " : [...document.querySelectorAll('body *:not(.scrolling *)')].filter(e => e.getBoundingClientRect().right >"
                        + " document.documentElement.clientWidth).map(e => e.outerHTML.slice(0, 99))"))
                .isEqualTo(List.of());
    }

    @Test
    void withoutAScriptTheListsHaveLinks() {
        browser.driver().executeCdpCommand("Emulation.setScriptExecutionDisabled", Map.of("value", true));
        try {
            browser.open(page, 1200, "light");
            new Actions(browser.driver())
                    .moveToElement(browser.driver().findElement(SUPPLY))
                    .pause(Duration.ofMillis(500))
                    .perform();
            assertThat(browser.driver().findElements(PANEL)).isEmpty();
            browser.driver().findElement(By.cssSelector(".result summary")).click();
            browser.driver().findElement(LISTED).click();
            assertThat(browser.driver().getCurrentUrl()).endsWith("#at-1.1");
        } finally {
            browser.driver().executeCdpCommand("Emulation.setScriptExecutionDisabled", Map.of("value", false));
        }
    }

    @Test
    void nothingOfItShowsOnPaper() {
        browser.open(page, 1200, "light");
        hover(SUPPLY);
        WebElement panel = shown();
        browser.driver()
                .executeCdpCommand("Emulation.setEmulatedMedia", Map.of("media", "print", "features", List.of()));
        try {
            assertThat(panel.isDisplayed()).isFalse();
            assertThat(browser.evaluate("getComputedStyle(document.querySelector('math .peeked')).color"
                            + " === getComputedStyle(document.querySelector('math')).color"))
                    .isEqualTo(true);
        } finally {
            browser.driver()
                    .executeCdpCommand("Emulation.setEmulatedMedia", Map.of("media", "", "features", List.of()));
        }
    }

    /** Nothing moves, so there is nothing to reduce. */
    @Test
    void nothingMoves() {
        browser.open(page, 1200, "light");
        hover(SUPPLY);
        shown();
        assertThat(browser.evaluate("document.getAnimations().length")).isEqualTo(0L);
        assertThat(browser.evaluate("getComputedStyle(document.querySelector('.peek')).transitionDuration"))
                .isEqualTo("0s");
    }

    private void hover(By place) {
        new Actions(browser.driver())
                .moveToElement(browser.driver().findElement(place))
                .perform();
    }

    private WebElement shown() {
        return new WebDriverWait(browser.driver(), Duration.ofSeconds(10))
                .until(ExpectedConditions.visibilityOfElementLocated(PANEL));
    }

    private void gone() {
        new WebDriverWait(browser.driver(), Duration.ofSeconds(10))
                .until(ExpectedConditions.numberOfElementsToBe(PANEL, 0));
    }

    private WebElement focused() {
        return browser.driver().switchTo().activeElement();
    }

    private WebElement tabTo(By place) {
        WebElement wanted = browser.driver().findElement(place);
        for (int i = 0; i < 60; i++) {
            new Actions(browser.driver()).sendKeys(Keys.TAB).perform();
            if (focused().equals(wanted)) {
                return wanted;
            }
        }
        throw new AssertionError("no tab stop within 60: " + place);
    }

    private void tap(WebElement place) {
        PointerInput finger = new PointerInput(PointerInput.Kind.TOUCH, "finger");
        browser.driver()
                .perform(List.of(new Sequence(finger, 0)
                        .addAction(
                                finger.createPointerMove(Duration.ZERO, PointerInput.Origin.fromElement(place), 0, 0))
                        .addAction(finger.createPointerDown(PointerInput.MouseButton.LEFT.asArg()))
                        .addAction(finger.createPointerUp(PointerInput.MouseButton.LEFT.asArg()))));
    }
}
