package spanwright.network;

import java.util.List;
import java.util.stream.Stream;
import spanwright.paged.PagedInts;

/** Where pieces lie, in a built network. Immutable. */
final class BlockTable extends Blocks {

    final PagedInts fields;
    final PagedInts chunks;
    final List<PagedInts> maps;
    final int pieces;
    final int dead;

    BlockTable(PagedInts fields, PagedInts chunks, List<PagedInts> maps, int pieces, int dead) {
        this.fields = fields;
        this.chunks = chunks;
        this.maps = List.copyOf(maps);
        this.pieces = pieces;
        this.dead = dead;
    }

    static BlockTable empty() {
        return new BlockTable(
                PagedInts.empty(),
                PagedInts.empty(),
                Stream.generate(PagedInts::empty).limit(MAPS).toList(),
                0,
                0);
    }

    BlockEditor edit() {
        return new BlockEditor(this);
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
        PagedInts blocks = maps.get(map);
        return owner < blocks.size() ? blocks.get(owner) - 1 : NONE;
    }

    long heapBytes() {
        return fields.heapBytes()
                + chunks.heapBytes()
                + maps.stream().mapToLong(PagedInts::heapBytes).sum();
    }
}
