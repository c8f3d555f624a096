package spanwright.repair;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Random;
import java.util.TreeMap;
import org.junit.jupiter.api.Test;
import spanwright.circuits.CircuitStatus;
import spanwright.network.RecordsText;
import spanwright.network.Snapshot;
import spanwright.network.SnapshotEditor;
import spanwright.plant.Cable;
import spanwright.plants.RandomPlant;
import spanwright.quantity.Length;
import spanwright.records.CableLay;
import spanwright.records.Refusal;
import spanwright.splicing.SpliceMethod;
import spanwright.trace.Path;
import spanwright.trace.Tracer;

class RepairTest {

    private static final Length TRAY = Length.ofMetres(1.5);

    private static RepairOrder order(CableLay lay, int first, int second) {
        long out = lay.positions().out(first).micrometres();
        long in = lay.positions().in(second).micrometres();
        return new RepairOrder(
                lay.cable().code(),
                new Length((out + in) / 2),
                null,
                new RepairOrder.Place("NEW-1", lay.structure(first).code(), TRAY),
                new RepairOrder.Place("NEW-2", lay.structure(second).code(), TRAY),
                new RepairOrder.Piece(null, null, "R-9", null),
                List.of(),
                SpliceMethod.FUSION,
                "Crew 4",
                null,
                null,
                null);
    }

    /** Every working circuit's paths, each as its ends, whether complete, and its glass. */
    private static Map<String, List<Path>> paths(Snapshot snapshot) {
        Map<String, List<Path>> paths = new TreeMap<>();
        Tracer tracer = new Tracer(snapshot);
        snapshot.records()
                .circuits()
                .list()
                .filter(circuit -> circuit.status() == CircuitStatus.WORKING)
                .forEach(circuit -> paths.put(circuit.code(), tracer.ofCircuit(circuit)));
        return paths;
    }

    @Test
    void a_piece_let_into_random_plants_leaves_circuits_whole_and_changes_no_glass_but_its_own() {
        int repaired = 0;
        for (long seed = 1; repaired < 120; seed++) {
            assertThat(seed).as("enough plants take a piece").isLessThan(4_000);
            Snapshot before = Snapshot.of(RandomPlant.of(seed).entered());
            for (Cable cable : before.records().cables().list().toList()) {
                if (repairOne(seed, before, cable)) {
                    repaired++;
                }
            }
        }
    }

    private static boolean repairOne(long seed, Snapshot before, Cable cable) {
        CableLay lay = CableLay.of(before.records(), cable.id());
        Random random = new Random(seed);
        int first = 1 + random.nextInt(Math.max(1, lay.rows().size() - 3));
        int second = first + 1;
        if (second >= lay.rows().size() - 1
                || before.records().findPassAt(lay.rows().get(first).id()).isPresent()
                || lay.positions().in(second).minus(lay.positions().out(first)).micrometres() < 2
                || before.records().findPassAt(lay.rows().get(second).id()).isPresent()) {
            return false;
        }
        SnapshotEditor editor = before.edit();
        Repair repair = new Repair(editor, order(lay, first, second));
        List<Refusal> refusals = new ArrayList<>(repair.enter());
        refusals.addAll(refusals.isEmpty() ? editor.finish() : List.of());
        assertThat(refusals)
                .as("seed %d, cable %s, rows %d", seed, cable.code(), first)
                .isEmpty();
        Snapshot after = editor.build(2);
        String at = "seed " + seed + ", cable " + cable.code();
        assertThat(RecordsText.of(after)).as(at).isEqualTo(RecordsText.of(Snapshot.of(after.records())));
        compare(at, paths(before), paths(after));
        return true;
    }

    private static void compare(String at, Map<String, List<Path>> before, Map<String, List<Path>> after) {
        assertThat(after.keySet()).as(at).isEqualTo(before.keySet());
        before.forEach((code, paths) -> {
            List<Path> now = after.getOrDefault(code, List.of());
            assertThat(now).as("%s, circuit %s", at, code).hasSameSizeAs(paths);
            for (int index = 0; index < paths.size(); index++) {
                assertThat(now.get(index).complete())
                        .as("%s, circuit %s", at, code)
                        .isEqualTo(paths.get(index).complete());
            }
        });
    }
}
