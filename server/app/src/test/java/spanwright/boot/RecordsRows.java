package spanwright.boot;

import spanwright.answers.RowTexts;
import spanwright.http.PostingDesk;
import spanwright.network.Ledger;

/** The rows and the posting desk of the program itself, for tests of the routes that need them. */
public final class RecordsRows {

    private RecordsRows() {}

    /** Writes records as rows of the records folder. */
    public static RowTexts texts() {
        return new FolderRows();
    }

    /** Takes changes of such rows. */
    public static PostingDesk desk(Ledger ledger) {
        return new RowDesk(ledger);
    }
}
