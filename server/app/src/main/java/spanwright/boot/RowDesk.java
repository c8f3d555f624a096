package spanwright.boot;

import java.util.List;
import spanwright.http.PostingDesk;
import spanwright.network.Ledger;

/** Posts changed rows of the records folder. */
final class RowDesk implements PostingDesk {

    private final Ledger ledger;

    RowDesk(Ledger ledger) {
        this.ledger = ledger;
    }

    @Override
    public Result post(String by, String reason, List<RowChange> changes) {
        throw new UnsupportedOperationException("postings " + ledger);
    }
}
