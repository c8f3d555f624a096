package spanwright.sqlite;

import static org.assertj.core.api.Assertions.assertThat;

import java.nio.file.Path;
import java.time.Clock;
import java.util.List;
import java.util.Objects;
import org.jspecify.annotations.Nullable;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import spanwright.draft.Draft;
import spanwright.draft.DraftBook;
import spanwright.draft.DraftBookContract;
import spanwright.draft.DraftOutcome;
import spanwright.draft.DraftStart;
import spanwright.draft.DraftStep;

class SqliteDraftsTest extends DraftBookContract {

    @TempDir
    private Path folder;

    private @Nullable SqliteLedger opened;

    private Path file() {
        return folder.resolve("plant.spanwright");
    }

    @Override
    protected DraftBook empty(Clock clock) {
        SqliteLedger ledger = ((Opening.Opened) SqliteLedger.open(file(), Access.WRITE, clock)).ledger();
        opened = ledger;
        Ledgers.post(ledger, Ledgers.setting("owner", "Valley Fiber"));
        return ledger.drafts();
    }

    private SqliteLedger ledger() {
        return Objects.requireNonNull(opened);
    }

    @AfterEach
    void close() {
        ledger().close();
    }

    @Test
    void a_draft_and_its_history_are_there_when_the_file_is_opened_again() {
        Draft first = kept(ledger().drafts().begin(new DraftStart(7, "R. Vale", 1, text("a"))));
        Draft second = kept(ledger().drafts().change(1, first.revision(), new DraftStep.Save(text("b"), 1)));
        try (SqliteLedger reader = Ledgers.open(file(), Access.READ)) {
            assertThat(reader.drafts().list()).containsExactly(second);
            assertThat(reader.drafts().change(1, 2, new DraftStep.Undo())).isInstanceOf(DraftOutcome.Refused.class);
        }
        ledger().close();
        opened = Ledgers.open(file(), Access.WRITE);

        assertThat(ledger().drafts().find(1)).contains(second);
        Draft undone = kept(ledger().drafts().change(1, second.revision(), new DraftStep.Undo()));
        assertThat(undone.text().lines()).isEqualTo(List.of("a"));
        assertThat(undone.canRedo()).isTrue();
        assertThat(ledger().integrity().toCompletableFuture().join().sound()).isTrue();
    }
}
