package spanwright.atlas;

import java.util.List;
import java.util.Objects;
import java.util.Random;
import spanwright.circuits.Circuit;
import spanwright.circuits.CircuitStatus;
import spanwright.circuits.PortRange;
import spanwright.journal.Change;
import spanwright.journal.RecordKind;
import spanwright.journal.Recorded;
import spanwright.plant.Cable;
import spanwright.plant.CableType;
import spanwright.plant.Enclosure;
import spanwright.plant.EnclosureKind;
import spanwright.plant.FiberRange;
import spanwright.plant.Placement;
import spanwright.plant.PlantState;
import spanwright.plant.Position;
import spanwright.plant.RunRow;
import spanwright.plant.Span;
import spanwright.plant.Structure;
import spanwright.plant.StructureKind;
import spanwright.plant.Trust;
import spanwright.quantity.Length;
import spanwright.quantity.Wavelength;
import spanwright.records.Records;
import spanwright.records.RecordsEditor;
import spanwright.splicing.Panel;

/** Structures in a row with spans between, some holding an enclosure, one cable; by a seed. */
final class SmallTown {

    private SmallTown() {}

    static Records of(int structures, long seed) {
        Random random = new Random(seed);
        RecordsEditor editor = Records.empty().edit();
        for (int i = 1; i <= structures; i++) {
            add(editor, structure(i, random, "ST-" + i));
            if (i > 1) {
                add(editor, span(i - 1, i - 1, i));
            }
            if (i % 5 == 0) {
                add(editor, enclosure(i / 5, "EN-" + i / 5, i));
            }
        }
        add(editor, new CableType(1, "C12", 12, 12, "G.652.D", 0, false, null, "TIA-598"));
        add(editor, new Cable(1, "F-1", 1, "F", "white", null, null, null, PlantState.IN_SERVICE, null));
        for (int seq = 0; seq < structures; seq++) {
            Integer span = seq == 0 ? null : seq;
            add(editor, new RunRow(seq + 1, 1, seq, seq + 1, span, Length.ZERO, Trust.POSTED, null, null));
        }
        return editor.build(1);
    }

    static void add(RecordsEditor editor, Recorded record) {
        Recorded before = editor.record(record.kind(), record.id());
        editor.apply(before == null ? Change.add(record) : Change.replace(before, record));
    }

    static void remove(RecordsEditor editor, RecordKind kind, int id) {
        editor.apply(Change.remove(Objects.requireNonNull(editor.record(kind, id))));
    }

    static Structure structure(int id, Random random, String code) {
        StructureKind[] kinds = StructureKind.values();
        Position position = new Position(-123 + random.nextDouble() * 0.2, -48 + random.nextDouble() * 0.2);
        String address = id % 3 == 0 ? id + " Mill Lane" : null;
        return new Structure(
                id,
                code,
                kinds[random.nextInt(kinds.length)],
                position,
                null,
                address,
                PlantState.IN_SERVICE,
                List.of(),
                null);
    }

    static Span span(int id, int from, int to) {
        return new Span(id, "SP-" + id, from, to, Placement.AERIAL, null, null, PlantState.IN_SERVICE, List.of(), null);
    }

    static Enclosure enclosure(int id, String code, int structure) {
        return new Enclosure(id, code, structure, EnclosureKind.CLOSURE, Length.ZERO, PlantState.IN_SERVICE, null);
    }

    static Panel panel(int id, int enclosure, String code) {
        return new Panel(id, enclosure, code, 12, "SC/APC");
    }

    static Circuit circuit(int id, String code, String customer) {
        PortRange a = new PortRange(1, FiberRange.of(1));
        PortRange z = new PortRange(1, FiberRange.of(2));
        return new Circuit(
                id,
                code,
                null,
                customer,
                3,
                1,
                List.of(Wavelength.ofNanometres(1310)),
                null,
                null,
                a,
                z,
                CircuitStatus.WORKING);
    }
}
