package spanwright.outage;

import java.math.BigDecimal;
import java.math.RoundingMode;
import java.util.ArrayList;
import java.util.List;
import java.util.Objects;
import org.jspecify.annotations.Nullable;
import spanwright.journal.Change;
import spanwright.journal.RecordKind;
import spanwright.journal.Recorded;
import spanwright.network.SnapshotEditor;
import spanwright.plant.Cable;
import spanwright.plant.CableType;
import spanwright.plant.CableValue;
import spanwright.plant.Enclosure;
import spanwright.plant.EnclosureKind;
import spanwright.plant.FiberRange;
import spanwright.plant.Pass;
import spanwright.plant.PlantState;
import spanwright.plant.RunRow;
import spanwright.plant.SheathMark;
import spanwright.plant.SheathTie;
import spanwright.plant.Trust;
import spanwright.quantity.Length;
import spanwright.records.CableLay;
import spanwright.records.RecordsEditor;
import spanwright.records.Refusal;
import spanwright.records.Relation;
import spanwright.splicing.EndRange;
import spanwright.splicing.Joint;
import spanwright.splicing.JointFacts;
import spanwright.splicing.JointKind;
import spanwright.splicing.Leg;
import spanwright.splicing.LegKind;

/**
 * Lets a piece into a cut cable, as one set of changes: the cable becomes two and the piece, all part of the longer
 * cable; the part toward the start keeps the cable's identity, and marks, flags, enclosures and joints go with their
 * side. One posting's, used once.
 */
public final class Repair {

    private static final int MARK_DIGITS = 4;

    private final SnapshotEditor editor;
    private final RecordsEditor records;
    private final RepairOrder order;
    private final RepairSite site;
    private final List<Refusal> refusals = new ArrayList<>();
    private final int before;

    /** A repair to be entered into a posting. */
    public Repair(SnapshotEditor editor, RepairOrder order) {
        this.editor = editor;
        this.records = editor.records();
        this.order = order;
        this.site = new RepairSite(records, order);
        this.before = editor.changes().size();
    }

    /**
     * What a repair makes.
     *
     * @param parts the codes of the part toward the start, the piece, and the part toward the end
     * @param partOf the longer cable that they are part of
     * @param joints how many joints it makes
     * @param changes how many records it changes
     * @param slackBefore the coils beside the piece before it
     * @param slackAfter the same after it
     * @param coilsRemoved sheath that was coiled on the route that the piece takes
     * @param piece the sheath of the piece
     */
    public record Made(
            List<String> parts,
            String partOf,
            int joints,
            int changes,
            Length slackBefore,
            Length slackAfter,
            Length coilsRemoved,
            Length piece) {}

    private int next(RecordKind kind) {
        return records.newIdentity(kind);
    }

    private void apply(Change change) {
        refusals.addAll(editor.apply(change));
    }

    private <T extends Recorded> T add(T record) {
        apply(Change.add(record));
        return record;
    }

    /** Enters it; empty where the rules allow it. */
    public List<Refusal> enter() {
        if (!site.refusals().isEmpty()) {
            return site.refusals();
        }
        CableLay lay = site.lay();
        Cable old = lay.cable();
        String name = Objects.requireNonNullElse(old.partOf(), old.code());
        List<String> codes = codes(old.code());
        MovedMeasurements measurements = new MovedMeasurements(records, lay, site.second());
        MovedFlags flags = new MovedFlags(records, lay, site.second());
        measurements.remove(this::apply);
        flags.remove(this::apply);
        Cable start = renamed(old, codes.get(0), name);
        Cable piece = add(new Cable(
                next(RecordKind.CABLE),
                codes.get(1),
                site.pieceType().map(CableType::id).orElse(old.cableType()),
                name,
                "white",
                null,
                order.piece().reel(),
                order.on(),
                old.state(),
                null));
        Cable end = add(with(old, next(RecordKind.CABLE), codes.get(2), name));
        List<SheathMark> reckoned = reckonedMarks(lay);
        List<RunRow> endRows = moveEnd(lay, end);
        shorten(lay);
        reckoned.forEach(mark -> apply(Change.add(mark)));
        RunRow startLast = records.runOf(start.id()).get(site.first());
        List<RunRow> pieceRows = layPiece(lay, piece);
        int first = enclosure(order.first(), startLast.structure());
        int second = enclosure(order.second(), endRows.get(0).structure());
        pass(first, startLast);
        pass(first, pieceRows.get(0));
        pass(second, pieceRows.get(pieceRows.size() - 1));
        pass(second, endRows.get(0));
        join(first, startLast.id(), pieceRows.get(0).id(), lay.type());
        join(second, pieceRows.get(pieceRows.size() - 1).id(), endRows.get(0).id(), lay.type());
        flags.enter(start, piece, end, new int[] {first, second}, this::apply);
        measurements.enter(start, end, this::apply);
        return refusals;
    }

