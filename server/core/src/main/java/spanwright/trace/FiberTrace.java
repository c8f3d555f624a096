package spanwright.trace;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.HashSet;
import java.util.List;
import java.util.Set;
import java.util.stream.IntStream;
import spanwright.network.Block;
import spanwright.network.Network;

/** Finds the routes through each piece of one fiber: every walk backward from it, joined to every walk onward. */
final class FiberTrace {

    private static final int[] NOTHING = new int[0];

    private final Network network;
    private final Walker walker;
    private final int cable;
    private final int fiber;
    private final List<Route> routes = new ArrayList<>();
    /** What was found so far: a path through two pieces of the fiber counts once. */
    private final Set<List<Integer>> known = new HashSet<>();

    FiberTrace(Network network, Walker walker, int cable, int fiber) {
        this.network = network;
        this.walker = walker;
        this.cable = cable;
        this.fiber = fiber;
    }

    /** A route through a piece, run in the cable's direction. */
    static final class Route {

        private final int[] back;
        private final int[] onward;
        private final int first;
        private final int last;
        private final boolean closed;

        private Route(int[] back, int[] onward, int first, int last, boolean closed) {
            this.back = back;
            this.onward = onward;
            this.first = first;
            this.last = last;
            this.closed = closed;
        }

        private static Route open(Walk back, Walk onward) {
            return new Route(back.turnedWithoutFirst(), onward.entered(), back.last(), onward.last(), false);
        }

        private static Route circle(int[] back, int[] onward, boolean closed) {
            return new Route(back, onward, Network.NONE, Network.NONE, closed);
        }

        /** The ends entered before the piece; of a circle those met last. */
        int[] back() {
            return back;
        }

        /** The ends entered from the piece on. */
        int[] onward() {
            return onward;
        }

        /** The end where it begins; NONE for a circle. */
        int first() {
            return first;
        }

        /** The end where it ends; NONE for a circle. */
        int last() {
            return last;
        }

        boolean circle() {
            return first == Network.NONE;
        }

        /** Whether a joint leads from a circle's last piece to its first. */
        boolean closed() {
            return closed;
        }
    }

    List<Route> routes() {
        List<Block> sections = network.sectionsOf(cable);
        int from = 0;
        while (from < sections.size()) {
            int to = from;
            while (to + 1 < sections.size() && uncut(sections.get(to).piece(fiber))) {
                to++;
            }
            addRoutes(sections.get(from).piece(fiber), to - from + 1);
            from = to + 1;
        }
        return routes;
    }

    /** Whether a section's fiber goes on uncut into the next section. */
    private boolean uncut(int section) {
        int end = 2 * section + 1;
        return network.peer(end) != Network.NONE && network.joint(end) == 0;
    }

    private void addRoutes(int firstSection, int sections) {
        List<Walk> backward = walker.all(2 * firstSection + 1);
        List<Walk> onward = walker.all(2 * firstSection);
        if ((long) backward.size() * onward.size() > walker.mostWalks()) {
            onward = List.of(walker.plain(2 * firstSection));
        }
        for (Walk back : backward) {
            if (back.stop() == Walk.Stop.CROSSED) {
                int[] piece = Arrays.copyOf(onward.get(0).entered(), sections);
                add(Route.circle(back.turnedWithoutFirst(), piece, true));
            } else if (!back.loop()) {
                join(back, onward);
            }
        }
        // A circle that closes at the piece is found both ways; it counts once.
        for (Walk on : onward) {
            if (on.loop()) {
                add(Route.circle(NOTHING, on.entered(), on.stop() == Walk.Stop.CIRCLE));
            }
        }
    }

    private void join(Walk back, List<Walk> onward) {
        Set<Integer> walked = new HashSet<>();
        for (int entering : back.turnedWithoutFirst()) {
            walked.add(entering >> 1);
        }
        for (Walk on : onward) {
            int met = on.loop() ? -1 : firstOf(walked, on.entered());
            if (met >= 0) {
                add(Route.circle(back.turnedWithoutFirst(), Arrays.copyOf(on.entered(), met), true));
            } else if (!on.loop()) {
                add(Route.open(back, on));
            }
        }
    }

    private void add(Route route) {
        List<Integer> entered = new ArrayList<>();
        entered.add(route.first());
        entered.add(route.circle() ? route.back().length : 0);
        IntStream.concat(Arrays.stream(route.back()), Arrays.stream(route.onward()))
                .forEach(entered::add);
        if (known.add(entered)) {
            routes.add(route);
        }
    }

    /** The first index at which a walk comes to one of these pieces; below 0 where it does not. */
    private static int firstOf(Set<Integer> walked, int[] entered) {
        for (int index = 0; index < entered.length; index++) {
            if (walked.contains(entered[index] >> 1)) {
                return index;
            }
        }
        return -1;
    }
}
