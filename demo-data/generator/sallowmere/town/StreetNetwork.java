package sallowmere.town;

import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Random;
import java.util.function.Predicate;
import sallowmere.geo.Curve;
import sallowmere.geo.Point;

/**
 * The streets of a town, grown rather than drawn with a ruler: crossings strewn at a least distance, joined where no
 * third crossing lies in the circle between two (the Gabriel graph), a quarter of the joins left out where another way
 * round remains, each street a little bent.
 */
final class StreetNetwork {
    private static final double LEAST_DISTANCE = 118;
    private static final double LEFT_OUT = 0.24;

    private final List<Point> nodes = new ArrayList<>();
    private final List<Block> blocks = new ArrayList<>();
    private final List<List<Block>> meeting = new ArrayList<>();

    private StreetNetwork() {}

    /** Grows a network within a lobed ellipse, on the ground that a test allows; the seeds are crossings. */
    static StreetNetwork grow(
            Point centre,
            double major,
            double minor,
            double turn,
            Predicate<Point> ground,
            List<Point> seeds,
            Random random) {
        StreetNetwork network = new StreetNetwork();
        seeds.forEach(network::node);
        double lobes = 2 * Math.PI * random.nextDouble();
        for (int tries = 0; tries < 8_000; tries++) {
            double u = 2 * random.nextDouble() - 1;
            double v = 2 * random.nextDouble() - 1;
            double out = u * u + v * v;
            double apart = LEAST_DISTANCE * (0.9 + 0.55 * out);
            double x = u * major;
            double y = v * minor;
            double cosine = StrictMath.cos(turn);
            double sine = StrictMath.sin(turn);
            Point place = centre.plus(new Point(x * cosine - y * sine, x * sine + y * cosine));
            double angle = StrictMath.atan2(v, u);
            double edge =
                    0.86 + 0.2 * StrictMath.sin(2 * angle + lobes) + 0.16 * StrictMath.sin(3 * angle + 2.2 * lobes);
            if (out < edge && ground.test(place) && network.clear(place, apart)) {
                network.node(place);
            }
        }
        network.join(random);
        return network;
    }

    private void node(Point place) {
        nodes.add(place);
        meeting.add(new ArrayList<>());
    }

    private boolean clear(Point place, double apart) {
        return nodes.stream().noneMatch(node -> node.to(place) < apart);
    }

    private void join(Random random) {
        List<int[]> pairs = new ArrayList<>();
        for (int a = 0; a < nodes.size(); a++) {
            for (int b = a + 1; b < nodes.size(); b++) {
                if (nodes.get(a).to(nodes.get(b)) < 520 && neighbours(a, b)) {
                    pairs.add(new int[] {a, b});
                }
            }
        }
        Collections.shuffle(pairs, random);
        int target = (int) (pairs.size() * (1 - LEFT_OUT));
        List<int[]> kept = new ArrayList<>(pairs);
        for (int[] pair : pairs) {
            if (kept.size() > target) {
                kept.remove(pair);
                if (!holdsTogether(kept)) {
                    kept.add(pair);
                }
            }
        }
        kept.sort((p, q) -> p[0] != q[0] ? p[0] - q[0] : p[1] - q[1]);
        kept.forEach(pair -> block(pair[0], pair[1], random));
    }

    private boolean neighbours(int a, int b) {
        Point middle = nodes.get(a).toward(nodes.get(b), 0.5);
        double radius = nodes.get(a).to(nodes.get(b)) / 2;
        for (int other = 0; other < nodes.size(); other++) {
            if (other != a && other != b && nodes.get(other).to(middle) < radius) {
                return false;
            }
        }
        return true;
    }

    /** Whether every crossing keeps two streets and can be reached. */
    private boolean holdsTogether(List<int[]> pairs) {
        int[] degree = new int[nodes.size()];
        int[] group = new int[nodes.size()];
        for (int i = 0; i < group.length; i++) {
            group[i] = i;
        }
        int groups = nodes.size();
        for (int[] pair : pairs) {
            degree[pair[0]]++;
            degree[pair[1]]++;
            int a = root(group, pair[0]);
            int b = root(group, pair[1]);
            if (a != b) {
                group[a] = b;
                groups--;
            }
        }
        for (int d : degree) {
            if (d < 2) {
                return false;
            }
        }
        return groups == 1;
    }

    private static int root(int[] group, int node) {
        int at = node;
        while (group[at] != at) {
            group[at] = group[group[at]];
            at = group[at];
        }
        return at;
    }

    private void block(int a, int b, Random random) {
        Point from = nodes.get(a);
        Point to = nodes.get(b);
        Point across = to.minus(from).left();
        double bend = 0.09 * random.nextGaussian();
        Point middle = from.toward(to, 0.5).plus(across.times(Math.max(-0.16, Math.min(0.16, bend))));
        Curve smooth = Curve.through(List.of(from, middle, to));
        List<Point> corners = new ArrayList<>(List.of(from));
        for (int i = 1; i < 5; i++) {
            corners.add(smooth.at(smooth.length() * i / 5));
        }
        corners.add(to);
        Block block = new Block(blocks.size(), a, b, Curve.straight(corners));
        blocks.add(block);
        meeting.get(a).add(block);
        meeting.get(b).add(block);
    }

    Point node(int number) {
        return nodes.get(number);
    }

    int nodes() {
        return nodes.size();
    }

    List<Block> blocks() {
        return blocks;
    }

    List<Block> meetingAt(int node) {
        return meeting.get(node);
    }

    /** The crossing nearest to a place. */
    int nearest(Point place) {
        int best = 0;
        for (int node = 1; node < nodes.size(); node++) {
            if (nodes.get(node).to(place) < nodes.get(best).to(place)) {
                best = node;
            }
        }
        return best;
    }
}
