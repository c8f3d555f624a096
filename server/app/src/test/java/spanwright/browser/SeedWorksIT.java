package spanwright.browser;

import static com.microsoft.playwright.assertions.PlaywrightAssertions.assertThat;
import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import com.fasterxml.jackson.core.JsonProcessingException;
import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import com.microsoft.playwright.options.ColorScheme;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Objects;
import java.util.TreeSet;
import org.junit.jupiter.api.AfterAll;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;

/**
 * The demo's third story: Oxbarrow Seed Works, beside CAB-11, asks for four dark fibers side by side from HE-1, and for a
 * pair by another way. What the pages show is read off them; the rest the same browser asks the server for. All but the
 * last test ask as of the posting that loaded the demo, so that the reservation made there does not show.
 */
class SeedWorksIT {

    private static final ObjectMapper JSON = new ObjectMapper();
    private static final String WAY = "/spares?from=HE-1&to=CAB-11";
    private static final String AS_LOADED = "&as_of=1";
    /** The demo's planning values: fiber at 1550 nm in dB a metre, a fusion splice, a connector pair. */
    private static final double FIBER = 0.22 / 1000;

    private static final double SPLICE = 0.1;
    private static final double CONNECTOR = 0.35;

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
    void the_chart_of_the_feeder_says_which_of_tube_20_are_not_spare_and_why() {
        try (OpenPage opened = opened("#/cable/FDR-S-1?as_of=1")) {
            List<String[]> truth = Stories.rows("3-seed-works/tube-20.csv");
            assertThat(truth).hasSize(12);
            for (String[] row : truth) {
                String word = row[1].split("[, ]", -1)[0];
                String said = opened.find(".fiber-cell[title^='fiber " + row[0] + ",']")
                        .first()
                        .getAttribute("title");
                assertThat(said).as("fiber " + row[0] + ", in truth " + row[1]).contains(word);
            }
            opened.go("#/port/HE-1/FDR-S/238?as_of=1");
            assertThat(opened.find(".facts").first()).containsText("HE-1/XC/7");
            opened.go("#/fiber/FDR-S-1:236?as_of=1");
            assertThat(opened.find("sw-fiber")).containsText("Oxbarrow cold store");
        }
    }

    @Test
    void four_side_by_side_are_229_to_232_and_one_closure_is_opened() {
        try (OpenPage opened = opened("#/start")) {
            JsonNode first = options(opened, "&fibers=4&same_tube=yes").get(0);

            assertThat(fibersOf(first, "FDR-S-1")).isEqualTo(Stories.numbers(fact("fibers side by side")));
            assertThat(first.path("same_tube").asBoolean()).isTrue();
            assertThat(texts(first.path("enclosures_opened"))).containsExactly("C-S06");
            assertThat(first.path("new_splices").asInt()).isEqualTo(4);
            assertThat(first.path("verified").asBoolean()).isTrue();
            double glass = first.path("glass_m").asDouble();
            assertThat(glass).isCloseTo(Double.parseDouble(fact("glass of the first path")), within(0.01));
            // The pigtail at HE-1, the joint at C-S03, the new one at C-S06; it ends bare in the cabinet.
            assertThat(first.path("loss_db").asDouble()).isCloseTo(glass * FIBER + 3 * SPLICE, within(0.0001));
        }
    }

    @Test
    void nine_of_the_tube_are_spare_and_a_tenth_must_come_from_another() {
        try (OpenPage opened = opened("#/start")) {
            TreeSet<Integer> spare = new TreeSet<>(Stories.numbers(fact("fibers side by side")));
            spare.addAll(Stories.numbers(fact("other spare fibers")));

            assertThat(fibersOf(options(opened, "&fibers=9&same_tube=yes").get(0), "FDR-S-1"))
                    .containsExactlyElementsOf(spare);
            assertThat(fibersOf(options(opened, "&fibers=10&same_tube=yes").get(0), "FDR-S-1"))
                    .noneMatch(fiber -> fiber >= 229 && fiber <= 240);
        }
    }

    @Test
    void a_pair_round_the_ring_shares_entrance_closure_and_lateral_with_the_first() {
        try (OpenPage opened = opened("#/start")) {
            JsonNode both = options(opened, "&fibers=2");
            JsonNode around = both.get(1);

            double glass = around.path("glass_m").asDouble();
            assertThat(glass).isCloseTo(Double.parseDouble(fact("glass of the second path, about")), within(10.0));
            // Pigtails at HE-1 and two at HUT-N, joints at C-N02, C-N07, C-E01, C-E02, new ones at HUT-S and C-S06; a
            // jumper between two ports at HUT-N.
            assertThat(around.path("loss_db").asDouble())
                    .isCloseTo(glass * FIBER + 9 * SPLICE + 2 * CONNECTOR, within(0.0001));

            List<String> shared = new ArrayList<>(texts(both.get(0).path("spans")));
            shared.retainAll(texts(around.path("spans")));
            assertThat(shared.get(0)).isEqualTo("HE-1_EV-1");
            assertThat(length(opened, shared.subList(0, 1))).isCloseTo(85, within(0.5));
            assertThat(shared.subList(1, shared.size())).allMatch(span -> span.contains("HH-L11-"));
            assertThat(length(opened, shared.subList(1, shared.size()))).isCloseTo(600, within(10.0));
            assertThat(texts(both.get(0).path("enclosures_opened"))).contains("C-S06");
            assertThat(texts(around.path("enclosures_opened"))).contains("C-S06");
        }
    }

