package spanwright.repair;

import java.util.ArrayList;
import java.util.List;
import java.util.Objects;
import java.util.Optional;
import org.jspecify.annotations.Nullable;
import spanwright.journal.Change;
import spanwright.journal.RecordKind;
import spanwright.network.Snapshot;
import spanwright.network.SnapshotEditor;
import spanwright.outage.Cut;
import spanwright.outage.Impact;
import spanwright.plant.Cable;
import spanwright.plant.CableType;
import spanwright.plant.CableValue;
import spanwright.plant.RunRow;
import spanwright.plant.SheathMark;
import spanwright.quantity.Length;
import spanwright.records.CableLay;
import spanwright.records.RecordsEditor;
import spanwright.records.Refusal;
import spanwright.records.Relation;

/**
 * Lets a piece into a cut cable, as one set of changes: the cable becomes two and the piece, all part of the longer
 * cable; the part toward the start keeps the cable's identity, and marks, flags, enclosures and joints go with their
 * side. One posting's, used once.
 */
final class Repair {

    private final RepairEntry entry;
    private final RecordsEditor records;
    private final RepairOrder order;
    private final RepairSite site;
    private List<String> parts = List.of();
    private List<String> leftInJournal = List.of();

    /** A repair to be entered into a posting. */
    Repair(SnapshotEditor editor, RepairOrder order) {
        this.entry = new RepairEntry(editor);
        this.records = editor.records();
        this.order = order;
        this.site = new RepairSite(records, order);
    }

    /** Enters it; empty where the rules allow it. */
    List<Refusal> enter() {
        if (site.refusals().isEmpty()) {
            enterParts(site.lay());
            return entry.refusals();
        }
        return site.refusals();
    }

    private void enterParts(CableLay lay) {
        parts = codes(lay.cable().code());
        MovedMeasurements measurements = new MovedMeasurements(records, lay, site.second());
        MovedFlags flags = new MovedFlags(records, lay, site.second());
        measurements.remove(entry::apply);
        leftInJournal = measurements.left();
        flags.remove(entry::apply);
        Cable start = renamed(lay.cable());
        Cable piece = entry.add(piece(lay.cable()));
        Cable end = entry.add(with(lay.cable(), entry.next(RecordKind.CABLE), parts.get(2), partOf()));
        RepairMarks marks = new RepairMarks(entry, site);
        RepairRuns runs = new RepairRuns(entry, order, site, marks);
        Optional<SheathMark> reckoned = marks.reckoned();
        List<RunRow> endRows = runs.moveEnd(end);
        copyValues(lay.cable(), end);
        RunRow startLast = runs.shorten();
        reckoned.ifPresent(entry::add);
        List<RunRow> pieceRows = runs.layPiece(piece);
        RepairJoints joints = new RepairJoints(entry, order, lay.type());
        int first = joints.join(order.first(), startLast, pieceRows.get(0));
        int second = joints.join(order.second(), pieceRows.get(pieceRows.size() - 1), endRows.get(0));
        flags.enter(start, piece, end, new int[] {first, second}, entry::apply);
        measurements.enter(start, end, entry::apply);
    }

    private String partOf() {
        Cable old = site.lay().cable();
        return Objects.requireNonNullElse(old.partOf(), old.code());
    }

    /** The codes of the three: that of the piece as ordered, else, as the others, the next free that goes on. */
    private List<String> codes(String old) {
        String asked = order.piece().cable();
        List<String> free = new ArrayList<>();
        for (int number = 1; free.size() < 3; number++) {
            String code = old + "-" + number;
            if (records.cables().find(code).isEmpty() && !code.equals(asked)) {
                free.add(code);
            }
        }
        return asked == null ? free : List.of(free.get(0), asked, free.get(1));
    }

    private static Cable with(Cable old, int id, String code, @Nullable String partOf) {
        return new Cable(
                id,
                code,
                old.cableType(),
                partOf,
                old.marksInk(),
                old.overlengthPct(),
                old.reel(),
                old.installedOn(),
                old.state(),
                old.note());
    }

    private Cable piece(Cable old) {
        return new Cable(
                entry.next(RecordKind.CABLE),
                parts.get(1),
                site.pieceType().map(CableType::id).orElse(old.cableType()),
                partOf(),
                "white",
                null,
                order.piece().reel(),
                order.on(),
                old.state(),
                null);
    }

    /** In two steps: a longer cable may not bear the code of a cable, so the old one gives it up first. */
    private Cable renamed(Cable old) {
        Cable free = with(old, old.id(), parts.get(0), old.partOf());
        entry.apply(Change.replace(old, free));
        Cable part = with(free, free.id(), free.code(), partOf());
        if (!part.equals(free)) {
            entry.apply(Change.replace(free, part));
        }
        return part;
    }

    private void copyValues(Cable from, Cable to) {
        records.cableValues()
                .owned(Relation.CABLE_VALUES, from.id())
                .toList()
                .forEach(value -> entry.add(new CableValue(
                        entry.next(RecordKind.CABLE_VALUE),
                        to.id(),
                        value.wavelength(),
                        value.groupIndex(),
                        value.lossPerKm(),
                        value.source())));
    }

    /**
     * What it made; once entered.
     *
     * @param before the plant before it
     */
    RepairMade made(Snapshot before) {
        CableLay lay = site.lay();
        Length removed = Length.ZERO;
        for (int row = site.first() + 1; row < site.second(); row++) {
            removed = removed.plus(lay.positions().coil(row));
        }
        return new RepairMade(
                parts,
                partOf(),
                lay.type().fibers(),
                List.of(seam(order.first(), site.first(), 0), seam(order.second(), site.second(), 1)),
                entry.changes(),
                site.pieceLength(),
                site.route(),
                removed,
                hit(before),
                leftInJournal);
    }

    private List<String> hit(Snapshot before) {
        int cable = site.lay().cable().id();
        return Impact.of(before, List.of(new Cut.AtPlace(cable, site.cut()))).circuits().stream()
                .map(hit -> hit.circuit().code())
                .toList();
    }

    private RepairMade.Seam seam(RepairOrder.Place place, int row, int back) {
        return new RepairMade.Seam(
                place.enclosure(),
                place.structure(),
                parts.get(back),
                parts.get(back + 1),
                site.lay().positions().coil(row),
                site.left(row));
    }
}
