package spanwright.loss;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.Locale;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import spanwright.plants.Drawing;
import spanwright.quantity.Loss;
import spanwright.records.Records;
import spanwright.trace.ElementKind;

/** Worked examples with published answers. */
class PublishedLossTest {

    /** Splices in a row between two ports; the glass is one cable a section, the same length each. */
    private static String row(int splices, double metres, double dbPerKm, int nanometres) {
        StringBuilder drawing = new StringBuilder();
        int sections = splices + 1;
        for (int section = 1; section <= sections; section++) {
            drawing.append(String.format(
                    Locale.ROOT, "cable F-%d 1 : H%d %.3f H%d%n", section, section, metres / sections, section + 1));
            drawing.append(String.format(Locale.ROOT, "reel F-%d %d %.4f%n", section, nanometres, dbPerKm));
        }
        for (int at = 1; at <= sections + 1; at++) {
            drawing.append("enclosure E").append(at).append(" H").append(at).append(" :");
            drawing.append(at > 1 ? " F-" + (at - 1) : "")
                    .append(at <= sections ? " F-" + at : "")
                    .append('\n');
        }
        for (int at = 2; at <= sections; at++) {
            drawing.append(String.format(Locale.ROOT, "splice E%d : F-%d back 1 = F-%d ahead 1%n", at, at - 1, at));
        }
        return drawing.toString();
    }

    private static String ends(int sections, boolean pigtails) {
        return String.format(
                Locale.ROOT,
                "panel E1 P 1%npanel E%d P 1%nterm E1/P/1 = F-1 ahead 1 %s%nterm E%d/P/1 = F-%d back 1 %s%n",
                sections + 1,
                pigtails ? "" : "direct",
                sections + 1,
                sections,
                pigtails ? "" : "direct");
    }

    private static double expected(String drawing, int nanometres) {
        return LossText.loss(Drawing.of(drawing), "E1/P/1", nanometres)
                .expected()
                .decibels();
    }

    /** W1, a test-equipment maker's training page: 0.5 km x 0.5 + 2 x 0.75 + 2 x 0.3 = 2.35 dB; 1.95 measured passes. */
    @Test
    void a_short_link_with_two_connections_and_two_splices() {
        String drawing =
                row(0, 500, 0.5, 1310) + ends(1, true) + "planning connector 0.75\nplanning splice.fusion 0.3\n";

        double budget = expected(drawing, 1310);

        assertThat(budget).isCloseTo(2.35, within(1e-9));
        Loss measured = Loss.ofDecibels(-10.30 + 12.25);
        BudgetCheck check = new BudgetCheck(Budget.of(Loss.ofDecibels(budget)), Loss.ZERO, measured, measured);
        assertThat(check.passes()).isTrue();
        assertThat(check.left().decibels()).isCloseTo(0.40, within(1e-9));
    }

    /** W2, a teaching page: 10 km x 0.35 + 1 x 0.01 + 2 x 0.5 and 3 dB of margin make 7.51 dB. */
    @Test
    void a_link_with_a_margin() {
        String drawing = row(1, 10_000, 0.35, 1310) + ends(2, false) + "planning splice.fusion 0.01\n";
        PathLoss loss = LossText.loss(Drawing.of(drawing), "E1/P/1", 1310);

        BudgetCheck check = BudgetCheck.of(loss, Budget.find("7.51").orElseThrow(), Loss.ofDecibels(3));

        assertThat(check.left().decibels()).isCloseTo(0, within(1e-9));
        assertThat(check.passes()).isTrue();
        assertThat(BudgetCheck.of(loss, Budget.find("7.509999").orElseThrow(), Loss.ofDecibels(3))
                        .passes())
                .isFalse();
    }

    /** W3, a router's hardware guide: 13 dB of power, 8 km x 0.5 + 7 x 0.5 = 7.5 dB lost, 5.5 dB left. */
    @Test
    void a_power_budget_with_what_is_left() {
        String drawing = row(5, 8_000, 0.5, 1310) + ends(6, false) + "planning splice.fusion 0.5\n";
        PathLoss loss = LossText.loss(Drawing.of(drawing), "E1/P/1", 1310);

        assertThat(loss.expected().decibels()).isCloseTo(7.5, within(1e-5));
        assertThat(BudgetCheck.of(loss, Budget.find("13").orElseThrow(), Loss.ZERO)
                        .left()
                        .decibels())
                .isCloseTo(5.5, within(1e-5));
    }

    /** W14, Senior, Optical Fiber Communications, example 3.1 (from memory): 2 dB/km over 10 km, 9 splices of 1 dB. */
    @Test
    void ten_sections_have_nine_splices() {
        String drawing = row(9, 10_000, 2, 1310) + ends(10, false) + "planning splice.fusion 1\nplanning connector 0\n";

        double loss = expected(drawing, 1310);

        assertThat(loss).isCloseTo(29, within(1e-6));
        assertThat(Math.pow(10, loss / 10)).isCloseTo(794.33, within(0.01));
        // 120 microwatts in, 3 out over 8 km.
        assertThat(10 * Math.log10(120.0 / 3)).isCloseTo(16.02, within(0.005));
        assertThat(10 * Math.log10(120.0 / 3) / 8).isCloseTo(2.0, within(0.005));
    }

