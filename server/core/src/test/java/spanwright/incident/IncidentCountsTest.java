package spanwright.incident;

import static org.assertj.core.api.Assertions.assertThat;

import java.math.BigDecimal;
import java.time.Duration;
import java.time.Instant;
import java.util.ArrayList;
import java.util.List;
import java.util.Random;
import java.util.Set;
import java.util.TreeSet;
import org.jspecify.annotations.Nullable;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import spanwright.circuits.Circuit;
import spanwright.incident.ReportingStandings.Due;
import spanwright.incident.ReportingStandings.Standing;
import spanwright.journal.Change;
import spanwright.journal.RecordKind;
import spanwright.network.Snapshot;
import spanwright.network.SnapshotEditor;
import spanwright.plant.Setting;
import spanwright.plant.SourceStatus;
import spanwright.plants.Drawing;
import spanwright.records.Records;

class IncidentCountsTest {

    private static final Instant BEGAN = Instant.parse("2026-03-31T10:42:00Z");
    private static final String PLANT = """
            structure H1 0 0
            structure H2 0.001 0
            cable F-1 12 : H1 100 H2
            enclosure E1 H1 : F-1
            enclosure E2 H2 : F-1
            panel E1 P 12
            panel E2 P 12
            term E1/P/1-12 = F-1 ahead 1-12
            term E2/P/1-12 = F-1 back 1-12
            circuit W E1/P/1 E2/P/1
            circuit P E1/P/2 E2/P/2
            circuit A E1/P/3 E2/P/3
            circuit B E1/P/4 E2/P/4
            """;

    private final List<IncidentEntry> entries = new ArrayList<>();
    private Records records = records();

    /** W and P protect each other and serve 7 and 5; A serves 410, B 130; all of first priority but A. */
    private static Records records() {
        SnapshotEditor editor = Drawing.of(PLANT).edit();
        serve(editor, "W", "RING", 7, 1);
        serve(editor, "P", "RING", 5, 1);
        serve(editor, "A", null, 410, 3);
        serve(editor, "B", null, 130, 1);
        return editor.build(2).records();
    }

    private static void serve(SnapshotEditor editor, String code, @Nullable String group, int customers, int priority) {
        Circuit was = editor.records().circuits().find(code).orElseThrow();
        Circuit is = new Circuit(
                was.id(),
                code,
                null,
                null,
                priority,
                customers,
                was.wavelengths(),
                null,
                group,
                was.a(),
                was.z(),
                was.status());
        assertThat(editor.apply(Change.replace(was, is))).isEmpty();
    }

    private IncidentLog log(String... down) {
        IncidentStart start = new IncidentStart(List.of("span:S-1"), List.of(down), List.of(), null);
        return new IncidentLog(new Incident(1, "Cut", BEGAN, BEGAN.plusSeconds(300), "D. Reed", start, 1), entries);
    }

    private void write(EntryDraft said) {
        entries.add(new IncidentEntry(1, entries.size() + 1, said.happenedAt(), said));
    }

    private static Instant after(long minutes) {
        return BEGAN.plusSeconds(60 * minutes);
    }

    private static EntryDraft said(EntryKind kind, long minutes) {
        return EntryDraft.of(kind, after(minutes), "D. Reed");
    }

    private IncidentCounts counts(IncidentLog log, long minutes) {
        return IncidentCounts.of(log, records, after(minutes));
    }

    private Standing standing(IncidentLog log, long minutes, String name) {
        return new ReportingStandings(log, counts(log, minutes), records)
                .counts().stream()
                        .filter(each -> each.threshold().name().equals(name))
                        .findFirst()
                        .orElseThrow();
    }

    @Test
    void customers_are_counted_by_the_minute_until_they_are_back() {
        write(said(EntryKind.CIRCUITS_BACK, 10).about("B"));
        write(said(EntryKind.CIRCUITS_DOWN, 20).about("B"));
        write(said(EntryKind.ALL_LIGHT, 50));
        IncidentLog log = log("A", "B");

        // By hand: A 410 x 50; B 130 x (10 + 30).
        assertThat(counts(log, 50).customerMinutes().at(after(50))).isEqualByComparingTo("25700");
        assertThat(counts(log, 50).customerMinutes().at(after(500))).isEqualByComparingTo("25700");
        assertThat(counts(log, 50).circuitMinutes().at(after(50))).isEqualByComparingTo("90");
        assertThat(counts(log, 15).down()).containsExactly("A");
        assertThat(counts(log, 15).back()).containsExactly("B");
        assertThat(counts(log, 25).down()).containsExactly("A", "B");
        assertThat(counts(log, 60).down()).isEmpty();
        assertThat(counts(log, 60).standings())
                .extracting(IncidentCounts.Standing::customersDown)
                .containsExactly(540, 410, 540, 0);
    }

