package spanwright.exchange;

import static org.assertj.core.api.Assertions.assertThat;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import spanwright.exchange.RowChange.Action;
import spanwright.network.Snapshot;
import spanwright.network.SnapshotEditor;
import spanwright.records.Records;

class PostingRowsTest {

    private static final Path SMALL =
            Path.of(System.getProperty("repository.root"), "demo-data", "cases", "good", "small");

    private Snapshot before;

    @BeforeEach
    void load() {
        SnapshotEditor editor = Snapshot.empty().edit();
        assertThat(FolderLoad.load(SMALL, editor, FolderLoad.Progress.NONE)).isEmpty();
        before = editor.build(1);
    }

    /** {@code add table a=1 b=2}, {@code change table key=1 -> column=2}, {@code remove table key=1}. */
    private static RowChange change(String line) {
        String[] parts = line.split(" ", 3);
        Action action = Action.valueOf(parts[0].toUpperCase(java.util.Locale.ROOT));
        String[] sides = parts[2].split(" -> ", -1);
        Map<String, String> first = texts(sides[0]);
        Map<String, String> second = sides.length > 1 ? texts(sides[1]) : Map.of();
        return action == Action.ADD
                ? new RowChange(action, parts[1], Map.of(), first)
                : new RowChange(action, parts[1], first, second);
    }

    private static Map<String, String> texts(String side) {
        Map<String, String> texts = new LinkedHashMap<>();
        Arrays.stream(side.split(" (?=[a-z_]+=)", -1))
                .forEach(text -> texts.put(text.split("=", -1)[0], text.substring(text.indexOf('=') + 1)));
        return texts;
    }

    private List<String> faults(String... lines) {
        return PostingRows.enter(
                        before.edit(),
                        Arrays.stream(lines).map(PostingRowsTest::change).toList())
                .stream()
                .map(fault -> fault.change() + " " + fault.column() + ": " + fault.text())
                .toList();
    }

    private Records posted(String... lines) {
        SnapshotEditor editor = before.edit();
        assertThat(PostingRows.enter(
                        editor,
                        Arrays.stream(lines).map(PostingRowsTest::change).toList()))
                .isEmpty();
        return editor.build(2).records();
    }

    /** The rows of a table, each its cells parted by bars. */
    private static List<String> rows(Records records, String table) {
        List<String> rows = new ArrayList<>();
        try {
            new RecordRows(records).each(Table.find(table).orElseThrow(), cells -> rows.add(String.join("|", cells)));
        } catch (java.io.IOException e) {
            throw new java.io.UncheckedIOException(e);
        }
        return rows;
    }

    @Test
    void a_row_is_added() {
        assertThat(rows(posted("add structures structure=P-5 kind=pole lon=-123.5 lat=-48.25"), "structures"))
                .contains("P-5|pole|-123.5|-48.25|||in service||");
    }

    @Test
    void a_row_is_changed_in_some_columns_and_keeps_the_others() {
        Records records = posted("change structures structure=HH-2 -> accuracy_m=0.5 note=");
        assertThat(rows(records, "structures"))
                .contains("HH-2|handhole|-123|-48.018|0.5||in service|BRIDGE-1 POWER-1|");
        assertThat(records.structures().find("HH-2").orElseThrow().id())
                .isEqualTo(
                        before.records().structures().find("HH-2").orElseThrow().id());
    }

    @Test
    void a_row_is_removed() {
        assertThat(rows(posted("remove structures structure=PED-9"), "structures"))
                .noneMatch(row -> row.startsWith("PED-9"));
    }

