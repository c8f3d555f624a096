package spanwright.planning;

import java.util.HashMap;
import java.util.HashSet;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import org.jspecify.annotations.Nullable;
import spanwright.network.Block;
import spanwright.network.Network;
import spanwright.plant.CableType;
import spanwright.plant.FiberRange;
import spanwright.plant.Pass;
import spanwright.records.Records;
import spanwright.records.Relation;
import spanwright.splicing.EndKey;
import spanwright.splicing.EndState;

/** What is recorded of ends that no joint uses, and which tubes are opened. What was asked is kept; one thread's. */
public final class EndStates {

    private final Records records;
    private final Network network;
    private final Map<Integer, Map<Long, EndState>> ofEnclosure = new HashMap<>();
    private final Map<Integer, Set<Integer>> openedAtRow = new HashMap<>();

    /** Of these records and their network. */
    public EndStates(Records records, Network network) {
        this.records = records;
        this.network = network;
    }

    /** The state recorded of a fiber's end, or null where none is. */
    public @Nullable EndState find(long key) {
        Optional<Pass> pass = records.findPassAt(EndKey.owner(key));
        return pass.isEmpty()
                ? null
                : ofEnclosure
                        .computeIfAbsent(pass.get().enclosure(), this::statesIn)
                        .get(key);
    }

    private Map<Long, EndState> statesIn(int enclosure) {
        Map<Long, EndState> states = new HashMap<>();
        records.endStates().owned(Relation.ENCLOSURE_END_STATES, enclosure).forEach(state -> {
            for (int index = 0; index < state.ends().count(); index++) {
                states.put(state.ends().key(index), state);
            }
        });
        return states;
    }

    /** Whether the tube of a fiber's end is opened where it lies: named so, or holding a cut fiber. */
    public boolean isTubeOpened(long key) {
        int row = EndKey.owner(key);
        CableType type = type(row);
        return openedAtRow.computeIfAbsent(row, this::openedAt).contains(type.tubeOf(EndKey.number(key)));
    }

    private CableType type(int runRow) {
        int cable = records.runRows().get(runRow).cable();
        return records.cableTypes().get(records.cables().get(cable).cableType());
    }

    private Set<Integer> openedAt(int row) {
        Set<Integer> tubes = new HashSet<>();
        CableType type = type(row);
        records.findPassAt(row).ifPresent(pass -> {
            for (FiberRange range : pass.tubesOpened()) {
                for (int index = 0; index < range.count(); index++) {
                    tubes.add(range.at(index));
                }
            }
        });
        network.sectionBack(row).ifPresent(section -> addCut(tubes, type, section, 1));
        network.sectionAhead(row).ifPresent(section -> addCut(tubes, type, section, 0));
        return tubes;
    }

    /** A fiber is cut where its end is in a joint, or is joined to nothing. */
    private void addCut(Set<Integer> tubes, CableType type, Block section, int side) {
        for (int fiber = 1; fiber <= section.count(); fiber++) {
            int end = 2 * section.piece(fiber) + side;
            if (network.joint(end) != 0 || network.peer(end) == Network.NONE) {
                tubes.add(type.tubeOf(fiber));
            }
        }
    }
}
