package spanwright.atlas;

/**
 * Something whose name matches what was typed.
 *
 * @param named what kind of name
 * @param id identity of the record, of that kind's kind
 * @param closeness how close the match, the closest first
 * @param length letters of the name, the shorter the closer
 */
public record Match(Named named, int id, Closeness closeness, int length) implements Comparable<Match> {

    /** How a name matches, the closest first. */
    public enum Closeness {
        /** The whole name. */
        WHOLE,
        /** Its beginning. */
        BEGINNING,
        /** The beginning of one of its words. */
        WORD,
        /** Somewhere within. */
        WITHIN
    }

    @Override
    public int compareTo(Match other) {
        return Long.compare(rank(), other.rank());
    }

    private long rank() {
        long upper = ((long) closeness.ordinal() << 12 | Math.min(length, 255) << 4) << 32;
        return upper | (long) named.ordinal() << 32 | id;
    }
}
