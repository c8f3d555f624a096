package spanwright.http;

import static java.nio.charset.StandardCharsets.UTF_8;
import static org.assertj.core.api.Assertions.assertThat;

import com.fasterxml.jackson.databind.JsonNode;
import java.io.IOException;
import java.io.InputStream;
import java.net.InetAddress;
import java.net.Socket;
import java.net.http.HttpResponse;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** Posting over real HTTP: what is taken, what is refused, and from whom. */
class PostingRouteTest {

    private static final OpenApi OPEN_API = new OpenApi();
    private static final String JSON = "application/json";
    private static final String OWNER = """
            {"by": "A. Marsh", "reason": "Sheet 0412",
             "changes": [{"action": "add", "table": "settings", "row": {"name": "owner", "value": "Valley Fiber"}}]}""";

    private final TestServer server =
            new TestServer(ServerOptions.at("127.0.0.1", 0).withLargestBody(2_000));

    @AfterEach
    void stop() {
        server.close();
    }

    private HttpResponse<byte[]> post(String body) {
        return server.asking().post("/postings", body, "Content-Type", JSON);
    }

    private JsonNode problem(HttpResponse<byte[]> answer, int status) {
        assertThat(answer.statusCode()).as(new String(answer.body(), UTF_8)).isEqualTo(status);
        return OPEN_API.check("POST", "/postings", answer);
    }

    @Test
    void a_posting_is_kept_and_found_where_it_is_said_to_be() {
        OPEN_API.checkRequest("/postings", OWNER.getBytes(UTF_8));

        HttpResponse<byte[]> answer = post(OWNER);

        assertThat(answer.statusCode()).as(new String(answer.body(), UTF_8)).isEqualTo(201);
        JsonNode body = OPEN_API.check("POST", "/postings", answer);
        assertThat(body.path("posting").asInt()).isEqualTo(1);
        assertThat(body.at("/changes/0/after/value").asText()).isEqualTo("Valley Fiber");
        assertThat(body.at("/changes/0/action").asText()).isEqualTo("add");
        String location = answer.headers().firstValue("Location").orElseThrow();
        assertThat(location).isEqualTo("/postings/1");
        HttpResponse<byte[]> kept = server.asking().get(location);
        assertThat(OPEN_API.check("GET", "/postings/{id}", kept)).isEqualTo(body);
        JsonNode list = OPEN_API.check("GET", "/postings", server.asking().get("/postings"));
        assertThat(list.at("/postings/0/reason").asText()).isEqualTo("Sheet 0412");
    }

    @Test
    void a_refused_posting_names_its_faults_and_keeps_nothing() {
        post(OWNER);

        JsonNode problem = problem(post(OWNER), 422);

        assertThat(problem.path("code").asText()).isEqualTo("refused");
        assertThat(problem.path("faults").isEmpty()).isFalse();
        assertThat(server.ledger().current().records().posting()).isEqualTo(1);
    }

    @Test
    void pages_of_postings_and_of_changes_go_on_where_the_last_ended() {
        post(OWNER);
        for (int posting = 2; posting <= 5; posting++) {
            server.rename(server.ledger(), "Owner " + posting);
        }

        JsonNode first = OPEN_API.check("GET", "/postings", server.asking().get("/postings?limit=3"));
        JsonNode rest = OPEN_API.check(
                "GET",
                "/postings",
                server.asking()
                        .get("/postings?limit=3&before=" + first.path("next").asInt()));
        JsonNode none = OPEN_API.check("GET", "/postings", server.asking().get("/postings?as_of=2&limit=2"));
        JsonNode past =
                OPEN_API.check("GET", "/postings/{id}", server.asking().get("/postings/2?from_change=1&limit=1"));
        JsonNode renamed =
                OPEN_API.check("GET", "/postings/{id}", server.asking().get("/postings/2"));

        assertThat(first.path("postings").size()).isEqualTo(3);
        assertThat(rest.at("/postings/0/posting").asInt()).isEqualTo(2);
        assertThat(rest.path("next").isNull()).isTrue();
        assertThat(none.at("/postings/0/posting").asInt()).isEqualTo(2);
        assertThat(past.path("changes").isEmpty()).isTrue();
        assertThat(renamed.at("/changes/0/action").asText()).isEqualTo("change");
        assertThat(renamed.at("/changes/0/before/value").asText()).isEqualTo("Valley Fiber");
    }

