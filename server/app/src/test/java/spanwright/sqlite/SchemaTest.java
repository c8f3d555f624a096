package spanwright.sqlite;

import static org.assertj.core.api.Assertions.assertThat;

import java.nio.file.Path;
import java.sql.Connection;
import java.sql.DriverManager;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

class SchemaTest {

    private static final String TO_COME = "classpath:migrations-to-come";

    @TempDir
    private Path folder;

    private Path file;

    @BeforeEach
    void makeFile() {
        file = folder.resolve("plant");
        try (SqliteLedger ledger = Ledgers.open(file, Access.WRITE)) {
            Ledgers.post(ledger, Ledgers.setting("owner", "Valley Fiber"));
        }
    }

    private String ask(String sql) throws Exception {
        try (Connection connection = DriverManager.getConnection("jdbc:sqlite:" + file)) {
            return String.join("\n", Ledgers.rows(connection, sql));
        }
    }

    @Test
    void an_older_file_is_brought_up_to_date_with_all_that_it_holds() throws Exception {
        Schema.bringUpTo(4, file, TO_COME);

        assertThat(ask("PRAGMA user_version")).isEqualTo("4");
        assertThat(ask("SELECT name, text FROM setting")).isEqualTo("owner|Valley Fiber");
        assertThat(ask("SELECT count(depth_um) FROM structure")).isEqualTo("0");
        assertThat(ask("SELECT version FROM migration WHERE success ORDER BY installed_rank"))
                .isEqualTo("3\n4");
    }

    @Test
    void a_file_that_is_up_to_date_is_left_alone() throws Exception {
        Schema.bringUpTo(4, file, TO_COME);
        Schema.bringUpTo(4, file, "classpath:no-such-migrations");
        Schema.bringUpToDate(file);

        assertThat(ask("PRAGMA user_version")).isEqualTo("4");
    }

    @Test
    void the_journal_of_an_older_schema_is_read_by_the_names_of_its_columns() throws Exception {
        Schema.bringUpTo(4, file, TO_COME);

        try (Connection connection = DriverManager.getConnection("jdbc:sqlite:" + file)) {
            assertThat(Journal.changes(connection, 1)).hasSize(1);
        }
    }

    @Test
    void a_new_file_bears_its_marks_and_is_kept_with_a_log() throws Exception {
        assertThat(ask("PRAGMA application_id")).isEqualTo(Integer.toString(RecordsFile.APPLICATION_ID));
        assertThat(ask("PRAGMA user_version")).isEqualTo(Integer.toString(RecordsFile.SCHEMA));
        assertThat(ask("PRAGMA journal_mode")).isEqualTo("wal");
    }

    @Test
    void the_one_that_writes_waits_for_the_disk_and_minds_references() throws Exception {
        try (Connection connection = Connections.writing(file)) {
            assertThat(FileCheck.pragma(connection, "synchronous")).isEqualTo(2);
            assertThat(FileCheck.pragma(connection, "foreign_keys")).isEqualTo(1);
        }
    }
}
