package spanwright.draft;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.NoSuchElementException;
import java.util.Optional;
import org.jspecify.annotations.Nullable;
import spanwright.network.Ledger;
import spanwright.network.Outcome;
import spanwright.network.Snapshot;
import spanwright.network.SnapshotEditor;
import spanwright.records.Refusal;
import spanwright.sheet.Mistake;
import spanwright.sheet.SheetEntry;
import spanwright.sheet.SheetRead;
import spanwright.sheet.SheetReader;

/** Where sheets are written, checked, submitted and posted. Any number of threads may use it. */
public final class DraftDesk {

    private final Ledger ledger;
    private final DraftBook book;

    /** A desk over the records and the drafts beside them. */
    public DraftDesk(Ledger ledger, DraftBook book) {
        this.ledger = ledger;
        this.book = book;
    }

    /** Every draft, the newest first. */
    public List<Draft> list() {
        return book.list();
    }

    /**
     * A draft.
     *
     * @throws NoSuchElementException where there is none of that number
     */
    public Draft get(int id) {
        return book.find(id).orElseThrow(() -> new NoSuchElementException("There is no draft " + id + "."));
    }

    /** The other open drafts of the same enclosure: their authors are told of each other. */
    public List<Draft> beside(Draft draft) {
        return book.list().stream()
                .filter(other -> other.id() != draft.id()
                        && other.enclosure() == draft.enclosure()
                        && other.state().open())
                .toList();
    }

    /** Begins a draft on the records as they are. */
    public DraftOutcome begin(int enclosure, String author, DraftText text) {
        return book.begin(
                new DraftStart(enclosure, author, ledger.current().records().posting(), text));
    }

    /** Takes a step that asks nothing of the sheet. */
    public DraftOutcome change(int id, int revision, DraftStep step) {
        get(id);
        return book.change(id, revision, step);
    }

    /** A draft as if it were posted now; nothing where its enclosure is gone from the records. */
    public Optional<SheetCheck> check(Draft draft) {
        Snapshot now = ledger.current();
        return now.records()
                .enclosures()
                .find(draft.enclosure())
                .map(enclosure -> SheetCheck.of(now, enclosure.id(), draft.text(), book.list()));
    }

    /** Hands a draft over to be posted, once every warning and prompt is answered. */
    public DraftOutcome submit(int id, int revision, String by) {
        Draft draft = get(id);
        Optional<DraftOutcome> not = stale(draft, revision).or(() -> refused(draft));
        return not.orElseGet(() -> book.change(id, revision, new DraftStep.Submit(by)));
    }

    private static Optional<DraftOutcome> stale(Draft draft, int revision) {
        return draft.revision() == revision ? Optional.empty() : Optional.of(new DraftOutcome.Stale(draft));
    }

    /** What of a draft stands in the way of its being submitted. */
    private Optional<DraftOutcome> refused(Draft draft) {
        SheetCheck check = check(draft).orElse(null);
        if (check == null) {
            return refused(refusal("enclosure-gone", "The enclosure of this sheet is gone from the records."));
        }
        List<Refusal> open = check.open(draft.text()).stream()
                .map(slip -> refusal(slip.rule(), where(slip) + slip.text() + " " + slip.mend()))
                .toList();
        if (!open.isEmpty()) {
            return Optional.of(new DraftOutcome.Refused(open));
        }
        return check.read().statements().isEmpty()
                ? refused(refusal("sheet-empty", "The sheet says nothing; write a line."))
                : Optional.empty();
    }

    private static Optional<DraftOutcome> refused(Refusal refusal) {
        return Optional.of(new DraftOutcome.Refused(List.of(refusal)));
    }

    private static String where(Slip slip) {
        return slip.ofSheet()
                ? ""
                : "Line " + slip.place().line() + ", column " + slip.place().column() + ": ";
    }

    private static Refusal refusal(String code, String sentence) {
        return new Refusal(code, sentence, "lines", null, null);
    }

    /**
     * Posts a submitted draft, all of it or nothing, upon the records as they then are.
     *
     * @param by the person who posts
     * @param reason why
     */
    public DraftOutcome post(int id, int revision, String by, String reason) {
        Draft draft = get(id);
        Optional<DraftOutcome> stale = stale(draft, revision);
        if (stale.isPresent()) {
            return stale.get();
        }
        Optional<Refusal> notNow = DraftRules.refuse(draft, new DraftStep.Posted(1, ""));
        if (notNow.isPresent()) {
            return new DraftOutcome.Refused(List.of(notNow.get()));
        }
        SheetCheck check = check(draft).orElse(null);
        if (check != null && check.touchesPriority() && isOf(draft, by)) {
            return new DraftOutcome.Refused(List.of(new Refusal(
                    "second-person",
                    "This sheet touches circuits of priority " + SheetCheck.PRIORITY
                            + " or before, so another person than " + draft.author() + " posts it.",
                    "by",
                    null,
                    null)));
        }
        return postChecked(draft, by, reason, check == null ? "" : check.fingerprint());
    }

    private static boolean isOf(Draft draft, String by) {
        return same(draft.author(), by) || same(draft.submittedBy(), by);
    }

    private static boolean same(@Nullable String one, String other) {
        return one != null
                && one.strip().toLowerCase(Locale.ROOT).equals(other.strip().toLowerCase(Locale.ROOT));
    }

    private DraftOutcome postChecked(Draft draft, String by, String reason, String fingerprint) {
        Snapshot base =
                ledger.asOf(Math.min(draft.base(), ledger.current().records().posting()));
        List<TubeConflict> conflicts = new ArrayList<>();
        Outcome outcome = ledger.post(by, reason, editor -> {
            conflicts.clear();
            return enter(editor, base, draft, conflicts);
        });
        if (!conflicts.isEmpty()) {
            return new DraftOutcome.Conflicting(draft, conflicts);
        }
        if (outcome instanceof Outcome.Refused refused) {
            return new DraftOutcome.Refused(refused.refusals());
        }
        int posting = ((Outcome.Posted) outcome).posting().number();
        return book.change(draft.id(), draft.revision(), new DraftStep.Posted(posting, fingerprint));
    }

    private static List<Refusal> enter(
            SnapshotEditor editor, Snapshot base, Draft draft, List<TubeConflict> conflicts) {
        if (editor.records().enclosures().find(draft.enclosure()).isEmpty()) {
            return List.of(refusal("enclosure-gone", "The enclosure of this sheet is gone from the records."));
        }
        DraftText text = draft.text();
        SheetRead read = SheetReader.read(editor.records(), draft.enclosure(), text.lines());
        List<Refusal> refusals = new ArrayList<>();
        for (Mistake mistake : read.mistakes()) {
            refusals.add(refusal(
                    mistake.code(), "Line " + mistake.place().line() + ": " + mistake.text() + " " + mistake.mend()));
        }
        conflicts.addAll(TubeConflicts.list(base, editor, draft.enclosure(), read.statements()));
        conflicts.forEach(tube -> refusals.add(
                refusal("plant-changed", tube.leg() + " " + tube.numbers() + " is " + tube.is() + " now.")));
        if (refusals.isEmpty()) {
            SheetEntry.enter(editor, draft.enclosure(), text.header(), read.statements())
                    .forEach(refused -> refusals.add(refusal(
                            refused.refusal().code(),
                            "Line " + refused.place().line() + ": "
                                    + refused.refusal().sentence())));
        }
        if (refusals.isEmpty() && editor.changes().isEmpty()) {
            refusals.add(refusal("nothing-to-post", "The records say all of this already; drop the draft."));
        }
        return refusals;
    }
}
