package spanwright.planning;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.HashSet;
import java.util.LinkedHashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.TreeSet;
import org.jspecify.annotations.Nullable;
import spanwright.network.Block;
import spanwright.network.Network;
import spanwright.plant.CableType;

/**
 * Which fibers along one route: exactly the cheapest, in the fewest enclosures that must be opened, tried by rising
 * count. In one tube a cable by branch and bound: the choice without that wish bounds it from below, and the first cable
 * of which several tubes are used is tried tube by tube.
 */
final class RouteChoice {

    /** Sets of fibers reckoned for one route; beyond it what was found is given. */
    static final int MOST_TRIALS = 2000;

    private final SpareEnds ends;
    private final BundleMap map;
    private final SpareQuestion question;
    private final List<Bundle> route;
    private final Network network;
    private int trials;

    RouteChoice(SpareEnds ends, BundleMap map, SpareQuestion question, List<Bundle> route) {
        this.ends = ends;
        this.map = map;
        this.question = question;
        this.route = route;
        this.network = ends.glass().snapshot().network();
    }

    /**
     * A choice.
     *
     * @param open the enclosures that may be opened
     * @param laid its paths
     */
    record Chosen(Set<Integer> open, RouteFlow.Laid laid) {}

    /** The cheapest choice for each smallest set of enclosures that will do. */
    List<Chosen> list(RouteSearch search, int least) {
        List<Set<Integer>> needed = new ArrayList<>();
        Set<Integer> candidates = new LinkedHashSet<>();
        for (int step = 0; step + 1 < route.size(); step++) {
            BundleCrossing crossing = search.findCrossing(route.get(step), route.get(step + 1));
            candidates.addAll(crossing.openings());
            if (crossing.whole() < question.fibers()) {
                needed.add(Set.copyOf(crossing.openings()));
            }
        }
        List<Chosen> found = new ArrayList<>();
        // Two openings at one structure, seen at two crossings, are one: the bound may be one too high.
        for (int size = needed.isEmpty() ? 0 : Math.min(1, least);
                size <= candidates.size() && found.isEmpty();
                size++) {
            tryAll(new ArrayList<>(candidates), 0, size, new LinkedHashSet<>(), needed, found);
        }
        return found;
    }

    private void tryAll(
            List<Integer> candidates,
            int next,
            int more,
            Set<Integer> open,
            List<Set<Integer>> needed,
            List<Chosen> found) {
        if (more == 0) {
            if (trials < MOST_TRIALS
                    && needed.stream().allMatch(any -> any.stream().anyMatch(open::contains))) {
                Set<Integer> opened = Set.copyOf(open);
                choose(opened, Map.of()).ifPresent(laid -> found.add(new Chosen(opened, laid)));
            }
            return;
        }
        for (int index = next; index + more <= candidates.size(); index++) {
            open.add(candidates.get(index));
            tryAll(candidates, index + 1, more - 1, open, needed, found);
            open.remove(candidates.get(index));
        }
    }

    /** The cheapest choice within windows of fibers, a cable each. */
    private Optional<RouteFlow.Laid> choose(Set<Integer> open, Map<Integer, FiberWindow> windows) {
        return Optional.ofNullable(question.sameTube() ? branch(open, windows, null) : lay(open, windows));
    }

    private RouteFlow.@Nullable Laid lay(Set<Integer> open, Map<Integer, FiberWindow> windows) {
        trials++;
        return RouteFlow.lay(ends, map, route, question.fibers(), open, piece -> isWithin(piece, windows))
                .orElse(null);
    }

    private boolean isWithin(int piece, Map<Integer, FiberWindow> windows) {
        Block block = network.blockOf(piece);
        FiberWindow window = windows.get(block.owner());
        return window == null || window.holds(block.number(piece));
    }

