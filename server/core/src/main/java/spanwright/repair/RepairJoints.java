package spanwright.repair;

import java.util.List;
import spanwright.journal.RecordKind;
import spanwright.plant.CableType;
import spanwright.plant.Enclosure;
import spanwright.plant.EnclosureKind;
import spanwright.plant.FiberRange;
import spanwright.plant.Pass;
import spanwright.plant.PlantState;
import spanwright.plant.RunRow;
import spanwright.plant.Trust;
import spanwright.splicing.EndRange;
import spanwright.splicing.Joint;
import spanwright.splicing.JointFacts;
import spanwright.splicing.JointKind;
import spanwright.splicing.Leg;
import spanwright.splicing.LegKind;

/** An enclosure at each end of the piece, and in it every fiber joined straight. */
final class RepairJoints {

    private final RepairEntry entry;
    private final RepairOrder order;
    private final CableType type;

    RepairJoints(RepairEntry entry, RepairOrder order, CableType type) {
        this.entry = entry;
        this.order = order;
        this.type = type;
    }

    /**
     * Joins two parts.
     *
     * @return the enclosure in which they are joined
     */
    int join(RepairOrder.Place place, RunRow back, RunRow ahead) {
        int enclosure = enclosure(place, back.structure());
        pass(enclosure, back);
        pass(enclosure, ahead);
        for (int fiber = 1; fiber <= type.fibers(); fiber += type.fibersPerTube()) {
            FiberRange tube = new FiberRange(fiber, Math.min(type.fibers(), fiber + type.fibersPerTube() - 1));
            entry.add(new Joint(
                    entry.next(RecordKind.JOINT),
                    JointKind.SPLICE,
                    enclosure,
                    new EndRange(new Leg(LegKind.BACK, back.id()), tube),
                    new EndRange(new Leg(LegKind.AHEAD, ahead.id()), tube),
                    facts()));
        }
        return enclosure;
    }

    private JointFacts facts() {
        return new JointFacts(
                null,
                order.method(),
                null,
                Trust.REPORTED,
                null,
                order.on(),
                order.by(),
                order.temporaryUntil(),
                order.job(),
                null);
    }

    private int enclosure(RepairOrder.Place place, int structure) {
        return entry.records()
                .enclosures()
                .find(place.enclosure())
                .map(Enclosure::id)
                .orElseGet(() -> entry.add(new Enclosure(
                                entry.next(RecordKind.ENCLOSURE),
                                place.enclosure(),
                                structure,
                                EnclosureKind.CLOSURE,
                                place.trayGlass(),
                                PlantState.IN_SERVICE,
                                null))
                        .id());
    }

    private void pass(int enclosure, RunRow row) {
        entry.add(new Pass(entry.next(RecordKind.PASS), enclosure, row.cable(), row.id(), List.of(), List.of()));
    }
}
