package spanwright.http;

import static java.nio.charset.StandardCharsets.UTF_8;
import static org.assertj.core.api.Assertions.assertThat;

import com.fasterxml.jackson.databind.JsonNode;
import java.net.http.HttpResponse;
import java.util.List;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import spanwright.circuits.Circuit;
import spanwright.journal.Change;
import spanwright.journal.RecordKind;
import spanwright.network.Snapshot;
import spanwright.plants.Drawing;
import spanwright.sheet.SheetEntry;
import spanwright.sheet.SheetHeader;
import spanwright.sheet.SheetReader;

/** Splice sheets over real HTTP: begun, kept, checked, submitted, posted. */
class DraftRoutesTest {

    private static final OpenApi OPEN_API = new OpenApi();
    private static final String JSON = "application/json";
    private static final String BEGIN = "{'enclosure': 'E2', 'author': 'R. Vale'}";
    private static final String ANSWERS = ", 'answers': [{'rule': 'all-done', 'line': '', 'reason': 'all of it'},"
            + " {'rule': 'light-check', 'reason': 'not yet'}]";

    private final TestServer server = new TestServer();

    @AfterEach
    void stop() {
        server.close();
    }

    @BeforeEach
    void enterPlant() {
        Snapshot drawn = Drawing.of("""
                cable F-1 24 tube=12 : H1 1000 H2
                cable D-7 24 tube=12 : H2 500 H4
                enclosure E1 H1 : F-1
                enclosure E2 H2 : F-1 D-7
                enclosure E4 H4 : D-7
                panel E1 P 12
                panel E4 P 12
                term E1/P/1-12 = F-1 ahead 1-12
                term E4/P/1-12 = D-7 back 1-12
                circuit C-1 E1/P/1 E4/P/1
                """);
        server.post(editor -> {
            for (RecordKind kind : RecordKind.values()) {
                for (int id = 1; id < drawn.records().limit(kind); id++) {
                    var record = drawn.records().record(kind, id);
                    if (record != null) {
                        editor.replay(Change.add(record));
                    }
                }
            }
            return List.of();
        });
    }

    private HttpResponse<byte[]> send(String path, String body) {
        return server.asking().post(path, body.replace('\'', '"'), "Content-Type", JSON);
    }

    private JsonNode post(String step, String body, int status) {
        String described = step.isEmpty() ? "/drafts" : "/drafts/{id}/" + step;
        if (status < 300) {
            OPEN_API.checkRequest(described, body.replace('\'', '"').getBytes(UTF_8));
        }
        HttpResponse<byte[]> answer = send(described.replace("{id}", "1"), body);
        assertThat(answer.statusCode()).as(new String(answer.body(), UTF_8)).isEqualTo(status);
        return OPEN_API.check("POST", described, answer);
    }

    private JsonNode save(int revision, String lines) {
        return post("save", "{'revision': " + revision + ", 'lines': [" + lines + "]" + ANSWERS + "}", 200);
    }

    private JsonNode get() {
        return OPEN_API.check("GET", "/drafts/{id}", server.asking().get("/drafts/1"));
    }

    /** Another clerk's sheet, posted meanwhile. */
    private void postMeanwhile(String line) {
        server.post(editor -> {
            int enclosure =
                    editor.records().enclosures().find("E2").orElseThrow().id();
            return SheetEntry.enter(
                            editor,
                            enclosure,
                            SheetHeader.NONE,
                            SheetReader.read(editor.records(), enclosure, List.of(line))
                                    .statements())
                    .stream()
                    .map(refused -> refused.refusal())
                    .toList();
        });
    }

    @Test
    void a_draft_is_kept_letter_by_letter_with_its_cursor_and_told_of_the_other_on_its_enclosure() {
        HttpResponse<byte[]> begun = send("/drafts", BEGIN);
        assertThat(begun.headers().firstValue("Location")).contains("/drafts/1");
        assertThat(OPEN_API.check("POST", "/drafts", begun).path("revision").asInt())
                .isEqualTo(1);
        post(
                "save",
                "{'revision': 1, 'lines': [' F-1 back 1 ', ''], 'cursor': {'line': 2, 'column': 1},"
                        + " 'header': {'job': '0412', 'spliced_on': '2026-03-30'}}",
                200);

        JsonNode draft = get();
        assertThat(draft.at("/lines/0").asText()).isEqualTo(" F-1 back 1 ");
        assertThat(draft.at("/cursor/line").asInt()).isEqualTo(2);
        assertThat(draft.at("/header/job").asText()).isEqualTo("0412");
        JsonNode other = OPEN_API.check("POST", "/drafts", send("/drafts", BEGIN.replace("R. Vale", "T. Moss")));
        assertThat(other.at("/beside/0/author").asText()).isEqualTo("R. Vale");
        assertThat(get().at("/beside/0/author").asText()).isEqualTo("T. Moss");
        JsonNode list = OPEN_API.check("GET", "/drafts", server.asking().get("/drafts?enclosure=E2&state=writing"));
        assertThat(list.path("drafts")).hasSize(2);
        assertThat(OPEN_API.check("GET", "/drafts", server.asking().get("/drafts?enclosure=E1"))
                        .path("drafts"))
                .isEmpty();
    }

