package spanwright.benchmarks.grid;

import java.util.Arrays;
import java.util.Random;

/**
 * What no circuit uses: at each node, the nodes in random order, a fiber goes on straight to the same number, if that is free too; else it is
 * spliced to a spare one at random, by groups of up to 12 that lie side by side as ribbons do, and be it back into the
 * same cable; else it stays dark. A chain holds 61 sections at the most and never closes on itself.
 */
final class SpareGlass {

    private static final int RIBBON = 12;
    /** So many places are tried for a group; a crew does not look for ever either. */
    private static final int TRIES = 8;

    private final Grid grid;
    private final Joins joins;
    private final Random random;
    private final Chains chains;
    private int[] free = new int[64];
    private int freeCount;

    SpareGlass(Grid grid, Joins joins, Random random) {
        this.grid = grid;
        this.joins = joins;
        this.random = random;
        this.chains = new Chains(grid.sections, joins);
    }

    void splice() {
        for (int node : Grid.shuffled(grid.nodes(), random)) {
            straight(node, Grid.EAST);
            straight(node, Grid.SOUTH);
            spare(node);
        }
    }

    private void straight(int node, int direction) {
        int ahead = grid.cable(node, direction);
        int back = grid.cable(node, direction + 2);
        if (ahead < 0 || back < 0) {
            return;
        }
        int count = Math.min(grid.fibers[ahead], grid.fibers[back]);
        for (int fiber = 0; fiber < count; fiber++) {
            join(end(node, back, fiber), end(node, ahead, fiber));
        }
    }

    private void spare(int node) {
        freeCount = 0;
        for (int direction = 0; direction < 4; direction++) {
            gather(node, grid.cable(node, direction));
        }
        for (int first = 0; first < freeCount; ) {
            int group = group(first);
            int done = 0;
            for (int tries = 0; tries < TRIES && done == 0; tries++) {
                done = join(first, group, random.nextInt(freeCount));
            }
            first += Math.max(1, done);
        }
    }

    private void gather(int node, int cable) {
        if (cable < 0) {
            return;
        }
        for (int fiber = 0; fiber < grid.fibers[cable]; fiber++) {
            if (joins.peer(end(node, cable, fiber)) == Joins.FREE) {
                if (freeCount == free.length) {
                    free = Arrays.copyOf(free, freeCount * 2);
                }
                free[freeCount++] = end(node, cable, fiber);
            }
        }
    }

    /** How many of the ends gathered are still free and lie side by side in one cable from one on, up to a ribbon. */
    private int group(int first) {
        int cable = grid.cableOf(free[first] >> 1);
        int count = 0;
        while (count < RIBBON
                && first + count < freeCount
                && free[first + count] == free[first] + 2 * count
                && grid.cableOf(free[first + count] >> 1) == cable
                && joins.peer(free[first + count]) == Joins.FREE) {
            count++;
        }
        return count;
    }

    /** Joins a group to other ends of the node, the same cable's too, and gives how many were joined. */
    private int join(int first, int group, int other) {
        int count = Math.min(group, group(other));
        int done = 0;
        for (int index = 0; index < count; index++) {
            done += join(free[first + index], free[other + index]) ? 1 : 0;
        }
        return done;
    }

    /** Joins two ends if both are free and their chains fit. */
    private boolean join(int one, int other) {
        boolean fit =
                joins.peer(one) == Joins.FREE && joins.peer(other) == Joins.FREE && chains.fits(one >> 1, other >> 1);
        if (fit) {
            joins.join(one, other);
            chains.unite(one >> 1, other >> 1);
        }
        return fit;
    }

    private int end(int node, int cable, int fiber) {
        return 2 * (grid.firstSection[cable] + fiber) + (grid.from[cable] == node ? 0 : 1);
    }
}