    @Test
    void a_service_with_one_path_left_is_not_down_but_single_and_its_days_are_counted() {
        write(said(EntryKind.CIRCUITS_DOWN, 60).about("P"));
        write(said(EntryKind.CIRCUITS_BACK, 90).about("W", "P"));
        IncidentLog log = log("W");

        assertThat(counts(log, 59).firstPriorityDown()).isEmpty();
        assertThat(counts(log, 59).standings().get(0).single()).containsExactly("RING");
        assertThat(counts(log, 61).firstPriorityDown()).containsExactly("P", "W");
        assertThat(counts(log, 61).standings().get(1).customersDown())
                .as("the larger of the two")
                .isEqualTo(7);
        assertThat(counts(log, 200).customerMinutes().at(after(200))).isEqualByComparingTo("210");
        assertThat(counts(log, 200).singlePath("RING").at(after(200))).isEqualByComparingTo("60");
        assertThat(standing(log("W"), 100, ReportingThresholds.DURATION).value())
                .isEqualByComparingTo("30");
    }

    @Test
    void a_service_on_a_single_path_for_four_days_meets_that_threshold() {
        IncidentLog log = log("W");
        Standing standing = standing(log, 3 * 24 * 60, ReportingThresholds.SINGLE_PATH);

        assertThat(standing.value()).isEqualByComparingTo("3");
        assertThat(standing.reached()).isFalse();
        assertThat(standing.reachedAt()).isEqualTo(after(4 * 24 * 60));
        assertThat(standing.threshold().status()).isEqualTo(SourceStatus.MEMORY);
    }

    /** 47 CFR 4.9: 900,000 user-minutes; by hand 900,000 / 410 = 2,195.12 min = 36.6 h. */
    @Test
    void four_hundred_and_ten_lines_need_36_6_hours_for_900_000_user_minutes() {
        write(said(EntryKind.STATED, 12).stating(410, null));
        Standing standing = standing(log("A", "B"), 60, ReportingThresholds.USER_MINUTES);

        assertThat(standing.value()).isEqualByComparingTo("24600");
        assertThat(standing.reached()).isFalse();
        assertThat(standing.basis()).contains("stated");
        double hours = Duration.between(BEGAN, standing.reachedAt()).toSeconds() / 3600.0;
        assertThat(hours).isBetween(36.58, 36.59);
    }

    @Test
    void where_nobody_states_users_the_customers_of_the_records_are_taken() {
        Standing standing = standing(log("A", "B"), 100, ReportingThresholds.USER_MINUTES);

        assertThat(standing.value()).isEqualByComparingTo("54000");
        assertThat(standing.basis()).contains("customers of the records");
    }

    /** 47 CFR 4.9: 667 OC3-minutes. A 10 Gb/s link is 64 OC3 (64 x 155.52 Mb/s = 9.953 Gb/s): by hand 10.42 min. */
    @Test
    void sixty_four_OC3_reach_667_OC3_minutes_after_10_4_minutes_and_unstated_capacity_is_not_known() {
        assertThat(standing(log("A"), 30, ReportingThresholds.OC3_MINUTES).value())
                .isNull();
        assertThat(standing(log("A"), 30, ReportingThresholds.OC3_MINUTES).reached())
                .isFalse();
        write(said(EntryKind.STATED, 15).stating(null, new BigDecimal("64")));
        Standing standing = standing(log("A"), 30, ReportingThresholds.OC3_MINUTES);

        assertThat(standing.value()).isEqualByComparingTo("1920");
        assertThat(standing.reached()).isTrue();
        assertThat(Duration.between(BEGAN, standing.reachedAt()).toMillis() / 60_000.0)
                .isBetween(10.42, 10.43);
    }

    @Test
    void what_is_stated_anew_holds_from_then_on_and_ends_when_all_is_back() {
        write(said(EntryKind.STATED, 5).stating(null, new BigDecimal("4")));
        write(said(EntryKind.STATED, 20).stating(null, new BigDecimal("1")));
        write(said(EntryKind.ALL_LIGHT, 50));

        // By hand: 4 x 20 + 1 x 30.
        assertThat(standing(log("A"), 90, ReportingThresholds.OC3_MINUTES).value())
                .isEqualByComparingTo("110");
    }

    @Test
    void the_notice_is_due_120_minutes_after_the_outage_has_lasted_30() {
        write(said(EntryKind.CALLED, 4));
        IncidentLog log = log("A");
        List<Due> early = new ReportingStandings(log, counts(log, 29), records).papers();
        List<Due> late = new ReportingStandings(log, counts(log, 31), records).papers();

        assertThat(early).extracting(Due::dueAt).containsOnlyNulls();
        assertThat(late)
                .extracting(Due::dueAt)
                .containsExactly(after(30 + 120), after(4 + 72 * 60), after(4 + 30 * 24 * 60));
    }

