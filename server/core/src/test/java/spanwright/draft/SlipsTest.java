package spanwright.draft;

import static org.assertj.core.api.Assertions.assertThat;

import java.time.Clock;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import spanwright.journal.Change;
import spanwright.network.Snapshot;
import spanwright.plant.FiberRange;
import spanwright.plants.Drawing;
import spanwright.sheet.SheetHeader;
import spanwright.splicing.FiberCount;

/**
 * The errors that really happen when sheets are entered (common practice), each on the smallest plant that shows it, and
 * what is said of it. The numbers are those of the list in {@code docs/RECORDS-DESK.md}.
 */
class SlipsTest {

    /** E2: F-1 passes in the middle; D-7 and L-3 begin. E9 is a tag away. Marks of F-1 fall, in feet. */
    private static final String PLANT = """
            cable F-1 432 tube=12 : H1 1000 H2 +30 1000 H3
            cable D-7 432 tube=12 : H2 500 H4
            cable L-3 24 tube=6 : H2 200 H5
            mark F-1 0 - 10000 ft
            mark F-1 2 3303 - ft
            enclosure E1 H1 tray=1 : F-1
            enclosure E2 H2 tray=1 : F-1/1 D-7 L-3
            enclosure E3 H3 : F-1
            enclosure E4 H4 : D-7
            panel E1 P 12
            panel E3 P 12
            panel E2 Q 4
            panel E2 R 4
            term E1/P/1-12 = F-1 ahead 1-12
            term E3/P/1-12 = F-1 back 1-12
            circuit C-1 E1/P/1 E3/P/1
            """;

    private static final Snapshot DRAWN = Drawing.of(PLANT);

    private static SheetCheck check(Snapshot plant, String... lines) {
        int enclosure = plant.records().enclosures().find("E2").orElseThrow().id();
        DraftText text = new DraftText(List.of(lines), SheetHeader.NONE, 1, 1, List.of());
        return SheetCheck.of(plant, enclosure, text, List.of());
    }

    private static Slip only(String rule, SheetCheck check) {
        assertThat(check.slips())
                .as(check.slips().toString())
                .filteredOn(slip -> slip.rule().equals(rule))
                .hasSize(1);
        return check.slips().stream()
                .filter(slip -> slip.rule().equals(rule))
                .findFirst()
                .orElseThrow();
    }

    private static void none(String rule, SheetCheck check) {
        assertThat(check.slips()).extracting(Slip::rule).doesNotContain(rule);
    }

