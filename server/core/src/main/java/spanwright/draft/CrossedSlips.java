package spanwright.draft;

import java.util.LinkedHashMap;
import java.util.Map;
import java.util.NavigableMap;
import java.util.TreeMap;
import java.util.function.Consumer;
import spanwright.plant.FiberRange;
import spanwright.sheet.CableLeg;
import spanwright.sheet.Statement;
import spanwright.splicing.Leg;

/** Fibers and tubes taken for their neighbours, for those of the same colour, turned over, or one off. */
final class CrossedSlips {

    private static final int COLOR_CYCLE = 12;
    private static final int SHORTEST_RUN = 3;

    /** Two legs that fibers join. */
    private record Pair(Leg a, Leg b) {}

    /** Where a number of one leg goes on the other, and which line says so. */
    private record Goes(int to, Statement.Joins said) {}

    private CrossedSlips() {}

    static void find(CheckedSheet sheet, Consumer<Slip> found) {
        Map<Pair, NavigableMap<Integer, Goes>> fibers = new LinkedHashMap<>();
        sheet.cableJoins().forEach(joins -> {
            twelveApart(sheet, joins, found);
            turned(sheet, joins, found);
            oneOff(sheet, joins, found);
            NavigableMap<Integer, Goes> map =
                    fibers.computeIfAbsent(new Pair(joins.a().leg(), joins.b().leg()), pair -> new TreeMap<>());
            for (int index = 0; index < joins.a().count(); index++) {
                map.put(
                        joins.a().numbers().at(index),
                        new Goes(joins.b().numbers().at(index), joins));
            }
        });
        fibers.forEach((pair, map) -> {
            CableLeg a = sheet.legs().find(pair.a).orElseThrow();
            CableLeg b = sheet.legs().find(pair.b).orElseThrow();
            crossing(map, "fibers", a, b, found);
            crossing(tubes(map, a, b), "tubes", a, b, found);
        });
    }

    private static void twelveApart(CheckedSheet sheet, Statement.Joins joins, Consumer<Slip> found) {
        CableLeg a = sheet.leg(joins.a());
        CableLeg b = sheet.leg(joins.b());
        int tubeA = a.type().tubeOf(joins.a().numbers().first());
        int tubeB = b.type().tubeOf(joins.b().numbers().first());
        boolean alike = a.type().fibersPerTube() == b.type().fibersPerTube();
        if (alike && Math.abs(tubeA - tubeB) == COLOR_CYCLE) {
            found.accept(Slip.warning(
                    joins.place(),
                    "tubes-twelve-apart",
                    a.name() + " " + a.tubeName(tubeA) + " joins " + b.name() + " " + b.tubeName(tubeB)
                            + ": the same colour, with and without its tracer.",
                    "Look for the stripe: " + b.tubeName(tubeA) + " is the one of the same number."));
        }
    }

    private static void turned(CheckedSheet sheet, Statement.Joins joins, Consumer<Slip> found) {
        FiberRange a = joins.a().numbers();
        FiberRange b = joins.b().numbers();
        if (a.count() == COLOR_CYCLE && a.step() != b.step()) {
            found.accept(Slip.warning(
                    joins.bPlace(),
                    "ribbon-turned",
                    sheet.names().ends(joins.a()) + " joins " + sheet.names().ends(joins.b())
                            + ": the exact reverse of twelve. Was a ribbon laid upside down?",
                    "If it was entered turned, write " + Math.min(b.first(), b.last()) + "-"
                            + Math.max(b.first(), b.last()) + "."));
        }
    }

    private static void oneOff(CheckedSheet sheet, Statement.Joins joins, Consumer<Slip> found) {
        CableLeg a = sheet.leg(joins.a());
        CableLeg b = sheet.leg(joins.b());
        FiberRange one = joins.a().numbers();
        FiberRange other = joins.b().numbers();
        if (one.step() != other.step()
                || one.count() < SHORTEST_RUN
                || a.type().fibersPerTube() != b.type().fibersPerTube()) {
            return;
        }
        int off = b.type().positionInTube(other.first()) - a.type().positionInTube(one.first());
        if (Math.abs(off) == 1) {
            found.accept(
                    Slip.warning(
                            joins.bPlace(),
                            "one-off",
                            sheet.names().ends(joins.a()) + " joins "
                                    + sheet.names().ends(joins.b())
                                    + ": every fiber goes to the neighbour of its own colour.",
                            "Was one skipped? Count again where the range begins, and say what became of the fiber left over."));
        }
    }

    /** Tubes of which each fiber goes to the same place in one other tube. */
    private static NavigableMap<Integer, Goes> tubes(NavigableMap<Integer, Goes> fibers, CableLeg a, CableLeg b) {
        NavigableMap<Integer, Goes> tubes = new TreeMap<>();
        if (a.type().fibersPerTube() != b.type().fibersPerTube()) {
            return tubes;
        }
        for (int tube = 1; tube <= a.type().tubes(); tube++) {
            FiberRange range = a.fibersOf(tube);
            Goes first = fibers.get(range.first());
            if (first != null && b.type().positionInTube(first.to) == 1 && isWhole(fibers, range, first.to)) {
                tubes.put(tube, new Goes(b.type().tubeOf(first.to), first.said));
            }
        }
        return tubes;
    }

    private static boolean isWhole(NavigableMap<Integer, Goes> fibers, FiberRange range, int to) {
        for (int fiber = range.first(); fiber <= range.last(); fiber++) {
            Goes goes = fibers.get(fiber);
            if (goes == null || goes.to != to + fiber - range.first()) {
                return false;
            }
        }
        return true;
    }

    /** One crossing of neighbours where those around run straight. */
    private static void crossing(
            NavigableMap<Integer, Goes> map, String what, CableLeg a, CableLeg b, Consumer<Slip> found) {
        map.forEach((number, goes) -> {
            Goes next = map.get(number + 1);
            if (next != null && goes.to - next.to == 1) {
                int off = next.to - number;
                if (straight(map, number - 1, off) || straight(map, number + 2, off)) {
                    String names = number + " and " + (number + 1);
                    found.accept(Slip.warning(
                            goes.said.place(),
                            "neighbours-crossed",
                            "The " + what + " " + names + " of " + a.name() + " cross to " + goes.to + " and " + next.to
                                    + " of " + b.name() + ", where those around run straight.",
                            "If that is how they lie, say that it is meant; else let " + number + " go to " + next.to
                                    + "."));
                }
            }
        });
    }

    private static boolean straight(NavigableMap<Integer, Goes> map, int number, int off) {
        Goes goes = map.get(number);
        return goes != null && goes.to == number + off;
    }
}
