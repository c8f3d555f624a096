package spanwright.records;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import org.junit.jupiter.api.Test;
import spanwright.journal.Change;
import spanwright.network.Snapshot;
import spanwright.plant.Cable;
import spanwright.plant.Enclosure;
import spanwright.plant.LengthBasis;
import spanwright.plant.PlantState;
import spanwright.plants.Drawing;
import spanwright.quantity.Length;

class CableLayTest {

    /** The worked example of records-folder.md section 2. */
    private static final String EXAMPLE = """
            cable F-1 12 over=1.5 : H1 +20 1000 H2 +30 1000 H3 +10
            mark F-1 0 - 5000
            mark F-1 1 - 6060
            mark F-1 2 7100
            enclosure E2 H2 : F-1
            enclosure E3 H3 planned : F-1
            """;

    @Test
    void the_worked_example_as_records() {
        CableLay lay = lay(Drawing.of(EXAMPLE), "F-1");

        assertThat(lay.positions().enclosure(1)).isEqualTo(Length.ofMetres(1064.563107));
        assertThat(lay.positions().length()).isEqualTo(Length.ofMetres(2130));
        assertThat(lay.routeTo(2)).isEqualTo(Length.ofMetres(2000));
        assertThat(lay.route(1).basis()).isEqualTo(LengthBasis.MEASURED);
        assertThat(lay.structure(1).code()).isEqualTo("H2");
        assertThat(lay.findEnclosure(1).map(Enclosure::code)).contains("E2");
        assertThat(lay.findEnclosure(0)).isEmpty();
        assertThat(lay.findEnclosure(2)).isEmpty();
        assertThat(lay.rows()).hasSize(3);
        assertThat(lay.cable().code()).isEqualTo("F-1");
        assertThat(lay.type().fibers()).isEqualTo(12);
        assertThat(lay.index(lay.rows().get(2).id())).isEqualTo(2);
        assertThatThrownBy(() -> lay.index(99)).hasMessageContaining("F-1");
    }

    @Test
    void glass_is_longer_than_sheath_by_the_excess_of_the_reel_else_of_the_type() {
        Snapshot plant = Drawing.of(EXAMPLE);
        assertThat(lay(plant, "F-1").glass(Length.ofMetres(1000))).isEqualTo(Length.ofMetres(1015));

        Cable cable = plant.records().cables().find("F-1").orElseThrow();
        RecordsEditor editor = plant.records().edit();
        editor.apply(Change.replace(
                cable,
                new Cable(
                        cable.id(),
                        cable.code(),
                        cable.cableType(),
                        null,
                        "white",
                        0.25,
                        null,
                        null,
                        PlantState.IN_SERVICE,
                        null)));
        CableLay own = CableLay.of(editor.build(2), cable.id());
        assertThat(own.overlengthPct()).isEqualTo(0.25);
        assertThat(own.glass(Length.ofMetres(1000))).isEqualTo(Length.ofMetres(1002.5));
    }

    @Test
    void a_length_says_the_marks_on_both_sides_or_that_there_are_none() {
        CableLay lay = lay(Drawing.of(EXAMPLE), "F-1");

        assertThat(lay.basis(0, 1)).isEqualTo(LengthBasis.NOMINAL);
        assertThat(lay.source(0, 1)).isEqualTo("Route lengths and coils; no sheath marks on both sides");
        CableLay marked = lay(Drawing.of(EXAMPLE.replace("- 5000", "4980").replace("7100", "- 7110")), "F-1");
        assertThat(marked.basis(0, 1)).isEqualTo(LengthBasis.MARKS);
        assertThat(marked.source(0, 1)).isEqualTo("White marks 4980 m and 6060 m");
        assertThat(marked.source(2, 1)).isEqualTo("White marks 4980 m and 7110 m");
    }

    @Test
    void a_span_is_travelled_in_the_direction_of_the_run() {
        Snapshot plant = Drawing.of("""
                structure H1 5 0
                structure H2 5.001 0
                span H2 H1 5.0005 0.001
                cable F-1 1 : H1 0 H2
                """);

        CableLay lay = lay(plant, "F-1");
        assertThat(lay.route(1).line().at(0)).isEqualTo(lay.structure(0).position());
        assertThat(lay.route(1).line().at(1)).isEqualTo(lay.structure(1).position());
        assertThat(lay.route(1).basis()).isEqualTo(LengthBasis.GEODESIC);
    }

    private static CableLay lay(Snapshot plant, String cable) {
        return CableLay.of(
                plant.records(),
                plant.records().cables().find(cable).orElseThrow().id());
    }
}
