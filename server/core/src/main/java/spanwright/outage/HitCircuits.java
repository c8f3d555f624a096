package spanwright.outage;

import java.util.ArrayDeque;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.Collection;
import java.util.Deque;
import java.util.HashMap;
import java.util.HashSet;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import org.jspecify.annotations.Nullable;
import spanwright.circuits.Circuit;
import spanwright.circuits.CircuitStatus;
import spanwright.network.Block;
import spanwright.network.BlockKind;
import spanwright.network.Network;
import spanwright.network.PathIndex;
import spanwright.network.Snapshot;
import spanwright.planning.PathCircuits;
import spanwright.records.EndNames;
import spanwright.records.Records;
import spanwright.splicing.EndKey;

/**
 * Finds the working circuits that cut glass hits. A circuit can meet the cut only where light from its a comes to a
 * glass path that the cut meets; so the fronts behind those paths name all circuits to look at, and each is then
 * followed along its own route.
 */
final class HitCircuits {

    private final Records records;
    private final Network network;
    private final CutGlass cut;
    private final CircuitRoutes routes;
    private final PathCircuits ending;
    private final EndNames names;
    private final int[] hitPaths;
    private @Nullable Map<String, List<Circuit>> groups;

    HitCircuits(Snapshot snapshot, CutGlass cut) {
        this.records = snapshot.records();
        this.network = snapshot.network();
        this.cut = cut;
        this.routes = new CircuitRoutes(network);
        this.ending = new PathCircuits(snapshot);
        this.names = new EndNames(records);
        this.hitPaths = cut.paths();
    }

    List<HitCircuit> list() {
        Map<Circuit, List<Route>> hit = new HashMap<>();
        Map<Circuit, List<String>> places = new HashMap<>();
        for (Circuit circuit : candidates()) {
            List<Route> ways = routes.of(circuit);
            List<String> at = meets(ways);
            if (!at.isEmpty()) {
                hit.put(circuit, ways);
                places.put(circuit, at);
            }
        }
        return hit.entrySet().stream()
                .map(entry -> new HitCircuit(
                        entry.getKey(),
                        isProtected(entry.getKey()),
                        entry.getValue().stream().allMatch(Route::whole),
                        places.getOrDefault(entry.getKey(), List.of())))
                .sorted(HitCircuit.FIRST_RESTORED)
                .toList();
    }

    private Set<Circuit> candidates() {
        Set<Circuit> found = new LinkedHashSet<>();
        for (long front : fronts()) {
            ending.endingOn(EndKey.owner(front), EndKey.number(front)).stream()
                    .filter(circuit -> circuit.status() == CircuitStatus.WORKING)
                    .forEach(found::add);
        }
        return found;
    }

    /** The fronts from which light can come to a glass path that is hit. */
    private Set<Long> fronts() {
        PathIndex paths = network.paths();
        Set<Long> fronts = new LinkedHashSet<>();
        Set<Integer> crossed = new HashSet<>();
        Deque<Integer> open = new ArrayDeque<>();
        for (int path : hitPaths) {
            open.add(paths.firstEnd(path));
            open.add(paths.lastEnd(path));
        }
        while (!open.isEmpty()) {
            reach(open.remove(), fronts, crossed, open);
        }
        return fronts;
    }

    /** Notes the front at a path's end, or goes on from the splitter there. */
    private void reach(int end, Set<Long> fronts, Set<Integer> crossed, Deque<Integer> open) {
        int terminal = end >> 1;
        Block block = network.blockOf(terminal);
        if ((end & 1) == 0 || block.kind() == BlockKind.SECTION) {
            return;
        }
        if (block.kind() == BlockKind.PANEL) {
            fronts.add(network.keyOf(end));
        } else if (crossed.add(terminal)) {
            boolean input = block.number(terminal) <= block.inputs();
            int from = input ? block.inputs() + 1 : 1;
            int to = input ? block.count() : block.inputs();
            for (int number = from; number <= to; number++) {
                open.add(farEnd(2 * block.piece(number) + 1));
            }
        }
    }

    /** The other end of the path that begins at an end. */
    private int farEnd(int end) {
        PathIndex paths = network.paths();
        int path = paths.pathOf(end >> 1);
        return paths.firstEnd(path) == end ? paths.lastEnd(path) : paths.firstEnd(path);
    }

    private boolean isProtected(Circuit circuit) {
        String group = circuit.protectionGroup();
        return group != null
                && ofGroup(group).stream()
                        .filter(other -> other.id() != circuit.id())
                        .map(routes::of)
                        .anyMatch(ways -> ways.stream().allMatch(Route::whole)
                                && meets(ways).isEmpty());
    }

    private Collection<Circuit> ofGroup(String group) {
        Map<String, List<Circuit>> known = groups;
        if (known == null) {
            known = new HashMap<>();
            for (Circuit circuit : (Iterable<Circuit>) records.circuits().list()::iterator) {
                if (circuit.protectionGroup() != null && circuit.status() == CircuitStatus.WORKING) {
                    known.computeIfAbsent(circuit.protectionGroup(), key -> new ArrayList<>())
                            .add(circuit);
                }
            }
            groups = known;
        }
        return known.getOrDefault(group, List.of());
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
