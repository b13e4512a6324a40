package sill.tests.browser;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Base64;
import java.util.Comparator;
import java.util.List;
import java.util.Map;
import java.util.stream.Stream;
import org.junit.jupiter.api.Assumptions;
import org.openqa.selenium.OutputType;
import org.openqa.selenium.chrome.ChromeDriver;
import org.openqa.selenium.chrome.ChromeDriverService;
import org.openqa.selenium.chrome.ChromeOptions;

/** A headless Chromium with an empty profile of its own, which goes when it is closed. It needs no network. */
final class Browser implements AutoCloseable {
    private static final List<Path> PROGRAMS = List.of(Path.of("/usr/bin/chromium"), Path.of("/usr/bin/chromedriver"));

    private final Path profile;
    private final ChromeDriver driver;

    private Browser(Path profile, ChromeDriver driver) {
        this.profile = profile;
        this.driver = driver;
    }

    /**
     * Starts a browser. Where there is none the test is skipped and says so; a build server, which sets {@code CI}, must have
     * one: there a page that nobody looked at is not tested.
     */
    static Browser start() {
        for (Path program : PROGRAMS) {
            if (!Files.isExecutable(program)) {
                if (System.getenv("CI") == null) {
                    Assumptions.abort(missing(program));
                }
                throw new AssertionError(missing(program));
            }
        }
        try {
            Path profile = Files.createTempDirectory("sill-browser");
            ChromeOptions options = new ChromeOptions();
            options.setBinary(PROGRAMS.get(0).toFile());
            options.addArguments(
                    "--headless=new",
                    "--no-sandbox",
                    "--disable-gpu",
                    "--disable-dev-shm-usage",
                    "--disable-quic",
                    "--no-first-run",
                    "--disable-background-networking",
                    "--disable-component-update",
                    "--disable-sync",
                    "--user-data-dir=" + profile);
            ChromeDriverService service = new ChromeDriverService.Builder()
                    .usingDriverExecutable(PROGRAMS.get(1).toFile())
                    .build();
            return new Browser(profile, new ChromeDriver(service, options));
        } catch (IOException e) {
            throw new UncheckedIOException("the temporary folder must be writable", e);
        }
    }

    static String missing(Path program) {
        return "the browser tests need " + program
                + ", which is not there; on Debian: apt-get install chromium chromium-driver";
    }

    ChromeDriver driver() {
        return driver;
    }

    /** Opens a page as a screen of a width would show it. */
    void open(Path page, int width, String scheme) {
        driver.executeCdpCommand(
                "Emulation.setDeviceMetricsOverride",
                Map.of("width", width, "height", 900, "deviceScaleFactor", 1, "mobile", false));
        driver.executeCdpCommand(
                "Emulation.setEmulatedMedia",
                Map.of("features", List.of(Map.of("name", "prefers-color-scheme", "value", scheme))));
        driver.get(page.toUri().toString());
    }

    /** What a script in the page gives. */
    Object evaluate(String script) {
        return driver.executeScript("return " + script);
    }

    /** The visible page as a PNG. */
    byte[] screenshot() {
        return driver.getScreenshotAs(OutputType.BYTES);
    }

    /** The page as a PDF, on the paper that its style sheet asks for. */
    byte[] print() {
        Map<String, Object> printed = driver.executeCdpCommand("Page.printToPDF", Map.of("preferCSSPageSize", true));
        return Base64.getDecoder().decode((String) printed.get("data"));
    }

    @Override
    public void close() {
        driver.quit();
        try (Stream<Path> files = Files.walk(profile)) {
            files.sorted(Comparator.reverseOrder())
                    .forEach(file -> file.toFile().delete());
        } catch (IOException e) {
            throw new UncheckedIOException("the browser's profile must be removable", e);
        }
    }
}
