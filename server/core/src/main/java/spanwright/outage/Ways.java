package spanwright.outage;

import java.util.ArrayDeque;
import java.util.Arrays;
import java.util.Comparator;
import java.util.Deque;
import java.util.HashMap;
import java.util.HashSet;
import java.util.Map;
import java.util.Objects;
import java.util.Optional;
import java.util.Set;
import java.util.stream.IntStream;
import org.jspecify.annotations.Nullable;
import spanwright.network.Block;
import spanwright.network.BlockKind;
import spanwright.network.Network;
import spanwright.network.PathIndex;

/**
 * All ways that light takes from one front, as a trace takes them, but glass path by glass path instead of piece by
 * piece. The first way into each glass path is kept, so one of these serves all circuits that begin at the front.
 */
final class Ways {

    /** The most splitters in a row, as in a trace. */
    private static final int MOST_SPLITTERS = 500;
    /** How many crossings to try before no terminal is tried twice. */
    private static final int MOST_CROSSINGS = 20_000;

    private final Network network;
    private final PathIndex paths;
    private final int front;
    private final Map<Integer, Way> firstInto = new HashMap<>();
    private final Set<Integer> crossed = new HashSet<>();
    private boolean once;
    private int crossings;
    private int depth;
    private int entered;

    Ways(Network network, int front) {
        this.network = network;
        this.paths = network.paths();
        this.front = front;
        enter(null, front);
        if (crossings > MOST_CROSSINGS) {
            once = true;
            crossings = 0;
            firstInto.clear();
            crossed.clear();
            enter(null, front);
        }
    }

    /** Into a glass path by an end of it. */
    private record Way(@Nullable Way before, int entering, int order) {}

    private void enter(@Nullable Way before, int entering) {
        Way way = new Way(before, entering, entered++);
        firstInto.putIfAbsent(entering, way);
        int far = farEnd(entering);
        if (far == Network.NONE || !innerEnd(far) || depth >= MOST_SPLITTERS) {
            return;
        }
        depth++;
        crossings++;
        int terminal = far >> 1;
        crossed.add(terminal);
        for (int other : across(terminal)) {
            if (!once && crossings > MOST_CROSSINGS) {
                break;
            }
            if (crossed.add(other)) {
                enter(way, 2 * other + 1);
                leave(other);
            }
        }
        leave(terminal);
        depth--;
    }

    private void leave(int terminal) {
        if (!once) {
            crossed.remove(terminal);
        }
    }

    /** The end by which light that entered a glass path leaves it; NONE where it comes back to where it began. */
    private int farEnd(int entering) {
        int path = paths.pathOf(entering >> 1);
        if (entering != front && path == paths.pathOf(front >> 1)) {
            return Network.NONE;
        }
        if (paths.circle(path)) {
            return Network.NONE;
        }
        if (entering == paths.firstEnd(path)) {
            return paths.lastEnd(path);
        }
        return entering == paths.lastEnd(path) || !forward(path, entering) ? paths.firstEnd(path) : paths.lastEnd(path);
    }

    private boolean forward(int path, int entering) {
        return IntStream.of(paths.ends(path)).anyMatch(end -> end == entering);
    }

    private boolean innerEnd(int end) {
        return (end & 1) == 1 && network.blockOf(end >> 1).kind() == BlockKind.SPLITTER;
    }

    /** The terminals on the other side of a splitter, in order. */
    private int[] across(int terminal) {
        Block block = network.blockOf(terminal);
        return (block.number(terminal) <= block.inputs()
                        ? IntStream.rangeClosed(block.inputs() + 1, block.count())
                        : IntStream.rangeClosed(1, block.inputs()))
                .map(block::piece)
                .toArray();
    }

    /** The first way to a front, if there is any. */
    Optional<Route> find(int target) {
        int path = paths.pathOf(target >> 1);
        return IntStream.of(front, paths.firstEnd(path), paths.lastEnd(path))
                .filter(entering -> paths.pathOf(entering >> 1) == path)
                .mapToObj(firstInto::get)
                .filter(Objects::nonNull)
                .filter(way -> contains(way.entering, target))
                .min(Comparator.comparingInt(Way::order))
                .map(way -> new Route(enterings(way), target));
    }

    private boolean contains(int entering, int target) {
        return farEnd(entering) == target
                || IntStream.of(glass(entering, Network.NONE)).anyMatch(end -> (end ^ 1) == target);
    }

    private static int[] enterings(Way way) {
        Deque<Integer> found = new ArrayDeque<>();
        for (Way at = way; at != null; at = at.before) {
            found.addFirst(at.entering);
        }
        return found.stream().mapToInt(Integer::intValue).toArray();
    }

    /** As far as light goes without a choice. */
    Route plain() {
        Set<Integer> met = new HashSet<>();
        IntStream.Builder found = IntStream.builder();
        int entering = front;
        while (entering != Network.NONE) {
            found.add(entering);
            int far = farEnd(entering);
            entering = far != Network.NONE && innerEnd(far) ? onlyOther(far >> 1, met) : Network.NONE;
        }
        return new Route(found.build().toArray(), Network.NONE);
    }

    private int onlyOther(int terminal, Set<Integer> met) {
        int[] across = across(terminal);
        met.add(terminal);
        return across.length == 1 && met.add(across[0]) ? 2 * across[0] + 1 : Network.NONE;
    }

    /**
     * The ends by which light enters the pieces of a glass path, from one that it enters by an end on.
     *
     * @param target the end at which it stands still, or NONE: as far as it goes, before it comes back to the front
     */
    int[] glass(int entering, int target) {
        int path = paths.pathOf(entering >> 1);
        int[] ends = paths.ends(path);
        int at = IntStream.range(0, ends.length)
                .filter(index -> ends[index] >> 1 == entering >> 1)
                .findFirst()
                .orElseThrow();
        boolean forward = ends[at] == entering;
        int count = paths.circle(path) ? ends.length : forward ? ends.length - at : at + 1;
        int[] glass = new int[count];
        for (int step = 0; step < count; step++) {
            int next = Math.floorMod(forward ? at + step : at - step, ends.length);
            glass[step] = forward ? ends[next] : ends[next] ^ 1;
            if (step > 0 && glass[step] >> 1 == front >> 1) {
                return Arrays.copyOf(glass, step);
            }
            if ((glass[step] ^ 1) == target) {
                return Arrays.copyOf(glass, step + 1);
            }
        }
        return glass;
    }
}
