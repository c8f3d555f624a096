package spanwright.network;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.EnumSet;
import java.util.HashMap;
import java.util.Map;
import java.util.Set;
import java.util.stream.IntStream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import spanwright.circuits.Circuit;
import spanwright.journal.Change;
import spanwright.journal.RecordKind;
import spanwright.plants.RandomPlant;
import spanwright.splicing.Joint;
import spanwright.splicing.JointKind;

/** Random plants are valid, and hold the odd cases they are drawn for. */
class RandomPlantTest {

    static IntStream seeds() {
        return IntStream.range(0, 250);
    }

    @ParameterizedTest(name = "seed {0}")
    @MethodSource("seeds")
    void a_random_plant_breaks_no_rule(int seed) {
        RandomPlant plant = RandomPlant.of(seed);
        SnapshotEditor editor = Snapshot.empty().edit();

        for (Change change : plant.changes()) {
            assertThat(editor.apply(change)).as(change.toString()).isEmpty();
        }
        assertThat(editor.finish()).isEmpty();
        Snapshot entered = editor.build(1);

        assertThat(entered.records().posting()).isEqualTo(1);
        assertThat(editor.changes()).isEqualTo(plant.changes());
        assertThat(Described.of(entered.network()))
                .isEqualTo(Described.of(Snapshot.of(plant.entered()).network()));
    }

    @Test
    void the_same_seed_draws_the_same_plant() {
        assertThat(RandomPlant.of(7).records()).isEqualTo(RandomPlant.of(7).records());
        assertThat(RandomPlant.of(7).records()).isNotEqualTo(RandomPlant.of(8).records());
    }

    @Test
    void random_plants_hold_every_kind_of_record() {
        Set<RecordKind> kinds = EnumSet.noneOf(RecordKind.class);
        seeds().forEach(seed -> RandomPlant.of(seed).records().forEach(record -> kinds.add(record.kind())));

        assertThat(kinds).containsExactlyInAnyOrder(RecordKind.values());
    }

    @Test
    void random_plants_hold_the_odd_cases() {
        Map<String, Integer> seen = new HashMap<>();
        seeds().forEach(seed -> note(Snapshot.of(RandomPlant.of(seed).entered()), seen));

        for (String odd : new String[] {
            "circle",
            "circle with a jumper",
            "splitter after splitter",
            "circuit",
            "circuits on one path",
            "two-fiber circuit",
            "loose joint",
            "planned joint",
            "range",
            "joint without a peer",
            "long path"
        }) {
            assertThat(seen.getOrDefault(odd, 0)).as(odd).isGreaterThan(9);
        }
    }

    private static void note(Snapshot plant, Map<String, Integer> seen) {
        Network network = plant.network();
        PathIndex paths = network.paths();
        for (int path = 0; path < paths.limit(); path++) {
            boolean jumper = false;
            for (int end : paths.ends(path)) {
                jumper |= plant.records()
                        .joints()
                        .find(network.joint(end))
                        .filter(joint -> joint.type() == JointKind.JUMPER)
                        .isPresent();
            }
            count(seen, "circle", paths.circle(path));
            count(seen, "circle with a jumper", paths.circle(path) && jumper);
            count(
                    seen,
                    "splitter after splitter",
                    inner(network, paths.firstEnd(path)) && inner(network, paths.lastEnd(path)));
            count(seen, "circuit", paths.circuit(path) != 0);
            count(seen, "circuits on one path", paths.shared(path));
            count(seen, "long path", paths.length(path) > 6);
        }
        for (int end = 0; end < 2 * network.pieces(); end++) {
            count(seen, "joint without a peer", network.joint(end) != 0 && network.peer(end) == Network.NONE);
        }
        for (Joint joint : plant.records().joints().list().toList()) {
            count(seen, "planned joint", joint.planned());
            count(seen, "range", joint.count() > 1);
            count(
                    seen,
                    "loose joint",
                    network.looseJoints(joint.a().leg().kind(), joint.a().leg().owner()).length > 0);
        }
        for (Circuit circuit : plant.records().circuits().list().toList()) {
            count(seen, "two-fiber circuit", circuit.fibers() == 2);
        }
    }

    private static boolean inner(Network network, int end) {
        return network.keyOf(end) == Network.NONE;
    }

    private static void count(Map<String, Integer> seen, String odd, boolean found) {
        seen.merge(odd, found ? 1 : 0, Integer::sum);
    }
}
