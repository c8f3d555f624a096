package spanwright.http;

import static java.nio.charset.StandardCharsets.UTF_8;
import static org.assertj.core.api.Assertions.assertThat;

import com.fasterxml.jackson.databind.JsonNode;
import java.net.http.HttpResponse;
import java.nio.file.Path;
import java.util.HashSet;
import java.util.List;
import java.util.Set;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import spanwright.circuits.Circuit;
import spanwright.exchange.FolderLoad;
import spanwright.network.RecordsText;
import spanwright.network.Snapshot;
import spanwright.outage.Cut;
import spanwright.outage.Impact;
import spanwright.splicing.Joint;
import spanwright.trace.Tracer;

/** The demo's cut feeder repaired over real HTTP: 288 fibers, 576 joints, light again. */
class RepairRouteTest {

    private static final OpenApi OPEN_API = new OpenApi();
    private static final Path DEMO = Path.of(System.getProperty("repository.root", "../.."), "demo-data", "sallowmere");
    private static final String SHEET = "{'cable': 'FDR-S-2', 'span': 'HH-S044_HH-S045', 'by': 'D. Reed',"
            + " 'reason': 'Cut by a digger', 'enclosures': [{'enclosure': 'C-R1', 'structure': 'HH-S044',"
            + " 'tray_glass_m': 1.5}, {'enclosure': 'C-R2', 'structure': 'HH-S045', 'tray_glass_m': 1.5}],"
            + " 'piece': {'reel': 'R-9', 'length_m': 170}, 'slack': [{'structure': 'HH-S044', 'left_m': 10.668}]}";

    private final TestServer server = new TestServer();

    @BeforeEach
    void loadDemo() {
        server.post(editor -> {
            assertThat(FolderLoad.load(DEMO, editor, FolderLoad.Progress.NONE)).isEmpty();
            return List.of();
        });
    }

    @AfterEach
    void stop() {
        server.close();
    }

    private JsonNode send(String query, String body, int status) {
        byte[] json = body.replace('\'', '"').getBytes(UTF_8);
        HttpResponse<byte[]> answer =
                server.asking().post("/repairs" + query, new String(json, UTF_8), "Content-Type", "application/json");
        assertThat(answer.statusCode()).as(new String(answer.body(), UTF_8)).isEqualTo(status);
        if (status < 400) {
            OPEN_API.checkRequest("/repairs", json);
        }
        return OPEN_API.check("POST", "/repairs", answer);
    }

    @Test
    void the_cut_feeder_is_two_cables_and_a_piece_and_light_passes_again() {
        Snapshot before = server.ledger().current();
        JsonNode body = send("", SHEET, 201);
        Snapshot after = server.ledger().current();

        assertThat(body.path("posting").asInt()).isEqualTo(2);
        assertThat(body.path("fibers").asInt()).isEqualTo(288);
        assertThat(body.path("joints").asInt()).isEqualTo(576);
        assertThat(jointsIn(after, "C-R1") + jointsIn(after, "C-R2")).isEqualTo(576);
        assertThat(body.path("part_of").asText()).isEqualTo("FDR-S");
        // 100 ft and 35 ft, of 0.3048 m each (NIST SP 811, appendix B).
        assertThat(body.at("/joined/0/slack_before_m").decimalValue()).isEqualByComparingTo("30.48");
        assertThat(body.at("/joined/0/slack_after_m").decimalValue()).isEqualByComparingTo("10.668");
        Circuit first = after.records().circuits().find("RC-01").orElseThrow();
        assertThat(new Tracer(after).ofCircuit(first)).isNotEmpty().allMatch(spanwright.trace.Path::complete);
        int span =
                before.records().spans().find("HH-S044_HH-S045").orElseThrow().id();
        Set<String> hit = codes(Impact.of(before, List.of(new Cut.OfSpan(span))));
        assertThat(texts(body.path("circuits"))).isEqualTo(hit).contains("RC-01");
        assertThat(codes(Impact.of(after, List.of(new Cut.OfSpan(span)))))
                .as("the same circuits lie over the piece")
                .isEqualTo(hit);
        assertThat(server.ledger().asOf(1).records().cables().find("FDR-S-2")).isPresent();
        assertThat(after.records().cables().find("FDR-S-2")).isEmpty();
    }

    private static int jointsIn(Snapshot snapshot, String enclosure) {
        int id = snapshot.records().enclosures().find(enclosure).orElseThrow().id();
        return snapshot.records()
                .joints()
                .list()
                .filter(joint -> joint.enclosure() == id)
                .mapToInt(Joint::count)
                .sum();
    }

    private static Set<String> codes(Impact impact) {
        Set<String> codes = new HashSet<>();
        impact.circuits().forEach(hit -> codes.add(hit.circuit().code()));
        return codes;
    }

    private static Set<String> texts(JsonNode list) {
        Set<String> texts = new HashSet<>();
        list.forEach(each -> texts.add(each.asText()));
        return texts;
    }

    @Test
    void a_preview_answers_the_same_and_keeps_nothing() {
        List<String> before = RecordsText.of(server.ledger().current());
        JsonNode asked = send("?preview=yes", SHEET, 200);
        JsonNode sent = send("", SHEET.replace("{'cable'", "{'preview': true, 'cable'"), 200);

        assertThat(sent).isEqualTo(asked);
        assertThat(RecordsText.of(server.ledger().current())).isEqualTo(before);
        assertThat(server.ledger().postings(10, 10)).hasSize(1);
        JsonNode posted = send("", SHEET, 201);
        for (String name : List.of("parts", "joints", "changes", "joined", "circuits", "left_in_journal")) {
            assertThat(posted.path(name)).as(name).isEqualTo(asked.path(name));
        }
    }

    @ParameterizedTest
    @CsvSource(
            quoteCharacter = '`',
            value = {
                "'FDR-S-2','FDR-X',no cable FDR-X",
                "HH-S044_HH-S045,HH-S001_HH-S002,does not lie on the span",
                "'length_m': 170,'length_m': 17,give its length along the sheath",
                "'left_m': 10.668,'left_m': 40,No coil of FDR-S-2 at HH-S044",
                "'structure': 'HH-S045','structure': 'HH-N001',does not visit HH-N001",
            })
    void what_cannot_be_is_refused_with_a_sentence_and_nothing_is_kept(String good, String bad, String sentence) {
        String sheet = SHEET.replace(good.replace("\"", "'"), bad);
        assertThat(sheet).isNotEqualTo(SHEET);
        JsonNode refused = send("", sheet, 422);

        assertThat(refused.at("/faults/0/text").asText()).contains(sentence);
        assertThat(server.ledger().current().records().posting()).isEqualTo(1);
    }

    @Test
    void a_body_that_says_the_cut_twice_or_nowhere_is_wrong() {
        assertThat(send("", SHEET.replace("'span'", "'at_m': 1352.2, 'span'"), 400)
                        .path("detail")
                        .asText())
                .contains("one of the two");
        send("", SHEET.replace("'span': 'HH-S044_HH-S045', ", ""), 400);
        send("", SHEET.replace("'C-R1'", "'C R1'"), 400);
        send("", SHEET.replace("'reel'", "'real'"), 400);
    }
}
