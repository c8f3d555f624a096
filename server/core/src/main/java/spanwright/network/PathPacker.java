package spanwright.network;

import java.util.function.IntUnaryOperator;
import spanwright.paged.PagedInts;

/** Writes all slices anew one behind another, without those that belong to no path any more. */
final class PathPacker {

    private PathPacker() {}

    /**
     * Packs paths.
     *
     * @param kept how many ints of the slices belong to paths
     * @param pathOf the path of each piece
     * @param moved gives the new number of an end
     */
    static PathIndex pack(PathIndex loose, int kept, PagedInts pathOf, IntUnaryOperator moved) {
        int[] from = plain(loose.slices);
        int[] paths = plain(loose.paths);
        int[] slices = new int[kept];
        int used = 0;
        for (int at = 0; at < paths.length; at += PathIndex.STRIDE) {
            int offset = paths[at + PathIndex.OFFSET];
            if (offset != PathIndex.UNUSED) {
                paths[at + PathIndex.OFFSET] = used;
                paths[at + PathIndex.FIRST] = moved.applyAsInt(paths[at + PathIndex.FIRST]);
                paths[at + PathIndex.LAST] = moved.applyAsInt(paths[at + PathIndex.LAST]);
                int count = Math.abs(from[offset]);
                slices[used++] = from[offset];
                for (int place = offset + 1; place <= offset + count; place++) {
                    slices[used++] = moved.applyAsInt(from[place]);
                }
            }
        }
        return new PathIndex(
                pathOf,
                PagedInts.copyOf(paths, paths.length, PathIndex.PATHS_PAGE),
                PagedInts.copyOf(slices, used, PathIndex.SLICES_PAGE),
                loose.unused,
                0);
    }

    private static int[] plain(PagedInts ints) {
        int[] plain = new int[ints.size()];
        ints.copyTo(0, plain.length, plain);
        return plain;
    }
}
