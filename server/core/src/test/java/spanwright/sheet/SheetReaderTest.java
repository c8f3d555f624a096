package spanwright.sheet;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import spanwright.network.Snapshot;
import spanwright.plants.Drawing;
import spanwright.records.EndNames;

class SheetReaderTest {

    /** E2 is in the middle of F-1; D-7 and L-3 begin there. */
    private static final String PLANT = """
            cable F-1 36 tube=12 : H1 1000 H2 1000 H3
            cable D-7 24 tube=12 : H2 500 H4
            cable L-3 12 tube=6 : H2 200 H5
            enclosure E2 H2 : F-1/1 D-7 L-3
            enclosure E3 H3 : F-1
            splitter E2 S1 1x8
            panel E2 P 12
            panel E2 Q 4
            """;

    private static final Snapshot DRAWN = Drawing.of(PLANT);
    private static final EndNames NAMES = new EndNames(DRAWN.records());

    private static SheetRead read(String... lines) {
        int enclosure = DRAWN.records().enclosures().find("E2").orElseThrow().id();
        return SheetReader.read(DRAWN.records(), enclosure, List.of(lines));
    }

    private static String text(Statement statement) {
        if (statement instanceof Statement.Joins joins) {
            return NAMES.ends(joins.a()) + " = " + NAMES.ends(joins.b());
        }
        if (statement instanceof Statement.States states) {
            return NAMES.ends(states.range()) + " " + states.condition().word();
        }
        return statement.toString();
    }

    private static List<String> understood(String... lines) {
        SheetRead read = read(lines);
        assertThat(read.mistakes()).isEmpty();
        return read.statements().stream().map(SheetReaderTest::text).toList();
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '>',
            value = {
                "F-1 back 1-12 = D-7 ahead 1-12 > F-1 back 1-12 = D-7 ahead 1-12",
                "F-1 back 1-12 = D-7 ahead 12-1 > F-1 back 1-12 = D-7 ahead 12-1",
                "F-1 back tube 2 = D-7 ahead tube OR > F-1 back 13-24 = D-7 ahead 13-24",
                "F-1 back tubes 1-2 = D-7 ahead tubes BL-OR > F-1 back 1-24 = D-7 ahead 1-24",
                "F-1 back tube gr SL = S1 in > F-1 back 29 = S1 in",
                "F-1 back tube GR 12-7 = L-3 ahead tube green 6-1 > nothing",
                "F-1 back tube 3 12-7 = L-3 ahead tube or 6-1 > F-1 back 36-31 = L-3 ahead 12-7",
                "S1 out 1-4 = D-7 ahead 1-4; loss 0.05; tray 2 > S1 out 1-4 = D-7 ahead 1-4",
                "D-7 ahead 1-4 = E2/P/1-4 > E2/P/1-4 = D-7 ahead 1-4",
                "E2/P/1 = E2/Q/1; jumper 2 m > E2/P/1 = E2/Q/1",
                "F-1 back 7 capped > F-1 back 7 capped",
                "S1 out 8 stored # the last one > S1 out 8 stored",
            })
    void a_line_says(String line, String said) {
        SheetRead read = read(line.strip());
        if (said.equals("nothing")) {
            assertThat(read.statements()).isEmpty();
            assertThat(read.mistakes()).hasSize(1);
        } else {
            assertThat(understood(line.strip())).containsExactly(said);
        }
    }

    @Test
    void a_fiber_goes_through_on_both_sides() {
        assertThat(understood("F-1 4-6 through")).containsExactly("F-1 back 4-6 through", "F-1 ahead 4-6 through");
    }

    @Test
    void the_rest_is_what_no_other_line_names() {
        assertThat(understood("F-1 back 1-2 = L-3 ahead 1-2", "F-1 rest through", "L-3 ahead rest capped"))
                .containsExactly(
                        "F-1 back 1-2 = L-3 ahead 1-2",
                        "F-1 back 3-12 through",
                        "F-1 ahead 3-12 through",
                        "L-3 ahead 3-12 capped")
                .doesNotContain("F-1 ahead 1-2 through");
    }

    @Test
    void the_rest_straight_joins_number_to_number() {
        assertThat(understood(
                        "D-7 ahead 5 = L-3 ahead 1",
                        "F-1 back 5 capped",
                        "F-1 back 25-36 stored",
                        "F-1 back rest = D-7 ahead rest"))
                .contains("F-1 back 1-4 = D-7 ahead 1-4", "F-1 back 6-24 = D-7 ahead 6-24");
        assertThat(read("F-1 back rest = D-7 ahead rest").mistakes())
                .extracting(Mistake::code)
                .containsExactly("rest-unlike");
        assertThat(read("rest straight").mistakes()).extracting(Mistake::code).containsExactly("which-legs");
    }

    @Test
    void the_rest_straight_needs_no_names_between_two_legs() {
        Snapshot plant = Drawing.of("""
                cable F-1 4 : H1 1000 H2
                cable F-2 4 : H2 1000 H3
                enclosure E2 H2 : F-1 F-2
                """);
        SheetRead read = SheetReader.read(plant.records(), 1, List.of("rest straight", "F-1 back 4 = F-2 ahead 4"));
        assertThat(read.mistakes()).isEmpty();
        assertThat(read.statements()).hasSize(2);
    }

