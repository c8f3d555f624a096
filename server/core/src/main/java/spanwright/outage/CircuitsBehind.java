package spanwright.outage;

import java.util.HashSet;
import java.util.Set;
import spanwright.circuits.Circuit;
import spanwright.circuits.CircuitStatus;
import spanwright.circuits.PortRange;
import spanwright.network.Block;
import spanwright.network.BlockKind;
import spanwright.network.Network;
import spanwright.network.PathIndex;
import spanwright.network.Snapshot;
import spanwright.planning.PathCircuits;
import spanwright.records.Records;
import spanwright.records.Relation;

/**
 * The working circuits that may run through glass paths: those that end on a front from which light can come there. A
 * path between two fronts that one circuit has to itself, as most that carry light, names it; only for the others are
 * splitters crossed and panels searched.
 */
final class CircuitsBehind {

    /** A panel with more circuits is put in order by port instead of being searched for each port. */
    private static final int MOST_SEARCHED = 48;

    private final Records records;
    private final Network network;
    private final PathIndex paths;
    private final PathCircuits byPort;
    private final IntGathering found = new IntGathering();
    private final Set<Integer> crossed = new HashSet<>();
    private final Set<Integer> searched = new HashSet<>();

    private CircuitsBehind(Snapshot snapshot) {
        this.records = snapshot.records();
        this.network = snapshot.network();
        this.paths = network.paths();
        this.byPort = new PathCircuits(snapshot);
    }

    /** Their identities, each once, rising. */
    static int[] of(Snapshot snapshot, int[] hitPaths) {
        CircuitsBehind behind = new CircuitsBehind(snapshot);
        for (int path : hitPaths) {
            behind.path(path);
        }
        return behind.found.distinct();
    }

    private void path(int path) {
        int alone = paths.circuitAlone(path);
        if (alone == 0) {
            reach(paths.firstEnd(path));
            reach(paths.lastEnd(path));
        } else {
            working(records.circuits().get(alone));
        }
    }

    private void working(Circuit circuit) {
        if (circuit.status() == CircuitStatus.WORKING) {
            found.add(circuit.id());
        }
    }

    /** Searches the front at a path's end, or goes on from the splitter there; glass that just ends is behind nothing. */
    private void reach(int end) {
        if ((end & 1) == 0) {
            return;
        }
        Block block = network.blockOf(end >> 1);
        if (block.kind() == BlockKind.PANEL && searched.add(end)) {
            front(block.owner(), block.number(end >> 1));
        } else if (block.kind() == BlockKind.SPLITTER && crossed.add(end >> 1)) {
            cross(block, end >> 1);
        }
    }

    private void cross(Block splitter, int terminal) {
        boolean input = splitter.number(terminal) <= splitter.inputs();
        int from = input ? splitter.inputs() + 1 : 1;
        int to = input ? splitter.count() : splitter.inputs();
        for (int number = from; number <= to; number++) {
            int inner = 2 * splitter.piece(number) + 1;
            int path = paths.pathOf(inner >> 1);
            reach(paths.firstEnd(path) == inner ? paths.lastEnd(path) : paths.firstEnd(path));
        }
    }

    private void front(int panel, int port) {
        int[] circuits = records.owned(Relation.PANEL_CIRCUITS, panel);
        if (circuits.length > MOST_SEARCHED) {
            byPort.endingOn(panel, port).forEach(this::working);
            return;
        }
        for (int id : circuits) {
            Circuit circuit = records.circuits().get(id);
            if (at(circuit.a(), panel, port) || at(circuit.z(), panel, port)) {
                working(circuit);
            }
        }
    }

    private static boolean at(PortRange ports, int panel, int port) {
        return ports.panel() == panel && ports.ports().contains(port);
    }
}
