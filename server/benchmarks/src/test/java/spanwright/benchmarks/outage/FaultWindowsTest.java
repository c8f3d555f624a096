package spanwright.benchmarks.outage;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.Map;
import org.junit.jupiter.api.Test;

/** A seeded share of the many breaks. */
class FaultWindowsTest {

    private static final int BREAKS = 1_500;

    @Test
    void the_window_holds_the_true_place_in_95_of_100() {
        FaultWindows stated = new FaultWindows(7, BREAKS, Spread.STATED);

        assertThat(stated.held()).as("seed 7").isGreaterThanOrEqualTo(0.95);
        // Wide enough to hold is easy; it has to be narrow enough to drive to as well.
        assertThat(stated.medianWithin()).isLessThan(40);
    }

    /** One standard uncertainty told is one standard deviation or a little more, for each kind of shot by itself. */
    @Test
    void no_kind_of_shot_is_told_surer_than_it_is_nor_half_as_sure() {
        Map<String, Double> off = new FaultWindows(7, BREAKS, Spread.STATED).offByKind(100);

        assertThat(off).hasSizeGreaterThanOrEqualTo(3).containsKey("marks read, 1 known");
        assertThat(off)
                .allSatisfy(
                        (kind, each) -> assertThat(each).as("seed 7, %s", kind).isBetween(0.5, 1.0));
    }

    @Test
    void errors_a_quarter_worse_are_still_mostly_held() {
        assertThat(new FaultWindows(8, BREAKS, Spread.WORSE).held())
                .as("seed 8")
                .isGreaterThanOrEqualTo(0.90);
    }
}
