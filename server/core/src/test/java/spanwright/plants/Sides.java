package spanwright.plants;

import java.util.ArrayList;
import java.util.List;
import spanwright.plant.Cable;
import spanwright.plant.FiberRange;
import spanwright.plant.Pass;
import spanwright.plant.RunRow;
import spanwright.records.RecordsView;
import spanwright.records.Relation;
import spanwright.splicing.EndRange;
import spanwright.splicing.Joint;
import spanwright.splicing.JointKind;
import spanwright.splicing.Leg;
import spanwright.splicing.LegKind;

/** The sides that can be joined in an enclosure, and random joints between them. */
final class Sides {

    private final RecordsView records;
    private final Chance chance;
    private final FactsDraw facts;

    Sides(RecordsView records, Chance chance) {
        this.records = records;
        this.chance = chance;
        this.facts = new FactsDraw(chance);
    }

    /** A side with its count of ends. */
    record Side(Leg leg, int count) {

        boolean port() {
            return leg.kind() == LegKind.REAR;
        }

        boolean splitter() {
            return leg.kind() == LegKind.IN || leg.kind() == LegKind.OUT;
        }
    }

    List<Side> in(int enclosure) {
        List<Side> sides = new ArrayList<>();
        records.passes().owned(Relation.ENCLOSURE_PASSES, enclosure).forEach(pass -> sides.addAll(of(pass)));
        records.splitters().owned(Relation.ENCLOSURE_SPLITTERS, enclosure).forEach(splitter -> {
            sides.add(new Side(new Leg(LegKind.IN, splitter.id()), splitter.inputs()));
            sides.add(new Side(new Leg(LegKind.OUT, splitter.id()), splitter.outputs()));
        });
        records.panels()
                .owned(Relation.ENCLOSURE_PANELS, enclosure)
                .forEach(panel -> sides.add(new Side(new Leg(LegKind.REAR, panel.id()), panel.ports())));
        return sides;
    }

    List<Side> of(Pass pass) {
        List<Side> sides = new ArrayList<>();
        RunRow row = records.runRows().get(pass.runRow());
        Cable cable = records.cables().get(pass.cable());
        int fibers = records.cableTypes().get(cable.cableType()).fibers();
        if (row.seq() > 0) {
            sides.add(new Side(new Leg(LegKind.BACK, row.id()), fibers));
        }
        if (row.seq() < records.owned(Relation.CABLE_RUN_ROWS, cable.id()).length - 1) {
            sides.add(new Side(new Leg(LegKind.AHEAD, row.id()), fibers));
        }
        return sides;
    }

    /** A splice or termination between two sides of an enclosure, its ends perhaps not free; not between two rears. */
    Joint joint(int id, int enclosure, Side one, Side other, boolean planned) {
        Side a = other.port() ? other : one;
        Side b = other.port() ? one : other;
        boolean singles = a.leg().kind() == LegKind.IN || b.leg().kind() == LegKind.IN;
        int count = singles ? 1 : chance.between(1, Math.min(8, Math.min(a.count(), b.count())));
        return new Joint(
                id,
                a.port() ? JointKind.TERMINATION : JointKind.SPLICE,
                enclosure,
                ends(a, count),
                ends(b, count),
                a.port() ? facts.termination(planned, b.splitter()) : facts.splice(planned));
    }

    private EndRange ends(Side side, int count) {
        int first = chance.between(1, side.count() - count + 1);
        int last = first + count - 1;
        return new EndRange(side.leg(), chance.in(70) ? new FiberRange(first, last) : new FiberRange(last, first));
    }
}
