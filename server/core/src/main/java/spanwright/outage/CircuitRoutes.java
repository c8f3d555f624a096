package spanwright.outage;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import spanwright.circuits.Circuit;
import spanwright.circuits.PortRange;
import spanwright.network.Network;
import spanwright.network.PathIndex;
import spanwright.splicing.EndKey;
import spanwright.splicing.LegKind;

/**
 * The ways that circuits take, the same that a trace of each circuit gives. What was asked is kept, so one of these
 * serves one question; one thread's.
 */
public final class CircuitRoutes {

    private final Network network;
    private final Map<Integer, Ways> from = new HashMap<>();

    public CircuitRoutes(Network network) {
        this.network = network;
    }

    /** The routes of a circuit, one a fiber; where none joins its ports, the one from its a as far as it is plain. */
    public List<Route> of(Circuit circuit) {
        List<Route> routes = new ArrayList<>();
        for (int index = 0; index < circuit.fibers(); index++) {
            int a = front(circuit.a(), index);
            int z = front(circuit.z(), index);
            if (a == Network.NONE) {
                routes.add(Route.NOWHERE);
            } else if (z != Network.NONE && onePath(a, z)) {
                routes.add(new Route(new int[] {a}, z));
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

    /** Whether two fronts are the ends of one glass path, as those of most circuits are: no splitter is crossed. */
    private boolean onePath(int a, int z) {
        PathIndex paths = network.paths();
        int path = paths.pathOf(a >> 1);
        int first = paths.firstEnd(path);
        int last = paths.lastEnd(path);
        return ((first == a && last == z) || (first == z && last == a)) && !paths.circle(path);
    }

    private Ways ways(int front) {
        return from.computeIfAbsent(front, end -> new Ways(network, end));
    }

    /** The ends by which a route enters the pieces of one of its glass paths. */
    public int[] glass(Route route, int entering) {
        int[] enterings = route.enterings();
        if (enterings.length == 1 && route.whole() && onePath(entering, route.target())) {
            return whole(entering);
        }
        boolean last = entering == enterings[enterings.length - 1];
        return ways(enterings[0]).glass(entering, last ? route.target() : Network.NONE);
    }

    /** All pieces of a glass path, from the one of its ends on. */
    private int[] whole(int entering) {
        PathIndex paths = network.paths();
        int path = paths.pathOf(entering >> 1);
        int[] ends = paths.ends(path);
        if (paths.firstEnd(path) == entering) {
            return ends;
        }
        for (int low = 0, high = ends.length - 1; low <= high; low++, high--) {
            int end = ends[low] ^ 1;
            ends[low] = ends[high] ^ 1;
            ends[high] = end;
        }
        return ends;
    }
}
