package spanwright.network;

import java.time.Instant;
import java.util.List;
import java.util.NoSuchElementException;
import java.util.Optional;
import spanwright.journal.Change;
import spanwright.journal.Posting;
import spanwright.records.Refusal;

/**
 * Where the records are kept: the state now, every state before it, and the one way to the next. Any number of
 * threads may use it; postings are made one after another in the order in which they are numbered.
 */
public interface Ledger extends AutoCloseable {

    /** The newest state that is durable. */
    Snapshot current();

    /**
     * The state once a posting was made, that posting included.
     *
     * @param posting from 0 (nothing recorded yet) to the newest
     * @throws NoSuchElementException where there is no such posting
     */
    Snapshot asOf(int posting);

    /** The state at an instant: that of the last posting made at it or before it, else the empty one. */
    Snapshot asOf(Instant at);

    /**
     * Makes one posting of what the entry enters, and returns once it is durable; refused, nothing of it is kept.
     * What the entry throws is thrown on to the caller, and nothing is kept then either.
     *
     * @param by the person who posts
     * @param reason why
     */
    Outcome post(String by, String reason, Entry entry);

    /**
     * Heads of postings, the newest first.
     *
     * @param before only those with a lower number
     * @param limit how many at most, 0 or above
     */
    List<Posting> postings(int before, int limit);

    /** The head of a posting, if there is one of that number. */
    Optional<Posting> findPosting(int number);

    /**
     * The changes of a posting, in the order in which they were entered.
     *
     * @throws NoSuchElementException where there is no such posting
     */
    List<Change> changesOf(int posting);

    /** Gives up the file; postings not yet made are refused. A second call does nothing. */
    @Override
    void close();

    /** What a posting enters. */
    @FunctionalInterface
    interface Entry {

        /**
         * Enters changes into the newest state, alone with it.
         *
         * @return why it cannot be posted; empty where it can
         */
        List<Refusal> enter(SnapshotEditor editor);
    }
}
