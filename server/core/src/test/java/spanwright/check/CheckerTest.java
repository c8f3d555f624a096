package spanwright.check;

import static org.assertj.core.api.Assertions.assertThat;

import java.time.LocalDate;
import java.util.ArrayList;
import java.util.List;
import java.util.function.Function;
import org.jspecify.annotations.Nullable;
import org.junit.jupiter.api.Test;
import spanwright.journal.Change;
import spanwright.journal.Recorded;
import spanwright.network.Snapshot;
import spanwright.network.SnapshotEditor;
import spanwright.plant.FiberRange;
import spanwright.plant.PlantState;
import spanwright.plant.Span;
import spanwright.plant.Trust;
import spanwright.plants.Drawing;
import spanwright.records.RecordsView;
import spanwright.splicing.EndCondition;
import spanwright.splicing.EndRange;
import spanwright.splicing.EndState;
import spanwright.splicing.FiberFlag;
import spanwright.splicing.Flag;
import spanwright.splicing.Joint;
import spanwright.splicing.JointFacts;
import spanwright.splicing.Leg;
import spanwright.splicing.LegKind;

/** Each rule on the smallest plant that breaks it, and on one that does not. */
class CheckerTest {

    private static final LocalDate TODAY = LocalDate.of(2026, 12, 1);

    /** A whole circuit over two spliced cables, with nothing to find. */
    private static final String SOUND = """
            cable F-1 2 : H1 1000 H2
            cable D-7 2 : H2 500 H3
            enclosure E1 H1 tray=1 : F-1
            enclosure E2 H2 tray=1 : F-1 D-7
            enclosure E3 H3 tray=1 : D-7
            panel E1 P 2
            panel E3 P 2
            term E1/P/1-2 = F-1 ahead 1-2
            splice E2 : F-1 back 1-2 = D-7 ahead 1-2
            term E3/P/1-2 = D-7 back 1-2
            circuit C-1 E1/P/1 E3/P/1
            """;

    private static List<Finding> check(Snapshot snapshot) {
        List<Finding> found = new ArrayList<>();
        Checker.check(snapshot, TODAY, found::add);
        return found;
    }

    /** The findings, a line each: severity, rule, file, code. */
    private static List<String> lines(Snapshot snapshot) {
        return check(snapshot).stream()
                .map(one -> one.severity().word() + " " + one.rule() + " " + one.file() + " " + one.code())
                .toList();
    }

    private static Snapshot with(Snapshot base, Function<RecordsView, Recorded> made) {
        SnapshotEditor editor = base.edit();
        Recorded record = made.apply(editor.records());
        Recorded before = editor.records().record(record.kind(), record.id());
        editor.replay(before == null ? Change.add(record) : Change.replace(before, record));
        return editor.build(2);
    }

    private static JointFacts temporary(JointFacts facts, LocalDate until) {
        return new JointFacts(
                facts.tray(), facts.method(), facts.loss(), facts.trust(), null, null, null, until, null, null);
    }

    private static Snapshot temporarySplice(LocalDate until) {
        return with(Drawing.of(SOUND), records -> {
            Joint splice = records.joints()
                    .list()
                    .filter(joint -> joint.count() == 2
                            && joint.b().leg().kind() == LegKind.AHEAD
                            && joint.a().leg().kind() == LegKind.BACK)
                    .findFirst()
                    .orElseThrow();
            return new Joint(
                    splice.id(),
                    splice.type(),
                    splice.enclosure(),
                    splice.a(),
                    splice.b(),
                    temporary(splice.facts(), until));
        });
    }

    private static Snapshot flagged(Flag flag, @Nullable LocalDate until) {
        return with(
                Drawing.of(SOUND),
                records -> new FiberFlag(
                        1,
                        records.cables().find("F-1").orElseThrow().id(),
                        FiberRange.of(1),
                        flag,
                        null,
                        null,
                        "Someone",
                        null,
                        until));
    }

