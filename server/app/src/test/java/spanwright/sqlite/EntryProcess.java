package spanwright.sqlite;

import java.io.PrintStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.time.Instant;
import java.util.List;
import spanwright.incident.EntryDraft;
import spanwright.incident.EntryKind;
import spanwright.incident.IncidentBook;
import spanwright.incident.IncidentDraft;
import spanwright.incident.IncidentEntry;
import spanwright.incident.IncidentStart;
import spanwright.incident.Written;

/**
 * A process of its own that writes entries into an incident's log until it is killed. It says {@code written N} once it
 * has been told that entry N is durable.
 */
final class EntryProcess {

    private EntryProcess() {}

    /**
     * Writes for ever.
     *
     * @param arguments the records file
     */
    public static void main(String[] arguments) {
        PrintStream out = new PrintStream(System.out, true, StandardCharsets.UTF_8);
        SqliteLedger ledger = Ledgers.open(Path.of(arguments[0]), Access.WRITE);
        if (ledger.current().records().posting() == 0) {
            Ledgers.post(ledger, Ledgers.setting("owner", "Valley Fiber"));
        }
        IncidentBook book = ledger.incidents();
        if (book.list().isEmpty()) {
            IncidentStart start = new IncidentStart(List.of(), List.of(), List.of(), "7,412 m");
            book.open(new IncidentDraft("Cut", "D. Reed", Instant.now(), start), 1);
        }
        out.println("opened");
        for (int count = 1; count > 0; count++) {
            EntryDraft note =
                    EntryDraft.of(EntryKind.NOTE, Instant.now(), "D. Reed").saying("note " + count);
            if (book.write(1, note) instanceof Written.Kept<IncidentEntry> kept) {
                out.println("written " + kept.kept().number());
            }
        }
    }
}
