package spanwright.trace;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import java.util.stream.Collectors;
import java.util.stream.IntStream;
import org.junit.jupiter.api.Test;
import spanwright.circuits.PortRange;
import spanwright.network.Snapshot;
import spanwright.plants.Drawing;

/** Walks stay within their bounds. */
class WalkerTest {

    private static final String FOUR_LEAVES = """
            cable F-1 1 : H1 10 H1B
            enclosure E1 H1 : F-1
            panel E1 P 2
            splitter E1 S1 1x2
            splitter E1 S2 1x2
            splitter E1 S3 1x2
            term E1/P/1 = S1 in direct
            splice E1 : S1 out 1 = S2 in
            splice E1 : S1 out 2 = F-1 ahead 1
            """;

    @Test
    void beyond_the_most_paths_a_walk_ends_before_the_splitter() {
        Snapshot plant = Drawing.of(FOUR_LEAVES);

        assertThat(ends(plant, 1, 100)).isEqualTo("S2 out 1 @ E1; S2 in @ E1; S1 in @ E1");
        assertThat(ends(plant, 3, 100)).isEqualTo("S2 out 1 @ E1; S2 out 2 @ E1; F-1 end 1");
    }

    @Test
    void beyond_the_most_splitters_a_walk_ends_before_the_next() {
        assertThat(ends(Drawing.of(FOUR_LEAVES), 100, 1)).isEqualTo("S2 in @ E1; F-1 end 1");
    }

    @Test
    void a_fiber_between_two_trees_of_splitters_stops_before_one_of_them_where_its_paths_are_too_many() {
        Snapshot plant = Drawing.of("""
                cable F-1 1 : H1 10 H2
                enclosure E1 H1 : F-1
                enclosure E2 H2 : F-1
                splitter E1 S1 1x4
                splitter E2 S2 1x4
                splice E1 : S1 in = F-1 ahead 1
                splice E2 : S2 in = F-1 back 1
                """);
        int cable = plant.records().cables().find("F-1").orElseThrow().id();

        assertThat(new Tracer(plant).ofFiber(cable, 1)).hasSize(16);
        List<Path> few = new Tracer(plant, new Walker(plant.network(), 15, 100), 1).ofFiber(cable, 1);
        assertThat(few.stream()
                        .map(path -> path.ends().get(0).name() + " to "
                                + path.ends().get(1).name()))
                .containsExactly(
                        "S1 out 1 @ E1 to S2 in @ E2",
                        "S1 out 2 @ E1 to S2 in @ E2",
                        "S1 out 3 @ E1 to S2 in @ E2",
                        "S1 out 4 @ E1 to S2 in @ E2");
    }

    /** Two inputs, two outputs, thirty in a row: a thousand million ways from the one end to the other. */
    @Test
    void a_lattice_of_splitters_is_searched_without_trying_every_way() {
        String lattice = "enclosure E1 H1\npanel E1 P 3\n"
                + IntStream.rangeClosed(1, 30)
                        .mapToObj(at -> "splitter E1 S" + at + " 2x2\n"
                                + (at == 1
                                        ? "term E1/P/1 = S1 in direct\n"
                                        : "splice E1 : S" + (at - 1) + " out 1 = S" + at + " in\nsplice E1 : S"
                                                + (at - 1) + " out 2 = S" + at + " in 2\n"))
                        .collect(Collectors.joining())
                + "term E1/P/2 = S30 out 2 direct\ncircuit C-1 E1/P/1 E1/P/2\ncircuit C-2 E1/P/1 E1/P/3\n";
        Snapshot plant = Drawing.of(lattice);

        assertThat(TraceText.ofCircuit(plant, "C-1"))
                .startsWith("E1/P/1 >> (E1/P/1) | S1 in>out 1 | S1 out 1 ~ S2 in")
                .endsWith("S30 in>out 2 | (E1/P/2) >> E1/P/2 complete C-1");
        assertThat(TraceText.ofCircuit(plant, "C-2")).isEqualTo("E1/P/1 >> (E1/P/1) >> S1 in @ E1");
        assertThat(ends(plant, 50, 100)).contains("S30 out 1 @ E1; E1/P/2; ").contains("; S1 in @ E1");
    }

    private static String ends(Snapshot plant, int mostWalks, int mostSplitters) {
        PortRange ports = Drawing.ports(plant.records(), "E1/P/1");
        Tracer tracer = new Tracer(plant, new Walker(plant.network(), mostWalks, mostSplitters), 1);
        return tracer.fromPort(ports.panel(), ports.ports().first()).stream()
                .map(path -> path.ends().get(1).name())
                .collect(Collectors.joining("; "));
    }

    @Test
    void a_long_walk_is_walked_to_its_end() {
        String rows = IntStream.rangeClosed(2, 200).mapToObj(at -> " 10 H" + at).collect(Collectors.joining());
        String enclosures = IntStream.rangeClosed(1, 200)
                .mapToObj(at -> "enclosure E" + at + " H" + at + " : F-1\n")
                .collect(Collectors.joining());
        Snapshot plant = Drawing.of("cable F-1 1 : H1" + rows + "\n" + enclosures);
        int cable = plant.records().cables().find("F-1").orElseThrow().id();

        Path path = new Tracer(plant).ofFiber(cable, 1).get(0);

        assertThat(path.count(ElementKind.FIBER)).isEqualTo(199);
        assertThat(path.count(ElementKind.THROUGH)).isEqualTo(198);
        assertThat(path.sheath().metres()).isEqualTo(1990);
    }
}
