package spanwright.paper;

import java.util.List;
import java.util.stream.IntStream;
import org.jspecify.annotations.Nullable;
import spanwright.journal.Change;
import spanwright.journal.Recorded;
import spanwright.network.Snapshot;
import spanwright.plant.Cable;
import spanwright.plant.CableType;
import spanwright.plant.ColorCode;
import spanwright.plant.Placement;
import spanwright.plant.PlantState;
import spanwright.plant.Position;
import spanwright.plant.RunRow;
import spanwright.plant.Span;
import spanwright.plant.Structure;
import spanwright.plant.StructureKind;
import spanwright.plant.Trust;
import spanwright.quantity.Length;
import spanwright.records.Records;
import spanwright.records.RecordsEditor;

/** One cable on one span between two handholes, bare at both ends, in twelve plain colours. */
final class OneCable {

    private OneCable() {}

    /** The colours of its tubes and fibers, named so that they are told apart in any text. */
    static ColorCode plainColors() {
        return new ColorCode(
                1,
                "plain",
                IntStream.rangeClosed(1, 12).mapToObj(place -> "shade" + place).toList());
    }

    /** The plant, at posting 7. */
    static Snapshot of(int fibers, int fibersPerTube, String note) {
        List<Recorded> records = List.of(
                plainColors(),
                handhole(1, "H-1", -123.0, note),
                handhole(2, "H-2", -123.001, note),
                new Span(1, "S-1", 1, 2, Placement.BURIED, null, null, PlantState.IN_SERVICE, List.of(), note),
                new CableType(1, "T-1", fibers, fibersPerTube, "G.652.D", 0, false, null, "plain"),
                new Cable(1, "F-1", 1, null, "white", null, null, null, PlantState.IN_SERVICE, note),
                row(1, 0, 1, null),
                row(2, 1, 2, 1));
        RecordsEditor editor = Records.empty().edit();
        records.forEach(record -> editor.apply(Change.add(record)));
        return Snapshot.of(editor.build(7));
    }

    private static Structure handhole(int id, String code, double lon, String note) {
        return new Structure(
                id,
                code,
                StructureKind.HANDHOLE,
                new Position(lon, -48),
                null,
                note,
                PlantState.IN_SERVICE,
                List.of(),
                note);
    }

    private static RunRow row(int id, int seq, int structure, @Nullable Integer span) {
        return new RunRow(id, 1, seq, structure, span, Length.ZERO, Trust.POSTED, null, null);
    }
}
