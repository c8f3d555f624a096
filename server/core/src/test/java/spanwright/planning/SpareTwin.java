package spanwright.planning;

import java.util.ArrayDeque;
import java.util.ArrayList;
import java.util.Deque;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.stream.IntStream;
import org.jspecify.annotations.Nullable;
import spanwright.circuits.CircuitStatus;
import spanwright.network.Block;
import spanwright.network.BlockKind;
import spanwright.network.Network;
import spanwright.network.Snapshot;
import spanwright.plant.CableType;
import spanwright.plant.Trust;
import spanwright.records.Records;
import spanwright.splicing.EndKey;
import spanwright.splicing.JointKind;

/**
 * The slow, obvious twin of the search: every end against every end, all costs that no other beats kept at each, until
 * nothing changes any more. No order, no bundles, no halls in between.
 */
final class SpareTwin {

    /** Where light stands, and whether hands work there already. */
    private record At(int end, boolean working) {}

    /** What it took. */
    record Cost(SpareWork work, long loss, List<Integer> trail) {

        boolean beats(Cost other) {
            return work.compareTo(other.work) <= 0 && loss <= other.loss;
        }

        Cost plus(SpareWork more, long lost) {
            return new Cost(work.plus(more), loss + lost, trail);
        }

        Cost entering(int end, long lost) {
            List<Integer> longer = new ArrayList<>(trail);
            longer.add(end);
            return new Cost(work, loss + lost, longer);
        }
    }

    private final SpareGlass glass;
    private final SpareQuery query;
    private final Network network;
    private final Records records;
    private final SearchLosses losses;
    private final EndStates endStates;
    private final Map<Integer, int[]> joinables = new HashMap<>();
    private final Map<At, List<Cost>> costs = new HashMap<>();
    private final Deque<At> changed = new ArrayDeque<>();
    private @Nullable Cost best;

    SpareTwin(Snapshot snapshot, SpareQuery query) {
        this.glass = new SpareGlass(snapshot);
        this.query = query;
        this.network = snapshot.network();
        this.records = snapshot.records();
        this.endStates = new EndStates(records, network);
        this.losses = new SearchLosses(snapshot, query.wavelength());
    }

    @Nullable
    Cost best() {
        for (SpareStart start : query.starts()) {
            Cost cost = new Cost(plug(start.plugged(), start.end(), false), 0, List.of());
            if (start.entering()) {
                enter(start.end(), start.plugged(), cost);
            } else {
                reach(new At(start.end(), start.plugged()), cost);
            }
        }
        while (!changed.isEmpty()) {
            At at = changed.poll();
            for (Cost cost : List.copyOf(costs.get(at))) {
                go(at, cost);
            }
        }
        return best;
    }

    private void go(At at, Cost cost) {
        for (SpareGoal goal : query.goals()) {
            if (!goal.entering() && goal.end() == at.end) {
                finish(cost.plus(plug(goal.plugged(), at.end, at.working), 0));
            }
        }
        if (barred(at.end)) {
            return;
        }
        int peer = network.peer(at.end);
        if (peer != Network.NONE) {
            int joint = network.joint(at.end);
            arrive(peer, at.working, cost.plus(new SpareWork(0, 0, 0, 0, unverified(joint)), losses.joint(joint)));
        }
        for (int end : joinables.computeIfAbsent(at.end, this::joinables)) {
            boolean patch = front(end);
            int tubes = (tube(at.end) ? 1 : 0) + (tube(end) ? 1 : 0);
            int visit = at.working || query.visited().contains(structure(at.end)) ? 0 : 1;
            long lost = patch ? losses.jumper() : losses.splice() + tray(at.end) + tray(end);
            SpareWork work = new SpareWork(visit, tubes, patch ? 0 : 1, patch ? 1 : 0, 0);
            arrive(end, true, cost.plus(work, lost));
        }
    }

    /** Every end that one could be joined to, out of all there are; no cost changes which. */
    private int[] joinables(int from) {
        return IntStream.range(0, 2 * network.pieces())
                .filter(end -> network.alive(end >> 1) && end != from && joinable(from, end))
                .toArray();
    }

    private void arrive(int end, boolean working, Cost cost) {
        boolean goal = false;
        for (SpareGoal each : query.goals()) {
            if (each.entering() && each.end() == end) {
                finish(cost);
                goal = true;
            }
        }
        if (!goal) {
            enter(end, working, cost);
        }
    }

    private void enter(int end, boolean working, Cost cost) {
        if (usable(end >> 1) && cost.trail.stream().noneMatch(each -> each >> 1 == end >> 1)) {
            boolean port = kind(end) == BlockKind.PANEL;
            reach(new At(end ^ 1, port && working), cost.entering(end, losses.piece(end >> 1)));
        }
    }

