package spanwright.repair;

import java.util.ArrayList;
import java.util.List;
import java.util.Objects;
import java.util.concurrent.atomic.AtomicReference;
import spanwright.incident.Written;
import spanwright.network.Ledger;
import spanwright.network.Outcome;
import spanwright.network.Snapshot;
import spanwright.network.SnapshotEditor;
import spanwright.records.Refusal;

/** Tries a repair without keeping it, or posts it as one posting. Any number of threads may use it. */
public final class RepairDesk {

    private final Ledger ledger;

    /** A desk over the records. */
    public RepairDesk(Ledger ledger) {
        this.ledger = ledger;
    }

    /** What a repair would make on the records as they stand; nothing of it is kept. */
    public Written<RepairMade> preview(RepairOrder order) {
        Snapshot now = ledger.current();
        SnapshotEditor editor = now.edit();
        Repair repair = new Repair(editor, order);
        List<Refusal> refusals = new ArrayList<>(repair.enter());
        if (refusals.isEmpty()) {
            refusals.addAll(editor.finish());
        }
        return refusals.isEmpty() ? new Written.Kept<>(repair.made(now)) : new Written.Refused<>(refusals);
    }

    /**
     * Posts a repair, all of it or nothing.
     *
     * @param by the person who posts
     * @param reason why
     */
    public Written<Posted> post(String by, String reason, RepairOrder order) {
        Snapshot now = ledger.current();
        AtomicReference<Repair> entered = new AtomicReference<>();
        Outcome outcome = ledger.post(by, reason, editor -> {
            Repair repair = new Repair(editor, order);
            entered.set(repair);
            return repair.enter();
        });
        if (outcome instanceof Outcome.Refused refused) {
            return new Written.Refused<>(refused.refusals());
        }
        int posting = ((Outcome.Posted) outcome).posting().number();
        // Another posting may have come between.
        Snapshot before = now.records().posting() == posting - 1 ? now : ledger.asOf(posting - 1);
        return new Written.Kept<>(
                new Posted(posting, Objects.requireNonNull(entered.get()).made(before)));
    }

    /**
     * A repair that is durable.
     *
     * @param posting the number of its posting
     * @param made what it made
     */
    public record Posted(int posting, RepairMade made) {}
}
