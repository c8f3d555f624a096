package spanwright.network;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import java.util.Random;
import java.util.stream.IntStream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import spanwright.journal.Change;
import spanwright.plant.Cable;
import spanwright.plant.PlantState;
import spanwright.plants.RandomChanges;
import spanwright.plants.RandomPlant;

/** Networks without their dead pieces against networks built afresh. */
class LivingPlantTest {

    static IntStream seeds() {
        return IntStream.range(0, 150);
    }

    @ParameterizedTest(name = "seed {0}")
    @MethodSource("seeds")
    void a_network_numbered_anew_says_the_same_and_goes_on_the_same(int seed) {
        RandomChanges random = new RandomChanges(seed);
        Snapshot now = Snapshot.of(RandomPlant.of(seed).entered());
        for (int posting = 2; posting < 7; posting++) {
            SnapshotEditor editor = now.edit();
            random.enter(editor);
            Snapshot next = editor.build(posting);
            now = new Snapshot(next.records(), LivingPlant.renumbered(next.network()));

            assertThat(now.network().deadPieces()).isZero();
            assertThat(Described.of(now.network()))
                    .as("seed %d, posting %d", seed, posting)
                    .isEqualTo(Described.of(next.network()))
                    .isEqualTo(Described.of(Snapshot.of(now.records()).network()));
        }
    }

    @Test
    void thousands_of_cable_changes_leave_no_more_dead_pieces_than_a_share() {
        Snapshot now = Snapshot.of(RandomPlant.of(11).entered());
        List<Cable> cables = now.records().cables().list().toList();
        Random random = new Random(11);
        int renumbered = 0;
        for (int posting = 2; posting < 6_000; posting++) {
            Cable before = now.records()
                    .cables()
                    .get(cables.get(random.nextInt(cables.size())).id());
            SnapshotEditor editor = now.edit();
            editor.replay(Change.replace(before, turned(before)));
            Snapshot next = editor.build(posting);
            if (next.network().pieces() < now.network().pieces()) {
                renumbered++;
                assertSameAsAfresh(next);
            }
            now = next;
            assertBounded(now.network());
        }
        assertThat(renumbered).isGreaterThan(3);
        assertSameAsAfresh(now);
    }

    private static Cable turned(Cable cable) {
        PlantState state = cable.state() == PlantState.IN_SERVICE ? PlantState.ABANDONED : PlantState.IN_SERVICE;
        return new Cable(
                cable.id(),
                cable.code(),
                cable.cableType(),
                cable.partOf(),
                cable.marksInk(),
                cable.overlengthPct(),
                cable.reel(),
                cable.installedOn(),
                state,
                cable.note());
    }

    private static void assertSameAsAfresh(Snapshot snapshot) {
        assertThat(Described.of(snapshot.network()))
                .isEqualTo(Described.of(Snapshot.of(snapshot.records()).network()));
    }

    private static void assertBounded(Network network) {
        int living = network.pieces() - network.deadPieces();
        assertThat(network.deadPieces()).isLessThanOrEqualTo(Math.max(LivingPlant.DEAD_AT_LEAST, living / 3));
        // 64 bytes a piece, dead or not, and a first page of each of a dozen arrays.
        assertThat(network.heapBytes()).isLessThan(64L * (living + LivingPlant.DEAD_AT_LEAST) + 200_000);
    }
}
