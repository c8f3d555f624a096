package spanwright.sqlite;

import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.sql.Connection;
import java.sql.SQLException;
import java.sql.Statement;
import java.util.List;
import org.flywaydb.core.Flyway;
import org.sqlite.SQLiteConnection;

/** The tables of a records file: made in a new one, brought up to date in an old one. */
final class Schema {

    private static final String MIGRATIONS = "schema/migrations";
    private static final List<String> NAMES = List.of("V1__records", "V2__incidents", "V3__drafts");

    private Schema() {}

    /** Makes the tables of the present schema in an empty database, by the same text as the migrations would. */
    static void create(Connection connection) throws SQLException {
        try (Statement statement = connection.createStatement()) {
            for (String name : NAMES) {
                statement.executeUpdate(text(name));
            }
            statement.executeUpdate("PRAGMA application_id = " + RecordsFile.APPLICATION_ID);
            statement.executeUpdate("PRAGMA user_version = " + RecordsFile.SCHEMA);
        }
    }

    private static String text(String name) {
        String resource = "/" + MIGRATIONS + "/" + name + ".sql";
        try (InputStream in = Schema.class.getResourceAsStream(resource)) {
            if (in == null) {
                throw new IllegalStateException("the program lacks " + resource);
            }
            return new String(in.readAllBytes(), StandardCharsets.UTF_8);
        } catch (IOException fault) {
            throw new UncheckedIOException(fault);
        }
    }

    /** Brings the tables of a file up to the schema of this program. */
    static void bringUpToDate(Path file) throws SQLException, IOException {
        bringUpTo(RecordsFile.SCHEMA, file, "classpath:" + MIGRATIONS);
    }

    /**
     * Brings the tables of a file up to a schema. Only where they are of an older one is Flyway asked: to look into its
     * own history costs it more than opening the file costs us. A copy of the file as it was is kept beside it.
     *
     * @param migrations where the migrations are
     */
    static void bringUpTo(int schema, Path file, String migrations) throws SQLException, IOException {
        long found;
        try (Connection connection = Connections.reading(file)) {
            found = FileCheck.pragma(connection, "user_version");
        }
        if (found >= schema) {
            return;
        }
        keepCopy(file, RecordsFile.before(file, schema));
        Flyway.configure()
                .dataSource("jdbc:sqlite:" + file.toAbsolutePath(), "", "")
                .locations(migrations)
                .table("migration")
                .baselineOnMigrate(true)
                .baselineVersion(Long.toString(found))
                .target(Integer.toString(schema))
                .load()
                .migrate();
        try (Connection connection = Connections.writing(file)) {
            try (Statement statement = connection.createStatement()) {
                statement.executeUpdate("PRAGMA user_version = " + schema);
            }
            connection.commit();
        }
    }

    /**
     * Copies a file, its log included. A copy left by an attempt that was broken off is made anew: what the file holds
     * now is what is to be kept.
     */
    private static void keepCopy(Path file, Path copy) throws SQLException, IOException {
        Path making = RecordsFile.making(copy);
        Files.deleteIfExists(making);
        try (Connection connection = Connections.reading(file)) {
            int fault = connection
                    .unwrap(SQLiteConnection.class)
                    .getDatabase()
                    .backup("main", making.toAbsolutePath().toString(), null);
            if (fault != 0) {
                throw new SQLException(
                        "no copy of " + file + " could be made before it is brought up to date", "", fault);
            }
        }
        Disk.moveInto(making, copy);
        Files.deleteIfExists(RecordsFile.log(making));
    }
}
