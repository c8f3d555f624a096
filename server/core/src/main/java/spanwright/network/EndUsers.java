package spanwright.network;

import java.util.HashMap;
import java.util.List;
import java.util.Map;
import spanwright.journal.Change;
import spanwright.plant.FiberRange;
import spanwright.records.RecordsView;
import spanwright.splicing.EndRange;
import spanwright.splicing.Joint;
import spanwright.splicing.Leg;

/**
 * Which joints name an end: the one in the glass, in the network or not, and within each job a planned one. One
 * thread's, for one posting.
 */
final class EndUsers {

    private static final int NONE = -1;

    private final RecordsView records;
    private final NetworkEditor network;
    /** The ends of planned joints by job, each gathered when first asked for. */
    private final Map<String, Map<Long, Integer>> planned = new HashMap<>();

    EndUsers(RecordsView records, NetworkEditor network) {
        this.records = records;
        this.network = network;
    }

    /** Adds the joints, but for one itself, that name ends of one of its sides: each with the first end it names. */
    void clashes(Joint joint, EndRange side, Map<Integer, Long> clashes) {
        if (!joint.planned()) {
            inGlass(side, joint.id(), clashes);
            return;
        }
        Map<Long, Integer> job = plannedOf(joint.plannedJob());
        for (int index = 0; index < side.count(); index++) {
            int earlier = job.getOrDefault(side.key(index), 0);
            if (earlier != 0 && earlier != joint.id()) {
                clashes.putIfAbsent(earlier, side.key(index));
            }
        }
    }

    /** Adds the joints in the glass, but for one, that name ends: each with the first end it names. */
    void inGlass(EndRange side, int but, Map<Integer, Long> clashes) {
        LegEnds ends = network.ends(side.leg());
        if (!ends.present()) {
            loose(side, but, clashes);
            return;
        }
        for (int index = 0; index < side.count(); index++) {
            int end = ends.at(side.numbers().at(index));
            int earlier = end == NONE ? 0 : network.joint(end);
            if (earlier != 0 && earlier != but) {
                clashes.putIfAbsent(earlier, side.key(index));
            }
        }
    }

    private void loose(EndRange side, int but, Map<Integer, Long> clashes) {
        for (int id : network.looseJoints(side.leg())) {
            Joint earlier = records.joints().get(id);
            for (int index = 0; index < side.count() && id != but; index++) {
                int number = side.numbers().at(index);
                if (names(earlier.a(), side.leg(), number) || names(earlier.b(), side.leg(), number)) {
                    clashes.putIfAbsent(id, side.key(index));
                }
            }
        }
    }

    private static boolean names(EndRange ends, Leg leg, int number) {
        return ends.leg().equals(leg) && ends.numbers().contains(number);
    }

    /** Adds the joints that name ends, in the glass or planned within any job: each with the first end it names. */
    void anywhere(EndRange side, Map<Integer, Long> found) {
        inGlass(side, 0, found);
        for (String job : records.plannedJobs()) {
            Map<Long, Integer> ends = plannedOf(job);
            for (int index = 0; index < side.count(); index++) {
                Integer joint = ends.get(side.key(index));
                if (joint != null) {
                    found.putIfAbsent(joint, side.key(index));
                }
            }
        }
    }

    /** Joints in the glass that name a leg out of the network. */
    int[] looseJoints(Leg leg) {
        return network.looseJoints(leg);
    }

    /** The joint in the glass that an end is in; 0 where it is in none. */
    int inGlass(Leg leg, int number) {
        Map<Integer, Long> found = new HashMap<>();
        inGlass(new EndRange(leg, FiberRange.of(number)), 0, found);
        return found.isEmpty() ? 0 : found.keySet().iterator().next();
    }

    /** The joint planned within a job that an end is in; 0 where it is in none. */
    int planned(String job, long key) {
        return plannedOf(job).getOrDefault(key, 0);
    }

    private Map<Long, Integer> plannedOf(String job) {
        Map<Long, Integer> known = planned.get(job);
        if (known == null) {
            known = new HashMap<>();
            for (int id : records.plannedJoints(job)) {
                note(known, records.joints().get(id));
            }
            planned.put(job, known);
        }
        return known;
    }

    private static void note(Map<Long, Integer> ends, Joint joint) {
        for (EndRange side : List.of(joint.a(), joint.b())) {
            for (int index = 0; index < side.count(); index++) {
                ends.put(side.key(index), joint.id());
            }
        }
    }

    private static void forget(Map<Long, Integer> ends, Joint joint) {
        for (EndRange side : List.of(joint.a(), joint.b())) {
            for (int index = 0; index < side.count(); index++) {
                ends.remove(side.key(index), joint.id());
            }
        }
    }

    /** Notes a change that has been applied. */
    void applied(Change change) {
        if (change.before() instanceof Joint joint && joint.planned() && planned.containsKey(joint.plannedJob())) {
            forget(plannedOf(joint.plannedJob()), joint);
        }
        if (change.after() instanceof Joint joint && joint.planned() && planned.containsKey(joint.plannedJob())) {
            note(plannedOf(joint.plannedJob()), joint);
        }
    }
}
