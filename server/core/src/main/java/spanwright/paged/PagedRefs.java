package spanwright.paged;

import java.lang.invoke.MethodHandles;
import java.lang.invoke.VarHandle;
import java.util.Arrays;
import java.util.Objects;
import java.util.function.IntConsumer;
import java.util.function.IntFunction;
import org.jspecify.annotations.Nullable;

/**
 * An immutable array of references, holes allowed, changed by page through an {@link Editor}. A page may be loaded when
 * first read ({@link #lazy}). Safe for any number of readers. Pages hang from nodes, as in {@link PagedInts}.
 *
 * @param <T> what is held
 */
public final class PagedRefs<T> {

    /** How many references one page holds; a loader is asked for whole pages. */
    public static final int PAGE = 1 << 8;

    private static final int SHIFT = 8;
    private static final int MASK = PAGE - 1;
    private static final int NODE_SHIFT = 16;
    private static final int NODE = 1 << (NODE_SHIFT - SHIFT);
    private static final int NODE_MASK = NODE - 1;
    private static final VarHandle PAGES = MethodHandles.arrayElementVarHandle(Object[][].class);

    /** Neighbouring pages; null for one that is not loaded yet, or that holds nothing. */
    private static final class Node {

        /** Stands where no page is; only ever copied. */
        static final Node EMPTY = new Node();

        final @Nullable Object[] @Nullable [] pages;

        Node() {
            this.pages = new Object[NODE][];
        }

        Node(Node copied) {
            this.pages = copied.pages.clone();
        }
    }

    private final Node[] nodes;
    private final int size;
    private final Loader loader;

    private PagedRefs(Node[] nodes, int size, Loader loader) {
        this.nodes = nodes;
        this.size = size;
        this.loader = loader;
    }

    /**
     * Where pages come from that are not there.
     *
     * @param pages loads a page
     * @param count how many pages, from the first on, can be loaded
     */
    private record Loader(IntFunction<@Nullable Object[]> pages, int count) {

        static final Loader NONE = new Loader(number -> new Object[PAGE], 0);

        @Nullable
        Object @Nullable [] page(Node[] nodes, int number) {
            @Nullable Object[] @Nullable [] pages = nodes[number / NODE].pages;
            int slot = number & NODE_MASK;
            if (number >= count) {
                return pages[slot];
            }
            @Nullable Object[] page = (Object[]) PAGES.getAcquire(pages, slot);
            if (page == null) {
                // Two readers may both load it; the answers are equal, so the last write wins harmlessly.
                page = this.pages.apply(number);
                PAGES.setRelease(pages, slot, page);
            }
            return page;
        }
    }

    /** An array of nothing. */
    public static <T> PagedRefs<T> empty() {
        return new PagedRefs<>(new Node[0], 0, Loader.NONE);
    }

    /**
     * An array whose pages are loaded when first read. The loader gets a page number and gives an array of
     * {@link #PAGE} references (holes null); it must give equal answers whenever it is asked, from any thread.
     */
    public static <T> PagedRefs<T> lazy(int size, IntFunction<@Nullable Object[]> loader) {
        Node[] nodes = new Node[nodeCount(size)];
        Arrays.setAll(nodes, index -> new Node());
        return new PagedRefs<>(nodes, size, new Loader(loader, (size + MASK) >>> SHIFT));
    }

    private static int nodeCount(int size) {
        return (size + (1 << NODE_SHIFT) - 1) >>> NODE_SHIFT;
    }

    /** One more than the largest index ever written. */
    public int size() {
        return size;
    }

    /** The reference at an index; null where there is none, also past the end. */
    @SuppressWarnings("unchecked")
    public @Nullable T find(int index) {
        return (T) find(nodes, size, loader, index);
    }

    private static @Nullable Object find(Node[] nodes, int size, Loader loader, int index) {
        if (index < 0 || index >= size) {
            return null;
        }
        @Nullable Object[] page = loader.page(nodes, index >>> SHIFT);
        return page == null ? null : page[index & MASK];
    }

    /**
     * Tells every index at which another array holds something else, rising. Pages that both share are passed
     * over whole, so neighbours in time are compared at the price of what changed.
     */
    public void differing(PagedRefs<T> other, IntConsumer hearer) {
        int last = (Math.max(size, other.size) + MASK) >>> SHIFT;
        for (int number = 0; number < last; number++) {
            if (!sharesPage(other, number)) {
                int end = Math.min((number + 1) << SHIFT, Math.max(size, other.size));
                for (int index = number << SHIFT; index < end; index++) {
                    if (!Objects.equals(find(index), other.find(index))) {
                        hearer.accept(index);
                    }
                }
            }
        }
    }

    private boolean sharesPage(PagedRefs<T> other, int number) {
        @Nullable Object[] page = pageAt(number);
        return page == other.pageAt(number) && (page != null || loaderOf(number).equals(other.loaderOf(number)));
    }

    private @Nullable Object @Nullable [] pageAt(int number) {
        int node = number / NODE;
        return node < nodes.length ? nodes[node].pages[number & NODE_MASK] : null;
    }

    private Loader loaderOf(int number) {
        return number < loader.count ? loader : Loader.NONE;
    }

    /** Begins a changed copy. */
    public Editor<T> edit() {
        return new Editor<>(this);
    }

    /**
     * Writes a changed copy, page by page. One thread's; dead after {@link #build}.
     *
     * @param <T> what is held
     */
    public static final class Editor<T> {

        private final PagedRefs<T> base;
        private final Loader loader;
        private Node[] nodes;
        /** By node and page, whether it is this editor's own; none of a node that is not. */
        private boolean[] @Nullable [] owned = new boolean[0][];

        private int size;

        private Editor(PagedRefs<T> base) {
            this.base = base;
            this.loader = base.loader;
            this.nodes = base.nodes;
            this.size = base.size;
        }

        /** The reference at an index, with what this editor has written so far; null where there is none. */
        @SuppressWarnings("unchecked")
        public @Nullable T find(int index) {
            return (T) PagedRefs.find(nodes, size, loader, index);
        }

        /** One more than the largest index ever written. */
        public int size() {
            return size;
        }

        /** Writes one reference, or with null clears it; the array grows as needed. */
        public void set(int index, @Nullable T value) {
            ownPage(index)[index & MASK] = value;
            size = Math.max(size, index + 1);
        }

        private @Nullable Object[] ownPage(int index) {
            int number = index >>> NODE_SHIFT;
            boolean[] mine = ownNode(number);
            @Nullable Object[] @Nullable [] pages = nodes[number].pages;
            int slot = index >>> SHIFT & NODE_MASK;
            @Nullable Object[] page = loader.page(nodes, index >>> SHIFT);
            if (page == null || !mine[slot]) {
                page = page == null ? new Object[PAGE] : page.clone();
                pages[slot] = page;
                mine[slot] = true;
            }
            return page;
        }

        private boolean[] ownNode(int number) {
            if (number >= owned.length) {
                int length = Math.max(number + 1, nodes.length);
                owned = Arrays.copyOf(owned, length);
                int before = nodes.length;
                nodes = Arrays.copyOf(nodes, length);
                Arrays.fill(nodes, before, length, Node.EMPTY);
            }
            boolean[] mine = owned[number];
            if (mine == null) {
                nodes[number] = new Node(nodes[number]);
                mine = new boolean[NODE];
                owned[number] = mine;
            }
            return mine;
        }

        /** The changed array; this editor is not used again. */
        public PagedRefs<T> build() {
            return owned.length == 0 ? base : new PagedRefs<>(nodes, size, loader);
        }
    }
}
