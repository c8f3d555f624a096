package spanwright.planning;

import java.util.ArrayList;
import java.util.BitSet;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.stream.IntStream;
import spanwright.network.Block;
import spanwright.network.Network;
import spanwright.plant.Trust;
import spanwright.records.Records;
import spanwright.splicing.Joint;
import spanwright.splicing.JointKind;

/** One search: its labels, and how one label leads to the next. */
final class SpareLabels {

    private static final int NONE = Network.NONE;
    /** Labels set between two steps; a power of two. */
    private static final int STEP = 1 << 10;

    private final SpareGlass glass;
    private final Network network;
    private final Records records;
    private final SearchLosses losses;
    private final SpareQuery query;
    private final Runnable step;
    private final SpareStates states;
    private final LabelHeap labels = new LabelHeap();
    private final LeastLosses least = new LeastLosses();
    private final Map<Integer, List<Integer>> standingGoals = new HashMap<>();
    private final Map<Integer, List<Integer>> enteringGoals = new HashMap<>();
    /** By which ends those paths came that are first at the splices of an enclosure or the jumpers of a structure. */
    private final Map<Integer, List<Integer>> cameHere = new HashMap<>();

    private final Map<Integer, int[]> candidates = new HashMap<>();
    private final SpareMarks closed;
    private final SpareMarks single;
    /** Pieces that may not be used whatever they are. */
    private final BitSet barred;

    private final BitSet goalEnds = new BitSet();
    private final BitSet shunnedVisits = new BitSet();

    SpareLabels(SpareGlass glass, SearchLosses losses, SpareMarks closed, SpareQuery query, Runnable step) {
        this.glass = glass;
        this.network = glass.snapshot().network();
        this.records = glass.snapshot().records();
        this.losses = losses;
        this.query = query;
        this.step = step;
        this.states = new SpareStates(network, records);
        for (int index = 0; index < query.goals().size(); index++) {
            SpareGoal goal = query.goals().get(index);
            (goal.entering() ? enteringGoals : standingGoals)
                    .computeIfAbsent(goal.end(), end -> new ArrayList<>())
                    .add(index);
            goalEnds.set(goal.end());
        }
        this.closed = closed;
        this.single = new SpareMarks(network).single(query.own(), query.taken()).goals(query.goals());
        this.barred = (BitSet) query.closed().clone();
        query.taken().forEach(barred::set);
        query.shunned().forEach(this::shun);
    }

    private void shun(SpareStretch stretch) {
        if (stretch.visit()) {
            shunnedVisits.set(stretch.id());
        } else {
            Block section = network.blockOf(stretch.id());
            barred.set(section.firstPiece(), section.firstPiece() + section.count());
        }
    }

    Optional<SpareWay> find() {
        Likenesses tried = new Likenesses();
        for (SpareStart start : query.starts()) {
            // Plugs of one panel whose glass runs alike are tried once.
            if (!start.plugged() || (usable(start.end() >> 1) && !isTried(start.end() >> 1, tried))) {
                start(start);
            }
        }
        step.run();
        for (int set = 1; !labels.isEmpty(); set++) {
            if ((set & (STEP - 1)) == 0) {
                step.run();
            }
            int label = labels.poll();
            int state = labels.state(label);
            if (states.isGoal(state)) {
                return Optional.of(new SpareTrail(glass, states, labels, query).way(label));
            }
            if (least.atMost(state, labels.loss(label))) {
                again(label, state);
            } else {
                least.put(state, labels.loss(label));
                expand(label, state);
            }
        }
        return Optional.empty();
    }

    private void start(SpareStart start) {
        long work = start.plugged() ? SpareWork.PATCH + visit(structure(start.end()), false) : 0;
        if (start.plugged() && shunned(structure(start.end()))) {
            return;
        }
        if (start.entering()) {
            enter(start.end(), NONE, start.plugged(), work, 0);
        } else {
            push(states.end(start.end(), start.plugged()), NONE, work, 0);
        }
    }