    @Test
    void lines_of_cables_say_direction_mark_and_coil() {
        SheetRead read = read("F-1 ahead to H3 mark 17387 ft", "F-1 slack 12.5 m", "F-1 back mark 20 m");
        assertThat(read.mistakes()).isEmpty();
        assertThat(read.statements()).hasSize(3);
        assertThat(((Statement.LegSeen) read.statements().get(0)).toward()).isEqualTo("H3");
        assertThat(((Statement.Coiled) read.statements().get(1)).left().metres())
                .isEqualTo(12.5);
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            quoteCharacter = '$',
            value = {
                "F-9 ahead 1 = D-7 ahead 1 | no-such-leg | 1 | F-1 back, toward H1",
                "F-1 1-4 = D-7 ahead 1-4 | direction-missing | 5 | F-1 ahead, toward H3",
                "D-7 back 1 = F-1 back 1 | no-such-leg | 5 | D-7 ahead, toward H4",
                "F-1 back 1-12 = D-7 ahead 1-11 | sides-unlike | 17 | capped or stored",
                "F-1 back 37 = D-7 ahead 1 | number-above-count | 10 | fibers that the cable has",
                "F-1 back tube 4 = D-7 ahead tube 1 | number-above-count | 15 | BL OR GR",
                "F-1 back tube VI = D-7 ahead tube 1 | no-such-color | 15 | 1 to 3: BL OR GR",
                "F-1 back tube 1 = L-3 ahead tube 1 | sides-unlike | 19 | same count",
                "L-3 ahead tube 1 RD capped | no-such-color | 18 | BL OR GR BR SL WH",
                "F-1 back 0 capped | bad-number | 10 | 1-12",
                "F-1 back 12-Jan capped | bad-number | 10 | 1-12",
                "F-1 back 1-12=D-7 ahead 1-12 | nothing-said | 10 | = with a space on both sides",
                "F-1 back 1-12 | nothing-said | 10 | capped, stored",
                "F-1 back 1 = | side-missing | 13 | F-1 ahead 1-12",
                "F-1 back capped | fibers-missing | 9 | F-1 back 1-12",
                "E2/P/1 front = D-7 ahead 1 | rear-or-front | 1 | rear",
                "E2/P/1 rear = E2/Q/1 | rear-or-front | 1 | jumper",
                "E2/X/1 = D-7 ahead 1 | no-such-panel | 1 | panel of E2",
                "E2/P/13 = D-7 ahead 1 | number-above-count | 6 | ports that it has",
                "F-1 back 1 = D-7 ahead 1; tray | value-missing | 27 | Write it",
                "F-1 back 1 = D-7 ahead 1; until 31.3.2026 | bad-date | 33 | 2026-03-31",
                "F-1 back 1 = D-7 ahead 1; glued | unknown-word | 27 | mechanical",
                "F-1 back 1 = D-7 ahead 1; loss -3 | loss-out-of-range | 32 | -0.1 dB or above",
                "F-1 back 1 = D-7 ahead 1; direct | word-not-here | 1 | Leave it out",
                "D-7 1-4 through | not-through | 1 | capped or stored",
                "S1 out 9 stored | number-above-count | 8 | what it has",
            })
    void a_line_that_cannot_be_read_says_where_and_what_would_be_right(
            String line, String code, int column, String mend) {
        SheetRead read = read("", line);

        assertThat(read.statements()).isEmpty();
        assertThat(read.mistakes()).hasSize(1);
        Mistake mistake = read.mistakes().get(0);
        assertThat(mistake.code()).as(mistake.toString()).isEqualTo(code);
        assertThat(mistake.place().line()).isEqualTo(2);
        assertThat(mistake.place().column()).as(mistake.toString()).isEqualTo(column);
        assertThat(mistake.mend()).contains(mend);
    }

    @Test
    void an_end_stands_once_in_a_sheet() {
        SheetRead read = read("F-1 back 1-4 = D-7 ahead 1-4", "F-1 back 4 = L-3 ahead 1", "D-7 ahead 5 = D-7 ahead 5");

        assertThat(read.mistakes()).extracting(Mistake::code).containsExactly("end-joined-twice", "end-joined-twice");
        assertThat(read.mistakes().get(0).text()).isEqualTo("F-1 back 4 is named in line 1 already.");
        assertThat(read.statements()).hasSize(1);
    }

    @Test
    void the_letters_beyond_twelve_name_the_tracer() {
        Snapshot plant = Drawing.of("""
                cable F-1 432 tube=12 : H1 1000 H2
                cable F-2 432 tube=12 : H2 1000 H3
                enclosure E2 H2 : F-1 F-2
                """);
        SheetRead read = SheetReader.read(
                plant.records(),
                1,
                List.of("F-1 back tube RD/BK = F-2 ahead tube 19", "F-1 back tube BL/2BK BK = F-2 ahead tube 25 8"));
        EndNames names = new EndNames(plant.records());
        assertThat(read.mistakes()).isEmpty();
        assertThat(read.statements().get(0).ends().stream().map(names::ends))
                .containsExactly("F-1 back 217-228", "F-2 ahead 217-228");
        assertThat(read.statements().get(1).ends().stream().map(names::ends))
                .containsExactly("F-1 back 296", "F-2 ahead 296");
    }
}
