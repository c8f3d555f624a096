package spanwright.paged;

import java.util.Arrays;

/** An immutable array of ints, changed by page through an {@link Editor}. Safe for any number of readers. */
public final class PagedInts {

    private static final int SHIFT = 11;
    private static final int PAGE = 1 << SHIFT;
    private static final int MASK = PAGE - 1;

    private final int[][] pages;
    private final int size;

    private PagedInts(int[][] pages, int size) {
        this.pages = pages;
        this.size = size;
    }

    /** An array of nothing. */
    public static PagedInts empty() {
        return new PagedInts(new int[0][], 0);
    }

    /** A copy of the first {@code size} ints of a plain array. */
    public static PagedInts copyOf(int[] ints, int size) {
        int[][] pages = new int[(size + MASK) >>> SHIFT][];
        for (int page = 0; page < pages.length; page++) {
            pages[page] = Arrays.copyOfRange(ints, page << SHIFT, (page << SHIFT) + PAGE);
        }
        return new PagedInts(pages, size);
    }

    /** How many ints there are. */
    public int size() {
        return size;
    }

    /**
     * The int at an index from 0 to size - 1.
     *
     * @throws IndexOutOfBoundsException past the last page
     */
    public int get(int index) {
        return pages[index >>> SHIFT][index & MASK];
    }

    /** Heap bytes of the pages and their table, near enough for a benchmark's report. */
    public long heapBytes() {
        return 16L + 4L * pages.length + (long) pages.length * (16L + 4L * PAGE);
    }

    /** Begins a changed copy. */
    public Editor edit() {
        return new Editor(this);
    }

    /** Writes a changed copy, page by page. One thread's; dead after {@link #build}. */
    public static final class Editor {

        private int[][] pages;
        private boolean[] owned;
        private int size;

        private Editor(PagedInts base) {
            this.pages = base.pages.clone();
            this.owned = new boolean[pages.length];
            this.size = base.size;
        }

        /** The int at an index, with what this editor has written so far. */
        public int get(int index) {
            return pages[index >>> SHIFT][index & MASK];
        }

        /** How many ints there are now. */
        public int size() {
            return size;
        }

        /** Writes one int; the index lies below the size. */
        public void set(int index, int value) {
            int page = index >>> SHIFT;
            if (!owned[page]) {
                pages[page] = pages[page].clone();
                owned[page] = true;
            }
            pages[page][index & MASK] = value;
        }

        /** Lengthens the array to a new size, the new places filled with one value. */
        public void grow(int newSize, int fill) {
            int needed = (newSize + MASK) >>> SHIFT;
            if (needed > pages.length) {
                pages = Arrays.copyOf(pages, Math.max(needed, pages.length + (pages.length >>> 1)));
                owned = Arrays.copyOf(owned, pages.length);
            }
            int index = size;
            for (; index < newSize && (index & MASK) != 0; index++) {
                set(index, fill);
            }
            for (int page = (index + MASK) >>> SHIFT; page < needed; page++) {
                pages[page] = new int[PAGE];
                owned[page] = true;
                Arrays.fill(pages[page], fill);
            }
            size = Math.max(size, newSize);
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
            return new PagedInts(Arrays.copyOf(pages, (size + MASK) >>> SHIFT), size);
        }
    }
}
