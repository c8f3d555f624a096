package spanwright.planning;

import spanwright.splicing.JointKind;

/**
 * A joint that a path needs and that is not there yet.
 *
 * @param kind what joins; of a termination the rear is {@code a}
 * @param enclosure identity of the enclosure; for a jumper that of its a side's panel
 * @param a one end, in the network
 * @param b the other end
 */
public record NewJoint(JointKind kind, int enclosure, int a, int b) {

    /** The length of a new jumper, in metres: that of a jumper of which none is recorded. */
    public static final int JUMPER_METRES = 3;
}