    @Test
    void a_sound_plant_has_nothing_to_find() {
        assertThat(check(Drawing.of(SOUND))).isEmpty();
    }

    @Test
    void a_circuit_whose_splice_is_missing_says_how_far_the_glass_leads() {
        Snapshot broken = Drawing.of(SOUND.replace("splice E2 : F-1 back 1-2 = D-7 ahead 1-2", ""));

        assertThat(lines(broken))
                .contains(
                        "error circuit-without-path circuits.csv C-1",
                        "warning opened-without-state end_states.csv E2");
        assertThat(check(broken))
                .anySatisfy(finding -> assertThat(finding.text()).contains("F-1 back 1 @ E2"));
    }

    @Test
    void an_opened_fiber_with_a_state_is_spoken_of_and_a_state_on_a_joined_end_is_contradicted() {
        String bare = """
                cable F-1 2 : H1 1000 H2
                enclosure E2 H2 : F-1
                """;
        Function<RecordsView, Recorded> capped = records -> new EndState(
                1,
                1,
                new EndRange(new Leg(LegKind.BACK, records.runOf(1).get(1).id()), new FiberRange(1, 2)),
                EndCondition.CAPPED,
                Trust.POSTED,
                null);

        assertThat(lines(Drawing.of(bare))).containsExactly("warning opened-without-state end_states.csv E2");
        assertThat(lines(with(Drawing.of(bare), capped))).isEmpty();
        assertThat(lines(with(
                        Drawing.of(SOUND),
                        records -> new EndState(
                                1,
                                records.enclosures().find("E2").orElseThrow().id(),
                                new EndRange(
                                        new Leg(
                                                LegKind.BACK,
                                                records.runOf(1).get(1).id()),
                                        FiberRange.of(1)),
                                EndCondition.STORED,
                                Trust.POSTED,
                                null))))
                .containsExactly("error state-contradicts-glass end_states.csv E2");
    }

    @Test
    void an_enclosure_without_cable_and_a_jumper_without_rear() {
        assertThat(lines(Drawing.of("""
                enclosure E1 H1
                enclosure E2 H1
                panel E2 P 2
                jumper E2/P/1 = E2/P/2
                """)))
                .containsExactly(
                        "warning enclosure-without-cable enclosures.csv E1",
                        "warning jumper-without-rear jumpers.csv E2/P/1",
                        "warning jumper-without-rear jumpers.csv E2/P/2");
    }

    @Test
    void marks_that_turn_and_marks_in_the_wrong_unit() {
        String run = "cable F-1 2 : H1 100 H2 100 H3\n";

        assertThat(lines(Drawing.of(run + "mark F-1 0 - 1000\nmark F-1 1 1102\nmark F-1 2 1204")))
                .isEmpty();
        assertThat(lines(Drawing.of(run + "mark F-1 0 - 1204\nmark F-1 1 1102\nmark F-1 2 1000")))
                .isEmpty();
        assertThat(lines(Drawing.of(run + "mark F-1 0 - 1000\nmark F-1 1 1102\nmark F-1 2 1000")))
                .containsExactly("error marks-turn sheath_marks.csv F-1");
        assertThat(check(Drawing.of(run + "mark F-1 0 - 1000\nmark F-1 1 1335\nmark F-1 2 1670")))
                .hasSize(2)
                .allSatisfy(finding -> {
                    assertThat(finding.rule()).isEqualTo("sheath-against-route");
                    assertThat(finding.mend()).contains("feet entered as metres");
                });
    }

    @Test
    void the_bounds_of_sheath_against_route_are_95_and_130_per_cent() {
        String run = "cable F-1 2 : H1 100 H2\nmark F-1 0 - 1000\nmark F-1 1 ";

        assertThat(lines(Drawing.of(run + "1095"))).isEmpty();
        assertThat(lines(Drawing.of(run + "1130"))).isEmpty();
        assertThat(lines(Drawing.of(run + "1094.9")))
                .containsExactly("warning sheath-against-route sheath_marks.csv F-1");
        assertThat(lines(Drawing.of(run + "1130.1")))
                .containsExactly("warning sheath-against-route sheath_marks.csv F-1");
    }

