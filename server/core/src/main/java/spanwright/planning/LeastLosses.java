package spanwright.planning;

import java.util.Arrays;

/** The least loss with which each state was reached so far; only states reached take room. */
final class LeastLosses {

    private static final int FREE = -1;

    private int[] states = free(1 << 10);
    private long[] losses = new long[1 << 10];
    private int count;

    private static int[] free(int size) {
        int[] states = new int[size];
        Arrays.fill(states, FREE);
        return states;
    }

    private int slot(int state) {
        int slot = ((state * 0x9E3779B9) >>> 7) & (states.length - 1);
        while (states[slot] != FREE && states[slot] != state) {
            slot = (slot + 1) & (states.length - 1);
        }
        return slot;
    }

    /** Whether a state was reached with no more loss than this. */
    boolean atMost(int state, long loss) {
        int slot = slot(state);
        return states[slot] == state && losses[slot] <= loss;
    }

    /** Notes the loss with which a state is reached now. */
    void put(int state, long loss) {
        int slot = slot(state);
        if (states[slot] == FREE) {
            states[slot] = state;
            count++;
        }
        losses[slot] = loss;
        if (2 * count > states.length) {
            grow();
        }
    }

    private void grow() {
        int[] oldStates = states;
        long[] oldLosses = losses;
        states = free(2 * oldStates.length);
        losses = new long[states.length];
        for (int old = 0; old < oldStates.length; old++) {
            if (oldStates[old] != FREE) {
                int slot = slot(oldStates[old]);
                states[slot] = oldStates[old];
                losses[slot] = oldLosses[old];
            }
        }
    }
}
