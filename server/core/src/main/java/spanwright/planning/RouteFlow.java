package spanwright.planning;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalLong;
import java.util.Set;
import java.util.function.IntPredicate;
import spanwright.network.Network;

/**
 * So many paths along one route at the least cost: new splices, then unverified joints, then the losses of all paths
 * together. Each fiber carries one path; splices are made in the enclosures that may be opened.
 */
final class RouteFlow {

    private final SpareEnds ends;
    private final BundleMap map;
    private final List<Bundle> route;
    private final Set<Integer> open;
    private final IntPredicate allowed;
    private final LeastCostFlow flow = new LeastCostFlow();
    private final int source = flow.node();
    private final int sink = flow.node();
    private final Map<Integer, Integer> into = new HashMap<>();
    private final List<List<Arc>> crossings = new ArrayList<>();
    private final List<Arc> starts = new ArrayList<>();

    /** Where a fiber's path goes on: by the joint to a fiber, or to a place of splices or patches, or from such a place. */
    private record Arc(int arc, int entry, int other, Crossover by, boolean toPlace) {}

    private RouteFlow(SpareEnds ends, BundleMap map, List<Bundle> route, Set<Integer> open, IntPredicate allowed) {
        this.ends = ends;
        this.map = map;
        this.route = route;
        this.open = open;
        this.allowed = allowed;
    }

    /**
     * Paths along a route.
     *
     * @param runs a path each
     * @param cost their splices, unverified joints and losses, packed
     */
    record Laid(List<SpareRun> runs, long cost) {}

    /** The cheapest paths, if so many go through. */
    static Optional<Laid> lay(
            SpareEnds ends, BundleMap map, List<Bundle> route, int fibers, Set<Integer> open, IntPredicate allowed) {
        RouteFlow laying = new RouteFlow(ends, map, route, open, allowed);
        laying.build();
        return laying.flow.send(laying.source, laying.sink, fibers)
                ? Optional.of(new Laid(laying.runs(), laying.flow.cost()))
                : Optional.empty();
    }

    private void build() {
        for (Bundle bundle : route) {
            for (int entry : bundle.entries()) {
                if (allowed.test(entry >> 1)) {
                    into.put(entry, flow.node());
                    flow.arc(into(entry), flow.node(), 1, ends.along(entry >> 1));
                }
            }
        }
        for (int entry : entries(0)) {
            OptionalLong cost = ends.terminal(entry);
            if (cost.isPresent()) {
                starts.add(new Arc(
                        flow.arc(source, into(entry), 1, cost.getAsLong()), entry, 0, Crossover.AS_IT_IS, false));
            }
        }
        for (int entry : entries(route.size() - 1)) {
            ends.terminal(entry ^ 1).ifPresent(cost -> flow.arc(outOf(entry), sink, 1, cost));
        }
        for (int step = 0; step + 1 < route.size(); step++) {
            crossings.add(cross(step));
        }
    }

    private int into(int entry) {
        return into.getOrDefault(entry, Network.NONE);
    }

    /** The node behind a fiber is made right after the one before it. */
    private int outOf(int entry) {
        return into(entry) + 1;
    }

    private List<Integer> entries(int step) {
        return route.get(step).entries().stream().filter(into::containsKey).toList();
    }

    private List<Arc> cross(int step) {
        List<Arc> arcs = new ArrayList<>();
        Map<Integer, Integer> splicing = new HashMap<>();
        open.forEach(enclosure -> splicing.put(enclosure, flow.node()));
        int patching = flow.node();
        for (int entry : entries(step)) {
            leave(entry, route.get(step + 1), splicing, patching, arcs);
        }
        for (int entry : entries(step + 1)) {
            int enclosure = ends.glass().enclosure(entry);
            if (splicing.containsKey(enclosure) && ends.isFreeable(entry)) {
                long cost = ends.newSplice() + ends.splicing(entry);
                int arc = flow.arc(splicing.get(enclosure), into(entry), 1, cost);
                arcs.add(new Arc(arc, entry, enclosure, Crossover.SPLICE, false));
            }
            if (ends.isPatchable(entry)) {
                int arc = flow.arc(patching, into(entry), 1, ends.patching(entry) + ends.newJumper());
                arcs.add(new Arc(arc, entry, 0, Crossover.JUMPER, false));
            }
        }
        return arcs;
    }

    private void leave(int entry, Bundle next, Map<Integer, Integer> splicing, int patching, List<Arc> arcs) {
        int exit = entry ^ 1;
        int from = outOf(entry);
        int peer = ends.glass().snapshot().network().peer(exit);
        if (peer != Network.NONE && into.containsKey(peer) && map.isEntry(peer, next)) {
            int arc = flow.arc(from, into(peer), 1, ends.crossing(exit, peer));
            arcs.add(new Arc(arc, entry, peer, Crossover.AS_IT_IS, true));
        }
        int enclosure = ends.glass().enclosure(exit);
        if (splicing.containsKey(enclosure) && ends.isFreeable(exit)) {
            int arc = flow.arc(from, splicing.get(enclosure), 1, ends.splicing(exit));
            arcs.add(new Arc(arc, entry, enclosure, Crossover.SPLICE, true));
        }
        if (ends.isPatchable(exit)) {
            arcs.add(new Arc(flow.arc(from, patching, 1, ends.patching(exit)), entry, 0, Crossover.JUMPER, true));
        }
    }

    /** The paths that the units took: at a place those that come are matched in order with those that go. */
    private List<SpareRun> runs() {
        List<Map<Integer, Arc>> onward = crossings.stream().map(this::onward).toList();
        List<SpareRun> runs = new ArrayList<>();
        for (Arc start : starts) {
            if (flow.carried(start.arc) > 0) {
                runs.add(run(start.entry, onward));
            }
        }
        return runs;
    }

    private static SpareRun run(int first, List<Map<Integer, Arc>> onward) {
        List<Integer> entered = new ArrayList<>(List.of(first));
        List<Crossover> crossovers = new ArrayList<>();
        int entry = first;
        for (Map<Integer, Arc> crossing : onward) {
            Arc arc = crossing.get(entry);
            if (arc == null) {
                throw new IllegalStateException("a path ends at " + entry + " within its route");
            }
            entry = arc.other;
            entered.add(entry);
            crossovers.add(arc.by);
        }
        return new SpareRun(entered, crossovers);
    }

    /** By the end where a fiber is entered, how its path goes on and to which. */
    private Map<Integer, Arc> onward(List<Arc> arcs) {
        Map<Integer, Arc> onward = new HashMap<>();
        Map<String, List<Integer>> going = new HashMap<>();
        List<Arc> carrying =
                arcs.stream().filter(arc -> flow.carried(arc.arc) > 0).toList();
        carrying.stream()
                .filter(arc -> !arc.toPlace)
                .forEach(arc -> going.computeIfAbsent(place(arc), key -> new ArrayList<>())
                        .add(arc.entry));
        for (Arc arc : carrying) {
            if (arc.toPlace && arc.by == Crossover.AS_IT_IS) {
                onward.put(arc.entry, arc);
            } else if (arc.toPlace) {
                List<Integer> next = going.getOrDefault(place(arc), List.of());
                onward.put(arc.entry, new Arc(arc.arc, arc.entry, next.remove(0), arc.by, true));
            }
        }
        return onward;
    }

    private static String place(Arc arc) {
        return arc.by + " " + arc.other;
    }
}
