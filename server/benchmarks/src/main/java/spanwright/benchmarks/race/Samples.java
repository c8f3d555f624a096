package spanwright.benchmarks.race;

import java.util.Arrays;
import java.util.Locale;

/** Times of one variant, in nanoseconds. */
public final class Samples {

    private final String name;
    private long[] times = new long[64];
    private int count;

    Samples(String name) {
        this.name = name;
    }

    void add(long nanos) {
        if (count == times.length) {
            times = Arrays.copyOf(times, count * 2);
        }
        times[count++] = nanos;
    }

    /** What the variant is. */
    public String name() {
        return name;
    }

    /** The time that a share of the samples does not exceed. */
    public double quantile(double share) {
        long[] sorted = Arrays.copyOf(times, count);
        Arrays.sort(sorted);
        return sorted[Math.min(count - 1, (int) (share * count))];
    }

    /** The middle time. */
    public double median() {
        return quantile(0.5);
    }

    /** As a row of a table: name, median, 99th percentile, samples. */
    String row() {
        return String.format(Locale.ROOT, "| %s | %s | %s | %d |", name, text(median()), text(quantile(0.99)), count);
    }

    /** A time in the unit that reads best. */
    public static String text(double nanos) {
        if (nanos < 10_000) {
            return String.format(Locale.ROOT, "%.2f us", nanos / 1e3);
        }
        return nanos < 10_000_000
                ? String.format(Locale.ROOT, "%.0f us", nanos / 1e3)
                : String.format(Locale.ROOT, "%.1f ms", nanos / 1e6);
    }
}
