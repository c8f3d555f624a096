package spanwright.plant;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Random;
import java.util.stream.Collectors;
import java.util.stream.IntStream;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import spanwright.quantity.Length;
import spanwright.quantity.LengthUnit;

class SheathPositionsTest {

    private static final boolean IN = false;
    private static final boolean OUT = true;

    /** Source: records-folder.md section 2, the worked example. */
    @Test
    void the_worked_example_of_the_records_folder() {
        SheathPositions run = run("20 30 10", "1000 1000", m(0, OUT, "5000"), m(1, OUT, "6060"), m(2, IN, "7100"));

        assertThat(text(run)).isEqualTo("0-20 1049.126214-1080 2120-2130");
        assertThat(enclosures(run)).isEqualTo("0 1064.563107 2130");
    }

    @Test
    void without_marks_nominal_lengths_hold() {
        assertThat(text(run("20 30 10", "1000 1000"))).isEqualTo("0-20 1020-1050 2050-2060");
    }

    @Test
    void one_tie_alone_changes_nothing() {
        assertThat(text(run("20 30 10", "1000 1000", m(1, IN, "77777")))).isEqualTo("0-20 1020-1050 2050-2060");
    }

    @Test
    void falling_marks_measure_as_rising_ones() {
        SheathPositions falling = run("20 30 10", "1000 1000", m(0, OUT, "7100"), m(1, OUT, "6040"), m(2, IN, "5000"));

        assertThat(text(falling)).isEqualTo("0-20 1049.126214-1080 2120-2130");
    }

    @Test
    void marks_in_feet_are_exact() {
        // 1 ft = 0.3048 m exactly (international foot, 1959).
        SheathPositions run = run("0 0", "300", ft(0, OUT, "100.1"), ft(1, IN, "1100.2"));

        assertThat(text(run)).isEqualTo("0-0 304.83048-304.83048");
    }

    @Test
    void a_row_without_slack_has_the_slack_between_its_two_marks() {
        SheathPositions run = run("0 0 0", "100 100", m(0, OUT, "0"), m(1, IN, "101"), m(1, OUT, "131"));

        assertThat(text(run)).isEqualTo("0-0 101-131 231-231");
        assertThat(enclosures(run)).isEqualTo("0 116 231");
        assertThat(run.coil(1)).isEqualTo(metres("30"));
    }

    @Test
    void between_equal_marks_lies_no_sheath() {
        SheathPositions run = run("0 10 0", "100 100", m(0, OUT, "500"), m(1, IN, "600"), m(1, OUT, "600"));

        assertThat(text(run)).isEqualTo("0-0 100-100 200-200");
    }

    @Test
    void a_mark_in_on_row_0_is_the_start_and_a_mark_out_on_the_last_row_the_end() {
        SheathPositions run = run("20 0 30", "100 100", m(0, IN, "1000"), m(2, OUT, "1500"));

        // 500 m of sheath over 250 m of nominal: everything doubles.
        assertThat(text(run)).isEqualTo("0-40 240-240 440-500");
        assertThat(enclosures(run)).isEqualTo("0 240 500");
    }

    @Test
    void before_the_first_and_after_the_last_mark_nominal_lengths_hold() {
        SheathPositions run = run("5 0 0 7", "100 100 100", m(1, OUT, "200"), m(2, IN, "320"));

        assertThat(text(run)).isEqualTo("0-5 105-105 225-225 325-332");
    }

    @Test
    void marks_that_turn_still_give_lengths() {
        SheathPositions run = run("0 0 0", "100 100", m(0, OUT, "1000"), m(1, IN, "1110"), m(2, IN, "1005"));

        assertThat(text(run)).isEqualTo("0-0 110-110 215-215");
    }

    @Test
    void spans_of_no_length_share_marks_evenly() {
        SheathPositions run = run("0 0 0", "0 0", m(0, OUT, "0"), m(2, IN, "9"));

        assertThat(text(run)).isEqualTo("0-0 4.5-4.5 9-9");
    }

    @Test
    void of_two_marks_at_one_place_the_later_counts() {
        SheathPositions run = run("0 0", "100", m(0, OUT, "0"), m(1, IN, "90"), m(1, IN, "110"));

        assertThat(text(run)).isEqualTo("0-0 110-110");
    }

    @Test
    void shared_lengths_add_up_to_the_micrometre() {
        SheathPositions run = run("0 0 0 0", "1 1 1", m(0, OUT, "0"), m(3, IN, "1"));

        assertThat(text(run)).isEqualTo("0-0 0.333333-0.333333 0.666667-0.666667 1-1");
    }

    @Test
    void a_run_needs_a_span_between_rows() {
        assertThatThrownBy(() -> run("1 2", "3 4")).isInstanceOf(IllegalArgumentException.class);
        assertThatThrownBy(() -> SheathPositions.of(List.of(), List.of(), List.of()))
                .isInstanceOf(IllegalArgumentException.class);
    }

