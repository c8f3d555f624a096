package spanwright.paper;

import spanwright.answers.Colors;
import spanwright.answers.View;
import spanwright.network.Block;
import spanwright.network.BlockKind;
import spanwright.network.Network;
import spanwright.plant.CableType;
import spanwright.splicing.EndKey;
import spanwright.splicing.EndState;
import spanwright.splicing.Joint;

/** What an end of glass is joined to, in words. One question's. */
final class JoinedWords {

    private final View view;
    private final Network network;

    JoinedWords(View view) {
        this.view = view;
        this.network = view.network();
    }

    /**
     * What an end is joined to.
     *
     * @param to the end on the other side, in the notation of the records folder, or what the end is instead
     * @param beneath colours of that glass and what else must be known of the joint; may be empty
     */
    record Joined(String to, String beneath) {}

    /** What a fiber's end is joined to. */
    Joined at(int end) {
        int peer = network.peer(end);
        int joint = network.joint(end);
        if (joint != 0) {
            Joint record = view.records().joints().get(joint);
            return peer == Network.NONE ? notInService(record, network.keyOf(end)) : joined(record, peer);
        }
        return peer == Network.NONE ? free(network.keyOf(end)) : new Joined("through", "not cut here");
    }

    private Joined joined(Joint joint, int peer) {
        String colors = colors(peer);
        String temporary = joint.facts().temporaryUntil() == null
                ? ""
                : "temporary to " + joint.facts().temporaryUntil();
        String parted = colors.isEmpty() || temporary.isEmpty() ? "" : "; ";
        return new Joined(view.names().end(network.keyOf(peer)), temporary + parted + colors);
    }

    /** Tube and fiber of an end of a cable; nothing for ports and splitters. */
    private String colors(int end) {
        Block block = network.blockOf(end >> 1);
        if (block.kind() != BlockKind.SECTION) {
            return "";
        }
        CableType type = view.lay(block.owner()).type();
        int fiber = block.number(end >> 1);
        Colors colors = new Colors(view, type);
        return colors.tube(type.tubeOf(fiber)) + " / " + colors.fiber(fiber);
    }

    private Joined notInService(Joint joint, long key) {
        for (int index = 0; index < joint.count(); index++) {
            if (joint.a().key(index) == key) {
                return new Joined(view.names().end(joint.b().key(index)), "not in service");
            }
            if (joint.b().key(index) == key) {
                return new Joined(view.names().end(joint.a().key(index)), "not in service");
            }
        }
        throw new IllegalStateException("joint " + joint.id() + " does not name its end");
    }

    private Joined free(long key) {
        if (view.records().findPassAt(EndKey.owner(key)).isEmpty()) {
            return new Joined("bare end", "in no enclosure");
        }
        EndState state = view.endStates().find(key);
        return state == null
                ? new Joined("not joined", "no state recorded")
                : new Joined(state.condition().word(), "not joined");
    }
}
