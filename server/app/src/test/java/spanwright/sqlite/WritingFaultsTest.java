package spanwright.sqlite;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.sql.SQLException;
import java.sql.Statement;
import java.time.Clock;
import java.util.ArrayList;
import java.util.List;
import java.util.concurrent.Callable;
import java.util.concurrent.CountDownLatch;
import java.util.concurrent.FutureTask;
import java.util.concurrent.atomic.AtomicReference;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import spanwright.journal.Change;
import spanwright.journal.RecordKind;
import spanwright.network.Ledger;
import spanwright.network.Outcome;
import spanwright.network.RecordsText;
import spanwright.plant.Pass;
import spanwright.plant.Setting;
import spanwright.records.Refusal;

/** What happens when the file does not take what it is given. */
class WritingFaultsTest {

    private final List<Thread> clients = new ArrayList<>();

    @TempDir
    private Path folder;

    private static String refusal(Outcome outcome) {
        assertThat(outcome).isInstanceOf(Outcome.Refused.class);
        Refusal refusal = ((Outcome.Refused) outcome).refusals().get(0);
        assertThat(refusal.sentence()).isNotBlank();
        return refusal.code();
    }

    @Test
    void a_log_that_cannot_be_written_keeps_nothing_and_what_is_there_can_be_read() throws IOException {
        Path file = folder.resolve("plant");
        try (SqliteLedger ledger = Ledgers.open(file, Access.WRITE)) {
            Ledgers.postAtRandom(ledger, 1, 10);
        }
        try (SqliteLedger ledger = Ledgers.open(file, Access.WRITE)) {
            List<String> before = RecordsText.of(ledger.current());
            Files.createDirectory(RecordsFile.log(file));

            assertThat(refusal(ledger.post("Ana", "small", Ledgers.setting("small", "x"))))
                    .isEqualTo("records-unwritable");
            Files.delete(RecordsFile.log(file));

            assertThat(refusal(ledger.post("Ana", "again", Ledgers.setting("small", "x"))))
                    .as("until the program is started again")
                    .isEqualTo("records-unwritable");
            assertThat(RecordsText.of(ledger.current())).isEqualTo(before);
            assertThat(RecordsText.of(ledger.asOf(1))).isNotEmpty();
            assertThat(ledger.postings(Integer.MAX_VALUE, 100))
                    .hasSize(ledger.current().records().posting());
        }
        try (SqliteLedger ledger = Ledgers.open(file, Access.WRITE)) {
            assertThat(ledger.current().records().settings().count()).isZero();
            Ledgers.post(ledger, Ledgers.setting("small", "x"));
        }
    }

    @Test
    void a_file_taken_away_is_not_made_anew_from_the_middle_of_its_journal() throws IOException {
        Path file = folder.resolve("plant");
        try (SqliteLedger ledger = Ledgers.open(file, Access.WRITE)) {
            Ledgers.post(ledger, Ledgers.setting("a", "1"));
            Ledgers.post(ledger, Ledgers.setting("b", "2"));
            Files.move(file, folder.resolve("elsewhere"));

            Outcome lost = ledger.post("Ana", "as built", Ledgers.setting("c", "3"));
            assertThat(refusal(lost)).isEqualTo("records-unwritable");
            assertThat(((Outcome.Refused) lost).refusals().get(0).sentence()).contains("is there no longer");
            assertThat(file).doesNotExist();
            assertThat(ledger.current().records().posting()).isEqualTo(2);
        }
    }

    @Test
    void a_full_disk_keeps_nothing_and_says_so() throws SQLException {
        Path file = folder.resolve("plant");
        AtomicReference<Tip> published = new AtomicReference<>(Tip.NONE);
        try (Store store = new Store(file)) {
            PostingDesk desk =
                    new PostingDesk(store, Clock.systemUTC(), Tip.NONE, (tip, changes) -> published.set(tip));
            assertThat(make(desk, Ledgers.setting("a", "1"))).isInstanceOf(Outcome.Posted.class);
            Tip before = published.get();
            try (Statement statement = store.connection().createStatement()) {
                statement.execute("PRAGMA max_page_count = 1");
            }

            Outcome full = make(desk, Ledgers.setting("big", "x".repeat(100_000)));
            assertThat(refusal(full)).isEqualTo("records-unwritable");
            assertThat(((Outcome.Refused) full).refusals().get(0).sentence()).contains("the disk is full");
            assertThat(refusal(make(desk, Ledgers.setting("b", "2")))).isEqualTo("records-unwritable");
            assertThat(published.get()).isSameAs(before);
        }
        try (SqliteLedger ledger = Ledgers.open(file, Access.WRITE)) {
            assertThat(ledger.current().records().settings().count()).isEqualTo(1);
            Ledgers.post(ledger, Ledgers.setting("big", "x".repeat(100_000)));
        }
    }

    private static Outcome make(PostingDesk desk, Ledger.Entry entry) {
        Pending pending = new Pending("Ana", "as built", entry);
        new PostingLine(desk).await(pending);
        return pending.result();
    }

