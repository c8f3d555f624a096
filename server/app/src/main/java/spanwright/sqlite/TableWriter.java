package spanwright.sqlite;

import java.sql.Connection;
import java.sql.PreparedStatement;
import java.sql.SQLException;
import java.util.ArrayList;
import java.util.List;
import org.jspecify.annotations.Nullable;
import spanwright.journal.Recorded;
import spanwright.sqlite.rows.Layout;

/**
 * Adds rows to one table of records and removes them: rows that have the same in common 16 by one statement, which
 * took 2.0 us a joint where a statement a row, in batches, took 2.4 to 3.4.
 *
 * <p>Plain JDBC, as everything on the way of a posting: prepared statements bound and run are the whole of it, and a
 * library between would only cost time for each of millions of rows.
 */
final class TableWriter {

    private static final int BATCH = 1024;
    private static final int MANY = 16;

    /** With more patterns than this at once, all begin anew. */
    private static final int MOST_PATTERNS = 64;

    /** The statements for rows that have the same in common. */
    private final class Insert implements AutoCloseable {

        final List<@Nullable String> literals;
        private final int bound;
        private final Object[] waiting;
        private int rows;
        private @Nullable PreparedStatement one;
        private @Nullable PreparedStatement many;

        Insert(List<@Nullable String> literals, int bound) {
            this.literals = literals;
            this.bound = bound;
            this.waiting = new Object[MANY * bound];
        }

        void add(RowPattern row) throws SQLException {
            for (int index = 0; index < bound; index++) {
                waiting[rows * bound + index] = row.value(index);
            }
            if (++rows == MANY) {
                PreparedStatement statement = many == null ? prepare(MANY) : many;
                many = statement;
                run(statement, 0, MANY);
                rows = 0;
            }
        }

        void flush() throws SQLException {
            if (rows > 0) {
                PreparedStatement statement = one == null ? prepare(1) : one;
                one = statement;
                for (int row = 0; row < rows; row++) {
                    run(statement, row, 1);
                }
                rows = 0;
            }
        }

        private PreparedStatement prepare(int count) throws SQLException {
            return connection.prepareStatement(RowPattern.insert(layout.table(), layout.columns(), literals, count));
        }

        private void run(PreparedStatement statement, int from, int count) throws SQLException {
            for (int index = 0; index < count * bound; index++) {
                statement.setObject(index + 1, waiting[from * bound + index]);
            }
            statement.executeUpdate();
        }

        @Override
        public void close() throws SQLException {
            flush();
            for (PreparedStatement statement : new @Nullable PreparedStatement[] {one, many}) {
                if (statement != null) {
                    statement.close();
                }
            }
        }
    }

    private final Connection connection;
    private final Layout layout;
    private final RowPattern row;
    private final List<Insert> inserts = new ArrayList<>();
    private final PreparedStatement delete;
    private int deletes;

    TableWriter(Connection connection, Layout layout) throws SQLException {
        this.connection = connection;
        this.layout = layout;
        this.row = new RowPattern(layout.columns().size());
        this.delete = connection.prepareStatement("DELETE FROM " + layout.table() + " WHERE id = ?");
    }

    void add(Recorded record) throws SQLException {
        row.restart();
        layout.write(record, row);
        insert().add(row);
    }

    private Insert insert() throws SQLException {
        // Rows alike come one after another, so the last one asked for is looked at first.
        for (int index = inserts.size() - 1; index >= 0; index--) {
            Insert known = inserts.get(index);
            if (row.fits(known.literals)) {
                if (index != inserts.size() - 1) {
                    inserts.remove(index);
                    inserts.add(known);
                }
                return known;
            }
        }
        if (inserts.size() == MOST_PATTERNS) {
            beginAnew();
        }
        Insert fresh = new Insert(row.literals(), row.bound());
        inserts.add(fresh);
        return fresh;
    }

    private void beginAnew() throws SQLException {
        for (Insert insert : inserts) {
            insert.close();
        }
        inserts.clear();
    }

    void remove(int id) throws SQLException {
        delete.setInt(1, id);
        delete.addBatch();
        if (++deletes == BATCH) {
            flushRemoved();
        }
    }

    void flushAdded() throws SQLException {
        for (Insert insert : inserts) {
            insert.flush();
        }
    }

    void flushRemoved() throws SQLException {
        if (deletes > 0) {
            delete.executeBatch();
            deletes = 0;
        }
    }
}
