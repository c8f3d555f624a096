package spanwright.answers;

import spanwright.planning.FiberUse;

/** Fibers by use. */
final class UseCounts {

    private final int[] counts = new int[FiberUse.values().length];

    void add(FiberUse use) {
        counts[use.ordinal()]++;
    }

    void write(Json json) {
        for (FiberUse use : FiberUse.values()) {
            json.whole(use.word(), counts[use.ordinal()]);
        }
    }
}
