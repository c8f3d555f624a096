package spanwright.planning;

import spanwright.network.Network;
import spanwright.planning.OpenTubes.Cutting;

/**
 * Which ends may be joined anew, and what it takes: one that is joined has its joint undone, one that goes through uncut is
 * cut in its tube. What was asked is kept; one thread's.
 */
final class FreeableEnds {

    private static final Cutting[] KINDS = Cutting.values();

    private final SpareGlass glass;
    private final Network network;
    /** By end: 0 where it was not asked yet, else one more than the ordinal of what it takes. */
    private final byte[] known;

    FreeableEnds(SpareGlass glass) {
        this.glass = glass;
        this.network = glass.snapshot().network();
        this.known = new byte[2 * network.pieces()];
    }

    /** What it takes to free an end; an end that is free takes what one in an open tube does: nothing. */
    Cutting freeing(int end) {
        if (known[end] == 0) {
            known[end] = (byte) (judge(end).ordinal() + 1);
        }
        return KINDS[known[end] - 1];
    }

    private Cutting judge(int end) {
        boolean joined = network.peer(end) != Network.NONE;
        if (network.joint(end) != 0) {
            return joined && !glass.isHeldJoint(end) ? Cutting.IN_OPEN_TUBE : Cutting.FORBIDDEN;
        }
        return joined ? glass.tubes().cutting(end) : Cutting.IN_OPEN_TUBE;
    }
}
