package spanwright.exchange;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.stream.IntStream;
import java.util.stream.LongStream;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import spanwright.journal.Change;
import spanwright.journal.RecordKind;
import spanwright.network.Snapshot;
import spanwright.network.SnapshotEditor;
import spanwright.plant.FiberRange;
import spanwright.plants.RandomPlant;
import spanwright.records.Records;
import spanwright.records.RecordsView;
import spanwright.splicing.EndRange;
import spanwright.splicing.Joint;
import spanwright.splicing.JointKind;

/** Rows of one joint each become ranges, and neither the glass nor a fault's line is another for it. */
class JointLoadTest {

    private static final Path SMALL =
            Path.of(System.getProperty("repository.root"), "demo-data", "cases", "good", "small");

    @TempDir
    private Path temp;

    private SnapshotEditor editor = Snapshot.empty().edit();

    static LongStream seeds() {
        return LongStream.rangeClosed(1, 40);
    }

    @ParameterizedTest
    @MethodSource("seeds")
    void a_row_a_joint_is_the_same_glass_in_no_more_records(long seed) throws IOException {
        Records ranges = entered(RandomPlant.of(seed).changes());
        Records single = entered(single(RandomPlant.of(seed).changes()));
        FolderExport.write(single, temp.resolve("single"));
        Records folded = loaded(temp.resolve("single"));
        // The slow twin: every range taken apart again.
        assertThat(RecordTexts.of(entered(single(changes(folded)))))
                .as("seed " + seed)
                .isEqualTo(RecordTexts.of(single));
        assertThat(betweenLegs(folded)).as("seed " + seed).isLessThanOrEqualTo(betweenLegs(ranges));
        FolderExport.write(folded, temp.resolve("folded"));
        assertThat(RecordTexts.of(loaded(temp.resolve("folded"))))
                .as("seed " + seed)
                .isEqualTo(RecordTexts.of(folded));
    }

    private static long betweenLegs(Records records) {
        return records.joints()
                .list()
                .filter(joint -> !joint.a().leg().equals(joint.b().leg()))
                .count();
    }

    private static Records entered(List<Change> changes) {
        SnapshotEditor editor = Snapshot.empty().edit();
        changes.forEach(change -> assertThat(editor.apply(change)).isEmpty());
        assertThat(editor.finish()).isEmpty();
        return editor.build(1).records();
    }

    private static Records loaded(Path folder) {
        SnapshotEditor editor = Snapshot.empty().edit();
        assertThat(FolderLoad.load(folder, editor, FolderLoad.Progress.NONE)).isEmpty();
        return editor.build(1).records();
    }

    private static List<Change> changes(RecordsView records) {
        return Stream.of(RecordKind.values())
                .flatMap(kind ->
                        IntStream.range(0, records.limit(kind)).mapToObj(identity -> records.record(kind, identity)))
                .flatMap(Stream::ofNullable)
                .map(Change::add)
                .toList();
    }

    /** The same changes, each splice and termination of one end a side. */
    private static List<Change> single(List<Change> changes) {
        List<Change> single = new ArrayList<>();
        int identity = 1;
        for (Change change : changes) {
            if (change.after() instanceof Joint joint) {
                int step = joint.type() == JointKind.JUMPER ? joint.count() : 1;
                for (int from = 0; from < joint.count(); from += step) {
                    single.add(Change.add(part(joint, identity++, from, from + step - 1)));
                }
            } else {
                single.add(change);
            }
        }
        return single;
    }

    private static Joint part(Joint joint, int identity, int first, int last) {
        return new Joint(
                identity,
                joint.type(),
                joint.enclosure(),
                part(joint.a(), first, last),
                part(joint.b(), first, last),
                joint.facts());
    }

    private static EndRange part(EndRange ends, int first, int last) {
        return new EndRange(
                ends.leg(),
                new FiberRange(ends.numbers().at(first), ends.numbers().at(last)));
    }

