package spanwright.http;

import static java.nio.charset.StandardCharsets.UTF_8;
import static org.assertj.core.api.Assertions.assertThat;

import com.fasterxml.jackson.databind.JsonNode;
import java.net.http.HttpResponse;
import java.time.Instant;
import java.time.OffsetDateTime;
import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import spanwright.circuits.Circuit;
import spanwright.circuits.CircuitStatus;

/** Incidents over real HTTP: opened, followed, counted, closed. */
class IncidentRoutesTest {

    private static final OpenApi OPEN_API = new OpenApi();
    private static final String JSON = "application/json";
    private static final String BEGAN = "2026-03-31T10:42:00-05:00";

    private final TestServer server = new TestServer();
    private String circuit = "";
    private int customers;

    @AfterEach
    void stop() {
        server.close();
    }

    @BeforeEach
    void pickCircuit() {
        Circuit picked = server.plant(3)
                .current()
                .records()
                .circuits()
                .list()
                .filter(each -> each.status() == CircuitStatus.WORKING && each.protectionGroup() == null)
                .findFirst()
                .orElseThrow();
        circuit = picked.code();
        customers = picked.customersServed();
    }

    private HttpResponse<byte[]> send(String path, String body) {
        return server.asking().post(path, body.replace('\'', '"'), "Content-Type", JSON);
    }

    private JsonNode post(String described, String path, String body, int status) {
        if (status == 201) {
            OPEN_API.checkRequest(described, body.replace('\'', '"').getBytes(UTF_8));
        }
        HttpResponse<byte[]> answer = send(path, body);
        assertThat(answer.statusCode()).as(new String(answer.body(), UTF_8)).isEqualTo(status);
        return OPEN_API.check("POST", described, answer);
    }

    private JsonNode open() {
        return post("/incidents", "/incidents", opening(circuit), 201);
    }

    private static String opening(String down) {
        return "{'title': 'Cut near Wendlecote', 'by': 'D. Reed', 'began_at': '" + BEGAN + "', 'cuts': ['span:S-1'],"
                + " 'down': ['" + down + "'], 'reading': '7,412 m from HE-1'}";
    }

    private JsonNode write(String entry, int status) {
        return post("/incidents/{id}/entries", "/incidents/1/entries", entry, status);
    }

    private JsonNode get(String query) {
        return OPEN_API.check("GET", "/incidents/{id}", server.asking().get("/incidents/1" + query));
    }

    @Test
    void an_incident_is_opened_on_the_records_as_they_stand_and_found_where_it_is_said_to_be() {
        HttpResponse<byte[]> answer = send("/incidents", opening(circuit));

        assertThat(answer.headers().firstValue("Location")).contains("/incidents/1");
        JsonNode body = OPEN_API.check("POST", "/incidents", answer);
        server.rename(server.ledger(), "Valley Fiber");
        assertThat(body.path("posting").asInt()).isEqualTo(1);
        assertThat(get("").path("posting").asInt())
                .as("the records stay frozen")
                .isEqualTo(1);
        assertThat(body.at("/from/reading").asText()).isEqualTo("7,412 m from HE-1");
        assertThat(body.at("/counts/circuits_down/0").asText()).isEqualTo(circuit);
        assertThat(body.path("decision").asText()).isEqualTo("a person decides");
        JsonNode list = OPEN_API.check("GET", "/incidents", server.asking().get("/incidents"));
        assertThat(list.at("/incidents/0/title").asText()).isEqualTo("Cut near Wendlecote");
        assertThat(list.at("/incidents/0/circuits_down").asInt()).isEqualTo(1);
    }

