package spanwright.plant;

import java.util.List;
import org.jspecify.annotations.Nullable;
import spanwright.journal.RecordKind;
import spanwright.journal.Recorded;
import spanwright.quantity.Length;

/**
 * Where plant sits.
 *
 * @param id lasting identity
 * @param code what its tag says, unique
 * @param type what it is
 * @param position where it is
 * @param accuracy standard uncertainty of the position, or null
 * @param address street address or route note, or null
 * @param state whether it is there
 * @param sharedRisk codes of risks it shares with other plant
 * @param note free text, or null
 */
public record Structure(
        int id,
        String code,
        StructureKind type,
        Position position,
        @Nullable Length accuracy,
        @Nullable String address,
        PlantState state,
        List<String> sharedRisk,
        @Nullable String note)
        implements Recorded {

    /** Keeps its own copy of the list. */
    public Structure {
        sharedRisk = List.copyOf(sharedRisk);
    }

    @Override
    public RecordKind kind() {
        return RecordKind.STRUCTURE;
    }
}
