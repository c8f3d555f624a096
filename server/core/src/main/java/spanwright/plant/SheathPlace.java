package spanwright.plant;

import spanwright.quantity.Length;

/**
 * Where a sheath position lies: in what a run row holds (its coil, or the bare row), or on the span that leads to a
 * row.
 *
 * @param row index of the run row, from 0; for a span, the row to which it leads
 * @param onSpan true on a span, false at the row
 * @param before sheath from where that stretch begins to the position
 * @param after sheath from the position to where that stretch ends
 */
public record SheathPlace(int row, boolean onSpan, Length before, Length after) {

    /** The share of the stretch that lies before the position, from 0 to 1; 0 where the stretch has no length. */
    public double fraction() {
        long whole = before.micrometres() + after.micrometres();
        return whole == 0 ? 0 : (double) before.micrometres() / whole;
    }
}
