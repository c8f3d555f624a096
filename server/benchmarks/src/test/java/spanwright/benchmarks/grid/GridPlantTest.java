package spanwright.benchmarks.grid;

import static org.assertj.core.api.Assertions.assertThat;

import org.junit.jupiter.api.Test;
import spanwright.journal.Change;
import spanwright.network.Snapshot;
import spanwright.network.SnapshotEditor;

class GridPlantTest {

    private final GridPlant plant = new GridPlant(20_000, 42);

    @Test
    void a_plant_has_about_the_wanted_size_and_enters_without_a_refusal() {
        assertThat(plant.sections()).isBetween(10_000, 40_000);
        SnapshotEditor editor = Snapshot.empty().edit();

        plant.list()
                .forEach(record -> assertThat(editor.apply(Change.add(record))).isEmpty());

        assertThat(editor.finish()).isEmpty();
    }

    @Test
    void every_circuit_on_glass_without_a_splitter_lies_on_one_path_of_its_own() {
        Snapshot snapshot = Snapshot.of(plant.records());
        var paths = snapshot.network().paths();
        int withCircuit = 0;
        int longest = 0;
        for (int path = 0; path < paths.limit(); path++) {
            if (paths.exists(path)) {
                assertThat(paths.circle(path)).isFalse();
                withCircuit += paths.circuit(path) != 0 ? 1 : 0;
                longest = Math.max(longest, paths.length(path));
            }
        }
        long behindSplitters = 32L * snapshot.records().splitters().count();

        assertThat(withCircuit).isEqualTo(snapshot.records().circuits().count() - (int) behindSplitters);
        assertThat(behindSplitters).isPositive();
        assertThat(longest).isLessThanOrEqualTo(63);
    }

    @Test
    void the_same_seed_gives_the_same_plant_and_another_seed_another() {
        assertThat(new GridPlant(20_000, 42).list()).isEqualTo(plant.list());
        assertThat(new GridPlant(20_000, 43).list()).isNotEqualTo(plant.list());
    }
}
