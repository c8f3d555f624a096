package spanwright.repair;

import java.util.List;
import java.util.Objects;
import java.util.function.Consumer;
import org.jspecify.annotations.Nullable;
import spanwright.journal.Change;
import spanwright.journal.RecordKind;
import spanwright.plant.Cable;
import spanwright.plant.Pass;
import spanwright.records.CableLay;
import spanwright.records.RecordsEditor;
import spanwright.records.Relation;
import spanwright.splicing.FiberCount;
import spanwright.splicing.FiberFlag;
import spanwright.splicing.Flag;

/**
 * The flags and counts of a cable that becomes two and a piece. A flag goes with its side; one that lies across the
 * cut stands on both, and what is let or held for somebody on the piece too. The piece itself is sound.
 */
final class MovedFlags {

    private final RecordsEditor records;
    private final CableLay lay;
    private final int second;
    private final List<FiberFlag> flags;
    private final List<FiberCount> counts;
    private final List<Pass> passes;

    /** Of a cable as it is now; {@code second} is the first row beyond the cut. */
    MovedFlags(RecordsEditor records, CableLay lay, int second) {
        int cable = lay.cable().id();
        this.records = records;
        this.lay = lay;
        this.second = second;
        this.flags = records.fiberFlags().owned(Relation.CABLE_FLAGS, cable).toList();
        this.counts = records.fiberCounts().owned(Relation.CABLE_COUNTS, cable).toList();
        this.passes = records.passesOf(cable);
    }

    /** Takes the flags off, before the enclosures that they name are given up. */
    void remove(Consumer<Change> apply) {
        flags.forEach(flag -> apply.accept(Change.remove(flag)));
    }

    /** Enters them on the three parts, whose enclosures at the cut are there. */
    void enter(Cable start, Cable piece, Cable end, int[] atCut, Consumer<Change> apply) {
        for (FiberFlag flag : flags) {
            boolean whole = flag.from() == null && flag.to() == null;
            int one = row(flag.from(), true);
            int other = row(flag.to(), false);
            boolean onStart = whole || Math.min(one, other) < second;
            boolean onEnd = whole || Math.max(one, other) >= second;
            boolean across = onStart && onEnd;
            Integer from = one <= other ? flag.from() : flag.to();
            Integer to = one <= other ? flag.to() : flag.from();
            if (onStart) {
                apply.accept(on(flag, start, from, across && !whole ? (Integer) atCut[0] : to));
            }
            if (across && (flag.flag() == Flag.LEASED || flag.flag() == Flag.RESERVED)) {
                apply.accept(on(flag, piece, null, null));
            }
            if (onEnd) {
                apply.accept(on(flag, end, across && !whole ? (Integer) atCut[1] : from, to));
            }
        }
        for (FiberCount count : counts) {
            for (Cable part : List.of(piece, end)) {
                apply.accept(Change.add(new FiberCount(
                        records.newIdentity(RecordKind.FIBER_COUNT),
                        part.id(),
                        count.fibers(),
                        count.name(),
                        count.numbers())));
            }
        }
    }

    /** The row at which the cable is in an enclosure: of a ring's two the first where a flag begins, else the last. */
    private int row(@Nullable Integer enclosure, boolean begins) {
        if (enclosure == null) {
            return begins ? 0 : lay.rows().size() - 1;
        }
        List<Pass> there = passes.stream()
                .filter(pass -> Objects.equals(pass.enclosure(), enclosure))
                .toList();
        return lay.index(there.get(begins ? 0 : there.size() - 1).runRow());
    }

    private Change on(FiberFlag flag, Cable part, @Nullable Integer from, @Nullable Integer to) {
        return Change.add(new FiberFlag(
                records.newIdentity(RecordKind.FIBER_FLAG),
                part.id(),
                flag.fibers(),
                flag.flag(),
                from,
                to,
                flag.owner(),
                flag.reason(),
                flag.until()));
    }
}
