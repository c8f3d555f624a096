package sallowmere.land;

import java.util.ArrayList;
import java.util.List;
import java.util.Random;
import sallowmere.geo.Curve;
import sallowmere.geo.Point;

/** The ground under the plant: a river with its width, a lake, and the edges of the map. */
public final class Landscape {
    /** West edge of the map in metres from the false origin. */
    public static final double WEST = -15_000;

    /** East edge. */
    public static final double EAST = 15_000;

    /** South edge. */
    public static final double SOUTH = -10_000;

    /** North edge. */
    public static final double NORTH = 10_000;

    private final Curve river;
    private final List<Point> lake;

    private Landscape(Curve river, List<Point> lake) {
        this.river = river;
        this.lake = List.copyOf(lake);
    }

    /** Lays the river across a bridge, square to the road there, and the lake in the north-west. */
    public static Landscape around(Point bridge, Point road, Random random) {
        Point across = road.left();
        Point west = bridge.plus(across.times(across.x() < 0 ? 500 : -500));
        Point east = bridge.plus(across.times(across.x() < 0 ? -500 : 500));
        Curve river = Curve.through(List.of(
                new Point(WEST, -6_900),
                new Point(-12_300, -7_500),
                new Point(-9_800, -6_400),
                new Point(-7_200, -5_700),
                new Point(-5_000, -6_100),
                new Point(-2_600, -5_900),
                west,
                bridge,
                east,
                new Point(3_600, -5_650),
                new Point(6_100, -6_900),
                new Point(9_200, -6_300),
                new Point(12_000, -5_200),
                new Point(EAST, -5_600)));
        return new Landscape(river, blob(new Point(-11_400, 5_600), 1_900, 1_050, 0.4, random));
    }

    /** A rounded shape about a centre: its two radii in metres and the turn of the longer one in radians. */
    public static List<Point> blob(Point centre, double major, double minor, double turn, Random random) {
        int corners = 14;
        List<Point> points = new ArrayList<>();
        for (int i = 0; i < corners; i++) {
            double angle = 2 * Math.PI * i / corners;
            double swell = 0.82 + 0.36 * random.nextDouble();
            double x = major * swell * StrictMath.cos(angle);
            double y = minor * swell * StrictMath.sin(angle);
            double cosine = StrictMath.cos(turn);
            double sine = StrictMath.sin(turn);
            points.add(centre.plus(new Point(x * cosine - y * sine, x * sine + y * cosine)));
        }
        return smoothed(points);
    }

    /** A closed line through the corners, which wrap around so that no corner shows where it closes. */
    private static List<Point> smoothed(List<Point> corners) {
        List<Point> around = new ArrayList<>(corners.subList(corners.size() - 2, corners.size()));
        around.addAll(corners);
        around.addAll(corners.subList(0, 3));
        List<Point> points = new ArrayList<>();
        for (int i = 2; i < corners.size() + 2; i++) {
            points.addAll(Curve.piece(around.subList(i - 1, i + 3), 4));
        }
        points.add(points.get(0));
        return points;
    }

    /** The middle of the river, from west to east. */
    public Curve river() {
        return river;
    }

    /** Metres from bank to bank at an arc length of the river; a little wider downstream. */
    public double riverWidth(double arc) {
        return 90 + 50 * arc / river.length() + 14 * StrictMath.sin(arc / 900);
    }

    /** The shore of the lake, closed. */
    public List<Point> lake() {
        return lake;
    }

    /** Whether a place is dry: so many metres clear of the water. */
    public boolean dry(Point place, double clear) {
        return river.distance(place) > clear + 75 && !inside(lake, place);
    }

    /** Whether two places lie on the same bank of the river. */
    public boolean sameBank(Point one, Point other) {
        return northOfRiver(one) == northOfRiver(other);
    }

    private boolean northOfRiver(Point place) {
        Point nearest = river.at(0);
        for (Point point : river.points()) {
            nearest = Math.abs(point.x() - place.x()) < Math.abs(nearest.x() - place.x()) ? point : nearest;
        }
        return place.y() > nearest.y();
    }

    /** Whether a place lies inside a closed shape. */
    public static boolean inside(List<Point> ring, Point place) {
        boolean inside = false;
        for (int i = 1; i < ring.size(); i++) {
            Point a = ring.get(i - 1);
            Point b = ring.get(i);
            boolean straddles = a.y() > place.y() != b.y() > place.y();
            if (straddles && place.x() < a.x() + (place.y() - a.y()) / (b.y() - a.y()) * (b.x() - a.x())) {
                inside = !inside;
            }
        }
        return inside;
    }
}
