package spanwright.exchange;

import static org.assertj.core.api.Assertions.assertThat;

import java.nio.file.Path;
import org.junit.jupiter.api.Test;
import spanwright.network.Snapshot;
import spanwright.network.SnapshotEditor;
import spanwright.records.Records;

class FolderLoadTest {

    private static final Path DEMO = Path.of(System.getProperty("repository.root"), "demo-data");

    @Test
    void a_sane_folder_is_entered_whole() {
        SnapshotEditor editor = Snapshot.empty().edit();
        assertThat(FolderLoad.load(DEMO.resolve("cases/good/small"), editor, FolderLoad.Progress.NONE))
                .isEmpty();
        Records records = editor.build(1).records();
        assertThat(records.structures().count()).isEqualTo(4);
        assertThat(records.joints().count()).isEqualTo(7);
    }

    @Test
    void the_demo_is_entered_whole() {
        assertThat(FolderLoad.load(DEMO.resolve("sallowmere"), Snapshot.empty().edit(), FolderLoad.Progress.NONE))
                .isEmpty();
    }
}
