package spanwright.exchange;

import java.util.List;
import org.jspecify.annotations.Nullable;
import spanwright.journal.Change;
import spanwright.journal.RecordKind;
import spanwright.journal.Recorded;
import spanwright.network.SnapshotEditor;
import spanwright.plant.RunRow;
import spanwright.records.RecordsView;
import spanwright.records.Refusal;
import spanwright.splicing.Joint;

/** Enters the records of one folder into an editor, and turns what refuses them into faults with their lines. */
final class Entering {

    private final SnapshotEditor editor;
    private final Faults faults;
    private final Lines lines;
    private final Doubts doubts = new Doubts();
    private final References refs;

    Entering(SnapshotEditor editor, Faults faults) {
        this.editor = editor;
        this.faults = faults;
        this.lines = new Lines(editor.records());
        this.refs = new References(editor.records(), doubts);
    }

    RecordsView view() {
        return editor.records();
    }

    /** An identity for a record that is entered later. */
    int newIdentity(RecordKind kind) {
        return editor.records().newIdentity(kind);
    }

    References refs() {
        return refs;
    }

    Doubts doubts() {
        return doubts;
    }

    Lines lines() {
        return lines;
    }

    Faults faults() {
        return faults;
    }

    /** A row that tells its faults to the folder. */
    Row row(Table table) {
        return new Row(table, (row, column, text) -> faults.add(row.table(), row.line(), text));
    }

    /** Adds a record that stands on a line; false where it is refused, which is then reported. */
    boolean add(Table table, int line, Recorded record) {
        return apply(table, line, Change.add(record));
    }

    /**
     * Adds a range of joints whose rows stand on a line each, from one line on; false where any of it is refused,
     * which is not reported, and then none of it is added.
     */
    boolean addFolded(Joint range, int firstLine) {
        if (!editor.apply(Change.add(range)).isEmpty()) {
            return false;
        }
        lines.noteFolded(range, firstLine);
        return true;
    }

    /** Applies a change that a line makes; false where it is refused, which is then reported. */
    boolean apply(Table table, int line, Change change) {
        List<Refusal> refusals = editor.apply(change);
        for (Refusal refusal : refusals) {
            faults.add(table, line, sentence(refusal));
        }
        Recorded after = change.after();
        if (refusals.isEmpty() && after != null) {
            lines.note(after, line);
        }
        return refusals.isEmpty();
    }

    /** Applies a change that a line of the base map makes. */
    void apply(Change change, int line) {
        editor.apply(change).forEach(refusal -> faults.add(BaseMapLoad.FILE, line, sentence(refusal)));
    }

    /** Reports a refusal of a record that stands on a line of its table. */
    void refuse(Refusal refusal, int line) {
        Recorded record = refusal.record();
        Table table = record == null ? null : Lines.table(record);
        if (table != null) {
            faults.add(table, line, sentence(refusal));
        } else {
            faults.add(BaseMapLoad.FILE, line, sentence(refusal));
        }
    }

    /** What is wrong, and where the earlier row stands that it clashes with. */
    String sentence(Refusal refusal) {
        Recorded earlier = refusal.earlier();
        return earlier == null
                ? refusal.sentence()
                : refusal.sentence() + " (" + where(earlier, refusal.record()) + ")";
    }

    private String where(Recorded earlier, @Nullable Recorded refused) {
        int line = lines.of(earlier, refused);
        Table table = Lines.table(earlier);
        return line == 0 || table == null
                ? "it is in the records file already"
                : "the earlier is " + table.file() + ":" + line;
    }

    /** Asks what only all rows together can break. */
    void finish() {
        for (Refusal refusal : editor.finish()) {
            Recorded record = refusal.record();
            if (!inDoubt(record)) {
                refuse(refusal, record == null ? 1 : Math.max(1, lines.of(record)));
            }
        }
    }

    /** Whether a record would break a rule only because rows beside it were refused. */
    private boolean inDoubt(@Nullable Recorded record) {
        return record instanceof RunRow run && Runs.inDoubt(refs, run.cable());
    }
}
