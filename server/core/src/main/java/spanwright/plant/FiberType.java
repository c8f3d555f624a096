package spanwright.plant;

import java.util.List;
import org.jspecify.annotations.Nullable;
import spanwright.journal.RecordKind;
import spanwright.journal.Recorded;

/**
 * A type of fiber with its values by wavelength.
 *
 * @param id lasting identity
 * @param code unique
 * @param values one a wavelength, rising
 * @param zeroDispersionNm zero-dispersion wavelength in nm, or null
 * @param dispersionSlope slope there in ps/(nm2 km), or null
 * @param pmdPsPerSqrtKm PMD coefficient in ps/sqrt(km), or null
 */
public record FiberType(
        int id,
        String code,
        List<FiberValues> values,
        @Nullable Double zeroDispersionNm,
        @Nullable Double dispersionSlope,
        @Nullable Double pmdPsPerSqrtKm)
        implements Recorded {

    /** Keeps its own copy of the list. */
    public FiberType {
        values = List.copyOf(values);
    }

    @Override
    public RecordKind kind() {
        return RecordKind.FIBER_TYPE;
    }
}
