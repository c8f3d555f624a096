package spanwright.trace;

import spanwright.plant.Position;
import spanwright.quantity.Length;

/**
 * A point of a path's track.
 *
 * @param glass glass from the path's start
 * @param sheath sheath from the path's start
 * @param route route from the path's start, coils apart
 * @param position where it is
 */
public record TrackPoint(Length glass, Length sheath, Length route, Position position) {}
