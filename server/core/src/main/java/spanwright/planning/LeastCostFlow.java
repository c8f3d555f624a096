package spanwright.planning;

import java.util.ArrayDeque;
import java.util.Arrays;
import java.util.Deque;

/**
 * Sends units through a net of arcs at the least cost: one unit after another along the cheapest way that is left, going
 * back on earlier ones where that is cheaper (successive shortest paths).
 */
final class LeastCostFlow {

    private static final int NONE = -1;

    private int nodes;
    private int[] firstOf = new int[256];
    private int arcs;
    private int[] nextOf = new int[1024];
    private int[] target = new int[1024];
    private int[] room = new int[1024];
    private long[] price = new long[1024];
    private long cost;

    /** A fresh node. */
    int node() {
        if (nodes == firstOf.length) {
            firstOf = Arrays.copyOf(firstOf, 2 * nodes);
        }
        firstOf[nodes] = NONE;
        return nodes++;
    }

    /** A fresh arc of a cost not below 0. */
    int arc(int from, int to, int most, long each) {
        int arc = half(from, to, most, each);
        half(to, from, 0, -each);
        return arc;
    }

    private int half(int from, int to, int most, long each) {
        if (arcs == target.length) {
            nextOf = Arrays.copyOf(nextOf, 2 * arcs);
            target = Arrays.copyOf(target, 2 * arcs);
            room = Arrays.copyOf(room, 2 * arcs);
            price = Arrays.copyOf(price, 2 * arcs);
        }
        target[arcs] = to;
        room[arcs] = most;
        price[arcs] = each;
        nextOf[arcs] = firstOf[from];
        firstOf[from] = arcs;
        return arcs++;
    }

    /** How many units an arc carries. */
    int carried(int arc) {
        return room[arc ^ 1];
    }

    /** What all units sent cost together. */
    long cost() {
        return cost;
    }

    /** Sends so many units; false where they do not all go through. */
    boolean send(int from, int to, int units) {
        for (int unit = 0; unit < units; unit++) {
            if (!sendOne(from, to)) {
                return false;
            }
        }
        return true;
    }

    private boolean sendOne(int from, int to) {
        long[] least = new long[nodes];
        int[] by = new int[nodes];
        Arrays.fill(least, Long.MAX_VALUE);
        Arrays.fill(by, NONE);
        least[from] = 0;
        spread(from, least, by);
        if (by[to] == NONE) {
            return false;
        }
        for (int node = to; node != from; node = target[by[node] ^ 1]) {
            room[by[node]]--;
            room[by[node] ^ 1]++;
        }
        cost += least[to];
        return true;
    }

    private void spread(int from, long[] least, int[] by) {
        Deque<Integer> changed = new ArrayDeque<>();
        boolean[] waiting = new boolean[nodes];
        changed.add(from);
        while (!changed.isEmpty()) {
            int node = changed.poll();
            waiting[node] = false;
            for (int arc = firstOf[node]; arc != NONE; arc = nextOf[arc]) {
                int next = target[arc];
                if (room[arc] > 0 && least[node] + price[arc] < least[next]) {
                    least[next] = least[node] + price[arc];
                    by[next] = arc;
                    if (!waiting[next]) {
                        waiting[next] = true;
                        changed.add(next);
                    }
                }
            }
        }
    }
}
