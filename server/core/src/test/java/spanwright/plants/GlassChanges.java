package spanwright.plants;

import java.util.List;
import spanwright.circuits.Circuit;
import spanwright.circuits.CircuitStatus;
import spanwright.circuits.PortRange;
import spanwright.journal.RecordKind;
import spanwright.plant.Enclosure;
import spanwright.plant.FiberRange;
import spanwright.plant.Trust;
import spanwright.quantity.Wavelength;
import spanwright.records.RecordsView;
import spanwright.splicing.EndRange;
import spanwright.splicing.Joint;
import spanwright.splicing.JointFacts;
import spanwright.splicing.JointKind;
import spanwright.splicing.Leg;
import spanwright.splicing.LegKind;
import spanwright.splicing.Panel;

/** Draws changes of joints and circuits. */
final class GlassChanges {

    private final RandomChanges.Entering entering;
    private final RecordsView records;
    private final Chance chance;

    GlassChanges(RandomChanges.Entering entering) {
        this.entering = entering;
        this.records = entering.records();
        this.chance = entering.chance();
    }

    void draw() {
        switch (chance.between(0, 8)) {
            case 0, 1 -> entering.any(records.enclosures().list()).ifPresent(this::join);
            case 2 -> entering.any(records.joints().list()).ifPresent(entering::remove);
            case 3 -> entering.any(records.joints().list()).ifPresent(this::split);
            case 4 -> entering.any(records.joints().list()).ifPresent(this::retrust);
            case 5 -> entering.any(records.joints().list()).ifPresent(this::turn);
            case 6 -> entering.any(records.panels().list()).ifPresent(this::jumper);
            case 7 -> entering.any(records.panels().list()).ifPresent(this::circuit);
            default -> entering.any(records.circuits().list()).ifPresent(this::changeCircuit);
        }
    }

    private void join(Enclosure enclosure) {
        Sides all = new Sides(records, chance);
        List<Sides.Side> sides = all.in(enclosure.id());
        for (int tries = 4; tries > 0 && !sides.isEmpty(); tries--) {
            Sides.Side one = chance.of(sides);
            Sides.Side other = chance.of(sides);
            if (!one.port() || !other.port()) {
                Joint joint = all.joint(entering.next(RecordKind.JOINT), enclosure.id(), one, other, chance.in(20));
                entering.add(joint);
            }
        }
    }

    private void split(Joint joint) {
        int count = joint.count();
        if (count < 2 || !entering.remove(joint)) {
            return;
        }
        int cut = chance.between(1, count - 1);
        entering.add(part(joint, 0, cut - 1));
        if (chance.in(70)) {
            entering.add(part(joint, cut, count - 1));
        }
    }

    private Joint part(Joint joint, int from, int to) {
        return new Joint(
                entering.next(RecordKind.JOINT),
                joint.type(),
                joint.enclosure(),
                part(joint.a(), from, to),
                part(joint.b(), from, to),
                joint.facts());
    }

    private static EndRange part(EndRange ends, int from, int to) {
        return new EndRange(
                ends.leg(),
                new FiberRange(ends.numbers().at(from), ends.numbers().at(to)));
    }

    private void retrust(Joint joint) {
        JointFacts facts = joint.facts();
        entering.replace(
                joint,
                new Joint(
                        joint.id(),
                        joint.type(),
                        joint.enclosure(),
                        joint.a(),
                        joint.b(),
                        new JointFacts(
                                facts.tray(),
                                facts.method(),
                                facts.loss(),
                                joint.planned() ? Trust.POSTED : Trust.PLANNED,
                                facts.verifiedOn(),
                                facts.splicedOn(),
                                facts.splicedBy(),
                                facts.temporaryUntil(),
                                facts.job(),
                                facts.jumperLength())));
    }

    private void turn(Joint joint) {
        FiberRange numbers = joint.b().numbers();
        EndRange turned = new EndRange(joint.b().leg(), new FiberRange(numbers.at(numbers.count() - 1), numbers.at(0)));
        entering.replace(
                joint, new Joint(joint.id(), joint.type(), joint.enclosure(), joint.a(), turned, joint.facts()));
    }

    private void jumper(Panel panel) {
        int structure = records.enclosures().get(panel.enclosure()).structure();
        entering.any(records.panels()
                        .list()
                        .filter(other ->
                                records.enclosures().get(other.enclosure()).structure() == structure))
                .ifPresent(other -> entering.add(new Joint(
                        entering.next(RecordKind.JOINT),
                        JointKind.JUMPER,
                        panel.enclosure(),
                        front(panel),
                        front(other),
                        new FactsDraw(chance).jumper())));
    }

    private EndRange front(Panel panel) {
        return new EndRange(new Leg(LegKind.FRONT, panel.id()), FiberRange.of(chance.between(1, panel.ports())));
    }

    private void circuit(Panel a) {
        Panel z = chance.of(records.panels().list().toList());
        int id = entering.next(RecordKind.CIRCUIT);
        FiberRange portA = front(a).numbers();
        FiberRange portZ = front(z).numbers();
        if (a.id() != z.id() || !portA.equals(portZ)) {
            entering.add(new Circuit(
                    id,
                    "C+" + chance.between(100, 999) + "-" + id,
                    null,
                    null,
                    3,
                    1,
                    List.of(Wavelength.ofNanometres(1310)),
                    null,
                    null,
                    new PortRange(a.id(), portA),
                    new PortRange(z.id(), portZ),
                    CircuitStatus.WORKING));
        }
    }

    private void changeCircuit(Circuit circuit) {
        if (chance.in(30)) {
            entering.remove(circuit);
            return;
        }
        boolean swapped = chance.in(50);
        entering.replace(
                circuit,
                new Circuit(
                        circuit.id(),
                        chance.in(30) ? "A-" + circuit.code() : circuit.code(),
                        circuit.service(),
                        circuit.customer(),
                        circuit.priority(),
                        circuit.customersServed(),
                        circuit.wavelengths(),
                        circuit.budget(),
                        circuit.protectionGroup(),
                        swapped ? circuit.z() : circuit.a(),
                        swapped ? circuit.a() : circuit.z(),
                        chance.of(CircuitStatus.values())));
    }
}
