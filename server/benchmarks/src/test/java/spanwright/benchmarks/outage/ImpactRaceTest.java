package spanwright.benchmarks.outage;

import static org.assertj.core.api.Assertions.assertThatCode;

import org.junit.jupiter.api.Test;

class ImpactRaceTest {

    /** A race throws where the answers of its variants differ. */
    @Test
    void the_program_and_the_recursive_sql_name_the_same_circuits() {
        assertThatCode(() -> new ImpactRace(30_000).run(4)).doesNotThrowAnyException();
    }
}
