package spanwright.browser;

import static com.microsoft.playwright.assertions.PlaywrightAssertions.assertThat;
import static org.assertj.core.api.Assertions.assertThat;

import com.microsoft.playwright.options.ColorScheme;
import org.junit.jupiter.api.AfterAll;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;

/** The demo's cut feeder repaired from an incident's page, by keyboard: refused, mended, shown, posted, logged. */
class RepairIT {

    private static final String BEGUN = "{\"title\": \"Backhoe on FDR-S\", \"by\": \"Dana\","
            + " \"began_at\": \"2026-03-31T10:42:00-07:00\", \"cuts\": [\"span:HH-S044_HH-S045\"]}";

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
    void a_piece_is_let_in_written_in_the_log_and_listed_until_it_is_undone() {
        try (OpenPage opened = opened("#/start")) {
            opened.go("#/outage/incident?cut=span:HH-S044_HH-S045&incident=" + begun(opened));
            opened.find("sw-repair summary").focus();
            enter(opened);
            type(opened, "cable", "FDR-S-2");
            type(opened, "first_enclosure", "C-R1");
            type(opened, "first_structure", "HH-S044");
            // The coil holds 100 ft, and 35 ft once 65 ft are drawn.
            type(opened, "first_slack", "150");
            type(opened, "second_enclosure", "C-R2");
            type(opened, "second_structure", "HH-S045");
            type(opened, "length", "17");
            enter(opened);
            assertThat(opened.find("[data-field=by] input")).isFocused();
            assertThat(opened.find("[data-group=who] .problem")).containsText("Your name");
            mend(opened);
            tried(opened);
            post(opened);
            undo(opened);
        }
    }

    private static String begun(OpenPage opened) {
        return opened.page()
                .evaluate(
                        "(body) => fetch('/incidents', { method: 'POST', body, headers: { 'Content-Type':"
                                + " 'application/json' } }).then((answer) => answer.json())"
                                + ".then(({ incident }) => String(incident))",
                        BEGUN)
                .toString();
    }

    private static void mend(OpenPage opened) {
        type(opened, "by", "Dana");
        enter(opened);
        assertThat(opened.find("[data-group=piece] .problem")).containsText("give its length along the sheath");
        type(opened, "length", "560");
        enter(opened);
        assertThat(opened.find("[data-group=first] .problem")).containsText("holds 100 ft by the records");
        type(opened, "first_slack", "65");
        opened.find("sw-repair [data-field=temporary_until] input").fill("2099-12-31");
        assertThat(PagesSoundIT.violations(opened)).isEmpty();
    }

    private static void tried(OpenPage opened) {
        tabOn(opened, "sw-repair button.main");
        enter(opened);
        assertThat(opened.find(".tried")).isFocused();
        assertThat(opened.find(".tried")).containsText("576 joints");
        assertThat(opened.find(".tried")).containsText("coil 100 ft to 35 ft");
        assertThat(opened.find(".tried")).containsText("RC-01");
        assertThat(opened.find(".tried .warning")).containsText("proven dark");
        assertThat(opened.find(".cautions")).containsText("Manholes");
        assertThat(PagesSoundIT.violations(opened)).isEmpty();
        assertThat(postings(opened)).as("nothing is kept before it is asked").isEqualTo(1);
    }

    private static void post(OpenPage opened) {
        tabOn(opened, ".tried button.main");
        enter(opened);
        assertThat(opened.find("sw-repair .posted")).containsText("Posted as posting 2. It is written in the log.");
        assertThat(opened.find("sw-repair .posted")).isFocused();
        assertThat(opened.find(".log li", "posting 2")).containsText("let in between C-R1 at HH-S044");
        assertThat(opened.find("sw-temporary .temporary caption", "Repair of incident"))
                .containsText("Dana");
        assertThat(PagesSoundIT.violations(opened)).isEmpty();
        assertThat(opened.errors().stream().filter(each -> !each.contains("422")))
                .isEmpty();
    }

    private static void undo(OpenPage opened) {
        opened.find("button.undo", "Undo posting 2").focus();
        enter(opened);
        opened.page().keyboard().insertText("Dana");
        enter(opened);
        assertThat(opened.find(".undone")).containsText("Posting 2 is undone, by posting 3");
        assertThat(opened.find("sw-temporary .temporary")).hasCount(0);
    }

    /** Types into a field, over what stands there. */
    private static void type(OpenPage opened, String field, String text) {
        opened.find("sw-repair [data-field=" + field + "] input").focus();
        opened.press("Control+a");
        opened.page().keyboard().insertText(text);
        opened.settle();
    }

    private static void tabOn(OpenPage opened, String selector) {
        for (int pressed = 0; pressed < 20; pressed++) {
            if ((Boolean) opened.page().evaluate("(selector) => document.activeElement?.matches(selector)", selector)) {
                return;
            }
            opened.press("Tab");
        }
        throw new AssertionError("The tab key does not come to " + selector);
    }

    private static int postings(OpenPage opened) {
        return ((Number) opened.page()
                        .evaluate("() => fetch('/status').then((answer) => answer.json())"
                                + ".then((status) => status.posting.posting)"))
                .intValue();
    }

    private static void enter(OpenPage opened) {
        opened.press("Enter");
        opened.settle();
    }

    private static OpenPage opened(String hash) {
        return OpenPage.open(browser, server, hash, 1366, 768, ColorScheme.LIGHT);
    }
}
