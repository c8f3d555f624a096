package spanwright.browser;

import static java.nio.charset.StandardCharsets.UTF_8;
import static org.assertj.core.api.Assertions.assertThat;

import com.deque.html.axecore.playwright.AxeBuilder;
import com.deque.html.axecore.results.Rule;
import com.microsoft.playwright.Page;
import com.sun.net.httpserver.HttpServer;
import java.io.IOException;
import java.net.InetAddress;
import java.net.InetSocketAddress;
import org.junit.jupiter.api.AfterAll;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;

/** The browser runs scripts of a page that it is served, and the accessibility check finds what is wrong with one. */
class ChromiumBrowserIT {

    private static final String PAGE = """
            <!doctype html>
            <html lang="en">
              <head><title>Pole 12</title></head>
              <body>
                <main>
                  <h1>Pole 12</h1>
                  %s
                  <button onclick="document.querySelector('h1').textContent = 'Pole ' + innerWidth">Width</button>
                </main>
              </body>
            </html>
            """;

    private static ChromiumBrowser browser;
    private static HttpServer server;

    @BeforeAll
    static void open() throws IOException {
        browser = ChromiumBrowser.open();
        server = HttpServer.create(new InetSocketAddress(InetAddress.getLoopbackAddress(), 0), 0);
        serve("/sound", PAGE.formatted("<p>Leans.</p>"));
        serve("/unsound", PAGE.formatted("<input type=\"text\">"));
        server.start();
    }

    @AfterAll
    static void close() {
        server.stop(0);
        browser.close();
    }

    @Test
    void a_click_runs_the_script_of_a_page_of_the_size_asked_for() {
        try (Page page = opened("/sound")) {
            page.locator("button").click();

            assertThat(page.locator("h1").textContent()).isEqualTo("Pole 820");
        }
    }

    @Test
    void the_accessibility_check_passes_a_sound_page_and_names_what_is_wrong_with_another() {
        try (Page sound = opened("/sound");
                Page unsound = opened("/unsound")) {
            assertThat(new AxeBuilder(sound).analyze().getViolations()).isEmpty();
            assertThat(new AxeBuilder(unsound).analyze().getViolations())
                    .extracting(Rule::getId)
                    .containsExactly("label");
        }
    }

    private static Page opened(String path) {
        Page page = browser.page(820, 1180);
        page.navigate("http://localhost:" + server.getAddress().getPort() + path);
        return page;
    }

    private static void serve(String path, String page) {
        byte[] body = page.getBytes(UTF_8);
        server.createContext(path, exchange -> {
            exchange.getResponseHeaders().set("Content-Type", "text/html; charset=utf-8");
            exchange.sendResponseHeaders(200, body.length);
            exchange.getResponseBody().write(body);
            exchange.close();
        });
    }
}
