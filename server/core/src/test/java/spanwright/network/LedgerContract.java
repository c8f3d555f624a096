package spanwright.network;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.time.Clock;
import java.time.Instant;
import java.util.ArrayList;
import java.util.List;
import java.util.NoSuchElementException;
import java.util.Random;
import java.util.concurrent.Callable;
import java.util.concurrent.ExecutorService;
import java.util.concurrent.Executors;
import java.util.concurrent.Future;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import spanwright.journal.Change;
import spanwright.journal.Posting;
import spanwright.journal.RecordKind;
import spanwright.plant.Cable;
import spanwright.plant.PlantState;
import spanwright.plant.RunRow;
import spanwright.plant.Setting;
import spanwright.plant.Trust;
import spanwright.quantity.Length;
import spanwright.records.Refusal;

/** What every ledger keeps to. */
public abstract class LedgerContract {

    private static final Instant START = Instant.parse("2026-03-31T14:05:00.123456Z");

    private final SetClock now = new SetClock(START);
    private Ledger ledger;

    /** A ledger of nothing, at the time of the clock. */
    protected abstract Ledger open(Clock clock);

    @BeforeEach
    final void openLedger() {
        ledger = open(now);
    }

    @AfterEach
    final void closeLedger() {
        ledger.close();
    }

    private static Ledger.Entry setting(String name, String value) {
        return editor ->
                editor.apply(Change.add(new Setting(editor.records().newIdentity(RecordKind.SETTING), name, value)));
    }

    private Posting post(Ledger.Entry entry) {
        Outcome outcome = ledger.post("Ana", "as built", entry);
        assertThat(outcome).isInstanceOf(Outcome.Posted.class);
        return ((Outcome.Posted) outcome).posting();
    }

    private static List<Refusal> refusals(Outcome outcome) {
        assertThat(outcome).isInstanceOf(Outcome.Refused.class);
        return ((Outcome.Refused) outcome).refusals();
    }

    @Test
    final void a_new_ledger_holds_nothing() {
        assertThat(ledger.current().records().posting()).isZero();
        assertThat(ledger.postings(Integer.MAX_VALUE, 10)).isEmpty();
        assertThat(ledger.findPosting(1)).isEmpty();
        assertThat(RecordsText.of(ledger.asOf(0))).isEqualTo(RecordsText.of(Snapshot.empty()));
    }

    @Test
    final void a_posting_is_numbered_dated_and_kept() {
        Posting posting = post(setting("owner", "Valley Fiber"));

        assertThat(posting).isEqualTo(new Posting(1, START, "Ana", "as built", 1));
        assertThat(ledger.findPosting(1)).contains(posting);
        assertThat(ledger.current().records().posting()).isEqualTo(1);
        assertThat(ledger.current().records().settings().find("owner"))
                .contains(new Setting(1, "owner", "Valley Fiber"));
        assertThat(ledger.changesOf(1)).containsExactly(Change.add(new Setting(1, "owner", "Valley Fiber")));
    }

    @Test
    final void the_outcome_carries_the_state_with_the_posting() {
        Outcome outcome = ledger.post("Ana", "as built", setting("owner", "Valley Fiber"));

        assertThat(((Outcome.Posted) outcome).snapshot().records().settings().count())
                .isEqualTo(1);
    }

    @Test
    final void what_is_refused_leaves_nothing() {
        post(setting("owner", "Valley Fiber"));
        Refusal refusal = new Refusal("no", "No.", null, null, null);

        Outcome outcome = ledger.post("Ana", "as built", editor -> {
            assertThat(setting("unit", "m").enter(editor)).isEmpty();
            return List.of(refusal);
        });

        assertThat(refusals(outcome)).containsExactly(refusal);
        assertThat(ledger.current().records().posting()).isEqualTo(1);
        assertThat(ledger.current().records().settings().find("unit")).isEmpty();
        assertThat(ledger.findPosting(2)).isEmpty();
        assertThat(post(setting("unit", "ft")).number()).isEqualTo(2);
    }

