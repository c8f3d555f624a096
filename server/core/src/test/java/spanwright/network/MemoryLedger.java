package spanwright.network;

import java.time.Clock;
import java.time.Instant;
import java.util.ArrayList;
import java.util.List;
import java.util.NoSuchElementException;
import java.util.Optional;
import spanwright.journal.Change;
import spanwright.journal.Posting;
import spanwright.records.Refusal;

/** A ledger that keeps every state and forgets all at its end: the plain twin of the real one, for tests. */
public final class MemoryLedger implements Ledger {

    private final Clock clock;
    private final List<Snapshot> states = new ArrayList<>(List.of(Snapshot.empty()));
    private final List<Posting> postings = new ArrayList<>();
    private final List<List<Change>> changes = new ArrayList<>();
    private boolean closed;

    /** A ledger of nothing, at the system's time. */
    public MemoryLedger() {
        this(Clock.systemUTC());
    }

    /** A ledger of nothing, at the time of a clock. */
    public MemoryLedger(Clock clock) {
        this.clock = clock;
    }

    @Override
    public synchronized Snapshot current() {
        return states.get(states.size() - 1);
    }

    @Override
    public synchronized Snapshot asOf(int posting) {
        if (posting < 0 || posting >= states.size()) {
            throw new NoSuchElementException("no posting " + posting);
        }
        return states.get(posting);
    }

    @Override
    public synchronized Snapshot asOf(Instant at) {
        int number = 0;
        for (Posting posting : postings) {
            if (!posting.at().isAfter(at)) {
                number = posting.number();
            }
        }
        return states.get(number);
    }

    @Override
    public synchronized Outcome post(String by, String reason, Entry entry) {
        List<Refusal> headless = PostingRules.refuse(by, reason);
        if (!headless.isEmpty()) {
            return new Outcome.Refused(headless);
        }
        if (closed) {
            return new Outcome.Refused(
                    List.of(new Refusal("records-closed", "The records are closed.", null, null, null)));
        }
        SnapshotEditor editor = current().edit();
        List<Refusal> refusals = PostingRules.enter(entry, editor);
        if (!refusals.isEmpty()) {
            return new Outcome.Refused(refusals);
        }
        Posting posting = new Posting(
                states.size(), nextTime(), by, reason, editor.changes().size());
        Snapshot next = editor.build(posting.number());
        changes.add(List.copyOf(editor.changes()));
        postings.add(posting);
        states.add(next);
        return new Outcome.Posted(posting, next);
    }

    private Instant nextTime() {
        Instant now = clock.instant();
        Instant last =
                postings.isEmpty() ? now : postings.get(postings.size() - 1).at();
        return now.isBefore(last) ? last : now;
    }

    @Override
    public synchronized List<Posting> postings(int before, int limit) {
        List<Posting> heads = new ArrayList<>();
        for (int index = Math.min(before - 2, postings.size() - 1); index >= 0 && heads.size() < limit; index--) {
            heads.add(postings.get(index));
        }
        return heads;
    }

    @Override
    public synchronized Optional<Posting> findPosting(int number) {
        return number < 1 || number > postings.size() ? Optional.empty() : Optional.of(postings.get(number - 1));
    }

    @Override
    public synchronized List<Change> changesOf(int posting) {
        if (posting < 1 || posting > changes.size()) {
            throw new NoSuchElementException("no posting " + posting);
        }
        return changes.get(posting - 1);
    }

    @Override
    public synchronized void close() {
        closed = true;
    }
}