    private List<String> load(String... splices) throws IOException {
        try (Stream<Path> files = Files.list(SMALL)) {
            for (Path file : files.toList()) {
                Files.copy(file, temp.resolve(file.getFileName()));
            }
        }
        Files.write(temp.resolve("splices.csv"), List.of(splices));
        Files.writeString(temp.resolve("terminations.csv"), "enclosure,panel,ports,end\n");
        editor = Snapshot.empty().edit();
        return FolderLoad.load(temp, editor, FolderLoad.Progress.NONE).stream()
                .map(fault -> fault.file() + ":" + fault.line() + " " + fault.text())
                .toList();
    }

    private List<String> joints() {
        return editor.build(1)
                .records()
                .joints()
                .list()
                .filter(joint -> joint.type() == JointKind.SPLICE)
                .map(joint -> joint.a().numbers() + " = " + joint.b().numbers())
                .toList();
    }

    @Test
    void rows_alike_that_count_on_are_one_range() throws IOException {
        assertThat(load(
                        "enclosure,tray,a,b,loss_db",
                        "E4,1,F-1 back 1,F-1 ahead 4,",
                        "E4,1,F-1 back 2,F-1 ahead 3,",
                        "E4,1,F-1 back 3,F-1 ahead 2,",
                        "E4,2,F-1 back 4,F-1 ahead 1,",
                        "E4,2,F-1 back 5,D-7 ahead 2,",
                        "E4,2,F-1 back 6,D-7 ahead 3,0.04",
                        "E4,2,F-1 back 7,D-7 ahead 4,0.04",
                        "E4,2,F-1 back 8,D-7 ahead 6,0.04",
                        "E4,2,F-1 back 9-10,D-7 ahead 7-8,0.04",
                        "E4,2,F-1 back 11,D-7 ahead 9,0.04",
                        "E4,2,F-1 back 13,D-7 ahead 10,0.04"))
                .isEmpty();
        assertThat(joints())
                .containsExactly(
                        "1-3 = 4-2", "4 = 1", "5 = 2", "6-7 = 3-4", "8 = 6", "9-10 = 7-8", "11 = 9", "13 = 10");
    }

    @Test
    void a_row_of_two_fibers_of_one_leg_stays_by_itself() throws IOException {
        assertThat(load("enclosure,a,b", "E4,F-1 back 1,F-1 back 2", "E4,F-1 back 3,F-1 back 4"))
                .isEmpty();
        assertThat(joints()).containsExactly("1 = 2", "3 = 4");
    }

    @Test
    void a_clash_within_a_range_stands_on_its_own_line() throws IOException {
        assertThat(load(
                        "enclosure,a,b",
                        "E4,F-1 back 7,D-7 ahead 7",
                        "E4,F-1 ahead 6,D-7 ahead 6",
                        "E4,F-1 ahead 7,D-7 ahead 7",
                        "E4,F-1 ahead 8,D-7 ahead 8"))
                .containsExactly("splices.csv:4 D-7 ahead 7 @ E4 is joined already, to F-1 back 7;"
                        + " each end is joined once (the earlier is splices.csv:2)");
    }

    @Test
    void a_clash_with_a_range_names_the_row_of_the_same_end() throws IOException {
        assertThat(load(
                        "enclosure,a,b",
                        "E4,F-1 back 1,D-7 ahead 4",
                        "E4,F-1 back 2,D-7 ahead 3",
                        "E4,F-1 back 3,D-7 ahead 2",
                        "E4,F-1 back 5,D-7 ahead 3",
                        "E4,F-1 back 3,D-7 ahead 9"))
                .hasSize(2)
                .satisfies(faults -> assertThat(faults.get(0)).endsWith("(the earlier is splices.csv:3)"))
                .satisfies(faults -> assertThat(faults.get(1)).endsWith("(the earlier is splices.csv:4)"));
    }
}
