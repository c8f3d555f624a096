package spanwright.browser;

import static org.assertj.core.api.Assertions.assertThat;

import com.microsoft.playwright.APIResponse;
import com.microsoft.playwright.options.ColorScheme;
import java.nio.charset.StandardCharsets;
import org.junit.jupiter.api.AfterAll;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/**
 * The papers for the crew as a dispatcher comes to them: from the outage desk's view, by keyboard, to a page that is
 * sound for everyone (WCAG 2.2 AA, checked by axe-core) and to a PDF.
 */
class PaperIT {

    private static final String READING =
            "#/outage/reading?trace=port:HE-1/FDR-S/72&port=HE-1/FDR-S/72&distance=7412" + "&event=C-S03=6038";

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

    @ParameterizedTest
    @CsvSource({
        "#/outage/down?cut=span:HH-S044_HH-S045, /paper/cut-list, FDR-S-1",
        READING + ", /paper/crew, 19784",
    })
    void a_paper_is_reached_by_keyboard_and_sound_and_prints_as_a_pdf(String hash, String paper, String holds) {
        try (OpenPage opened = OpenPage.open(browser, server, hash, 1366, 768, ColorScheme.LIGHT)) {
            for (String size : new String[] {"a4", "letter"}) {
                opened.go(hash);
                String link = opened.find("a[href^='" + paper + "?'][href$='paper=" + size + "']")
                        .first()
                        .getAttribute("href");
                String pdf = opened.find("a[href^='" + paper + ".pdf?'][href$='paper=" + size + "']")
                        .first()
                        .getAttribute("href");
                focusAndEnter(opened, link);
                assertThat(opened.page().locator("body").innerText()).contains(holds);
                assertThat(PagesSoundIT.violations(opened))
                        .as("violations, " + link)
                        .isEmpty();
                APIResponse printed = opened.page().request().get(server.address() + pdf);
                assertThat(printed.status()).isEqualTo(200);
                assertThat(printed.headers().get("content-type")).startsWith("application/pdf");
                assertThat(new String(printed.body(), 0, 5, StandardCharsets.US_ASCII))
                        .isEqualTo("%PDF-");
            }
            assertThat(opened.requestsElsewhere()).as("requests elsewhere").isEmpty();
            assertThat(opened.errors()).as("errors").isEmpty();
        }
    }

    /** The link is one that the keyboard reaches; it opens here, where a new tab would be asked for, to be looked at. */
    private static void focusAndEnter(OpenPage opened, String link) {
        String selector = "a[href='" + link + "']";
        opened.find(selector).first().evaluate("each => each.removeAttribute('target')");
        opened.find(selector).first().focus();
        assertThat((Boolean) opened.find(selector).first().evaluate("each => each === document.activeElement"))
                .as("the link takes the focus")
                .isTrue();
        opened.press("Enter");
        opened.page().waitForURL("**" + link.substring(0, link.indexOf('?')) + "?*");
    }
}
