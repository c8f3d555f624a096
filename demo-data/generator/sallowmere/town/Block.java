package sallowmere.town;

import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import sallowmere.geo.Curve;
import sallowmere.geo.Point;

/**
 * A street between two crossings.
 *
 * @param number its number in its network
 * @param from one crossing
 * @param to the other
 * @param curve its middle from the one to the other
 */
record Block(int number, int from, int to, Curve curve) {

    int other(int node) {
        return node == from ? to : from;
    }

    /** The middle of the street as it is walked from a crossing. */
    Curve walkedFrom(int node) {
        if (node == from) {
            return curve;
        }
        List<Point> turned = new ArrayList<>(curve.points());
        Collections.reverse(turned);
        return Curve.straight(turned);
    }
}
