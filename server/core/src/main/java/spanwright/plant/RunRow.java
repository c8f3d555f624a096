package spanwright.plant;

import java.time.LocalDate;
import org.jspecify.annotations.Nullable;
import spanwright.journal.RecordKind;
import spanwright.journal.Recorded;
import spanwright.quantity.Length;

/**
 * One row of a cable's run: a structure that it visits.
 *
 * @param id lasting identity
 * @param cable identity of the cable
 * @param seq 0, 1, 2 ... from the cable's start
 * @param structure identity of the structure
 * @param span identity of the span travelled to reach it, null on row 0 only
 * @param slack sheath coiled here, 0 or above
 * @param slackTrust how sure the coil is
 * @param slackOn when it was seen, or null
 * @param duct a free code, or null
 */
public record RunRow(
        int id,
        int cable,
        int seq,
        int structure,
        @Nullable Integer span,
        Length slack,
        Trust slackTrust,
        @Nullable LocalDate slackOn,
        @Nullable String duct)
        implements Recorded {

    @Override
    public RecordKind kind() {
        return RecordKind.RUN_ROW;
    }
}
