package spanwright.sqlite;

import java.nio.file.Files;
import java.nio.file.Path;
import java.sql.Connection;
import java.sql.SQLException;
import java.sql.Statement;
import org.sqlite.SQLiteConfig;

/** Opens connections to records files. */
final class Connections {

    private static final int WRITER_CACHE_KIB = 128 * 1024;
    private static final int READER_CACHE_KIB = 16 * 1024;
    private static final int WAIT_MS = 10_000;

    private Connections() {}

    /**
     * The one that writes: every commit is on the disk before it returns. It stands in a transaction at all times
     * (begun, but holding nothing until the first statement).
     */
    static Connection writing(Path file) throws SQLException {
        SQLiteConfig config = config(WRITER_CACHE_KIB);
        config.setJournalMode(SQLiteConfig.JournalMode.WAL);
        config.setSynchronous(SQLiteConfig.SynchronousMode.FULL);
        config.enforceForeignKeys(true);
        Connection connection = open(file, config);
        connection.setAutoCommit(false);
        return connection;
    }

    /** One that makes a new file which nobody sees yet: nothing is safe until it is closed and forced to the disk. */
    static Connection making(Path file) throws SQLException {
        SQLiteConfig config = config(WRITER_CACHE_KIB);
        config.setJournalMode(SQLiteConfig.JournalMode.OFF);
        config.setSynchronous(SQLiteConfig.SynchronousMode.OFF);
        config.setLockingMode(SQLiteConfig.LockingMode.EXCLUSIVE);
        config.enforceForeignKeys(true);
        return open(file, config);
    }

    /** One that only reads. */
    static Connection reading(Path file) throws SQLException {
        SQLiteConfig config = config(READER_CACHE_KIB);
        if (!Files.isWritable(file)) {
            config.setReadOnly(true);
            return open(file, config);
        }
        // SQLite keeps its index of the log beside the file, and clears both away when the last one closes: for that
        // a reader must be allowed to write, though no statement of it is.
        Connection connection = open(file, config);
        try (Statement statement = connection.createStatement()) {
            statement.execute("PRAGMA query_only = ON");
        }
        return connection;
    }

    private static SQLiteConfig config(int cacheKib) {
        SQLiteConfig config = new SQLiteConfig();
        config.setCacheSize(-cacheKib);
        config.setTempStore(SQLiteConfig.TempStore.MEMORY);
        config.setBusyTimeout(WAIT_MS);
        // Else the driver asks for the last identity after each row, which takes as long as to add one.
        config.setGetGeneratedKeys(false);
        return config;
    }

    private static Connection open(Path file, SQLiteConfig config) throws SQLException {
        return config.createConnection("jdbc:sqlite:" + file.toAbsolutePath());
    }
}