    @ParameterizedTest
    @ValueSource(
            strings = {
                "",
                "not JSON",
                "[]",
                "{} {}",
                "{\"by\": \"A\", \"reason\": \"R\", \"changes\": []}",
                "{\"by\": \" \", \"reason\": \"R\", \"changes\": [{\"action\": \"add\", \"table\": \"settings\", \"row\": {\"name\": \"a\"}}]}",
                "{\"by\": \"A\", \"changes\": [{\"action\": \"add\", \"table\": \"settings\", \"row\": {\"name\": \"a\"}}]}",
                "{\"by\": \"A\", \"by\": \"B\", \"reason\": \"R\", \"changes\": []}",
                "{\"by\": \"A\", \"reason\": \"R\", \"changes\": [{\"action\": \"make\", \"table\": \"settings\", \"row\": {\"name\": \"a\"}}]}",
                "{\"by\": \"A\", \"reason\": \"R\", \"changes\": [{\"action\": \"add\", \"row\": {\"name\": \"a\"}}]}",
                "{\"by\": \"A\", \"reason\": \"R\", \"changes\": [{\"action\": \"add\", \"table\": \"settings\"}]}",
                "{\"by\": \"A\", \"reason\": \"R\", \"changes\": [{\"action\": \"remove\", \"table\": \"settings\"}]}",
                "{\"by\": \"A\", \"reason\": \"R\", \"changes\": [{\"action\": \"add\", \"table\": \"settings\", \"row\": []}]}",
                "{\"by\": \"A\", \"reason\": \"R\", \"changes\": [{\"action\": \"add\", \"table\": \"settings\", \"row\": {\"Name\": \"a\"}}]}",
                "{\"by\": \"A\", \"reason\": \"R\", \"changes\": [{\"action\": \"add\", \"table\": \"settings\", \"row\": {\"name\": true}}]}",
                "{\"by\": \"A\", \"reason\": \"R\", \"changes\": [{\"action\": \"add\", \"table\": \"settings\", \"row\": {\"name\": 1e999999}}]}",
                "{\"by\": \"A\", \"reason\": \"R\", \"changes\": [{\"action\": \"add\", \"table\": \"settings\", \"row\": {\"name\": \"a\"}, \"why\": 1}]}",
                "{\"by\": \"A\", \"reason\": \"R\", \"changes\": [1]}",
                "[[[[[[[[[[[[[[[[[[[[]]]]]]]]]]]]]]]]]]]]"
            })
    void a_body_that_is_not_a_posting_is_said_to_be_none(String body) {
        assertThat(problem(post(body), 400).path("code").asText()).isEqualTo("bad_request");
        assertThat(server.ledger().current().records().posting()).isZero();
    }

    @Test
    void numbers_and_nulls_are_taken_as_texts_and_blanks() {
        PostingBody body = PostingBody.read("""
                {"by": " A ", "reason": "R", "changes": [
                  {"action": "change", "table": "structures", "key": {"structure": "HH-4"},
                   "row": {"accuracy_m": 0.50, "lon": -1e2, "note": null}}]}""".getBytes(UTF_8));

        assertThat(body.by()).isEqualTo("A");
        assertThat(body.changes().get(0).row())
                .containsEntry("accuracy_m", "0.5")
                .containsEntry("lon", "-100")
                .containsEntry("note", null);
        assertThat(body.changes().get(0).key()).containsEntry("structure", "HH-4");
    }

    @Test
    void a_body_is_bounded_and_is_JSON() {
        String large = OWNER.replace("Sheet 0412", "x".repeat(3_000));

        assertThat(problem(post(large), 413).path("code").asText()).isEqualTo("too_large");
        assertThat(problem(server.asking().post("/postings", OWNER, "Content-Type", "text/plain"), 415)
                        .path("code")
                        .asText())
                .isEqualTo("unsupported_media_type");
        assertThat(server.asking().post("/postings", OWNER).statusCode()).isEqualTo(415);
        assertThat(server.asking()
                        .post("/postings", OWNER, "Content-Type", "application/json; charset=utf-8")
                        .statusCode())
                .isEqualTo(201);
    }

    @Test
    void another_site_s_page_cannot_post() {
        String own = "http://127.0.0.1:" + server.server().address().getPort();

        assertThat(problem(
                                server.asking()
                                        .post(
                                                "/postings",
                                                OWNER,
                                                "Content-Type",
                                                JSON,
                                                "Origin",
                                                "http://plant.example"),
                                403)
                        .path("code")
                        .asText())
                .isEqualTo("forbidden");
        problem(server.asking().post("/postings", OWNER, "Content-Type", JSON, "Sec-Fetch-Site", "cross-site"), 403);
        problem(server.asking().post("/postings", OWNER, "Content-Type", JSON, "Sec-Fetch-Site", "same-site"), 403);
        assertThat(server.asking()
                        .post("/postings", OWNER, "Content-Type", JSON, "Origin", own, "Sec-Fetch-Site", "same-origin")
                        .statusCode())
                .isEqualTo(201);
    }

    @Test
    void a_server_that_others_reach_answers_them_and_takes_no_posting_under_another_name() throws IOException {
        try (TestServer open = new TestServer(ServerOptions.at("0.0.0.0", 0))) {
            int port = open.server().address().getPort();
            String get = raw(port, "GET /health HTTP/1.1\r\nHost: plant.example\r\nConnection: close\r\n\r\n");
            String post = raw(
                    port,
                    "POST /postings HTTP/1.1\r\nHost: plant.example\r\nContent-Type: application/json\r\n"
                            + "Content-Length: 2\r\nConnection: close\r\n\r\n{}");

            assertThat(get).startsWith("HTTP/1.1 200");
            assertThat(post).startsWith("HTTP/1.1 403");
        }
    }

    private static String raw(int port, String request) throws IOException {
        try (Socket socket = new Socket(InetAddress.getLoopbackAddress(), port)) {
            socket.getOutputStream().write(request.getBytes(UTF_8));
            InputStream in = socket.getInputStream();
            return new String(in.readAllBytes(), UTF_8);
        }
    }
}
