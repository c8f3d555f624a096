package spanwright.draft;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.time.Clock;
import java.time.Instant;
import java.time.LocalDate;
import java.time.ZoneOffset;
import java.util.List;
import java.util.NoSuchElementException;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import spanwright.sheet.SheetHeader;

/** What every book of drafts keeps to. */
public abstract class DraftBookContract {

    protected static final Instant NOW = Instant.parse("2026-03-31T19:05:00.123456Z");

    private DraftBook book;

    /** An empty book at the time of a clock. */
    protected abstract DraftBook empty(Clock clock);

    @BeforeEach
    void makeBook() {
        book = empty(Clock.fixed(NOW, ZoneOffset.UTC));
    }

    protected static DraftText text(String... lines) {
        return new DraftText(List.of(lines), SheetHeader.NONE, 1, 1, List.of());
    }

    protected static Draft kept(DraftOutcome outcome) {
        assertThat(outcome).isInstanceOf(DraftOutcome.Kept.class);
        return ((DraftOutcome.Kept) outcome).draft();
    }

    private Draft begin(String... lines) {
        return kept(book.begin(new DraftStart(7, "R. Vale", 1, text(lines))));
    }

    private Draft save(Draft draft, String... lines) {
        return kept(book.change(draft.id(), draft.revision(), new DraftStep.Save(text(lines), 1)));
    }

    private Draft step(Draft draft, DraftStep step) {
        return kept(book.change(draft.id(), draft.revision(), step));
    }

    @Test
    void all_that_is_written_comes_back_letter_by_letter() {
        DraftText written = new DraftText(
                List.of("", "  F-1 ahead 1 = ", "", "\tx; \"y\" # z", ""),
                new SheetHeader("0412", "K. Ash", LocalDate.of(2026, 3, 30), "photo", "rain"),
                4,
                3,
                List.of(new Answer("ribbon-turned", "", "seen"), new Answer("a", "\tline", "because")));
        Draft draft = kept(book.begin(new DraftStart(7, "R. Vale", 1, written)));

        assertThat(book.find(1)).contains(draft);
        assertThat(draft.text()).isEqualTo(written);
        assertThat(draft.begunAt()).isEqualTo(NOW);
        assertThat(book.list()).containsExactly(draft);
        assertThat(save(draft).text()).isEqualTo(text());
        assertThat(book.find(1).orElseThrow().text().lines()).isEmpty();
    }

    @Test
    void a_change_upon_an_old_revision_is_not_laid_over_a_newer_one() {
        Draft first = begin("a");
        Draft second = save(first, "b");

        DraftOutcome late = book.change(1, first.revision(), new DraftStep.Save(text("c"), 1));

        assertThat(late).isEqualTo(new DraftOutcome.Stale(second));
        assertThat(book.find(1)).contains(second);
    }

    @Test
    void what_was_written_is_undone_and_redone_step_by_step() {
        Draft draft = save(save(begin("a"), "b"), "c");
        Draft b = step(draft, new DraftStep.Undo());
        Draft a = step(b, new DraftStep.Undo());

        assertThat(b.text().lines()).containsExactly("b");
        assertThat(a.text().lines()).containsExactly("a");
        assertThat(a.canUndo()).isFalse();
        assertThat(book.change(1, a.revision(), new DraftStep.Undo())).isInstanceOf(DraftOutcome.Refused.class);
        Draft again = step(a, new DraftStep.Redo());
        assertThat(again.text().lines()).containsExactly("b");
        Draft other = save(again, "d");
        assertThat(other.canRedo()).isFalse();
        assertThat(step(other, new DraftStep.Undo()).text().lines()).containsExactly("b");
    }

    @Test
    void the_cursor_moves_without_a_step_to_undo_and_keeps_what_can_be_redone() {
        Draft undone = step(save(begin("a"), "b"), new DraftStep.Undo());
        DraftText moved = new DraftText(List.of("a"), SheetHeader.NONE, 1, 2, List.of());
        Draft after = step(undone, new DraftStep.Save(moved, 1));

        assertThat(after.text().cursorColumn()).isEqualTo(2);
        assertThat(book.find(1)).contains(after);
        assertThat(step(after, new DraftStep.Redo()).text().lines()).containsExactly("b");
    }

    @Test
    void a_draft_is_submitted_withdrawn_posted_and_then_stands() {
        Draft submitted = step(begin("a"), new DraftStep.Submit("R. Vale"));
        assertThat(submitted.submittedBy()).isEqualTo("R. Vale");
        assertThat(book.change(1, submitted.revision(), new DraftStep.Save(text("b"), 1)))
                .isInstanceOf(DraftOutcome.Refused.class);
        Draft back = step(submitted, new DraftStep.Withdraw());
        assertThat(back.state()).isEqualTo(DraftState.WRITING);
        Draft posted = step(step(back, new DraftStep.Submit("R. Vale")), new DraftStep.Posted(1, "F-1 = D-7"));
        assertThat(book.find(1)).contains(posted);
        assertThat(posted.posting()).isEqualTo(1);
        for (DraftStep step : List.of(new DraftStep.Drop(), new DraftStep.Withdraw(), new DraftStep.Undo())) {
            assertThat(book.change(1, posted.revision(), step)).isInstanceOf(DraftOutcome.Refused.class);
        }
    }

    @Test
    void a_draft_given_up_is_kept_and_numbers_are_not_given_twice() {
        Draft dropped = step(begin("a"), new DraftStep.Drop());

        assertThat(dropped.state()).isEqualTo(DraftState.DROPPED);
        assertThat(begin("b").id()).isEqualTo(2);
        assertThat(book.list()).extracting(Draft::id).containsExactly(2, 1);
    }

    @Test
    void the_oldest_versions_go_once_there_are_very_many() {
        Draft draft = begin("0");
        for (int version = 1; version <= DraftRules.MOST_VERSIONS; version++) {
            draft = save(draft, Integer.toString(version));
        }
        assertThat(draft.steps().oldest()).isEqualTo(2);
        assertThat(draft.steps().at()).isEqualTo(DraftRules.MOST_VERSIONS + 1);
    }

    @Test
    void nothing_begins_by_nobody_and_nothing_is_done_to_what_is_not_there() {
        assertThat(book.begin(new DraftStart(7, " ", 1, text()))).isInstanceOf(DraftOutcome.Refused.class);
        assertThat(book.find(1)).isEmpty();
        assertThatThrownBy(() -> book.change(1, 1, new DraftStep.Drop())).isInstanceOf(NoSuchElementException.class);
    }
}
