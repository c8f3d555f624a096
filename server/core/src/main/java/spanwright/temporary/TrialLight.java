package spanwright.temporary;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.jspecify.annotations.Nullable;
import spanwright.circuits.Circuit;
import spanwright.circuits.PortRange;
import spanwright.journal.Change;
import spanwright.journal.RecordKind;
import spanwright.loss.Budget;
import spanwright.loss.BudgetCheck;
import spanwright.loss.LossReckoner;
import spanwright.loss.LossUnknown;
import spanwright.loss.Measurements;
import spanwright.loss.PathLoss;
import spanwright.loss.Reckoning;
import spanwright.network.Network;
import spanwright.network.Snapshot;
import spanwright.network.SnapshotEditor;
import spanwright.planning.NewJoint;
import spanwright.planning.SpareWay;
import spanwright.plant.FiberRange;
import spanwright.plant.Trust;
import spanwright.quantity.Length;
import spanwright.quantity.Loss;
import spanwright.quantity.Wavelength;
import spanwright.splicing.EndKey;
import spanwright.splicing.EndRange;
import spanwright.splicing.Joint;
import spanwright.splicing.JointFacts;
import spanwright.splicing.JointKind;
import spanwright.splicing.Leg;
import spanwright.splicing.LegKind;
import spanwright.splicing.SpliceMethod;
import spanwright.trace.Path;
import spanwright.trace.Tracer;

/** Tries temporary paths: traces and reckons each circuit of a group as if they were posted. One thread's. */
final class TrialLight {

    /** The job under which the joints are tried; a code holds no blank, so it is nobody's. */
    private static final String JOB = "temporary light";

    private final Snapshot snapshot;
    private final Network network;
    private final Loss margin;
    private final Measurements measurements;

    TrialLight(Snapshot snapshot, Loss margin) {
        this.snapshot = snapshot;
        this.network = snapshot.network();
        this.margin = margin;
        this.measurements = new Measurements(snapshot.records());
    }

    /** The circuits of a group whose ends move; none where a circuit would end on ports that are no range. */
    Optional<List<Circuit>> moves(DarkGroup group, List<SpareWay> ways) {
        Map<Long, Long> moved = new HashMap<>();
        for (int index = 0; index < ways.size(); index++) {
            note(moved, group.lines().get(index).from(), ways.get(index).start().end());
            note(moved, group.lines().get(index).to(), ways.get(index).goal().end());
        }
        List<Circuit> changed = new ArrayList<>();
        for (Circuit circuit : group.circuits()) {
            Optional<PortRange> a = moved(circuit.a(), moved);
            Optional<PortRange> z = moved(circuit.z(), moved);
            if (a.isEmpty() || z.isEmpty()) {
                return Optional.empty();
            }
            if (!a.get().equals(circuit.a()) || !z.get().equals(circuit.z())) {
                changed.add(with(circuit, a.get(), z.get()));
            }
        }
        return Optional.of(changed);
    }

    private void note(Map<Long, Long> moved, int from, int to) {
        if (!DarkLine.inSplitter(network, from) && from != to) {
            moved.put(network.keyOf(from), network.keyOf(to));
        }
    }

    private static Optional<PortRange> moved(PortRange ports, Map<Long, Long> moved) {
        List<Long> keys = new ArrayList<>();
        for (int index = 0; index < ports.ports().count(); index++) {
            long key = DarkLine.front(ports, index);
            keys.add(moved.getOrDefault(key, key));
        }
        FiberRange numbers = new FiberRange(EndKey.number(keys.get(0)), EndKey.number(keys.get(keys.size() - 1)));
        PortRange range = new PortRange(EndKey.owner(keys.get(0)), numbers);
        for (int index = 0; index < keys.size(); index++) {
            if (numbers.count() != keys.size() || DarkLine.front(range, index) != keys.get(index)) {
                return Optional.empty();
            }
        }
        return Optional.of(range);
    }

    private static Circuit with(Circuit circuit, PortRange a, PortRange z) {
        return new Circuit(
                circuit.id(),
                circuit.code(),
                circuit.service(),
                circuit.customer(),
                circuit.priority(),
                circuit.customersServed(),
                circuit.wavelengths(),
                circuit.budget(),
                circuit.protectionGroup(),
                a,
                z,
                circuit.status());
    }

