package spanwright.answers;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import spanwright.journal.Change;
import spanwright.journal.Posting;
import spanwright.journal.RecordKind;
import spanwright.network.Ledger;

/**
 * Finds by which posting a record was last changed. The journal is read once, when first asked, and followed from then
 * on. Postings of very many changes (the loading of a whole plant) are not read: a record that no other posting names
 * is from such a one, which is known where there is only one of them. Any thread may ask.
 *
 * <p>Each change is one long: kind, identity and posting, in order; lost to this: a map of lists, ten times the memory.
 */
public final class LastChanges implements Changes.Finder {

    private static final int BULK = 200_000;
    private static final int MERGE_AT = 4_096;
    private static final int ID_SHIFT = 27;
    private static final int KIND_SHIFT = ID_SHIFT + 31;
    private static final long POSTING_MASK = (1L << ID_SHIFT) - 1;

    private final Ledger ledger;
    private final List<Integer> bulk = new ArrayList<>();
    private long[] sorted = new long[0];
    private long[] recent = new long[MERGE_AT];
    private int recentCount;
    private int read;

    /** The last changes in a ledger. */
    public LastChanges(Ledger ledger) {
        this.ledger = ledger;
    }

    @Override
    public Optional<Posting> find(RecordKind kind, int id, int upTo) {
        int number;
        synchronized (this) {
            follow(upTo);
            number = number(kind, id, upTo);
        }
        return number == 0 ? Optional.empty() : ledger.findPosting(number);
    }

    private void follow(int upTo) {
        while (read < upTo) {
            int number = read + 1;
            Optional<Posting> posting = ledger.findPosting(number);
            if (posting.isEmpty()) {
                return;
            }
            if (posting.get().changes() > BULK) {
                bulk.add(number);
            } else {
                ledger.changesOf(number).forEach(change -> add(change, number));
            }
            read = number;
        }
    }

    private void add(Change change, int posting) {
        if (recentCount == recent.length) {
            merge();
        }
        recent[recentCount++] = pack(change.kind(), change.id(), posting);
    }

    private void merge() {
        long[] all = Arrays.copyOf(sorted, sorted.length + recentCount);
        System.arraycopy(recent, 0, all, sorted.length, recentCount);
        Arrays.sort(all);
        sorted = all;
        recentCount = 0;
        // Grown with what is kept, so that reading a long journal does not sort it again and again.
        recent = new long[Math.max(MERGE_AT, all.length / 4)];
    }

    private int number(RecordKind kind, int id, int upTo) {
        long wanted = pack(kind, id, upTo);
        int best = 0;
        int at = Arrays.binarySearch(sorted, wanted);
        int before = at >= 0 ? at : -at - 2;
        if (before >= 0) {
            best = postingOf(sorted[before], wanted);
        }
        for (int index = 0; index < recentCount; index++) {
            if (recent[index] <= wanted) {
                best = Math.max(best, postingOf(recent[index], wanted));
            }
        }
        if (best == 0 && bulk.size() == 1 && bulk.get(0) <= upTo) {
            best = bulk.get(0);
        }
        return best;
    }

    /** The posting of an entry where it is of the wanted record, else 0. */
    private static int postingOf(long entry, long wanted) {
        return (entry & ~POSTING_MASK) == (wanted & ~POSTING_MASK) ? (int) (entry & POSTING_MASK) : 0;
    }

    private static long pack(RecordKind kind, int id, int posting) {
        return (long) kind.ordinal() << KIND_SHIFT | (long) id << ID_SHIFT | posting;
    }
}
