package spanwright.benchmarks.outage;

import static org.assertj.core.api.Assertions.assertThat;

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

    @Test
    void errors_a_quarter_worse_are_still_mostly_held() {
        assertThat(new FaultWindows(8, BREAKS, Spread.WORSE).held())
                .as("seed 8")
                .isGreaterThanOrEqualTo(0.90);
    }
}
