package spanwright.plants;

import java.util.List;
import java.util.Optional;
import java.util.stream.Stream;
import org.jspecify.annotations.Nullable;
import spanwright.journal.Change;
import spanwright.journal.RecordKind;
import spanwright.journal.Recorded;
import spanwright.network.SnapshotEditor;
import spanwright.records.RecordsEditor;

/**
 * Draws changes of all sorts to whatever plant there is, from a seed: joints made, undone, split and turned; fibers
 * opened; passes, panels, splitters and cables that come, go, grow, and go into and out of service; cables lengthened
 * and cut in two; circuits moved. A change that a rule refuses is left out, and so is the rest of what it began.
 */
public final class RandomChanges {

    private final Chance chance;

    /** Draws from a seed. */
    public RandomChanges(long seed) {
        this.chance = new Chance(seed);
    }

    /** Enters some changes; what they leave may break a rule that is asked at the finish. */
    public void enter(SnapshotEditor editor) {
        Entering entering = new Entering(editor, chance);
        for (int more = chance.between(1, 8); more > 0; more--) {
            if (chance.in(55)) {
                new GlassChanges(entering).draw();
            } else if (chance.in(60)) {
                new PlantChanges(entering).draw();
            } else {
                new CableChanges(entering).draw();
            }
        }
    }

    /** What the kinds of change share. */
    record Entering(SnapshotEditor editor, Chance chance) {

        RecordsEditor records() {
            return editor.records();
        }

        int next(RecordKind kind) {
            return editor.records().newIdentity(kind);
        }

        /** Applies a change, and says whether it was let. */
        boolean apply(Change change) {
            return editor.apply(change).isEmpty();
        }

        boolean add(Recorded record) {
            return apply(Change.add(record));
        }

        boolean remove(Recorded record) {
            return apply(Change.remove(record));
        }

        boolean replace(Recorded before, Recorded after) {
            return before.equals(after) || apply(Change.replace(before, after));
        }

        /** Removes all, while the rules let it. */
        boolean removeAll(Stream<? extends Recorded> records) {
            return records.toList().stream().allMatch(this::remove);
        }

        <T extends Recorded> Optional<T> any(Stream<T> records) {
            List<T> all = records.toList();
            return all.isEmpty() ? Optional.empty() : Optional.of(chance.of(all));
        }

        <T> @Nullable T perhaps(int outOfHundred, T what) {
            return chance.in(outOfHundred) ? what : null;
        }
    }
}
