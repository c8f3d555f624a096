package spanwright.repair;

import java.util.ArrayList;
import java.util.List;
import spanwright.journal.Change;
import spanwright.journal.RecordKind;
import spanwright.journal.Recorded;
import spanwright.network.SnapshotEditor;
import spanwright.records.RecordsEditor;
import spanwright.records.Refusal;

/** Enters the changes of one repair; once one is refused, no more are entered, since they would build on it. */
final class RepairEntry {

    private final SnapshotEditor editor;
    private final int before;
    private final List<Refusal> refusals = new ArrayList<>();

    RepairEntry(SnapshotEditor editor) {
        this.editor = editor;
        this.before = editor.changes().size();
    }

    /** The records as changed so far. */
    RecordsEditor records() {
        return editor.records();
    }

    /** A new identity. */
    int next(RecordKind kind) {
        return records().newIdentity(kind);
    }

    /** Enters a change. */
    void apply(Change change) {
        if (refusals.isEmpty()) {
            refusals.addAll(editor.apply(change));
        }
    }

    /** Enters a new record. */
    <T extends Recorded> T add(T record) {
        apply(Change.add(record));
        return record;
    }

    /** Why it cannot be entered; empty where it can. */
    List<Refusal> refusals() {
        return List.copyOf(refusals);
    }

    /** How many changes were entered. */
    int changes() {
        return editor.changes().size() - before;
    }
}
