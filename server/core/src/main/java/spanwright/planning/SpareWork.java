package spanwright.planning;

/**
 * What hands must do to light a path, the gravest first: it is compared in this order.
 *
 * @param visits structures where hands work; work that the path does at a structure before it leaves it is one visit
 * @param tubes closed tubes opened
 * @param splices new splices, pigtails among them
 * @param patches jumpers laid and plugs moved
 * @param unverified joints crossed as they are that nobody has verified
 */
public record SpareWork(int visits, int tubes, int splices, int patches, int unverified)
        implements Comparable<SpareWork> {

    /** Nothing to do. */
    public static final SpareWork NONE = new SpareWork(0, 0, 0, 0, 0);

    private static final int VISIT_SHIFT = 54;
    private static final int TUBE_SHIFT = 46;
    private static final int SPLICE_SHIFT = 34;
    private static final int PATCH_SHIFT = 22;

    static final long VISIT = 1L << VISIT_SHIFT;
    static final long TUBE = 1L << TUBE_SHIFT;
    static final long SPLICE = 1L << SPLICE_SHIFT;
    static final long PATCH = 1L << PATCH_SHIFT;
    static final long UNVERIFIED = 1;

    /** Of the sum that a search reckons with. */
    static SpareWork of(long packed) {
        return new SpareWork(
                (int) (packed >>> VISIT_SHIFT),
                field(packed, TUBE_SHIFT, VISIT_SHIFT),
                field(packed, SPLICE_SHIFT, TUBE_SHIFT),
                field(packed, PATCH_SHIFT, SPLICE_SHIFT),
                field(packed, 0, PATCH_SHIFT));
    }

    private static int field(long packed, int from, int to) {
        return (int) (packed >>> from) & ((1 << (to - from)) - 1);
    }

    private long packed() {
        return visits * VISIT + tubes * TUBE + splices * SPLICE + patches * PATCH + unverified;
    }

    /** Both together. */
    public SpareWork plus(SpareWork other) {
        return new SpareWork(
                visits + other.visits,
                tubes + other.tubes,
                splices + other.splices,
                patches + other.patches,
                unverified + other.unverified);
    }

    @Override
    public int compareTo(SpareWork other) {
        return Long.compare(packed(), other.packed());
    }
}
