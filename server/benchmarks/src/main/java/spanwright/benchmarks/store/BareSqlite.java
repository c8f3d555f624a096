package spanwright.benchmarks.store;

import java.nio.file.Path;
import java.sql.Connection;
import java.sql.DriverManager;
import java.sql.PreparedStatement;
import java.sql.SQLException;
import java.sql.Statement;
import java.util.concurrent.atomic.AtomicInteger;

/**
 * The natural table of joints in bare SQLite, one row a joint with an index on each end, WAL and synchronous=FULL:
 * what the program is held against. It checks nothing and keeps no journal.
 */
final class BareSqlite implements AutoCloseable {

    private static final String INSERT =
            "INSERT INTO splice(closure_id, a_end, b_end, kind, tray, pos) VALUES (?, ?, ?, 0, 1, ?)";
    private static final int BATCH = 10_000;

    private final Connection connection;
    private final PreparedStatement insert;

    BareSqlite(Path file) throws SQLException {
        connection = DriverManager.getConnection("jdbc:sqlite:" + file);
        try (Statement statement = connection.createStatement()) {
            statement.execute("PRAGMA journal_mode = WAL");
            statement.execute("PRAGMA synchronous = FULL");
            statement.execute("PRAGMA busy_timeout = 60000");
            statement.execute(
                    "CREATE TABLE IF NOT EXISTS splice(id INTEGER PRIMARY KEY, closure_id INTEGER NOT NULL, "
                            + "a_end INTEGER NOT NULL, b_end INTEGER NOT NULL, kind INTEGER NOT NULL, tray INTEGER, pos INTEGER)");
            statement.execute("CREATE INDEX IF NOT EXISTS splice_a ON splice(a_end)");
            statement.execute("CREATE INDEX IF NOT EXISTS splice_b ON splice(b_end)");
        }
        insert = connection.prepareStatement(INSERT);
    }

    /** Inserts rows, 10,000 a transaction, and brings the log into the file. */
    void bulk(long[] a, long[] b, int[] closures) throws SQLException {
        connection.setAutoCommit(false);
        for (int index = 0; index < a.length; index++) {
            add(a[index], b[index], closures[index], index);
            if ((index + 1) % BATCH == 0) {
                insert.executeBatch();
                connection.commit();
            }
        }
        insert.executeBatch();
        connection.commit();
        connection.setAutoCommit(true);
        try (Statement statement = connection.createStatement()) {
            statement.execute("PRAGMA wal_checkpoint(TRUNCATE)");
        }
    }

    /** Inserts twelve rows with fresh ends in one transaction. */
    void twelve(AtomicInteger fresh) throws SQLException {
        try (Statement statement = connection.createStatement()) {
            statement.execute("BEGIN IMMEDIATE");
            for (int index = 0; index < 12; index++) {
                // Scattered ends, as a crew's are beside the others' in the file.
                long end = Integer.toUnsignedLong(fresh.incrementAndGet() * 0x9E3779B1);
                add(end, end + (1L << 33), index, index);
            }
            insert.executeBatch();
            statement.execute("COMMIT");
        }
    }

    private void add(long a, long b, int closure, int position) throws SQLException {
        insert.setInt(1, closure);
        insert.setLong(2, a);
        insert.setLong(3, b);
        insert.setInt(4, position);
        insert.addBatch();
    }

    @Override
    public void close() throws SQLException {
        connection.close();
    }
}
