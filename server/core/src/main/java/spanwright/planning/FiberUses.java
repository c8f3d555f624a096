package spanwright.planning;

import java.util.Comparator;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.jspecify.annotations.Nullable;
import spanwright.circuits.Circuit;
import spanwright.network.Block;
import spanwright.network.Snapshot;
import spanwright.plant.RunRow;
import spanwright.records.Records;
import spanwright.records.Relation;
import spanwright.splicing.FiberFlag;
import spanwright.splicing.Flag;

/**
 * What the fibers of cable sections are used for. What was asked is kept, so one of these serves one question or a few;
 * one thread's.
 */
public final class FiberUses {

    private final Snapshot snapshot;
    private final Records records;
    private final PathCircuits circuits;
    private final PathTrusts trusts;
    private final Map<Integer, List<FiberFlag>> flags = new HashMap<>();

    /** The uses in a snapshot. */
    public FiberUses(Snapshot snapshot) {
        this.snapshot = snapshot;
        this.records = snapshot.records();
        this.circuits = new PathCircuits(snapshot);
        this.trusts = new PathTrusts(snapshot);
    }

    /** The circuits that these uses know. */
    public PathCircuits circuits() {
        return circuits;
    }

    /** What a fiber of a section is used for. */
    public SectionUse of(Block section, int fiber) {
        int piece = section.piece(fiber);
        List<Circuit> on = circuits.through(piece);
        PathTrust trust = trusts.of(snapshot.network().paths().pathOf(piece));
        FiberFlag flag = findFlag(section, fiber).orElse(null);
        FiberUse use = on.isEmpty() ? unused(flag, trust) : FiberUse.IN_USE;
        return new SectionUse(use, on, flag, trust.verifiedOn());
    }

    /** What glass without flags of its own, such as a port, is used for: what its glass path says. */
    FiberUse ofPath(int path) {
        int piece = snapshot.network().paths().firstEnd(path) >> 1;
        return circuits.through(piece).isEmpty() ? unused(null, trusts.of(path)) : FiberUse.IN_USE;
    }

    private static FiberUse unused(@Nullable FiberFlag flag, PathTrust trust) {
        if (flag != null && (flag.flag() == Flag.DEAD || flag.flag() == Flag.SUSPECT)) {
            return flag.flag() == Flag.DEAD ? FiberUse.DEAD : FiberUse.SUSPECT;
        }
        if (trust.jumpered()) {
            return FiberUse.JUMPERED;
        }
        if (flag != null) {
            return flag.flag() == Flag.LEASED ? FiberUse.LEASED : FiberUse.RESERVED;
        }
        if (!trust.known()) {
            return FiberUse.SPARE_UNKNOWN;
        }
        return trust.verified() ? FiberUse.SPARE_VERIFIED : FiberUse.SPARE;
    }

    private Optional<FiberFlag> findFlag(Block section, int fiber) {
        return flags(section.owner(), fiber, seq(section.fromRow()), seq(section.toRow())).stream()
                .findFirst();
    }

    /**
     * The flags on a stretch of a fiber, the gravest first: dead before suspect before leased before reserved.
     *
     * @param cable identity of the cable
     * @param fiber from 1
     * @param fromSeq the run row where the stretch begins
     * @param toSeq the run row where it ends, not before the first
     */
    public List<FiberFlag> flags(int cable, int fiber, int fromSeq, int toSeq) {
        List<FiberFlag> ofCable = flags.computeIfAbsent(
                cable,
                owner -> records.fiberFlags()
                        .owned(Relation.CABLE_FLAGS, owner)
                        .sorted(Comparator.comparing(FiberFlag::flag).thenComparing(FiberFlag::id))
                        .toList());
        return ofCable.stream()
                .filter(flag -> flag.fibers().contains(fiber) && covers(flag, fromSeq, toSeq))
                .toList();
    }

    /** Whether a flag holds on a stretch: on every one that lies between its two enclosures, whichever way round. */
    private boolean covers(FiberFlag flag, int fromSeq, int toSeq) {
        int first = flag.from() == null ? 0 : seqAt(flag.cable(), flag.from());
        int last = flag.to() == null ? Integer.MAX_VALUE : seqAt(flag.cable(), flag.to());
        return fromSeq >= Math.min(first, last) && toSeq <= Math.max(first, last);
    }

    private int seq(int runRow) {
        return records.runRows().get(runRow).seq();
    }

    /** The row at which a cable is in an enclosure: the first, where both its first and its last are (a ring). */
    private int seqAt(int cable, int enclosure) {
        return records.passes()
                .owned(Relation.CABLE_PASSES, cable)
                .filter(pass -> pass.enclosure() == enclosure)
                .map(pass -> records.runRows().get(pass.runRow()))
                .mapToInt(RunRow::seq)
                .min()
                .orElse(0);
    }
}
