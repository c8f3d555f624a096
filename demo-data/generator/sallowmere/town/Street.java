package sallowmere.town;

import java.util.List;
import sallowmere.geo.Point;

/**
 * A named street.
 *
 * @param name its name
 * @param line its middle, from end to end
 */
public record Street(String name, List<Point> line) {

    /** Keeps its own copy of the line. */
    public Street {
        line = List.copyOf(line);
    }
}
