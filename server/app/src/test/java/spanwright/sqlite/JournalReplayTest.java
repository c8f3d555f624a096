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
import spanwright.journal.Change;
import spanwright.journal.Posting;
import spanwright.journal.RecordKind;
import spanwright.network.RandomPostings;
import spanwright.network.RecordsText;
import spanwright.network.SetClock;
import spanwright.plant.Setting;

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

    @Test
    void a_small_posting_is_one_row_of_the_journal_and_a_larger_one_has_pages() throws SQLException {
        Path file = folder.resolve("plant");
        try (SqliteLedger ledger = Ledgers.open(file, Access.WRITE)) {
            Ledgers.post(ledger, Ledgers.setting("a", "1"));
            Ledgers.post(ledger, Ledgers.setting("b", "x".repeat(2_000)));
            Ledgers.post(ledger, new RandomPostings(5).foundation());

            assertThat(ledger.changesOf(1)).hasSize(1);
            assertThat(ledger.changesOf(2)).hasSize(1);
            assertThat(ledger.changesOf(3))
                    .hasSize(ledger.findPosting(3).orElseThrow().changes());
        }
        try (Connection connection = DriverManager.getConnection("jdbc:sqlite:" + file)) {
            assertThat(Ledgers.rows(
                            connection,
                            "SELECT number, of_table, (SELECT count(*) > 0 FROM posting_page WHERE posting = number)"
                                    + " FROM posting ORDER BY number"))
                    .containsExactly("1|setting|0", "2|null|1", "3|null|1");
        }
    }

    @Test
    void no_identity_is_given_twice_whether_its_record_is_there_or_was_removed() throws SQLException {
        Path file = folder.resolve("plant");
        try (SqliteLedger ledger = Ledgers.open(file, Access.WRITE)) {
            Ledgers.post(ledger, Ledgers.setting("a", "1"));
            Ledgers.post(ledger, Ledgers.setting("b", "2"));
        }
        assertThat(identities(file)).as("none is removed").isEmpty();
        assertThat(nextAfterReading(file)).isEqualTo(3);
        try (SqliteLedger ledger = Ledgers.open(file, Access.WRITE)) {
            Setting last = ledger.current().records().settings().get(2);
            Ledgers.post(ledger, editor -> editor.apply(Change.remove(last)));
        }
        assertThat(identities(file)).containsExactly("setting|3");
        assertThat(nextAfterReading(file)).isEqualTo(3);
    }

    private static List<String> identities(Path file) throws SQLException {
        try (Connection connection = DriverManager.getConnection("jdbc:sqlite:" + file)) {
            return Ledgers.rows(connection, "SELECT of_table, id FROM next_identity");
        }
    }

    /** The next identity of a setting, as the tables alone tell it. */
    private static int nextAfterReading(Path file) throws SQLException {
        try (Connection connection = DriverManager.getConnection("jdbc:sqlite:" + file)) {
            return StateReader.read(connection, 1).records().limit(RecordKind.SETTING);
        }
    }
}