    /** The Fiber Optic Association's loss budget page: 24 km, 6 splices at 0.15, 2 connections at 0.5. */
    @ParameterizedTest
    @CsvSource({"1310, 0.4, 11.5", "1550, 0.2, 6.7"})
    void the_loss_budget_page_of_the_FOA(int nanometres, double dbPerKm, double total) {
        String drawing = row(6, 24_000, dbPerKm, nanometres) + ends(7, false) + "planning splice.fusion 0.15\n";

        assertThat(expected(drawing, nanometres)).isCloseTo(total, within(1e-5));
    }

    /**
     * Reckoned from published parts (PLC data sheet maximum 17.2 dB): 18 km behind a splitter of 32, 8 splices at 0.1, 4
     * connections at 0.5. It passes B+ and N1 everywhere and fails B at 1310 nm only.
     */
    @ParameterizedTest
    @CsvSource({"1310, 0.35, 26.30, false", "1490, 0.24, 24.32, true", "1550, 0.22, 23.96, true"})
    void eighteen_kilometres_behind_a_splitter_of_32(int nanometres, double dbPerKm, double total, boolean passesB) {
        String drawing = row(7, 18_000, dbPerKm, nanometres) + """
                cable D-1 1 : H9 0.001 H10
                enclosure E9D H9 : D-1
                enclosure E10 H10 : D-1
                panel E1 P 1
                panel E9 P 1
                panel E9D P 1
                panel E10 P 1
                splitter E9 S1 1x32 17.2
                term E1/P/1 = F-1 ahead 1
                splice E9 : F-8 back 1 = S1 in loss=0
                term E9/P/1 = S1 out 1 direct
                jumper E9/P/1 = E9D/P/1 0.001
                term E9D/P/1 = D-1 ahead 1 direct
                term E10/P/1 = D-1 back 1 direct
                """;
        PathLoss loss = LossText.loss(Drawing.of(drawing), "E1/P/1", nanometres);

        assertThat(loss.path().count(ElementKind.CONNECTOR)).isEqualTo(4);
        assertThat(loss.expected().decibels()).isCloseTo(total, within(1e-5));
        for (String code : new String[] {"B+", "N1", "B"}) {
            BudgetCheck check = BudgetCheck.of(loss, Budget.find(code).orElseThrow(), Loss.ZERO);
            assertThat(check.passes()).as(code).isEqualTo(!code.equals("B") || passesB);
            assertThat(check.overload()).isFalse();
        }
    }

    /** Reckoned: ten splices of mean 0.05 and deviation 0.03 dB: 0.5 + 3 x 0.03 x root 10 = 0.7846 dB; worst case 1.0 dB. */
    @Test
    void ten_splices_are_better_than_ten_times_the_worst() {
        String drawing = row(10, 0.011, 0, 1310) + ends(11, false)
                + "planning splice.fusion 0.05 0.1 0.03\nplanning connector 0\n";
        PathLoss loss = LossText.loss(Drawing.of(drawing), "E1/P/1", 1310);

        assertThat(loss.expected().decibels()).isCloseTo(0.5, within(1e-9));
        assertThat(loss.statistical().decibels()).isCloseTo(0.7846, within(0.00005));
        assertThat(loss.limit().decibels()).isCloseTo(1.0, within(0.00001));
    }

    @Test
    void the_statistical_sum_is_at_most_the_limit() {
        String drawing = row(1, 0.011, 0, 1310) + ends(2, false)
                + "planning splice.fusion 0.05 0.1 0.03\nplanning connector 0\n";
        PathLoss loss = LossText.loss(Drawing.of(drawing), "E1/P/1", 1310);

        assertThat(loss.statistical()).isEqualTo(loss.limit());
    }

    /** Common practice of the trade: about 50 km without an amplifier, a splice every 4 to 6 km, within 28 dB. */
    @ParameterizedTest
    @CsvSource({"7", "9", "12"})
    void fifty_kilometres_run_without_an_amplifier(int splices) {
        StringBuilder drawing = new StringBuilder();
        row(splices, 50_000, 0, 1310)
                .lines()
                .filter(line -> !line.startsWith("reel"))
                .forEach(line -> drawing.append(line).append('\n'));
        PathLoss loss = LossText.loss(Drawing.of(drawing + ends(splices + 1, true)), "E1/P/1", 1550);

        assertThat(BudgetCheck.of(loss, Budget.find("28").orElseThrow(), Loss.ZERO)
                        .passes())
                .isTrue();
        assertThat(loss.expected().decibels()).isBetween(11.0, 14.0);
    }

    /** Invariant: in cascade 1:4 and 1:8 share light as 1:32 does, 15.05 dB at best, but lose more; no value beats 10 log10 N. */
    @Test
    void a_cascade_of_splitters_loses_more_than_one() {
        PlanningLosses planning = new PlanningLosses(Records.empty());
        for (int outputs : new int[] {2, 4, 8, 16, 32, 64, 128}) {
            PlanningLoss value = planning.find("splitter." + outputs).orElseThrow();
            assertThat(value.expected().decibels()).isGreaterThan(10 * Math.log10(outputs));
            // ITU-T G.671, from memory: 0.8 + 3.4 log2 N.
            assertThat(value.limit().decibels()).isCloseTo(0.8 + 3.4 * Math.log(outputs) / Math.log(2), within(1e-9));
        }
        assertThat(planning.find("splitter.4").orElseThrow().expected().decibels()
                        + planning.find("splitter.8").orElseThrow().expected().decibels())
                .isGreaterThan(
                        planning.find("splitter.32").orElseThrow().expected().decibels());
        assertThat(PlanningLosses.listBuiltIn()).hasSize(10);
        assertThat(planning.find("splitter.12")).isEmpty();
    }
}