    @ParameterizedTest(name = "{0}: {1}")
    @CsvSource(
            delimiter = '|',
            value = {
                "1 | tubes-twelve-apart | WARNING | F-1 back tube RD = D-7 ahead tube RD/BK | 1 | tube 7 RD is the one of the same number",
                "2 | neighbours-crossed | WARNING | F-1 back 13-16 = D-7 ahead 13-16 / F-1 back 17 = D-7 ahead 18 / F-1 back 18 = D-7 ahead 17 / F-1 back 19-24 = D-7 ahead 19-24 | 2 | say that it is meant",
                "2 | neighbours-crossed | WARNING | F-1 back tube 9 = D-7 ahead tube 9 / F-1 back tube VI = D-7 ahead tube RS / F-1 back tube RS = D-7 ahead tube VI | 2 | let 10 go to 10",
                "3 | ribbon-turned | WARNING | F-1 back 13-24 = D-7 ahead 24-13 | 1 | write 13-24",
                "4 | one-off | WARNING | F-1 back 14-24 = D-7 ahead 13-23 | 1 | Was one skipped",
                "4 | sides-unlike | ERROR | F-1 back 13-24 = D-7 ahead 13-23 | 1 | capped or stored",
                "5 | sides-unlike | ERROR | F-1 back tube 2 = L-3 ahead tube 2 | 1 | same count",
                "5 | no-such-color | ERROR | L-3 ahead tube AQ capped | 1 | BL OR GR BR",
                "5 | number-above-count | ERROR | L-3 ahead tube 1 7 capped | 1 | BL OR GR BR SL WH",
                "6 | leg-reversed | ERROR | F-1 ahead to H1 | 1 | F-1 back leads to H1: was the closure turned round?",
                "7 | through-and-cut | ERROR | F-1 13-24 through / F-1 back 20 = D-7 ahead 20 | 2 | goes through or is cut",
                "7 | express-cut | WARNING | F-1 back 1-12 = D-7 ahead 1-12 | 1 | if it is uncut, leave it out",
                "8 | mark-unit | ERROR | F-1 back mark 2048 ft | 1 | In m it would fit",
                "9 | mark-misread | ERROR | F-1 back mark 6179 ft | 1 | 6719 ft would fit",
                "9 | mark-misread | ERROR | F-1 back mark 13281 ft | 1 | Read it again",
                "12 | end-without-state | WARNING | F-1 back 13-18 = L-3 ahead 1-6 | 1 | F-1 ahead 13-18 capped",
                "13 | end-without-state | WARNING | D-7 ahead 1-6 = F-1 back 13-18 | 1 | capped",
                "14 | rear-or-front | ERROR | E2/Q/1 front = D-7 ahead 1 | 1 | Write rear",
                "14 | rear-or-front | ERROR | E2/Q/1 rear = E2/R/1 | 1 | Leave rear out",
                "17 | temporary-without-end | WARNING | F-1 back 13 = D-7 ahead 13; mechanical | 1 | until 2026-04-30; by NAME",
                "18 | verified-without-light | WARNING | F-1 back 13 = D-7 ahead 13; trust verified | 1 | light 2026-03-31",
            })
    void a_slip_is_found_in_its_line_with_what_would_mend_it(
            int row, String rule, Weight weight, String lines, int line, String mend) {
        List<Slip> found = check(DRAWN, lines.split(" / ", -1)).slips().stream()
                .filter(slip -> slip.rule().equals(rule))
                .toList();

        assertThat(found)
                .as(check(DRAWN, lines.split(" / ", -1)).slips().toString())
                .isNotEmpty();
        assertThat(found).allSatisfy(slip -> assertThat(slip.weight()).isEqualTo(weight));
        assertThat(found).anySatisfy(slip -> {
            assertThat(slip.place().line()).isEqualTo(line);
            assertThat(slip.mend()).contains(mend);
        });
    }

    @Test
    void a_right_sheet_has_no_slip_and_shows_what_it_would_make() {
        SheetCheck check = check(
                DRAWN,
                "F-1 back tube 2 = D-7 ahead tube 2; light 2026-03-31",
                "F-1 ahead tube 2 capped",
                "F-1 back to H1 mark 6719 ft");

        assertThat(check.slips())
                .filteredOn(slip -> slip.weight() != Weight.PROMPT)
                .isEmpty();
        assertThat(check.before()).isEmpty();
        assertThat(check.after())
                .containsExactly(
                        "F-1 back 13-24 = D-7 ahead 13-24; trust verified; seen 2026-03-31", "F-1 ahead 13-24 capped");
    }

    @Test
    void a_count_of_another_name_is_said_and_not_inferred() {
        Snapshot plant = counted(97, 120);
        Slip slip = only("number-above-count", check(plant, "L-3 ahead 97-102 capped"));

        assertThat(slip.text()).contains("FDR-N 97-102 are fibers 1-6 of L-3");
        assertThat(slip.mend()).contains("both are shown");
    }

    private static Snapshot counted(int first, int last) {
        var editor = DRAWN.edit();
        int cable = DRAWN.records().cables().find("L-3").orElseThrow().id();
        editor.replay(
                Change.add(new FiberCount(1, cable, new FiberRange(1, 24), "FDR-N", new FiberRange(first, last))));
        return editor.build(2);
    }