    @Test
    void an_outage_discovered_late_has_its_notice_due_from_then() {
        write(said(EntryKind.CALLED, 45));
        IncidentLog log = log("A");

        assertThat(new ReportingStandings(log, counts(log, 46), records)
                        .papers()
                        .get(0)
                        .dueAt())
                .isEqualTo(after(45 + 120));
    }

    @Test
    void the_records_settings_replace_a_threshold_and_one_that_is_no_number_is_said_not_to() {
        SnapshotEditor editor = Snapshot.of(records).edit();
        for (String[] each : new String[][] {{"report.user_minutes", "450000"}, {"report.minutes", "half an hour"}}) {
            int id = editor.records().newIdentity(RecordKind.SETTING);
            assertThat(editor.apply(Change.add(new Setting(id, each[0], each[1]))))
                    .isEmpty();
        }
        ReportingThresholds thresholds = new ReportingThresholds(editor.build(3).records());

        assertThat(thresholds.get(ReportingThresholds.USER_MINUTES).limit()).isEqualByComparingTo("450000");
        assertThat(thresholds.get(ReportingThresholds.USER_MINUTES).source()).contains("settings");
        assertThat(thresholds.get(ReportingThresholds.DURATION).limit()).isEqualByComparingTo("30");
        assertThat(thresholds.get(ReportingThresholds.DURATION).note()).contains("half an hour");
        assertThat(thresholds.get(ReportingThresholds.DURATION).source()).contains("47 CFR 4.9");
    }

    @Test
    void light_that_is_back_is_on_the_clock_whether_or_not_it_was_called_the_first() {
        write(said(EntryKind.ON_SITE, 20));
        write(said(EntryKind.CIRCUITS_BACK, 96).about("A"));
        assertThat(IncidentClock.of(log("A", "B")).firstLight()).isEqualTo(after(96));
        assertThat(IncidentClock.of(log("A", "B")).allLight()).isNull();
        write(said(EntryKind.CIRCUITS_BACK, 120).about("B"));
        assertThat(IncidentClock.of(log("A", "B")).allLight()).isEqualTo(after(120));
    }

    /** The twin: minute by minute, who is down, asked of the entries anew each time. */
    @ParameterizedTest
    @ValueSource(longs = {1, 2, 3, 4, 5, 6, 7, 8, 9, 10, 11, 12, 13, 14, 15, 16, 17, 18, 19, 20})
    void minutes_counted_one_by_one_come_to_the_same(long seed) {
        Random random = new Random(seed);
        String[] codes = {"W", "P", "A", "B"};
        for (int count = 0; count < 12; count++) {
            EntryKind kind = random.nextInt(6) == 0
                    ? EntryKind.ALL_LIGHT
                    : random.nextBoolean() ? EntryKind.CIRCUITS_DOWN : EntryKind.CIRCUITS_BACK;
            EntryDraft said = said(kind, random.nextInt(200));
            write(kind == EntryKind.ALL_LIGHT ? said : said.about(codes[random.nextInt(4)]));
        }
        IncidentLog log = log("W", "A");
        IncidentCounts counts = counts(log, 240);
        long customers = 0;
        long circuits = 0;
        long single = 0;
        for (int minute = 0; minute < 240; minute++) {
            Set<String> down = downAt(after(minute), "W", "A");
            circuits += down.size();
            customers += (down.contains("A") ? 410 : 0) + (down.contains("B") ? 130 : 0);
            customers += down.contains("W") && down.contains("P") ? 7 : 0;
            single += down.contains("W") != down.contains("P") ? 1 : 0;
        }

        assertThat(counts.circuitMinutes().at(after(240))).as("seed %d", seed).isEqualByComparingTo("" + circuits);
        assertThat(counts.customerMinutes().at(after(240))).as("seed %d", seed).isEqualByComparingTo("" + customers);
        assertThat(counts.singlePath("RING").at(after(240))).as("seed %d", seed).isEqualByComparingTo("" + single);
    }

    private Set<String> downAt(Instant at, String... start) {
        Set<String> down = new TreeSet<>(List.of(start));
        for (int minute = 0; !after(minute).isAfter(at); minute++) {
            for (IncidentEntry entry : entries) {
                EntryDraft said = entry.said();
                if (said.happenedAt().equals(after(minute))) {
                    switch (said.kind()) {
                        case CIRCUITS_DOWN -> down.addAll(said.circuits());
                        case CIRCUITS_BACK -> down.removeAll(said.circuits());
                        default -> down.clear();
                    }
                }
            }
        }
        return down;
    }
}
