package spanwright.benchmarks.store;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.Duration;
import java.util.Comparator;
import java.util.List;
import java.util.stream.Stream;
import spanwright.exchange.Fault;
import spanwright.exchange.FolderLoad;
import spanwright.network.Ledger;
import spanwright.sqlite.Access;
import spanwright.sqlite.Opening;
import spanwright.sqlite.SqliteLedger;

/** A folder for the files of one race, gone with it. */
final class Workshop implements AutoCloseable {

    private final Path folder;

    Workshop() throws IOException {
        folder = Files.createTempDirectory("spanwright-race");
    }

    Path path(String name) {
        return folder.resolve(name);
    }

    static SqliteLedger open(Path file, Access access) {
        Opening opening = SqliteLedger.open(file, access);
        if (opening instanceof Opening.Opened opened) {
            return opened.ledger();
        }
        throw new IllegalStateException(opening.toString());
    }

    /** Loads a records folder as one posting. */
    static void load(Ledger ledger, Path folder) {
        ledger.post("race", "load", editor -> {
            List<Fault> faults = FolderLoad.load(folder, editor, FolderLoad.Progress.NONE);
            if (!faults.isEmpty()) {
                throw new IllegalStateException(faults.get(0).toString());
            }
            return List.of();
        });
    }

    static Duration since(long nanoTime) {
        return Duration.ofNanos(System.nanoTime() - nanoTime);
    }

    @Override
    public void close() throws IOException {
        try (Stream<Path> all = Files.walk(folder)) {
            for (Path path : all.sorted(Comparator.reverseOrder()).toList()) {
                Files.delete(path);
            }
        }
    }
}
