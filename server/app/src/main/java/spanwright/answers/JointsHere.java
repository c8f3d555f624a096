package spanwright.answers;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.TreeSet;
import org.jspecify.annotations.Nullable;
import spanwright.network.Block;
import spanwright.network.Network;
import spanwright.plant.Enclosure;
import spanwright.records.Relation;
import spanwright.splicing.Joint;

/** Everything joined in one enclosure, by tray, then as recorded: the joints that its ends are in. */
final class JointsHere {

    private final View view;
    private final List<Joint> joints;
    private final Map<Integer, Integer> indexOf = new HashMap<>();

    JointsHere(View view, Enclosure enclosure) {
        this.view = view;
        Set<Integer> ids = new TreeSet<>();
        view.records().passes().owned(Relation.ENCLOSURE_PASSES, enclosure.id()).forEach(pass -> {
            view.network().sectionBack(pass.runRow()).ifPresent(section -> gather(ids, section, 1));
            view.network().sectionAhead(pass.runRow()).ifPresent(section -> gather(ids, section, 0));
        });
        for (int panel : view.records().owned(Relation.ENCLOSURE_PANELS, enclosure.id())) {
            view.network().panelBlock(panel).ifPresent(block -> {
                gather(ids, block, 0);
                gather(ids, block, 1);
            });
        }
        for (int splitter : view.records().owned(Relation.ENCLOSURE_SPLITTERS, enclosure.id())) {
            view.network().splitterBlock(splitter).ifPresent(block -> gather(ids, block, 0));
        }
        joints = new ArrayList<>(ids.stream().map(view.records().joints()::get).toList());
        joints.sort(Comparator.comparing((Joint joint) -> joint.facts().tray(), JointsHere::byTray)
                .thenComparing(Joint::id));
        for (int index = 0; index < joints.size(); index++) {
            indexOf.put(joints.get(index).id(), index);
        }
    }

    private void gather(Set<Integer> ids, Block block, int side) {
        Network network = view.network();
        for (int piece = block.firstPiece(); piece < block.firstPiece() + block.count(); piece++) {
            int joint = network.joint(2 * piece + side);
            if (joint != 0) {
                ids.add(joint);
            }
        }
    }

    /** Tray 2 before tray 10, what is in no tray last. */
    private static int byTray(@Nullable String one, @Nullable String other) {
        if (one == null || other == null) {
            return Boolean.compare(one == null, other == null);
        }
        return one.length() != other.length() && isNumber(one) && isNumber(other)
                ? Integer.compare(one.length(), other.length())
                : one.compareTo(other);
    }

    private static boolean isNumber(String text) {
        return text.chars().allMatch(letter -> letter >= '0' && letter <= '9');
    }

    List<Joint> list() {
        return joints;
    }

    /** The place of a joint in the list, or null where it is not in it. */
    @Nullable
    Integer index(Joint joint) {
        return indexOf.get(joint.id());
    }

    /** The joint that an end is in, or null. */
    @Nullable
    Joint findAt(long key) {
        int end = view.network().endOf(key);
        int joint = end == Network.NONE ? 0 : view.network().joint(end);
        return joint == 0 ? null : view.records().joints().get(joint);
    }
}
