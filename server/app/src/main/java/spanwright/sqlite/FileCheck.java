package spanwright.sqlite;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.sql.Connection;
import java.sql.ResultSet;
import java.sql.SQLException;
import java.sql.Statement;
import java.util.Optional;
import org.sqlite.SQLiteErrorCode;

/**
 * Looks at a file before it is opened: whether it is a records file, whole, and of a schema that this program knows.
 * All through SQLite and the size of the file: to open the file past SQLite and close it would give up its locks.
 */
final class FileCheck {

    private FileCheck() {}

    /**
     * What is wrong with a file that is there; nothing where it can be opened. One of an older schema can be read as it
     * is, and is written after {@link Schema#bringUpToDate}.
     */
    static Optional<Opening.Unopened> check(Path file) throws IOException {
        try (Connection connection = Connections.reading(file)) {
            long application = pragma(connection, "application_id");
            long schema = pragma(connection, "user_version");
            if (application != RecordsFile.APPLICATION_ID || schema < 1) {
                return Optional.of(foreign(file, application));
            }
            if (schema > RecordsFile.SCHEMA) {
                return Optional.of(new Opening.Unopened(
                        "records-newer",
                        file + " was written by a newer version of this program (its schema is " + schema
                                + ", this one knows schemas up to " + RecordsFile.SCHEMA
                                + "): open it with that version or a later one."));
            }
            return size(file, pragma(connection, "page_count"), pragma(connection, "page_size"));
        } catch (SQLException fault) {
            return Optional.of(unreadable(file, new StorageFault(fault)));
        }
    }

    private static Opening.Unopened foreign(Path file, long application) {
        String mark = Long.toHexString(application) + ", where a records file bears "
                + Integer.toHexString(RecordsFile.APPLICATION_ID) + " and the number of its schema";
        return new Opening.Unopened(
                "records-foreign",
                file + " is an SQLite file, but not a records file: it bears the mark " + mark
                        + ". Name a records file.");
    }

    private static Optional<Opening.Unopened> size(Path file, long pages, long pageSize) throws IOException {
        Path log = RecordsFile.log(file);
        if (Files.exists(log) && Files.size(log) > 0) {
            // The last pages may be in the log still; whether the two fit together SQLite has judged by now.
            return Optional.empty();
        }
        long size = Files.size(file);
        return size >= pages * pageSize
                ? Optional.empty()
                : Optional.of(torn(file, "it is " + size + " bytes long where its head says " + pages * pageSize));
    }

    private static Opening.Unopened torn(Path file, String how) {
        return new Opening.Unopened(
                "records-torn", file + " is damaged: " + how + ". Go back to a backup; do not write to this file.");
    }

    /** Says why SQLite would not read a file. */
    static Opening.Unopened unreadable(Path file, StorageFault fault) {
        SQLiteErrorCode code = fault.primary();
        if (code == SQLiteErrorCode.SQLITE_NOTADB) {
            return new Opening.Unopened(
                    "records-not-sqlite", file + " is not a records file (not an SQLite file at all). Name one.");
        }
        if (code == SQLiteErrorCode.SQLITE_CORRUPT) {
            return torn(file, "its pages do not fit together (" + fault.getMessage() + ")");
        }
        return new Opening.Unopened("records-unreadable", file + " cannot be read: " + fault.getMessage());
    }

    /** What SQLite says of a file as a whole number. */
    static long pragma(Connection connection, String name) throws SQLException {
        try (Statement statement = connection.createStatement();
                ResultSet row = statement.executeQuery("PRAGMA " + name)) {
            return row.getLong(1);
        }
    }
}