    /** The first three free codes that go on from the old one. */
    private List<String> codes(String old) {
        List<String> codes = new ArrayList<>();
        for (int number = 1; codes.size() < 3; number++) {
            String code = old + "-" + number;
            if (records.cables().find(code).isEmpty()) {
                codes.add(code);
            }
        }
        return codes;
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

    /** In two steps: a longer cable may not bear the code of a cable, so the old one gives it up first. */
    private Cable renamed(Cable old, String code, String name) {
        Cable free = with(old, old.id(), code, old.partOf());
        apply(Change.replace(old, free));
        Cable part = with(free, free.id(), code, name);
        if (!part.equals(free)) {
            apply(Change.replace(free, part));
        }
        return part;
    }

    /** Rows from the second on go to the new cable, with their marks, enclosures, joints and states of ends. */
    private List<RunRow> moveEnd(CableLay lay, Cable end) {
        List<RunRow> moved = new ArrayList<>();
        for (int row = site.second(); row < lay.rows().size(); row++) {
            RunRow was = lay.rows().get(row);
            boolean first = row == site.second();
            moved.add(add(new RunRow(
                    next(RecordKind.RUN_ROW),
                    end.id(),
                    row - site.second(),
                    was.structure(),
                    first ? null : was.span(),
                    first ? slackLeft(lay, row) : was.slack(),
                    was.slackTrust(),
                    first && drawn(lay, row) ? order.on() : was.slackOn(),
                    was.duct())));
        }
        MovedEnds ends = new MovedEnds(records, this::apply);
        for (int index = 0; index < moved.size(); index++) {
            RunRow was = lay.rows().get(site.second() + index);
            ends.move(was, moved.get(index), end.id());
        }
        ends.finish();
        ends.giveUp();
        for (int row = site.second(); row < lay.rows().size(); row++) {
            moveMarks(lay, row, moved.get(row - site.second()).id());
        }
        records.cableValues()
                .owned(Relation.CABLE_VALUES, lay.cable().id())
                .toList()
                .forEach(value -> add(new CableValue(
                        next(RecordKind.CABLE_VALUE),
                        end.id(),
                        value.wavelength(),
                        value.groupIndex(),
                        value.lossPerKm(),
                        value.source())));
        return moved;
    }

    private boolean drawn(CableLay lay, int row) {
        return !site.left(row).equals(lay.positions().coil(row));
    }

    private Length slackLeft(CableLay lay, int row) {
        return drawn(lay, row) ? site.left(row) : lay.rows().get(row).slack();
    }

    private void moveMarks(CableLay lay, int row, int to) {
        for (SheathMark mark : marks(lay, row)) {
            apply(Change.remove(mark));
            BigDecimal in = row == site.second() ? cutBack(lay, row, mark.markOut(), mark.markIn()) : mark.markIn();
            addMark(to, mark, in, mark.markOut());
        }
    }

    private List<SheathMark> marks(CableLay lay, int row) {
        return records.sheathMarks()
                .owned(Relation.RUN_ROW_MARKS, lay.rows().get(row).id())
                .toList();
    }

    private void addMark(int row, SheathMark like, @Nullable BigDecimal in, @Nullable BigDecimal out) {
        add(new SheathMark(
                next(RecordKind.SHEATH_MARK), row, like.ink(), like.unit(), in, out, like.readOn(), like.trust()));
    }

    /** The mark where a coil's sheath now ends: as far from the mark that stays as sheath is left. */
    private @Nullable BigDecimal cutBack(
            CableLay lay, int row, @Nullable BigDecimal stays, @Nullable BigDecimal goes) {
        long coil = lay.positions().coil(row).micrometres();
        if (stays == null || goes == null || coil == 0 || !drawn(lay, row)) {
            return goes;
        }
        BigDecimal share = BigDecimal.valueOf(site.left(row).micrometres());
        return stays.add(goes.subtract(stays)
                .multiply(share)
                .divide(BigDecimal.valueOf(coil), MARK_DIGITS, RoundingMode.HALF_EVEN));
    }

    /** The part toward the start loses all rows beyond the first, and what was drawn from its coil. */
    private void shorten(CableLay lay) {
        for (int row = site.second() - 1; row > site.first(); row--) {
            marks(lay, row).forEach(mark -> apply(Change.remove(mark)));
        }
        for (int row = lay.rows().size() - 1; row > site.first(); row--) {
            apply(Change.remove(lay.rows().get(row)));
        }
        int last = site.first();
        for (SheathMark mark : marks(lay, last)) {
            BigDecimal out = cutBack(lay, last, mark.markIn(), mark.markOut());
            SheathMark now = new SheathMark(
                    mark.id(), mark.runRow(), mark.ink(), mark.unit(), mark.markIn(), out, mark.readOn(), mark.trust());
            if (!now.equals(mark)) {
                apply(Change.replace(mark, now));
            }
        }
        RunRow row = lay.rows().get(last);
        if (drawn(lay, last)) {
            apply(Change.replace(
                    row,
                    new RunRow(
                            row.id(),
                            row.cable(),
                            row.seq(),
                            row.structure(),
                            row.span(),
                            site.left(last),
                            row.slackTrust(),
                            order.on(),
                            row.duct())));
        }
    }

    /**
     * Where marks on both sides of the cut share the sheath out, and the first row has none, the print there is
     * reckoned, so that the part that stays keeps its length; it is a reckoned mark, and of unknown trust.
     */
    private List<SheathMark> reckonedMarks(CableLay lay) {
        int last = site.first();
        Length out = lay.positions().out(last);
        boolean tied = lay.positions().ties().stream().anyMatch(tie -> tie.row() == last);
        var tie = lay.positions().findTieBefore(out);
        boolean shared = tie.isPresent() && lay.positions().findTieAfter(out).isPresent();
        if (tied || !shared || !marks(lay, last).isEmpty()) {
            return List.of();
        }
        SheathTie before = tie.get();
        return lay.positions()
                .findMark(out.minus(lay.positions().coil(last)).plus(site.left(last)))
                .map(print -> new SheathMark(
                        next(RecordKind.SHEATH_MARK),
                        lay.rows().get(last).id(),
                        lay.cable().marksInk(),
                        before.unit(),
                        null,
                        BigDecimal.valueOf(print.along().micrometres())
                                .divide(
                                        BigDecimal.valueOf(before.unit().micrometres()),
                                        MARK_DIGITS,
                                        RoundingMode.HALF_EVEN),
                        null,
                        Trust.UNKNOWN))
                .stream()
                .toList();
    }

    private List<RunRow> layPiece(CableLay lay, Cable piece) {
        List<RunRow> rows = new ArrayList<>();
        Length rest = pieceLength().minus(site.route());
        for (int row = site.first(); row <= site.second(); row++) {
            RunRow like = lay.rows().get(row);
            rows.add(add(new RunRow(
                    next(RecordKind.RUN_ROW),
                    piece.id(),
                    row - site.first(),
                    like.structure(),
                    row == site.first() ? null : like.span(),
                    row == site.second() ? rest : Length.ZERO,
                    Trust.REPORTED,
                    order.on(),
                    like.duct())));
        }
        return rows;
    }

    private Length pieceLength() {
        return Objects.requireNonNullElse(order.piece().length(), site.route());
    }

    private int enclosure(RepairOrder.Place place, int structure) {
        return records.enclosures().find(place.enclosure()).map(Enclosure::id).orElseGet(() -> add(new Enclosure(
                        next(RecordKind.ENCLOSURE),
                        place.enclosure(),
                        structure,
                        EnclosureKind.CLOSURE,
                        place.trayGlass(),
                        PlantState.IN_SERVICE,
                        null))
                .id());
    }

    private void pass(int enclosure, RunRow row) {
        add(new Pass(next(RecordKind.PASS), enclosure, row.cable(), row.id(), List.of(), List.of()));
    }

    /** Straight, a tube a row. */
    private void join(int enclosure, int backOf, int aheadOf, CableType type) {
        for (int fiber = 1; fiber <= type.fibers(); fiber += type.fibersPerTube()) {
            FiberRange tube = new FiberRange(fiber, Math.min(type.fibers(), fiber + type.fibersPerTube() - 1));
            add(new Joint(
                    next(RecordKind.JOINT),
                    JointKind.SPLICE,
                    enclosure,
                    new EndRange(new Leg(LegKind.BACK, backOf), tube),
                    new EndRange(new Leg(LegKind.AHEAD, aheadOf), tube),
                    new JointFacts(
                            null,
                            order.method(),
                            null,
                            Trust.REPORTED,
                            null,
                            order.on(),
                            order.by(),
                            order.temporaryUntil(),
                            order.job(),
                            null)));
        }
    }

    /** What it made; once entered. */
    public Made made() {
        CableLay lay = site.lay();
        Length slackBefore =
                lay.positions().coil(site.first()).plus(lay.positions().coil(site.second()));
        Length removed = Length.ZERO;
        for (int row = site.first() + 1; row < site.second(); row++) {
            removed = removed.plus(lay.positions().coil(row));
        }
        Cable start = records.cables().get(lay.cable().id());
        List<String> parts = editor.changes().subList(before, editor.changes().size()).stream()
                .filter(change -> change.before() == null && change.after() instanceof Cable)
                .map(change -> ((Cable) Objects.requireNonNull(change.after())).code())
                .toList();
        return new Made(
                List.of(start.code(), parts.get(0), parts.get(1)),
                Objects.requireNonNullElse(start.partOf(), ""),
                2 * lay.type().fibers(),
                editor.changes().size() - before,
                slackBefore,
                site.left(site.first()).plus(site.left(site.second())),
                removed,
                pieceLength());
    }
}
