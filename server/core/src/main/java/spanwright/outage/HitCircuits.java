package spanwright.outage;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Set;
import spanwright.circuits.Circuit;
import spanwright.circuits.CircuitStatus;
import spanwright.network.Network;
import spanwright.network.Snapshot;
import spanwright.records.EndNames;
import spanwright.records.Records;

/**
 * Finds the working circuits that cut glass hits. A circuit can meet the cut only where light from its a comes to a
 * glass path that the cut meets; so the fronts behind those paths name all circuits to look at ({@link CircuitsBehind}), and
 * each is then followed along its own route.
 */
final class HitCircuits {

    private final Snapshot snapshot;
    private final Records records;
    private final Network network;
    private final CutGlass cut;
    private final CircuitRoutes routes;
    private final EndNames names;
    private final int[] hitPaths;

    HitCircuits(Snapshot snapshot, CutGlass cut) {
        this.snapshot = snapshot;
        this.records = snapshot.records();
        this.network = snapshot.network();
        this.cut = cut;
        this.routes = new CircuitRoutes(network);
        this.names = new EndNames(records);
        this.hitPaths = cut.paths();
    }

    List<HitCircuit> list() {
        List<HitCircuit> hit = new ArrayList<>();
        for (int id : CircuitsBehind.of(snapshot, hitPaths)) {
            Circuit circuit = records.circuits().get(id);
            List<Route> ways = routes.of(circuit);
            List<String> at = meets(ways);
            if (!at.isEmpty()) {
                hit.add(new HitCircuit(circuit, isProtected(circuit), whole(ways), at));
            }
        }
        hit.sort(HitCircuit.FIRST_RESTORED);
        return hit;
    }

    private static boolean whole(List<Route> ways) {
        for (Route way : ways) {
            if (!way.whole()) {
                return false;
            }
        }
        return true;
    }

    private boolean isProtected(Circuit circuit) {
        String group = circuit.protectionGroup();
        return group != null
                && records.groupCircuits(group)
                        .filter(other -> other.id() != circuit.id() && other.status() == CircuitStatus.WORKING)
                        .map(routes::of)
                        .anyMatch(ways -> whole(ways) && !isHit(ways));
    }

    private boolean isHit(List<Route> ways) {
        return !meets(ways).isEmpty();
    }

    /** Where the cut meets routes, in order; nothing where it does not. */
    private List<String> meets(List<Route> ways) {
        Set<String> at = new LinkedHashSet<>();
        for (Route route : ways) {
            for (int entering : route.enterings()) {
                if (Arrays.binarySearch(hitPaths, network.paths().pathOf(entering >> 1)) >= 0) {
                    for (int end : routes.glass(route, entering)) {
                        meet(at, end);
                    }
                }
            }
        }
        return List.copyOf(at);
    }

    private void meet(Set<String> at, int end) {
        enclosure(at, end);
        int piece = end >> 1;
        int cable = cut.cableAt(piece);
        if (cable != 0) {
            at.add(names.fiber(cable, network.blockOf(piece).number(piece)));
        }
        enclosure(at, end ^ 1);
    }

    private void enclosure(Set<String> at, int end) {
        int enclosure = cut.enclosureAt(end);
        if (enclosure != 0) {
            at.add(records.enclosures().get(enclosure).code());
        }
    }
}
