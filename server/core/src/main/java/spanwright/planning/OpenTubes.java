package spanwright.planning;

import java.util.HashMap;
import java.util.Map;
import java.util.Optional;
import spanwright.circuits.Circuit;
import spanwright.circuits.CircuitStatus;
import spanwright.network.Block;
import spanwright.network.Network;
import spanwright.network.Snapshot;
import spanwright.plant.CableType;
import spanwright.records.Records;
import spanwright.splicing.EndKey;

/**
 * In which tubes an uncut fiber may be cut: opened ones, and closed ones on which no circuit works. A closed tube with a
 * working circuit is never opened, whether its light is down at the moment or not. One thread's.
 */
final class OpenTubes {

    /** What it takes to cut a fiber. */
    enum Cutting {
        /** It must not be cut. */
        FORBIDDEN,
        /** Its tube lies open already. */
        IN_OPEN_TUBE,
        /** Its tube must be opened. */
        OPENS_TUBE
    }

    private final Records records;
    private final Network network;
    private final PathCircuits circuits;
    private final EndStates states;
    private final Map<Long, Cutting> known = new HashMap<>();

    OpenTubes(Snapshot snapshot, PathCircuits circuits) {
        this.records = snapshot.records();
        this.network = snapshot.network();
        this.circuits = circuits;
        this.states = new EndStates(records, network);
    }

    /** The tube of a fiber. */
    int tube(Block section, int fiber) {
        return type(section).tubeOf(fiber);
    }

    private CableType type(Block section) {
        return records.cableTypes().get(records.cables().get(section.owner()).cableType());
    }

    /** What it takes to cut a fiber at an end of it where it goes through uncut. */
    Cutting cutting(int end) {
        long key = network.keyOf(end);
        Block section = network.blockOf(end >> 1);
        int tube = tube(section, EndKey.number(key));
        return known.computeIfAbsent(((long) EndKey.owner(key) << 32) | tube, at -> judge(key, section, tube));
    }

    private Cutting judge(long key, Block section, int tube) {
        if (states.isTubeOpened(key)) {
            return Cutting.IN_OPEN_TUBE;
        }
        int row = EndKey.owner(key);
        return works(network.sectionBack(row), type(section), tube)
                        || works(network.sectionAhead(row), type(section), tube)
                ? Cutting.FORBIDDEN
                : Cutting.OPENS_TUBE;
    }

    private boolean works(Optional<Block> section, CableType type, int tube) {
        if (section.isEmpty()) {
            return false;
        }
        int last = Math.min(tube * type.fibersPerTube(), section.get().count());
        for (int fiber = (tube - 1) * type.fibersPerTube() + 1; fiber <= last; fiber++) {
            for (Circuit circuit : circuits.through(section.get().piece(fiber))) {
                if (circuit.status() == CircuitStatus.WORKING) {
                    return true;
                }
            }
        }
        return false;
    }
}