    private RouteFlow.@Nullable Laid branch(
            Set<Integer> open, Map<Integer, FiberWindow> windows, RouteFlow.@Nullable Laid best) {
        RouteFlow.Laid bound = lay(open, windows);
        if (bound == null || (best != null && bound.cost() >= best.cost())) {
            return best;
        }
        int mixed = findMixed(bound.runs());
        if (mixed == Network.NONE) {
            return bound;
        }
        RouteFlow.Laid found = best;
        CableType type = type(mixed);
        for (int tube = 1; tube <= type.tubes() && trials < MOST_TRIALS; tube++) {
            FiberWindow window = new FiberWindow((tube - 1) * type.fibersPerTube() + 1, tube * type.fibersPerTube());
            Map<Integer, FiberWindow> narrower = new HashMap<>(windows);
            if (windows.getOrDefault(mixed, window).first() <= window.last()
                    && windows.getOrDefault(mixed, window).last() >= window.first()) {
                narrower.put(mixed, window);
                found = branch(open, narrower, found);
            }
            if (found != null && found.cost() == bound.cost()) {
                return found;
            }
        }
        return found;
    }

    private CableType type(int cable) {
        return ends.lay(cable).type();
    }

    /** The first cable of which more than one tube is used. */
    private int findMixed(List<SpareRun> runs) {
        for (Map.Entry<Integer, Set<Integer>> used : fibersOf(runs).entrySet()) {
            CableType type = type(used.getKey());
            if (used.getValue().stream().map(type::tubeOf).distinct().count() > 1) {
                return used.getKey();
            }
        }
        return Network.NONE;
    }

    /** Whether each cable is used in one tube only. */
    boolean isOneTube(List<SpareRun> runs) {
        return findMixed(runs) == Network.NONE;
    }

    /** By cable, in the order of the route, the fibers that are used. */
    private Map<Integer, Set<Integer>> fibersOf(List<SpareRun> runs) {
        Map<Integer, Set<Integer>> used = new LinkedHashMap<>();
        for (int step = 0; step < route.size(); step++) {
            for (SpareRun run : runs) {
                int piece = run.entered().get(step) >> 1;
                Block block = network.blockOf(piece);
                used.computeIfAbsent(block.owner(), key -> new TreeSet<>()).add(block.number(piece));
            }
        }
        return used;
    }

    /** The same at no more cost in fibers side by side, the first of each cable that can be had so; else in one tube. */
    Chosen sideBySide(Chosen chosen) {
        Chosen best = chosen;
        Map<Integer, FiberWindow> windows = new HashMap<>();
        for (int cable : fibersOf(chosen.laid().runs()).keySet()) {
            int count =
                    fibersOf(best.laid().runs()).getOrDefault(cable, Set.of()).size();
            for (FiberWindow window : windows(cable, count)) {
                Map<Integer, FiberWindow> narrower = new HashMap<>(windows);
                narrower.put(cable, window);
                Optional<RouteFlow.Laid> laid = choose(best.open(), narrower);
                if (laid.isPresent() && laid.get().cost() == chosen.laid().cost()) {
                    windows.put(cable, window);
                    best = new Chosen(best.open(), laid.get());
                    break;
                }
            }
        }
        return best;
    }

    /** Windows worth trying: of as many fibers as are used, within a tube, then over tubes, then whole tubes. */
    private List<FiberWindow> windows(int cable, int count) {
        CableType type = type(cable);
        Set<Integer> spare = spareThroughout(cable);
        List<FiberWindow> within = new ArrayList<>();
        List<FiberWindow> over = new ArrayList<>();
        for (int first = 1; count > 0 && first + count - 1 <= type.fibers(); first++) {
            FiberWindow window = new FiberWindow(first, first + count - 1);
            if (spare.stream().filter(window::holds).count() == count) {
                (type.tubeOf(first) == type.tubeOf(window.last()) ? within : over).add(window);
            }
        }
        within.addAll(over);
        for (int tube = 1; tube <= type.tubes(); tube++) {
            within.add(new FiberWindow((tube - 1) * type.fibersPerTube() + 1, tube * type.fibersPerTube()));
        }
        return within;
    }

    private Set<Integer> spareThroughout(int cable) {
        Set<Integer> spare = new HashSet<>();
        for (Bundle bundle : route) {
            for (int entry : bundle.entries()) {
                Block block = network.blockOf(entry >> 1);
                if (block.owner() == cable) {
                    spare.add(block.number(entry >> 1));
                }
            }
        }
        return spare;
    }
}
