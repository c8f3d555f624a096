package spanwright.planning;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.HashMap;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.stream.IntStream;
import spanwright.circuits.Circuit;
import spanwright.circuits.CircuitStatus;
import spanwright.circuits.PortRange;
import spanwright.network.Block;
import spanwright.network.BlockKind;
import spanwright.network.Network;
import spanwright.network.PathIndex;
import spanwright.network.Snapshot;
import spanwright.records.Records;
import spanwright.records.Relation;
import spanwright.splicing.EndKey;
import spanwright.splicing.LegKind;

/**
 * The circuits that live on a glass path: those with one of their ports behind its one end and the other behind its
 * other end, splitters crossed. Retired circuits use nothing. What was asked is kept, so one of these serves one
 * question or a few; one thread's.
 *
 * <p>Lost to this: tracing every circuit once and keeping the paths that each takes, which every posting outdates.
 */
public final class PathCircuits {

    /** The order in which circuits are restored, then by code. */
    private static final Comparator<Circuit> FIRST_RESTORED =
            Comparator.comparingInt(Circuit::priority).thenComparing(Circuit::code);

    private final Records records;
    private final Network network;
    private final Map<Integer, List<Circuit>> ofPath = new HashMap<>();
    private final Map<Integer, Map<Integer, List<Landing>>> onPanel = new HashMap<>();

    /** The circuits of a snapshot. */
    public PathCircuits(Snapshot snapshot) {
        this.records = snapshot.records();
        this.network = snapshot.network();
    }

    /** The circuits on a piece's glass path, by priority, then by code; none for a dead piece. */
    public List<Circuit> through(int piece) {
        int path = network.paths().pathOf(piece);
        return path == Network.NONE ? List.of() : ofPath.computeIfAbsent(path, this::find);
    }

    private List<Circuit> find(int path) {
        PathIndex paths = network.paths();
        if (paths.circle(path)) {
            return List.of();
        }
        Set<Long> one = new HashSet<>();
        Set<Long> other = new HashSet<>();
        reach(paths.firstEnd(path), one, new HashSet<>());
        reach(paths.lastEnd(path), other, new HashSet<>());
        Set<Long> few = one.size() <= other.size() ? one : other;
        Set<Long> many = few == one ? other : one;
        return few.stream()
                .flatMap(port -> landings(port).stream())
                .filter(landing -> many.contains(landing.far))
                .map(Landing::circuit)
                .distinct()
                .sorted(FIRST_RESTORED)
                .toList();
    }

    /** Gathers the keys of all fronts that light leaving by a path's end comes to, that end itself among them. */
    private void reach(int end, Set<Long> fronts, Set<Integer> crossed) {
        int piece = end >> 1;
        Block block = network.blockOf(piece);
        if (block.kind() == BlockKind.PANEL) {
            long key = network.keyOf(end);
            if (EndKey.kind(key) == LegKind.FRONT) {
                fronts.add(key);
            }
        } else if (block.kind() == BlockKind.SPLITTER && (end & 1) == 1 && crossed.add(piece)) {
            boolean input = block.number(piece) <= block.inputs();
            int from = input ? block.inputs() + 1 : 1;
            int to = input ? block.count() : block.inputs();
            for (int terminal = from; terminal <= to; terminal++) {
                reach(farEnd(block.piece(terminal)), fronts, crossed);
            }
        }
    }

    /** The other end of the path that begins inside of a splitter's terminal. */
    private int farEnd(int terminal) {
        PathIndex paths = network.paths();
        int path = paths.pathOf(terminal);
        int inner = 2 * terminal + 1;
        return paths.firstEnd(path) == inner ? paths.lastEnd(path) : paths.firstEnd(path);
    }

    private List<Landing> landings(long port) {
        return onPanel.computeIfAbsent(EndKey.owner(port), this::landingsOn)
                .getOrDefault(EndKey.number(port), List.of());
    }

    private Map<Integer, List<Landing>> landingsOn(int panel) {
        Map<Integer, List<Landing>> byPort = new HashMap<>();
        records.circuits()
                .owned(Relation.PANEL_CIRCUITS, panel)
                .filter(circuit -> circuit.status() != CircuitStatus.RETIRED)
                .forEach(circuit -> {
                    land(byPort, panel, circuit, circuit.a(), circuit.z());
                    land(byPort, panel, circuit, circuit.z(), circuit.a());
                });
        return byPort;
    }

    private static void land(
            Map<Integer, List<Landing>> byPort, int panel, Circuit circuit, PortRange near, PortRange far) {
        if (near.panel() == panel) {
            IntStream.range(0, near.ports().count())
                    .forEach(index -> byPort.computeIfAbsent(near.ports().at(index), port -> new ArrayList<>())
                            .add(new Landing(
                                    circuit,
                                    EndKey.of(
                                            LegKind.FRONT,
                                            far.panel(),
                                            far.ports().at(index)))));
        }
    }

    /** The circuits that end on a port's front, retired ones left out, by priority, then by code. */
    public List<Circuit> endingOn(int panel, int port) {
        return landings(EndKey.of(LegKind.FRONT, panel, port)).stream()
                .map(Landing::circuit)
                .distinct()
                .sorted(FIRST_RESTORED)
                .toList();
    }

    /** A circuit's end on a port, and the key of the front where its fiber ends. */
    private record Landing(Circuit circuit, long far) {}
}
