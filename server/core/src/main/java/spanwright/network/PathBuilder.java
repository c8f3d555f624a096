package spanwright.network;

import java.util.Arrays;
import spanwright.paged.PagedInts;

/** Lays all paths afresh, in plain arrays: one walk over the whole glass. Used where most of it changed. */
final class PathBuilder {

    private static final int NONE = -1;

    private final int[] peers;
    private final int[] pathOf;
    private int[] paths = new int[1 << 10];
    private int[] slices;
    private int pathCount;
    private int used;

    private PathBuilder(Links links, int pieces) {
        this.peers = links.peers();
        this.pathOf = new int[pieces];
        this.slices = new int[Math.max(16, pieces + (pieces >>> 3))];
    }

    static PathIndex build(Blocks blocks, Links links) {
        PathBuilder builder = new PathBuilder(links, blocks.pieces());
        builder.lay(blocks);
        return new PathIndex(
                PagedInts.copyOf(builder.pathOf, builder.pathOf.length),
                PagedInts.copyOf(builder.paths, builder.pathCount * PathIndex.STRIDE, PathIndex.PATHS_PAGE),
                PagedInts.copyOf(builder.slices, builder.used, PathIndex.SLICES_PAGE),
                NONE,
                0);
    }

    private void lay(Blocks blocks) {
        Arrays.fill(pathOf, NONE);
        for (int block = 0; block < blocks.count(); block++) {
            if (blocks.alive(block)) {
                layOpen(blocks.field(block, Blocks.FIRST), blocks.field(block, Blocks.COUNT));
            }
        }
        for (int block = 0; block < blocks.count(); block++) {
            if (blocks.alive(block)) {
                layCircles(blocks.field(block, Blocks.FIRST), blocks.field(block, Blocks.COUNT));
            }
        }
    }

    private void layOpen(int firstPiece, int count) {
        for (int piece = firstPiece; piece < firstPiece + count; piece++) {
            if (pathOf[piece] == NONE) {
                if (peers[2 * piece] == NONE) {
                    layFrom(2 * piece);
                } else if (peers[2 * piece + 1] == NONE) {
                    layFrom(2 * piece + 1);
                }
            }
        }
    }

    private void layCircles(int firstPiece, int count) {
        for (int piece = firstPiece; piece < firstPiece + count; piece++) {
            if (pathOf[piece] == NONE) {
                layFrom(2 * piece);
            }
        }
    }

    private void layFrom(int start) {
        int path = pathCount++;
        int offset = used++;
        int end = start;
        int last;
        do {
            if (used + 1 >= slices.length) {
                slices = Arrays.copyOf(slices, slices.length + (slices.length >>> 1));
            }
            slices[used++] = end;
            pathOf[end >> 1] = path;
            last = end ^ 1;
            end = peers[last];
        } while (end != NONE && end != start);
        int length = used - offset - 1;
        slices[offset] = end == start ? -length : length;
        if (pathCount * PathIndex.STRIDE > paths.length) {
            paths = Arrays.copyOf(paths, paths.length * 2);
        }
        int at = path * PathIndex.STRIDE;
        paths[at + PathIndex.OFFSET] = offset;
        paths[at + PathIndex.FIRST] = start;
        paths[at + PathIndex.LAST] = last;
    }
}
