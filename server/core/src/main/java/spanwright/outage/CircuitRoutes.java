package spanwright.outage;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import spanwright.circuits.Circuit;
import spanwright.circuits.PortRange;
import spanwright.network.Network;
import spanwright.splicing.EndKey;
import spanwright.splicing.LegKind;

/**
 * The ways that circuits take, the same that a trace of each circuit gives. What was asked is kept, so one of these
 * serves one question; one thread's.
 */
final class CircuitRoutes {

    private final Network network;
    private final Map<Integer, Ways> from = new HashMap<>();

    CircuitRoutes(Network network) {
        this.network = network;
    }

    /** The routes of a circuit, one a fiber; where none joins its ports, the one from its a as far as it is plain. */
    List<Route> of(Circuit circuit) {
        List<Route> routes = new ArrayList<>();
        for (int index = 0; index < circuit.fibers(); index++) {
            int a = front(circuit.a(), index);
            int z = front(circuit.z(), index);
            if (a == Network.NONE) {
                routes.add(Route.NOWHERE);
            } else {
                Optional<Route> joined = z == Network.NONE ? Optional.empty() : ways(a).find(z);
                routes.add(joined.orElseGet(() -> ways(a).plain()));
            }
        }
        return routes;
    }

    private int front(PortRange ports, int index) {
        return network.endOf(
                EndKey.of(LegKind.FRONT, ports.panel(), ports.ports().at(index)));
    }

    private Ways ways(int front) {
        return from.computeIfAbsent(front, end -> new Ways(network, end));
    }

    /** The ends by which a route enters the pieces of one of its glass paths. */
    int[] glass(Route route, int entering) {
        int[] enterings = route.enterings();
        boolean last = entering == enterings[enterings.length - 1];
        return ways(enterings[0]).glass(entering, last ? route.target() : Network.NONE);
    }
}
