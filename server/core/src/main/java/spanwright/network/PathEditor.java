package spanwright.network;

import java.util.Arrays;
import java.util.function.IntUnaryOperator;
import spanwright.paged.PagedInts;

/**
 * Lays afresh the paths that changes touched, and no others. Every part of a path that a change cut holds a touched
 * piece, so walking from the touched pieces meets all that needs a new label; the number that most of a new path's
 * pieces have is kept where it can be, so that few labels are written.
 */
final class PathEditor {

    private static final int NONE = -1;
    private static final int STRIDE = PathIndex.STRIDE;
    private static final int GARBAGE_AT_LEAST = 1 << 14;

    private final Blocks blocks;
    private final Links links;
    private final PagedInts.Editor pathOf;
    private final PagedInts.Editor paths;
    private final PagedInts.Editor slices;
    private int unused;
    private int garbage;

    private int[] freed = new int[16];
    private int freedCount;
    private int[] laid = new int[16];
    private int laidCount;
    private int[] walk = new int[64];

    PathEditor(PathIndex base, Blocks blocks, Links links) {
        this.blocks = blocks;
        this.links = links;
        this.pathOf = base.pathOf.edit();
        this.paths = base.paths.edit();
        this.slices = base.slices.edit();
        this.unused = base.unused;
        this.garbage = base.garbage;
    }

    /** Lays the touched paths; afterwards {@link #laidCount} of them are new. */
    void relay(TouchedPieces touched) {
        pathOf.grow(blocks.pieces(), NONE);
        for (int index = 0; index < touched.size(); index++) {
            int piece = touched.get(index);
            int path = pathOf.get(piece);
            if (path != NONE) {
                free(path);
                pathOf.set(piece, NONE);
            }
        }
        for (int index = 0; index < touched.size(); index++) {
            int piece = touched.get(index);
            if (pathOf.get(piece) == NONE && blocks.alive(blocks.blockOf(piece))) {
                lay(piece);
            }
        }
        putBackFreed();
    }

    private void free(int path) {
        int at = path * STRIDE;
        int offset = paths.get(at);
        if (offset == PathIndex.UNUSED) {
            return;
        }
        garbage += 1 + Math.abs(slices.get(offset));
        paths.set(at, PathIndex.UNUSED);
        freed = append(freed, freedCount++, path);
    }

    private static int[] append(int[] list, int size, int value) {
        int[] longer = size == list.length ? Arrays.copyOf(list, size * 2) : list;
        longer[size] = value;
        return longer;
    }

    private void lay(int piece) {
        int start = startOf(piece);
        int count = 1;
        int end = start;
        int last;
        int kept = NONE;
        int votes = 0;
        do {
            walk = append(walk, count++, end);
            int before = pathOf.get(end >> 1);
            if (votes == 0) {
                kept = before;
            }
            votes += before == kept ? 1 : -1;
            last = end ^ 1;
            end = links.peer(last);
        } while (end != NONE && end != start);
        walk[0] = end == start ? 1 - count : count - 1;
        int path = numberFor(kept);
        for (int index = 1; index < count; index++) {
            if (pathOf.get(walk[index] >> 1) != path) {
                pathOf.set(walk[index] >> 1, path);
            }
        }
        write(path, count, start, last);
    }

    private int startOf(int piece) {
        int start = 2 * piece;
        int end = start;
        for (int before = links.peer(end); before != NONE; before = links.peer(end)) {
            end = before ^ 1;
            if (end == start) {
                return start;
            }
        }
        return end;
    }

    private int numberFor(int kept) {
        if (kept != NONE && paths.get(kept * STRIDE) == PathIndex.UNUSED) {
            return kept;
        }
        if (unused != NONE) {
            int path = unused;
            unused = paths.get(path * STRIDE + PathIndex.FIRST);
            return path;
        }
        int path = paths.size() / STRIDE;
        paths.grow(paths.size() + STRIDE, 0);
        return path;
    }

    private void write(int path, int count, int first, int last) {
        int offset = slices.size();
        slices.grow(offset + count, 0);
        slices.copyFrom(walk, count, offset);
        int at = path * STRIDE;
        paths.set(at + PathIndex.OFFSET, offset);
        paths.set(at + PathIndex.FIRST, first);
        paths.set(at + PathIndex.LAST, last);
        paths.set(at + PathIndex.CIRCUIT, 0);
        laid = append(laid, laidCount++, path);
    }

    private void putBackFreed() {
        for (int index = 0; index < freedCount; index++) {
            int at = freed[index] * STRIDE;
            if (paths.get(at) == PathIndex.UNUSED) {
                paths.set(at + PathIndex.FIRST, unused);
                unused = freed[index];
            }
        }
    }

    /** How many paths were laid afresh. */
    int laidCount() {
        return laidCount;
    }

    /** The number of one laid afresh. */
    int laid(int index) {
        return laid[index];
    }

    PathIndex build() {
        PathIndex built = new PathIndex(pathOf.build(), paths.build(), slices.build(), unused, garbage);
        int kept = built.slices.size() - garbage;
        return garbage > Math.max(GARBAGE_AT_LEAST, kept / 2)
                ? PathPacker.pack(built, kept, built.pathOf, IntUnaryOperator.identity())
                : built;
    }
}
