package spanwright.plant;

import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import net.sf.geographiclib.Geodesic;
import net.sf.geographiclib.GeodesicData;
import net.sf.geographiclib.GeodesicMask;

/**
 * A line on the map measured along geodesics of the WGS 84 ellipsoid (C. F. F. Karney, Algorithms for geodesics,
 * J. Geodesy 87, 2013, through GeographicLib). Immutable.
 */
public final class RouteLine {

    private final List<Position> positions;
    private final double[] metresTo;

    private RouteLine(List<Position> positions) {
        this.positions = List.copyOf(positions);
        this.metresTo = new double[positions.size()];
        for (int bend = 1; bend < metresTo.length; bend++) {
            metresTo[bend] = metresTo[bend - 1] + metres(positions.get(bend - 1), positions.get(bend));
        }
    }

    /** Along these positions, two at least, in order; two neighbours may be at one place. */
    public static RouteLine along(List<Position> positions) {
        if (positions.size() < 2) {
            throw new IllegalArgumentException("a line needs two positions, not " + positions.size());
        }
        return new RouteLine(positions);
    }

    /** The geodesic length between two places in metres, on WGS 84. */
    public static double metres(Position from, Position to) {
        return Geodesic.WGS84.Inverse(from.lat(), from.lon(), to.lat(), to.lon(), GeodesicMask.DISTANCE).s12;
    }

    /** Its bends in order, both ends included. */
    public List<Position> positions() {
        return positions;
    }

    /** Its whole length in metres; 0 where it lies at one place. */
    public double metres() {
        return metresTo[metresTo.length - 1];
    }

    /** The share of its length, from 0 to 1, at which a bend lies; on a line without length bends share evenly. */
    public double fractionOf(int bend) {
        return metres() > 0 ? metresTo[bend] / metres() : (double) bend / (metresTo.length - 1);
    }

    /**
     * The place at a share of its length.
     *
     * @param fraction from 0 to 1; beyond, the nearer end
     */
    public Position at(double fraction) {
        double wanted = Math.max(0, Math.min(1, fraction)) * metres();
        int bend = 1;
        while (bend < metresTo.length - 1 && metresTo[bend] < wanted) {
            bend++;
        }
        return between(positions.get(bend - 1), positions.get(bend), wanted - metresTo[bend - 1]);
    }

    private Position between(Position from, Position to, double metres) {
        GeodesicData inverse = Geodesic.WGS84.Inverse(
                from.lat(), from.lon(), to.lat(), to.lon(), GeodesicMask.DISTANCE | GeodesicMask.AZIMUTH);
        if (metres <= 0) {
            return from;
        }
        if (metres >= inverse.s12) {
            return to;
        }
        GeodesicData place = Geodesic.WGS84.Direct(from.lat(), from.lon(), inverse.azi1, metres);
        return new Position(place.lon2, place.lat2);
    }

    /** The same line the other way round. */
    public RouteLine reversed() {
        List<Position> turned = new ArrayList<>(positions);
        Collections.reverse(turned);
        return new RouteLine(turned);
    }
}
