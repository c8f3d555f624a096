package spanwright.network;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.Arrays;
import java.util.List;
import java.util.SortedSet;
import java.util.TreeSet;
import java.util.stream.IntStream;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import spanwright.circuits.Circuit;
import spanwright.circuits.CircuitStatus;
import spanwright.plants.PlainGlass;
import spanwright.plants.RandomPlant;
import spanwright.records.Records;
import spanwright.splicing.EndKey;
import spanwright.splicing.LegKind;

/** The network against its plain, slow twin, on random plants. */
class GlassTwinTest {

    static IntStream seeds() {
        return IntStream.range(0, 250);
    }

    @ParameterizedTest(name = "seed {0}")
    @MethodSource("seeds")
    void joins_the_same_ends_as_the_twin(int seed) {
        Records records = RandomPlant.of(seed).entered();
        Network network = Snapshot.of(records).network();
        PlainGlass twin = new PlainGlass(records);

        assertSameEnds(network, twin);
    }

    @ParameterizedTest(name = "seed {0}")
    @MethodSource("seeds")
    void lays_the_same_paths_as_the_twin(int seed) {
        Records records = RandomPlant.of(seed).entered();
        Network network = Snapshot.of(records).network();
        PlainGlass twin = new PlainGlass(records);

        assertSamePaths(network, twin);
        for (int path = 0; path < network.paths().limit(); path++) {
            assertTagged(records, network, twin, path);
        }
    }

    @ParameterizedTest(name = "seed {0}")
    @MethodSource("seeds")
    void joins_the_same_ends_as_if_a_job_were_built(int seed) {
        Records records = RandomPlant.of(seed).entered();
        Snapshot base = Snapshot.of(records);
        SortedSet<String> before = Described.of(base.network());

        for (String job : records.plannedJobs()) {
            SnapshotEditor editor = base.edit();
            editor.build(job);
            Network asIf = editor.build(2).network();
            PlainGlass twin = new PlainGlass(records, job);

            assertSameEnds(asIf, twin);
            assertSamePaths(asIf, twin);
        }
        assertThat(Described.of(base.network())).isEqualTo(before);
    }

    private static void assertSameEnds(Network network, PlainGlass twin) {
        TreeSet<Long> found = new TreeSet<>();
        for (Block block : network.blocks()) {
            for (int end = 2 * block.firstPiece(); end < 2 * (block.firstPiece() + block.count()); end++) {
                if (network.keyOf(end) != Network.NONE) {
                    found.add(network.keyOf(end));
                }
            }
        }
        assertThat(found).isEqualTo(new TreeSet<>(twin.ends()));
        for (long key : twin.ends()) {
            int end = network.endOf(key);
            String name = Described.name(key);
            Long peer = twin.peer(key);
            assertThat(network.keyOf(end)).as(name).isEqualTo(key);
            assertThat(network.joint(end)).as(name).isEqualTo(twin.joint(key));
            assertThat(Described.name(network, network.peer(end)))
                    .as(name)
                    .isEqualTo(peer == null ? "nothing" : Described.name(peer));
            assertThat(network.keyOf(end ^ 1)).as(name).isEqualTo(twin.across(key));
            assertThat(network.alive(end >> 1)).as(name).isTrue();
        }
    }

    private static void assertSamePaths(Network network, PlainGlass twin) {
        PathIndex paths = network.paths();
        PathList list = new PathList();
        for (Block block : network.blocks()) {
            assertSameList(paths, block, list);
            for (int number = 1; number <= block.count(); number++) {
                int path = paths.pathOf(block.piece(number));
                assertThat(paths.exists(path)).isTrue();
                assertThat(paths.ends(path)).contains(enteredBy(paths.ends(path), block.piece(number)));
            }
        }
        for (int path = 0; path < paths.limit(); path++) {
            if (paths.exists(path)) {
                assertSamePath(network, twin, path);
            }
        }
    }

