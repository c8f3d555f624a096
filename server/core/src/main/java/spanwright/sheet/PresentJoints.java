package spanwright.sheet;

import java.util.Comparator;
import java.util.List;
import java.util.Set;
import java.util.TreeSet;
import spanwright.network.Block;
import spanwright.network.Network;
import spanwright.network.Snapshot;
import spanwright.plant.Enclosure;
import spanwright.records.RecordsView;
import spanwright.records.Relation;
import spanwright.splicing.Joint;

/** Everything joined in one enclosure: what is in the glass and in service, and what is planned. */
final class PresentJoints {

    private final Snapshot snapshot;
    private final Set<Integer> found = new TreeSet<>();

    private PresentJoints(Snapshot snapshot) {
        this.snapshot = snapshot;
    }

    /** The joints, by the keys of their a sides. */
    static List<Joint> list(Snapshot snapshot, int enclosure) {
        PresentJoints joints = new PresentJoints(snapshot);
        joints.inGlass(enclosure);
        joints.planned(enclosure);
        return joints.found.stream()
                .map(snapshot.records().joints()::get)
                .sorted(Comparator.comparingLong((Joint joint) -> joint.a().key(0))
                        .thenComparing(Joint::id))
                .toList();
    }

    private void inGlass(int enclosure) {
        RecordsView records = snapshot.records();
        Network network = snapshot.network();
        records.passes().owned(Relation.ENCLOSURE_PASSES, enclosure).forEach(pass -> {
            network.sectionBack(pass.runRow()).ifPresent(section -> gather(section, 1));
            network.sectionAhead(pass.runRow()).ifPresent(section -> gather(section, 0));
        });
        for (int panel : records.owned(Relation.ENCLOSURE_PANELS, enclosure)) {
            network.panelBlock(panel).ifPresent(block -> {
                gather(block, 0);
                gather(block, 1);
            });
        }
        for (int splitter : records.owned(Relation.ENCLOSURE_SPLITTERS, enclosure)) {
            network.splitterBlock(splitter).ifPresent(block -> gather(block, 0));
        }
    }

    private void gather(Block block, int side) {
        for (int piece = block.firstPiece(); piece < block.firstPiece() + block.count(); piece++) {
            int joint = snapshot.network().joint(2 * piece + side);
            if (joint != 0) {
                found.add(joint);
            }
        }
    }

    private void planned(int enclosure) {
        RecordsView records = snapshot.records();
        int structure =
                records.enclosures().find(enclosure).map(Enclosure::structure).orElse(0);
        if (structure != 0) {
            records.plannedJobs().stream()
                    .flatMap(job -> records.plannedJoints(job).stream())
                    .filter(id -> records.joints().get(id).enclosure() == enclosure)
                    .forEach(found::add);
        }
    }
}
