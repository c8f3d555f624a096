package spanwright.boot;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import com.fasterxml.jackson.databind.JsonNode;
import java.io.PrintWriter;
import java.io.StringWriter;
import java.nio.file.Path;
import java.util.stream.Stream;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import spanwright.cli.CommandLineProgram;

/** The command that places a reading, with all its parts, on folders worked by hand. */
class FaultCommandTest {

    private static final double FOOT = 0.3048;

    @TempDir
    private Path folder;

    private String records;

    @BeforeEach
    void name() {
        records = folder.resolve("records.db").toString();
    }

    private Ran run(String... args) {
        StringWriter out = new StringWriter();
        StringWriter err = new StringWriter();
        String[] all =
                Stream.concat(Stream.of(args), Stream.of("--records", records)).toArray(String[]::new);
        int status = CommandLineProgram.run(new Parts(), new PrintWriter(out), new PrintWriter(err), all);
        return new Ran(status, out.toString(), err.toString());
    }

    private void load(Path what) {
        assertThat(run("load", what.toString()).status()).isZero();
    }

    /** What a command did. */
    private record Ran(int status, String out, String err) {}

    /** Source: the worked example whose steps stand in the folder's README. */
    @Test
    void the_worked_example_comes_out_to_the_foot() {
        load(Cases.WORKED_OTDR);

        Ran json = run(
                "fault",
                "--port",
                "HE-1/P/1",
                "--distance",
                "7412",
                "--event",
                "C-S03=6038",
                "--event",
                "C-S04=8155",
                "--json");
        JsonNode place = Expected.read(json.out()).at("/places/0");

        Expected.assertHeldBy(
                Expected.read(json.out()), Expected.read(Cases.WORKED_OTDR.resolve("expected-fault.json")));
        assertThat(place.path("mark").path("value").asDouble()).isCloseTo(19_784, within(0.5));
        assertThat(place.path("beyond_before_m").asDouble() / FOOT).isCloseTo(136, within(0.5));
        // About 26 ft, or 8 m: so the example prints it.
        assertThat(place.path("within_m").asDouble()).isCloseTo(8, within(0.5));
        assertThat(place.has("may_be_in_slack_at")).isFalse();
        assertThat(place.has("over_m")).isFalse();
        assertThat(json.err()).isEmpty();
    }

    @Test
    void events_may_follow_one_another_and_the_sentence_is_what_a_dispatcher_says() {
        load(Cases.WORKED_OTDR);

        Ran table = run("fault", "--port", "HE-1/P/1", "--distance", "7412", "--event", "C-S03=6038", "C-S04=8155");

        assertThat(table.status()).isZero();
        assertThat(table.out())
                .startsWith("Between HH-S044 and HH-S045, 136 ft past HH-S044, within 25 ft; mark 19,784 ft (white).")
                .contains("one standard", "not a locate");
    }

    @Test
    void the_window_is_twice_the_root_of_its_causes_and_shrinks_with_events() {
        load(Cases.WORKED_OTDR);

        JsonNode with = Expected.read(run(
                                "fault",
                                "--port",
                                "HE-1/P/1",
                                "--distance",
                                "7412",
                                "--event",
                                "C-S03=6038",
                                "C-S04=8155",
                                "--json")
                        .out())
                .at("/places/0");
        JsonNode without = Expected.read(run("fault", "--port", "HE-1/P/1", "--distance", "7412", "--json")
                        .out())
                .at("/places/0");

        for (JsonNode place : new JsonNode[] {with, without}) {
            double squares = 0;
            for (JsonNode cause : place.path("within")) {
                squares += cause.asDouble() * cause.asDouble();
            }
            assertThat(place.path("within_m").asDouble()).isCloseTo(2 * Math.sqrt(squares), within(2e-6));
        }
        assertThat(with.path("within_m").asDouble())
                .isLessThan(without.path("within_m").asDouble() / 4);
        assertThat(without.path("may_be_in_slack_at").asText()).isEqualTo("HH-S044");
        assertThat(without.path("window").size()).isGreaterThan(2);
    }

    private static final String[] BACKHOE = {
        "fault",
        "--port",
        "HE-1/FDR-S/72",
        "--distance",
        "7412",
        "--event",
        "C-S03=6038",
        "C-S04=8155",
        "--far-port",
        "HUT-S/FDR-S/12",
        "--far-distance",
        "5334"
    };

    /** The marks are those of {@code demo-data/stories/1-backhoe/readings.csv}, by the generator's own arithmetic. */
    @Test
    void the_backhoe_of_the_demo_is_found_from_both_ends() {
        load(Cases.DEMO);

        JsonNode both = Expected.read(
                run(Stream.concat(Stream.of(BACKHOE), Stream.of("--json")).toArray(String[]::new))
                        .out());
        Ran table = run(BACKHOE);

        JsonNode near = both.at("/places/0");
        assertThat(near.path("span").asText()).isEqualTo("HH-S044_HH-S045");
        assertThat(near.at("/mark/value").asDouble()).isCloseTo(19_783.6, within(0.5));
        assertThat(near.path("beyond_before_m").asDouble() / FOOT).isCloseTo(136.4, within(0.5));
        assertThat(near.path("within_m").asDouble() / FOOT).isCloseTo(26, within(1.0));
        assertSecondBreak(both.path("between"));
        assertThat(table.out()).contains("within 26 ft", "From the far end: ", "40 ft of cable");
        assertThat(table.out().lines())
                .allSatisfy(line -> assertThat(line.length()).as(line).isLessThanOrEqualTo(100));
        // FDR-N-3 was marked anew in yellow feet: these govern.
        assertThat(Expected.read(run("fault", "--port", "HUT-N/FDR-N/20", "--distance", "500", "--json")
                                .out())
                        .at("/places/0/mark/ink")
                        .asText())
                .isEqualTo("yellow");
    }

