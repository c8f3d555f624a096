package spanwright.http;

import static java.nio.charset.StandardCharsets.UTF_8;
import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.net.http.HttpResponse;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.Test;

/** The harness itself: that it would notice. */
class OpenApiTest {

    private final OpenApi openApi = new OpenApi();
    private final TestServer server = new TestServer();

    @AfterEach
    void stop() {
        server.close();
    }

    @Test
    void an_answer_of_another_kind_is_noticed() {
        HttpResponse<byte[]> health = server.asking().get("/health");

        assertThatThrownBy(() -> openApi.check("GET", "/status", health)).isInstanceOf(AssertionError.class);
    }

    @Test
    void a_status_that_is_not_described_falls_to_the_description_of_problems() {
        HttpResponse<byte[]> missing = server.asking().get("/nothing");

        assertThat(openApi.check("GET", "/health", missing).path("code").asText())
                .isEqualTo("not_found");
    }

    @Test
    void every_operation_that_is_described_is_answered() {
        server.plant(1);
        for (String operation : openApi.operations()) {
            String[] parts = operation.split(" ", 2);
            String path = parts[1].replace("{code}", "no-such").replace("{id}", "1");
            HttpResponse<byte[]> answer = parts[0].equals("GET")
                    ? server.asking().get(path)
                    : server.asking().post(path, "{}", "Content-Type", "application/json");
            int status = answer.statusCode();
            String detail = new String(answer.body(), UTF_8);
            assertThat(status).as(operation).isNotEqualTo(405).isNotEqualTo(500);
            assertThat(detail).as(operation).doesNotContain("Nothing is at this address");
        }
    }
}
