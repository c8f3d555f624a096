package spanwright.network;

import spanwright.splicing.Leg;

/**
 * Where the ends of a leg are.
 *
 * @param first the end numbered 1, or NONE where the leg is not in the network
 * @param count how many there are
 */
record LegEnds(int first, int count) {

    private static final int NONE = -1;
    private static final LegEnds NOWHERE = new LegEnds(NONE, 0);

    static LegEnds of(Blocks blocks, Leg leg) {
        int block = blocks.blockOfLeg(leg.kind(), leg.owner());
        return block == NONE
                ? NOWHERE
                : new LegEnds(blocks.firstEnd(block, leg.kind()), blocks.endCount(block, leg.kind()));
    }

    boolean present() {
        return first != NONE;
    }

    /** The end with a number, or NONE where there is none. */
    int at(int number) {
        return number <= count ? first + 2 * (number - 1) : NONE;
    }
}