    @Test
    void a_joint_taken_apart_is_named_with_its_circuits_and_slack_is_asked_for() {
        Snapshot plant = Drawing.of(PLANT + "splice E2 : F-1 back 1 = F-1 ahead 1\n");
        SheetCheck check = check(plant, "F-1 back 1 = D-7 ahead 1", "F-1 ahead 1 capped");

        Slip apart = only("joint-taken-apart", check);
        assertThat(apart.text()).contains("F-1 back 1 = F-1 ahead 1").contains("C-1");
        assertThat(only("slack-used", check).text()).contains("F-1 30 m");
        none("slack-used", check(plant, "F-1 back 1 = D-7 ahead 1", "F-1 ahead 1 capped", "F-1 slack 20 m"));
        assertThat(check.circuits()).hasSize(1);
        assertThat(check.circuits().get(0).wholeBefore()).isTrue();
        assertThat(check.circuits().get(0).wholeAfter()).isFalse();
        assertThat(check.circuits().get(0).lossBefore()).isNotNull();
        assertThat(check.circuits().get(0).lossAfter()).isNull();
        assertThat(check.touchesPriority()).isFalse();
    }

    @Test
    void a_cable_joined_to_itself_is_asked_whether_a_piece_was_let_in() {
        assertThat(only("repair-section", check(DRAWN, "F-1 back 1 = F-1 ahead 1"))
                        .weight())
                .isEqualTo(Weight.PROMPT);
    }

    @Test
    void a_sheet_posted_before_and_one_that_says_nothing_new_are_asked_about() {
        String line = "F-1 back 13-24 = D-7 ahead 13-24";
        SheetCheck first = check(DRAWN, line);
        MemoryDrafts book = new MemoryDrafts(Clock.systemUTC());
        DraftText text = new DraftText(
                List.of("D-7 ahead tube 2 = F-1 back tube 2"),
                new SheetHeader("0412", null, null, null, null),
                1,
                1,
                List.of());
        book.begin(new DraftStart(2, "R. Vale", 1, text));
        book.change(1, 1, new DraftStep.Submit("R. Vale"));
        book.change(1, 2, new DraftStep.Posted(2, first.fingerprint()));
        SheetCheck again = SheetCheck.of(DRAWN, 2, text, book.list());

        assertThat(only("sheet-twice", again).text()).contains("job 0412").contains("posted as 2");
        Snapshot posted = Drawing.of(PLANT + "splice E2 : " + line + "\n");
        assertThat(only("nothing-new", check(posted, line)).text()).contains("E2");
    }

    @Test
    void an_enclosure_of_a_like_code_with_the_same_cables_is_asked_about() {
        assertThat(only("like-code", check(DRAWN, "F-1 back 13 = F-1 ahead 13")).text())
                .contains("E1")
                .contains("E3");
    }

    @Test
    void what_of_the_job_stays_planned_is_named() {
        Snapshot plant = Drawing.of(PLANT + "splice E2 : F-1 back 13-24 = D-7 ahead 13-24 trust=planned job=J-1\n");
        DraftText text = new DraftText(
                List.of("F-1 back 13-18 = D-7 ahead 13-18"),
                new SheetHeader("J-1", null, null, null, null),
                1,
                1,
                List.of());
        SheetCheck check = SheetCheck.of(plant, 2, text, List.of());

        assertThat(only("all-done", check).text())
                .contains("F-1 back 19-24 = D-7 ahead 19-24")
                .contains("stay planned");
        assertThat(check.after())
                .containsExactly(
                        "F-1 back 13-18 = D-7 ahead 13-18; job J-1",
                        "F-1 back 19-24 = D-7 ahead 19-24; trust planned; job J-1");
    }

    @Test
    void light_is_asked_for_by_range_and_answers_close_what_they_answer() {
        SheetCheck check = check(DRAWN, "F-1 back 13-24 = D-7 ahead 24-13", "F-1 ahead 13-24 capped");
        assertThat(only("light-check", check).text()).contains("F-1 back 13-24");
        DraftText answered = new DraftText(
                List.of("F-1 back 13-24 = D-7 ahead 24-13", "F-1 ahead 13-24 capped"),
                SheetHeader.NONE,
                1,
                1,
                List.of(
                        new Answer("ribbon-turned", "F-1 back 13-24 = D-7 ahead 24-13", "seen on the photo"),
                        new Answer("light-check", "", "no"),
                        new Answer("all-done", "", "yes")));

        assertThat(check.open(answered)).extracting(Slip::rule).isEmpty();
        assertThat(check.open(new DraftText(List.of(), SheetHeader.NONE, 1, 1, answered.answers())))
                .extracting(Slip::rule)
                .containsExactly("ribbon-turned");
    }
}
