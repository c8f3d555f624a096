package spanwright.network;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import spanwright.paged.PagedInts;
import spanwright.splicing.LegKind;

/**
 * The glass as it is joined, at one posting. Immutable: any number of threads may read it.
 *
 * <p>A fiber of a cable section has as end 2p the one toward the cable's start (its key is AHEAD of the run row where
 * the section begins), as 2p + 1 the one toward the cable's end (BACK of the run row where it ends). A port has its
 * rear as 2p, its front as 2p + 1. A splitter's terminal has its outer end as 2p; its inner end 2p + 1 is never joined
 * and has no key.
 */
public final class Network {

    /** No end, no piece, no path. */
    public static final int NONE = -1;

    final BlockTable blocks;
    final PagedInts peer;
    final PagedInts joint;
    final LooseJoints loose;
    private final PathIndex paths;

    Network(BlockTable blocks, PagedInts peer, PagedInts joint, LooseJoints loose, PathIndex paths) {
        this.blocks = blocks;
        this.peer = peer;
        this.joint = joint;
        this.loose = loose;
        this.paths = paths;
    }

    /** A network of nothing. */
    static Network empty() {
        return new Network(
                BlockTable.empty(), PagedInts.empty(), PagedInts.empty(), LooseJoints.empty(), PathIndex.empty());
    }

    /** The end joined to an end, by a joint or as uncut glass; {@link #NONE} where there is none. */
    public int peer(int end) {
        return peer.get(end);
    }

    /**
     * The joint that names an end; 0 for uncut glass and for a free end. An end may have a joint and no peer: where
     * the other side is not in service.
     */
    public int joint(int end) {
        return joint.get(end);
    }

    /** Pieces are numbered from 0 to this less 1, dead ones included; piece p has the ends 2p and 2p + 1. */
    public int pieces() {
        return blocks.pieces();
    }

    /** How many of the pieces are dead: replaced by fresh ones, joined to nothing, on no path. */
    public int deadPieces() {
        return blocks.dead;
    }

    /** Whether a piece is there, not replaced by a fresh one. */
    public boolean alive(int piece) {
        return blocks.alive(blocks.blockOf(piece));
    }

    /** The block of a piece. */
    public Block blockOf(int piece) {
        return blocks.block(blocks.blockOf(piece));
    }

    /** All living blocks, by rising first piece. */
    public List<Block> blocks() {
        List<Block> found = new ArrayList<>();
        for (int block = 0; block < blocks.count(); block++) {
            if (blocks.alive(block)) {
                found.add(blocks.block(block));
            }
        }
        return found;
    }

    /** The end with a key; {@link #NONE} where it is not in the network: no such end, or its plant not in service. */
    public int endOf(long endKey) {
        return blocks.endOf(endKey);
    }

    /** The key of an end of a living piece; {@link #NONE} for a splitter's inner end. */
    public long keyOf(int end) {
        return blocks.keyOf(end);
    }

    /** The sections of a cable, from its start on; none where it is not in service. */
    public List<Block> sectionsOf(int cable) {
        List<Block> found = new ArrayList<>();
        for (int block = blocks.find(Blocks.CABLE, cable); block != NONE; block = blocks.nextSection(block)) {
            found.add(blocks.block(block));
        }
        return found;
    }

    /** The section that begins at a run row, if any. */
    public Optional<Block> sectionAhead(int runRow) {
        return find(blocks.find(Blocks.AHEAD, runRow));
    }

    /** The section that ends at a run row, if any. */
    public Optional<Block> sectionBack(int runRow) {
        return find(blocks.find(Blocks.BACK, runRow));
    }

    /** The ports of a panel, where it is in service. */
    public Optional<Block> panelBlock(int panel) {
        return find(blocks.find(Blocks.PANEL, panel));
    }

    /** The terminals of a splitter, where it is in service. */
    public Optional<Block> splitterBlock(int splitter) {
        return find(blocks.find(Blocks.SPLITTER, splitter));
    }

    private Optional<Block> find(int block) {
        return block == NONE ? Optional.empty() : Optional.of(blocks.block(block));
    }

    /** The glass paths. */
    public PathIndex paths() {
        return paths;
    }

    /** Joints in the glass that name a leg which is not in the network, in the order entered; not to be changed. */
    int[] looseJoints(LegKind kind, int owner) {
        return loose.find(kind, owner);
    }

    /** Heap bytes of the network and its path index, the records apart. */
    public long heapBytes() {
        return blocks.heapBytes() + peer.heapBytes() + joint.heapBytes() + paths.heapBytes();
    }
}
