package spanwright.benchmarks.race;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Objects;

/** One task in several variants. Every variant's answer to the same round must be the same, or the race is void. */
public final class Race {

    /** One variant: does round number so-and-so and gives its answer, to be compared. */
    public interface Runner {
        /** Does one round. */
        Object run(int round) throws Exception;
    }

    private final String title;
    private final List<Runner> runners = new ArrayList<>();
    private final List<Samples> samples = new ArrayList<>();
    private final List<Boolean> compared = new ArrayList<>();

    /** A race without variants yet. */
    public Race(String title) {
        this.title = title;
    }

    /** Adds a variant; the first is the one that the others are held against. */
    public Race variant(String name, Runner runner) {
        return add(name, runner, true);
    }

    /** Adds a variant that does another round's task, so that no other has just touched the same memory. */
    public Race apart(String name, Runner runner) {
        return add(name, runner, false);
    }

    private Race add(String name, Runner runner, boolean compare) {
        runners.add(runner);
        samples.add(new Samples(name));
        compared.add(compare);
        return this;
    }

    /** Runs all variants in turn, first uncounted rounds, then counted ones. */
    public Race run(int warmUp, int rounds) throws Exception {
        for (int round = 0; round < warmUp + rounds; round++) {
            Object expected = null;
            for (int index = 0; index < runners.size(); index++) {
                long start = System.nanoTime();
                Object answer = runners.get(index).run(round);
                long time = System.nanoTime() - start;
                if (round >= warmUp) {
                    samples.get(index).add(time);
                }
                expected = index == 0 ? answer : expected;
                if (compared.get(index) && !Objects.deepEquals(expected, answer)) {
                    throw new IllegalStateException(title + ", round " + round + ": "
                            + samples.get(index).name() + " answers otherwise");
                }
            }
        }
        return this;
    }

    /** How many times the first variant's median a variant's is the smaller. */
    public double timesFaster(int variant) {
        return samples.get(0).median() / samples.get(variant).median();
    }

    /** The samples of a variant. */
    public Samples samples(int variant) {
        return samples.get(variant);
    }

    /** The result as a Markdown table. */
    public String table() {
        StringBuilder text = new StringBuilder();
        text.append("\n### ").append(title).append("\n\n");
        text.append("| variant | median | p99 | rounds | times the first |\n|---|---|---|---|---|\n");
        for (int index = 0; index < samples.size(); index++) {
            text.append(samples.get(index).row()).append(String.format(Locale.ROOT, " %.1f |%n", timesFaster(index)));
        }
        return text.toString();
    }
}
