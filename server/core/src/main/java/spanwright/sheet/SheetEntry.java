package spanwright.sheet;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import spanwright.journal.Change;
import spanwright.network.SnapshotEditor;
import spanwright.records.Refusal;

/**
 * Enters what a sheet says: joints and states that it contradicts give way, those that it repeats stay as they are, and
 * of what it does not name nothing changes but this: an end whose joint is taken apart stays cut, in no state. One
 * thread's, for one posting.
 */
public final class SheetEntry {

    private final SnapshotEditor editor;
    private final List<LineRefusal> refusals = new ArrayList<>();
    private final SheetHeader header;
    private final int enclosure;

    private SheetEntry(SnapshotEditor editor, int enclosure, SheetHeader header) {
        this.editor = editor;
        this.enclosure = enclosure;
        this.header = header;
    }

    /**
     * Enters statements. Where anything is refused, the editor holds only part of them and must be thrown away.
     *
     * @param enclosure identity of the enclosure
     * @return why not, by line; empty where all are entered
     */
    public static List<LineRefusal> enter(
            SnapshotEditor editor, int enclosure, SheetHeader header, List<Statement> statements) {
        SheetEntry entry = new SheetEntry(editor, enclosure, header);
        entry.enter(statements);
        return entry.refusals;
    }

    private void enter(List<Statement> statements) {
        Map<String, List<Statement>> byJob = new LinkedHashMap<>();
        byJob.put("", new ArrayList<>());
        for (Statement statement : statements) {
            Statement whole = statement instanceof Statement.Joins joins
                    ? joins.saying(joins.words().under(header))
                    : statement;
            byJob.computeIfAbsent(whole.job(), job -> new ArrayList<>()).add(whole);
        }
        byJob.forEach((job, said) -> new EndEntry(this, job, said).enter());
        new CableEntry(this, header).enter(statements);
    }

    SnapshotEditor editor() {
        return editor;
    }

    int enclosure() {
        return enclosure;
    }

    /** Applies a change for a line, or notes what refuses it. */
    void apply(TextPlace place, Change change) {
        for (Refusal refusal : editor.apply(change)) {
            refusals.add(new LineRefusal(place, refusal));
        }
    }
}