    @Test
    final void a_rule_over_several_rows_is_asked_though_the_entry_does_not() {
        Outcome outcome = ledger.post("Ana", "as built", editor -> {
            new RandomPostings(1).foundation().enter(editor);
            return editor.apply(Change.add(LedgerContract.cableWithoutStart(editor)))
                            .isEmpty()
                    ? List.of()
                    : List.of(new Refusal("unexpected", "The row itself is refused.", null, null, null));
        });

        assertThat(refusals(outcome)).extracting(Refusal::code).contains("run-not-consecutive");
        assertThat(ledger.current().records().posting()).isZero();
    }

    private static RunRow cableWithoutStart(SnapshotEditor editor) {
        editor.apply(Change.add(new Cable(1, "F-1", 1, null, "white", null, null, null, PlantState.IN_SERVICE, null)));
        return new RunRow(1, 1, 3, 1, null, Length.ZERO, Trust.POSTED, null, null);
    }

    @Test
    final void an_entry_that_throws_leaves_nothing_and_the_ledger_goes_on() {
        assertThatThrownBy(() -> ledger.post("Ana", "as built", editor -> {
                    setting("unit", "m").enter(editor);
                    throw new IllegalStateException("a bug");
                }))
                .isInstanceOf(IllegalStateException.class)
                .hasMessage("a bug");

        assertThat(ledger.current().records().posting()).isZero();
        assertThat(post(setting("unit", "ft")).number()).isEqualTo(1);
    }

    @Test
    final void a_posting_needs_a_person_and_a_reason() {
        assertThat(refusals(ledger.post(" ", "", setting("unit", "m"))))
                .extracting(Refusal::code)
                .containsExactly("posting-by-nobody", "posting-without-reason");
        assertThat(ledger.current().records().posting()).isZero();
    }

    @Test
    final void a_posting_of_no_changes_is_kept_too() {
        assertThat(post(editor -> List.of()).changes()).isZero();
        assertThat(ledger.changesOf(1)).isEmpty();
    }

    @Test
    final void time_never_runs_back_from_one_posting_to_the_next() {
        post(setting("a", "1"));
        now.set(START.minusSeconds(3600));

        assertThat(post(setting("b", "2")).at()).isEqualTo(START);
        now.set(START.plusSeconds(1));
        assertThat(post(setting("c", "3")).at()).isEqualTo(START.plusSeconds(1));
    }

    @Test
    final void the_state_at_an_instant_includes_what_was_posted_then() {
        post(setting("a", "1"));
        now.set(START.plusSeconds(10));
        post(setting("b", "2"));
        post(setting("c", "3"));

        assertThat(ledger.asOf(START.minusNanos(1)).records().posting()).isZero();
        assertThat(ledger.asOf(START).records().posting()).isEqualTo(1);
        assertThat(ledger.asOf(START.plusSeconds(9)).records().posting()).isEqualTo(1);
        assertThat(ledger.asOf(START.plusSeconds(10)).records().posting()).isEqualTo(3);
        assertThat(ledger.asOf(Instant.MAX).records().posting()).isEqualTo(3);
    }

    @Test
    final void postings_are_listed_newest_first() {
        for (int number = 1; number <= 5; number++) {
            post(setting("s" + number, "x"));
        }

        assertThat(ledger.postings(Integer.MAX_VALUE, 2))
                .extracting(Posting::number)
                .containsExactly(5, 4);
        assertThat(ledger.postings(4, 10)).extracting(Posting::number).containsExactly(3, 2, 1);
        assertThat(ledger.postings(1, 10)).isEmpty();
        assertThat(ledger.postings(Integer.MAX_VALUE, 0)).isEmpty();
    }

    @Test
    final void what_is_not_there_is_said_not_to_be() {
        post(setting("a", "1"));

        assertThatThrownBy(() -> ledger.asOf(2)).isInstanceOf(NoSuchElementException.class);
        assertThatThrownBy(() -> ledger.asOf(-1)).isInstanceOf(NoSuchElementException.class);
        assertThatThrownBy(() -> ledger.changesOf(2)).isInstanceOf(NoSuchElementException.class);
        assertThatThrownBy(() -> ledger.changesOf(0)).isInstanceOf(NoSuchElementException.class);
        assertThat(ledger.findPosting(0)).isEmpty();
    }

    @Test
    final void a_closed_ledger_posts_no_more() {
        ledger.close();
        ledger.close();

        assertThat(refusals(ledger.post("Ana", "too late", setting("a", "1"))))
                .extracting(Refusal::code)
                .containsExactly("records-closed");
    }