    @Test
    void what_is_believed_cut_says_what_is_down_where_nobody_has() {
        List<String> down = new ArrayList<>();
        String cut = server.ledger()
                .current()
                .records()
                .spans()
                .list()
                .map(span -> "span:" + span.code())
                .filter(span -> {
                    down.clear();
                    OPEN_API.check("GET", "/impact", server.asking().get("/impact?cut=" + span))
                            .path("circuits")
                            .forEach(hit -> {
                                if (hit.path("state").asText().equals("down")) {
                                    down.add(hit.path("circuit").asText());
                                }
                            });
                    return !down.isEmpty();
                })
                .findFirst()
                .orElseThrow();

        JsonNode opened = post(
                "/incidents",
                "/incidents",
                "{'title': 'Cut', 'by': 'D. Reed', 'began_at': '" + BEGAN + "', 'cuts': ['" + cut + "']}",
                201);

        List<String> counted = new ArrayList<>();
        opened.at("/counts/circuits_down").forEach(code -> counted.add(code.asText()));
        assertThat(counted).containsExactlyInAnyOrderElementsOf(down);
    }

    @Test
    void it_is_counted_as_of_a_time_and_each_threshold_says_its_source() {
        open();
        write("{'kind': 'stated', 'at': '" + BEGAN + "', 'by': 'D. Reed', 'users': 410, 'oc3': 64}", 201);
        JsonNode after = get("?at=2026-03-31T11:42:00-05:00");

        assertThat(after.at("/counts/circuit_minutes").decimalValue()).isEqualByComparingTo("60");
        assertThat(after.at("/counts/customer_minutes").asLong()).isEqualTo(60L * customers);
        assertThat(after.at("/counts/stated_user_minutes").asInt()).isEqualTo(24_600);
        assertThat(after.at("/counts/oc3_minutes").asInt()).isEqualTo(3_840);
        JsonNode users = after.at("/thresholds/1");
        assertThat(users.path("setting").asText()).isEqualTo("report.user_minutes");
        assertThat(users.path("reached").asBoolean()).isFalse();
        // 47 CFR 4.9: 900,000 user-minutes; with 410 users that is 36.585 h, to 23:17 on 1 April.
        assertThat(OffsetDateTime.parse(users.path("reached_at").asText()).toInstant())
                .isBetween(Instant.parse("2026-04-02T04:17:00Z"), Instant.parse("2026-04-02T04:18:00Z"));
        assertThat(users.path("source").asText()).contains("47 CFR 4.9");
        assertThat(after.at("/thresholds/2/reached").asBoolean()).isTrue();
        assertThat(after.at("/papers/0/left_minutes").decimalValue())
                .as("it was entered late")
                .isPositive();
    }

    @Test
    void its_log_is_corrected_by_later_entries_and_its_clock_follows() {
        open();
        write("{'kind': 'found', 'at': '2026-03-31T11:30:00-05:00', 'by': 'D. Reed'}", 201);
        JsonNode body = write(
                "{'kind': 'found', 'at': '2026-03-31T16:35:00Z', 'by': 'D. Reed', 'corrects': 1, 'text': 'by his watch'}",
                201);

        assertThat(body.at("/log/0/corrected_by").asInt()).isEqualTo(2);
        assertThat(body.at("/log/1/text").asText()).isEqualTo("by his watch");
        assertThat(OffsetDateTime.parse(body.at("/clock/found").asText()).toInstant())
                .isEqualTo("2026-03-31T16:35:00Z");
    }

    @Test
    void it_is_closed_once_all_is_back_and_then_stands_after_those_that_are_open() {
        open();
        String close = "{'at': '2026-03-31T19:00:00-05:00', 'by': 'D. Reed', 'text': 'Tested'}";
        JsonNode refused = post("/incidents/{id}/close", "/incidents/1/close", close, 422);
        assertThat(refused.at("/faults/0/text").asText()).contains(circuit).contains("circuits_back");
        write(
                "{'kind': 'circuits_back', 'at': '2026-03-31T12:18:00-05:00', 'by': 'D. Reed', 'circuits': ['" + circuit
                        + "']}",
                201);
        JsonNode closed = post("/incidents/{id}/close", "/incidents/1/close", close, 201);

        assertThat(closed.path("open").asBoolean()).isFalse();
        assertThat(closed.at("/counts/circuit_minutes").decimalValue()).isEqualByComparingTo("96");
        open();
        JsonNode list = OPEN_API.check("GET", "/incidents", server.asking().get("/incidents"));
        assertThat(list.at("/incidents/0/incident").asInt()).isEqualTo(2);
        assertThat(list.at("/incidents/1/closed_at").isTextual()).isTrue();
    }

