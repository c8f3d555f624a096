package spanwright.network;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import org.jspecify.annotations.Nullable;
import spanwright.circuits.Circuit;
import spanwright.circuits.CircuitStatus;
import spanwright.circuits.PortRange;
import spanwright.journal.Change;
import spanwright.journal.Recorded;
import spanwright.records.RecordsView;
import spanwright.records.Refusal;
import spanwright.records.Relation;
import spanwright.splicing.EndKey;
import spanwright.splicing.EndRange;
import spanwright.splicing.Joint;
import spanwright.splicing.JointKind;
import spanwright.splicing.Leg;
import spanwright.splicing.LegKind;

/**
 * The rules of ends: each end and each port's rear is joined once at most, none to itself; a front takes one jumper or
 * else circuits' ends. A planned joint uses its ends within its job alone. One thread's, for one posting.
 */
final class EndRules {

    private static final int NONE = -1;

    private final RecordsView records;
    private final NetworkEditor network;
    private final EndNames names;
    private final UsedEnds used;
    private final Map<String, Map<Long, Integer>> plannedByJob = new HashMap<>();

    EndRules(RecordsView records, NetworkEditor network) {
        this.records = records;
        this.network = network;
        this.names = new EndNames(records);
        this.used = new UsedEnds(records, this);
    }

    /** Why a change may not be applied; every broken rule at once, one refusal for each earlier record it clashes with. */
    List<Refusal> refuse(Change change) {
        Recorded after = change.after();
        if (after instanceof Joint joint) {
            return refuseJoint(joint);
        }
        return after instanceof Circuit circuit ? refuseCircuit(circuit) : used.refuse(change);
    }

    /** What is wrong with the ends of what the applied changes touched, seen as a whole. */
    List<Refusal> finish() {
        return used.finish();
    }

    /** The joint that uses an end, in the glass or planned within any job; 0 where none does. */
    int userOf(Leg leg, long key) {
        int joint = jointAt(leg, key);
        for (String job : joint == 0 ? records.plannedJobs() : List.<String>of()) {
            joint = Math.max(joint, plannedAt(job, key));
        }
        return joint;
    }

    /** Joints in the glass that name a leg out of the network. */
    int[] looseJoints(Leg leg) {
        return network.looseJoints(leg);
    }

    private List<Refusal> refuseJoint(Joint joint) {
        Map<Object, Refusal> found = new LinkedHashMap<>();
        refuseWithin(joint, found);
        for (int index = 0; index < joint.count(); index++) {
            refuseEnd(joint, joint.a(), index, found);
            refuseEnd(joint, joint.b(), index, found);
        }
        return new ArrayList<>(found.values());
    }

    private void refuseWithin(Joint joint, Map<Object, Refusal> found) {
        if (!joint.a().leg().equals(joint.b().leg())) {
            return;
        }
        for (int index = 0; index < joint.count(); index++) {
            int number = joint.a().numbers().at(index);
            if (joint.b().numbers().at(index) == number) {
                found.putIfAbsent(
                        "itself",
                        refusal(
                                "end-joined-to-itself",
                                joint,
                                null,
                                names.of(joint.a().key(index)) + " is joined to itself; name two different ends"));
            } else if (joint.b().numbers().contains(number)) {
                found.putIfAbsent(
                        "twice",
                        refusal(
                                "end-joined-twice",
                                joint,
                                null,
                                names.of(joint.a().key(index))
                                        + " stands on both sides of one row; each end is joined once"));
            }
        }
    }

    private void refuseEnd(Joint joint, EndRange ends, int index, Map<Object, Refusal> found) {
        long key = ends.key(index);
        int earlier = joint.planned() ? plannedAt(joint.plannedJob(), key) : jointAt(ends.leg(), key);
        if (earlier != 0 && earlier != joint.id()) {
            found.computeIfAbsent(
                    earlier, id -> joinedTwice(joint, key, records.joints().get(earlier)));
        }
        if (joint.type() == JointKind.JUMPER && !joint.planned()) {
            Circuit circuit = circuitAt(ends.leg().owner(), ends.numbers().at(index));
            if (circuit != null) {
                found.computeIfAbsent(
                        circuit.code(),
                        code -> refusal(
                                "front-with-jumper-and-circuit",
                                joint,
                                circuit,
                                "circuit " + code + " ends on " + names.of(key)
                                        + "; a front takes a jumper or circuits' ends, not both"));
            }
        }
    }

