package sallowmere.geo;

import java.util.ArrayList;
import java.util.List;

/** A smooth line on the plane, measured by arc length from its start. */
public final class Curve {
    private static final int STEPS = 40;

    private final List<Point> points;
    private final double[] arcs;

    private Curve(List<Point> points) {
        if (points.size() < 2) {
            throw new IllegalStateException("a curve has two points at least, not " + points.size());
        }
        this.points = List.copyOf(points);
        arcs = new double[points.size()];
        for (int i = 1; i < arcs.length; i++) {
            arcs[i] = arcs[i - 1] + points.get(i - 1).to(points.get(i));
        }
    }

    /** The smooth curve (Catmull-Rom) through some places, two at least. */
    public static Curve through(List<Point> places) {
        List<Point> points = new ArrayList<>();
        for (int i = 0; i + 1 < places.size(); i++) {
            Point before = i == 0 ? mirrored(places.get(1), places.get(0)) : places.get(i - 1);
            Point from = places.get(i);
            Point to = places.get(i + 1);
            Point after = i + 2 == places.size() ? mirrored(from, to) : places.get(i + 2);
            points.addAll(piece(List.of(before, from, to, after), STEPS));
        }
        points.add(places.get(places.size() - 1));
        return new Curve(points);
    }

    /** The line through the places, corners kept. */
    public static Curve straight(List<Point> places) {
        return new Curve(places);
    }

    /** Some places on the smooth curve from the second of four places up to, not including, the third. */
    public static List<Point> piece(List<Point> four, int count) {
        List<Point> points = new ArrayList<>();
        for (int step = 0; step < count; step++) {
            points.add(blend(four.get(0), four.get(1), four.get(2), four.get(3), step / (double) count));
        }
        return points;
    }

    private static Point mirrored(Point far, Point about) {
        return about.plus(about.minus(far));
    }

    private static Point blend(Point a, Point b, Point c, Point d, double t) {
        Point linear = c.minus(a).times(t);
        Point square = a.times(2).minus(b.times(5)).plus(c.times(4)).minus(d).times(t * t);
        Point cube = b.times(3).minus(a).minus(c.times(3)).plus(d).times(t * t * t);
        return b.times(2).plus(linear).plus(square).plus(cube).times(0.5);
    }

    /** Metres from start to end along the line. */
    public double length() {
        return arcs[arcs.length - 1];
    }

    /** All corners of the line. */
    public List<Point> points() {
        return points;
    }

    /** The place at an arc length; short of the start or beyond the end it is the end's. */
    public Point at(double arc) {
        if (arc <= 0) {
            return points.get(0);
        }
        int i = 1;
        while (i < arcs.length - 1 && arcs[i] < arc) {
            i++;
        }
        double fraction = (arc - arcs[i - 1]) / (arcs[i] - arcs[i - 1]);
        return points.get(i - 1).toward(points.get(i), Math.min(1, fraction));
    }

    /** The direction, at length one, in which the line goes at an arc length. */
    public Point heading(double arc) {
        double around = Math.min(length() - 1, Math.max(1, arc));
        return at(around + 1).minus(at(around - 1)).unit();
    }

    /** The arc length at which the straight distance on the ellipsoid from the place at an arc length is a chord. */
    public double walk(double arc, double chord) {
        double near = arc;
        double far = Math.min(length(), arc + chord * 1.5);
        if (Frame.distance(at(arc), at(far)) < chord) {
            throw new IllegalStateException("the curve ends " + (length() - arc) + " m on, short of " + chord + " m");
        }
        for (int i = 0; i < 60; i++) {
            double middle = (near + far) / 2;
            if (Frame.distance(at(arc), at(middle)) < chord) {
                near = middle;
            } else {
                far = middle;
            }
        }
        return far;
    }

    /** Metres from a place to the nearest corner of the line. */
    public double distance(Point place) {
        double least = Double.MAX_VALUE;
        for (Point point : points) {
            least = Math.min(least, point.to(place));
        }
        return least;
    }
}
