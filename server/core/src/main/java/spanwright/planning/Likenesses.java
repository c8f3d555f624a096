package spanwright.planning;

import java.util.Arrays;

/**
 * The likenesses that a search tried, each with the glass path that had it first. Kept apart from boxed maps: a search asks
 * some millions of times.
 */
final class Likenesses {

    private static final int FREE = -1;

    private long[] likenesses = new long[16];
    private int[] paths = free(16);
    private int count;

    private static int[] free(int size) {
        int[] paths = new int[size];
        Arrays.fill(paths, FREE);
        return paths;
    }

    /** Whether another path of that likeness came before; notes this one where none did. */
    boolean isTried(long likeness, int path) {
        int slot = slot(likeness);
        if (paths[slot] != FREE) {
            return paths[slot] != path;
        }
        likenesses[slot] = likeness;
        paths[slot] = path;
        if (2 * ++count > paths.length) {
            grow();
        }
        return false;
    }

    private int slot(long likeness) {
        int slot = (int) ((likeness * 0x9E3779B97F4A7C15L) >>> 40) & (paths.length - 1);
        while (paths[slot] != FREE && likenesses[slot] != likeness) {
            slot = (slot + 1) & (paths.length - 1);
        }
        return slot;
    }

    private void grow() {
        long[] oldLikenesses = likenesses;
        int[] oldPaths = paths;
        likenesses = new long[2 * oldPaths.length];
        paths = free(2 * oldPaths.length);
        for (int old = 0; old < oldPaths.length; old++) {
            if (oldPaths[old] != FREE) {
                int slot = slot(oldLikenesses[old]);
                likenesses[slot] = oldLikenesses[old];
                paths[slot] = oldPaths[old];
            }
        }
    }
}
