package spanwright.http;

import static java.nio.charset.StandardCharsets.UTF_8;
import static org.assertj.core.api.Assertions.assertThat;

import com.fasterxml.jackson.databind.JsonNode;
import java.net.URLEncoder;
import java.net.http.HttpResponse;
import java.util.List;
import java.util.Set;
import java.util.TreeSet;
import java.util.stream.Stream;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import spanwright.network.Ledger;
import spanwright.plant.Cable;
import spanwright.plant.Enclosure;
import spanwright.plant.Span;
import spanwright.plant.Structure;
import spanwright.records.EndNames;
import spanwright.records.Records;

/** Every route over real HTTP, on random plants, held to the OpenAPI document. */
class RoutesTest {

    private static final OpenApi OPEN_API = new OpenApi();

    private final TestServer server = new TestServer();

    @AfterEach
    void stop() {
        server.close();
    }

    @ParameterizedTest
    @ValueSource(longs = {1, 2, 3, 4, 5, 6, 7, 8})
    void everything_in_a_plant_is_answered_as_described(long seed) {
        Ledger ledger = server.plant(seed);
        Records records = ledger.current().records();
        for (Structure structure : records.structures().list().toList()) {
            get("/structures/{code}", "/structures/" + structure.code());
        }
        for (Span span : records.spans().list().toList()) {
            get("/spans/{code}", "/spans/" + span.code());
        }
        for (Enclosure enclosure : records.enclosures().list().toList()) {
            get("/enclosures/{code}", "/enclosures/" + enclosure.code());
        }
        for (Cable cable : records.cables().list().toList()) {
            get("/cables/{code}", "/cables/" + cable.code());
        }
        records.circuits().list().forEach(circuit -> get("/circuits/{code}", "/circuits/" + circuit.code()));
        for (String job : records.plannedJobs()) {
            records.enclosures()
                    .list()
                    .limit(5)
                    .forEach(enclosure ->
                            get("/enclosures/{code}", "/enclosures/" + enclosure.code() + "?as_if=" + encoded(job)));
        }
    }

    @ParameterizedTest
    @ValueSource(longs = {11, 12, 13})
    void the_map_the_lists_and_finding_are_answered_as_described(long seed) {
        Records records = server.plant(seed).current().records();

        JsonNode status = get("/status", "/status");
        assertThat(status.at("/counts/structures").asInt())
                .isEqualTo(records.structures().count());
        JsonNode map = get("/map/plant", "/map/plant?west=-180&south=-90&east=180&north=90&zoom=18");
        assertThat(map.path("features").size())
                .isGreaterThanOrEqualTo(records.structures().count());
        get("/map/plant", "/map/plant?west=-180&south=-90&east=180&north=90&zoom=2.5");
        get("/map/base", "/map/base?west=-180&south=-90&east=180&north=90&zoom=10");
        JsonNode circuits = get("/circuits", "/circuits?limit=1");
        assertThat(circuits.path("total").asInt()).isEqualTo(records.circuits().count());
        get("/postings", "/postings");
        get("/health", "/health");
        get("/openapi.json", "/openapi.json");
        Stream.of(
                        "a",
                        "1",
                        "-",
                        records.structures().list().findFirst().orElseThrow().code())
                .forEach(typed -> get("/find", "/find?q=" + encoded(typed)));
    }

    @ParameterizedTest
    @ValueSource(longs = {21, 22, 23, 24, 25, 26})
    void every_trace_is_answered_as_described(long seed) {
        Records records = server.plant(seed).current().records();
        EndNames names = new EndNames(records);
        records.circuits().list().forEach(circuit -> trace("circuit", circuit.code()));
        records.panels().list().forEach(panel -> trace("port", names.port(panel.id(), panel.ports())));
        records.cables()
                .list()
                .forEach(cable ->
                        trace("fiber", names.fiber(cable.id(), 1) + "&wavelength=1550&budget=B%2B&margin=0.5"));
    }

    @ParameterizedTest
    @ValueSource(longs = {31, 32, 33, 34})
    void every_cut_is_answered_as_described(long seed) {
        Records records = server.plant(seed).current().records();
        records.spans().list().forEach(span -> cut("span:" + span.code()));
        records.structures().list().forEach(structure -> cut("structure:" + structure.code()));
        records.enclosures().list().forEach(enclosure -> cut("enclosure:" + enclosure.code()));
        records.cables().list().forEach(cable -> {
            cut("cable:" + cable.code() + "&cut=tube:" + cable.code() + "/1");
            cut("place:" + cable.code() + "@0");
        });
    }

