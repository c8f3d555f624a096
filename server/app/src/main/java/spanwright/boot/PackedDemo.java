package spanwright.boot;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.net.URI;
import java.net.URISyntaxException;
import java.net.URL;
import java.nio.file.FileSystem;
import java.nio.file.FileSystems;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import java.util.stream.Stream;

/** The demo's records folder, as it is packed in the program. */
final class PackedDemo {

    private static final String FOLDER = "/demo/sallowmere";

    private PackedDemo() {}

    /** Copies it to a folder of its own, which goes when the program ends. */
    static Path unpack() {
        URL packed = PackedDemo.class.getResource(FOLDER);
        if (packed == null) {
            throw new IllegalStateException("the program was packed without its demo");
        }
        try {
            URI address = packed.toURI();
            if (address.getScheme().equals("file")) {
                return Path.of(address);
            }
            try (FileSystem jar = FileSystems.newFileSystem(address, Map.of())) {
                return copy(jar.getPath(FOLDER));
            }
        } catch (IOException | URISyntaxException unreadable) {
            throw new IllegalStateException("the packed demo cannot be read", unreadable);
        }
    }

    private static Path copy(Path folder) throws IOException {
        Path copy = Files.createTempDirectory("spanwright-demo-folder");
        Runtime.getRuntime().addShutdownHook(new Thread(() -> clear(copy), "clear"));
        try (Stream<Path> files = Files.list(folder)) {
            for (Path file : files.toList()) {
                Files.copy(file, copy.resolve(String.valueOf(file.getFileName())));
            }
        }
        return copy;
    }

    private static void clear(Path copy) {
        try (Stream<Path> files = Files.list(copy)) {
            List<Path> all = files.toList();
            for (Path file : all) {
                Files.deleteIfExists(file);
            }
            Files.deleteIfExists(copy);
        } catch (IOException busy) {
            throw new UncheckedIOException(busy);
        }
    }
}
