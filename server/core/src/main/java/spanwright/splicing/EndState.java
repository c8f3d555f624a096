package spanwright.splicing;

import java.time.LocalDate;
import org.jspecify.annotations.Nullable;
import spanwright.journal.RecordKind;
import spanwright.journal.Recorded;
import spanwright.plant.Trust;

/**
 * What became of ends that no joint uses.
 *
 * @param id lasting identity
 * @param enclosure identity of the enclosure
 * @param ends the ends
 * @param condition what became of them
 * @param trust how sure
 * @param verifiedOn when last seen, or null
 */
public record EndState(
        int id,
        int enclosure,
        EndRange ends,
        EndCondition condition,
        Trust trust,
        @Nullable LocalDate verifiedOn) implements Recorded {

    @Override
    public RecordKind kind() {
        return RecordKind.END_STATE;
    }
}
