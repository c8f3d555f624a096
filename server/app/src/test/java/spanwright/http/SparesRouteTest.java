package spanwright.http;

import static org.assertj.core.api.Assertions.assertThat;

import com.fasterxml.jackson.databind.JsonNode;
import java.util.List;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.Test;
import spanwright.plant.Structure;

/** Spare fibers asked for over real HTTP, on random plants, held to the OpenAPI document. */
class SparesRouteTest {

    private static final OpenApi OPEN_API = new OpenApi();

    private final TestServer server = new TestServer();

    @AfterEach
    void stop() {
        server.close();
    }

    private JsonNode ask(String query) {
        return OPEN_API.check("GET", "/spares", server.asking().get("/spares?" + query));
    }

    @Test
    void every_pair_of_structures_is_answered_as_described() {
        int options = 0;
        for (long seed : new long[] {3, 41, 42, 47}) {
            TestServer another = new TestServer();
            try {
                options += askAll(another, seed);
            } finally {
                another.close();
            }
        }
        assertThat(options).isPositive();
    }

    private static int askAll(TestServer server, long seed) {
        List<Structure> structures =
                server.plant(seed).current().records().structures().list().toList();
        int options = 0;
        for (Structure from : structures) {
            for (Structure to : structures) {
                String query = "/spares?from=" + from.code() + "&to=" + to.code() + "&fibers=1"
                        + (from.id() % 2 == 0 ? "&same_tube=yes" : "");
                JsonNode answer =
                        OPEN_API.check("GET", "/spares", server.asking().get(query));
                if (from.equals(to)) {
                    assertThat(answer.path("parameter").asText()).isEqualTo("to");
                } else {
                    options += answer.path("options").size();
                }
            }
        }
        return options;
    }

    @Test
    void what_is_asked_wrongly_names_its_parameter() {
        List<Structure> structures =
                server.plant(45).current().records().structures().list().toList();
        String pair =
                "from=" + structures.get(0).code() + "&to=" + structures.get(1).code();

        assertWrong("from", "to=A&fibers=1");
        assertWrong("from", "from=none&to=" + structures.get(1).code() + "&fibers=1");
        assertWrong("to", "from=" + structures.get(0).code() + "&to=none&fibers=1");
        assertWrong("fibers", pair);
        assertWrong("fibers", pair + "&fibers=0");
        assertWrong("fibers", pair + "&fibers=1001");
        assertWrong("same_tube", pair + "&fibers=1&same_tube=maybe");
        assertWrong("avoid_circuit", pair + "&fibers=1&avoid_circuit=none");
        assertWrong("other", pair + "&fibers=1&other=1");
    }

    private void assertWrong(String parameter, String query) {
        assertThat(ask(query).path("parameter").asText()).as(query).isEqualTo(parameter);
    }
}
