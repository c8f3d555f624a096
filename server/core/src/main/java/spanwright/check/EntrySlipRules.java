package spanwright.check;

import java.util.function.Consumer;
import spanwright.plant.CableType;
import spanwright.plant.FiberRange;
import spanwright.records.RecordsView;
import spanwright.splicing.EndRange;
import spanwright.splicing.Joint;
import spanwright.splicing.JointKind;

/** Slips of the hand that a sheet still shows: tubes twelve apart, a ribbon laid upside down. */
final class EntrySlipRules implements Rule {

    private static final int COLOR_CYCLE = 12;

    @Override
    public void find(Checked checked, Consumer<Finding> found) {
        checked.records()
                .joints()
                .list()
                .filter(joint -> joint.type() == JointKind.SPLICE && onCables(joint))
                .forEach(joint -> {
                    tubesTwelveApart(checked, joint, found);
                    ribbonTurned(checked, joint, found);
                });
    }

    private static boolean onCables(Joint joint) {
        return onCable(joint.a()) && onCable(joint.b());
    }

    private static boolean onCable(EndRange side) {
        return switch (side.leg().kind()) {
            case BACK, AHEAD -> true;
            default -> false;
        };
    }

    /** Tubes of one colour, with and without tracer, taken for each other: colours repeat after twelve. */
    private static void tubesTwelveApart(Checked checked, Joint joint, Consumer<Finding> found) {
        CableType a = type(checked.records(), joint.a());
        CableType b = type(checked.records(), joint.b());
        if (a.fibersPerTube() != b.fibersPerTube() || a.tubes() <= COLOR_CYCLE || b.tubes() <= COLOR_CYCLE) {
            return;
        }
        int tubeA = a.tubeOf(joint.a().numbers().first());
        int tubeB = b.tubeOf(joint.b().numbers().first());
        if (Math.abs(tubeA - tubeB) == COLOR_CYCLE) {
            found.accept(new Finding(
                    Severity.WARNING,
                    "tubes-twelve-apart",
                    "splices.csv",
                    checked.enclosure(joint.enclosure()).code(),
                    JointText.of(checked, joint) + " joins tube " + tubeA + " to tube " + tubeB
                            + ": the same colour, one with a tracer.",
                    "Look at the tubes: if they are crossed, mend the glass or the records."));
        }
    }

    private static void ribbonTurned(Checked checked, Joint joint, Consumer<Finding> found) {
        FiberRange a = joint.a().numbers();
        FiberRange b = joint.b().numbers();
        if (a.count() == COLOR_CYCLE && a.step() != b.step()) {
            found.accept(new Finding(
                    Severity.WARNING,
                    "ribbon-turned",
                    "splices.csv",
                    checked.enclosure(joint.enclosure()).code(),
                    JointText.of(checked, joint) + " is the exact reverse of twelve: a ribbon laid upside down?",
                    "Look at the ribbon, or prove the fibers by light from end to end."));
        }
    }

    private static CableType type(RecordsView records, EndRange side) {
        int cable = records.runRows().get(side.leg().owner()).cable();
        return records.cableTypes().get(records.cables().get(cable).cableType());
    }
}
