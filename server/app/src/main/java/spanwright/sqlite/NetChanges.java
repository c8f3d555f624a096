package spanwright.sqlite;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Objects;
import org.jspecify.annotations.Nullable;
import spanwright.journal.Change;
import spanwright.journal.RecordKind;
import spanwright.journal.Recorded;

/** What a list of changes comes to: one change a record at most, from its first before to its last after. */
final class NetChanges {

    /** Names a record among those of all kinds. */
    private record Identity(RecordKind kind, int id) {}

    private NetChanges() {}

    /** The same list where no record occurs twice, as in a load. */
    static List<Change> of(List<Change> changes) {
        if (allNew(changes)) {
            return changes;
        }
        Map<Identity, Change> first = new LinkedHashMap<>();
        Map<Identity, @Nullable Recorded> last = new LinkedHashMap<>();
        for (Change change : changes) {
            Identity identity = new Identity(change.kind(), change.id());
            first.putIfAbsent(identity, change);
            last.put(identity, change.after());
        }
        List<Change> net = new ArrayList<>(first.size());
        first.forEach((identity, change) -> {
            Recorded before = change.before();
            Recorded after = last.get(identity);
            if (!Objects.equals(before, after)) {
                net.add(new Change(identity.kind(), identity.id(), before, after));
            }
        });
        return net;
    }

    private static boolean allNew(List<Change> changes) {
        int[] highest = new int[RecordKind.values().length];
        for (Change change : changes) {
            int kind = change.kind().ordinal();
            if (change.before() != null || change.id() <= highest[kind]) {
                return false;
            }
            highest[kind] = change.id();
        }
        return true;
    }
}
