package sallowmere.town;

import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Random;
import sallowmere.geo.Point;

/** Names the blocks of a network: a street goes on across a crossing where a block lies nearly straight ahead. */
final class Streets {
    private static final double STRAIGHT = 0.8;

    private final StreetNetwork network;
    private final String[] nameOf;
    private final List<Street> streets = new ArrayList<>();

    private Streets(StreetNetwork network) {
        this.network = network;
        nameOf = new String[network.blocks().size()];
    }

    static Streets name(StreetNetwork network, Random random) {
        Streets streets = new Streets(network);
        Names names = new Names(random);
        for (Block block : network.blocks()) {
            if (streets.nameOf[block.number()] == null) {
                streets.draw(block, names.next());
            }
        }
        return streets;
    }

    private void draw(Block first, String name) {
        nameOf[first.number()] = name;
        List<Point> line = new ArrayList<>(first.curve().points());
        extend(first, first.to(), line, name);
        Collections.reverse(line);
        extend(first, first.from(), line, name);
        streets.add(new Street(name, line));
    }

    private void extend(Block block, int node, List<Point> line, String name) {
        Block at = block;
        int reached = node;
        while (at != null) {
            Block next = ahead(at, reached);
            if (next != null) {
                nameOf[next.number()] = name;
                List<Point> more = next.walkedFrom(reached).points();
                line.addAll(more.subList(1, more.size()));
                reached = next.other(reached);
            }
            at = next;
        }
    }

    private Block ahead(Block block, int node) {
        Point heading =
                network.node(node).minus(network.node(block.other(node))).unit();
        Block best = null;
        double straightest = STRAIGHT;
        for (Block other : network.meetingAt(node)) {
            double along = network.node(other.other(node))
                    .minus(network.node(node))
                    .unit()
                    .dot(heading);
            if (nameOf[other.number()] == null && along > straightest) {
                best = other;
                straightest = along;
            }
        }
        return best;
    }

    /** The name of the street that a block is part of. */
    String nameOf(Block block) {
        return nameOf[block.number()];
    }

    /** All streets. */
    List<Street> list() {
        return streets;
    }
}
