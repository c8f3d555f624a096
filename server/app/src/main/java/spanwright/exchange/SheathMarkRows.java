package spanwright.exchange;

import java.math.BigDecimal;
import java.time.LocalDate;
import java.util.Objects;
import org.jspecify.annotations.Nullable;
import spanwright.journal.RecordKind;
import spanwright.plant.SheathMark;
import spanwright.plant.Trust;
import spanwright.quantity.LengthUnit;

/** Rows of {@code sheath_marks.csv}. */
final class SheathMarkRows extends Rows<SheathMark> {

    private static final int CABLE = Table.SHEATH_MARKS.column("cable");
    private static final int SEQ = Table.SHEATH_MARKS.column("seq");
    private static final int INK = Table.SHEATH_MARKS.column("ink");
    private static final int UNIT = Table.SHEATH_MARKS.column("unit");
    private static final int MARK_IN = Table.SHEATH_MARKS.column("mark_in");
    private static final int MARK_OUT = Table.SHEATH_MARKS.column("mark_out");
    private static final int READ_ON = Table.SHEATH_MARKS.column("read_on");
    private static final int TRUST = Table.SHEATH_MARKS.column("trust");
    private static final BigDecimal MOST_MARK = BigDecimal.valueOf(100_000_000);

    SheathMarkRows(References refs) {
        super(Table.SHEATH_MARKS, RecordKind.SHEATH_MARK, refs);
    }

    @Override
    @Nullable
    SheathMark read(Row row, int id) {
        int runRow = Runs.row(refs, row, CABLE, SEQ);
        String ink = row.free(INK);
        LengthUnit unit = row.word(UNIT, LengthUnit.values(), LengthUnit::symbol);
        BigDecimal in = mark(row, MARK_IN);
        BigDecimal out = mark(row, MARK_OUT);
        LocalDate readOn = row.date(READ_ON, refs.zone());
        Trust trust = row.word(TRUST, Trust.values(), Trust::word);
        if (runRow == 0 || unit == null) {
            return null;
        }
        return new SheathMark(
                id,
                runRow,
                Objects.requireNonNullElse(ink, CableRows.INK),
                unit,
                in,
                out,
                readOn,
                Objects.requireNonNullElse(trust, Trust.POSTED));
    }

    private static @Nullable BigDecimal mark(Row row, int column) {
        BigDecimal mark = row.decimal(column, BigDecimal.ZERO, MOST_MARK, "a printed mark is 0 to 100000000");
        // One number has one form, so that 100.0 and 100 are equal records.
        return mark == null ? null : Decimals.shortest(mark);
    }

    @Override
    void write(SheathMark mark, Cells cells) {
        cells.put(CABLE, refs.cableAt(mark.runRow()));
        cells.put(SEQ, refs.seq(mark.runRow()));
        cells.put(INK, mark.ink());
        cells.put(UNIT, mark.unit().symbol());
        cells.put(MARK_IN, mark.markIn());
        cells.put(MARK_OUT, mark.markOut());
        cells.put(READ_ON, mark.readOn());
        cells.put(TRUST, mark.trust().word());
    }
}