    private static void assertSameList(PathIndex paths, Block block, PathList list) {
        int[] across = paths.across(block.firstPiece(), block.count());
        paths.listAcross(block.firstPiece(), block.count(), list);
        assertThat(list.count()).isEqualTo(block.count());
        for (int index = 0; index < block.count(); index++) {
            int path = paths.pathOf(block.firstPiece() + index);
            int[] row = {path, paths.firstEnd(path), paths.lastEnd(path), paths.circuit(path)};
            assertThat(Arrays.copyOfRange(across, 4 * index, 4 * index + 4)).isEqualTo(row);
            assertThat(IntStream.range(list.from(index), list.from(index + 1)).map(list::end))
                    .containsExactly(IntStream.of(paths.ends(path)).boxed().toArray(Integer[]::new));
        }
    }

    private static int enteredBy(int[] ends, int piece) {
        return IntStream.of(ends).filter(end -> end >> 1 == piece).findFirst().orElse(Network.NONE);
    }

    private static void assertSamePath(Network network, PlainGlass twin, int path) {
        PathIndex paths = network.paths();
        int[] ends = paths.ends(path);
        assertThat(ends).hasSize(paths.length(path));
        assertThat(IntStream.range(0, ends.length).map(index -> paths.end(path, index)))
                .containsExactly(IntStream.of(ends).boxed().toArray(Integer[]::new));
        assertThat(IntStream.of(ends).map(end -> paths.pathOf(end >> 1))).containsOnly(path);
        assertThat(paths.firstEnd(path)).isEqualTo(ends[0]);
        assertThat(paths.lastEnd(path)).isEqualTo(ends[ends.length - 1] ^ 1);

        boolean turned = network.keyOf(ends[0]) == Network.NONE;
        List<Long> there = IntStream.of(ends).mapToObj(network::keyOf).toList();
        List<Long> back = IntStream.rangeClosed(1, ends.length)
                .mapToObj(index -> network.keyOf(ends[ends.length - index] ^ 1))
                .toList();
        List<Long> walked = turned ? back : there;
        if (walked.get(0) != Network.NONE) {
            assertThat(twin.walk(walked.get(0))).isEqualTo(walked);
            assertThat(twin.circle(walked.get(0))).isEqualTo(paths.circle(path));
        } else {
            assertThat(ends.length).as("from a splitter to a splitter").isGreaterThan(1);
            assertThat(twin.walk(walked.get(1))).isEqualTo(walked.subList(1, walked.size()));
        }
        if (!paths.circle(path)) {
            assertThat(network.peer(paths.firstEnd(path))).isEqualTo(Network.NONE);
            assertThat(network.peer(paths.lastEnd(path))).isEqualTo(Network.NONE);
        } else {
            assertThat(network.peer(paths.firstEnd(path))).isEqualTo(paths.lastEnd(path));
        }
    }

    private static void assertTagged(Records records, Network network, PlainGlass twin, int path) {
        PathIndex paths = network.paths();
        SortedSet<String> codes =
                twin.circuits(network.keyOf(paths.firstEnd(path)), network.keyOf(paths.lastEnd(path)));
        int first = codes.isEmpty()
                ? 0
                : records.circuits().find(codes.first()).map(Circuit::id).orElseThrow();
        assertThat(paths.circuit(path)).isEqualTo(first);
        assertThat(paths.shared(path)).isEqualTo(codes.size() > 1);
        boolean alone = codes.size() == 1
                && records.circuits()
                        .list()
                        .filter(circuit -> circuit.status() != CircuitStatus.RETIRED && circuit.id() != first)
                        .noneMatch(circuit -> begins(network, circuit, path));
        assertThat(paths.circuitAlone(path)).isEqualTo(alone ? first : 0);
    }

    private static boolean begins(Network network, Circuit circuit, int path) {
        PathIndex paths = network.paths();
        return IntStream.range(0, circuit.fibers())
                .mapToLong(index -> EndKey.of(
                        LegKind.FRONT, circuit.a().panel(), circuit.a().ports().at(index)))
                .anyMatch(
                        key -> key == network.keyOf(paths.firstEnd(path)) || key == network.keyOf(paths.lastEnd(path)));
    }
}
