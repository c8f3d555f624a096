package spanwright.planning;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import java.util.stream.Collectors;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import spanwright.network.Block;
import spanwright.network.Network;
import spanwright.network.Snapshot;
import spanwright.plants.Drawing;
import spanwright.records.Records;

/** Options of spare fibers on plants drawn by hand, the whole answer as text. */
class SpareOptionsTest {

    /** F-1 from port to C, D-1 on to port at the seed works: A - B - C, and a detour A - D - C. */
    private static final String PLANT = """
            structure A 0 0
            structure B 0.01 0
            structure C 0.02 0
            structure D 0.01 0.01
            cable F-1 12 : A 1000 B
            cable G-1 12 : B 1000 C
            cable N-1 12 : A 3000 D 3000 C
            enclosure EA A : F-1 N-1
            enclosure EB B : F-1 G-1
            enclosure EC C : G-1 N-1
            panel EA P 24
            panel EC P 24
            term EA/P/1-12 = F-1 ahead 1-12 trust=verified
            term EC/P/1-12 = G-1 back 1-12 trust=verified
            term EA/P/13-24 = N-1 ahead 1-12
            term EC/P/13-24 = N-1 back 1-12
            """;

    private static String options(
            Snapshot snapshot, String from, String to, int fibers, boolean sameTube, Avoided avoided) {
        Records records = snapshot.records();
        SpareQuestion question = new SpareQuestion(
                records.structures().find(from).orElseThrow().id(),
                records.structures().find(to).orElseThrow().id(),
                fibers,
                sameTube,
                avoided);
        return new SpareOptions(snapshot)
                .list(question).stream().map(option -> text(snapshot, option)).collect(Collectors.joining("\n"));
    }

    private static String options(String plant, int fibers) {
        return options(Drawing.of(plant), "A", "C", fibers, false, Avoided.NOTHING);
    }

    private static String text(Snapshot snapshot, SpareOption option) {
        List<String> opened = option.opened().stream()
                .map(enclosure -> snapshot.records().enclosures().get(enclosure).code())
                .toList();
        List<String> spans = option.spans().stream()
                .map(span -> snapshot.records().spans().get(span).code())
                .toList();
        return option.runs().stream().map(run -> text(snapshot, run)).toList() + " opens " + opened + " splices "
                + option.cost().splices() + " jumpers " + option.jumpers() + " unverified "
                + option.cost().unverified() + " " + option.glass().metres() + " m " + option.loss() + " "
                + (option.sameTube() ? "one tube" : "tubes") + " " + spans;
    }

    private static String text(Snapshot snapshot, SpareRun run) {
        Network network = snapshot.network();
        return run.entered().stream()
                .map(end -> {
                    Block block = network.blockOf(end >> 1);
                    return snapshot.records().cables().get(block.owner()).code() + ":" + block.number(end >> 1);
                })
                .collect(Collectors.joining(" "));
    }

    @Test
    void glass_that_is_joined_through_comes_first_and_the_run_side_by_side_of_it() {
        String plant = PLANT + """
                splice EB : F-1 back 1-2 = G-1 ahead 1-2 trust=verified
                splice EB : F-1 back 4-9 = G-1 ahead 4-9 trust=verified
                """;

        assertThat(options(plant, 3)).isEqualTo("""
                [F-1:4 G-1:4, F-1:5 G-1:5, F-1:6 G-1:6] opens [] splices 0 jumpers 0 unverified 0 2000.0 m 0.74 dB one tube [A-B, B-C]
                [N-1:1, N-1:2, N-1:3] opens [] splices 0 jumpers 0 unverified 6 6000.0 m 1.52 dB one tube [A-D, D-C]""");
    }

    @Test
    void an_enclosure_is_opened_only_for_what_does_not_go_through() {
        String plant = PLANT + """
                splice EB : F-1 back 1-2 = G-1 ahead 1-2 trust=verified
                state EB : F-1 back 3-12 = stored
                state EB : G-1 ahead 3-12 = stored
                flag N-1 1-12 reserved
                """;

        assertThat(options(plant, 3))
                .isEqualTo("[F-1:1 G-1:1, F-1:2 G-1:2, F-1:3 G-1:3] opens [EB] splices 1 jumpers 0"
                        + " unverified 0 2000.0 m 0.74 dB one tube [A-B, B-C]");
        assertThat(options(plant, 13)).isEmpty();
    }

