package spanwright.plant;

import org.jspecify.annotations.Nullable;
import spanwright.journal.RecordKind;
import spanwright.journal.Recorded;
import spanwright.quantity.Length;

/**
 * What holds joints at a structure.
 *
 * @param id lasting identity
 * @param code unique
 * @param structure identity of the structure
 * @param type what it is
 * @param trayGlass glass between the sheath and a joint, on each side of it, 0 or above
 * @param state whether it is there
 * @param note free text, or null
 */
public record Enclosure(
        int id,
        String code,
        int structure,
        EnclosureKind type,
        Length trayGlass,
        PlantState state,
        @Nullable String note)
        implements Recorded {

    @Override
    public RecordKind kind() {
        return RecordKind.ENCLOSURE;
    }
}
