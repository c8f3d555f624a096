package sallowmere.town;

import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Random;
import java.util.Set;
import sallowmere.geo.Point;

/**
 * A way along streets that meets no crossing twice.
 *
 * @param start the crossing where it begins
 * @param blocks the blocks in order
 */
record Trail(int start, List<Block> blocks) {
    private static final int TRIES = 150;

    Trail {
        blocks = List.copyOf(blocks);
    }

    double length() {
        return blocks.stream().mapToDouble(block -> block.curve().length()).sum();
    }

    /** The first blocks up to some metres. */
    List<Block> head(double metres) {
        List<Block> head = new ArrayList<>();
        double length = 0;
        for (Block block : blocks) {
            if (length >= metres) {
                break;
            }
            head.add(block);
            length += block.curve().length();
        }
        return head;
    }

    /**
     * Looks for a trail of some metres that begins with given blocks and uses no other block that is taken. What it
     * finds is shorter where there is none so long.
     */
    static Trail find(
            StreetNetwork network, int start, List<Block> head, double metres, Set<Block> taken, Random random) {
        Trail best = new Trail(start, head);
        for (int tries = 0; tries < TRIES && best.length() < metres; tries++) {
            Trail trail = wander(network, start, head, metres, taken, random);
            if (trail.length() > best.length()) {
                best = trail;
            }
        }
        return best;
    }

    private static Trail wander(
            StreetNetwork network, int start, List<Block> head, double metres, Set<Block> taken, Random random) {
        List<Block> blocks = new ArrayList<>(head);
        Set<Integer> met = new HashSet<>(Set.of(start));
        int node = start;
        Point heading = null;
        double length = 0;
        for (Block block : head) {
            node = block.other(node);
            met.add(node);
            length += block.curve().length();
        }
        while (length < metres) {
            Block next = choose(network, node, heading, met, taken, random);
            if (next == null) {
                break;
            }
            int other = next.other(node);
            heading = network.node(other).minus(network.node(node)).unit();
            node = other;
            met.add(node);
            blocks.add(next);
            length += next.curve().length();
        }
        return new Trail(start, blocks);
    }

    private static Block choose(
            StreetNetwork network, int node, Point heading, Set<Integer> met, Set<Block> taken, Random random) {
        Block best = null;
        double most = -1;
        for (Block block : network.meetingAt(node)) {
            int other = block.other(node);
            if (taken.contains(block) || met.contains(other)) {
                continue;
            }
            Point way = network.node(other).minus(network.node(node)).unit();
            double liking = random.nextDouble() + (heading == null ? 0 : 0.25 * way.dot(heading));
            if (liking > most || best == null) {
                most = liking;
                best = block;
            }
        }
        return best;
    }
}
