package spanwright.http;

import static java.nio.charset.StandardCharsets.UTF_8;
import static org.assertj.core.api.Assertions.assertThat;

import com.fasterxml.jackson.databind.JsonNode;
import java.net.http.HttpResponse;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import spanwright.plant.Span;
import spanwright.records.Records;

/** Temporary paths over real HTTP, on random plants, held to the OpenAPI document. */
class LightRouteTest {

    private static final OpenApi OPEN_API = new OpenApi();

    private final TestServer server = new TestServer();

    @AfterEach
    void stop() {
        server.close();
    }

    private static HttpResponse<byte[]> post(TestServer server, String body) {
        return server.asking().post("/light", body, "Content-Type", "application/json");
    }

    private static JsonNode light(TestServer server, String body) {
        OPEN_API.checkRequest("/light", body.getBytes(UTF_8));
        HttpResponse<byte[]> answer = post(server, body);
        assertThat(answer.statusCode()).as(new String(answer.body(), UTF_8)).isEqualTo(200);
        return OPEN_API.check("POST", "/light", answer);
    }

    @Test
    void every_cut_is_answered_as_described() {
        int offers = 0;
        for (long seed = 51; seed <= 62; seed++) {
            try (TestServer each = new TestServer()) {
                offers += offers(each, seed);
            }
        }
        assertThat(offers).isPositive();
    }

    private static int offers(TestServer server, long seed) {
        Records records = server.plant(seed).current().records();
        int offers = 0;
        for (Span span : records.spans().list().toList()) {
            JsonNode answer = light(
                    server,
                    "{\"cuts\":[\"span:" + span.code()
                            + "\"],\"verified_only\":false,\"offers\":2,\"until\":\"2026-12-08\"}");
            for (JsonNode group : answer.path("groups")) {
                offers += group.path("offers").size();
                assertThat(group.path("offers").size() + group.path("refused").size())
                        .as("seed %d, %s: an offer, or why none", seed, span.code())
                        .isPositive();
            }
        }
        return offers;
    }

    @Test
    void a_circuit_that_nothing_named_hits_is_a_stray() {
        Records records = server.plant(51).current().records();
        String circuit = records.circuits().list().findFirst().orElseThrow().code();
        int strays = 0;
        for (Span span : records.spans().list().toList()) {
            JsonNode answer =
                    light(server, "{\"down\":[\"" + circuit + "\"],\"avoid\":[\"span:" + span.code() + "\"]}");
            strays += answer.path("strays").size();
            assertThat(answer.path("strays").size() + answer.path("groups").size())
                    .isEqualTo(1);
        }
        assertThat(strays).isPositive();
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "{}                                             | bad_request",
                "[]                                             | bad_request",
                "{                                              | bad_request",
                "{\"cuts\":[]}                                  | bad_request",
                "{\"cuts\":\"span:S-1\"}                        | bad_request",
                "{\"cuts\":[1]}                                 | bad_request",
                "{\"cuts\":[\"pole:H-1\"]}                      | bad_request",
                "{\"avoid\":[\"span:no-such\"]}                 | bad_reference",
                "{\"cuts\":[\"AT\"],\"down\":[\"no-such\"]}     | bad_reference",
                "{\"cuts\":[\"AT\"],\"from_panels\":[\"no/P\"]} | bad_reference",
                "{\"cuts\":[\"AT\"],\"from_panels\":[\"no\"]}   | bad_request",
                "{\"cuts\":[\"AT\"],\"verified_only\":1}        | bad_request",
                "{\"cuts\":[\"AT\"],\"margin_db\":-1}           | bad_request",
                "{\"cuts\":[\"AT\"],\"margin_db\":1e-9}         | bad_request",
                "{\"cuts\":[\"AT\"],\"margin_db\":1e99}         | bad_request",
                "{\"cuts\":[\"AT\"],\"offers\":0}               | bad_request",
                "{\"cuts\":[\"AT\"],\"offers\":6}               | bad_request",
                "{\"cuts\":[\"AT\"],\"until\":\"soon\"}         | bad_request",
                "{\"cuts\":[\"AT\"],\"until\":20261208}         | bad_request",
                "{\"cuts\":[\"AT\"],\"to\":[]}                  | bad_request"
            })
    void a_question_that_cannot_be_is_refused(String body, String code) {
        Records records = server.plant(51).current().records();
        String span = "span:" + records.spans().list().findFirst().orElseThrow().code();

        HttpResponse<byte[]> answer = post(server, body.replace("AT", span));

        assertThat(answer.statusCode()).isIn(400, 404);
        assertThat(OPEN_API.check("POST", "/light", answer).path("code").asText())
                .as(body)
                .isEqualTo(code);
    }

    @Test
    void another_site_s_page_cannot_ask() {
        HttpResponse<byte[]> answer = server.asking()
                .post("/light", "{}", "Content-Type", "application/json", "Origin", "http://plant.example");

        assertThat(answer.statusCode()).isEqualTo(403);
    }
}
