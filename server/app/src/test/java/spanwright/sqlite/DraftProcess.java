package spanwright.sqlite;

import java.io.PrintStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.List;
import spanwright.draft.Draft;
import spanwright.draft.DraftBook;
import spanwright.draft.DraftOutcome;
import spanwright.draft.DraftStart;
import spanwright.draft.DraftStep;
import spanwright.draft.DraftText;
import spanwright.sheet.SheetHeader;

/**
 * A process of its own that saves a draft, a letter more each time, until it is killed. It says {@code saved N} once it has
 * been told that revision N is durable.
 */
final class DraftProcess {

    private DraftProcess() {}

    /**
     * Saves for ever.
     *
     * @param arguments the records file
     */
    public static void main(String[] arguments) {
        PrintStream out = new PrintStream(System.out, true, StandardCharsets.UTF_8);
        SqliteLedger ledger = Ledgers.open(Path.of(arguments[0]), Access.WRITE);
        if (ledger.current().records().posting() == 0) {
            Ledgers.post(ledger, Ledgers.setting("owner", "Valley Fiber"));
        }
        DraftBook book = ledger.drafts();
        if (book.list().isEmpty()) {
            book.begin(new DraftStart(1, "R. Vale", 1, text(1)));
        }
        out.println("opened");
        Draft draft = book.find(1).orElseThrow();
        while (true) {
            DraftStep step = new DraftStep.Save(text(draft.revision() + 1), 1);
            if (book.change(1, draft.revision(), step) instanceof DraftOutcome.Kept kept) {
                draft = kept.draft();
                out.println("saved " + draft.revision());
            }
        }
    }

    /** What stands in the draft at a revision. */
    static DraftText text(int revision) {
        List<String> lines = List.of("F-1 ahead " + revision + " capped");
        return new DraftText(lines, SheetHeader.NONE, 1, revision, List.of());
    }
}
