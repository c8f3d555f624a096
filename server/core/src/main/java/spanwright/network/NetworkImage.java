package spanwright.network;

import java.io.IOException;
import java.util.ArrayList;
import java.util.List;
import spanwright.paged.IntSink;
import spanwright.paged.IntSource;
import spanwright.paged.PageSize;
import spanwright.paged.PagedInts;
import spanwright.paged.PagedRefs;
import spanwright.records.Records;

/**
 * A network taken apart into ints, paths included, and put together again: a hundred times faster than to build it.
 * Whoever keeps the ints sees to it that they come back unharmed, and with the records that they belong to.
 */
public final class NetworkImage {

    /** To be raised with each change of what the ints mean. */
    private static final int FORM = 2;

    private NetworkImage() {}

    /**
     * Takes a network apart.
     *
     * @throws IOException where the sink fails
     */
    public static void write(Network network, IntSink sink) throws IOException {
        BlockTable blocks = network.blocks;
        PathIndex paths = network.paths();
        put(sink, FORM, blocks.pieces, blocks.dead, paths.unused, paths.garbage, network.loose.count);
        List<PagedInts> arrays = new ArrayList<>(List.of(
                network.peer, network.joint, blocks.fields, blocks.chunks, paths.pathOf, paths.paths, paths.slices));
        arrays.addAll(blocks.maps);
        for (PagedInts array : arrays) {
            put(sink, array.size());
            array.write(sink);
        }
        for (PagedRefs<int[]> legs : network.loose.byKind) {
            writeLoose(legs, sink);
        }
    }

    private static void put(IntSink sink, int... ints) throws IOException {
        sink.put(ints, ints.length);
    }

    private static void writeLoose(PagedRefs<int[]> legs, IntSink sink) throws IOException {
        put(sink, legs.size());
        for (int leg = 0; leg < legs.size(); leg++) {
            int[] joints = legs.find(leg);
            if (joints != null) {
                put(sink, leg, joints.length);
                put(sink, joints);
            }
        }
        put(sink, Network.NONE);
    }

    /**
     * Puts a network together.
     *
     * @throws IOException where the source fails, or gives the ints of another form of network
     */
    public static Network read(IntSource source) throws IOException {
        int[] head = get(source, 6);
        if (head[0] != FORM) {
            throw new IOException("a network of form " + head[0] + ", not " + FORM);
        }
        PagedInts peer = readArray(source);
        PagedInts joint = readArray(source);
        PagedInts fields = readArray(source);
        PagedInts chunks = readArray(source);
        PathIndex paths = new PathIndex(
                readArray(source),
                readArray(source, PathIndex.PATHS_PAGE),
                readArray(source, PathIndex.SLICES_PAGE),
                head[3],
                head[4]);
        List<PagedInts> maps = new ArrayList<>();
        for (int map = 0; map < Blocks.MAPS; map++) {
            maps.add(readArray(source));
        }
        BlockTable blocks = new BlockTable(fields, chunks, maps, head[1], head[2]);
        List<PagedRefs<int[]>> loose = new ArrayList<>();
        for (int kind = 0; kind < LooseJoints.empty().byKind.size(); kind++) {
            loose.add(readLoose(source, head[5]));
        }
        return new Network(blocks, peer, joint, new LooseJoints(loose, head[5]), paths);
    }

    /** The state of which a network is, put together with the records of the same posting. */
    public static Snapshot beside(Records records, Network network) {
        return new Snapshot(records, network);
    }

    private static int[] get(IntSource source, int count) throws IOException {
        int[] ints = new int[count];
        source.get(ints, count);
        return ints;
    }

    private static PagedInts readArray(IntSource source) throws IOException {
        return readArray(source, PageSize.SMALL);
    }

    private static PagedInts readArray(IntSource source, PageSize pages) throws IOException {
        return PagedInts.read(get(source, 1)[0], pages, source);
    }

    private static PagedRefs<int[]> readLoose(IntSource source, int most) throws IOException {
        int size = get(source, 1)[0];
        PagedRefs.Editor<int[]> legs = PagedRefs.<int[]>empty().edit();
        if (size > 0) {
            legs.set(size - 1, null);
        }
        for (int leg = get(source, 1)[0]; leg != Network.NONE; leg = get(source, 1)[0]) {
            int count = get(source, 1)[0];
            if (count < 0 || count > most) {
                throw new IOException(count + " joints at one leg, of " + most);
            }
            legs.set(leg, get(source, count));
        }
        return legs.build();
    }
}
