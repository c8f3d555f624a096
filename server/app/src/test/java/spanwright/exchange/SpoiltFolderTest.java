package spanwright.exchange;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Path;
import java.util.List;
import java.util.TreeMap;
import java.util.stream.LongStream;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.Timeout;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import spanwright.network.Snapshot;
import spanwright.network.SnapshotEditor;
import spanwright.plants.RandomPlant;
import spanwright.records.Records;

/**
 * Sound folders of which one thing is spoilt at random: a byte, a cell, a row. Either such a folder is refused with
 * faults that name a file of it and a line within that file, or it is entered, and written and read again it gives
 * equal records. It never throws and never takes long.
 */
class SpoiltFolderTest {

    private static final Path GOOD = Path.of(System.getProperty("repository.root"), "demo-data", "cases", "good");

    private static List<FolderBytes> sound;

    @TempDir
    static Path temp;

    @BeforeAll
    static void sound() throws IOException {
        FolderExport.write(RandomPlant.of(11).entered(), temp.resolve("eleven"));
        FolderExport.write(RandomPlant.of(64).entered(), temp.resolve("sixty-four"));
        sound = List.of(
                FolderBytes.of(GOOD.resolve("small")),
                FolderBytes.of(GOOD.resolve("worked")),
                FolderBytes.of(temp.resolve("eleven")),
                FolderBytes.of(temp.resolve("sixty-four")));
    }

    static LongStream share() {
        return LongStream.rangeClosed(1, 120);
    }

    static LongStream seeds() {
        return LongStream.rangeClosed(121, 1_120);
    }

    @Test
    void what_is_spoilt_is_sound_before() {
        assertThat(sound)
                .allSatisfy(folder -> assertThat(
                                FolderLoad.load(folder, Snapshot.empty().edit()))
                        .isEmpty());
    }

    @ParameterizedTest
    @MethodSource("share")
    @Timeout(30)
    void a_spoilt_folder_is_refused_or_sound(long seed) throws IOException {
        askSpoilt(seed);
    }

    @Tag("slow")
    @ParameterizedTest
    @MethodSource("seeds")
    @Timeout(30)
    void one_of_many_spoilt_folders_is_refused_or_sound(long seed) throws IOException {
        askSpoilt(seed);
    }

    /** So that the test tests both: some of the spoilt folders are refused, and some are sound still. */
    @Test
    void of_the_spoilt_folders_some_are_refused_and_some_are_not() throws IOException {
        TreeMap<Boolean, Integer> refused = new TreeMap<>();
        for (long seed : share().toArray()) {
            boolean any =
                    !FolderLoad.load(spoilt(seed), Snapshot.empty().edit()).isEmpty();
            refused.merge(any, 1, Integer::sum);
        }
        assertThat(refused.get(true)).isGreaterThan(40);
        assertThat(refused.get(false)).isGreaterThan(15);
    }

    private static FolderBytes spoilt(long seed) {
        Spoiling spoiling = new Spoiling(seed);
        return spoiling.spoil(sound.get((int) (seed % sound.size())));
    }

    private void askSpoilt(long seed) throws IOException {
        FolderBytes folder = spoilt(seed);
        String which = "seed " + seed + ", " + folder.spoilt();
        SnapshotEditor editor = Snapshot.empty().edit();
        List<Fault> faults = load(folder, editor, which);
        for (Fault fault : faults) {
            assertThat(folder.names()).as(which + ": " + fault).contains(fault.file());
            assertThat(fault.line()).as(which + ": " + fault).isBetween(1, folder.lines(fault.file()));
            assertThat(fault.text()).as(which).isNotBlank().doesNotContain("\n").doesNotContain("null");
        }
        if (faults.isEmpty()) {
            askAgain(editor.build(1).records(), which, temp.resolve("again-" + seed + ".zip"));
        }
    }

    private static List<Fault> load(FolderBytes folder, SnapshotEditor editor, String which) {
        try {
            return FolderLoad.load(folder, editor);
        } catch (RuntimeException | StackOverflowError thrown) {
            throw new AssertionError(which, thrown);
        }
    }

    private static void askAgain(Records records, String which, Path out) throws IOException {
        FolderExport.write(records, out);
        SnapshotEditor editor = Snapshot.empty().edit();
        assertThat(FolderLoad.load(out, editor, FolderLoad.Progress.NONE))
                .as(which)
                .isEmpty();
        assertThat(RecordTexts.of(editor.build(1).records())).as(which).isEqualTo(RecordTexts.of(records));
    }
}
