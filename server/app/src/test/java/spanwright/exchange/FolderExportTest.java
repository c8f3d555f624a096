package spanwright.exchange;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.io.IOException;
import java.nio.file.FileAlreadyExistsException;
import java.nio.file.Files;
import java.nio.file.Path;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import spanwright.journal.Change;
import spanwright.network.Snapshot;
import spanwright.network.SnapshotEditor;
import spanwright.plant.Setting;
import spanwright.plants.RandomPlant;
import spanwright.records.Records;

/** An export is there whole, or nothing of it is; one that failed is not in the way of the next. */
class FolderExportTest {

    @TempDir
    Path temp;

    private static Records plant() {
        return RandomPlant.of(7).entered();
    }

    private static Records loaded(Path path) {
        SnapshotEditor editor = Snapshot.empty().edit();
        assertThat(FolderLoad.load(path, editor, FolderLoad.Progress.NONE)).isEmpty();
        return editor.build(1).records();
    }

    @ParameterizedTest
    @ValueSource(strings = {"out", "out.zip", "OUT.ZIP"})
    void what_is_there_already_is_left_as_it_is(String name) throws IOException {
        FolderExport.write(plant(), temp.resolve(name));
        assertThatThrownBy(() -> FolderExport.write(Records.empty(), temp.resolve(name)))
                .isInstanceOf(FileAlreadyExistsException.class);
        assertThat(RecordTexts.of(loaded(temp.resolve(name)))).isEqualTo(RecordTexts.of(plant()));
        assertThat(temp.toFile().list()).containsExactly(name);
    }

    @Test
    void an_empty_folder_is_filled() throws IOException {
        Files.createDirectory(temp.resolve("out"));
        FolderExport.write(plant(), temp.resolve("out"));
        assertThat(RecordTexts.of(loaded(temp.resolve("out")))).isEqualTo(RecordTexts.of(plant()));
    }

    /** The file of a killed export of old lies where a fixed name would be used again. */
    @ParameterizedTest
    @ValueSource(strings = {"out", "out.zip"})
    void what_a_killed_export_left_is_in_nobody_s_way(String name) throws IOException {
        Files.createDirectory(temp.resolve(name + ".part"));
        Files.writeString(temp.resolve(name + ".part").resolve("structures.csv"), "half a ro");
        FolderExport.write(plant(), temp.resolve(name));
        assertThat(RecordTexts.of(loaded(temp.resolve(name)))).isEqualTo(RecordTexts.of(plant()));
    }

    @ParameterizedTest
    @ValueSource(strings = {"out", "out.zip", "out.geojson"})
    void one_that_fails_leaves_nothing(String name) throws IOException {
        Path out = temp.resolve(name);
        assertThatThrownBy(() -> Unfinished.write(out, part -> {
                    if (name.equals("out")) {
                        Files.createDirectory(part);
                        Files.writeString(part.resolve("structures.csv"), "half a ro");
                    } else {
                        Files.writeString(part, "half a ro");
                    }
                    throw new IOException("the disk is full");
                }))
                .hasMessage("the disk is full");
        assertThat(temp).isEmptyDirectory();
        FolderExport.write(plant(), out);
        assertThat(out).exists();
    }

    @Test
    void a_folder_that_is_not_there_is_told() {
        assertThatThrownBy(() -> FolderExport.write(plant(), temp.resolve("no/out.zip")))
                .isInstanceOf(IOException.class);
        assertThat(temp).isEmptyDirectory();
    }

    /** Nothing recorded but that nothing is: the least folder that can be loaded. */
    @ParameterizedTest
    @ValueSource(strings = {"out", "out.zip"})
    void records_without_plant_are_written_and_read_again(String name) throws IOException {
        SnapshotEditor editor = Snapshot.empty().edit();
        editor.apply(Change.add(new Setting(1, "owner", "Nobody yet")));
        Records records = editor.build(1).records();
        FolderExport.write(records, temp.resolve(name));
        assertThat(RecordTexts.of(loaded(temp.resolve(name)))).isEqualTo(RecordTexts.of(records));
    }

    @ParameterizedTest
    @ValueSource(strings = {"out", "out.zip"})
    void empty_records_are_written_and_read_again(String name) throws IOException {
        FolderExport.write(Records.empty(), temp.resolve(name));
        assertThat(RecordTexts.of(loaded(temp.resolve(name)))).isEmpty();
    }
}
