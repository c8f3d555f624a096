package spanwright.trace;

import spanwright.plant.Enclosure;
import spanwright.plant.Structure;
import spanwright.splicing.Joint;
import spanwright.splicing.JointKind;
import spanwright.splicing.SpliceMethod;

/**
 * A splice crossed; that of a termination's pigtail too.
 *
 * @param joint the row of the records that it is part of: its trust, tray, loss
 * @param method how it is made
 * @param enclosure where it is
 * @param structure where that is
 * @param aKey key of the end that the walk comes from
 * @param bKey key of the end that the walk goes to
 * @param a name of the end that the walk comes from, within the enclosure; of a pigtail's the port
 * @param b name of the end that the walk goes to
 */
public record Splice(
        Joint joint,
        SpliceMethod method,
        Enclosure enclosure,
        Structure structure,
        long aKey,
        long bKey,
        String a,
        String b)
        implements Element {

    @Override
    public ElementKind kind() {
        return ElementKind.SPLICE;
    }

    /** Whether it is the splice of a termination's pigtail. */
    public boolean pigtail() {
        return joint.type() == JointKind.TERMINATION;
    }
}
