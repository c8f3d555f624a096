package spanwright.planning;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.BitSet;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import spanwright.journal.RecordKind;
import spanwright.network.Block;
import spanwright.network.BlockKind;
import spanwright.network.Network;
import spanwright.network.PathIndex;
import spanwright.network.Snapshot;
import spanwright.plant.Pass;
import spanwright.plant.PlantState;
import spanwright.records.Records;
import spanwright.splicing.EndKey;
import spanwright.splicing.LegKind;

/**
 * Where spare glass can be joined: for each end its enclosure and structure, and which pieces are spare. Made once for a
 * snapshot and searched many times; one thread's.
 *
 * <p>Glass that meets a splitter is never spare here: light may come out of it though no circuit is recorded.
 */
public final class SpareGlass {

    private static final byte UNJUDGED = -1;

    /** Beside the qualities of spare glass, 0 to 2. */
    private static final int HELD = 3;

    private final Snapshot snapshot;
    private final Network network;
    private final Records records;
    private final FiberUses uses;
    private final OpenTubes tubes;
    private final int[] enclosureOf;
    private final byte[] quality;
    private final Map<Integer, List<EndRow>> inEnclosure = new HashMap<>();
    private final Map<Integer, List<EndRow>> frontsAt = new HashMap<>();
    /** By path, 0 where it was not asked yet. */
    private final long[] likeness;

    private final byte[] frontFree;
    private final byte[] held;
    private final FreeableEnds freeable;
    private final BitSet ports = new BitSet();
    /** By enclosure, 0 where it was not asked yet. */
    private final int[] structureOf;

    /** The spare glass of a snapshot. */
    public SpareGlass(Snapshot snapshot) {
        this.snapshot = snapshot;
        this.network = snapshot.network();
        this.records = snapshot.records();
        this.uses = new FiberUses(snapshot);
        this.tubes = new OpenTubes(snapshot, uses.circuits());
        this.enclosureOf = new int[2 * network.pieces()];
        this.quality = new byte[network.pieces()];
        this.likeness = new long[network.paths().limit()];
        this.frontFree = new byte[network.pieces()];
        Arrays.fill(quality, UNJUDGED);
        this.held = new byte[network.pieces()];
        Arrays.fill(frontFree, UNJUDGED);
        Arrays.fill(held, UNJUDGED);
        this.freeable = new FreeableEnds(this);
        this.structureOf = new int[records.limit(RecordKind.ENCLOSURE)];
        network.blocks().forEach(this::place);
    }

    /**
     * Neighbouring ends, two apart.
     *
     * @param first the first of them
     * @param count how many
     * @param rear whether they are rears of ports
     */
    record EndRow(int first, int count, boolean rear) {}

    private void place(Block block) {
        switch (block.kind()) {
            case SECTION -> {
                place(block, 0, enclosureAt(block.fromRow()), false);
                place(block, 1, enclosureAt(block.toRow()), false);
            }
            case PANEL -> {
                int enclosure = records.panels().get(block.owner()).enclosure();
                place(block, 0, enclosure, true);
                ports.set(block.firstPiece(), block.firstPiece() + block.count());
                for (int piece = block.firstPiece(); piece < block.firstPiece() + block.count(); piece++) {
                    enclosureOf[2 * piece + 1] = enclosure;
                }
                frontsAt.computeIfAbsent(structure(enclosure), key -> new ArrayList<>())
                        .add(new EndRow(2 * block.firstPiece() + 1, block.count(), false));
            }
            case SPLITTER ->
                place(block, 0, records.splitters().get(block.owner()).enclosure(), false);
        }
    }

    private void place(Block block, int side, int enclosure, boolean rear) {
        if (enclosure == 0) {
            return;
        }
        for (int piece = block.firstPiece(); piece < block.firstPiece() + block.count(); piece++) {
            enclosureOf[2 * piece + side] = enclosure;
        }
        inEnclosure
                .computeIfAbsent(enclosure, key -> new ArrayList<>())
                .add(new EndRow(2 * block.firstPiece() + side, block.count(), rear));
    }

    private int enclosureAt(int runRow) {
        return records.findPassAt(runRow)
                .map(Pass::enclosure)
                .filter(enclosure -> records.enclosures().get(enclosure).state() == PlantState.IN_SERVICE)
                .orElse(0);
    }

    /** The snapshot. */
    public Snapshot snapshot() {
        return snapshot;
    }

    /** What its glass is used for. */
    public FiberUses uses() {
        return uses;
    }

    /** The tubes that may be opened. */
    OpenTubes tubes() {
        return tubes;
    }

    /** The enclosure in which an end lies, 0 where in none. */
    public int enclosure(int end) {
        return enclosureOf[end];
    }

    /** The structure of an enclosure. */
    public int structure(int enclosure) {
        if (structureOf[enclosure] == 0) {
            structureOf[enclosure] = records.enclosures().get(enclosure).structure();
        }
        return structureOf[enclosure];
    }

    /** Whether a piece is a port. */
    boolean isPort(int piece) {
        return ports.get(piece);
    }

    /** The ends that may be joined anew. */
    FreeableEnds freeable() {
        return freeable;
    }

    /** The ends that can be spliced or terminated in an enclosure. */
    List<EndRow> ends(int enclosure) {
        return inEnclosure.getOrDefault(enclosure, List.of());
    }

