package spanwright.network;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.ArrayList;
import java.util.Collections;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.SortedSet;
import java.util.TreeSet;
import java.util.stream.IntStream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import spanwright.journal.Change;
import spanwright.journal.RecordKind;
import spanwright.plants.RandomChanges;
import spanwright.plants.RandomPlant;
import spanwright.records.Records;

/** Snapshots changed step by step against snapshots built afresh, on random plants and changes. */
class SnapshotChangesTest {

    static IntStream seeds() {
        return IntStream.range(0, 250);
    }

    @ParameterizedTest(name = "seed {0}")
    @MethodSource("seeds")
    void a_changed_network_is_the_one_built_afresh(int seed) {
        RandomChanges random = new RandomChanges(seed);
        Snapshot now = Snapshot.of(RandomPlant.of(seed).entered());
        List<Snapshot> past = new ArrayList<>();
        List<Set<String>> described = new ArrayList<>();
        List<Change> changes = new ArrayList<>();

        for (int posting = 2; posting < 7; posting++) {
            past.add(now);
            described.add(Described.of(now.network()));
            SnapshotEditor editor = now.edit();
            random.enter(editor);
            changes.addAll(editor.changes());
            now = editor.build(posting);

            assertThat(Described.of(now.network()))
                    .as("posting %d", posting)
                    .isEqualTo(Described.of(Snapshot.of(now.records()).network()));
        }
        for (int index = 0; index < past.size(); index++) {
            assertThat(Described.of(past.get(index).network())).isEqualTo(described.get(index));
        }
        assertGoesBack(now, changes, past.get(0));
    }

    @Test
    void most_random_postings_break_no_rule_and_change_much() {
        int sound = 0;
        Map<RecordKind, Integer> kinds = new EnumMap<>(RecordKind.class);
        for (int seed = 0; seed < 250; seed++) {
            SnapshotEditor editor = Snapshot.of(RandomPlant.of(seed).entered()).edit();
            new RandomChanges(seed).enter(editor);
            sound += editor.finish().isEmpty() ? 1 : 0;
            editor.changes().forEach(change -> kinds.merge(change.kind(), 1, Integer::sum));
        }
        assertThat(sound).isGreaterThan(225);
        assertThat(kinds)
                .containsKeys(
                        RecordKind.CABLE_TYPE,
                        RecordKind.CABLE,
                        RecordKind.RUN_ROW,
                        RecordKind.ENCLOSURE,
                        RecordKind.PASS,
                        RecordKind.SPLITTER,
                        RecordKind.PANEL,
                        RecordKind.JOINT,
                        RecordKind.CIRCUIT);
    }

    private static void assertGoesBack(Snapshot now, List<Change> changes, Snapshot first) {
        SnapshotEditor editor = now.edit();
        List<Change> backward = new ArrayList<>(changes);
        Collections.reverse(backward);
        backward.forEach(change -> editor.replay(change.inverse()));
        Snapshot back = editor.build(1);

        assertThat(Described.of(back.network())).isEqualTo(Described.of(first.network()));
        assertThat(everything(back.records())).isEqualTo(everything(first.records()));
    }

    private static SortedSet<String> everything(Records records) {
        SortedSet<String> lines = new TreeSet<>();
        for (RecordKind kind : RecordKind.values()) {
            for (int id = 1; id < records.limit(kind); id++) {
                lines.add(kind + " " + id + " " + records.record(kind, id));
            }
        }
        lines.removeIf(line -> line.endsWith(" null"));
        return lines;
    }
}
