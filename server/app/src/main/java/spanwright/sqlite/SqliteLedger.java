package spanwright.sqlite;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.sql.SQLException;
import java.time.Clock;
import java.time.Instant;
import java.util.List;
import java.util.NoSuchElementException;
import java.util.Optional;
import java.util.concurrent.CompletionStage;
import org.jspecify.annotations.Nullable;
import spanwright.draft.DraftBook;
import spanwright.incident.IncidentBook;
import spanwright.journal.Change;
import spanwright.journal.Posting;
import spanwright.network.Ledger;
import spanwright.network.Outcome;
import spanwright.network.Snapshot;

/** The ledger in a records file. Safe for any number of threads. */
public final class SqliteLedger implements Ledger {

    private final Path file;
    private final Readers readers;
    private final Journal journal;
    private final Views views;
    private final IntegrityCheck integrity;
    private final @Nullable WriterLock lock;
    private final Store store;
    private final PostingDesk desk;
    private final PostingLine line;
    private final ImageKeeper images;
    private final SqliteIncidents incidents;
    private final SqliteDrafts drafts;
    private volatile Tip tip;
    private boolean closed;

    private SqliteLedger(Path file, Loading.Loaded loaded, @Nullable WriterLock lock, Clock clock) {
        this.file = file;
        this.tip = loaded.tip();
        this.lock = lock;
        this.readers = new Readers(file);
        this.journal = new Journal(readers);
        this.views = new Views(journal);
        this.integrity = new IntegrityCheck(readers);
        this.store = new Store(file);
        this.images = new ImageKeeper(file, loaded.image());
        this.desk = new PostingDesk(store, clock, loaded.tip(), this::publish);
        this.line = new PostingLine(desk);
        BookTurn turn = new BookTurn(readers, line, store, desk, clock);
        this.incidents = new SqliteIncidents(turn);
        this.drafts = new SqliteDrafts(turn);
        if (lock == null) {
            desk.shut("records-read-only", "The records file was opened to be read only, so nothing can be posted.");
        }
    }

    private void publish(Tip made, int changes) {
        tip = made;
        images.committed(made, changes);
    }

    /** Opens a records file. */
    public static Opening open(Path file, Access access) {
        return open(file, access, Clock.systemUTC());
    }

    /**
     * Opens a records file.
     *
     * @param file there already, or to be made by the first posting; its folder is there
     * @param clock says when postings are made
     */
    public static Opening open(Path file, Access access, Clock clock) {
        WriterLock lock = null;
        try {
            lock = access == Access.WRITE ? WriterLock.take(file, clock) : null;
            Opening opening = open(file, access, clock, lock);
            if (opening instanceof Opening.Opened) {
                lock = null;
            }
            return opening;
        } catch (WriterLock.Taken taken) {
            return new Opening.Unopened(
                    "records-taken",
                    file + " is being written by " + taken.getMessage()
                            + ", and one writes at a time: wait for it, or post through it. It can be read meanwhile.");
        } catch (IOException fault) {
            return new Opening.Unopened("records-unreachable", file + " cannot be reached: " + fault);
        } catch (SQLException fault) {
            return FileCheck.unreadable(file, new StorageFault(fault));
        } catch (StorageFault fault) {
            return FileCheck.unreadable(file, fault);
        } finally {
            giveBack(lock);
        }
    }

    private static void giveBack(@Nullable WriterLock lock) {
        if (lock != null) {
            try {
                lock.close();
            } catch (IOException fault) {
                throw new StorageFault(fault);
            }
        }
    }

    private static Opening open(Path file, Access access, Clock clock, @Nullable WriterLock lock)
            throws IOException, SQLException {
        if (!Store.exists(file)) {
            if (access == Access.READ) {
                return new Opening.Unopened(
                        "records-missing",
                        "There is no records file " + file + ": name one, or load a folder into it.");
            }
            return new Opening.Opened(new SqliteLedger(file, new Loading.Loaded(Tip.NONE, 0), lock, clock));
        }
        Optional<Opening.Unopened> wrong = FileCheck.check(file);
        if (wrong.isPresent()) {
            return wrong.get();
        }
        if (lock != null) {
            Files.deleteIfExists(RecordsFile.making(file));
            Schema.bringUpToDate(file);
        }
        Loading.Loaded loaded = Loading.load(file);
        SqliteLedger ledger = new SqliteLedger(file, loaded, lock, clock);
        if (loaded.image() < 0) {
            ledger.images.begin(loaded.tip());
        }
        return new Opening.Opened(ledger);
    }

    @Override
    public Snapshot current() {
        return tip.snapshot();
    }

    @Override
    public Snapshot asOf(int posting) {
        Snapshot current = current();
        if (posting < 0 || posting > current.records().posting()) {
            throw new NoSuchElementException("no posting " + posting + "; the last is "
                    + current.records().posting());
        }
        return views.at(posting, current);
    }

    @Override
    public Snapshot asOf(Instant at) {
        Tip now = tip;
        if (!at.isBefore(now.at())) {
            return now.snapshot();
        }
        return views.at(journal.numberAt(at), now.snapshot());
    }

    @Override
    public Outcome post(String by, String reason, Entry entry) {
        Pending pending = new Pending(by, reason, entry);
        line.await(pending);
        return pending.result();
    }

    @Override
    public List<Posting> postings(int before, int limit) {
        int last = current().records().posting();
        return last == 0 || limit == 0 ? List.of() : journal.list(Math.min(before, last + 1), limit);
    }

    @Override
    public Optional<Posting> findPosting(int number) {
        return number < 1 || number > current().records().posting() ? Optional.empty() : journal.find(number);
    }

    @Override
    public List<Change> changesOf(int posting) {
        if (posting < 1 || posting > current().records().posting()) {
            throw new NoSuchElementException("no posting " + posting);
        }
        return journal.changesOf(posting);
    }

    /**
     * What a check of the whole file finds; begun when first asked for, beside everything else. It fails where the
     * file is closed before.
     */
    public CompletionStage<Integrity> integrity() {
        return integrity.begin();
    }

    /** The incidents kept in the same file. */
    public IncidentBook incidents() {
        return incidents;
    }

    /** The sheets being written, kept in the same file. */
    public DraftBook drafts() {
        return drafts;
    }

    /** The records file. */
    public Path file() {
        return file;
    }

    @Override
    public void close() {
        line.alone(this::closeAlone);
    }

    private void closeAlone() {
        if (closed) {
            return;
        }
        closed = true;
        desk.shut("records-closed", "The records file is closed.");
        try {
            integrity.stop();
            readers.close();
            store.close();
            if (lock == null) {
                images.finish();
            } else {
                images.close(tip);
            }
        } catch (SQLException fault) {
            throw new StorageFault(fault);
        } finally {
            giveBack(lock);
        }
    }
}
