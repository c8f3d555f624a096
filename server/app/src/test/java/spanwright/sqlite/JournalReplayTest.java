package spanwright.sqlite;

import static org.assertj.core.api.Assertions.assertThat;

import java.nio.file.Path;
import java.sql.Connection;
import java.sql.DriverManager;
import java.sql.SQLException;
import java.time.Instant;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import spanwright.journal.Posting;
import spanwright.network.RecordsText;
import spanwright.network.SetClock;

/** Invariant 3 of the package: the journal makes the state again. */
class JournalReplayTest {

    @TempDir
    private Path folder;

    @ParameterizedTest(name = "seed {0}")
    @ValueSource(longs = {11, 12, 13, 14})
    void the_journal_replayed_makes_the_same_tables_and_the_same_records(long seed) throws SQLException {
        Path original = folder.resolve("original");
        Path replayed = folder.resolve("replayed");
        List<String> records;
        try (SqliteLedger ledger = Ledgers.open(original, Access.WRITE)) {
            Ledgers.postAtRandom(ledger, seed, 60);
            records = RecordsText.of(ledger.current());
            replay(ledger, replayed);
        }

        assertThat(Ledgers.state(replayed)).as("seed %d", seed).isEqualTo(Ledgers.state(original));
        assertThat(hashes(replayed)).isEqualTo(hashes(original)).hasSizeGreaterThan(30);
        try (SqliteLedger ledger = Ledgers.open(replayed, Access.READ)) {
            assertThat(RecordsText.of(ledger.current())).isEqualTo(records);
        }
    }

    private static void replay(SqliteLedger from, Path to) {
        SetClock clock = new SetClock(Instant.EPOCH);
        Opening opening = SqliteLedger.open(to, Access.WRITE, clock);
        try (SqliteLedger ledger = ((Opening.Opened) opening).ledger()) {
            for (int number = 1; number <= from.current().records().posting(); number++) {
                Posting head = from.findPosting(number).orElseThrow();
                clock.set(head.at());
                ledger.post(head.by(), head.reason(), editor -> {
                    from.changesOf(head.number()).forEach(editor::replay);
                    return List.of();
                });
            }
        }
    }

    private static List<String> hashes(Path file) throws SQLException {
        try (Connection connection = DriverManager.getConnection("jdbc:sqlite:" + file)) {
            return Ledgers.rows(connection, "SELECT number, hex(hash) FROM posting ORDER BY number");
        }
    }

    @Test
    void a_hash_names_all_that_went_before() throws SQLException {
        Path one = folder.resolve("one");
        Path other = folder.resolve("other");
        for (Path file : List.of(one, other)) {
            Opening opening = SqliteLedger.open(file, Access.WRITE, new SetClock(Instant.EPOCH));
            try (SqliteLedger ledger = ((Opening.Opened) opening).ledger()) {
                Ledgers.post(ledger, Ledgers.setting("a", file.equals(one) ? "1" : "2"));
                Ledgers.post(ledger, Ledgers.setting("b", "3"));
            }
        }

        assertThat(hashes(one)).hasSize(2).doesNotContainAnyElementsOf(hashes(other));
    }
}
