package sallowmere.town;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Random;
import sallowmere.folder.Figures;
import sallowmere.geo.Curve;
import sallowmere.geo.Point;
import sallowmere.plant.Cable;
import sallowmere.plant.CableType;
import sallowmere.plant.Marking;
import sallowmere.plant.Plant;
import sallowmere.plant.Span;
import sallowmere.plant.Structure;
import sallowmere.ring.Trunk;

/** Lays the distribution cables of one district along trails: A and B on poles, C in duct. */
final class TrailCable {
    // Poles stand on one side of the street, handholes on the other.
    private static final Point POLE_SIDE = new Point(5, 4);
    private static final Point HANDHOLE_SIDE = new Point(-5, -4);
    private static final double BEND_WORTH_DRAWING = 1.5;

    private final Plant plant;
    private final String number;
    private final String town;
    private final Structure cabinet;
    private final Streets streets;
    private final Map<String, Structure> placed = new HashMap<>();
    private int poles;
    private int handholes;

    TrailCable(Plant plant, String number, String town, Structure cabinet, Streets streets) {
        this.plant = plant;
        this.number = number;
        this.town = town;
        this.cabinet = cabinet;
        this.streets = streets;
    }

    /** Lays a cable along a trail until it has about some metres of route. */
    Cable lay(char letter, Trail trail, double metres, Random random) {
        boolean aerial = letter != 'C';
        Marking marking = new Marking("white", aerial ? "ft" : "m", 40 + random.nextInt(4_000), random.nextInt(4) > 0);
        Marking numbered = marking.rising() ? marking : new Marking("white", marking.unit(), 18_000, false);
        Cable cable = plant.cable(new Cable(
                "DST-" + number + letter,
                aerial ? CableType.DISTRIBUTION : CableType.DISTRIBUTION_SMALL,
                "",
                null,
                Figures.code("201", 4 + random.nextInt(5), 1)
                        + Figures.code("-", 4 + random.nextInt(6), 2)
                        + Figures.code("-", 1 + random.nextInt(28), 2),
                numbered,
                cabinet,
                aerial ? 0 : 5));
        List<Structure> stops = new ArrayList<>(List.of(cabinet));
        int node = trail.start();
        for (Block block : trail.blocks()) {
            node = walk(block, node, aerial, cable, stops, metres);
            if (done(cable, metres, aerial)) {
                break;
            }
        }
        return cable;
    }

    private static boolean done(Cable cable, double metres, boolean aerial) {
        return cable.last().route() > metres - (aerial ? 22 : 70);
    }

    private int walk(Block block, int node, boolean aerial, Cable cable, List<Structure> stops, double metres) {
        Curve way = block.walkedFrom(node);
        int other = block.other(node);
        int count = Math.max(1, (int) Math.round(way.length() / (aerial ? 44.9 : 133)));
        for (int i = 1; i <= count && !done(cable, metres, aerial); i++) {
            String key = i == count
                    ? "node " + other
                    : "block " + block.number() + " " + (node == block.from() ? i : count - i) + "/" + count;
            Structure next = structure(key, way.at(way.length() * i / count), block, aerial);
            Structure last = stops.get(stops.size() - 1);
            List<Point> bends = aerial ? List.of() : bends(way, i - 1, i, count);
            Span span = plant.span(last, next, aerial ? "aerial" : "duct", bends, "");
            double sheath = span.length() * (aerial ? 1.011 : 1.004) + (stops.size() == 1 ? 7 : aerial ? 0 : 0.6);
            cable.go(span, sheath, coil(stops.size(), aerial));
            stops.add(next);
        }
        return other;
    }

    private static double coil(int row, boolean aerial) {
        return row % (aerial ? 9 : 4) != 0 ? 0 : aerial ? Trunk.AERIAL_COIL : Trunk.COIL;
    }

    private Structure structure(String key, Point at, Block block, boolean aerial) {
        String address = streets.nameOf(block) + ", " + town;
        return placed.computeIfAbsent((aerial ? "pole " : "handhole ") + key, made -> {
            String code = aerial
                    ? Figures.code("P-" + number + "-", ++poles, 3)
                    : Figures.code("HH-" + number + "-", ++handholes, 3);
            Point side = at.plus(aerial ? POLE_SIDE : HANDHOLE_SIDE);
            return plant.structure(new Structure(code, aerial ? "pole" : "handhole", side, address, "", ""));
        });
    }

    /** The corners of a piece of street on the handholes' side, none where it runs nearly straight. */
    private static List<Point> bends(Curve way, int from, int to, int count) {
        double start = way.length() * from / count;
        double end = way.length() * to / count;
        Point middle = way.at((start + end) / 2);
        if (middle.to(way.at(start).toward(way.at(end), 0.5)) < BEND_WORTH_DRAWING) {
            return List.of();
        }
        List<Point> bends = new ArrayList<>();
        for (int i = 1; i < 4; i++) {
            bends.add(way.at(start + (end - start) * i / 4).plus(HANDHOLE_SIDE));
        }
        return bends;
    }
}
