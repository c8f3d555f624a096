package spanwright.benchmarks.outage;

import java.io.PrintStream;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Random;
import java.util.function.Predicate;

/** Draws many breaks and writes a table of how often the window holds the true place. */
public final class FaultWindows {

    private static final int TRIALS = 4_000;
    private static final long SEED = 20261201;

    private final List<FaultTrial> trials = new ArrayList<>();

    /** So many breaks, from a seed. */
    FaultWindows(long seed, int count, Spread spread) {
        Random chance = new Random(seed);
        for (int trial = 0; trial < count; trial++) {
            trials.add(FaultTrial.of(chance, spread));
        }
    }

    /** The share of breaks whose true place lies within the window. */
    double held() {
        return held(trials);
    }

    private static double held(List<FaultTrial> trials) {
        return (double) trials.stream()
                        .filter(trial -> trial.off() <= trial.within())
                        .count()
                / trials.size();
    }

    /** Half the width of the middle window, m. */
    double medianWithin() {
        return median(trials.stream().map(FaultTrial::within).toList());
    }

    private static double median(List<Double> values) {
        return values.stream().sorted().toList().get(values.size() / 2);
    }

    /**
     * Runs and prints.
     *
     * @param args how many breaks, else 4,000
     */
    public static void main(String[] args) {
        int count = args.length > 0 ? Integer.parseInt(args[0]) : TRIALS;
        PrintStream out = new PrintStream(System.out, true, StandardCharsets.UTF_8);
        out.println("| errors | marks | known joints | breaks | within the window | median window | median off |");
        out.println("|---|---|---|---:|---:|---:|---:|");
        for (Spread spread : List.of(Spread.STATED, Spread.WORSE)) {
            FaultWindows windows = new FaultWindows(SEED, count, spread);
            windows.row(out, spread, "all", "all", trial -> true);
            for (int events = 0; events < 3; events++) {
                int known = events;
                windows.row(
                        out,
                        spread,
                        "read",
                        Integer.toString(events),
                        trial -> trial.marked() && trial.events() == known);
                windows.row(
                        out,
                        spread,
                        "none",
                        Integer.toString(events),
                        trial -> !trial.marked() && trial.events() == known);
            }
        }
    }

    private void row(PrintStream out, Spread spread, String marks, String events, Predicate<FaultTrial> which) {
        List<FaultTrial> some = trials.stream().filter(which).toList();
        out.printf(
                Locale.ROOT,
                "| %s | %s | %s | %,d | %.1f %% | +/-%.1f m | %.1f m |%n",
                spread.name(),
                marks,
                events,
                some.size(),
                100 * held(some),
                median(some.stream().map(FaultTrial::within).toList()),
                median(some.stream().map(FaultTrial::off).toList()));
    }
}
