package spanwright.sqlite;

import java.time.Instant;
import spanwright.network.Snapshot;

/**
 * Where the journal ends.
 *
 * @param snapshot the state there
 * @param at when its last posting was made
 * @param hash the hash of its last posting
 */
record Tip(Snapshot snapshot, Instant at, PostingHash hash) {

    /** Before the first posting. */
    static final Tip NONE = new Tip(Snapshot.empty(), Instant.EPOCH, PostingHash.NONE);

    /** The number of the last posting. */
    int number() {
        return snapshot.records().posting();
    }
}
