package spanwright.suspicion;

import java.util.ArrayList;
import java.util.BitSet;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import spanwright.circuits.Circuit;
import spanwright.network.Network;
import spanwright.network.Snapshot;
import spanwright.plant.CableType;
import spanwright.records.Records;
import spanwright.splicing.EndKey;
import spanwright.splicing.Joint;
import spanwright.splicing.JointKind;
import spanwright.splicing.Leg;

/**
 * Weighs whether tubes were crossed where an enclosure was opened lately: two tubes exchanged, or one joined to the wrong
 * glass. Whatever circuits run through these tubes there should then be dark, and no others.
 */
final class Crossings {

    private final Records records;
    private final Network network;
    private final RouteUnits units;
    private final OpenedLately opened;
    private final Map<Place, BitSet> through = new HashMap<>();

    Crossings(Snapshot snapshot, RouteUnits units, Alarms alarms) {
        this.records = snapshot.records();
        this.network = snapshot.network();
        this.units = units;
        this.opened = new OpenedLately(records, alarms);
    }

    /** A tube of a leg, where splices begin at it. */
    private record Place(Leg leg, int tube) {}

    /** The candidates for listed circuits, those that are down first. */
    List<Candidate> find(List<Circuit> listed, int down) {
        if (opened.none()) {
            return List.of();
        }
        for (int index = 0; index < listed.size(); index++) {
            for (int[] ends : units.ends(listed.get(index))) {
                note(ends, index);
            }
        }
        List<Candidate> found = new ArrayList<>();
        for (int enclosure : opened.enclosures()) {
            opened.tubes(enclosure).forEach((leg, tubes) -> pairs(enclosure, leg, tubes, down, found));
        }
        return found;
    }

    private void note(int[] ends, int circuit) {
        for (int step = 1; step < ends.length; step++) {
            int id = network.joint(ends[step]);
            if (id != 0 && network.peer(ends[step]) == (ends[step - 1] ^ 1)) {
                Joint joint = records.joints().get(id);
                if (joint.type() == JointKind.SPLICE
                        && opened.tubes(joint.enclosure()).containsKey(joint.a().leg())) {
                    long before = network.keyOf(ends[step - 1] ^ 1);
                    long after = network.keyOf(ends[step]);
                    Leg leg = joint.a().leg();
                    long key = leg.equals(new Leg(EndKey.kind(before), EndKey.owner(before))) ? before : after;
                    int tube = opened.type(leg).tubeOf(EndKey.number(key));
                    through.computeIfAbsent(new Place(leg, tube), place -> new BitSet())
                            .set(circuit);
                }
            }
        }
    }

    private void pairs(int enclosure, Leg leg, BitSet tubes, int down, List<Candidate> found) {
        CableType type = opened.type(leg);
        double lately = opened.fresh(enclosure);
        for (int tube = tubes.nextSetBit(0); tube >= 0; tube = tubes.nextSetBit(tube + 1)) {
            if (darkIn(leg, tube, down) == 0) {
                continue;
            }
            found.add(candidate(enclosure, leg, tube, 0, down, Likelihood.crossed(lately, type.tubes(), tube, 0)));
            for (int other = tubes.nextSetBit(0); other >= 0; other = tubes.nextSetBit(other + 1)) {
                boolean fresh = other > tube || (other < tube && darkIn(leg, other, down) == 0);
                if (fresh && (through.containsKey(new Place(leg, other)) || Likelihood.alike(tube, other))) {
                    double prior = Likelihood.crossed(lately, type.tubes(), tube, other);
                    found.add(candidate(enclosure, leg, tube, other, down, prior));
                }
            }
        }
    }

    private int darkIn(Leg leg, int tube, int down) {
        BitSet in = through.get(new Place(leg, tube));
        return in == null ? 0 : in.get(0, down).cardinality();
    }

    private Candidate candidate(int enclosure, Leg leg, int tube, int other, int down, double prior) {
        Candidate candidate = new Candidate(Suspect.Kind.CROSSED);
        String cable =
                records.cables().get(records.runRows().get(leg.owner()).cable()).code();
        candidate.add(units.ofEnclosure(enclosure), prior);
        candidate.units.add(units.ofEnclosure(enclosure));
        for (int each : other == 0 ? new int[] {tube} : new int[] {Math.min(tube, other), Math.max(tube, other)}) {
            candidate.tubes.add(cable + "/" + each);
            BitSet in = through.get(new Place(leg, each));
            if (in != null) {
                candidate.circuits.or(in);
            }
        }
        int explains = candidate.circuits.get(0, down).cardinality();
        candidate.counts(explains, candidate.circuits.cardinality() - explains);
        return candidate;
    }
}
