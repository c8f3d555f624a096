package spanwright.boot;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.jspecify.annotations.Nullable;
import spanwright.exchange.PostingRows;
import spanwright.http.PostingDesk;
import spanwright.journal.Change;
import spanwright.journal.Posting;
import spanwright.network.Ledger;
import spanwright.network.Outcome;
import spanwright.records.Refusal;

/** Posts changed rows of the records folder, and takes postings back. */
final class RowDesk implements PostingDesk {

    private static final int MOST_TAKEN_BACK = 100_000;

    private final Ledger ledger;

    RowDesk(Ledger ledger) {
        this.ledger = ledger;
    }

    @Override
    public Result post(String by, String reason, @Nullable Integer unchangedSince, List<RowChange> changes) {
        List<spanwright.exchange.RowChange> rows =
                changes.stream().map(RowDesk::row).toList();
        List<RowFault> faults = new ArrayList<>();
        Outcome outcome = ledger.post(by, reason, editor -> {
            faults.clear();
            if (unchangedSince != null && unchangedSince != editor.base()) {
                return List.of(changedSince(unchangedSince, editor.base()));
            }
            PostingRows.enter(editor, rows)
                    .forEach(fault -> faults.add(new RowFault(fault.change(), fault.column(), fault.text())));
            return faults.stream().map(RowDesk::refusal).toList();
        });
        return result(outcome, faults);
    }

    private static Refusal changedSince(int posting, int newest) {
        String what = posting > newest
                ? "there is no posting " + posting + " yet"
                : "posting " + newest + " came meanwhile, and what this rests on may be gone";
        return new Refusal("changed-since", what + "; ask anew, then post what that answers", null, null, null);
    }

    @Override
    public Result takeBack(int posting, String by, String reason) {
        Optional<Posting> head = ledger.findPosting(posting);
        if (head.isEmpty() || head.get().changes() > MOST_TAKEN_BACK) {
            return new Result.Refused(List.of(new RowFault(
                    0,
                    null,
                    "posting " + posting + " is not there, or holds more than " + MOST_TAKEN_BACK
                            + " changes; undo it in parts, by postings of its own rows")));
        }
        List<Change> changes = ledger.changesOf(posting);
        return result(ledger.post(by, reason, editor -> editor.takeBack(changes)), new ArrayList<>());
    }

    private static Result result(Outcome outcome, List<RowFault> faults) {
        if (outcome instanceof Outcome.Posted posted) {
            return new Result.Posted(posted.posting());
        }
        if (faults.isEmpty()) {
            ((Outcome.Refused) outcome)
                    .refusals()
                    .forEach(refusal -> faults.add(new RowFault(0, refusal.column(), refusal.sentence())));
        }
        return new Result.Refused(faults);
    }

    private static spanwright.exchange.RowChange row(RowChange change) {
        return new spanwright.exchange.RowChange(
                spanwright.exchange.RowChange.Action.valueOf(change.action().name()),
                change.table(),
                change.key(),
                withoutNulls(change.row()));
    }

    private static Map<String, String> withoutNulls(Map<String, @Nullable String> texts) {
        Map<String, String> plain = new LinkedHashMap<>();
        texts.forEach((column, text) -> plain.put(column, text == null ? "" : text));
        return plain;
    }

    private static Refusal refusal(RowFault fault) {
        return new Refusal("row", fault.text(), fault.column(), null, null);
    }
}
