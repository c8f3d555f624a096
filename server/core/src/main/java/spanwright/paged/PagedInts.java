package spanwright.paged;

import java.io.IOException;
import java.util.Arrays;

/**
 * An immutable array of ints, changed by page through an {@link Editor}. Safe for any number of readers.
 *
 * <p>Pages hang from nodes of 256 pages, so that a small change to 10^7 ints copies some pages, some nodes of 1 KiB and
 * a short root. Lost to this: one flat table of pages, of which each change copied 40 to 160 KiB.
 */
public final class PagedInts {

    private static final int NODE_BITS = 8;
    private static final int NODE = 1 << NODE_BITS;
    private static final int NODE_MASK = NODE - 1;
    private static final int HEADER_BYTES = 16;

    private final PageSize pages;
    private final int shift;
    private final int mask;
    private final int[][][] nodes;
    private final int size;

    private PagedInts(PageSize pages, int[][][] nodes, int size) {
        this.pages = pages;
        this.shift = pages.shift();
        this.mask = pages.ints() - 1;
        this.nodes = nodes;
        this.size = size;
    }

    /** An array of nothing, of small pages. */
    public static PagedInts empty() {
        return empty(PageSize.SMALL);
    }

    /** An array of nothing, with pages of a size that its edited copies keep. */
    public static PagedInts empty(PageSize pages) {
        return new PagedInts(pages, new int[0][][], 0);
    }

    /** A copy of the first {@code size} ints of a plain array, in small pages. */
    public static PagedInts copyOf(int[] ints, int size) {
        return copyOf(ints, size, PageSize.SMALL);
    }

    /** A copy of the first {@code size} ints of a plain array, in pages of a size. */
    public static PagedInts copyOf(int[] ints, int size, PageSize pages) {
        int[][][] nodes = nodesFor(size, pages);
        for (int from = 0, page = 0; from < size; from += pages.ints(), page++) {
            nodes[page >>> NODE_BITS][page & NODE_MASK] = Arrays.copyOfRange(ints, from, from + pages.ints());
        }
        return new PagedInts(pages, nodes, size);
    }

    /**
     * Reads an array that {@link #write} wrote, into pages of a size.
     *
     * @throws IOException where the source fails
     */
    public static PagedInts read(int size, PageSize pages, IntSource source) throws IOException {
        int[][][] nodes = nodesFor(size, pages);
        for (int from = 0, page = 0; from < size; from += pages.ints(), page++) {
            int[] ints = new int[pages.ints()];
            source.get(ints, Math.min(pages.ints(), size - from));
            nodes[page >>> NODE_BITS][page & NODE_MASK] = ints;
        }
        return new PagedInts(pages, nodes, size);
    }

    private static int[][][] nodesFor(int size, PageSize pages) {
        int[][][] nodes = new int[nodeCount(size, pages.shift())][][];
        for (int node = 0; node < nodes.length; node++) {
            nodes[node] = new int[NODE][];
        }
        return nodes;
    }

    private static int nodeCount(int size, int shift) {
        return (int) ((size + (1L << (shift + NODE_BITS)) - 1) >>> (shift + NODE_BITS));
    }

    private static int[] page(int[][][] nodes, int shift, int index) {
        int page = index >>> shift;
        return nodes[page >>> NODE_BITS][page & NODE_MASK];
    }

