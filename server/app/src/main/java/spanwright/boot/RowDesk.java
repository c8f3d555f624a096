package spanwright.boot;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import org.jspecify.annotations.Nullable;
import spanwright.exchange.PostingRows;
import spanwright.http.PostingDesk;
import spanwright.network.Ledger;
import spanwright.network.Outcome;
import spanwright.records.Refusal;

/** Posts changed rows of the records folder. */
final class RowDesk implements PostingDesk {

    private final Ledger ledger;

    RowDesk(Ledger ledger) {
        this.ledger = ledger;
    }

    @Override
    public Result post(String by, String reason, List<RowChange> changes) {
        List<spanwright.exchange.RowChange> rows =
                changes.stream().map(RowDesk::row).toList();
        List<RowFault> faults = new ArrayList<>();
        Outcome outcome = ledger.post(by, reason, editor -> {
            faults.clear();
            PostingRows.enter(editor, rows)
                    .forEach(fault -> faults.add(new RowFault(fault.change(), fault.column(), fault.text())));
            return faults.stream().map(RowDesk::refusal).toList();
        });
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