    @ParameterizedTest
    @ValueSource(longs = {41, 42, 43})
    void every_circuit_that_is_down_has_its_suspects(long seed) {
        Records records = server.plant(seed).current().records();
        records.circuits().list().forEach(circuit -> {
            JsonNode answer = OPEN_API.check(
                    "POST", "/suspects", post("{\"down\":[\"" + circuit.code() + "\"],\"by_path\":true}"));
            assertThat(answer.path("suspects").isArray()).isTrue();
            answer.path("suspects").forEach(RoutesTest::liesOnTheMap);
        });
    }

    @ParameterizedTest
    @ValueSource(
            strings = {
                "{}",
                "[]",
                "{\"down\":[]}",
                "{\"down\":[\"no-such\"]}",
                "{\"down\":\"C-1\"}",
                "{\"down\":[1]}",
                "{\"down\":[\"C-1\"],\"by_path\":1}",
                "{\"down\":[\"C-1\"],\"left\":[]}",
                "{\"down\":[\"C-1\"],\"up\":[\"C-1\"]}",
                "{"
            })
    void alarms_that_cannot_be_are_refused(String body) {
        server.plant(31);
        var answer = post(body);

        assertThat(answer.statusCode()).isIn(400, 404);
        OPEN_API.check("POST", "/suspects", answer);
    }

    /** A suspect with spans has two ends, and no more lines than spans; each of its enclosures has a place. */
    private static void liesOnTheMap(JsonNode suspect) {
        int spans = suspect.path("spans").size();
        assertThat(suspect.path("ends")).hasSize(spans == 0 ? 0 : 2);
        assertThat(suspect.path("lines").size()).isLessThanOrEqualTo(spans);
        assertThat(suspect.path("places")).hasSameSizeAs(suspect.path("enclosures"));
    }

    private HttpResponse<byte[]> post(String body) {
        return server.asking().post("/suspects", body, "Content-Type", "application/json");
    }

    private void cut(String what) {
        assertThat(get("/impact", "/impact?cut=" + what).has("sheath")).isFalse();
        JsonNode sheath = get("/impact", "/impact?fibers=yes&cut=" + what).path("sheath");
        assertThat(sheath.isArray()).isTrue();
    }

    @ParameterizedTest
    @ValueSource(
            strings = {
                "",
                "?cut=span",
                "?cut=span:no-such",
                "?cut=tube:F-1",
                "?cut=tube:F-1/999",
                "?cut=place:F-1@-1",
                "?cut=place:F-1@9999999",
                "?cut=pole:H-1",
                "?cut=span:no-such&fibers=maybe"
            })
    void a_cut_of_nothing_is_refused(String asked) {
        server.plant(31);
        var answer = server.asking().get("/impact" + asked);

        assertThat(answer.statusCode()).isIn(400, 404);
        assertThat(OPEN_API.check("GET", "/impact", answer).path("parameter").asText())
                .isIn("cut", "fibers");
    }

    /** A random plant may lack a value for some glass or splitter; then that is what is answered. */
    private void trace(String what, String which) {
        var answer = server.asking().get("/trace?" + what + "=" + which);
        JsonNode body = OPEN_API.check("GET", "/trace", answer);
        assertThat(answer.statusCode() == 200 || body.path("code").asText().equals("wavelength_out_of_range"))
                .as("%s", body)
                .isTrue();
    }

    @Test
    void a_trace_is_asked_of_one_thing() {
        server.plant(27);
        assertThat(problem("/trace", "/trace", 400).path("detail").asText()).startsWith("Nothing to trace is named");
        problem("/trace", "/trace?port=E1/P/1&fiber=F-1:1", 400);
        assertThat(problem("/trace", "/trace?circuit=nothing-so-named", 404)
                        .path("code")
                        .asText())
                .isEqualTo("bad_reference");
        assertThat(problem("/trace", "/trace?fiber=F", 400).path("parameter").asText())
                .isEqualTo("fiber");
        problem("/trace", "/trace?fiber=F:1&wavelength=1e3", 400);
        problem("/trace", "/trace?fiber=F:1&wavelength=0", 400);
        problem("/trace", "/trace?fiber=F:1&margin=-1", 400);
        problem("/trace", "/trace?fiber=F:1&budget=Q", 400);
        problem("/trace", "/trace?" + "circuit=a&".repeat(201), 400);
    }

    @Test
    void pages_of_circuits_hold_each_circuit_once() {
        Records records = server.plant(4).current().records();
        Set<String> seen = new TreeSet<>();
        String after = "";
        do {
            JsonNode page = get("/circuits", "/circuits?limit=2&after=" + encoded(after));
            page.path("circuits")
                    .forEach(circuit -> assertThat(
                                    seen.add(circuit.path("circuit").asText()))
                            .isTrue());
            after = page.path("next").isNull() ? null : page.path("next").asText();
        } while (after != null);

        assertThat(seen).hasSize(records.circuits().count());
    }

