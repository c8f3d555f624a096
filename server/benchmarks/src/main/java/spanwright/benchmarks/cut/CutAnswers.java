package spanwright.benchmarks.cut;

import java.util.stream.IntStream;
import spanwright.circuits.Circuit;
import spanwright.circuits.PortRange;
import spanwright.network.Block;
import spanwright.network.BlockKind;
import spanwright.network.Network;
import spanwright.network.PathIndex;
import spanwright.network.PathList;
import spanwright.network.Snapshot;
import spanwright.records.Relation;
import spanwright.splicing.EndKey;

/** The program's own answers to a cut, from the path index. */
final class CutAnswers {

    private static final int STRIDE = 4;
    private static final int FIRST = 1;
    private static final int LAST = 2;
    private static final int CIRCUIT = 3;

    private final Snapshot snapshot;
    private final Network network;
    private final PathIndex paths;
    private final PathList list = new PathList();

    CutAnswers(Snapshot snapshot) {
        this.snapshot = snapshot;
        this.network = snapshot.network();
        this.paths = network.paths();
    }

    /** Per fiber of a block four ints: path, first end, last end, circuit. */
    int[] across(Block block) {
        return paths.across(block.firstPiece(), block.count());
    }

    /** The same as {@link spanwright.benchmarks.sql.SqlNetwork#ends}, to compare. */
    int[][] ends(Block block) {
        int[] across = across(block);
        int count = block.count();
        int[][] found = new int[count + 1][2];
        IntStream.Builder circuits = IntStream.builder();
        for (int index = 0; index < count; index++) {
            int first = across[STRIDE * index + FIRST];
            int last = across[STRIDE * index + LAST];
            found[index][0] = Math.min(first, last);
            found[index][1] = Math.max(first, last);
            int circuit = across[STRIDE * index + CIRCUIT];
            if (circuit != 0 && !paths.shared(across[STRIDE * index])) {
                circuits.add(circuit);
            } else {
                atFront(first, circuits);
                atFront(last, circuits);
            }
        }
        found[count] = circuits.build().sorted().distinct().toArray();
        return found;
    }

    /** Circuits that end at a front, as those behind a splitter do. */
    private void atFront(int end, IntStream.Builder circuits) {
        if ((end & 1) == 0 || network.blockOf(end >> 1).kind() != BlockKind.PANEL) {
            return;
        }
        long key = network.keyOf(end);
        for (int id : snapshot.records().owned(Relation.PANEL_CIRCUITS, EndKey.owner(key))) {
            Circuit circuit = snapshot.records().circuits().get(id);
            if (at(circuit.a(), key) || at(circuit.z(), key)) {
                circuits.add(id);
            }
        }
    }

    private static boolean at(PortRange ports, long front) {
        return ports.panel() == EndKey.owner(front) && ports.ports().contains(EndKey.number(front));
    }

    /** The sum of all pieces met on the paths of neighbouring pieces, their own piece counted for both ways. */
    long hops(Block block) {
        int firstPiece = block.firstPiece();
        int count = block.count();
        paths.listAcross(firstPiece, count, list);
        int[] ends = list.ends();
        int length = list.from(count);
        long sum = (long) count * firstPiece + (long) count * (count - 1) / 2;
        for (int place = 0; place < length; place++) {
            sum += ends[place] >> 1;
        }
        return sum;
    }

    /** The same for one piece. */
    long trace(int piece) {
        long sum = piece;
        for (int end : paths.ends(paths.pathOf(piece))) {
            sum += end >> 1;
        }
        return sum;
    }
}
