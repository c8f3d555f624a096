package spanwright.sqlite;

import static org.assertj.core.api.Assertions.assertThat;

import java.nio.file.Files;
import java.nio.file.Path;
import java.sql.Connection;
import java.sql.DriverManager;
import java.sql.SQLException;
import java.time.Instant;
import java.util.List;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import spanwright.draft.DraftOutcome;
import spanwright.draft.DraftStart;
import spanwright.draft.DraftText;
import spanwright.incident.IncidentDraft;
import spanwright.incident.IncidentStart;
import spanwright.incident.Written;
import spanwright.network.RecordsText;
import spanwright.sheet.SheetHeader;

/** A records file of the first schema: read as it is, brought up to date where it is written. */
class OlderFileTest {

    @TempDir
    private Path folder;

    private Path file;
    private Path copy;
    private List<String> state;
    private List<String> records;

    @BeforeEach
    void makeOlderFile() throws SQLException {
        file = folder.resolve("plant.spanwright");
        copy = folder.resolve("plant.spanwright.before-V3");
        try (SqliteLedger ledger = Ledgers.open(file, Access.WRITE)) {
            Ledgers.postAtRandom(ledger, 5, 20);
            records = RecordsText.of(ledger.current());
        }
        Ledgers.run(file, "DROP TABLE draft_version");
        Ledgers.run(file, "DROP TABLE draft");
        Ledgers.run(file, "DROP TABLE incident_entry");
        Ledgers.run(file, "DROP TABLE incident");
        Ledgers.run(file, "PRAGMA user_version = 1");
        state = Ledgers.state(file);
    }

    private static long schema(Path file) throws SQLException {
        try (Connection connection = DriverManager.getConnection("jdbc:sqlite:" + file)) {
            return FileCheck.pragma(connection, "user_version");
        }
    }

    @Test
    void it_is_read_as_it_is_and_holds_no_incidents_and_no_drafts() throws SQLException {
        try (SqliteLedger ledger = Ledgers.open(file, Access.READ)) {
            assertThat(RecordsText.of(ledger.current())).isEqualTo(records);
            assertThat(ledger.asOf(1).records().posting()).isEqualTo(1);
            assertThat(ledger.incidents().list()).isEmpty();
            assertThat(ledger.incidents().find(1)).isEmpty();
            assertThat(ledger.drafts().list()).isEmpty();
            assertThat(ledger.drafts().find(1)).isEmpty();
        }
        assertThat(schema(file)).isEqualTo(1);
        assertThat(copy).doesNotExist();
    }

    @Test
    void opened_to_be_written_it_keeps_all_takes_incidents_and_a_copy_stays_as_it_was() throws SQLException {
        try (SqliteLedger ledger = Ledgers.open(file, Access.WRITE)) {
            assertThat(RecordsText.of(ledger.current())).isEqualTo(records);
            assertThat(ledger.incidents()
                            .open(
                                    new IncidentDraft(
                                            "Cut",
                                            "D. Reed",
                                            Instant.EPOCH,
                                            new IncidentStart(List.of("span:S-1"), List.of(), List.of(), null)),
                                    ledger.current().records().posting()))
                    .isInstanceOf(Written.Kept.class);
        }
        assertThat(schema(file)).isEqualTo(RecordsFile.SCHEMA);
        assertThat(schema(copy)).isEqualTo(1);
        assertThat(Ledgers.state(copy)).isEqualTo(state);
        try (SqliteLedger ledger = Ledgers.open(copy, Access.READ)) {
            assertThat(RecordsText.of(ledger.current())).isEqualTo(records);
        }
        try (SqliteLedger ledger = Ledgers.open(file, Access.READ)) {
            assertThat(ledger.incidents().list()).hasSize(1);
            assertThat(ledger.integrity().toCompletableFuture().join().sound()).isTrue();
        }
    }

    @Test
    void a_file_of_the_schema_before_keeps_its_incidents_and_takes_drafts() throws SQLException {
        Ledgers.open(file, Access.WRITE).close();
        Ledgers.run(file, "DROP TABLE draft_version");
        Ledgers.run(file, "DROP TABLE draft");
        Ledgers.run(file, "DELETE FROM migration WHERE version = '3'");
        Ledgers.run(file, "PRAGMA user_version = 2");

        try (SqliteLedger ledger = Ledgers.open(file, Access.WRITE)) {
            DraftText text = new DraftText(List.of("F-1 ahead 1 capped"), SheetHeader.NONE, 1, 1, List.of());
            assertThat(ledger.drafts().begin(new DraftStart(1, "R. Vale", 1, text)))
                    .isInstanceOf(DraftOutcome.Kept.class);
            assertThat(RecordsText.of(ledger.current())).isEqualTo(records);
        }
        assertThat(schema(file)).isEqualTo(3);
    }

    @Test
    void a_bringing_up_to_date_that_was_broken_off_is_done_again() throws Exception {
        Files.writeString(RecordsFile.making(copy), "half a copy");
        Schema.bringUpToDate(file);
        Ledgers.run(file, "PRAGMA user_version = 1");

        try (SqliteLedger ledger = Ledgers.open(file, Access.WRITE)) {
            assertThat(RecordsText.of(ledger.current())).isEqualTo(records);
            assertThat(ledger.incidents().list()).isEmpty();
        }
        assertThat(schema(file)).isEqualTo(RecordsFile.SCHEMA);
        assertThat(RecordsFile.making(copy)).doesNotExist();
    }

    @Test
    void a_file_made_anew_has_the_tables_of_one_brought_up_to_date() throws SQLException {
        Path fresh = folder.resolve("fresh");
        try (SqliteLedger ledger = Ledgers.open(fresh, Access.WRITE)) {
            Ledgers.post(ledger, Ledgers.setting("owner", "Valley Fiber"));
        }
        Ledgers.open(file, Access.WRITE).close();

        assertThat(tables(file)).isEqualTo(tables(fresh));
    }

    private static List<String> tables(Path file) throws SQLException {
        try (Connection connection = DriverManager.getConnection("jdbc:sqlite:" + file)) {
            return Ledgers.rows(
                    connection,
                    "SELECT type, name, sql FROM sqlite_schema WHERE tbl_name NOT LIKE 'migration%' ORDER BY 1, 2");
        }
    }
}
