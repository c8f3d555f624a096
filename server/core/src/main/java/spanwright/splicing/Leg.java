package spanwright.splicing;

/**
 * A side from which numbered ends can be joined.
 *
 * @param kind what side
 * @param owner lasting identity of the run row, splitter or panel, as the kind says
 */
public record Leg(LegKind kind, int owner) {

    /** Refuses an owner below 1. */
    public Leg {
        if (owner < 1) {
            throw new IllegalArgumentException("no owner: " + kind + " " + owner);
        }
    }

    /** The key of one end of it, see {@link EndKey}. */
    public long key(int number) {
        return EndKey.of(kind, owner, number);
    }
}
