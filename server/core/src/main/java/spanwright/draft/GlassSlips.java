package spanwright.draft;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.TreeSet;
import java.util.function.Consumer;
import java.util.stream.IntStream;
import spanwright.circuits.Circuit;
import spanwright.network.Network;
import spanwright.planning.EndStates;
import spanwright.planning.PathCircuits;
import spanwright.plant.FiberRange;
import spanwright.plant.Trust;
import spanwright.sheet.CableLeg;
import spanwright.sheet.Statement;
import spanwright.sheet.TextPlace;
import spanwright.splicing.EndCondition;
import spanwright.splicing.EndRange;
import spanwright.splicing.EndState;
import spanwright.splicing.Joint;
import spanwright.splicing.JointKind;
import spanwright.splicing.SpliceMethod;

/** What a sheet would do to the glass: joints taken apart, uncut glass cut, cut ends left without a word. */
final class GlassSlips {

    private static final int MOST_CODES = 3;

    private GlassSlips() {}

    static void find(CheckedSheet sheet, Consumer<Slip> found) {
        takenApart(sheet, found);
        cutGlass(sheet, found);
        silentEnds(sheet, found);
        temporary(sheet, found);
        withoutLight(sheet, found);
    }

    private static Map<Long, TextPlace> places(CheckedSheet sheet) {
        Map<Long, TextPlace> places = new HashMap<>();
        for (Statement statement : sheet.statements()) {
            for (EndRange ends : statement.ends()) {
                for (int index = 0; index < ends.count(); index++) {
                    places.putIfAbsent(ends.key(index), statement.place());
                }
            }
        }
        return places;
    }

    /** Joints recorded that the sheet contradicts. */
    private static void takenApart(CheckedSheet sheet, Consumer<Slip> found) {
        Map<Long, TextPlace> places = places(sheet);
        PathCircuits circuits = new PathCircuits(sheet.before());
        sheet.changes().stream()
                .filter(change -> change.before() instanceof Joint && change.after() == null)
                .map(change -> (Joint) change.before())
                .filter(joint -> joint != null && !joint.planned())
                .distinct()
                .forEach(joint -> takenApart(sheet, joint, places, circuits, found));
    }

    private static void takenApart(
            CheckedSheet sheet, Joint joint, Map<Long, TextPlace> places, PathCircuits circuits, Consumer<Slip> found) {
        Network before = sheet.before().network();
        Set<Integer> apart = new TreeSet<>();
        Set<String> live = new TreeSet<>();
        TextPlace place = null;
        for (int index = 0; index < joint.count(); index++) {
            long key = joint.a().key(index);
            if (peer(before, key) != peer(sheet.after().network(), key)) {
                apart.add(joint.a().numbers().at(index));
                live.addAll(codes(circuits, before.endOf(key)));
                TextPlace at = places.getOrDefault(key, places.get(joint.b().key(index)));
                place = place == null ? at : place;
            }
        }
        if (place != null) {
            found.accept(Slip.warning(
                    place,
                    "joint-taken-apart",
                    "The records have " + sheet.names().ends(joint.a()) + " = "
                            + sheet.names().ends(joint.b()) + "; this sheet takes "
                            + words(apart.stream().mapToInt(Integer::intValue)) + " apart."
                            + (live.isEmpty() ? "" : " Circuits on them: " + String.join(", ", live) + "."),
                    "If that is what was done, say why; else mend the line."));
        }
    }

    /** The first circuits on an end's glass. */
    private static List<String> codes(PathCircuits circuits, int end) {
        return end == Network.NONE
                ? List.of()
                : circuits.through(end >> 1).stream()
                        .map(Circuit::code)
                        .limit(MOST_CODES)
                        .toList();
    }

    private static String words(IntStream rising) {
        return String.join(
                ", ",
                FiberRange.listOf(rising).stream().map(FiberRange::toString).toList());
    }

    /** The key of the end that an end is joined to, 0 where it is to none. */
    private static long peer(Network network, long key) {
        int end = network.endOf(key);
        int peer = end == Network.NONE ? Network.NONE : network.peer(end);
        return peer == Network.NONE ? 0 : network.keyOf(peer);
    }

