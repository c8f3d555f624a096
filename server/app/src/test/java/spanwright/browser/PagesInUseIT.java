package spanwright.browser;

import static com.microsoft.playwright.assertions.PlaywrightAssertions.assertThat;
import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import com.microsoft.playwright.Locator;
import com.microsoft.playwright.options.BoundingBox;
import com.microsoft.playwright.options.ColorScheme;
import java.util.List;
import java.util.regex.Pattern;
import org.junit.jupiter.api.AfterAll;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;

/** What people do with the pages, on the demo's records, mostly by keyboard. */
class PagesInUseIT {

    private static final String CIRCUIT = "#/circuit/RC-01";

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
    void find_is_reached_by_its_key_and_opens_what_is_typed() {
        try (OpenPage opened = opened("#/start")) {
            opened.press("/");
            opened.page().keyboard().type("C-S03");
            assertThat(opened.find("#found [role=option]").first()).containsText("C-S03");
            opened.press("Enter");

            assertThat(opened.page()).hasURL(Pattern.compile("#/enclosure/C-S03"));
            assertThat(opened.find(".sheet h1")).hasText("C-S03");
            assertThat(opened.find(".enclosure-diagram svg")).isVisible();
        }
    }

    @Test
    void an_arrow_key_takes_another_answer_of_find() {
        try (OpenPage opened = opened("#/start")) {
            opened.press("/");
            opened.page().keyboard().type("RC-0");
            Locator second = opened.find("#found [role=option]").nth(1);
            assertThat(second).isVisible();
            String label = second.locator(".found-label").textContent();
            opened.press("ArrowDown");
            assertThat(second).hasAttribute("aria-selected", "true");
            opened.press("Enter");

            assertThat(opened.find(".sheet h1")).hasText(label);
        }
    }

    @Test
    void what_is_not_in_the_records_is_said_to_be_not_there() {
        try (OpenPage opened = opened("#/start")) {
            opened.press("/");
            opened.page().keyboard().type("no such thing anywhere");

            assertThat(opened.find(".found [role=status]")).containsText("Nothing in the records is called that");
        }
    }

    @Test
    void a_circuit_is_traced_on_the_map_and_on_the_strip_together() {
        try (OpenPage opened = opened(CIRCUIT)) {
            assertThat(opened.find(".hop.fiber").first()).isVisible();
            assertThat(opened.find(".strip-line .section-name").first()).isVisible();

            opened.press("p");
            opened.press("End");
            opened.settle();

            double glass = number(opened, "document.querySelector('sw-strip').whole");
            assertThat(number(opened, "document.querySelector('sw-shell').pointer"))
                    .isEqualTo(glass);
            assertThat(number(
                            opened, "Math.hypot(HAND.pointer.x - HAND.path.at(-2), HAND.pointer.y - HAND.path.at(-1))"))
                    .isEqualTo(0);
        }
    }

    @Test
    void the_pointer_on_the_map_shows_its_place_on_the_strip() {
        try (OpenPage opened = opened(CIRCUIT)) {
            String middle = "(() => { const map = document.querySelector('sw-map'); const frame = map.drawing.frame();"
                    + " const at = Math.floor(HAND.path.length / 4) * 2;"
                    + " const ground = map.getBoundingClientRect();"
                    + " return [ground.left + frame.x(HAND.path[at]), ground.top + frame.y(HAND.path[at + 1]),"
                    + " map.path.track[at / 2][0], 30 * 156543 * 0.67 / frame.scale]; })()";
            List<?> spot = (List<?>) opened.page().evaluate(hand(middle));
            opened.page().mouse().move(asDouble(spot.get(0)), asDouble(spot.get(1)));

            assertThat(opened.find(".strip .pointer")).isVisible();
            assertThat(number(opened, "document.querySelector('sw-shell').pointer"))
                    .isCloseTo(asDouble(spot.get(2)), within(asDouble(spot.get(3))));
            assertThat(opened.find(".strip-foot")).containsText("past");
        }
    }

    @Test
    void a_place_put_on_the_strip_stays_until_it_is_let_go() {
        try (OpenPage opened = opened(CIRCUIT)) {
            BoundingBox paper = opened.find(".strip-paper").boundingBox();
            opened.page().mouse().click(paper.x + paper.width / 2, paper.y + 60);
            double put = number(opened, "document.querySelector('sw-shell').pointer");
            opened.page().mouse().move(paper.x + paper.width / 4, paper.y + 60);
            assertThat(number(opened, "document.querySelector('sw-shell').pointer"))
                    .isEqualTo(put);

            opened.find(".strip-paper").focus();
            opened.press("Escape");
            assertThat(opened.find(".strip .pointer")).hasCount(0);
        }
    }

    @Test
    void one_key_flips_metres_and_feet_everywhere() {
        try (OpenPage opened = opened(CIRCUIT)) {
            Locator sheet = opened.find(".facts .figure", "ft").first();
            assertThat(sheet).isVisible();
            double feet = value(sheet.locator(".number").textContent());
            opened.press("u");

            assertThat(opened.find(".facts .figure", "ft")).hasCount(0);
            double metres = value(opened.find(".facts .figure", " m")
                    .first()
                    .locator(".number")
                    .textContent());
            assertThat(metres).isCloseTo(feet * 0.3048, within(0.2));
            assertThat(opened.find(".axis-unit")).hasText("m glass");
            assertThat(opened.find(".scale-bar")).containsText(" m");
        }
    }

