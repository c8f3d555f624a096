package spanwright.benchmarks.cut;

import static org.assertj.core.api.Assertions.assertThat;

import java.nio.file.Path;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import spanwright.benchmarks.grid.GridPlant;
import spanwright.benchmarks.sql.SqlNetwork;
import spanwright.network.Block;
import spanwright.network.Snapshot;

class CutAndTraceTest {

    @TempDir
    Path folder;

    @Test
    void recursive_SQL_and_the_path_index_agree_on_every_block_before_and_after_a_burst_of_changes() throws Exception {
        Snapshot loaded = Snapshot.of(new GridPlant(8_000, 3).records());
        agree(loaded, folder.resolve("loaded.db"));
        agree(new EditBurst(loaded).change(0.05), folder.resolve("changed.db"));
    }

    private static void agree(Snapshot snapshot, Path file) throws Exception {
        CutAnswers own = new CutAnswers(snapshot);
        try (SqlNetwork sql = new SqlNetwork(file, snapshot)) {
            for (Block block : snapshot.network().blocks()) {
                assertThat(own.ends(block)).isDeepEqualTo(sql.ends(block));
                assertThat(own.hops(block)).isEqualTo(sql.hops(block));
            }
        }
    }
}
