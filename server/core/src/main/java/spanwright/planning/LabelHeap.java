package spanwright.planning;

import java.util.Arrays;

/**
 * The labels of one search, and those that wait, the one with the least work first, then the least loss, then the oldest.
 * A label says at which state a path stands, by which label it came there, its work and its loss.
 */
final class LabelHeap {

    private int[] states = new int[256];
    private int[] parents = new int[256];
    private long[] works = new long[256];
    private long[] losses = new long[256];
    private int count;
    private int[] heap = new int[256];
    private int size;

    /** Adds a label that waits. */
    void add(int state, int parent, long work, long loss) {
        if (count == states.length) {
            states = Arrays.copyOf(states, 2 * count);
            parents = Arrays.copyOf(parents, 2 * count);
            works = Arrays.copyOf(works, 2 * count);
            losses = Arrays.copyOf(losses, 2 * count);
        }
        states[count] = state;
        parents[count] = parent;
        works[count] = work;
        losses[count] = loss;
        if (size == heap.length) {
            heap = Arrays.copyOf(heap, 2 * size);
        }
        rise(count++, size++);
    }

    private void rise(int label, int from) {
        int at = from;
        while (at > 0 && before(label, heap[(at - 1) >> 1])) {
            heap[at] = heap[(at - 1) >> 1];
            at = (at - 1) >> 1;
        }
        heap[at] = label;
    }

    private boolean before(int one, int other) {
        if (works[one] != works[other]) {
            return works[one] < works[other];
        }
        return losses[one] != losses[other] ? losses[one] < losses[other] : one < other;
    }

    boolean isEmpty() {
        return size == 0;
    }

    /** Takes out the first that waits. */
    int poll() {
        int first = heap[0];
        int last = heap[--size];
        int at = 0;
        for (int child = 1; child < size; child = 2 * at + 1) {
            if (child + 1 < size && before(heap[child + 1], heap[child])) {
                child++;
            }
            if (!before(heap[child], last)) {
                break;
            }
            heap[at] = heap[child];
            at = child;
        }
        heap[at] = last;
        return first;
    }

    int state(int label) {
        return states[label];
    }

    int parent(int label) {
        return parents[label];
    }

    long work(int label) {
        return works[label];
    }

    long loss(int label) {
        return losses[label];
    }
}
