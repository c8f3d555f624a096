package spanwright.sqlite;

import java.time.Clock;
import java.time.Instant;
import java.util.ArrayList;
import java.util.List;
import java.util.function.BiConsumer;
import java.util.function.Supplier;
import org.jspecify.annotations.Nullable;
import org.sqlite.SQLiteErrorCode;
import spanwright.journal.Change;
import spanwright.journal.Posting;
import spanwright.network.Outcome;
import spanwright.network.PostingRules;
import spanwright.network.SnapshotEditor;
import spanwright.records.Refusal;

/** Judges postings on the newest state and commits those that the rules allow, several at a time. */
final class PostingDesk implements PostingLine.Maker {

    /** One commit holds this many postings at most, so that nobody waits for ever. */
    private static final int MOST = 64;

    private final Store store;
    private final Clock clock;
    private final BiConsumer<Tip, Integer> publish;
    private Tip tip;
    private @Nullable Refusal unwritable;

    /**
     * A desk.
     *
     * @param tip where the journal ends
     * @param publish is told where it ends after each commit, and how many changes that held
     */
    PostingDesk(Store store, Clock clock, Tip tip, BiConsumer<Tip, Integer> publish) {
        this.store = store;
        this.clock = clock;
        this.tip = tip;
        this.publish = publish;
    }

    /** Why nothing can be written any more; null where it can. In turn with postings. */
    @Nullable
    Refusal unwritable() {
        return unwritable;
    }

    /** Refuses all postings from now on. */
    void shut(String code, String sentence) {
        unwritable = new Refusal(code, sentence, null, null, null);
    }

    @Override
    public void make(Supplier<@Nullable Pending> line) {
        List<Pending> taken = new ArrayList<>();
        try {
            List<Draft> drafts = judge(line, taken);
            if (!drafts.isEmpty()) {
                keep(drafts);
            }
        } catch (RuntimeException | Error bug) {
            taken.forEach(pending -> pending.fail(bug));
        }
        taken.forEach(Pending::release);
    }

    private List<Draft> judge(Supplier<@Nullable Pending> line, List<Pending> taken) {
        List<Draft> drafts = new ArrayList<>();
        Tip at = tip;
        Pending pending = line.get();
        while (pending != null) {
            taken.add(pending);
            Draft draft = judge(pending, at);
            if (draft != null) {
                drafts.add(draft);
                if (draft.bulk()) {
                    return drafts;
                }
                at = draft.sequel().tip();
            }
            pending = taken.size() < MOST ? line.get() : null;
        }
        return drafts;
    }

    private @Nullable Draft judge(Pending pending, Tip at) {
        List<Refusal> headless = PostingRules.refuse(pending.by, pending.reason);
        Refusal closed = unwritable;
        if (!headless.isEmpty() || closed != null) {
            pending.settle(new Outcome.Refused(headless.isEmpty() && closed != null ? List.of(closed) : headless));
            return null;
        }
        try {
            SnapshotEditor editor = at.snapshot().edit();
            List<Refusal> refusals = PostingRules.enter(pending.entry, editor);
            if (refusals.isEmpty()) {
                return draft(pending, editor, at);
            }
            pending.settle(new Outcome.Refused(refusals));
        } catch (RuntimeException | Error thrown) {
            pending.fail(thrown);
        }
        return null;
    }

    private Draft draft(Pending pending, SnapshotEditor editor, Tip at) {
        Instant time = PostingTime.after(at.at(), clock.instant());
        int changes = editor.changes().size();
        Posting head = new Posting(at.number() + 1, time, pending.by, pending.reason, changes);
        return Draft.of(pending, head, editor, at);
    }

    private void keep(List<Draft> drafts) {
        try {
            store.commit(drafts);
        } catch (StorageFault fault) {
            if (!fault.breaksRule()) {
                fail(drafts, fault);
            } else if (drafts.size() > 1) {
                drafts.forEach(this::keepAlone);
            } else {
                drafts.get(0)
                        .pending
                        .refuse(
                                "database-rule",
                                "The records file does not take the posting: a rule of its tables is broken ("
                                        + fault.getMessage() + "). Nothing of it is kept.");
            }
            return;
        }
        int changes = 0;
        for (Draft draft : drafts) {
            changes += draft.changes.size();
            tip = draft.sequel().tip();
            draft.pending.settle(new Outcome.Posted(draft.head, tip.snapshot()));
        }
        publish.accept(tip, changes);
    }

    /** Makes a posting by itself whose commit together with others broke a rule of the tables: one of them does. */
    private void keepAlone(Draft draft) {
        SnapshotEditor editor = tip.snapshot().edit();
        List<Refusal> refusals = new ArrayList<>();
        for (Change change : draft.changes) {
            refusals.addAll(editor.apply(change));
        }
        refusals.addAll(editor.finish());
        if (refusals.isEmpty()) {
            keep(List.of(draft(draft.pending, editor, tip)));
        } else {
            draft.pending.settle(new Outcome.Refused(refusals));
        }
    }

    private void fail(List<Draft> drafts, StorageFault fault) {
        String cause = fault.primary() == SQLiteErrorCode.SQLITE_FULL ? "the disk is full" : fault.getMessage();
        shut(
                "records-unwritable",
                "The records file could not be written (" + cause + "), so nothing was posted, and nothing will be"
                        + " until the program is started again; the records can still be read.");
        Refusal why = unwritable;
        if (why != null) {
            drafts.forEach(draft -> draft.pending.settle(new Outcome.Refused(List.of(why))));
        }
    }
}
