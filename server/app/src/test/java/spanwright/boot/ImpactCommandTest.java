package spanwright.boot;

import static org.assertj.core.api.Assertions.assertThat;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import java.io.IOException;
import java.io.PrintWriter;
import java.io.StringWriter;
import java.nio.file.Path;
import java.util.Arrays;
import java.util.stream.Stream;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import spanwright.cli.CommandLineProgram;

/**
 * The command on the folder worked by hand: C-1 runs from E1 over F-1:1, uncut through E2, to the splitter in E3 and over
 * D-1:2 to E4; C-2, loaded later, the same but for D-1:3.
 */
class ImpactCommandTest {

    @TempDir
    private Path folder;

    private String records;

    private final StringWriter out = new StringWriter();
    private final StringWriter err = new StringWriter();

    @BeforeEach
    void load() {
        records = folder.resolve("records.db").toString();
        for (Path each : new Path[] {Cases.WORKED, Cases.WORKED_LATER}) {
            assertThat(run("load", each.toString())).isZero();
        }
        out.getBuffer().setLength(0);
        err.getBuffer().setLength(0);
    }

    private int run(String... args) {
        String[] all = Stream.concat(Arrays.stream(args), Stream.of("--records", records))
                .toArray(String[]::new);
        return CommandLineProgram.run(new Parts(), new PrintWriter(out), new PrintWriter(err), all);
    }

    private int impact(String options) {
        return run(("impact " + options).split(" "));
    }

    @ParameterizedTest
    @CsvSource({
        "--span S-1, 'C-1 F-1:1; C-2 F-1:1', 24",
        "--span S-3, 'C-1 D-1:2; C-2 D-1:3', 6",
        "--structure B, 'C-1 F-1:1 E2; C-2 F-1:1 E2', 24",
        "--structure C, 'C-1 F-1:1 E3 D-1:2; C-2 F-1:1 E3 D-1:3', 30",
        "--enclosure E2, 'C-1 E2; C-2 E2', 0",
        "--enclosure E4, 'C-1 E4; C-2 E4', 0",
        "--cable F-1 --tube 2, '', 12",
        "--cable F-1 --tube 1 --tube 2, 'C-1 F-1:1; C-2 F-1:1', 24",
        "--cable F-1 --span S-3 --tube 2, 'C-1 D-1:2; C-2 D-1:3', 18",
        "--cable F-1 --tube 2 --cable F-1, 'C-1 F-1:1; C-2 F-1:1', 24",
        "--cable D-1 --enclosure E1, 'C-1 E1 D-1:2; C-2 E1 D-1:3', 6",
        "--place D-1@250, 'C-1 D-1:2; C-2 D-1:3', 6"
    })
    void what_is_cut_takes_down_what_lives_on_it(String options, String expected, int fibers) throws IOException {
        assertThat(impact(options + " --json")).as("%s", err).isZero();

        JsonNode answer = new ObjectMapper().readTree(out.toString());
        StringBuilder found = new StringBuilder();
        for (JsonNode circuit : answer.path("circuits")) {
            found.append(found.isEmpty() ? "" : "; ")
                    .append(circuit.path("circuit").asText());
            circuit.path("at").forEach(at -> found.append(' ').append(at.asText()));
            assertThat(circuit.path("state").asText()).isEqualTo("down");
        }
        assertThat(found).hasToString(expected);
        assertThat(answer.path("fibers_cut").asInt()).isEqualTo(fibers);
        assertThat(answer.path("customers_down").asInt()).isEqualTo(expected.isEmpty() ? 0 : 2);
    }

    @Test
    void before_the_second_circuit_was_posted_one_is_hit() throws IOException {
        assertThat(impact("--span S-1 --json --as-of 1")).isZero();

        assertThat(new ObjectMapper().readTree(out.toString()).path("circuits")).hasSize(1);
    }

    @Test
    void a_person_reads_a_table_of_100_columns() {
        assertThat(impact("--span S-1")).isZero();

        assertThat(out.toString()).contains("C-1", "access", "2 circuits down", "24 fibers cut");
        assertThat(out.toString().lines()).allSatisfy(line -> assertThat(line).hasSizeLessThanOrEqualTo(100));
    }

    @ParameterizedTest
    @CsvSource({
        "--span S-9, 1, There is no span S-9",
        "--cable F-1 --tube 3, 1, 'tubes 1 to 2, not 3'",
        "--place D-1@501, 1, 500 m of sheath",
        "--tube 1, 2, name the cable first",
        "--json, 2, Missing required"
    })
    void what_is_wrong_is_said(String options, int status, String sentence) {
        assertThat(impact(options)).isEqualTo(status);

        assertThat(out.toString()).isEmpty();
        assertThat(err.toString()).contains(sentence);
    }
}
