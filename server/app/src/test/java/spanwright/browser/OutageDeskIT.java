package spanwright.browser;

import static com.microsoft.playwright.assertions.PlaywrightAssertions.assertThat;
import static org.assertj.core.api.Assertions.assertThat;

import com.microsoft.playwright.options.ColorScheme;
import java.util.regex.Pattern;
import org.junit.jupiter.api.AfterAll;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;

/**
 * The outage desk on the demo's stories, by keyboard alone. What is expected is told in {@code demo-data/stories}:
 * {@code facts.csv} and {@code readings.csv} of each, by the arithmetic of their own generator.
 */
class OutageDeskIT {

    private static final String READING = "#/outage/reading?trace=port:HE-1/FDR-S/72&port=HE-1/FDR-S/72&distance=7412"
            + "&event=C-S03=6038&event=C-S04=8155";

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
    void a_backhoe_is_found_from_the_alarms_then_by_a_reading_and_who_is_down_is_told() {
        try (OpenPage opened = opened("#/start")) {
            opened.press("o");
            rank(opened, "1-backhoe");
            assertThat(opened.find(".ranking li.chosen")).containsText("25 spans");
            assertThat(opened.find(".ranking li.chosen")).containsText("C-S02");
            assertThat(opened.find(".ranking li.chosen")).containsText("C-S04");
            assertThat(drawnLines(opened)).isGreaterThanOrEqualTo(25);

            opened.press("2");
            type(opened, "#field-port", "HE-1/FDR-S/72");
            type(opened, "#field-distance", "7412");
            type(opened, "#field-event-0", "C-S03");
            type(opened, "#field-event-at-0", "6038");
            type(opened, "#field-event-1", "C-S04");
            type(opened, "#field-event-at-1", "8155");
            enter(opened);
            assertThat(opened.find(".fault-place")).containsText("between HH-S044 and HH-S045");
            assertThat(opened.find(".fault-place")).containsText("136 ft past HH-S044");
            assertThat(opened.find(".fault-place")).containsText(Pattern.compile("within 2[67] ft"));
            assertThat(opened.find(".fault-place")).containsText("mark 19,784 ft white");
            assertThat(opened.find(".strip .fault-mark")).isVisible();

            tabTo(opened, "a.main");
            enter(opened);
            // 540 subscribers and 13 other circuits by the alarms, and two leases, which have no alarm.
            assertThat(opened.find(".sum .number")).hasText("555");
            assertThat(opened.find(".restore tbody tr").first()).containsText("GOV-0");
            assertThat(opened.find(".restore tbody tr", "RC-01").first()).containsText("single");
            assertThat(opened.find(".restore tbody tr", "RC-02").first()).containsText("single");
            assertThat(opened.find(".cut-tube summary").first()).containsText("tube 2");
        }
    }

    @Test
    void light_another_way_is_offered_and_what_is_over_budget_is_refused() {
        try (OpenPage opened = opened("#/outage/light?cut=span:HH-S044_HH-S045")) {
            opened.find("sw-light button.main").focus();
            enter(opened);
            assertThat(opened.find("sw-light .sum")).containsText("of 41 groups come back");
            assertThat(opened.find(".groups li").first()).containsText("GOV-01");
            assertThat(opened.find(".groups .refused", "over its budget").first())
                    .isVisible();
        }
    }

    @Test
    void an_incident_counts_who_is_down_and_keeps_a_log() {
        try (OpenPage opened = opened("#/outage/incident?cut=span:HH-S044_HH-S045")) {
            opened.find("sw-incident input[name=title]").fill("Backhoe on FDR-S");
            type(opened, "sw-incident input[name=by]", "Dana");
            opened.press("Enter");
            assertThat(opened.find("sw-incident .sum")).containsText("555");
            opened.find("sw-incident select[name=kind]").selectOption("found");
            opened.find("sw-incident input[name=by]").fill("Dana");
            type(opened, "sw-incident input[name=text]", "136 ft past HH-S044");
            opened.press("Enter");
            assertThat(opened.find("sw-incident li", "136 ft past HH-S044")).containsText("Dana");
        }
    }

    @Test
    void a_tube_joined_to_the_wrong_one_is_ranked_first() {
        try (OpenPage opened = opened("#/outage")) {
            type(opened, "#list-down", Stories.text("2-wrong-tube/down.txt"));
            type(opened, "#list-up", Stories.text("2-wrong-tube/up.txt"));
            type(opened, "#list-opened", "C-N02");
            enter(opened);
            assertThat(opened.find(".ranking li").first()).containsText("tubes 7 and 19 crossed at C-N02");
            assertThat(opened.find(".ranking li").first()).containsText("135 down");
        }
    }

    @Test
    void the_sheet_of_that_night_once_posted_tells_by_itself_where_a_closure_was_opened() {
        try (OpenPage opened = opened("#/outage")) {
            Object status = opened.page()
                    .evaluate(
                            "(body) => fetch('/postings', { method: 'POST', body,"
                                    + " headers: { 'Content-Type': 'application/json' } }).then((answer) => answer.status)",
                            Stories.text("2-wrong-tube/sheet.json"));
            assertThat(status).isEqualTo(201);
            rank(opened, "2-wrong-tube");
            assertThat(opened.find(".ranking li").first()).containsText("tubes 7 and 19 crossed at C-N02");
        }
    }

