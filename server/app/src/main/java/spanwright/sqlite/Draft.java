package spanwright.sqlite;

import java.util.List;
import java.util.concurrent.CompletableFuture;
import java.util.concurrent.CompletionException;
import java.util.function.Supplier;
import spanwright.journal.Change;
import spanwright.journal.Posting;
import spanwright.network.SnapshotEditor;

/** A posting that the rules allow, not yet durable. */
final class Draft {

    /** From this many changes on, what can be done beside the writing of the tables is done beside it. */
    static final int BULK = 20_000;

    /** What follows from a posting besides the tables: its pages in the journal, and the state with it. */
    record Sequel(PackedPosting packed, Tip tip) {}

    final Pending pending;
    final Posting head;
    final List<Change> changes;
    private final Supplier<Sequel> sequel;

    private Draft(Pending pending, Posting head, List<Change> changes, Supplier<Sequel> sequel) {
        this.pending = pending;
        this.head = head;
        this.changes = changes;
        this.sequel = sequel;
    }

    /**
     * Drafts a posting from an editor, which is not used again.
     *
     * @param before where the journal ends before it
     */
    static Draft of(Pending pending, Posting head, SnapshotEditor editor, Tip before) {
        List<Change> changes = editor.changes();
        Supplier<Sequel> following = () -> {
            PackedPosting packed = PackedPosting.of(head, changes, before.hash());
            return new Sequel(packed, new Tip(editor.build(head.number()), head.at(), packed.hash()));
        };
        if (changes.size() < BULK) {
            Sequel ready = following.get();
            return new Draft(pending, head, changes, () -> ready);
        }
        CompletableFuture<Sequel> beside = new CompletableFuture<>();
        Thread thread = new Thread(() -> complete(beside, following), "posting " + head.number());
        thread.start();
        return new Draft(pending, head, changes, () -> join(beside));
    }

    private static void complete(CompletableFuture<Sequel> beside, Supplier<Sequel> following) {
        try {
            beside.complete(following.get());
        } catch (RuntimeException | Error fault) {
            beside.completeExceptionally(fault);
        }
    }

    private static Sequel join(CompletableFuture<Sequel> beside) {
        try {
            return beside.join();
        } catch (CompletionException fault) {
            throw new IllegalStateException("a posting could not be drafted", fault.getCause());
        }
    }

    boolean bulk() {
        return changes.size() >= BULK;
    }

    /** What follows from it; waited for where it is still being worked out. */
    Sequel sequel() {
        return sequel.get();
    }
}
