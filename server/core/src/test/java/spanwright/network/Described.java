package spanwright.network;

import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Locale;
import java.util.SortedSet;
import java.util.TreeSet;
import spanwright.splicing.EndKey;

/** A network as sorted lines of text that do not depend on the numbers of its pieces and paths. */
final class Described {

    private Described() {}

    /** One line an end, one a path. */
    static SortedSet<String> of(Network network) {
        TreeSet<String> lines = new TreeSet<>();
        for (Block block : network.blocks()) {
            for (int end = 2 * block.firstPiece(); end < 2 * (block.firstPiece() + block.count()); end++) {
                lines.add(name(network, end) + " -> " + name(network, network.peer(end)) + " by " + network.joint(end));
            }
        }
        PathIndex paths = network.paths();
        for (int path = 0; path < paths.limit(); path++) {
            if (paths.exists(path)) {
                lines.add(path(network, path));
            }
        }
        return lines;
    }

    private static String path(Network network, int path) {
        PathIndex paths = network.paths();
        List<Integer> there = new ArrayList<>();
        for (int end : paths.ends(path)) {
            there.add(end);
        }
        List<Integer> back = new ArrayList<>();
        there.forEach(end -> back.add(0, end ^ 1));
        String text = min(words(network, there, paths.circle(path)), words(network, back, paths.circle(path)));
        return (paths.circle(path) ? "circle " : "path ") + text + " carries " + paths.circuit(path)
                + (paths.shared(path) ? " and more" : "")
                + (paths.circuitAlone(path) == 0 ? "" : " alone");
    }

    private static String min(String one, String other) {
        return one.compareTo(other) < 0 ? one : other;
    }

    private static String words(Network network, List<Integer> ends, boolean circle) {
        List<String> words = new ArrayList<>();
        ends.forEach(end -> words.add(name(network, end)));
        if (circle) {
            Collections.rotate(words, -words.indexOf(Collections.min(words)));
        }
        return String.join(", ", words);
    }

    static String name(Network network, int end) {
        if (end == Network.NONE) {
            return "nothing";
        }
        long key = network.keyOf(end);
        return key == Network.NONE ? "inner of " + name(network, end ^ 1) : name(key);
    }

    static String name(long key) {
        return EndKey.kind(key).name().toLowerCase(Locale.ROOT) + EndKey.owner(key) + ":" + EndKey.number(key);
    }
}