    private static void assertSecondBreak(JsonNode between) {
        assertThat(between.at("/to/mark/value").asDouble()).isCloseTo(19_743.6, within(0.5));
        assertThat(between.at("/to/structure_before").asText()).isEqualTo("HH-S045");
        assertThat(between.at("/to/short_of_after_m").asDouble() / FOOT).isCloseTo(176.4, within(0.5));
        assertThat(between.path("sheath_m").asDouble() / FOOT).isCloseTo(40, within(1.0));
        assertThat(between.path("one_break").asBoolean()).isFalse();
    }

    @Test
    void an_end_in_an_enclosure_may_be_shot() {
        load(Cases.WORKED_OTDR);

        JsonNode ahead = Expected.read(run(
                                "fault",
                                "--from",
                                "FDR-S-2 ahead 3 @ C-S03",
                                "--distance",
                                "102.5",
                                "--to",
                                "HUT-S/P/3",
                                "--json")
                        .out())
                .at("/places/0");
        JsonNode bare = Expected.read(run("fault", "--from", "FDR-S-2 start 3", "--distance", "102.5", "--json")
                        .out())
                .at("/places/0");

        // 1.5 m of tray glass, then 101 / 1.01 = 100 m of sheath.
        assertThat(ahead.path("sheath_position_m").asDouble()).isCloseTo(100, within(1e-6));
        assertThat(ahead.path("structure_before").asText()).isEqualTo("HH-S037");
        assertThat(bare.path("sheath_position_m").asDouble()).isCloseTo(100, within(1e-6));
    }

    @Test
    void what_cannot_be_placed_says_what_would_be_right() {
        load(Cases.WORKED);

        assertWrong("within the launch fiber", "--port", "E1/P/1", "--distance", "5", "--launch", "6");
        assertWrong("does not reach E4/T/4", "--port", "E1/P/1", "--distance", "5", "--to", "E4/T/4");
        assertWrong(
                "gives no group index at 1700 nm",
                "--port",
                "E1/P/1",
                "--distance",
                "5",
                "--index",
                "1.468",
                "--wavelength",
                "1700");
        assertWrong("There is no enclosure E7.", "--port", "E1/P/1", "--distance", "5", "--event", "E7=3");
        assertWrong("does not come to E4", "--from", "F-1 back 1 @ E3", "--distance", "5", "--event", "E4=1");
        assertWrong("is not a known event", "--port", "E1/P/1", "--distance", "5", "--event", "E2");
        assertWrong("ports 1 to 2, not 3", "--port", "E1/P/3", "--distance", "5");
        assertWrong("not a distance", "--port", "E1/P/1", "--distance", "-5");
        assertWrong("not a group index", "--port", "E1/P/1", "--distance", "5", "--index", "0");
        assertWrong("is not an end", "--from", "F-1 up 3 @ E1", "--distance", "5");
        assertWrong("begins in E1", "--from", "F-1 back 3 @ E1", "--distance", "5");
        assertWrong("is not in E4", "--from", "F-1 back 3 @ E4", "--distance", "5");
        assertWrong("fibers 1 to 24, not 25", "--from", "F-1 ahead 25 @ E1", "--distance", "5");
        assertWrong("no splitter S2 in E3. Is S1 meant?", "--from", "S2 in @ E3", "--distance", "5");
        assertWrong("outputs 1 to 4, not 5", "--from", "S1 out 5 @ E3", "--distance", "5");
        assertWrong("needs its port", "--port", "E1/P/1", "--distance", "5", "--far-distance", "7");
        assertThat(run("fault", "--distance", "5").status()).isEqualTo(2);
        assertThat(run("fault", "--port", "E1/P/1").status()).isEqualTo(2);
        assertThat(run("fault", "--port", "E1/P/1", "--from", "S1 in @ E3", "--distance", "5")
                        .status())
                .isEqualTo(2);
    }

    private void assertWrong(String sentence, String... asked) {
        Ran ran = run(Stream.concat(Stream.of("fault"), Stream.of(asked)).toArray(String[]::new));
        assertThat(ran.err()).contains(sentence);
        assertThat(ran.status()).isEqualTo(1);
        assertThat(ran.out()).isEmpty();
    }

    @Test
    void behind_a_splitter_each_way_is_named() {
        load(Cases.WORKED);

        Ran table = run("fault", "--port", "E1/P/1", "--distance", "2300");

        assertThat(table.out()).contains("Toward E4/T/1: ", "Toward E4/T/3: ").doesNotContain("S1 out 4");
        assertThat(run("fault", "--port", "E1/P/1", "--distance", "2300", "--as-if", "J-1")
                        .out())
                .contains("Toward E4/T/5: ", "as if J-1 were built");
        assertThat(run("fault", "--port", "E1/P/1", "--distance", "9000").out()).contains("Past the end of the path");
        assertThat(run("fault", "--port", "E1/P/1", "--distance", "1075").out()).contains("In the coil of 30.9 m at B");
        assertThat(run("fault", "--port", "E1/P/1", "--distance", "2153").out()).contains("At C, in tray glass");
    }
}
