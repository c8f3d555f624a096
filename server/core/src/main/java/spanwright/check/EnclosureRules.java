package spanwright.check;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import java.util.function.Consumer;
import spanwright.network.Block;
import spanwright.network.Network;
import spanwright.plant.Enclosure;
import spanwright.plant.Pass;
import spanwright.plant.PlantState;
import spanwright.records.Relation;
import spanwright.splicing.EndCondition;
import spanwright.splicing.EndRange;
import spanwright.splicing.EndState;
import spanwright.splicing.Leg;
import spanwright.splicing.LegKind;

/** What stands in an enclosure: no cable at all, opened fibers that nobody spoke of, states that joints contradict. */
final class EnclosureRules implements Rule {

    @Override
    public void find(Checked checked, Consumer<Finding> found) {
        checked.records()
                .enclosures()
                .list()
                .filter(enclosure -> enclosure.state() == PlantState.IN_SERVICE)
                .forEach(enclosure -> enclosure(checked, enclosure, found));
    }

    private static void enclosure(Checked checked, Enclosure enclosure, Consumer<Finding> found) {
        List<Pass> passes = checked.records()
                .passes()
                .owned(Relation.ENCLOSURE_PASSES, enclosure.id())
                .toList();
        boolean onlyPorts = checked.records().owned(Relation.ENCLOSURE_PANELS, enclosure.id()).length > 0;
        if (passes.isEmpty() && !onlyPorts) {
            found.accept(new Finding(
                    Severity.WARNING,
                    "enclosure-without-cable",
                    "enclosures.csv",
                    enclosure.code(),
                    "No cable is recorded in " + enclosure.code() + ".",
                    "Record the cables in it in enclosure_cables, or retire the enclosure."));
        }
        Map<Long, EndState> states = statesByEnd(checked, enclosure);
        passes.forEach(pass -> {
            leg(checked, enclosure, new Leg(LegKind.BACK, pass.runRow()), states, found);
            leg(checked, enclosure, new Leg(LegKind.AHEAD, pass.runRow()), states, found);
        });
        contradicted(checked, enclosure, states, found);
    }

    private static Map<Long, EndState> statesByEnd(Checked checked, Enclosure enclosure) {
        Map<Long, EndState> states = new TreeMap<>();
        checked.records()
                .endStates()
                .owned(Relation.ENCLOSURE_END_STATES, enclosure.id())
                .forEach(state -> {
                    for (int index = 0; index < state.ends().count(); index++) {
                        states.put(state.ends().key(index), state);
                    }
                });
        return states;
    }

    /** Fibers cut at one side of a pass, with no joint and no state. */
    private static void leg(
            Checked checked, Enclosure enclosure, Leg leg, Map<Long, EndState> states, Consumer<Finding> found) {
        Network network = checked.network();
        var section = leg.kind() == LegKind.BACK ? network.sectionBack(leg.owner()) : network.sectionAhead(leg.owner());
        if (section.isEmpty()) {
            return;
        }
        List<Integer> silent = silent(network, section.get(), leg, states);
        if (!silent.isEmpty()) {
            found.accept(new Finding(
                    Severity.WARNING,
                    "opened-without-state",
                    "end_states.csv",
                    enclosure.code(),
                    JointText.leg(checked.records(), leg, Checked.ranges(silent)) + " @ " + enclosure.code()
                            + ": cut here, with no joint and no state. Until somebody says, they do not count as spare.",
                    "Record each as capped or stored, or the joint that uses it."));
        }
    }

    private static List<Integer> silent(Network network, Block section, Leg leg, Map<Long, EndState> states) {
        List<Integer> silent = new ArrayList<>();
        int side = leg.kind() == LegKind.BACK ? 1 : 0;
        for (int fiber = 1; fiber <= section.count(); fiber++) {
            int end = 2 * (section.firstPiece() + fiber - 1) + side;
            if (network.peer(end) == Network.NONE && network.joint(end) == 0 && !states.containsKey(leg.key(fiber))) {
                silent.add(fiber);
            }
        }
        return silent;
    }

    private static void contradicted(
            Checked checked, Enclosure enclosure, Map<Long, EndState> states, Consumer<Finding> found) {
        states.values().stream().distinct().forEach(state -> {
            List<Integer> wrong = contradicted(checked.network(), state);
            if (!wrong.isEmpty()) {
                found.accept(new Finding(
                        Severity.ERROR,
                        "state-contradicts-glass",
                        "end_states.csv",
                        enclosure.code(),
                        JointText.leg(checked.records(), state.ends().leg(), Checked.ranges(wrong)) + " @ "
                                + enclosure.code() + " is recorded as "
                                + state.condition().word() + ", but " + contradiction(state.condition()) + ".",
                        "Remove the state, or mend the joint or the opened fibers."));
            }
        });
    }

    private static String contradiction(EndCondition condition) {
        return condition == EndCondition.THROUGH ? "the fiber is cut here" : "the end is joined or not cut here";
    }

    private static List<Integer> contradicted(Network network, EndState state) {
        EndRange ends = state.ends();
        List<Integer> wrong = new ArrayList<>();
        for (int index = 0; index < ends.count(); index++) {
            int end = network.endOf(ends.key(index));
            if (end == Network.NONE || state.condition() == EndCondition.UNKNOWN) {
                continue;
            }
            boolean uncut = network.peer(end) != Network.NONE && network.joint(end) == 0;
            boolean free = network.peer(end) == Network.NONE && network.joint(end) == 0;
            if (state.condition() == EndCondition.THROUGH ? !uncut : !free) {
                wrong.add(ends.numbers().at(index));
            }
        }
        wrong.sort(null);
        return wrong;
    }
}
