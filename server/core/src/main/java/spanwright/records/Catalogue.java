package spanwright.records;

import java.util.Optional;
import spanwright.plant.BuiltInColors;
import spanwright.plant.BuiltInFiberTypes;
import spanwright.plant.FiberColors;
import spanwright.plant.FiberType;

/**
 * Fiber types and colour orders by code: the recorded one, which replaces the built-in one of that name whole, else
 * the built-in one.
 */
public final class Catalogue {

    private final RecordsView records;

    /** The catalogue of these records. */
    public Catalogue(RecordsView records) {
        this.records = records;
    }

    /** The fiber type with a code, if there is one; a built-in one has identity 0. */
    public Optional<FiberType> findFiberType(String code) {
        return records.fiberTypes().find(code).or(() -> BuiltInFiberTypes.find(code));
    }

    /** The colour order with a code, if there is one. */
    public Optional<FiberColors> findColors(String code) {
        return records.colorCodes().find(code).map(FiberColors::of).or(() -> BuiltInColors.find(code));
    }
}
