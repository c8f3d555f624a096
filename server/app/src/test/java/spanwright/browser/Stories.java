package spanwright.browser;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.stream.IntStream;
import java.util.stream.Stream;

/** What arrives from outside in the demo's stories: lists of alarms as one pastes them, and what they should come to. */
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

    /** The rows of a story's table, its header apart; a comma stands only between two cells, or in the last of two. */
    static List<String[]> rows(String file) {
        return text(file)
                .lines()
                .skip(1)
                .map(line -> line.replace("\"", "").split(",", 2))
                .toList();
    }

    /** What each fact of a story comes to; a unit after it is left out. */
    static Map<String, String> facts(String file) {
        Map<String, String> facts = new LinkedHashMap<>();
        text(file).lines().skip(1).forEach(line -> {
            String[] cells = line.split(",(?=(?:[^\"]*\"[^\"]*\")*[^\"]*$)", -1);
            facts.put(cells[0].replace("\"", ""), cells[1].replace("\"", ""));
        });
        return facts;
    }

    /** Numbers and ranges parted by spaces, such as {@code 234-235 237}. */
    static List<Integer> numbers(String ranges) {
        return Stream.of(ranges.split(" ", -1))
                .map(range -> range.split("-", -1))
                .flatMap(range -> IntStream.rangeClosed(
                                Integer.parseInt(range[0]), Integer.parseInt(range[range.length - 1]))
                        .boxed())
                .toList();
    }
}
