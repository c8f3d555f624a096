package spanwright.exchange;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.Clock;
import java.time.Duration;
import java.time.Instant;
import java.time.LocalDate;
import java.time.ZoneId;
import java.time.ZoneOffset;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Set;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import spanwright.circuits.Circuit;
import spanwright.network.MemoryLedger;
import spanwright.network.Outcome;
import spanwright.network.Snapshot;
import spanwright.records.Refusal;
import spanwright.splicing.Joint;
import spanwright.suspicion.Alarms;
import spanwright.suspicion.PostedLately;
import spanwright.suspicion.Suspect;
import spanwright.suspicion.Suspects;

/**
 * The demo's second story, told by postings alone: where splices were made lately, crossed tubes come before a cut; where
 * they were not, a cut comes first. Forty days pass before each test, so that no posting of another is lately.
 */
class OpenedLatelyTest {

    private static final Path ROOT = Path.of(System.getProperty("repository.root", "../.."), "demo-data");
    private static final Path STORY = ROOT.resolve("stories").resolve("2-wrong-tube");

    private static Instant now = Instant.parse("2026-12-03T18:00:00Z");
    private static MemoryLedger ledger;

    @BeforeAll
    static void load() {
        ledger = new MemoryLedger(new Clock() {
            @Override
            public ZoneId getZone() {
                return ZoneOffset.UTC;
            }

            @Override
            public Clock withZone(ZoneId zone) {
                return this;
            }

            @Override
            public Instant instant() {
                return now;
            }
        });
        posted(ledger.post("demo", "The demo", editor -> {
            assertThat(FolderLoad.load(ROOT.resolve("sallowmere"), editor, FolderLoad.Progress.NONE))
                    .isEmpty();
            return List.of();
        }));
    }

    @BeforeEach
    void time_passes() {
        pass(40);
    }

    private static void pass(int days) {
        now = now.plus(Duration.ofDays(days));
    }

    private static LocalDate today() {
        return now.atZone(ZoneOffset.UTC).toLocalDate();
    }

    private static void posted(Outcome outcome) {
        assertThat(outcome).isInstanceOf(Outcome.Posted.class);
    }

    private static void post(List<RowChange> changes) {
        posted(ledger.post(
                "N. Ashby",
                "C-N02",
                editor -> PostingRows.enter(editor, changes).stream()
                        .map(fault -> new Refusal("row", fault.text(), null, null, null))
                        .toList()));
    }

    /** The sheet of that night, its columns changed as told. */
    private static List<RowChange> sheet(String... row) throws IOException {
        JsonNode sheet = new ObjectMapper().readTree(Files.readString(STORY.resolve("sheet.json")));
        List<RowChange> changes = new ArrayList<>();
        for (JsonNode change : sheet.path("changes")) {
            Map<String, String> cells = texts(change.path("row"));
            cells.put("spliced_by", "crew of " + today());
            for (int index = 0; index < row.length; index += 2) {
                cells.put(row[index], row[index + 1]);
            }
            changes.add(new RowChange(
                    RowChange.Action.CHANGE, change.path("table").asText(), texts(change.path("key")), cells));
        }
        assertThat(changes).hasSize(24);
        return changes;
    }

    private static Map<String, String> texts(JsonNode object) {
        Map<String, String> texts = new LinkedHashMap<>();
        object.properties()
                .forEach(each -> texts.put(
                        each.getKey(),
                        each.getValue().isNull() ? "" : each.getValue().asText()));
        return texts;
    }

    private static RowChange change(String enclosure, String a, String column, String value) {
        return new RowChange(
                RowChange.Action.CHANGE,
                "splices",
                Map.of("enclosure", enclosure, "a", a),
                new LinkedHashMap<>(Map.of(column, value)));
    }

