package sallowmere.town;

import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Random;
import java.util.Set;
import java.util.function.Predicate;
import sallowmere.geo.Curve;
import sallowmere.geo.Point;
import sallowmere.land.Landscape;
import sallowmere.plant.Cable;
import sallowmere.plant.CableType;
import sallowmere.plant.Marking;
import sallowmere.plant.Plant;
import sallowmere.plant.Span;
import sallowmere.plant.Structure;
import sallowmere.ring.Ring;
import sallowmere.ring.Trunk;

/** Grows the twelve districts along the feeders. */
public final class Districts {
    private static final double LATERAL = 580;
    private static final double CENTRE = 980;
    private static final double SHARED = 470;

    private final Plant plant;
    private final Ring ring;
    private final Landscape land;
    private final List<Point> centres = new ArrayList<>();

    private Districts(Plant plant, Ring ring, Landscape land) {
        this.plant = plant;
        this.ring = ring;
        this.land = land;
    }

    /** Grows all districts; each has a random source of its own, drawn from the seed. */
    public static List<District> grow(Plant plant, Ring ring, Landscape land, long seed) {
        Districts districts = new Districts(plant, ring, land);
        for (TownPlan town : TownPlan.all()) {
            districts.centres.add(districts.centre(town));
        }
        List<District> grown = new ArrayList<>();
        for (TownPlan town : TownPlan.all()) {
            grown.add(districts.grow(town, new Random(seed * 31 + town.cabinet())));
        }
        return grown;
    }

    private Trunk trunk(TownPlan town) {
        return town.trunk().equals("FDR-N") ? ring.north() : ring.south();
    }

    private Structure tap(TownPlan town) {
        return town.tap() == null ? trunk(town).at(town.kilometres()) : plant.structureOf(town.tap());
    }

    private Point away(TownPlan town) {
        Curve road = trunk(town).road();
        Point tap = tap(town).at();
        double best = 0;
        for (double arc = 0; arc < road.length(); arc += 20) {
            best = road.at(arc).to(tap) < road.at(best).to(tap) ? arc : best;
        }
        Point square = road.heading(best).left().times(town.side());
        double turn = StrictMath.toRadians(town.turn());
        return square.times(StrictMath.cos(turn)).plus(square.left().times(StrictMath.sin(turn)));
    }

    private Point centre(TownPlan town) {
        return tap(town).at().plus(away(town).times(CENTRE));
    }

    private District grow(TownPlan town, Random random) {
        Point centre = centre(town);
        Point seed = tap(town).at().plus(away(town).times(LATERAL));
        StreetNetwork network = StreetNetwork.grow(
                centre,
                1_150 + 90 * random.nextDouble(),
                930 + 70 * random.nextDouble(),
                Math.PI * random.nextDouble(),
                ground(town),
                List.of(seed),
                random);
        Streets names = Streets.name(network, random);
        int node = 0;
        String number = (town.cabinet() < 10 ? "0" : "") + town.cabinet();
        Structure cabinet = plant.structure(new Structure(
                "CAB-" + number,
                "cabinet",
                network.node(node),
                names.nameOf(network.meetingAt(node).get(0)) + ", " + town.town(),
                "",
                ""));
        Cable lateral = lateral(town, number, cabinet, random);
        List<Trail> trails = trails(town, network, node, random);
        TrailCable layer = new TrailCable(plant, number, town.town(), cabinet, names);
        List<Cable> cables = new ArrayList<>();
        List<TerminalSite> terminals = new ArrayList<>();
        for (int i = 0; i < 3; i++) {
            Cable cable =
                    layer.lay("ABC".charAt(i), trails.get(i), town.lengths().get(i), random);
            cables.add(cable);
            terminals.addAll(Terminals.place(number, cable, terminals.size(), random));
        }
        return new District(town, trunk(town), tap(town), cabinet, centre, lateral, cables, terminals, names.list());
    }

    /** Dry ground, off the feeders' roads, nearer to this town than to any other. */
    private Predicate<Point> ground(TownPlan town) {
        Point centre = centre(town);
        return place -> land.dry(place, 90)
                && land.sameBank(place, centre)
                && ring.south().road().distance(place) > 70
                && ring.north().road().distance(place) > 70
                && ring.east().road().distance(place) > 70
                && centres.stream().allMatch(other -> place.to(centre) <= place.to(other) - 40 || other.equals(centre));
    }

    private static List<Trail> trails(TownPlan town, StreetNetwork network, int node, Random random) {
        for (int tries = 0; tries < 200; tries++) {
            List<Trail> trails = new ArrayList<>();
            Set<Block> taken = new HashSet<>();
            for (int i = 0; i < 3; i++) {
                List<Block> head = i == 1 ? trails.get(0).head(SHARED) : List.of();
                Trail trail = Trail.find(network, node, head, town.lengths().get(i), taken, random);
                trails.add(trail);
                taken.addAll(trail.blocks());
            }
            if (longEnough(trails, town)) {
                return trails;
            }
        }
        throw new IllegalStateException("the streets of " + town.town() + " hold no three trails so long");
    }

    private static boolean longEnough(List<Trail> trails, TownPlan town) {
        for (int i = 0; i < trails.size(); i++) {
            if (trails.get(i).length() < town.lengths().get(i)) {
                return false;
            }
        }
        return true;
    }

    private Cable lateral(TownPlan town, String number, Structure cabinet, Random random) {
        Structure tap = tap(town);
        boolean aerial = town.trunk().equals("FDR-N");
        Point across = cabinet.at().minus(tap.at()).left();
        double bend = (random.nextBoolean() ? 1 : -1) * (0.08 + 0.05 * random.nextDouble());
        Point middle = tap.at().toward(cabinet.at(), 0.45).plus(across.times(bend));
        Curve way = Curve.through(List.of(tap.at(), middle, cabinet.at()));
        int count = (int) Math.round(way.length() / (aerial ? 45 : 148));
        Marking marking = new Marking("white", "ft", 100 + random.nextInt(900), true);
        Cable cable = plant.cable(new Cable(
                "LAT-" + number, CableType.LATERAL, "", null, aerial ? "2010-03-22" : "2012-02-14", marking, tap, 0));
        Structure last = tap;
        for (int i = 1; i <= count; i++) {
            Structure next = i == count
                    ? cabinet
                    : plant.structure(
                            (aerial ? "P-L" : "HH-L") + number + "-" + i,
                            aerial ? "pole" : "handhole",
                            way.at(way.length() * i / count),
                            town.town() + " Lane");
            Span span = plant.span(last, next, aerial && i < count ? "aerial" : "duct");
            cable.go(
                    span,
                    span.length() * (aerial ? 1.011 : 1.003) + (i == count ? 4 : 0.5),
                    i == count ? Trunk.AERIAL_COIL : 0);
            last = next;
        }
        cable.readAt(0);
        cable.readAt(cable.rows().size() - 1);
        return cable;
    }
}
