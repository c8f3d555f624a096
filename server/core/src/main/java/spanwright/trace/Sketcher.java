package spanwright.trace;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Objects;
import spanwright.network.Block;
import spanwright.network.BlockKind;
import spanwright.network.Network;
import spanwright.network.Snapshot;
import spanwright.plant.Enclosure;
import spanwright.plant.FiberColors;
import spanwright.plant.Structure;
import spanwright.quantity.Length;
import spanwright.records.CableLay;
import spanwright.records.Catalogue;
import spanwright.records.EndNames;
import spanwright.records.Records;
import spanwright.splicing.EndKey;
import spanwright.splicing.Joint;
import spanwright.splicing.LegKind;
import spanwright.splicing.Panel;
import spanwright.splicing.SpliceMethod;
import spanwright.splicing.Splitter;

/** Makes elements and ends of the pieces that a walk enters. One thread's. */
final class Sketcher {

    /** How many lays are kept at hand. */
    static final int MOST_LAYS = 4096;

    private final Network network;
    private final Records records;
    private final Catalogue catalogue;
    private final EndNames names;
    private final int mostLays;
    private final Map<Integer, CableLay> lays = new HashMap<>();

    Sketcher(Snapshot snapshot, int mostLays) {
        this.mostLays = mostLays;
        this.network = snapshot.network();
        this.records = snapshot.records();
        this.catalogue = new Catalogue(records);
        this.names = new EndNames(records);
    }

    /** What a walk meets that enters these ends in order: its pieces, and what joins each to the one before. */
    List<Element> elements(int[] entered) {
        List<Element> elements = new ArrayList<>();
        for (int index = 0; index < entered.length; index++) {
            if (index > 0) {
                addJoint(elements, entered[index - 1], entered[index]);
            }
            addPiece(elements, entered[index]);
        }
        return elements;
    }

    /** What joins the piece entered by one end to the piece entered next. */
    void addJoint(List<Element> elements, int before, int entered) {
        if ((before ^ 1) != network.peer(entered)) {
            elements.add(crossing(before >> 1, entered >> 1));
            return;
        }
        int id = network.joint(entered);
        if (id == 0) {
            elements.add(through(entered));
            return;
        }
        Joint joint = records.joints().get(id);
        switch (joint.type()) {
            case SPLICE, TERMINATION -> addSplice(elements, joint, before ^ 1, entered);
            case JUMPER -> elements.add(jumper(joint, before ^ 1, entered));
        }
    }

    private SplitterCrossing crossing(int from, int to) {
        Block block = network.blockOf(from);
        Splitter splitter = records.splitters().get(block.owner());
        Enclosure enclosure = records.enclosures().get(splitter.enclosure());
        int input = block.number(Math.min(from, to));
        int output = block.number(Math.max(from, to)) - block.inputs();
        return new SplitterCrossing(splitter, enclosure, structure(enclosure), input, output, from < to);
    }

    private Through through(int entered) {
        long key = network.keyOf(entered);
        CableLay lay = lay(network.blockOf(entered >> 1).owner());
        Enclosure enclosure = lay.findEnclosure(lay.index(EndKey.owner(key))).orElseThrow();
        return new Through(enclosure, structure(enclosure), lay.cable(), EndKey.number(key));
    }

    /** A direct termination has no splice. */
    private void addSplice(List<Element> elements, Joint joint, int from, int to) {
        SpliceMethod method = joint.facts().method();
        if (method != null) {
            Enclosure enclosure = records.enclosures().get(joint.enclosure());
            long a = network.keyOf(from);
            long b = network.keyOf(to);
            elements.add(new Splice(joint, method, enclosure, structure(enclosure), a, b, names.end(a), names.end(b)));
        }
    }

    private Jumper jumper(Joint joint, int from, int to) {
        Enclosure enclosure = records.enclosures().get(joint.enclosure());
        return new Jumper(
                joint,
                structure(enclosure),
                names.end(network.keyOf(from)),
                names.end(network.keyOf(to)),
                Objects.requireNonNull(joint.facts().jumperLength()));
    }

    private void addPiece(List<Element> elements, int entered) {
        Block block = network.blockOf(entered >> 1);
        switch (block.kind()) {
            case SECTION -> elements.add(fiber(block, entered));
            case PANEL -> elements.add(connector(block, entered));
            case SPLITTER -> {
                // Crossed between two terminals, not within one.
            }
        }
    }

    private Fiber fiber(Block section, int entered) {
        CableLay lay = lay(section.owner());
        int number = section.number(entered >> 1);
        boolean ahead = (entered & 1) == 0;
        int fromRow = lay.index(ahead ? section.fromRow() : section.toRow());
        int toRow = lay.index(ahead ? section.toRow() : section.fromRow());
        FiberColors colors = catalogue.findColors(lay.type().colors()).orElseThrow();
        return new Fiber(
                lay,
                number,
                fromRow,
                toRow,
                tray(lay, fromRow, entered),
                tray(lay, toRow, entered ^ 1),
                colors.at(lay.type().tubeOf(number)),
                colors.at(lay.type().positionInTube(number)));
    }

    /** The tray glass at one side of a section; none where the fiber goes through uncut. */
    private Length tray(CableLay lay, int row, int end) {
        boolean uncut = network.peer(end) != Network.NONE && network.joint(end) == 0;
        return uncut
                ? Length.ZERO
                : lay.findEnclosure(row).map(Enclosure::trayGlass).orElse(Length.ZERO);
    }

    private Connector connector(Block block, int entered) {
        Panel panel = records.panels().get(block.owner());
        Enclosure enclosure = records.enclosures().get(panel.enclosure());
        int port = block.number(entered >> 1);
        int termination = network.joint(entered & ~1);
        return new Connector(
                names.port(panel.id(), port),
                panel,
                port,
                enclosure,
                structure(enclosure),
                termination == 0 ? null : records.joints().get(termination));
    }

    /** The end of a path at an end of a piece. */
    PathEnd end(int end) {
        long key = network.keyOf(end);
        boolean bare = network.blockOf(end >> 1).kind() == BlockKind.SECTION && !inEnclosure(key);
        return new PathEnd(key, bare ? names.bare(key) : names.anywhere(key));
    }

    /** Whether the run row of a fiber's end is in an enclosure in service. */
    private boolean inEnclosure(long key) {
        CableLay lay = lay(records.runRows().get(EndKey.owner(key)).cable());
        return lay.findEnclosure(lay.index(EndKey.owner(key))).isPresent();
    }

    /** The front of a port that is perhaps not in the network. */
    PathEnd front(int panel, int port) {
        return new PathEnd(EndKey.of(LegKind.FRONT, panel, port), names.port(panel, port));
    }

    private CableLay lay(int cable) {
        if (lays.size() >= mostLays) {
            lays.clear();
        }
        return lays.computeIfAbsent(cable, id -> CableLay.of(records, id));
    }

    private Structure structure(Enclosure enclosure) {
        return records.structures().get(enclosure.structure());
    }
}
