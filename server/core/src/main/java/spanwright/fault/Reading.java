package spanwright.fault;

import java.util.List;
import org.jspecify.annotations.Nullable;
import spanwright.quantity.Length;
import spanwright.quantity.Wavelength;

/**
 * A distance read on an OTDR.
 *
 * @param distance as the instrument shows it, launch fiber included
 * @param launch length of the launch fiber, 0 where there is none
 * @param index the group index set on the instrument, or null: the distance is meters of glass as they are
 * @param wavelength the wavelength of the shot
 * @param events joints known on the same trace
 */
public record Reading(
        Length distance, Length launch, @Nullable Double index, Wavelength wavelength, List<KnownEvent> events) {

    /** Keeps its own copy; refuses lengths below nothing and an index of nothing. */
    public Reading {
        events = List.copyOf(events);
        if (distance.micrometres() < 0 || launch.micrometres() < 0) {
            throw new IllegalArgumentException("a reading begins at 0: " + distance + ", launch " + launch);
        }
        if (index != null && !(index > 0)) {
            throw new IllegalArgumentException("not a group index: " + index);
        }
    }
}
