package spanwright.sqlite;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.sql.Connection;
import java.sql.SQLException;
import java.sql.Statement;
import java.util.List;
import org.jspecify.annotations.Nullable;

/** Commits postings to the records file, and makes the file with the first. One thread's at a time. */
final class Store implements AutoCloseable {

    private final Path file;
    private @Nullable Connection connection;
    private @Nullable StateWriter state;
    private @Nullable JournalWriter journal;

    /** A store of a file that is there, or is made by the first commit. */
    Store(Path file) {
        this.file = file;
    }

    /**
     * Writes postings in one transaction, and returns once they are durable. After a fault nothing of them is kept.
     *
     * @throws StorageFault where the file, or a rule of its tables, does not take them
     */
    void commit(List<Draft> drafts) {
        try {
            if (connection == null && !exists(file)) {
                make(drafts);
            } else {
                append(writing -> write(drafts, stateWriter(writing), journalWriter(writing)));
            }
        } catch (SQLException fault) {
            throw new StorageFault(fault);
        } catch (IOException fault) {
            throw new StorageFault(fault);
        }
    }

    /** Something written to the file besides postings. */
    @FunctionalInterface
    interface Writing {
        /** Writes; the transaction is committed afterwards. */
        void write(Connection connection) throws SQLException;
    }

    /**
     * Writes in one transaction, and returns once it is durable. After a fault nothing of it is kept.
     *
     * @throws StorageFault where the file, or a rule of its tables, does not take it
     */
    void commit(Writing writing) {
        try {
            append(writing);
        } catch (SQLException fault) {
            throw new StorageFault(fault);
        } catch (IOException fault) {
            throw new StorageFault(fault);
        }
    }

    /** Whether there is a records file: an empty file is none yet. */
    static boolean exists(Path file) throws IOException {
        return Files.exists(file) && Files.size(file) > 0;
    }

    private void append(Writing writing) throws SQLException, IOException {
        if (!file.toFile().exists()) {
            // Not made anew: what stood in it would be gone.
            throw new IOException(file + " is there no longer");
        }
        Connection open = connection();
        try {
            writing.write(open);
            open.commit();
        } catch (SQLException | RuntimeException | Error fault) {
            undo(open, fault);
            throw fault;
        }
    }

    private static void write(List<Draft> drafts, StateWriter state, JournalWriter journal) throws SQLException {
        for (Draft draft : drafts) {
            state.write(draft.changes);
            journal.write(draft.sequel().packed());
        }
    }

    /** The connection that writes. */
    Connection connection() throws SQLException {
        Connection open = connection;
        if (open == null) {
            open = Connections.writing(file);
            connection = open;
        }
        return open;
    }

    private StateWriter stateWriter(Connection writing) throws SQLException {
        StateWriter writer = state;
        if (writer == null) {
            writer = new StateWriter(writing);
            state = writer;
        }
        return writer;
    }

    private JournalWriter journalWriter(Connection writing) throws SQLException {
        JournalWriter writer = journal;
        if (writer == null) {
            writer = new JournalWriter(writing);
            journal = writer;
        }
        return writer;
    }

    /** Takes back what was written, and forgets the statements: batches may be half filled. */
    private void undo(Connection writing, Throwable fault) {
        state = null;
        journal = null;
        try {
            writing.rollback();
        } catch (SQLException already) {
            // Some faults, such as a full disk, have SQLite take it back itself. So as to be sure, begin afresh.
            fault.addSuppressed(already);
            connection = null;
            close(writing, fault);
        }
    }

    private static void close(Connection writing, Throwable fault) {
        try {
            writing.close();
        } catch (SQLException unclosed) {
            fault.addSuppressed(unclosed);
        }
    }

    private void make(List<Draft> drafts) throws SQLException, IOException {
        Path making = RecordsFile.making(file);
        boolean made = false;
        try {
            Files.deleteIfExists(making);
            try (Connection fresh = Connections.making(making)) {
                fresh.setAutoCommit(false);
                Schema.create(fresh);
                write(drafts, new StateWriter(fresh), new JournalWriter(fresh));
                fresh.commit();
                fresh.setAutoCommit(true);
                try (Statement statement = fresh.createStatement()) {
                    statement.execute("PRAGMA journal_mode = WAL");
                }
            }
            Disk.moveInto(making, file);
            made = true;
        } finally {
            if (!made) {
                Files.deleteIfExists(making);
                Files.deleteIfExists(RecordsFile.log(making));
            }
        }
    }

    @Override
    public void close() throws SQLException {
        Connection open = connection;
        if (open != null) {
            connection = null;
            open.close();
        }
    }
}
