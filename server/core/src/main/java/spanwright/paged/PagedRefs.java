package spanwright.paged;

import java.util.Arrays;
import java.util.Objects;
import java.util.function.IntConsumer;
import java.util.function.IntFunction;
import org.jspecify.annotations.Nullable;

/**
 * An immutable array of references, holes allowed, changed by page through an {@link Editor}. A page may be
 * loaded when first read ({@link #lazy}). Safe for any number of readers.
 *
 * @param <T> what is held
 */
public final class PagedRefs<T> {

    /** How many references one page holds; a loader is asked for whole pages. */
    public static final int PAGE = 1 << 8;

    private static final int SHIFT = 8;
    private static final int MASK = PAGE - 1;

    private final @Nullable Object[] @Nullable [] pages;
    private final int size;
    private final @Nullable IntFunction<@Nullable Object[]> loader;

    private PagedRefs(
            @Nullable Object[] @Nullable [] pages, int size, @Nullable IntFunction<@Nullable Object[]> loader) {
        this.pages = pages;
        this.size = size;
        this.loader = loader;
    }

    /** An array of nothing. */
    public static <T> PagedRefs<T> empty() {
        return new PagedRefs<>(new Object[0][], 0, null);
    }

    /**
     * An array whose pages are loaded when first read. The loader gets a page number and gives an array of
     * {@link #PAGE} references (holes null); it must give equal answers whenever it is asked, from any thread.
     */
    public static <T> PagedRefs<T> lazy(int size, IntFunction<@Nullable Object[]> loader) {
        return new PagedRefs<>(new Object[(size + MASK) >>> SHIFT][], size, loader);
    }

    /** One more than the largest index ever written. */
    public int size() {
        return size;
    }

    /** The reference at an index; null where there is none, also past the end. */
    @SuppressWarnings("unchecked")
    public @Nullable T find(int index) {
        if (index < 0 || index >= size) {
            return null;
        }
        @Nullable Object[] page = pages[index >>> SHIFT];
        if (page == null && loader == null) {
            return null;
        }
        return (T) page(pages, loader, index >>> SHIFT)[index & MASK];
    }

    private static @Nullable Object[] page(
            @Nullable Object[] @Nullable [] pages, @Nullable IntFunction<@Nullable Object[]> loader, int number) {
        @Nullable Object[] page = pages[number];
        if (page == null) {
            // Two readers may both load it; the answers are equal, so the last write wins harmlessly.
            page = loader == null ? new Object[PAGE] : loader.apply(number);
            pages[number] = page;
        }
        return page;
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
        if (number >= pages.length || number >= other.pages.length) {
            return false;
        }
        return pages[number] == other.pages[number] && (pages[number] != null || loader == other.loader);
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

        private @Nullable Object[] @Nullable [] pages;
        private final @Nullable IntFunction<@Nullable Object[]> loader;
        private boolean[] owned;
        private int size;

        private Editor(PagedRefs<T> base) {
            this.pages = base.pages.clone();
            this.loader = base.loader;
            this.owned = new boolean[pages.length];
            this.size = base.size;
        }

        /** The reference at an index, with what this editor has written so far; null where there is none. */
        @SuppressWarnings("unchecked")
        public @Nullable T find(int index) {
            return index < 0 || index >= size ? null : (T) page(pages, loader, index >>> SHIFT)[index & MASK];
        }

        /** One more than the largest index ever written. */
        public int size() {
            return size;
        }

        /** Writes one reference, or with null clears it; the array grows as needed. */
        public void set(int index, @Nullable T value) {
            int number = index >>> SHIFT;
            if (number >= pages.length) {
                pages = Arrays.copyOf(pages, Math.max(number + 1, pages.length + (pages.length >>> 1)));
                owned = Arrays.copyOf(owned, pages.length);
            }
            @Nullable
            Object[] page = index >= size && pages[number] == null ? new Object[PAGE] : page(pages, loader, number);
            if (!owned[number]) {
                page = page.clone();
                owned[number] = true;
            }
            pages[number] = page;
            page[index & MASK] = value;
            size = Math.max(size, index + 1);
        }

        /** The changed array; this editor is not used again. */
        public PagedRefs<T> build() {
            return new PagedRefs<>(Arrays.copyOf(pages, (size + MASK) >>> SHIFT), size, loader);
        }
    }
}
