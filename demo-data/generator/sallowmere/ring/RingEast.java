package sallowmere.ring;

import java.util.ArrayList;
import java.util.List;
import sallowmere.folder.Figures;
import sallowmere.geo.Curve;
import sallowmere.geo.Point;
import sallowmere.plant.CableType;
import sallowmere.plant.Marking;
import sallowmere.plant.Plant;
import sallowmere.plant.Span;
import sallowmere.plant.Structure;

/** RNG-E: duct, poles, buried, poles, then the duct of the Wendlecote Bridge into Pinnock Ferry: 17.6 km. */
final class RingEast {
    private static final double TOTAL = 17_600;
    private static final double BRIDGE = 210;
    private static final double FIRST_POLES = 6_075;
    private static final double SECOND_POLES = 3_960;
    private static final double BURIED_SPACING = 150;

    // How far the road swings out from the straight line between its ends, before it is fitted to the length wanted.
    private static final List<Point> BENDS = List.of(
            new Point(4_900, 6_300),
            new Point(6_700, 4_900),
            new Point(7_300, 2_600),
            new Point(6_700, 100),
            new Point(5_000, -1_900),
            new Point(2_900, -3_400),
            new Point(1_500, -4_300));

    private final Plant plant;
    private final List<Leg> legs = new ArrayList<>();
    private Structure last;
    private int poles;
    private int handholes;

    private RingEast(Plant plant, Structure start) {
        this.plant = plant;
        this.last = start;
    }

    static Trunk build(Plant plant) {
        Structure start = plant.structureOf("HUT-N");
        Structure end = plant.structureOf("HUT-S");
        Structure near = plant.structureOf("MH-8");
        Structure far = plant.structureOf("MH-9");
        Point across = end.at().minus(far.at());
        Point bulge = far.at().toward(end.at(), 0.5).plus(across.unit().left().times(170));
        Curve tail = Curve.through(List.of(far.at(), bulge, end.at()));
        Curve road = fitted(start.at(), near.at(), TOTAL - BRIDGE - tail.length());
        RingEast ring = new RingEast(plant, start);
        double duct = (road.length() - FIRST_POLES - SECOND_POLES) * 0.16;
        double closing = 300;
        double buried = road.length() - FIRST_POLES - SECOND_POLES - duct - closing;
        double arc = ring.underground(road, 0, duct, "duct", null);
        arc = ring.aerial(road, arc, FIRST_POLES);
        arc = ring.underground(road, arc, buried, "buried", null);
        arc = ring.aerial(road, arc, SECOND_POLES);
        ring.underground(road, arc, road.length() - arc, "duct", near);
        ring.reach(plant.structureOf("BR-1"), "duct", 0);
        ring.reach(far, "duct", 0);
        ring.underground(tail, 0, tail.length(), "duct", end);
        return Trunk.lay(plant, "RNG-E", road, start, ring.legs, ring.reels());
    }

    /** Stretches the bends toward or away from the straight line until the road has the length wanted. */
    private static Curve fitted(Point from, Point to, double wanted) {
        double low = 0.3;
        double high = 1.6;
        for (int i = 0; i < 50; i++) {
            double middle = (low + high) / 2;
            if (bent(from, to, middle).length() < wanted) {
                low = middle;
            } else {
                high = middle;
            }
        }
        return bent(from, to, high);
    }

    private static Curve bent(Point from, Point to, double factor) {
        Point along = to.minus(from).unit();
        List<Point> points = new ArrayList<>(List.of(from));
        for (Point bend : BENDS) {
            Point foot = from.plus(along.times(bend.minus(from).dot(along)));
            points.add(foot.plus(bend.minus(foot).times(factor)));
        }
        points.add(to);
        return Curve.through(points);
    }

    private double aerial(Curve road, double arc, double length) {
        int count = (int) Math.round(length / 45);
        for (int i = 1; i <= count; i++) {
            poles++;
            Point at = road.at(arc + length * i / count);
            Structure pole = plant.structure(Figures.code("P-E", poles, 3), "pole", at, "Eastern Drove");
            reach(pole, "aerial", poles % 9 == 0 ? Trunk.AERIAL_COIL : 0);
        }
        return arc + length;
    }

    /** Handholes along a stretch; it ends at a given structure, or at a handhole where that is null. */
    private double underground(Curve road, double arc, double length, String placement, Structure end) {
        int count = (int) Math.round(length / BURIED_SPACING);
        for (int i = 1; i <= count; i++) {
            if (i == count && end != null) {
                reach(end, placement, 0);
                continue;
            }
            handholes++;
            Point at = road.at(arc + length * i / count);
            Structure handhole = plant.structure(Figures.code("HH-E", handholes, 3), "handhole", at, "Eastern Drove");
            reach(handhole, placement, handholes % 4 == 0 ? Trunk.COIL : 0);
        }
        return arc + length;
    }

    private void reach(Structure next, String placement, double coil) {
        Span span = plant.span(last, next, placement);
        double sheath = placement.equals("aerial") ? span.length() * 1.011 : span.length() + 0.9;
        legs.add(new Leg(next, span, sheath, coil));
        last = next;
    }

    private List<Reel> reels() {
        return List.of(
                new Reel(CableType.RING, null, "2013-04-16", new Marking("white", "m", 2, true), butt(5_900)),
                new Reel(
                        CableType.RING_RIBBON,
                        null,
                        "2013-05-07",
                        new Marking("white", "m", 6_480, false),
                        butt(11_700)),
                new Reel(CableType.RING, 0.8, "2013-05-28", new Marking("white", "ft", 10_115, true), "HUT-S"));
    }

    /** The structure nearest to some metres of route from the start. */
    private String butt(double route) {
        double done = 0;
        for (Leg leg : legs) {
            done += leg.span().length();
            if (done >= route) {
                return leg.to().code();
            }
        }
        throw new IllegalStateException("the ring is shorter than " + route + " m");
    }
}
