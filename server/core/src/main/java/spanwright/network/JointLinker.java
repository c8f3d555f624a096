package spanwright.network;

import java.util.Optional;
import spanwright.plant.FiberRange;
import spanwright.plant.Pass;
import spanwright.records.RecordsView;
import spanwright.splicing.EndRange;
import spanwright.splicing.Joint;
import spanwright.splicing.Leg;
import spanwright.splicing.LegKind;

/** Puts joints into the glass and takes them out, so that fibers are cut and go through as the records say. */
final class JointLinker {

    private static final int NONE = -1;

    private final RecordsView records;
    private final BlockEditor blocks;
    private final Links links;
    private final LooseJoints.Editor loose;

    JointLinker(RecordsView records, BlockEditor blocks, Links links, LooseJoints.Editor loose) {
        this.records = records;
        this.blocks = blocks;
        this.links = links;
        this.loose = loose;
    }

    /** Puts a joint into the glass; none of its ends is named by another. */
    void link(Joint joint) {
        int blockA = blockOf(joint.a().leg());
        int blockB = blockOf(joint.b().leg());
        boolean joins = blockA != NONE
                && blockB != NONE
                && records.enclosures()
                        .find(joint.enclosure())
                        .filter(InService::is)
                        .isPresent();
        for (int index = 0; index < joint.count(); index++) {
            int endA = claim(blockA, joint.a(), index, joint.id());
            int endB = claim(blockB, joint.b(), index, joint.id());
            if (joins && endA != NONE && endB != NONE) {
                links.connect(endA, endB);
            }
        }
        noteLoose(joint, true);
    }

    private int blockOf(Leg leg) {
        return blocks.blockOfLeg(leg.kind(), leg.owner());
    }

    private int claim(int block, EndRange ends, int index, int joint) {
        if (block == NONE) {
            return NONE;
        }
        int end = blocks.endIn(block, ends.leg().kind(), ends.numbers().at(index));
        if (end != NONE) {
            int earlier = links.joint(end);
            if (earlier != 0) {
                throw new IllegalStateException("joint " + joint + " on an end of joint " + earlier);
            }
            links.part(end);
            links.name(end, joint);
        }
        return end;
    }

    private void noteLoose(Joint joint, boolean put) {
        noteLoose(joint.a().leg(), joint.id(), put);
        if (!joint.b().leg().equals(joint.a().leg())) {
            noteLoose(joint.b().leg(), joint.id(), put);
        }
    }

    private void noteLoose(Leg leg, int joint, boolean put) {
        if (blockOf(leg) == NONE) {
            if (put) {
                loose.add(leg, joint);
            } else {
                loose.remove(leg, joint);
            }
        }
    }

    /**
     * Takes a joint out of the glass.
     *
     * @param heal whether a fiber that nothing cuts any more goes through again
     */
    void unlink(Joint joint, boolean heal) {
        release(joint.a(), joint.id());
        release(joint.b(), joint.id());
        if (heal) {
            heal(joint.a());
            heal(joint.b());
        }
        noteLoose(joint, false);
    }

    private void release(EndRange ends, int joint) {
        int block = blockOf(ends.leg());
        if (block == NONE) {
            return;
        }
        for (int index = 0; index < ends.count(); index++) {
            int end = blocks.endIn(block, ends.leg().kind(), ends.numbers().at(index));
            if (end != NONE && links.joint(end) == joint) {
                links.part(end);
                links.name(end, 0);
            }
        }
    }

    private void heal(EndRange ends) {
        LegKind kind = ends.leg().kind();
        if (kind == LegKind.BACK || kind == LegKind.AHEAD) {
            settleRow(ends.leg().owner(), ends.numbers());
        }
    }

    /** Makes every fiber at a run row cut or through, as the joints and the pass there say. */
    void settleRow(int row) {
        int block = blocks.find(Blocks.BACK, row);
        if (block != NONE) {
            settleRow(row, new FiberRange(1, blocks.field(block, Blocks.COUNT)));
        }
    }

    private void settleRow(int row, FiberRange fibers) {
        int back = blocks.find(Blocks.BACK, row);
        int ahead = blocks.find(Blocks.AHEAD, row);
        if (back == NONE || ahead == NONE) {
            return;
        }
        Optional<Pass> pass = records.findPassAt(row);
        for (int index = 0; index < fibers.count(); index++) {
            int fiber = fibers.at(index);
            settle(
                    blocks.endIn(back, LegKind.BACK, fiber),
                    blocks.endIn(ahead, LegKind.AHEAD, fiber),
                    pass.isPresent() && opens(pass.get(), fiber));
        }
    }

    private void settle(int back, int ahead, boolean opened) {
        if (back == NONE || ahead == NONE || links.joint(back) != 0 || links.joint(ahead) != 0) {
            return;
        }
        boolean through = links.peer(back) != NONE;
        if (through && opened) {
            links.part(back);
        } else if (!through && !opened) {
            links.connect(back, ahead);
        }
    }

    private static boolean opens(Pass pass, int fiber) {
        for (FiberRange range : pass.opened()) {
            if (range.contains(fiber)) {
                return true;
            }
        }
        return false;
    }

    /** Puts a planned joint in the place of whatever its ends are in now. */
    void linkAsIf(Joint joint) {
        displace(joint.a());
        displace(joint.b());
        link(joint);
    }

    private void displace(EndRange ends) {
        int block = blockOf(ends.leg());
        for (int index = 0; block != NONE && index < ends.count(); index++) {
            int end = blocks.endIn(block, ends.leg().kind(), ends.numbers().at(index));
            if (end != NONE) {
                freePeerOf(end);
                links.part(end);
                links.name(end, 0);
            }
        }
    }

    private void freePeerOf(int end) {
        int other = links.peer(end);
        if (other != NONE) {
            links.name(other, 0);
        }
    }
}
