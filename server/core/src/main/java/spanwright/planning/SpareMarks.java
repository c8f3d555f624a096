package spanwright.planning;

import java.util.BitSet;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Set;
import spanwright.network.Network;

/**
 * What sets glass paths apart within one search that else run alike: pieces of its own and pieces taken, each by itself;
 * closed pieces by their section.
 */
final class SpareMarks {

    private static final long MIX = 0xD6E8FEB86659FD93L;

    private final Network network;
    private final Map<Integer, Long> ofPath = new HashMap<>();
    /** Paths that have a mark: few, so that most are told by one bit. */
    private final BitSet marked = new BitSet();

    SpareMarks(Network network) {
        this.network = network;
    }

    /** Marks the paths of closed pieces; those of one section are alike in it. */
    SpareMarks closed(BitSet pieces) {
        pieces.stream()
                .filter(piece -> piece < network.pieces() && network.alive(piece))
                .forEach(piece -> mark(piece, 2L * network.blockOf(piece).firstPiece()));
        return this;
    }

    /** Marks the paths of pieces that are like no others; these marks stand beside those of others. */
    SpareMarks single(BitSet own, Set<Integer> taken) {
        own.stream().forEach(piece -> mark(piece, 2L * piece + 1));
        taken.forEach(piece -> mark(piece, -2L * piece - 1));
        return this;
    }

    /** Marks the paths that lead to goals; goals of one panel are alike. */
    SpareMarks goals(List<SpareGoal> goals) {
        for (SpareGoal goal : goals) {
            int piece = goal.end() >> 1;
            mark(piece, -8L * network.blockOf(piece).firstPiece() - (goal.plugged() ? 4 : 2));
        }
        return this;
    }

    private void mark(int piece, long value) {
        marked.set(network.paths().pathOf(piece));
        ofPath.merge(network.paths().pathOf(piece), ((value + 1) * MIX) ^ ((value * MIX) >>> 29), Long::sum);
    }

    /** The mark of a path, 0 where it has none. */
    long ofPath(int path) {
        return marked.get(path) ? ofPath.getOrDefault(path, 0L) : 0;
    }
}
