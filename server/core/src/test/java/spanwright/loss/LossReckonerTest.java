package spanwright.loss;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.math.BigDecimal;
import java.util.List;
import org.junit.jupiter.api.Test;
import spanwright.network.Snapshot;
import spanwright.plants.Drawing;
import spanwright.quantity.Wavelength;
import spanwright.records.Records;
import spanwright.trace.Path;

class LossReckonerTest {

    private static final String ONE_OF_EACH = """
            cable F-1 2 over=1 : H1 1000 H2
            cable D-1 2 : H2 500 H3
            enclosure E1 H1 : F-1
            enclosure E2 H2 : F-1 D-1
            enclosure E3 H3 : D-1
            panel E1 P 1
            panel E3 P 1
            panel E3 Q 1
            splitter E2 S1 1x32
            term E1/P/1 = F-1 ahead 1
            splice E2 : F-1 back 1 = S1 in
            splice E2 : S1 out 1 = D-1 ahead 1 mechanical
            term E3/P/1 = D-1 back 1 direct
            jumper E3/P/1 = E3/Q/1 3
            """;

    /** Source of every value: records-folder.md section 3. */
    @Test
    void each_element_has_its_planning_value_or_its_table() {
        assertThat(LossText.of(LossText.loss(Drawing.of(ONE_OF_EACH), "E1/P/1", 1550)))
                .isEqualTo("connector 0.5/0.75 planning | splice 0.1/0.3 planning | fiber 0.2222/0.303 type"
                        + " | splice 0.1/0.3 planning | splitter 16.9/17.8 planning | splice 0.2/0.3 planning"
                        + " | fiber 0.11/0.15 type | connector 0.5/0.75 planning | jumper 0.00066/0.0009 type"
                        + " | connector 0.5/0.75 planning = 19.13286/21.4039 (19.994544)");
    }

    @Test
    void every_loss_says_its_source() {
        PathLoss loss = LossText.loss(Drawing.of(ONE_OF_EACH), "E1/P/1", 1550);

        assertThat(loss.elements().stream().map(ElementLoss::source).distinct())
                .containsExactly(
                        "Planning value connector: FOA loss budget page; limit: TIA-568.3-D maximum, as stated by a"
                                + " secondary page; spread from memory",
                        "Planning value splice.fusion: ITU-T L.400 mean, as stated by a secondary page; limit: TIA-568.3-D"
                                + " maximum, as stated by a secondary page; spread from memory",
                        "Fiber type G.652.D at 1550 nm: typical cabled-fiber data sheets and FOA figures; limit: Fiber type"
                                + " G.652.D at 1550 nm: ITU-T G.652 (2016) Table 2 and Appendix I, from memory",
                        "Planning value splitter.32: planar splitters, from memory; limit: 0.8 + 3.4 log2 N, ITU-T G.671,"
                                + " from memory",
                        "Planning value splice.mechanical: UFGS-16768A 3.1.6.2; spread from memory");
    }

    @Test
    void between_tabled_wavelengths_values_are_linear() {
        Snapshot plant = Drawing.of("""
                cable F-1 1 : H1 1000 H2
                enclosure E1 H1 : F-1
                panel E1 P 1
                term E1/P/1 = F-1 ahead 1 direct
                """);

        // 1310: 0.35 and 0.40, 1383: 0.34 and 0.40; 1350 lies 40/73 of the way.
        assertThat(LossText.of(LossText.loss(plant, "E1/P/1", 1350).elements().get(1)))
                .isEqualTo("fiber 0.344521/0.4 type");
        // 1625: 0.25 and 0.40, 1650: 0.27 and 0.45; 1635 lies 10/25 of the way.
        assertThat(LossText.of(LossText.loss(plant, "E1/P/1", 1635).elements().get(1)))
                .isEqualTo("fiber 0.258/0.42 type");
        assertThat(LossText.loss(plant, "E1/P/1", 1635).elements().get(1).source())
                .startsWith("Fiber type G.652.D between 1625 nm and 1650 nm");
    }

    @Test
    void outside_the_table_the_loss_is_unknown_and_says_so() {
        Snapshot plant = Drawing.of(ONE_OF_EACH);

        LossUnknown unknown = (LossUnknown) LossText.reckon(plant, "E1/P/1", 1259);
        assertThat(unknown.reasons())
                .containsExactly(
                        "fiber type G.652.D gives no loss at 1259 nm: its table reaches from 1260 nm to 1650 nm; give F-1 a"
                                + " value of its own, or the type a row",
                        "fiber type G.652.D gives no loss at 1259 nm: its table reaches from 1260 nm to 1650 nm; give D-1 a"
                                + " value of its own, or the type a row",
                        "fiber type G.652.D gives no loss at 1259 nm: its table reaches from 1260 nm to 1650 nm; give the"
                                + " type a row");
        assertThat(unknown.sentence()).contains("1259 nm").contains("; fiber type");
        assertThat(LossText.reckon(plant, "E1/P/1", 1651)).isInstanceOf(LossUnknown.class);
        assertThat(LossText.reckon(plant, "E1/P/1", 1260)).isInstanceOf(PathLoss.class);
        assertThat(LossText.reckon(plant, "E1/P/1", 1650)).isInstanceOf(PathLoss.class);
    }

