package spanwright.draft;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.NoSuchElementException;
import java.util.stream.Collectors;
import org.jspecify.annotations.Nullable;
import spanwright.network.Network;
import spanwright.network.Snapshot;
import spanwright.network.SnapshotEditor;
import spanwright.plant.FiberRange;
import spanwright.records.EndNames;
import spanwright.records.RecordsView;
import spanwright.records.Relation;
import spanwright.sheet.CableLeg;
import spanwright.sheet.EnclosureLegs;
import spanwright.sheet.Statement;
import spanwright.splicing.EndKey;
import spanwright.splicing.EndRange;
import spanwright.splicing.EndState;
import spanwright.splicing.Joint;
import spanwright.splicing.Leg;

/**
 * Where a sheet and the postings since its author looked say different things of one end. What only one of the two
 * speaks of is merged, and so is what both say alike.
 */
final class TubeConflicts {

    private final Snapshot base;
    private final SnapshotEditor now;
    private final EnclosureLegs legs;
    private final EndNames names;
    private final Map<Long, String> statesBefore;
    private final Map<Long, String> statesNow;

    private TubeConflicts(Snapshot base, SnapshotEditor now, int enclosure) {
        this.base = base;
        this.now = now;
        this.legs = new EnclosureLegs(now.records(), enclosure);
        this.names = new EndNames(now.records());
        this.statesBefore = states(base.records(), enclosure);
        this.statesNow = states(now.records(), enclosure);
    }

    /** The conflicts, a tube each, in the order of the lines. */
    static List<TubeConflict> list(Snapshot base, SnapshotEditor now, int enclosure, List<Statement> statements) {
        return new TubeConflicts(base, now, enclosure).list(statements);
    }

    private static Map<Long, String> states(RecordsView records, int enclosure) {
        Map<Long, String> states = new HashMap<>();
        records.endStates().owned(Relation.ENCLOSURE_END_STATES, enclosure).forEach((EndState state) -> {
            for (int index = 0; index < state.ends().count(); index++) {
                states.put(state.ends().key(index), state.condition().word());
            }
        });
        return states;
    }

    /** A tube of a leg; of a splitter or a panel its side, and no tube. */
    private record Tube(String leg, String name) {}

    /** An end of which two things are said. */
    private record Found(Statement statement, long key, String was, String is, String said) {}

    private List<TubeConflict> list(List<Statement> statements) {
        Map<Tube, List<Found>> byTube = new LinkedHashMap<>();
        for (Statement statement : statements) {
            if (statement.job().isEmpty()) {
                for (EndRange ends : statement.ends()) {
                    for (int index = 0; index < ends.count(); index++) {
                        Found found = find(statement, ends.key(index), said(statement, ends, index));
                        if (found != null) {
                            byTube.computeIfAbsent(tube(ends.key(index)), tube -> new ArrayList<>())
                                    .add(found);
                        }
                    }
                }
            }
        }
        return byTube.entrySet().stream()
                .map(entry -> conflict(entry.getKey(), entry.getValue()))
                .toList();
    }

    private static TubeConflict conflict(Tube tube, List<Found> found) {
        Found first = found.get(0);
        String numbers = FiberRange.listOf(
                        found.stream().mapToInt(each -> EndKey.number(each.key)).sorted())
                .stream()
                .map(FiberRange::toString)
                .collect(Collectors.joining(", "));
        return new TubeConflict(first.statement.place(), tube.leg, tube.name, numbers, first.was, first.is, first.said);
    }

    private String said(Statement statement, EndRange ends, int index) {
        if (statement instanceof Statement.Joins joins) {
            EndRange other = ends.equals(joins.a()) ? joins.b() : joins.a();
            return names.end(other.key(index));
        }
        return ((Statement.States) statement).condition().word();
    }

    private @Nullable Found find(Statement statement, long key, String said) {
        String was = words(before(key), key, statesBefore);
        String is = words(now.findJoint(new Leg(EndKey.kind(key), EndKey.owner(key)), EndKey.number(key)), key);
        return was.equals(is) || is.equals(said) ? null : new Found(statement, key, was, is, said);
    }

    private @Nullable Joint before(long key) {
        int end = base.network().endOf(key);
        int joint = end == Network.NONE ? 0 : base.network().joint(end);
        return joint == 0 ? null : base.records().joints().get(joint);
    }

    private String words(int joint, long key) {
        return words(joint == 0 ? null : now.records().joints().get(joint), key, statesNow);
    }

    private String words(@Nullable Joint joint, long key, Map<Long, String> states) {
        if (joint == null) {
            return states.getOrDefault(key, "nothing recorded");
        }
        for (int index = 0; index < joint.count(); index++) {
            if (joint.a().key(index) == key) {
                return name(joint.b().key(index));
            }
            if (joint.b().key(index) == key) {
                return name(joint.a().key(index));
            }
        }
        return "nothing recorded";
    }

    /** The name of an end; of one that is gone since, that it is gone. */
    private String name(long key) {
        try {
            return names.end(key);
        } catch (NoSuchElementException gone) {
            return "an end that is gone";
        }
    }

    private Tube tube(long key) {
        Leg leg = new Leg(EndKey.kind(key), EndKey.owner(key));
        CableLeg cable = legs.find(leg).orElse(null);
        if (cable == null) {
            String[] name = names.end(key).split(" ", 3);
            return new Tube(name.length > 1 ? name[0] + " " + name[1] : name[0].replaceAll("/[0-9]+$", ""), "");
        }
        return new Tube(cable.name(), cable.tubeName(cable.type().tubeOf(EndKey.number(key))));
    }
}