    private void reach(At at, Cost cost) {
        List<Cost> known = costs.computeIfAbsent(at, key -> new ArrayList<>());
        if (cost.loss <= query.mostLoss() && known.stream().noneMatch(each -> each.beats(cost))) {
            known.removeIf(cost::beats);
            known.add(cost);
            changed.add(at);
        }
    }

    private void finish(Cost cost) {
        if (cost.loss <= query.mostLoss()
                && (best == null
                        || cost.work.compareTo(best.work) < 0
                        || (cost.work.equals(best.work) && cost.loss < best.loss))) {
            best = cost;
        }
    }

    private SpareWork plug(boolean plugged, int end, boolean working) {
        return plugged
                ? new SpareWork(working || query.visited().contains(structure(end)) ? 0 : 1, 0, 0, 1, 0)
                : SpareWork.NONE;
    }

    private boolean joinable(int from, int to) {
        boolean goal = query.goals().stream().anyMatch(each -> each.entering() && each.end() == to);
        if (glass.enclosure(to) == 0 || barred(to) || (!goal && !usable(to >> 1))) {
            return false;
        }
        if (front(from) || front(to)) {
            return front(from) && front(to) && structure(from) == structure(to) && free(from) && free(to);
        }
        boolean rears = kind(from) == BlockKind.PANEL && kind(to) == BlockKind.PANEL;
        boolean inner = kind(to) == BlockKind.SPLITTER && (to & 1) == 1;
        return !rears && !inner && glass.enclosure(from) == glass.enclosure(to) && freeable(from) && freeable(to);
    }

    private boolean freeable(int end) {
        if (network.joint(end) != 0) {
            return network.peer(end) != Network.NONE && !held(network.peer(end));
        }
        return network.peer(end) == Network.NONE || !tube(end) || !worksInTube(end);
    }

    /** Whether somebody else has the fiber to which an end is joined. */
    private boolean held(int peer) {
        Block block = network.blockOf(peer >> 1);
        if (block.kind() != BlockKind.SECTION) {
            return false;
        }
        FiberUse use = glass.uses().of(block, block.number(peer >> 1)).use();
        return use == FiberUse.RESERVED || use == FiberUse.LEASED;
    }

    /** Whether freeing an end opens a closed tube. */
    private boolean tube(int end) {
        return uncut(end) && !endStates.isTubeOpened(network.keyOf(end));
    }

    private boolean uncut(int end) {
        return network.joint(end) == 0 && network.peer(end) != Network.NONE;
    }

    private boolean worksInTube(int end) {
        long key = network.keyOf(end);
        Block section = network.blockOf(end >> 1);
        CableType type =
                records.cableTypes().get(records.cables().get(section.owner()).cableType());
        int tube = type.tubeOf(EndKey.number(key));
        PathCircuits circuits = glass.uses().circuits();
        return network.blocks().stream()
                .filter(block -> block.kind() == BlockKind.SECTION)
                .filter(block -> block.fromRow() == EndKey.owner(key) || block.toRow() == EndKey.owner(key))
                .anyMatch(block -> {
                    for (int fiber = 1; fiber <= block.count(); fiber++) {
                        if (type.tubeOf(fiber) == tube
                                && circuits.through(block.piece(fiber)).stream()
                                        .anyMatch(circuit -> circuit.status() == CircuitStatus.WORKING)) {
                            return true;
                        }
                    }
                    return false;
                });
    }

    private long tray(int end) {
        return uncut(end) ? losses.tray(end) : 0;
    }

    private boolean usable(int piece) {
        return !query.closed().get(piece)
                && !query.taken().contains(piece)
                && (query.own().get(piece) || (query.verifiedOnly() ? glass.isVerified(piece) : glass.isSpare(piece)));
    }

    private boolean barred(int end) {
        int enclosure = glass.enclosure(end);
        return enclosure == 0 || query.closedEnclosures().get(enclosure);
    }

    private boolean free(int front) {
        return glass.isFrontFree(front);
    }

    private int unverified(int id) {
        return id != 0
                        && records.joints().get(id).type() != JointKind.JUMPER
                        && records.joints().get(id).facts().trust() != Trust.VERIFIED
                ? 1
                : 0;
    }

    private boolean front(int end) {
        return kind(end) == BlockKind.PANEL && (end & 1) == 1;
    }

    private BlockKind kind(int end) {
        return network.blockOf(end >> 1).kind();
    }

    private int structure(int end) {
        return glass.structure(glass.enclosure(end));
    }
}