    @Test
    void a_coil_that_the_marks_contradict() {
        String run = "cable F-1 2 : H1 100 H2 +30 100 H3\nmark F-1 1 1100 ";

        assertThat(lines(Drawing.of(run + "1131"))).isEmpty();
        assertThat(lines(Drawing.of(run + "1101"))).containsExactly("warning coil-against-marks cable_runs.csv F-1");
    }

    @Test
    void a_cable_in_service_on_a_span_that_is_abandoned() {
        Snapshot sound = Drawing.of("cable F-1 2 : H1 100 H2");
        Snapshot abandoned = with(sound, records -> {
            Span span = records.spans().list().findFirst().orElseThrow();
            return new Span(
                    span.id(),
                    span.code(),
                    span.from(),
                    span.to(),
                    span.placement(),
                    span.measuredLength(),
                    span.line(),
                    PlantState.ABANDONED,
                    List.of(),
                    null);
        });

        assertThat(lines(sound)).isEmpty();
        assertThat(lines(abandoned)).containsExactly("error cable-on-plant-not-in-service cable_runs.csv F-1");
    }

    @Test
    void codes_that_are_easily_taken_for_each_other() {
        assertThat(lines(Drawing.of("cable C-S11 2 : H1 100 H2\ncable C-S1I 2 : H1 100 H3")))
                .containsExactly("note codes-near-equal cables.csv C-S1I");
    }

    @Test
    void a_circle_of_joints() {
        Snapshot circle = Drawing.of("""
                cable F-1 2 : H1 100 H2
                enclosure E1 H1 : F-1
                enclosure E2 H2 : F-1
                splice E1 : F-1 ahead 1 = F-1 ahead 2
                splice E2 : F-1 back 1 = F-1 back 2
                """);

        assertThat(lines(circle)).containsExactly("error circle-of-joints splices.csv F-1:1");
    }

    @Test
    void a_splitter_that_nothing_feeds() {
        assertThat(lines(Drawing.of("""
                cable D-7 2 : H1 100 H2
                enclosure E1 H1 : D-7
                splitter E1 S1 1x4
                splice E1 : S1 out 1-2 = D-7 ahead 1-2
                """))).containsExactly("warning splitter-not-fed splitters.csv E1/S1");
    }

    @Test
    void tubes_twelve_apart_and_a_ribbon_laid_upside_down() {
        String two = """
                cable F-1 288 : H1 100 H2
                cable F-2 288 : H2 100 H3
                enclosure E2 H2 : F-1 F-2
                splice E2 : F-1 back 1-72 = F-2 ahead 1-72
                """;

        assertThat(lines(Drawing.of(two + "splice E2 : F-1 back 73-84 = F-2 ahead 73-84")))
                .noneMatch(line -> line.contains("tubes") || line.contains("ribbon"));
        assertThat(lines(Drawing.of(two + "splice E2 : F-1 back 73-84 = F-2 ahead 217-228")))
                .contains("warning tubes-twelve-apart splices.csv E2");
        assertThat(lines(Drawing.of(two + "splice E2 : F-1 back 73-84 = F-2 ahead 84-73")))
                .contains("warning ribbon-turned splices.csv E2");
    }

    @Test
    void circuits_that_share_a_front_are_a_slip_unless_a_splitter_or_their_wavelengths_part_them() {
        assertThat(lines(Drawing.of(SOUND + "circuit C-2 E1/P/1 E3/P/1")))
                .containsExactly(
                        "warning circuits-share-front circuits.csv E1/P/1",
                        "warning circuits-share-front circuits.csv E3/P/1");
        assertThat(lines(Drawing.of(SOUND + "circuit C-2 E1/P/1 E3/P/1 nm=1550")))
                .containsExactly(
                        "note circuits-share-front circuits.csv E1/P/1",
                        "note circuits-share-front circuits.csv E3/P/1");
        assertThat(lines(Drawing.of("""
                enclosure E1 H1
                panel E1 P 3
                splitter E1 S1 1x2
                term E1/P/1 = S1 in
                term E1/P/2-3 = S1 out 1-2
                circuit C-1 E1/P/1 E1/P/2
                circuit C-2 E1/P/1 E1/P/3
                """))).isEmpty();
    }

