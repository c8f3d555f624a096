package spanwright.sqlite;

import spanwright.plant.FiberRange;
import spanwright.splicing.EndRange;
import spanwright.splicing.Joint;

/**
 * One side of a range of joints: its ends by rising key.
 *
 * @param key the lowest key; the others follow it without gaps
 * @param count how many
 * @param joint the joint
 */
record JointSide(long key, int count, int joint) {

    static JointSide of(Joint joint, boolean a) {
        return new JointSide(key(joint, a), joint.count(), joint.id());
    }

    /** The lowest key of a side, the rest left out. */
    static long key(Joint joint, boolean a) {
        EndRange here = a ? joint.a() : joint.b();
        FiberRange numbers = here.numbers();
        return here.leg().key(Math.min(numbers.first(), numbers.last()));
    }
}