    /** What light does over the paths of a group. */
    Lit light(DarkGroup group, List<SpareWay> ways, List<Circuit> moves) {
        SnapshotEditor editor = snapshot.edit();
        Map<Integer, Circuit> as = new HashMap<>();
        for (Circuit after : moves) {
            editor.replay(Change.replace(snapshot.records().circuits().get(after.id()), after));
            as.put(after.id(), after);
        }
        ways.forEach(way -> way.joints()
                .forEach(joint ->
                        editor.replay(Change.add(planned(joint, editor.records().newIdentity(RecordKind.JOINT))))));
        editor.build(JOB);
        Snapshot lit = editor.build(snapshot.records().posting());
        Tally tally = new Tally(lit);
        group.circuits().forEach(circuit -> tally.add(as.getOrDefault(circuit.id(), circuit)));
        return tally.lit(group);
    }

    private Joint planned(NewJoint joint, int id) {
        boolean jumper = joint.kind() == JointKind.JUMPER;
        JointFacts facts = new JointFacts(
                null,
                jumper ? null : SpliceMethod.FUSION,
                null,
                Trust.PLANNED,
                null,
                null,
                null,
                null,
                JOB,
                jumper ? Length.ofMetres(NewJoint.JUMPER_METRES) : null);
        return new Joint(id, joint.kind(), joint.enclosure(), one(joint.a()), one(joint.b()), facts);
    }

    private EndRange one(int end) {
        long key = network.keyOf(end);
        LegKind kind = EndKey.kind(key);
        return new EndRange(new Leg(kind, EndKey.owner(key)), FiberRange.of(EndKey.number(key)));
    }

    /** The worst of what was traced so far. */
    private final class Tally {

        private final Tracer tracer;
        private final Snapshot lit;
        private final Map<Wavelength, LossReckoner> reckoners = new HashMap<>();
        private boolean whole = true;
        private @Nullable Lit worst;
        private Length longest = Length.ZERO;

        Tally(Snapshot lit) {
            this.lit = lit;
            this.tracer = new Tracer(lit);
        }

        void add(Circuit circuit) {
            for (Path path : tracer.ofCircuit(circuit)) {
                whole &= path.complete();
                longest = path.glass().compareTo(longest) > 0 ? path.glass() : longest;
                Reckoning reckoning = reckoners
                        .computeIfAbsent(
                                circuit.wavelengths().get(0), nm -> new LossReckoner(lit.records(), nm, measurements))
                        .reckon(path);
                consider(circuit, path, reckoning);
            }
        }

        private void consider(Circuit circuit, Path path, Reckoning reckoning) {
            Lit found;
            if (reckoning instanceof PathLoss loss) {
                String written = circuit.budget();
                BudgetCheck check = written == null
                        ? null
                        : Budget.find(written)
                                .map(budget -> BudgetCheck.of(loss, budget, margin))
                                .orElse(null);
                found = new Lit(true, circuit, path.glass(), loss.expected(), check, List.of());
            } else {
                String sentence = ((LossUnknown) reckoning).sentence();
                found = new Lit(true, circuit, path.glass(), null, null, List.of(sentence));
            }
            if (worst == null || worse(found, worst)) {
                worst = found;
            }
        }

        private boolean worse(Lit one, Lit other) {
            Loss oneLoss = one.loss();
            Loss otherLoss = other.loss();
            if (oneLoss == null || otherLoss == null) {
                return oneLoss == null && otherLoss != null;
            }
            BudgetCheck oneCheck = one.check();
            BudgetCheck otherCheck = other.check();
            if (oneCheck != null && otherCheck != null) {
                return oneCheck.left().compareTo(otherCheck.left()) < 0;
            }
            return otherCheck == null && (oneCheck != null || oneLoss.compareTo(otherLoss) > 0);
        }

        Lit lit(DarkGroup group) {
            Lit found = worst;
            if (found == null) {
                throw new IllegalStateException("no path of " + group.circuits());
            }
            return new Lit(whole, found.worst(), longest, found.loss(), found.check(), found.unknown());
        }
    }
}