    @Test
    void a_circuit_held_against_its_budget() {
        // 1.5 km x 0.35 + 3 fusion splices x 0.10 + 2 connector pairs x 0.50 = 1.825 dB, 6 m of tray glass apart
        assertThat(lines(Drawing.of(SOUND.replace("E3/P/1\n", "E3/P/1 budget=1.85\n"))))
                .isEmpty();
        assertThat(lines(Drawing.of(SOUND.replace("E3/P/1\n", "E3/P/1 budget=1.8\n"))))
                .containsExactly("warning circuit-over-budget circuits.csv C-1");
        assertThat(lines(Drawing.of(SOUND.replace("E3/P/1\n", "E3/P/1 budget=B+\n"))))
                .containsExactly("warning circuit-below-least-loss circuits.csv C-1");
        assertThat(lines(Drawing.of(SOUND.replace("E3/P/1\n", "E3/P/1 nm=850\n"))))
                .containsExactly("warning circuit-loss-not-known circuits.csv C-1");
    }

    @Test
    void a_circuit_on_a_dead_fiber() {
        assertThat(lines(flagged(Flag.DEAD, null))).containsExactly("error circuit-on-dead-fiber circuits.csv C-1");
    }

    @Test
    void a_circuit_on_joints_of_unknown_trust() {
        String unknown = SOUND.replace(
                "splice E2 : F-1 back 1-2 = D-7 ahead 1-2", "splice E2 : F-1 back 1-2 = D-7 ahead 1-2 trust=unknown");

        assertThat(lines(Drawing.of(unknown))).containsExactly("note circuit-on-unknown-joints circuits.csv C-1");
    }

    @Test
    void what_is_due_is_due_the_day_after_its_last_day() {
        assertThat(lines(flagged(Flag.RESERVED, TODAY))).isEmpty();
        assertThat(lines(flagged(Flag.RESERVED, TODAY.minusDays(1))))
                .containsExactly("warning reservation-lapsed fiber_flags.csv F-1");
        assertThat(lines(temporarySplice(TODAY))).isEmpty();
        assertThat(lines(temporarySplice(TODAY.minusDays(1))))
                .containsExactly("warning temporary-lapsed splices.csv E2");
    }

    @Test
    void a_mechanical_splice_without_a_last_day() {
        String mechanical = SOUND.replace(
                "splice E2 : F-1 back 1-2 = D-7 ahead 1-2", "splice E2 : F-1 back 1-2 = D-7 ahead 1-2 mechanical");

        assertThat(lines(Drawing.of(mechanical))).containsExactly("note mechanical-without-end splices.csv E2");
    }

    @Test
    void a_measurement_one_way_only() {
        String measured = "measured \"F-1 back 1 @ E2\" 1550 ab 0.2\n";

        assertThat(lines(Drawing.of(SOUND + measured)))
                .containsExactly("note measured-one-way measurements.csv F-1 back 1 @ E2");
        assertThat(lines(Drawing.of(SOUND + measured + "measured \"F-1 back 1 @ E2\" 1550 ba 0.1")))
                .isEmpty();
    }

    @Test
    void every_finding_says_what_would_mend_it() {
        Snapshot messy = Drawing.of(SOUND.replace("splice E2 : F-1 back 1-2 = D-7 ahead 1-2", "") + "enclosure E9 H9");

        assertThat(check(messy)).isNotEmpty().allSatisfy(finding -> {
            assertThat(finding.text()).endsWith(".");
            assertThat(finding.mend()).endsWith(".");
        });
    }
}
