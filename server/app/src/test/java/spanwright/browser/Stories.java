package spanwright.browser;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Files;
import java.nio.file.Path;

/** What arrives from outside in the demo's stories: lists of alarms as one pastes them. */
final class Stories {

    private static final Path FOLDER = Path.of(System.getProperty("repository.root"), "demo-data", "stories");

    private Stories() {}

    /** The text of a file of a story, such as {@code 1-backhoe/down.txt}. */
    static String text(String file) {
        try {
            return Files.readString(FOLDER.resolve(file)).strip();
        } catch (IOException cause) {
            throw new UncheckedIOException(cause);
        }
    }
}
