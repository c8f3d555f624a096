package spanwright.incident;

import static org.assertj.core.api.Assertions.assertThat;

import java.math.BigDecimal;
import java.time.Instant;
import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;
import spanwright.records.Refusal;

class IncidentRulesTest {

    private static final Instant BEGAN = Instant.parse("2026-03-31T14:42:00Z");
    private static final Instant NOW = BEGAN.plusSeconds(36_000);
    private static final Incident INCIDENT = new Incident(
            1, "Cut", BEGAN, BEGAN, "D. Reed", new IncidentStart(List.of(), List.of("C-1", "C-2"), List.of(), null), 1);

    private final List<IncidentEntry> entries = new ArrayList<>();

    private IncidentLog log() {
        return new IncidentLog(INCIDENT, entries);
    }

    private static EntryDraft said(EntryKind kind, long minutes) {
        return EntryDraft.of(kind, BEGAN.plusSeconds(60 * minutes), "D. Reed");
    }

    private List<String> refused(EntryDraft draft) {
        return IncidentRules.refuse(log(), draft, NOW).stream()
                .map(Refusal::code)
                .toList();
    }

    private void write(EntryDraft draft) {
        assertThat(IncidentRules.refuse(log(), draft, NOW)).isEmpty();
        entries.add(new IncidentEntry(1, entries.size() + 1, NOW, draft));
    }

    @Test
    void an_entry_has_a_writer_a_time_that_is_past_and_what_its_kind_needs() {
        assertThat(refused(EntryDraft.of(EntryKind.FOUND, NOW.plusSeconds(1), "")))
                .containsExactly("entry-by-nobody", "entry-in-future");
        assertThat(refused(said(EntryKind.NOTE, 1))).containsExactly("entry-without-text");
        assertThat(refused(said(EntryKind.CIRCUITS_BACK, 1))).containsExactly("entry-circuits");
        assertThat(refused(said(EntryKind.FOUND, 1).about("C-1"))).containsExactly("entry-circuits");
        assertThat(refused(said(EntryKind.STATED, 1))).containsExactly("entry-stated");
        assertThat(refused(said(EntryKind.FOUND, 1).stating(3, null))).containsExactly("entry-stated");
        assertThat(refused(said(EntryKind.STATED, 1).stating(-1, new BigDecimal("-2"))))
                .containsExactly("entry-stated");
    }

    @Test
    void only_what_is_down_comes_back() {
        assertThat(refused(said(EntryKind.CIRCUITS_BACK, 5).about("C-1", "C-9")))
                .containsExactly("circuit-not-down");
        write(said(EntryKind.CIRCUITS_DOWN, 4).about("C-9"));
        write(said(EntryKind.CIRCUITS_BACK, 5).about("C-1", "C-9"));
    }

    @Test
    void an_incident_is_closed_once_all_is_back_and_opened_again_before_more_goes_down() {
        write(said(EntryKind.CIRCUITS_BACK, 30).about("C-1"));
        assertThat(refused(said(EntryKind.CLOSED, 40))).containsExactly("incident-circuits-down");
        write(said(EntryKind.ALL_LIGHT, 41));
        assertThat(refused(said(EntryKind.REOPENED, 42))).containsExactly("incident-open");
        write(said(EntryKind.CLOSED, 42));
        assertThat(log().isOpen()).isFalse();
        assertThat(refused(said(EntryKind.CLOSED, 43))).containsExactly("incident-closed");
        assertThat(refused(said(EntryKind.CIRCUITS_DOWN, 43).about("C-1"))).containsExactly("incident-circuits-down");
        write(said(EntryKind.NOTE, 44).saying("Claim sent"));
        write(said(EntryKind.REOPENED, 50));
        write(said(EntryKind.CIRCUITS_DOWN, 50).about("C-1"));
        assertThat(log().isOpen()).isTrue();
    }

    @Test
    void a_correction_stands_in_the_place_of_what_it_names_and_both_stay_to_be_seen() {
        write(said(EntryKind.FOUND, 20));
        write(said(EntryKind.FOUND, 25).inPlaceOf(1));

        assertThat(IncidentClock.of(log()).found()).isEqualTo(BEGAN.plusSeconds(25 * 60));
        assertThat(log().entries()).hasSize(2);
        assertThat(log().correctedBy(1)).contains(2);
        assertThat(refused(said(EntryKind.FOUND, 26).inPlaceOf(1))).containsExactly("entry-corrected-already");
        assertThat(refused(said(EntryKind.FOUND, 26).inPlaceOf(7))).containsExactly("entry-corrects-none");
        write(said(EntryKind.NOTE, 26).saying("Not found yet: it was a shadow").inPlaceOf(2));
        assertThat(IncidentClock.of(log()).found()).isNull();
    }

    @Test
    void a_correction_that_would_leave_a_closed_incident_with_circuits_down_is_refused() {
        write(said(EntryKind.ALL_LIGHT, 41));
        write(said(EntryKind.CLOSED, 42));

        assertThat(refused(said(EntryKind.CIRCUITS_BACK, 41).about("C-1").inPlaceOf(1)))
                .containsExactly("incident-circuits-down");
        write(said(EntryKind.NOTE, 43).saying("Closed too early").inPlaceOf(2));
        assertThat(log().isOpen()).isTrue();
    }
}
