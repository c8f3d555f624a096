package spanwright.benchmarks.cut;

import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Locale;
import java.util.Random;
import java.util.stream.IntStream;
import spanwright.benchmarks.grid.GridPlant;
import spanwright.benchmarks.race.Race;
import spanwright.benchmarks.sql.SqlNetwork;
import spanwright.network.Block;
import spanwright.network.BlockKind;
import spanwright.network.Network;
import spanwright.network.Snapshot;

/**
 * Races a cut of the largest cables and traces of single circuits against recursive SQL, before and after a burst of
 * postings. Arguments: fiber sections (default 10,000,000), rounds (default 25).
 */
public final class CutAndTrace {

    private static final int WARM_UP = 3;
    private static final int TRACES = 1_000;
    /** So many traces go uncounted first: until then both the SQL's driver and the race are still being compiled. */
    private static final int TRACES_BEFORE = 5_000;
    /** The program's own answers are given so often before the race, on all cables in turn, as in a running server. */
    private static final int COMPILED = 20_000;

    private final Random random = new Random(7);
    private final int rounds;

    private CutAndTrace(int rounds) {
        this.rounds = rounds;
    }

    /** Prints the results as Markdown. */
    public static void main(String[] args) throws Exception {
        int sections = args.length > 0 ? Integer.parseInt(args[0]) : 10_000_000;
        int rounds = args.length > 1 ? Integer.parseInt(args[1]) : 25;
        GridPlant plant = new GridPlant(sections, 42);
        Snapshot snapshot = Snapshot.of(plant.records());
        System.out.printf(
                Locale.ROOT,
                "%,d fiber sections, %,d joints, %,d circuits, %,d splitters%n",
                plant.sections(),
                plant.joints(),
                snapshot.records().circuits().count(),
                snapshot.records().splitters().count());
        System.out.println(new Likeness(snapshot.network()).text());
        memory(snapshot, plant.sections());
        CutAndTrace race = new CutAndTrace(rounds);
        race.against("as loaded", snapshot);
        race.against("after 1 % of the joints were changed", new EditBurst(snapshot).change(0.01));
    }

    private static void memory(Snapshot snapshot, int sections) {
        System.out.printf(
                Locale.ROOT,
                "network with its path index: %.1f bytes a fiber section (goal: at most 32)%n",
                (double) snapshot.network().heapBytes() / sections);
    }

    private void against(String when, Snapshot snapshot) throws Exception {
        Path file = Files.createTempFile("spanwright-sql", ".db");
        Files.delete(file);
        try (SqlNetwork sql = new SqlNetwork(file, snapshot)) {
            cuts(when, snapshot, sql);
            traces(when, snapshot, sql);
        } finally {
            Files.deleteIfExists(file);
        }
    }

    private void cuts(String when, Snapshot snapshot, SqlNetwork sql) throws Exception {
        CutAnswers own = new CutAnswers(snapshot);
        List<Block> cables = largest(snapshot.network());
        for (int round = 0; round < COMPILED; round++) {
            own.across(cable(cables, round));
            own.hops(cable(cables, round));
        }
        int other = cables.size() / 2;
        Race ends = new Race("A cut of " + cables.get(0).count() + " fibers, both ends and the circuits, " + when)
                .variant("recursive SQL", round -> sql.ends(cable(cables, round)))
                .variant("path index, compared with the SQL's", round -> own.ends(cable(cables, round)))
                .apart("path index", round -> own.across(cable(cables, round + other)))
                .run(WARM_UP, rounds);
        System.out.println(ends.table());
        Race hops = new Race("The same cut, every hop listed, " + when)
                .variant("recursive SQL", round -> sql.hops(cable(cables, round)))
                .variant("path index", round -> own.hops(cable(cables, round)))
                .run(WARM_UP, rounds);
        System.out.println(hops.table());
    }

    private void traces(String when, Snapshot snapshot, SqlNetwork sql) throws Exception {
        CutAnswers own = new CutAnswers(snapshot);
        // Every round its own: no circuit counted was just traced.
        int[] pieces = circuitPieces(snapshot.network());
        for (int round = 0; round < COMPILED; round++) {
            own.trace(pieces[round % TRACES]);
        }
        Race single = new Race("One circuit end to end, " + when)
                .variant("recursive SQL", round -> sql.hops(pieces[round], 1))
                .variant("path index", round -> own.trace(pieces[round]))
                .run(TRACES_BEFORE, TRACES);
        System.out.println(single.table());
        System.out.printf(
                Locale.ROOT,
                "p99 of the path index is %.1f times its median (goal: at most 4)%n",
                single.samples(1).quantile(0.99) / single.samples(1).median());
    }

    private static Block cable(List<Block> cables, int round) {
        return cables.get(round % cables.size());
    }

    static List<Block> largest(Network network) {
        List<Block> sections = network.blocks().stream()
                .filter(block -> block.kind() == BlockKind.SECTION)
                .toList();
        int most = sections.stream().mapToInt(Block::count).max().orElseThrow();
        return sections.stream().filter(block -> block.count() == most).toList();
    }

    private int[] circuitPieces(Network network) {
        return IntStream.generate(() -> random.nextInt(network.pieces()))
                .filter(piece -> network.alive(piece)
                        && network.paths().circuit(network.paths().pathOf(piece)) != 0)
                .limit(TRACES_BEFORE + TRACES)
                .toArray();
    }
}
