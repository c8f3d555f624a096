package spanwright.network;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import org.jspecify.annotations.Nullable;
import spanwright.circuits.Circuit;
import spanwright.circuits.CircuitStatus;
import spanwright.circuits.PortRange;
import spanwright.journal.Change;
import spanwright.journal.Recorded;
import spanwright.plant.FiberRange;
import spanwright.records.EndNames;
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

    private final RecordsView records;
    private final EndNames names;
    private final EndUsers users;
    private final UsedEnds used;

    EndRules(RecordsView records, NetworkEditor network) {
        this.records = records;
        this.names = new EndNames(records);
        this.users = new EndUsers(records, network);
        this.used = new UsedEnds(records, users);
    }

    /** Why a change may not be applied; every broken rule at once, one refusal for each record it clashes with. */
    List<Refusal> refuse(Change change) {
        Recorded after = change.after();
        if (after instanceof Joint joint) {
            return refuseJoint(joint);
        }
        return after instanceof Circuit circuit ? refuseCircuit(circuit) : used.refuse(change);
    }

    /** Notes a change that has been applied. */
    void applied(Change change) {
        used.applied(change);
        users.applied(change);
    }

    /** What is wrong with the ends of what the applied changes touched, seen as a whole. */
    List<Refusal> finish() {
        return used.finish();
    }

    /** Who uses ends, all changes regarded. */
    EndUsers users() {
        return users;
    }

    private List<Refusal> refuseJoint(Joint joint) {
        List<Refusal> refusals = new ArrayList<>();
        refuseWithin(joint, refusals);
        Map<Integer, Long> clashes = new LinkedHashMap<>();
        users.clashes(joint, joint.a(), clashes);
        users.clashes(joint, joint.b(), clashes);
        clashes.forEach((earlier, key) ->
                refusals.add(joinedTwice(joint, key, records.joints().get(earlier))));
        if (joint.type() == JointKind.JUMPER && !joint.planned()) {
            refuseFronts(joint, joint.a(), refusals);
            refuseFronts(joint, joint.b(), refusals);
        }
        return refusals;
    }

    private void refuseWithin(Joint joint, List<Refusal> refusals) {
        FiberRange one = joint.a().numbers();
        FiberRange other = joint.b().numbers();
        if (!joint.a().leg().equals(joint.b().leg())) {
            return;
        }
        for (int index = 0; index < one.count(); index++) {
            String end = names.anywhere(joint.a().key(index));
            if (one.at(index) == other.at(index)) {
                refusals.add(refusal(
                        "end-joined-to-itself", joint, null, end + " is joined to itself; name two different ends"));
                return;
            }
            if (other.contains(one.at(index))) {
                refusals.add(refusal(
                        "end-joined-twice",
                        joint,
                        null,
                        end + " stands on both sides of one row; each end is joined once, so name two ranges that do"
                                + " not meet"));
                return;
            }
        }
    }

    private Refusal joinedTwice(Joint joint, long key, Joint earlier) {
        String already = " already" + (joint.planned() ? " within job " + joint.plannedJob() : "");
        String sentence = switch (EndKey.kind(key)) {
            case REAR ->
                "the rear of " + names.end(key) + " is terminated" + already + ", to " + names.ends(other(earlier, key))
                        + "; a rear takes one end";
            case FRONT ->
                names.end(key) + " has a jumper" + already + ", to " + names.ends(other(earlier, key))
                        + "; a front takes one jumper";
            default ->
                names.anywhere(key) + " is joined" + already + ", to " + names.ends(other(earlier, key))
                        + "; each end is joined once";
        };
        return refusal("end-joined-twice", joint, earlier, sentence);
    }

    /** To what a joint joins one of its ends. */
    private static EndRange other(Joint joint, long key) {
        for (int index = 0; index < joint.count(); index++) {
            if (joint.a().key(index) == key) {
                return one(joint.b(), index);
            }
            if (joint.b().key(index) == key) {
                return one(joint.a(), index);
            }
        }
        throw new IllegalArgumentException("joint " + joint.id() + " does not name the end");
    }

    private static EndRange one(EndRange ends, int index) {
        return new EndRange(ends.leg(), FiberRange.of(ends.numbers().at(index)));
    }

    private void refuseFronts(Joint jumper, EndRange fronts, List<Refusal> refusals) {
        int panel = fronts.leg().owner();
        for (int id : records.owned(Relation.PANEL_CIRCUITS, panel)) {
            Circuit circuit = records.circuits().get(id);
            int port = circuit.status() == CircuitStatus.RETIRED ? 0 : sharedPort(circuit, panel, fronts.numbers());
            if (port != 0) {
                refusals.add(refusal(
                        "front-with-jumper-and-circuit",
                        jumper,
                        circuit,
                        "circuit " + circuit.code() + " ends on " + names.port(panel, port)
                                + "; a front takes a jumper or circuits' ends, not both"));
            }
        }
    }

    private static int sharedPort(Circuit circuit, int panel, FiberRange ports) {
        for (int index = 0; index < ports.count(); index++) {
            int port = ports.at(index);
            if (endsOn(circuit.a(), panel, port) || endsOn(circuit.z(), panel, port)) {
                return port;
            }
        }
        return 0;
    }

    private static boolean endsOn(PortRange ports, int panel, int port) {
        return ports.panel() == panel && ports.ports().contains(port);
    }

    private List<Refusal> refuseCircuit(Circuit circuit) {
        if (circuit.status() == CircuitStatus.RETIRED) {
            return List.of();
        }
        Map<Integer, Long> jumpers = new LinkedHashMap<>();
        for (PortRange ports : List.of(circuit.a(), circuit.z())) {
            users.inGlass(new EndRange(new Leg(LegKind.FRONT, ports.panel()), ports.ports()), 0, jumpers);
        }
        List<Refusal> refusals = new ArrayList<>();
        jumpers.forEach((jumper, key) -> refusals.add(refusal(
                "front-with-jumper-and-circuit",
                circuit,
                records.joints().get(jumper),
                names.end(key) + " has a jumper, to "
                        + names.ends(other(records.joints().get(jumper), key))
                        + "; a circuit ends on a front without one")));
        return refusals;
    }

    private static Refusal refusal(String code, Recorded record, @Nullable Recorded earlier, String sentence) {
        return new Refusal(code, sentence, null, record, earlier);
    }
}
