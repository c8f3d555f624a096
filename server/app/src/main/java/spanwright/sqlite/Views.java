package spanwright.sqlite;

import java.util.ArrayList;
import java.util.Iterator;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import spanwright.journal.Change;
import spanwright.network.Snapshot;
import spanwright.network.SnapshotEditor;

/**
 * States of the past: from whichever state at hand lies the fewest changes away, changes are undone or made again. A
 * few are kept, the ones asked for last. Safe for any number of threads.
 */
final class Views {

    private static final int KEPT = 8;

    private final Journal journal;
    private final Map<Integer, Snapshot> kept = new LinkedHashMap<>(16, 0.75f, true);

    Views(Journal journal) {
        this.journal = journal;
    }

    /**
     * The state at a posting.
     *
     * @param posting from 0 to that of the current state
     */
    Snapshot at(int posting, Snapshot current) {
        if (posting == current.records().posting()) {
            return current;
        }
        if (posting == 0) {
            return Snapshot.empty();
        }
        synchronized (kept) {
            Snapshot known = kept.get(posting);
            if (known != null) {
                return known;
            }
        }
        Snapshot found = walk(nearest(posting, current), posting);
        synchronized (kept) {
            kept.put(posting, found);
            Iterator<Integer> oldest = kept.keySet().iterator();
            if (kept.size() > KEPT) {
                oldest.next();
                oldest.remove();
            }
        }
        return found;
    }

    private Snapshot nearest(int posting, Snapshot current) {
        List<Snapshot> bases = new ArrayList<>(List.of(current, Snapshot.empty()));
        synchronized (kept) {
            bases.addAll(kept.values());
        }
        Snapshot best = current;
        long fewest = Long.MAX_VALUE;
        for (Snapshot base : bases) {
            int from = base.records().posting();
            long away = journal.changesBetween(Math.min(from, posting), Math.max(from, posting));
            if (away < fewest) {
                fewest = away;
                best = base;
            }
        }
        return best;
    }

    private Snapshot walk(Snapshot base, int posting) {
        SnapshotEditor editor = base.edit();
        int from = base.records().posting();
        for (int number = from + 1; number <= posting; number++) {
            journal.changesOf(number).forEach(editor::replay);
        }
        for (int number = from; number > posting; number--) {
            List<Change> changes = journal.changesOf(number);
            for (int index = changes.size() - 1; index >= 0; index--) {
                editor.replay(changes.get(index).inverse());
            }
        }
        return editor.build(posting);
    }
}