    private static Suspect first(String... opened) throws IOException {
        Snapshot snapshot = ledger.current();
        Set<Integer> said = Set.copyOf(Arrays.stream(opened)
                .map(code ->
                        snapshot.records().enclosures().find(code).orElseThrow().id())
                .toList());
        int posting = snapshot.records().posting();
        Map<Integer, LocalDate> posted = PostedLately.of(ledger, posting, today(), ZoneOffset.UTC);
        Alarms alarms =
                new Alarms(circuits(snapshot, "down.txt"), circuits(snapshot, "up.txt"), false, said, posted, today());
        return Suspects.of(snapshot, alarms).list().get(0);
    }

    private static List<Circuit> circuits(Snapshot snapshot, String file) throws IOException {
        return Arrays.stream(Files.readString(STORY.resolve(file)).strip().split(",", -1))
                .map(code -> snapshot.records().circuits().find(code).orElseThrow())
                .toList();
    }

    private static void crossed(Suspect first) {
        assertThat(first.kind()).isEqualTo(Suspect.Kind.CROSSED);
        assertThat(first.enclosures()).extracting(each -> each.code()).containsExactly("C-N02");
        assertThat(first.tubes()).containsExactly("FDR-N-1/7", "FDR-N-1/19");
    }

    private static void cut(Suspect first) {
        assertThat(first.kind()).isEqualTo(Suspect.Kind.CUT);
        assertThat(first.spans()).extracting(each -> each.code()).contains("P-L04-12_CAB-04");
    }

    @Test
    void a_sheet_without_a_day_is_as_new_as_its_posting() throws IOException {
        post(sheet());

        Suspect byPosting = first();
        crossed(byPosting);
        // Half of such postings tell of work done shortly before: docs/SUSPECTS.md.
        assertThat(first("C-N02").score() - byPosting.score()).isCloseTo(Math.log(2), within(1e-9));
        pass(15);
        cut(first());
    }

    @Test
    void a_day_on_the_sheet_counts_and_not_the_day_on_which_it_was_posted() throws IOException {
        post(sheet("spliced_on", today().minusDays(2).toString()));
        crossed(first());

        pass(40);
        post(sheet("spliced_on", today().minusDays(30).toString()));
        cut(first());
    }

    @Test
    void a_day_that_is_still_to_come_is_no_day() throws IOException {
        post(sheet("spliced_on", today().plusDays(2).toString()));
        crossed(first());
    }

    @Test
    void the_loading_of_a_plant_tells_of_no_crew() throws IOException {
        List<RowChange> many = ledger.current()
                .records()
                .joints()
                .list()
                .filter(joint -> joint.type() == spanwright.splicing.JointKind.SPLICE)
                .map(Joint::enclosure)
                .distinct()
                .map(id -> ledger.current().records().enclosures().get(id).code())
                .filter(code -> code.matches("C-[NS]0[1-7]"))
                .map(code ->
                        new RowChange(RowChange.Action.CHANGE, "splices", key(code), new LinkedHashMap<>(redone())))
                .toList();
        assertThat(many).hasSize(14);
        post(many.subList(0, 13));
        cut(first());
        pass(1);
        post(sheet());
        crossed(first());
    }

    /** The first splice of an enclosure, by its a side. */
    private static Map<String, String> key(String code) {
        Snapshot snapshot = ledger.current();
        int id = snapshot.records().enclosures().find(code).orElseThrow().id();
        Joint first = snapshot.records()
                .joints()
                .list()
                .filter(joint -> joint.enclosure() == id)
                .findFirst()
                .orElseThrow();
        return Map.of("enclosure", code, "a", new spanwright.records.EndNames(snapshot.records()).ends(first.a()));
    }

    private static Map<String, String> redone() {
        return Map.of("spliced_on", "", "spliced_by", "crew of " + today());
    }

    @Test
    void what_is_only_seen_or_measured_was_not_opened() throws IOException {
        post(sheet());
        pass(40);
        post(List.of(change("C-N02", "FDR-N-1 back 75-76", "loss_db", "0.07")));
        cut(first());
        post(List.of(change("C-N02", "FDR-N-1 back 80-81", "trust", "reported")));
        cut(first());
        post(List.of(change("C-N02", "FDR-N-1 back 80-81", "method", "mechanical")));
        crossed(first());
    }
}