    @Test
    void what_is_not_there_is_said_with_what_was_probably_meant() {
        Records records = server.plant(5).current().records();
        String code = records.structures().list().findFirst().orElseThrow().code();

        JsonNode problem = problem("/structures/{code}", "/structures/" + code + "x", 404);

        assertThat(problem.path("code").asText()).isEqualTo("not_found");
        assertThat(problem.path("detail").asText())
                .isEqualTo("There is no structure " + code + "x. Is " + code + " meant?");
        for (String kind : List.of("spans", "enclosures", "cables", "circuits")) {
            problem("/" + kind + "/{code}", "/" + kind + "/no-such-thing-at-all", 404);
        }
        problem("/postings/{id}", "/postings/99", 404);
    }

    @Test
    void what_is_asked_wrongly_is_said_to_be_wrong() {
        server.plant(6);
        assertThat(problem("/find", "/find", 400).path("parameter").asText()).isEqualTo("q");
        assertThat(problem("/find", "/find?q=a&limit=0", 400).path("parameter").asText())
                .isEqualTo("limit");
        assertThat(problem("/find", "/find?q=a&q=b", 400).path("parameter").asText())
                .isEqualTo("q");
        assertThat(problem("/find", "/find?q=" + "a".repeat(201), 400)
                        .path("parameter")
                        .asText())
                .isEqualTo("q");
        assertThat(problem("/map/plant", "/map/plant?west=1&south=0&east=0&north=1&zoom=3", 400)
                        .path("parameter")
                        .asText())
                .isEqualTo("east");
        assertThat(problem("/map/plant", "/map/plant?west=0&south=1&east=0&north=0&zoom=3", 400)
                        .path("parameter")
                        .asText())
                .isEqualTo("north");
        assertThat(problem("/map/plant", "/map/plant?west=x&south=0&east=0&north=1&zoom=3", 400)
                        .path("parameter")
                        .asText())
                .isEqualTo("west");
        assertThat(problem("/map/plant", "/map/plant?west=0&south=0&east=0&north=1&zoom=99", 400)
                        .path("parameter")
                        .asText())
                .isEqualTo("zoom");
        assertThat(problem("/status", "/status?as_of=tomorrow", 400)
                        .path("parameter")
                        .asText())
                .isEqualTo("as_of");
        assertThat(problem("/status", "/status?as_of=99", 404).path("code").asText())
                .isEqualTo("bad_reference");
        assertThat(problem("/status", "/status?as_if=no-such-job", 404)
                        .path("parameter")
                        .asText())
                .isEqualTo("as_if");
        problem("/postings/{id}", "/postings/x", 400);
        problem("/circuits", "/circuits?prefix=" + "a".repeat(201), 400);
    }

    @Test
    void who_holds_an_answer_is_told_so_until_something_is_posted() {
        Ledger ledger = server.plant(7);
        String tag = server.asking().get("/status").headers().firstValue("ETag").orElseThrow();

        assertThat(server.asking().get("/status", "If-None-Match", tag).statusCode())
                .isEqualTo(304);
        assertThat(server.asking()
                        .get("/status", "If-None-Match", "\"other\", " + tag)
                        .statusCode())
                .isEqualTo(304);
        server.rename(ledger, "Another Owner");
        assertThat(server.asking().get("/status", "If-None-Match", tag).statusCode())
                .isEqualTo(200);
    }

    @Test
    void a_past_posting_answers_as_it_did() {
        Ledger ledger = server.plant(8);
        server.rename(ledger, "First Owner");
        int first = ledger.current().records().posting();
        server.rename(ledger, "Second Owner");

        assertThat(get("/status", "/status").path("owner").asText()).isEqualTo("Second Owner");
        assertThat(get("/status", "/status?as_of=" + first).path("owner").asText())
                .isEqualTo("First Owner");
        assertThat(get("/status", "/status?as_of=2001-01-01").path("owner").isNull())
                .isTrue();
        assertThat(get("/status", "/status?as_of=2099-01-01T00:00")
                        .path("owner")
                        .asText())
                .isEqualTo("Second Owner");
    }

    private JsonNode get(String path, String address) {
        var answer = server.asking().get(address);
        assertThat(answer.statusCode())
                .as("%s %s", address, new String(answer.body(), UTF_8))
                .isEqualTo(200);
        return OPEN_API.check("GET", path, answer);
    }

    private JsonNode problem(String path, String address, int status) {
        var answer = server.asking().get(address);
        assertThat(answer.statusCode())
                .as("%s %s", address, new String(answer.body(), UTF_8))
                .isEqualTo(status);
        return OPEN_API.check("GET", path, answer);
    }

    private static String encoded(String text) {
        return URLEncoder.encode(text, UTF_8);
    }
}
