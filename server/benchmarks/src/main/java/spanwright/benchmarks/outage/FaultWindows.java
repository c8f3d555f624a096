package spanwright.benchmarks.outage;

import java.io.PrintStream;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Random;
import java.util.TreeMap;
import java.util.function.Predicate;
import java.util.stream.Collectors;

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

    /**
     * By kind of shot, as many as were drawn often enough: how far places are off, root mean square, in the standard
     * uncertainties that were told. Above 1 a cause is missing or understated, far below 1 the windows are too wide.
     */
    Map<String, Double> offByKind(int least) {
        Map<String, List<FaultTrial>> kinds = trials.stream()
                .collect(Collectors.groupingBy(
                        trial -> (trial.marked() ? "marks read, " : "no marks, ") + trial.events() + " known",
                        TreeMap::new,
                        Collectors.toList()));
        Map<String, Double> off = new TreeMap<>();
        kinds.forEach((kind, some) -> {
            if (some.size() >= least) {
                off.put(kind, off(some));
            }
        });
        return off;
    }

    private static double off(List<FaultTrial> trials) {
        return Math.sqrt(trials.stream()
                .mapToDouble(trial -> 2 * trial.off() / trial.within())
                .map(off -> off * off)
                .average()
                .orElseThrow());
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
        out.println("| errors | marks | known joints | breaks | within the window | median window | median off"
                + " | off, in standard uncertainties told |");
        out.println("|---|---|---|---:|---:|---:|---:|---:|");
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
                "| %s | %s | %s | %,d | %.1f %% | +/-%.1f m | %.1f m | %.2f |%n",
                spread.name(),
                marks,
                events,
                some.size(),
                100 * held(some),
                median(some.stream().map(FaultTrial::within).toList()),
                median(some.stream().map(FaultTrial::off).toList()),
                off(some));
    }
}