    @Test
    void codes_that_the_records_do_not_hold_are_told_with_the_nearest_and_mended_by_a_key() {
        try (OpenPage opened = opened("#/outage")) {
            type(opened, "#list-down", "GOV-1, GOV-02 NO-SUCH-CIRCUIT-ANYWHERE");
            tabTo(opened, "button.main");
            enter(opened);
            assertThat(opened.find(".strangers li")).hasCount(2);
            assertThat(opened.find(".strangers li").first()).containsText("Take GOV-01");
            assertThat(opened.find(".strangers li").last()).containsText("nothing is called alike");

            opened.find(".strangers button").first().focus();
            enter(opened);
            assertThat(opened.find(".strangers li")).hasCount(1);
            assertThat(opened.find("#list-down")).hasValue("GOV-01, GOV-02 NO-SUCH-CIRCUIT-ANYWHERE");
        }
    }

    @Test
    void the_map_follows_the_arrow_keys_through_the_suspects() {
        try (OpenPage opened = opened("#/outage")) {
            rank(opened, "1-backhoe");
            assertThat(opened.find(".ranking input:checked")).isFocused();
            assertThat(chosenSign(opened)).isEqualTo("S1");
            opened.press("ArrowDown");
            assertThat(opened.find(".ranking li").nth(1)).hasClass("chosen");
            assertThat(chosenSign(opened)).isEqualTo("S2");
        }
    }

    @Test
    void the_desk_that_was_left_is_the_desk_that_opens() {
        try (OpenPage opened = opened("#/outage")) {
            rank(opened, "1-backhoe");
            opened.go(READING);
            opened.go("#/structure/HH-S044");
            opened.press("o");
            assertThat(opened.find(".fault-place")).containsText("mark 19,784 ft white");
            opened.press("1");
            assertThat(opened.find(".ranking li.chosen")).containsText("25 spans");
        }
    }

    @Test
    void how_sure_a_place_is_says_what_makes_it_unsure() {
        try (OpenPage opened = opened(READING)) {
            opened.find(".fault-place .figure").nth(1).focus();
            opened.press("Enter");
            assertThat(opened.find(".basis")).containsText("cursor and pulse width");
            assertThat(opened.find(".basis")).containsText("structures' places on the map");
        }
    }

    @Test
    void what_is_wrong_with_a_reading_is_said_beside_its_field() {
        try (OpenPage opened = opened("#/outage/reading")) {
            type(opened, "#field-port", "HE-1/FDR-S/999");
            type(opened, "#field-distance", "far");
            enter(opened);
            assertThat(opened.find("[data-field=distance] .problem")).containsText("such as 7412");
            opened.find("#field-distance").fill("7412");
            enter(opened);
            assertThat(opened.find("[data-field=port] .problem")).containsText("HE-1/FDR-S has ports 1 to 288");
        }
    }

    @Test
    void the_desk_is_sound_by_red_light_too() {
        try (OpenPage opened = opened("#/outage")) {
            rank(opened, "1-backhoe");
            opened.press("t");
            opened.press("t");
            assertThat(opened.page()
                            .evaluate("() => document.documentElement.dataset.theme")
                            .toString())
                    .isEqualTo("red");
            assertThat(PagesSoundIT.violations(opened)).isEmpty();
            opened.go(READING);
            assertThat(PagesSoundIT.violations(opened)).isEmpty();
            opened.go("#/outage/down?cut=span:HH-S044_HH-S045");
            assertThat(PagesSoundIT.violations(opened)).isEmpty();
        }
    }

    /** Pastes the lists of a story and ranks the suspects, by keyboard. */
    private static void rank(OpenPage opened, String story) {
        type(opened, "#list-down", Stories.text(story + "/down.txt"));
        type(opened, "#list-up", Stories.text(story + "/up.txt"));
        tabTo(opened, "button.main");
        enter(opened);
        assertThat(opened.find(".ranking li.chosen")).isVisible();
    }

    /** Presses Enter and waits for what it asks for. */
    private static void enter(OpenPage opened) {
        opened.press("Enter");
        opened.settle();
    }

    /** Goes to a field by the tab key and types or pastes into it. */
    private static void type(OpenPage opened, String field, String text) {
        tabTo(opened, field);
        opened.page().keyboard().insertText(text);
    }

    /** Presses the tab key until the focus is on a part. */
    private static void tabTo(OpenPage opened, String selector) {
        for (int pressed = 0; pressed < 80; pressed++) {
            if ((Boolean) opened.page()
                    .evaluate("(selector) => document.activeElement?.matches('.sheet ' + selector)", selector)) {
                return;
            }
            opened.press("Tab");
        }
        throw new AssertionError("The tab key does not come to " + selector);
    }

    private static int drawnLines(OpenPage opened) {
        return ((Number) opened.page()
                        .evaluate("() => document.querySelector('sw-map').drawing.marks.stretches.at(-1).lines.length"))
                .intValue();
    }

    private static String chosenSign(OpenPage opened) {
        return opened.page()
                .evaluate(
                        "() => document.querySelector('sw-map').drawing.marks.stretches.find((each) => each.chosen).sign")
                .toString();
    }

    private static OpenPage opened(String hash) {
        return OpenPage.open(browser, server, hash, 1366, 768, ColorScheme.LIGHT);
    }
}
