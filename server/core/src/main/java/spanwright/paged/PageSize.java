package spanwright.paged;

/**
 * How many ints one page holds. A change copies whole pages, so small ones make changes cheap; each page costs a look
 * at its head when it is read, so large ones make scattered reads cheap.
 */
public enum PageSize {
    /** 512 ints: for what is changed here and there. */
    SMALL(9),
    /** 8,192 ints: for what is read scattered, or only added to at the end. */
    LARGE(13);

    private final int shift;

    PageSize(int shift) {
        this.shift = shift;
    }

    /** How many ints a page holds. */
    public int ints() {
        return 1 << shift;
    }

    /** That number as a power of two. */
    int shift() {
        return shift;
    }
}
