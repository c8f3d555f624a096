package spanwright.benchmarks.cut;

import java.util.ArrayList;
import java.util.List;
import java.util.Random;
import spanwright.journal.Change;
import spanwright.journal.RecordKind;
import spanwright.network.Network;
import spanwright.network.Snapshot;
import spanwright.network.SnapshotEditor;
import spanwright.plant.FiberRange;
import spanwright.splicing.EndRange;
import spanwright.splicing.Joint;
import spanwright.splicing.JointKind;

/** Changes a share of all joints by postings, as crews do: a range is made anew the other way round. */
final class EditBurst {

    private static final int RANGES_A_POSTING = 4;

    private final Random random = new Random(11);
    private Snapshot snapshot;

    EditBurst(Snapshot snapshot) {
        this.snapshot = snapshot;
    }

    Snapshot change(double share) {
        List<Joint> splices = new ArrayList<>(snapshot.records()
                .joints()
                .list()
                .filter(joint -> joint.type() == JointKind.SPLICE && joint.count() > 1)
                .toList());
        long all = snapshot.records().joints().list().mapToLong(Joint::count).sum();
        long changed = 0;
        while (changed < all * share) {
            SnapshotEditor editor = snapshot.edit();
            List<Joint> turned = new ArrayList<>();
            for (int index = 0; index < RANGES_A_POSTING; index++) {
                turned.add(take(splices));
                turn(editor, turned.get(index));
            }
            Snapshot next = editor.build(snapshot.records().posting() + 1);
            // Turning a range can close a circle, on which the SQL would walk for ever: such a posting is not made.
            if (turned.stream().noneMatch(joint -> circles(next.network(), joint))) {
                changed += turned.stream().mapToInt(Joint::count).sum();
                snapshot = next;
            }
        }
        return snapshot;
    }

    private static boolean circles(Network network, Joint joint) {
        for (int index = 0; index < joint.count(); index++) {
            int piece = network.endOf(joint.a().key(index)) >> 1;
            if (network.paths().circle(network.paths().pathOf(piece))) {
                return true;
            }
        }
        return false;
    }

    private Joint take(List<Joint> splices) {
        int at = random.nextInt(splices.size());
        Joint joint = splices.get(at);
        splices.set(at, splices.get(splices.size() - 1));
        splices.remove(splices.size() - 1);
        return joint;
    }

    private static void turn(SnapshotEditor editor, Joint joint) {
        FiberRange numbers = joint.b().numbers();
        Joint turned = new Joint(
                editor.records().newIdentity(RecordKind.JOINT),
                joint.type(),
                joint.enclosure(),
                joint.a(),
                new EndRange(joint.b().leg(), new FiberRange(/* first= */ numbers.last(), /* last= */ numbers.first())),
                joint.facts());
        refuse(editor.apply(Change.remove(joint)));
        refuse(editor.apply(Change.add(turned)));
    }

    private static void refuse(List<?> refusals) {
        if (!refusals.isEmpty()) {
            throw new IllegalStateException(refusals.toString());
        }
    }
}
