package spanwright.fault;

import spanwright.plant.Enclosure;
import spanwright.quantity.Length;

/**
 * A joint that stands on the same trace as the reading.
 *
 * @param enclosure where the joint is
 * @param reading the distance read to it, launch fiber included
 */
public record KnownEvent(Enclosure enclosure, Length reading) {}
