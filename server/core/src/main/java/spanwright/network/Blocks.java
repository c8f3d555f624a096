package spanwright.network;

import spanwright.splicing.EndKey;
import spanwright.splicing.LegKind;

/**
 * Where pieces lie and what they are, built or being edited. A block is eight ints in a row; blocks follow one another
 * by rising first piece.
 */
abstract class Blocks {

    static final int NONE = -1;

    static final int STRIDE = 8;
    static final int KIND = 0;
    static final int OWNER = 1;
    static final int FROM_ROW = 2;
    static final int TO_ROW = 3;
    static final int FIRST = 4;
    static final int COUNT = 5;
    static final int INPUTS = 6;
    /** 1 while its pieces are alive, 0 afterwards. */
    static final int ALIVE = 7;

    /** The first block of a chunk of pieces is tabled: so many pieces to a chunk, as a power of 2. */
    static final int CHUNK_SHIFT = 5;

    /** Maps from an owner to a block: of the section that ends at a run row. */
    static final int BACK = 0;
    /** Of the section that begins at a run row. */
    static final int AHEAD = 1;
    /** Of a splitter. */
    static final int SPLITTER = 2;
    /** Of a panel. */
    static final int PANEL = 3;
    /** Of the first section of a cable. */
    static final int CABLE = 4;

    static final int MAPS = 5;

    private static final BlockKind[] KINDS = BlockKind.values();

    /** How many pieces there are, dead ones included. */
    abstract int pieces();

    /** How many blocks there are, dead ones included. */
    abstract int count();

    /** One of a block's eight ints. */
    abstract int field(int block, int field);

    /** The block in which the first piece of a chunk lies. */
    abstract int chunk(int chunk);

    /** The block to which a map leads, or NONE. */
    abstract int find(int map, int owner);

    final boolean alive(int block) {
        return field(block, ALIVE) != 0;
    }

    /** The block of a piece. */
    final int blockOf(int piece) {
        int block = chunk(piece >>> CHUNK_SHIFT);
        int last = count() - 1;
        while (block < last && field(block + 1, FIRST) <= piece) {
            block++;
        }
        return block;
    }

    final Block block(int block) {
        return new Block(
                KINDS[field(block, KIND)],
                field(block, OWNER),
                field(block, FROM_ROW),
                field(block, TO_ROW),
                field(block, FIRST),
                field(block, COUNT),
                field(block, INPUTS));
    }

    /** The block to which a leg belongs, or NONE where it is not in the network. */
    final int blockOfLeg(LegKind kind, int owner) {
        return switch (kind) {
            case BACK -> find(BACK, owner);
            case AHEAD -> find(AHEAD, owner);
            case IN, OUT -> find(SPLITTER, owner);
            case REAR, FRONT -> find(PANEL, owner);
        };
    }

    /** The end numbered 1 of a leg in its block; the one numbered n is 2 (n - 1) further. */
    final int firstEnd(int block, LegKind kind) {
        int first = 2 * field(block, FIRST);
        return switch (kind) {
            case AHEAD, REAR, IN -> first;
            case BACK, FRONT -> first + 1;
            case OUT -> first + 2 * field(block, INPUTS);
        };
    }

    /** How many ends a leg has in its block. */
    final int endCount(int block, LegKind kind) {
        return switch (kind) {
            case AHEAD, BACK, REAR, FRONT -> field(block, COUNT);
            case IN -> field(block, INPUTS);
            case OUT -> field(block, COUNT) - field(block, INPUTS);
        };
    }

    final int endOf(long key) {
        LegKind kind = EndKey.kind(key);
        int block = blockOfLeg(kind, EndKey.owner(key));
        int number = EndKey.number(key);
        return block == NONE || number > endCount(block, kind) ? NONE : firstEnd(block, kind) + 2 * (number - 1);
    }

    final long keyOf(int end) {
        int block = blockOf(end >> 1);
        int number = (end >> 1) - field(block, FIRST) + 1;
        boolean second = (end & 1) != 0;
        return switch (KINDS[field(block, KIND)]) {
            case SECTION ->
                second
                        ? EndKey.of(LegKind.BACK, field(block, TO_ROW), number)
                        : EndKey.of(LegKind.AHEAD, field(block, FROM_ROW), number);
            case PANEL -> EndKey.of(second ? LegKind.FRONT : LegKind.REAR, field(block, OWNER), number);
            case SPLITTER -> second ? NONE : terminalKey(block, number);
        };
    }

    private long terminalKey(int block, int number) {
        int inputs = field(block, INPUTS);
        int splitter = field(block, OWNER);
        return number <= inputs
                ? EndKey.of(LegKind.IN, splitter, number)
                : EndKey.of(LegKind.OUT, splitter, number - inputs);
    }

    /** The section after one in its cable, or NONE. */
    final int nextSection(int block) {
        return find(AHEAD, field(block, TO_ROW));
    }
}
