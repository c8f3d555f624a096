package spanwright.network;

import java.util.Arrays;

/** Pieces whose joining changed since the last build; past a number of them, all pieces count as touched. */
final class TouchedPieces {

    /** Up to so many, naming each is cheaper than doing all, however small the network. */
    private static final int FEW = 1 << 12;

    private int[] pieces = new int[16];
    private int size;
    private boolean all;

    /** Notes a piece, of so many in all; one may be noted twice. */
    void add(int piece, int inAll) {
        if (all) {
            return;
        }
        if (size == pieces.length) {
            if (size > Math.max(FEW, inAll / 2)) {
                addAll();
                return;
            }
            pieces = Arrays.copyOf(pieces, size * 2);
        }
        pieces[size++] = piece;
    }

    /** Notes all pieces. */
    void addAll() {
        all = true;
        pieces = new int[0];
        size = 0;
    }

    /** Whether so many are touched that all count as touched. */
    boolean all() {
        return all;
    }

    boolean isEmpty() {
        return size == 0 && !all;
    }

    int size() {
        return size;
    }

    int get(int index) {
        return pieces[index];
    }
}
