package spanwright.exchange;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.stream.Stream;
import org.assertj.core.api.SoftAssertions;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import spanwright.network.Snapshot;

/**
 * Every folder of {@code demo-data/cases/broken} is refused with the faults that its {@code faults.txt} lists: file
 * and line exactly and in order, and of the sentence a part.
 */
class BrokenFolderTest {

    private static final Path CASES = Path.of(System.getProperty("repository.root"), "demo-data", "cases", "broken");

    static Stream<String> cases() throws IOException {
        try (Stream<Path> folders = Files.list(CASES)) {
            return folders.map(folder -> folder.getFileName().toString()).sorted().toList().stream();
        }
    }

    @Test
    void there_are_as_many_cases_as_there_are_kinds_of_fault_and_more() throws IOException {
        assertThat(cases().count()).isGreaterThanOrEqualTo(60);
    }

    @ParameterizedTest
    @MethodSource("cases")
    void is_refused_with_every_fault_in_its_place(String name) throws IOException {
        Path folder = CASES.resolve(name);
        List<String> expected = Files.readAllLines(folder.resolve("faults.txt"));
        List<String> found = FolderLoad.load(folder, Snapshot.empty().edit(), FolderLoad.Progress.NONE).stream()
                .map(Fault::toString)
                .toList();
        assertThat(places(found)).as(String.join("\n", found)).isEqualTo(places(expected));
        SoftAssertions softly = new SoftAssertions();
        for (int index = 0; index < expected.size(); index++) {
            String part =
                    expected.get(index).substring(places(expected).get(index).length() + 2);
            softly.assertThat(found.get(index)).contains(part);
        }
        softly.assertAll();
    }

    private static List<String> places(List<String> faults) {
        List<String> places = new ArrayList<>();
        for (String fault : faults) {
            String[] parts = fault.split(": ", 2);
            places.add(parts[0]);
        }
        return places;
    }
}