    @Test
    void a_position_lies_in_a_coil_or_on_a_span() {
        SheathPositions run = run("20 30 10", "1000 1000");

        assertThat(place(run, "0")).isEqualTo("row 0: 0 + 20");
        assertThat(place(run, "20")).isEqualTo("row 0: 20 + 0");
        assertThat(place(run, "20.000001")).isEqualTo("span to 1: 0.000001 + 999.999999");
        assertThat(place(run, "270")).isEqualTo("span to 1: 250 + 750");
        assertThat(run.place(metres("270")).fraction()).isEqualTo(0.25);
        assertThat(place(run, "1020")).isEqualTo("row 1: 0 + 30");
        assertThat(place(run, "1050")).isEqualTo("row 1: 30 + 0");
        assertThat(place(run, "2060")).isEqualTo("row 2: 10 + 0");
        assertThat(run("0 0", "10").place(metres("10")).fraction()).isZero();
        assertThatThrownBy(() -> run.place(metres("-0.1"))).isInstanceOf(IllegalArgumentException.class);
        assertThatThrownBy(() -> run.place(metres("2060.1"))).isInstanceOf(IllegalArgumentException.class);
    }

    @Test
    void the_print_is_read_at_any_position_and_found_again() {
        SheathPositions run = run("20 30 10", "1000 1000", m(0, OUT, "7100"), m(1, OUT, "6040"), m(2, IN, "5000"));

        assertThat(mark(run, "0")).isEqualTo("7120.000 m");
        assertThat(mark(run, "20")).isEqualTo("7100.000 m");
        assertThat(mark(run, "1080")).isEqualTo("6040.000 m");
        assertThat(mark(run, "1100")).isEqualTo("6020.000 m");
        assertThat(mark(run, "2130")).isEqualTo("4990.000 m");
        for (String position : List.of("0", "20", "500.5", "1080", "1100", "2130")) {
            Length mark = run.findMark(metres(position)).orElseThrow().along();
            assertThat(run.findPosition(mark)).contains(metres(position));
        }
        assertThat(run.findPosition(metres("7121"))).isEmpty();
        assertThat(run.findPosition(metres("4989"))).isEmpty();
    }

    @Test
    void one_tie_says_nothing_about_the_print() {
        SheathPositions run = run("0 0", "100", m(0, OUT, "0"));

        assertThat(run.findMark(metres("50"))).isEmpty();
        assertThat(run.findPosition(metres("50"))).isEmpty();
    }

    @Test
    void print_that_stands_still_goes_on_as_it_goes_elsewhere() {
        SheathPositions run = run("0 10 0", "100 100", m(0, OUT, "600"), m(1, IN, "500"), m(1, OUT, "500"));
        assertThat(mark(run, "150")).isEqualTo("450.000 m");

        SheathPositions still = run("0 10 0", "100 100", m(1, IN, "500"), m(1, OUT, "500"));
        assertThat(mark(still, "150")).isEqualTo("550.000 m");
    }

    @Test
    void a_length_rests_on_marks_only_where_marks_stand_on_both_sides() {
        SheathPositions run = run("5 0 0 7", "100 100 100", m(1, OUT, "200"), m(2, IN, "320"));

        assertThat(run.basis(metres("105"), metres("225"))).isEqualTo(LengthBasis.MARKS);
        assertThat(run.basis(metres("104"), metres("225"))).isEqualTo(LengthBasis.NOMINAL);
        assertThat(run.basis(metres("105"), metres("226"))).isEqualTo(LengthBasis.NOMINAL);
        assertThat(run("0 0", "9", m(0, IN, "0")).basis(metres("0"), metres("0")))
                .isEqualTo(LengthBasis.NOMINAL);
        assertThat(run.findTieBefore(metres("104"))).isEmpty();
        assertThat(run.findTieBefore(metres("230")).orElseThrow().row()).isEqualTo(2);
        assertThat(run.findTieAfter(metres("104")).orElseThrow().row()).isEqualTo(1);
        assertThat(run.findTieAfter(metres("226"))).isEmpty();
        assertThat(run.ties()).hasSize(2);
    }

    /**
     * Source: users.md 3.4, worked by script: descending feet, 24,220 leaving one closure and 17,387 coming to the
     * next; a coil with 20,020 in and 19,920 out; the next handhole in at 19,410; a reading 4,436 ft past the first
     * closure is at mark 19,784, 136 ft past the coil and 26.7 % of the way on.
     */
    @Test
    void the_worked_reading_of_a_feeder_with_descending_feet() {
        SheathPositions run = run(
                "0 30 0 0",
                "1270 153.3 600",
                ft(0, OUT, "24220"),
                ft(1, IN, "20020"),
                ft(1, OUT, "19920"),
                ft(2, IN, "19410"),
                ft(3, IN, "17387"));

        assertThat(run.length().metres()).isCloseTo(2082.7, within(0.05));
        // (1,374 - 1.5) m of glass at a ratio of 1.0150.
        Length reading = Length.ofMetres((1374 - 1.5) / 1.0150);
        assertThat(reading.in(LengthUnit.FOOT)).isCloseTo(4436, within(0.5));
        assertThat(run.findMark(reading).orElseThrow().number().doubleValue()).isCloseTo(19784, within(0.5));
        SheathPlace place = run.place(reading);
        assertThat(place.onSpan()).isTrue();
        assertThat(place.row()).isEqualTo(2);
        assertThat(place.before().in(LengthUnit.FOOT)).isCloseTo(136, within(0.5));
        assertThat(place.before().plus(place.after()).in(LengthUnit.FOOT)).isCloseTo(510, within(0.001));
        assertThat(place.fraction()).isCloseTo(0.267, within(0.0005));
        assertThat(run.coil(1).in(LengthUnit.FOOT)).isCloseTo(100, within(1e-9));
    }

