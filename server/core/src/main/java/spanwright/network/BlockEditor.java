package spanwright.network;

import java.util.List;
import spanwright.paged.PagedInts;

/** Adds fresh blocks at the end and declares old ones dead. One thread's; dead after {@link #build}. */
final class BlockEditor extends Blocks {

    private final PagedInts.Editor fields;
    private final PagedInts.Editor chunks;
    private final List<PagedInts.Editor> maps;
    private int pieces;
    private int dead;

    BlockEditor(BlockTable base) {
        this.fields = base.fields.edit();
        this.chunks = base.chunks.edit();
        this.maps = base.maps.stream().map(PagedInts::edit).toList();
        this.pieces = base.pieces;
        this.dead = base.dead;
    }

    @Override
    int pieces() {
        return pieces;
    }

    @Override
    int count() {
        return fields.size() / STRIDE;
    }

    @Override
    int field(int block, int field) {
        return fields.get(block * STRIDE + field);
    }

    @Override
    int chunk(int chunk) {
        return chunks.get(chunk);
    }

    @Override
    int find(int map, int owner) {
        PagedInts.Editor blocks = maps.get(map);
        return owner < blocks.size() ? blocks.get(owner) - 1 : NONE;
    }

    /** Adds a section of a cable and gives its block. */
    int addSection(int cable, int fromRow, int toRow, int fibers) {
        int block = add(BlockKind.SECTION, cable, fromRow, toRow, fibers, 0);
        lead(AHEAD, fromRow, block);
        lead(BACK, toRow, block);
        return block;
    }

    /** Says which section is a cable's first. */
    void leadCable(int cable, int block) {
        lead(CABLE, cable, block);
    }

    int addPanel(int panel, int ports) {
        int block = add(BlockKind.PANEL, panel, 0, 0, ports, 0);
        lead(PANEL, panel, block);
        return block;
    }

    int addSplitter(int splitter, int inputs, int outputs) {
        int block = add(BlockKind.SPLITTER, splitter, 0, 0, inputs + outputs, inputs);
        lead(SPLITTER, splitter, block);
        return block;
    }

    private int add(BlockKind kind, int owner, int fromRow, int toRow, int count, int inputs) {
        int block = count();
        fields.grow(fields.size() + STRIDE, 0);
        int[] all = {kind.ordinal(), owner, fromRow, toRow, pieces, count, inputs, 1};
        fields.copyFrom(all, STRIDE, block * STRIDE);
        int firstChunk = (pieces + (1 << CHUNK_SHIFT) - 1) >>> CHUNK_SHIFT;
        pieces += count;
        int chunkEnd = (pieces + (1 << CHUNK_SHIFT) - 1) >>> CHUNK_SHIFT;
        if (chunkEnd > firstChunk) {
            chunks.grow(chunkEnd, block);
        }
        return block;
    }

    private void lead(int map, int owner, int block) {
        PagedInts.Editor blocks = maps.get(map);
        if (owner >= blocks.size()) {
            blocks.grow(owner + 1, 0);
        }
        blocks.set(owner, block + 1);
    }

    /** Declares a block dead; no map leads to it any more. */
    void kill(int block) {
        fields.set(block * STRIDE + ALIVE, 0);
        dead += field(block, COUNT);
        int owner = field(block, OWNER);
        switch (BlockKind.values()[field(block, KIND)]) {
            case SECTION -> {
                forget(AHEAD, field(block, FROM_ROW), block);
                forget(BACK, field(block, TO_ROW), block);
                forget(CABLE, owner, block);
            }
            case PANEL -> forget(PANEL, owner, block);
            case SPLITTER -> forget(SPLITTER, owner, block);
        }
    }

    private void forget(int map, int owner, int block) {
        if (find(map, owner) == block) {
            maps.get(map).set(owner, 0);
        }
    }

    BlockTable build() {
        return new BlockTable(
                fields.build(),
                chunks.build(),
                maps.stream().map(PagedInts.Editor::build).toList(),
                pieces,
                dead);
    }
}
