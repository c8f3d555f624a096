package spanwright.sqlite;

import java.sql.Connection;
import java.sql.PreparedStatement;
import java.sql.SQLException;
import java.util.stream.Collectors;
import spanwright.journal.Recorded;
import spanwright.sqlite.rows.Column;
import spanwright.sqlite.rows.Layout;

/**
 * Adds rows to one table of records and removes them, in batches.
 *
 * <p>Plain JDBC, as everything on the way of a posting: a batch of prepared statements is the whole of it, and a
 * library between would only cost time for each of millions of rows.
 */
final class TableWriter {

    private static final int BATCH = 1024;

    private final Layout layout;
    private final PreparedStatement insert;
    private final PreparedStatement delete;
    private final StatementSink sink;
    private int inserts;
    private int deletes;

    TableWriter(Connection connection, Layout layout) throws SQLException {
        this.layout = layout;
        String columns = layout.columns().stream().map(Column::name).collect(Collectors.joining(", "));
        String marks = layout.columns().stream().map(column -> "?").collect(Collectors.joining(", "));
        this.insert = connection.prepareStatement(
                "INSERT INTO " + layout.table() + " (" + columns + ") VALUES (" + marks + ")");
        this.delete = connection.prepareStatement("DELETE FROM " + layout.table() + " WHERE id = ?");
        this.sink = new StatementSink(insert);
    }

    void add(Recorded record) throws SQLException {
        sink.restart();
        layout.write(record, sink);
        insert.addBatch();
        if (++inserts == BATCH) {
            flushAdded();
        }
    }

    void remove(int id) throws SQLException {
        delete.setInt(1, id);
        delete.addBatch();
        if (++deletes == BATCH) {
            flushRemoved();
        }
    }

    void flushAdded() throws SQLException {
        if (inserts > 0) {
            insert.executeBatch();
            inserts = 0;
        }
    }

    void flushRemoved() throws SQLException {
        if (deletes > 0) {
            delete.executeBatch();
            deletes = 0;
        }
    }
}