    private static org.assertj.core.data.Offset<Double> within(double metres) {
        return org.assertj.core.data.Offset.offset(metres);
    }

    static Stream<Long> seeds() {
        return IntStream.range(0, 300).mapToObj(seed -> 7_000L + seed);
    }

    /** The slow twin reckons each position by itself, in exact fractions of metres, from the sentences of section 2. */
    @ParameterizedTest(name = "seed {0}")
    @MethodSource("seeds")
    void random_runs_agree_with_the_slow_twin(long seed) {
        Random random = new Random(seed);
        int rows = 2 + random.nextInt(8);
        List<Length> slack = new ArrayList<>();
        List<Length> spans = new ArrayList<>();
        List<SheathTie> ties = new ArrayList<>();
        BigDecimal mark = BigDecimal.valueOf(random.nextInt(100_000), 1);
        int way = random.nextBoolean() ? 1 : -1;
        LengthUnit unit = random.nextBoolean() ? LengthUnit.FOOT : LengthUnit.METRE;
        for (int row = 0; row < rows; row++) {
            slack.add(random.nextInt(3) == 0 ? new Length(random.nextInt(40_000_000)) : Length.ZERO);
            if (row > 0) {
                spans.add(new Length(1 + random.nextInt(900_000_000)));
            }
            for (boolean out : new boolean[] {IN, OUT}) {
                mark = mark.add(BigDecimal.valueOf((long) way * random.nextInt(20_000), 1));
                if (random.nextInt(3) == 0) {
                    ties.add(new SheathTie(row, out, mark, unit, null));
                }
            }
        }
        List<BigDecimal> expected = SheathTwin.positions(slack, spans, ties);
        Collections.shuffle(ties, random);

        SheathPositions run = SheathPositions.of(slack, spans, ties);

        for (int row = 0; row < rows; row++) {
            assertThat(run.in(row).exactMetres()).isEqualByComparingTo(expected.get(2 * row));
            assertThat(run.out(row).exactMetres()).isEqualByComparingTo(expected.get(2 * row + 1));
            assertThat(run.enclosure(row)).isBetween(run.in(row), run.out(row));
        }
        everyPlaceAddsUp(run, random);
    }

    private static void everyPlaceAddsUp(SheathPositions run, Random random) {
        for (int probe = 0; probe < 20; probe++) {
            Length position =
                    new Length((long) (random.nextDouble() * run.length().micrometres()));
            SheathPlace place = run.place(position);
            Length begins = place.onSpan() ? run.out(place.row() - 1) : run.in(place.row());
            Length ends = place.onSpan() ? run.in(place.row()) : run.out(place.row());
            assertThat(begins.plus(place.before())).isEqualTo(position);
            assertThat(position.plus(place.after())).isEqualTo(ends);
        }
    }

    private static SheathPositions run(String slack, String spans, SheathTie... ties) {
        return SheathPositions.of(lengths(slack), lengths(spans), List.of(ties));
    }

    private static SheathTie m(int row, boolean out, String number) {
        return new SheathTie(row, out, new BigDecimal(number), LengthUnit.METRE, null);
    }

    private static SheathTie ft(int row, boolean out, String number) {
        return new SheathTie(row, out, new BigDecimal(number), LengthUnit.FOOT, null);
    }

    private static List<Length> lengths(String metres) {
        return Stream.of(metres.split(" ")).map(SheathPositionsTest::metres).toList();
    }

    private static Length metres(String metres) {
        return Length.ofMetres(new BigDecimal(metres));
    }

    private static String text(SheathPositions run) {
        return IntStream.range(0, run.rows())
                .mapToObj(row -> plain(run.in(row)) + "-" + plain(run.out(row)))
                .collect(Collectors.joining(" "));
    }

    private static String enclosures(SheathPositions run) {
        return IntStream.range(0, run.rows())
                .mapToObj(row -> plain(run.enclosure(row)))
                .collect(Collectors.joining(" "));
    }

    private static String plain(Length length) {
        return length.exactMetres().toPlainString();
    }

    private static String place(SheathPositions run, String position) {
        SheathPlace place = run.place(metres(position));
        String where = place.onSpan() ? "span to " + place.row() : "row " + place.row();
        return where + ": " + plain(place.before()) + " + " + plain(place.after());
    }

    private static String mark(SheathPositions run, String position) {
        PrintedMark mark = run.findMark(metres(position)).orElseThrow();
        return mark.number().toPlainString() + " " + mark.unit().symbol();
    }
}
