package sallowmere.basemap;

import java.util.ArrayList;
import java.util.List;
import java.util.Random;
import sallowmere.geo.Curve;
import sallowmere.geo.Point;
import sallowmere.land.Landscape;
import sallowmere.town.Street;

/** Houses along the streets of a town, thinner toward its edge, none on a street or on another house. */
final class Buildings {
    private static final double STREET_CLEAR = 13;
    private static final double HOUSE_CLEAR = 19;

    private final Landscape land;
    private final Random random;
    private final List<Point> streets = new ArrayList<>();
    private final List<Point> houses = new ArrayList<>();

    Buildings(Landscape land, List<Street> streets, Random random) {
        this.land = land;
        this.random = random;
        for (Street street : streets) {
            Curve curve = Curve.straight(street.line());
            for (double arc = 0; arc < curve.length(); arc += 8) {
                this.streets.add(curve.at(arc));
            }
        }
    }

    /** The houses along one street. */
    List<List<Point>> along(Street street, Point centre) {
        Curve curve = Curve.straight(street.line());
        List<List<Point>> shapes = new ArrayList<>();
        for (double arc = 22; arc < curve.length() - 20; arc += 21 + 16 * random.nextDouble()) {
            for (int side = -1; side <= 1; side += 2) {
                Point heading = curve.heading(arc);
                Point place = curve.at(arc).plus(heading.left().times(side * (17 + 6 * random.nextDouble())));
                double edge = Math.max(0.12, 1.02 - place.to(centre) / 1_050);
                if (random.nextDouble() < edge * 0.62 && clear(place)) {
                    houses.add(place);
                    shapes.add(house(place, heading));
                }
            }
        }
        return shapes;
    }

    private boolean clear(Point place) {
        return streets.stream().allMatch(street -> street.to(place) > STREET_CLEAR)
                && houses.stream().allMatch(house -> house.to(place) > HOUSE_CLEAR)
                && land.dry(place, 30);
    }

    private List<Point> house(Point place, Point heading) {
        double half = 5 + 4 * random.nextDouble();
        double depth = 4 + 2.5 * random.nextDouble();
        return rectangle(place, heading, half, depth);
    }

    /** A rectangle about a place: half its length along a heading, half its depth across. */
    static List<Point> rectangle(Point place, Point heading, double half, double depth) {
        Point along = heading.times(half);
        Point across = heading.left().times(depth);
        Point first = place.plus(along).plus(across);
        return List.of(
                first,
                place.minus(along).plus(across),
                place.minus(along).minus(across),
                place.plus(along).minus(across),
                first);
    }
}
