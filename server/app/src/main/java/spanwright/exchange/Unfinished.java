package spanwright.exchange;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;
import java.util.List;
import java.util.UUID;
import java.util.stream.Stream;

/**
 * What is being written lies under a name of its own beside its place and is moved there when it is whole. A writing
 * that fails leaves nothing, and what one left that was killed is in nobody's way.
 */
final class Unfinished {

    /** Writes a file or folder. */
    interface Writing {
        /** Writes it under a name that is free. */
        void to(Path part) throws IOException;
    }

    private Unfinished() {}

    /** Writes a file or a folder of files whole, or not at all. */
    static void write(Path path, Writing writing) throws IOException {
        Path part = path.resolveSibling(path.getFileName() + "." + UUID.randomUUID() + ".part");
        try {
            writing.to(part);
            if (Files.isDirectory(part)) {
                Files.deleteIfExists(path);
            }
            Files.move(part, path, StandardCopyOption.ATOMIC_MOVE);
        } finally {
            remove(part);
        }
    }

    private static void remove(Path part) throws IOException {
        if (Files.isDirectory(part)) {
            List<Path> files;
            try (Stream<Path> all = Files.list(part)) {
                files = all.toList();
            }
            for (Path file : files) {
                Files.deleteIfExists(file);
            }
        }
        Files.deleteIfExists(part);
    }
}
