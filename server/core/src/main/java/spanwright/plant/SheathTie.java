package spanwright.plant;

import java.math.BigDecimal;
import java.time.LocalDate;
import org.jspecify.annotations.Nullable;
import spanwright.quantity.Length;
import spanwright.quantity.LengthUnit;

/**
 * A printed mark read at one side of a run row: it ties that position to the print on the sheath.
 *
 * @param row index of the run row, from 0
 * @param out true where the sheath leaves for the next row, false where it arrives
 * @param number the number printed
 * @param unit its unit
 * @param readOn when it was read, or null
 */
public record SheathTie(
        int row,
        boolean out,
        BigDecimal number,
        LengthUnit unit,
        @Nullable LocalDate readOn) {

    /** How far along the print the mark stands; a foot is 0.3048 m exactly. */
    public Length mark() {
        return Length.of(number, unit);
    }

    /** Its place among the positions of the run: the in of row k is 2k, its out 2k + 1. */
    int index() {
        return 2 * row + (out ? 1 : 0);
    }
}
