package spanwright.sheet;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import java.util.stream.LongStream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import spanwright.journal.Change;
import spanwright.network.Network;
import spanwright.network.Snapshot;
import spanwright.network.SnapshotEditor;
import spanwright.plant.Enclosure;
import spanwright.plants.Drawing;
import spanwright.plants.RandomPlant;
import spanwright.records.Relation;
import spanwright.splicing.LegKind;

class SheetEntryTest {

    private static final String PLANT = """
            cable F-1 24 tube=12 : H1 1000 H2 1000 H3
            cable D-7 24 tube=12 : H2 500 H4
            enclosure E2 H2 : F-1/1 D-7
            splice E2 : F-1 back 1-12 = D-7 ahead 1-12 loss=0.05 tray=T1
            state E2 : F-1 ahead 1-12 = capped
            """;

    static LongStream seeds() {
        return LongStream.rangeClosed(1, 120);
    }

    private static Snapshot enter(Snapshot plant, int enclosure, List<String> lines) {
        SheetRead read = SheetReader.read(plant.records(), enclosure, lines);
        assertThat(read.mistakes()).isEmpty();
        SnapshotEditor editor = plant.edit();
        assertThat(SheetEntry.enter(editor, enclosure, SheetHeader.NONE, read.statements()))
                .isEmpty();
        assertThat(editor.finish()).isEmpty();
        return editor.build(2);
    }

    @ParameterizedTest(name = "seed {0}")
    @MethodSource("seeds")
    void what_is_recorded_changes_nothing_and_entered_anew_is_the_same(long seed) {
        Snapshot plant = Snapshot.of(RandomPlant.of(seed).entered());
        for (Enclosure enclosure : plant.records().enclosures().list().toList()) {
            List<String> lines = SheetWriter.present(plant, enclosure.id());
            SheetRead read = SheetReader.read(plant.records(), enclosure.id(), lines);
            SnapshotEditor editor = plant.edit();
            String where = "seed " + seed + ", " + enclosure.code() + ":\n" + String.join("\n", lines);
            boolean contradicted = plant.records()
                    .endStates()
                    .owned(Relation.ENCLOSURE_END_STATES, enclosure.id())
                    .findAny()
                    .isPresent();

            if (!contradicted) {
                assertThat(SheetEntry.enter(editor, enclosure.id(), SheetHeader.NONE, read.statements()))
                        .as(where)
                        .isEmpty();
                assertThat(editor.changes()).as(where).isEmpty();
                SnapshotEditor emptied = plant.edit();
                PresentJoints.list(plant, enclosure.id()).forEach(joint -> emptied.replay(Change.remove(joint)));
                Snapshot empty = emptied.build(2);
                // Who says verified says by which light, where nothing was recorded before.
                List<String> proven = lines.stream()
                        .map(line -> line.contains("trust verified") ? line + "; light 2026-01-01" : line)
                        .toList();
                assertThat(SheetWriter.present(enter(empty, enclosure.id(), proven), enclosure.id()).stream()
                                .map(line -> line.contains("trust verified") ? withoutSeen(line) : line))
                        .as(where)
                        .containsExactlyInAnyOrderElementsOf(lines.stream()
                                .map(line -> line.contains("trust verified") ? withoutSeen(line) : line)
                                .toList());
            }
        }
    }

    private static String withoutSeen(String line) {
        return line.replaceAll("; seen [-0-9]+", "");
    }

    @Test
    void a_sheet_changes_what_it_names_and_keeps_what_is_known_of_the_rest() {
        Snapshot after = enter(
                Drawing.of(PLANT),
                1,
                List.of("F-1 back 5 = D-7 ahead 6", "F-1 back 6 = D-7 ahead 5", "F-1 ahead 7 stored"));

        assertThat(SheetWriter.present(after, 1))
                .containsExactlyInAnyOrder(
                        "F-1 back 1-4 = D-7 ahead 1-4; tray T1; loss 0.05",
                        "F-1 back 5 = D-7 ahead 6",
                        "F-1 back 6 = D-7 ahead 5",
                        "F-1 back 7-12 = D-7 ahead 7-12; tray T1; loss 0.05",
                        "F-1 ahead 1-6 capped",
                        "F-1 ahead 8-12 capped",
                        "F-1 ahead 7 stored");
    }

    @Test
    void what_a_line_does_not_say_of_a_recorded_joint_stays() {
        Snapshot after = enter(Drawing.of(PLANT), 1, List.of("F-1 back 1-12 = D-7 ahead 1-12; by K. Ash"));

        assertThat(SheetWriter.present(after, 1))
                .contains("F-1 back 1-12 = D-7 ahead 1-12; tray T1; loss 0.05; by K. Ash");
    }

    @Test
    void an_end_whose_joint_is_taken_apart_stays_cut() {
        Snapshot after = enter(Drawing.of(PLANT), 1, List.of("D-7 ahead 1 capped", "F-1 13-14 through"));

        long key = EnclosureLegsOf.key(after, "F-1", 1);
        int end = after.network().endOf(key);
        assertThat(after.network().joint(end)).isZero();
        assertThat(after.network().peer(end)).isEqualTo(Network.NONE);
    }

    @Test
    void uncut_again_by_a_correction_the_glass_goes_through() {
        Snapshot after = enter(Drawing.of(PLANT), 1, List.of("F-1 1 through", "D-7 ahead 1 stored"));

        int end = after.network().endOf(EnclosureLegsOf.key(after, "F-1", 1));
        assertThat(after.network().peer(end)).isNotEqualTo(Network.NONE);
        assertThat(SheetWriter.present(after, 1)).contains("F-1 1 through", "D-7 ahead 1 stored");
    }

    /** Keys of ends toward the start of a cable in the first enclosure. */
    private static final class EnclosureLegsOf {

        static long key(Snapshot plant, String cable, int fiber) {
            return new EnclosureLegs(plant.records(), 1)
                    .find(cable, LegKind.BACK)
                    .orElseThrow()
                    .leg()
                    .key(fiber);
        }
    }
}
