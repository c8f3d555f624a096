package spanwright.repair;

import java.math.BigDecimal;
import java.math.RoundingMode;
import java.util.List;
import java.util.Optional;
import org.jspecify.annotations.Nullable;
import spanwright.journal.Change;
import spanwright.journal.RecordKind;
import spanwright.plant.RunRow;
import spanwright.plant.SheathMark;
import spanwright.plant.SheathTie;
import spanwright.plant.Trust;
import spanwright.quantity.Length;
import spanwright.records.CableLay;
import spanwright.records.Relation;

/** The sheath marks of a cable that is cut: they stay where they are printed, on the part that has them. */
final class RepairMarks {

    private static final int MARK_DIGITS = 4;

    private final RepairEntry entry;
    private final RepairSite site;
    private final CableLay lay;

    RepairMarks(RepairEntry entry, RepairSite site) {
        this.entry = entry;
        this.site = site;
        this.lay = site.lay();
    }

    /** The marks of a row go to a row of the part toward the end. */
    void move(int row, RunRow to) {
        for (SheathMark mark : marks(row)) {
            entry.apply(Change.remove(mark));
            BigDecimal in = row == site.second() ? cutBack(row, mark.markOut(), mark.markIn()) : mark.markIn();
            entry.add(with(mark, entry.next(RecordKind.SHEATH_MARK), to.id(), in, mark.markOut()));
        }
    }

    /** The marks of a row that no part has any more. */
    void remove(int row) {
        marks(row).forEach(mark -> entry.apply(Change.remove(mark)));
    }

    /** The part toward the start ends in what is left of its last coil. */
    void shorten() {
        int last = site.first();
        for (SheathMark mark : marks(last)) {
            BigDecimal out = cutBack(last, mark.markIn(), mark.markOut());
            SheathMark now = with(mark, mark.id(), mark.runRow(), mark.markIn(), out);
            if (!now.equals(mark)) {
                entry.apply(Change.replace(mark, now));
            }
        }
    }

    private List<SheathMark> marks(int row) {
        return entry.records()
                .sheathMarks()
                .owned(Relation.RUN_ROW_MARKS, lay.rows().get(row).id())
                .toList();
    }

    private static SheathMark with(
            SheathMark like, int id, int row, @Nullable BigDecimal in, @Nullable BigDecimal out) {
        return new SheathMark(id, row, like.ink(), like.unit(), in, out, like.readOn(), like.trust());
    }

    /** The mark where a coil's sheath now ends: as far from the mark that stays as sheath is left. */
    private @Nullable BigDecimal cutBack(int row, @Nullable BigDecimal stays, @Nullable BigDecimal goes) {
        long coil = lay.positions().coil(row).micrometres();
        if (stays == null || goes == null || coil == 0 || !site.drawn(row)) {
            return goes;
        }
        BigDecimal left = BigDecimal.valueOf(site.left(row).micrometres());
        return stays.add(goes.subtract(stays)
                .multiply(left)
                .divide(BigDecimal.valueOf(coil), MARK_DIGITS, RoundingMode.HALF_EVEN));
    }

    /**
     * Where marks on both sides of the cut share the sheath out, and the first row has none, the print there is
     * reckoned, so that the part that stays keeps its length; it is a reckoned mark, and of unknown trust. To be asked
     * before anything is entered, and entered once the part toward the start is shortened.
     */
    Optional<SheathMark> reckoned() {
        int last = site.first();
        Length out = lay.positions().out(last);
        boolean tied = lay.positions().ties().stream().anyMatch(tie -> tie.row() == last);
        Optional<SheathTie> before = lay.positions().findTieBefore(out);
        boolean shared = before.isPresent() && lay.positions().findTieAfter(out).isPresent();
        if (tied || !shared || !marks(last).isEmpty()) {
            return Optional.empty();
        }
        long unit = before.get().unit().micrometres();
        return lay.positions()
                .findMark(out.minus(lay.positions().coil(last)).plus(site.left(last)))
                .map(print -> new SheathMark(
                        entry.next(RecordKind.SHEATH_MARK),
                        lay.rows().get(last).id(),
                        lay.cable().marksInk(),
                        before.get().unit(),
                        null,
                        BigDecimal.valueOf(print.along().micrometres())
                                .divide(BigDecimal.valueOf(unit), MARK_DIGITS, RoundingMode.HALF_EVEN),
                        null,
                        Trust.UNKNOWN));
    }
}
