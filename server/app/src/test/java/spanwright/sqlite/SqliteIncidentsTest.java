package spanwright.sqlite;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.nio.file.Path;
import java.sql.SQLException;
import java.time.Clock;
import java.time.Instant;
import java.util.List;
import java.util.Objects;
import org.jspecify.annotations.Nullable;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import spanwright.incident.EntryDraft;
import spanwright.incident.EntryKind;
import spanwright.incident.IncidentBook;
import spanwright.incident.IncidentBookContract;
import spanwright.incident.IncidentDraft;
import spanwright.incident.IncidentStart;
import spanwright.incident.Written;

class SqliteIncidentsTest extends IncidentBookContract {

    @TempDir
    private Path folder;

    private @Nullable SqliteLedger opened;

    private Path file() {
        return folder.resolve("plant.spanwright");
    }

    @Override
    protected IncidentBook empty(Clock clock) {
        SqliteLedger ledger = ((Opening.Opened) SqliteLedger.open(file(), Access.WRITE, clock)).ledger();
        opened = ledger;
        Ledgers.post(ledger, Ledgers.setting("owner", "Valley Fiber"));
        return ledger.incidents();
    }

    private SqliteLedger ledger() {
        return Objects.requireNonNull(opened);
    }

    @AfterEach
    void close() {
        ledger().close();
    }

    private void enterOne() {
        Instant began = Instant.parse("2026-03-31T14:42:00Z");
        IncidentStart start = new IncidentStart(List.of(), List.of("C-1"), List.of(), null);
        assertThat(ledger().incidents().open(new IncidentDraft("Cut", "D. Reed", began, start), 1))
                .isInstanceOf(Written.Kept.class);
        assertThat(ledger().incidents().write(1, EntryDraft.of(EntryKind.CALLED, began, "D. Reed")))
                .isInstanceOf(Written.Kept.class);
    }

    @Test
    void incidents_are_there_when_the_file_is_opened_again_and_read_beside_the_one_that_writes() {
        enterOne();
        try (SqliteLedger reader = Ledgers.open(file(), Access.READ)) {
            assertThat(reader.incidents().entries(1)).hasSize(1);
            assertThat(reader.incidents()
                            .write(1, EntryDraft.of(EntryKind.FOUND, Instant.parse("2026-03-31T14:42:00Z"), "X")))
                    .isInstanceOf(Written.Refused.class);
        }
        ledger().close();
        opened = Ledgers.open(file(), Access.WRITE);
        assertThat(ledger().incidents().list()).hasSize(1);
        assertThat(ledger().incidents().entries(1)).hasSize(1);
        assertThat(ledger().integrity().toCompletableFuture().join().sound()).isTrue();
    }

    @Test
    void postings_and_entries_take_turns() {
        enterOne();
        Ledgers.post(ledger(), Ledgers.setting("unit", "ft"));
        enterSecond();
        Ledgers.post(ledger(), Ledgers.setting("time_zone", "UTC"));

        assertThat(ledger().current().records().posting()).isEqualTo(3);
        assertThat(ledger().incidents().entries(1)).hasSize(2);
    }

    private void enterSecond() {
        ledger().incidents().write(1, EntryDraft.of(EntryKind.FOUND, Instant.parse("2026-03-31T14:42:00Z"), "X"));
    }

    @Test
    void the_database_itself_refuses_to_change_or_remove_what_was_written() {
        enterOne();
        for (String sql : List.of(
                "UPDATE incident SET title = 'x'",
                "DELETE FROM incident_entry",
                "UPDATE incident_entry SET kind = 'found'",
                "DELETE FROM incident WHERE id = 1",
                "INSERT INTO incident_entry VALUES (1, 2, 'wrong', '', '', 'X', NULL, '', NULL, NULL, NULL)")) {
            assertThatThrownBy(() -> Ledgers.run(file(), sql)).as(sql).isInstanceOf(SQLException.class);
        }
    }
}
