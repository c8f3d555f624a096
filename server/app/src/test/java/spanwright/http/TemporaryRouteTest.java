package spanwright.http;

import static org.assertj.core.api.Assertions.assertThat;

import com.fasterxml.jackson.databind.JsonNode;
import java.time.LocalDate;
import java.time.ZoneId;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import spanwright.journal.Change;
import spanwright.network.Ledger;
import spanwright.splicing.Joint;
import spanwright.splicing.JointFacts;

/** Temporary joints over real HTTP: listed until they are undone. */
class TemporaryRouteTest {

    private static final OpenApi OPEN_API = new OpenApi();

    private final TestServer server = new TestServer();

    @AfterEach
    void stop() {
        server.close();
    }

    private JsonNode list(String query) {
        return OPEN_API.check("GET", "/temporary", server.asking().get("/temporary" + query));
    }

    private static Joint until(Joint joint, LocalDate date) {
        JointFacts was = joint.facts();
        JointFacts is = new JointFacts(
                was.tray(),
                was.method(),
                was.loss(),
                was.trust(),
                was.verifiedOn(),
                was.splicedOn(),
                was.splicedBy(),
                date,
                "storm 7",
                was.jumperLength());
        return new Joint(joint.id(), joint.type(), joint.enclosure(), joint.a(), joint.b(), is);
    }

    @ParameterizedTest(name = "seed {0}")
    @ValueSource(longs = {1, 2, 3, 4})
    void every_temporary_joint_of_a_plant_is_listed_once_and_no_other(long seed) {
        Ledger ledger = server.plant(seed);
        Map<LocalDate, Integer> expected = new TreeMap<>();
        ledger.current()
                .records()
                .joints()
                .list()
                .filter(joint -> !joint.planned())
                .forEach(joint -> {
                    LocalDate date = joint.facts().temporaryUntil();
                    if (date != null) {
                        expected.merge(date, 1, Integer::sum);
                    }
                });
        Map<LocalDate, Integer> listed = new TreeMap<>();
        List<LocalDate> order = new ArrayList<>();
        for (JsonNode joint : list("").path("temporary")) {
            LocalDate date = LocalDate.parse(joint.path("until").asText());
            listed.merge(date, 1, Integer::sum);
            order.add(date);
        }

        assertThat(listed).as("seed %d", seed).isEqualTo(expected);
        assertThat(order).as("seed %d", seed).isSorted();
    }

    @Test
    void a_joint_is_listed_with_its_days_until_it_is_undone_and_still_as_of_before() {
        Ledger ledger = server.plant(2);
        int others = list("").path("temporary").size();
        Joint joint = ledger.current()
                .records()
                .joints()
                .list()
                .filter(each -> !each.planned() && each.facts().temporaryUntil() == null)
                .findFirst()
                .orElseThrow();
        LocalDate lapsed = LocalDate.now(ZoneId.of("UTC")).minusYears(90);
        server.post(editor -> editor.apply(Change.replace(joint, until(joint, lapsed))));
        JsonNode first = list("").at("/temporary/0");

        assertThat(first.path("until").asText()).isEqualTo(lapsed.toString());
        assertThat(first.path("lapsed").asBoolean()).isTrue();
        assertThat(first.path("days_left").asInt()).isBetween(-90 * 366, -90 * 365);
        assertThat(first.path("job").asText()).isEqualTo("storm 7");
        assertThat(first.path("count").asInt()).isEqualTo(joint.count());
        server.post(editor -> editor.apply(Change.replace(until(joint, lapsed), joint)));
        assertThat(list("").path("temporary")).hasSize(others);
        assertThat(list("?as_of=2").path("temporary")).hasSize(others + 1);
    }
}
