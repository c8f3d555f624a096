package spanwright.splicing;

import java.time.LocalDate;
import org.jspecify.annotations.Nullable;
import spanwright.journal.RecordKind;
import spanwright.journal.Recorded;
import spanwright.plant.FiberRange;

/**
 * A flag on fibers of a cable.
 *
 * @param id lasting identity
 * @param cable identity of the cable
 * @param fibers which fibers
 * @param flag what is said of them
 * @param from identity of the enclosure where it begins, or null: the cable's start
 * @param to identity of the enclosure where it ends, or null: the cable's end
 * @param owner whose, or null
 * @param reason why, or null
 * @param until last day, or null
 */
public record FiberFlag(
        int id,
        int cable,
        FiberRange fibers,
        Flag flag,
        @Nullable Integer from,
        @Nullable Integer to,
        @Nullable String owner,
        @Nullable String reason,
        @Nullable LocalDate until)
        implements Recorded {

    @Override
    public RecordKind kind() {
        return RecordKind.FIBER_FLAG;
    }
}