    @Test
    void a_row_that_others_refer_to_is_not_removed_and_they_are_named() {
        assertThat(faults("remove structures structure=HH-1"))
                .containsExactly("0 structure: structure HH-1 is referred to by span S-1 and S-2; by the run of cable"
                        + " F-1 and D-7; by enclosure E4; remove or change those first");
        assertThat(faults("remove cable_types cable_type=F24"))
                .first()
                .asString()
                .contains("cable F-1");
        assertThat(faults("remove fiber_types fiber_type=BEND"))
                .first()
                .asString()
                .contains("cable type D12");
        assertThat(faults("remove enclosure_cables enclosure=E4 cable=D-7"))
                .first()
                .asString()
                .contains("D-7 ahead 1 @ E4");
        assertThat(faults("remove splitters enclosure=E9 splitter=S1")).isNotEmpty();
        assertThat(faults("remove panels enclosure=E1 panel=Q")).isNotEmpty();
        assertThat(faults("remove panels enclosure=E1 panel=P"))
                .first()
                .asString()
                .contains("circuit C-1");
    }

    @Test
    void a_part_of_a_range_is_removed_and_the_rest_stays() {
        Records records = posted("remove terminations enclosure=E1 panel=P ports=4-6");
        assertThat(rows(records, "terminations"))
                .contains("E1|P|1-3|F-1 ahead 1-3|pigtail||posted|||", "E1|P|7-12|F-1 ahead 7-12|pigtail||posted|||")
                .noneMatch(row -> row.startsWith("E1|P|1-12"));
    }

    @Test
    void a_part_of_a_falling_range_is_changed() {
        Records records = posted("change splices enclosure=E4 a=F-1 ahead 2-3 -> trust=unknown loss_db=0.2");
        assertThat(rows(records, "splices"))
                .contains(
                        "E4|1|F-1 back 1|F-1 ahead 4|fusion|0.04|verified||2026-03-31|||",
                        "E4|1|F-1 back 2-3|F-1 ahead 3-2|fusion|0.2|unknown||2026-03-31|||",
                        "E4|1|F-1 back 4|F-1 ahead 1|fusion|0.04|verified||2026-03-31|||");
    }

    @Test
    void both_sides_in_a_key_must_be_joined_to_each_other() {
        posted("remove splices enclosure=E4 a=F-1 back 1-2 b=F-1 ahead 4-3");
        assertThat(faults("remove splices enclosure=E4 a=F-1 back 1-2 b=F-1 ahead 3-4"))
                .containsExactly(
                        "0 b: the ends of both sides of the key are not joined to each other; name one side alone");
    }

    @Test
    void joints_are_moved_to_other_ends() {
        Records records = posted("change splices enclosure=E4 a=F-1 back 5-6 -> b=D-7 ahead 11-12");
        assertThat(rows(records, "splices"))
                .contains(
                        "E4|1|F-1 back 5-6|D-7 ahead 11-12|fusion||posted||2026-03-31|||",
                        "E4|1|F-1 back 7-8|D-7 ahead 3-4|fusion||posted||2026-03-31|||");
    }

    @Test
    void a_jumper_is_found_by_either_side() {
        assertThat(rows(posted("remove jumpers a=E1/Q/1"), "jumpers")).isEmpty();
        assertThat(rows(posted("change jumpers b=E1/P/10 -> length_m=5"), "jumpers"))
                .containsExactly("E1/P/10|E1/Q/1|5|");
    }

    @Test
    void jumpers_and_pigtails_too_may_be_temporary() {
        assertThat(rows(posted("change jumpers a=E1/Q/1 -> temporary_until=2026-12-08"), "jumpers"))
                .allMatch(row -> row.endsWith("|2026-12-08"));
        assertThat(rows(
                        posted("change terminations enclosure=E1 panel=P ports=4-6 -> temporary_until=2026-12-08"),
                        "terminations"))
                .contains("E1|P|4-6|F-1 ahead 4-6|pigtail||posted|||2026-12-08");
    }

    @Test
    void planned_joints_are_found_by_their_job() {
        String plan = "add splices enclosure=E4 a=F-1 back 9-10 b=D-7 ahead 9-10 trust=planned job=J-1";
        assertThat(rows(posted(plan, "remove splices enclosure=E4 a=F-1 back 9 trust=planned job=J-1"), "splices"))
                .contains("E4||F-1 back 10|D-7 ahead 10|fusion||planned|||||J-1");
        assertThat(rows(posted(plan, "change splices enclosure=E4 a=F-1 back 9 -> trust=posted"), "splices"))
                .contains("E4||F-1 back 9|D-7 ahead 9|fusion||posted|||||J-1");
    }