    @Test
    void every_number_of_a_path_opens_how_it_is_known_and_gives_the_focus_back() {
        try (OpenPage opened = opened(CIRCUIT)) {
            Locator splice = opened.find(".hop.splice .figure").first();
            splice.focus();
            opened.press("Enter");

            assertThat(opened.find(".basis")).containsText("Known from");
            assertThat(opened.find(".basis")).containsText("Source");
            opened.press("Escape");
            assertThat(opened.find(".basis")).hasCount(0);
            assertThat(splice).isFocused();

            for (Locator number : opened.find(".sheet .number").all()) {
                String said = number.evaluate(
                                "(each) => each.closest('button.figure') ? '' : each.parentElement.textContent")
                        .toString();
                assertThat(said)
                        .as("a number in decibels or lengths without a basis")
                        .doesNotContainPattern("\\d (dB|ft)$");
            }
        }
    }

    @Test
    void one_key_turns_day_into_night_and_the_page_remembers() {
        try (OpenPage opened = opened("#/start")) {
            assertThat(theme(opened)).isEqualTo("light");
            opened.press("t");
            assertThat(theme(opened)).isEqualTo("dark");
            opened.page().reload();
            opened.settle();
            assertThat(theme(opened)).isEqualTo("dark");
        }
    }

    @Test
    void the_place_a_person_left_is_the_place_that_opens() {
        try (OpenPage opened = opened("#/cable/FDR-S-1")) {
            opened.page().evaluate("() => { location.hash = '#/enclosure/C-S03?trace=circuit:RC-01'; }");
            opened.settle();
            opened.page().evaluate("() => { document.querySelector('sw-map').map.setView([-48, -123.05], 15); }");
            opened.settle();
            opened.page().navigate("about:blank");
            opened.go("");

            assertThat(opened.find(".sheet h1")).hasText("C-S03");
            assertThat(opened.find(".strip-head h2")).containsText("RC-01");
            assertThat(number(opened, "document.querySelector('sw-map').map.getCenter().lng"))
                    .isCloseTo(-123.05, within(1e-4));
        }
    }

    @Test
    void which_records_answer_is_always_in_sight_and_can_be_left() {
        try (OpenPage opened = opened(CIRCUIT)) {
            assertThat(opened.find("sw-as-of")).containsText("as posted");
            opened.find("sw-as-of button").first().click();
            opened.find("sw-as-of input").fill("1");
            opened.press("Enter");

            assertThat(opened.page()).hasURL(Pattern.compile("as_of=1"));
            assertThat(opened.find("sw-as-of")).containsText("as of 1");
            assertThat(opened.find(".sheet h1")).hasText("RC-01");
            opened.find("sw-as-of button", "Back to as posted").click();
            assertThat(opened.find("sw-as-of")).containsText("as posted");
        }
    }

    @Test
    void wavelengths_are_drawn_side_by_side_as_they_are_chosen() {
        try (OpenPage opened = opened(CIRCUIT)) {
            int before = opened.find(".curves path.curve").count();
            opened.find(".strip-head fieldset")
                    .first()
                    .locator("label", new Locator.LocatorOptions().setHasText("1310"))
                    .click();
            opened.settle();

            assertThat(opened.find(".curves path.curve")).hasCount(before + 1);
            assertThat(opened.page()).hasURL(Pattern.compile("nm=1550,1310"));
        }
    }

    @Test
    void arrow_keys_go_from_fiber_to_fiber_in_the_tube_chart() {
        try (OpenPage opened = opened("#/cable/FDR-S-1")) {
            Locator first = opened.find(".tube-chart a").first();
            first.focus();
            opened.press("ArrowRight");
            opened.press("ArrowDown");
            opened.press("Enter");

            assertThat(opened.find(".sheet h1")).hasText("FDR-S-1:14");
        }
    }

    @Test
    void the_keys_are_listed_and_can_be_turned_off() {
        try (OpenPage opened = opened("#/start")) {
            opened.press("?");
            assertThat(opened.find(".keys-panel")).isVisible();
            opened.find(".keys-panel input[type=checkbox]").uncheck();
            opened.press("Escape");
            assertThat(opened.find(".keys-panel")).hasCount(0);
            opened.press("t");
            assertThat(theme(opened)).isEqualTo("light");
        }
    }

    @Test
    void the_map_is_steered_and_opened_by_keyboard() {
        try (OpenPage opened = opened("#/structure/HE-1")) {
            opened.page().evaluate("() => { location.hash = '#/start'; }");
            opened.settle();
            opened.press("m");
            opened.press("Enter");

            assertThat(opened.find(".sheet h1")).hasText("HE-1");
        }
    }

    private static OpenPage opened(String hash) {
        return OpenPage.open(browser, server, hash, 1366, 768, ColorScheme.LIGHT);
    }

    private static String theme(OpenPage opened) {
        return opened.page()
                .evaluate("() => document.documentElement.dataset.theme")
                .toString();
    }

    /** A script's number; HAND stands for what the map shows as at hand. */
    private static double number(OpenPage opened, String script) {
        return asDouble(opened.page().evaluate(hand(script)));
    }

    private static String hand(String script) {
        return "() => { const HAND = document.querySelector('sw-map').drawing.atHand; return " + script + "; }";
    }

    private static double asDouble(Object number) {
        return ((Number) number).doubleValue();
    }

    private static double value(String text) {
        return Double.parseDouble(text.replace(",", ""));
    }
}
