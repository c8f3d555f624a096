package spanwright.benchmarks.cut;

import java.util.List;
import java.util.Locale;
import spanwright.network.Block;
import spanwright.network.Network;
import spanwright.network.PathIndex;
import spanwright.network.PathList;

/** What a plant's paths are like, so that the plant can be held against its description. */
final class Likeness {

    /** A circuit's path has a port at each end, and one splice fewer than sections. */
    private static final int NO_SPLICES = 3;

    private final Network network;

    Likeness(Network network) {
        this.network = network;
    }

    String text() {
        List<Block> cables = CutAndTrace.largest(network);
        return String.format(
                Locale.ROOT,
                "%.1f splices a circuit in the mean (splitters' apart), %,d cables of %d fibers, %,.0f hops a cut of one",
                splices(),
                cables.size(),
                cables.get(0).count(),
                cables.stream().mapToLong(this::hops).average().orElse(0));
    }

    private double splices() {
        PathIndex paths = network.paths();
        long circuits = 0;
        long splices = 0;
        for (int path = 0; path < paths.limit(); path++) {
            if (paths.exists(path) && paths.circuit(path) != 0) {
                circuits++;
                splices += paths.length(path) - NO_SPLICES;
            }
        }
        return (double) splices / circuits;
    }

    private long hops(Block cable) {
        PathList list = new PathList();
        network.paths().listAcross(cable.firstPiece(), cable.count(), list);
        return list.from(list.count());
    }
}
