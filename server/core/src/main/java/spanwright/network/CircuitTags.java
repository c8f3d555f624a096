package spanwright.network;

import java.util.Comparator;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Set;
import org.jspecify.annotations.Nullable;
import spanwright.circuits.Circuit;
import spanwright.circuits.CircuitStatus;
import spanwright.circuits.PortRange;
import spanwright.paged.PagedInts;
import spanwright.plant.FiberRange;
import spanwright.records.RecordsView;
import spanwright.records.Relation;
import spanwright.splicing.EndKey;
import spanwright.splicing.LegKind;

/** Writes beside each path the circuit whose two fronts are its ends. */
final class CircuitTags {

    private static final int NONE = -1;
    private static final long NO_FRONT = -1;

    private final RecordsView records;
    private final Blocks blocks;
    private final Set<Integer> changed = new LinkedHashSet<>();
    private final Set<Long> fronts = new LinkedHashSet<>();

    CircuitTags(RecordsView records, Blocks blocks) {
        this.records = records;
        this.blocks = blocks;
    }

    /** Notes that a circuit came, went or changed. */
    void note(@Nullable Circuit circuit) {
        if (circuit != null && circuit.status() != CircuitStatus.RETIRED) {
            changed.add(circuit.id());
            for (int index = 0; index < circuit.fibers(); index++) {
                fronts.add(key(circuit.a(), index));
            }
        }
    }

    boolean isEmpty() {
        return fronts.isEmpty();
    }

    private static long key(PortRange ports, int index) {
        return EndKey.of(LegKind.FRONT, ports.panel(), ports.ports().at(index));
    }

    /** Tags the paths laid afresh, and those at whose ends circuits changed. */
    PathIndex tag(PathIndex index, PathEditor laid) {
        PagedInts.Editor paths = index.paths.edit();
        for (int at = 0; at < laid.laidCount(); at++) {
            tag(paths, laid.laid(at));
        }
        for (long front : fronts) {
            int end = blocks.endOf(front);
            if (end != NONE) {
                tag(paths, index.pathOf(end >> 1));
            }
        }
        return new PathIndex(index.pathOf, paths.build(), index.slices, index.unused, index.garbage);
    }

    private void tag(PagedInts.Editor paths, int path) {
        int at = path * PathIndex.STRIDE;
        long one = frontKey(paths.get(at + PathIndex.FIRST));
        long other = frontKey(paths.get(at + PathIndex.LAST));
        int tag = one == NO_FRONT || other == NO_FRONT ? 0 : tagBetween(one, other);
        if (paths.get(at + PathIndex.CIRCUIT) != tag) {
            paths.set(at + PathIndex.CIRCUIT, tag);
        }
    }

    private long frontKey(int end) {
        int block = (end & 1) == 0 ? NONE : blocks.blockOf(end >> 1);
        return block != NONE && blocks.field(block, Blocks.KIND) == BlockKind.PANEL.ordinal()
                ? blocks.keyOf(end)
                : NO_FRONT;
    }

    private int tagBetween(long one, long other) {
        int[] atOne = records.owned(Relation.PANEL_CIRCUITS, EndKey.owner(one));
        int[] atOther = records.owned(Relation.PANEL_CIRCUITS, EndKey.owner(other));
        Circuit first = null;
        int shared = 0;
        for (int id : atOne.length < atOther.length ? atOne : atOther) {
            Circuit circuit = records.circuits().get(id);
            if (circuit.status() != CircuitStatus.RETIRED
                    && (joins(circuit, one, other) || joins(circuit, other, one))) {
                shared = first == null ? 0 : PathIndex.SHARED;
                first = first == null || circuit.code().compareTo(first.code()) < 0 ? circuit : first;
            }
        }
        if (first == null) {
            return 0;
        }
        boolean beside = beginsBeside(atOne, one, other) || beginsBeside(atOther, other, one);
        return first.id() | shared | (beside ? PathIndex.BESIDE : 0);
    }

    /** Whether a circuit begins at a front and is not on the path from there to the other front. */
    private boolean beginsBeside(int[] circuits, long front, long other) {
        for (int id : circuits) {
            Circuit circuit = records.circuits().get(id);
            if (circuit.status() != CircuitStatus.RETIRED
                    && circuit.a().panel() == EndKey.owner(front)
                    && circuit.a().ports().contains(EndKey.number(front))
                    && !joins(circuit, front, other)
                    && !joins(circuit, other, front)) {
                return true;
            }
        }
        return false;
    }

    private static boolean joins(Circuit circuit, long a, long z) {
        if (circuit.a().panel() != EndKey.owner(a) || circuit.z().panel() != EndKey.owner(z)) {
            return false;
        }
        FiberRange ports = circuit.a().ports();
        int index = (EndKey.number(a) - ports.first()) * ports.step();
        return index >= 0 && index < ports.count() && circuit.z().ports().at(index) == EndKey.number(z);
    }

    /** Tags all paths of an index without tags. */
    PathIndex tagAll(PathIndex index) {
        PagedInts.Editor paths = index.paths.edit();
        List<Circuit> byCode = records.circuits()
                .list()
                .filter(circuit -> circuit.status() != CircuitStatus.RETIRED)
                .sorted(Comparator.comparing(Circuit::code))
                .toList();
        for (Circuit circuit : byCode) {
            for (int fiber = 0; fiber < circuit.fibers(); fiber++) {
                tagOne(index, paths, circuit, fiber);
            }
        }
        for (Circuit circuit : byCode) {
            for (int fiber = 0; fiber < circuit.fibers(); fiber++) {
                markBeside(index, paths, circuit, fiber);
            }
        }
        return new PathIndex(index.pathOf, paths.build(), index.slices, index.unused, index.garbage);
    }

    private void tagOne(PathIndex index, PagedInts.Editor paths, Circuit circuit, int fiber) {
        int a = blocks.endOf(key(circuit.a(), fiber));
        int z = blocks.endOf(key(circuit.z(), fiber));
        if (a == NONE || z == NONE) {
            return;
        }
        int at = index.pathOf(a >> 1) * PathIndex.STRIDE;
        int first = paths.get(at + PathIndex.FIRST);
        int last = paths.get(at + PathIndex.LAST);
        if ((first == a && last == z) || (first == z && last == a)) {
            int before = paths.get(at + PathIndex.CIRCUIT);
            boolean same = (before & ~PathIndex.SHARED) == circuit.id();
            paths.set(at + PathIndex.CIRCUIT, before == 0 || same ? circuit.id() : before | PathIndex.SHARED);
        }
    }

    /** Marks the path on which a fiber begins where another circuit is on it and this one is not. */
    private void markBeside(PathIndex index, PagedInts.Editor paths, Circuit circuit, int fiber) {
        int a = blocks.endOf(key(circuit.a(), fiber));
        if (a == NONE) {
            return;
        }
        int at = index.pathOf(a >> 1) * PathIndex.STRIDE;
        int tag = paths.get(at + PathIndex.CIRCUIT);
        boolean marked = (tag & (PathIndex.SHARED | PathIndex.BESIDE)) != 0;
        boolean atEnd = paths.get(at + PathIndex.FIRST) == a || paths.get(at + PathIndex.LAST) == a;
        if (tag != 0 && !marked && tag != circuit.id() && atEnd) {
            paths.set(at + PathIndex.CIRCUIT, tag | PathIndex.BESIDE);
        }
    }
}
