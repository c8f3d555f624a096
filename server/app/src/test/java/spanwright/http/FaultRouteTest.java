package spanwright.http;

import static java.nio.charset.StandardCharsets.UTF_8;
import static org.assertj.core.api.Assertions.assertThat;

import com.fasterxml.jackson.databind.JsonNode;
import java.net.URLEncoder;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import spanwright.records.EndNames;
import spanwright.records.Records;
import spanwright.splicing.EndRange;
import spanwright.splicing.Joint;
import spanwright.splicing.JointKind;

/** Readings placed over real HTTP, on random plants, held to the OpenAPI document. */
class FaultRouteTest {

    private static final OpenApi OPEN_API = new OpenApi();

    private final TestServer server = new TestServer();

    @AfterEach
    void stop() {
        server.close();
    }

    private JsonNode ask(String query) {
        return OPEN_API.check("GET", "/fault", server.asking().get("/fault?" + query));
    }

    private static String encoded(String text) {
        return URLEncoder.encode(text, UTF_8);
    }

    @ParameterizedTest
    @ValueSource(longs = {31, 32, 33, 34, 35, 36})
    void every_reading_is_answered_as_described(long seed) {
        Records records = server.plant(seed).current().records();
        EndNames names = new EndNames(records);
        int placed = 0;
        for (var panel : records.panels().list().toList()) {
            String port = encoded(names.port(panel.id(), 1));
            for (int metres = 0; metres < 4000; metres += 799) {
                placed += ask("port=" + port + "&distance=" + metres)
                        .path("places")
                        .size();
                placed += ask("port=" + port + "&index=1.468&launch=1&distance=" + metres)
                        .path("places")
                        .size();
            }
        }
        for (Joint joint : records.joints().list().toList()) {
            if (joint.type() == JointKind.SPLICE) {
                EndRange ends = joint.a();
                placed += ask("from=" + encoded(names.anywhere(ends.key(0))) + "&distance=77.5")
                        .path("places")
                        .size();
            }
        }
        assertThat(placed).isPositive();
    }

    @Test
    void what_is_asked_wrongly_names_its_parameter() {
        Records records = server.plant(37).current().records();
        String port = encoded(new EndNames(records)
                .port(records.panels().list().findFirst().orElseThrow().id(), 1));

        assertWrong("distance", "port=" + port);
        assertWrong("distance", "port=" + port + "&distance=x");
        assertWrong("distance", "port=" + port + "&distance=-1");
        assertWrong("launch", "port=" + port + "&distance=1&launch=-1");
        assertWrong("index", "port=" + port + "&distance=1&index=0.5");
        assertWrong("wavelength", "port=" + port + "&distance=1&wavelength=0");
        assertWrong("event", "port=" + port + "&distance=1&event=E1");
        assertWrong("event", "port=" + port + "&distance=1" + "&event=E1=1".repeat(201));
        assertWrong("far_distance", "port=" + port + "&distance=1&far_port=" + port);
        assertWrong("far_port", "port=" + port + "&distance=1&far_distance=1");
        assertWrong("from", "from=nothing&distance=1");
        assertThat(ask("distance=1").path("detail").asText()).startsWith("Nothing says where the shot begins");
        assertThat(ask("port=" + port + "&from=x&distance=1").path("detail").asText())
                .startsWith("Two things say");
        assertThat(ask("port=" + port + "&distance=1&to=no/such/1").path("code").asText())
                .isEqualTo("bad_reference");
        assertThat(ask("port=" + port + "&distance=1&far=1").path("parameter").asText())
                .isEqualTo("far");
    }

    private void assertWrong(String parameter, String query) {
        assertThat(ask(query).path("parameter").asText()).as(query).isEqualTo(parameter);
    }
}
