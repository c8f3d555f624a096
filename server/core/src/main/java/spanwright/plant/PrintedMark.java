package spanwright.plant;

import java.math.BigDecimal;
import java.math.RoundingMode;
import spanwright.quantity.Length;
import spanwright.quantity.LengthUnit;

/**
 * The mark to look for on a sheath.
 *
 * @param along how far along the print it stands; may be below 0 where the print is carried on beyond its beginning
 * @param unit the unit in which the sheath is printed
 */
public record PrintedMark(Length along, LengthUnit unit) {

    /** The number printed, in its unit, to a thousandth. */
    public BigDecimal number() {
        return BigDecimal.valueOf(along.micrometres())
                .divide(BigDecimal.valueOf(unit.micrometres()), 3, RoundingMode.HALF_EVEN);
    }
}