    @Test
    void a_new_file_that_cannot_be_made_is_not_there() {
        Path nowhere = folder.resolve("plant");
        try (SqliteLedger ledger = Ledgers.open(nowhere, Access.WRITE)) {
            assertThat(RecordsFile.making(nowhere).toFile().mkdir()).isTrue();
            assertThat(RecordsFile.making(nowhere)
                            .resolve("in the way")
                            .toFile()
                            .mkdir())
                    .isTrue();

            assertThat(refusal(ledger.post("Ana", "first", Ledgers.setting("a", "1"))))
                    .isEqualTo("records-unwritable");
            assertThat(nowhere).doesNotExist();
            assertThat(ledger.current().records().posting()).isZero();
            assertThat(ledger.postings(10, 10)).isEmpty();
        }
    }

    /** An entry that the rules let by and the tables do not: it is replayed past the rules. */
    private static Ledger.Entry codeTwice() {
        return editor -> {
            editor.replay(
                    Change.add(new Setting(editor.records().newIdentity(RecordKind.SETTING), "taken", "another")));
            return List.of();
        };
    }

    private static Ledger.Entry passOfNoCable() {
        return editor -> {
            Pass pass = new Pass(editor.records().newIdentity(RecordKind.PASS), 1, 1, 77, List.of(), List.of());
            editor.records().newIdentity(RecordKind.PASS);
            editor.replay(Change.add(pass));
            return List.of();
        };
    }

    @Test
    void what_the_tables_refuse_is_refused_alone_and_the_ledger_goes_on() {
        try (SqliteLedger ledger = Ledgers.open(folder.resolve("plant"), Access.WRITE)) {
            Ledgers.post(ledger, Ledgers.setting("taken", "1"));

            assertThat(refusal(ledger.post("Ana", "a bug", codeTwice()))).isEqualTo("database-rule");
            assertThat(refusal(ledger.post("Ana", "a bug", passOfNoCable()))).isEqualTo("database-rule");
            assertThat(ledger.current().records().posting()).isEqualTo(1);
            assertThat(Ledgers.post(ledger, Ledgers.setting("free", "2"))
                            .posting()
                            .number())
                    .isEqualTo(2);
        }
    }

    @Test
    void one_bad_posting_in_a_commit_of_many_does_not_take_the_others_with_it() throws Exception {
        try (SqliteLedger ledger = Ledgers.open(folder.resolve("plant"), Access.WRITE)) {
            Ledgers.post(ledger, Ledgers.setting("taken", "1"));
            CountDownLatch first = new CountDownLatch(1);
            // The first holds the desk until the others stand in line behind it, so that they are made in one go.
            FutureTask<Outcome> holding = start(() -> ledger.post("Ana", "hold", editor -> {
                await(first);
                return Ledgers.setting("held", "x").enter(editor);
            }));
            List<FutureTask<Outcome>> good = new ArrayList<>();
            for (int index = 0; index < 5; index++) {
                String name = "good " + index;
                good.add(start(() -> ledger.post("Ana", "good", Ledgers.setting(name, "x"))));
            }
            FutureTask<Outcome> bad = start(() -> ledger.post("Ana", "a bug", codeTwice()));
            awaitAllWaiting();
            first.countDown();

            assertThat(holding.get()).isInstanceOf(Outcome.Posted.class);
            for (FutureTask<Outcome> outcome : good) {
                assertThat(outcome.get()).isInstanceOf(Outcome.Posted.class);
            }
            assertThat(refusal(bad.get())).isEqualTo("code-twice");
            assertThat(ledger.current().records().posting()).isEqualTo(7);
        }
        try (SqliteLedger again = Ledgers.open(folder.resolve("plant"), Access.READ)) {
            assertThat(again.current().records().settings().count()).isEqualTo(7);
        }
    }

    private FutureTask<Outcome> start(Callable<Outcome> client) {
        FutureTask<Outcome> task = new FutureTask<>(client);
        Thread thread = new Thread(task);
        clients.add(thread);
        thread.start();
        return task;
    }

    private void awaitAllWaiting() throws InterruptedException {
        while (!clients.stream().allMatch(thread -> thread.getState() == Thread.State.WAITING)) {
            Thread.sleep(1);
        }
    }

    private static void await(CountDownLatch latch) {
        try {
            latch.await();
        } catch (InterruptedException end) {
            throw new IllegalStateException(end);
        }
    }

    @Test
    void a_posting_within_a_posting_is_a_bug_that_is_told() {
        try (SqliteLedger ledger = Ledgers.open(folder.resolve("plant"), Access.WRITE)) {
            assertThatThrownBy(() -> ledger.post("Ana", "outer", editor -> {
                        ledger.post("Ana", "inner", Ledgers.setting("a", "1"));
                        return List.of();
                    }))
                    .isInstanceOf(IllegalStateException.class);
            Ledgers.post(ledger, Ledgers.setting("a", "1"));
        }
    }

    @Test
    void a_caller_that_is_interrupted_still_learns_what_became_of_its_posting() {
        try (SqliteLedger ledger = Ledgers.open(folder.resolve("plant"), Access.WRITE)) {
            Thread.currentThread().interrupt();
            Outcome outcome = ledger.post("Ana", "as built", Ledgers.setting("a", "1"));

            assertThat(outcome).isInstanceOf(Outcome.Posted.class);
            assertThat(Thread.interrupted()).isTrue();
        }
    }
}
