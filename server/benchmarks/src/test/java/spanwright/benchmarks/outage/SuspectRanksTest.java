package spanwright.benchmarks.outage;

import static org.assertj.core.api.Assertions.assertThat;

import org.junit.jupiter.api.Test;

/** A seeded share of the many cuts. */
class SuspectRanksTest {

    private static final int CUTS = 40;

    @Test
    void true_alarms_name_the_span_first() {
        SuspectRanks ranks = new SuspectRanks(SuspectRanks.drawn(2), CUTS, 0, 7);

        assertThat(ranks.cuts()).isEqualTo(CUTS);
        assertThat(ranks.top(1)).as("seed 7").isGreaterThanOrEqualTo(0.9);
    }

    @Test
    void a_fifth_of_the_alarms_missing_or_wrong_still_names_it_among_the_first_three() {
        SuspectRanks ranks = new SuspectRanks(SuspectRanks.drawn(2), CUTS, 0.2, 8);

        assertThat(ranks.top(3)).as("seed 8").isGreaterThanOrEqualTo(0.8);
    }
}
