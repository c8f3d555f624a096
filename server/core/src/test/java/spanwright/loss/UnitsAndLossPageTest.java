package spanwright.loss;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** The page that names every constant with its source says what the tables say. */
class UnitsAndLossPageTest {

    private static final Path ROOT = Path.of("../..");

    @ParameterizedTest
    @ValueSource(strings = {"planning_values", "budget_classes", "fiber_types", "reporting_thresholds"})
    void every_row_of_a_built_in_table_stands_on_the_page_with_its_numbers(String table) throws IOException {
        List<String> page = Files.readAllLines(ROOT.resolve("docs/UNITS-AND-LOSS.md"));

        rows(table)
                .forEach(row -> assertThat(page)
                        .as(String.join(",", row))
                        .anySatisfy(line -> assertThat(cells(line)).containsAll(row)));
    }

    private static Stream<List<String>> rows(String table) throws IOException {
        List<String> lines = Files.readAllLines(ROOT.resolve("schema/built-in/" + table + ".csv"));
        List<String> header = List.of(lines.get(0).split(","));
        return lines.stream().skip(1).map(line -> {
            String[] cells = line.split(",", -1);
            return Stream.iterate(0, at -> at < header.size(), at -> at + 1)
                    .filter(at -> isShown(header.get(at)))
                    .map(at -> cells[at])
                    .filter(cell -> !cell.isEmpty())
                    .toList();
        });
    }

    /** Sources are named by their text on the page; what all rows of a fiber type share stands above its table. */
    private static boolean isShown(String column) {
        return !column.endsWith("source")
                && !List.of("fiber_type", "zero_dispersion_nm", "dispersion_slope", "pmd_ps_per_sqrt_km")
                        .contains(column);
    }

    private static List<String> cells(String line) {
        return Stream.of(line.split("\\|"))
                .map(cell -> cell.strip().replace("`", ""))
                .toList();
    }
}
