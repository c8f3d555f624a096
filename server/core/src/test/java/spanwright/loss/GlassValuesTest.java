package spanwright.loss;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import org.junit.jupiter.api.Test;
import spanwright.journal.Change;
import spanwright.network.Snapshot;
import spanwright.plant.Cable;
import spanwright.plant.FiberType;
import spanwright.plant.FiberValues;
import spanwright.plants.Drawing;
import spanwright.quantity.Loss;
import spanwright.quantity.Wavelength;
import spanwright.records.Records;
import spanwright.records.RecordsEditor;

class GlassValuesTest {

    private static final Snapshot PLANT = Drawing.of("""
            cable F-1 1 : H1 100 H2
            reel F-1 1310 - 1.4670
            reel F-1 1550 0.19 1.4676
            """);
    private static final Cable CABLE = PLANT.records().cables().find("F-1").orElseThrow();

    @Test
    void the_group_index_is_that_of_the_reel_where_its_sheet_reaches_else_of_the_type() {
        GlassValues glass = new GlassValues(PLANT.records());

        assertThat(glass.findIndex(CABLE, nm(1430)).orElseThrow().value()).isCloseTo(1.4673, within(1e-9));
        assertThat(glass.findIndex(CABLE, nm(1430)).orElseThrow().source())
                .isEqualTo("Reel sheet of F-1 between 1310 nm and 1550 nm: sheet 7");
        assertThat(glass.findIndex(CABLE, nm(1625)).orElseThrow())
                .isEqualTo(new TableValue(
                        1.4686,
                        LossBasis.TYPE,
                        "Fiber type G.652.D at 1625 nm: reckoned from the makers' index at 1310 nm and 1550 nm and the"
                                + " dispersion formula"));
        assertThat(glass.findIndex(CABLE, nm(1700))).isEmpty();
        assertThat(glass.whyNoIndex(CABLE, nm(1700)))
                .isEqualTo(
                        "fiber type G.652.D gives no group index at 1700 nm: its table reaches from 1260 nm to 1650 nm;"
                                + " give F-1 a value of its own, or the type a row");
        assertThat(glass.findJumperIndex(nm(1310)).orElseThrow().value()).isEqualTo(1.4676);
        assertThat(glass.findJumperIndex(nm(1200))).isEmpty();
    }

    /** G.652.D replaced by a type that gives no index; jumpers follow it. */
    @Test
    void a_recorded_type_replaces_the_built_in_one_of_its_name_whole() {
        RecordsEditor editor = PLANT.records().edit();
        editor.apply(Change.add(new FiberType(
                1,
                "G.652.D",
                List.of(
                        new FiberValues(nm(1600), Loss.ofDecibels(0.3), Loss.ofDecibels(0.5), null),
                        new FiberValues(nm(1500), Loss.ofDecibels(0.2), Loss.ofDecibels(0.4), null)),
                null,
                null,
                null)));
        Records records = editor.build(2);
        GlassValues glass = new GlassValues(records);

        assertThat(glass.findJumperLoss(nm(1525)).orElseThrow().value()).isCloseTo(0.225, within(1e-9));
        assertThat(glass.findJumperLimit(nm(1525)).orElseThrow().source())
                .isEqualTo("Fiber type G.652.D between 1500 nm and 1600 nm, from these records");
        assertThat(glass.findJumperLoss(nm(1310))).isEmpty();
        assertThat(glass.findJumperIndex(nm(1550))).isEmpty();
        assertThat(glass.whyNoIndex(CABLE, nm(1620))).contains("its table reaches nowhere");
        assertThat(glass.jumperType().id()).isEqualTo(1);
        assertThat(glass.type(CABLE).code()).isEqualTo("G.652.D");
    }

    private static Wavelength nm(long nanometres) {
        return Wavelength.ofNanometres(nanometres);
    }
}
