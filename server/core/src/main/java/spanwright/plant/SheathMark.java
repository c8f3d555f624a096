package spanwright.plant;

import java.math.BigDecimal;
import java.time.LocalDate;
import org.jspecify.annotations.Nullable;
import spanwright.journal.RecordKind;
import spanwright.journal.Recorded;
import spanwright.quantity.LengthUnit;

/**
 * The printed marks read where a sheath comes to and leaves one run row.
 *
 * @param id lasting identity
 * @param runRow identity of the run row
 * @param ink which set of marks
 * @param unit the unit of the numbers
 * @param markIn the number where the sheath arrives, or null
 * @param markOut the number where it leaves, or null
 * @param readOn when read, or null
 * @param trust how sure
 */
public record SheathMark(
        int id,
        int runRow,
        String ink,
        LengthUnit unit,
        @Nullable BigDecimal markIn,
        @Nullable BigDecimal markOut,
        @Nullable LocalDate readOn,
        Trust trust)
        implements Recorded {

    /** One number has one form, so that 100.0 and 100 make equal records. */
    public SheathMark {
        markIn = shortest(markIn);
        markOut = shortest(markOut);
    }

    private static @Nullable BigDecimal shortest(@Nullable BigDecimal mark) {
        if (mark == null) {
            return null;
        }
        BigDecimal shortest = mark.stripTrailingZeros();
        return shortest.scale() < 0 ? shortest.setScale(0) : shortest;
    }

    @Override
    public RecordKind kind() {
        return RecordKind.SHEATH_MARK;
    }
}