    private void expand(int label, int state) {
        if (states.isEnd(state)) {
            stand(label, states.endOf(state), states.working(state));
            return;
        }
        cameHere.computeIfAbsent(state, key -> new ArrayList<>()).add(cameBy(label));
        if (states.isSplicing(state)) {
            splice(label, states.enclosureOf(state), states.fromRear(state));
        } else {
            patch(label, states.structureOf(state));
        }
    }

    /** A better path came here before and did all that this one would, but for going back whence it came. */
    private void again(int label, int state) {
        for (int end : cameHere.getOrDefault(state, List.of())) {
            if (end != cameBy(label)) {
                if (states.isSplicing(state)) {
                    spliceTo(label, end);
                } else {
                    patchTo(label, end);
                }
            }
        }
    }

    /** Light stands at an end: it is where it is to be, or goes on by what is joined, or changes over. */
    private void stand(int label, int end, boolean working) {
        for (int goal : goalEnds.get(end) ? standingGoals.getOrDefault(end, List.of()) : List.<Integer>of()) {
            boolean plugged = query.goals().get(goal).plugged();
            if (!plugged || !shunned(structure(end))) {
                long more = plugged ? SpareWork.PATCH + visit(structure(end), working) : 0;
                push(states.goal(goal), label, labels.work(label) + more, labels.loss(label));
            }
        }
        int enclosure = glass.enclosure(end);
        if (enclosure == 0 || query.closedEnclosures().get(enclosure)) {
            return;
        }
        goOn(label, end, working);
        if (shunned(glass.structure(enclosure))) {
            return;
        }
        if (isPort(end) && (end & 1) == 1) {
            if (glass.isFrontFree(end)) {
                int structure = glass.structure(enclosure);
                push(
                        states.patching(structure),
                        label,
                        labels.work(label) + visit(structure, working),
                        labels.loss(label));
            }
            return;
        }
        long freeing = freeing(end);
        if (freeing >= 0) {
            push(
                    states.splicing(enclosure, isPort(end)),
                    label,
                    labels.work(label) + freeing + visit(glass.structure(enclosure), working),
                    labels.loss(label) + trayIfCut(end));
        }
    }

    private void goOn(int label, int end, boolean working) {
        int next = network.peer(end);
        if (next == NONE) {
            return;
        }
        int joint = network.joint(end);
        long work = labels.work(label) + (isUnverified(joint) ? SpareWork.UNVERIFIED : 0);
        long loss = labels.loss(label) + losses.joint(joint);
        arrive(next, label, working, work, loss);
    }

    private boolean isUnverified(int id) {
        if (id == 0) {
            return false;
        }
        Joint joint = records.joints().get(id);
        return joint.type() != JointKind.JUMPER && joint.facts().trust() != Trust.VERIFIED;
    }

    /** The work that freeing an end takes, below 0 where it must not be freed. */
    private long freeing(int end) {
        return switch (glass.freeable().freeing(end)) {
            case FORBIDDEN -> -1;
            case IN_OPEN_TUBE -> 0;
            case OPENS_TUBE -> SpareWork.TUBE;
        };
    }

    private long trayIfCut(int end) {
        return network.joint(end) == 0 && network.peer(end) != NONE ? losses.tray(end) : 0;
    }

    private void splice(int label, int enclosure, boolean fromRear) {
        for (SpareGlass.EndRow row : glass.ends(enclosure)) {
            if (!fromRear || !row.rear()) {
                spliceTo(label, row);
            }
        }
    }

    private void spliceTo(int label, SpareGlass.EndRow row) {
        Likenesses tried = new Likenesses();
        for (int end : candidates(row)) {
            if (end != cameBy(label) && (isEnteringGoal(end) || !isTried(end >> 1, tried))) {
                spliceTo(label, end);
            }
        }
    }

