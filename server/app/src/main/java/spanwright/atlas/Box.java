package spanwright.atlas;

import spanwright.plant.Position;

/**
 * A box on the map, its sides included.
 *
 * @param west degrees
 * @param south degrees
 * @param east degrees, not below west
 * @param north degrees, not below south
 */
public record Box(double west, double south, double east, double north) {

    /** Refuses a box turned inside out. */
    public Box {
        if (!(west <= east) || !(south <= north)) {
            throw new IllegalArgumentException("not a box: " + west + " " + south + " " + east + " " + north);
        }
    }

    /** The box of one position. */
    public static Box at(Position position) {
        return new Box(position.lon(), position.lat(), position.lon(), position.lat());
    }

    /** The least box round both. */
    public Box around(Box other) {
        return new Box(
                Math.min(west, other.west),
                Math.min(south, other.south),
                Math.max(east, other.east),
                Math.max(north, other.north));
    }

    /** Whether both have a point in common. */
    public boolean meets(Box other) {
        return west <= other.east && other.west <= east && south <= other.north && other.south <= north;
    }
}
