package spanwright.plant;

import org.jspecify.annotations.Nullable;
import spanwright.journal.RecordKind;
import spanwright.journal.Recorded;
import spanwright.quantity.Loss;
import spanwright.quantity.Wavelength;

/**
 * A value of one reel from its own sheet; goes before its type's.
 *
 * @param id lasting identity
 * @param cable identity of the cable
 * @param wavelength where it holds
 * @param groupIndex group index, or null
 * @param lossPerKm loss a kilometre, or null
 * @param source where the value comes from, or null
 */
public record CableValue(
        int id,
        int cable,
        Wavelength wavelength,
        @Nullable Double groupIndex,
        @Nullable Loss lossPerKm,
        @Nullable String source)
        implements Recorded {

    @Override
    public RecordKind kind() {
        return RecordKind.CABLE_VALUE;
    }
}
