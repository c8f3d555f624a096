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
 * Adds rows to one table of records and removes them, in batches.
 *
 * <p>Plain JDBC, as everything on the way of a posting: a batch of prepared statements is the whole of it, and a
 * library between would only cost time for each of millions of rows.
 */
final class TableWriter {

    private static final int BATCH = 1024;

    /** With more patterns than this at once, all begin anew. */
    private static final int MOST_PATTERNS = 64;

    /** The statement for rows that have the same in common. */
    private static final class Insert {

        final List<@Nullable String> literals;
        final PreparedStatement statement;
        int rows;

        Insert(List<@Nullable String> literals, PreparedStatement statement) {
            this.literals = literals;
            this.statement = statement;
        }

        void flush() throws SQLException {
            if (rows > 0) {
                statement.executeBatch();
                rows = 0;
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
        Insert insert = insert();
        for (int index = 0; index < row.bound(); index++) {
            insert.statement.setObject(index + 1, row.value(index));
        }
        insert.statement.addBatch();
        if (++insert.rows == BATCH) {
            insert.flush();
        }
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
        List<@Nullable String> literals = row.literals();
        Insert fresh = new Insert(
                literals, connection.prepareStatement(RowPattern.insert(layout.table(), layout.columns(), literals)));
        inserts.add(fresh);
        return fresh;
    }

    private void beginAnew() throws SQLException {
        flushAdded();
        for (Insert insert : inserts) {
            insert.statement.close();
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
