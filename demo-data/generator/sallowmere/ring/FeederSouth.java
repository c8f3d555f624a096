package sallowmere.ring;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Map;
import sallowmere.folder.Figures;
import sallowmere.geo.Curve;
import sallowmere.geo.Point;
import sallowmere.plant.CableType;
import sallowmere.plant.Marking;
import sallowmere.plant.Plant;
import sallowmere.plant.PlantTables;
import sallowmere.plant.Span;
import sallowmere.plant.Structure;

/**
 * FDR-S: duct all the way, 11.9 km, 77 handholes, the Wendlecote Bridge near its end.
 *
 * <p>From HH-S037 to HH-S049 its sheath is laid foot by foot as the story of the backhoe tells it.
 */
final class FeederSouth {
    private static final double FOOT = Marking.FOOT;

    // Feet of sheath from handhole 37 on, as the marks of the second reel give them.
    private static final Map<Integer, Integer> STORY_FEET = Map.ofEntries(
            Map.entry(38, 586),
            Map.entry(39, 586),
            Map.entry(40, 586),
            Map.entry(41, 586),
            Map.entry(42, 585),
            Map.entry(43, 586),
            Map.entry(44, 585),
            Map.entry(45, 510),
            Map.entry(46, 481),
            Map.entry(47, 481),
            Map.entry(48, 480),
            Map.entry(49, 481));

    // Sheath of the first reel from the headend to the butt closure C-S03: 19,507.3 ft.
    private static final double FIRST_REEL = 19_507.3 * FOOT;
    // Route from the headend to HH-S044, so that a reading laid along the map alone lands 1,740 ft too far.
    private static final double ROUTE_TO_44 = 6_840.7;
    private static final double ROUTE_TO_72 = 10_900;

    private FeederSouth() {}

    static Trunk build(Plant plant, Structure headend, Structure vault) {
        Curve road = road(vault.at());
        List<Structure> stops = new ArrayList<>(List.of(headend, vault));
        double arc = 0;
        double route = 85;
        for (String code : codes()) {
            double chord = chord(code, route);
            arc = road.walk(arc, chord);
            route += chord;
            stops.add(plant.structure(structure(code, road.at(arc))));
        }
        List<Span> spans = new ArrayList<>();
        for (int i = 1; i < stops.size(); i++) {
            spans.add(span(plant, stops.get(i - 1), stops.get(i)));
        }
        List<Reel> reels = List.of(
                new Reel(CableType.FEEDER, 1.5, "2011-08-22", new Marking("white", "ft", 15.7, true), "HH-S037"),
                new Reel(CableType.FEEDER, 1.5, "2011-09-12", new Marking("white", "ft", 24_220, false), "HUT-S"));
        Trunk trunk = Trunk.lay(plant, "FDR-S", road, headend, legs(stops, spans), reels);
        trunk.reels().forEach(reel -> {
            for (int seq = 0; seq < reel.rows().size(); seq++) {
                reel.readAt(seq);
            }
        });
        return trunk;
    }

    private static Curve road(Point start) {
        return Curve.through(List.of(
                start,
                new Point(-7_650, -1_250),
                new Point(-6_100, -2_500),
                new Point(-4_000, -2_950),
                new Point(-1_700, -3_150),
                new Point(-450, -3_600),
                new Point(380, -4_500),
                new Point(560, -5_500),
                new Point(640, -6_600)));
    }

    /** The structures beyond the vault in order. */
    private static List<String> codes() {
        List<String> codes = new ArrayList<>(List.of("MH-1", "MH-2", "MH-3"));
        for (int i = 1; i <= 74; i++) {
            codes.add(Figures.code("HH-S", i, 3));
        }
        codes.addAll(Arrays.asList("MH-8", "BR-1", "MH-9", "HH-S075", "HH-S076", "HH-S077", "HUT-S"));
        return codes;
    }

    private static Structure structure(String code, Point at) {
        return switch (code) {
            case "BR-1" ->
                new Structure(code, "point", at, "Wendlecote Bridge", Ring.BRIDGE_RISK, "duct under the deck");
            case "MH-8", "MH-9" ->
                new Structure(code, "manhole", at, "Wendlecote Bridge", Ring.BRIDGE_RISK, "bridge abutment");
            case "HUT-S" -> new Structure(code, "hut", at, "4 Ferry Road, Pinnock Ferry", "", "");
            default -> new Structure(code, code.startsWith("MH") ? "manhole" : "handhole", at, "Valley Road", "", "");
        };
    }

    private static Span span(Plant plant, Structure from, Structure to) {
        boolean bridge = from.code().equals("BR-1") || to.code().equals("BR-1");
        return plant.span(from, to, "duct", List.of(), bridge ? Ring.BRIDGE_RISK : "");
    }

    /** Metres from the structure before to one, with so much route behind. */
    private static double chord(String code, double route) {
        if (!code.startsWith("HH-S")) {
            return switch (code) {
                case "MH-1" -> 150;
                case "MH-2" -> 160;
                case "MH-3" -> 155;
                case "MH-8" -> 115;
                default -> 105;
            };
        }
        int number = number(code);
        Integer feet = STORY_FEET.get(number);
        if (feet != null) {
            return (number == 45 ? 503 : feet - 3) * FOOT;
        }
        if (number == 1) {
            return 150;
        }
        if (number <= 37) {
            return share(ROUTE_TO_44 - (4_100 - 21) * FOOT - route, 37 - number + 1, number);
        }
        return number <= 72 ? share(ROUTE_TO_72 - route, 72 - number + 1, number) : number == 77 ? 110 : 115;
    }

    /** An even share of what is left, a little more or less from one handhole to the next. */
    private static double share(double left, int parts, int number) {
        double even = left / parts;
        return parts == 1 ? even : even * (1 + 0.06 * StrictMath.sin(number * 2.4));
    }

    private static int number(String code) {
        return Integer.parseInt(code.substring("HH-S".length()));
    }

    private static List<Leg> legs(List<Structure> stops, List<Span> spans) {
        double route = 0;
        double coils = Trunk.COIL * 10;
        int upTo37 = 0;
        while (!stops.get(upTo37).code().equals("HH-S037")) {
            route += spans.get(upTo37).length();
            upTo37++;
        }
        double riser = 13;
        double racking = (FIRST_REEL - coils - route - riser) / upTo37;
        List<Leg> legs = new ArrayList<>();
        for (int i = 0; i < spans.size(); i++) {
            Structure to = stops.get(i + 1);
            double extra = i < upTo37 ? racking + (i == 0 ? riser : 0) : 0.9;
            legs.add(new Leg(to, spans.get(i), sheath(to.code(), spans.get(i).length() + extra), coil(to.code())));
        }
        return legs;
    }

    private static double sheath(String code, double usual) {
        Integer feet = code.startsWith("HH-S") ? STORY_FEET.get(number(code)) : null;
        return feet == null ? usual : feet * FOOT;
    }

    private static double coil(String code) {
        boolean gone = code.equals(PlantTables.GONE_COIL);
        return code.startsWith("HH-S") && number(code) % 4 == 0 && !gone ? Trunk.COIL : 0;
    }
}
