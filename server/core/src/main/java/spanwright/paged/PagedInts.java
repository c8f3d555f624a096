package spanwright.paged;

import java.io.IOException;
import java.util.Arrays;

/**
 * An immutable array of ints, changed by page through an {@link Editor}. Safe for any number of readers.
 *
 * <p>Pages of 512 ints hang from nodes of 256 pages, so that a small change to 10^7 ints copies some pages, some nodes
 * of 1 KiB and a short root. Lost to this: one flat table of pages, of which each change copied 40 to 160 KiB.
 */
public final class PagedInts {

    private static final int SHIFT = 9;
    private static final int PAGE = 1 << SHIFT;
    private static final int MASK = PAGE - 1;
    private static final int NODE_SHIFT = 17;
    private static final int NODE = 1 << (NODE_SHIFT - SHIFT);
    private static final int NODE_MASK = NODE - 1;
    private static final int HEADER_BYTES = 16;

    private final int[][][] nodes;
    private final int size;

    private PagedInts(int[][][] nodes, int size) {
        this.nodes = nodes;
        this.size = size;
    }

    /** An array of nothing. */
    public static PagedInts empty() {
        return new PagedInts(new int[0][][], 0);
    }

    /** A copy of the first {@code size} ints of a plain array. */
    public static PagedInts copyOf(int[] ints, int size) {
        int[][][] nodes = nodesFor(size);
        for (int page = 0; page << SHIFT < size; page++) {
            int from = page << SHIFT;
            nodes[page / NODE][page & NODE_MASK] = Arrays.copyOfRange(ints, from, from + PAGE);
        }
        return new PagedInts(nodes, size);
    }

    /**
     * Reads an array that {@link #write} wrote.
     *
     * @throws IOException where the source fails
     */
    public static PagedInts read(int size, IntSource source) throws IOException {
        int[][][] nodes = nodesFor(size);
        for (int page = 0; page << SHIFT < size; page++) {
            int[] ints = new int[PAGE];
            source.get(ints, Math.min(PAGE, size - (page << SHIFT)));
            nodes[page / NODE][page & NODE_MASK] = ints;
        }
        return new PagedInts(nodes, size);
    }

    private static int[][][] nodesFor(int size) {
        int[][][] nodes = new int[nodeCount(size)][][];
        for (int node = 0; node < nodes.length; node++) {
            nodes[node] = new int[NODE][];
        }
        return nodes;
    }

    private static int nodeCount(int size) {
        return (size + (1 << NODE_SHIFT) - 1) >>> NODE_SHIFT;
    }

    /**
     * Writes all ints in order.
     *
     * @throws IOException where the sink fails
     */
    public void write(IntSink sink) throws IOException {
        for (int from = 0; from < size; from += PAGE) {
            sink.put(nodes[from >>> NODE_SHIFT][from >>> SHIFT & NODE_MASK], Math.min(PAGE, size - from));
        }
    }

    /** How many ints there are. */
    public int size() {
        return size;
    }

    /**
     * The int at an index from 0 to size - 1.
     *
     * @throws IndexOutOfBoundsException past the last node
     */
    public int get(int index) {
        return nodes[index >>> NODE_SHIFT][index >>> SHIFT & NODE_MASK][index & MASK];
    }

    /** Copies {@code count} ints from an index on to the head of a plain array. */
    public void copyTo(int index, int count, int[] into) {
        copyTo(nodes, index, count, into);
    }

    private static void copyTo(int[][][] nodes, int index, int count, int[] into) {
        int done = 0;
        while (done < count) {
            int from = index + done;
            int some = Math.min(count - done, PAGE - (from & MASK));
            System.arraycopy(nodes[from >>> NODE_SHIFT][from >>> SHIFT & NODE_MASK], from & MASK, into, done, some);
            done += some;
        }
    }

