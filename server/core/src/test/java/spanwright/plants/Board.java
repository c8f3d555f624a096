package spanwright.plants;

import java.util.List;
import java.util.Optional;
import spanwright.circuits.PortRange;
import spanwright.journal.Change;
import spanwright.journal.RecordKind;
import spanwright.journal.Recorded;
import spanwright.network.Snapshot;
import spanwright.network.SnapshotEditor;
import spanwright.plant.Cable;
import spanwright.plant.Enclosure;
import spanwright.records.RecordsView;
import spanwright.records.Refusal;
import spanwright.splicing.Panel;

/** What a drawing is drawn upon: the records so far, and how a record is entered. */
final class Board {

    private final SnapshotEditor editor = Snapshot.empty().edit();
    final RecordsView view = editor.records();

    /** The snapshot of all that was entered, as posting 1. */
    Snapshot build() {
        check(editor.finish());
        return editor.build(1);
    }

    private static void check(List<Refusal> refusals) {
        if (!refusals.isEmpty()) {
            throw new RefusedDrawing(refusals);
        }
    }

    <T extends Recorded> T add(T record) {
        check(editor.apply(Change.add(record)));
        return record;
    }

    int next(RecordKind kind) {
        return editor.records().newIdentity(kind);
    }

    Cable cableOf(String code) {
        return view.cables().find(code).orElseThrow(() -> new IllegalArgumentException(code));
    }

    Enclosure enclosureOf(String code) {
        return view.enclosures().find(code).orElseThrow(() -> new IllegalArgumentException(code));
    }

    PortRange ports(String text) {
        return ports(view, text);
    }

    /** The ports written as {@code E1/P/1-2}. */
    static PortRange ports(RecordsView view, String text) {
        String[] parts = text.split("/", -1);
        int enclosure = view.enclosures().find(parts[0]).orElseThrow().id();
        Optional<Panel> panel = view.findPanel(enclosure, parts[1]);
        return new PortRange(panel.orElseThrow().id(), Words.range(parts[2]));
    }
}