    @Test
    void a_stale_revision_gets_both_sides() {
        post("", BEGIN, 201);
        save(1, "'F-1 back 1 capped'");

        JsonNode stale = post("save", "{'revision': 1, 'lines': ['F-1 back 2 capped']}", 409);

        assertThat(stale.path("code").asText()).isEqualTo("stale_revision");
        assertThat(stale.at("/theirs/lines/0").asText()).isEqualTo("F-1 back 1 capped");
        assertThat(stale.at("/yours/0").asText()).isEqualTo("F-1 back 2 capped");
        JsonNode undone = post("undo", "{'revision': 2}", 200);
        assertThat(undone.path("lines")).isEmpty();
        assertThat(post("redo", "{'revision': 3}", 200).at("/lines/0").asText()).isEqualTo("F-1 back 1 capped");
    }

    @Test
    void a_check_shows_findings_before_and_after_and_the_circuits_touched() {
        post("", BEGIN, 201);
        save(1, "'F-1 back 1-12 = D-7 ahead 12-1', 'F-9 back 1 capped'");

        JsonNode check = post("check", "{}", 200);

        assertThat(check.findValuesAsText("rule")).contains("ribbon-turned", "no-such-leg");
        assertThat(check.path("ready").asBoolean()).isFalse();
        assertThat(check.path("before")).isEmpty();
        assertThat(check.at("/after/0").asText()).isEqualTo("F-1 back 1-12 = D-7 ahead 12-1");
        save(2, "'F-1 back 1-12 = D-7 ahead 1-12'");
        JsonNode right = post("check", "{}", 200);
        assertThat(right.path("findings").findValuesAsText("weight")).containsOnly("prompt");
        assertThat(right.at("/circuits/0/circuit").asText()).isEqualTo("C-1");
        assertThat(right.at("/circuits/0/whole_before").asBoolean()).isFalse();
        assertThat(right.at("/circuits/0/whole_after").asBoolean()).isTrue();
        assertThat(right.at("/circuits/0/loss_after_db").asDouble()).isPositive();
        assertThat(server.ledger().current().records().posting())
                .as("nothing is kept")
                .isEqualTo(1);
    }

    @Test
    void a_pasted_block_is_read_into_lines_with_its_doubts() {
        post("", BEGIN, 201);

        JsonNode pasted = post("paste", "{'text': 'F-1,1,D-7,1\\nF-1,2,D-7,2\\nF-1,3,D-7,99'}", 200);

        assertThat(pasted.at("/lines/0").asText()).isEqualTo("F-1 back 1-2 = D-7 ahead 1-2");
        assertThat(pasted.at("/doubts/0/row").asInt()).isEqualTo(3);
        assertThat(pasted.at("/doubts/0/text").asText()).isEqualTo("99");
        post("paste", "{'text': ' '}", 400);
    }

    @Test
    void a_draft_is_submitted_once_all_is_answered_and_posted_by_another_person() {
        post("", BEGIN, 201);
        post("save", "{'revision': 1, 'lines': ['F-1 back 1-12 = D-7 ahead 1-12']}", 200);
        assertThat(post("submit", "{'revision': 2, 'by': 'R. Vale'}", 422).path("faults"))
                .isNotEmpty();
        save(2, "'F-1 back 1-12 = D-7 ahead 1-12'");
        assertThat(post("submit", "{'revision': 3, 'by': 'R. Vale'}", 200)
                        .path("state")
                        .asText())
                .isEqualTo("submitted");

        JsonNode posted = post("post", "{'revision': 4, 'by': 'M. Holt', 'reason': 'Sheet 0412'}", 201);

        assertThat(posted.path("posting").asInt()).isEqualTo(2);
        assertThat(posted.path("state").asText()).isEqualTo("posted");
        assertThat(server.ledger().current().records().posting()).isEqualTo(2);
        assertThat(server.ledger().findPosting(2).orElseThrow().by()).isEqualTo("M. Holt");
        assertThat(post("post", "{'revision': 5, 'by': 'M. Holt', 'reason': 'again'}", 422)
                        .path("code")
                        .asText())
                .isEqualTo("refused");
    }