    /** The fronts at a structure. */
    List<EndRow> fronts(int structure) {
        return frontsAt.getOrDefault(structure, List.of());
    }

    /** Whether a piece is spare: unused, unflagged, all of its glass path known. */
    public boolean isSpare(int piece) {
        return quality(piece) > 0;
    }

    /** Whether a piece is spare and all of its glass path verified; a port to which nothing is joined needs no proof. */
    public boolean isVerified(int piece) {
        return quality(piece) > 1;
    }

    private int quality(int piece) {
        if (quality[piece] == UNJUDGED) {
            quality[piece] = (byte) judge(piece);
        }
        return quality[piece];
    }

    /**
     * Whether the joint at an end leads to a fiber that is reserved or leased: then it is somebody else's, and is left as
     * it is.
     */
    boolean isHeldJoint(int end) {
        int peer = network.peer(end);
        return peer != Network.NONE && network.joint(end) != 0 && isHeld(peer >> 1);
    }

    private boolean isHeld(int piece) {
        if (held[piece] == UNJUDGED) {
            Block block = network.blockOf(piece);
            FiberUse use = block.kind() == BlockKind.SECTION
                    ? uses.of(block, block.number(piece)).use()
                    : FiberUse.SPARE;
            held[piece] = (byte) (use == FiberUse.RESERVED || use == FiberUse.LEASED ? 1 : 0);
        }
        return held[piece] == 1;
    }

    private int judge(int piece) {
        Block block = network.blockOf(piece);
        PathIndex paths = network.paths();
        int path = paths.pathOf(piece);
        if (block.kind() == BlockKind.SPLITTER
                || path == Network.NONE
                || paths.circuit(path) != 0
                || paths.circle(path)
                || taken(paths.firstEnd(path))
                || taken(paths.lastEnd(path))) {
            return 0;
        }
        FiberUse use = block.kind() == BlockKind.SECTION
                ? uses.of(block, block.number(piece)).use()
                : uses.ofPath(path);
        if (use == FiberUse.SPARE_VERIFIED || (use == FiberUse.SPARE && bare(block, path))) {
            return 2;
        }
        return use == FiberUse.SPARE ? 1 : 0;
    }

    private boolean bare(Block block, int path) {
        return block.kind() == BlockKind.PANEL && network.paths().length(path) == 1;
    }

    /** Whether a path's end is a splitter, or a front on which a circuit ends, its path whole or not. */
    private boolean taken(int end) {
        Block block = network.blockOf(end >> 1);
        return switch (block.kind()) {
            case SPLITTER -> true;
            case PANEL -> {
                long key = network.keyOf(end);
                yield EndKey.kind(key) == LegKind.FRONT
                        && !uses.circuits()
                                .endingOn(EndKey.owner(key), EndKey.number(key))
                                .isEmpty();
            }
            case SECTION -> false;
        };
    }

    /** The fronts at a structure into which nothing is plugged, by panel and port. */
    public List<Integer> freeFronts(int structure) {
        List<Integer> free = new ArrayList<>();
        for (EndRow row : fronts(structure)) {
            addFree(row, free);
        }
        return free;
    }

    /** The fronts of a panel into which nothing is plugged, by port; none where it is not in service. */
    public List<Integer> freeFrontsOf(int panel) {
        List<Integer> free = new ArrayList<>();
        network.panelBlock(panel)
                .ifPresent(block -> addFree(new EndRow(2 * block.firstPiece() + 1, block.count(), false), free));
        return free;
    }

    private void addFree(EndRow row, List<Integer> free) {
        for (int index = 0; index < row.count(); index++) {
            int front = row.first() + 2 * index;
            if (isFrontFree(front) && isSpare(front >> 1)) {
                free.add(front);
            }
        }
    }

    /** Whether nothing is plugged into a front: no jumper, no circuit's end. */
    boolean isFrontFree(int front) {
        int port = front >> 1;
        if (frontFree[port] == UNJUDGED) {
            frontFree[port] = (byte) (network.joint(front) == 0 && !taken(front) ? 1 : 0);
        }
        return frontFree[port] == 1;
    }

    /**
     * A number that is alike for glass paths that run alike: through the same sections and ports in the same
     * tubes, by the same rows of joints, as spare. Which of them a search takes makes no odds.
     */
    long likenessOf(int path) {
        if (likeness[path] == 0) {
            likeness[path] = reckonLikeness(path);
        }
        return likeness[path];
    }

    private long reckonLikeness(int path) {
        int[] ends = network.paths().ends(path);
        long there = 1;
        long back = 1;
        for (int index = 0; index < ends.length; index++) {
            there = there * 0x9E3779B97F4A7C15L + mark(ends[index]);
            back = back * 0x9E3779B97F4A7C15L + mark(ends[ends.length - 1 - index] ^ 1);
        }
        return there + back;
    }

    private long mark(int entered) {
        int piece = entered >> 1;
        Block block = network.blockOf(piece);
        long mark = block.firstPiece();
        if (block.kind() == BlockKind.SECTION) {
            mark = mark * 1009 + tubes.tube(block, block.number(piece));
        }
        mark = mark * 4 + (isHeld(piece) ? HELD : quality(piece));
        return (mark * 1_000_003 + network.joint(entered)) * 1_000_003 + network.joint(entered ^ 1);
    }
}
