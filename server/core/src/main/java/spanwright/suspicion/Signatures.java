package spanwright.suspicion;

import java.util.Arrays;
import java.util.SplittableRandom;

/**
 * Which circuits live on each unit, as counts and as a 128-bit sum of random numbers, one a circuit: units with the same
 * sum have the same circuits, but for a chance of 2^-128 a pair. So units are told apart without a set for each.
 */
final class Signatures {

    private static final long SEED = 42;

    private final SplittableRandom random = new SplittableRandom(SEED);
    private int[] down = new int[0];
    private int[] up = new int[0];
    private long[] low = new long[0];
    private long[] high = new long[0];
    private int[] seen = new int[0];
    private int circuit;
    private boolean dark;
    private long lowKey;
    private long highKey;

    /** A sum. */
    record Sum(long low, long high) {}

    /** Begins the next circuit. */
    void next(boolean isDown) {
        circuit++;
        dark = isDown;
        lowKey = random.nextLong();
        highKey = random.nextLong();
    }

    /** The circuit lives on a unit. */
    void add(int unit) {
        if (unit >= seen.length) {
            grow(Math.max(unit + 1, 2 * seen.length));
        }
        if (seen[unit] != circuit) {
            seen[unit] = circuit;
            low[unit] += lowKey;
            high[unit] += highKey;
            if (dark) {
                down[unit]++;
            } else {
                up[unit]++;
            }
        }
    }

    private void grow(int size) {
        down = Arrays.copyOf(down, size);
        up = Arrays.copyOf(up, size);
        low = Arrays.copyOf(low, size);
        high = Arrays.copyOf(high, size);
        seen = Arrays.copyOf(seen, size);
    }

    int down(int unit) {
        return unit < down.length ? down[unit] : 0;
    }

    int up(int unit) {
        return unit < up.length ? up[unit] : 0;
    }

    Sum sum(int unit) {
        return new Sum(low[unit], high[unit]);
    }
}