    @ParameterizedTest
    @ValueSource(
            strings = {
                "{'title': 'Cut', 'by': 'D. Reed', 'began_at': '2026-03-31T10:42:00', 'down': []}",
                "{'title': 'Cut', 'by': 'D. Reed', 'began_at': '2026-03-31', 'reading': 'x'}",
                "{'title': 'Cut', 'by': 'D. Reed', 'began_at': 7, 'reading': 'x'}",
                "{'title': ' ', 'by': 'D. Reed', 'began_at': '2026-03-31T10:42Z', 'reading': 'x'}",
                "{'by': 'D. Reed', 'began_at': '2026-03-31T10:42Z', 'reading': 'x'}",
                "{'title': 'Cut', 'by': 'D. Reed', 'began_at': '2026-03-31T10:42Z', 'down': 'C-1'}",
                "{'title': 'Cut', 'by': 'D. Reed', 'began_at': '2026-03-31T10:42Z', 'down': ['C 1']}",
                "{'title': 'Cut', 'by': 'D. Reed', 'began_at': '2026-03-31T10:42Z', 'why': 'x'}"
            })
    void a_body_that_opens_nothing_is_said_to_be_wrong(String body) {
        assertThat(post("/incidents", "/incidents", body, 400).path("code").asText())
                .isEqualTo("bad_request");
    }

    @Test
    void what_the_records_do_not_know_is_refused_with_what_would_be_right() {
        JsonNode problem = post("/incidents", "/incidents", opening("no-such"), 422);
        assertThat(problem.at("/faults/0/column").asText()).isEqualTo("down");
        assertThat(problem.at("/faults/0/text").asText()).contains("no-such");
        post("/incidents", "/incidents", opening(circuit).replace("span:S-1", "S-1"), 422);
        post(
                "/incidents",
                "/incidents",
                opening(circuit).replace("'reading'", "'up': ['" + circuit + "'], 'reading'"),
                422);
        post("/incidents", "/incidents", opening(circuit).replace("2026-", "2126-"), 422);
    }

    @Test
    void an_incident_that_is_not_there_and_a_time_before_it_began_are_said_to_be_wrong() {
        open();
        assertThat(server.asking().get("/incidents/7").statusCode()).isEqualTo(404);
        assertThat(server.asking()
                        .get("/incidents/1?at=2026-03-31T10:41:00-05:00")
                        .statusCode())
                .isEqualTo(400);
        assertThat(server.asking().get("/incidents/1?at=yesterday").statusCode())
                .isEqualTo(400);
        String note = "{'kind': 'note', 'at': '" + BEGAN + "', 'by': 'D. Reed', 'text': 'x'}";
        post("/incidents/{id}/entries", "/incidents/7/entries", note, 404);
        write(note.replace("'note'", "'guess'"), 400);
        write(note.replace("'x'", "'x', 'users': -1"), 400);
        write(note.replace("'x'", "'x', 'oc3': -1"), 400);
        write(note.replace("'x'", "'x', 'oc3': 1e900"), 400);
    }

    @Test
    void another_site_s_page_cannot_write() {
        for (String path : new String[] {"/incidents", "/incidents/1/entries", "/incidents/1/close"}) {
            assertThat(server.asking()
                            .post(path, "{}", "Content-Type", JSON, "Origin", "http://plant.example")
                            .statusCode())
                    .as(path)
                    .isEqualTo(403);
        }
    }
}
