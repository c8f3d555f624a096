package spanwright.network;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import spanwright.plant.Cable;
import spanwright.plant.RunRow;
import spanwright.records.RecordsView;
import spanwright.splicing.Joint;
import spanwright.splicing.LegKind;
import spanwright.splicing.Panel;
import spanwright.splicing.Splitter;

/**
 * Gives dirty plant fresh blocks: takes the joints on its ends out of the glass, lets the old blocks die, lays fresh
 * ones from the records, and puts the joints back by their end keys.
 */
final class FreshBlocks {

    private static final int NONE = -1;

    private final RecordsView records;
    private final BlockEditor blocks;
    private final Links links;
    private final LooseJoints.Editor loose;
    private final JointLinker linker;

    private final Set<Integer> dying = new LinkedHashSet<>();
    private final Set<Integer> joints = new LinkedHashSet<>();

    FreshBlocks(RecordsView records, BlockEditor blocks, Links links, LooseJoints.Editor loose, JointLinker linker) {
        this.records = records;
        this.blocks = blocks;
        this.links = links;
        this.loose = loose;
        this.linker = linker;
    }

    void renew(DirtyPlant dirty) {
        List<Integer> settled = new ArrayList<>(dirty.rows);
        Map<Integer, List<Integer>> cut = new LinkedHashMap<>();
        for (int cable : dirty.cables) {
            List<Integer> wanted = cutsOf(cable);
            if (!dirty.wholly.contains(cable) && standsSo(cable, wanted)) {
                settled.addAll(wanted);
            } else {
                cut.put(cable, wanted);
                gatherCable(cable, wanted);
            }
        }
        dirty.panels.forEach(this::gatherPanel);
        dirty.splitters.forEach(this::gatherSplitter);
        List<Joint> moved = new ArrayList<>();
        for (int joint : joints) {
            moved.add(records.joints().get(joint));
        }
        moved.forEach(joint -> linker.unlink(joint, false));
        dying.forEach(this::kill);
        cut.forEach(this::layCable);
        dirty.panels.forEach(this::layPanel);
        dirty.splitters.forEach(this::laySplitter);
        moved.forEach(linker::link);
        settled.forEach(linker::settleRow);
    }

    /** The run rows at which a cable's sections begin and end, by seq; none where it is not in service. */
    private List<Integer> cutsOf(int cable) {
        if (records.cables().find(cable).filter(InService::is).isEmpty()) {
            return List.of();
        }
        List<RunRow> run = records.runOf(cable);
        List<Integer> cuts = new ArrayList<>();
        for (int index = 0; index < run.size(); index++) {
            if (index == 0 || index == run.size() - 1 || cutAt(run.get(index).id())) {
                cuts.add(run.get(index).id());
            }
        }
        return cuts.size() < 2 ? List.of() : cuts;
    }

    private boolean cutAt(int row) {
        return records.findPassAt(row)
                .flatMap(pass -> records.enclosures().find(pass.enclosure()))
                .filter(InService::is)
                .isPresent();
    }

    private int fibersOf(int cable) {
        Cable found = records.cables().get(cable);
        return records.cableTypes().get(found.cableType()).fibers();
    }

    private boolean standsSo(int cable, List<Integer> wanted) {
        int block = blocks.find(Blocks.CABLE, cable);
        if (block == NONE || wanted.isEmpty()) {
            return block == NONE && wanted.isEmpty();
        }
        List<Integer> cuts = new ArrayList<>(List.of(blocks.field(block, Blocks.FROM_ROW)));
        if (blocks.field(block, Blocks.COUNT) != fibersOf(cable)) {
            return false;
        }
        for (; block != NONE; block = blocks.nextSection(block)) {
            cuts.add(blocks.field(block, Blocks.TO_ROW));
        }
        return cuts.equals(wanted);
    }

    private void gatherCable(int cable, List<Integer> wanted) {
        for (int row : wanted) {
            gatherLoose(LegKind.BACK, row);
            gatherLoose(LegKind.AHEAD, row);
        }
        for (int block = blocks.find(Blocks.CABLE, cable); block != NONE; block = blocks.nextSection(block)) {
            gatherBlock(block);
        }
    }

    private void gatherPanel(int panel) {
        gatherLoose(LegKind.REAR, panel);
        gatherLoose(LegKind.FRONT, panel);
        gatherBlock(blocks.find(Blocks.PANEL, panel));
    }

    private void gatherSplitter(int splitter) {
        gatherLoose(LegKind.IN, splitter);
        gatherLoose(LegKind.OUT, splitter);
        gatherBlock(blocks.find(Blocks.SPLITTER, splitter));
    }

    private void gatherLoose(LegKind kind, int owner) {
        if (!loose.isEmpty()) {
            for (int joint : loose.find(kind, owner)) {
                joints.add(joint);
            }
        }
    }

    private void gatherBlock(int block) {
        if (block == NONE) {
            return;
        }
        dying.add(block);
        int first = 2 * blocks.field(block, Blocks.FIRST);
        int end = first + 2 * blocks.field(block, Blocks.COUNT);
        int last = 0;
        for (int at = first; at < end; at++) {
            int joint = links.joint(at);
            if (joint != 0 && joint != last) {
                joints.add(joint);
                last = joint;
            }
        }
    }

    private void kill(int block) {
        links.clear(blocks.field(block, Blocks.FIRST), blocks.field(block, Blocks.COUNT));
        blocks.kill(block);
    }

    private void layCable(int cable, List<Integer> cuts) {
        if (cuts.isEmpty()) {
            return;
        }
        int fibers = fibersOf(cable);
        for (int index = 1; index < cuts.size(); index++) {
            int block = blocks.addSection(cable, cuts.get(index - 1), cuts.get(index), fibers);
            if (index == 1) {
                blocks.leadCable(cable, block);
            }
        }
        links.grow(blocks.pieces());
        for (int row : cuts.subList(1, cuts.size() - 1)) {
            linker.settleRow(row);
        }
    }

    private void layPanel(int id) {
        records.panels().find(id).filter(panel -> hosts(panel.enclosure())).ifPresent(this::lay);
    }

    private void lay(Panel panel) {
        blocks.addPanel(panel.id(), panel.ports());
        links.grow(blocks.pieces());
    }

    private void laySplitter(int id) {
        records.splitters()
                .find(id)
                .filter(splitter -> hosts(splitter.enclosure()))
                .ifPresent(this::lay);
    }

    private void lay(Splitter splitter) {
        blocks.addSplitter(splitter.id(), splitter.inputs(), splitter.outputs());
        links.grow(blocks.pieces());
    }

    private boolean hosts(int enclosure) {
        return records.enclosures().find(enclosure).filter(InService::is).isPresent();
    }
}