    /**
     * Writes all ints in order.
     *
     * @throws IOException where the sink fails
     */
    public void write(IntSink sink) throws IOException {
        for (int from = 0; from < size; from += mask + 1) {
            sink.put(page(nodes, shift, from), Math.min(mask + 1, size - from));
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
        return page(nodes, shift, index)[index & mask];
    }

    /** Copies {@code count} ints from an index on to the head of a plain array. */
    public void copyTo(int index, int count, int[] into) {
        copyTo(index, count, into, 0);
    }

    /** Copies {@code count} ints from an index on into a plain array, from a place of it on. */
    public void copyTo(int index, int count, int[] into, int place) {
        copyTo(nodes, shift, index, count, into, place);
    }

    private static void copyTo(int[][][] nodes, int shift, int index, int count, int[] into, int place) {
        int mask = (1 << shift) - 1;
        int done = 0;
        while (done < count) {
            int from = index + done;
            int some = Math.min(count - done, mask + 1 - (from & mask));
            System.arraycopy(page(nodes, shift, from), from & mask, into, place + done, some);
            done += some;
        }
    }

    /**
     * Copies rows of four ints that lie anywhere, one behind another: each row read at once from its page. What rows
     * are read next does not depend on what a row holds, so the memory's answers are waited for together.
     *
     * @param rows numbers of rows, each of the ints from four times its number on
     * @param count how many of them
     * @param into takes four ints a row
     */
    public void copyRows(int[] rows, int count, int[] into) {
        for (int row = 0, to = 0; row < count; row++, to += 4) {
            int index = rows[row] << 2;
            int[] page = page(nodes, shift, index);
            int from = index & mask;
            into[to] = page[from];
            into[to + 1] = page[from + 1];
            into[to + 2] = page[from + 2];
            into[to + 3] = page[from + 3];
        }
    }

    /** Heap bytes of the pages and their tables, with a 16-byte header each and 4-byte references. */
    public long heapBytes() {
        long held = (size + (long) mask) >>> shift;
        return 3L * HEADER_BYTES
                + 4L * nodes.length
                + nodes.length * (HEADER_BYTES + 4L * NODE)
                + held * (HEADER_BYTES + 4L * (mask + 1));
    }

    /** Begins a changed copy. */
    public Editor edit() {
        return new Editor(this);
    }

    /** Writes a changed copy, page by page. One thread's; dead after {@link #build}. */
    public static final class Editor {

        private final PageSize pages;
        private final int shift;
        private final int mask;
        private final int[][][] base;
        private int[][][] nodes;
        private int size;

        private Editor(PagedInts base) {
            this.pages = base.pages;
            this.shift = base.shift;
            this.mask = base.mask;
            this.base = base.nodes;
            this.nodes = base.nodes;
            this.size = base.size;
        }

        /** The int at an index, with what this editor has written so far. */
        public int get(int index) {
            return page(nodes, shift, index)[index & mask];
        }

        /** How many ints there are now. */
        public int size() {
            return size;
        }

        /** Copies {@code count} ints from an index on to the head of a plain array. */
        public void copyTo(int index, int count, int[] into) {
            PagedInts.copyTo(nodes, shift, index, count, into, 0);
        }

        /** Writes one int; the index lies below the size. */
        public void set(int index, int value) {
            ownPage(index)[index & mask] = value;
        }

        /** Writes the first {@code count} ints of an array from an index on; all lie below the size. */
        public void copyFrom(int[] ints, int count, int index) {
            int done = 0;
            while (done < count) {
                int to = index + done;
                int some = Math.min(count - done, mask + 1 - (to & mask));
                System.arraycopy(ints, done, ownPage(to), to & mask, some);
                done += some;
            }
        }

        // A page or node that differs from the base's is this editor's own; past the base's end all are.
        private int[] ownPage(int index) {
            int number = index >>> (shift + NODE_BITS);
            int[][] node = nodes[number];
            int slot = index >>> shift & NODE_MASK;
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
            int needed = nodeCount(newSize, shift);
            if (needed > nodes.length) {
                int before = nodes.length;
                nodes = Arrays.copyOf(nodes, Math.max(needed, before + (before >>> 1)));
                for (int node = before; node < nodes.length; node++) {
                    nodes[node] = new int[NODE][];
                }
            }
            int index = size;
            for (; index < newSize && (index & mask) != 0; index++) {
                set(index, fill);
            }
            for (; index < newSize; index += mask + 1) {
                putPage(index, filledPage(fill));
            }
            size = Math.max(size, newSize);
        }

        private int[] filledPage(int fill) {
            int[] page = new int[mask + 1];
            if (fill != 0) {
                Arrays.fill(page, fill);
            }
            return page;
        }

        private void putPage(int index, int[] page) {
            int number = index >>> (shift + NODE_BITS);
            int[][] node = nodes[number];
            if (number < base.length && node == base[number]) {
                node = ownNode(number);
            }
            node[index >>> shift & NODE_MASK] = page;
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
            int needed = nodeCount(size, shift);
            return new PagedInts(pages, needed == nodes.length ? nodes : Arrays.copyOf(nodes, needed), size);
        }
    }
}
