package spanwright.exchange;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.LocalDate;
import java.util.Arrays;
import java.util.List;
import java.util.Set;
import java.util.TreeSet;
import java.util.stream.Collectors;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import spanwright.circuits.Circuit;
import spanwright.network.Snapshot;
import spanwright.network.SnapshotEditor;
import spanwright.outage.Cut;
import spanwright.outage.HitCircuit;
import spanwright.outage.Impact;
import spanwright.plant.Enclosure;
import spanwright.plant.Span;
import spanwright.suspicion.Alarms;
import spanwright.suspicion.Suspect;
import spanwright.suspicion.Suspects;

/** The stories of the demo, as their generator reckoned them: demo-data/stories. */
class DemoStoriesTest {

    private static final Path ROOT = Path.of(System.getProperty("repository.root", "../.."), "demo-data");

    private static Snapshot demo;

    @BeforeAll
    static void load() {
        SnapshotEditor editor = Snapshot.empty().edit();
        assertThat(FolderLoad.load(ROOT.resolve("sallowmere"), editor, FolderLoad.Progress.NONE))
                .isEmpty();
        demo = editor.build(1);
    }

    private static Set<String> codes(String story, String file) throws IOException {
        return new TreeSet<>(Arrays.asList(
                Files.readString(ROOT.resolve("stories").resolve(story).resolve(file))
                        .strip()
                        .split(",")));
    }

    @Test
    void the_backhoe_takes_down_what_the_alarms_say_and_the_lease_that_has_none() throws IOException {
        int span = demo.records().spans().find("HH-S044_HH-S045").orElseThrow().id();

        Impact impact = Impact.of(demo, List.of(new Cut.OfSpan(span)));

        Set<String> down = codes(impact, true);
        Set<String> leased = new TreeSet<>(Set.of("LSE-01", "LSE-02"));
        leased.addAll(codes("1-backhoe", "down.txt"));
        assertThat(down).isEqualTo(leased);
        assertThat(down).filteredOn(code -> code.startsWith("PON-")).hasSize(540);
        assertThat(codes("1-backhoe", "down.txt"))
                .filteredOn(code -> !code.startsWith("PON-"))
                .hasSize(13);
        assertThat(codes(impact, false)).containsExactly("RC-01", "RC-02");
        assertThat(impact.fibersCut()).isEqualTo(288);
        assertThat(impact.customersDown()).isEqualTo(555);
        assertThat(impact.circuits().stream().limit(8).map(hit -> hit.circuit().code()))
                .containsExactly("GOV-01", "GOV-02", "GOV-03", "GOV-04", "GOV-05", "RC-01", "RC-02", "BIZ-01");
    }

    private static Suspects suspects(String story, String... opened) throws IOException {
        return Suspects.of(
                demo,
                new Alarms(
                        circuits(story, "down.txt"),
                        circuits(story, "up.txt"),
                        false,
                        Arrays.stream(opened)
                                .map(code -> demo.records()
                                        .enclosures()
                                        .find(code)
                                        .orElseThrow()
                                        .id())
                                .collect(Collectors.toSet()),
                        LocalDate.of(2026, 12, 3)));
    }

    private static List<Circuit> circuits(String story, String file) throws IOException {
        return codes(story, file).stream()
                .map(code -> demo.records().circuits().find(code).orElseThrow())
                .toList();
    }

    @Test
    void the_backhoe_lies_in_25_spans_that_no_alarm_tells_apart() throws IOException {
        Suspect first = suspects("1-backhoe").list().get(0);

        assertThat(first.spans()).extracting(Span::code).hasSize(25).contains("HH-S044_HH-S045");
        assertThat(first.enclosures()).extracting(Enclosure::code).containsExactly("C-S03", "C-S04");
        assertThat(first.spans().get(0).code()).isEqualTo("HH-S024_HH-S025");
        assertThat(first.explains()).hasSize(553);
        assertThat(first.contradicts()).isEmpty();
        assertThat(first.kind()).isEqualTo(Suspect.Kind.CUT);
    }

    @Test
    void tubes_7_and_19_crossed_where_a_crew_was_come_before_a_cut_of_the_lateral() throws IOException {
        Suspects suspects = suspects("2-wrong-tube", "C-N02");
        Suspect first = suspects.list().get(0);

        assertThat(first.kind()).isEqualTo(Suspect.Kind.CROSSED);
        assertThat(first.enclosures()).extracting(Enclosure::code).containsExactly("C-N02");
        assertThat(first.tubes()).containsExactly("FDR-N-1/7", "FDR-N-1/19");
        assertThat(first.explains()).hasSize(135);
        assertThat(first.contradicts()).isEmpty();
        assertThat(suspects.list())
                .anyMatch(each -> each.kind() == Suspect.Kind.CUT
                        && each.spans().stream().anyMatch(span -> span.code().endsWith("_CAB-04")));
    }

    @Test
    void where_no_enclosure_was_opened_lately_a_cut_of_the_lateral_comes_first() throws IOException {
        Suspect first = suspects("2-wrong-tube").list().get(0);

        assertThat(first.kind()).isEqualTo(Suspect.Kind.CUT);
        assertThat(first.spans()).extracting(Span::code).contains("P-L04-12_CAB-04");
    }

    @Test
    void one_drop_among_lit_neighbours_is_no_cut() throws IOException {
        Suspects suspects = suspects("4-fence-anchor");
        Suspect first = suspects.list().get(0);

        assertThat(first.kind()).isEqualTo(Suspect.Kind.END);
        assertThat(first.enclosures()).extracting(Enclosure::code).containsExactly("DT-02-13");
        assertThat(first.explains()).extracting(Circuit::code).containsExactly("PON-02-110");
        assertThat(first.contradicts()).isEmpty();
        assertThat(suspects.together()).containsExactly(0);
    }

    private static Set<String> codes(Impact impact, boolean down) {
        return impact.circuits().stream()
                .filter(hit -> hit.down() == down)
                .map(HitCircuit::circuit)
                .map(circuit -> circuit.code())
                .collect(Collectors.toCollection(TreeSet::new));
    }
}
