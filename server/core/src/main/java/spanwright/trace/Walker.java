package spanwright.trace;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.HashSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import java.util.stream.IntStream;
import spanwright.network.Block;
import spanwright.network.BlockKind;
import spanwright.network.Network;

/**
 * Walks the network from an end, piece by piece. Only splitters give a choice, and only at splitters (or at the piece
 * where it began) can a walk come to what it has walked already, so only there is that asked.
 */
final class Walker {

    /** The most paths of one answer; a splitter of 128 behind one of 128 has 16,384. */
    static final int MOST_WALKS = 1 << 16;
    /** The most splitters in a row on one walk; light is long gone. */
    static final int MOST_SPLITTERS = 500;
    /** How many crossings to try for one end before terminals are tried once only. */
    private static final int MOST_CROSSINGS = 20_000;

    private final Network network;
    private final int mostWalks;
    private final int mostSplitters;

    Walker(Network network) {
        this(network, MOST_WALKS, MOST_SPLITTERS);
    }

    Walker(Network network, int mostWalks, int mostSplitters) {
        this.network = network;
        this.mostWalks = mostWalks;
        this.mostSplitters = mostSplitters;
    }

    int mostWalks() {
        return mostWalks;
    }

    /** Every walk that begins by entering a piece by an end, in order of the splitters' inputs and outputs. */
    List<Walk> all(int entering) {
        Search search = new Search(entering, Network.NONE);
        search.walk(entering);
        return search.found;
    }

    /**
     * The first walk that begins by entering a piece by an end and comes to stand at another end, if any. Where splitters
     * make a lattice with too many ways to try, no terminal is tried twice.
     */
    Optional<Walk> find(int entering, int target) {
        Search search = new Search(entering, target);
        search.walk(entering);
        if (search.found.isEmpty() && search.crossings > MOST_CROSSINGS) {
            search = new Search(entering, target);
            search.once = true;
            search.walk(entering);
        }
        return search.found.stream().findFirst();
    }

    /** The walk that begins by entering a piece by an end, as far as it goes without a choice. */
    Walk plain(int entering) {
        Search search = new Search(entering, Network.NONE);
        search.plain = true;
        search.walk(entering);
        return search.found.get(0);
    }

    /** Whether an end is the outer end of a splitter's terminal. */
    private boolean terminal(int end) {
        return (end & 1) == 0 && network.blockOf(end >> 1).kind() == BlockKind.SPLITTER;
    }

    /** The terminals on the other side of a splitter, in order. */
    private int[] across(int terminal) {
        Block block = network.blockOf(terminal);
        boolean input = block.number(terminal) <= block.inputs();
        return (input
                        ? IntStream.rangeClosed(block.inputs() + 1, block.count())
                        : IntStream.rangeClosed(1, block.inputs()))
                .map(block::piece)
                .toArray();
    }

    /** One walk after another, depth first. */
    private final class Search {

        private final int start;
        private final int target;
        private boolean plain;
        private boolean once;
        private int crossings;
        private int depth;
        private final List<Walk> found = new ArrayList<>();
        private final Set<Integer> crossed = new HashSet<>();
        private int[] trail = new int[64];
        private int size;

        Search(int entering, int target) {
            this.start = entering >> 1;
            this.target = target;
        }

        void walk(int entering) {
            int mark = size;
            int at = entering;
            while (at != Network.NONE) {
                push(at);
                at = onward(at);
            }
            size = mark;
        }

        /** The end by which the walk enters the next piece; NONE where it ends or where others have gone on from here. */
        private int onward(int at) {
            int exit = at ^ 1;
            if (exit == target) {
                emit(Walk.Stop.FOUND);
                return Network.NONE;
            }
            int next = network.peer(exit);
            if (next == Network.NONE) {
                if (terminal(at)) {
                    cross(at >> 1);
                } else {
                    emit(Walk.Stop.FREE);
                }
            } else if (next >> 1 == start) {
                emit(Walk.Stop.CIRCLE);
                return Network.NONE;
            }
            return next;
        }

        private void cross(int terminal) {
            int[] across = across(terminal);
            if ((plain && across.length > 1) || depth >= mostSplitters) {
                emit(Walk.Stop.CHOICE);
                return;
            }
            depth++;
            crossings++;
            crossed.add(terminal);
            boolean circled = false;
            for (int other : across) {
                if (found.size() >= mostWalks) {
                    emit(Walk.Stop.CHOICE);
                    break;
                }
                if (crossed.add(other)) {
                    walk(2 * other + 1);
                    leave(other);
                } else if (!circled) {
                    circled = true;
                    emit(Walk.Stop.CROSSED);
                }
                if (target != Network.NONE && (!found.isEmpty() || (!once && crossings > MOST_CROSSINGS))) {
                    break;
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

        private void push(int entering) {
            if (size == trail.length) {
                trail = Arrays.copyOf(trail, 2 * size);
            }
            trail[size++] = entering;
        }

        private void emit(Walk.Stop stop) {
            if (target == Network.NONE || stop == Walk.Stop.FOUND) {
                found.add(new Walk(Arrays.copyOf(trail, size), stop));
            }
        }
    }
}
