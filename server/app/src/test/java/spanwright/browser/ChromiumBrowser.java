package spanwright.browser;

import com.microsoft.playwright.Browser;
import com.microsoft.playwright.BrowserContext;
import com.microsoft.playwright.BrowserType;
import com.microsoft.playwright.Page;
import com.microsoft.playwright.Playwright;
import java.util.List;
import java.util.Map;

/**
 * A headless Chromium to open pages in. For one thread; a test class opens one and closes it at its end.
 */
public final class ChromiumBrowser implements AutoCloseable {

    /** As root there is no sandbox to be had; the rest keeps the browser from calling anyone on its own. */
    private static final List<String> FLAGS = List.of(
            "--no-sandbox",
            "--disable-gpu",
            "--disable-quic",
            "--no-first-run",
            "--disable-background-networking",
            "--disable-component-update",
            "--disable-sync");

    private final Playwright playwright;
    private final Browser browser;

    private ChromiumBrowser(Playwright playwright, Browser browser) {
        this.playwright = playwright;
        this.browser = browser;
    }

    /**
     * Starts the browser; see {@link Chromium#executable()} for which.
     *
     * @throws IllegalStateException where no browser is found or to be installed
     */
    public static ChromiumBrowser open() {
        Playwright playwright = Playwright.create(
                new Playwright.CreateOptions().setEnv(Map.of("PLAYWRIGHT_SKIP_BROWSER_DOWNLOAD", "1")));
        Browser browser = playwright
                .chromium()
                .launch(new BrowserType.LaunchOptions()
                        .setExecutablePath(Chromium.executable())
                        .setArgs(FLAGS)
                        .setHeadless(true));
        return new ChromiumBrowser(playwright, browser);
    }

    /** A new page {@code width} by {@code height} CSS pixels, with cookies and storage of its own. */
    public Page page(int width, int height) {
        return context(width, height).newPage();
    }

    /** A new profile, with cookies and storage of its own, whose pages are {@code width} by {@code height} CSS pixels. */
    public BrowserContext context(int width, int height) {
        return browser.newContext(new Browser.NewContextOptions().setViewportSize(width, height));
    }

    /** Ends the browser and all its pages. */
    @Override
    public void close() {
        browser.close();
        playwright.close();
    }
}
