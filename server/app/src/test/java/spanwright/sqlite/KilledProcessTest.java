package spanwright.sqlite;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.BufferedReader;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.sql.Connection;
import java.sql.DriverManager;
import java.sql.SQLException;
import java.util.List;
import java.util.Random;
import java.util.concurrent.TimeUnit;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import spanwright.draft.Draft;
import spanwright.journal.Change;
import spanwright.network.RecordsText;
import spanwright.network.Snapshot;
import spanwright.network.SnapshotEditor;

/** Invariant 1 of the package, put to the test by killing the process that writes. */
class KilledProcessTest {

    @TempDir
    private Path folder;

    @Test
    void what_was_acknowledged_before_a_kill_is_there_and_nothing_is_half_there() throws Exception {
        killOften(6, 20260331);
    }

    @Test
    @Tag("slow")
    void what_was_acknowledged_before_fifty_kills_is_there_and_nothing_is_half_there() throws Exception {
        killOften(50, System.nanoTime());
    }

    @Test
    void entries_acknowledged_before_a_kill_are_there() throws Exception {
        Path file = folder.resolve("plant");
        Random random = new Random(20260331);
        int acknowledged = 0;
        for (int kill = 0; kill < 4; kill++) {
            Process process = PostingProcess.start(EntryProcess.class, file, 0);
            acknowledged = Math.max(acknowledged, killed(process, random, "written "));
            try (SqliteLedger ledger = Ledgers.open(file, Access.WRITE)) {
                assertThat(ledger.incidents().entries(1)).as("kill %d", kill).hasSizeGreaterThanOrEqualTo(acknowledged);
            }
        }
        assertThat(acknowledged).isPositive();
    }

    @Test
    void letters_acknowledged_before_a_kill_are_there() throws Exception {
        Path file = folder.resolve("plant");
        Random random = new Random(20260331);
        int acknowledged = 0;
        for (int kill = 0; kill < 4; kill++) {
            Process process = PostingProcess.start(DraftProcess.class, file, 0);
            acknowledged = Math.max(acknowledged, killed(process, random, "saved "));
            try (SqliteLedger ledger = Ledgers.open(file, Access.WRITE)) {
                Draft draft = ledger.drafts().find(1).orElseThrow();
                assertThat(draft.revision()).as("kill %d", kill).isGreaterThanOrEqualTo(acknowledged);
                assertThat(draft.text()).isEqualTo(DraftProcess.text(draft.revision()));
            }
        }
        assertThat(acknowledged).isPositive();
    }

    private void killOften(int kills, long seed) throws IOException, SQLException, InterruptedException {
        Random random = new Random(seed);
        Path file = folder.resolve("plant");
        int acknowledged = 0;
        for (int kill = 0; kill < kills; kill++) {
            if (kill % 5 == 4) {
                // Begin anew, so that the making of a file is killed too.
                Files.deleteIfExists(file);
                Files.deleteIfExists(RecordsFile.log(file));
                acknowledged = 0;
            }
            Process process = PostingProcess.start(file, random.nextLong());
            acknowledged = Math.max(acknowledged, killed(process, random, "posted "));
            String run = "seed " + seed + ", kill " + kill + ", acknowledged " + acknowledged;
            if (acknowledged > 0 || Store.exists(file)) {
                check(file, acknowledged, run);
            }
        }
    }

    /** Lets a process write for a moment and kills it; gives the last number that it was told is durable. */
    private static int killed(Process process, Random random, String told) throws IOException, InterruptedException {
        int acknowledged = 0;
        try (BufferedReader lines = process.inputReader(StandardCharsets.UTF_8)) {
            assertThat(lines.readLine()).isEqualTo("opened");
            Thread killer = new Thread(() -> sleepAndKill(process, random.nextInt(1500)));
            killer.start();
            for (String line = lines.readLine(); line != null; line = lines.readLine()) {
                if (line.startsWith(told) && line.length() > told.length()) {
                    acknowledged = Math.max(acknowledged, Integer.parseInt(line.substring(told.length())));
                }
            }
            killer.join();
        }
        assertThat(process.waitFor(30, TimeUnit.SECONDS)).isTrue();
        return acknowledged;
    }

    private static void sleepAndKill(Process process, int milliseconds) {
        try {
            Thread.sleep(milliseconds);
        } catch (InterruptedException early) {
            Thread.currentThread().interrupt();
        }
        // By its handle: Process.destroyForcibly would close the stream that is being read, last words and all.
        process.toHandle().destroyForcibly();
    }

    private static void check(Path file, int acknowledged, String run) throws SQLException {
        try (SqliteLedger ledger = Ledgers.open(file, Access.WRITE)) {
            int last = ledger.current().records().posting();
            assertThat(last).as(run).isGreaterThanOrEqualTo(acknowledged);
            assertThat(ledger.integrity().toCompletableFuture().join().findings())
                    .as(run)
                    .isEmpty();
            assertThat(RecordsText.of(ledger.current())).as(run).isEqualTo(RecordsText.of(replayed(ledger, last)));
        }
        try (Connection connection = DriverManager.getConnection("jdbc:sqlite:" + file)) {
            List<String> counts = Ledgers.rows(
                    connection, "SELECT count(*), max(number), coalesce(sum(changes), 0) >= 0 FROM posting");
            assertThat(counts.get(0)).as(run).matches("(\\d+)\\|\\1\\|1|0\\|null\\|1");
        }
    }

    private static Snapshot replayed(SqliteLedger ledger, int last) {
        SnapshotEditor editor = Snapshot.empty().edit();
        for (int number = 1; number <= last; number++) {
            for (Change change : ledger.changesOf(number)) {
                editor.replay(change);
            }
        }
        return editor.build(last);
    }
}
