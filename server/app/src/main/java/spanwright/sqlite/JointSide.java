package spanwright.sqlite;

import spanwright.plant.FiberRange;
import spanwright.splicing.EndRange;
import spanwright.splicing.Joint;

/**
 * One side of a range of joints, its ends by rising key, each with the end it is joined to.
 *
 * @param key the lowest key; the others follow it without gaps
 * @param count how many
 * @param peer the end to which the lowest is joined
 * @param step how far the peer of each next end lies from the one before: 1 or -1
 * @param joint the joint
 */
record JointSide(long key, int count, long peer, int step, int joint) {

    static JointSide of(Joint joint, boolean a) {
        EndRange here = a ? joint.a() : joint.b();
        EndRange there = a ? joint.b() : joint.a();
        FiberRange numbers = here.numbers();
        int lowest = numbers.step() > 0 ? 0 : here.count() - 1;
        int step = numbers.step() * there.numbers().step();
        return new JointSide(here.key(lowest), here.count(), there.key(lowest), step, joint.id());
    }

    /** The lowest key of a side, the rest left out. */
    static long key(Joint joint, boolean a) {
        EndRange here = a ? joint.a() : joint.b();
        FiberRange numbers = here.numbers();
        return here.leg().key(Math.min(numbers.first(), numbers.last()));
    }
}
