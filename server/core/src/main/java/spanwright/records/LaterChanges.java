package spanwright.records;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Objects;
import spanwright.journal.Change;
import spanwright.journal.RecordKind;
import spanwright.journal.Recorded;
import spanwright.splicing.Joint;

/** Whether records are still as a posting left them, so that it can be taken back. */
public final class LaterChanges {

    private LaterChanges() {}

    /** A record, known across postings. */
    private record Identity(RecordKind kind, int id) {}

    /**
     * Asks about what a posting changed.
     *
     * @param changes all of its changes, in the order in which they were entered
     * @return a refusal a record that was changed again since; empty where none was
     */
    public static List<Refusal> ask(RecordsView now, List<Change> changes) {
        Map<Identity, Change> last = new LinkedHashMap<>();
        changes.forEach(change -> last.put(new Identity(change.kind(), change.id()), change));
        List<Refusal> refusals = new ArrayList<>();
        last.forEach((identity, change) -> {
            Recorded present = now.record(identity.kind(), identity.id());
            if (!Objects.equals(present, change.after())) {
                refusals.add(refusal(now, change));
            }
        });
        return refusals;
    }

    private static Refusal refusal(RecordsView now, Change change) {
        Recorded record = Objects.requireNonNullElse(change.after(), change.before());
        String name = record instanceof Joint joint
                ? "a joint in enclosure " + Names.enclosure(now, joint.enclosure())
                : Names.of(now, record);
        return new Refusal(
                "changed-since",
                name + " was changed again since; take the later change back first, or undo this by hand",
                null,
                record,
                null);
    }
}
