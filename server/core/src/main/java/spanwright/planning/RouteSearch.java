package spanwright.planning;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.Comparator;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.PriorityQueue;
import org.jspecify.annotations.Nullable;

/**
 * The routes from one structure to another, bundle after bundle, by rising bound of what they cost at least: best first
 * with the exact bound of what is left (A*). A route travels no bundle twice, either way.
 */
final class RouteSearch {

    /** Steps of one search; beyond it the routes found so far are all. */
    static final int MOST_STEPS = 50_000;

    private static final long OPENED = 1L << 54;
    private static final long SPLICE = 1L << 40;
    private static final long NEVER = Long.MAX_VALUE;

    private final BundleMap map;
    private final SpareEnds ends;
    private final SpareQuestion question;
    private final long[] left;
    private final Map<Long, BundleCrossing> crossings = new HashMap<>();
    private final PriorityQueue<Step> waiting = new PriorityQueue<>(Comparator.comparingLong(Step::bound)
            .thenComparingInt(Step::count)
            .thenComparingInt(step -> step.bundle.id()));

    private int steps;

    /** A route as far as it goes. */
    private record Step(Bundle bundle, @Nullable Step before, int count, long spent, long bound) {

        boolean holds(Bundle next) {
            for (Step step = this; step != null; step = step.before) {
                if (step.bundle.id() == next.id() || step.bundle.id() == next.back()) {
                    return true;
                }
            }
            return false;
        }
    }

    /**
     * A route.
     *
     * @param bundles its bundles, in order
     * @param least what an option along it costs at least
     */
    record Route(List<Bundle> bundles, SpareCost least) {}

    RouteSearch(BundleMap map, SpareEnds ends, SpareQuestion question) {
        this.map = map;
        this.ends = ends;
        this.question = question;
        this.left = new long[map.list().size()];
        Arrays.fill(left, NEVER);
        reckonLeft();
        for (Bundle bundle : map.leaving(question.from())) {
            if (terminals(bundle, 0) >= question.fibers() && left[bundle.id()] != NEVER) {
                waiting.add(new Step(bundle, null, 1, bundle.loss(), left[bundle.id()]));
            }
        }
    }

    /** How many fibers can begin (side 0) or end (side 1) at that side of a bundle. */
    private long terminals(Bundle bundle, int side) {
        return bundle.entries().stream()
                .filter(entry -> ends.terminal(entry ^ side).isPresent())
                .count();
    }

    /** From the goal back: what is spent at least from where a bundle begins. */
    private void reckonLeft() {
        PriorityQueue<long[]> queue = new PriorityQueue<>(Comparator.comparingLong(item -> item[0]));
        for (Bundle bundle : map.reaching(question.to())) {
            if (terminals(bundle, 1) >= question.fibers()) {
                reach(bundle, bundle.loss(), queue);
            }
        }
        while (!queue.isEmpty()) {
            long[] item = queue.poll();
            Bundle bundle = map.list().get((int) item[1]);
            if (item[0] == left[bundle.id()] && bundle.from() != question.from()) {
                for (Bundle before : map.reaching(bundle.from())) {
                    long crossing = isBack(before, bundle) ? NEVER : crossing(before, bundle);
                    if (crossing != NEVER && before.to() != question.to()) {
                        reach(before, item[0] + crossing + before.loss(), queue);
                    }
                }
            }
        }
    }

    private void reach(Bundle bundle, long spent, PriorityQueue<long[]> queue) {
        if (bundle.entries().size() >= question.fibers() && spent < left[bundle.id()]) {
            left[bundle.id()] = spent;
            queue.add(new long[] {spent, bundle.id()});
        }
    }

    private static boolean isBack(Bundle one, Bundle other) {
        return one.back() == other.id() || one.id() == other.id();
    }

    private long crossing(Bundle from, Bundle to) {
        BundleCrossing crossing = findCrossing(from, to);
        if (!crossing.leads(question.fibers())) {
            return NEVER;
        }
        int missing = question.fibers() - crossing.whole();
        return missing <= 0 ? 0 : OPENED + missing * SPLICE;
    }

    /** How fibers can go over from one bundle to the next. */
    BundleCrossing findCrossing(Bundle from, Bundle to) {
        return crossings.computeIfAbsent(((long) from.id() << 32) | to.id(), key -> map.crossing(from, to));
    }

    /** The next route. */
    Optional<Route> next() {
        while (!waiting.isEmpty() && steps++ < MOST_STEPS) {
            Step step = waiting.poll();
            if (step.bundle.to() == question.to()) {
                return Optional.of(route(step));
            }
            for (Bundle bundle : map.leaving(step.bundle.to())) {
                if (left[bundle.id()] != NEVER && bundle.to() != question.from() && !step.holds(bundle)) {
                    go(step, bundle);
                }
            }
        }
        return Optional.empty();
    }

    private void go(Step step, Bundle next) {
        long crossing = crossing(step.bundle, next);
        if (crossing != NEVER) {
            long spent = step.spent + crossing;
            waiting.add(new Step(next, step, step.count + 1, spent + next.loss(), spent + left[next.id()]));
        }
    }

    private static Route route(Step last) {
        List<Bundle> bundles = new ArrayList<>();
        for (Step step = last; step != null; step = step.before) {
            bundles.add(0, step.bundle);
        }
        long spent = last.bound;
        return new Route(
                bundles, new SpareCost((int) (spent / OPENED), (int) (spent % OPENED / SPLICE), 0, spent % SPLICE));
    }
}
