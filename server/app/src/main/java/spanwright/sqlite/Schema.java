package spanwright.sqlite;

import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.sql.Connection;
import java.sql.SQLException;
import java.sql.Statement;
import org.flywaydb.core.Flyway;

/** The tables of a records file: made in a new one, brought up to date in an old one. */
final class Schema {

    private static final String MIGRATIONS = "schema/migrations";
    private static final String FIRST = "/" + MIGRATIONS + "/V1__records.sql";

    private Schema() {}

    /** Makes the tables of the first schema in an empty database, by the same text as a migration would. */
    static void create(Connection connection) throws SQLException {
        try (Statement statement = connection.createStatement()) {
            statement.executeUpdate(text());
            statement.executeUpdate("PRAGMA application_id = " + RecordsFile.APPLICATION_ID);
            statement.executeUpdate("PRAGMA user_version = 1");
        }
    }

    private static String text() {
        try (InputStream in = Schema.class.getResourceAsStream(FIRST)) {
            if (in == null) {
                throw new IllegalStateException("the program lacks " + FIRST);
            }
            return new String(in.readAllBytes(), StandardCharsets.UTF_8);
        } catch (IOException fault) {
            throw new UncheckedIOException(fault);
        }
    }

    /** Brings the tables of a file up to the schema of this program. */
    static void bringUpToDate(Path file) throws SQLException {
        bringUpTo(RecordsFile.SCHEMA, file, "classpath:" + MIGRATIONS);
    }

    /**
     * Brings the tables of a file up to a schema. Only where they are of an older one is Flyway asked: to look into its
     * own history costs it more than opening the file costs us.
     *
     * @param migrations where the migrations are
     */
    static void bringUpTo(int schema, Path file, String migrations) throws SQLException {
        long found;
        try (Connection connection = Connections.reading(file)) {
            found = FileCheck.pragma(connection, "user_version");
        }
        if (found >= schema) {
            return;
        }
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
}
