package spanwright.plant;

import java.time.LocalDate;
import org.jspecify.annotations.Nullable;
import spanwright.journal.RecordKind;
import spanwright.journal.Recorded;

/**
 * One continuous sheath.
 *
 * @param id lasting identity
 * @param code unique
 * @param cableType identity of its type
 * @param partOf name of the longer cable this reel is part of, or null
 * @param marksInk which set of sheath marks governs
 * @param overlengthPct this reel's own excess length in per cent, or null: its type's
 * @param reel reel number, or null
 * @param installedOn when laid, or null
 * @param state whether it is there
 * @param note free text, or null
 */
public record Cable(
        int id,
        String code,
        int cableType,
        @Nullable String partOf,
        String marksInk,
        @Nullable Double overlengthPct,
        @Nullable String reel,
        @Nullable LocalDate installedOn,
        PlantState state,
        @Nullable String note)
        implements Recorded {

    @Override
    public RecordKind kind() {
        return RecordKind.CABLE;
    }
}