    @Test
    void a_reels_own_sheet_goes_before_the_table_of_its_type() {
        Snapshot plant = Drawing.of("""
                cable F-1 1 : H1 1000 H2
                enclosure E1 H1 : F-1
                panel E1 P 1
                term E1/P/1 = F-1 ahead 1 direct
                reel F-1 1550 0.19
                reel F-1 1700 0.4
                reel F-1 1310 - 1.4671
                """);

        assertThat(LossText.of(LossText.loss(plant, "E1/P/1", 1550).elements().get(1)))
                .isEqualTo("fiber 0.19/0.3 sheet");
        assertThat(LossText.loss(plant, "E1/P/1", 1550).elements().get(1).source())
                .startsWith("Reel sheet of F-1 at 1550 nm: sheet 7; limit: Fiber type G.652.D at 1550 nm");
        // Between its wavelengths the sheet is linear; where only the sheet reaches, it gives the limit too.
        assertThat(LossText.of(LossText.loss(plant, "E1/P/1", 1625).elements().get(1)))
                .isEqualTo("fiber 0.295/0.4 sheet");
        assertThat(LossText.of(LossText.loss(plant, "E1/P/1", 1700).elements().get(1)))
                .isEqualTo("fiber 0.4/0.4 sheet");
        // A row that gives no loss says nothing of it.
        assertThat(LossText.of(LossText.loss(plant, "E1/P/1", 1310).elements().get(1)))
                .isEqualTo("fiber 0.35/0.4 type");
    }

    @Test
    void a_planning_value_of_the_records_replaces_the_built_in_one_whole() {
        Snapshot plant = Drawing.of(ONE_OF_EACH + "planning connector 0.35\nplanning splitter.32 17.5 18\n");

        PathLoss loss = LossText.loss(plant, "E1/P/1", 1550);
        assertThat(LossText.of(loss.elements().get(0))).isEqualTo("connector 0.35/0.35 planning");
        assertThat(loss.elements().get(0).sd()).isNull();
        assertThat(loss.elements().get(0).source()).isEqualTo("Planning value connector of these records: own trials");
        assertThat(LossText.of(loss.elements().get(4))).isEqualTo("splitter 17.5/18 planning");
    }

    @Test
    void a_measured_loss_counts_the_same_in_both_sums_and_has_no_spread() {
        Snapshot plant = Drawing.of("""
                cable F-1 4 : H1 1000 H2
                enclosure E1 H1 : F-1
                enclosure E2 H2 : F-1
                panel E1 P 4
                splitter E2 S1 1x4 7.25 3=9.5
                panel E2 Q 2
                term E1/P/1-2 = F-1 ahead 1-2 loss=0.07
                splice E2 : F-1 back 1 = S1 in loss=-0.02
                term E2/Q/1 = S1 out 3 direct
                """);

        assertThat(LossText.of(LossText.loss(plant, "E1/P/1", 1550)))
                .isEqualTo("connector 0.5/0.75 planning | splice 0.07/0.07 measured | fiber 0.22/0.3 type"
                        + " | splice -0.02/-0.02 measured | splitter 7.25/7.25 measured = 8.02/8.35 (8.35)");
        assertThat(LossText.of(LossText.loss(plant, "E2/Q/1", 1550)))
                .startsWith("connector 0.5/0.75 planning | splitter 9.5/9.5 measured | splice -0.02/-0.02 measured");
    }

    @Test
    void a_splitter_without_a_planning_value_is_unknown() {
        Snapshot plant = Drawing.of("""
                enclosure E1 H1
                panel E1 P 2
                splitter E1 S1 1x12
                term E1/P/1 = S1 in direct
                """);

        assertThat(((LossUnknown) LossText.reckon(plant, "E1/P/1", 1310)).sentence())
                .isEqualTo("splitter S1 at E1 has no loss, and there is no planning value splitter.12; give either");
    }

