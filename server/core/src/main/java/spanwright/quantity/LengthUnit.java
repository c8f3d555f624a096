package spanwright.quantity;

import java.util.Arrays;
import java.util.Optional;

/** The two units in which people read and sheaths print lengths. */
public enum LengthUnit {
    /** The metre. */
    METRE("m", 1_000_000),
    /** The international foot, 0.3048 m exactly. */
    FOOT("ft", 304_800);

    private final String symbol;
    private final long micrometres;

    LengthUnit(String symbol, long micrometres) {
        this.symbol = symbol;
        this.micrometres = micrometres;
    }

    /** How the unit is written: {@code m} or {@code ft}. */
    public String symbol() {
        return symbol;
    }

    /** One of it in micrometres, exact. */
    public long micrometres() {
        return micrometres;
    }

    /** The unit written so, if any. */
    public static Optional<LengthUnit> find(String symbol) {
        return Arrays.stream(values())
                .filter(unit -> unit.symbol.equals(symbol))
                .findFirst();
    }
}