    @Test
    void what_was_changed_meanwhile_is_merged_where_it_does_not_clash_and_shown_by_tube_where_it_does() {
        post("", BEGIN, 201);
        save(1, "'F-1 back 1-12 = D-7 ahead 1-12'");
        post("submit", "{'revision': 2, 'by': 'R. Vale'}", 200);
        postMeanwhile("F-1 back 13 = D-7 ahead 13");
        postMeanwhile("F-1 back 3 = D-7 ahead 20");

        JsonNode clash = post("post", "{'revision': 3, 'by': 'M. Holt', 'reason': 'Sheet'}", 409);

        assertThat(clash.path("code").asText()).isEqualTo("plant_changed");
        assertThat(clash.path("conflicts")).hasSize(1);
        JsonNode tube = clash.at("/conflicts/0");
        assertThat(tube.path("leg").asText()).isEqualTo("F-1 back");
        assertThat(tube.path("tube").asText()).isEqualTo("tube 1 BL");
        assertThat(tube.path("numbers").asText()).isEqualTo("3");
        assertThat(tube.path("was").asText()).isEqualTo("nothing recorded");
        assertThat(tube.path("is").asText()).isEqualTo("D-7 ahead 20");
        assertThat(tube.path("said").asText()).isEqualTo("D-7 ahead 3");
        post("withdraw", "{'revision': 3}", 200);
        post(
                "save",
                "{'revision': 4, 'base': 3, 'lines': ['F-1 back 4-12 = D-7 ahead 4-12',"
                        + " 'F-1 back 1-2 capped', 'D-7 ahead 1-3 stored']" + ANSWERS + "}",
                200);
        post("submit", "{'revision': 5, 'by': 'R. Vale'}", 200);
        post("post", "{'revision': 6, 'by': 'M. Holt', 'reason': 'Sheet'}", 201);
        assertThat(server.ledger().current().records().joints().list().filter(joint -> joint.enclosure() == 2))
                .hasSize(3);
    }

    @Test
    void the_clerk_of_a_sheet_with_a_priority_circuit_does_not_post_it() {
        post("", BEGIN, 201);
        server.post(editor -> {
            var circuit = editor.records().circuits().find("C-1").orElseThrow();
            return editor.apply(Change.replace(
                    circuit,
                    new Circuit(
                            circuit.id(),
                            circuit.code(),
                            circuit.service(),
                            circuit.customer(),
                            1,
                            circuit.customersServed(),
                            circuit.wavelengths(),
                            circuit.budget(),
                            circuit.protectionGroup(),
                            circuit.a(),
                            circuit.z(),
                            circuit.status())));
        });
        save(1, "'F-1 back 1-12 = D-7 ahead 1-12'");
        assertThat(post("check", "{}", 200).path("second_person").asBoolean()).isTrue();
        post("submit", "{'revision': 2, 'by': 'R. Vale'}", 200);

        JsonNode refused = post("post", "{'revision': 3, 'by': 'r. vale', 'reason': 'Sheet'}", 422);
        assertThat(refused.at("/faults/0/text").asText()).contains("another person than R. Vale");
        post("post", "{'revision': 3, 'by': 'M. Holt', 'reason': 'Sheet'}", 201);
    }

    @Test
    void drafts_are_taken_from_this_servers_own_pages_only_and_bad_ones_are_refused() {
        post("", BEGIN, 201);
        HttpResponse<byte[]> other = server.asking()
                .post("/drafts/1/save", "{}", "Content-Type", JSON, "Origin", "http://elsewhere.invalid");
        assertThat(OPEN_API.check("POST", "/drafts/{id}/save", other)
                        .path("code")
                        .asText())
                .isEqualTo("forbidden");
        post("save", "{'revision': 1, 'lines': ['a\\nb']}", 400);
        post("save", "{'lines': []}", 400);
        post("save", "{'revision': 1, 'base': 99}", 400);
        post("", "{'enclosure': 'E9', 'author': 'R. Vale'}", 404);
        assertThat(server.asking().get("/drafts/2").statusCode()).isEqualTo(404);
        assertThat(post("drop", "{'revision': 1}", 200).path("state").asText()).isEqualTo("dropped");
    }
}
