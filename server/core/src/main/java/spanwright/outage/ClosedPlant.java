package spanwright.outage;

import java.util.BitSet;
import java.util.HashSet;
import java.util.Set;
import java.util.function.IntUnaryOperator;
import spanwright.network.Block;
import spanwright.network.BlockKind;
import spanwright.network.Network;
import spanwright.network.Snapshot;
import spanwright.plant.Enclosure;
import spanwright.plant.RunRow;
import spanwright.records.Records;
import spanwright.records.Relation;

/** Plant that a temporary path keeps away from, gathered place by place. One thread's. */
public final class ClosedPlant {

    private final Records records;
    private final Network network;
    private final BitSet pieces = new BitSet();
    private final BitSet enclosures = new BitSet();

    /** Nothing is closed yet. */
    public ClosedPlant(Snapshot snapshot) {
        this.records = snapshot.records();
        this.network = snapshot.network();
    }

    /** A copy to add to. */
    ClosedPlant copy(Snapshot snapshot) {
        ClosedPlant copy = new ClosedPlant(snapshot);
        copy.pieces.or(pieces);
        copy.enclosures.or(enclosures);
        return copy;
    }

    /** Closes every section that lies on a span. */
    public void span(int span) {
        records.runRows().owned(Relation.SPAN_RUN_ROWS, span).forEach(row -> sections(row, false));
    }

    /** Closes every section that passes, begins or ends at a structure, and what is there. */
    public void structure(int structure) {
        records.runRows().owned(Relation.STRUCTURE_RUN_ROWS, structure).forEach(row -> sections(row, true));
        records.enclosures().owned(Relation.STRUCTURE_ENCLOSURES, structure).forEach(this::enclosure);
    }

    /** Closes an enclosure: nothing in it is crossed or joined, and no port of it used. */
    public void enclosure(Enclosure enclosure) {
        enclosures.set(enclosure.id());
        records.panels()
                .owned(Relation.ENCLOSURE_PANELS, enclosure.id())
                .flatMap(panel -> network.panelBlock(panel.id()).stream())
                .forEach(this::block);
    }

    /** Closes a cable from end to end. */
    public void cable(int cable) {
        network.sectionsOf(cable).forEach(this::block);
    }

    /** Closes one piece of glass. */
    public void piece(int piece) {
        pieces.set(piece);
    }

    private void sections(RunRow row, boolean touching) {
        for (Block section : network.sectionsOf(row.cable())) {
            int from = seq(section.fromRow());
            int to = seq(section.toRow());
            if (row.seq() <= to && (row.seq() > from || (touching && row.seq() == from))) {
                block(section);
            }
        }
    }

    private int seq(int runRow) {
        return records.runRows().get(runRow).seq();
    }

    private void block(Block block) {
        pieces.set(block.firstPiece(), block.firstPiece() + block.count());
    }

    /** Closes all that lies along a glass path: its spans, its structures but for some, its enclosures there. */
    void along(DarkLine line, Set<Integer> but) {
        Set<Integer> spans = new HashSet<>();
        Set<Integer> structures = new HashSet<>();
        for (int piece : line.pieces(network)) {
            Block block = network.blockOf(piece);
            if (block.kind() == BlockKind.SECTION) {
                travelled(block, spans, structures);
            }
        }
        spans.forEach(this::span);
        structures.stream().filter(structure -> !but.contains(structure)).forEach(this::structure);
    }

    private void travelled(Block section, Set<Integer> spans, Set<Integer> structures) {
        int from = seq(section.fromRow());
        int to = seq(section.toRow());
        for (RunRow row : records.runOf(section.owner())) {
            if (row.seq() >= from && row.seq() <= to) {
                structures.add(row.structure());
                Integer span = row.span();
                if (row.seq() > from && span != null) {
                    spans.add(span);
                }
            }
        }
    }

    /** Whether a glass path is hit: a piece of it is closed, or a joint of it lies in a closed enclosure. */
    boolean hits(DarkLine line, IntUnaryOperator enclosureOf) {
        for (int end : network.paths().ends(line.path())) {
            if (pieces.get(end >> 1)
                    || enclosures.get(enclosureOf.applyAsInt(end))
                    || enclosures.get(enclosureOf.applyAsInt(end ^ 1))) {
                return true;
            }
        }
        return false;
    }

    BitSet pieces() {
        return pieces;
    }

    BitSet enclosures() {
        return enclosures;
    }
}
