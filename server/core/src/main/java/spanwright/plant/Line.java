package spanwright.plant;

import java.util.List;

/**
 * A line on the map, of two positions or more.
 *
 * @param positions its positions in order
 */
public record Line(List<Position> positions) {

    /** Keeps its own copy; refuses a line of fewer than two positions. */
    public Line {
        positions = List.copyOf(positions);
        if (positions.size() < 2) {
            throw new IllegalArgumentException("a line needs two positions, not " + positions.size());
        }
    }
}
