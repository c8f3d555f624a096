package spanwright.network;

import spanwright.circuits.Circuit;
import spanwright.journal.Change;
import spanwright.journal.RecordKind;
import spanwright.journal.Recorded;
import spanwright.records.RecordsView;
import spanwright.splicing.Joint;
import spanwright.splicing.Leg;

/**
 * Follows changes of the records in the network. What needs fresh blocks is noted and done once, before the next joint
 * changes or the network is built. One thread's; dead after {@link #build}.
 */
final class NetworkEditor {

    private final Network base;
    private final RecordsView records;
    private final BlockEditor blocks;
    private final Links links;
    private final LooseJoints.Editor loose;
    private final JointLinker linker;
    private final DirtyPlant dirty;
    private final CircuitTags tags;

    NetworkEditor(Network base, RecordsView records) {
        this.base = base;
        this.records = records;
        this.blocks = base.blocks.edit();
        this.links = new Links(base.peer, base.joint);
        this.loose = base.loose.edit();
        this.linker = new JointLinker(records, blocks, links, loose);
        this.dirty = new DirtyPlant(records);
        this.tags = new CircuitTags(records, blocks);
    }

    /** Makes ready for a change that is about to be applied to the records. */
    void prepare(Change change) {
        if (change.kind() == RecordKind.JOINT) {
            renew();
        }
    }

    /** Brings all noted changes into the network. */
    void renew() {
        if (!dirty.isEmpty()) {
            new FreshBlocks(records, blocks, links, loose, linker).renew(dirty);
            dirty.clear();
        }
    }

    /** Follows a change that has been applied to the records. */
    void follow(Change change) {
        Recorded before = change.before();
        Recorded after = change.after();
        if (change.kind() == RecordKind.JOINT) {
            if (before instanceof Joint joint && !joint.planned()) {
                linker.unlink(joint, true);
            }
            if (after instanceof Joint joint && !joint.planned()) {
                linker.link(joint);
            }
        } else if (change.kind() == RecordKind.CIRCUIT) {
            tags.note((Circuit) before);
            tags.note((Circuit) after);
        } else {
            dirty.note(change);
        }
    }

    /** Puts a planned joint into the glass, in the place of whatever its ends are in now. */
    void buildPlanned(Joint joint) {
        renew();
        linker.linkAsIf(joint);
    }

    /** Where the ends of a leg are, all changes regarded. */
    LegEnds ends(Leg leg) {
        renew();
        return LegEnds.of(blocks, leg);
    }

    /** The joint in the glass that names an end, 0 for none. */
    int joint(int end) {
        return links.joint(end);
    }

    /** Joints in the glass that name a leg out of the network. */
    int[] looseJoints(Leg leg) {
        renew();
        return loose.isEmpty() ? NOTHING : loose.find(leg.kind(), leg.owner());
    }

    private static final int[] NOTHING = new int[0];

    Network build() {
        renew();
        PathIndex paths = buildPaths();
        return new Network(blocks.build(), links.buildPeers(), links.buildJoints(), loose.build(), paths);
    }

    private PathIndex buildPaths() {
        TouchedPieces touched = links.touched();
        if (touched.all()) {
            return tags.tagAll(PathBuilder.build(blocks, links));
        }
        if (touched.isEmpty() && tags.isEmpty()) {
            return base.paths();
        }
        PathEditor editor = new PathEditor(base.paths(), blocks, links);
        editor.relay(touched);
        return tags.tag(editor.build(), editor);
    }
}
