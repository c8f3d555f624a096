package spanwright.journal;

import org.jspecify.annotations.Nullable;

/**
 * One record's change: added where there is no before, removed where there is no after.
 *
 * @param kind what kind of record
 * @param id its lasting identity
 * @param before as it was, or null
 * @param after as it is now, or null
 */
public record Change(
        RecordKind kind,
        int id,
        @Nullable Recorded before,
        @Nullable Recorded after) {

    /** Refuses a change of nothing, or between two different records. */
    public Change {
        if (before == null && after == null) {
            throw new IllegalArgumentException("a change of nothing: " + kind + " " + id);
        }
        refuseOther(kind, id, before);
        refuseOther(kind, id, after);
    }

    private static void refuseOther(RecordKind kind, int id, @Nullable Recorded side) {
        if (side != null && (side.kind() != kind || side.id() != id)) {
            throw new IllegalArgumentException("not " + kind + " " + id + ": " + side);
        }
    }

    /** The change that adds a record. */
    public static Change add(Recorded after) {
        return new Change(after.kind(), after.id(), null, after);
    }

    /** The change that removes a record. */
    public static Change remove(Recorded before) {
        return new Change(before.kind(), before.id(), before, null);
    }

    /** The change of one record into another of the same identity. */
    public static Change replace(Recorded before, Recorded after) {
        return new Change(after.kind(), after.id(), before, after);
    }

    /** The change that undoes this one. */
    public Change inverse() {
        return new Change(kind, id, after, before);
    }
}