    /** Ends of a row that may be tried: of those that run alike two paths, as one may be that by which light comes. */
    private int[] candidates(SpareGlass.EndRow row) {
        return candidates.computeIfAbsent(row.first(), first -> {
            Likenesses once = new Likenesses();
            Likenesses twice = new Likenesses();
            boolean falling = (row.first() & 1) == 1 && !isPort(row.first());
            return IntStream.range(0, row.count())
                    .map(index -> row.first() + 2 * (falling ? row.count() - 1 - index : index))
                    .filter(end -> isEnteringGoal(end)
                            || (usable(end >> 1) && (!isTried(end >> 1, once) || !isTried(end >> 1, twice))))
                    .toArray();
        });
    }

    private void spliceTo(int label, int end) {
        long freeing = freeing(end);
        boolean rears = isPort(end) && states.fromRear(labels.state(label));
        if (freeing >= 0 && !rears) {
            long work = labels.work(label) + SpareWork.SPLICE + freeing;
            long loss = labels.loss(label) + losses.splice() + trayIfCut(end);
            arrive(end, label, true, work, loss);
        }
    }

    /** Whether a piece of another path that runs alike was tried; one path may pass a section by several fibers. */
    private boolean isTried(int piece, Likenesses tried) {
        int path = network.paths().pathOf(piece);
        return tried.isTried(glass.likenessOf(path) + closed.ofPath(path) + 3 * single.ofPath(path), path);
    }

    private boolean isEnteringGoal(int end) {
        return goalEnds.get(end) && enteringGoals.containsKey(end);
    }

    private int cameBy(int label) {
        return states.endOf(labels.state(labels.parent(label)));
    }

    private void patch(int label, int structure) {
        Likenesses tried = new Likenesses();
        for (SpareGlass.EndRow row : glass.fronts(structure)) {
            for (int front : candidates(row)) {
                if (front != cameBy(label) && glass.isFrontFree(front) && !isTried(front >> 1, tried)) {
                    patchTo(label, front);
                }
            }
        }
    }

    private void patchTo(int label, int front) {
        enter(front, label, true, labels.work(label) + SpareWork.PATCH, labels.loss(label) + losses.jumper());
    }

    /** Light comes to an end from outside: it is where it is to be, or enters the piece. */
    private void arrive(int end, int parent, boolean working, long work, long loss) {
        List<Integer> goals = goalEnds.get(end) ? enteringGoals.getOrDefault(end, List.of()) : List.of();
        goals.forEach(goal -> push(states.goal(goal), parent, work, loss));
        if (goals.isEmpty()) {
            enter(end, parent, working, work, loss);
        }
    }

    /** Light enters a piece by an end and comes to stand at its other end. */
    private void enter(int end, int parent, boolean working, long work, long loss) {
        int piece = end >> 1;
        if (usable(piece) && !isOnTrail(piece, parent)) {
            push(states.end(end ^ 1, working && isPort(end)), parent, work, loss + losses.piece(piece));
        }
    }

    /** Whether a path uses a piece already: it could turn back only where a port's rear must not meet another's. */
    private boolean isOnTrail(int piece, int last) {
        for (int label = last; label != NONE; label = labels.parent(label)) {
            int state = labels.state(label);
            if (states.isEnd(state) && states.endOf(state) >> 1 == piece) {
                return true;
            }
        }
        return false;
    }

    private boolean isPort(int end) {
        return glass.isPort(end >> 1);
    }

    private boolean usable(int piece) {
        return !barred.get(piece)
                && (query.own().get(piece) || (query.verifiedOnly() ? glass.isVerified(piece) : glass.isSpare(piece)));
    }

    private boolean shunned(int structure) {
        return shunnedVisits.get(structure);
    }

    private long visit(int structure, boolean working) {
        return working || (!query.visited().isEmpty() && query.visited().contains(structure)) ? 0 : SpareWork.VISIT;
    }

    private int structure(int end) {
        return glass.structure(glass.enclosure(end));
    }

    private void push(int state, int parent, long work, long loss) {
        if (loss <= query.mostLoss() && (!states.isEnd(state) || !least.atMost(state, loss))) {
            labels.add(state, parent, work, loss);
        }
    }
}
