package spanwright.sqlite;

import java.io.IOException;
import java.nio.channels.FileChannel;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;
import java.nio.file.StandardOpenOption;
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
            if (exists(file)) {
                append(drafts);
            } else {
                make(drafts);
            }
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

    private void append(List<Draft> drafts) throws SQLException {
        boolean kept = false;
        Connection writing = connection();
        try {
            write(drafts, stateWriter(writing), journalWriter(writing));
            writing.commit();
            kept = true;
        } finally {
            if (!kept) {
                undo(writing);
            }
        }
    }

    private static void write(List<Draft> drafts, StateWriter state, JournalWriter journal) throws SQLException {
        for (Draft draft : drafts) {
            state.write(draft.changes);
            journal.write(draft.sequel().packed());
        }
    }

    private Connection connection() throws SQLException {
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
    private void undo(Connection writing) throws SQLException {
        state = null;
        journal = null;
        writing.rollback();
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
            force(making);
            Files.move(making, file, StandardCopyOption.ATOMIC_MOVE, StandardCopyOption.REPLACE_EXISTING);
            made = true;
            forceFolder(file);
        } finally {
            if (!made) {
                Files.deleteIfExists(making);
                Files.deleteIfExists(RecordsFile.log(making));
            }
        }
    }

    /** Has the system write all of a file to the disk. */
    static void force(Path file) throws IOException {
        try (FileChannel channel = FileChannel.open(file, StandardOpenOption.WRITE)) {
            channel.force(true);
        }
    }

    /** Has the system write the name of a file to the disk, where it can be asked to. */
    static void forceFolder(Path file) throws IOException {
        Path folder = file.toAbsolutePath().getParent();
        if (folder != null && !System.getProperty("os.name", "").startsWith("Windows")) {
            try (FileChannel channel = FileChannel.open(folder, StandardOpenOption.READ)) {
                channel.force(true);
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
