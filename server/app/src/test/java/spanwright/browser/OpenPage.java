package spanwright.browser;

import com.microsoft.playwright.BrowserContext;
import com.microsoft.playwright.Locator;
import com.microsoft.playwright.Page;
import com.microsoft.playwright.options.ColorScheme;
import java.net.URI;
import java.util.ArrayList;
import java.util.List;

/**
 * One page of the program open in a browser of its own profile, with everything noted that a page must not do: errors
 * on its console, and requests to another host.
 */
final class OpenPage implements AutoCloseable {

    private final String address;
    private final BrowserContext context;
    private final Page page;
    private final List<String> errors = new ArrayList<>();
    private final List<String> elsewhere = new ArrayList<>();

    private OpenPage(String address, BrowserContext context) {
        this.address = address;
        this.context = context;
        this.page = context.newPage();
        String host = URI.create(address).getAuthority();
        page.onConsoleMessage(message -> {
            if (message.type().equals("error") || message.type().equals("warning")) {
                errors.add(message.text());
            }
        });
        page.onPageError(errors::add);
        page.onRequest(request -> {
            String asked = URI.create(request.url()).getAuthority();
            if (!host.equals(asked)) {
                elsewhere.add(request.url());
            }
        });
    }

    /** Opens the view that {@code hash} names, on a screen of the given size in CSS pixels, by day or by night. */
    static OpenPage open(
            ChromiumBrowser browser, DemoServer server, String hash, int width, int height, ColorScheme theme) {
        OpenPage opened = new OpenPage(server.address(), browser.context(width, height));
        opened.page.emulateMedia(new Page.EmulateMediaOptions().setColorScheme(theme));
        opened.go(hash);
        return opened;
    }

    /** Goes on with the same page on another screen, by day or by night. */
    void change(int width, int height, ColorScheme theme) {
        page.setViewportSize(width, height);
        page.emulateMedia(new Page.EmulateMediaOptions().setColorScheme(theme));
        settle();
    }

    /** Opens another view in the same page, as a link pasted into the address line does. */
    void go(String hash) {
        page.navigate(address + "/" + hash);
        settle();
    }

    /** Waits until everything that the view asked for is there and drawn. */
    void settle() {
        page.waitForLoadState();
        page.waitForFunction("() => {"
                + " const shell = document.querySelector('sw-shell');"
                + " const busy = (part) => part?.asking?.pending || part?.stock?.abort;"
                + " return shell?.status?.answer && !shell.status.pending && !shell.tracing.pending"
                + "  && [...shell.querySelectorAll('*')].every((part) => !busy(part)); }");
        page.evaluate("() => new Promise((drawn) => requestAnimationFrame(() => requestAnimationFrame(drawn)))");
    }

    Page page() {
        return page;
    }

    Locator find(String selector) {
        return page.locator(selector);
    }

    /** The parts that {@code selector} names and that hold {@code text}. */
    Locator find(String selector, String text) {
        return page.locator(selector, new Page.LocatorOptions().setHasText(text));
    }

    /** Presses a key where the focus is. */
    void press(String key) {
        page.keyboard().press(key);
    }

    /** What the browser's console called an error or a warning. */
    List<String> errors() {
        return List.copyOf(errors);
    }

    /** Requests that went to another host than the server. */
    List<String> requestsElsewhere() {
        return List.copyOf(elsewhere);
    }

    @Override
    public void close() {
        context.close();
    }
}