    @ParameterizedTest(name = "seed {0}")
    @ValueSource(longs = {1, 2, 3, 4})
    final void every_state_can_be_asked_for_again(long seed) {
        RandomPostings postings = new RandomPostings(seed);
        List<List<String>> states = new ArrayList<>();
        states.add(RecordsText.of(ledger.current()));
        post(postings.foundation());
        states.add(RecordsText.of(ledger.current()));
        for (int posting = 0; posting < 40; posting++) {
            if (ledger.post("Ana", "at random", postings.next()) instanceof Outcome.Posted posted) {
                assertThat(posted.posting().number()).isEqualTo(states.size());
                states.add(RecordsText.of(posted.snapshot()));
            }
            assertThat(RecordsText.of(ledger.current())).isEqualTo(states.get(states.size() - 1));
        }
        Random random = new Random(seed);
        for (int question = 0; question < 30; question++) {
            int posting = random.nextInt(states.size());
            assertThat(RecordsText.of(ledger.asOf(posting)))
                    .as("seed %d, posting %d of %d", seed, posting, states.size() - 1)
                    .isEqualTo(states.get(posting));
        }
    }

    @Test
    final void the_changes_of_the_postings_make_the_state_again() {
        RandomPostings postings = new RandomPostings(5);
        post(postings.foundation());
        for (int posting = 0; posting < 20; posting++) {
            ledger.post("Ana", "at random", postings.next());
        }

        SnapshotEditor editor = Snapshot.empty().edit();
        for (int number = 1; number <= ledger.current().records().posting(); number++) {
            List<Change> changes = ledger.changesOf(number);
            assertThat(changes).hasSize(ledger.findPosting(number).orElseThrow().changes());
            changes.forEach(editor::replay);
        }

        assertThat(RecordsText.of(editor.build(ledger.current().records().posting())))
                .isEqualTo(RecordsText.of(ledger.current()));
    }

    @Test
    final void postings_from_many_threads_are_made_one_after_another() throws Exception {
        int threads = 8;
        int each = 25;
        ExecutorService clients = Executors.newFixedThreadPool(threads);
        List<Future<Integer>> made = new ArrayList<>();
        for (int thread = 0; thread < threads; thread++) {
            String name = "t" + thread;
            Callable<Integer> client = () -> {
                for (int index = 0; index < each; index++) {
                    int wanted = index;
                    Outcome outcome = ledger.post(name, "count", editor -> count(editor, name, wanted));
                    assertThat(outcome).isInstanceOf(Outcome.Posted.class);
                    Outcome.Posted posted = (Outcome.Posted) outcome;
                    assertThat(ledger.current().records().posting())
                            .isGreaterThanOrEqualTo(posted.posting().number());
                    assertThat(valueOf(posted.snapshot(), name)).isEqualTo(wanted + 1);
                }
                return each;
            };
            made.add(clients.submit(client));
        }
        for (Future<Integer> future : made) {
            assertThat(future.get()).isEqualTo(each);
        }
        clients.shutdown();

        assertThat(ledger.current().records().posting()).isEqualTo(threads * each);
        List<Posting> postings = ledger.postings(Integer.MAX_VALUE, Integer.MAX_VALUE);
        assertThat(postings).hasSize(threads * each);
        for (int thread = 0; thread < threads; thread++) {
            assertThat(valueOf(ledger.current(), "t" + thread)).isEqualTo(each);
        }
    }

    private static int valueOf(Snapshot snapshot, String name) {
        return Integer.parseInt(
                snapshot.records().settings().find(name).orElseThrow().value());
    }

    /** Counts up from what the state says, so that a posting on a state that is not the newest would be seen. */
    private static List<Refusal> count(SnapshotEditor editor, String name, int wanted) {
        Setting was = editor.records().settings().find(name).orElse(null);
        if (was == null) {
            assertThat(wanted).isZero();
            return setting(name, "1").enter(editor);
        }
        assertThat(was.value()).isEqualTo(Integer.toString(wanted));
        return editor.apply(Change.replace(was, new Setting(was.id(), name, Integer.toString(wanted + 1))));
    }
}
