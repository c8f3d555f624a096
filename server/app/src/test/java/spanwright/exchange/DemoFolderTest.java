package spanwright.exchange;

import static org.assertj.core.api.Assertions.assertThat;

import java.nio.file.Path;
import java.time.LocalDate;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import spanwright.check.Checker;
import spanwright.check.Severity;
import spanwright.circuits.Circuit;
import spanwright.network.Snapshot;
import spanwright.network.SnapshotEditor;
import spanwright.quantity.Length;
import spanwright.trace.Tracer;

/** The demo's folder as the program reads it. What is expected is told in demo-data/README.md. */
class DemoFolderTest {

    private static final Path DEMO = Path.of(System.getProperty("repository.root"), "demo-data", "sallowmere");
    private static final LocalDate TODAY = LocalDate.of(2026, 12, 1);

    private static Snapshot demo;

    @BeforeAll
    static void load() {
        SnapshotEditor editor = Snapshot.empty().edit();
        assertThat(FolderLoad.load(DEMO, editor, FolderLoad.Progress.NONE)).isEmpty();
        demo = editor.build(1);
    }

    @Test
    void every_circuit_has_its_path() {
        Tracer tracer = new Tracer(demo);
        List<Circuit> circuits = demo.records().circuits().list().toList();
        assertThat(circuits).hasSize(1_620 + 31);
        assertThat(circuits)
                .allSatisfy(circuit -> assertThat(tracer.ofCircuit(circuit)).allMatch(path -> path.complete()));
    }

    @Test
    void the_farthest_subscriber_has_16_7_km_of_glass() {
        Tracer tracer = new Tracer(demo);
        long most = demo.records()
                .circuits()
                .list()
                .filter(circuit -> circuit.code().startsWith("PON-"))
                .flatMap(circuit -> tracer.ofCircuit(circuit).stream())
                .mapToLong(path -> path.glass().micrometres())
                .max()
                .orElseThrow();
        assertThat(most)
                .isBetween(
                        Length.ofMetres(16_650).micrometres(),
                        Length.ofMetres(16_750).micrometres());
    }

    @Test
    void the_seeded_faults_are_found_and_one_of_them_is_an_error() {
        Map<String, Integer> found = new TreeMap<>();
        Map<Severity, Integer> severities = new EnumMap<>(Severity.class);
        Checker.check(demo, TODAY, finding -> {
            found.merge(finding.rule(), 1, Integer::sum);
            severities.merge(finding.severity(), 1, Integer::sum);
        });
        // The one error is meant: a drop fiber broken at its first pole, while its subscriber's circuit still works.
        assertThat(severities).containsEntry(Severity.ERROR, 1);
        assertThat(found)
                .containsEntry("circuit-on-dead-fiber", 1)
                .containsEntry("reservation-lapsed", 11)
                .containsEntry("ribbon-turned", 1)
                .containsEntry("codes-near-equal", 1)
                .containsEntry("jumper-without-rear", 1)
                .containsKeys("sheath-against-route", "coil-against-marks", "coil-not-sure", "measured-one-way");
    }
}
