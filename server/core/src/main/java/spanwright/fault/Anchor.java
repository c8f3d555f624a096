package spanwright.fault;

import org.jspecify.annotations.Nullable;
import spanwright.plant.Enclosure;

/**
 * A point of a path whose reading is known: the port, or an event.
 *
 * @param part index of the part that begins there; the count of parts at the path's end
 * @param optical the optical length read to it, launch fiber included
 * @param enclosure where the event is, or null for where the shot begins
 */
record Anchor(int part, double optical, @Nullable Enclosure enclosure) {

    boolean event() {
        return enclosure != null;
    }
}
