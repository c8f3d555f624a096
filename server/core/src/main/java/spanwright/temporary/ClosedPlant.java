package spanwright.temporary;

import java.util.BitSet;
import java.util.Collection;
import java.util.HashSet;
import java.util.Set;
import java.util.function.IntUnaryOperator;
import java.util.stream.Stream;
import spanwright.network.Block;
import spanwright.network.BlockKind;
import spanwright.network.Network;
import spanwright.network.Snapshot;
import spanwright.outage.Cut;
import spanwright.outage.CutGlass;
import spanwright.plant.RunRow;
import spanwright.records.Records;
import spanwright.records.Relation;

/** Plant that a temporary path keeps away from, gathered place by place. One thread's. */
public final class ClosedPlant {

    private final Snapshot snapshot;
    private final Records records;
    private final Network network;
    private final BitSet pieces = new BitSet();
    private final BitSet enclosures = new BitSet();

    /** Nothing is closed yet. */
    public ClosedPlant(Snapshot snapshot) {
        this.snapshot = snapshot;
        this.records = snapshot.records();
        this.network = snapshot.network();
    }

    /** A copy to add to. */
    ClosedPlant copy() {
        ClosedPlant copy = new ClosedPlant(snapshot);
        copy.pieces.or(pieces);
        copy.enclosures.or(enclosures);
        return copy;
    }

    /** Closes what cuts take: their glass, and the enclosures that they open. */
    public void cut(Collection<Cut> cuts) {
        CutGlass glass = new CutGlass(snapshot, cuts);
        glass.sections()
                .forEach(cut ->
                        cut.fibers().forEach(fiber -> pieces.set(cut.section().piece(fiber))));
        glass.enclosures().forEach(this::enclosure);
    }

    /** Closes an enclosure: nothing in it is crossed or joined, and no port of it used. */
    private void enclosure(int enclosure) {
        enclosures.set(enclosure);
        records.panels()
                .owned(Relation.ENCLOSURE_PANELS, enclosure)
                .flatMap(panel -> network.panelBlock(panel.id()).stream())
                .forEach(block -> pieces.set(block.firstPiece(), block.firstPiece() + block.count()));
    }

    /** Closes one piece of glass. */
    void piece(int piece) {
        pieces.set(piece);
    }

    private int seq(int runRow) {
        return records.runRows().get(runRow).seq();
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
        Stream<Cut> sites = structures.stream()
                .filter(structure -> !but.contains(structure))
                .map(Cut.OfStructure::new);
        cut(Stream.concat(spans.stream().map(Cut.OfSpan::new), sites).toList());
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
