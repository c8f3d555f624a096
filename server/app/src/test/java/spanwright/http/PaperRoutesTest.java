package spanwright.http;

import static java.nio.charset.StandardCharsets.UTF_8;
import static org.assertj.core.api.Assertions.assertThat;

import com.fasterxml.jackson.databind.JsonNode;
import java.net.http.HttpResponse;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import spanwright.records.Records;

/** Papers over real HTTP, held to the OpenAPI document. */
class PaperRoutesTest {

    private static final OpenApi OPEN_API = new OpenApi();

    private final TestServer server = new TestServer();

    @AfterEach
    void stop() {
        server.close();
    }

    private HttpResponse<byte[]> ask(String path, String query) {
        HttpResponse<byte[]> answer = server.asking().get(path + "?" + query);
        OPEN_API.check("GET", path, answer);
        return answer;
    }

    private String span(long seed) {
        Records records = server.plant(seed).current().records();
        return "cut=span:" + records.spans().list().findFirst().orElseThrow().code();
    }

    @ParameterizedTest
    @ValueSource(longs = {41, 42, 43})
    void a_cut_list_is_answered_as_a_page_without_scripts_and_as_PDF(long seed) {
        String span = span(seed);

        HttpResponse<byte[]> page = ask("/paper/cut-list", span);
        HttpResponse<byte[]> pdf = ask("/paper/cut-list.pdf", span + "&paper=letter");

        String html = new String(page.body(), UTF_8);
        assertThat(html).contains("span " + span.substring(9), "page 1 of ", "/paper/cut-list.pdf?cut=span%3A");
        assertThat(html).doesNotContain("<script", "style=\"", "javascript:", "http:", "https:");
        assertThat(page.headers().firstValue("Content-Security-Policy").orElse(""))
                .contains("default-src 'none'", "style-src 'self'");
        assertThat(page.headers().firstValue("Cache-Control")).contains("no-store");
        assertThat(new String(pdf.body(), 0, 5, UTF_8)).isEqualTo("%PDF-");
    }

    @Test
    void an_incident_prints_what_it_took_as_cut_on_the_records_as_they_stood() {
        String span = span(44).substring(4);
        String body = "{\"title\":\"Backhoe <1>\",\"by\":\"N. Reed\",\"began_at\":\"2026-03-31T14:05:00Z\",\"cuts\":[\""
                + span + "\"],\"down\":[],\"up\":[]}";
        HttpResponse<byte[]> opened = server.asking().post("/incidents", body, "Content-Type", "application/json");
        assertThat(opened.statusCode()).as(new String(opened.body(), UTF_8)).isEqualTo(201);
        server.rename(server.ledger(), "Another owner");

        String html = new String(ask("/paper/cut-list", "incident=1").body(), UTF_8);

        assertThat(html).contains("Incident 1: Backhoe &lt;1&gt;. span ", "Records as of posting 1,");
    }

    @Test
    void what_is_asked_wrongly_names_its_parameter() {
        String span = span(45);

        assertWrong("cut", "paper=a4");
        assertWrong("cut", "cut=nothing");
        assertWrong("paper", span + "&paper=a3");
        assertWrong("incident", span + "&incident=x");
        assertThat(ask("/paper/cut-list", span + "&incident=9").statusCode()).isEqualTo(404);
    }

    private void assertWrong(String parameter, String query) {
        JsonNode problem =
                OPEN_API.check("GET", "/paper/cut-list", server.asking().get("/paper/cut-list?" + query));
        assertThat(problem.path("parameter").asText()).as(query).isEqualTo(parameter);
    }
}
