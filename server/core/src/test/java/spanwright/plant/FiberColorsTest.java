package spanwright.plant;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.util.List;
import java.util.stream.IntStream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class FiberColorsTest {

    private static final FiberColors TIA = BuiltInColors.find("TIA-598").orElseThrow();

    /** Source: 7 CFR 1755.200(e)(9) Table 7, for buffer tubes and fibers alike. */
    @Test
    void positions_1_to_24_are_those_of_the_federal_table() {
        assertThat(IntStream.rangeClosed(1, 24).mapToObj(TIA::at))
                .containsExactly(
                        "blue",
                        "orange",
                        "green",
                        "brown",
                        "slate",
                        "white",
                        "red",
                        "black",
                        "yellow",
                        "violet",
                        "rose",
                        "aqua",
                        "blue with black tracer",
                        "orange with black tracer",
                        "green with black tracer",
                        "brown with black tracer",
                        "slate with black tracer",
                        "white with black tracer",
                        "red with black tracer",
                        "black with yellow tracer",
                        "yellow with black tracer",
                        "violet with black tracer",
                        "rose with black tracer",
                        "aqua with black tracer");
    }

    /** Source: TIA-598-C as stated by an encyclopedia: one more stripe for each further twelve, black striped yellow. */
    @Test
    void beyond_24_each_twelve_has_one_tracer_more() {
        assertThat(TIA.at(25)).isEqualTo("blue with 2 black tracers");
        assertThat(TIA.at(32)).isEqualTo("black with 2 yellow tracers");
        assertThat(TIA.at(37)).isEqualTo("blue with 3 black tracers");
    }

    /** Source: reckoned from 7 CFR 1755.200 Table 7: tube = ceiling of n / k, position = (n - 1) mod k + 1. */
    @ParameterizedTest
    @CsvSource({
        "1, blue, blue",
        "12, blue, aqua",
        "13, orange, blue",
        "23, orange, rose",
        "73, red, blue",
        "96, black, aqua",
        "144, aqua, aqua",
        "145, blue with black tracer, blue"
    })
    void a_fiber_of_a_cable_of_twelves_has_its_tube_and_colour(int fiber, String tube, String color) {
        CableType type = type(288);

        assertThat(TIA.at(type.tubeOf(fiber))).isEqualTo(tube);
        assertThat(TIA.at(type.positionInTube(fiber))).isEqualTo(color);
    }

    @Test
    void a_fiber_that_a_cable_does_not_have_is_refused_not_wrapped() {
        CableType type = type(144);

        for (int fiber : new int[] {0, -1, 145}) {
            assertThatThrownBy(() -> type.tubeOf(fiber)).hasMessageContaining("fibers 1 to 144, not " + fiber);
            assertThatThrownBy(() -> type.positionInTube(fiber)).isInstanceOf(IllegalArgumentException.class);
        }
        assertThatThrownBy(() -> TIA.at(0)).hasMessageContaining("positions start at 1");
    }

    @Test
    void the_last_tube_may_be_part_filled() {
        assertThat(type(144).tubes()).isEqualTo(12);
        assertThat(type(145).tubes()).isEqualTo(13);
    }

    /** Source: the tube order of one national cable specification (spec 2020102013, sections 2.2 and 2.3). */
    @Test
    void another_national_order_is_data_and_is_carried_on_with_tracers() {
        FiberColors order = FiberColors.of(new ColorCode(
                1,
                "NATIONAL",
                List.of(
                        "green", "yellow", "white", "blue", "red", "purple", "brown", "pink", "black", "gray", "orange",
                        "aqua")));

        assertThat(order.at(9)).isEqualTo("black");
        assertThat(order.at(13)).isEqualTo("green with black tracer");
        assertThat(order.at(21)).isEqualTo("black with yellow tracer");
    }

    @Test
    void an_order_of_no_colours_is_refused() {
        assertThatThrownBy(() -> new FiberColors("X", List.of(), List.of())).hasMessageContaining("X");
        assertThatThrownBy(() -> new FiberColors("X", List.of("red"), List.of()))
                .hasMessageContaining("X");
    }

    @Test
    void every_built_in_colour_says_its_source() {
        assertThat(BuiltInColors.list()).containsExactly("TIA-598");
        assertThat(BuiltInColors.find("TIA-599")).isEmpty();
        assertThat(BuiltInColors.source(20).text()).isEqualTo("7 CFR 1755.200(e)(9) Table 7");
        assertThat(BuiltInColors.source(1).status().word()).isEqualTo("READ-P");
    }

    private static CableType type(int fibers) {
        return new CableType(1, "T", fibers, 12, "G.652.D", 0, false, null, "TIA-598");
    }
}
