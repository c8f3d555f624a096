package spanwright.planning;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.TreeMap;
import java.util.TreeSet;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import spanwright.circuits.Circuit;
import spanwright.circuits.CircuitStatus;
import spanwright.network.Block;
import spanwright.network.BlockKind;
import spanwright.network.Network;
import spanwright.network.Snapshot;
import spanwright.plants.Drawing;
import spanwright.plants.RandomPlant;
import spanwright.trace.Fiber;
import spanwright.trace.Path;
import spanwright.trace.Tracer;

class PathCircuitsTest {

    private static final String FEEDER = """
            structure H1 0 0
            structure H2 0.001 0
            structure H3 0.002 0
            cable F-1 4 : H1 100 H2 100 H3
            enclosure E1 H1 : F-1
            enclosure E2 H2 : F-1
            enclosure E3 H3 : F-1
            panel E1 P 4
            panel E3 P 4
            term E1/P/1-4 = F-1 ahead 1-4
            term E3/P/1-4 = F-1 back 1-4
            """;

    @Test
    void a_circuit_is_on_the_glass_between_its_ports_and_a_retired_one_on_none() {
        Snapshot snapshot = Drawing.of(FEEDER + """
                circuit C-2 E1/P/1 E3/P/1
                circuit C-1 E3/P/1 E1/P/1
                circuit C-3 E1/P/2 E3/P/2 retired
                circuit C-4 E1/P/3 E3/P/4
                """);
        PathCircuits circuits = new PathCircuits(snapshot);
        Block section = snapshot.network()
                .sectionsOf(
                        snapshot.records().cables().find("F-1").orElseThrow().id())
                .get(0);

        assertThat(codes(circuits.through(section.piece(1)))).containsExactly("C-1", "C-2");
        assertThat(circuits.through(section.piece(2))).isEmpty();
        assertThat(circuits.through(section.piece(3))).isEmpty();
    }

    @Test
    void behind_a_splitter_the_feeder_carries_all_and_each_output_its_own() {
        Snapshot snapshot = Drawing.of("""
                structure H1 0 0
                structure H2 0.001 0
                structure H3 0.002 0
                cable F-1 1 : H1 100 H2
                cable D-1 4 : H2 100 H3
                enclosure E1 H1 : F-1
                enclosure E2 H2 : F-1 D-1
                enclosure E3 H3 : D-1
                panel E1 P 1
                panel E3 P 4
                splitter E2 S1 1x4
                term E1/P/1 = F-1 ahead 1
                splice E2 : F-1 back 1 = S1 in
                splice E2 : S1 out 1-4 = D-1 ahead 1-4
                term E3/P/1-4 = D-1 back 1-4
                circuit C-1 E1/P/1 E3/P/1
                circuit C-2 E1/P/1 E3/P/2
                """);
        PathCircuits circuits = new PathCircuits(snapshot);
        Network network = snapshot.network();
        Block feeder = network.sectionsOf(1).get(0);
        Block distribution = network.sectionsOf(2).get(0);

        assertThat(codes(circuits.through(feeder.piece(1)))).containsExactly("C-1", "C-2");
        assertThat(codes(circuits.through(distribution.piece(1)))).containsExactly("C-1");
        assertThat(codes(circuits.through(distribution.piece(2)))).containsExactly("C-2");
        assertThat(circuits.through(distribution.piece(3))).isEmpty();
        assertThat(codes(circuits.endingOn(1, 1))).containsExactly("C-1", "C-2");
        assertThat(circuits.endingOn(2, 4)).isEmpty();
    }

    /** The slow twin traces every circuit and notes the glass that it meets. */
    @ParameterizedTest
    @ValueSource(longs = {1, 2, 3, 4, 5, 6, 7, 8, 9, 10, 11, 12, 13, 14, 15, 16, 17, 18, 19, 20})
    void agrees_with_tracing_every_circuit(long seed) {
        Snapshot snapshot = Snapshot.of(RandomPlant.of(seed).entered());
        Map<Integer, Set<String>> traced = traced(snapshot);
        PathCircuits circuits = new PathCircuits(snapshot);
        for (Block block : snapshot.network().blocks()) {
            if (block.kind() == BlockKind.SECTION) {
                for (int fiber = 1; fiber <= block.count(); fiber++) {
                    int piece = block.piece(fiber);
                    assertThat(codes(circuits.through(piece)))
                            .as("seed %s piece %s", seed, piece)
                            .containsExactlyInAnyOrderElementsOf(traced.getOrDefault(piece, Set.of()));
                }
            }
        }
    }

    private static Map<Integer, Set<String>> traced(Snapshot snapshot) {
        Map<Integer, Set<String>> traced = new TreeMap<>();
        Tracer tracer = new Tracer(snapshot);
        snapshot.records()
                .circuits()
                .list()
                .filter(circuit -> circuit.status() != CircuitStatus.RETIRED)
                .forEach(circuit -> {
                    for (Path path : tracer.ofCircuit(circuit)) {
                        if (path.complete()) {
                            path.list(Fiber.class)
                                    .forEach(fiber -> traced.computeIfAbsent(
                                                    piece(snapshot.network(), fiber), piece -> new TreeSet<>())
                                            .add(circuit.code()));
                        }
                    }
                });
        return traced;
    }

    private static int piece(Network network, Fiber fiber) {
        int first = Math.min(fiber.fromRow(), fiber.toRow());
        int row = fiber.lay().rows().get(first).id();
        return network.sectionAhead(row).orElseThrow().piece(fiber.fiber());
    }

    private static List<String> codes(List<Circuit> circuits) {
        return circuits.stream().map(Circuit::code).toList();
    }
}
