package spanwright.sqlite;

import java.nio.file.Path;
import java.sql.Connection;
import java.sql.ResultSet;
import java.sql.SQLException;
import java.sql.Statement;

/** Reads a file into memory when it is opened. */
final class Loading {

    private Loading() {}

    /** Where the journal ends, and the state there. */
    static Tip load(Path file) throws SQLException {
        try (Connection connection = Connections.reading(file)) {
            // One transaction, so that whoever writes meanwhile is seen in all tables or in none.
            connection.setAutoCommit(false);
            Tip tip = load(connection);
            connection.rollback();
            return tip;
        }
    }

    private static Tip load(Connection connection) throws SQLException {
        try (Statement statement = connection.createStatement();
                ResultSet row = statement.executeQuery(
                        "SELECT number, posted_at, hash FROM posting ORDER BY number DESC LIMIT 1")) {
            if (!row.next()) {
                return Tip.NONE;
            }
            return new Tip(
                    StateReader.read(connection, row.getInt(1)),
                    PostingTime.parse(row.getString(2)),
                    PostingHash.read(row.getBytes(3)));
        }
    }
}
