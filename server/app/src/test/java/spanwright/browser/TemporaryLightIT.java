package spanwright.browser;

import static com.microsoft.playwright.assertions.PlaywrightAssertions.assertThat;
import static org.assertj.core.api.Assertions.assertThat;

import com.microsoft.playwright.options.ColorScheme;
import org.junit.jupiter.api.AfterAll;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;

/** A temporary path of the demo's backhoe, by keyboard: seen on the map, posted, listed, and undone. */
class TemporaryLightIT {

    /** The temporary path that the map draws. */
    private static final String WAY =
            "document.querySelector('sw-map').drawing.marks.stretches.find((each) => each.kind === 'spare')";

    private static ChromiumBrowser browser;
    private static DemoServer server;

    @BeforeAll
    static void open() {
        browser = ChromiumBrowser.open();
        server = DemoServer.start();
    }

    @AfterAll
    static void close() {
        server.close();
        browser.close();
    }

    @Test
    void a_path_is_drawn_posted_listed_and_undone() {
        try (OpenPage opened = opened("#/outage/light?cut=span:HH-S044_HH-S045")) {
            opened.find("sw-light button.main").focus();
            enter(opened);
            opened.find(".offer summary").first().focus();
            enter(opened);
            opened.page().waitForFunction("() => " + WAY + " !== undefined");
            opened.settle();
            assertThat(lines(opened)).isGreaterThan(10);
            assertThat(PagesSoundIT.violations(opened)).isEmpty();

            opened.find(".offer[open] sw-post-light button").focus();
            enter(opened);
            assertThat(opened.find("sw-post-light input[name=by]")).isFocused();
            assertThat(opened.find(".post-light")).containsText("Into the records");
            assertThat(PagesSoundIT.violations(opened)).isEmpty();
            opened.page().keyboard().insertText("Dana");
            enter(opened);
            assertThat(opened.find("sw-post-light .posted")).containsText("Posted as posting 2");
            assertThat(opened.find("sw-post-light .posted")).isFocused();

            opened.find(".offer summary").first().focus();
            enter(opened);
            opened.page().waitForFunction("() => " + WAY + " === undefined");
        }
        undo();
    }

    private static void undo() {
        try (OpenPage opened = opened("#/outage/incident")) {
            assertThat(opened.find(".temporary caption", "Light another way").first())
                    .containsText("Dana");
            opened.find("button.undo", "Undo posting 2").focus();
            enter(opened);
            assertThat(opened.find("sw-temporary input[name=by]")).isFocused();
            assertThat(PagesSoundIT.violations(opened)).isEmpty();
            opened.page().keyboard().insertText("Dana");
            enter(opened);
            assertThat(opened.find(".undone")).containsText("Posting 2 is undone, by posting 3");
            assertThat(opened.find(".temporary caption", "Light another way")).hasCount(0);
        }
    }

    private static int lines(OpenPage opened) {
        return ((Number) opened.page().evaluate("() => " + WAY + ".lines.length")).intValue();
    }

    private static void enter(OpenPage opened) {
        opened.press("Enter");
        opened.settle();
    }

    private static OpenPage opened(String hash) {
        return OpenPage.open(browser, server, hash, 1366, 768, ColorScheme.LIGHT);
    }
}
