package spanwright.sheet;

import java.math.BigDecimal;
import java.util.List;
import java.util.Objects;
import org.jspecify.annotations.Nullable;
import spanwright.journal.Change;
import spanwright.journal.RecordKind;
import spanwright.plant.RunRow;
import spanwright.plant.SheathMark;
import spanwright.plant.Trust;
import spanwright.quantity.LengthUnit;
import spanwright.records.RecordsEditor;
import spanwright.records.Relation;
import spanwright.splicing.LegKind;

/** Enters what is said of cables themselves: sheath marks read, sheath coiled. */
final class CableEntry {

    private final SheetEntry sheet;
    private final SheetHeader header;

    CableEntry(SheetEntry sheet, SheetHeader header) {
        this.sheet = sheet;
        this.header = header;
    }

    void enter(List<Statement> statements) {
        for (Statement statement : statements) {
            if (statement instanceof Statement.LegSeen seen && seen.mark() != null && seen.unit() != null) {
                mark(seen, seen.mark(), seen.unit());
            } else if (statement instanceof Statement.Coiled coiled) {
                coil(coiled);
            }
        }
    }

    private RecordsEditor records() {
        return sheet.editor().records();
    }

    private void mark(Statement.LegSeen seen, BigDecimal number, LengthUnit unit) {
        CableLeg leg = seen.leg();
        boolean in = leg.leg().kind() == LegKind.BACK;
        SheathMark before = records()
                .sheathMarks()
                .owned(Relation.RUN_ROW_MARKS, leg.row().id())
                .filter(mark -> mark.ink().equals(leg.cable().marksInk()))
                .findFirst()
                .orElse(null);
        SheathMark after = new SheathMark(
                before == null ? records().newIdentity(RecordKind.SHEATH_MARK) : before.id(),
                leg.row().id(),
                leg.cable().marksInk(),
                unit,
                in ? number : kept(before, true),
                in ? kept(before, false) : number,
                header.splicedOn() != null || before == null ? header.splicedOn() : before.readOn(),
                Trust.POSTED);
        if (before == null) {
            sheet.apply(seen.place(), Change.add(after));
        } else if (!sameNumbers(before, after)) {
            sheet.apply(seen.place(), Change.replace(before, after));
        }
    }

    private static @Nullable BigDecimal kept(@Nullable SheathMark before, boolean in) {
        if (before == null) {
            return null;
        }
        return in ? before.markIn() : before.markOut();
    }

    private static boolean sameNumbers(SheathMark one, SheathMark other) {
        return one.unit() == other.unit()
                && Objects.equals(written(one.markIn()), written(other.markIn()))
                && Objects.equals(written(one.markOut()), written(other.markOut()));
    }

    private static @Nullable String written(@Nullable BigDecimal mark) {
        return mark == null ? null : mark.toPlainString();
    }

    private void coil(Statement.Coiled coiled) {
        RunRow before = records().runRows().get(coiled.leg().row().id());
        if (!before.slack().equals(coiled.left())) {
            RunRow after = new RunRow(
                    before.id(),
                    before.cable(),
                    before.seq(),
                    before.structure(),
                    before.span(),
                    coiled.left(),
                    Trust.POSTED,
                    header.splicedOn() == null ? before.slackOn() : header.splicedOn(),
                    before.duct());
            sheet.apply(coiled.place(), Change.replace(before, after));
        }
    }
}
