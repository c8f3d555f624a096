package spanwright.sqlite;

import java.util.ArrayList;
import java.util.List;
import spanwright.journal.Change;
import spanwright.journal.Posting;
import spanwright.sqlite.rows.ChangePacker;

/**
 * A posting ready for the journal.
 *
 * @param head its head
 * @param pages its changes, packed
 * @param hash its hash, see {@link PostingHash}
 */
record PackedPosting(Posting head, List<ChangePacker.Page> pages, PostingHash hash) {

    static PackedPosting of(Posting head, List<Change> changes, PostingHash before) {
        List<ChangePacker.Page> pages = new ArrayList<>();
        ChangePacker.pack(changes, pages::add);
        return new PackedPosting(head, pages, PostingHash.of(before, head, pages));
    }
}
