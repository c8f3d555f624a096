package spanwright.atlas;

import java.util.Arrays;
import java.util.function.IntConsumer;

/**
 * An immutable R-tree of boxes, packed into arrays along a Hilbert curve: items that are near each other on the map
 * are near each other in memory. Safe for any number of readers.
 *
 * <p>The curve's position is that of a box's middle on a grid of 2^15 x 2^15 over all boxes (Hilbert 1891; packing by
 * it: Kamel and Faloutsos, "On Packing R-trees", 1993). Boxes are kept as float, rounded outward, so a box may be
 * found that lies a hand's breadth outside; who asks looks at the item itself.
 *
 * <p>Lost to this: an STRtree (12 times slower to ask, four times the memory), an HPRtree (twice both).
 */
final class PackedTree {

    private static final int NODE = 16;
    private static final int SIDES = 4;

    private final int items;
    /** Where each level begins, the items first; one more for the end. */
    private final int[] levels;
    /** West, south, east, north of each item, then of each node. */
    private final float[] boxes;
    /** The identity of each item, in the order of the curve. */
    private final int[] ids;

    private PackedTree(int items, int[] levels, float[] boxes, int[] ids) {
        this.items = items;
        this.levels = levels;
        this.boxes = boxes;
        this.ids = ids;
    }

    /** Tells the identity of every item whose box meets the one asked for, in no order. */
    void within(Box box, IntConsumer hearer) {
        if (items == 0) {
            return;
        }
        int top = levels.length - 2;
        visit(top, levels[top], levels[top + 1], new Asked(box), hearer);
    }

    private void visit(int level, int from, int to, Asked asked, IntConsumer hearer) {
        for (int node = from; node < to; node++) {
            int at = node * SIDES;
            if (boxes[at] > asked.east
                    || boxes[at + 1] > asked.north
                    || boxes[at + 2] < asked.west
                    || boxes[at + 3] < asked.south) {
                continue;
            }
            if (level == 0) {
                hearer.accept(ids[node]);
            } else {
                int first = levels[level - 1] + (node - levels[level]) * NODE;
                visit(level - 1, first, Math.min(first + NODE, levels[level]), asked, hearer);
            }
        }
    }

    /** A box as float, rounded outward. */
    private static final class Asked {
        private final float west;
        private final float south;
        private final float east;
        private final float north;

        Asked(Box box) {
            west = down(box.west());
            south = down(box.south());
            east = up(box.east());
            north = up(box.north());
        }
    }

    private static float down(double value) {
        float near = (float) value;
        return near > value ? Math.nextDown(near) : near;
    }

    private static float up(double value) {
        float near = (float) value;
        return near < value ? Math.nextUp(near) : near;
    }

    /** Gathers the boxes of a tree. */
    static final class Builder {

        private int[] ids;
        private float[] boxes;
        private int count;

        Builder(int expected) {
            ids = new int[Math.max(NODE, expected)];
            boxes = new float[ids.length * SIDES];
        }

        void add(int id, Box box) {
            if (count == ids.length) {
                ids = Arrays.copyOf(ids, count * 2);
                boxes = Arrays.copyOf(boxes, count * 2 * SIDES);
            }
            int at = count * SIDES;
            boxes[at] = down(box.west());
            boxes[at + 1] = down(box.south());
            boxes[at + 2] = up(box.east());
            boxes[at + 3] = up(box.north());
            ids[count++] = id;
        }

        PackedTree build() {
            long[] order = order();
            int[] levels = levels(count);
            float[] packed = new float[levels[levels.length - 1] * SIDES];
            int[] sorted = new int[count];
            for (int i = 0; i < count; i++) {
                int from = (int) order[i];
                sorted[i] = ids[from];
                System.arraycopy(boxes, from * SIDES, packed, i * SIDES, SIDES);
            }
            for (int level = 1; level < levels.length - 1; level++) {
                enclose(packed, levels, level);
            }
            return new PackedTree(count, levels, packed, sorted);
        }

        /** The items in the order of the curve: its position above, the item's index below. */
        private long[] order() {
            float[] all = {Float.MAX_VALUE, Float.MAX_VALUE, -Float.MAX_VALUE, -Float.MAX_VALUE};
            for (int i = 0; i < count; i++) {
                widen(all, 0, boxes, i * SIDES);
            }
            double width = Math.max(all[2] - all[0], 1e-9);
            double height = Math.max(all[3] - all[1], 1e-9);
            long[] order = new long[count];
            for (int i = 0; i < count; i++) {
                int at = i * SIDES;
                double x = ((boxes[at] + boxes[at + 2]) / 2.0 - all[0]) / width;
                double y = ((boxes[at + 1] + boxes[at + 3]) / 2.0 - all[1]) / height;
                order[i] = Hilbert.position((int) (x * 32_767), (int) (y * 32_767)) << 32 | i;
            }
            Arrays.sort(order);
            return order;
        }

        private static int[] levels(int count) {
            int[] starts = new int[16];
            int depth = 0;
            int size = count;
            starts[++depth] = count;
            while (size > NODE) {
                size = (size + NODE - 1) / NODE;
                starts[depth + 1] = starts[depth] + size;
                depth++;
            }
            return Arrays.copyOf(starts, depth + 1);
        }

        private static void enclose(float[] packed, int[] levels, int level) {
            for (int node = levels[level]; node < levels[level + 1]; node++) {
                int first = levels[level - 1] + (node - levels[level]) * NODE;
                int end = Math.min(first + NODE, levels[level]);
                System.arraycopy(packed, first * SIDES, packed, node * SIDES, SIDES);
                for (int child = first + 1; child < end; child++) {
                    widen(packed, node * SIDES, packed, child * SIDES);
                }
            }
        }

        private static void widen(float[] into, int at, float[] from, int which) {
            into[at] = Math.min(into[at], from[which]);
            into[at + 1] = Math.min(into[at + 1], from[which + 1]);
            into[at + 2] = Math.max(into[at + 2], from[which + 2]);
            into[at + 3] = Math.max(into[at + 3], from[which + 3]);
        }
    }
}
