package spanwright.quantity;

import java.math.BigDecimal;
import java.math.RoundingMode;

/**
 * A length, exact to the micrometre; may be negative where a difference is meant.
 *
 * @param micrometres the length in micrometres
 */
public record Length(long micrometres) implements Comparable<Length> {

    /** No length at all. */
    public static final Length ZERO = new Length(0);

    private static final BigDecimal MICROMETRES_PER_METRE = BigDecimal.valueOf(1_000_000);

    /**
     * The length of so many metres, rounded half-even to the micrometre.
     *
     * @throws IllegalArgumentException where the number is not finite or leaves the range of a long
     */
    public static Length ofMetres(double metres) {
        if (!Double.isFinite(metres) || Math.abs(metres) > 9e12) {
            throw new IllegalArgumentException("not a length in metres: " + metres);
        }
        return new Length((long) Math.rint(metres * 1e6));
    }

    /** The length of so many metres, rounded half-even to the micrometre. */
    public static Length ofMetres(BigDecimal metres) {
        return of(metres, LengthUnit.METRE);
    }

    /**
     * The length of so many units, rounded half-even to the micrometre.
     *
     * @throws ArithmeticException where it leaves the range of a long
     */
    public static Length of(BigDecimal number, LengthUnit unit) {
        BigDecimal micrometres = number.multiply(BigDecimal.valueOf(unit.micrometres()));
        return new Length(micrometres.setScale(0, RoundingMode.HALF_EVEN).longValueExact());
    }

    /** The sum of both. */
    public Length plus(Length other) {
        return new Length(Math.addExact(micrometres, other.micrometres));
    }

    /** This less the other; may be negative. */
    public Length minus(Length other) {
        return new Length(Math.subtractExact(micrometres, other.micrometres));
    }

    /** This length times a plain factor, rounded half-even to the micrometre. */
    public Length times(double factor) {
        return new Length((long) Math.rint(micrometres * factor));
    }

    /** The same length without its sign. */
    public Length abs() {
        return micrometres < 0 ? new Length(-micrometres) : this;
    }

    /** In metres, for a formula or a screen. */
    public double metres() {
        return micrometres / 1e6;
    }

    /** In metres, exact to the micrometre, without trailing zeros. */
    public BigDecimal exactMetres() {
        BigDecimal plain =
                BigDecimal.valueOf(micrometres).divide(MICROMETRES_PER_METRE).stripTrailingZeros();
        return plain.scale() < 0 ? plain.setScale(0) : plain;
    }

    /** In the given unit, for a screen. */
    public double in(LengthUnit unit) {
        return (double) micrometres / unit.micrometres();
    }

    @Override
    public int compareTo(Length other) {
        return Long.compare(micrometres, other.micrometres);
    }

    @Override
    public String toString() {
        return exactMetres().toPlainString() + " m";
    }
}
