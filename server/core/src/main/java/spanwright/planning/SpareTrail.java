package spanwright.planning;

import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Set;
import spanwright.network.Block;
import spanwright.network.BlockKind;
import spanwright.network.Network;
import spanwright.splicing.JointKind;

/** Reads a path back from its last label. */
final class SpareTrail {

    private final SpareGlass glass;
    private final Network network;
    private final SpareStates states;
    private final LabelHeap labels;
    private final SpareQuery query;
    private final List<Integer> entered = new ArrayList<>();
    private final List<NewJoint> joints = new ArrayList<>();
    private final Set<SpareStretch> stretches = new HashSet<>();

    SpareTrail(SpareGlass glass, SpareStates states, LabelHeap labels, SpareQuery query) {
        this.glass = glass;
        this.network = glass.snapshot().network();
        this.states = states;
        this.labels = labels;
        this.query = query;
    }

    SpareWay way(int last) {
        List<Integer> trail = new ArrayList<>();
        for (int label = last; label != Network.NONE; label = labels.parent(label)) {
            trail.add(0, label);
        }
        SpareStart start = startOf(labels.state(trail.get(0)));
        SpareGoal goal = query.goals().get(states.goalOf(labels.state(last)));
        int joining = Network.NONE;
        for (int label : trail) {
            int state = labels.state(label);
            if (states.isEnd(state)) {
                if (label != trail.get(0) || start.entering()) {
                    enter(states.endOf(state) ^ 1, joining);
                }
                joining = Network.NONE;
            } else if (!states.isGoal(state)) {
                joining = states.endOf(labels.state(labels.parent(label)));
            }
        }
        if (joining != Network.NONE) {
            join(joining, goal.end());
        }
        visit(start.plugged(), start.end());
        visit(goal.plugged(), goal.end());
        return new SpareWay(
                start, goal, entered, joints, stretches, SpareWork.of(labels.work(last)), labels.loss(last));
    }

    private SpareStart startOf(int state) {
        int end = states.endOf(state);
        return query.starts().stream()
                .filter(start -> start.entering() ? (start.end() ^ 1) == end : start.end() == end)
                .filter(start -> start.plugged() == states.working(state)
                        || network.blockOf(end >> 1).kind() == BlockKind.SECTION)
                .findFirst()
                .orElseThrow();
    }

    private void enter(int end, int joining) {
        Block block = network.blockOf(end >> 1);
        if (block.kind() == BlockKind.SECTION) {
            stretches.add(SpareStretch.section(block.firstPiece()));
        }
        if (joining != Network.NONE) {
            join(joining, end);
        }
        entered.add(end);
    }

    private void join(int from, int to) {
        boolean fromPort = network.blockOf(from >> 1).kind() == BlockKind.PANEL;
        boolean toPort = network.blockOf(to >> 1).kind() == BlockKind.PANEL;
        int enclosure = glass.enclosure(from);
        stretches.add(SpareStretch.visit(glass.structure(enclosure)));
        if (fromPort && (from & 1) == 1) {
            joints.add(new NewJoint(JointKind.JUMPER, enclosure, from, to));
        } else if (fromPort || toPort) {
            joints.add(new NewJoint(JointKind.TERMINATION, enclosure, fromPort ? from : to, fromPort ? to : from));
        } else {
            joints.add(new NewJoint(JointKind.SPLICE, enclosure, from, to));
        }
    }

    private void visit(boolean plugged, int end) {
        if (plugged) {
            stretches.add(SpareStretch.visit(glass.structure(glass.enclosure(end))));
        }
    }
}