    /** Fibers recorded as going through, with circuits on them, that the sheet has cut. */
    private static void cutGlass(CheckedSheet sheet, Consumer<Slip> found) {
        Network before = sheet.before().network();
        Network after = sheet.after().network();
        PathCircuits circuits = new PathCircuits(sheet.before());
        for (Statement statement : sheet.statements()) {
            Set<String> live = new TreeSet<>();
            List<String> cut = new ArrayList<>();
            for (EndRange ends : statement.ends()) {
                for (int index = 0;
                        index < ends.count() && sheet.legs().find(ends.leg()).isPresent();
                        index++) {
                    int was = before.endOf(ends.key(index));
                    int is = after.endOf(ends.key(index));
                    boolean uncut = was != Network.NONE && before.joint(was) == 0 && before.peer(was) != Network.NONE;
                    boolean gone = is != Network.NONE && (after.joint(is) != 0 || after.peer(is) == Network.NONE);
                    List<Circuit> on = uncut && gone ? circuits.through(was >> 1) : List.of();
                    if (!on.isEmpty()) {
                        on.stream().map(Circuit::code).limit(3).forEach(live::add);
                        cut.add(sheet.names().end(ends.key(index)));
                    }
                }
            }
            if (!cut.isEmpty()) {
                found.accept(Slip.warning(
                        statement.place(),
                        "express-cut",
                        cut.get(0) + (cut.size() > 1 ? " and " + (cut.size() - 1) + " more" : "")
                                + " goes through uncut by the records, with circuits on it: "
                                + String.join(", ", live) + ".",
                        "Only scheduled fibers are cut at mid-sheath: if it is uncut, leave it out or say through."));
            }
        }
    }

    /** Cut ends of tubes that the sheet touches, with no joint and no state. */
    private static void silentEnds(CheckedSheet sheet, Consumer<Slip> found) {
        Network after = sheet.after().network();
        EndStates states = new EndStates(sheet.after().records(), after);
        Map<String, TextPlace> tubes = touchedTubes(sheet);
        for (CableLeg leg : sheet.legs().list()) {
            for (int tube = 1; tube <= leg.type().tubes(); tube++) {
                TextPlace place = tubes.get(leg.cable().id() + "/" + tube);
                if (place == null) {
                    continue;
                }
                List<FiberRange> silent = FiberRange.listOf(IntStream.rangeClosed(
                                leg.fibersOf(tube).first(), leg.fibersOf(tube).last())
                        .filter(fiber -> silent(after, states, leg.leg().key(fiber))));
                if (!silent.isEmpty()) {
                    String fibers = String.join(
                            ", ", silent.stream().map(FiberRange::toString).toList());
                    found.accept(Slip.warning(
                            place,
                            "end-without-state",
                            leg.name() + " " + fibers + " (" + leg.tubeName(tube)
                                    + ") would be cut, with no joint and no state.",
                            "Say what they join, or that they are capped or stored: " + leg.name() + " " + silent.get(0)
                                    + " capped."));
                }
            }
        }
    }

    private static boolean silent(Network network, EndStates states, long key) {
        int end = network.endOf(key);
        if (end == Network.NONE || network.joint(end) != 0 || network.peer(end) != Network.NONE) {
            return false;
        }
        EndState state = states.find(key);
        return state == null || state.condition() == EndCondition.UNKNOWN;
    }

    private static Map<String, TextPlace> touchedTubes(CheckedSheet sheet) {
        Map<String, TextPlace> tubes = new LinkedHashMap<>();
        for (Statement statement : sheet.statements()) {
            for (EndRange ends : statement.ends()) {
                sheet.legs().find(ends.leg()).ifPresent(leg -> {
                    for (int index = 0; index < ends.count(); index++) {
                        int tube = leg.type().tubeOf(ends.numbers().at(index));
                        tubes.putIfAbsent(leg.cable().id() + "/" + tube, statement.place());
                    }
                });
            }
        }
        return tubes;
    }

    /** Mechanical splices are temporary: they have an owner and a last day. */
    private static void temporary(CheckedSheet sheet, Consumer<Slip> found) {
        sheet.joins()
                .filter(joins -> joins.type() == JointKind.SPLICE)
                .map(joins -> joins.saying(joins.words().under(sheet.header())))
                .filter(joins -> joins.words().method() == SpliceMethod.MECHANICAL
                        || joins.words().until() != null)
                .filter(joins -> joins.words().until() == null || joins.words().splicedBy() == null)
                .forEach(joins -> found.accept(Slip.warning(
                        joins.place(),
                        "temporary-without-end",
                        "A mechanical splice is temporary, and has "
                                + (joins.words().until() == null ? "no last day" : "nobody who answers for it") + ".",
                        "Write ; until 2026-04-30; by NAME, so that it stands on the list until it is undone.")));
    }

    private static void withoutLight(CheckedSheet sheet, Consumer<Slip> found) {
        sheet.joins()
                .filter(joins -> joins.words().trust() == Trust.VERIFIED
                        && joins.words().light() == null
                        && sheet.changes().stream()
                                .anyMatch(change -> change.after() instanceof Joint joint
                                        && joint.a().leg().equals(joins.a().leg())
                                        && joins.a()
                                                .numbers()
                                                .contains(joint.a().numbers().first())))
                .forEach(joins -> found.accept(Slip.warning(
                        joins.place(),
                        "verified-without-light",
                        "Crossed fibers pass a splice's loss test, so without light from end to end no joint of this"
                                + " range becomes verified; it will be posted.",
                        "Send light over every fiber and write ; light 2026-03-31.")));
    }
}
