package spanwright.http;

import static java.nio.charset.StandardCharsets.UTF_8;
import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.io.IOException;
import java.io.InputStream;
import java.io.OutputStream;
import java.net.InetAddress;
import java.net.Socket;
import java.net.http.HttpResponse;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.Test;

class WebServerTest {

    private final TestServer test = new TestServer();
    private final WebServer server = test.server();
    private final Asking asking = test.asking();

    @AfterEach
    void stop() {
        test.close();
    }

    @Test
    void says_that_it_answers() {
        HttpResponse<byte[]> answer = asking.get("/health");

        assertThat(answer.statusCode()).isEqualTo(200);
        assertThat(new String(answer.body(), UTF_8)).isEqualTo("{\"status\":\"ok\"}");
    }

    @Test
    void tells_the_browser_what_not_to_do() {
        HttpResponse<byte[]> answer = asking.get("/health");

        assertThat(answer.headers().firstValue("Content-Security-Policy"))
                .hasValueSatisfying(policy -> assertThat(policy)
                        .contains("default-src 'none'", "script-src 'self'", "frame-ancestors 'none'")
                        .doesNotContain("unsafe"));
        assertThat(answer.headers().firstValue("X-Content-Type-Options")).contains("nosniff");
        assertThat(answer.headers().firstValue("Referrer-Policy")).contains("no-referrer");
        assertThat(answer.headers().firstValue("Server")).isEmpty();
    }

    @Test
    void a_path_where_nothing_is_gets_a_problem_document() {
        HttpResponse<byte[]> answer = asking.get("/nothing/here");

        assertThat(answer.statusCode()).isEqualTo(404);
        assertThat(answer.headers().firstValue("Content-Type")).contains("application/problem+json");
        assertThat(new String(answer.body(), UTF_8))
                .contains("\"code\":\"not_found\"", "\"instance\":\"/nothing/here\"");
    }

    @Test
    void steps_out_of_the_pages_lead_nowhere() throws IOException {
        assertThat(raw("GET /../logback.xml HTTP/1.1\r\nHost: localhost\r\nConnection: close\r\n\r\n"))
                .doesNotContain("appender");
        assertThat(asking.get("/%2e%2e/logback.xml").statusCode()).isBetween(400, 404);
        assertThat(asking.get("/logback.xml").statusCode()).isEqualTo(404);
    }

    @Test
    void a_method_that_an_address_does_not_take_is_refused() {
        HttpResponse<byte[]> answer = asking.method("DELETE", "/health");

        assertThat(answer.statusCode()).isEqualTo(405);
        assertThat(new String(answer.body(), UTF_8)).contains("\"code\":\"method_not_allowed\"");
    }

    @Test
    void a_loopback_server_answers_to_loopback_names_only() throws IOException {
        String answer = raw("GET /health HTTP/1.1\r\nHost: plant.example\r\nConnection: close\r\n\r\n");

        assertThat(answer).startsWith("HTTP/1.1 403").contains("\"code\":\"forbidden\"");
    }

    @Test
    void a_request_too_broken_to_be_read_learns_nothing_of_how_the_program_is_made() throws IOException {
        String answer = raw("GET /health HTTP/9.9\r\nHost: localhost\r\n\r\n");

        assertThat(answer).contains("application/problem+json").doesNotContainIgnoringCase("jetty");
    }

    @Test
    void libraries_are_served_out_of_their_jars_and_kept_for_good() {
        HttpResponse<byte[]> answer = asking.get("/webjars/leaflet/1.9.4/dist/leaflet-src.esm.js");

        assertThat(answer.statusCode()).isEqualTo(200);
        assertThat(answer.headers().firstValue("Content-Type")).contains("text/javascript; charset=utf-8");
        assertThat(answer.headers().firstValue("Cache-Control")).contains("public, max-age=31536000, immutable");
        String tag = answer.headers().firstValue("ETag").orElseThrow();
        HttpResponse<byte[]> again = asking.get("/webjars/leaflet/1.9.4/dist/leaflet-src.esm.js", "If-None-Match", tag);
        assertThat(again.statusCode()).isEqualTo(304);
        assertThat(again.body()).isEmpty();
    }

    @Test
    void large_answers_are_packed_for_who_can_unpack_them() {
        assertThat(asking.get("/openapi.json", "Accept-Encoding", "gzip")
                        .headers()
                        .firstValue("Content-Encoding"))
                .contains("gzip");
        assertThat(asking.get("/openapi.json").headers().firstValue("Content-Encoding"))
                .isEmpty();
    }

    @Test
    void a_parameter_that_is_not_known_is_a_mistake() {
        HttpResponse<byte[]> answer = asking.get("/openapi.json?as_off=3");

        assertThat(answer.statusCode()).isEqualTo(400);
        assertThat(new String(answer.body(), UTF_8))
                .contains("There is no parameter as_off", "\"parameter\":\"as_off\"");
    }

    @Test
    void a_port_that_is_taken_is_said_to_be_taken() {
        ServerOptions taken = ServerOptions.at("127.0.0.1", server.address().getPort());

        assertThatThrownBy(() -> new TestServer(taken).server())
                .isInstanceOf(CannotListenException.class)
                .hasMessageContaining("another program has it");
    }

    private String raw(String request) throws IOException {
        try (Socket socket =
                new Socket(InetAddress.getLoopbackAddress(), server.address().getPort())) {
            OutputStream out = socket.getOutputStream();
            out.write(request.getBytes(UTF_8));
            out.flush();
            socket.shutdownOutput();
            InputStream in = socket.getInputStream();
            return new String(in.readAllBytes(), UTF_8);
        }
    }
}
