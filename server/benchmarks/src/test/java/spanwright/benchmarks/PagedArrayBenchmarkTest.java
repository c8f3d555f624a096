package spanwright.benchmarks;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.stream.IntStream;
import org.junit.jupiter.api.Test;
import spanwright.paged.PagedInts;

class PagedArrayBenchmarkTest {

    @Test
    void both_arrays_hold_the_same_walk_and_take_the_same_changes() {
        PagedArrayBenchmark benchmark = new PagedArrayBenchmark();
        benchmark.size = 5_000;
        benchmark.fill();

        assertThat(benchmark.walkPaged()).isEqualTo(benchmark.walkPlain()).isNotZero();
        PagedInts paged = benchmark.changePaged();
        assertThat(IntStream.range(0, paged.size()).map(paged::get).toArray())
                .containsExactly(benchmark.changePlain())
                .contains(-1);
    }
}
