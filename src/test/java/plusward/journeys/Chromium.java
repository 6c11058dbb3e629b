package plusward.journeys;

import com.microsoft.playwright.Browser;
import com.microsoft.playwright.BrowserContext;
import com.microsoft.playwright.BrowserType;
import com.microsoft.playwright.Page;
import com.microsoft.playwright.Playwright;
import com.microsoft.playwright.options.ColorScheme;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import org.junit.jupiter.api.Assumptions;

/** A real browser for tests; where none is installed the tests that need it are skipped with one loud line. */
final class Chromium implements AutoCloseable {

    private static final Path PROGRAM = Path.of("/usr/bin/chromium");
    private static final List<String> ARGUMENTS = List.of(
            "--no-sandbox",
            "--disable-gpu",
            "--disable-quic",
            "--no-first-run",
            "--disable-background-networking",
            "--disable-component-update",
            "--disable-sync");

    private final Playwright playwright;
    private final Browser browser;

    private Chromium(Playwright playwright, Browser browser) {
        this.playwright = playwright;
        this.browser = browser;
    }

    static Chromium start() {
        if (!Files.isExecutable(PROGRAM)) {
            System.err.println("SKIPPED BROWSER TESTS: no Chromium at " + PROGRAM + "; install the package chromium");
            Assumptions.abort("no Chromium at " + PROGRAM);
        }
        Playwright playwright = Playwright.create();
        Browser browser = playwright
                .chromium()
                .launch(new BrowserType.LaunchOptions()
                        .setExecutablePath(PROGRAM)
                        .setArgs(ARGUMENTS));
        return new Chromium(playwright, browser);
    }

    /** A fresh profile with a window of this size. */
    Page page(int width, int height, ColorScheme scheme) {
        BrowserContext context = browser.newContext(
                new Browser.NewContextOptions().setViewportSize(width, height).setColorScheme(scheme));
        return context.newPage();
    }

    Page page() {
        return page(1280, 900, ColorScheme.LIGHT);
    }

    @Override
    public void close() {
        browser.close();
        playwright.close();
    }
}
