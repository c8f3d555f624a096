package spanwright.check;

import java.util.function.Consumer;
import spanwright.splicing.FiberFlag;
import spanwright.splicing.Flag;
import spanwright.splicing.Joint;
import spanwright.splicing.SpliceMethod;

/** What has lapsed: reservations, temporary joints, and mechanical splices that no date ends. */
final class DueRules implements Rule {

    @Override
    public void find(Checked checked, Consumer<Finding> found) {
        checked.records().joints().list().filter(joint -> !joint.planned()).forEach(joint -> {
            temporary(checked, joint, found);
            mechanical(checked, joint, found);
        });
        checked.records().fiberFlags().list().forEach(flag -> reservation(checked, flag, found));
    }

    private static void temporary(Checked checked, Joint joint, Consumer<Finding> found) {
        var until = joint.facts().temporaryUntil();
        if (until != null && until.isBefore(checked.today())) {
            found.accept(new Finding(
                    Severity.WARNING,
                    "temporary-lapsed",
                    JointText.file(joint),
                    checked.enclosure(joint.enclosure()).code(),
                    JointText.of(checked, joint) + " was temporary until " + until + ".",
                    "Undo it, make it lasting, or give it a later date."));
        }
    }

    /** Mechanical splices are for a while only (common practice in cooperative plant). */
    private static void mechanical(Checked checked, Joint joint, Consumer<Finding> found) {
        if (joint.facts().method() == SpliceMethod.MECHANICAL && joint.facts().temporaryUntil() == null) {
            found.accept(new Finding(
                    Severity.NOTE,
                    "mechanical-without-end",
                    JointText.file(joint),
                    checked.enclosure(joint.enclosure()).code(),
                    JointText.of(checked, joint) + " is a mechanical splice with no last day.",
                    "Give it a temporary_until date, or record the fusion splice that replaced it."));
        }
    }

    private static void reservation(Checked checked, FiberFlag flag, Consumer<Finding> found) {
        if (flag.flag() == Flag.RESERVED && flag.until() != null && flag.until().isBefore(checked.today())) {
            String whose = flag.owner() == null ? "" : " for " + flag.owner();
            found.accept(new Finding(
                    Severity.WARNING,
                    "reservation-lapsed",
                    "fiber_flags.csv",
                    checked.cable(flag.cable()),
                    checked.cable(flag.cable()) + ":" + flag.fibers() + " is reserved" + whose + " until "
                            + flag.until() + ", which is past.",
                    "Free the fibers, or agree on a later date."));
        }
    }
}
