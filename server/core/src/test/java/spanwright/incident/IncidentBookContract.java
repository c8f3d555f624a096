package spanwright.incident;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.math.BigDecimal;
import java.time.Clock;
import java.time.Instant;
import java.util.List;
import java.util.NoSuchElementException;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import spanwright.network.SetClock;
import spanwright.records.Refusal;

/** What every incident book keeps to. */
public abstract class IncidentBookContract {

    private static final Instant BEGAN = Instant.parse("2026-03-31T14:42:00Z");
    private static final Instant NOW = BEGAN.plusSeconds(3600);
    private static final IncidentStart START = new IncidentStart(
            List.of("span:S-1", "place:F-1@1352.2"), List.of("C-1", "C-2"), List.of("C-3"), "7,412 m");

    private final SetClock clock = new SetClock(NOW);
    private IncidentBook book;

    /** An empty book at the time of the clock, beside records with one posting. */
    protected abstract IncidentBook empty(Clock clock);

    @BeforeEach
    final void openBook() {
        book = empty(clock);
    }

    private Incident open(String title) {
        return kept(book.open(new IncidentDraft(title, "D. Reed", BEGAN, START), 1));
    }

    private static <T> T kept(Written<T> written) {
        assertThat(written).isInstanceOf(Written.Kept.class);
        return ((Written.Kept<T>) written).kept();
    }

    private static List<String> refused(Written<?> written) {
        assertThat(written).isInstanceOf(Written.Refused.class);
        return ((Written.Refused<?>) written)
                .refusals().stream().map(Refusal::code).toList();
    }

    private static EntryDraft entry(EntryKind kind, long minutes) {
        return EntryDraft.of(kind, BEGAN.plusSeconds(60 * minutes), "D. Reed");
    }

    @Test
    final void an_empty_book_holds_nothing() {
        assertThat(book.list()).isEmpty();
        assertThat(book.find(1)).isEmpty();
        assertThatThrownBy(() -> book.entries(1)).isInstanceOf(NoSuchElementException.class);
        assertThatThrownBy(() -> book.write(1, entry(EntryKind.CALLED, 1))).isInstanceOf(NoSuchElementException.class);
    }

    @Test
    final void an_incident_is_kept_as_it_was_opened() {
        Incident first = open("Cut near Wendlecote");

        assertThat(first).isEqualTo(new Incident(1, "Cut near Wendlecote", BEGAN, NOW, "D. Reed", START, 1));
        assertThat(book.find(1)).contains(first);
        assertThat(book.entries(1)).isEmpty();
        Incident second = open("Another");
        assertThat(second.id()).isEqualTo(2);
        assertThat(book.list()).containsExactly(second, first);
    }

    @Test
    final void an_incident_begun_at_part_of_a_second_is_kept_to_the_microsecond() {
        Instant odd = BEGAN.plusNanos(123_456_789);
        Incident incident = kept(book.open(new IncidentDraft("Odd", "D. Reed", odd, START), 1));

        assertThat(incident.beganAt()).isEqualTo(BEGAN.plusNanos(123_456_000));
        assertThat(book.find(1)).contains(incident);
    }

    @Test
    final void an_entry_is_kept_with_all_that_it_says_in_the_order_written() {
        open("Cut");
        IncidentEntry stated = kept(book.write(
                1,
                entry(EntryKind.STATED, 5).stating(410, new BigDecimal("64.5")).saying("by the switch")));
        clock.set(NOW.plusSeconds(60));
        IncidentEntry back =
                kept(book.write(1, entry(EntryKind.CIRCUITS_BACK, 30).about("C-1", "C-2")));
        IncidentEntry amended = kept(book.write(
                1, entry(EntryKind.CIRCUITS_BACK, 31).about("C-1", "C-2").inPlaceOf(2)));

        assertThat(stated.number()).isEqualTo(1);
        assertThat(back.writtenAt()).isEqualTo(NOW.plusSeconds(60));
        assertThat(amended.said().corrects()).isEqualTo(2);
        assertThat(book.entries(1)).containsExactly(stated, back, amended);
    }

    @Test
    final void each_incident_has_its_own_log() {
        open("One");
        open("Other");
        IncidentEntry entry = kept(book.write(2, entry(EntryKind.CALLED, 1)));

        assertThat(book.entries(1)).isEmpty();
        assertThat(book.entries(2)).containsExactly(entry);
    }

    @Test
    final void what_the_rules_refuse_is_not_kept() {
        assertThat(refused(book.open(
                        new IncidentDraft(
                                " ", "", NOW.plusSeconds(1), new IncidentStart(List.of(), List.of(), List.of(), null)),
                        1)))
                .containsExactly(
                        "entry-by-nobody", "entry-in-future", "incident-without-title", "incident-from-nothing");
        assertThat(book.list()).isEmpty();
        open("Cut");
        assertThat(refused(book.write(1, entry(EntryKind.CLOSED, 50)))).containsExactly("incident-circuits-down");
        assertThat(book.entries(1)).isEmpty();
    }
}
