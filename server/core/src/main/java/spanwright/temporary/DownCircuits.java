package spanwright.temporary;

import java.util.List;
import spanwright.circuits.Circuit;
import spanwright.circuits.CircuitStatus;
import spanwright.network.Network;
import spanwright.network.Snapshot;
import spanwright.planning.SpareGlass;

/** Which working circuits closed plant takes down: those hit that no other of their protection group stands in for. */
public final class DownCircuits {

    private final SpareGlass glass;
    private final Network network;
    private final ClosedPlant closed;
    private final List<Circuit> working;

    private DownCircuits(Snapshot snapshot, ClosedPlant closed) {
        this.glass = new SpareGlass(snapshot);
        this.network = snapshot.network();
        this.closed = closed;
        this.working = snapshot.records()
                .circuits()
                .list()
                .filter(circuit -> circuit.status() == CircuitStatus.WORKING)
                .toList();
    }

    /** The circuits, as entered. */
    public static List<Circuit> of(Snapshot snapshot, ClosedPlant closed) {
        DownCircuits down = new DownCircuits(snapshot, closed);
        return down.working.stream()
                .filter(circuit -> down.isHit(circuit) && !down.isProtected(circuit))
                .toList();
    }

    private boolean isHit(Circuit circuit) {
        for (int fiber = 0; fiber < circuit.fibers(); fiber++) {
            if (DarkLine.of(network, circuit, fiber).stream().anyMatch(line -> closed.hits(line, glass::enclosure))) {
                return true;
            }
        }
        return false;
    }

    private boolean isProtected(Circuit circuit) {
        String group = circuit.protectionGroup();
        return group != null
                && working.stream()
                        .filter(other -> other.id() != circuit.id() && group.equals(other.protectionGroup()))
                        .anyMatch(other -> isWhole(other) && !isHit(other));
    }

    private boolean isWhole(Circuit circuit) {
        for (int fiber = 0; fiber < circuit.fibers(); fiber++) {
            if (DarkLine.of(network, circuit, fiber).isEmpty()) {
                return false;
            }
        }
        return true;
    }
}
