package spanwright.network;

import spanwright.paged.PageSize;
import spanwright.paged.PagedInts;

/**
 * The glass paths: each the longest chain of pieces joined without a choice, through uncut fibers, splices,
 * terminations, ports and jumpers. A path ends where nothing is joined, so also at a splitter's terminal. Immutable.
 *
 * <p>A path is four ints in a row, its own cache line's neighbours: where its slice is, its first and last end, the
 * circuit on it. A slice is the count of pieces (below 0 for a circle) and then, in order, the end by which a walk
 * enters each piece. Lost to this: offsets and ends in arrays of their own, three misses a path instead of one.
 */
public final class PathIndex {

    static final int STRIDE = 4;
    static final int OFFSET = 0;
    /** In an answer of {@link #across}, where a row has its offset. */
    static final int PATH = 0;

    static final int FIRST = 1;
    static final int LAST = 2;
    static final int CIRCUIT = 3;
    /** The offset of a path number not in use; its first end is then the next such number. */
    static final int UNUSED = -1;
    /** Set in a circuit's identity where the path has others beside it. */
    static final int SHARED = 1 << 31;
    /** Set in a circuit's identity where another circuit begins at one of the path's ends and goes elsewhere. */
    static final int BESIDE = 1 << 30;

    private static final int IDENTITY = ~(SHARED | BESIDE);

    static final int NONE = -1;

    /** Pages of {@link #paths}: rows are read all over the place. Lost to this: pages of 2,048, a sixth slower. */
    static final PageSize PATHS_PAGE = PageSize.LARGE;
    /** Pages of {@link #slices}: written once, at the end. */
    static final PageSize SLICES_PAGE = PageSize.LARGE;

    final PagedInts pathOf;
    final PagedInts paths;
    final PagedInts slices;
    /** The first path number not in use, or NONE. */
    final int unused;
    /** How many ints of the slices belong to no path any more. */
    final int garbage;

    PathIndex(PagedInts pathOf, PagedInts paths, PagedInts slices, int unused, int garbage) {
        this.pathOf = pathOf;
        this.paths = paths;
        this.slices = slices;
        this.unused = unused;
        this.garbage = garbage;
    }

    static PathIndex empty() {
        return new PathIndex(PagedInts.empty(), PagedInts.empty(PATHS_PAGE), PagedInts.empty(SLICES_PAGE), NONE, 0);
    }

    /** The path of a piece; {@link Network#NONE} where the piece is dead. */
    public int pathOf(int piece) {
        return pathOf.get(piece);
    }

    /** Path numbers are from 0 to this less 1; some may not be in use. */
    public int limit() {
        return paths.size() / STRIDE;
    }

    /** Whether a path number is in use. */
    public boolean exists(int path) {
        return paths.get(path * STRIDE + OFFSET) != UNUSED;
    }

    /** How many pieces a path has, 1 or more. */
    public int length(int path) {
        return Math.abs(slices.get(paths.get(path * STRIDE + OFFSET)));
    }

    /** Whether a path runs in a circle: its first and last end are then each other's peer. */
    public boolean circle(int path) {
        return slices.get(paths.get(path * STRIDE + OFFSET)) < 0;
    }

    /** The end by which a walk along a path enters its piece at an index from 0 to length - 1. */
    public int end(int path, int index) {
        return slices.get(paths.get(path * STRIDE + OFFSET) + 1 + index);
    }

    /** The ends by which a walk along a path enters its pieces, in order: a fresh array. */
    public int[] ends(int path) {
        int offset = paths.get(path * STRIDE + OFFSET);
        int[] ends = new int[Math.abs(slices.get(offset))];
        slices.copyTo(offset + 1, ends.length, ends);
        return ends;
    }

    /** The end where a path begins; nothing is joined to it but in a circle. */
    public int firstEnd(int path) {
        return paths.get(path * STRIDE + FIRST);
    }

    /** The end where a path ends; nothing is joined to it but in a circle. */
    public int lastEnd(int path) {
        return paths.get(path * STRIDE + LAST);
    }

    /**
     * The circuit whose a port and z port are a path's two ends, whichever way round, retired ones left out; of several
     * the first by code; 0 for none. A circuit that crosses a splitter is on none of its glass paths.
     */
    public int circuit(int path) {
        return paths.get(path * STRIDE + CIRCUIT) & IDENTITY;
    }

    /** Whether a path has more circuits than the one that {@link #circuit} gives. */
    public boolean shared(int path) {
        return (paths.get(path * STRIDE + CIRCUIT) & SHARED) != 0;
    }

    /**
     * The circuit of a path that is the only one on it, and the only one that begins at either of its ends; 0 where
     * there is none, or where others have to be looked for.
     */
    public int circuitAlone(int path) {
        int tag = paths.get(path * STRIDE + CIRCUIT);
        return (tag & ~IDENTITY) == 0 ? tag : 0;
    }

    /**
     * Both ends and the circuit of the path of each of neighbouring pieces, such as the fibers of a block: the quick
     * answer to what a cut there takes down.
     *
     * @param firstPiece the first piece; all are alive
     * @param count how many pieces
     * @return per piece four ints: path, first end, last end, circuit (0 for none)
     */
    public int[] across(int firstPiece, int count) {
        int[] across = new int[count];
        pathOf.copyTo(firstPiece, count, across);
        int[] found = new int[STRIDE * count];
        paths.copyRows(across, count, found);
        for (int index = 0, at = 0; index < count; index++, at += STRIDE) {
            found[at + PATH] = across[index];
            found[at + CIRCUIT] &= IDENTITY;
        }
        return found;
    }

    /**
     * The whole path of each of neighbouring pieces: what {@link #ends} gives for each, in one list.
     *
     * @param firstPiece the first piece; all are alive
     * @param count how many pieces
     * @param into is filled anew
     */
    public void listAcross(int firstPiece, int count, PathList into) {
        int[] rows = across(firstPiece, count);
        // Each step goes over all paths, as the memory answers many questions as soon as one.
        for (int at = 0; at < rows.length; at += STRIDE) {
            rows[at] = paths.get(rows[at] * STRIDE + OFFSET);
        }
        into.begin(count);
        for (int index = 0; index < count; index++) {
            into.add(Math.abs(slices.get(rows[index * STRIDE])));
        }
        int[] ends = into.room();
        for (int index = 0; index < count; index++) {
            int from = into.from(index);
            slices.copyTo(rows[index * STRIDE] + 1, into.from(index + 1) - from, ends, from);
        }
    }

    /** Heap bytes held. */
    public long heapBytes() {
        return pathOf.heapBytes() + paths.heapBytes() + slices.heapBytes();
    }
}
