package spanwright.benchmarks.grid;

import java.util.Arrays;

/**
 * Which ends are joined, as plain arrays. An end of glass is twice its section plus 0 at the cable's beginning, 1 at
 * its end; beyond the glass come ports and splitter terminals, numbered as they are made.
 */
final class Joins {

    static final int FREE = -1;

    private final int[] peer;
    private int[] extraPeer = new int[1024];
    private int extras;

    Joins(int sections) {
        peer = new int[2 * sections];
        Arrays.fill(peer, FREE);
    }

    int glassEnds() {
        return peer.length;
    }

    /** A new end that is no glass: a port's rear or a splitter's terminal. */
    int newEnd() {
        if (extras == extraPeer.length) {
            extraPeer = Arrays.copyOf(extraPeer, extras * 2);
        }
        extraPeer[extras] = FREE;
        return peer.length + extras++;
    }

    int ends() {
        return peer.length + extras;
    }

    int peer(int end) {
        return end < peer.length ? peer[end] : extraPeer[end - peer.length];
    }

    void join(int a, int b) {
        set(a, b);
        set(b, a);
    }

    private void set(int end, int other) {
        if (peer(end) != FREE) {
            throw new IllegalStateException("joined already: " + end);
        }
        if (end < peer.length) {
            peer[end] = other;
        } else {
            extraPeer[end - peer.length] = other;
        }
    }
}
