package spanwright.http;

import static java.nio.charset.StandardCharsets.UTF_8;
import static org.assertj.core.api.Assertions.assertThat;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.net.http.HttpResponse;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Collections;
import java.util.HashSet;
import java.util.List;
import java.util.Set;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.Test;
import spanwright.circuits.Circuit;
import spanwright.exchange.FolderLoad;
import spanwright.network.RecordsText;
import spanwright.network.Snapshot;
import spanwright.outage.Cut;
import spanwright.outage.Impact;
import spanwright.plant.Span;
import spanwright.plants.RandomRing;
import spanwright.splicing.Joint;
import spanwright.trace.Tracer;

/**
 * Temporary paths posted as they are offered, over real HTTP: light passes end to end clear of what is cut, the joints are
 * listed with their last day, and once they are undone the records are as they were.
 */
class PostedLightTest {

    private static final OpenApi OPEN_API = new OpenApi();
    private static final ObjectMapper MAPPER = new ObjectMapper();
    private static final Path DEMO = Path.of(System.getProperty("repository.root", "../.."), "demo-data", "sallowmere");
    private static final String CUT = "HH-S044_HH-S045";
    /** Offers that are posted on a random plant, but for the last cut's. */
    private static final int MOST = 4;

    private static final String UNTIL = "2099-12-08";
    private static final String WHO = "{\"by\":\"D. Reed\",\"reason\":\"Light until the cable is whole\"}";

    private final TestServer server = TestServer.ofAllRows();

    @AfterEach
    void stop() {
        server.close();
    }

    private static JsonNode send(TestServer server, String path, String described, String body, int status) {
        HttpResponse<byte[]> answer = server.asking().post(path, body, "Content-Type", "application/json");
        assertThat(answer.statusCode()).as(new String(answer.body(), UTF_8)).isEqualTo(status);
        OPEN_API.checkRequest(described, body.getBytes(UTF_8));
        return OPEN_API.check("POST", described, answer);
    }

    private static JsonNode light(TestServer server, String span, String rest) {
        String body = "{\"cuts\":[\"span:" + span + "\"],\"until\":\"" + UNTIL + "\"," + rest + "}";
        return send(server, "/light", "/light", body, 200);
    }

    private static int post(TestServer server, JsonNode changes, int since) {
        return send(server, "/postings", "/postings", posting(changes, since), 201)
                .path("posting")
                .asInt();
    }

    private static String posting(JsonNode changes, int since) {
        ObjectNode body = MAPPER.createObjectNode().put("by", "D. Reed").put("reason", "Light another way");
        body.put("unchanged_since", since);
        body.set("changes", changes);
        return body.toString();
    }

    private static int undo(TestServer server, int posting) {
        return send(server, "/postings/" + posting + "/undo", "/postings/{id}/undo", WHO, 201)
                .path("posting")
                .asInt();
    }

    private static JsonNode temporary(TestServer server) {
        return OPEN_API.check("GET", "/temporary", server.asking().get("/temporary"))
                .path("temporary");
    }

    private static Set<String> hit(Snapshot snapshot, String span) {
        int id = snapshot.records().spans().find(span).orElseThrow().id();
        Set<String> codes = new HashSet<>();
        Impact.of(snapshot, List.of(new Cut.OfSpan(id))).circuits().stream()
                .map(each -> each.circuit().code())
                .forEach(codes::add);
        return codes;
    }

    /** Every joint by itself, whatever rows they lie in, and where the circuits end. */
    private static List<String> unitJoints(Snapshot snapshot) {
        List<String> lines = new ArrayList<>();
        snapshot.records().joints().list().forEach(joint -> {
            for (int index = 0; index < joint.count(); index++) {
                lines.add(line(joint, index));
            }
        });
        snapshot.records().circuits().list().map(Circuit::toString).forEach(lines::add);
        Collections.sort(lines);
        return lines;
    }

    private static String line(Joint joint, int index) {
        long a = joint.a().key(index);
        long b = joint.b().key(index);
        return joint.type() + " " + joint.enclosure() + " " + Math.min(a, b) + " " + Math.max(a, b) + " "
                + joint.facts();
    }

    /** The offers of story 1 that were shared out are all posted, one after another, and taken back. */
    @Test
    void the_backhoe_s_circuits_come_back_by_postings_that_can_all_be_undone() {
        server.post(editor -> {
            assertThat(FolderLoad.load(DEMO, editor, FolderLoad.Progress.NONE)).isEmpty();
            return List.of();
        });
        List<String> before = RecordsText.of(server.ledger().current());
        int others = temporary(server).size();
        JsonNode answer = light(server, CUT, "\"from_panels\":[\"HUT-S/OLT\"],\"verified_only\":false");
        Set<String> served = new HashSet<>();
        List<Integer> posted = new ArrayList<>();
        int joints = 0;
        for (JsonNode share : answer.path("assigned")) {
            posted.add(post(server, share.at("/offer/changes"), 1 + posted.size()));
            joints += share.at("/offer/joints").size();
            answer.path("groups")
                    .get(share.path("group").asInt())
                    .path("circuits")
                    .forEach(code -> served.add(code.asText()));
        }

        assertThat(posted).hasSizeGreaterThan(10);
        assertThat(served).contains("GOV-03").anyMatch(code -> code.startsWith("PON-"));
        assertThat(hit(server.ledger().current(), CUT)).doesNotContainAnyElementsOf(served);
        checkLit(served);
        assertThat(temporary(server).size()).isEqualTo(others + joints);
        checkListed(posted);
        Collections.reverse(posted);
        posted.forEach(posting -> undo(server, posting));
        assertThat(RecordsText.of(server.ledger().current())).isEqualTo(before);
        assertThat(temporary(server).size()).isEqualTo(others);
    }

