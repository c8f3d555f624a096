package spanwright.temporary;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.stream.IntStream;
import spanwright.circuits.Circuit;
import spanwright.circuits.PortRange;
import spanwright.network.Block;
import spanwright.network.BlockKind;
import spanwright.network.Network;
import spanwright.network.PathIndex;
import spanwright.splicing.EndKey;
import spanwright.splicing.LegKind;

/**
 * One glass path of a circuit: from a front or a splitter to a front or a splitter.
 *
 * @param path its number
 * @param from its end toward the circuit's a
 * @param to its end toward the circuit's z
 */
public record DarkLine(int path, int from, int to) {

    /** The most splitters that are crossed in a row. */
    private static final int DEEPEST = 8;

    /** The glass paths of one fiber of a circuit, from its a to its z; none where the records do not join the two. */
    static List<DarkLine> of(Network network, Circuit circuit, int fiber) {
        int a = network.endOf(front(circuit.a(), fiber));
        int z = network.endOf(front(circuit.z(), fiber));
        return a == Network.NONE || z == Network.NONE
                ? List.of()
                : climb(network, a, z, 0).orElse(List.of());
    }

    /** The key of the front where a fiber of a circuit ends. */
    static long front(PortRange ports, int fiber) {
        return EndKey.of(LegKind.FRONT, ports.panel(), ports.ports().at(fiber));
    }

    private static Optional<List<DarkLine>> climb(Network network, int a, int end, int depth) {
        PathIndex paths = network.paths();
        int path = paths.pathOf(end >> 1);
        int far = paths.firstEnd(path) == end ? paths.lastEnd(path) : paths.firstEnd(path);
        DarkLine line = new DarkLine(path, far, end);
        if (far == a) {
            return Optional.of(new ArrayList<>(List.of(line)));
        }
        Block block = network.blockOf(far >> 1);
        if (depth == DEEPEST || block.kind() != BlockKind.SPLITTER || (far & 1) == 0) {
            return Optional.empty();
        }
        boolean input = block.number(far >> 1) <= block.inputs();
        Optional<List<DarkLine>> above = IntStream.rangeClosed(
                        input ? block.inputs() + 1 : 1, input ? block.count() : block.inputs())
                .mapToObj(number -> climb(network, a, 2 * block.piece(number) + 1, depth + 1))
                .flatMap(Optional::stream)
                .findFirst();
        above.ifPresent(lines -> lines.add(line));
        return above;
    }

    /** Its pieces, splitters' terminals left out. */
    List<Integer> pieces(Network network) {
        return IntStream.of(network.paths().ends(path))
                .map(end -> end >> 1)
                .filter(piece -> network.blockOf(piece).kind() != BlockKind.SPLITTER)
                .boxed()
                .toList();
    }

    /** Whether an end of it is inside a splitter. */
    static boolean inSplitter(Network network, int end) {
        return network.blockOf(end >> 1).kind() == BlockKind.SPLITTER;
    }
}
