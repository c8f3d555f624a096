package spanwright.exchange;

import java.io.ByteArrayInputStream;
import java.io.IOException;
import java.io.InputStream;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import java.util.Objects;
import java.util.TreeMap;

/**
 * A records folder in memory.
 *
 * @param files what each file holds
 * @param spoilt what has been done to it
 */
record FolderBytes(Map<String, byte[]> files, String spoilt) implements Source {

    /** The folder as it lies on disk. */
    static FolderBytes of(Path folder) throws IOException {
        Map<String, byte[]> files = new TreeMap<>();
        try (Source source = Source.folder(folder)) {
            for (String name : source.names()) {
                if (name.endsWith(".csv")) {
                    files.put(name, Files.readAllBytes(folder.resolve(name)));
                }
            }
        }
        return new FolderBytes(files, "nothing");
    }

    /** The same with other bytes in one file. */
    FolderBytes with(String file, byte[] bytes, String done) {
        Map<String, byte[]> changed = new TreeMap<>(files);
        changed.put(file, bytes);
        return new FolderBytes(changed, done + " in " + file);
    }

    /** What a file holds. */
    byte[] bytes(String file) {
        return Objects.requireNonNull(files.get(file), file);
    }

    /** How many lines a file has, one at least. */
    int lines(String file) {
        int lines = 1;
        for (byte one : bytes(file)) {
            lines += one == '\n' ? 1 : 0;
        }
        return lines;
    }

    @Override
    public List<String> names() {
        return List.copyOf(files.keySet());
    }

    @Override
    public InputStream open(String name) {
        return new ByteArrayInputStream(bytes(name));
    }

    @Override
    public void close() {
        // Holds nothing.
    }
}