    private void checkLit(Set<String> circuits) {
        for (String circuit : circuits) {
            JsonNode trace = OPEN_API.check("GET", "/trace", server.asking().get("/trace?circuit=" + circuit));
            assertThat(trace.path("paths").isEmpty()).isFalse();
            for (JsonNode path : trace.path("paths")) {
                assertThat(path.path("complete").asBoolean()).as(circuit).isTrue();
                assertThat(path.at("/budget/passes").asBoolean(true))
                        .as(circuit)
                        .isTrue();
            }
        }
    }

    private void checkListed(List<Integer> posted) {
        Set<Integer> listed = new HashSet<>();
        temporary(server).forEach(joint -> {
            if (joint.path("until").asText().equals(UNTIL)) {
                listed.add(joint.at("/changed/posting").asInt());
            }
        });
        assertThat(listed).isSubsetOf(posted).isNotEmpty();
    }

    @Test
    void what_changed_meanwhile_refuses_the_posting_and_the_undoing_with_a_sentence() {
        server.post(editor -> {
            assertThat(FolderLoad.load(DEMO, editor, FolderLoad.Progress.NONE)).isEmpty();
            return List.of();
        });
        JsonNode answer = light(server, CUT, "\"down\":[\"GOV-03\"]");
        JsonNode changes = answer.at("/assigned/0/offer/changes");
        server.rename(server.ledger(), "Valley Fiber");

        JsonNode stale = send(server, "/postings", "/postings", posting(changes, 1), 422);
        assertThat(stale.at("/faults/0/text").asText())
                .contains("posting 2 came meanwhile")
                .contains("ask anew");
        int posted = post(server, changes, 2);
        JsonNode again = send(server, "/postings", "/postings", posting(changes, posted), 422);
        assertThat(again.path("faults").size()).isPositive();
        undo(server, posted);
        JsonNode twice = send(server, "/postings/" + posted + "/undo", "/postings/{id}/undo", WHO, 422);
        assertThat(twice.at("/faults/0/text").asText()).contains("changed again since");
        send(server, "/postings/999/undo", "/postings/{id}/undo", WHO, 404);
    }

    @Test
    void offers_on_random_plants_are_lit_once_posted_and_leave_no_trace_once_undone() {
        int posted = 0;
        int plants = 0;
        for (long seed = 1; plants < 50; seed++) {
            assertThat(seed).as("enough plants have an offer").isLessThan(200);
            try (TestServer each = TestServer.ofAllRows()) {
                int offers = postOffers(each, seed);
                posted += offers;
                plants += offers > 0 ? 1 : 0;
            }
        }
        assertThat(posted).isGreaterThan(100);
    }

    private static int postOffers(TestServer server, long seed) {
        server.plant(RandomRing.of(seed));
        Snapshot plant = server.ledger().current();
        int posted = 0;
        for (Span span : plant.records().spans().list().toList()) {
            if (posted < MOST && !hit(plant, span.code()).isEmpty()) {
                JsonNode answer = light(server, span.code(), "\"verified_only\":false,\"offers\":2");
                for (JsonNode group : answer.path("groups")) {
                    for (JsonNode offer : group.path("offers")) {
                        postOne("seed " + seed + ", " + span.code(), server, span.code(), group, offer);
                        posted++;
                    }
                }
            }
        }
        return posted;
    }

    private static void postOne(String at, TestServer server, String span, JsonNode group, JsonNode offer) {
        Snapshot before = server.ledger().current();
        int since = before.records().posting();
        int first = post(server, offer.path("changes"), since);
        Snapshot lit = server.ledger().current();
        Set<String> hit = hit(lit, span);
        for (JsonNode code : group.path("circuits")) {
            Circuit circuit = lit.records().circuits().find(code.asText()).orElseThrow();
            assertThat(new Tracer(lit).ofCircuit(circuit))
                    .as("%s, %s", at, circuit.code())
                    .isNotEmpty()
                    .allMatch(spanwright.trace.Path::complete);
            assertThat(hit).as(at).doesNotContain(circuit.code());
        }
        post(server, offer.path("undo"), first);
        assertThat(unitJoints(server.ledger().current())).as(at).isEqualTo(unitJoints(before));
        List<String> rows = RecordsText.of(server.ledger().current());
        undo(server, post(server, offer.path("changes"), since + 2));
        assertThat(RecordsText.of(server.ledger().current())).as(at).isEqualTo(rows);
    }
}
