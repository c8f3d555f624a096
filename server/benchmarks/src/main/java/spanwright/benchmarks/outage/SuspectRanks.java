package spanwright.benchmarks.outage;

import java.io.PrintStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Random;
import spanwright.benchmarks.grid.GridPlant;
import spanwright.exchange.FolderLoad;
import spanwright.network.Snapshot;
import spanwright.network.SnapshotEditor;
import spanwright.plant.RouteLength;
import spanwright.plant.Span;
import spanwright.records.Records;

/**
 * Cuts many spans and writes a table of the place at which the suspects hold the true one. Arguments: cuts (default
 * 300), folder of records (default the demo).
 */
public final class SuspectRanks {

    private static final int CUTS = 300;
    private static final long SEED = 20261201;
    private static final List<Double> WRONG = List.of(0.0, 0.05, 0.2);
    private static final int PLANTS = 10;
    private static final int SECTIONS = 5_000;
    /** After so many spans that take nothing down a plant is given up. */
    private static final int MOST_DRAWN = 100;

    private final List<SuspectTrial> trials = new ArrayList<>();

    /** So many cuts, in plants in turn, a share of the alarms missing or wrong. */
    SuspectRanks(List<Snapshot> plants, int cuts, double wrong, long seed) {
        Random random = new Random(seed);
        for (int cut = 0; cut < cuts; cut++) {
            trial(plants.get(cut % plants.size()), wrong, random);
        }
    }

    /** Plants drawn from seeds: grids of some thousand fiber sections. */
    static List<Snapshot> drawn(int plants) {
        List<Snapshot> drawn = new ArrayList<>();
        for (int seed = 1; seed <= plants; seed++) {
            drawn.add(Snapshot.of(new GridPlant(SECTIONS, seed).records()));
        }
        return drawn;
    }

    /** Prints the results as Markdown. */
    public static void main(String[] args) {
        int cuts = args.length > 0 ? Integer.parseInt(args[0]) : CUTS;
        Path folder = Path.of(args.length > 1 ? args[1] : "demo-data/sallowmere");
        PrintStream out = new PrintStream(System.out, true, StandardCharsets.UTF_8);
        out.println("| plant | alarms missing, wrong | cuts | down, median | top 1 | top 3 | not listed "
                + "| route, median | route, 90 % |");
        out.println("|---|---:|---:|---:|---:|---:|---:|---:|---:|");
        rows(out, "demo", List.of(demo(folder)), cuts);
        rows(out, PLANTS + " drawn", drawn(PLANTS), cuts);
    }

    private static Snapshot demo(Path folder) {
        SnapshotEditor editor = Snapshot.empty().edit();
        if (!FolderLoad.load(folder, editor, FolderLoad.Progress.NONE).isEmpty()) {
            throw new IllegalStateException("not sane: " + folder);
        }
        return editor.build(1);
    }

    private static void rows(PrintStream out, String name, List<Snapshot> plants, int cuts) {
        for (double wrong : WRONG) {
            out.println(new SuspectRanks(plants, cuts, wrong, SEED).row(name, wrong));
        }
    }

    private void trial(Snapshot plant, double wrong, Random random) {
        List<Span> spans = plant.records().spans().list().toList();
        double[] until = new double[spans.size()];
        double sum = 0;
        for (int index = 0; index < until.length; index++) {
            sum += route(plant.records(), spans.get(index));
            until[index] = sum;
        }
        int before = trials.size();
        for (int drawn = 0; drawn < MOST_DRAWN && trials.size() == before; drawn++) {
            double at = random.nextDouble() * sum;
            int index = 0;
            while (until[index] < at) {
                index++;
            }
            SuspectTrial.of(plant, spans.get(index), wrong, random).ifPresent(trials::add);
        }
    }

    private static double route(Records records, Span span) {
        return RouteLength.of(
                        span,
                        records.structures().get(span.from()).position(),
                        records.structures().get(span.to()).position())
                .length()
                .metres();
    }

    int cuts() {
        return trials.size();
    }

    /** The share of cuts whose span is held by one of so many first suspects. */
    double top(int most) {
        return (double) trials.stream()
                        .filter(trial -> trial.rank() > 0 && trial.rank() <= most)
                        .count()
                / trials.size();
    }

    private String row(String name, double wrong) {
        List<Double> routes = trials.stream()
                .filter(trial -> trial.rank() > 0)
                .map(SuspectTrial::route)
                .sorted()
                .toList();
        return String.format(
                Locale.ROOT,
                "| %s | %.0f %% | %d | %d | %.1f %% | %.1f %% | %d | %,.0f m | %,.0f m |",
                name,
                100 * wrong,
                trials.size(),
                trials.stream().map(SuspectTrial::down).sorted().toList().get(trials.size() / 2),
                100 * top(1),
                100 * top(3),
                trials.stream().filter(trial -> trial.rank() == 0).count(),
                routes.get(routes.size() / 2),
                routes.get(routes.size() * 9 / 10));
    }
}