    @Test
    void no_pair_is_clear_of_the_cabinets_own_way_so_a_second_lateral_is_to_be_quoted() {
        try (OpenPage opened = opened("#/start")) {
            assertThat(options(opened, "&fibers=2&avoid_circuit=PON-11-001")).isEmpty();
        }
    }

    @Test
    void one_cut_on_the_bridge_takes_emergency_calls_down_both_ways() {
        try (OpenPage opened = opened("#/outage/down?cut=span:MH-8_BR-1")) {
            for (String circuit : List.of("RC-01", "RC-01P", "RC-02", "RC-02P")) {
                String row = ".restore tbody tr:has(a[href='#/circuit/" + circuit + "'])";
                assertThat(opened.find(row).first()).containsText("down");
                assertThat(opened.find(row).first()).not().containsText("single");
            }
        }
    }

    @Test
    void what_is_reserved_for_the_quote_is_offered_to_nobody_else() {
        try (OpenPage opened = opened("#/start")) {
            String change = "{'action': 'add', 'table': 'fiber_flags', 'row': {'cable': '%s', 'fibers': '%s',"
                    + " 'flag': 'reserved', 'owner': 'planning', 'reason': 'quote, Oxbarrow Seed Works',"
                    + " 'until': '2099-12-31'}}";
            String body = "{'by': 'P. Lanner', 'reason': 'Held for 30 days', 'changes': ["
                    + change.formatted("FDR-S-1", "229-232")
                    + ", " + change.formatted("FDR-S-2", "229-232")
                    + ", " + change.formatted("LAT-11", "13-16") + "]}";
            JsonNode posted = ask(opened, "/postings", body.replace('\'', '"'));
            assertThat(posted.path("posting").asInt()).as(posted.toString()).isGreaterThan(1);

            JsonNode next =
                    ask(opened, WAY + "&fibers=4&same_tube=yes").path("options").get(0);
            assertThat(fibersOf(next, "FDR-S-1")).doesNotContain(229, 230, 231, 232);
            assertThat(fibersOf(next, "LAT-11")).containsExactly(17, 18, 19, 20);
        }
    }

    private static JsonNode options(OpenPage opened, String query) {
        return ask(opened, WAY + query + AS_LOADED).path("options");
    }

    private static JsonNode ask(OpenPage opened, String path) {
        return ask(opened, path, "");
    }

    /** What the server answers to the page's own question: by GET, or by POST where something is sent. */
    private static JsonNode ask(OpenPage opened, String path, String body) {
        String script = "([path, body]) => fetch(path, body === '' ? {} : { method: 'POST', body,"
                + " headers: { 'Content-Type': 'application/json' } }).then((answer) => answer.text())";
        Object text = opened.page().evaluate(script, List.of(path, body));
        try {
            return JSON.readTree(text.toString());
        } catch (JsonProcessingException wrong) {
            throw new IllegalStateException(path + " answers no JSON: " + text, wrong);
        }
    }

    /** The fibers of a cable that an option takes, in order. */
    private static List<Integer> fibersOf(JsonNode option, String cable) {
        List<Integer> found = new ArrayList<>();
        option.path("fibers")
                .forEach(path -> texts(path).stream()
                        .filter(fiber -> fiber.startsWith(cable + ":"))
                        .forEach(fiber -> found.add(Integer.valueOf(fiber.substring(cable.length() + 1)))));
        found.sort(null);
        return found;
    }

    private static double length(OpenPage opened, List<String> spans) {
        return spans.stream()
                .mapToDouble(
                        span -> ask(opened, "/spans/" + span).path("length_m").asDouble())
                .sum();
    }

    private static List<String> texts(JsonNode list) {
        List<String> texts = new ArrayList<>();
        list.forEach(each -> texts.add(each.asText()));
        return texts;
    }

    private static String fact(String name) {
        Map<String, String> facts = Stories.facts("3-seed-works/facts.csv");
        return Objects.requireNonNull(facts.get(name), name);
    }

    private static OpenPage opened(String hash) {
        return OpenPage.open(browser, server, hash, 1366, 768, ColorScheme.LIGHT);
    }
}