    /** F-1 is spliced on to R-1, which is another's; G-1 is spare, and would need that splice undone. */
    @ParameterizedTest
    @ValueSource(strings = {"reserved", "leased"})
    void a_joint_to_a_fiber_that_is_somebody_else_s_is_not_undone(String flag) {
        String plant = """
                structure A 0 0
                structure B 0.01 0
                structure C 0.02 0
                structure D 0.01 0.01
                cable F-1 2 : A 1000 B
                cable G-1 2 : B 1000 C
                cable R-1 2 : B 1000 D
                enclosure EA A : F-1
                enclosure EB B : F-1 G-1 R-1
                enclosure EC C : G-1
                enclosure ED D : R-1
                panel EA P 2
                panel EC P 2
                term EA/P/1-2 = F-1 ahead 1-2 trust=verified
                term EC/P/1-2 = G-1 back 1-2 trust=verified
                splice EB : F-1 back 1-2 = R-1 ahead 1-2 trust=verified
                state EB : G-1 ahead 1-2 = stored trust=verified
                state ED : R-1 back 1-2 = stored trust=verified
                """;

        assertThat(options(plant + "flag R-1 1-2 dead", 1)).contains("splices 1");
        assertThat(options(plant + "flag R-1 1-2 " + flag, 1)).isEmpty();
        assertThat(options(plant + "flag R-1 1 " + flag + "\nflag R-1 2 dead", 1))
                .contains("F-1:2");
    }

    @Test
    void unknown_dead_reserved_leased_suspect_and_jumpered_glass_is_never_offered() {
        String plant = PLANT + """
                panel EA X 2
                splice EB : F-1 back 1-6 = G-1 ahead 1-6 trust=verified
                splice EB : F-1 back 7 = G-1 ahead 7 trust=unknown
                splice EB : F-1 back 9 = G-1 ahead 9
                flag F-1 1 dead
                flag F-1 2 reserved
                flag F-1 3 leased
                flag F-1 4 suspect
                jumper EA/P/5 = EA/X/1
                circuit C-1 EA/P/6 EC/P/6
                flag N-1 1-12 reserved
                """;

        assertThat(options(plant, 1))
                .isEqualTo("[F-1:9 G-1:9] opens [] splices 0 jumpers 0 unverified 1 2000.0 m"
                        + " 0.74 dB one tube [A-B, B-C]");
        assertThat(options(plant, 2)).isEmpty();
    }

    @Test
    void one_tube_throughout_each_cable_where_it_is_wished() {
        String plant =
                PLANT.replace("cable F-1 12", "cable F-1 12 tube=6").replace("cable G-1 12", "cable G-1 12 tube=6")
                        + """
                splice EB : F-1 back 1 = G-1 ahead 1 trust=verified
                splice EB : F-1 back 2-6 = G-1 ahead 8-12 trust=verified
                splice EB : F-1 back 7 = G-1 ahead 7
                splice EB : F-1 back 8 = G-1 ahead 6
                flag F-1 3-6 dead
                flag N-1 1-12 reserved
                """;
        Snapshot snapshot = Drawing.of(plant);

        assertThat(options(snapshot, "A", "C", 2, false, Avoided.NOTHING))
                .startsWith("[F-1:1 G-1:1, F-1:2 G-1:8] opens [] splices 0 jumpers 0 unverified 0")
                .contains(" tubes ");
        assertThat(options(snapshot, "A", "C", 2, true, Avoided.NOTHING))
                .startsWith("[F-1:1 G-1:7, F-1:2 G-1:8] opens [EB] splices 1")
                .contains(" one tube ");
    }

    @Test
    void a_circuit_is_avoided_with_its_spans_and_enclosures_but_for_those_at_the_ends() {
        String plant = PLANT + """
                splice EB : F-1 back 1-12 = G-1 ahead 1-12
                circuit C-1 EA/P/1 EC/P/1
                """;
        Snapshot snapshot = Drawing.of(plant);
        Avoided circuit =
                Avoided.of(snapshot, snapshot.records().circuits().find("C-1").orElseThrow());

        assertThat(options(snapshot, "A", "C", 1, false, circuit))
                .isEqualTo("[N-1:1] opens [] splices 0 jumpers 0 unverified 2 6000.0 m 1.52 dB one tube [A-D, D-C]");
        assertThat(options(snapshot, "B", "C", 1, false, circuit)).isEmpty();
    }

    @Test
    void ports_on_the_way_are_joined_by_a_jumper_rather_than_a_splice() {
        String plant = PLANT + """
                panel EB P 24
                term EB/P/1-12 = F-1 back 1-12
                term EB/P/13-24 = G-1 ahead 1-12
                flag N-1 1-12 dead
                """;

        assertThat(options(plant, 2))
                .startsWith("[F-1:1 G-1:1, F-1:2 G-1:2] opens [] splices 0 jumpers 2 unverified 4 2003.0 m");
    }

    @Test
    void cables_side_by_side_are_one_bundle() {
        String plant = """
                structure A 0 0
                structure C 0.02 0
                cable F-1 2 : A 1000 C
                cable F-2 2 : A 1000 C
                enclosure EA A : F-1 F-2
                enclosure EC C : F-1 F-2
                state EA : F-1 ahead 1-2 = stored
                state EC : F-1 back 1-2 = stored
                state EA : F-2 ahead 1-2 = stored
                state EC : F-2 back 1-2 = stored
                flag F-1 1 dead
                flag F-2 2 dead
                """;

        assertThat(options(plant, 2))
                .isEqualTo("[F-1:2, F-2:1] opens [] splices 0 jumpers 0 unverified 0 1000.0 m 0.22 dB one tube [A-C]");
    }
}
