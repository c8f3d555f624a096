package spanwright.exchange;

import java.io.Closeable;
import java.io.IOException;
import java.io.InputStream;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.stream.Stream;

/** Where the files of a records folder come from. */
interface Source extends Closeable {

    /** The names of the files, without folders, sorted. */
    List<String> names();

    /** Opens one of them; the caller closes it. */
    InputStream open(String name) throws IOException;

    /** The files of a folder itself; folders within are passed over. */
    static Source folder(Path folder) throws IOException {
        List<String> names;
        try (Stream<Path> files = Files.list(folder)) {
            names = files.filter(Files::isRegularFile)
                    .map(file -> file.getFileName().toString())
                    .sorted()
                    .toList();
        }
        return new Source() {
            @Override
            public List<String> names() {
                return names;
            }

            @Override
            public InputStream open(String name) throws IOException {
                return Files.newInputStream(folder.resolve(name));
            }

            @Override
            public void close() {
                // Nothing is held open between files.
            }
        };
    }
}