    @Test
    void rows_of_which_several_make_a_record_are_changed_one_by_one() {
        assertThat(rows(
                        posted("add fiber_types fiber_type=BEND wavelength_nm=1625 loss_db_per_km=0.24"
                                + " zero_dispersion_nm=1312"),
                        "fiber_types"))
                .hasSize(3);
        assertThat(rows(
                        posted("change fiber_types fiber_type=BEND wavelength_nm=1550 -> loss_db_per_km=0.2"
                                + " loss_limit_db_per_km=0.25 zero_dispersion_nm=1313"),
                        "fiber_types"))
                .containsExactly("BEND|1310|0.35|0.35|1.4677|1313||", "BEND|1550|0.2|0.25|1.4682|1313||");
        assertThat(rows(posted("remove fiber_types fiber_type=BEND wavelength_nm=1310"), "fiber_types"))
                .hasSize(1);
        assertThat(rows(
                        posted("add splitter_outputs enclosure=E9 splitter=S1 output=3 loss_db=11.6"),
                        "splitter_outputs"))
                .hasSize(3);
        assertThat(rows(posted("remove splitter_outputs enclosure=E9 splitter=S1 output=1"), "splitter_outputs"))
                .containsExactly("E9|S1|2|11.5");
        assertThat(rows(posted("change splitters enclosure=E9 splitter=S1 -> loss_db=7"), "splitter_outputs"))
                .hasSize(2);
        assertThat(rows(
                        posted(
                                "add color_codes code=X position=1 color=red",
                                "add color_codes code=X position=2 color=blue"),
                        "color_codes"))
                .containsExactly("X|1|red", "X|2|blue");
    }

    @Test
    void a_run_grows_and_its_spans_are_found() {
        Records records = posted(
                "add spans span=S-3 from=HH-2 to=PED-9 placement=buried",
                "add cable_runs cable=F-1 seq=3 structure=PED-9");
        assertThat(rows(records, "cable_runs")).contains("F-1|3|PED-9|S-3|0|posted||");
    }

    @Test
    void a_run_does_not_end_before_glass_that_is_joined() {
        assertThat(faults(
                        "remove terminations enclosure=E9 panel=P ports=5-8",
                        "remove splices enclosure=E9 a=F-1 back 1",
                        "remove sheath_marks cable=F-1 seq=2 ink=white",
                        "remove enclosure_cables enclosure=E9 cable=F-1",
                        "remove cable_runs cable=F-1 seq=2"))
                .singleElement()
                .asString()
                .contains("F-1");
    }

    @Test
    void every_fault_names_its_change_and_column() {
        assertThat(faults(
                        "add structures structure=P 5 kind=pool lon=1e2 lat=91",
                        "add structure structure=P-5",
                        "change spans span=S-9 -> placement=aerial",
                        "change spans span=S-1 -> colour=red",
                        "add splices enclosure=E4 a=F-1 back 30 b=D-7 ahead 1",
                        "add circuits circuit=C-9 a=E1/Q/1 z=E9/P/1"))
                .extracting(fault -> fault.substring(0, fault.indexOf(": ")))
                .containsExactly(
                        "0 structure", "0 kind", "0 lon", "0 lat", "1 null", "2 span", "3 colour", "4 a", "5 null");
    }

    @Test
    void what_no_file_can_hold_is_refused() {
        assertThat(faults("change structures structure=HH-1 -> note=a\u0000b")).hasSize(1);
        assertThat(faults("change structures structure=HH-1 -> note=\uD800")).hasSize(1);
        assertThat(rows(posted("change structures structure=HH-1 -> note=\uD83D\uDE00\ttab"), "structures"))
                .anyMatch(row -> row.endsWith("\uD83D\uDE00\ttab"));
    }
}
