package spanwright.outage;

import java.util.BitSet;
import java.util.Collection;
import java.util.Comparator;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.TreeMap;
import java.util.TreeSet;
import java.util.function.IntConsumer;
import java.util.function.Predicate;
import spanwright.network.Block;
import spanwright.network.Network;
import spanwright.network.Snapshot;
import spanwright.plant.CableType;
import spanwright.plant.PlantState;
import spanwright.plant.SheathPositions;
import spanwright.quantity.Length;
import spanwright.records.CableLay;
import spanwright.records.Records;
import spanwright.records.Relation;

/** The glass that cuts take: fibers of cable sections, and all that lies in enclosures. Only what is in service. */
public final class CutGlass {

    private final Records records;
    private final Network network;
    /** The fibers cut of each section, bit 0 for fiber 1. */
    private final Map<Block, BitSet> sections = new LinkedHashMap<>();

    private final Map<Integer, BitSet> cables = new TreeMap<>();
    private final Set<Integer> enclosures = new TreeSet<>();
    private final PieceRanges glass;
    private final PieceRanges atFirst;
    private final PieceRanges atSecond;

    public CutGlass(Snapshot snapshot, Collection<Cut> cuts) {
        records = snapshot.records();
        network = snapshot.network();
        cuts.forEach(this::cut);
        glass = glass();
        PieceRanges.Builder first = new PieceRanges.Builder();
        PieceRanges.Builder second = new PieceRanges.Builder();
        enclosures.forEach(enclosure -> gather(enclosure, first, second));
        atFirst = first.build();
        atSecond = second.build();
    }

    private void cut(Cut cut) {
        if (cut instanceof Cut.OfSpan of) {
            records.runRows()
                    .owned(Relation.SPAN_RUN_ROWS, of.span())
                    .forEach(row ->
                            whole(row.cable(), section -> from(section) < row.seq() && to(section) >= row.seq()));
        } else if (cut instanceof Cut.OfStructure of) {
            records.runRows()
                    .owned(Relation.STRUCTURE_RUN_ROWS, of.structure())
                    .forEach(row ->
                            whole(row.cable(), section -> from(section) <= row.seq() && to(section) >= row.seq()));
            records.enclosures()
                    .owned(Relation.STRUCTURE_ENCLOSURES, of.structure())
                    .forEach(enclosure -> open(enclosure.id()));
        } else if (cut instanceof Cut.OfCable of) {
            whole(of.cable(), section -> true);
        } else if (cut instanceof Cut.OfTube of) {
            tube(of.cable(), of.tube());
        } else if (cut instanceof Cut.OfEnclosure of) {
            open(of.enclosure());
        } else if (cut instanceof Cut.AtPlace at) {
            place(at.cable(), at.position());
        }
    }

    private int from(Block section) {
        return records.runRows().get(section.fromRow()).seq();
    }

    private int to(Block section) {
        return records.runRows().get(section.toRow()).seq();
    }

    private void whole(int cable, Predicate<Block> which) {
        network.sectionsOf(cable).stream().filter(which).forEach(section -> take(section, 1, section.count()));
    }

    private void tube(int cable, int tube) {
        CableType type = records.cableTypes().get(records.cables().get(cable).cableType());
        int first = (tube - 1) * type.fibersPerTube() + 1;
        int last = Math.min(tube * type.fibersPerTube(), type.fibers());
        network.sectionsOf(cable).forEach(section -> take(section, first, last));
    }

    private void place(int cable, Length position) {
        CableLay lay = CableLay.of(records, cable);
        SheathPositions positions = lay.positions();
        whole(
                cable,
                section -> positions.enclosure(lay.index(section.fromRow())).compareTo(position) <= 0
                        && positions.enclosure(lay.index(section.toRow())).compareTo(position) >= 0);
    }

    private void take(Block section, int firstFiber, int lastFiber) {
        sections.computeIfAbsent(section, key -> new BitSet()).set(firstFiber - 1, lastFiber);
        cables.computeIfAbsent(section.owner(), key -> new BitSet()).set(firstFiber - 1, lastFiber);
    }

    private void open(int enclosure) {
        if (records.enclosures().get(enclosure).state() == PlantState.IN_SERVICE) {
            enclosures.add(enclosure);
        }
    }

    private PieceRanges glass() {
        PieceRanges.Builder ranges = new PieceRanges.Builder();
        sections.forEach((section, fibers) -> {
            int from = fibers.nextSetBit(0);
            while (from >= 0) {
                int to = fibers.nextClearBit(from);
                ranges.add(section.firstPiece() + from, to - from, section.owner());
                from = fibers.nextSetBit(to);
            }
        });
        return ranges.build();
    }

    private void gather(int enclosure, PieceRanges.Builder first, PieceRanges.Builder second) {
        records.passes().owned(Relation.ENCLOSURE_PASSES, enclosure).forEach(pass -> {
            network.sectionAhead(pass.runRow()).ifPresent(block -> add(first, block, enclosure));
            network.sectionBack(pass.runRow()).ifPresent(block -> add(second, block, enclosure));
        });
        records.panels()
                .owned(Relation.ENCLOSURE_PANELS, enclosure)
                .flatMap(panel -> network.panelBlock(panel.id()).stream())
                .forEach(block -> addBoth(first, second, block, enclosure));
        records.splitters()
                .owned(Relation.ENCLOSURE_SPLITTERS, enclosure)
                .flatMap(splitter -> network.splitterBlock(splitter.id()).stream())
                .forEach(block -> addBoth(first, second, block, enclosure));
    }

    private static void add(PieceRanges.Builder ranges, Block block, int enclosure) {
        ranges.add(block.firstPiece(), block.count(), enclosure);
    }

    private static void addBoth(PieceRanges.Builder first, PieceRanges.Builder second, Block block, int enclosure) {
        add(first, block, enclosure);
        add(second, block, enclosure);
    }

    /** The cable by which a piece is glass that is cut; 0 where it is not. */
    int cableAt(int piece) {
        return glass.find(piece);
    }

    /** The cut enclosure in which an end lies; 0 where it lies in none. */
    int enclosureAt(int end) {
        return ((end & 1) == 0 ? atFirst : atSecond).find(end >> 1);
    }

    /** The glass paths that the cuts meet, each once, rising. */
    int[] paths() {
        IntGathering met = new IntGathering();
        IntConsumer meet = piece -> met.add(network.paths().pathOf(piece));
        glass.forEach(meet);
        atFirst.forEach(meet);
        atSecond.forEach(meet);
        return met.distinct();
    }

    /** How many fibers are cut, lit or dark, each of a cable once. */
    int fibers() {
        return cables.values().stream().mapToInt(BitSet::cardinality).sum();
    }

    /** The enclosures that are cut open. */
    public Set<Integer> enclosures() {
        return Set.copyOf(enclosures);
    }

    /** The cut sections by cable and along it. */
    public List<CutSection> sections() {
        return sections.entrySet().stream()
                .map(entry -> new CutSection(entry.getKey(), entry.getValue()))
                .sorted(Comparator.<CutSection, String>comparing(
                                each -> records.cables()
                                        .get(each.section().owner())
                                        .code(),
                                CodeOrder.BY_CODE_POINT)
                        .thenComparingInt(each -> from(each.section())))
                .toList();
    }
}
