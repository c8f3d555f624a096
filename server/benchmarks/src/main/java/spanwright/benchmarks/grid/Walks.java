package spanwright.benchmarks.grid;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Random;

/**
 * Lays circuits over the grid: groups of 1, 2, 4 or 12 fibers on random walks biased straight ahead, of 5 to 60
 * splices, one at every node, each group brought to ports at both ends; and for a share of the glass feeders that end
 * at a 1:32 splitter whose outputs walk on to ports of their own. A walk ends early where no cable has room for it; one
 * that comes to fewer than 5 splices is not laid. What is left is for {@link SpareGlass}.
 */
final class Walks {

    private static final int[] GROUPS = {1, 2, 4, 12};
    private static final double CIRCUIT_SHARE = 0.40;
    private static final double SPLITTER_SHARE = 0.05;
    private static final double STRAIGHT = 0.7;
    private static final int LEAST_SPLICES = 5;
    private static final int MOST_SPLICES = 60;
    private static final int OUTPUTS = 32;
    /** Once so many groups in a row found no way, the plant is as full as it gets. */
    private static final int FUTILE = 10_000;

    /** A port at a node: the end of its rear. */
    record Port(int node, int rear) {}

    /** A splitter at a node: its input's end, its outputs' first end. */
    record Split(int node, int in, int firstOut) {}

    /** A circuit between two ports, by their places in {@link #ports}. */
    record Service(int a, int z) {}

    final List<Port> ports = new ArrayList<>();
    final List<Split> splitters = new ArrayList<>();
    final List<Service> services = new ArrayList<>();
    final Joins joins;
    private final Grid grid;
    private final Random random;
    /** Fibers of a cable given to circuits so far; they are given from the first on. */
    private final int[] used;

    private int usedSections;

    Walks(Grid grid, Random random) {
        this.grid = grid;
        this.random = random;
        this.joins = new Joins(grid.sections);
        this.used = new int[grid.cables];
        int behindSplitters = (int) (grid.sections * SPLITTER_SHARE);
        while (usedSections < behindSplitters) {
            tree();
        }
        int wanted = (int) (grid.sections * CIRCUIT_SHARE);
        int futile = 0;
        while (usedSections < wanted && futile < FUTILE) {
            futile = group() ? 0 : futile + 1;
        }
        new SpareGlass(grid, joins, random).splice();
    }

    private int[] port(int node, int count) {
        int[] rears = new int[count];
        for (int index = 0; index < count; index++) {
            rears[index] = joins.newEnd();
            ports.add(new Port(node, rears[index]));
        }
        return rears;
    }

    private boolean group() {
        int count = GROUPS[random.nextInt(GROUPS.length)];
        int node = random.nextInt(grid.nodes());
        int direction = way(node, count);
        if (direction < 0) {
            return false;
        }
        int splices = LEAST_SPLICES + random.nextInt(MOST_SPLICES - LEAST_SPLICES + 1);
        int[] cables = plan(node, direction, count, splices + 1);
        if (cables.length <= LEAST_SPLICES) {
            return false;
        }
        int firstPort = ports.size();
        int[] tips = port(node, count);
        int end = lay(node, cables, tips);
        int lastPort = ports.size();
        connect(tips, port(end, count));
        for (int index = 0; index < count; index++) {
            services.add(new Service(firstPort + index, lastPort + index));
        }
        return true;
    }

    private void tree() {
        int node = random.nextInt(grid.nodes());
        int direction = way(node, 1);
        if (direction < 0) {
            return;
        }
        int feederPort = ports.size();
        int[] tip = port(node, 1);
        int at = walk(node, direction, tip, 5 + random.nextInt(26));
        int in = joins.newEnd();
        joins.join(tip[0], in);
        int[] outs = new int[OUTPUTS];
        for (int output = 0; output < OUTPUTS; output++) {
            outs[output] = joins.newEnd();
        }
        splitters.add(new Split(at, in, outs[0]));
        for (int first = 0; first < OUTPUTS; first += 8) {
            int[] tips = Arrays.copyOfRange(outs, first, first + 8);
            int end = walk(at, random.nextInt(4), tips, 1 + random.nextInt(4));
            int lastPort = ports.size();
            connect(tips, port(end, tips.length));
            for (int index = 0; index < tips.length; index++) {
                services.add(new Service(feederPort, lastPort + index));
            }
        }
    }

    private void connect(int[] tips, int[] rears) {
        for (int index = 0; index < tips.length; index++) {
            joins.join(tips[index], rears[index]);
        }
    }

    private int walk(int start, int firstDirection, int[] tips, int hops) {
        return lay(start, plan(start, firstDirection, tips.length, hops), tips);
    }

    /** The cables of a walk, as far as there is room for the group; none is taken yet. */
    private int[] plan(int start, int firstDirection, int count, int hops) {
        int[] cables = new int[hops];
        int node = start;
        int direction = firstDirection;
        int planned = 0;
        while (planned < hops) {
            direction = turn(node, direction, count);
            if (direction < 0) {
                break;
            }
            int cable = grid.cable(node, direction);
            // Taken while the walk is planned, as it may come by here again.
            used[cable] += count;
            cables[planned++] = cable;
            node = grid.across(cable, node);
        }
        for (int hop = 0; hop < planned; hop++) {
            used[cables[hop]] -= count;
        }
        return Arrays.copyOf(cables, planned);
    }

    /** Takes the tips along some cables, one fiber each, and gives the node where they came to their end. */
    private int lay(int start, int[] cables, int[] tips) {
        int node = start;
        for (int cable : cables) {
            node = advance(node, cable, tips);
        }
        return node;
    }

    /** A direction with room for the group: straight ahead by preference, never back; -1 where there is none. */
    private int turn(int node, int direction, int count) {
        int first = random.nextDouble() < STRAIGHT ? direction : (direction + (random.nextBoolean() ? 1 : 3)) % 4;
        int[] tried = {first, direction, (direction + 1) % 4, (direction + 3) % 4};
        for (int way : tried) {
            int cable = grid.cable(node, way);
            if (room(cable, count)) {
                return way;
            }
        }
        return -1;
    }

    /** A direction with room for a group, whichever; -1 where there is none. */
    private int way(int node, int count) {
        int first = random.nextInt(4);
        for (int turn = 0; turn < 4; turn++) {
            if (room(grid.cable(node, (first + turn) % 4), count)) {
                return (first + turn) % 4;
            }
        }
        return -1;
    }

    private boolean room(int cable, int count) {
        return cable >= 0 && used[cable] + count <= grid.fibers[cable];
    }

    private int advance(int node, int cable, int[] tips) {
        int near = grid.from[cable] == node ? 0 : 1;
        int firstSection = grid.firstSection[cable] + used[cable];
        for (int index = 0; index < tips.length; index++) {
            int end = 2 * (firstSection + index) + near;
            joins.join(tips[index], end);
            tips[index] = end ^ 1;
        }
        used[cable] += tips.length;
        usedSections += tips.length;
        return grid.across(cable, node);
    }
}
