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

    /**
     * Brings the tables of a file from one schema up to another. Only asked where they differ: to look into its own
     * history costs Flyway more than opening the file costs us.
     *
     * @param migrations where the migrations are, on the class path
     */
    static void migrate(Path file, int from, int to, String... migrations) throws SQLException {
        Flyway.configure()
                .dataSource("jdbc:sqlite:" + file.toAbsolutePath(), "", "")
                .locations(migrations.length == 0 ? new String[] {"classpath:" + MIGRATIONS} : migrations)
                .table("migration")
                .baselineOnMigrate(true)
                .baselineVersion(Integer.toString(from))
                .target(Integer.toString(to))
                .load()
                .migrate();
        try (Connection connection = Connections.writing(file)) {
            try (Statement statement = connection.createStatement()) {
                statement.executeUpdate("PRAGMA user_version = " + to);
            }
            connection.commit();
        }
    }
}
