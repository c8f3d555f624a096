package spanwright.network;

import java.util.Arrays;
import spanwright.paged.PagedInts;

/**
 * Numbers the living pieces of a network anew, one behind another, so that the dead ones that years of cable work leave
 * behind take no room. Nothing is asked of the records and no path is walked: some tenths of a second for 10^7 pieces.
 */
final class LivingPlant {

    /** Up to so many dead pieces stay, however small the network is. */
    static final int DEAD_AT_LEAST = 1 << 12;
    /** One in so many pieces may be dead. */
    static final int DEAD_SHARE = 4;

    private final Network worn;
    private final BlockEditor blocks = BlockTable.empty().edit();
    /** By old piece the new one. */
    private final int[] moved;

    private LivingPlant(Network worn) {
        this.worn = worn;
        this.moved = new int[worn.pieces()];
    }

    /** A network that says the same, with all pieces alive where too many were dead; itself where not. */
    static Network of(Network network) {
        int dead = network.deadPieces();
        boolean worn = dead > DEAD_AT_LEAST && dead > network.pieces() / DEAD_SHARE;
        return worn ? renumbered(network) : network;
    }

    static Network renumbered(Network network) {
        return new LivingPlant(network).renumbered();
    }

    private Network renumbered() {
        Arrays.fill(moved, Network.NONE);
        int living = worn.pieces() - worn.deadPieces();
        int[] peer = new int[2 * living];
        int[] joint = new int[2 * living];
        int[] pathOf = new int[living];
        for (int block = 0; block < worn.blocks.count(); block++) {
            if (worn.blocks.alive(block)) {
                take(block, peer, joint, pathOf);
            }
        }
        for (int end = 0; end < peer.length; end++) {
            peer[end] = move(peer[end]);
        }
        PathIndex paths = worn.paths();
        return new Network(
                blocks.build(),
                PagedInts.copyOf(peer, peer.length),
                PagedInts.copyOf(joint, joint.length),
                worn.loose,
                PathPacker.pack(
                        paths,
                        paths.slices.size() - paths.garbage,
                        PagedInts.copyOf(pathOf, pathOf.length),
                        this::move));
    }

    private void take(int block, int[] peer, int[] joint, int[] pathOf) {
        int first = worn.blocks.field(block, Blocks.FIRST);
        int count = worn.blocks.field(block, Blocks.COUNT);
        int to = blocks.pieces();
        add(worn.blocks.block(block), block);
        for (int index = 0; index < count; index++) {
            moved[first + index] = to + index;
        }
        worn.peer.copyTo(2 * first, 2 * count, peer, 2 * to);
        worn.joint.copyTo(2 * first, 2 * count, joint, 2 * to);
        worn.paths().pathOf.copyTo(first, count, pathOf, to);
    }

    private void add(Block old, int number) {
        switch (old.kind()) {
            case SECTION -> {
                int block = blocks.addSection(old.owner(), old.fromRow(), old.toRow(), old.count());
                if (worn.blocks.find(Blocks.CABLE, old.owner()) == number) {
                    blocks.leadCable(old.owner(), block);
                }
            }
            case PANEL -> blocks.addPanel(old.owner(), old.count());
            case SPLITTER -> blocks.addSplitter(old.owner(), old.inputs(), old.count() - old.inputs());
        }
    }

    private int move(int end) {
        return end == Network.NONE ? Network.NONE : 2 * moved[end >> 1] + (end & 1);
    }
}
