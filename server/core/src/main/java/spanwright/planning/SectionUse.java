package spanwright.planning;

import java.time.LocalDate;
import java.util.List;
import org.jspecify.annotations.Nullable;
import spanwright.circuits.Circuit;
import spanwright.splicing.FiberFlag;

/**
 * What one fiber of a section is used for.
 *
 * @param use what for
 * @param circuits the circuits on its glass path, by priority, then by code
 * @param flag the flag that says so, or null where none does
 * @param verifiedOn when the least recently verified joint or end of its glass path was verified; null where one was
 *     not, or there is none
 */
public record SectionUse(
        FiberUse use,
        List<Circuit> circuits,
        @Nullable FiberFlag flag,
        @Nullable LocalDate verifiedOn) {

    /** Keeps its own copy of the list. */
    public SectionUse {
        circuits = List.copyOf(circuits);
    }
}
