package spanwright.plant;

import org.jspecify.annotations.Nullable;
import org.locationtech.jts.geom.Geometry;
import spanwright.journal.RecordKind;
import spanwright.journal.Recorded;

/**
 * A feature of the base map, drawn under the plant.
 *
 * @param id lasting identity
 * @param layer water, wood, street, building or place
 * @param name its name, or null
 * @param geometry in lon lat, WGS 84; not to be changed
 */
public record BaseFeature(int id, String layer, @Nullable String name, Geometry geometry) implements Recorded {

    @Override
    public RecordKind kind() {
        return RecordKind.BASE_FEATURE;
    }
}
