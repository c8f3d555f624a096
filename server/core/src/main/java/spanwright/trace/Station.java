package spanwright.trace;

import java.util.Optional;
import org.jspecify.annotations.Nullable;
import spanwright.plant.Enclosure;
import spanwright.plant.Structure;
import spanwright.quantity.Length;

/**
 * A structure that a path passes.
 *
 * @param structure the structure
 * @param entered the enclosure that the glass enters there, or null where it only passes
 * @param at where along the path it is: the middle of the coil where there is one
 * @param coil sheath coiled there
 */
public record Station(Structure structure, @Nullable Enclosure entered, TrackPoint at, Length coil) {

    /** The enclosure that the glass enters there, if any. */
    public Optional<Enclosure> enclosure() {
        return Optional.ofNullable(entered);
    }
}
