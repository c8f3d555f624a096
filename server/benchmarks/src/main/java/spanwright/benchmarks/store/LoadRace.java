package spanwright.benchmarks.store;

import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Arrays;
import java.util.Locale;
import spanwright.benchmarks.grid.GridFolder;
import spanwright.benchmarks.grid.GridPlant;
import spanwright.network.Network;
import spanwright.network.Snapshot;
import spanwright.records.Records;
import spanwright.splicing.Joint;
import spanwright.sqlite.Access;
import spanwright.sqlite.SqliteLedger;

/**
 * Races a bulk load of joints, end to end (parsed, every rule checked, journalled, durable, ready to trace), against a
 * bare batch insert; then a start from the file, with the side file and without. Arguments: fiber sections (default
 * 1,000,000), rounds (default 3).
 */
public final class LoadRace {

    private final Workshop workshop;
    private final Records records;
    private final long joints;

    private LoadRace(Workshop workshop, Records records) {
        this.workshop = workshop;
        this.records = records;
        this.joints = records.joints().list().mapToLong(Joint::count).sum();
    }

    /** Prints the results as Markdown. */
    public static void main(String[] args) throws Exception {
        int sections = args.length > 0 ? Integer.parseInt(args[0]) : 1_000_000;
        int rounds = args.length > 1 ? Integer.parseInt(args[1]) : 3;
        try (Workshop workshop = new Workshop()) {
            LoadRace race = new LoadRace(workshop, new GridPlant(sections, 42).records());
            race.prepare();
            race.run(rounds);
        }
    }

    private void prepare() throws Exception {
        GridFolder folder = new GridFolder(records);
        folder.plant(workshop.path("plant"));
        folder.joints(workshop.path("ranges"), false);
        folder.joints(workshop.path("single"), true);
        System.out.printf(
                Locale.ROOT,
                "%,d joints in %,d ranges; plant and circuits are loaded before, not timed%n%n",
                joints,
                records.joints().count());
    }

    private void run(int rounds) throws Exception {
        double[][] seconds = new double[5][rounds];
        for (int round = 0; round < rounds; round++) {
            seconds[0][round] = bare();
            double[] ranges = own("ranges");
            seconds[1][round] = ranges[0];
            seconds[2][round] = own("single")[0];
            seconds[3][round] = ranges[1];
            seconds[4][round] = ranges[2];
        }
        double bare = median(seconds[0]);
        System.out.println("| load of joints | median | joints a second | times the bare insert |\n|---|---|---|---|");
        load("bare batch insert, one row a joint, two indexes", median(seconds[0]), bare);
        load("records folder, ranges as crews write them", median(seconds[1]), bare);
        load("records folder, one row a joint", median(seconds[2]), bare);
        double rebuilt = median(seconds[3]);
        double mapped = median(seconds[4]);
        System.out.printf(
                Locale.ROOT,
                "%n| file to first answer | median | times |%n|---|---|---|%n"
                        + "| rebuilt from the joint rows | %.2f s | 1.0 |%n| with the side file | %.2f s | %.1f |%n",
                rebuilt,
                mapped,
                rebuilt / mapped);
    }

    private void load(String what, double seconds, double bare) {
        System.out.printf(
                Locale.ROOT, "| %s | %.2f s | %,.0f | %.2f |%n", what, seconds, joints / seconds, bare / seconds);
    }

    private static double median(double[] values) {
        double[] sorted = values.clone();
        Arrays.sort(sorted);
        return sorted[sorted.length / 2];
    }

    private double bare() throws Exception {
        long[] a = new long[(int) joints];
        long[] b = new long[(int) joints];
        int[] closures = new int[(int) joints];
        int at = 0;
        for (Joint joint : (Iterable<Joint>) records.joints().list()::iterator) {
            for (int index = 0; index < joint.count(); index++, at++) {
                a[at] = joint.a().key(index);
                b[at] = joint.b().key(index);
                closures[at] = joint.enclosure();
            }
        }
        Path file = workshop.path("bare.db");
        Files.deleteIfExists(file);
        long start = System.nanoTime();
        try (BareSqlite sqlite = new BareSqlite(file)) {
            sqlite.bulk(a, b, closures);
        }
        return Workshop.since(start).toNanos() / 1e9;
    }

    /** Seconds to load the joints, to start without the side file, to start with it. */
    private double[] own(String folder) throws Exception {
        Path file = workshop.path("own-" + folder + ".db");
        double load;
        try (SqliteLedger ledger = Workshop.open(file, Access.WRITE)) {
            Workshop.load(ledger, workshop.path("plant"));
            long start = System.nanoTime();
            Workshop.load(ledger, workshop.path(folder));
            load = Workshop.since(start).toNanos() / 1e9;
        }
        double mapped = start(file);
        Files.delete(file.resolveSibling(file.getFileName() + ".network"));
        double rebuilt = start(file);
        Files.delete(file);
        return new double[] {load, rebuilt, mapped};
    }

    private double start(Path file) {
        long start = System.nanoTime();
        try (SqliteLedger ledger = Workshop.open(file, Access.READ)) {
            answer(ledger.current());
            return Workshop.since(start).toNanos() / 1e9;
        }
    }

    private static void answer(Snapshot snapshot) {
        Network network = snapshot.network();
        int piece = network.sectionsOf(1).get(0).firstPiece();
        if (network.paths().ends(network.paths().pathOf(piece)).length == 0) {
            throw new IllegalStateException("no answer");
        }
    }
}
