package spanwright.splicing;

import spanwright.journal.RecordKind;
import spanwright.journal.Recorded;
import spanwright.plant.FiberRange;

/**
 * Another numbering of the same fibers: shown beside, never reckoned with.
 *
 * @param id lasting identity
 * @param cable identity of the cable
 * @param fibers which fibers
 * @param name name of the count
 * @param numbers their numbers in it, of the same count
 */
public record FiberCount(int id, int cable, FiberRange fibers, String name, FiberRange numbers) implements Recorded {

    @Override
    public RecordKind kind() {
        return RecordKind.FIBER_COUNT;
    }
}
