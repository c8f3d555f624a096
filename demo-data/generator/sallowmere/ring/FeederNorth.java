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

/** FDR-N: four manholes out of Sallowmere, poles for 12.6 km, six handholes into Bracken Forks: 14.2 km. */
final class FeederNorth {
    private static final int POLES = 280;
    private static final int HANDHOLES = 6;
    private static final double TOTAL = 14_200;

    private FeederNorth() {}

    static Trunk build(Plant plant, Structure headend, Structure vault) {
        Curve road = Curve.through(List.of(
                vault.at(),
                new Point(-7_250, 2_000),
                new Point(-5_200, 3_300),
                new Point(-2_900, 4_000),
                new Point(-900, 5_350),
                new Point(1_500, 6_000),
                new Point(3_400, 6_750),
                new Point(5_000, 7_300)));
        List<Leg> legs = new ArrayList<>();
        Structure last = vault;
        Span entrance = plant.span(headend, vault, "duct");
        legs.add(new Leg(vault, entrance, entrance.length() + 13, 0));
        double arc = 0;
        double handholes = (TOTAL - 85 - 600 - POLES * 45.0) / (HANDHOLES + 1);
        for (int i = 1; i <= 4 + POLES + HANDHOLES + 1; i++) {
            boolean aerial = i > 4 && i <= 4 + POLES;
            double chord = i <= 4 ? 150 : aerial ? 45 : handholes;
            arc = road.walk(arc, chord);
            Structure next = plant.structure(structure(i, road.at(arc)));
            Span span = plant.span(last, next, aerial ? "aerial" : "duct");
            double sheath = aerial ? span.length() * 1.011 : span.length() + 0.9;
            legs.add(new Leg(next, span, sheath, coil(i)));
            last = next;
        }
        return Trunk.lay(plant, "FDR-N", road, headend, legs, reels());
    }

    private static Structure structure(int i, Point at) {
        if (i <= 4) {
            return new Structure("MH-" + (i + 3), "manhole", at, "Thessle Road", "", "");
        }
        if (i <= 4 + POLES) {
            return new Structure(Figures.code("P-N", i - 4, 3), "pole", at, "Thessle Road", "", "");
        }
        if (i <= 4 + POLES + HANDHOLES) {
            return new Structure(Figures.code("HH-N", i - 4 - POLES, 3), "handhole", at, "Thessle Road", "", "");
        }
        return new Structure("HUT-N", "hut", at, "17 Sawpit Lane, Bracken Forks", "", "");
    }

    /** A storage loop every ninth pole (0.4 km), a coil at every fourth handhole. */
    private static double coil(int i) {
        int pole = i - 4;
        if (pole >= 1 && pole <= POLES) {
            return pole % 9 == 0 ? Trunk.AERIAL_COIL : 0;
        }
        return pole - POLES == 4 ? Trunk.COIL : 0;
    }

    private static List<Reel> reels() {
        return List.of(
                new Reel(CableType.FEEDER, null, "2009-05-18", new Marking("white", "m", 4, true), "P-N080"),
                new Reel(CableType.FEEDER, 0.9, "2009-06-09", new Marking("white", "ft", 1_206, true), "P-N194"),
                new Reel(CableType.FEEDER, 1.1, "2009-06-30", new Marking("yellow", "ft", 3_310, true), "HUT-N"));
    }
}
