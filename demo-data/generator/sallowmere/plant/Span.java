package sallowmere.plant;

import java.util.List;
import sallowmere.geo.Frame;
import sallowmere.geo.Point;

/**
 * A stretch of route between two structures.
 *
 * @param code its code
 * @param from the structure where its line begins
 * @param to the structure where its line ends
 * @param placement aerial, duct, buried or indoor
 * @param bends the corners of its line between the two structures; empty for a straight one
 * @param risk codes of shared risks, may be blank
 */
public record Span(String code, Structure from, Structure to, String placement, List<Point> bends, String risk) {

    /** Keeps its own copy of the corners. */
    public Span {
        bends = List.copyOf(bends);
    }

    /** Metres on the ellipsoid along the line. */
    public double length() {
        double length = 0;
        Point last = from.at();
        for (Point bend : bends) {
            length += Frame.distance(last, bend);
            last = bend;
        }
        return length + Frame.distance(last, to.at());
    }
}
