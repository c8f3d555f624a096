package spanwright.splicing;

/**
 * The lasting name of one end of glass as one 64-bit number, unique over all ends: the leg's kind in bits 56
 * to 58, its owner in bits 24 to 55, the number of the fiber, input, output or port in bits 0 to 23. Ends of
 * one leg are neighbours, so a range of joints is written and read in order.
 */
public final class EndKey {

    private static final int KIND_SHIFT = 56;
    private static final int OWNER_SHIFT = 24;
    private static final int NUMBER_MASK = (1 << OWNER_SHIFT) - 1;
    private static final LegKind[] KINDS = LegKind.values();

    private EndKey() {}

    /**
     * The key of an end.
     *
     * @param number from 1 to 2^24 - 1
     */
    public static long of(LegKind kind, int owner, int number) {
        if (number < 1 || number > NUMBER_MASK) {
            throw new IllegalArgumentException("no such end: " + kind + " " + owner + " " + number);
        }
        return (long) kind.ordinal() << KIND_SHIFT | (long) owner << OWNER_SHIFT | number;
    }

    /** The leg's kind in a key. */
    public static LegKind kind(long key) {
        return KINDS[(int) (key >>> KIND_SHIFT)];
    }

    /** The leg's owner in a key. */
    public static int owner(long key) {
        return (int) (key >>> OWNER_SHIFT);
    }

    /** The number in a key. */
    public static int number(long key) {
        return (int) key & NUMBER_MASK;
    }
}
