package spanwright.network;

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

    /**
     * Puts a joint into the glass; none of its ends is named by another.
     *
     * @throws IllegalStateException where one is
     */
    void link(Joint joint) {
        LegEnds endsA = LegEnds.of(blocks, joint.a().leg());
        LegEnds endsB = LegEnds.of(blocks, joint.b().leg());
        boolean joins = endsA.present() && endsB.present() && inService(joint.enclosure());
        FiberRange numbersA = joint.a().numbers();
        FiberRange numbersB = joint.b().numbers();
        for (int index = 0; index < numbersA.count(); index++) {
            int endA = endsA.at(numbersA.at(index));
            int endB = endsB.at(numbersB.at(index));
            claim(endA, joint.id());
            claim(endB, joint.id());
            if (joins && endA != NONE && endB != NONE) {
                links.connect(endA, endB);
            }
        }
        noteLoose(joint, endsA, endsB, true);
    }

    private boolean inService(int enclosure) {
        return records.enclosures().find(enclosure).filter(InService::is).isPresent();
    }

    private void claim(int end, int joint) {
        if (end == NONE) {
            return;
        }
        int earlier = links.joint(end);
        if (earlier != 0) {
            throw new IllegalStateException("joint " + joint + " on an end of joint " + earlier);
        }
        links.part(end);
        links.name(end, joint);
    }

    private void noteLoose(Joint joint, LegEnds endsA, LegEnds endsB, boolean put) {
        noteLoose(joint.a().leg(), endsA, joint.id(), put);
        if (!joint.b().leg().equals(joint.a().leg())) {
            noteLoose(joint.b().leg(), endsB, joint.id(), put);
        }
    }

    private void noteLoose(Leg leg, LegEnds ends, int joint, boolean put) {
        if (ends.present()) {
            return;
        }
        if (put) {
            loose.add(leg, joint);
        } else {
            loose.remove(leg, joint);
        }
    }

    /**
     * Takes a joint out of the glass.
     *
     * @param heal whether a fiber that nothing cuts any more goes through again
     */
    void unlink(Joint joint, boolean heal) {
        LegEnds endsA = LegEnds.of(blocks, joint.a().leg());
        LegEnds endsB = LegEnds.of(blocks, joint.b().leg());
        release(endsA, joint.a().numbers(), joint.id());
        release(endsB, joint.b().numbers(), joint.id());
        if (heal) {
            heal(joint.a());
            heal(joint.b());
        }
        noteLoose(joint, endsA, endsB, false);
    }

    private void release(LegEnds ends, FiberRange numbers, int joint) {
        for (int index = 0; index < numbers.count(); index++) {
            int end = ends.at(numbers.at(index));
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
        LegEnds back = LegEnds.of(blocks, new Leg(LegKind.BACK, row));
        LegEnds ahead = LegEnds.of(blocks, new Leg(LegKind.AHEAD, row));
        if (!back.present() || !ahead.present()) {
            return;
        }
        Pass pass = records.findPassAt(row).orElse(null);
        for (int index = 0; index < fibers.count(); index++) {
            int fiber = fibers.at(index);
            settle(back.at(fiber), ahead.at(fiber), pass != null && opens(pass, fiber));
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

    private void displace(EndRange range) {
        LegEnds ends = LegEnds.of(blocks, range.leg());
        for (int index = 0; index < range.count(); index++) {
            int end = ends.at(range.numbers().at(index));
            if (end != NONE) {
                int other = links.peer(end);
                links.part(end);
                links.name(end, 0);
                if (other != NONE) {
                    links.name(other, 0);
                }
            }
        }
    }
}
