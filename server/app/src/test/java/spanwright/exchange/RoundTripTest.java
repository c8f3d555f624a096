package spanwright.exchange;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.stream.LongStream;
import java.util.stream.Stream;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import org.junit.jupiter.params.provider.ValueSource;
import spanwright.journal.Change;
import spanwright.network.Snapshot;
import spanwright.network.SnapshotEditor;
import spanwright.plants.RandomPlant;
import spanwright.records.Records;
import spanwright.records.Refusal;

class RoundTripTest {

    private static final Path DEMO = Path.of(System.getProperty("repository.root"), "demo-data");

    @TempDir
    Path temp;

    static LongStream seeds() {
        return LongStream.rangeClosed(1, 120);
    }

    @ParameterizedTest
    @MethodSource("seeds")
    void a_random_plant_written_and_read_again_is_equal(long seed) throws IOException {
        Records records = entered(RandomPlant.of(seed));
        Path out = temp.resolve(seed % 2 == 0 ? "plant" : "plant.zip");
        FolderExport.write(records, out);
        Records again = loaded(out);
        assertThat(RecordTexts.of(again)).isEqualTo(RecordTexts.of(records));
    }

    private static Records entered(RandomPlant plant) {
        SnapshotEditor editor = Snapshot.empty().edit();
        List<Refusal> refusals = new ArrayList<>();
        for (Change change : plant.changes()) {
            refusals.addAll(editor.apply(change));
        }
        refusals.addAll(editor.finish());
        assertThat(refusals).isEmpty();
        return editor.build(1).records();
    }

    private static Records loaded(Path path) {
        SnapshotEditor editor = Snapshot.empty().edit();
        assertThat(FolderLoad.load(path, editor, FolderLoad.Progress.NONE)).isEmpty();
        return editor.build(1).records();
    }

    @ParameterizedTest
    @ValueSource(strings = {"cases/good/small", "sallowmere"})
    void a_folder_read_and_written_is_written_the_same_again(String name) throws IOException {
        Records records = loaded(DEMO.resolve(name));
        FolderExport.write(records, temp.resolve("first"));
        Records again = loaded(temp.resolve("first"));
        assertThat(RecordTexts.of(again)).isEqualTo(RecordTexts.of(records));
        FolderExport.write(again, temp.resolve("second"));
        FolderExport.write(again, temp.resolve("third.zip"));
        FolderExport.write(loaded(temp.resolve("third.zip")), temp.resolve("fourth.zip"));
        try (Stream<Path> files = Files.list(temp.resolve("first"))) {
            for (Path file : files.toList()) {
                assertThat(temp.resolve("second").resolve(file.getFileName())).hasSameBinaryContentAs(file);
            }
        }
        assertThat(temp.resolve("fourth.zip")).hasSameBinaryContentAs(temp.resolve("third.zip"));
    }
}
