package spanwright.benchmarks;

import java.util.Random;
import java.util.concurrent.TimeUnit;
import org.openjdk.jmh.annotations.Benchmark;
import org.openjdk.jmh.annotations.BenchmarkMode;
import org.openjdk.jmh.annotations.Fork;
import org.openjdk.jmh.annotations.Measurement;
import org.openjdk.jmh.annotations.Mode;
import org.openjdk.jmh.annotations.OutputTimeUnit;
import org.openjdk.jmh.annotations.Param;
import org.openjdk.jmh.annotations.Scope;
import org.openjdk.jmh.annotations.Setup;
import org.openjdk.jmh.annotations.State;
import org.openjdk.jmh.annotations.Warmup;
import spanwright.paged.PagedInts;

/**
 * What a paged array costs a walk that jumps about in it, and what it spares a posting that changes a few places, each
 * beside a plain array of the same ints. The ratio is the result; a single time means little on a shared machine.
 */
@State(Scope.Benchmark)
@BenchmarkMode(Mode.AverageTime)
@OutputTimeUnit(TimeUnit.MICROSECONDS)
@Fork(1)
@Warmup(iterations = 3, time = 1)
@Measurement(iterations = 5, time = 1)
public class PagedArrayBenchmark {

    private static final int STEPS = 1_000;
    private static final int CHANGES = 24;

    /** How many ints there are. */
    @Param({"100000", "10000000"})
    int size;

    private int[] plain;
    private PagedInts paged;
    private int[] changed;

    /** One circle through all places, in the same random order every time; and the places of a posting's changes. */
    @Setup
    public void fill() {
        Random random = new Random(1);
        int[] order = new int[size];
        for (int place = 0; place < size; place++) {
            int other = random.nextInt(place + 1);
            order[place] = order[other];
            order[other] = place;
        }
        plain = new int[size];
        for (int place = 0; place < size; place++) {
            plain[order[place]] = order[(place + 1) % size];
        }
        paged = PagedInts.copyOf(plain, size);
        int first = random.nextInt(size - CHANGES);
        changed = random.ints(CHANGES, first, first + CHANGES).toArray();
    }

    /** A walk of {@value #STEPS} steps in a plain array; gives where it ends. */
    @Benchmark
    public int walkPlain() {
        int place = 0;
        for (int step = 0; step < STEPS; step++) {
            place = plain[place];
        }
        return place;
    }

    /** The same walk in the paged array. */
    @Benchmark
    public int walkPaged() {
        int place = 0;
        for (int step = 0; step < STEPS; step++) {
            place = paged.get(place);
        }
        return place;
    }

    /** A changed copy of the plain array: {@value #CHANGES} neighbouring places, as of one closure's sheet. */
    @Benchmark
    public int[] changePlain() {
        int[] copy = plain.clone();
        for (int place : changed) {
            copy[place] = -1;
        }
        return copy;
    }

    /** The same changes made to the paged array. */
    @Benchmark
    public PagedInts changePaged() {
        PagedInts.Editor editor = paged.edit();
        for (int place : changed) {
            editor.set(place, -1);
        }
        return editor.build();
    }
}
