package spanwright.exchange;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Path;
import java.util.List;
import java.util.stream.LongStream;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import spanwright.incident.Written;
import spanwright.network.MemoryLedger;
import spanwright.network.Snapshot;
import spanwright.network.SnapshotEditor;
import spanwright.plants.RandomRing;
import spanwright.quantity.Length;
import spanwright.repair.RepairDesk;
import spanwright.repair.RepairOrder;
import spanwright.splicing.SpliceMethod;
import spanwright.trace.Tracer;

/** A repair rewrites runs, marks, passes and joints by itself; a folder has to take all of it out and in again. */
class RepairedRoundTripTest {

    private static final Length TRAY = Length.ofMetres(1.5);
    private static final RepairOrder ORDER = new RepairOrder(
            "F-0",
            null,
            "H01-H02",
            new RepairOrder.Place("R-1", "H01", TRAY),
            new RepairOrder.Place("R-2", "H02", TRAY),
            new RepairOrder.Piece(null, null, "R-9", null),
            List.of(),
            SpliceMethod.FUSION,
            "Crew 4",
            null,
            null,
            null);

    @TempDir
    Path temp;

    static LongStream seeds() {
        return LongStream.rangeClosed(1, 30);
    }

    @ParameterizedTest
    @MethodSource("seeds")
    void a_repaired_ring_written_and_read_again_is_equal_and_still_lit(long seed) throws IOException {
        // Joints side by side are one row of a folder, so the ring is taken as a folder brings it.
        Snapshot repaired = repaired(again(RandomRing.of(seed), "ring"));
        Snapshot again = again(repaired, seed % 2 == 0 ? "repaired" : "repaired.zip");

        assertThat(RecordTexts.of(again.records())).isEqualTo(RecordTexts.of(repaired.records()));
        assertThat(again.records().cables().find("F-0-2")).isPresent();
        Tracer tracer = new Tracer(again);
        assertThat(again.records().circuits().list())
                .isNotEmpty()
                .allSatisfy(circuit -> assertThat(tracer.ofCircuit(circuit))
                        .as(circuit.code())
                        .isNotEmpty()
                        .allMatch(spanwright.trace.Path::complete));
    }

    private static Snapshot repaired(Snapshot ring) {
        try (MemoryLedger ledger = new MemoryLedger()) {
            ledger.post("A. Marsh", "Ring", editor -> {
                RandomRing.changes(ring).forEach(editor::replay);
                return List.of();
            });
            assertThat(new RepairDesk(ledger).post("D. Reed", "Cut", ORDER)).isInstanceOf(Written.Kept.class);
            return ledger.current();
        }
    }

    private Snapshot again(Snapshot plant, String name) throws IOException {
        Path path = temp.resolve(name);
        FolderExport.write(plant.records(), path);
        SnapshotEditor editor = Snapshot.empty().edit();
        assertThat(FolderLoad.load(path, editor, FolderLoad.Progress.NONE)).isEmpty();
        return editor.build(1);
    }
}