    /** Heap bytes of the pages and their tables, with a 16-byte header each and 4-byte references. */
    public long heapBytes() {
        long pages = (size + (long) MASK) >>> SHIFT;
        return 3L * HEADER_BYTES
                + 4L * nodes.length
                + nodes.length * (HEADER_BYTES + 4L * NODE)
                + pages * (HEADER_BYTES + 4L * PAGE);
    }

    /** Begins a changed copy. */
    public Editor edit() {
        return new Editor(this);
    }

    /** Writes a changed copy, page by page. One thread's; dead after {@link #build}. */
    public static final class Editor {

        private final int[][][] base;
        private int[][][] nodes;
        private int size;

        private Editor(PagedInts base) {
            this.base = base.nodes;
            this.nodes = base.nodes;
            this.size = base.size;
        }

        /** The int at an index, with what this editor has written so far. */
        public int get(int index) {
            return nodes[index >>> NODE_SHIFT][index >>> SHIFT & NODE_MASK][index & MASK];
        }

        /** How many ints there are now. */
        public int size() {
            return size;
        }

        /** Copies {@code count} ints from an index on to the head of a plain array. */
        public void copyTo(int index, int count, int[] into) {
            PagedInts.copyTo(nodes, index, count, into);
        }

        /** Writes one int; the index lies below the size. */
        public void set(int index, int value) {
            ownPage(index)[index & MASK] = value;
        }

        /** Writes the first {@code count} ints of an array from an index on; all lie below the size. */
        public void copyFrom(int[] ints, int count, int index) {
            int done = 0;
            while (done < count) {
                int to = index + done;
                int some = Math.min(count - done, PAGE - (to & MASK));
                System.arraycopy(ints, done, ownPage(to), to & MASK, some);
                done += some;
            }
        }

        // A page or node that differs from the base's is this editor's own; past the base's end all are.
        private int[] ownPage(int index) {
            int number = index >>> NODE_SHIFT;
            int[][] node = nodes[number];
            int slot = index >>> SHIFT & NODE_MASK;
            if (number >= base.length) {
                return node[slot];
            }
            if (node == base[number]) {
                node = ownNode(number);
            }
            int[] page = node[slot];
            if (page == base[number][slot]) {
                page = page.clone();
                node[slot] = page;
            }
            return page;
        }

        private int[][] ownNode(int number) {
            if (nodes == base) {
                nodes = base.clone();
            }
            int[][] node = nodes[number].clone();
            nodes[number] = node;
            return node;
        }

        /** Lengthens the array to a new size, the new places filled with one value. */
        public void grow(int newSize, int fill) {
            int needed = nodeCount(newSize);
            if (needed > nodes.length) {
                int before = nodes.length;
                nodes = Arrays.copyOf(nodes, Math.max(needed, before + (before >>> 1)));
                for (int node = before; node < nodes.length; node++) {
                    nodes[node] = new int[NODE][];
                }
            }
            int index = size;
            for (; index < newSize && (index & MASK) != 0; index++) {
                set(index, fill);
            }
            for (; index < newSize; index += PAGE) {
                putPage(index, filledPage(fill));
            }
            size = Math.max(size, newSize);
        }

        private static int[] filledPage(int fill) {
            int[] page = new int[PAGE];
            if (fill != 0) {
                Arrays.fill(page, fill);
            }
            return page;
        }

        private void putPage(int index, int[] page) {
            int number = index >>> NODE_SHIFT;
            int[][] node = nodes[number];
            if (number < base.length && node == base[number]) {
                node = ownNode(number);
            }
            node[index >>> SHIFT & NODE_MASK] = page;
        }

        /** Adds one int at the end and gives its index. */
        public int add(int value) {
            int index = size;
            grow(size + 1, value);
            set(index, value);
            return index;
        }

        /** The changed array; this editor is not used again. */
        public PagedInts build() {
            int needed = nodeCount(size);
            return new PagedInts(needed == nodes.length ? nodes : Arrays.copyOf(nodes, needed), size);
        }
    }
}
