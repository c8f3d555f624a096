package spanwright.sqlite;

import java.sql.Connection;
import java.sql.ResultSet;
import java.sql.SQLException;
import java.sql.Statement;
import java.util.stream.Collectors;
import spanwright.journal.Change;
import spanwright.network.Snapshot;
import spanwright.records.Records;
import spanwright.records.RecordsEditor;
import spanwright.sqlite.rows.Column;
import spanwright.sqlite.rows.Layout;
import spanwright.sqlite.rows.Layouts;

/** Reads the whole state out of the tables: the slow way to open a file, where there is no image of it. */
final class StateReader {

    private StateReader() {}

    /** The state in the tables; the caller sees to it that nobody writes between the first and the last of them. */
    static Snapshot read(Connection connection, int posting) throws SQLException {
        RecordsEditor editor = Records.empty().edit();
        for (Layout layout : Layouts.all()) {
            read(connection, layout, editor);
        }
        try (Statement statement = connection.createStatement();
                ResultSet rows = statement.executeQuery("SELECT of_table, id FROM next_identity")) {
            while (rows.next()) {
                editor.reserveIdentities(Layouts.of(rows.getString(1)).kind(), rows.getInt(2));
            }
        }
        return Snapshot.of(editor.build(posting));
    }

    private static void read(Connection connection, Layout layout, RecordsEditor editor) throws SQLException {
        String columns = layout.columns().stream().map(Column::name).collect(Collectors.joining(", "));
        try (Statement statement = connection.createStatement();
                ResultSet rows =
                        statement.executeQuery("SELECT " + columns + " FROM " + layout.table() + " ORDER BY id")) {
            ResultRow row = new ResultRow(rows);
            while (row.next()) {
                editor.apply(Change.add(layout.read(row)));
            }
        }
    }
}
