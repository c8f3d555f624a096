package spanwright.planning;

import java.time.LocalDate;
import java.util.HashMap;
import java.util.Map;
import org.jspecify.annotations.Nullable;
import spanwright.network.BlockKind;
import spanwright.network.Network;
import spanwright.network.PathIndex;
import spanwright.network.Snapshot;
import spanwright.plant.Trust;
import spanwright.records.Records;
import spanwright.splicing.EndCondition;
import spanwright.splicing.EndState;
import spanwright.splicing.Joint;
import spanwright.splicing.JointKind;

/** How sure the records are of glass paths: each joint counts, and each fiber end that no joint uses. One thread's. */
final class PathTrusts {

    private final Records records;
    private final Network network;
    private final EndStates states;
    private final Map<Integer, PathTrust> ofPath = new HashMap<>();

    PathTrusts(Snapshot snapshot) {
        this.records = snapshot.records();
        this.network = snapshot.network();
        this.states = new EndStates(records, network);
    }

    PathTrust of(int path) {
        return ofPath.computeIfAbsent(path, this::gather);
    }

    private PathTrust gather(int path) {
        Tally tally = new Tally();
        PathIndex paths = network.paths();
        for (int entered : paths.ends(path)) {
            count(tally, entered);
            count(tally, entered ^ 1);
        }
        return tally.trust();
    }

    private void count(Tally tally, int end) {
        int joint = network.joint(end);
        if (joint != 0) {
            tally.add(records.joints().get(joint));
        } else if (network.blockOf(end >> 1).kind() == BlockKind.SECTION) {
            long key = network.keyOf(end);
            EndState state = states.find(key);
            if (state != null) {
                tally.add(
                        state.condition() == EndCondition.UNKNOWN ? Trust.UNKNOWN : state.trust(), state.verifiedOn());
            } else if (network.peer(end) == Network.NONE || states.isTubeOpened(key)) {
                tally.add(Trust.UNKNOWN, null);
            }
        }
    }

    /** What is found along one path. */
    private static final class Tally {

        private boolean jumpered;
        private boolean known = true;
        private boolean verified = true;
        private boolean dated = true;
        private int count;
        private @Nullable LocalDate earliest;

        void add(Joint joint) {
            jumpered |= joint.type() == JointKind.JUMPER;
            add(joint.facts().trust(), joint.facts().verifiedOn());
        }

        void add(Trust trust, @Nullable LocalDate on) {
            count++;
            known &= trust != Trust.UNKNOWN;
            verified &= trust == Trust.VERIFIED;
            if (on == null) {
                dated = false;
            } else if (earliest == null || on.isBefore(earliest)) {
                earliest = on;
            }
        }

        PathTrust trust() {
            return new PathTrust(jumpered, known, verified && count > 0, dated ? earliest : null);
        }
    }
}