    /**
     * Source: 7 CFR 1755.404(b)(4): a splice's loss is the average of both directions. W9: 0.20 and 0.10 give 0.15 dB
     * (a test-equipment training page).
     */
    @Test
    void both_ways_are_averaged_at_their_wavelength() {
        Snapshot plant = Drawing.of("""
                cable F-1 1 : H1 1000 H2
                cable D-1 1 : H2 1000 H3
                enclosure E1 H1 : F-1
                enclosure E2 H2 : F-1 D-1
                panel E1 P 1
                term E1/P/1 = F-1 ahead 1
                splice E2 : F-1 back 1 = D-1 ahead 1 loss=0.3
                measured "D-1 ahead 1 @ E2" 1550 ab 0.2
                measured "F-1 back 1 @ E2" 1550 ba 0.1
                measured "F-1 ahead 1 @ E1" 1550 ba 0.04
                measured "E1/P/1" 1550 ba 0.3
                measured "E1/P/1" 1550 ab 0.2
                measured "E1/P/1" 1550 0.9
                """);

        PathLoss loss = LossText.loss(plant, "E1/P/1", 1550);
        assertThat(LossText.of(loss))
                .isEqualTo("connector 0.25/0.25 measured | splice 0.1/0.3 planning | fiber 0.22/0.3 type"
                        + " | splice 0.15/0.15 measured | fiber 0.22/0.3 type = 0.94/1.3 (1.09)");
        assertThat(loss.elements().get(3).source()).isEqualTo("Measured both ways at 1550 nm: 0.2 dB and 0.1 dB");
        // One way only: shown, not summed.
        assertThat(loss.elements().get(1).oneWay()).hasSize(1);
        assertThat(loss.elements().get(0).oneWay()).isEmpty();
        // At another wavelength the recorded two-way mean holds.
        assertThat(LossText.of(LossText.loss(plant, "E1/P/1", 1310).elements().get(3)))
                .isEqualTo("splice 0.3/0.3 measured");
        assertThat(loss.unmeasured()).isEqualTo(1);
        assertThat(loss.unverified()).isEqualTo(2);
    }

    /**
     * Gainers. Source: a fiber maker's note AN3060 (backscatter capture goes with 1/MFD squared, so one way is off by
     * 10 log10(w1/w2)); true loss of a mode-field mismatch after Marcuse, from memory: -20 log10(2 w1 w2 / (w1^2 + w2^2)).
     */
    @Test
    void a_gainer_one_way_averages_to_the_true_loss() {
        double w1 = 9.2;
        double w2 = 8.6;
        double offset = 10 * Math.log10(w1 / w2);
        double trueLoss = -20 * Math.log10(2 * w1 * w2 / (w1 * w1 + w2 * w2));
        String drawing = """
                cable F-1 1 : H1 1000 H2
                cable D-1 1 : H2 1000 H3
                enclosure E1 H1 : F-1
                enclosure E2 H2 : F-1 D-1
                panel E1 P 1
                term E1/P/1 = F-1 ahead 1
                splice E2 : F-1 back 1 = D-1 ahead 1
                """ + "measured \"F-1 back 1 @ E2\" 1550 ab " + decimal(trueLoss - offset) + "\n";
        Snapshot oneWay = Drawing.of(drawing);
        Snapshot both = Drawing.of(drawing + "measured \"F-1 back 1 @ E2\" 1550 ba " + decimal(trueLoss + offset));

        // Published figures, to 0.0001 dB: offset 0.2929, true loss 0.0197, A to B -0.2732, B to A 0.3126.
        assertThat(offset).isCloseTo(0.2929, within(0.00005));
        assertThat(trueLoss - offset).isCloseTo(-0.2732, within(0.00005));
        assertThat(trueLoss + offset).isCloseTo(0.3126, within(0.00005));
        ElementLoss splice = LossText.loss(both, "E1/P/1", 1550).elements().get(3);
        assertThat(splice.expected().decibels()).isCloseTo(0.0197, within(0.00005));
        assertThat(splice.basis()).isEqualTo(LossBasis.MEASURED);
        ElementLoss shown = LossText.loss(oneWay, "E1/P/1", 1550).elements().get(3);
        assertThat(LossText.of(shown)).isEqualTo("splice 0.1/0.3 planning");
        assertThat(shown.oneWay()).hasSize(1);
    }

    private static String decimal(double number) {
        return BigDecimal.valueOf(Math.round(number * 1e6), 6).toPlainString();
    }

    @Test
    void jumpers_follow_a_replaced_table_and_a_path_of_nothing_loses_nothing() {
        Snapshot plant = Drawing.of("""
                enclosure E1 H1 planned
                panel E1 P 1
                """);

        PathLoss loss = LossText.loss(plant, "E1/P/1", 9999);
        assertThat(LossText.of(loss)).isEqualTo(" = 0/0 (0)");
        assertThat(loss.dispersion().psPerNm()).contains(0.0);
    }

    @Test
    void an_unknown_loss_has_a_reason() {
        assertThatThrownBy(() -> new LossUnknown(List.of())).hasMessageContaining("has a reason");
        assertThat(new Measurements(Records.empty()).list(Wavelength.ofNanometres(1310), "x"))
                .isEmpty();
        Path path = LossText.path(Drawing.of(ONE_OF_EACH), "E1/P/1");
        assertThat(path.elements()).hasSize(10);
    }
}
