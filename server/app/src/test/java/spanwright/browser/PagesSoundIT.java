package spanwright.browser;

import static org.assertj.core.api.Assertions.assertThat;

import com.deque.html.axecore.playwright.AxeBuilder;
import com.deque.html.axecore.results.Rule;
import com.microsoft.playwright.options.ColorScheme;
import java.util.List;
import java.util.stream.Collectors;
import org.junit.jupiter.api.AfterAll;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/**
 * What holds for every view, by day and by night, on a laptop and on a tablet: nothing wrong for those who hear or
 * steer the page otherwise (WCAG 2.2 AA, checked by axe-core), no error, nothing asked of another host, no sideways
 * scroll, the safety line in sight.
 */
class PagesSoundIT {

    private static final List<String> WCAG =
            List.of("wcag2a", "wcag2aa", "wcag21a", "wcag21aa", "wcag22aa", "best-practice");
    private static final int[][] SCREENS = {{1366, 768}, {820, 1180}};

    private static final String NOT_THERE = "#/structure/NOT-THERE";

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
    @ValueSource(
            strings = {
                "#/start",
                "#/structure/HE-1",
                "#/enclosure/HE-1",
                "#/enclosure/C-N02",
                "#/enclosure/C-S03",
                "#/enclosure/CAB-09",
                "#/cable/FDR-S-1",
                "#/fiber/FDR-S-1:25",
                "#/port/HE-1/FDR-S/1",
                "#/circuit/RC-01",
                "#/circuits",
                "#/postings",
                "#/posting/1",
                "#/outage",
                "#/outage/reading",
                "#/outage/reading?trace=port:HE-1/FDR-S/72&port=HE-1/FDR-S/72&distance=7412&event=C-S03=6038",
                "#/outage/down?cut=span:HH-S044_HH-S045",
                "#/outage/light?cut=span:HH-S044_HH-S045",
                "#/outage/incident?cut=span:HH-S044_HH-S045",
                NOT_THERE
            })
    void a_view_is_sound_by_day_and_by_night_on_a_laptop_and_on_a_tablet(String hash) {
        try (OpenPage opened = OpenPage.open(browser, server, hash, 1366, 768, ColorScheme.LIGHT)) {
            for (ColorScheme theme : List.of(ColorScheme.LIGHT, ColorScheme.DARK)) {
                for (int[] screen : SCREENS) {
                    opened.change(screen[0], screen[1], theme);
                    String where = hash + " " + theme + " " + screen[0];
                    assertThat(violations(opened)).as("violations, " + where).isEmpty();
                    assertThat(sideways(opened)).as("sideways scroll, " + where).isEmpty();
                    assertThat(opened.find(".safety").isVisible())
                            .as("safety line, " + where)
                            .isTrue();
                }
            }
            assertThat(opened.requestsElsewhere()).as("requests elsewhere").isEmpty();
            assertThat(opened.errors())
                    .as("errors")
                    .allMatch(error -> hash.equals(NOT_THERE) && isAnsweredNotFound(error));
        }
    }

    /** The browser itself notes an answer of 404 on the console, which only the view of what is not there has. */
    private static boolean isAnsweredNotFound(String error) {
        return error.contains("status of 404");
    }

    /** What axe-core finds wrong with what is open. */
    static List<String> violations(OpenPage opened) {
        return new AxeBuilder(opened.page())
                .withTags(WCAG).analyze().getViolations().stream()
                        .map(PagesSoundIT::said)
                        .collect(Collectors.toList());
    }

    private static String said(Rule rule) {
        return rule.getId() + ": " + rule.getNodes().get(0).getHtml();
    }

    /** The parts of the page that are wider than their room. */
    private static List<?> sideways(OpenPage opened) {
        return (List<?>) opened.page()
                .evaluate("() => [document.documentElement,"
                        + " ...document.querySelectorAll('.bar, .sheet-body, .strip')]"
                        + ".filter((part) => part.scrollWidth > part.clientWidth)"
                        + ".map((part) => part.className || part.localName)");
    }
}