    private Refusal joinedTwice(Joint joint, long key, Joint earlier) {
        String within = joint.planned() ? " within job " + joint.plannedJob() : "";
        String what = switch (EndKey.kind(key)) {
            case REAR -> "the rear of " + names.of(key) + " is terminated already" + within + "; a rear takes one";
            case FRONT -> names.of(key) + " has a jumper already" + within + "; a front takes one";
            default -> names.of(key) + " is joined already" + within + "; each end is joined once";
        };
        return refusal("end-joined-twice", joint, earlier, what + ", so free it first or name another");
    }

    private static Refusal refusal(String code, Recorded record, @Nullable Recorded earlier, String sentence) {
        return new Refusal(code, sentence, null, record, earlier);
    }

    private int jointAt(Leg leg, long key) {
        int end = network.endOf(key);
        if (end != NONE) {
            return network.joint(end);
        }
        for (int id : network.looseJoints(leg)) {
            Joint loose = records.joints().get(id);
            if (names(loose.a(), key) || names(loose.b(), key)) {
                return id;
            }
        }
        return 0;
    }

    private static boolean names(EndRange ends, long key) {
        return ends.leg().kind() == EndKey.kind(key)
                && ends.leg().owner() == EndKey.owner(key)
                && ends.numbers().contains(EndKey.number(key));
    }

    private int plannedAt(String job, long key) {
        return plannedOf(job).getOrDefault(key, 0);
    }

    private Map<Long, Integer> plannedOf(String job) {
        return plannedByJob.computeIfAbsent(job, name -> {
            Map<Long, Integer> ends = new HashMap<>();
            for (int id : records.plannedJoints(name)) {
                note(ends, records.joints().get(id));
            }
            return ends;
        });
    }

    private static void note(Map<Long, Integer> ends, Joint joint) {
        for (int index = 0; index < joint.count(); index++) {
            ends.put(joint.a().key(index), joint.id());
            ends.put(joint.b().key(index), joint.id());
        }
    }

    /** Notes a change that has been applied. */
    void applied(Change change) {
        used.applied(change);
        if (change.before() instanceof Joint joint && joint.planned()) {
            Map<Long, Integer> ends = plannedOf(joint.plannedJob());
            for (int index = 0; index < joint.count(); index++) {
                ends.remove(joint.a().key(index), joint.id());
                ends.remove(joint.b().key(index), joint.id());
            }
        }
        if (change.after() instanceof Joint joint && joint.planned()) {
            note(plannedOf(joint.plannedJob()), joint);
        }
    }

    private @Nullable Circuit circuitAt(int panel, int port) {
        for (int id : records.owned(Relation.PANEL_CIRCUITS, panel)) {
            Circuit circuit = records.circuits().get(id);
            if (circuit.status() != CircuitStatus.RETIRED
                    && (ends(circuit.a(), panel, port) || ends(circuit.z(), panel, port))) {
                return circuit;
            }
        }
        return null;
    }

    private static boolean ends(PortRange ports, int panel, int port) {
        return ports.panel() == panel && ports.ports().contains(port);
    }

    private List<Refusal> refuseCircuit(Circuit circuit) {
        if (circuit.status() == CircuitStatus.RETIRED) {
            return List.of();
        }
        Map<Object, Refusal> found = new LinkedHashMap<>();
        for (PortRange ports : List.of(circuit.a(), circuit.z())) {
            Leg leg = new Leg(LegKind.FRONT, ports.panel());
            for (int index = 0; index < ports.ports().count(); index++) {
                long key = leg.key(ports.ports().at(index));
                int jumper = jointAt(leg, key);
                if (jumper != 0) {
                    found.computeIfAbsent(
                            jumper,
                            id -> refusal(
                                    "front-with-jumper-and-circuit",
                                    circuit,
                                    records.joints().get(jumper),
                                    names.of(key) + " has a jumper; a circuit ends on a front without one"));
                }
            }
        }
        return new ArrayList<>(found.values());
    }
}
